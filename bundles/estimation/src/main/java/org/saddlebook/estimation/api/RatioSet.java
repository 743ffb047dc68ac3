package org.saddlebook.estimation.api;

/**
 * All values of a ratio that data do not exclude (Fieller 1954). It is a set of whatever kind, not always an interval:
 * only the set covers with the stated probability over all campaigns, its bounded cases alone do not.
 */
public sealed interface RatioSet {
    /** Whether a ratio lies in the set. */
    boolean contains(double ratio);

    /** {@code lower <= x <= upper}: the denominator differs from zero. */
    record Bounded(double lower, double upper) implements RatioSet {
        @Override
        public boolean contains(double ratio) {
            return ratio >= lower && ratio <= upper;
        }
    }

    /** {@code x <= lowerRayEnd} or {@code x >= upperRayStart}: the denominator may be zero, the numerator not. */
    record TwoRays(double lowerRayEnd, double upperRayStart) implements RatioSet {
        @Override
        public boolean contains(double ratio) {
            return ratio <= lowerRayEnd || ratio >= upperRayStart;
        }
    }

    /** {@code x <= upper}: the denominator lies exactly on the edge of differing from zero. */
    record AtMost(double upper) implements RatioSet {
        @Override
        public boolean contains(double ratio) {
            return ratio <= upper;
        }
    }

    /** {@code x >= lower}: the denominator lies exactly on the edge of differing from zero. */
    record AtLeast(double lower) implements RatioSet {
        @Override
        public boolean contains(double ratio) {
            return ratio >= lower;
        }
    }

    /** Every value: the ratio is not determined. */
    record WholeLine() implements RatioSet {
        @Override
        public boolean contains(double ratio) {
            return true;
        }
    }
}
