package org.saddlebook.estimation.internal;

/** The factorisation of {@link HouseholderQr} in double-double arithmetic; same layout, leading and trailing parts. */
final class WideQr {
    final int rank;
    final int[] order;
    final double[] factorHigh;
    final double[] factorLow;

    private final int n;
    private final int p;
    private final double[] high;
    private final double[] low;
    private final Wide sum = new Wide();
    private final Wide work = new Wide();

    /**
     * Factorises.
     *
     * @param n rows
     * @param p columns
     * @param high leading parts, n numbers a column; overwritten
     * @param low trailing parts; overwritten
     * @param yHigh right-hand side, becomes Q'y
     * @param yLow its trailing parts
     * @param tolerance a column whose remainder is at most this share of its length depends on the others
     */
    WideQr(int n, int p, double[] high, double[] low, double[] yHigh, double[] yLow, double tolerance) {
        this.n = n;
        this.p = p;
        this.high = high;
        this.low = low;
        order = new int[p];
        double[] original = new double[p];
        for (int j = 0; j < p; j++) {
            order[j] = j;
            original[j] = norm(j, 0).value();
        }
        factorHigh = new double[p * p];
        factorLow = new double[p * p];
        int found = 0;
        for (int k = 0; k < p && k < n; k++) {
            int pivot = -1;
            double largest = 0;
            for (int j = k; j < p; j++) {
                double remaining = norm(j, k).value();
                if (remaining > tolerance * original[j] && remaining > largest) {
                    largest = remaining;
                    pivot = j;
                }
            }
            if (pivot < 0) {
                break;
            }
            exchange(k, pivot, original);
            reflect(k, yHigh, yLow);
            found++;
        }
        rank = found;
        for (int k = 0; k < p; k++) {
            for (int i = 0; i < k && i < n; i++) {
                factorHigh[k * p + i] = high[k * n + i];
                factorLow[k * p + i] = low[k * n + i];
            }
        }
    }

    private Wide norm(int column, int from) {
        sum.set(0, 0);
        for (int i = column * n + from; i < column * n + n; i++) {
            sum.addProduct(high[i], low[i], high[i], low[i]);
        }
        return sum.squareRoot();
    }

    private void exchange(int k, int pivot, double[] original) {
        if (pivot == k) {
            return;
        }
        for (int i = 0; i < n; i++) {
            double x = high[k * n + i];
            high[k * n + i] = high[pivot * n + i];
            high[pivot * n + i] = x;
            x = low[k * n + i];
            low[k * n + i] = low[pivot * n + i];
            low[pivot * n + i] = x;
        }
        int index = order[k];
        order[k] = order[pivot];
        order[pivot] = index;
        double length = original[k];
        original[k] = original[pivot];
        original[pivot] = length;
    }

    private void reflect(int k, double[] yHigh, double[] yLow) {
        int head = k * n + k;
        Wide length = norm(k, k);
        double sign = high[head] > 0 ? -1 : 1;
        double alphaHigh = sign * length.hi;
        double alphaLow = sign * length.lo;
        factorHigh[k * p + k] = alphaHigh;
        factorLow[k * p + k] = alphaLow;
        // 1 / beta = length (length + |head|) = -alpha (head - alpha)
        work.set(high[head], low[head]).add(-alphaHigh, -alphaLow);
        high[head] = work.hi;
        low[head] = work.lo;
        work.multiply(-alphaHigh, -alphaLow);
        double divisorHigh = work.hi;
        double divisorLow = work.lo;
        for (int j = k + 1; j < p; j++) {
            apply(k, high, low, j * n, divisorHigh, divisorLow);
        }
        apply(k, yHigh, yLow, 0, divisorHigh, divisorLow);
    }

    private void apply(
            int k, double[] targetHigh, double[] targetLow, int offset, double divisorHigh, double divisorLow) {
        int column = k * n;
        sum.set(0, 0);
        for (int i = k; i < n; i++) {
            sum.addProduct(high[column + i], low[column + i], targetHigh[offset + i], targetLow[offset + i]);
        }
        sum.divide(divisorHigh, divisorLow);
        double factorHi = -sum.hi;
        double factorLo = -sum.lo;
        for (int i = k; i < n; i++) {
            work.set(targetHigh[offset + i], targetLow[offset + i])
                    .addProduct(factorHi, factorLo, high[column + i], low[column + i]);
            targetHigh[offset + i] = work.hi;
            targetLow[offset + i] = work.lo;
        }
    }
}
