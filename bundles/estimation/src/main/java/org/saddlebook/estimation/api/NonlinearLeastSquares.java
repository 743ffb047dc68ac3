package org.saddlebook.estimation.api;

import java.util.List;
import org.saddlebook.estimation.internal.Inputs;
import org.saddlebook.estimation.internal.NonlinearAttempt;
import org.saddlebook.estimation.internal.NonlinearProblem;
import org.saddlebook.estimation.internal.NonlinearSearch;

/**
 * Weighted non-linear least squares: the p that makes {@code sum w (y - f(p))^2} smallest.
 *
 * <p>Levenberg-Marquardt in a trust region scaled by the columns of the Jacobian (Marquardt 1963; Moré 1978), from every
 * start, each finished by a Gauss-Newton polish that goes on until rounding stops it, with second derivatives where the
 * residuals are so large that Gauss-Newton alone converges slowly (Björck 1996, 9.2). Depends on no unit: multiplying a
 * parameter or the response by a constant multiplies the estimate and changes nothing else but rounding.
 */
public final class NonlinearLeastSquares {
    private NonlinearLeastSquares() {}

    /**
     * Fits from each start and keeps the smallest residual sum of squares; of equal ones the earlier start's.
     *
     * @param function the response
     * @param response n observed values
     * @param weightsOrNull n weights multiplying the squared residuals, zero excludes the observation; null means all one
     * @param starts at least one set of starting parameters; those outside the bounds are moved onto them
     * @param options limits, bounds and the check for cancelling, whose exception passes through
     * @return the fit, the best that was met without converging, or where the data stopped determining the parameters
     * @throws IllegalArgumentException on NaN, infinite or over-large numbers, negative weights, and lengths that disagree
     */
    public static NonlinearOutcome fit(
            ResponseFunction function,
            double[] response,
            double[] weightsOrNull,
            List<double[]> starts,
            NonlinearOptions options) {
        int n = function.observations();
        int p = function.parameterCount();
        if (starts.isEmpty() || p < 1) {
            throw new IllegalArgumentException(
                    "a fit needs a start and a parameter; starts " + starts.size() + ", parameters " + p);
        }
        for (int s = 0; s < starts.size(); s++) {
            if (starts.get(s).length != p) {
                throw new IllegalArgumentException(
                        "start " + s + " has " + starts.get(s).length + " values for " + p + " parameters");
            }
            for (int j = 0; j < p; j++) {
                Inputs.requireNumber(starts.get(s)[j], "start " + s + " ", j);
            }
        }
        NonlinearProblem problem = new NonlinearProblem(
                function,
                Inputs.response(response, n),
                Inputs.weights(weightsOrNull, n),
                options.lower(p),
                options.upper(p),
                options.check());
        if (problem.active() < p) {
            return new NonlinearRankDeficient(
                    problem.active(),
                    problem.active() + " observations do not determine " + p + " parameters",
                    starts.get(0));
        }
        NonlinearAttempt best = null;
        int winner = 0;
        for (int s = 0; s < starts.size(); s++) {
            NonlinearAttempt attempt =
                    NonlinearSearch.from(problem, starts.get(s), options.maximumIterations(), options.thorough());
            if (best == null || attempt.betterThan(best)) {
                best = attempt;
                winner = s;
            }
        }
        return switch (best.end()) {
            case CONVERGED -> new NonlinearFit(best, winner);
            case DEFICIENT -> new NonlinearRankDeficient(best.rank(), best.reason(), best.parameters());
            case STALLED -> new NotConverged(best.reason(), best.parameters());
        };
    }
}
