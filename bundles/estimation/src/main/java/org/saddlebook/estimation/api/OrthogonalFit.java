package org.saddlebook.estimation.api;

import java.util.function.Function;
import org.saddlebook.estimation.internal.LinearSolution;
import org.saddlebook.estimation.internal.OrthogonalSolution;

/**
 * A fit with errors in both variables. {@link #residualSumOfSquares()} is chi-squared, {@link #unscaledCovariance()} the
 * covariance when the uncertainties are stated; multiply by {@link #residualVariance()} when they are known only up to a
 * factor. Covariance, leverages and condition number are those of the curve linearised at the adjusted points, each with the
 * weight {@code 1 / (uy^2 - 2 f' r ux uy + f'^2 ux^2)}.
 */
public final class OrthogonalFit implements OrthogonalOutcome, Fit {
    private final OrthogonalSolution solution;
    private final LinearSolution local;

    OrthogonalFit(OrthogonalSolution solution) {
        this.solution = solution;
        this.local = solution.local();
    }

    @Override
    public <T> T fold(
            Function<? super OrthogonalFit, ? extends T> fitted, Function<? super NotOrthogonal, ? extends T> refused) {
        return fitted.apply(this);
    }

    /** Abscissae of the points of the curve that belong to the observations (York's "adjusted points"). */
    public double[] adjustedAbscissae() {
        return solution.adjusted().clone();
    }

    /** Observed minus adjusted abscissae. */
    public double[] abscissaResiduals() {
        return solution.abscissaResiduals().clone();
    }

    /** Weight of each point at the estimate, one over the variance of its distance in y from the curve. */
    public double[] effectiveWeights() {
        return solution.weights().clone();
    }

    @Override
    public int observations() {
        return local.observations();
    }

    @Override
    public int parameterCount() {
        return local.parameterCount();
    }

    @Override
    public int degreesOfFreedom() {
        return local.degreesOfFreedom();
    }

    @Override
    public double[] parameters() {
        return solution.parameters().clone();
    }

    @Override
    public double[][] unscaledCovariance() {
        return local.covariance();
    }

    @Override
    public double residualSumOfSquares() {
        return solution.chiSquared();
    }

    @Override
    public double residualVariance() {
        if (degreesOfFreedom() == 0) {
            throw new IllegalStateException("no degree of freedom is left to estimate a variance");
        }
        return residualSumOfSquares() / degreesOfFreedom();
    }

    /** Observed ordinate minus that of the adjusted point, not weighted. */
    @Override
    public double[] residuals() {
        return solution.ordinateResiduals().clone();
    }

    @Override
    public double[] leverages() {
        return local.leverages();
    }

    @Override
    public double conditionNumber() {
        return local.conditionNumber();
    }

    @Override
    public double predictionVariance(double[] row) {
        return local.predictionVariance(row);
    }

    @Override
    public double predictionCovariance(double[] row, double[] other) {
        return local.predictionCovariance(row, other);
    }
}
