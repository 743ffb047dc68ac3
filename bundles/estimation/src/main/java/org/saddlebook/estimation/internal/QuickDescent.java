package org.saddlebook.estimation.internal;

/**
 * Plain Gauss-Newton in double, for starts so good that it goes downhill all the way and comes to rest; anything else is left
 * to the search that can cope with it.
 */
final class QuickDescent {
    private static final int LIMIT = 30;
    /** Relative steps that nothing but rounding makes. */
    private static final double ROUNDING = 1e-15;
    /** Relative steps that may rest without having reached it. */
    private static final double RESTING = 1e-12;

    private QuickDescent() {}

    /** The minimum, or null. */
    static NonlinearAttempt fromOrNull(NonlinearProblem problem, double[] start) {
        NonlinearProblem.Point point = problem.at(problem.clip(start.clone()));
        int p = problem.columns;
        int[] all = new int[p];
        for (int j = 0; j < p; j++) {
            all[j] = j;
        }
        double last = Double.POSITIVE_INFINITY;
        for (int k = 0; k < LIMIT; k++) {
            problem.check.run();
            if (!point.defined() || point.free().length < p) {
                return null;
            }
            LinearSolution target = target(problem, point);
            if (target.rank() < p) {
                return null;
            }
            double[] next = target.parameters();
            double size = 0;
            for (int j = 0; j < p; j++) {
                double change = Math.abs(next[j] - point.parameters[j]);
                size = Math.max(size, change == 0 ? 0 : change / Math.abs(next[j]));
            }
            boolean rests = size <= ROUNDING || (size <= RESTING && size >= 0.3 * last);
            if (rests) {
                return new NonlinearAttempt(
                        NonlinearAttempt.End.CONVERGED,
                        "",
                        point.parameters,
                        all,
                        point.residuals,
                        point.sumOfSquares,
                        k,
                        target);
            }
            NonlinearProblem.Point trial = problem.at(problem.clip(next));
            if (!trial.defined() || trial.sumOfSquares > point.sumOfSquares * (1 + RESTING)) {
                return null;
            }
            point = trial;
            last = size;
        }
        return null;
    }

    /** The linearised problem for the next parameters themselves: their size tells the solver what is rounding. */
    private static LinearSolution target(NonlinearProblem problem, NonlinearProblem.Point point) {
        int p = problem.columns;
        double[] flat = new double[problem.rows * p];
        double[] right = point.residuals.clone();
        for (int i = 0; i < problem.rows; i++) {
            for (int j = 0; j < p; j++) {
                flat[i * p + j] = point.jacobian[i][j];
                right[i] += point.jacobian[i][j] * point.parameters[j];
            }
        }
        return LinearSolver.solve(new Design(problem.rows, p, flat, null), right, problem.weightsOrNull);
    }
}
