package org.saddlebook.reaction.series.internal;

import org.saddlebook.estimation.api.ChiSquared;
import org.saddlebook.estimation.api.FisherF;
import org.saddlebook.estimation.api.StudentT;

/**
 * The size of the errors and the distributions that follow from it: estimated from the scatter (t and F), or stated (normal
 * and chi-squared, infinitely many degrees of freedom).
 *
 * @param variance variance of an observation of weight one; 1 where stated
 * @param degreesOfFreedom of the variance; infinite where stated
 */
record Scale(double variance, double degreesOfFreedom) {
    /** Errors as stated. */
    static final Scale STATED = new Scale(1, Double.POSITIVE_INFINITY);

    boolean stated() {
        return Double.isInfinite(degreesOfFreedom);
    }

    /** Two-sided quantile. */
    double quantile(double level) {
        return StudentT.quantile(0.5 + level / 2, degreesOfFreedom);
    }

    /** Probability of so large a cost of q restrictions when they hold. */
    double probability(double cost, int restrictions) {
        return stated()
                ? ChiSquared.upperTail(cost, restrictions)
                : FisherF.upperTail(cost / restrictions / variance, restrictions, degreesOfFreedom);
    }

    /** The cost of one restriction that is exceeded with probability 1 − level when it holds. */
    double limit(double level) {
        double t = quantile(level);
        return t * t * variance;
    }

    /** The test statistic: F, or chi-squared where stated. */
    double statistic(double cost, int restrictions) {
        return stated() ? cost : cost / restrictions / variance;
    }

    /** Short name of the statistic with its degrees of freedom, for sentences. */
    String statisticName(int restrictions) {
        return stated() ? "χ²(" + restrictions + ")" : "F(" + restrictions + ", " + Math.round(degreesOfFreedom) + ")";
    }

    /** The word for intervals. */
    String method() {
        return stated() ? "normal" : "t";
    }
}
