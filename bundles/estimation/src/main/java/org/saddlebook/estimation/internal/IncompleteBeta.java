package org.saddlebook.estimation.internal;

/**
 * Regularised incomplete beta function by its continued fraction (DLMF 8.17.22) in Lentz's evaluation, both tails without
 * cancellation. Holds the last evaluation: value, complement and the derivative a quantile search needs.
 */
public final class IncompleteBeta implements QuantileSearch.Tails {
    private static final double TINY = 1e-300;
    private static final int LIMIT = 1_000_000;

    private final double a;
    private final double b;
    private final double stirling;
    private final double front;
    private double lower;
    private double upper;
    private double slope;

    /**
     * The function for two parameters; not for use by several threads.
     *
     * @param a first parameter, above zero
     * @param b second parameter, above zero
     */
    public IncompleteBeta(double a, double b) {
        this.a = a;
        this.b = b;
        stirling = Deviance.stirlingError(a + b) - Deviance.stirlingError(a) - Deviance.stirlingError(b);
        front = Math.sqrt(a / (a + b) * b / (2 * Math.PI));
    }

    /**
     * Evaluates.
     *
     * @param x argument in [0, 1]
     * @param y one minus x, given separately so that neither is rounded away
     * @return this, holding the values there
     */
    public IncompleteBeta at(double x, double y) {
        if (!(x > 0)) {
            return hold(0, 1, 0);
        }
        if (!(y > 0)) {
            return hold(1, 0, 0);
        }
        double n = a + b;
        // x^a y^b / B(a, b)
        double density = front * StrictMath.exp(stirling - Deviance.deviance(a, n * x) - Deviance.deviance(b, n * y));
        if (x < (a + 1) / (n + 2)) {
            double value = density / fraction(a, b, x, y);
            return hold(value, 1 - value, density);
        }
        double value = density / fraction(b, a, y, x);
        return hold(1 - value, value, density);
    }

    /** Moves to the x whose odds {@code x / y} are given. */
    @Override
    public void move(double odds) {
        at(odds / (1 + odds), 1 / (1 + odds));
    }

    private IncompleteBeta hold(double below, double above, double density) {
        lower = below;
        upper = above;
        slope = density;
        return this;
    }

    /**
     * The fraction f in {@code I_x(a, b) = x^a y^b / (B(a, b) f)}: the even part of DLMF 8.17.22 (Didonato &amp; Morris
     * 1992), written with {@code a y - b x} so that nothing cancels when one parameter is large.
     */
    private static double fraction(double a, double b, double x, double y) {
        double shift = a * y - b * x + 1;
        double f = a * shift / (a + 1);
        double c = f;
        double d = 0;
        for (int m = 1; m < LIMIT; m++) {
            double odd = a + 2.0 * m - 1;
            double share = m * (b - m) * x / odd;
            double numerator = (a + m - 1) * ((a + b + m - 1) * x / odd) * share;
            double denominator = m + share + (a + m) / (odd + 2) * (shift + m * (1 + y));
            d = denominator + numerator * d;
            d = 1 / (Math.abs(d) < TINY ? TINY : d);
            c = denominator + numerator / c;
            c = Math.abs(c) < TINY ? TINY : c;
            double factor = c * d;
            f *= factor;
            if (Math.abs(factor - 1) < 2e-16) {
                break;
            }
        }
        return f;
    }

    /** {@code I_x(a, b)}. */
    @Override
    public double lower() {
        return lower;
    }

    /** {@code 1 - I_x(a, b)}. */
    @Override
    public double upper() {
        return upper;
    }

    /** {@code dI / d ln(x / y)}. */
    @Override
    public double slope() {
        return slope;
    }
}
