package org.saddlebook.window.internal;

/**
 * {@code exp} for sums over millions of draws, several times as fast as StrictMath and the same bits everywhere: nothing but
 * additions, multiplications and rounding, which IEEE 754 defines. Argument reduction by multiples of ln 2 in two parts (W. J.
 * Cody and W. Waite, Software Manual for the Elementary Functions, 1980) and the Taylor polynomial of degree 11 on
 * [−ln 2/2, ln 2/2], whose remainder is below 7e-15.
 */
final class FastExp {
    private static final double PER_LN_2 = 1.4426950408889634;

    /** The leading bits of ln 2, so that multiples are exact; and the rest. */
    private static final double LN_2_HIGH = 0.6931471803691238;

    private static final double LN_2_LOW = 1.9082149292705877e-10;
    private static final double SMALLEST = -708;
    private static final double LARGEST = 709;
    private static final int BIAS = 1023;
    private static final int MANTISSA_BITS = 52;

    private FastExp() {}

    /** e to the x; 0 below −708, infinite above 709, NaN for NaN. */
    static double exp(double x) {
        if (!(x > SMALLEST && x < LARGEST)) {
            return x <= SMALLEST ? 0 : x >= LARGEST ? Double.POSITIVE_INFINITY : Double.NaN;
        }
        double n = Math.rint(x * PER_LN_2);
        double r = (x - n * LN_2_HIGH) - n * LN_2_LOW;
        double p = 1.0 / 39_916_800;
        p = p * r + 1.0 / 3_628_800;
        p = p * r + 1.0 / 362_880;
        p = p * r + 1.0 / 40_320;
        p = p * r + 1.0 / 5040;
        p = p * r + 1.0 / 720;
        p = p * r + 1.0 / 120;
        p = p * r + 1.0 / 24;
        p = p * r + 1.0 / 6;
        p = p * r + 0.5;
        p = p * r + 1;
        p = p * r + 1;
        return p * Double.longBitsToDouble(((long) n + BIAS) << MANTISSA_BITS);
    }
}
