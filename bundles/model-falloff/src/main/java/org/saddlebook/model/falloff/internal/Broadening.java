package org.saddlebook.model.falloff.internal;

/** How much lower than the curve of Lindemann the rate constant lies between its limits. */
enum Broadening {
    /** Not at all: F = 1. */
    NONE,
    /**
     * {@code lg F = lg Fc/(1 + [y/(N − 0.14 y)]²)} with {@code y = lg Pr + c}, {@code c = −0.4 − 0.67 lg Fc} and {@code N =
     * 0.75 − 1.27 lg Fc}, for the collision of strength of a common bath gas.
     *
     * <p>Source: R. G. Gilbert, K. Luther and J. Troe, Ber. Bunsenges. Phys. Chem. 87 (1983) 169.
     */
    TROE;

    private static final double LN_10 = 2.302585092994046;

    /**
     * ln F.
     *
     * @param lnReduced ln Pr; plus or minus infinity is allowed
     * @param centre Fc, above 0 and at most 1
     * @param slopes receives d ln F/d ln Pr and d ln F/dFc
     */
    double lnFactor(double lnReduced, double centre, double[] slopes) {
        slopes[0] = 0;
        slopes[1] = 0;
        if (this == NONE) {
            return 0;
        }
        double lg = StrictMath.log10(centre);
        // Beyond this F no longer changes, and squares could overflow.
        double far = Math.max(-1e6, Math.min(1e6, lnReduced / LN_10));
        double y = far - 0.4 - 0.67 * lg;
        double q = 0.75 - 1.27 * lg - 0.14 * y;
        // With q² multiplied out there is no pole where q = 0.
        double sum = q * q + y * y;
        double weight = q * q / sum;
        double byQ = 2 * q * y / sum * (y / sum);
        double byY = -2 * q * y / sum * (q / sum);
        slopes[0] = lg * (byY - 0.14 * byQ);
        double perLg = weight + lg * (-0.67 * byY + (-1.27 + 0.14 * 0.67) * byQ);
        slopes[1] = perLg / centre;
        return LN_10 * lg * weight;
    }
}
