package org.saddlebook.window.internal;

/**
 * Time to a conversion for A ⇌ B, both directions of first order, from A alone: with {@code q = 1/K},
 * {@code k t = −ln(1 − x(1 + q)) / (1 + q)} (K. J. Laidler, Chemical Kinetics, 3rd ed. (1987), section 2.6). Grows with q,
 * without limit where the equilibrium conversion {@code 1/(1 + q)} falls to x. k in 1/s is that of the forward direction.
 */
final class ReversibleTime {
    private static final double STEP = 1.0 / 64;
    private static final int ENTRIES = 40 * 64 + 1;

    private final double conversion;
    private final double lnLimit;
    private final double lnLeast;
    private final double[] needed = new double[ENTRIES];

    /**
     * A limit on the time.
     *
     * @param conversion 0 to 1, both excluded
     * @param seconds time allowed
     */
    ReversibleTime(double conversion, double seconds) {
        this.conversion = conversion;
        lnLimit = StrictMath.log(seconds);
        lnLeast = StrictMath.log(conversion / (1 - conversion));
        for (int i = 0; i < ENTRIES; i++) {
            needed[i] = i == 0 ? Double.POSITIVE_INFINITY : lnNeeded(lnLeast + i * STEP);
        }
    }

    /** ln of {@code k t} at the conversion, for this ln K; infinite where it is never reached. */
    static double lnProgress(double conversion, double lnEquilibrium) {
        double back = 1 + StrictMath.exp(-lnEquilibrium);
        double rest = conversion * back;
        return rest < 1 ? StrictMath.log(-StrictMath.log1p(-rest) / back) : Double.POSITIVE_INFINITY;
    }

    /** ln of the smallest k that is fast enough at this ln K; infinite where none is. */
    double lnNeeded(double lnEquilibrium) {
        return lnProgress(conversion, lnEquilibrium) - lnLimit;
    }

    /**
     * Whether k is fast enough. Because the needed k falls with K, the neighbours in a table decide nearly always and the
     * logarithms are spared; the answer is the same as without the table.
     */
    boolean holds(double lnRate, double lnEquilibrium) {
        double place = (lnEquilibrium - lnLeast) * (1 / STEP);
        if (!(place > 0)) {
            return false;
        }
        if (place < ENTRIES - 1) {
            int index = (int) place;
            if (lnRate >= needed[index]) {
                return true;
            }
            if (lnRate < needed[index + 1]) {
                return false;
            }
        }
        return lnRate >= lnNeeded(lnEquilibrium);
    }
}
