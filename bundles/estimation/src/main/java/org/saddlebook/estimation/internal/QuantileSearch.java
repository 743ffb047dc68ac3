package org.saddlebook.estimation.internal;

/**
 * Newton's method for a quantile on logarithmic scales of both variable and probability, where all tails met here are
 * concave: from any start the second step lies on the safe side and the rest approach the root from there.
 */
final class QuantileSearch {
    private static final int LIMIT = 200;
    private static final double LARGEST_STEP = 30;
    private static final double HALF = 0.5;

    private QuantileSearch() {}

    /** A distribution on the positive numbers. */
    interface Tails {
        /** Moves to an argument. */
        void move(double x);

        /** Probability below the argument. */
        double lower();

        /** Probability above the argument. */
        double upper();

        /** Density with respect to the logarithm of the argument. */
        double slope();
    }

    /**
     * Finds the argument below (or above) which the given probability lies.
     *
     * @param tails the distribution
     * @param below whether the probability is the one below
     * @param probability wanted, above zero
     * @param start positive guess
     */
    static double solve(Tails tails, boolean below, double probability, double start) {
        double x = start;
        double known = start;
        for (int i = 0; i < LIMIT; i++) {
            tails.move(x);
            double tail = below ? tails.lower() : tails.upper();
            double slope = tails.slope();
            if (!(tail > 0 && slope > 0)) {
                // Underflow: the step went too far out; back half-way to where there was a value.
                if (x == known) {
                    x *= below ? 2 : HALF;
                    known = x;
                } else {
                    x = Math.sqrt(x) * Math.sqrt(known);
                }
                continue;
            }
            double step = StrictMath.log(tail / probability) * tail / slope;
            step = Math.max(-LARGEST_STEP, Math.min(LARGEST_STEP, below ? -step : step));
            known = x;
            x = Math.max(Double.MIN_NORMAL, Math.min(Double.MAX_VALUE, x * StrictMath.exp(step)));
            if (Math.abs(step) < 1e-9) {
                // The error of the next step would be the square of this one.
                break;
            }
        }
        return x;
    }
}
