package org.saddlebook.estimation.internal;

/** Checks of what callers hand in. */
public final class Inputs {
    /** Squares and sums of a few thousand numbers up to here stay finite. */
    static final double LARGEST = 1e150;

    private Inputs() {}

    /** The response, checked and copied. */
    public static double[] response(double[] response, int n) {
        if (response.length != n) {
            throw new IllegalArgumentException("response has " + response.length + " values for " + n + " rows");
        }
        double[] copy = response.clone();
        for (int i = 0; i < n; i++) {
            requireNumber(copy[i], "response", i);
        }
        return copy;
    }

    /** The weights, checked and copied; null stays null. */
    public static double[] weights(double[] weightsOrNull, int n) {
        if (weightsOrNull == null) {
            return null;
        }
        if (weightsOrNull.length != n) {
            throw new IllegalArgumentException("there are " + weightsOrNull.length + " weights for " + n + " rows");
        }
        double[] copy = weightsOrNull.clone();
        for (int i = 0; i < n; i++) {
            if (!(copy[i] >= 0 && copy[i] <= LARGEST)) {
                throw new IllegalArgumentException(
                        "weight[" + i + "] is " + copy[i] + "; a weight is a number from 0 to " + LARGEST);
            }
        }
        return copy;
    }

    /** Refuses what is not an ordinary number. */
    public static void requireNumber(double value, String name, int index) {
        if (!(Math.abs(value) <= LARGEST)) {
            throw new IllegalArgumentException(
                    name + "[" + index + "] is " + value + "; a finite number up to " + LARGEST + " is needed");
        }
    }
}
