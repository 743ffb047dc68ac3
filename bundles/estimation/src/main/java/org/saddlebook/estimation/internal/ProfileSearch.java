package org.saddlebook.estimation.internal;

import org.saddlebook.estimation.api.ProfileLimit;
import org.saddlebook.estimation.api.ResponseFunction;

/** Follows the profile of one parameter to one side until it crosses the limit. */
public final class ProfileSearch {
    private static final int LIGHT_STEPS = 25;
    private static final int REFINEMENTS = 60;
    private static final double ENOUGH = 1e-11;
    private static final double FLAT = 1e-13;
    /** Standard deviations after which a profile that has not crossed never will, as far as anyone can tell. */
    private static final double FAR = 1e9;
    /** A sum of squares smaller than the fit's by more than this share is another minimum. */
    private static final double BETTER = 1e-8;

    private final ResponseFunction function;
    private final double[] response;
    private final double[] weightsOrNull;
    private final double[] lower;
    private final double[] upper;
    private final Runnable check;
    private final int limit;

    private final double[] estimate;
    private final double smallest;
    private final double variance;
    private final double quantile;
    private final int parameter;

    // The two latest points of the path, from which the next one is guessed.
    private double[] nearer;
    private double[] farther;
    private double[] found;

    /** What the search needs to know of the problem: inputs checked, bounds, cancel check, iterations of a heavy refit. */
    @SuppressWarnings("ArrayRecordComponent") // internal carrier
    public record Problem(
            ResponseFunction function,
            double[] response,
            double[] weightsOrNull,
            double[] lower,
            double[] upper,
            Runnable check,
            int limit) {}

    /**
     * A search.
     *
     * @param problem the problem
     * @param estimate parameters of the fit
     * @param smallest its sum of squares
     * @param variance of an observation of weight one
     * @param parameter whose profile is followed
     * @param quantile in standard deviations
     */
    public ProfileSearch(
            Problem problem, double[] estimate, double smallest, double variance, int parameter, double quantile) {
        this.function = problem.function;
        this.response = problem.response;
        this.weightsOrNull = problem.weightsOrNull;
        this.lower = problem.lower;
        this.upper = problem.upper;
        this.check = problem.check;
        this.limit = problem.limit;
        this.estimate = estimate;
        this.smallest = smallest;
        this.variance = variance;
        this.parameter = parameter;
        this.quantile = quantile;
    }

    /**
     * The end on one side.
     *
     * @param direction 1 or -1
     * @param deviation standard deviation of the parameter, positive
     * @param slopes change of every parameter with this one along the linearised profile
     */
    public ProfileLimit end(int direction, double deviation, double[] slopes) {
        double edge = direction > 0 ? upper[parameter] - estimate[parameter] : estimate[parameter] - lower[parameter];
        nearer = estimate.clone();
        farther = estimate.clone();
        for (int j = 0; j < farther.length; j++) {
            farther[j] += direction * deviation * slopes[j];
        }
        double low = 0;
        double zLow = 0;
        double high = Double.NaN;
        double zHigh = Double.NaN;
        double barrier = Double.POSITIVE_INFINITY;
        double distance = Math.min(edge, quantile * deviation);
        for (int k = 0; ; k++) {
            double value = estimate[parameter] + direction * distance;
            if (value == estimate[parameter] + direction * low || k > REFINEMENTS + 40) {
                return barrier < Double.POSITIVE_INFINITY
                        ? new ProfileLimit.Open(value, "the response is not defined beyond")
                        : new ProfileLimit.Lost(value, "the profile has no digits left to follow");
            }
            double sum = smallestAt(value);
            if (Double.isNaN(sum)) {
                barrier = distance;
                distance = low + (barrier - low) / 2;
                continue;
            }
            if (sum < 0) {
                return new ProfileLimit.Lost(value, "the other parameters found no minimum there");
            }
            if (sum < smallest * (1 - BETTER) && smallest - sum > BETTER * variance) {
                return new ProfileLimit.Lost(
                        value, "a smaller sum of squares lies there: the fit is not at its minimum");
            }
            double z = Math.sqrt(Math.max(0, sum - smallest) / variance);
            farther = nearer;
            nearer = found;
            if (Math.abs(z - quantile) <= ENOUGH * quantile) {
                return new ProfileLimit.At(value);
            }
            if (z < quantile) {
                low = distance;
                zLow = z;
                if (distance == edge) {
                    return new ProfileLimit.Open(value, "the bound of the parameter is reached first");
                }
                if (distance > FAR * deviation) {
                    return new ProfileLimit.Open(
                            value, "the sum of squares stays below the limit however far it is followed");
                }
            } else {
                high = distance;
                zHigh = z;
            }
            double next;
            if (Double.isNaN(high)) {
                double reach = z > 0 ? distance * quantile / z : Double.POSITIVE_INFINITY;
                next = Math.max(1.05 * distance, Math.min(4 * distance, reach * 1.000001));
                next = barrier < Double.POSITIVE_INFINITY ? Math.min(next, low + (barrier - low) / 2) : next;
                next = Math.min(next, edge);
            } else {
                next = inside(low, zLow, high, zHigh, k);
                if (high - low <= 4 * Math.ulp(value)) {
                    return new ProfileLimit.At(value);
                }
            }
            distance = next;
        }
    }

