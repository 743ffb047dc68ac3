package org.saddlebook.data.checks.internal;

import java.util.OptionalDouble;
import org.saddlebook.api.campaign.RatePoint;

/**
 * One used row of the table.
 *
 * @param number place among the rows of the table, from 1; excluded rows count
 * @param point what stands in it
 * @param lnRate ln of the SI rate constant
 * @param lnUncertainty relative standard uncertainty of k; absent when not stated
 */
record Row(int number, RatePoint point, double lnRate, OptionalDouble lnUncertainty) {
    static Row of(int number, RatePoint point) {
        OptionalDouble uncertainty = point.rateUncertainty().isPresent()
                ? OptionalDouble.of(point.rateUncertainty().getAsDouble() / point.rate())
                : OptionalDouble.empty();
        return new Row(number, point, StrictMath.log(point.rate()), uncertainty);
    }

    double kelvin() {
        return point.kelvin();
    }
}
