package org.saddlebook.estimation.internal;

/** Regularised incomplete gamma function: series (DLMF 8.11.4) and continued fraction (DLMF 8.9.2), both tails. Holds the last evaluation. */
public final class IncompleteGamma implements QuantileSearch.Tails {
    private static final double TINY = 1e-300;
    private static final int LIMIT = 1_000_000;

    private final double a;
    private final double stirling;
    private double lower;
    private double upper;
    private double slope;

    /**
     * The function for one parameter; not for use by several threads.
     *
     * @param a parameter, above zero
     */
    public IncompleteGamma(double a) {
        this.a = a;
        stirling = Deviance.stirlingError(a);
    }

    /**
     * Evaluates.
     *
     * @param x argument; below zero counts as zero
     * @return this, holding the values there
     */
    public IncompleteGamma at(double x) {
        if (!(x > 0)) {
            return hold(0, 1, 0);
        }
        if (x == Double.POSITIVE_INFINITY) {
            return hold(1, 0, 0);
        }
        // x^a e^-x / Gamma(a + 1)
        double density = StrictMath.exp(-stirling - Deviance.deviance(a, x)) / Math.sqrt(2 * Math.PI * a);
        if (x < a + 1) {
            double term = 1;
            double sum = 1;
            for (int k = 1; k < LIMIT; k++) {
                term *= x / (a + k);
                sum += term;
                if (term < sum * 1e-17) {
                    break;
                }
            }
            double value = density * sum;
            return hold(value, 1 - value, density * a);
        }
        double b = x + 1 - a;
        double c = 1 / TINY;
        double d = 1 / b;
        double h = d;
        for (int k = 1; k < LIMIT; k++) {
            double an = -k * (k - a);
            b += 2;
            d = an * d + b;
            d = 1 / (Math.abs(d) < TINY ? TINY : d);
            c = b + an / c;
            c = Math.abs(c) < TINY ? TINY : c;
            double factor = d * c;
            h *= factor;
            if (Math.abs(factor - 1) < 2e-16) {
                break;
            }
        }
        double value = density * a * h;
        return hold(1 - value, value, density * a);
    }

    @Override
    public void move(double x) {
        at(x);
    }

    private IncompleteGamma hold(double below, double above, double derivative) {
        lower = below;
        upper = above;
        slope = derivative;
        return this;
    }

    /** {@code P(a, x)}. */
    @Override
    public double lower() {
        return lower;
    }

    /** {@code Q(a, x) = 1 - P(a, x)}. */
    @Override
    public double upper() {
        return upper;
    }

    /** {@code dP / d ln x}. */
    @Override
    public double slope() {
        return slope;
    }
}
