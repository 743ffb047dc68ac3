package org.saddlebook.estimation.api;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** Looks at residuals one by one and in their order: R. D. Cook and S. Weisberg, Residuals and Influence (1982), chapter 2. */
public final class Diagnostics {
    /** Leverages closer to one than this leave no residual to judge. */
    private static final double FULL = 1e-10;

    private Diagnostics() {}

    /**
     * Diagnostics of every observation that took part, in their order.
     *
     * @param fit the fit
     * @param weightsOrNull the weights it was made with
     */
    public static List<PointDiagnostics> of(Fit fit, double[] weightsOrNull) {
        double[] residuals = fit.residuals();
        double[] leverages = fit.leverages();
        int dof = fit.degreesOfFreedom();
        double sum = fit.residualSumOfSquares();
        List<PointDiagnostics> result = new ArrayList<>(residuals.length);
        for (int i = 0; i < residuals.length; i++) {
            double weight = weightsOrNull == null ? 1 : weightsOrNull[i];
            if (!(weight > 0)) {
                continue;
            }
            double rest = 1 - leverages[i];
            OptionalDouble studentised = OptionalDouble.empty();
            OptionalDouble deleted = OptionalDouble.empty();
            OptionalDouble cook = OptionalDouble.empty();
            if (dof > 0 && sum > 0 && rest > FULL) {
                double own = residuals[i] * Math.sqrt(weight / rest);
                double internal = own / Math.sqrt(sum / dof);
                studentised = OptionalDouble.of(internal);
                cook = OptionalDouble.of(internal * internal * leverages[i] / rest / fit.parameterCount());
                double without = sum - own * own;
                if (dof > 1 && without > 0) {
                    deleted = OptionalDouble.of(own / Math.sqrt(without / (dof - 1)));
                }
            }
            result.add(new PointDiagnostics(i, leverages[i], studentised, deleted, cook));
        }
        return result;
    }

    /**
     * The runs test on the signs of residuals in their order: A. Wald and J. Wolfowitz, Ann. Math. Statist. 11 (1940) 147.
     * Exact, by counting arrangements; residuals that are zero are left out.
     *
     * @param residuals in the order to be judged, of temperature or of time
     * @return number of runs and how likely so few, or so many, are if the order means nothing
     */
    public static RunsTest runs(double[] residuals) {
        int positive = 0;
        int negative = 0;
        int runs = 0;
        double last = 0;
        for (double residual : residuals) {
            if (residual == 0) {
                continue;
            }
            if (residual > 0) {
                positive++;
            } else {
                negative++;
            }
            if (runs == 0 || residual > 0 != last > 0) {
                runs++;
            }
            last = residual;
        }
        double few = 0;
        double many = 0;
        for (int r = Math.min(1, runs); r <= positive + negative; r++) {
            double share = probability(r, positive, negative);
            few += r <= runs ? share : 0;
            many += r >= runs ? share : 0;
        }
        return new RunsTest(runs, positive, negative, Math.min(1, few), Math.min(1, many));
    }

    /** Probability of exactly r runs of two kinds in random order. */
    private static double probability(int r, int first, int second) {
        if (first == 0 || second == 0) {
            return r == (first + second == 0 ? 0 : 1) ? 1 : 0;
        }
        int half = r / 2;
        double ways = r % 2 == 0
                ? 2 * choose(first - 1, half - 1) * choose(second - 1, half - 1)
                : choose(first - 1, half) * choose(second - 1, half - 1)
                        + choose(first - 1, half - 1) * choose(second - 1, half);
        return ways / choose(first + second, first);
    }

    private static double choose(int n, int k) {
        if (k < 0 || k > n) {
            return 0;
        }
        double result = 1;
        for (int i = 1; i <= k; i++) {
            result = result * (n - k + i) / i;
        }
        return result;
    }
}
