package org.saddlebook.estimation.internal;

/**
 * The two functions that let densities be computed without the cancellation of large logarithms: C. Loader, Fast and
 * accurate computation of binomial probabilities (2000).
 */
final class Deviance {
    private static final double HALF = 0.5;
    private static final double SERIES_FROM = 16;

    private Deviance() {}

    /** {@code ln Gamma(x + 1) - ((x + 1/2) ln x - x + ln(2 pi) / 2)}, the error of Stirling's formula; x above zero. */
    static double stirlingError(double x) {
        double shifted = x;
        double sum = 0;
        while (shifted < SERIES_FROM) {
            // The difference of the errors at x and x + 1, exactly.
            sum += excess(shifted);
            shifted += 1;
        }
        double r = 1 / (shifted * shifted);
        double series = 1.0 / 12
                - r * (1.0 / 360 - r * (1.0 / 1260 - r * (1.0 / 1680 - r * (1.0 / 1188 - r * (691.0 / 360360)))));
        return sum + series / shifted;
    }

    /** {@code (x + 1/2) ln(1 + 1/x) - 1}. */
    private static double excess(double x) {
        if (x < 2) {
            return (x + HALF) * StrictMath.log1p(1 / x) - 1;
        }
        // With v = 1 / (2 x + 1) this is artanh(v) / v - 1 = v^2/3 + v^4/5 + ...
        double v = 1 / (2 * x + 1);
        double square = v * v;
        double power = square;
        double sum = 0;
        for (int k = 3; power > 1e-19; k += 2) {
            sum += power / k;
            power *= square;
        }
        return sum;
    }

    /** {@code x ln(x / m) + m - x}, not negative, for positive x and m. */
    static double deviance(double x, double m) {
        double difference = x - m;
        if (Math.abs(difference) < 0.1 * (x + m)) {
            double v = difference / (x + m);
            double sum = difference * v;
            double term = 2 * x * v;
            double square = v * v;
            for (int j = 3; ; j += 2) {
                term *= square;
                double next = sum + term / j;
                if (next == sum) {
                    return sum;
                }
                sum = next;
            }
        }
        return x * StrictMath.log(x / m) + m - x;
    }
}
