package org.saddlebook.estimation.internal;

import java.util.LinkedHashMap;
import java.util.Map;

/**
 * Restricted maximum likelihood of one random effect. Inside a block with sum of weights S, subtracting the share
 * {@code 1 - 1 / sqrt(1 + g S)} of the block's weighted mean from every observation makes errors independent, g being the
 * variance between blocks over that inside; so each trial of g is an ordinary problem.
 */
public final class BlockSolution {
    private static final int GRID = 64;
    private static final double GOLDEN = 0.6180339887498949;
    /** Largest share of the variance of a block mean that is looked at. */
    private static final double LARGEST = 1 - 1e-7;

    private static final double PRECISE = 1e-11;

    private final int n;
    private final int p;
    private final double[][] design;
    private final double[] response;
    private final double[] weights;
    private final int[] block;
    private final double[] sums;
    private final double typical;

    private LinearSolution best;
    private double ratio;
    private double within;
    private double[][] information;

    /** A problem of checked numbers; blocks by any numbers. */
    public BlockSolution(double[][] design, double[] response, double[] weightsOrNull, int[] blocks) {
        n = response.length;
        p = design[0].length;
        this.design = design;
        this.response = response;
        weights = new double[n];
        block = new int[n];
        Map<Integer, Integer> index = new LinkedHashMap<>();
        for (int i = 0; i < n; i++) {
            weights[i] = weightsOrNull == null ? 1 : weightsOrNull[i];
            Integer known = index.putIfAbsent(blocks[i], index.size());
            block[i] = known == null ? index.size() - 1 : known;
        }
        sums = new double[index.size()];
        double total = 0;
        for (int i = 0; i < n; i++) {
            sums[block[i]] += weights[i];
            total += weights[i];
        }
        typical = total / sums.length;
    }

    /** Why the variances cannot be told apart; empty when they can. */
    public String refusal() {
        if (sums.length < 2) {
            return "there is one block only";
        }
        if (sums.length == n) {
            return "every block holds one observation: its error and the block's cannot be told apart";
        }
        // Columns of the design and of the blocks together must leave something for the scatter inside blocks.
        double[] flat = new double[n * (p + sums.length)];
        int columns = p + sums.length;
        for (int i = 0; i < n; i++) {
            System.arraycopy(design[i], 0, flat, i * columns, p);
            flat[i * columns + p + block[i]] = 1;
        }
        LinearSolution both = LinearSolver.solve(new Design(n, columns, flat, null), response, null);
        if (both.rank() >= n) {
            return "nothing is repeated inside the blocks: no degree of freedom is left for the scatter there";
        }
        return both.rank() == p ? "the blocks are already told by the parameters" : "";
    }

    /** Finds the variances; why not, or empty. */
    public String search() {
        double bestShare = 0;
        double lowest = Double.POSITIVE_INFINITY;
        for (int k = 0; k <= GRID; k++) {
            double share = LARGEST * k / GRID;
            double value = criterion(share);
            if (value < lowest) {
                lowest = value;
                bestShare = share;
            }
        }
        double low = Math.max(0, bestShare - LARGEST / GRID);
        double high = Math.min(LARGEST, bestShare + LARGEST / GRID);
        double a = high - GOLDEN * (high - low);
        double b = low + GOLDEN * (high - low);
        double atA = criterion(a);
        double atB = criterion(b);
        while (high - low > PRECISE) {
            if (atA <= atB) {
                high = b;
                b = a;
                atB = atA;
                a = high - GOLDEN * (high - low);
                atA = criterion(a);
            } else {
                low = a;
                a = b;
                atA = atB;
                b = low + GOLDEN * (high - low);
                atB = criterion(b);
            }
        }
        double share = stationary(0.5 * (low + high));
        if (criterion(0) <= criterion(share)) {
            share = 0;
        }
        if (share > LARGEST - 1e-6) {
            return "the observations of each block agree to rounding: no scatter is left inside the blocks";
        }
        ratio = share / (1 - share) / typical;
        best = transformed(ratio);
        within = best.residualSumOfSquares() / (n - p);
        if (!(within > 0)) {
            return "there is no scatter";
        }
        information = information();
        return "";
    }

    /** A minimum is flat to half the digits; its slope is not: secant steps on the central difference. */
    private double stationary(double share) {
        double h = 1e-4 * Math.min(share, 1 - share);
        if (!(h > 1e-9)) {
            return share;
        }
        double x = share;
        for (int k = 0; k < 3; k++) {
            double up = criterion(x + h);
            double down = criterion(x - h);
            double curvature = (up - 2 * criterion(x) + down) / (h * h);
            double next = x - (up - down) / (2 * h) / curvature;
            if (!(curvature > 0) || !(Math.abs(next - x) < 2 * h)) {
                break;
            }
            x = next;
        }
        return x;
    }

    /** Minus twice the restricted log-likelihood, the variance inside blocks at its best, up to a constant. */
    private double criterion(double share) {
        double g = share / (1 - share) / typical;
        LinearSolution solution = transformed(g);
        if (solution.rank() < p) {
            return Double.POSITIVE_INFINITY;
        }
        double value = (n - p) * StrictMath.log(solution.residualSumOfSquares()) + solution.logDeterminant();
        for (double sum : sums) {
            value += StrictMath.log1p(g * sum);
        }
        return value;
    }

