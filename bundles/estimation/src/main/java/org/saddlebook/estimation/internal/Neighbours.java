package org.saddlebook.estimation.internal;

/**
 * Residuals that are only just larger than the rounding of the response carry that rounding into their sum of squares.
 * Rounding differs between neighbouring parameters while the response itself is linear there, so its mean over neighbours,
 * moved back along the Jacobian, is several times quieter.
 */
final class Neighbours {
    /** Residuals above this share of the response have seven digits or more without help. */
    private static final double NOISY = 1e-8;

    private static final int COUNT = 16;
    private static final double STEP = 0x1p-51;

    private Neighbours() {}

    /** Residuals at a point, averaged where rounding would show. */
    static double[] residuals(NonlinearProblem problem, NonlinearProblem.Point point) {
        if (!(Math.sqrt(point.sumOfSquares) < NOISY * problem.responseNorm())) {
            return point.residuals;
        }
        double[] mean = point.residuals.clone();
        for (int k = 0; k < COUNT; k++) {
            double[] near = point.parameters.clone();
            for (int j = 0; j < near.length; j++) {
                // Signs from a Walsh pattern: balanced for each parameter and between parameters.
                near[j] *= (Integer.bitCount(k & (j + 1)) & 1) == 0 ? 1 + STEP : 1 - STEP;
            }
            NonlinearProblem.Point other = problem.at(problem.clip(near));
            if (!other.defined()) {
                return point.residuals;
            }
            for (int i = 0; i < mean.length; i++) {
                double change = 0;
                for (int j = 0; j < near.length; j++) {
                    change += point.jacobian[i][j] * (other.parameters[j] - point.parameters[j]);
                }
                mean[i] += other.residuals[i] + change;
            }
        }
        for (int i = 0; i < mean.length; i++) {
            mean[i] /= COUNT + 1;
        }
        return mean;
    }
}
