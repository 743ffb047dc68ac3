package org.saddlebook.data.checks.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.presentation.api.QuantityText;
import org.saddlebook.presentation.api.Rounding;

/** Pieces of sentences. */
final class Say {
    private static final double BEYOND = 690;

    private Say() {}

    /** {@code row 5 (line 9, 333.15 K (60.00 °C))} or {@code rows 2, 3 and 4 (lines 6, 7 and 8)}. */
    static String rows(List<Row> rows) {
        List<String> numbers = new ArrayList<>();
        List<String> lines = new ArrayList<>();
        for (Row row : rows) {
            numbers.add(Integer.toString(row.number()));
            row.point().asRead().line().ifPresent(line -> lines.add(Integer.toString(line)));
        }
        boolean one = rows.size() == 1;
        String text = (one ? "row " : "rows ") + list(numbers);
        String where = lines.size() == rows.size() ? (one ? "line " : "lines ") + list(lines) : "";
        if (one) {
            where = (where.isEmpty() ? "" : where + ", ")
                    + QuantityText.temperature(rows.get(0).kelvin());
        }
        return where.isEmpty() ? text : text + " (" + where + ")";
    }

    /** Numbers of rows. */
    static List<Integer> numbers(List<Row> rows) {
        List<Integer> numbers = new ArrayList<>();
        for (Row row : rows) {
            numbers.add(row.number());
        }
        return numbers;
    }

    /** The same at the start of a sentence. */
    static String capital(String text) {
        return Character.toUpperCase(text.charAt(0)) + text.substring(1);
    }

    /** A factor above 1 and its direction: {@code lower by a factor of 60.3}. */
    static String lowerOrHigher(double ln) {
        return (ln < 0 ? "lower" : "higher") + " by a factor of " + factor(Math.abs(ln));
    }

    /** exp(ln) with three digits. */
    static String factor(double ln) {
        if (Math.abs(ln) > BEYOND) {
            return "more than 10³⁰⁰";
        }
        return Rounding.significant(StrictMath.exp(ln), 3);
    }

    /** A relative scatter in per cent, or as a factor where it is no longer small. */
    static String scatter(double ln) {
        return ln < 0.3 ? Rounding.significant(100 * ln, 2) + " %" : "a factor of " + factor(ln);
    }

    private static String list(List<String> items) {
        if (items.size() == 1) {
            return items.get(0);
        }
        if (items.size() > 8) {
            return String.join(", ", items.subList(0, 7)) + " … " + items.get(items.size() - 1);
        }
        return String.join(", ", items.subList(0, items.size() - 1)) + " and " + items.get(items.size() - 1);
    }
}
