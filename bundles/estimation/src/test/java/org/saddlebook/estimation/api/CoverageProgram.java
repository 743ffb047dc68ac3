package org.saddlebook.estimation.api;

import java.io.IOException;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.SplittableRandom;
import java.util.function.ToDoubleFunction;
import org.saddlebook.estimation.internal.Draws;

/**
 * How often an interval that says 95 % holds the truth: simulated campaigns of one law, ln k straight in 1/T, 100 kJ/mol,
 * temperatures evenly spaced from 40 to 80 degrees Celsius, run scatter lognormal. Writes a table in Markdown.
 *
 * <pre>java ... org.saddlebook.estimation.api.CoverageProgram CAMPAIGNS SEED FILE</pre>
 */
final class CoverageProgram {
    private static final double R = 8.31446261815324;
    private static final double SLOPE = -100_000 / R;
    private static final double LEVEL = 0.95;
    private static final double COLD = 298.15;
    private static final int RESAMPLES = 999;
    /** Shared thermometer offset, K, standard uncertainty. */
    private static final double OFFSET = 0.5;
    /** Random error of each temperature, K, standard uncertainty. */
    private static final double JITTER = 0.3;

    private final int campaigns;
    private final long seed;
    private final Map<String, Cell> cells = new LinkedHashMap<>();

    /** Counts of one row of the table. */
    static final class Cell {
        final String method;
        final String quantity;
        final int n;
        final double scatter;
        int held;
        int all;
        private final Map<String, Integer> kinds = new LinkedHashMap<>();

        Cell(String method, String quantity, int n, double scatter) {
            this.method = method;
            this.quantity = quantity;
            this.n = n;
            this.scatter = scatter;
        }

        void count(boolean holds) {
            all++;
            held += holds ? 1 : 0;
        }

        double percent() {
            return 100.0 * held / all;
        }
    }

    /** One campaign: temperatures as recorded, their design about the centre, ln k. */
    private static final class Campaign {
        final double[] kelvin;
        final double centre;
        final double[][] design;
        final double[] y;
        final double[] truth;

        Campaign(double[] kelvin, double[] y) {
            this.kelvin = kelvin;
            this.y = y;
            double sum = 0;
            for (double t : kelvin) {
                sum += 1 / t;
            }
            centre = sum / kelvin.length;
            design = new double[kelvin.length][];
            for (int i = 0; i < design.length; i++) {
                design[i] = new double[] {1, 1 / kelvin[i] - centre};
            }
            truth = new double[] {lnRate(1 / centre), SLOPE};
        }

        double[] row(String quantity) {
            return switch (quantity) {
                case "Ea" -> new double[] {0, 1};
                case "ln A" -> new double[] {1, -centre};
                default -> new double[] {1, 1 / COLD - centre};
            };
        }
    }

    private static final String[] QUANTITIES = {"Ea", "ln A", "ln k(25 degC)"};

    CoverageProgram(int campaigns, long seed) {
        this.campaigns = campaigns;
        this.seed = seed;
    }

    static double lnRate(double kelvin) {
        return -8 + SLOPE * (1 / kelvin - 1 / 333.15);
    }

    private static double[] temperatures(int n) {
        double[] kelvin = new double[n];
        for (int i = 0; i < n; i++) {
            kelvin[i] = 313.15 + 40.0 * i / (n - 1);
        }
        return kelvin;
    }

    private static Campaign campaign(int n, double scatter, Draws draws) {
        double[] kelvin = temperatures(n);
        double[] y = new double[n];
        for (int i = 0; i < n; i++) {
            y[i] = lnRate(kelvin[i]) + scatter * draws.gaussian();
        }
        return new Campaign(kelvin, y);
    }

    private static LinearFit fit(Campaign c) {
        return (LinearFit) LinearLeastSquares.fit(c.design, c.y, null);
    }

    private static double dot(double[] a, double[] b) {
        double sum = 0;
        for (int j = 0; j < a.length; j++) {
            sum += a[j] * b[j];
        }
        return sum;
    }

    private Cell cell(String method, String quantity, int n, double scatter) {
        return cells.computeIfAbsent(
                method + "|" + quantity + "|" + n + "|" + scatter, key -> new Cell(method, quantity, n, scatter));
    }

    private Draws draws(String name) {
        return new Draws(new SplittableRandom(seed * 31 + name.hashCode()));
    }

