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

    /** One evaluation of a tail. */
    interface Tail {
        /**
         * Evaluates the tail.
         *
         * @param x positive argument
         * @param result receives the probability and its absolute derivative with respect to ln x
         */
        void at(double x, double[] result);
    }

    /**
     * Finds x with a tail of the given probability.
     *
     * @param tail the tail
     * @param rising whether the tail grows with x
     * @param probability wanted, above zero
     * @param start positive guess
     */
    static double solve(Tail tail, boolean rising, double probability, double start) {
        double[] at = new double[2];
        double x = start;
        double known = start;
        for (int i = 0; i < LIMIT; i++) {
            tail.at(x, at);
            if (!(at[0] > 0 && at[1] > 0)) {
                // Underflow: the step went too far out; back half-way to where there was a value.
                if (x == known) {
                    x *= rising ? 2 : HALF;
                    known = x;
                } else {
                    x = Math.sqrt(x) * Math.sqrt(known);
                }
                continue;
            }
            double step = StrictMath.log(at[0] / probability) * at[0] / at[1];
            step = Math.max(-LARGEST_STEP, Math.min(LARGEST_STEP, rising ? -step : step));
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
