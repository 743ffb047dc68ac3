package org.saddlebook.window.internal;

import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.presentation.api.Rounding;
import org.saddlebook.presentation.api.UnitText;

/** Numbers in sentences. */
final class Words {
    private static final double MINUTE = 60;
    private static final double HOUR = 3600;
    private static final double DAY = 86_400;
    private static final double YEAR = 31_557_600;

    private Words() {}

    static String quantity(double value, Unit unit) {
        return Rounding.shortest(value) + " " + UnitText.forPeople(unit.code());
    }

    static String number(double value) {
        return Rounding.shortest(value);
    }

    static String percent(double fraction) {
        return Rounding.percent(fraction);
    }

    /** {@code 34.2 °C}. */
    static String celsius(double kelvin) {
        return Rounding.decimals(kelvin - Constants.ZERO_CELSIUS, 1) + " °C";
    }

    /** {@code 34.2 to 58.0 °C}. */
    static String celsius(double low, double high) {
        return Rounding.decimals(low - Constants.ZERO_CELSIUS, 1) + " to " + celsius(high);
    }

    /** The unit in which a time is best read. */
    static Unit timeUnit(double seconds) {
        if (!(seconds >= 2 * MINUTE)) {
            return new Unit("s", Reading.TIME, 1, 0);
        }
        if (seconds < 2 * HOUR) {
            return new Unit("min", Reading.TIME, MINUTE, 0);
        }
        if (seconds < 2 * DAY) {
            return new Unit("h", Reading.TIME, HOUR, 0);
        }
        return seconds < 2 * YEAR ? new Unit("d", Reading.TIME, DAY, 0) : new Unit("a", Reading.TIME, YEAR, 0);
    }
}
