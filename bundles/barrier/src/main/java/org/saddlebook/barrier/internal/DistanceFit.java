package org.saddlebook.barrier.internal;

import org.saddlebook.estimation.api.Fit;
import org.saddlebook.estimation.api.OrthogonalFit;

/**
 * A fit with errors in both variables as the other fits are read: its residuals are the distances in the response from the
 * curve at the temperatures as measured, and belong to the weights {@link #weights()}, in which the errors of both are.
 */
final class DistanceFit implements Fit {
    private final OrthogonalFit fit;
    private final double[] residuals;

    DistanceFit(OrthogonalFit fit, double[] residuals) {
        this.fit = fit;
        this.residuals = residuals;
    }

    /** One over the variance of each residual. */
    double[] weights() {
        return fit.effectiveWeights();
    }

    @Override
    public int observations() {
        return fit.observations();
    }

    @Override
    public int parameterCount() {
        return fit.parameterCount();
    }

    @Override
    public int degreesOfFreedom() {
        return fit.degreesOfFreedom();
    }

    @Override
    public double[] parameters() {
        return fit.parameters();
    }

    @Override
    public double[][] unscaledCovariance() {
        return fit.unscaledCovariance();
    }

    @Override
    public double residualSumOfSquares() {
        return fit.residualSumOfSquares();
    }

    @Override
    public double residualVariance() {
        return fit.residualVariance();
    }

    @Override
    public double[] residuals() {
        return residuals.clone();
    }

    @Override
    public double[] leverages() {
        return fit.leverages();
    }

    @Override
    public double conditionNumber() {
        return fit.conditionNumber();
    }

    @Override
    public double predictionVariance(double[] row) {
        return fit.predictionVariance(row);
    }

    @Override
    public double predictionCovariance(double[] row, double[] other) {
        return fit.predictionCovariance(row, other);
    }
}
