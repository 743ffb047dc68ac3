package org.saddlebook.estimation.api;

import org.saddlebook.estimation.internal.BlockSolution;

/**
 * Linear least squares with one random effect: observations of one block (stock, batch, day) share an error. The two variances
 * maximise the restricted likelihood (H. D. Patterson and R. Thompson, Biometrika 58 (1971) 545; D. A. Harville, J. Am. Stat.
 * Assoc. 72 (1977) 320), which for balanced blocks gives the estimates of the analysis of variance; the parameters are those
 * of generalised least squares.
 */
public final class BlockRegression {
    private BlockRegression() {}

    /**
     * Fits {@code y = X b + u(block) + e}.
     *
     * @param design n rows of p numbers
     * @param response n numbers
     * @param weightsOrNull n positive weights of the errors inside blocks, or null for all one
     * @param blocks n numbers, equal for observations of one block
     * @return the fit, or why the scatter cannot be parted
     * @throws IllegalArgumentException as {@link LinearLeastSquares#fit}, and on a weight of zero
     */
    public static BlockOutcome fit(double[][] design, double[] response, double[] weightsOrNull, int[] blocks) {
        if (blocks.length != response.length) {
            throw new IllegalArgumentException(blocks.length + " blocks for " + response.length + " observations");
        }
        LinearOutcome plain = LinearLeastSquares.fit(design, response, weightsOrNull);
        if (plain instanceof RankDeficient deficient) {
            return new NotBlocked(deficient.reason());
        }
        LinearFit ordinary = (LinearFit) plain;
        if (ordinary.observations() < response.length) {
            throw new IllegalArgumentException("a weight is zero; leave the observation out instead");
        }
        BlockSolution solution = new BlockSolution(design, response, weightsOrNull, blocks);
        String reason = solution.refusal();
        if (reason.isEmpty()) {
            reason = solution.search();
        }
        return reason.isEmpty() ? new BlockFit(solution) : new NotBlocked(reason);
    }
}
