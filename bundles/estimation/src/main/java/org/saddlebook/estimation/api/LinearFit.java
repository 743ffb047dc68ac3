package org.saddlebook.estimation.api;

import java.util.function.Function;
import org.saddlebook.estimation.internal.LinearSolution;

/** A linear least-squares fit. Made by {@link LinearLeastSquares}. */
public final class LinearFit implements LinearOutcome, Fit {
    private final LinearSolution solution;

    LinearFit(LinearSolution solution) {
        this.solution = solution;
    }

    @Override
    public <T> T fold(
            Function<? super LinearFit, ? extends T> fitted, Function<? super RankDeficient, ? extends T> deficient) {
        return fitted.apply(this);
    }

    @Override
    public int observations() {
        return solution.observations();
    }

    @Override
    public int parameterCount() {
        return solution.parameterCount();
    }

    @Override
    public int degreesOfFreedom() {
        return solution.degreesOfFreedom();
    }

    @Override
    public double[] parameters() {
        return solution.parameters();
    }

    @Override
    public double[][] unscaledCovariance() {
        return solution.covariance();
    }

    @Override
    public double residualSumOfSquares() {
        return solution.residualSumOfSquares();
    }

    @Override
    public double residualVariance() {
        return solution.residualVariance();
    }

    @Override
    public double[] residuals() {
        return solution.residuals();
    }

    @Override
    public double[] leverages() {
        return solution.leverages();
    }

    @Override
    public double conditionNumber() {
        return solution.conditionNumber();
    }

    @Override
    public double predictionVariance(double[] row) {
        return solution.predictionVariance(row);
    }

    @Override
    public double predictionCovariance(double[] row, double[] other) {
        return solution.predictionCovariance(row, other);
    }
}
