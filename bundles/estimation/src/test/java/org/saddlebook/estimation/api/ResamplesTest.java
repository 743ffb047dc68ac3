package org.saddlebook.estimation.api;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.SplittableRandom;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class ResamplesTest {
    private static final int N = 8;
    private static final double[][] DESIGN = new double[N][];
    private static final double[] Y = new double[N];

    static {
        for (int i = 0; i < N; i++) {
            double kelvin = 300 + 7.5 * i;
            DESIGN[i] = new double[] {1, StrictMath.log(kelvin / 325), 1 / kelvin - 1 / 325.0};
            Y[i] = 2 - 9000 * DESIGN[i][2] + 0.02 * StrictMath.sin(17.0 * i + 1);
        }
    }

    private static final RandomStreams STREAMS = name -> new SplittableRandom(20260L + name.hashCode());
    private static final ResampleOptions OPTIONS = ResampleOptions.defaults();

    private static Resamples resampled(BootstrapKind kind, double[] weightsOrNull, ResampleOptions options) {
        return assertInstanceOf(Resamples.class, Bootstrap.linear(kind, DESIGN, Y, weightsOrNull, options, STREAMS));
    }

    private static LinearFit fit(double[] weightsOrNull) {
        return assertInstanceOf(LinearFit.class, LinearLeastSquares.fit(DESIGN, Y, weightsOrNull));
    }

    @Test
    void percentileAndBcaIntervalsOfGivenReplicatesAgreeWithSciPy() throws IOException {
        // reference/uncertainty/bca.csv, made by bca.py beside it, whose quantiles take (B - 1) p for (B + 1) p - 1:
        // one
        // order statistic apart at most.
        double[] values = new double[99_999];
        for (int k = 1; k <= values.length; k++) {
            double q = Normal.quantile(k / 100_000.0);
            values[k - 1] = q + 0.3 * q * q;
        }
        double[] x = {0.9, -0.6, 0.3, -0.2, 1.9, -1.1, 0.4, -1.2};
        double sum = 0;
        for (double number : x) {
            sum += number;
        }
        double[] left = new double[x.length];
        for (int i = 0; i < x.length; i++) {
            left[i] = (sum - x[i]) / 7;
        }
        Resamples given = new Resamples(new double[] {sum / 8}, values, left, 0);
        int rows = 0;
        try (BufferedReader reader = new BufferedReader(new InputStreamReader(
                ResamplesTest.class.getResourceAsStream("/reference/uncertainty/bca.csv"), StandardCharsets.UTF_8))) {
            for (String text = reader.readLine(); text != null; text = reader.readLine()) {
                String[] cells = text.split(",", -1);
                if (!text.startsWith("percentile") && !text.startsWith("bca")) {
                    continue;
                }
                double level = Double.parseDouble(cells[1]);
                Interval interval = cells[0].equals("bca")
                        ? given.bca(Resamples.parameter(0), level).orElseThrow()
                        : given.percentile(Resamples.parameter(0), level);
                assertEquals(Double.parseDouble(cells[2]), interval.lower(), 1.2e-3);
                assertEquals(Double.parseDouble(cells[3]), interval.upper(), 1.2e-3);
                rows++;
            }
        }
        assertEquals(6, rows);
    }

    @Test
    void residualResamplesScatterAsTheDrawnPoolSays() {
        // Var b* = s2 C exactly, with s2 the mean square of the centred corrected residuals.
        LinearFit fit = fit(null);
        double[] r = fit.residuals();
        double[] h = fit.leverages();
        double mean = 0;
        for (int i = 0; i < N; i++) {
            r[i] /= Math.sqrt(1 - h[i]);
            mean += r[i] / N;
        }
        double square = 0;
        for (int i = 0; i < N; i++) {
            square += (r[i] - mean) * (r[i] - mean) / N;
        }
        Resamples resamples = resampled(BootstrapKind.RESIDUAL, null, OPTIONS);
        assertEquals(10_000, resamples.count());
        for (int j = 0; j < 3; j++) {
            double expected = Math.sqrt(square * fit.unscaledCovariance()[j][j]);
            assertEquals(expected, resamples.standardDeviation(Resamples.parameter(j)), 0.04 * expected);
        }
    }

    @Test
    void parametricResamplesScatterAsTheCovarianceSays() {
        double[] weights = new double[N];
        for (int i = 0; i < N; i++) {
            weights[i] = 100 + 400 * i;
        }
        LinearFit fit = fit(weights);
        double[] factor = {1, fit.residualVariance()};
        BootstrapKind[] kinds = {BootstrapKind.PARAMETRIC_STATED, BootstrapKind.PARAMETRIC_ESTIMATED};
        for (int k = 0; k < 2; k++) {
            Resamples resamples = resampled(kinds[k], weights, OPTIONS);
            for (int j = 0; j < 3; j++) {
                double expected = Math.sqrt(factor[k] * fit.unscaledCovariance()[j][j]);
                assertEquals(expected, resamples.standardDeviation(Resamples.parameter(j)), 0.04 * expected);
            }
        }
    }

    @ParameterizedTest
    @EnumSource(BootstrapKind.class)
    void theResultIsTheSameOnAnyNumberOfThreadsAndForTheSameSeedOnly(BootstrapKind kind) {
        ResampleOptions few = OPTIONS.withResamples(2100);
        double[] one = resampled(kind, null, few).of(Resamples.parameter(2));
        double[] many = resampled(kind, null, few.withParallel(true)).of(Resamples.parameter(2));
        double[] other = resampled(kind, null, few.withStream("other")).of(Resamples.parameter(2));
        assertArrayEquals(one, many, 0);
        assertTrue(one[0] != other[0]);
    }

    @Test
    void drawingWholeObservationsRedrawsAndCountsSamplesThatDetermineNothing() {
        // Three temperatures, two parameters: a sample is useless when all three draws are equal, 3 of 27.
        double[][] design = {{1, -1}, {1, 0}, {1, 1}};
        Resamples resamples = assertInstanceOf(
                Resamples.class,
                Bootstrap.linear(BootstrapKind.CASE, design, new double[] {1, 2.5, 3}, null, OPTIONS, STREAMS));
        double share = resamples.redrawn() / (double) (resamples.redrawn() + resamples.count());
        assertEquals(3.0 / 27, share, 0.012);
        for (double slope : resamples.of(Resamples.parameter(1))) {
            assertTrue(slope >= 0.5 - 1e-12 && slope <= 1.5 + 1e-12, "slopes lie between those of any two points");
        }
    }

    @Test
    void refitsOfALinearResponseAgreeWithTheDirectWay() {
        ResponseFunction function = new ResponseFunction() {
            @Override
            public int observations() {
                return N;
            }

            @Override
            public int parameterCount() {
                return 3;
            }

            @Override
            public void evaluate(double[] p, double[] values, double[][] jacobian) {
                for (int i = 0; i < N; i++) {
                    values[i] = 0;
                    for (int j = 0; j < 3; j++) {
                        jacobian[i][j] = DESIGN[i][j];
                        values[i] += DESIGN[i][j] * p[j];
                    }
                }
            }
        };
        double[] start = {1, 1, -8000};
        NonlinearFit nonlinear = assertInstanceOf(
                NonlinearFit.class,
                NonlinearLeastSquares.fit(function, Y, null, List.of(start), NonlinearOptions.defaults()));
        ResampleOptions few = OPTIONS.withResamples(40);
        for (BootstrapKind kind : BootstrapKind.values()) {
            Resamples direct = resampled(kind, null, few);
            Resamples refitted = assertInstanceOf(
                    Resamples.class,
                    Bootstrap.nonlinear(kind, nonlinear, function, Y, null, NonlinearOptions.defaults(), few, STREAMS));
            for (int j = 0; j < 3; j++) {
                double[] expected = direct.of(Resamples.parameter(j));
                double size = direct.standardDeviation(Resamples.parameter(j));
                assertArrayEquals(expected, refitted.of(Resamples.parameter(j)), 1e-6 * size);
            }
            Interval a = direct.bca(Resamples.parameter(2), 0.5).orElseThrow();
            Interval b = refitted.bca(Resamples.parameter(2), 0.5).orElseThrow();
            assertEquals(a.lower(), b.lower(), 1e-4 * Math.abs(a.lower()));
        }
    }

    @Test
    void monteCarloDrawsOneScaleForAllParameters() {
        // Two uncorrelated parameters with 4 degrees of freedom: each a t variable, their squares correlated.
        Resamples draws = MonteCarlo.draw(
                new double[] {10, -3}, new double[][] {{4, 0}, {0, 1}}, 4, OPTIONS.withResamples(100_000), STREAMS);
        Interval first = draws.percentile(Resamples.parameter(0), 0.95);
        double t = StudentT.quantile(0.975, 4);
        assertEquals(10 - 2 * t, first.lower(), 0.15);
        assertEquals(10 + 2 * t, first.upper(), 0.15);
        // The share outside 2 of both: independent t variables would give 0.0135, one common scale more than
        // twice that.
        int both = 0;
        for (int k = 0; k < draws.count(); k++) {
            if (Math.abs(draws.value(k, 0) - 10) > 4 && Math.abs(draws.value(k, 1) + 3) > 2) {
                both++;
            }
        }
        assertEquals(BOTH_BEYOND_TWO, both / (double) draws.count(), 0.003);
        assertTrue(draws.bca(Resamples.parameter(0), 0.95).isEmpty());
    }

    /** SciPy 1.17.1: quad(lambda c: (2*norm.sf(2*sqrt(c/4)))**2*chi2.pdf(c, 4), 0, inf). */
    private static final double BOTH_BEYOND_TWO = 0.030994373921432648;

    @Test
    void monteCarloOfAFitCoversItsCorrelations() {
        LinearFit fit = fit(null);
        Resamples draws = assertInstanceOf(Resamples.class, MonteCarlo.draw(fit, Scale.ESTIMATED, OPTIONS, STREAMS));
        double[] row = {1, StrictMath.log(290 / 325.0), 1 / 290.0 - 1 / 325.0};
        double centre = 0;
        for (int j = 0; j < 3; j++) {
            centre += row[j] * fit.parameters()[j];
        }
        double half = StudentT.quantile(0.975, 5) * Math.sqrt(fit.residualVariance() * fit.predictionVariance(row));
        Interval interval = draws.percentile(p -> row[0] * p[0] + row[1] * p[1] + row[2] * p[2], 0.95);
        assertEquals(centre - half, interval.lower(), 0.06 * half);
        assertEquals(centre + half, interval.upper(), 0.06 * half);
        Interval shortest = draws.shortest(Resamples.parameter(0), 0.95);
        Interval symmetric = draws.percentile(Resamples.parameter(0), 0.95);
        assertTrue(shortest.upper() - shortest.lower() <= 1.001 * (symmetric.upper() - symmetric.lower()));
    }

    @Test
    void degenerateCovariancesAreDrawnAndNonsenseIsRefused() {
        Resamples equal = MonteCarlo.draw(
                new double[] {0, 0},
                new double[][] {{1, 1}, {1, 1}},
                Double.POSITIVE_INFINITY,
                OPTIONS.withResamples(100),
                STREAMS);
        assertArrayEquals(equal.of(Resamples.parameter(0)), equal.of(Resamples.parameter(1)), 0);
        double[] centre = {0, 0};
        assertThrows(
                IllegalArgumentException.class,
                () -> MonteCarlo.draw(centre, new double[][] {{1, 2}, {2, 1}}, 3, OPTIONS, STREAMS));
        assertThrows(
                IllegalArgumentException.class,
                () -> MonteCarlo.draw(centre, new double[][] {{1, 0.5}, {0.2, 1}}, 3, OPTIONS, STREAMS));
        assertThrows(
                IllegalArgumentException.class,
                () -> MonteCarlo.draw(centre, new double[][] {{1, 0}, {0, 1}}, Double.NaN, OPTIONS, STREAMS));
    }

    @Test
    void whatCannotBeResampledIsNamed() {
        double[][] two = {{1, 0}, {1, 1}};
        double[] y = {1, 2};
        assertInstanceOf(NotResampled.class, Bootstrap.linear(BootstrapKind.RESIDUAL, two, y, null, OPTIONS, STREAMS));
        double[][] same = {{1, 2}, {1, 2}, {1, 2}};
        NotResampled refused = assertInstanceOf(
                NotResampled.class,
                Bootstrap.linear(BootstrapKind.CASE, same, new double[] {1, 2, 3}, null, OPTIONS, STREAMS));
        assertTrue(refused.reason().contains("repeat each other"), refused.reason());
        LinearFit exact = assertInstanceOf(LinearFit.class, LinearLeastSquares.fit(two, y, null));
        assertInstanceOf(NotResampled.class, MonteCarlo.draw(exact, Scale.ESTIMATED, OPTIONS, STREAMS));
        assertInstanceOf(Resamples.class, MonteCarlo.draw(exact, Scale.STATED, OPTIONS, STREAMS));
    }

    @Test
    void aCancelledResamplingEndsWithTheExceptionOfTheCheck() {
        AtomicInteger asked = new AtomicInteger();
        IllegalStateException stop = new IllegalStateException("stop");
        ResampleOptions cancelled = OPTIONS.withCheck(() -> {
            if (asked.incrementAndGet() > 3) {
                throw stop;
            }
        });
        IllegalStateException thrown =
                assertThrows(IllegalStateException.class, () -> resampled(BootstrapKind.RESIDUAL, null, cancelled));
        assertSame(stop, thrown);
        assertEquals(4, asked.get());
    }
}
