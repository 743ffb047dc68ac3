package org.saddlebook.barrier.internal;

import java.util.OptionalDouble;
import org.saddlebook.api.model.Parameter;
import org.saddlebook.api.model.RateFunction;
import org.saddlebook.estimation.api.LinearLeastSquares;
import org.saddlebook.estimation.api.ResponseFunction;

/** Tells laws whose numbers come from the data from those whose numbers come from where a search happened to stop. */
final class Openness {
    /** Standard uncertainty of a logarithm that leaves its factor open by ten powers of ten. */
    private static final double OPEN_FACTOR = 23;

    private Openness() {}

    /** Whether, where a search stopped, the data leave a factor of the law open by powers of ten, or do not even show it. */
    static boolean ranAway(
            RateFunction law, ResponseFunction function, double[] response, double[] weights, double[] p) {
        int n = response.length;
        if (law.linear() || n <= p.length) {
            return false;
        }
        double[] values = new double[n];
        double[][] jacobian = new double[n][p.length];
        function.evaluate(p, values, jacobian);
        double squares = 0;
        for (int i = 0; i < n; i++) {
            double residual = response[i] - values[i];
            squares += (weights == null ? 1 : weights[i]) * residual * residual;
            for (double slope : jacobian[i]) {
                if (!Double.isFinite(slope)) {
                    return false;
                }
            }
        }
        if (!Double.isFinite(squares)) {
            return false;
        }
        double scale = Math.sqrt(squares / (n - p.length));
        return LinearLeastSquares.fit(jacobian, response, weights)
                .fold(
                        fit -> {
                            for (int j = 0; j < p.length; j++) {
                                double[] axis = new double[p.length];
                                axis[j] = 1;
                                double open = scale * Math.sqrt(fit.predictionVariance(axis));
                                if (law.parameters().get(j).scale() == Parameter.Scale.LOG && !(open < OPEN_FACTOR)) {
                                    return true;
                                }
                            }
                            return false;
                        },
                        deficient -> true);
    }

    /**
     * A law that is not linear always finds some minimum; where a factor in it is open by powers of ten, a part of the law
     * leaves no trace in the data, and the numbers of that part would be those of the search.
     */
    static LawOutcome determined(LawOutcome outcome) {
        if (!(outcome instanceof FittedLaw fitted) || fitted.law().linear()) {
            return outcome;
        }
        for (int i = 0; i < fitted.parameters().size(); i++) {
            Parameter parameter = fitted.parameters().get(i);
            OptionalDouble variance = fitted.parameter(i).variance();
            if (parameter.scale() == Parameter.Scale.LOG
                    && variance.isPresent()
                    && !(Math.sqrt(variance.getAsDouble()) < OPEN_FACTOR)) {
                return new LawOutcome.NotFitted(
                        fitted.id(),
                        fitted.title(),
                        LawOutcome.Kind.UNDETERMINED,
                        "The data leave " + parameter.symbol() + " (" + parameter.name()
                                + ") open by more than ten powers of ten, so they do not determine the "
                                + fitted.parameters().size() + " parameters of this law.");
            }
        }
        return outcome;
    }
}
