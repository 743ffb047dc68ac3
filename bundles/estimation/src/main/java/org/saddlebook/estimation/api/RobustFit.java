package org.saddlebook.estimation.api;

import java.util.function.Function;

/** A robust fit and the ordinary one it stands beside. Immutable; arrays are copies. */
public final class RobustFit implements RobustOutcome {
    private final LinearFit ordinary;
    private final double[] parameters;
    private final double[][] covariance;
    private final double scale;
    private final double[] residuals;
    private final double[] weights;
    private final int iterations;

    RobustFit(
            LinearFit ordinary,
            double[] parameters,
            double[][] covariance,
            double scale,
            double[] residuals,
            double[] weights,
            int iterations) {
        this.ordinary = ordinary;
        this.parameters = parameters;
        this.covariance = covariance;
        this.scale = scale;
        this.residuals = residuals;
        this.weights = weights;
        this.iterations = iterations;
    }

    @Override
    public <T> T fold(
            Function<? super RobustFit, ? extends T> fitted, Function<? super NotRobust, ? extends T> refused) {
        return fitted.apply(this);
    }

    /** The ordinary least-squares fit of the same observations: the result; the robust one is there to compare. */
    public LinearFit ordinary() {
        return ordinary;
    }

    /** The robust estimates. */
    public double[] parameters() {
        return parameters.clone();
    }

    /**
     * Covariance of the estimates, scaled (P. J. Huber, Ann. Statist. 1 (1973) 799):
     * {@code (K / m)^2 sum (w r)^2 / (n - p) (X'X)^-1} with {@code K = 1 + p var(psi') / (n m^2)}, m the mean of psi'.
     */
    public double[][] covariance() {
        double[][] copy = new double[covariance.length][];
        for (int j = 0; j < copy.length; j++) {
            copy[j] = covariance[j].clone();
        }
        return copy;
    }

    /** Square roots of the diagonal of the covariance. */
    public double[] standardErrors() {
        double[] result = new double[parameters.length];
        for (int j = 0; j < result.length; j++) {
            result[j] = Math.sqrt(covariance[j][j]);
        }
        return result;
    }

    /** Robust standard deviation of an observation of weight one: median absolute residual over 0.6745. */
    public double scale() {
        return scale;
    }

    /** Observed minus fitted, not weighted, every row. */
    public double[] residuals() {
        return residuals.clone();
    }

    /** What the loss left of each observation's weight, 0 to 1; 0 for excluded rows. */
    public double[] robustWeights() {
        return weights.clone();
    }

    /** Repeated fits. */
    public int iterations() {
        return iterations;
    }
}
