package org.saddlebook.reaction.series.internal;

import java.util.OptionalDouble;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.estimation.api.RatioSet;

/** A Fieller set of a temperature, cut to what lies above 0 K. */
final class TemperatureSet {
    private TemperatureSet() {}

    static Interval of(RatioSet set, double level) {
        if (set instanceof RatioSet.Bounded bounded) {
            return bounded(bounded.lower(), bounded.upper(), level);
        }
        if (set instanceof RatioSet.TwoRays rays) {
            return rays(rays.lowerRayEnd(), rays.upperRayStart(), level);
        }
        if (set instanceof RatioSet.AtLeast atLeast) {
            return atLeast(atLeast.lower(), level);
        }
        if (set instanceof RatioSet.AtMost atMost) {
            return atMost(atMost.upper(), level);
        }
        return Interval.everything(level, "fieller");
    }

    private static Interval bounded(double lower, double upper, double level) {
        if (!(upper > 0)) {
            return none(level);
        }
        return lower > 0 ? Interval.between(lower, upper, level, "fieller") : atMost(upper, level);
    }

    private static Interval rays(double lowerEnd, double upperStart, double level) {
        if (!(upperStart > 0)) {
            return Interval.everything(level, "fieller");
        }
        if (!(lowerEnd > 0)) {
            return atLeast(upperStart, level);
        }
        return new Interval(
                Interval.Kind.OUTSIDE, level, OptionalDouble.of(lowerEnd), OptionalDouble.of(upperStart), "fieller");
    }

    private static Interval atLeast(double lower, double level) {
        return lower > 0
                ? new Interval(
                        Interval.Kind.AT_LEAST, level, OptionalDouble.of(lower), OptionalDouble.empty(), "fieller")
                : Interval.everything(level, "fieller");
    }

    private static Interval atMost(double upper, double level) {
        return upper > 0
                ? new Interval(
                        Interval.Kind.AT_MOST, level, OptionalDouble.empty(), OptionalDouble.of(upper), "fieller")
                : none(level);
    }

    private static Interval none(double level) {
        return new Interval(Interval.Kind.NONE, level, OptionalDouble.empty(), OptionalDouble.empty(), "fieller");
    }
}
