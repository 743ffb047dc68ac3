package org.saddlebook.barrier.internal;

import java.util.List;
import org.saddlebook.api.model.Parameter;
import org.saddlebook.api.model.RateFunction;
import org.saddlebook.estimation.api.NonlinearLeastSquares;
import org.saddlebook.estimation.api.NonlinearOptions;
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
        int n = data.size();
        boolean logarithm = data.response() == Measurements.Response.LN_RATE;
        // k is fitted in units of the first one, so that its size cannot matter.
        double unit = logarithm ? 0 : data.lnRate(0);
        double[] response = new double[n];
        for (int i = 0; i < n; i++) {
            response[i] = logarithm ? data.lnRate(i) : StrictMath.exp(data.lnRate(i) - unit);
        }
        NonlinearOptions options = NonlinearOptions.defaults().withCheck(check);
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
        return NonlinearLeastSquares.fit(
                        response(law, data, logarithm, unit), response, data.weights(), starts, options)
                .fold(
                        fit -> LawFitter.checked(id, title, law, data, fit),
                        missed -> new LawOutcome.NotFitted(id, title, LawOutcome.Kind.FAILED, missed.reason()),
                        deficient ->
                                new LawOutcome.NotFitted(id, title, LawOutcome.Kind.UNDETERMINED, deficient.reason()));
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
                    double ln = law.lnRate(kelvin, p, jacobian[i]);
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
