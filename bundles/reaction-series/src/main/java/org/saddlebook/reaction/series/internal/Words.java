package org.saddlebook.reaction.series.internal;

import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Node;
import org.saddlebook.presentation.api.QuantityText;
import org.saddlebook.presentation.api.Rounding;

/** Pieces of sentences. */
final class Words {
    private Words() {}

    static String kelvin(double kelvin) {
        return QuantityText.temperature(kelvin);
    }

    static String quantity(Node.Quantity quantity) {
        return QuantityText.withInterval(quantity);
    }

    static String freedom(long degrees) {
        return degrees + (degrees == 1 ? " degree of freedom" : " degrees of freedom");
    }

    static String probability(double p) {
        return "p " + (p < 0.0001 ? "below 0.0001" : "= " + Rounding.probability(p));
    }

    /** A set of temperatures in words, by its kind. */
    static String temperatures(Interval set) {
        String level = Rounding.percent(set.level()) + ": ";
        return switch (set.kind()) {
            case BETWEEN ->
                level + limits(set.lower().getAsDouble(), set.upper().getAsDouble()) + " K, bounded";
            case AT_LEAST ->
                level + "any temperature from " + Rounding.limit(set.lower().getAsDouble()) + " K upward, unbounded";
            case AT_MOST ->
                level + "any temperature up to " + Rounding.limit(set.upper().getAsDouble()) + " K, unbounded downward";
            case OUTSIDE ->
                level + "any temperature up to " + Rounding.limit(set.lower().getAsDouble()) + " K or from "
                        + Rounding.limit(set.upper().getAsDouble()) + " K, unbounded";
            case EVERYTHING -> "not determined: the data exclude no temperature";
            case NONE -> "none above 0 K";
        };
    }

    private static String limits(double lower, double upper) {
        return Rounding.interval(lower, upper);
    }
}
