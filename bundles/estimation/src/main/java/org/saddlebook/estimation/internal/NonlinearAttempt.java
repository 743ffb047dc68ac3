package org.saddlebook.estimation.internal;

/** Where one search ended. Arrays are shared inside the bundle and not changed once here. */
public final class NonlinearAttempt {
    /** Sums of squares that differ by less than this share are the same minimum. */
    private static final double SAME = 1e-9;

    /** How it ended. */
    public enum End {
        /** At a minimum. */
        CONVERGED,
        /** Where the parameters are not determined. */
        DEFICIENT,
        /** Somewhere else. */
        STALLED
    }

    private final End end;
    private final String reason;
    private final double[] parameters;
    private final int[] free;
    private final double[] residuals;
    private final double residualSumOfSquares;
    private final int iterations;
    private final LinearSolution localOrNull;

    NonlinearAttempt(
            End end,
            String reason,
            double[] parameters,
            int[] free,
            double[] residuals,
            double residualSumOfSquares,
            int iterations,
            LinearSolution localOrNull) {
        this.end = end;
        this.reason = reason;
        this.parameters = parameters;
        this.free = free;
        this.residuals = residuals;
        this.residualSumOfSquares = residualSumOfSquares;
        this.iterations = iterations;
        this.localOrNull = localOrNull;
    }

    /** Whether to prefer this one: a clearly smaller sum of squares, or the same and converged when the other is not. */
    public boolean betterThan(NonlinearAttempt other) {
        if (Double.isNaN(other.residualSumOfSquares) || Double.isNaN(residualSumOfSquares)) {
            return Double.isNaN(other.residualSumOfSquares) && !Double.isNaN(residualSumOfSquares);
        }
        if (end == End.CONVERGED && other.end != End.CONVERGED) {
            return residualSumOfSquares <= other.residualSumOfSquares * (1 + SAME);
        }
        return residualSumOfSquares < other.residualSumOfSquares * (1 - SAME);
    }

    /** How it ended. */
    public End end() {
        return end;
    }

    /** Why it did not converge. */
    public String reason() {
        return reason;
    }

    /** Where. */
    public double[] parameters() {
        return parameters;
    }

    /** Indices of the parameters not held at a bound. */
    public int[] free() {
        return free;
    }

    /** Observed minus response, every row. */
    public double[] residuals() {
        return residuals;
    }

    /** Weighted sum of squares; NaN when the response was never defined. */
    public double residualSumOfSquares() {
        return residualSumOfSquares;
    }

    /** Iterations done. */
    public int iterations() {
        return iterations;
    }

    /** Independent columns of the Jacobian. */
    public int rank() {
        return localOrNull == null ? 0 : localOrNull.rank();
    }

    /** The problem linearised there. */
    public LinearSolution local() {
        return localOrNull;
    }
}
