package org.saddlebook.estimation.api;

import org.saddlebook.estimation.internal.IncompleteGamma;
import org.saddlebook.estimation.internal.Quantiles;

/** The chi-squared distribution (DLMF 8.2.4 with a = dof / 2, x = value / 2). */
public final class ChiSquared {
    private ChiSquared() {}

    /**
     * Probability of a value above x.
     *
     * @param x any number or infinity
     * @param dof degrees of freedom, positive, not necessarily whole
     */
    public static double upperTail(double x, double dof) {
        Quantiles.requireFreedom(dof, "dof");
        if (Double.isNaN(x)) {
            throw new IllegalArgumentException("x is NaN");
        }
        return new IncompleteGamma(dof / 2).at(x / 2).upper();
    }

    /**
     * The value that is exceeded with probability {@code 1 - probability}.
     *
     * @param probability strictly between zero and one
     * @param dof degrees of freedom, positive
     */
    public static double quantile(double probability, double dof) {
        Quantiles.requireProbability(probability);
        Quantiles.requireFreedom(dof, "dof");
        double a = dof / 2;
        return 2
                * (probability <= 0.5
                        ? Quantiles.gammaLower(a, probability, a)
                        : Quantiles.gammaUpper(a, 1 - probability, a - StrictMath.log(1 - probability)));
    }
}
