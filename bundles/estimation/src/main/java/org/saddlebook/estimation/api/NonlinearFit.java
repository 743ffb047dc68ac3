package org.saddlebook.estimation.api;

import java.util.function.Function;
import org.saddlebook.estimation.internal.LinearSolution;
import org.saddlebook.estimation.internal.NonlinearAttempt;

/**
 * A non-linear least-squares fit. Covariance, leverages and condition number are those of the response linearised at the
 * estimate; a parameter held at a bound has neither variance nor covariance.
 */
public final class NonlinearFit implements NonlinearOutcome, Fit {
    private final NonlinearAttempt attempt;
    private final LinearSolution local;
    private final int winningStart;

    NonlinearFit(NonlinearAttempt attempt, int winningStart) {
        this.attempt = attempt;
        this.local = attempt.local();
        this.winningStart = winningStart;
    }

    @Override
    public <T> T fold(
            Function<? super NonlinearFit, ? extends T> fitted,
            Function<? super NotConverged, ? extends T> notConverged,
            Function<? super NonlinearRankDeficient, ? extends T> deficient) {
        return fitted.apply(this);
    }

    /** Iterations of the attempt that won, polish included. */
    public int iterations() {
        return attempt.iterations();
    }

    /** Index, in the list handed in, of the start that led to the smallest residual sum of squares. */
    public int winningStart() {
        return winningStart;
    }

    /** Which parameters are held at a bound. */
    public boolean[] atBound() {
        boolean[] held = new boolean[parameterCount()];
        java.util.Arrays.fill(held, true);
        for (int j : attempt.free()) {
            held[j] = false;
        }
        return held;
    }

    @Override
    public int observations() {
        return local.observations();
    }

    @Override
    public int parameterCount() {
        return attempt.parameters().length;
    }

    @Override
    public int degreesOfFreedom() {
        return observations() - parameterCount();
    }

    @Override
    public double[] parameters() {
        return attempt.parameters().clone();
    }

    @Override
    public double[][] unscaledCovariance() {
        int p = parameterCount();
        int[] free = attempt.free();
        double[][] inner = local.covariance();
        double[][] result = new double[p][p];
        for (int i = 0; i < free.length; i++) {
            for (int j = 0; j < free.length; j++) {
                result[free[i]][free[j]] = inner[i][j];
            }
        }
        return result;
    }

    @Override
    public double residualSumOfSquares() {
        return attempt.residualSumOfSquares();
    }

    @Override
    public double residualVariance() {
        if (degreesOfFreedom() == 0) {
            throw new IllegalStateException("no degree of freedom is left to estimate a variance");
        }
        return residualSumOfSquares() / degreesOfFreedom();
    }

    @Override
    public double[] residuals() {
        return attempt.residuals().clone();
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
        return local.predictionVariance(select(row));
    }

    @Override
    public double predictionCovariance(double[] row, double[] other) {
        return local.predictionCovariance(select(row), select(other));
    }

    private double[] select(double[] row) {
        int[] free = attempt.free();
        if (row.length != parameterCount()) {
            throw new IllegalArgumentException(
                    "a row of " + row.length + " numbers for " + parameterCount() + " parameters");
        }
        double[] result = new double[free.length];
        for (int j = 0; j < free.length; j++) {
            result[j] = row[free[j]];
        }
        return result;
    }
}
