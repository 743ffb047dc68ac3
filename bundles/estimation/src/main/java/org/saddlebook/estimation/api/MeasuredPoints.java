package org.saddlebook.estimation.api;

import org.saddlebook.estimation.internal.Inputs;

/**
 * Points uncertain in both coordinates: x and y, their standard uncertainties, and the correlation of the two errors of one
 * point. Errors of different points are independent. Immutable; arrays are copied in and out.
 */
public final class MeasuredPoints {
    private final double[] x;
    private final double[] y;
    private final double[] ux;
    private final double[] uy;
    private final double[] correlation;

    private MeasuredPoints(double[] x, double[] y, double[] ux, double[] uy, double[] correlation) {
        this.x = x;
        this.y = y;
        this.ux = ux;
        this.uy = uy;
        this.correlation = correlation;
    }

    /**
     * Points with uncorrelated errors.
     *
     * @param x n abscissae, any unit
     * @param y n ordinates, any unit
     * @param ux n standard uncertainties of x, at least zero; zero means exact
     * @param uy n standard uncertainties of y, at least zero; zero means exact
     * @throws IllegalArgumentException on NaN, infinite or negative numbers and lengths that disagree
     */
    public static MeasuredPoints of(double[] x, double[] y, double[] ux, double[] uy) {
        int n = x.length;
        return new MeasuredPoints(
                Inputs.response(x, n),
                Inputs.response(y, n),
                uncertainties(ux, n, "ux"),
                uncertainties(uy, n, "uy"),
                new double[n]);
    }

    /**
     * With correlations of the two errors of each point.
     *
     * @param r n numbers strictly between -1 and 1
     */
    public MeasuredPoints withCorrelations(double[] r) {
        double[] copy = Inputs.response(r, x.length);
        for (int i = 0; i < copy.length; i++) {
            if (!(Math.abs(copy[i]) < 1)) {
                throw new IllegalArgumentException(
                        "correlation[" + i + "] is " + copy[i] + "; it must lie strictly between -1 and 1");
            }
        }
        return new MeasuredPoints(x, y, ux, uy, copy);
    }

    private static double[] uncertainties(double[] u, int n, String name) {
        if (u.length != n) {
            throw new IllegalArgumentException(name + " has " + u.length + " values for " + n + " points");
        }
        double[] copy = u.clone();
        for (int i = 0; i < n; i++) {
            Inputs.requireNumber(copy[i], name, i);
            if (copy[i] < 0) {
                throw new IllegalArgumentException(name + "[" + i + "] is " + copy[i] + "; at least 0 is needed");
            }
        }
        return copy;
    }

    /** Number of points. */
    public int count() {
        return x.length;
    }

    /** Abscissae. */
    public double[] x() {
        return x.clone();
    }

    /** Ordinates. */
    public double[] y() {
        return y.clone();
    }

    /** Standard uncertainties of the abscissae. */
    public double[] ux() {
        return ux.clone();
    }

    /** Standard uncertainties of the ordinates. */
    public double[] uy() {
        return uy.clone();
    }

    /** Correlation of the two errors of each point. */
    public double[] correlations() {
        return correlation.clone();
    }
}
