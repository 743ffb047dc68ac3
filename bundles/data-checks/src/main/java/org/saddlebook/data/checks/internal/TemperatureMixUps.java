package org.saddlebook.data.checks.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/** Temperatures read on the wrong scale, from the scales' own definitions. */
final class TemperatureMixUps {
    /** Beyond these a rate constant is hardly measured, K. */
    private static final double LOWEST = 50;

    private static final double HIGHEST = 4000;

    private TemperatureMixUps() {}

    /**
     * One wrong scale.
     *
     * @param read scale the numbers were taken for
     * @param meant scale they would really be on
     */
    record Scale(Unit read, Unit meant) {
        /** Stable identifier. */
        String id() {
            return "read-" + word(read) + "-meant-" + word(meant);
        }

        /** The right temperature, K, of one as read, K; NaN where none would be sensible. */
        double mend(double kelvin) {
            double right = meant.toSi(read.fromSi(kelvin));
            return right >= LOWEST && right <= HIGHEST ? right : Double.NaN;
        }

        /** What would have happened, to follow "as if". */
        String meaning() {
            return "the numbers read as " + shown(read) + " had been in " + shown(meant);
        }

        private static String word(Unit unit) {
            return unit.code().equals("K") ? "kelvin" : unit.code().equals("Cel") ? "celsius" : "fahrenheit";
        }

        private static String shown(Unit unit) {
            return unit.code().equals("K") ? "K" : unit.code().equals("Cel") ? "°C" : "°F";
        }
    }

    /** Every pair of two different scales out of kelvin, degrees Celsius and Fahrenheit. */
    static List<Scale> all() {
        try {
            Unit[] units = {Unit.KELVIN, Units.temperature("Cel"), Units.temperature("[degF]")};
            List<Scale> scales = new ArrayList<>();
            for (Unit read : units) {
                for (Unit meant : units) {
                    if (!read.equals(meant)) {
                        scales.add(new Scale(read, meant));
                    }
                }
            }
            return scales;
        } catch (UnitException impossible) {
            throw new IllegalStateException("scales of the units bundle itself", impossible);
        }
    }
}
