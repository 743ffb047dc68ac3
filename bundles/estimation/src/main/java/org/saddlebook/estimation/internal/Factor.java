package org.saddlebook.estimation.internal;

/**
 * The triangular factor of a design with scaled and exchanged columns: {@code X S P = Q R}, S powers of two. Flat,
 * column by column. The trailing parts are there when the factor was computed in double-double.
 */
final class Factor {
    final int size;
    final int[] order;
    final double[] scale;
    final double[] high;
    final double[] lowOrNull;

    /**
     * A factor.
     *
     * @param size number of columns p
     * @param order original index of each exchanged column
     * @param scale power of two each original column was multiplied by
     * @param high R, p by p, column by column
     * @param lowOrNull trailing parts of R
     */
    Factor(int size, int[] order, double[] scale, double[] high, double[] lowOrNull) {
        this.size = size;
        this.order = order;
        this.scale = scale;
        this.high = high;
        this.lowOrNull = lowOrNull;
    }

    /** Solves {@code R' z = P' S g}. Returns z with p leading and, after them, p trailing parts (zero when plain). */
    double[] solveTransposed(double[] g, double[] gLowOrNull) {
        int p = size;
        double[] z = new double[2 * p];
        if (lowOrNull == null) {
            for (int k = 0; k < p; k++) {
                double sum = g[order[k]] * scale[order[k]];
                for (int i = 0; i < k; i++) {
                    sum -= high[k * p + i] * z[i];
                }
                z[k] = sum / high[k * p + k];
            }
            return z;
        }
        Wide sum = new Wide();
        for (int k = 0; k < p; k++) {
            int j = order[k];
            sum.set(g[j] * scale[j], gLowOrNull == null ? 0 : gLowOrNull[j] * scale[j]);
            for (int i = 0; i < k; i++) {
                sum.addProduct(-high[k * p + i], -lowOrNull[k * p + i], z[i], z[p + i]);
            }
            sum.divide(high[k * p + k], lowOrNull[k * p + k]);
            z[k] = sum.hi;
            z[p + k] = sum.lo;
        }
        return z;
    }

    double product(double[] z, double[] other) {
        int p = size;
        if (lowOrNull == null) {
            double sum = 0;
            for (int k = 0; k < p; k++) {
                sum += z[k] * other[k];
            }
            return sum;
        }
        Wide sum = new Wide();
        for (int k = 0; k < p; k++) {
            sum.addProduct(z[k], z[p + k], other[k], other[p + k]);
        }
        return sum.value();
    }

    /** {@code (X'WX)^-1} as rows. */
    double[][] covariance() {
        int p = size;
        double[][] columns = new double[p][];
        double[] unit = new double[p];
        for (int k = 0; k < p; k++) {
            // Row k of the inverse of R, reached by solving R' z = e_k in exchanged and scaled coordinates.
            unit[order[k]] = 1 / scale[order[k]];
            columns[k] = solveTransposed(unit, null);
            unit[order[k]] = 0;
        }
        double[][] result = new double[p][p];
        for (int k = 0; k < p; k++) {
            for (int l = 0; l <= k; l++) {
                double value = product(columns[k], columns[l]) * scale[order[k]] * scale[order[l]];
                result[order[k]][order[l]] = value;
                result[order[l]][order[k]] = value;
            }
        }
        return result;
    }

    /**
     * Solves {@code (C - S) d = C b} with {@code C = X'WX}, as {@code (I - R^-T S R^-1) w = R b}, d = R^-1 w: the matrix on
     * the left is near the identity however ill-conditioned X is. Null when it is not positive definite.
     */
    double[] curvedStep(double[][] second, double[] plain) {
        int p = size;
        double[][] half = new double[p][];
        for (int j = 0; j < p; j++) {
            half[j] = solveTransposed(second[j], null);
        }
        // half[j][k] = (R^-T P' S S_j)_k for column j of S; a second solve along the other index completes the product.
        double[][] matrix = new double[p][p];
        double[] row = new double[p];
        for (int k = 0; k < p; k++) {
            for (int j = 0; j < p; j++) {
                row[j] = half[j][k];
            }
            double[] column = solveTransposed(row, null);
            for (int l = 0; l < p; l++) {
                matrix[k][l] = (k == l ? 1 : 0) - column[l];
            }
        }
        double[] right = new double[p];
        for (int k = 0; k < p; k++) {
            for (int l = k; l < p; l++) {
                right[k] += high[l * p + k] * plain[order[l]] / scale[order[l]];
            }
        }
        if (!Cholesky.solve(matrix, right)) {
            return null;
        }
        double[] result = new double[p];
        double[] z = new double[p];
        for (int k = p - 1; k >= 0; k--) {
            double sum = right[k];
            for (int l = k + 1; l < p; l++) {
                sum -= high[l * p + k] * z[l];
            }
            z[k] = sum / high[k * p + k];
            result[order[k]] = z[k] * scale[order[k]];
        }
        return result;
    }

    /** {@code ln |X'WX|}. */
    double logDeterminant() {
        double sum = 0;
        for (int k = 0; k < size; k++) {
            sum += StrictMath.log(Math.abs(high[k * size + k])) - StrictMath.log(scale[k]);
        }
        return 2 * sum;
    }

    /** An upper bound of the condition number, at most p times too large: product of Frobenius norms. */
    double conditionBound() {
        int p = size;
        double forward = 0;
        double backward = 0;
        double[] z = new double[p];
        for (int k = 0; k < p; k++) {
            for (int i = 0; i <= k; i++) {
                forward += high[k * p + i] * high[k * p + i];
            }
            // Column k of the inverse of R, by back substitution.
            for (int i = k; i >= 0; i--) {
                double sum = i == k ? 1 : 0;
                for (int j = i + 1; j <= k; j++) {
                    sum -= high[j * p + i] * z[j];
                }
                z[i] = sum / high[i * p + i];
                backward += z[i] * z[i];
            }
        }
        return Math.sqrt(forward * backward);
    }

    /** Condition number after scaling the columns to unit length. */
    double conditionNumber() {
        int p = size;
        double[] unit = high.clone();
        for (int k = 0; k < p; k++) {
            double norm = 0;
            for (int i = 0; i <= k; i++) {
                norm += unit[k * p + i] * unit[k * p + i];
            }
            norm = Math.sqrt(norm);
            for (int i = 0; i <= k; i++) {
                unit[k * p + i] /= norm;
            }
        }
        double[] singular = new SingularValues(p, unit).values();
        return Math.max(1, singular[0] / singular[p - 1]);
    }
}
