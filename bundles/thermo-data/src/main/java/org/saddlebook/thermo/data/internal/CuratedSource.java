package org.saddlebook.thermo.data.internal;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.reaction.api.ReactionException;
import org.saddlebook.reaction.api.Species;
import org.saddlebook.thermo.data.api.NasaFiles;
import org.saddlebook.thermo.data.api.PowerSegment;
import org.saddlebook.thermo.data.api.Segment;
import org.saddlebook.thermo.data.api.SpeciesData;
import org.saddlebook.thermo.data.api.SpeciesSource;
import org.saddlebook.thermo.data.api.TableSegment;

/** The curated set of this bundle; files are read when a species is asked for. Preferred first: table, Shomate, NASA 7, NASA 9, constants. */
@Component
public final class CuratedSource implements SpeciesSource {
    private static final String JANAF =
            "NIST-JANAF Thermochemical Tables, 4th edition (M. W. Chase, J. Phys. Chem. Ref."
                    + " Data Monograph 9, 1998)";
    private static final String SHOMATE = "NIST Chemistry WebBook, SRD 69, Shomate coefficients after NIST-JANAF 1998";
    private static final String GRI = "G. P. Smith et al., GRI-Mech 3.0, thermochemistry file";
    private static final String MCBRIDE = "B. J. McBride, M. J. Zehe, S. Gordon, NASA TP-2002-211556";
    private static final String CODATA =
            "J. D. Cox, D. D. Wagman, V. A. Medvedev, CODATA Key Values for Thermodynamics" + " (1989)";

    @Override
    public String id() {
        return "curated";
    }

    @Override
    public String title() {
        return "Curated published data";
    }

    @Override
    public List<SpeciesData> find(Species species) {
        List<SpeciesData> found = new ArrayList<>();
        List<SpeciesData> constants = constants(species);
        for (List<String> row : rows("tables.csv")) {
            Species one = parse(row.get(0));
            if (matches(species, one)) {
                found.add(stated(table(one, row.get(1)), one));
            }
        }
        List<Segment> segments = new ArrayList<>();
        List<List<String>> shomate = rows("shomate.csv");
        for (int i = 0; i < shomate.size(); i++) {
            List<String> row = shomate.get(i);
            Species one = parse(row.get(0));
            if (!matches(species, one)) {
                continue;
            }
            double[] a = new double[7];
            for (int k = 0; k < a.length; k++) {
                a[k] = number(row.get(3 + k));
            }
            segments.add(PowerSegment.shomate(number(row.get(1)), number(row.get(2)), a));
            if (i + 1 == shomate.size() || !shomate.get(i + 1).get(0).equals(row.get(0))) {
                found.add(stated(SpeciesData.of(one, "shomate", SHOMATE, segments), one));
                segments.clear();
            }
        }
        for (SpeciesData one : nasa()) {
            if (matches(species, one.species())) {
                found.add(stated(one, one.species()));
            }
        }
        found.addAll(constants);
        return found;
    }

    private static List<SpeciesData> nasa() {
        try {
            List<SpeciesData> all = new ArrayList<>(NasaFiles.nasa7(text("nasa7.dat"), "nasa7.dat", GRI));
            all.addAll(NasaFiles.nasa9(text("nasa9.dat"), "nasa9.dat", MCBRIDE));
            return all;
        } catch (InputException broken) {
            throw new IllegalStateException("a file of this bundle: " + broken.getMessage(), broken);
        }
    }

    /** With the uncertainties of the key values, where those list the species, else of the tables' own pages. */
    private static SpeciesData stated(SpeciesData data, Species species) {
        for (SpeciesData key : constants(species)) {
            return data.withUncertainties(
                    key.enthalpyUncertainty(), key.entropyUncertainty(), "CODATA Key Values 1989");
        }
        for (List<String> row : rows("uncertainties.csv")) {
            if (matches(species, parse(row.get(0)))) {
                return data.withUncertainties(
                        OptionalDouble.of(number(row.get(1)) * 1000),
                        OptionalDouble.empty(),
                        "NIST-JANAF 1998, from memory");
            }
        }
        return data;
    }

    private static List<SpeciesData> constants(Species species) {
        List<SpeciesData> found = new ArrayList<>();
        for (List<String> row : rows("codata.csv")) {
            Species one = parse(row.get(0));
            if (matches(species, one)) {
                found.add(SpeciesData.constants(one, "codata", CODATA, number(row.get(1)) * 1000, number(row.get(3)))
                        .withUncertainties(
                                OptionalDouble.of(number(row.get(2)) * 1000), OptionalDouble.of(number(row.get(4)))));
            }
        }
        return found;
    }

    private static SpeciesData table(Species species, String file) {
        List<List<String>> rows = rows("tables/" + file);
        int n = rows.size();
        double[] t = new double[n];
        double[] cp = new double[n];
        double[] s = new double[n];
        double[] h = new double[n];
        double formation = Double.NaN;
        for (int i = 0; i < n; i++) {
            List<String> row = rows.get(i);
            t[i] = number(row.get(0));
            cp[i] = number(row.get(1));
            s[i] = number(row.get(2));
            h[i] = number(row.get(3)) * 1000;
            if (t[i] == 298.15) {
                formation = number(row.get(4)) * 1000;
            }
        }
        for (int i = 0; i < n; i++) {
            h[i] += formation;
        }
        return SpeciesData.of(species, "janaf", JANAF, List.of(new TableSegment(t, cp, h, s)));
    }

    /** What is asked for without phase or modification matches every one. */
    static boolean matches(Species asked, Species known) {
        return asked.formula().equals(known.formula())
                && (asked.phase().isEmpty() || asked.phase().equals(known.phase()))
                && (asked.modification().isEmpty() || asked.modification().equals(known.modification()));
    }

    private static Species parse(String text) {
        try {
            return Species.parse(text);
        } catch (ReactionException broken) {
            throw new IllegalStateException("a file of this bundle: " + broken.getMessage(), broken);
        }
    }

    private static double number(String text) {
        return Double.parseDouble(text);
    }

    /** Rows without comments and header. */
    private static List<List<String>> rows(String file) {
        List<List<String>> rows = new ArrayList<>();
        boolean header = true;
        for (String line : text(file).split("\n", -1)) {
            if (line.isEmpty() || line.startsWith("#")) {
                continue;
            }
            if (!header) {
                rows.add(List.of(line.split(";", -1)));
            }
            header = false;
        }
        return rows;
    }

    private static String text(String file) {
        try (InputStream stream = Optional.ofNullable(CuratedSource.class.getResourceAsStream(file))
                .orElseThrow(() -> new IllegalStateException("missing in this bundle: " + file))) {
            return new String(stream.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException unreadable) {
            throw new UncheckedIOException(unreadable);
        }
    }
}
