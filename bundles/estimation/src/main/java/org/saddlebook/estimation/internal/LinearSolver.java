package org.saddlebook.estimation.internal;

/** Solves a weighted linear problem, in double where that is enough and in double-double where it is not. */
public final class LinearSolver {
    /** Half a unit in the last place of one. */
    private static final double EPSILON = 0x1p-53;
    /** Estimated relative error of the parameters from which double is not enough: nine digits with room. */
    private static final double ENOUGH = 1e-11;
    /** Estimated relative error of the residual norm from which double is not enough. */
    private static final double ENOUGH_RESIDUAL = 1e-10;
    /** Ratio of weights from which row scaling makes double unreliable (Cox &amp; Higham 1998). */
    private static final double STIFF_WEIGHTS = 1e8;

    private LinearSolver() {}

    /**
     * Solves.
     *
     * @param design checked rows
     * @param response checked numbers
     * @param weightsOrNull checked weights
     */
    public static LinearSolution solve(Design design, double[] response, double[] weightsOrNull) {
        int active = design.rows();
        double smallest = 1;
        double largest = 1;
        if (weightsOrNull != null) {
            active = 0;
            smallest = Double.POSITIVE_INFINITY;
            largest = 0;
            for (double weight : weightsOrNull) {
                if (weight > 0) {
                    active++;
                    smallest = Math.min(smallest, weight);
                    largest = Math.max(largest, weight);
                }
            }
        }
        double[] scale = scales(design, weightsOrNull);
        if (!design.wide() && !(largest > STIFF_WEIGHTS * smallest)) {
            LinearSolution plain = plain(design, response, weightsOrNull, active, scale);
            if (plain != null) {
                return plain;
            }
        }
        return wide(design, response, weightsOrNull, active, scale);
    }

    /** Powers of two that bring the largest weighted number of each column between one and two. */
    private static double[] scales(Design design, double[] weightsOrNull) {
        int p = design.columns();
        double[] scale = new double[p];
        for (int i = 0; i < design.rows(); i++) {
            double root = weightsOrNull == null ? 1 : Math.sqrt(weightsOrNull[i]);
            for (int j = 0; j < p; j++) {
                scale[j] = Math.max(scale[j], Math.abs(design.high(i, j)) * root);
            }
        }
        for (int j = 0; j < p; j++) {
            scale[j] = powerOfTwo(scale[j]);
        }
        return scale;
    }

    private static double powerOfTwo(double magnitude) {
        return magnitude > 0 ? Math.scalb(1.0, -Math.max(Math.getExponent(magnitude), -1000)) : 1;
    }

    private static double responseScale(double[] response, double[] weightsOrNull) {
        double magnitude = 0;
        for (int i = 0; i < response.length; i++) {
            double root = weightsOrNull == null ? 1 : Math.sqrt(weightsOrNull[i]);
            magnitude = Math.max(magnitude, Math.abs(response[i]) * root);
        }
        return powerOfTwo(magnitude);
    }

