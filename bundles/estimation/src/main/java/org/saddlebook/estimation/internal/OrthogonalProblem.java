package org.saddlebook.estimation.internal;

import java.util.List;
import org.saddlebook.estimation.api.CurveFunction;
import org.saddlebook.estimation.api.MeasuredPoints;
import org.saddlebook.estimation.api.ResponseFunction;

/**
 * Errors in both variables as an ordinary problem in the parameters alone: each observation is projected onto the curve in
 * the metric of its covariance, and its response is minus the weighted distance (plus a constant that gives the response the
 * size of the ordinates, by which the search judges what is rounding).
 */
public final class OrthogonalProblem implements ResponseFunction {
    private static final int LIMIT = 100;
    private static final int HALVINGS = 40;
    private static final double AT_ROUNDING = 4e-16;

    private final CurveFunction curve;
    private final double[] x;
    private final double[] y;
    private final double[] varianceX;
    private final double[] varianceY;
    private final double[] covariance;
    private final double[] constant;

    // The projection just made.
    private final double[] gradient;
    private double adjusted;
    private double ordinate;
    private double variance;
    private double distance;

    /** A problem of checked points. */
    public OrthogonalProblem(CurveFunction curve, MeasuredPoints points) {
        this.curve = curve;
        int n = points.count();
        x = points.x();
        y = points.y();
        varianceX = points.ux();
        varianceY = points.uy();
        covariance = points.correlations();
        for (int i = 0; i < n; i++) {
            covariance[i] *= varianceX[i] * varianceY[i];
            varianceX[i] *= varianceX[i];
            varianceY[i] *= varianceY[i];
        }
        constant = new double[n];
        gradient = new double[curve.parameterCount() + 1];
    }

    /** The first point exact in both coordinates, or -1. */
    public int exactPoint() {
        for (int i = 0; i < x.length; i++) {
            if (varianceX[i] == 0 && varianceY[i] == 0) {
                return i;
            }
        }
        return -1;
    }

    @Override
    public int observations() {
        return x.length;
    }

    @Override
    public int parameterCount() {
        return curve.parameterCount();
    }

    @Override
    public void evaluate(double[] p, double[] values, double[][] jacobian) {
        int parameters = gradient.length - 1;
        for (int i = 0; i < x.length; i++) {
            if (!project(i, p)) {
                values[i] = Double.NaN;
                continue;
            }
            double root = 1 / Math.sqrt(variance);
            values[i] = constant[i] - distance * root;
            for (int j = 0; j < parameters; j++) {
                jacobian[i][j] = gradient[j] * root;
            }
        }
    }

    /** Looks from every start; the best end. */
    public NonlinearAttempt search(
            List<double[]> starts, double[] lower, double[] upper, Runnable check, int limit, boolean thorough) {
        shift(starts);
        NonlinearProblem problem = new NonlinearProblem(this, constant.clone(), null, lower, upper, check);
        NonlinearAttempt best = null;
        for (double[] start : starts) {
            NonlinearAttempt attempt = thorough ? null : QuickDescent.fromOrNull(problem, start);
            if (attempt == null) {
                attempt = NonlinearSearch.from(problem, start, limit, thorough);
            }
            if (best == null || attempt.betterThan(best)) {
                best = attempt;
            }
        }
        return best;
    }

    private void shift(List<double[]> starts) {
        for (double[] start : starts) {
            boolean defined = true;
            for (int i = 0; i < x.length; i++) {
                constant[i] = 0;
                defined &= project(i, start);
                if (defined) {
                    constant[i] = y[i] / Math.sqrt(variance);
                }
            }
            if (defined) {
                return;
            }
        }
    }

