package org.saddlebook.units.api;

import java.math.BigDecimal;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.units.internal.ExactConversion;

/**
 * Converts decimal numbers of one unit to SI, rounded once: the same amount stated in °C and K, or per second and per
 * minute, gives the same double. Immutable; make one per column.
 */
public final class Converter {
    private final ExactConversion conversion;

    private Converter(ExactConversion conversion) {
        this.conversion = conversion;
    }

    /** A converter for a unit; exact when the unit's code is one that {@link Units#parse} gives. */
    public static Converter of(Unit unit) {
        return new Converter(ExactConversion.of(unit));
    }

    /** The SI value of a value; infinite or 0 when it is beyond the range of double. */
    public double toSi(BigDecimal value) {
        return conversion.value(value);
    }

    /** The SI value of a difference, such as an uncertainty: the unit's offset plays no part. */
    public double differenceToSi(BigDecimal difference) {
        return conversion.difference(difference);
    }
}
