package org.saddlebook.estimation.internal;

/**
 * Levenberg-Marquardt as a trust region: J. J. Moré, The Levenberg-Marquardt algorithm, in Lecture Notes in Mathematics
 * 630 (1978), 105. Each step is the shortest that reaches the linear prediction inside the region {@code |D d| <= radius},
 * D the largest column norms of the Jacobian met so far; the parameter is found on the singular values of the scaled
 * triangular factor.
 */
final class TrustRegion {
    private static final double SUFFICIENT = 1e-4;
    private static final double FLAT = 1e-14;
    private static final double SHORT = 1e-14;
    private static final double TENTH = 0.1;
    private static final double HALF = 0.5;

    private final NonlinearProblem problem;
    private final double[] scale;
    private NonlinearProblem.Point point;
    private int iterations;
    private String complaint = "";

    TrustRegion(NonlinearProblem problem, NonlinearProblem.Point start) {
        this.problem = problem;
        this.point = start;
        this.scale = new double[problem.columns];
    }

    NonlinearProblem.Point point() {
        return point;
    }

    int iterations() {
        return iterations;
    }

    /** Why it gave up; empty when it came to rest. */
    String complaint() {
        return complaint;
    }

    /**
     * Descends until nothing improves.
     *
     * @param firstStep length of the first region as a multiple of the scaled length of the start
     * @param limit iterations allowed
     */
    void descend(double firstStep, int limit) {
        double radius = -1;
        while (iterations < limit) {
            iterations++;
            problem.check.run();
            int[] free = point.free();
            if (free.length == 0 || point.sumOfSquares == 0) {
                return;
            }
            rescale();
            if (radius < 0) {
                double length = scaledLength(point.parameters);
                radius = firstStep * (length > 0 ? length : Math.sqrt(point.sumOfSquares));
            }
            TrustStep step = new TrustStep(problem, point, free, scale);
            radius = iterate(step, free, radius, iterations == 1);
            if (!(radius > 0)) {
                return;
            }
        }
        complaint = "still improving after " + limit + " iterations";
    }

    /** One accepted step, shrinking the region as often as needed. Returns the next radius, or -1 at rest. */
    private double iterate(TrustStep step, int[] free, double radius, boolean first) {
        double region = radius;
        while (true) {
            double[] move = step.within(region);
            double[] next = point.parameters.clone();
            for (int j = 0; j < free.length; j++) {
                next[free[j]] += move[j];
            }
            problem.clip(next);
            double length = 0;
            boolean moved = false;
            for (int j = 0; j < free.length; j++) {
                move[j] = next[free[j]] - point.parameters[free[j]];
                moved |= move[j] != 0;
                double scaled = move[j] * scale[free[j]];
                length += scaled * scaled;
            }
            length = Math.sqrt(length);
            if (!moved) {
                return -1;
            }
            if (first) {
                region = Math.min(region, length);
            }
            double predicted = step.predictedShare(move);
            NonlinearProblem.Point trial = problem.at(next);
            if (!trial.defined()) {
                region = 0.25 * Math.min(region, length);
                if (region <= SHORT * scaledLength(point.parameters)) {
                    complaint = "the response stops being defined next to the best parameters met";
                    return -1;
                }
                continue;
            }
            double actual = 1 - trial.sumOfSquares / point.sumOfSquares;
            double ratio = predicted > 0 ? actual / predicted : 0;
            if (ratio <= 0.25) {
                double shrink = actual >= 0 ? HALF : HALF * predicted / (predicted - HALF * actual);
                region = Math.max(TENTH, Math.min(HALF, shrink)) * Math.min(region, length / TENTH);
            } else if (ratio >= 0.75 || !step.restricted()) {
                region = 2 * length;
            }
            boolean flat = Math.abs(actual) <= FLAT && predicted <= FLAT && ratio <= 2;
            boolean small = region <= SHORT * scaledLength(next);
            if (ratio >= SUFFICIENT) {
                point = trial;
                return flat || small ? -1 : region;
            }
            if (flat || small) {
                return -1;
            }
        }
    }

    private void rescale() {
        for (int j = 0; j < problem.columns; j++) {
            double sum = 0;
            for (int i = 0; i < problem.rows; i++) {
                double weight = problem.weight(i);
                if (weight > 0) {
                    sum += weight * point.jacobian[i][j] * point.jacobian[i][j];
                }
            }
            scale[j] = Math.max(scale[j], Math.sqrt(sum));
        }
    }

    private double scaledLength(double[] parameters) {
        double sum = 0;
        for (int j = 0; j < parameters.length; j++) {
            double scaled = parameters[j] * scale[j];
            sum += scaled * scaled;
        }
        return Math.sqrt(sum);
    }
}