    /** The quick part: intervals that claim to be exact or nearly so. */
    List<Cell> claims() {
        for (int n : new int[] {4, 5, 6, 8}) {
            for (double scatter : new double[] {0.02, 0.10}) {
                Draws draws = draws("claims " + n + " " + scatter);
                for (int k = 0; k < campaigns; k++) {
                    student(n, scatter, draws);
                    ratio(n, scatter, draws);
                    thermometer(n, scatter, draws);
                }
            }
        }
        return new ArrayList<>(cells.values());
    }

    private void student(int n, double scatter, Draws draws) {
        Campaign c = campaign(n, scatter, draws);
        LinearFit fit = fit(c);
        double t = StudentT.quantile(0.975, n - 2);
        for (String quantity : QUANTITIES) {
            double[] row = c.row(quantity);
            double error = Math.abs(dot(row, fit.parameters()) - dot(row, c.truth));
            double u = Math.sqrt(fit.residualVariance() * fit.predictionVariance(row));
            cell("Student's t", quantity, n, scatter).count(error <= t * u);
            cell("1.96 standard errors", quantity, n, scatter).count(error <= Normal.quantile(0.975) * u);
        }
    }

    /** A selectivity, two apparent energies 4 kJ/mol apart: the temperature at which it turns, not always determined. */
    private void ratio(int n, double scatter, Draws draws) {
        double[] kelvin = temperatures(n);
        double slope = -4000 / R;
        double[] y = new double[n];
        for (int i = 0; i < n; i++) {
            y[i] = slope * (1 / kelvin[i] - 1 / 318.15) + scatter * draws.gaussian();
        }
        Campaign c = new Campaign(kelvin, y);
        LinearFit fit = fit(c);
        double[] b = fit.parameters();
        double[][] v = fit.unscaledCovariance();
        double s2 = fit.residualVariance();
        RatioSet set =
                Fieller.set(-b[0], b[1], s2 * v[0][0], -s2 * v[0][1], s2 * v[1][1], StudentT.quantile(0.975, n - 2));
        Cell cell = cell("Fieller set", "turning temperature", n, scatter);
        cell.count(set.contains(1 / 318.15 - c.centre));
        cell.kinds.merge(set.getClass().getSimpleName(), 1, Integer::sum);
    }

    private void thermometer(int n, double scatter, Draws draws) {
        double offset = OFFSET * draws.gaussian();
        Campaign truth = campaign(n, scatter, draws);
        double[] recorded = truth.kelvin.clone();
        double[] moved = truth.kelvin.clone();
        for (int i = 0; i < n; i++) {
            recorded[i] -= offset;
            moved[i] = recorded[i] + 1e-3;
        }
        Campaign c = new Campaign(recorded, truth.y);
        Campaign shifted = new Campaign(moved, truth.y);
        LinearFit fit = fit(c);
        LinearFit other = fit(shifted);
        for (String quantity : new String[] {"Ea", "ln k(25 degC)"}) {
            double[] row = c.row(quantity);
            double value = dot(row, fit.parameters());
            double sensitivity = (dot(shifted.row(quantity), other.parameters()) - value) / 1e-3;
            double t = Math.sqrt(fit.residualVariance() * fit.predictionVariance(row));
            double error = Math.abs(value - dot(row, c.truth));
            cell("t plus normal, thermometer 0.5 K shared", quantity, n, scatter)
                    .count(holds(error, t, n - 2, Math.abs(sensitivity) * OFFSET));
        }
    }

    /** Whether an error lies within the quantile, which is never below either part's nor above their sum. */
    private static boolean holds(double error, double t, int dof, double shared) {
        double own = t * StudentT.quantile(0.975, dof);
        double common = shared * Normal.quantile(0.975);
        if (error <= Math.max(own, common)) {
            return true;
        }
        return error <= own + common && error <= StudentPlusNormal.quantile(0.975, t, dof, shared);
    }

    /** The slow part: reported as it is. */
    List<Cell> rest() {
        double scatter = 0.05;
        for (int n : new int[] {4, 5, 6, 8, 12}) {
            Draws draws = draws("rest " + n);
            for (int k = 0; k < campaigns; k++) {
                Campaign c = campaign(n, scatter, draws);
                resampling(c, n, scatter, k);
                robust(c, n, scatter);
                york(n, scatter, draws);
                absolute(n, draws);
            }
        }
        return new ArrayList<>(cells.values());
    }

