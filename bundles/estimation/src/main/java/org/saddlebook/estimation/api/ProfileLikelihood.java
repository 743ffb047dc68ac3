package org.saddlebook.estimation.api;

import org.saddlebook.estimation.internal.Inputs;
import org.saddlebook.estimation.internal.ProfileSearch;

/**
 * Profile-likelihood intervals: all values of one parameter at which, with the others refitted, the sum of squares exceeds
 * the smallest by at most {@code q^2 s^2} (D. M. Bates and D. G. Watts, Nonlinear Regression Analysis and Its Applications
 * (1988), 6.1). Unlike {@code b +/- q u} they follow the curvature of the response, depend on no choice of parameters, and
 * know when the data set no limit at all.
 *
 * <p>q is Student's t with n - p degrees of freedom when the scale is estimated, the normal quantile (the root of chi-squared
 * with one degree of freedom) when uncertainties are stated.
 */
public final class ProfileLikelihood {
    private ProfileLikelihood() {}

    /**
     * For a response linear in its parameters, where the profile is a parabola and the interval exactly the t interval.
     *
     * @param fit the fit
     * @param parameter index of the parameter
     * @param level probability held, strictly between 0 and 1
     * @param scale whether weights are one over stated variances
     * @throws IllegalStateException when the scale is to be estimated and no degree of freedom is left
     */
    public static ProfileInterval of(LinearFit fit, int parameter, double level, Scale scale) {
        double[] parameters = fit.parameters();
        requireIndex(parameter, parameters.length);
        double quantile = scale.quantile(level, fit.degreesOfFreedom());
        double[] unit = new double[parameters.length];
        unit[parameter] = 1;
        double half = quantile * Math.sqrt(scale.variance(fit) * fit.predictionVariance(unit));
        double estimate = parameters[parameter];
        return new ProfileInterval(
                estimate, new ProfileLimit.At(estimate - half), new ProfileLimit.At(estimate + half), quantile);
    }

    /**
     * For any response.
     *
     * @param fit the fit of this problem
     * @param function the response, as fitted
     * @param response observed values, as fitted
     * @param weightsOrNull weights, as fitted
     * @param parameter index of the parameter
     * @param level probability held, strictly between 0 and 1
     * @param scale whether weights are one over stated variances
     * @param options bounds, limit of iterations and check, as fitted
     * @return both ends, each found, open or lost with a reason
     * @throws IllegalStateException when the scale is to be estimated and no degree of freedom is left
     */
    public static ProfileInterval of(
            NonlinearFit fit,
            ResponseFunction function,
            double[] response,
            double[] weightsOrNull,
            int parameter,
            double level,
            Scale scale,
            NonlinearOptions options) {
        double[] estimate = fit.parameters();
        int p = estimate.length;
        requireIndex(parameter, p);
        double quantile = scale.quantile(level, fit.degreesOfFreedom());
        double variance = scale.variance(fit);
        double[][] covariance = fit.unscaledCovariance();
        double own = covariance[parameter][parameter];
        double value = estimate[parameter];
        if (!(own > 0)) {
            ProfileLimit held = new ProfileLimit.Lost(value, "the parameter is held at its bound");
            return new ProfileInterval(value, held, held, quantile);
        }
        double deviation = Math.sqrt(variance * own);
        boolean rounding = value + deviation == value && value - deviation == value;
        if (rounding || !(variance > 0)) {
            ProfileLimit exact = new ProfileLimit.At(value);
            return new ProfileInterval(value, exact, exact, quantile);
        }
        double[] slopes = new double[p];
        for (int j = 0; j < p; j++) {
            slopes[j] = covariance[parameter][j] / own;
        }
        int n = function.observations();
        ProfileSearch search = new ProfileSearch(
                new ProfileSearch.Problem(
                        function,
                        Inputs.response(response, n),
                        Inputs.weights(weightsOrNull, n),
                        options.lower(p),
                        options.upper(p),
                        options.check(),
                        options.maximumIterations()),
                estimate,
                fit.residualSumOfSquares(),
                variance,
                parameter,
                quantile);
        return new ProfileInterval(
                value, search.end(-1, deviation, slopes), search.end(1, deviation, slopes), quantile);
    }

    private static void requireIndex(int parameter, int p) {
        if (parameter < 0 || parameter >= p) {
            throw new IllegalArgumentException("parameter " + parameter + " of " + p);
        }
    }
}
