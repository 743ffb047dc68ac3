package org.saddlebook.estimation.api;

import org.saddlebook.estimation.internal.IncompleteBeta;
import org.saddlebook.estimation.internal.Quantiles;

/** Fisher's F distribution, by the incomplete beta function (NIST Digital Library of Mathematical Functions 8.17). */
public final class FisherF {
    private FisherF() {}

    /**
     * Probability of a value above f.
     *
     * @param f any number or infinity
     * @param numeratorDof degrees of freedom of the numerator, positive
     * @param denominatorDof degrees of freedom of the denominator, positive
     */
    public static double upperTail(double f, double numeratorDof, double denominatorDof) {
        require(numeratorDof, denominatorDof);
        if (Double.isNaN(f)) {
            throw new IllegalArgumentException("f is NaN");
        }
        if (f <= 0) {
            return 1;
        }
        double odds = numeratorDof / denominatorDof * f;
        double y = 1 / (1 + odds);
        double x = odds < 1 ? odds * y : 1 / (1 + 1 / odds);
        return new IncompleteBeta(numeratorDof / 2, denominatorDof / 2).at(x, y).upper();
    }

    /**
     * The value that is exceeded with probability {@code 1 - probability}.
     *
     * @param probability strictly between zero and one
     * @param numeratorDof degrees of freedom of the numerator, positive
     * @param denominatorDof degrees of freedom of the denominator, positive
     */
    public static double quantile(double probability, double numeratorDof, double denominatorDof) {
        Quantiles.requireProbability(probability);
        require(numeratorDof, denominatorDof);
        double a = numeratorDof / 2;
        double b = denominatorDof / 2;
        double odds = probability <= 0.5
                ? Quantiles.betaOddsLower(a, b, probability, a / b)
                : Quantiles.betaOddsUpper(a, b, 1 - probability, a / b);
        return odds * b / a;
    }

    private static void require(double numeratorDof, double denominatorDof) {
        Quantiles.requireFreedom(numeratorDof, "numeratorDof");
        Quantiles.requireFreedom(denominatorDof, "denominatorDof");
    }
}
