package org.saddlebook.estimation.api;

import java.util.OptionalDouble;

/** Criteria that compare fits to the same response: K. P. Burnham &amp; D. R. Anderson, Model Selection (2002). */
public final class InformationCriteria {
    private InformationCriteria() {}

    /**
     * Akaike's criterion with the correction for small samples, {@code -2 ln L + 2 k + 2 k (k + 1) / (n - k - 1)}.
     *
     * @param minusTwoLnL minus twice the log-likelihood; chi-squared when every uncertainty is stated
     * @param k parameters; counts the scale when it is estimated
     * @param n observations
     * @return empty for {@code n <= k + 1}, where the correction has no value
     */
    public static OptionalDouble aicc(double minusTwoLnL, int k, int n) {
        require(minusTwoLnL, k, n);
        if (n <= k + 1) {
            return OptionalDouble.empty();
        }
        return OptionalDouble.of(minusTwoLnL + 2.0 * k + 2.0 * k * (k + 1.0) / (n - k - 1.0));
    }

    /**
     * Schwarz's criterion, {@code -2 ln L + k ln n}.
     *
     * @param minusTwoLnL as in {@link #aicc}
     * @param k as in {@link #aicc}
     * @param n observations
     */
    public static double bic(double minusTwoLnL, int k, int n) {
        require(minusTwoLnL, k, n);
        return minusTwoLnL + k * StrictMath.log(n);
    }

    /**
     * Minus twice the log-likelihood of normal residuals whose variance is estimated as {@code rss / n}, with the full
     * constant: {@code n (ln(2 pi rss / n) + 1)}. Observations of unequal weight w add {@code - sum ln w}, the same for
     * every model of one data set.
     *
     * @param rss residual sum of squares, above zero
     * @param n observations
     */
    public static double minusTwoLogLikelihood(double rss, int n) {
        if (!(rss > 0) || n < 1) {
            throw new IllegalArgumentException(
                    "a positive sum of squares and observations are needed: " + rss + ", " + n);
        }
        return n * (StrictMath.log(2 * Math.PI * (rss / n)) + 1);
    }

    private static void require(double minusTwoLnL, int k, int n) {
        if (Double.isNaN(minusTwoLnL) || k < 0 || n < 1) {
            throw new IllegalArgumentException(
                    "likelihood " + minusTwoLnL + ", " + k + " parameters, " + n + " observations");
        }
    }
}
