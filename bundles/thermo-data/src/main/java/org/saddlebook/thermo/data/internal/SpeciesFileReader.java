package org.saddlebook.thermo.data.internal;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalInt;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.reaction.api.ReactionException;
import org.saddlebook.reaction.api.Species;
import org.saddlebook.thermo.data.api.PowerSegment;
import org.saddlebook.thermo.data.api.Segment;
import org.saddlebook.thermo.data.api.SpeciesData;
import org.saddlebook.thermo.data.api.TableSegment;

/** Files of species data in any form that is understood; the content says which. */
public final class SpeciesFileReader {
    private static final double REFERENCE = 298.15;
    private static final List<String> SHOMATE =
            List.of("species", "lower_k", "upper_k", "a", "b", "c", "d", "e", "f", "g");
    private static final List<String> TABLE =
            List.of("temperature_k", "cp_j_mol-1_k-1", "s_j_mol-1_k-1", "h_minus_h298_kj_mol-1", "dfh_kj_mol-1");

    private final String file;
    private final String reference;
    private final List<String> lines;

    private SpeciesFileReader(String text, String file, String reference) {
        this.file = file;
        this.reference = reference;
        lines = List.of(text.replace("\r\n", "\n").split("\n", -1));
    }

    /** Every species of the file. */
    public static List<SpeciesData> read(String text, String file, String reference) throws InputException {
        SpeciesFileReader reader = new SpeciesFileReader(text, file, reference);
        int header = reader.header();
        if (header < 0) {
            throw reader.problem(
                    "empty-file", 0, "", "species data", "Put species data into the file, or take it away.");
        }
        List<String> columns = reader.cells(header);
        String first = columns.get(0).toLowerCase(Locale.ROOT);
        if (first.equals("species")) {
            return reader.shomate(header);
        }
        if (first.equals("temperature_k")) {
            return List.of(reader.table(header));
        }
        return reader.numbered() ? Nasa7Reader.read(text, file, reference) : Nasa9Reader.read(text, file, reference);
    }

    /** The first line that is no comment; −1 for none. */
    private int header() {
        for (int i = 0; i < lines.size(); i++) {
            String line = lines.get(i).strip();
            if (!line.isEmpty() && !line.startsWith("#") && !line.startsWith("!")) {
                return i;
            }
        }
        return -1;
    }

    /** Whether column 80 numbers lines, as it does for NASA 7 coefficients. */
    private boolean numbered() {
        for (String line : lines) {
            if (line.length() >= 80 && line.charAt(79) == '1' && !line.startsWith("!")) {
                return true;
            }
        }
        return false;
    }

    private List<String> cells(int line) {
        String text = lines.get(line);
        String separator = text.indexOf(';') >= 0 ? ";" : ",";
        List<String> cells = new ArrayList<>();
        for (String cell : text.split(separator, -1)) {
            cells.add(cell.strip());
        }
        return cells;
    }

    private int[] columns(int header, List<String> wanted) throws InputException {
        List<String> names = new ArrayList<>();
        for (String cell : cells(header)) {
            names.add(cell.toLowerCase(Locale.ROOT));
        }
        int[] columns = new int[wanted.size()];
        for (int k = 0; k < columns.length; k++) {
            columns[k] = names.indexOf(wanted.get(k));
            if (columns[k] < 0) {
                throw problem(
                        "missing-column",
                        header,
                        lines.get(header),
                        "a column " + wanted.get(k),
                        "Name the columns as the documentation lists them.");
            }
        }
        return columns;
    }

    private List<SpeciesData> shomate(int header) throws InputException {
        int[] columns = columns(header, SHOMATE);
        List<SpeciesData> found = new ArrayList<>();
        List<Segment> segments = new ArrayList<>();
        Species current = null;
        int last = header;
        for (int i = header + 1; i < lines.size(); i++) {
            if (lines.get(i).isBlank() || lines.get(i).startsWith("#")) {
                continue;
            }
            List<String> cells = cells(i);
            Species species = species(cell(cells, columns[0], i), i);
            double low = number(cells, columns[1], i);
            double high = number(cells, columns[2], i);
            if (!(low > 0 && high > low)) {
                throw problem(
                        "temperature-range",
                        i,
                        cell(cells, columns[1], i) + " to " + cell(cells, columns[2], i),
                        "a lower temperature above 0 K and an upper one above it",
                        "Check both temperatures; they are in kelvin.");
            }
            double[] a = new double[7];
            for (int k = 0; k < a.length; k++) {
                a[k] = number(cells, columns[3 + k], i);
            }
            if (current != null && !current.equals(species)) {
                found.add(data(current, "shomate", segments, last));
                segments.clear();
            }
            current = species;
            last = i;
            segments.add(PowerSegment.shomate(low, high, a));
        }
        if (current == null) {
            throw problem(
                    "empty-file", header, "", "a line of coefficients", "Add a line for each range of each species.");
        }
        found.add(data(current, "shomate", segments, last));
        return found;
    }

