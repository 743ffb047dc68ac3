package org.saddlebook.estimation.internal;

/** A solved linear problem; everything that not every caller needs is computed when asked for. */
public final class LinearSolution {
    private final Design design;
    private final double[] response;
    private final double[] weightsOrNull;
    private final int observations;
    private final int rank;
    private final double[] parameters;
    private final double[] trailingOrNull;
    private final double residualSumOfSquares;
    private final Factor factor;
    private final String deficiency;

    LinearSolution(
            Design design,
            double[] response,
            double[] weightsOrNull,
            int observations,
            double[] parameters,
            double[] trailingOrNull,
            double residualSumOfSquares,
            Factor factor) {
        this.design = design;
        this.response = response;
        this.weightsOrNull = weightsOrNull;
        this.observations = observations;
        this.rank = design.columns();
        this.parameters = parameters;
        this.trailingOrNull = trailingOrNull;
        this.residualSumOfSquares = residualSumOfSquares;
        this.factor = factor;
        this.deficiency = "";
    }

    private LinearSolution(Design design, int observations, int rank, String deficiency) {
        this.design = design;
        this.response = new double[0];
        this.weightsOrNull = null;
        this.observations = observations;
        this.rank = rank;
        this.parameters = new double[0];
        this.trailingOrNull = null;
        this.residualSumOfSquares = 0;
        this.factor = null;
        this.deficiency = deficiency;
    }

    static LinearSolution deficient(Design design, int observations, int rank) {
        int p = design.columns();
        String reason = observations < p
                ? observations + " observations do not determine " + p + " parameters"
                : "the observations determine only " + rank + " of " + p
                        + " parameters: columns of the design repeat each other or are zero";
        return new LinearSolution(design, observations, rank, reason);
    }

    /** Independent columns found. */
    public int rank() {
        return rank;
    }

    /** Why the rank falls short; empty when it does not. */
    public String deficiency() {
        return deficiency;
    }

    /** Rows with a weight above zero. */
    public int observations() {
        return observations;
    }

    /** Number of columns. */
    public int parameterCount() {
        return design.columns();
    }

    /** Observations beyond the parameters. */
    public int degreesOfFreedom() {
        return observations - design.columns();
    }

    /** The estimates, a copy. */
    public double[] parameters() {
        return parameters.clone();
    }

    /** Weighted sum of squared residuals. */
    public double residualSumOfSquares() {
        return residualSumOfSquares;
    }

    /** Variance of an observation of weight one. */
    public double residualVariance() {
        if (degreesOfFreedom() == 0) {
            throw new IllegalStateException("no degree of freedom is left to estimate a variance");
        }
        return residualSumOfSquares / degreesOfFreedom();
    }

    /** Unscaled covariance. */
    public double[][] covariance() {
        return factor.covariance();
    }

    /** Observed minus fitted. */
    public double[] residuals() {
        int p = design.columns();
        double[] result = new double[design.rows()];
        Wide sum = new Wide();
        for (int i = 0; i < result.length; i++) {
            sum.set(response[i], 0);
            for (int j = 0; j < p; j++) {
                double trailing = trailingOrNull == null ? 0 : trailingOrNull[j];
                sum.addProduct(-design.high(i, j), -design.low(i, j), parameters[j], trailing);
            }
            result[i] = sum.value();
        }
        return result;
    }

    /** Diagonal of the weighted hat matrix. */
    public double[] leverages() {
        int p = design.columns();
        double[] result = new double[design.rows()];
        double[] row = new double[p];
        double[] low = design.wide() ? new double[p] : null;
        for (int i = 0; i < result.length; i++) {
            double weight = weightsOrNull == null ? 1 : weightsOrNull[i];
            if (weight > 0) {
                for (int j = 0; j < p; j++) {
                    row[j] = design.high(i, j);
                    if (low != null) {
                        low[j] = design.low(i, j);
                    }
                }
                double[] z = factor.solveTransposed(row, low);
                result[i] = Math.min(1, weight * factor.product(z, z));
            }
        }
        return result;
    }

    /** Condition number of the weighted design with unit columns. */
    public double conditionNumber() {
        return factor.conditionNumber();
    }

    /** {@code ln |X'WX|}. */
    double logDeterminant() {
        return factor.logDeterminant();
    }

    /** {@code g' (X'WX)^-1 g}. */
    public double predictionVariance(double[] row) {
        requireRow(row);
        double[] z = factor.solveTransposed(row, null);
        return factor.product(z, z);
    }

    /** {@code g' (X'WX)^-1 h}. */
    public double predictionCovariance(double[] row, double[] other) {
        requireRow(row);
        requireRow(other);
        return factor.product(factor.solveTransposed(row, null), factor.solveTransposed(other, null));
    }

    /**
     * Solves {@code (X'WX - S) d = X'WX b}: with b this solution, a Newton step where this one is a Gauss-Newton step.
     *
     * @param second S, symmetric
     * @param plain b
     * @return d, or null when the curved problem is not positive definite or has no solution in numbers
     */
    double[] curvedStep(double[][] second, double[] plain) {
        return factor.curvedStep(second, plain);
    }

    private void requireRow(double[] row) {
        if (row.length != design.columns()) {
            throw new IllegalArgumentException(
                    "a row of " + row.length + " numbers for " + design.columns() + " parameters");
        }
        for (int j = 0; j < row.length; j++) {
            Inputs.requireNumber(row[j], "row", j);
        }
    }
}
