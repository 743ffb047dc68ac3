package org.saddlebook.api.campaign;

import java.util.List;
import java.util.Objects;
import org.saddlebook.api.model.Conditions;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;

/**
 * Temperature against rate constant.
 *
 * @param rateUnit unit the rate constants were stated in; results are given in it
 * @param order overall order, from the dimension of the unit
 * @param points the points in order of the source, at least one
 */
public record RateTable(Unit rateUnit, double order, List<RatePoint> points) {
    /** Checks that the order fits the unit. */
    public RateTable {
        Objects.requireNonNull(rateUnit, "rateUnit");
        if (!rateUnit.dimension().equals(Dimension.rateConstant(order))) {
            throw new IllegalArgumentException("unit " + rateUnit.code() + " is not that of order " + order);
        }
        points = List.copyOf(points);
        if (points.isEmpty()) {
            throw new IllegalArgumentException("a rate table has at least one point");
        }
    }

    /** The points that are used. */
    public List<RatePoint> used() {
        return points.stream().filter(point -> point.excluded().isEmpty()).toList();
    }

    /** Whether every used point states a condition, or one it follows from, and it is not the same at all of them. */
    public boolean varies(String condition) {
        double lowest = Double.POSITIVE_INFINITY;
        double highest = 0;
        for (RatePoint point : points) {
            if (point.excluded().isEmpty()) {
                if (!point.conditions().has(condition)) {
                    return false;
                }
                double value = condition.equals(Conditions.THIRD_BODY)
                        ? point.conditions().thirdBody(point.kelvin()).orElseThrow()
                        : point.conditions().get(condition).orElseThrow();
                lowest = Math.min(lowest, value);
                highest = Math.max(highest, value);
            }
        }
        return highest > lowest;
    }

    /** The same with other points. */
    public RateTable withPoints(List<RatePoint> newPoints) {
        return new RateTable(rateUnit, order, newPoints);
    }
}
