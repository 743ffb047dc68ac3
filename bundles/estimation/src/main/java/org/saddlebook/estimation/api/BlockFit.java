package org.saddlebook.estimation.api;

import java.util.function.Function;
import org.saddlebook.estimation.internal.BlockSolution;

/** A fit whose blocks scatter among themselves. Immutable; arrays are copies. */
public final class BlockFit implements BlockOutcome {
    private final BlockSolution solution;

    BlockFit(BlockSolution solution) {
        this.solution = solution;
    }

    @Override
    public <T> T fold(
            Function<? super BlockFit, ? extends T> fitted, Function<? super NotBlocked, ? extends T> refused) {
        return fitted.apply(this);
    }

    /** The estimates. */
    public double[] parameters() {
        return solution.parameters();
    }

    /** Their covariance, scaled, with both kinds of scatter. */
    public double[][] covariance() {
        return solution.covariance();
    }

    /** Variance of an observation of weight one inside its block. */
    public double withinVariance() {
        return solution.within();
    }

    /** Variance between blocks; 0 when the blocks scatter no more than their observations explain. */
    public double betweenVariance() {
        return solution.between();
    }

    /**
     * Effective degrees of freedom of a combination of the parameters, for Student's t: F. E. Satterthwaite, Biometrics Bull.
     * 2 (1946) 110, with the expected information of the two variances. A quantity that only blocks tell has about as many
     * as there are blocks, however often each was measured.
     *
     * @param row the combination
     */
    public double degreesOfFreedom(double[] row) {
        return solution.degreesOfFreedom(row);
    }

    /** Variance of a combination of the parameters. */
    public double predictionVariance(double[] row) {
        return solution.predictionVariance(row);
    }

    /** Observed minus fitted without the blocks, not weighted. */
    public double[] residuals() {
        return solution.residuals();
    }
}
