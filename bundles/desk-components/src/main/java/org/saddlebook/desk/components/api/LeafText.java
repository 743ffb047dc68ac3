package org.saddlebook.desk.components.api;

import java.util.Locale;
import org.saddlebook.api.findings.Node;
import org.saddlebook.presentation.api.DisplayUnit;
import org.saddlebook.presentation.api.QuantityText;
import org.saddlebook.presentation.api.Rounding;
import org.saddlebook.presentation.api.UnitText;

/** Leaves and keys of findings in words. */
public final class LeafText {
    private LeafText() {}

    /** Whether a node is one value that fits on a line. */
    public static boolean isLeaf(Node node) {
        return node instanceof Node.Quantity
                || node instanceof Node.Scalar
                || node instanceof Node.Flag
                || node instanceof Node.Text;
    }

    /**
     * A leaf as one line; empty for a node that is no leaf.
     *
     * @param key its key: a kelvin that is a distance between temperatures is not given in °C too
     */
    public static String of(String key, Node node, CautionNumbers numbers) {
        if (node instanceof Node.Quantity quantity) {
            boolean exact = quantity.value().isPresent()
                    && quantity.standardUncertainty().isEmpty()
                    && quantity.standardFactor().isEmpty()
                    && quantity.interval().isEmpty();
            if (exact && !isTemperature(key, quantity) && few(quantity.value().getAsDouble())) {
                DisplayUnit shown = DisplayUnit.of(quantity.unit());
                String number = Rounding.shortest(shown.value(quantity.value().getAsDouble()));
                return UnitText.after(number, shown.ucum()) + numbers.marks(quantity.cautions());
            }
            String text = isTemperature(key, quantity) && quantity.interval().isEmpty()
                    ? QuantityText.temperature(quantity)
                    : QuantityText.withInterval(quantity);
            return text + numbers.marks(quantity.cautions());
        }
        if (node instanceof Node.Scalar scalar) {
            return few(scalar.value()) ? Rounding.shortest(scalar.value()) : Rounding.significant(scalar.value(), 4);
        }
        if (node instanceof Node.Flag flag) {
            return flag.value() ? "yes" : "no";
        }
        return node instanceof Node.Text text ? text.value() : "";
    }

    /** Whether a number has so few digits that it was counted or chosen, not measured. */
    private static boolean few(double value) {
        if (!Double.isFinite(value)) {
            return false;
        }
        String shortest = Rounding.shortest(value);
        int digits = 0;
        for (int i = 0; i < shortest.length(); i++) {
            digits += Character.isDigit(shortest.charAt(i)) ? 1 : 0;
        }
        return digits <= 5;
    }

    private static boolean isTemperature(String key, Node.Quantity quantity) {
        String lower = key.toLowerCase(Locale.ROOT);
        return quantity.unit().equals("K") && !lower.contains("extrapolation") && !lower.contains("shift");
    }

    /** A key for people: {@code dH} is ΔH, {@code honestRange} is honest range. */
    public static String key(String key) {
        if (key.length() > 1 && key.charAt(0) == 'd' && Character.isUpperCase(key.charAt(1))) {
            return "Δ" + key.substring(1);
        }
        StringBuilder words = new StringBuilder(key.length() + 4);
        for (int i = 0; i < key.length(); i++) {
            char c = key.charAt(i);
            if (Character.isUpperCase(c) && i > 0 && Character.isLowerCase(key.charAt(i - 1))) {
                words.append(' ').append(Character.toLowerCase(c));
            } else {
                words.append(c);
            }
        }
        return words.toString();
    }

    /** A symbol of the barrier: {@code dH} is ΔH‡. */
    public static String activation(String symbol) {
        return switch (symbol) {
            case "dH", "dS", "dG", "dCp" -> "Δ" + symbol.substring(1) + "‡";
            default -> symbol;
        };
    }
}
