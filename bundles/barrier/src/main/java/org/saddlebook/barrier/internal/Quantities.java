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
