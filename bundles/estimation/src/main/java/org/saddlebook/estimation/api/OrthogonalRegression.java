package org.saddlebook.estimation.api;

import java.util.List;
import org.saddlebook.estimation.internal.Inputs;
import org.saddlebook.estimation.internal.NonlinearAttempt;
import org.saddlebook.estimation.internal.OrthogonalProblem;
import org.saddlebook.estimation.internal.OrthogonalSolution;
import org.saddlebook.estimation.internal.YorkIteration;

/**
 * Least squares with errors in both variables: parameters and points on the curve that make
 * {@code sum (dx, dy) V^-1 (dx, dy)'} smallest, V the covariance of the two errors of a point.
 *
 * <p>The sum is smallest at maximum likelihood for normal errors. The points on the curve are nuisance parameters, one for
 * each observation, which makes the Jacobian a block arrow (P. T. Boggs and J. E. Rogers, Contemp. Math. 112 (1990) 183).
 * Here each is eliminated exactly: it depends on its own observation only, and at its best place the weighted distance
 * {@code r = (y - f - f' (x - xi)) / sqrt(uy^2 - 2 f' r ux uy + f'^2 ux^2)} has derivative {@code -df/dp} over the same
 * root. So a step costs what it costs in ordinary least squares, and {@link NonlinearLeastSquares}' trust region and polish
 * do the rest.
 */
public final class OrthogonalRegression {
    private static final double[] NONE = {};

    private OrthogonalRegression() {}

    /**
     * The straight line {@code y = a + b x}: D. York, N. M. Evensen, M. López Martínez and J. De Basabe Delgado, Am. J.
     * Phys. 72 (2004) 367, equations 13, with the standard errors at the adjusted points; from the slopes of both ordinary
     * regressions, keeping the smaller chi-squared. Where the iteration does not settle, the general method takes over.
     *
     * @param points observations
     * @return the fit with parameters a, b, or why there is none
     */
    public static OrthogonalOutcome fitLine(MeasuredPoints points) {
        OrthogonalProblem problem = new OrthogonalProblem(new YorkIteration.Line(), points);
        NotOrthogonal refusal = refusal(problem, points);
        if (refusal != null) {
            return refusal;
        }
        YorkIteration iteration = new YorkIteration(points);
        if (iteration.sameAbscissae()) {
            return new NotOrthogonal(
                    NotOrthogonal.Kind.NOT_DETERMINED,
                    "all points have the same abscissa: no slope is determined",
                    NONE);
        }
        double[] settled = iteration.settledOrNull();
        if (settled != null) {
            OrthogonalSolution solution = problem.solutionAt(settled);
            if (solution != null && solution.local().rank() == 2) {
                return new OrthogonalFit(solution);
            }
        }
        return fit(new YorkIteration.Line(), points, iteration.starts(), NonlinearOptions.defaults());
    }

    /**
     * Any curve. With {@link NonlinearOptions#withThorough} false, starts from which plain steps go downhill to rest are taken
     * at their word, which is several times faster.
     *
     * @param curve the curve with its derivatives
     * @param points observations
     * @param starts at least one set of starting parameters
     * @param options limits, bounds and check, as for {@link NonlinearLeastSquares}; a parameter that ends at a bound makes
     *     the outcome {@link NotOrthogonal.Kind#NOT_CONVERGED}, because no covariance belongs to it
     * @return the fit, or why there is none
     * @throws IllegalArgumentException when there is no start, or one of another length or with numbers that are none
     */
    public static OrthogonalOutcome fit(
            CurveFunction curve, MeasuredPoints points, List<double[]> starts, NonlinearOptions options) {
        int p = curve.parameterCount();
        if (starts.isEmpty() || p < 1) {
            throw new IllegalArgumentException(
                    "a fit needs a start and a parameter; starts " + starts.size() + ", parameters " + p);
        }
        for (double[] start : starts) {
            if (start.length != p) {
                throw new IllegalArgumentException("a start has " + start.length + " values for " + p + " parameters");
            }
            for (int j = 0; j < p; j++) {
                Inputs.requireNumber(start[j], "start", j);
            }
        }
        OrthogonalProblem problem = new OrthogonalProblem(curve, points);
        NotOrthogonal refusal = refusal(problem, points);
        if (refusal != null) {
            return refusal;
        }
        NonlinearAttempt best = problem.search(
                starts,
                options.lower(p),
                options.upper(p),
                options.check(),
                options.maximumIterations(),
                options.thorough());
        if (best.end() == NonlinearAttempt.End.DEFICIENT) {
            return new NotOrthogonal(NotOrthogonal.Kind.NOT_DETERMINED, best.reason(), best.parameters());
        }
        boolean held = best.free().length < p;
        OrthogonalSolution solution =
                best.end() == NonlinearAttempt.End.CONVERGED && !held ? problem.solutionAt(best.parameters()) : null;
        if (solution == null) {
            String reason = held && best.end() == NonlinearAttempt.End.CONVERGED
                    ? "a parameter ended at its bound"
                    : best.reason();
            return new NotOrthogonal(NotOrthogonal.Kind.NOT_CONVERGED, reason, best.parameters());
        }
        return new OrthogonalFit(solution);
    }

    private static NotOrthogonal refusal(OrthogonalProblem problem, MeasuredPoints points) {
        int exact = problem.exactPoint();
        if (exact >= 0) {
            return new NotOrthogonal(
                    NotOrthogonal.Kind.EXACT_POINT,
                    "point " + exact + " (counted from 0) has no uncertainty in either coordinate",
                    NONE);
        }
        if (points.count() < problem.parameterCount()) {
            return new NotOrthogonal(
                    NotOrthogonal.Kind.NOT_DETERMINED,
                    points.count() + " points do not determine " + problem.parameterCount() + " parameters",
                    NONE);
        }
        return null;
    }
}
