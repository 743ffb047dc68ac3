package org.saddlebook.estimation.api;

import java.util.Arrays;

/**
 * M-estimates by iteratively reweighted least squares, to stand beside the ordinary fit and never in its place. They limit
 * what a wild response can do, not what a wild abscissa can: a point of high leverage pulls the line to itself. Below about
 * eight points that is nearly every end point.
 *
 * <p>From the ordinary fit: residuals, their scale as median absolute value over 0.6745, weights from the loss, refit, until
 * the residuals rest (P. W. Holland and R. E. Welsch, Commun. Statist. A6 (1977) 813; W. N. Venables and B. D. Ripley, Modern
 * Applied Statistics with S (2002), 6.5, whose printed values stop at a relative change of 1e-4 within 20 iterations).
 */
public final class RobustRegression {
    private static final double NORMAL_MEDIAN = 0.6745;
    private static final double DEFAULT_TOLERANCE = 1e-12;
    private static final int DEFAULT_LIMIT = 1000;
    /** A scale below this share of the response is rounding. */
    private static final double ROUNDING = 1e-13;

    private RobustRegression() {}

    /**
     * Fits until nothing changes: to a relative change of the residuals of 1e-12, within 1000 iterations.
     *
     * @param design n rows of p numbers
     * @param response n numbers
     * @param weightsOrNull n weights as in {@link LinearLeastSquares#fit}; residuals are judged after multiplication by
     *     their roots
     * @param loss the loss
     * @return the fit, or why there is none
     * @throws IllegalArgumentException as {@link LinearLeastSquares#fit}
     */
    public static RobustOutcome fit(double[][] design, double[] response, double[] weightsOrNull, RobustLoss loss) {
        return fit(design, response, weightsOrNull, loss, DEFAULT_TOLERANCE, DEFAULT_LIMIT);
    }

    /**
     * Fits until the residuals change by less than a share of their length.
     *
     * @param design as above
     * @param response as above
     * @param weightsOrNull as above
     * @param loss as above
     * @param tolerance relative change of the residuals that ends the iteration, positive
     * @param limit iterations allowed, at least one
     * @return the fit, or why there is none
     */
    public static RobustOutcome fit(
            double[][] design,
            double[] response,
            double[] weightsOrNull,
            RobustLoss loss,
            double tolerance,
            int limit) {
        if (!(tolerance > 0) || limit < 1) {
            throw new IllegalArgumentException("tolerance " + tolerance + " and limit " + limit + " must be positive");
        }
        LinearOutcome first = LinearLeastSquares.fit(design, response, weightsOrNull);
        if (first instanceof RankDeficient deficient) {
            return new NotRobust(NotRobust.Kind.NOT_DETERMINED, deficient.reason());
        }
        LinearFit ordinary = (LinearFit) first;
        double[] roots = new double[response.length];
        double largest = 0;
        for (int i = 0; i < roots.length; i++) {
            roots[i] = weightsOrNull == null ? 1 : Math.sqrt(weightsOrNull[i]);
            largest = Math.max(largest, Math.abs(response[i]) * roots[i]);
        }
        LinearFit current = ordinary;
        double[] residuals = weighted(current, roots);
        double[] weights = new double[roots.length];
        for (int k = 1; k <= limit; k++) {
            double scale = scale(residuals, roots);
            if (!(scale > ROUNDING * largest)) {
                return new NotRobust(
                        NotRobust.Kind.NO_SCALE, "half of the residuals are zero to rounding: there is no scale");
            }
            for (int i = 0; i < weights.length; i++) {
                weights[i] = loss.weight(residuals[i] / scale) * roots[i] * roots[i];
            }
            LinearOutcome next = LinearLeastSquares.fit(design, response, weights);
            if (next instanceof RankDeficient deficient) {
                return new NotRobust(
                        NotRobust.Kind.NOT_DETERMINED, "of the points left any weight, " + deficient.reason());
            }
            current = (LinearFit) next;
            double[] before = residuals;
            residuals = weighted(current, roots);
            if (change(before, residuals) <= tolerance) {
                return finished(ordinary, current, residuals, roots, scale, loss, k);
            }
        }
        return new NotRobust(
                NotRobust.Kind.NOT_CONVERGED, "the weights were still changing after " + limit + " iterations");
    }

    private static double[] weighted(LinearFit fit, double[] roots) {
        double[] residuals = fit.residuals();
        for (int i = 0; i < residuals.length; i++) {
            residuals[i] *= roots[i];
        }
        return residuals;
    }

    private static double scale(double[] residuals, double[] roots) {
        double[] sizes = new double[residuals.length];
        int count = 0;
        for (int i = 0; i < sizes.length; i++) {
            if (roots[i] > 0) {
                sizes[count++] = Math.abs(residuals[i]);
            }
        }
        Arrays.sort(sizes, 0, count);
        int half = count / 2;
        double median = count % 2 == 1 ? sizes[half] : (sizes[half - 1] + sizes[half]) / 2;
        return median / NORMAL_MEDIAN;
    }

    private static double change(double[] before, double[] after) {
        double moved = 0;
        double length = 0;
        for (int i = 0; i < before.length; i++) {
            moved += (before[i] - after[i]) * (before[i] - after[i]);
            length += before[i] * before[i];
        }
        return Math.sqrt(moved / Math.max(1e-300, length));
    }

    private static RobustFit finished(
            LinearFit ordinary,
            LinearFit current,
            double[] residuals,
            double[] roots,
            double scale,
            RobustLoss loss,
            int iterations) {
        int n = ordinary.observations();
        int p = ordinary.parameterCount();
        double[] weights = new double[residuals.length];
        double squares = 0;
        double slopes = 0;
        double slopeSquares = 0;
        double[] plain = current.residuals();
        for (int i = 0; i < residuals.length; i++) {
            if (roots[i] > 0) {
                double u = residuals[i] / scale;
                weights[i] = loss.weight(u);
                double psi = weights[i] * residuals[i];
                squares += psi * psi;
                slopes += loss.slope(u);
            }
        }
        double mean = slopes / n;
        for (int i = 0; i < residuals.length; i++) {
            if (roots[i] > 0) {
                double rest = loss.slope(residuals[i] / scale) - mean;
                slopeSquares += rest * rest;
            }
        }
        double kappa = 1 + p * (slopeSquares / (n - 1)) / (n * mean * mean);
        double factor = squares / (n - p) * (kappa / mean) * (kappa / mean);
        double[][] covariance = ordinary.unscaledCovariance();
        for (double[] row : covariance) {
            for (int j = 0; j < p; j++) {
                row[j] *= factor;
            }
        }
        return new RobustFit(ordinary, current.parameters(), covariance, scale, plain, weights, iterations);
    }
}
