package org.saddlebook.window.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Node;
import org.saddlebook.estimation.api.Normal;
import org.saddlebook.estimation.api.StudentPlusNormal;

/**
 * Intervals of ln k and of what follows from it. With one law left they are exact: Student's t for the scatter of the
 * runs, normal for stated and shared errors, their sum where both are there. With several laws they are quantiles of the
 * draws, so that the choice of the law is in them.
 *
 * @param laws the laws that remain; the first is the preferred one
 * @param draws draws spread over the laws
 * @param lowest coldest measured temperature, K
 * @param highest hottest measured temperature, K
 * @param level coverage probability
 */
record Rates(List<BoundLaw> laws, Draws draws, double lowest, double highest, double level) {
    BoundLaw best() {
        return laws.get(0);
    }

    /** Distance outside the measured temperatures, K; 0 inside. */
    double extrapolation(double kelvin) {
        return Math.max(0, Math.max(lowest - kelvin, kelvin - highest));
    }

    /**
     * ln of something at the best estimate, with how far it reaches.
     *
     * @param value best estimate
     * @param below distance to the value exceeded with probability {@code p}, {@code [two-sided, one-sided]}; positive
     * @param above distance to the value exceeded with probability {@code 1 − p}
     * @param standard standard uncertainty; for draws half the spread of the middle 68.27 %
     * @param method {@code t}, {@code normal}, {@code t+normal} or {@code draws}
     */
    @SuppressWarnings("ArrayRecordComponent") // compared by nobody; handed over inside this package only
    record Spread(double value, double[] below, double[] above, double standard, String method) {
        /** The spread of what falls as this rises. */
        Spread inverse(double sum) {
            return new Spread(sum - value, above, below, standard, method);
        }
    }

    /** ln k at a temperature. */
    Spread lnRate(double kelvin) {
        BoundLaw.At at = best().at(kelvin);
        if (laws.size() == 1) {
            return spread(at.lnRate(), at.gradient(), at.sensor());
        }
        return ofDraws(at.lnRate(), draws.lnRates(kelvin));
    }

    /** Quantiles of draws around a best estimate. */
    Spread ofDraws(double value, double[] drawn) {
        double two = (1 - level) / 2;
        double[] below = {value - WindowSearch.quantile(drawn, two), value - WindowSearch.quantile(drawn, 1 - level)};
        double[] above = {WindowSearch.quantile(drawn, 1 - two) - value, WindowSearch.quantile(drawn, level) - value};
        double half = (WindowSearch.quantile(drawn, 0.841345) - WindowSearch.quantile(drawn, 0.158655)) / 2;
        return new Spread(value, below, above, half, "draws");
    }

    /** Something linear in the parameters of the preferred law. */
    Spread spread(double value, double[] gradient, double[] sensor) {
        double[] u = best().uncertainties(gradient, sensor);
        double[] half = {quantile(0.5 + level / 2, u), quantile(level, u)};
        OptionalDouble dof = best().degreesOfFreedom();
        String method = dof.isEmpty() ? "normal" : u[1] > 0 ? "t+normal" : "t";
        return new Spread(value, half, half, Math.sqrt(u[0] * u[0] + u[1] * u[1]), method);
    }

    private double quantile(double probability, double[] u) {
        OptionalDouble dof = best().degreesOfFreedom();
        return dof.isPresent()
                ? StudentPlusNormal.quantile(probability, u[0], dof.getAsDouble(), u[1])
                : Normal.quantile(probability) * Math.sqrt(u[0] * u[0] + u[1] * u[1]);
    }

    /** A positive quantity from its logarithm in SI, with its two-sided interval. */
    Node.Quantity quantity(Spread ln, double factor, String unit, List<String> cautions) {
        double value = StrictMath.exp(ln.value()) / factor;
        double standard = StrictMath.exp(ln.standard());
        return new Node.Quantity(
                finite(value),
                unit,
                OptionalDouble.empty(),
                Double.isFinite(standard) ? OptionalDouble.of(standard) : OptionalDouble.empty(),
                Optional.of(limits(
                        StrictMath.exp(ln.value() - ln.below()[0]) / factor,
                        StrictMath.exp(ln.value() + ln.above()[0]) / factor,
                        ln.method())),
                cautions);
    }

    /** The same with its one-sided lower bound. */
    Node.Quantity atLeast(Spread ln, double factor, String unit, List<String> cautions) {
        double bound = StrictMath.exp(ln.value() - ln.below()[1]) / factor;
        return bound(ln, factor, unit, cautions, Interval.Kind.AT_LEAST, bound);
    }

    /** The same with its one-sided upper bound. */
    Node.Quantity atMost(Spread ln, double factor, String unit, List<String> cautions) {
        double bound = StrictMath.exp(ln.value() + ln.above()[1]) / factor;
        return bound(ln, factor, unit, cautions, Interval.Kind.AT_MOST, bound);
    }

    private Node.Quantity bound(
            Spread ln, double factor, String unit, List<String> cautions, Interval.Kind kind, double bound) {
        boolean lower = kind == Interval.Kind.AT_LEAST;
        return new Node.Quantity(
                finite(StrictMath.exp(ln.value()) / factor),
                unit,
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                Double.isNaN(bound)
                        ? Optional.empty()
                        : Optional.of(new Interval(
                                kind,
                                level,
                                lower ? OptionalDouble.of(bound) : OptionalDouble.empty(),
                                lower ? OptionalDouble.empty() : OptionalDouble.of(bound),
                                ln.method())),
                cautions);
    }

    private static OptionalDouble finite(double value) {
        return Double.isFinite(value) ? OptionalDouble.of(value) : OptionalDouble.empty();
    }

    private Interval limits(double lower, double upper, String method) {
        boolean low = lower > 0 && Double.isFinite(lower);
        boolean high = Double.isFinite(upper);
        if (low && high) {
            return Interval.between(lower, upper, level, method);
        }
        if (low) {
            return new Interval(
                    Interval.Kind.AT_LEAST, level, OptionalDouble.of(lower), OptionalDouble.empty(), method);
        }
        return high
                ? new Interval(Interval.Kind.AT_MOST, level, OptionalDouble.empty(), OptionalDouble.of(upper), method)
                : Interval.everything(level, method);
    }

    /** Cautions of a prediction at a temperature. */
    List<String> cautions(double kelvin, String... more) {
        List<String> ids = new ArrayList<>();
        if (extrapolation(kelvin) > 0) {
            ids.add("extrapolated");
        }
        ids.add("same-mechanism");
        if (laws.size() > 1) {
            ids.add(WindowCautions.LAWS_DIFFER);
        }
        return WindowCautions.with(WindowCautions.with(ids, more), "parameters-do-not-transfer");
    }
}
