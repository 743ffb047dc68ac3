package org.saddlebook.estimation.internal;

import org.saddlebook.estimation.api.BootstrapKind;
import org.saddlebook.estimation.api.Fit;

/**
 * Resampling of a linear fit. With the design kept, every new estimate is the old one plus a fixed matrix times the new
 * errors; only drawing whole observations needs a factorisation each.
 */
public final class LinearBootstrap {
    /** Leverages closer to one than this belong to points the fit passes through whatever they are. */
    private static final double FULL = 1e-10;
    /** Useless samples in a row, for each set asked for, after which drawing whole observations is given up. */
    private static final int PATIENCE = 100_000;

    private final int n;
    private final int p;
    private final double[] estimate;
    /** Change of the estimate, p for each observation, with its error in units of its standard deviation. */
    private final double[] gain;

    private final double[] pool;
    private final double[] jackknife;
    private final Design design;
    private final double[] response;
    private final double[] weightsOrNull;
    private final int[] active;

    /** Prepares, leaving out observations without weight. */
    public LinearBootstrap(Fit fit, double[][] rows, double[] response, double[] weightsOrNull) {
        this.design = Design.of(rows);
        this.response = response.clone();
        this.weightsOrNull = weightsOrNull == null ? null : weightsOrNull.clone();
        p = fit.parameterCount();
        n = fit.observations();
        estimate = fit.parameters();
        active = new int[n];
        int count = 0;
        for (int i = 0; i < response.length; i++) {
            if (weight(i) > 0) {
                active[count++] = i;
            }
        }
        gain = new double[n * p];
        double[] residuals = fit.residuals();
        double[] leverages = fit.leverages();
        double[] corrected = new double[n];
        double[] left = new double[n * p];
        double[] unit = new double[p];
        int usable = 0;
        for (int k = 0; k < n; k++) {
            int i = active[k];
            double root = Math.sqrt(weight(i));
            double rest = 1 - leverages[i];
            for (int j = 0; j < p; j++) {
                unit[j] = 1;
                gain[k * p + j] = fit.predictionCovariance(unit, rows[i]) * root;
                unit[j] = 0;
            }
            if (rest > FULL) {
                for (int j = 0; j < p; j++) {
                    left[usable * p + j] = estimate[j] - gain[k * p + j] * root * residuals[i] / rest;
                }
                corrected[usable++] = root * residuals[i] / Math.sqrt(rest);
            }
        }
        pool = centred(corrected, usable);
        jackknife = java.util.Arrays.copyOf(left, usable * p);
    }

    private double weight(int i) {
        return weightsOrNull == null ? 1 : weightsOrNull[i];
    }

    /** The first numbers of an array less their mean. */
    static double[] centred(double[] numbers, int count) {
        double[] result = java.util.Arrays.copyOf(numbers, count);
        double mean = 0;
        for (double number : result) {
            mean += number / count;
        }
        for (int i = 0; i < count; i++) {
            result[i] -= mean;
        }
        return result;
    }

    /** Estimates with each observation left out, where that leaves the parameters determined. */
    public double[] jackknife() {
        return jackknife;
    }

    /** Whether any residual can be drawn. */
    public boolean hasResiduals() {
        return pool.length > 0;
    }

    /**
     * Fills parameter sets.
     *
     * @param kind what is drawn
     * @param deviation of an observation of weight one, for parametric kinds
     */
    public Chunks.Work work(BootstrapKind kind, double deviation) {
        return switch (kind) {
            case RESIDUAL -> (draws, values, from, to) -> residuals(draws, values, from, to);
            case CASE -> (draws, values, from, to) -> cases(draws, values, from, to);
            case PARAMETRIC_STATED, PARAMETRIC_ESTIMATED ->
                (draws, values, from, to) -> normal(draws, deviation, values, from, to);
        };
    }

    private long residuals(Draws draws, double[] values, int from, int to) {
        for (int k = from; k < to; k++) {
            int at = k * p;
            System.arraycopy(estimate, 0, values, at, p);
            for (int i = 0; i < n; i++) {
                add(values, at, i, pool[draws.index(pool.length)]);
            }
        }
        return 0;
    }

    private long normal(Draws draws, double deviation, double[] values, int from, int to) {
        for (int k = from; k < to; k++) {
            int at = k * p;
            System.arraycopy(estimate, 0, values, at, p);
            for (int i = 0; i < n; i++) {
                add(values, at, i, deviation * draws.gaussian());
            }
        }
        return 0;
    }

    private void add(double[] values, int at, int i, double error) {
        for (int j = 0; j < p; j++) {
            values[at + j] += gain[i * p + j] * error;
        }
    }

    private long cases(Draws draws, double[] values, int from, int to) {
        long redrawn = 0;
        double[] weights = new double[response.length];
        for (int k = from; k < to; k++) {
            int useless = 0;
            LinearSolution solution;
            while (true) {
                java.util.Arrays.fill(weights, 0);
                for (int i = 0; i < n; i++) {
                    int drawn = active[draws.index(n)];
                    weights[drawn] += weight(drawn);
                }
                solution = LinearSolver.solve(design, response, weights);
                if (solution.rank() == p) {
                    break;
                }
                useless++;
                if (useless > PATIENCE) {
                    return -1;
                }
            }
            redrawn += useless;
            System.arraycopy(solution.parameters(), 0, values, k * p, p);
        }
        return redrawn;
    }
}
