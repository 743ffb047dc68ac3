package org.saddlebook.api.quantity;

/**
 * Exponents of the SI base dimensions that kinetics and thermodynamics need. Counted entities (molecules) are amounts of
 * substance: their unit carries the factor 1/N_A.
 *
 * @param mass exponent of mass (kg)
 * @param length exponent of length (m)
 * @param time exponent of time (s)
 * @param temperature exponent of thermodynamic temperature (K)
 * @param amount exponent of amount of substance (mol)
 */
public record Dimension(double mass, double length, double time, double temperature, double amount) {
    /** The dimension of a pure number. */
    public static final Dimension NONE = new Dimension(0, 0, 0, 0, 0);

    /** Thermodynamic temperature. */
    public static final Dimension TEMPERATURE = new Dimension(0, 0, 0, 1, 0);

    /** Molar energy, J/mol. */
    public static final Dimension MOLAR_ENERGY = new Dimension(1, 2, -2, 0, -1);

    /** Molar entropy or heat capacity, J/(mol K). */
    public static final Dimension MOLAR_ENTROPY = new Dimension(1, 2, -2, -1, -1);

    /** Amount concentration, mol/m3. */
    public static final Dimension CONCENTRATION = new Dimension(0, -3, 0, 0, 1);

    /** Pressure, Pa. */
    public static final Dimension PRESSURE = new Dimension(1, -1, -2, 0, 0);

    /** The dimension of a rate constant of the given overall order: concentration^(1 - order) per time. */
    public static Dimension rateConstant(double order) {
        return CONCENTRATION.power(1 - order).times(new Dimension(0, 0, -1, 0, 0));
    }

    /** The product of two dimensions. */
    public Dimension times(Dimension other) {
        return new Dimension(
                mass + other.mass,
                length + other.length,
                time + other.time,
                temperature + other.temperature,
                amount + other.amount);
    }

    /** This dimension raised to a power. */
    public Dimension power(double exponent) {
        // Adding 0.0 turns a negative zero into zero, so that equal dimensions are equal records.
        return new Dimension(
                mass * exponent + 0.0,
                length * exponent + 0.0,
                time * exponent + 0.0,
                temperature * exponent + 0.0,
                amount * exponent + 0.0);
    }

    /** Written out, because the equality of records is set up at run time, which costs at every start. */
    @Override
    public boolean equals(Object object) {
        return object instanceof Dimension other
                && Double.compare(mass, other.mass) == 0
                && Double.compare(length, other.length) == 0
                && Double.compare(time, other.time) == 0
                && Double.compare(temperature, other.temperature) == 0
                && Double.compare(amount, other.amount) == 0;
    }

    @Override
    public int hashCode() {
        int hash = Double.hashCode(mass);
        hash = 31 * hash + Double.hashCode(length);
        hash = 31 * hash + Double.hashCode(time);
        hash = 31 * hash + Double.hashCode(temperature);
        return 31 * hash + Double.hashCode(amount);
    }
}
