package org.saddlebook.api.quantity;

/**
 * Physical constants. All are exact in the SI of 2019.
 *
 * <p>Source: BIPM, The International System of Units (SI Brochure), 9th edition, 2019.
 */
public final class Constants {
    /** Boltzmann constant, J/K, exact. */
    public static final double BOLTZMANN = 1.380649e-23;

    /** Planck constant, J s, exact. */
    public static final double PLANCK = 6.62607015e-34;

    /** Avogadro constant, 1/mol, exact. */
    public static final double AVOGADRO = 6.02214076e23;

    /** Molar gas constant, J/(mol K): the exact product of the Boltzmann and Avogadro constants. */
    public static final double GAS = 8.31446261815324;

    /** ln of (k_B/h in 1/(K s)): the exact ratio, rounded to double. */
    public static final double LN_BOLTZMANN_OVER_PLANCK = 23.759977810504218;

    /** Thermochemical calorie, J, exact by definition. */
    public static final double CALORIE = 4.184;

    /** 0 degrees Celsius in kelvin, exact by definition. */
    public static final double ZERO_CELSIUS = 273.15;

    /** The reference temperature of thermodynamic tables, K (common practice). */
    public static final double REFERENCE_KELVIN = 298.15;

    private Constants() {}
}
