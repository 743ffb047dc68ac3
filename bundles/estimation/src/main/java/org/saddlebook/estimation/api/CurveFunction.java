package org.saddlebook.estimation.api;

import org.osgi.annotation.versioning.ConsumerType;

/** A smooth curve y = f(x; p) with its derivatives. Must be a pure function; called from one thread at a time by one fit. */
@ConsumerType
public interface CurveFunction {
    /** Number of parameters p. */
    int parameterCount();

    /**
     * The value and its derivatives.
     *
     * @param x abscissa
     * @param parameters p numbers; not to be changed
     * @param gradient receives p + 1 numbers: the derivative with respect to each parameter, then the one with respect to x
     * @return f(x; p); NaN or infinite where it is not defined: the search then turns back
     */
    double value(double x, double[] parameters, double[] gradient);
}
