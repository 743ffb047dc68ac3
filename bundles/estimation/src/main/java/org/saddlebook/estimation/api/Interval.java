package org.saddlebook.estimation.api;

/**
 * A bounded interval.
 *
 * @param lower end
 * @param upper end, not below
 */
public record Interval(double lower, double upper) {
    /** Whether a value lies inside or on an end. */
    public boolean contains(double value) {
        return value >= lower && value <= upper;
    }
}