    private void resampling(Campaign c, int n, double scatter, int number) {
        RandomStreams streams = name -> new SplittableRandom(seed + 7919L * number + 104_729L * n + name.hashCode());
        ResampleOptions options = ResampleOptions.defaults().withResamples(RESAMPLES);
        for (BootstrapKind kind :
                new BootstrapKind[] {BootstrapKind.RESIDUAL, BootstrapKind.CASE, BootstrapKind.PARAMETRIC_ESTIMATED}) {
            Resamples resamples = (Resamples) Bootstrap.linear(kind, c.design, c.y, null, options, streams);
            for (String quantity : new String[] {"Ea", "ln k(25 degC)"}) {
                double[] row = c.row(quantity);
                ToDoubleFunction<double[]> function = parameters -> dot(row, parameters);
                double truth = dot(row, c.truth);
                cell("bootstrap, " + kind.id() + ", percentile", quantity, n, scatter)
                        .count(resamples.percentile(function, LEVEL).contains(truth));
                cell("bootstrap, " + kind.id() + ", BCa", quantity, n, scatter)
                        .count(resamples
                                .bca(function, LEVEL)
                                .map(interval -> interval.contains(truth))
                                .orElse(false));
            }
        }
        Resamples draws = (Resamples) MonteCarlo.draw(fit(c), Scale.ESTIMATED, options, streams);
        double[] row = c.row("ln k(25 degC)");
        cell("Monte Carlo, multivariate t", "ln k(25 degC)", n, scatter)
                .count(draws.percentile(parameters -> dot(row, parameters), LEVEL)
                        .contains(dot(row, c.truth)));
    }

    private void robust(Campaign c, int n, double scatter) {
        for (RobustLoss loss : new RobustLoss[] {RobustLoss.huber(), RobustLoss.bisquare()}) {
            double[] row = c.row("Ea");
            Cell cell = cell("robust (" + loss + "), t times its standard error", "Ea", n, scatter);
            cell.count(RobustRegression.fit(c.design, c.y, null, loss) instanceof RobustFit fit
                    && Math.abs(dot(row, fit.parameters()) - SLOPE)
                            <= StudentT.quantile(0.975, n - 2) * fit.standardErrors()[1]);
        }
    }

    /** Stated uncertainties of k and of each temperature. */
    private void york(int n, double scatter, Draws draws) {
        Campaign c = campaign(n, scatter, draws);
        double[] x = new double[n];
        double[] ux = new double[n];
        double[] uy = new double[n];
        for (int i = 0; i < n; i++) {
            double recorded = c.kelvin[i] + JITTER * draws.gaussian();
            x[i] = 1 / recorded - c.centre;
            ux[i] = JITTER / (recorded * recorded);
            uy[i] = scatter;
        }
        Cell cell = cell("errors in both, stated, normal quantile", "Ea", n, scatter);
        cell.count(OrthogonalRegression.fitLine(MeasuredPoints.of(x, c.y, ux, uy)) instanceof OrthogonalFit fit
                && Math.abs(fit.parameters()[1] - SLOPE)
                        <= Normal.quantile(0.975) * Math.sqrt(fit.unscaledCovariance()[1][1]));
    }

    /** Constant absolute error on k, a fifth of the coldest: fitted to k, profile and linearised interval. */
    private void absolute(int n, Draws draws) {
        double[] kelvin = temperatures(n);
        double sigma = 0.2 * StrictMath.exp(lnRate(kelvin[0]));
        double[] k = new double[n];
        for (int i = 0; i < n; i++) {
            k[i] = StrictMath.exp(lnRate(kelvin[i])) + sigma * draws.gaussian();
        }
        double centre = 1 / 353.15;
        ResponseFunction law = ReferenceModels.over(kelvin, 2, (t, p, g) -> {
            double x = 1 / t - centre;
            double value = StrictMath.exp(p[0] + p[1] * x);
            g[0] = value;
            g[1] = value * x;
            return value;
        });
        NonlinearOptions options = NonlinearOptions.defaults().withThorough(false);
        double[] start = {lnRate(353.15), SLOPE};
        boolean fitted = NonlinearLeastSquares.fit(law, k, null, List.of(start), options) instanceof NonlinearFit;
        Cell profile = cell("constant error on k, profile", "Ea", n, 0.2);
        Cell linear = cell("constant error on k, t times its standard error", "Ea", n, 0.2);
        if (!fitted) {
            profile.count(false);
            linear.count(false);
            return;
        }
        NonlinearFit fit = (NonlinearFit) NonlinearLeastSquares.fit(law, k, null, List.of(start), options);
        double t = StudentT.quantile(0.975, n - 2);
        double u = Math.sqrt(fit.residualVariance() * fit.unscaledCovariance()[1][1]);
        linear.count(Math.abs(fit.parameters()[1] - SLOPE) <= t * u);
        ProfileInterval interval = ProfileLikelihood.of(fit, law, k, null, 1, LEVEL, Scale.ESTIMATED, options);
        profile.count(end(interval.lower(), -1) <= SLOPE && end(interval.upper(), 1) >= SLOPE);
    }

