package org.saddlebook.estimation.api;

import org.osgi.annotation.versioning.ProviderType;

/**
 * What every least-squares fit answers, linear or not. Immutable and thread-safe; arrays are copies.
 *
 * <p>Covariances are <em>unscaled</em>: {@code (X'WX)^-1}, where X is the design (the Jacobian of a non-linear response
 * at the estimate). Multiply by {@link #residualVariance()} when the weights are known only up to a factor; use as it is
 * when each weight is one over a stated variance.
 */
@ProviderType
public interface Fit {
    /** Observations that took part: those with a weight above zero. */
    int observations();

    /** Number of parameters. */
    int parameterCount();

    /** {@code observations() - parameterCount()}; zero when the fit passes through every point. */
    int degreesOfFreedom();

    /** The estimates. */
    double[] parameters();

    /** {@code (X'WX)^-1}, symmetric, in the order of the parameters. */
    double[][] unscaledCovariance();

    /** Sum over observations of weight times squared residual; chi-squared when weights are one over stated variances. */
    double residualSumOfSquares();

    /**
     * {@code residualSumOfSquares() / degreesOfFreedom()}: the variance of an observation of weight one.
     *
     * @throws IllegalStateException when no degree of freedom is left
     */
    double residualVariance();

    /** Observed minus fitted, not weighted, one for each row handed in (excluded ones too). */
    double[] residuals();

    /** Diagonal of the weighted hat matrix, each in [0, 1], sum {@link #parameterCount()}; zero for excluded rows. */
    double[] leverages();

    /** 2-norm condition number of the weighted design after its columns are scaled to unit length; at least one. */
    double conditionNumber();

    /**
     * {@code g' (X'WX)^-1 g}: the unscaled variance of the linear combination {@code g' b}, by a triangular solve and
     * never through the explicit covariance, so that nearly cancelling combinations keep their digits.
     *
     * @param row the combination g, one number for each parameter
     */
    double predictionVariance(double[] row);

    /**
     * {@code g' (X'WX)^-1 h}: the unscaled covariance of two linear combinations of the parameters.
     *
     * @param row the combination g, one number for each parameter
     * @param other the combination h, one number for each parameter
     */
    double predictionCovariance(double[] row, double[] other);
}
