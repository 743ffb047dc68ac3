package org.saddlebook.barrier.internal;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.saddlebook.api.model.Parameter;
import org.saddlebook.api.model.RateFunction;
import org.saddlebook.estimation.api.NonlinearFit;
import org.saddlebook.estimation.api.NonlinearLeastSquares;
import org.saddlebook.estimation.api.NonlinearOptions;
import org.saddlebook.estimation.api.NonlinearOutcome;
import org.saddlebook.estimation.api.ResponseFunction;

/** Fits a law by search: a law that is not linear in its parameters, or any law to k itself. */
final class NonlinearFitter {
    private NonlinearFitter() {}

    static LawOutcome fit(
            String id, String title, RateFunction law, Measurements data, List<double[]> starts, Runnable check) {
        if (starts.isEmpty()) {
            return new LawOutcome.NotFitted(
                    id, title, LawOutcome.Kind.FAILED, "The law is not linear and offers no starting values.");
        }
        Problem problem = problem(law, data, check);
        NonlinearOutcome outcome = problem.fit(data, starts);
        if (outcome instanceof NonlinearFit found) {
            double[] ordered = law.ordered(found.parameters());
            if (!Arrays.equals(ordered, found.parameters())) {
                // The same minimum with the parameters where the law promises them.
                outcome = problem.fit(data, List.of(ordered));
            }
        }
        return outcome.fold(
                fit -> Openness.determined(LawFitter.checked(id, title, law, data, fit)),
                missed -> Openness.ranAway(
                                law, problem.function(), problem.response(), data.weights(), missed.bestParameters())
                        ? new LawOutcome.NotFitted(
                                id,
                                title,
                                LawOutcome.Kind.UNDETERMINED,
                                "The search ran away along parameters that leave no trace in the data, so they do not"
                                        + " determine the " + law.parameters().size() + " parameters of this law.")
                        : new LawOutcome.NotFitted(id, title, LawOutcome.Kind.FAILED, missed.reason()),
                deficient -> new LawOutcome.NotFitted(id, title, LawOutcome.Kind.UNDETERMINED, deficient.reason()));
    }

    /** A fit by search as the engine takes it. */
    static final class Problem {
        private final ResponseFunction function;
        private final double[] response;
        private final NonlinearOptions options;

        Problem(ResponseFunction function, double[] response, NonlinearOptions options) {
            this.function = function;
            this.response = response;
            this.options = options;
        }

        private NonlinearOutcome fit(Measurements data, List<double[]> starts) {
            return NonlinearLeastSquares.fit(function, response, data.weights(), starts, options);
        }

        ResponseFunction function() {
            return function;
        }

        /** Observed values; not copied. */
        double[] response() {
            return response;
        }

        NonlinearOptions options() {
            return options;
        }
    }

    /** The problem of fitting a law to measurements. */
    static Problem problem(RateFunction law, Measurements data, Runnable check) {
        int n = data.size();
        boolean logarithm = data.response() == Measurements.Response.LN_RATE;
        // k is fitted in units of the first one, so that its size cannot matter.
        double unit = logarithm ? 0 : data.lnRate(0);
        double[] response = new double[n];
        for (int i = 0; i < n; i++) {
            response[i] = logarithm ? data.lnRate(i) : StrictMath.exp(data.lnRate(i) - unit);
        }
        NonlinearOptions options = options(law).withCheck(check);
        return new Problem(response(law, data, logarithm, unit), response, options);
    }

    /** A law fitted to a curve of ln k at the measured points, each counting alike; empty when the search does not end. */
    static Optional<NonlinearFit> reproduce(
            RateFunction law, Measurements data, double[] curve, List<double[]> starts) {
        return !starts.isEmpty()
                        && NonlinearLeastSquares.fit(response(law, data, true, 0), curve, null, starts, options(law))
                                instanceof NonlinearFit fit
                ? Optional.of(fit)
                : Optional.empty();
    }

    private static NonlinearOptions options(RateFunction law) {
        NonlinearOptions options = NonlinearOptions.defaults();
        List<Parameter> parameters = law.parameters();
        double[] lower = new double[parameters.size()];
        double[] upper = new double[parameters.size()];
        boolean bounded = false;
        for (int j = 0; j < lower.length; j++) {
            lower[j] = parameters.get(j).lower();
            upper[j] = parameters.get(j).upper();
            bounded |= Double.isFinite(lower[j]) || Double.isFinite(upper[j]);
        }
        if (bounded) {
            options = options.withBounds(lower, upper);
        }
        return options;
    }

    private static ResponseFunction response(RateFunction law, Measurements data, boolean logarithm, double unit) {
        return new ResponseFunction() {
            @Override
            public int observations() {
                return data.size();
            }

            @Override
            public int parameterCount() {
                return law.parameters().size();
            }

            @Override
            public void evaluate(double[] p, double[] values, double[][] jacobian) {
                for (int i = 0; i < values.length; i++) {
                    double kelvin = data.kelvin(i);
                    if (!law.defined(kelvin, p)) {
                        values[i] = Double.NaN;
                        continue;
                    }
                    double ln = data.lnRate(law, i, p, jacobian[i]);
                    values[i] = logarithm ? ln : StrictMath.exp(ln - unit);
                    if (!logarithm) {
                        for (int j = 0; j < p.length; j++) {
                            jacobian[i][j] *= values[i];
                        }
                    }
                }
            }
        };
    }
}
