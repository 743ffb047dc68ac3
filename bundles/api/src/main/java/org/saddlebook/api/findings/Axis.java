package org.saddlebook.api.findings;

import java.util.Objects;

/**
 * An axis of a figure.
 *
 * @param label what is plotted, for people
 * @param unit UCUM term; {@code "1"} for a pure number
 * @param scale how values are spaced
 */
public record Axis(String label, String unit, Scale scale) {
    /** How values are spaced along an axis. */
    public enum Scale {
        /** Evenly. */
        LINEAR,
        /** By their logarithm. */
        LOGARITHMIC,
        /** Kelvin, spaced as 1/T, labelled in kelvin and degrees Celsius. */
        RECIPROCAL_TEMPERATURE
    }

    /** Checks the components. */
    public Axis {
        Objects.requireNonNull(label, "label");
        Objects.requireNonNull(unit, "unit");
        Objects.requireNonNull(scale, "scale");
    }
}
