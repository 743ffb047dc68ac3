package org.saddlebook.estimation.internal;

import org.saddlebook.estimation.api.BootstrapKind;
import org.saddlebook.estimation.api.Fit;

/** Resampling of a non-linear fit, one refit for each set. */
public final class NonlinearBootstrap {
    private static final double FULL = 1e-10;
    /** Refits in a row without a fit after which resampling is given up. */
    private static final int PATIENCE = 200;

    private final int p;
    private final double[] fitted;
    private final double[] response;
    private final double[] weightsOrNull;
    private final double[] pool;
    private final int[] active;
    private final Refit refit;

    /** A fit of other numbers to the same response. */
    @FunctionalInterface
    public interface Refit {
        /** The parameters, or null where there is no fit. */
        double[] of(double[] response, double[] weightsOrNull);
    }

    /** Prepares, leaving out observations without weight. */
    public NonlinearBootstrap(Fit fit, double[] response, double[] weightsOrNull, Refit refit) {
        this.p = fit.parameterCount();
        this.response = response;
        this.weightsOrNull = weightsOrNull;
        this.refit = refit;
        double[] residuals = fit.residuals();
        double[] leverages = fit.leverages();
        fitted = new double[response.length];
        active = new int[fit.observations()];
        double[] corrected = new double[active.length];
        int count = 0;
        int usable = 0;
        for (int i = 0; i < response.length; i++) {
            fitted[i] = response[i] - residuals[i];
            if (weight(i) > 0) {
                active[count++] = i;
                double rest = 1 - leverages[i];
                if (rest > FULL) {
                    corrected[usable++] = Math.sqrt(weight(i) / rest) * residuals[i];
                }
            }
        }
        pool = LinearBootstrap.centred(corrected, usable);
    }

    private double weight(int i) {
        return weightsOrNull == null ? 1 : weightsOrNull[i];
    }

    /** Whether any residual can be drawn. */
    public boolean hasResiduals() {
        return pool.length > 0;
    }

    /** Estimates with each observation left out, where there is one. */
    public double[] jackknife() {
        double[] result = new double[active.length * p];
        double[] weights = new double[response.length];
        int count = 0;
        for (int left : active) {
            for (int i = 0; i < weights.length; i++) {
                weights[i] = i == left ? 0 : weight(i);
            }
            double[] parameters = refit.of(response, weights);
            if (parameters != null) {
                System.arraycopy(parameters, 0, result, count * p, p);
                count++;
            }
        }
        return java.util.Arrays.copyOf(result, count * p);
    }

    /** Fills parameter sets; deviation as in {@link LinearBootstrap#work}. */
    public Chunks.Work work(BootstrapKind kind, double deviation) {
        return (draws, values, from, to) -> {
            long redrawn = 0;
            double[] drawn = response.clone();
            double[] weights = weightsOrNull;
            if (kind == BootstrapKind.CASE) {
                weights = new double[response.length];
            }
            for (int k = from; k < to; k++) {
                int useless = 0;
                double[] parameters;
                while (true) {
                    draw(kind, deviation, draws, drawn, weights);
                    parameters = refit.of(drawn, weights);
                    if (parameters != null) {
                        break;
                    }
                    useless++;
                    if (useless > PATIENCE) {
                        return -1;
                    }
                }
                redrawn += useless;
                System.arraycopy(parameters, 0, values, k * p, p);
            }
            return redrawn;
        };
    }

    private void draw(BootstrapKind kind, double deviation, Draws draws, double[] drawn, double[] weights) {
        if (kind == BootstrapKind.CASE) {
            java.util.Arrays.fill(weights, 0);
            for (int k = 0; k < active.length; k++) {
                int i = active[draws.index(active.length)];
                weights[i] += weight(i);
            }
            return;
        }
        for (int i : active) {
            double error =
                    kind == BootstrapKind.RESIDUAL ? pool[draws.index(pool.length)] : deviation * draws.gaussian();
            drawn[i] = fitted[i] + error / Math.sqrt(weight(i));
        }
    }
}
