package org.saddlebook.barrier.internal;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.Parameter;
import org.saddlebook.api.quantity.Unit;

/**
 * Turns estimates into quantities of the findings.
 *
 * @param level coverage probability
 * @param degreesOfFreedom of the scale; empty for normal quantiles
 */
record Quantities(double level, OptionalDouble degreesOfFreedom) {
    /** A quantity on either scale; logarithms become values with a factor. */
    Node.Quantity of(FittedLaw.Estimate estimate, Parameter.Scale scale, Unit unit, List<String> cautions) {
        return scale == Parameter.Scale.LOG ? logarithmic(estimate, unit, cautions) : linear(estimate, unit, cautions);
    }

    private Node.Quantity linear(FittedLaw.Estimate estimate, Unit unit, List<String> cautions) {
        double value = unit.fromSi(estimate.value());
        if (estimate.variance().isEmpty()) {
            return Node.Quantity.of(value, unit.code()).withCautions(cautions);
        }
        double half = estimate.halfWidth(level, degreesOfFreedom) / unit.factor();
        return Node.Quantity.of(value, unit.code(), estimate.standardUncertainty() / unit.factor())
                .withInterval(Interval.between(value - half, value + half, level, method(estimate)))
                .withCautions(cautions);
    }

    private Node.Quantity logarithmic(FittedLaw.Estimate estimate, Unit unit, List<String> cautions) {
        double value = StrictMath.exp(estimate.value()) / unit.factor();
        boolean representable = value > 0 && Double.isFinite(value);
        OptionalDouble shown = representable ? OptionalDouble.of(value) : OptionalDouble.empty();
        if (estimate.variance().isEmpty()) {
            return new Node.Quantity(
                    shown, unit.code(), OptionalDouble.empty(), OptionalDouble.empty(), Optional.empty(), cautions);
        }
        double half = estimate.halfWidth(level, degreesOfFreedom);
        double factor = StrictMath.exp(estimate.standardUncertainty());
        return new Node.Quantity(
                shown,
                unit.code(),
                OptionalDouble.empty(),
                Double.isFinite(factor) ? OptionalDouble.of(factor) : OptionalDouble.empty(),
                Optional.of(limits(
                        StrictMath.exp(estimate.value() - half) / unit.factor(),
                        StrictMath.exp(estimate.value() + half) / unit.factor(),
                        method(estimate))),
                cautions);
    }

    /**
     * What one more run would read when its error is an absolute one of k. On each side the half-width of the mean, on ln k,
     * and that of the run, on k, are added in quadrature. A reading may be zero or less: the interval is then open below.
     *
     * @param lnRate ln k in SI with its variance, which is present
     * @param deviation standard deviation of the run, SI
     */
    Node.Quantity newRun(FittedLaw.Estimate lnRate, double deviation, Unit unit, List<String> cautions) {
        double k = StrictMath.exp(lnRate.value());
        double half = lnRate.halfWidth(level, degreesOfFreedom);
        double own = FittedLaw.quantile(level, degreesOfFreedom) * deviation;
        double below = -k * StrictMath.expm1(-half);
        double above = k * StrictMath.expm1(half);
        double lower = (k - Math.sqrt(below * below + own * own)) / unit.factor();
        double upper = (k + Math.sqrt(above * above + own * own)) / unit.factor();
        double mean = k * lnRate.standardUncertainty();
        double uncertainty = Math.sqrt(mean * mean + deviation * deviation) / unit.factor();
        if (!Double.isFinite(uncertainty) || !Double.isFinite(upper)) {
            return Node.Quantity.of(k / unit.factor(), unit.code()).withCautions(cautions);
        }
        return Node.Quantity.of(k / unit.factor(), unit.code(), uncertainty)
                .withInterval(limits(lower, upper, method(lnRate)))
                .withCautions(cautions);
    }

    /** Limits beyond the range of a double leave that side open. */
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
        if (high) {
            return new Interval(Interval.Kind.AT_MOST, level, OptionalDouble.empty(), OptionalDouble.of(upper), method);
        }
        return Interval.everything(level, method);
    }

    /** The word for the quantile: {@code t}, {@code normal}, or {@code t+normal} where a shared error of stated size joins. */
    private String method(FittedLaw.Estimate estimate) {
        String own = FittedLaw.method(degreesOfFreedom);
        return degreesOfFreedom.isPresent() && estimate.sharedVariance() > 0 ? own + "+normal" : own;
    }
}
