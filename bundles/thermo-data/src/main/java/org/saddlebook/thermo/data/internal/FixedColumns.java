package org.saddlebook.thermo.data.internal;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.TreeMap;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.reaction.api.Formula;
import org.saddlebook.reaction.api.Fraction;
import org.saddlebook.reaction.api.Phase;
import org.saddlebook.reaction.api.ReactionException;
import org.saddlebook.reaction.api.Species;

/** Lines of a file with fixed columns, counted from 1. */
final class FixedColumns {
    private final String file;
    private final List<String> lines;

    FixedColumns(String text, String file) {
        this.file = file;
        lines = new ArrayList<>();
        int start = 0;
        while (start < text.length()) {
            int end = text.indexOf('\n', start);
            end = end < 0 ? text.length() : end;
            int cut = end > start && text.charAt(end - 1) == '\r' ? end - 1 : end;
            lines.add(text.substring(start, cut));
            start = end + 1;
        }
    }

    int size() {
        return lines.size();
    }

    String line(int index) {
        return lines.get(index);
    }

    /** Columns from..to, both counted from 1 and included; short lines are taken as filled with blanks. */
    String columns(int index, int from, int to) {
        String line = index < lines.size() ? lines.get(index) : "";
        return from > line.length() ? "" : line.substring(from - 1, Math.min(to, line.length()));
    }

    /** A number in Fortran's manner: D exponents, blanks inside an exponent such as {@code E 03}. */
    double number(int index, int from, int to) throws InputException {
        String written = columns(index, from, to);
        String plain = written.strip().replace('D', 'E').replace('d', 'E').replace(" ", "");
        try {
            double value = new BigDecimal(plain).doubleValue();
            if (Double.isFinite(value)) {
                return value;
            }
        } catch (NumberFormatException notOne) {
            // Reported below with its place.
        }
        throw problem(
                "not-a-number",
                index,
                from,
                to,
                written,
                "a number",
                "Check that the line keeps its fixed columns; a blank too many shifts them.");
    }

    boolean blank(int index, int from, int to) {
        return columns(index, from, to).isBlank();
    }

    InputException problem(String code, int index, int from, int to, String found, String expected, String remedy) {
        return new InputException(new Problem(
                code,
                new Place(file, OptionalInt.of(index + 1), Optional.of("columns " + from + "-" + to)),
                "\"" + found + "\"",
                expected,
                remedy));
    }

    /** Elements and numbers in pairs of columns. */
    void elements(int index, int from, int pairs, int width, Map<String, Fraction> elements) throws InputException {
        for (int i = 0; i < pairs; i++) {
            int at = from + i * width;
            String symbol = columns(index, at, at + 1).strip();
            if (symbol.isEmpty() || symbol.equals("0") || blank(index, at + 2, at + width - 1)) {
                continue;
            }
            double count = number(index, at + 2, at + width - 1);
            if (count != 0) {
                String name = symbol.substring(0, 1).toUpperCase(Locale.ROOT)
                        + symbol.substring(1).toLowerCase(Locale.ROOT);
                elements.merge(name, Fraction.of(new BigDecimal(count)), Fraction::plus);
            }
        }
    }

    /** The species: its name where that is a formula of this composition, else a formula made of the composition. */
    Species species(int index, String name, Map<String, Fraction> composition, Phase phase) throws InputException {
        Map<String, Fraction> elements = new TreeMap<>(composition);
        Fraction electrons = elements.remove("E");
        int charge = electrons == null ? 0 : -electrons.numerator().intValueExact();
        int bracket = name.indexOf('(');
        String bare = bracket > 0 && name.endsWith(")") && Character.isLowerCase(name.charAt(name.length() - 2))
                ? name.substring(0, bracket)
                : name;
        for (String candidate : List.of(name, bare)) {
            try {
                Formula formula = Formula.parse(candidate);
                if (formula.elements().equals(elements) && formula.charge() == charge) {
                    return new Species(formula, Optional.of(phase), "");
                }
            } catch (ReactionException notAFormula) {
                // Names such as CH3CHO,ethanal are common; the composition speaks.
            }
        }
        StringBuilder text = new StringBuilder();
        elements.forEach((symbol, count) -> text.append(symbol)
                .append(count.equals(Fraction.ONE) ? "" : count.numerator().toString()));
        if (charge != 0) {
            text.append('^').append(Math.abs(charge)).append(charge > 0 ? '+' : '-');
        }
        try {
            return new Species(Formula.parse(text.toString()), Optional.of(phase), name);
        } catch (ReactionException wrong) {
            throw problem("unknown-element", index, 1, 80, line(index), "elements of a species", wrong.remedy());
        }
    }
}
