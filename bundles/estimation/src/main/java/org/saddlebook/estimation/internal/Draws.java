package org.saddlebook.estimation.internal;

import java.util.random.RandomGenerator;

/** Deviates computed from the 64 random bits of a generator alone, so that they are the same on every Java. */
public final class Draws {
    private final RandomGenerator generator;
    private double spare;
    private boolean hasSpare;
    private long bits;
    private boolean hasBits;

    /** Deviates of a generator. */
    public Draws(RandomGenerator generator) {
        this.generator = generator;
    }

    /** A whole number from 0 to n - 1; 32 bits scaled, which favours none by more than n / 2^32. */
    public int index(int n) {
        long half;
        if (hasBits) {
            half = bits & 0xffffffffL;
        } else {
            bits = generator.nextLong();
            half = bits >>> 32;
        }
        hasBits = !hasBits;
        return (int) ((half * n) >>> 32);
    }

    private double uniform() {
        return (generator.nextLong() >>> 11) * 0x1.0p-53;
    }

    /** A standard normal deviate: polar method (G. Marsaglia and T. A. Bray, SIAM Rev. 6 (1964) 260). */
    public double gaussian() {
        if (hasSpare) {
            hasSpare = false;
            return spare;
        }
        double u;
        double v;
        double r;
        do {
            u = 2 * uniform() - 1;
            v = 2 * uniform() - 1;
            r = u * u + v * v;
        } while (r >= 1 || r == 0);
        double factor = Math.sqrt(-2 * StrictMath.log(r) / r);
        spare = v * factor;
        hasSpare = true;
        return u * factor;
    }

    /** A chi-squared deviate, twice a gamma one: G. Marsaglia and W. W. Tsang, ACM Trans. Math. Softw. 26 (2000) 363. */
    public double chiSquared(double dof) {
        double shape = dof / 2;
        double boost = 1;
        if (shape < 1) {
            double u;
            do {
                u = uniform();
            } while (u == 0);
            boost = StrictMath.exp(StrictMath.log(u) / shape);
            shape += 1;
        }
        double d = shape - 1.0 / 3;
        double c = 1 / Math.sqrt(9 * d);
        while (true) {
            double x = gaussian();
            double v = 1 + c * x;
            if (v > 0) {
                v = v * v * v;
                double u = uniform();
                if (u > 0 && StrictMath.log(u) < 0.5 * x * x + d * (1 - v + StrictMath.log(v))) {
                    return 2 * d * v * boost;
                }
            }
        }
    }
}
