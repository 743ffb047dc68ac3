package org.saddlebook.estimation.internal;

/** The lower triangular root of a covariance. */
public final class SquareRoot {
    /** Share of a variance below which what is left of it is rounding. */
    private static final double ROUNDING = 1e-13;

    private static final double ASYMMETRY = 1e-9;

    private SquareRoot() {}

    /**
     * L with {@code L L' = C}, row by row; a direction without variance gets a zero column.
     *
     * @param covariance p by p
     * @param p its size
     * @throws IllegalArgumentException when it is not symmetric or not positive semi-definite
     */
    public static double[] of(double[][] covariance, int p) {
        if (covariance.length != p) {
            throw new IllegalArgumentException("covariance has " + covariance.length + " rows for " + p + " values");
        }
        double[] root = new double[p * p];
        for (int i = 0; i < p; i++) {
            if (covariance[i].length != p) {
                throw new IllegalArgumentException(
                        "covariance row " + i + " has " + covariance[i].length + " numbers for " + p + " values");
            }
            for (int j = 0; j <= i; j++) {
                Inputs.requireNumber(covariance[i][j], "covariance row " + i + " ", j);
                double size = Math.sqrt(Math.abs(covariance[i][i] * covariance[j][j]));
                if (!(Math.abs(covariance[i][j] - covariance[j][i]) <= ASYMMETRY * size)) {
                    throw new IllegalArgumentException("covariance [" + i + "][" + j + "] is " + covariance[i][j]
                            + " but [" + j + "][" + i + "] is " + covariance[j][i]);
                }
                double rest = covariance[i][j];
                for (int k = 0; k < j; k++) {
                    rest -= root[i * p + k] * root[j * p + k];
                }
                if (i == j) {
                    if (!(rest >= -1e4 * ROUNDING * covariance[i][i]) || covariance[i][i] < 0) {
                        throw new IllegalArgumentException(
                                "covariance is not positive semi-definite: it fails at row " + i);
                    }
                    root[i * p + i] = rest > ROUNDING * covariance[i][i] ? Math.sqrt(rest) : 0;
                } else {
                    double pivot = root[j * p + j];
                    root[i * p + j] = pivot > 0 ? rest / pivot : 0;
                }
            }
        }
        return root;
    }
}