    private LinearSolution transformed(double g) {
        double[] flat = new double[n * p];
        double[] right = new double[n];
        double[] means = new double[sums.length * (p + 1)];
        for (int i = 0; i < n; i++) {
            int at = block[i] * (p + 1);
            double part = weights[i] / sums[block[i]];
            for (int j = 0; j < p; j++) {
                means[at + j] += part * design[i][j];
            }
            means[at + p] += part * response[i];
        }
        for (int i = 0; i < n; i++) {
            int at = block[i] * (p + 1);
            double root = Math.sqrt(weights[i]);
            double share = 1 - 1 / Math.sqrt(1 + g * sums[block[i]]);
            for (int j = 0; j < p; j++) {
                flat[i * p + j] = root * (design[i][j] - share * means[at + j]);
            }
            right[i] = root * (response[i] - share * means[at + p]);
        }
        return LinearSolver.solve(new Design(n, p, flat, null), right, null);
    }

    /** The estimates. */
    public double[] parameters() {
        return best.parameters();
    }

    /** Scaled covariance. */
    public double[][] covariance() {
        double[][] result = best.covariance();
        for (double[] row : result) {
            for (int j = 0; j < p; j++) {
                row[j] *= within;
            }
        }
        return result;
    }

    /** Variance inside blocks. */
    public double within() {
        return within;
    }

    /** Variance between blocks. */
    public double between() {
        return ratio * within;
    }

    /** Scaled variance of a combination. */
    public double predictionVariance(double[] row) {
        return within * best.predictionVariance(row);
    }

    /** Observed minus fitted. */
    public double[] residuals() {
        double[] b = best.parameters();
        double[] result = response.clone();
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < p; j++) {
                result[i] -= design[i][j] * b[j];
            }
        }
        return result;
    }

    /** Satterthwaite's degrees of freedom of a combination. */
    public double degreesOfFreedom(double[] row) {
        if (ratio == 0) {
            return n - p;
        }
        double variance = predictionVariance(row);
        double[][] c = covariance();
        // a = V^-1 X C g; the derivative of g' C g is a' V_k a.
        double[] combination = new double[n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < p; j++) {
                for (int k = 0; k < p; k++) {
                    combination[i] += design[i][j] * c[j][k] * row[k];
                }
            }
        }
        double[] a = inverseTimes(combination);
        double[] inside = new double[sums.length];
        double second = 0;
        for (int i = 0; i < n; i++) {
            inside[block[i]] += a[i];
            second += a[i] * a[i] / weights[i];
        }
        double first = 0;
        for (double sum : inside) {
            first += sum * sum;
        }
        double determinant =
                Products.difference(information[0][0], information[1][1], information[0][1], information[0][1]);
        double spread = (information[1][1] * first * first
                        - 2 * information[0][1] * first * second
                        + information[0][0] * second * second)
                / determinant;
        return Math.min(n - p, Math.max(1, 2 * variance * variance / spread));
    }

    /** {@code V^-1 x}. */
    private double[] inverseTimes(double[] x) {
        double[] totals = new double[sums.length];
        for (int i = 0; i < n; i++) {
            totals[block[i]] += weights[i] * x[i];
        }
        double[] result = new double[n];
        for (int i = 0; i < n; i++) {
            double part = ratio / (1 + ratio * sums[block[i]]) * totals[block[i]];
            result[i] = weights[i] * (x[i] - part) / within;
        }
        return result;
    }

    /** Expected information {@code tr(P V_j P V_k) / 2} of the variances between and inside blocks. */
    private double[][] information() {
        double[][] c = covariance();
        double[][] projection = new double[n][];
        double[][] solved = new double[p][];
        double[] column = new double[n];
        for (int j = 0; j < p; j++) {
            for (int i = 0; i < n; i++) {
                column[i] = design[i][j];
            }
            solved[j] = inverseTimes(column);
        }
        for (int m = 0; m < n; m++) {
            double[] unit = new double[n];
            unit[m] = 1;
            double[] inverse = inverseTimes(unit);
            for (int j = 0; j < p; j++) {
                for (int k = 0; k < p; k++) {
                    double factor = c[j][k] * solved[k][m];
                    for (int i = 0; i < n; i++) {
                        inverse[i] -= solved[j][i] * factor;
                    }
                }
            }
            projection[m] = inverse;
        }
        double[][] blocks = new double[sums.length][sums.length];
        double[][] mixed = new double[sums.length][n];
        double both = 0;
        for (int m = 0; m < n; m++) {
            for (int i = 0; i < n; i++) {
                blocks[block[m]][block[i]] += projection[m][i];
                mixed[block[m]][i] += projection[m][i];
                both += projection[m][i] * projection[m][i] / (weights[m] * weights[i]);
            }
        }
        double first = 0;
        double cross = 0;
        for (int g = 0; g < sums.length; g++) {
            for (int h = 0; h < sums.length; h++) {
                first += blocks[g][h] * blocks[g][h];
            }
            for (int i = 0; i < n; i++) {
                cross += mixed[g][i] * mixed[g][i] / weights[i];
            }
        }
        return new double[][] {{first / 2, cross / 2}, {cross / 2, both / 2}};
    }
}
