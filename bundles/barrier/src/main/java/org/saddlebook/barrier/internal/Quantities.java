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
 * @param quantile two-sided quantile of the level
 * @param level coverage probability
 * @param method word for the quantile
 */
record Quantities(double quantile, double level, String method) {
    /** Quantities with the quantile that belongs to these degrees of freedom; normal when they are empty. */
    static Quantities of(OptionalDouble degreesOfFreedom, double level) {
        // Without a degree of freedom there is no scale, hence no variance and no use of the quantile.
        boolean usable = degreesOfFreedom.isEmpty() || degreesOfFreedom.getAsDouble() > 0;
        return new Quantities(
                usable ? FittedLaw.quantile(level, degreesOfFreedom) : Double.NaN,
                level,
                FittedLaw.method(degreesOfFreedom));
    }

    /** A quantity on either scale; logarithms become values with a factor. */
    Node.Quantity of(FittedLaw.Estimate estimate, Parameter.Scale scale, Unit unit, List<String> cautions) {
        return scale == Parameter.Scale.LOG ? logarithmic(estimate, unit, cautions) : linear(estimate, unit, cautions);
    }

    private Node.Quantity linear(FittedLaw.Estimate estimate, Unit unit, List<String> cautions) {
        double value = unit.fromSi(estimate.value());
        if (estimate.variance().isEmpty()) {
            return Node.Quantity.of(value, unit.code()).withCautions(cautions);
        }
        double u = Math.sqrt(estimate.variance().getAsDouble()) / unit.factor();
        return Node.Quantity.of(value, unit.code(), u)
                .withInterval(Interval.between(value - quantile * u, value + quantile * u, level, method))
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
        double u = Math.sqrt(estimate.variance().getAsDouble());
        double factor = StrictMath.exp(u);
        return new Node.Quantity(
                shown,
                unit.code(),
                OptionalDouble.empty(),
                Double.isFinite(factor) ? OptionalDouble.of(factor) : OptionalDouble.empty(),
                Optional.of(limits(
                        StrictMath.exp(estimate.value() - quantile * u) / unit.factor(),
                        StrictMath.exp(estimate.value() + quantile * u) / unit.factor())),
                cautions);
    }

    /** Limits beyond the range of a double leave that side open. */
    private Interval limits(double lower, double upper) {
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
}
