package org.saddlebook.barrier.internal;

import java.util.List;
import java.util.Optional;
import org.saddlebook.api.model.Parameter;
import org.saddlebook.api.model.RateFunction;
import org.saddlebook.estimation.api.CurveFunction;
import org.saddlebook.estimation.api.MeasuredPoints;
import org.saddlebook.estimation.api.NonlinearOptions;
import org.saddlebook.estimation.api.OrthogonalFit;
import org.saddlebook.estimation.api.OrthogonalOutcome;
import org.saddlebook.estimation.api.OrthogonalRegression;

/**
 * Fits a law to rate constants and temperatures that both have stated uncertainties. A straight law is York's line (York et
 * al., Am. J. Phys. 72 (2004) 367) of {@code ln k - o(T)} on 1/T, whose errors correlate where o depends on T:
 * {@code cov = o' u(T)^2 / T^2}. Any other law, and k itself, is fitted by orthogonal distance in T (Boggs and Rogers 1990).
 */
final class BothErrorsFitter {
    private static final double STEP = 1e-5;

    private BothErrorsFitter() {}

    /** The law fitted with errors in both, from the estimate of a fit that knows the temperatures' errors as weights only. */
    static LawOutcome fit(FittedLaw ordinary, Runnable check) {
        Measurements data = ordinary.data();
        RateFunction law = ordinary.law();
        Optional<StraightLine> line =
                data.response() == Measurements.Response.LN_RATE ? StraightLine.of(law, data) : Optional.empty();
        OrthogonalOutcome outcome = line.isPresent()
                ? straight(line.get(), ordinary, check)
                : OrthogonalRegression.fit(
                        new Curve(law, data),
                        points(data),
                        List.of(ordinary.fit().parameters()),
                        options(law, check));
        return outcome.fold(
                fit -> LawFitter.checked(
                        ordinary.id(), ordinary.title(), law, data, new DistanceFit(fit, residuals(law, data, fit))),
                refused -> new LawOutcome.NotFitted(
                        ordinary.id(),
                        ordinary.title(),
                        LawOutcome.Kind.FAILED,
                        "With the stated errors of the temperatures: " + refused.reason() + "."));
    }

    private static OrthogonalOutcome straight(StraightLine line, FittedLaw ordinary, Runnable check) {
        Measurements data = ordinary.data();
        int n = data.size();
        double[] x = new double[n];
        double[] y = new double[n];
        double[] ux = new double[n];
        double[] uy = new double[n];
        double[] correlation = new double[n];
        for (int i = 0; i < n; i++) {
            double kelvin = data.kelvin(i);
            double slope = line.offsetSlope(kelvin);
            x[i] = 1 / kelvin;
            y[i] = data.lnRate(i) - line.offset(kelvin);
            ux[i] = data.kelvinUncertainty(i) / (kelvin * kelvin);
            double shared = slope * data.kelvinUncertainty(i);
            double own = data.statedUncertainty(i);
            uy[i] = Math.sqrt(own * own + shared * shared);
            // Both move with the error of T: dx = -dT/T^2, dy = -o' dT.
            correlation[i] = shared / uy[i];
        }
        MeasuredPoints points = MeasuredPoints.of(x, y, ux, uy).withCorrelations(correlation);
        double[] start = OrthogonalRegression.fitLine(points) instanceof OrthogonalFit york
                ? line.parameters(york.parameters()[0], york.parameters()[1])
                : ordinary.fit().parameters();
        // The same minimum in the law's own parameters.
        CurveFunction curve = new CurveFunction() {
            @Override
            public int parameterCount() {
                return 2;
            }

            @Override
            public double value(double abscissa, double[] p, double[] gradient) {
                return line.value(abscissa, p, gradient);
            }
        };
        return OrthogonalRegression.fit(curve, points, List.of(start), options(ordinary.law(), check));
    }

    private static MeasuredPoints points(Measurements data) {
        int n = data.size();
        double[] y = new double[n];
        double[] ux = new double[n];
        double[] uy = new double[n];
        boolean logarithm = data.response() == Measurements.Response.LN_RATE;
        for (int i = 0; i < n; i++) {
            y[i] = logarithm ? data.lnRate(i) : StrictMath.exp(data.lnRate(i) - data.lnRate(0));
            ux[i] = data.kelvinUncertainty(i);
            uy[i] = data.statedUncertainty(i) * (logarithm ? 1 : y[i]);
        }
        return MeasuredPoints.of(data.kelvin(), y, ux, uy);
    }

    private static double[] residuals(RateFunction law, Measurements data, OrthogonalFit fit) {
        double[] p = fit.parameters();
        double[] unused = new double[p.length];
        double[] residuals = new double[data.size()];
        boolean logarithm = data.response() == Measurements.Response.LN_RATE;
        for (int i = 0; i < residuals.length; i++) {
            double fitted = law.lnRate(data.kelvin(i), p, unused);
            residuals[i] = logarithm
                    ? data.lnRate(i) - fitted
                    : StrictMath.exp(data.lnRate(i) - data.lnRate(0)) - StrictMath.exp(fitted - data.lnRate(0));
        }
        return residuals;
    }

    private static NonlinearOptions options(RateFunction law, Runnable check) {
        List<Parameter> parameters = law.parameters();
        double[] lower = new double[parameters.size()];
        double[] upper = new double[parameters.size()];
        boolean bounded = false;
        for (int j = 0; j < lower.length; j++) {
            lower[j] = parameters.get(j).lower();
            upper[j] = parameters.get(j).upper();
            bounded |= Double.isFinite(lower[j]) || Double.isFinite(upper[j]);
        }
        NonlinearOptions options = NonlinearOptions.defaults().withCheck(check);
        return bounded ? options.withBounds(lower, upper) : options;
    }

    /** d ln k/dT of a law, 1/K, by a central difference: laws state no such derivative. */
    static double slope(RateFunction law, double kelvin, double[] p) {
        double above = kelvin * (1 + STEP);
        double below = kelvin * (1 - STEP);
        double[] unused = new double[p.length];
        return (law.lnRate(above, p, unused) - law.lnRate(below, p, unused)) / (above - below);
    }

    /** The law over T, as ln k or as k in units of the first one. */
    private static final class Curve implements CurveFunction {
        private final RateFunction law;
        private final boolean logarithm;
        private final double unit;

        Curve(RateFunction law, Measurements data) {
            this.law = law;
            this.logarithm = data.response() == Measurements.Response.LN_RATE;
            this.unit = data.lnRate(0);
        }

        @Override
        public int parameterCount() {
            return law.parameters().size();
        }

        @Override
        public double value(double kelvin, double[] p, double[] gradient) {
            if (!(kelvin > 0) || !law.defined(kelvin, p)) {
                return Double.NaN;
            }
            double[] own = new double[p.length];
            double ln = law.lnRate(kelvin, p, own);
            double size = logarithm ? 1 : StrictMath.exp(ln - unit);
            for (int j = 0; j < p.length; j++) {
                gradient[j] = own[j] * size;
            }
            gradient[p.length] = slope(law, kelvin, p) * size;
            return logarithm ? ln : size;
        }
    }
}
