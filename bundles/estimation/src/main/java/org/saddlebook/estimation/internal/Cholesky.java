package org.saddlebook.estimation.internal;

/** Solution of a small symmetric positive definite system. */
final class Cholesky {
    private Cholesky() {}

    /**
     * Solves in place, using the lower triangle.
     *
     * @param matrix overwritten by its factor
     * @param right becomes the solution
     * @return whether the matrix is positive definite
     */
    static boolean solve(double[][] matrix, double[] right) {
        int p = right.length;
        for (int j = 0; j < p; j++) {
            double diagonal = matrix[j][j];
            for (int k = 0; k < j; k++) {
                diagonal -= matrix[j][k] * matrix[j][k];
            }
            if (!(diagonal > 0)) {
                return false;
            }
            diagonal = Math.sqrt(diagonal);
            matrix[j][j] = diagonal;
            for (int i = j + 1; i < p; i++) {
                double sum = matrix[i][j];
                for (int k = 0; k < j; k++) {
                    sum -= matrix[i][k] * matrix[j][k];
                }
                matrix[i][j] = sum / diagonal;
            }
        }
        for (int i = 0; i < p; i++) {
            for (int k = 0; k < i; k++) {
                right[i] -= matrix[i][k] * right[k];
            }
            right[i] /= matrix[i][i];
        }
        for (int i = p - 1; i >= 0; i--) {
            for (int k = i + 1; k < p; k++) {
                right[i] -= matrix[k][i] * right[k];
            }
            right[i] /= matrix[i][i];
        }
        return true;
    }
}
