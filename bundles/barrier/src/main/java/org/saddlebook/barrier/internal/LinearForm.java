package org.saddlebook.barrier.internal;

import java.util.Optional;
import org.saddlebook.api.model.RateFunction;
import org.saddlebook.estimation.api.LinearFit;

/** A law that was fitted to ln k by a direct solution, as the arrays of that problem. */
final class LinearForm {
    private final double[][] design;
    private final double[] response;
    private final double[] weightsOrNull;

    private LinearForm(double[][] design, double[] response, double[] weightsOrNull) {
        this.design = design;
        this.response = response;
        this.weightsOrNull = weightsOrNull;
    }

    /** The problem behind a fit; empty for a law that was found by search. */
    static Optional<LinearForm> of(FittedLaw fitted) {
        if (!(fitted.fit() instanceof LinearFit)) {
            return Optional.empty();
        }
        RateFunction law = fitted.law();
        Measurements data = fitted.data();
        int p = law.parameters().size();
        double[][] design = new double[data.size()][p];
        double[] response = new double[data.size()];
        for (int i = 0; i < response.length; i++) {
            response[i] = data.lnRate(i) - data.lnRate(law, i, new double[p], design[i]);
        }
        return Optional.of(new LinearForm(design, response, data.weightsOnLogarithm()));
    }

    /** n rows of p derivatives; not copied. */
    double[][] design() {
        return design;
    }

    /** ln k without the term of temperature alone; not copied. */
    double[] response() {
        return response;
    }

    /** Weights; null where all are 1; not copied. */
    double[] weightsOrNull() {
        return weightsOrNull;
    }
}
