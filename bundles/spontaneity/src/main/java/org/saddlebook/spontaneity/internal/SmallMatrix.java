package org.saddlebook.spontaneity.internal;

import java.util.Optional;

/** Positive definite systems of a few rows, by Cholesky's factor after scaling to a unit diagonal. */
final class SmallMatrix {
    /** Below this a pivot, of a matrix with unit diagonal, is rounding: a row that others already state. */
    private static final double SINGULAR = 1e-12;

    private SmallMatrix() {}

    /** The inverse; empty when a row follows from the others or has no variance. */
    static Optional<double[][]> inverse(double[][] matrix) {
        int n = matrix.length;
        double[] scale = new double[n];
        for (int i = 0; i < n; i++) {
            if (!(matrix[i][i] > 0)) {
                return Optional.empty();
            }
            scale[i] = 1 / Math.sqrt(matrix[i][i]);
        }
        double[][] lower = new double[n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j <= i; j++) {
                double sum = matrix[i][j] * scale[i] * scale[j];
                for (int k = 0; k < j; k++) {
                    sum -= lower[i][k] * lower[j][k];
                }
                if (i == j && !(sum > SINGULAR)) {
                    return Optional.empty();
                }
                lower[i][j] = i == j ? Math.sqrt(sum) : sum / lower[j][j];
            }
        }
        double[][] inverse = new double[n][n];
        for (int column = 0; column < n; column++) {
            double[] y = new double[n];
            for (int i = 0; i < n; i++) {
                double sum = i == column ? 1 : 0;
                for (int k = 0; k < i; k++) {
                    sum -= lower[i][k] * y[k];
                }
                y[i] = sum / lower[i][i];
            }
            for (int i = n - 1; i >= 0; i--) {
                double sum = y[i];
                for (int k = i + 1; k < n; k++) {
                    sum -= lower[k][i] * inverse[k][column];
                }
                inverse[i][column] = sum / lower[i][i];
            }
        }
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                inverse[i][j] *= scale[i] * scale[j];
            }
        }
        return Optional.of(inverse);
    }

    static double[] times(double[][] matrix, double[] vector) {
        double[] result = new double[matrix.length];
        for (int i = 0; i < result.length; i++) {
            for (int j = 0; j < vector.length; j++) {
                result[i] += matrix[i][j] * vector[j];
            }
        }
        return result;
    }

    /** {@code vᵀ M v}. */
    static double quadratic(double[][] matrix, double[] vector) {
        double[] right = times(matrix, vector);
        double sum = 0;
        for (int i = 0; i < vector.length; i++) {
            sum += vector[i] * right[i];
        }
        return sum;
    }
}