    /** The solution in double, or null when it may be wrong in the digits promised. */
    private static LinearSolution plain(
            Design design, double[] response, double[] weightsOrNull, int active, double[] scale) {
        int p = design.columns();
        double yScale = responseScale(response, weightsOrNull);
        double[] a = new double[active * p];
        double[] y = new double[active];
        double yNorm = 0;
        int row = 0;
        for (int i = 0; i < design.rows(); i++) {
            double root = weightsOrNull == null ? 1 : Math.sqrt(weightsOrNull[i]);
            if (root > 0) {
                for (int j = 0; j < p; j++) {
                    a[j * active + row] = design.high(i, j) * scale[j] * root;
                }
                y[row] = response[i] * yScale * root;
                yNorm += y[row] * y[row];
                row++;
            }
        }
        HouseholderQr qr = new HouseholderQr(active, p, a, y);
        if (qr.rank < p) {
            return LinearSolution.deficient(design, active, qr.rank);
        }
        Factor factor = new Factor(p, qr.order, scale, qr.factor, null);
        double[] z = new double[p];
        double zNorm = 0;
        for (int k = p - 1; k >= 0; k--) {
            double sum = y[k];
            for (int j = k + 1; j < p; j++) {
                sum -= qr.factor[j * p + k] * z[j];
            }
            z[k] = sum / qr.factor[k * p + k];
            zNorm += z[k] * z[k];
        }
        double rss = 0;
        for (int i = p; i < active; i++) {
            rss += y[i] * y[i];
        }
        double residual = Math.sqrt(rss);
        double condition = factor.conditionBound();
        double length = Math.sqrt(zNorm * p);
        double error = EPSILON * condition * (1 + condition * residual / length);
        boolean residualInDoubt = active > p && EPSILON * Math.sqrt(yNorm) > ENOUGH_RESIDUAL * residual;
        if (!(error <= ENOUGH) || residualInDoubt) {
            return null;
        }
        double[] parameters = new double[p];
        for (int k = 0; k < p; k++) {
            parameters[qr.order[k]] = z[k] * scale[qr.order[k]] / yScale;
        }
        return new LinearSolution(
                design, response, weightsOrNull, active, parameters, null, rss / yScale / yScale, factor);
    }

    private static LinearSolution wide(
            Design design, double[] response, double[] weightsOrNull, int active, double[] scale) {
        int p = design.columns();
        double yScale = responseScale(response, weightsOrNull);
        double[] aHigh = new double[active * p];
        double[] aLow = new double[active * p];
        double[] yHigh = new double[active];
        double[] yLow = new double[active];
        Wide root = new Wide().set(1, 0);
        Wide work = new Wide();
        int row = 0;
        for (int i = 0; i < design.rows(); i++) {
            if (weightsOrNull != null) {
                if (weightsOrNull[i] == 0) {
                    continue;
                }
                root.set(weightsOrNull[i], 0).squareRoot();
            }
            for (int j = 0; j < p; j++) {
                work.set(design.high(i, j) * scale[j], design.low(i, j) * scale[j])
                        .multiply(root.hi, root.lo);
                aHigh[j * active + row] = work.hi;
                aLow[j * active + row] = work.lo;
            }
            work.set(response[i] * yScale, 0).multiply(root.hi, root.lo);
            yHigh[row] = work.hi;
            yLow[row] = work.lo;
            row++;
        }
        // Columns given as doubles repeat each other when they agree to rounding; exact powers are told apart further.
        double tolerance = Math.max(active, p) * (design.wide() ? 0x1p-98 : 0x1p-52);
        WideQr qr = new WideQr(active, p, aHigh, aLow, yHigh, yLow, tolerance);
        if (qr.rank < p) {
            return LinearSolution.deficient(design, active, qr.rank);
        }
        double[] zHigh = new double[p];
        double[] zLow = new double[p];
        for (int k = p - 1; k >= 0; k--) {
            work.set(yHigh[k], yLow[k]);
            for (int j = k + 1; j < p; j++) {
                work.addProduct(-qr.factorHigh[j * p + k], -qr.factorLow[j * p + k], zHigh[j], zLow[j]);
            }
            work.divide(qr.factorHigh[k * p + k], qr.factorLow[k * p + k]);
            zHigh[k] = work.hi;
            zLow[k] = work.lo;
        }
        work.set(0, 0);
        for (int i = p; i < active; i++) {
            work.addProduct(yHigh[i], yLow[i], yHigh[i], yLow[i]);
        }
        double rss = work.value() / yScale / yScale;
        double[] parameters = new double[p];
        double[] trailing = new double[p];
        for (int k = 0; k < p; k++) {
            int j = qr.order[k];
            parameters[j] = zHigh[k] * scale[j] / yScale;
            trailing[j] = zLow[k] * scale[j] / yScale;
        }
        Factor factor = new Factor(p, qr.order, scale, qr.factorHigh, qr.factorLow);
        return new LinearSolution(design, response, weightsOrNull, active, parameters, trailing, rss, factor);
    }
}
