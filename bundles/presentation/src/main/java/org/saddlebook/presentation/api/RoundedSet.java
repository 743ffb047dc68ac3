package org.saddlebook.presentation.api;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.function.Predicate;

/**
 * Numbers that belong together, such as A and Ea, rounded just so far that calculating with the printed set gives the
 * same answers. Rounding each to two digits of its own uncertainty is not enough: they are so strongly correlated that an
 * Ea of ±1.5 kJ/mol rounded that way moves a rate constant by two per cent.
 */
public final class RoundedSet {
    private static final int MOST_DIGITS = 15;

    /** Largest shift of any result, in its own standard uncertainties. */
    private static final double TENTH = 0.1;

    private final List<String> texts;
    private final double[] values;
    private final int digits;

    private RoundedSet(List<String> texts, double[] values, int digits) {
        this.texts = List.copyOf(texts);
        this.values = values;
        this.digits = digits;
    }

    /** The rounded numbers for people, in the order given. */
    public List<String> texts() {
        return texts;
    }

    /** The rounded numbers, a copy. */
    public double[] values() {
        return values.clone();
    }

    /** How many digits of each uncertainty are kept; at least 2. */
    public int digits() {
        return digits;
    }

    /**
     * Adds digits to all numbers, from two digits of each uncertainty on, until the rounded set is acceptable.
     *
     * @param values the numbers
     * @param uncertainties their standard uncertainties in the same units; 0 for a number that is exact
     * @param acceptable says whether a rounded set, in the same order, is good enough; asked for finer and finer sets
     * @return the coarsest acceptable set, or the finest tried, with 15 significant digits
     */
    public static RoundedSet reproducing(double[] values, double[] uncertainties, Predicate<double[]> acceptable) {
        if (values.length != uncertainties.length) {
            throw new IllegalArgumentException(
                    uncertainties.length + " uncertainties for " + values.length + " values");
        }
        RoundedSet set = rounded(values, uncertainties, 2);
        while (set.digits < MOST_DIGITS && !acceptable.test(set.values())) {
            set = rounded(values, uncertainties, set.digits + 1);
        }
        return set;
    }

    /**
     * The set from which every result follows within a tenth of its own standard uncertainty, whatever the result is: by
     * the Cauchy–Schwarz inequality a function f of the set moves, to first order, by at most
     * {@code sqrt(d' C^-1 d) u(f)}, where d is the rounding error and C the covariance. Digits are added until that root
     * is at most 0.1.
     *
     * @param values the numbers as printed (A itself, not ln A)
     * @param logarithmic whether the covariance is that of the logarithm, for each number; such numbers are positive
     * @param covariance covariance of the numbers or their logarithms; a zero on the diagonal marks an exact number
     */
    public static RoundedSet reproducing(double[] values, boolean[] logarithmic, double[][] covariance) {
        int n = values.length;
        if (logarithmic.length != n || covariance.length != n) {
            throw new IllegalArgumentException("values, scales and covariance of unequal size");
        }
        double[] scale = new double[n];
        double[] uncertainties = new double[n];
        for (int i = 0; i < n; i++) {
            if (covariance[i].length != n || !(covariance[i][i] >= 0)) {
                throw new IllegalArgumentException("not a covariance: row " + i);
            }
            scale[i] = Math.sqrt(covariance[i][i]);
            // Rounding needs only the size of the uncertainty, so the first-order form is enough for a logarithm.
            uncertainties[i] = logarithmic[i] ? Math.abs(values[i]) * Math.min(scale[i], 1) : scale[i];
        }
        double[][] factor = cholesky(covariance, scale);
        return reproducing(values, uncertainties, rounded -> {
            double[] error = new double[n];
            for (int i = 0; i < n; i++) {
                double shift = logarithmic[i] ? StrictMath.log(rounded[i] / values[i]) : rounded[i] - values[i];
                error[i] = scale[i] > 0 ? shift / scale[i] : 0;
            }
            return distance(factor, error) <= TENTH;
        });
    }

    private static RoundedSet rounded(double[] values, double[] uncertainties, int digits) {
        List<String> texts = new ArrayList<>();
        double[] rounded = new double[values.length];
        for (int i = 0; i < values.length; i++) {
            BigDecimal exact = Decimals.of(values[i]);
            if (!(uncertainties[i] >= 0)) {
                throw new IllegalArgumentException("standard uncertainty must not be negative: " + uncertainties[i]);
            }
            if (uncertainties[i] == 0 || Double.isInfinite(uncertainties[i])) {
                texts.add(Rounding.shortest(values[i]));
                rounded[i] = values[i];
                continue;
            }
            int coarse = Decimals.secondDigit(Decimals.of(uncertainties[i])) - (digits - 2);
            int finest = Decimals.exponent(exact) - MOST_DIGITS + 1;
            int position = Math.max(coarse, finest);
            BigDecimal value = Decimals.at(exact, position);
            texts.add(Rounding.at(value, position));
            rounded[i] = value.doubleValue();
        }
        return new RoundedSet(Collections.unmodifiableList(texts), rounded, digits);
    }

    /** Lower triangle of the correlation matrix; exact numbers and lost rank give a zero pivot. */
    private static double[][] cholesky(double[][] covariance, double[] scale) {
        int n = scale.length;
        double[][] lower = new double[n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j <= i; j++) {
                double sum = scale[i] > 0 && scale[j] > 0 ? covariance[i][j] / (scale[i] * scale[j]) : 0;
                for (int k = 0; k < j; k++) {
                    sum -= lower[i][k] * lower[j][k];
                }
                if (i == j) {
                    lower[i][i] = sum > 0 ? Math.sqrt(sum) : 0;
                } else {
                    lower[i][j] = lower[j][j] > 0 ? sum / lower[j][j] : 0;
                }
            }
        }
        return lower;
    }

    /** Length of the solution of lower · z = error: the error in units of the joint uncertainty. */
    private static double distance(double[][] lower, double[] error) {
        double[] z = new double[error.length];
        double sum = 0;
        for (int i = 0; i < z.length; i++) {
            double rest = error[i];
            for (int k = 0; k < i; k++) {
                rest -= lower[i][k] * z[k];
            }
            if (lower[i][i] > 0) {
                z[i] = rest / lower[i][i];
            } else if (rest == 0) {
                z[i] = 0;
            } else {
                return Double.POSITIVE_INFINITY;
            }
            sum += z[i] * z[i];
        }
        return Math.sqrt(sum);
    }
}
