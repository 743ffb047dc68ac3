package org.saddlebook.api.model;

import java.util.Objects;

/**
 * The standard state that entropies and Gibbs energies refer to.
 *
 * @param kind concentration or pressure
 * @param value in mol/m3 or Pa; positive
 */
public record StandardState(Kind kind, double value) {
    /** What is held at its standard value. */
    public enum Kind {
        /** Amount concentration, mol/m3; does not vary with temperature. */
        CONCENTRATION,
        /** Pressure of an ideal gas, Pa. */
        PRESSURE
    }

    /** 1 mol/L. */
    public static final StandardState ONE_MOLAR = new StandardState(Kind.CONCENTRATION, 1000);

    /** 1 bar. */
    public static final StandardState ONE_BAR = new StandardState(Kind.PRESSURE, 1e5);

    /** Checks the components. */
    public StandardState {
        Objects.requireNonNull(kind, "kind");
        if (!(value > 0) || Double.isInfinite(value)) {
            throw new IllegalArgumentException("standard value must be positive and finite: " + value);
        }
    }
}
