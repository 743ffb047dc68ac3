package org.saddlebook.units.api;

import java.util.List;
import java.util.OptionalDouble;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.units.internal.Dimensions;
import org.saddlebook.units.internal.QuantityReading;
import org.saddlebook.units.internal.RateOrders;
import org.saddlebook.units.internal.UnitReading;

/**
 * Reads units and quantities. Pure functions; nothing is guessed: what cannot be read in one way only is refused.
 *
 * <p>Units are understood as terms of the Unified Code for Units of Measure (UCUM 2.2, ucum.org) and in the spellings of
 * papers and notebooks: {@code L/(mol.s)}, {@code L mol-1 s-1}, {@code dm³·mol⁻¹·s⁻¹}, {@code M^-1 s^-1}, {@code
 * cm3 molecule-1 s-1}. Upper and lower case differ.
 */
public final class Units {
    private Units() {}

    /**
     * A unit. Its code is the normalised term: factors with positive exponents joined by a point, then a solidus and
     * the denominator, in parentheses when it has several factors, always in the same order; the user's own units are
     * kept ({@code min-1} gives {@code 1/min}), but {@code M} becomes {@code mol/L} and {@code dm3} becomes {@code L}.
     * Its factor is the exact value, rounded once.
     *
     * @throws UnitException with code {@code missing-unit}, {@code unknown-unit}, {@code ambiguous-unit} or {@code
     *     unit-syntax}
     */
    public static Unit parse(String text) throws UnitException {
        return UnitReading.unit(text);
    }

    /**
     * A unit of one dimension.
     *
     * @param example unit to name in the remedy, for example {@code kJ/mol}
     * @throws UnitException as {@link #parse(String)}, and {@code wrong-dimension}
     */
    public static Unit parse(String text, Dimension dimension, String example) throws UnitException {
        return UnitReading.unit(text, dimension, example);
    }

    /**
     * A unit of temperature; here {@code C} and {@code F} are degrees too.
     *
     * @throws UnitException as {@link #parse(String)}, and {@code wrong-dimension}
     */
    public static Unit temperature(String text) throws UnitException {
        return UnitReading.temperature(text);
    }

    /**
     * A unit of a rate constant of any order.
     *
     * @throws UnitException as {@link #parse(String)}, {@code wrong-dimension}, and {@code pressure-rate-constant} for
     *     one stated per pressure
     */
    public static Unit rateConstant(String text) throws UnitException {
        return UnitReading.rateConstant(text);
    }

    /**
     * The overall order of a rate constant with this unit: the order {@code m} for which the dimension is that of
     * concentration^(1 - m) per time, {@code m >= 0}; absent for any other dimension.
     */
    public static OptionalDouble rateOrder(Unit unit) {
        return RateOrders.order(unit.dimension());
    }

    /** What a dimension is, in words, for example "molar energy"; a product of SI base units when it has no name. */
    public static String name(Dimension dimension) {
        return Dimensions.name(dimension);
    }

    /**
     * A temperature in kelvin, from {@code 298.15K}, {@code 25degC}, {@code 25 °C} or {@code 77degF}.
     *
     * @throws UnitException when the number or its unit is missing or wrong, or with code {@code below-absolute-zero}
     *     when it is at or below 0 K
     */
    public static double kelvin(String text) throws UnitException {
        return QuantityReading.kelvin(text);
    }

    /**
     * A standard state, from {@code 1 mol/L}, {@code 1 M}, {@code 1 mol/m3}, {@code 1bar}, {@code 1 atm} or {@code
     * 101325 Pa}.
     *
     * @throws UnitException when it is neither a concentration nor a pressure above zero
     */
    public static StandardState standardState(String text) throws UnitException {
        return QuantityReading.standardState(text);
    }

    /**
     * A standard state as text: {@code 1 mol/L}, {@code 1 bar}, {@code 1 atm}. The digits are the same on every Java
     * version, and {@link #standardState} reads them back.
     */
    public static String text(StandardState standard) {
        return QuantityReading.text(standard);
    }

    /**
     * A value with its unit and, when stated, its standard uncertainty: {@code -45.1 kJ/mol}, {@code -45.1 ± 1.2
     * kJ/mol}, {@code -45.1 +- 1.2 kJ/mol}, {@code -45.1 u 1.2 kJ/mol}, {@code (-45.1 ± 1.2) kJ/mol}, {@code -45.1(12)
     * kJ/mol} (uncertainty in units of the last digit, JCGM 100:2008, 7.2.2).
     *
     * @throws UnitException when the number, the uncertainty or the unit is missing or wrong
     */
    public static Measured measured(String text) throws UnitException {
        return QuantityReading.measured(text);
    }

    /** Every unit symbol that is understood, in a fixed order. */
    public static List<ListedUnit> list() {
        return UnitReading.list();
    }
}
