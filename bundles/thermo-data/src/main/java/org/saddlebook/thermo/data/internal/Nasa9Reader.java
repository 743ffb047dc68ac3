package org.saddlebook.thermo.data.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.reaction.api.Fraction;
import org.saddlebook.reaction.api.Phase;
import org.saddlebook.reaction.api.Species;
import org.saddlebook.thermo.data.api.PowerSegment;
import org.saddlebook.thermo.data.api.Segment;
import org.saddlebook.thermo.data.api.SpeciesData;

/** NASA 9 coefficients in fixed columns. */
public final class Nasa9Reader {
    private static final int WIDTH = 16;
    private static final int LINES_PER_RANGE = 3;

    private final FixedColumns columns;
    private final String reference;

    private Nasa9Reader(FixedColumns columns, String reference) {
        this.columns = columns;
        this.reference = reference;
    }

    /** Every species of the file that has coefficients; throws with every problem. */
    public static List<SpeciesData> read(String text, String file, String reference) throws InputException {
        return new Nasa9Reader(new FixedColumns(text, file), reference).all();
    }

    private List<SpeciesData> all() throws InputException {
        List<SpeciesData> found = new ArrayList<>();
        List<Problem> problems = new ArrayList<>();
        int i = 0;
        while (i < columns.size()) {
            String word = columns.line(i).strip().toUpperCase(Locale.ROOT);
            if (word.isEmpty() || word.startsWith("!") || word.startsWith("#") || word.startsWith("END ")) {
                i++;
            } else if (word.equals("END")) {
                break;
            } else if (word.equals("THERMO")) {
                i += 2;
            } else {
                int ranges;
                try {
                    ranges = (int) columns.number(i + 1, 1, 2);
                } catch (InputException wrong) {
                    // Without the number of ranges the next species cannot be found.
                    problems.addAll(wrong.problems());
                    break;
                }
                try {
                    if (ranges > 0) {
                        found.add(species(i, ranges));
                    }
                } catch (InputException wrong) {
                    problems.addAll(wrong.problems());
                }
                i += 2 + Math.max(1, LINES_PER_RANGE * ranges);
            }
        }
        if (!problems.isEmpty()) {
            throw new InputException(problems);
        }
        return found;
    }

    private SpeciesData species(int first, int ranges) throws InputException {
        String name = columns.columns(first, 1, 16).strip().split("\\s", 2)[0];
        Map<String, Fraction> elements = new TreeMap<>();
        columns.elements(first + 1, 11, 5, 8, elements);
        boolean gas = columns.number(first + 1, 51, 52) == 0;
        Phase phase = gas ? Phase.GAS : name.endsWith("(L)") ? Phase.LIQUID : Phase.SOLID;
        String bare = name.endsWith("(L)") ? name.substring(0, name.length() - 3) : name;
        Species species = columns.species(first + 1, bare, elements, phase);
        List<Segment> segments = new ArrayList<>();
        for (int k = 0; k < ranges; k++) {
            segments.add(range(first + 2 + LINES_PER_RANGE * k));
            if (k > 0 && segments.get(k).lowerKelvin() < segments.get(k - 1).upperKelvin()) {
                throw columns.problem(
                        "temperature-range",
                        first + 2 + LINES_PER_RANGE * k,
                        1,
                        22,
                        columns.columns(first + 2 + LINES_PER_RANGE * k, 1, 22),
                        "a range above the one before",
                        "Put the ranges in rising order, without overlap.");
            }
        }
        return SpeciesData.of(species, "nasa-9", reference, segments);
    }

    private Segment range(int line) throws InputException {
        double low = columns.number(line, 1, 11);
        double high = columns.number(line, 12, 22);
        if (!(low > 0 && high > low)) {
            throw columns.problem(
                    "temperature-range",
                    line,
                    1,
                    22,
                    columns.columns(line, 1, 22),
                    "a lower and an upper temperature above 0 K",
                    "Check the two temperatures.");
        }
        for (int k = 0; k < PowerSegment.POWERS; k++) {
            int at = 24 + 5 * k;
            if (columns.number(line, at, at + 4) != k - 2) {
                throw columns.problem(
                        "exponent",
                        line,
                        at,
                        at + 4,
                        columns.columns(line, at, at + 4),
                        "the exponent " + (k - 2),
                        "Only the published order -2 to 4 is understood.");
            }
        }
        double[] c = new double[9];
        for (int k = 0; k < 5; k++) {
            c[k] = columns.number(line + 1, 1 + WIDTH * k, WIDTH * (k + 1));
        }
        c[5] = columns.number(line + 2, 1, 16);
        c[6] = columns.number(line + 2, 17, 32);
        c[7] = columns.number(line + 2, 49, 64);
        c[8] = columns.number(line + 2, 65, 80);
        return PowerSegment.nasa9(low, high, c);
    }
}