    private SpeciesData table(int header) throws InputException {
        int[] columns = columns(header, TABLE);
        List<double[]> rows = new ArrayList<>();
        double formation = Double.NaN;
        for (int i = header + 1; i < lines.size(); i++) {
            if (lines.get(i).isBlank() || lines.get(i).startsWith("#")) {
                continue;
            }
            List<String> cells = cells(i);
            double[] row = new double[4];
            for (int k = 0; k < row.length; k++) {
                row[k] = number(cells, columns[k], i);
            }
            if (!(row[0] > (rows.isEmpty() ? 0 : rows.get(rows.size() - 1)[0]))) {
                throw problem(
                        "temperature-order",
                        i,
                        cell(cells, columns[0], i),
                        "a temperature above 0 K and above that of the row before",
                        "Sort the rows by temperature; a phase change belongs into two files.");
            }
            if (row[0] == REFERENCE) {
                formation = number(cells, columns[4], i);
            }
            rows.add(row);
        }
        if (rows.size() < 2 || Double.isNaN(formation)) {
            throw problem(
                    "missing-row",
                    header,
                    rows.size() + " rows",
                    "at least two rows, one of them at 298.15 K with the enthalpy of formation",
                    "Add the row at 298.15 K.");
        }
        double[][] c = new double[4][rows.size()];
        for (int i = 0; i < rows.size(); i++) {
            for (int k = 0; k < 4; k++) {
                c[k][i] = rows.get(i)[k];
            }
            c[3][i] = (c[3][i] + formation) * 1000;
        }
        return data(named(header), "table", List.of(new TableSegment(c[0], c[1], c[3], c[2])), header);
    }

    /** The species of a table: from a comment, else from the name of the file. */
    private Species named(int header) throws InputException {
        for (int i = 0; i < header; i++) {
            String line = lines.get(i).strip();
            if (line.startsWith("# species:")) {
                return species(line.substring("# species:".length()).strip(), i);
            }
        }
        int slash = file.lastIndexOf('/');
        int dot = file.lastIndexOf('.');
        String bare = file.substring(slash + 1, dot > slash ? dot : file.length());
        int underscore = bare.lastIndexOf('_');
        String text =
                underscore > 0 ? bare.substring(0, underscore) + "(" + bare.substring(underscore + 1) + ")" : bare;
        return species(text, header);
    }

    private Species species(String text, int line) throws InputException {
        Species species;
        try {
            species = Species.parse(text);
        } catch (ReactionException wrong) {
            throw problem("unknown-species", line, text, wrong.expected(), wrong.remedy());
        }
        if (species.phase().isEmpty()) {
            throw problem(
                    "missing-phase",
                    line,
                    text,
                    "a species with its phase, such as NO2(g)",
                    "State the phase: (g), (l), (s) or (aq); of a table in a line \"# species: NO2(g)\".");
        }
        return species;
    }

    private SpeciesData data(Species species, String kind, List<Segment> segments, int line) throws InputException {
        try {
            return SpeciesData.of(species, kind, reference, segments);
        } catch (IllegalArgumentException wrong) {
            throw problem(
                    "temperature-range",
                    line,
                    species.text(),
                    "ranges of one species in rising order that do not overlap",
                    "Put the lines of one species together, the coldest range first.");
        }
    }

    private String cell(List<String> cells, int column, int line) throws InputException {
        if (column >= cells.size()) {
            throw problem(
                    "ragged-row", line, cells.size() + " cells", "at least " + (column + 1), "Check the separators.");
        }
        return cells.get(column);
    }

    private double number(List<String> cells, int column, int line) throws InputException {
        String text = cell(cells, column, line);
        try {
            double value = new BigDecimal(text).doubleValue();
            if (Double.isFinite(value)) {
                return value;
            }
        } catch (NumberFormatException notANumber) {
            // Reported below with its place.
        }
        throw new InputException(new Problem(
                "not-a-number",
                new Place(file, OptionalInt.of(line + 1), Optional.of(Integer.toString(column + 1))),
                "\"" + text + "\"",
                "a number with a decimal point",
                "Correct the cell."));
    }

    private InputException problem(String code, int line, String found, String expected, String remedy) {
        return new InputException(new Problem(
                code,
                new Place(file, OptionalInt.of(line + 1), Optional.empty()),
                "\"" + found + "\"",
                expected,
                remedy));
    }
}
