package org.saddlebook.data.checks.api;

import java.util.Objects;
import org.saddlebook.api.quantity.Constants;

/**
 * One way of stating a rate constant wrongly.
 *
 * @param id stable identifier, for example {@code unit-per-min}
 * @param meaning what would have happened, to follow "as if": {@code k had been given in min⁻¹}
 * @param unit the unit the numbers would then really have; empty when the mix-up is not one of units
 * @param lnFactor ln of (right value / value as read)
 */
public record MixUp(String id, String meaning, String unit, double lnFactor) {
    /** Checks the components. */
    public MixUp {
        Objects.requireNonNull(id, "id");
        Objects.requireNonNull(meaning, "meaning");
        Objects.requireNonNull(unit, "unit");
        if (!(Math.abs(lnFactor) > 0 && Math.abs(lnFactor) < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException("a mix-up changes the value by a finite factor: " + lnFactor);
        }
    }

    /** How much mending it would add to the entropy of activation, J/(mol K): {@code R ln(right / read)}. */
    public double entropyShift() {
        return Constants.GAS * lnFactor;
    }
}
