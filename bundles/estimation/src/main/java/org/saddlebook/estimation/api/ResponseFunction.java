package org.saddlebook.estimation.api;

import org.osgi.annotation.versioning.ConsumerType;

/**
 * A response that depends on parameters in any smooth way, with its exact derivatives. Called from one thread at a time by
 * one fit; must not keep the arrays.
 */
@ConsumerType
public interface ResponseFunction {
    /** Number of observations. */
    int observations();

    /** Number of parameters. */
    int parameterCount();

    /**
     * Computes the response of every observation and its derivatives.
     *
     * @param p the parameters; not to be changed
     * @param values receives one response per observation; NaN or infinite where the response is not defined for these
     *     parameters: the search then turns back
     * @param jacobian receives, in row i and column j, the derivative of response i with respect to parameter j
     */
    void evaluate(double[] p, double[] values, double[][] jacobian);
}