    /**
     * Blocks: 5 % between them and 2 % inside; either each block measures three temperatures, or each temperature is a block
     * of three runs.
     */
    List<Cell> blocks() {
        for (int count : new int[] {3, 4, 6, 8}) {
            Draws draws = draws("blocks " + count);
            for (int k = 0; k < campaigns; k++) {
                blocks(count, true, draws);
                blocks(count, false, draws);
            }
        }
        return new ArrayList<>(cells.values());
    }

    private void blocks(int count, boolean across, Draws draws) {
        int n = 3 * count;
        double[] kelvin = new double[n];
        double[] y = new double[n];
        int[] blocks = new int[n];
        for (int b = 0; b < count; b++) {
            double shared = 0.05 * draws.gaussian();
            for (int r = 0; r < 3; r++) {
                int i = 3 * b + r;
                blocks[i] = b;
                kelvin[i] = across ? 313.15 + 20.0 * r : 313.15 + 40.0 * b / (count - 1);
                y[i] = lnRate(kelvin[i]) + shared + 0.02 * draws.gaussian();
            }
        }
        Campaign c = new Campaign(kelvin, y);
        LinearFit plain = fit(c);
        BlockFit mixed = (BlockFit) BlockRegression.fit(c.design, c.y, null, blocks);
        String where = across ? " (blocks across temperatures)" : " (each temperature a block)";
        for (String quantity : new String[] {"Ea", "ln k(25 degC)"}) {
            double[] row = c.row(quantity);
            double truth = dot(row, c.truth);
            double half =
                    StudentT.quantile(0.975, mixed.degreesOfFreedom(row)) * Math.sqrt(mixed.predictionVariance(row));
            cell("blocks, restricted likelihood, Satterthwaite" + where, quantity, n, 0.05)
                    .count(Math.abs(dot(row, mixed.parameters()) - truth) <= half);
            double naive = StudentT.quantile(0.975, n - 2)
                    * Math.sqrt(plain.residualVariance() * plain.predictionVariance(row));
            cell("blocks ignored, Student's t" + where, quantity, n, 0.05)
                    .count(Math.abs(dot(row, plain.parameters()) - truth) <= naive);
        }
    }

    private static double end(ProfileLimit limit, int side) {
        if (limit instanceof ProfileLimit.At at) {
            return at.value();
        }
        return limit instanceof ProfileLimit.Open ? side * Double.POSITIVE_INFINITY : Double.NaN;
    }

    /** The table. */
    String markdown() {
        StringBuilder text = new StringBuilder(4000);
        text.append("## Coverage of intervals\n\nCoverage of intervals that say 95 %. ")
                .append(campaigns)
                .append(" campaigns each, seed ")
                .append(seed)
                .append(", ")
                .append(RESAMPLES)
                .append(" resamples; one standard error of a share is ")
                .append(decimal(100 * Math.sqrt(0.05 * 0.95 / campaigns), 2))
                .append(" %.\n\n| method | quantity | n | scatter | covered / % | of which |\n")
                .append("|---|---|---|---|---|---|\n");
        for (Cell cell : cells.values()) {
            text.append("| ")
                    .append(cell.method)
                    .append(" | ")
                    .append(cell.quantity)
                    .append(" | ")
                    .append(cell.n)
                    .append(" | ")
                    .append(decimal(100 * cell.scatter, 0))
                    .append(" % | ")
                    .append(decimal(cell.percent(), 1))
                    .append(" | ");
            cell.kinds.forEach((kind, count) -> text.append(kind)
                    .append(' ')
                    .append(decimal(100.0 * count / cell.all, 1))
                    .append(" % "));
            text.append("|\n");
        }
        return text.toString();
    }

    private static String decimal(double value, int digits) {
        return BigDecimal.valueOf(value).setScale(digits, RoundingMode.HALF_UP).toPlainString();
    }

    void write(Path file) throws IOException {
        Files.createDirectories(file.toAbsolutePath().getParent());
        Files.write(file, markdown().getBytes(StandardCharsets.UTF_8));
    }

    public static void main(String[] arguments) throws IOException {
        CoverageProgram program = new CoverageProgram(Integer.parseInt(arguments[0]), Long.parseLong(arguments[1]));
        program.claims();
        program.blocks();
        program.rest();
        program.write(Path.of(arguments[2]));
    }
}
