package org.saddlebook.presentation.api;

import java.util.ArrayList;
import java.util.List;

/**
 * UCUM terms in the look of the trade: {@code L/(mol.s)} is {@code L mol⁻¹ s⁻¹}, {@code s-1} is {@code s⁻¹}, while molar
 * energies and entropies keep their stroke: {@code kJ/mol}, {@code J/(mol K)}.
 */
public final class UnitText {
    private UnitText() {}

    /**
     * The unit for people.
     *
     * @param ucum a UCUM term; one that is not understood comes back unchanged
     * @return empty for the pure number {@code 1}
     */
    public static String forPeople(String ucum) {
        return switch (ucum) {
            case "1", "" -> "";
            case "K", "J/mol", "kJ/mol", "kcal/mol", "cal/mol" -> ucum;
            case "J/(mol.K)", "J/mol/K", "J.mol-1.K-1" -> "J/(mol K)";
            case "kJ/(mol.K)" -> "kJ/(mol K)";
            case "cal/(mol.K)" -> "cal/(mol K)";
            case "Cel" -> "°C";
            case "[degF]" -> "°F";
            default -> terms(ucum);
        };
    }

    /** {@code text} and the unit behind it, with a no-break space; the text alone for a pure number. */
    public static String after(String text, String ucum) {
        String unit = forPeople(ucum);
        return unit.isEmpty() ? text : text + "\u00a0" + unit;
    }

    private record Term(String symbol, int exponent) {}

    private static String terms(String ucum) {
        List<Term> found = new ArrayList<>();
        if (!new Parser(ucum).read(found)) {
            return ucum;
        }
        // The trade writes what is multiplied first, then what is divided by, each in the order of the term.
        StringBuilder text = new StringBuilder();
        for (int pass = 0; pass < 2; pass++) {
            for (Term term : found) {
                if ((term.exponent() > 0) == (pass == 0)) {
                    if (text.length() > 0) {
                        text.append('\u00a0');
                    }
                    text.append(term.symbol());
                    if (term.exponent() != 1) {
                        text.append(Decimals.raised(term.exponent()));
                    }
                }
            }
        }
        return text.toString();
    }

    private static String symbol(String ucum) {
        return switch (ucum) {
            case "Cel" -> "°C";
            case "[degF]" -> "°F";
            case "l" -> "L";
            case "ml" -> "mL";
            case "um" -> "µm";
            case "us" -> "µs";
            case "umol" -> "µmol";
            default -> ucum;
        };
    }

    /** Reads the part of UCUM that units of rate constants need: symbols, exponents, dots, strokes and brackets. */
    private static final class Parser {
        private final String text;
        private int at;

        Parser(String text) {
            this.text = text;
        }

        boolean read(List<Term> into) {
            return product(1, into) && at == text.length();
        }

        private boolean product(int sign, List<Term> into) {
            int current = sign;
            if (peek() == '/') {
                at++;
                current = -sign;
            }
            while (true) {
                if (!factor(current, into)) {
                    return false;
                }
                if (peek() == '.') {
                    at++;
                    current = sign;
                } else if (peek() == '/') {
                    at++;
                    current = -sign;
                } else {
                    return true;
                }
            }
        }

        private boolean factor(int sign, List<Term> into) {
            if (peek() == '(') {
                at++;
                if (!product(sign, into) || peek() != ')') {
                    return false;
                }
                at++;
                return true;
            }
            int start = at;
            if (peek() == '{') {
                int end = text.indexOf('}', at);
                if (end < 0) {
                    return false;
                }
                at = end + 1;
                into.add(new Term(text.substring(start + 1, end), sign));
                return true;
            }
            while (Character.isLetter(peek()) || "[]_%'".indexOf(peek()) >= 0) {
                at++;
            }
            if (at == start) {
                if (peek() == '1') {
                    at++;
                    return true;
                }
                return false;
            }
            String symbol = symbol(text.substring(start, at));
            int exponentStart = at;
            if (peek() == '-' || peek() == '+') {
                at++;
            }
            while (peek() >= '0' && peek() <= '9') {
                at++;
            }
            int exponent = 1;
            if (at > exponentStart) {
                try {
                    exponent = Integer.parseInt(text.substring(exponentStart, at));
                } catch (NumberFormatException e) {
                    return false;
                }
            }
            if (exponent == 0) {
                return false;
            }
            into.add(new Term(symbol, sign * exponent));
            return true;
        }

        /** The next character; NUL at the end, which belongs to nothing. */
        private char peek() {
            return at < text.length() ? text.charAt(at) : '\0';
        }
    }
}