    /** The solution at given parameters; null where the curve is not defined or the numbers overflow. */
    public OrthogonalSolution solutionAt(double[] p) {
        int n = x.length;
        int columns = gradient.length - 1;
        double[] abscissae = new double[n];
        double[] dx = new double[n];
        double[] dy = new double[n];
        double[] weights = new double[n];
        double[] flat = new double[n * columns];
        double[] distances = new double[n];
        Wide sum = new Wide();
        for (int i = 0; i < n; i++) {
            if (!project(i, p)) {
                return null;
            }
            abscissae[i] = adjusted;
            // Not x - adjusted: that loses the digits of a small difference.
            dx[i] = (covariance[i] - gradient[columns] * varianceX[i]) * (distance / variance);
            dy[i] = (varianceY[i] - gradient[columns] * covariance[i]) * (distance / variance);
            weights[i] = 1 / variance;
            // The distance alone has a solution of zero, which the solver would compute in double-double for nothing.
            distances[i] = distance;
            for (int j = 0; j < columns; j++) {
                distances[i] += gradient[j] * p[j];
            }
            System.arraycopy(gradient, 0, flat, i * columns, columns);
            double root = distance / Math.sqrt(variance);
            sum.addProduct(root, 0, root, 0);
            if (!(weights[i] > 0 && weights[i] <= Inputs.LARGEST)) {
                return null;
            }
        }
        LinearSolution local = LinearSolver.solve(new Design(n, columns, flat, null), distances, weights);
        return local.rank() < columns
                ? null
                : new OrthogonalSolution(p.clone(), abscissae, dx, dy, weights, sum.value(), local);
    }

    /**
     * Finds the point of the curve that belongs to observation i: repeated linearisation, hastened by the secant through the
     * last two steps, halved while the distance grows.
     */
    private boolean project(int i, double[] p) {
        if (!look(i, x[i], p)) {
            return false;
        }
        if (varianceX[i] == 0) {
            return true;
        }
        double here = x[i];
        double step = next(i) - here;
        double lastStep = 0;
        double lastMove = 0;
        double merit = merit(i, here);
        double scale = AT_ROUNDING * (Math.abs(here) + Math.sqrt(varianceX[i]));
        for (int k = 0; k < LIMIT && Math.abs(step) > scale; k++) {
            double move = step;
            double ratio = lastMove == 0 ? 1 : step / lastStep;
            if (Math.abs(ratio) < 0.5) {
                move = step * lastMove / (lastStep - step);
            }
            int halvings = 0;
            while (!(look(i, here + move, p) && merit(i, here + move) <= merit * (1 + 1e-14)) && halvings < HALVINGS) {
                move *= 0.5;
                halvings++;
            }
            if (halvings == HALVINGS) {
                return look(i, here, p);
            }
            here += move;
            merit = merit(i, here);
            lastStep = halvings == 0 ? step : 0;
            lastMove = halvings == 0 ? move : 0;
            step = next(i) - here;
            if (k > 3 && Math.abs(step) < 1e-13 * (Math.abs(here) + Math.sqrt(varianceX[i]))) {
                break;
            }
        }
        return true;
    }

    /** Evaluates the curve and linearises there. */
    private boolean look(int i, double at, double[] p) {
        double value = curve.value(at, p, gradient);
        double slope = gradient[gradient.length - 1];
        adjusted = at;
        ordinate = value;
        distance = y[i] - value - slope * (x[i] - at);
        variance = varianceY[i] - 2 * slope * covariance[i] + slope * slope * varianceX[i];
        return variance > 0 && Math.abs(distance) < Double.POSITIVE_INFINITY && variance < Double.POSITIVE_INFINITY;
    }

    private double next(int i) {
        return x[i] - (covariance[i] - gradient[gradient.length - 1] * varianceX[i]) * (distance / variance);
    }

    /** What the projection makes smallest: the squared distance of observation and point; where y is exact, its misfit. */
    private double merit(int i, double at) {
        double dx = x[i] - at;
        double dy = y[i] - ordinate;
        if (varianceY[i] == 0) {
            return Math.abs(dy);
        }
        double slope = covariance[i] / varianceX[i];
        double rest = dy - slope * dx;
        return dx * dx / varianceX[i] + rest * rest / (varianceY[i] - slope * covariance[i]);
    }
}
