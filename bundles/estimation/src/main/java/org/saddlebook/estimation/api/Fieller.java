package org.saddlebook.estimation.api;

import org.saddlebook.estimation.internal.Products;

/** Confidence set of a ratio of two normal estimates: E. C. Fieller, J. R. Stat. Soc. B 16, 175 (1954). */
public final class Fieller {
    private Fieller() {}

    /**
     * All {@code x} with {@code (a - x b)^2 <= q^2 (vaa - 2 x vab + x^2 vbb)}.
     *
     * @param a estimate of the numerator
     * @param b estimate of the denominator
     * @param vaa variance of a
     * @param vab covariance of a and b
     * @param vbb variance of b
     * @param quantile q, the two-sided quantile: Student's t where the scale is estimated, normal where it is stated
     * @return the set; never empty, it always holds {@code a / b}
     * @throws IllegalArgumentException for NaN, infinite, negative variances or quantile, or a covariance larger than the
     *     variances allow
     */
    public static RatioSet set(double a, double b, double vaa, double vab, double vbb, double quantile) {
        require(a, "a");
        require(b, "b");
        require(vab, "vab");
        requireNotNegative(vaa, "vaa");
        requireNotNegative(vbb, "vbb");
        requireNotNegative(quantile, "quantile");
        double q2 = quantile * quantile;
        double determinant = Products.difference(vaa, vbb, vab, vab);
        if (determinant < -1e-12 * vaa * vbb) {
            throw new IllegalArgumentException(
                    "covariance " + vab + " is larger than variances " + vaa + " and " + vbb + " allow");
        }
        // leading x^2 - 2 middle x + constant <= 0
        double leading = Products.difference(b, b, q2, vbb);
        double middle = Products.difference(a, b, q2, vab);
        double constant = Products.difference(a, a, q2, vaa);
        // middle^2 - leading * constant, written so that the large terms have cancelled on paper
        double spread = a * a * vbb - 2 * a * b * vab + b * b * vaa - q2 * Math.max(0, determinant);
        double root = Math.sqrt(Math.max(0, q2 * spread));
        if (leading == 0) {
            if (middle == 0) {
                return new RatioSet.WholeLine();
            }
            double end = constant / (2 * middle);
            return middle > 0 ? new RatioSet.AtLeast(end) : new RatioSet.AtMost(end);
        }
        if (leading < 0 && !(q2 * spread > 0)) {
            return new RatioSet.WholeLine();
        }
        double sum = middle >= 0 ? middle + root : middle - root;
        double first = sum / leading;
        double second = sum == 0 ? first : constant / sum;
        double low = Math.min(first, second);
        double high = Math.max(first, second);
        return leading > 0 ? new RatioSet.Bounded(low, high) : new RatioSet.TwoRays(low, high);
    }

    private static void require(double value, String name) {
        if (!(Math.abs(value) < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException(name + " is " + value + "; a finite number is needed");
        }
    }

    private static void requireNotNegative(double value, String name) {
        if (!(value >= 0 && value < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException(name + " is " + value + "; a finite number of at least 0 is needed");
        }
    }
}
