package org.saddlebook.estimation.api;

/** Whether weights are one over stated variances, or known only up to a factor that the scatter tells. */
public enum Scale {
    /** Weights are one over stated variances: normal quantiles, chi-squared. */
    STATED,
    /** The factor is estimated from the residuals: Student's t, F. */
    ESTIMATED;

    /**
     * The two-sided quantile of one parameter.
     *
     * @param level probability held, strictly between 0 and 1
     * @param degreesOfFreedom of the fit
     * @return Student's t or the normal quantile
     * @throws IllegalStateException when the scale is to be estimated and no degree of freedom is left
     */
    public double quantile(double level, int degreesOfFreedom) {
        if (!(level > 0 && level < 1)) {
            throw new IllegalArgumentException("level is " + level + "; it must lie strictly between 0 and 1");
        }
        double probability = 0.5 + level / 2;
        return this == STATED
                ? Normal.quantile(probability)
                : StudentT.quantile(probability, requireFreedom(degreesOfFreedom));
    }

    /**
     * The limit of a quadratic form in several parameters, {@code (b - b0)' C^-1 (b - b0)} with C the scaled covariance.
     *
     * @param level probability held, strictly between 0 and 1
     * @param parameters q in the form, at least 1
     * @param degreesOfFreedom of the fit
     * @return {@code q F(q, n - p)}, or the quantile of chi-squared with q degrees of freedom
     */
    public double jointQuantile(double level, int parameters, int degreesOfFreedom) {
        return this == STATED
                ? ChiSquared.quantile(level, parameters)
                : parameters * FisherF.quantile(level, parameters, requireFreedom(degreesOfFreedom));
    }

    /** The variance that belongs to weight one: 1, or the residual variance. */
    public double variance(Fit fit) {
        return this == STATED ? 1 : fit.residualVariance();
    }

    private static int requireFreedom(int degreesOfFreedom) {
        if (degreesOfFreedom < 1) {
            throw new IllegalStateException("no degree of freedom is left to estimate a scale");
        }
        return degreesOfFreedom;
    }
}
