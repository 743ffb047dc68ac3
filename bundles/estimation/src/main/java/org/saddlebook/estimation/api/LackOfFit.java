package org.saddlebook.estimation.api;

import java.util.LinkedHashMap;
import java.util.Map;

/**
 * Lack of fit against the scatter of replicates: N. R. Draper and H. Smith, Applied Regression Analysis (1998), 2.2. The
 * residual sum of squares is parted into what replicates differ among themselves (pure error) and what their means differ
 * from the response (lack of fit); their mean squares are compared by F.
 */
public final class LackOfFit {
    private LackOfFit() {}

    /** How the test ended. */
    public sealed interface Outcome permits Tested, NotTestable {}

    /**
     * The test.
     *
     * @param f lack-of-fit mean square over pure-error mean square
     * @param lackFreedom degrees of freedom of lack of fit, groups less parameters
     * @param pureFreedom degrees of freedom of pure error, observations less groups
     * @param lackSum sum of squares of lack of fit
     * @param pureSum sum of squares of pure error
     * @param pValue probability of so large an F when the response is right
     */
    public record Tested(double f, int lackFreedom, int pureFreedom, double lackSum, double pureSum, double pValue)
            implements Outcome {}

    /**
     * Why there is no test.
     *
     * @param reason a sentence naming what is missing
     */
    public record NotTestable(String reason) implements Outcome {}

    /**
     * Tests.
     *
     * @param fit the fit
     * @param response observed values, as fitted
     * @param weightsOrNull weights, as fitted
     * @param groups for each observation the number of its group of replicates: runs of equal conditions have equal numbers
     * @return the test, or why there is none
     */
    public static Outcome test(Fit fit, double[] response, double[] weightsOrNull, int[] groups) {
        if (groups.length != response.length) {
            throw new IllegalArgumentException(groups.length + " groups for " + response.length + " observations");
        }
        // For each group: sum of weights, weighted mean, weighted sum of squares about it (Welford's update).
        Map<Integer, double[]> sums = new LinkedHashMap<>();
        for (int i = 0; i < groups.length; i++) {
            double weight = weightsOrNull == null ? 1 : weightsOrNull[i];
            if (weight > 0) {
                double[] sum = sums.computeIfAbsent(groups[i], key -> new double[3]);
                sum[0] += weight;
                double change = response[i] - sum[1];
                sum[1] += change * weight / sum[0];
                sum[2] += weight * change * (response[i] - sum[1]);
            }
        }
        double pure = 0;
        for (double[] sum : sums.values()) {
            pure += sum[2];
        }
        int pureFreedom = fit.observations() - sums.size();
        int lackFreedom = sums.size() - fit.parameterCount();
        if (pureFreedom < 1) {
            return new NotTestable("no condition was repeated");
        }
        if (lackFreedom < 1) {
            return new NotTestable(sums.size() + " different conditions leave nothing to test beside "
                    + fit.parameterCount() + " parameters");
        }
        if (!(pure > 0)) {
            return new NotTestable("all replicates agree exactly");
        }
        double lack = Math.max(0, fit.residualSumOfSquares() - pure);
        double f = lack / lackFreedom / (pure / pureFreedom);
        return new Tested(f, lackFreedom, pureFreedom, lack, pure, FisherF.upperTail(f, lackFreedom, pureFreedom));
    }
}
