package org.saddlebook.estimation.api;

import java.util.Objects;

/** How to search for the minimum of a non-linear fit. Immutable; start from {@link #defaults()}. */
public final class NonlinearOptions {
    private static final NonlinearOptions DEFAULTS = new NonlinearOptions(2000, true, null, null, new NeverCancelled());

    /** A class, not a lambda: the first lambda of a process costs milliseconds. */
    private static final class NeverCancelled implements Runnable {
        @Override
        public void run() {
            // nothing to check
        }
    }

    private final int maximumIterations;
    private final boolean thorough;
    private final double[] lowerOrNull;
    private final double[] upperOrNull;
    private final Runnable check;

    private NonlinearOptions(
            int maximumIterations, boolean thorough, double[] lowerOrNull, double[] upperOrNull, Runnable check) {
        this.maximumIterations = maximumIterations;
        this.thorough = thorough;
        this.lowerOrNull = lowerOrNull;
        this.upperOrNull = upperOrNull;
        this.check = check;
    }

    /** 2000 iterations for each attempt, thorough, no bounds, no check. */
    public static NonlinearOptions defaults() {
        return DEFAULTS;
    }

    /** With another limit of iterations for each attempt. */
    public NonlinearOptions withMaximumIterations(int iterations) {
        if (iterations < 1) {
            throw new IllegalArgumentException("maximum iterations is " + iterations + "; at least 1 is needed");
        }
        return new NonlinearOptions(iterations, thorough, lowerOrNull, upperOrNull, check);
    }

    /**
     * Whether each start is tried with a long, a moderate and a short first step (default), or with the long one alone
     * unless that fails. Thorough costs three times as much and misses fewer minima.
     */
    public NonlinearOptions withThorough(boolean value) {
        return new NonlinearOptions(maximumIterations, value, lowerOrNull, upperOrNull, check);
    }

    /** With bounds; infinite where there is none. A parameter that ends at a bound is held there, without variance. */
    public NonlinearOptions withBounds(double[] lower, double[] upper) {
        if (lower.length != upper.length) {
            throw new IllegalArgumentException(lower.length + " lower and " + upper.length + " upper bounds");
        }
        for (int j = 0; j < lower.length; j++) {
            if (!(lower[j] < upper[j])) {
                throw new IllegalArgumentException(
                        "bounds[" + j + "] are " + lower[j] + " and " + upper[j] + "; the lower must be the smaller");
            }
        }
        return new NonlinearOptions(maximumIterations, thorough, lower.clone(), upper.clone(), check);
    }

    /** With a check called in every iteration; an exception it throws ends the fit and reaches the caller. */
    public NonlinearOptions withCheck(Runnable cancelCheck) {
        return new NonlinearOptions(
                maximumIterations, thorough, lowerOrNull, upperOrNull, Objects.requireNonNull(cancelCheck, "check"));
    }

    /** Limit of iterations for each attempt. */
    public int maximumIterations() {
        return maximumIterations;
    }

    /** Whether each start is tried with several first steps. */
    public boolean thorough() {
        return thorough;
    }

    /** Lower bounds for a number of parameters, minus infinity where there is none. */
    public double[] lower(int parameterCount) {
        return bounds(lowerOrNull, parameterCount, Double.NEGATIVE_INFINITY);
    }

    /** Upper bounds for a number of parameters, infinity where there is none. */
    public double[] upper(int parameterCount) {
        return bounds(upperOrNull, parameterCount, Double.POSITIVE_INFINITY);
    }

    /** The check. */
    public Runnable check() {
        return check;
    }

    private static double[] bounds(double[] boundsOrNull, int parameterCount, double none) {
        if (boundsOrNull != null) {
            if (boundsOrNull.length != parameterCount) {
                throw new IllegalArgumentException(
                        boundsOrNull.length + " bounds for " + parameterCount + " parameters");
            }
            return boundsOrNull.clone();
        }
        double[] result = new double[parameterCount];
        java.util.Arrays.fill(result, none);
        return result;
    }
}
