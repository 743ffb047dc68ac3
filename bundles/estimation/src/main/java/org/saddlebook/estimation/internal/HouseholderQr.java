package org.saddlebook.estimation.internal;

/**
 * Householder QR in double with column exchange (Businger &amp; Golub 1965). Works in place on a flat matrix, column by
 * column, whose columns are already scaled to similar size; carries one right-hand side along.
 */
final class HouseholderQr {
    final int rank;
    final int[] order;
    final double[] factor;

    /**
     * Factorises.
     *
     * @param n rows
     * @param p columns
     * @param a the matrix, n numbers a column; overwritten
     * @param y the right-hand side, becomes Q'y
     */
    HouseholderQr(int n, int p, double[] a, double[] y) {
        order = new int[p];
        double[] original = new double[p];
        for (int j = 0; j < p; j++) {
            order[j] = j;
            original[j] = norm(a, j * n, j * n + n);
        }
        double[] diagonal = new double[p];
        double tolerance = Math.max(n, p) * 0x1p-52;
        int found = 0;
        for (int k = 0; k < p && k < n; k++) {
            int pivot = k;
            double largest = -1;
            double largestShare = 0;
            for (int j = k; j < p; j++) {
                double remaining = norm(a, j * n + k, j * n + n);
                if (remaining > largest) {
                    largest = remaining;
                    pivot = j;
                }
                if (remaining > largestShare * original[j]) {
                    largestShare = remaining / original[j];
                }
            }
            if (!(largestShare > tolerance)) {
                break;
            }
            if (!(largest > tolerance * original[pivot])) {
                // The longest remainder is noise of a long column: take the one that stands out from its own length.
                pivot = independent(a, n, p, k, original, tolerance);
                largest = norm(a, pivot * n + k, pivot * n + n);
            }
            if (pivot != k) {
                exchange(a, n, k, pivot, original);
            }
            diagonal[k] = reflect(a, n, p, k, largest, y);
            found++;
        }
        rank = found;
        factor = new double[p * p];
        for (int k = 0; k < p; k++) {
            for (int i = 0; i < k && i < n; i++) {
                factor[k * p + i] = a[k * n + i];
            }
            factor[k * p + k] = diagonal[k];
        }
    }

    private static int independent(double[] a, int n, int p, int k, double[] original, double tolerance) {
        for (int j = k; j < p; j++) {
            if (norm(a, j * n + k, j * n + n) > tolerance * original[j]) {
                return j;
            }
        }
        throw new IllegalStateException("no independent column left");
    }

    private void exchange(double[] a, int n, int k, int pivot, double[] original) {
        for (int i = 0; i < n; i++) {
            double x = a[k * n + i];
            a[k * n + i] = a[pivot * n + i];
            a[pivot * n + i] = x;
        }
        int index = order[k];
        order[k] = order[pivot];
        order[pivot] = index;
        double length = original[k];
        original[k] = original[pivot];
        original[pivot] = length;
    }

    private static double reflect(double[] a, int n, int p, int k, double length, double[] y) {
        int column = k * n;
        double head = a[column + k];
        double alpha = head > 0 ? -length : length;
        double beta = 1 / (length * (length + Math.abs(head)));
        a[column + k] = head - alpha;
        for (int j = k + 1; j < p; j++) {
            apply(a, column, a, j * n, k, n, beta);
        }
        apply(a, column, y, 0, k, n, beta);
        return alpha;
    }

    private static void apply(double[] v, int from, double[] target, int offset, int k, int n, double beta) {
        double sum = 0;
        for (int i = k; i < n; i++) {
            sum += v[from + i] * target[offset + i];
        }
        sum *= beta;
        for (int i = k; i < n; i++) {
            target[offset + i] -= sum * v[from + i];
        }
    }

    private static double norm(double[] a, int from, int to) {
        double sum = 0;
        for (int i = from; i < to; i++) {
            sum += a[i] * a[i];
        }
        return Math.sqrt(sum);
    }
}
