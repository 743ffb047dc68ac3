package org.saddlebook.estimation.internal;

/**
 * Singular value decomposition {@code A = U diag(s) V'} of a small square matrix by one-sided Jacobi rotations
 * (Hestenes 1958), which finds small singular values of column-scaled matrices to high relative accuracy (Demmel &amp;
 * Veselić 1992). Flat, column by column, singular values in falling order.
 */
final class SingularValues {
    private static final int SWEEPS = 60;
    private static final double ORTHOGONAL = 1e-15;

    private final int size;
    private final double[] scaledLeft;
    private final double[] right;
    private final double[] values;

    SingularValues(int size, double[] matrix) {
        this.size = size;
        scaledLeft = matrix.clone();
        right = new double[size * size];
        values = new double[size];
        for (int j = 0; j < size; j++) {
            right[j * size + j] = 1;
        }
        for (int sweep = 0; sweep < SWEEPS && sweep(); sweep++) {
            // sweep() rotates until every pair of columns is orthogonal
        }
        sort();
    }

    private boolean sweep() {
        boolean rotated = false;
        for (int a = 0; a < size - 1; a++) {
            for (int b = a + 1; b < size; b++) {
                double aa = dot(a, a);
                double bb = dot(b, b);
                double ab = dot(a, b);
                if (!(Math.abs(ab) > ORTHOGONAL * Math.sqrt(aa * bb)) || ab == 0) {
                    continue;
                }
                rotated = true;
                double zeta = (bb - aa) / (2 * ab);
                double t = Math.copySign(1, zeta) / (Math.abs(zeta) + Math.sqrt(1 + zeta * zeta));
                double c = 1 / Math.sqrt(1 + t * t);
                rotate(scaledLeft, a, b, c, c * t);
                rotate(right, a, b, c, c * t);
            }
        }
        return rotated;
    }

    private double dot(int a, int b) {
        double sum = 0;
        for (int i = 0; i < size; i++) {
            sum += scaledLeft[a * size + i] * scaledLeft[b * size + i];
        }
        return sum;
    }

    private void rotate(double[] matrix, int a, int b, double c, double s) {
        for (int i = 0; i < size; i++) {
            double x = matrix[a * size + i];
            double y = matrix[b * size + i];
            matrix[a * size + i] = c * x - s * y;
            matrix[b * size + i] = s * x + c * y;
        }
    }

    private void sort() {
        for (int j = 0; j < size; j++) {
            values[j] = Math.sqrt(dot(j, j));
        }
        for (int j = 0; j < size; j++) {
            int largest = j;
            for (int k = j + 1; k < size; k++) {
                if (values[k] > values[largest]) {
                    largest = k;
                }
            }
            if (largest != j) {
                double value = values[j];
                values[j] = values[largest];
                values[largest] = value;
                exchange(scaledLeft, j, largest);
                exchange(right, j, largest);
            }
        }
    }

    private void exchange(double[] matrix, int a, int b) {
        for (int i = 0; i < size; i++) {
            double x = matrix[a * size + i];
            matrix[a * size + i] = matrix[b * size + i];
            matrix[b * size + i] = x;
        }
    }

    double[] values() {
        return values;
    }

    /** {@code diag(s) U' y}, so that no division by a vanishing singular value is needed. */
    double[] scaledLeftTimes(double[] y) {
        double[] result = new double[size];
        for (int j = 0; j < size; j++) {
            double sum = 0;
            for (int i = 0; i < size; i++) {
                sum += scaledLeft[j * size + i] * y[i];
            }
            result[j] = sum;
        }
        return result;
    }

    /** {@code V x}. */
    double[] rightTimes(double[] x) {
        double[] result = new double[size];
        for (int j = 0; j < size; j++) {
            for (int i = 0; i < size; i++) {
                result[i] += right[j * size + i] * x[j];
            }
        }
        return result;
    }
}
