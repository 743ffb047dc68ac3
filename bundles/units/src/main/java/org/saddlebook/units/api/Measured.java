package org.saddlebook.units.api;

import java.util.Objects;
import java.util.OptionalDouble;
import org.saddlebook.api.quantity.Unit;

/**
 * A stated value with its unit, as a person wrote it.
 *
 * @param value in {@code unit}; finite
 * @param uncertainty standard uncertainty in {@code unit}, positive and finite; absent when none is stated
 * @param unit the stated unit
 */
public record Measured(double value, OptionalDouble uncertainty, Unit unit) {
    /** Checks the components. */
    public Measured {
        if (!Double.isFinite(value)) {
            throw new IllegalArgumentException("value must be finite: " + value);
        }
        if (uncertainty.isPresent()
                && (!(uncertainty.getAsDouble() > 0) || Double.isInfinite(uncertainty.getAsDouble()))) {
            throw new IllegalArgumentException("uncertainty must be positive and finite: " + uncertainty.getAsDouble());
        }
        Objects.requireNonNull(unit, "unit");
    }

    /** The value in SI. */
    public double si() {
        return unit.toSi(value);
    }

    /** The standard uncertainty in SI: a difference, so a unit's offset plays no part. */
    public OptionalDouble uncertaintySi() {
        return uncertainty.isPresent() ? OptionalDouble.of(uncertainty.getAsDouble() * unit.factor()) : uncertainty;
    }
}
