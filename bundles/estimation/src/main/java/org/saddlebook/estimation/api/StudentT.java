package org.saddlebook.estimation.api;

import org.saddlebook.estimation.internal.IncompleteBeta;
import org.saddlebook.estimation.internal.Quantiles;
import org.saddlebook.estimation.internal.RecentValues;

/**
 * Student's t distribution: incomplete beta function (DLMF 8.17), closed forms for 1, 2 and 4 degrees of freedom,
 * expansion in the normal quantile beyond 1e8 (Abramowitz &amp; Stegun 26.7.5).
 */
public final class StudentT {
    private static final double HALF = 0.5;
    private static final double NEARLY_NORMAL = 1e8;
    /** One campaign, or a thousand resamples of it, asks for the same few quantiles over and over. */
    private static final RecentValues RECENT = new RecentValues();

    private StudentT() {}

    /**
     * The value that is exceeded with probability {@code 1 - probability}.
     *
     * @param probability strictly between zero and one; 0.975 for a two-sided interval of 95 %
     * @param dof degrees of freedom, positive, not necessarily whole; infinity gives the normal quantile
     * @return the quantile, to 13 digits or more; infinite where its square would leave the range of doubles (far tails of
     *     fewer than one or two degrees of freedom)
     */
    public static double quantile(double probability, double dof) {
        Quantiles.requireProbability(probability);
        requireFreedom(dof);
        if (probability == HALF) {
            return 0;
        }
        double remembered = RECENT.get(probability, dof);
        if (!Double.isNaN(remembered)) {
            return remembered;
        }
        double value = compute(probability, dof);
        RECENT.put(probability, dof, value);
        return value;
    }

    private static double compute(double probability, double dof) {
        double tail = Math.min(probability, 1 - probability);
        double size = dof > NEARLY_NORMAL
                ? fromNormal(Math.abs(Normal.quantile(probability)), dof)
                : size(tail, Math.abs(probability - HALF), dof);
        return Math.copySign(size, probability - HALF);
    }

    private static double size(double tail, double centre, double dof) {
        if (tail > 0.25) {
            double odds = Quantiles.betaOddsLower(HALF, dof / 2, 2 * centre, 1 / dof);
            return Math.sqrt(odds * dof);
        }
        if (dof == 1) {
            return 1 / StrictMath.tan(Math.PI * tail);
        }
        if (dof == 2) {
            return (1 - 2 * tail) / Math.sqrt(2 * tail * (1 - tail));
        }
        if (dof == 4) {
            double root = Math.sqrt(4 * tail * (1 - tail));
            return 2 * Math.sqrt(StrictMath.cos(StrictMath.acos(root) / 3) / root - 1);
        }
        // t^2 / dof is the odds of a beta variable; start from the heavier of a power law and a normal tail.
        double start = StrictMath.expm1(-2 * StrictMath.log(2 * tail) / dof) + 1 / dof;
        return Math.sqrt(Quantiles.betaOddsUpper(HALF, dof / 2, 2 * tail, start) * dof);
    }

    /** Probability of a value above t. */
    public static double upperTail(double t, double dof) {
        requireFreedom(dof);
        if (Double.isNaN(t)) {
            throw new IllegalArgumentException("t is NaN");
        }
        if (dof > NEARLY_NORMAL) {
            return Normal.upperTail(toNormal(t, dof));
        }
        double odds = t / dof * t;
        double y = 1 / (1 + odds);
        double x = odds < 1 ? odds * y : 1 / (1 + 1 / odds);
        IncompleteBeta square = new IncompleteBeta(HALF, dof / 2).at(x, y);
        return t > 0 ? HALF * square.upper() : HALF + HALF * square.lower();
    }

    private static double fromNormal(double z, double dof) {
        double z2 = z * z;
        return z + z * (z2 + 1) / (4 * dof) + z * (3 + z2 * (16 + 5 * z2)) / 96 / dof / dof;
    }

    private static double toNormal(double t, double dof) {
        if (!(Math.abs(t) < 1000)) {
            return t;
        }
        double t2 = t * t;
        return t - t * (t2 + 1) / (4 * dof) + t * (3 + t2 * (8 + 13 * t2)) / 96 / dof / dof;
    }

    private static void requireFreedom(double dof) {
        if (!(dof > 0)) {
            throw new IllegalArgumentException("dof is " + dof + "; a positive number is needed");
        }
    }
}
