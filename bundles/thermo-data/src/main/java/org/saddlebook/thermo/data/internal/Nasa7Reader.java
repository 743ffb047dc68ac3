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
import org.saddlebook.thermo.data.api.PowerSegment;
import org.saddlebook.thermo.data.api.SpeciesData;

/** NASA 7 coefficients in fixed columns. */
public final class Nasa7Reader {
    private static final int WIDTH = 15;
    private static final int PER_LINE = 5;
    private static final double DEFAULT_MIDDLE = 1000;

    private final FixedColumns columns;
    private final String reference;
    private double defaultMiddle = DEFAULT_MIDDLE;

    private Nasa7Reader(FixedColumns columns, String reference) {
        this.columns = columns;
        this.reference = reference;
    }

    /** Every species of the file; throws with every problem. */
    public static List<SpeciesData> read(String text, String file, String reference) throws InputException {
        return new Nasa7Reader(new FixedColumns(text, file), reference).all();
    }

    private List<SpeciesData> all() throws InputException {
        List<SpeciesData> found = new ArrayList<>();
        List<Problem> problems = new ArrayList<>();
        int i = 0;
        while (i < columns.size()) {
            String word = columns.line(i).strip().toUpperCase(Locale.ROOT);
            if (word.isEmpty() || word.startsWith("!")) {
                i++;
            } else if (word.startsWith("END")) {
                break;
            } else if (word.startsWith("THERMO")) {
                i = skipDefaults(i + 1);
            } else {
                try {
                    found.add(species(i));
                } catch (InputException wrong) {
                    problems.addAll(wrong.problems());
                }
                i += 4;
            }
        }
        if (!problems.isEmpty()) {
            throw new InputException(problems);
        }
        return found;
    }

    /** The three default temperatures, where they are. */
    private int skipDefaults(int i) throws InputException {
        boolean defaults = i < columns.size()
                && !columns.line(i).isBlank()
                && columns.columns(i, 80, 80).isBlank()
                && !Character.isLetter(columns.line(i).strip().charAt(0));
        if (!defaults) {
            return i;
        }
        defaultMiddle = columns.number(i, 11, 20);
        return i + 1;
    }

    private SpeciesData species(int first) throws InputException {
        for (int k = 0; k < 4; k++) {
            String number = columns.columns(first + k, 80, 80);
            if (!number.equals(Integer.toString(k + 1))) {
                throw columns.problem(
                        "line-number",
                        Math.min(first + k, columns.size() - 1),
                        80,
                        80,
                        number,
                        "the line number " + (k + 1),
                        "Each species has four lines of 80 columns, numbered 1 to 4 in the last.");
            }
        }
        String name = columns.columns(first, 1, 18).strip().split("\\s", 2)[0];
        Map<String, Fraction> elements = new TreeMap<>();
        columns.elements(first, 25, 4, 5, elements);
        columns.elements(first, 74, 1, 5, elements);
        Phase phase = switch (columns.columns(first, 45, 45)) {
            case "G", "g" -> Phase.GAS;
            case "L", "l" -> Phase.LIQUID;
            case "S", "s", "C", "c" -> Phase.SOLID;
            default ->
                throw columns.problem(
                        "unknown-phase",
                        first,
                        45,
                        45,
                        columns.columns(first, 45, 45),
                        "G, L, S or C",
                        "State the phase in column 45.");
        };
        double low = columns.number(first, 46, 55);
        double high = columns.number(first, 56, 65);
        double middle = columns.blank(first, 66, 73) ? defaultMiddle : columns.number(first, 66, 73);
        if (!(low > 0 && middle > low && high > middle)) {
            throw columns.problem(
                    "temperature-range",
                    first,
                    46,
                    73,
                    columns.columns(first, 46, 73),
                    "lower, upper and middle temperature, the middle one between the others",
                    "Check the three temperatures.");
        }
        double[] a = new double[14];
        for (int k = 0; k < a.length; k++) {
            int at = 1 + k % PER_LINE * WIDTH;
            a[k] = columns.number(first + 1 + k / PER_LINE, at, at + WIDTH - 1);
        }
        double[] upper = java.util.Arrays.copyOfRange(a, 0, 7);
        double[] lower = java.util.Arrays.copyOfRange(a, 7, 14);
        return SpeciesData.of(
                columns.species(first, name, elements, phase),
                "nasa-7",
                reference,
                List.of(PowerSegment.nasa7(low, middle, lower), PowerSegment.nasa7(middle, high, upper)));
    }
}
