package org.saddlebook.presentation.api;

import java.math.BigDecimal;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Node;

/**
 * Quantities in words. Molar energies are shown in kJ/mol, everything else in its own unit. A quantity that the data do
 * not determine is never given a tidy ±: it is "not determined", with the interval that shows why.
 */
public final class QuantityText {
    /** Caution id that marks a quantity as not determined by the data. */
    public static final String UNDETERMINED = "undetermined";

    private static final BigDecimal ZERO_CELSIUS = new BigDecimal("273.15");

    private QuantityText() {}

    /**
     * Value, uncertainty and unit: {@code 84.0 ± 1.4 kJ/mol}; {@code 1.370 × 10⁻³ ×/÷ 1.040 s⁻¹}; where there is no
     * uncertainty the value with six digits; where it is not determined
     * {@code not determined (95 %: −11.0 to 2.9 kJ/mol)}.
     */
    public static String of(Node.Quantity quantity) {
        if (isUndetermined(quantity)) {
            Optional<String> interval = interval(quantity);
            return interval.isEmpty() ? "not determined" : "not determined (" + interval.get() + ")";
        }
        DisplayUnit shown = DisplayUnit.of(quantity.unit());
        return UnitText.after(number(quantity, shown), shown.ucum());
    }

    /** {@link #of} followed by the interval where there is one: {@code 84.0 ± 1.4 kJ/mol (95 %: 79.5 to 88.5 kJ/mol)}. */
    public static String withInterval(Node.Quantity quantity) {
        Optional<String> interval = interval(quantity);
        if (interval.isEmpty() || isUndetermined(quantity)) {
            return of(quantity);
        }
        return of(quantity) + " (" + interval.get() + ")";
    }

    /**
     * The same for an absolute temperature in K, with degrees Celsius: {@code 353.0 ± 4.2 K (79.9 °C)}. Differences of
     * temperature go through {@link #of}.
     */
    public static String temperature(Node.Quantity quantity) {
        if (isUndetermined(quantity) || !quantity.unit().equals("K")) {
            return of(quantity);
        }
        double kelvin = quantity.value().getAsDouble();
        if (quantity.standardUncertainty().isEmpty()
                || !(quantity.standardUncertainty().getAsDouble() > 0)) {
            return temperature(kelvin);
        }
        int decimals = Math.min(
                2,
                Math.max(
                        0,
                        -Decimals.secondDigit(
                                Decimals.of(quantity.standardUncertainty().getAsDouble()))));
        return of(quantity) + " (" + celsius(kelvin, decimals) + ")";
    }

    /** A temperature, K, as {@code 313.15 K (40.00 °C)}. */
    public static String temperature(double kelvin) {
        return Rounding.decimals(kelvin, 2) + "\u00a0K (" + celsius(kelvin, 2) + ")";
    }

    /** A temperature, K, in degrees Celsius alone: {@code 40.00 °C}. */
    public static String celsius(double kelvin, int decimals) {
        return Decimals.text(Decimals.at(Decimals.of(kelvin).subtract(ZERO_CELSIUS), -decimals)) + "\u00a0°C";
    }

    /** The interval with its coverage: {@code 95 %: 79.5 to 88.5 kJ/mol}; empty when there is none. */
    public static Optional<String> interval(Node.Quantity quantity) {
        return quantity.interval()
                .map(interval -> Rounding.percent(interval.level()) + ": " + set(interval, quantity.unit()));
    }

    /**
     * A coverage set in words: {@code 340 to 371 K}, {@code at least 340 K}, {@code below 340 K or above 371 K},
     * {@code every value}, {@code no value}.
     *
     * @param ucum unit of the limits
     */
    public static String set(Interval interval, String ucum) {
        DisplayUnit shown = DisplayUnit.of(ucum);
        OptionalDouble low = interval.lower();
        OptionalDouble high = interval.upper();
        return switch (interval.kind()) {
            case BETWEEN ->
                UnitText.after(
                        Rounding.interval(shown.value(low.getAsDouble()), shown.value(high.getAsDouble())),
                        shown.ucum());
            case AT_LEAST -> "at least " + limit(low.getAsDouble(), shown);
            case AT_MOST -> "at most " + limit(high.getAsDouble(), shown);
            case OUTSIDE ->
                "below " + limit(low.getAsDouble(), shown) + " or above " + limit(high.getAsDouble(), shown);
            case EVERYTHING -> "every value";
            case NONE -> "no value";
        };
    }

    /** Whether the data leave the quantity open: it has no value, or carries the caution {@link #UNDETERMINED}. */
    public static boolean isUndetermined(Node.Quantity quantity) {
        return quantity.value().isEmpty() || quantity.cautions().contains(UNDETERMINED);
    }

    private static String limit(double value, DisplayUnit shown) {
        return UnitText.after(Rounding.limit(shown.value(value)), shown.ucum());
    }

    private static String number(Node.Quantity quantity, DisplayUnit shown) {
        double value = quantity.value().getAsDouble();
        if (!Double.isFinite(value)) {
            return value < 0 ? "−∞" : "∞";
        }
        double scaled = shown.value(value);
        OptionalDouble u = quantity.standardUncertainty();
        if (u.isPresent()) {
            // An infinite uncertainty says nothing with ±; the value stands alone and its interval tells.
            return Double.isFinite(u.getAsDouble())
                    ? Rounding.plusMinus(scaled, shown.value(u.getAsDouble()))
                    : Rounding.significant(scaled, 2);
        }
        OptionalDouble factor = quantity.standardFactor();
        if (factor.isPresent()) {
            return Double.isFinite(factor.getAsDouble())
                    ? Rounding.factor(scaled, factor.getAsDouble())
                    : Rounding.significant(scaled, 2);
        }
        return Rounding.significant(scaled, 6);
    }
}
