package org.saddlebook.estimation.api;

import org.saddlebook.estimation.internal.IncompleteGamma;
import org.saddlebook.estimation.internal.Quantiles;

/** The standard normal distribution, from the incomplete gamma function (DLMF 7.11.1-2); relative accuracy near 1e-15. */
public final class Normal {
    private static final double HALF = 0.5;

    private Normal() {}

    /**
     * The value that is exceeded with probability {@code 1 - probability}.
     *
     * @param probability strictly between zero and one
     */
    public static double quantile(double probability) {
        Quantiles.requireProbability(probability);
        if (probability == HALF) {
            return 0;
        }
        double tail = Math.min(probability, 1 - probability);
        double halfSquare = tail > 0.25
                ? Quantiles.gammaLower(HALF, 2 * Math.abs(probability - HALF), HALF)
                : Quantiles.gammaUpper(HALF, 2 * tail, -StrictMath.log(tail));
        return Math.copySign(Math.sqrt(2 * halfSquare), probability - HALF);
    }

    /** Probability of a value above z. */
    public static double upperTail(double z) {
        if (Double.isNaN(z)) {
            throw new IllegalArgumentException("z is NaN");
        }
        IncompleteGamma square = new IncompleteGamma(HALF).at(z * z / 2);
        return z > 0 ? HALF * square.upper() : HALF + HALF * square.lower();
    }
}
