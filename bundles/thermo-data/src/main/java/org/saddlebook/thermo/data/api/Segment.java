package org.saddlebook.thermo.data.api;

/**
 * The standard functions of one species over one range of temperatures. Values are given at every temperature above 0 K;
 * whether one outside the range may be used is for the caller to decide and to say.
 */
public sealed interface Segment permits PowerSegment, TableSegment {
    /** Lower end of validity, K. */
    double lowerKelvin();

    /** Upper end of validity, K. */
    double upperKelvin();

    /** Heat capacity at constant pressure, J/(mol K). */
    double heatCapacity(double kelvin);

    /** {@code ΔfH°(298.15 K) + H°(T) − H°(298.15 K)}, J/mol. */
    double enthalpy(double kelvin);

    /** {@code S°(T)}, J/(mol K). */
    double entropy(double kelvin);

    /** {@code H − T S}, J/mol. */
    default double gibbs(double kelvin) {
        return enthalpy(kelvin) - kelvin * entropy(kelvin);
    }

    /** Whether a temperature lies within the range, ends included. */
    default boolean contains(double kelvin) {
        return kelvin >= lowerKelvin() && kelvin <= upperKelvin();
    }
}
