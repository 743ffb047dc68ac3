package org.saddlebook.api.model;

import java.util.List;
import org.osgi.annotation.versioning.ConsumerType;

/** A rate model bound to a context: {@code ln k(T; p)} with its exact gradient. Immutable and thread-safe. */
@ConsumerType
public interface RateFunction {
    /** The free parameters, in the order of every parameter array. A parameter fixed in the context does not appear. */
    List<Parameter> parameters();

    /**
     * Whether ln k is linear in the parameters, beside a term of temperature alone: then the engine solves directly and
     * {@link #starts} is not called.
     */
    boolean linear();

    /**
     * ln of the SI value of k, k in (m3/mol)^(order-1)/s.
     *
     * @param kelvin temperature, K; positive
     * @param p parameters: SI values, or natural logarithms of them for LOG parameters
     * @param gradient receives d ln k / d p; same length as p
     * @return ln k; NaN where the law is not defined
     */
    double lnRate(double kelvin, double[] p, double[] gradient);

    /**
     * ln of the SI value of k under stated conditions. A law of temperature alone need not override it.
     *
     * @param kelvin temperature, K; positive
     * @param at the conditions of this value of k
     * @param p parameters: SI values, or natural logarithms of them for LOG parameters
     * @param gradient receives d ln k / d p; same length as p
     * @return ln k; NaN where the law is not defined
     */
    default double lnRate(double kelvin, Conditions at, double[] p, double[] gradient) {
        return lnRate(kelvin, p, gradient);
    }

    /** Whether the law has a value at this temperature with these parameters. */
    default boolean defined(double kelvin, double[] p) {
        return true;
    }

    /**
     * Starting values for a non-linear law, best first.
     *
     * @param kelvin temperatures, K
     * @param lnRate ln of the SI rate constants, same length
     */
    default List<double[]> starts(double[] kelvin, double[] lnRate) {
        return List.of();
    }

    /**
     * Starting values for a non-linear law that depends on conditions, best first. A law of temperature alone need not
     * override it.
     *
     * @param kelvin temperatures, K
     * @param at conditions of each value, same length
     * @param lnRate ln of the SI rate constants, same length
     */
    default List<double[]> starts(double[] kelvin, List<Conditions> at, double[] lnRate) {
        return starts(kelvin, lnRate);
    }

    /**
     * The same point of a law that is unchanged when some of its parameters change places, in the order in which the law
     * promises them; p itself, or a copy, when it is in order.
     *
     * @param p parameters in the form handed to the law
     */
    default double[] ordered(double[] p) {
        return p;
    }

    /**
     * What a reader of these estimates must know about the law itself, as sentences; none for most laws.
     *
     * @param p estimates in the form handed to the law
     */
    default List<String> remarks(double[] p) {
        return List.of();
    }

    /** Quantities that follow from the parameters at a temperature. */
    default List<Derived> derived() {
        return List.of();
    }
}
