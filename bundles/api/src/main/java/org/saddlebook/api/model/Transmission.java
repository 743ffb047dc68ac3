package org.saddlebook.api.model;

import org.osgi.annotation.versioning.ConsumerType;

/**
 * A transmission coefficient that varies with temperature, {@code κ(T)}, with its exact derivative. Immutable and
 * thread-safe; the same temperature gives the same bits.
 */
@ConsumerType
public interface Transmission {
    /** What it was computed from. */
    Tunnelling stated();

    /** Whether the coefficient has a value at this temperature, K. */
    boolean defined(double kelvin);

    /** Why it has none where it is not defined, as a sentence. */
    String limit();

    /** ln κ at a temperature in K; NaN where it is not defined. */
    double lnCoefficient(double kelvin);

    /** d ln κ/dT at a temperature in K, 1/K; NaN where it is not defined. */
    double slope(double kelvin);
}
