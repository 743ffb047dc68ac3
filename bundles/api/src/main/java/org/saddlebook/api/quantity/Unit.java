package org.saddlebook.api.quantity;

import java.util.Objects;

/**
 * A unit of measurement: its UCUM term and how it relates to SI. {@code SI value = value * factor + offset}.
 *
 * @param code the UCUM term, for example {@code L/(mol.s)}
 * @param dimension the dimension
 * @param factor SI units in one of this unit; positive and finite
 * @param offset SI value of zero in this unit; 0 except for temperatures such as {@code Cel}
 */
public record Unit(String code, Dimension dimension, double factor, double offset) {
    /** A pure number. */
    public static final Unit ONE = new Unit("1", Dimension.NONE, 1, 0);

    /** Kelvin. */
    public static final Unit KELVIN = new Unit("K", Dimension.TEMPERATURE, 1, 0);

    /** Joule per mole. */
    public static final Unit JOULE_PER_MOLE = new Unit("J/mol", Dimension.MOLAR_ENERGY, 1, 0);

    /** Joule per mole and kelvin. */
    public static final Unit JOULE_PER_MOLE_KELVIN = new Unit("J/(mol.K)", Dimension.MOLAR_ENTROPY, 1, 0);

    /** Checks the components. */
    public Unit {
        Objects.requireNonNull(code, "code");
        Objects.requireNonNull(dimension, "dimension");
        if (!(factor > 0) || Double.isInfinite(factor)) {
            throw new IllegalArgumentException("factor must be positive and finite: " + factor);
        }
        if (!Double.isFinite(offset)) {
            throw new IllegalArgumentException("offset must be finite: " + offset);
        }
    }

    /** The SI value of {@code value} in this unit. */
    public double toSi(double value) {
        return value * factor + offset;
    }

    /** The value in this unit of an SI value. */
    public double fromSi(double si) {
        return (si - offset) / factor;
    }
}
