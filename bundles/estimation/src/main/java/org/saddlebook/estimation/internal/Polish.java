package org.saddlebook.estimation.internal;

/**
 * The last digits: Gauss-Newton steps, each solved to full accuracy, until rounding stops them. Where they shrink slowly
 * because the residuals are large, second derivatives by differences of the Jacobian turn them into Newton steps, in the
 * coordinates of the triangular factor so that nothing is squared (Björck 1996, Numerical Methods for Least Squares
 * Problems, 9.2).
 */
final class Polish {
    private static final int LIMIT = 60;
    private static final double SLOW = 0.2;
    private static final double AT_ROUNDING = 1e-15;
    private static final double NOISE = 1e-10;
    private static final double DIFFERENCE = 1e-5;

    private final NonlinearProblem problem;
    private NonlinearProblem.Point point;
    private int[] free;
    private LinearSolution local;
    private double[] step;
    private double size;
    private int iterations;

    Polish(NonlinearProblem problem, NonlinearProblem.Point start) {
        this.problem = problem;
        look(start);
        improve();
    }

    private void look(NonlinearProblem.Point at) {
        point = at;
        free = at.free();
        local = null;
        step = new double[0];
        size = 0;
        if (free.length == 0) {
            return;
        }
        local = at.linearised(free);
        if (local.rank() == free.length) {
            step = local.parameters();
            size = measure(step);
        }
    }

    private void improve() {
        boolean newton = false;
        int fruitless = 0;
        while (iterations < LIMIT && step.length > 0 && size > AT_ROUNDING && fruitless < 3) {
            iterations++;
            problem.check.run();
            NonlinearProblem.Point before = point;
            int[] freeBefore = free;
            LinearSolution localBefore = local;
            double[] stepBefore = step;
            double sizeBefore = size;
            double[] move = newton ? newtonStep() : step;
            double[] next = before.parameters.clone();
            for (int j = 0; j < free.length; j++) {
                next[free[j]] += move[j];
            }
            NonlinearProblem.Point trial = problem.at(problem.clip(next));
            boolean worse = !trial.defined() || trial.sumOfSquares > before.sumOfSquares * (1 + NOISE);
            if (!worse) {
                look(trial);
                worse = step.length != stepBefore.length || !(size < sizeBefore);
            }
            if (worse) {
                point = before;
                free = freeBefore;
                local = localBefore;
                step = stepBefore;
                size = sizeBefore;
                fruitless = newton ? 3 : fruitless;
                newton = true;
            } else if (size > SLOW * sizeBefore) {
                fruitless = newton ? fruitless + 1 : fruitless;
                newton = true;
            } else {
                fruitless = 0;
            }
        }
    }

    /** Largest step relative to its parameter, or to its share of the response where the parameter is near zero. */
    private double measure(double[] move) {
        double largest = 0;
        for (int j = 0; j < free.length; j++) {
            double value = Math.abs(point.parameters[free[j]]);
            double change = Math.abs(move[j]);
            double column = columnNorm(free[j]);
            double natural = column > 0 ? 1e-6 * problem.responseNorm() / column : 0;
            largest = Math.max(largest, change == 0 ? 0 : change / Math.max(value, natural));
        }
        return largest;
    }

    private double columnNorm(int column) {
        double sum = 0;
        for (int i = 0; i < problem.rows; i++) {
            double weight = problem.weight(i);
            if (weight > 0) {
                sum += weight * point.jacobian[i][column] * point.jacobian[i][column];
            }
        }
        return Math.sqrt(sum);
    }

    /** Solves {@code (R'R - S) d = J'r}, S the residuals times second derivatives; the plain step where that fails. */
    private double[] newtonStep() {
        int p = free.length;
        double[][] second = new double[p][p];
        double[] shifted = point.parameters.clone();
        for (int k = 0; k < p; k++) {
            int column = free[k];
            double value = point.parameters[column];
            double norm = columnNorm(column);
            double natural = norm > 0 ? problem.responseNorm() / norm : 1;
            double h = DIFFERENCE * (value == 0 ? natural : Math.abs(value));
            shifted[column] = value + h;
            double above = shifted[column];
            NonlinearProblem.Point up = problem.at(shifted.clone());
            shifted[column] = value - h;
            double width = above - shifted[column];
            NonlinearProblem.Point down = problem.at(shifted.clone());
            shifted[column] = value;
            if (!up.defined() || !down.defined()) {
                return step;
            }
            for (int j = 0; j < p; j++) {
                double sum = 0;
                for (int i = 0; i < problem.rows; i++) {
                    double weight = problem.weight(i);
                    if (weight > 0) {
                        sum += weight * point.residuals[i] * (up.jacobian[i][free[j]] - down.jacobian[i][free[j]]);
                    }
                }
                second[k][j] = sum / width;
            }
        }
        double[] better = local.curvedStep(second, step);
        return better == null ? step : better;
    }

    NonlinearProblem.Point point() {
        return point;
    }

    int[] free() {
        return free;
    }

    /** The linearised problem there; null when every parameter is at a bound. */
    LinearSolution local() {
        return local;
    }

    int iterations() {
        return iterations;
    }

    /** Whether what is left of the step matters to nobody. */
    boolean atMinimum() {
        if (step.length == 0) {
            return false;
        }
        double predicted = 0;
        double unit = local.degreesOfFreedom() == 0 ? 0 : Math.sqrt(point.sumOfSquares / local.degreesOfFreedom());
        double[][] covariance = local.covariance();
        boolean small = true;
        for (int j = 0; j < free.length; j++) {
            double deviation = unit * Math.sqrt(covariance[j][j]);
            double change = Math.abs(step[j]);
            small &= change <= 1e-8 * Math.abs(point.parameters[free[j]]) || change <= 1e-6 * deviation;
        }
        for (int i = 0; i < problem.rows; i++) {
            if (problem.weight(i) > 0) {
                double change = 0;
                for (int j = 0; j < free.length; j++) {
                    change += point.jacobian[i][free[j]] * step[j];
                }
                predicted += problem.weight(i) * change * change;
            }
        }
        return small || Math.sqrt(predicted) <= 1e-14 * problem.responseNorm();
    }
}
