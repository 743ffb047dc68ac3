package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.estimation.api.Normal;

/**
 * ln k averaged over laws with Akaike weights w, its standard error
 * {@code sum w sqrt((t/z)^2 u^2 + (ln k_i - mean)^2)} so that the disagreement of the laws widens the interval
 * (K. P. Burnham and D. R. Anderson, Model Selection and Multimodel Inference, 2nd ed., Springer 2002, section 4.3).
 */
final class ModelAverage {
    private final List<FittedLaw> laws;
    private final Map<String, Double> weights;
    private final Unit rateUnit;
    private final double level;
    private final boolean onSameSensor;

    /** Averages the laws that have a weight and an uncertainty. */
    ModelAverage(
            List<FittedLaw> fitted, Map<String, Double> weights, Unit rateUnit, double level, boolean onSameSensor) {
        this.laws = new ArrayList<>();
        for (FittedLaw law : fitted) {
            if (weights.containsKey(law.id()) && law.scale().isPresent()) {
                laws.add(law);
            }
        }
        this.weights = weights;
        this.rateUnit = rateUnit;
        this.level = level;
        this.onSameSensor = onSameSensor;
    }

    /** A row for each temperature; empty with fewer than two laws to average. */
    Optional<Node.Items> rows(List<Double> targetsKelvin) {
        if (laws.size() < 2 || targetsKelvin.isEmpty()) {
            return Optional.empty();
        }
        List<Node> rows = new ArrayList<>();
        for (double kelvin : targetsKelvin) {
            if (laws.stream().allMatch(law -> law.defined(kelvin))) {
                rows.add(row(kelvin));
            }
        }
        return rows.isEmpty() ? Optional.empty() : Optional.of(new Node.Items(rows));
    }

    private Node.Group row(double kelvin) {
        double z = Normal.quantile(0.5 + level / 2);
        double total = 0;
        double mean = 0;
        double lowest = Double.POSITIVE_INFINITY;
        double highest = Double.NEGATIVE_INFINITY;
        for (FittedLaw law : laws) {
            double value = law.lnRate(kelvin, onSameSensor).value();
            total += weights.get(law.id());
            mean += weights.get(law.id()) * value;
            lowest = Math.min(lowest, value);
            highest = Math.max(highest, value);
        }
        mean /= total;
        double error = 0;
        for (FittedLaw law : laws) {
            FittedLaw.Estimate estimate = law.lnRate(kelvin, onSameSensor);
            double half = estimate.halfWidth(level, law.degreesOfFreedom()) / z;
            double away = estimate.value() - mean;
            error += weights.get(law.id()) / total * Math.sqrt(half * half + away * away);
        }
        return new Tree()
                .put("temperature", Node.Quantity.of(kelvin, "K"))
                .put("k", quantity(mean, error, z))
                .put("spreadBetweenLaws", OptionalDouble.of(StrictMath.exp(highest - lowest)))
                .group();
    }

    private Node.Quantity quantity(double ln, double error, double z) {
        double unit = rateUnit.factor();
        double value = StrictMath.exp(ln) / unit;
        double lower = StrictMath.exp(ln - z * error) / unit;
        double upper = StrictMath.exp(ln + z * error) / unit;
        double factor = StrictMath.exp(error);
        boolean shown = value > 0 && Double.isFinite(factor);
        Optional<Interval> interval = lower > 0 && Double.isFinite(upper)
                ? Optional.of(Interval.between(lower, upper, level, "model-averaged"))
                : Optional.of(Interval.everything(level, "model-averaged"));
        return new Node.Quantity(
                shown && Double.isFinite(value) ? OptionalDouble.of(value) : OptionalDouble.empty(),
                rateUnit.code(),
                OptionalDouble.empty(),
                Double.isFinite(factor) ? OptionalDouble.of(factor) : OptionalDouble.empty(),
                interval,
                List.of("same-mechanism"));
    }
}
