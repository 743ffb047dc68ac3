package org.saddlebook.thermo.data.api;

import java.util.Arrays;

/**
 * A table of heat capacity, entropy and enthalpy. At the rows its values are those of the table. Between two rows the heat
 * capacity is a straight line; enthalpy and entropy are its integrals plus a straight line for what is then still missing
 * at the upper row, so that both are continuous whatever the rounding of the table. With a heat capacity of curvature
 * {@code q} the enthalpy is off by at most {@code 0.008 q w³} between rows {@code w} apart: below 1 J/mol for rows every
 * 100 K.
 */
public final class TableSegment implements Segment {
    private final double[] t;
    private final double[] cp;
    private final double[] h;
    private final double[] s;

    /**
     * A table; arrays of equal length, at least two rows.
     *
     * @param kelvin temperatures in rising order, K
     * @param heatCapacity J/(mol K)
     * @param enthalpy ΔfH°(298.15 K) + H°(T) − H°(298.15 K), J/mol
     * @param entropy J/(mol K)
     */
    public TableSegment(double[] kelvin, double[] heatCapacity, double[] enthalpy, double[] entropy) {
        int n = kelvin.length;
        if (n < 2 || heatCapacity.length != n || enthalpy.length != n || entropy.length != n) {
            throw new IllegalArgumentException("a table has at least two rows, and columns of equal length");
        }
        for (int i = 0; i < n; i++) {
            if (!(kelvin[i] > (i == 0 ? 0 : kelvin[i - 1])) || Double.isInfinite(kelvin[i])) {
                throw new IllegalArgumentException("temperatures must rise and lie above 0 K: " + kelvin[i]);
            }
            if (!Double.isFinite(heatCapacity[i] + enthalpy[i] + entropy[i])) {
                throw new IllegalArgumentException("values must be finite, at " + kelvin[i] + " K");
            }
        }
        t = kelvin.clone();
        cp = heatCapacity.clone();
        h = enthalpy.clone();
        s = entropy.clone();
    }

    /** The temperatures of the rows, K. */
    public double[] kelvins() {
        return t.clone();
    }

    /**
     * The same functions between two neighbouring rows as sums of powers, so that reactions can add them:
     * {@code Cp = a + b T}, {@code H = h + (a + p) T + b T²/2}, {@code S = s + a ln T + (b + q) T}. {@code p} and {@code q} are
     * the straight lines that make both meet the upper row.
     *
     * @param kelvin a temperature between the rows meant; below the table the first two, above it the last two
     * @return a in J/(mol K), b in J/(mol K²), h in J/mol, p in J/(mol K), s in J/(mol K), q in J/(mol K²)
     */
    public double[] between(double kelvin) {
        int i = row(kelvin);
        double width = t[i + 1] - t[i];
        double b = slope(i);
        double a = cp[i] - b * t[i];
        double p = (h[i + 1] - h[i] - heat(i, t[i + 1])) / width;
        double q = (s[i + 1] - s[i] - heatOverT(i, t[i + 1])) / width;
        return new double[] {
            a, b, h[i] - t[i] * (a + p + b * t[i] / 2), p, s[i] - a * StrictMath.log(t[i]) - (b + q) * t[i], q
        };
    }

    @Override
    public double lowerKelvin() {
        return t[0];
    }

    @Override
    public double upperKelvin() {
        return t[t.length - 1];
    }

    @Override
    public double heatCapacity(double kelvin) {
        int i = row(kelvin);
        return cp[i] + slope(i) * (kelvin - t[i]);
    }

    @Override
    public double enthalpy(double kelvin) {
        int i = row(kelvin);
        double missing = h[i + 1] - h[i] - heat(i, t[i + 1]);
        return h[i] + heat(i, kelvin) + missing * (kelvin - t[i]) / (t[i + 1] - t[i]);
    }

    @Override
    public double entropy(double kelvin) {
        int i = row(kelvin);
        double missing = s[i + 1] - s[i] - heatOverT(i, t[i + 1]);
        return s[i] + heatOverT(i, kelvin) + missing * (kelvin - t[i]) / (t[i + 1] - t[i]);
    }

    /** The row below, or the last but one; the first for temperatures below the table. */
    private int row(double kelvin) {
        int found = Arrays.binarySearch(t, kelvin);
        int below = found >= 0 ? found : -found - 2;
        return Math.max(0, Math.min(t.length - 2, below));
    }

    private double slope(int i) {
        return (cp[i + 1] - cp[i]) / (t[i + 1] - t[i]);
    }

    /** Integral of the straight line from row i. */
    private double heat(int i, double kelvin) {
        double d = kelvin - t[i];
        return d * (cp[i] + slope(i) * d / 2);
    }

    /** Integral of the straight line over T from row i. */
    private double heatOverT(int i, double kelvin) {
        double slope = slope(i);
        double d = kelvin - t[i];
        return (cp[i] - slope * t[i]) * StrictMath.log1p(d / t[i]) + slope * d;
    }
}
