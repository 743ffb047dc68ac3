package org.saddlebook.presentation.api;

/**
 * The unit a quantity is shown in: molar energies in kJ/mol, everything else in its own unit.
 *
 * @param ucum UCUM term of the unit shown
 * @param powerOfTen number shown = number in the file times 10 to this power
 */
public record DisplayUnit(String ucum, int powerOfTen) {
    /** The unit in which quantities of this unit are shown. */
    public static DisplayUnit of(String ucum) {
        return ucum.equals("J/mol") ? new DisplayUnit("kJ/mol", -3) : new DisplayUnit(ucum, 0);
    }

    /** The number shown; infinities and, for other units, every number stay as they are. */
    public double value(double value) {
        if (powerOfTen == 0 || !Double.isFinite(value)) {
            return value;
        }
        return Decimals.of(value).scaleByPowerOfTen(powerOfTen).doubleValue();
    }
}
