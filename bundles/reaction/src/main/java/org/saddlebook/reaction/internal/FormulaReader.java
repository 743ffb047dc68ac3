package org.saddlebook.reaction.internal;

import java.math.BigDecimal;
import java.util.Map;
import java.util.TreeMap;
import org.saddlebook.reaction.api.Formula;
import org.saddlebook.reaction.api.Fraction;
import org.saddlebook.reaction.api.ReactionException;

/**
 * Reads one formula.
 *
 * <pre>
 * formula = part {"·" [number] part} [charge] | "e" charge
 * part    = {(symbol | "(" part ")" | "[" part "]") [count]}
 * </pre>
 */
final class FormulaReader {
    private static final int DEEPEST = 20;
    private static final int MOST_DIGITS = 9;

    private final Characters characters;
    private final int start;
    private final int end;
    private int next;

    private FormulaReader(Characters characters, int start, int end) {
        this.characters = characters;
        this.start = start;
        this.end = end;
        this.next = start;
    }

    /**
     * A formula and where it ends.
     *
     * @param formula the formula
     * @param end index behind it
     */
    record Read(Formula formula, int end) {}

    static Read at(Characters characters, int start) throws ReactionException {
        ChargeReader.Extent extent = ChargeReader.at(characters, start);
        if (characters.part(start, extent.bodyEnd()).equals("e")) {
            if (extent.charge() != -1) {
                throw new ReactionException(
                        "formula-syntax",
                        "\"" + characters.part(start, extent.end()) + "\"",
                        "e- for the electron",
                        "Write e-.",
                        start + 1);
            }
            return new Read(new Formula("e^-", Map.of(), -1), extent.end());
        }
        FormulaReader reader = new FormulaReader(characters, start, extent.bodyEnd());
        Map<String, Fraction> elements = reader.whole();
        return new Read(
                new Formula(reader.text() + chargeText(extent.charge()), elements, extent.charge()), extent.end());
    }

    private static String chargeText(int charge) {
        if (charge == 0) {
            return "";
        }
        int size = Math.abs(charge);
        return "^" + (size == 1 ? "" : Integer.toString(size)) + (charge > 0 ? "+" : "-");
    }

    /** As written; a point that separates parts becomes {@code ·}. */
    private String text() {
        StringBuilder text = new StringBuilder();
        for (int i = start; i < end; i++) {
            char c = characters.at(i);
            boolean separates = c == '.' && !decimalPoint(i);
            text.append(separates ? '·' : c);
        }
        return text.toString();
    }

    /** Whether this point stands inside a number: digits on both sides. */
    private boolean decimalPoint(int i) {
        return characters.at(i) == '.'
                && i > start
                && Characters.digit(characters.at(i - 1))
                && Characters.digit(characters.at(i + 1));
    }

    private Map<String, Fraction> whole() throws ReactionException {
        if (start == end) {
            throw empty();
        }
        Map<String, Fraction> all = new TreeMap<>();
        add(all, part(0), Fraction.ONE);
        while (next < end && (characters.at(next) == '·' || characters.at(next) == '.')) {
            next++;
            Fraction times = Fraction.ONE;
            if (NumberReader.startsAt(characters, next)) {
                NumberReader.Read read = NumberReader.coefficient(characters, next);
                times = read.value();
                next = read.end();
            }
            add(all, part(0), times);
        }
        if (next < end) {
            throw unexpected();
        }
        return all;
    }

    private Map<String, Fraction> part(int depth) throws ReactionException {
        if (depth > DEEPEST) {
            throw syntax(next, "brackets more than 20 deep", "fewer brackets", "Write the formula more simply.");
        }
        int from = next;
        Map<String, Fraction> elements = new TreeMap<>();
        while (next < end) {
            char c = characters.at(next);
            if (Characters.capital(c)) {
                String symbol = symbol();
                add(elements, Map.of(symbol, Fraction.ONE), count());
            } else if (c == '(' || c == '[') {
                int open = next++;
                Map<String, Fraction> inner = part(depth + 1);
                if (next >= end || characters.at(next) != (c == '(' ? ')' : ']')) {
                    throw syntax(
                            open,
                            "\"" + characters.part(open, end) + "\"",
                            "a closing bracket",
                            "Close every bracket with one of its kind.");
                }
                next++;
                add(elements, inner, count());
            } else {
                break;
            }
        }
        if (next == from) {
            throw next < end ? unexpected() : empty();
        }
        return elements;
    }

    private String symbol() throws ReactionException {
        int from = next;
        next += Characters.small(characters.at(next + 1)) && next + 1 < end ? 2 : 1;
        String symbol = characters.part(from, next);
        if (!Elements.known(symbol)) {
            throw new ReactionException(
                    "unknown-element",
                    "\"" + symbol + "\"",
                    "the symbol of an element",
                    "Check the spelling; upper and lower case differ.",
                    from + 1);
        }
        return symbol;
    }

    /** One where none is written. */
    private Fraction count() throws ReactionException {
        int from = next;
        int digitsEnd = characters.skipDigits(from);
        if (digitsEnd == from || from >= end) {
            return Fraction.ONE;
        }
        next = Math.min(digitsEnd, end);
        if (next < end && decimalPoint(next)) {
            int behind = characters.skipDigits(next + 1);
            char follows = characters.at(behind);
            boolean zero = characters.part(from, next).equals("0");
            if (!zero && (Characters.capital(follows) || (follows == '(' && !characters.phaseAt(behind)))) {
                throw new ReactionException(
                        "ambiguous-count",
                        "\"" + characters.part(start, end) + "\"",
                        "a point that is either a decimal point or joins two parts",
                        "Write " + characters.part(start, next) + "·" + characters.part(next + 1, end)
                                + " for two parts; close the number with brackets for a decimal count.",
                        from + 1);
            }
            next = behind;
        }
        if (next - from > MOST_DIGITS) {
            throw syntax(
                    from,
                    "\"" + characters.part(from, next) + "\"",
                    "a number of at most 9 digits",
                    "Check the number of atoms.");
        }
        Fraction count = Fraction.of(new BigDecimal(characters.part(from, next)));
        if (count.signum() == 0) {
            throw syntax(from, "a count of 0", "a number of atoms above zero", "Leave the element out.");
        }
        return count;
    }

    private static void add(Map<String, Fraction> to, Map<String, Fraction> from, Fraction times) {
        for (Map.Entry<String, Fraction> entry : from.entrySet()) {
            to.merge(entry.getKey(), entry.getValue().times(times), Fraction::plus);
        }
    }

    private ReactionException unexpected() {
        return syntax(
                next,
                "\"" + characters.at(next) + "\"",
                "the symbol of an element",
                "Write a formula such as H2O, Ca(OH)2 or CuSO4·5H2O.");
    }

    private ReactionException empty() {
        char found = characters.at(next);
        return new ReactionException(
                "empty-formula",
                found == '\n' ? "nothing" : "\"" + found + "\"",
                "a formula",
                "Write a formula such as H2O, Ca(OH)2 or CuSO4·5H2O.",
                next + 1);
    }

    private static ReactionException syntax(int at, String found, String expected, String remedy) {
        return new ReactionException("formula-syntax", found, expected, remedy, at + 1);
    }
}