    /** The crossing of the chord; the middle every third time, so that no end stays for ever. */
    private double inside(double low, double zLow, double high, double zHigh, int k) {
        double chord = low + (high - low) * (quantile - zLow) / (zHigh - zLow);
        boolean usable = chord > low && chord < high && k % 6 != 5;
        return usable ? chord : low + (high - low) / 2;
    }

    /** Best sum of squares with the parameter held; NaN where nothing is defined, -1 where no minimum was found. */
    private double smallestAt(double value) {
        double[] floor = lower.clone();
        double[] ceiling = upper.clone();
        floor[parameter] = value;
        ceiling[parameter] = value;
        NonlinearProblem problem = new NonlinearProblem(function, response, weightsOrNull, floor, ceiling, check);
        double[] start = guess(value);
        NonlinearProblem.Point point = problem.at(problem.clip(start));
        if (!point.defined()) {
            double[] plain = nearer.clone();
            plain[parameter] = value;
            point = problem.at(problem.clip(plain));
            if (!point.defined()) {
                return Double.NaN;
            }
        }
        NonlinearProblem.Point settled = light(problem, point);
        if (settled != null) {
            found = settled.parameters;
            return settled.sumOfSquares;
        }
        NonlinearAttempt attempt = NonlinearSearch.from(problem, point.parameters, limit, true);
        found = attempt.parameters();
        return attempt.end() == NonlinearAttempt.End.STALLED ? -1 : attempt.residualSumOfSquares();
    }

    private double[] guess(double value) {
        double[] start = nearer.clone();
        double span = farther[parameter] - nearer[parameter];
        if (span != 0) {
            double share = (value - nearer[parameter]) / span;
            for (int j = 0; j < start.length; j++) {
                start[j] += share * (farther[j] - nearer[j]);
            }
        }
        start[parameter] = value;
        return start;
    }

    /** Plain Gauss-Newton, which is all a good guess needs; null when it does not settle. */
    private NonlinearProblem.Point light(NonlinearProblem problem, NonlinearProblem.Point start) {
        NonlinearProblem.Point point = start;
        for (int k = 0; k < LIGHT_STEPS; k++) {
            check.run();
            int[] free = point.free();
            if (free.length == 0) {
                return point;
            }
            LinearSolution local = point.linearised(free);
            if (local.rank() < free.length) {
                return null;
            }
            double[] step = local.parameters();
            double[] next = point.parameters.clone();
            for (int j = 0; j < free.length; j++) {
                next[free[j]] += step[j];
            }
            double gain = point.sumOfSquares - local.residualSumOfSquares();
            if (gain <= FLAT * point.sumOfSquares) {
                return point;
            }
            NonlinearProblem.Point trial = problem.at(problem.clip(next));
            if (!trial.defined() || trial.sumOfSquares > point.sumOfSquares) {
                return gain <= 1e3 * FLAT * point.sumOfSquares ? point : null;
            }
            point = trial;
        }
        return null;
    }
}
