package org.saddlebook.estimation.internal;

/** Quantiles by inversion of the tails. */
public final class Quantiles {
    private Quantiles() {}

    /** Refuses a probability that is not strictly between zero and one. */
    public static void requireProbability(double probability) {
        if (!(probability > 0 && probability < 1)) {
            throw new IllegalArgumentException("probability is " + probability + "; between 0 and 1 is needed");
        }
    }

    /** Refuses degrees of freedom that are not positive and finite. */
    public static void requireFreedom(double dof, String name) {
        if (!(dof > 0 && dof < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException(name + " is " + dof + "; a positive finite number is needed");
        }
    }

    /** x with {@code P(a, x) = lower}. */
    public static double gammaLower(double a, double lower, double start) {
        return QuantileSearch.solve(new IncompleteGamma(a), true, lower, start);
    }

    /** x with {@code Q(a, x) = upper}. */
    public static double gammaUpper(double a, double upper, double start) {
        return QuantileSearch.solve(new IncompleteGamma(a), false, upper, start);
    }

    /** Odds {@code r = x / y} with {@code I_x(a, b) = lower}, x = r / (1 + r). */
    public static double betaOddsLower(double a, double b, double lower, double start) {
        return QuantileSearch.solve(new IncompleteBeta(a, b), true, lower, start);
    }

    /** Odds {@code r = x / y} with {@code 1 - I_x(a, b) = upper}. */
    public static double betaOddsUpper(double a, double b, double upper, double start) {
        return QuantileSearch.solve(new IncompleteBeta(a, b), false, upper, start);
    }
}
