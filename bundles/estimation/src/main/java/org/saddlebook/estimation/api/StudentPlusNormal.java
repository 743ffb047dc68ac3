package org.saddlebook.estimation.api;

/**
 * The sum of a scaled t variable and an independent scaled normal one: an error whose scale was estimated from scatter
 * beside one whose standard uncertainty is stated. Given the chi-squared variable behind t the sum is normal, so the tail
 * is one smooth integral over it, taken by the trapezoidal rule in its logarithm (which converges geometrically for such
 * an integrand; L. N. Trefethen and J. A. C. Weideman, SIAM Rev. 56 (2014) 385). No random numbers, no approximate
 * degrees of freedom.
 */
public final class StudentPlusNormal {
    private static final double STEP = 0.125;
    /** Weights below this share of the largest one are left out. */
    private static final double NEGLIGIBLE = 1e-20;

    private static final int LIMIT = 200;

    private StudentPlusNormal() {}

    /**
     * The value that is exceeded with probability {@code 1 - probability} by {@code tScale * t + normalScale * z}.
     *
     * @param probability strictly between 0 and 1
     * @param tScale standard uncertainty whose scale was estimated; not negative
     * @param dof degrees of freedom of that estimate; positive
     * @param normalScale stated standard uncertainty; not negative
     * @return the quantile, to about 12 digits
     */
    public static double quantile(double probability, double tScale, double dof, double normalScale) {
        require(tScale, "tScale");
        require(normalScale, "normalScale");
        if (normalScale == 0) {
            return tScale == 0 ? 0 : tScale * StudentT.quantile(probability, dof);
        }
        if (tScale == 0) {
            return normalScale * Normal.quantile(probability);
        }
        double tail = Math.min(probability, 1 - probability);
        if (tail == 0.5) {
            return 0;
        }
        Mixture mixture = new Mixture(tScale, dof, normalScale);
        double t = tScale * -StudentT.quantile(tail, dof);
        double z = normalScale * -Normal.quantile(tail);
        // Neither part alone reaches as far as both, and both together not as far as their sum.
        double low = Math.max(t, z);
        double high = t + z;
        double x = Math.sqrt(t * t + z * z);
        for (int i = 0; i < LIMIT; i++) {
            double excess = mixture.upperTail(x) - tail;
            if (excess > 0) {
                low = x;
            } else {
                high = x;
            }
            double next = x + excess / mixture.density(x);
            if (!(next > low && next < high)) {
                next = 0.5 * (low + high);
            }
            if (Math.abs(next - x) <= 1e-13 * x) {
                return Math.copySign(next, probability - 0.5);
            }
            x = next;
        }
        return Math.copySign(x, probability - 0.5);
    }

    private static void require(double scale, String name) {
        if (!(scale >= 0) || Double.isInfinite(scale)) {
            throw new IllegalArgumentException(name + " is " + scale + "; it must be finite and not negative");
        }
    }

    /** Normal laws of different width with their weights. */
    private static final class Mixture {
        private static final double ROOT_TWO_PI = Math.sqrt(2 * Math.PI);

        private final double[] width;
        private final double[] weight;

        Mixture(double tScale, double dof, double normalScale) {
            if (!(dof > 0)) {
                throw new IllegalArgumentException("dof is " + dof + "; it must be positive");
            }
            // In y = ln chi2 the density is exp(dof y/2 - exp(y)/2) up to a factor, largest at y = ln dof.
            double peak = StrictMath.log(dof);
            int below = 0;
            while (relative(peak - STEP * below, dof, peak) > NEGLIGIBLE && below < 100_000) {
                below++;
            }
            int above = 0;
            while (relative(peak + STEP * above, dof, peak) > NEGLIGIBLE && above < 100_000) {
                above++;
            }
            width = new double[below + above + 1];
            weight = new double[width.length];
            double sum = 0;
            for (int i = 0; i < width.length; i++) {
                double y = peak + STEP * (i - below);
                double ratio = dof / StrictMath.exp(y);
                width[i] = Math.sqrt(tScale * tScale * ratio + normalScale * normalScale);
                weight[i] = relative(y, dof, peak);
                sum += weight[i];
            }
            for (int i = 0; i < weight.length; i++) {
                weight[i] /= sum;
            }
        }

        private static double relative(double y, double dof, double peak) {
            return StrictMath.exp(dof / 2 * (y - peak) - (StrictMath.exp(y) - dof) / 2);
        }

        double upperTail(double x) {
            double sum = 0;
            for (int i = 0; i < width.length; i++) {
                sum += weight[i] * Normal.upperTail(x / width[i]);
            }
            return sum;
        }

        double density(double x) {
            double sum = 0;
            for (int i = 0; i < width.length; i++) {
                double z = x / width[i];
                sum += weight[i] * StrictMath.exp(-z * z / 2) / (width[i] * ROOT_TWO_PI);
            }
            return sum;
        }
    }
}
