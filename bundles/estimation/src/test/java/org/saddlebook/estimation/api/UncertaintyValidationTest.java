package org.saddlebook.estimation.api;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** Published examples whose every printed digit must come out. */
@Tag("validation")
class UncertaintyValidationTest {
    private static List<String[]> table(String name) throws IOException {
        List<String[]> rows = new ArrayList<>();
        try (BufferedReader reader = new BufferedReader(new InputStreamReader(
                UncertaintyValidationTest.class.getResourceAsStream("/reference/uncertainty/" + name + ".csv"),
                StandardCharsets.UTF_8))) {
            reader.readLine();
            for (String line = reader.readLine(); line != null; line = reader.readLine()) {
                rows.add(line.split(",", -1));
            }
        }
        return rows;
    }

    private static LinearFit thermometer() throws IOException {
        List<String[]> rows = table("thermometer_calibration");
        double[][] design = new double[rows.size()][];
        double[] correction = new double[rows.size()];
        for (int i = 0; i < design.length; i++) {
            design[i] = new double[] {1, Double.parseDouble(rows.get(i)[0]) - 20};
            correction[i] = Double.parseDouble(rows.get(i)[1]);
        }
        return assertInstanceOf(LinearFit.class, LinearLeastSquares.fit(design, correction, null));
    }

    @Test
    void thermometerCalibrationOfTheGuideComesOutToEveryPrintedDigit() throws IOException {
        // JCGM 100:2008 (GUM), H.3.3-H.3.4: y1 = -0.1712(29), y2 = 0.00218(67), r = -0.930, s = 0.0035,
        // b(30 degC) = -0.1494, u = 0.0041. The further digits are the curator's re-computation.
        LinearFit fit = thermometer();
        double[] y = fit.parameters();
        double[] u = ReferenceSet.standardDeviations(fit);
        double[][] v = fit.unscaledCovariance();
        assertEquals(-0.1712, y[0], 0.5e-4);
        assertEquals(0.0029, u[0], 0.5e-4);
        assertEquals(0.00218, y[1], 0.5e-5);
        assertEquals(0.00067, u[1], 0.5e-5);
        assertEquals(-0.930, v[0][1] / Math.sqrt(v[0][0] * v[1][1]), 0.5e-3);
        assertEquals(0.0035, Math.sqrt(fit.residualVariance()), 0.5e-4);
        assertEquals(9, fit.degreesOfFreedom());
        double[] at30 = {1, 10};
        assertEquals(-0.1494, y[0] + 10 * y[1], 0.5e-4);
        double atThirty = Math.sqrt(fit.residualVariance() * fit.predictionVariance(at30));
        assertEquals(0.0041, atThirty, 0.5e-4);
        assertArrayEquals(new double[] {-0.17120379, 0.0021827}, y, 0.5e-7);
        assertEquals(0.0041385958, atThirty, 0.5e-10);
    }

    @Test
    void readingOfNoCorrectionHasTheFiellerIntervalDerivedTwice() throws IOException {
        // No published value; the curator's closed form and profile of the residual sum agree to ten digits.
        LinearFit fit = thermometer();
        double[] y = fit.parameters();
        double[][] v = fit.unscaledCovariance();
        double s2 = fit.residualVariance();
        double t = StudentT.quantile(0.975, fit.degreesOfFreedom());
        RatioSet.Bounded set = assertInstanceOf(
                RatioSet.Bounded.class, Fieller.set(-y[0], y[1], s2 * v[0][0], -s2 * v[0][1], s2 * v[1][1], t));
        assertEquals(47.97862, set.lower(), 0.5e-5);
        assertEquals(245.870358, set.upper(), 0.5e-6);
        assertEquals(78.436784, -y[0] / y[1], 0.5e-6);
    }

    @SuppressWarnings("ArrayRecordComponent") // carries a fixture
    private record PuromycinSet(ResponseFunction function, double[] rate) {}

    private static PuromycinSet puromycinSet(String state) throws IOException {
        List<double[]> points = new ArrayList<>();
        for (String[] row : table("puromycin")) {
            if (row[2].equals(state)) {
                points.add(new double[] {Double.parseDouble(row[0]), Double.parseDouble(row[1])});
            }
        }
        double[] x = points.stream().mapToDouble(point -> point[0]).toArray();
        double[] y = points.stream().mapToDouble(point -> point[1]).toArray();
        ReferenceModels.Curve saturation = (c, p, g) -> {
            g[0] = c / (p[1] + c);
            g[1] = -p[0] * c / ((p[1] + c) * (p[1] + c));
            return p[0] * g[0];
        };
        return new PuromycinSet(ReferenceModels.over(x, 2, saturation), y);
    }

    private static NonlinearFit puromycin(String state) throws IOException {
        PuromycinSet set = puromycinSet(state);
        return assertInstanceOf(
                NonlinearFit.class,
                NonlinearLeastSquares.fit(
                        set.function(), set.rate(), null, List.of(new double[] {100, 1}), NonlinearOptions.defaults()));
    }

    @Test
    void saturationKineticsGivePublishedEstimatesAndStandardErrors() throws IOException {
        // Treloar 1974; Bates & Watts 1988; Venables & Ripley 2002: Vm = 212.7(6.947), K = 0.06412(0.00828), rss 1195,
        // s = 10.93; more digits from R's nls, whose iteration stops at about eight.
        NonlinearFit fit = puromycin("treated");
        double[] u = ReferenceSet.standardDeviations(fit);
        assertEquals(212.7, fit.parameters()[0], 0.05);
        assertEquals(6.947, u[0], 0.0005);
        assertEquals(0.06412, fit.parameters()[1], 0.5e-5);
        assertEquals(0.00828, u[1], 0.5e-5);
        assertEquals(10.93, Math.sqrt(fit.residualVariance()), 0.005);
        assertEquals(212.683741382723, fit.parameters()[0], 1e-5);
        assertEquals(0.0641212789681, fit.parameters()[1], 1e-8);
        assertEquals(6.947155095551, u[0], 1e-5);
        assertEquals(1195.44881443937, fit.residualSumOfSquares(), 1e-8);
        NonlinearFit untreated = puromycin("untreated");
        assertEquals(160.280046519282, untreated.parameters()[0], 1e-5);
        assertEquals(6.48024560467, ReferenceSet.standardDeviations(untreated)[0], 1e-5);
        assertEquals(859.604293779374, untreated.residualSumOfSquares(), 1e-8);
    }

    @Test
    void profileLimitsOfTheSaturationFitAreThePublishedOnes() throws IOException {
        // Venables & Ripley 2002 and R: Vm 197.30 to 229.29, K 0.04692 to 0.08616 (R interpolates). The further digits
        // by
        // root finding on the sum of squares with the other parameter eliminated, SciPy 1.17.1 (brentq,
        // minimize_scalar).
        double[][] limits = {{197.30, 229.29}, {0.04692, 0.08616}};
        double[][] further = {{197.30193290028, 229.28905505505}, {0.04692034203517077, 0.08615691342713874}};
        double[] half = {0.005, 0.5e-5};
        PuromycinSet set = puromycinSet("treated");
        NonlinearFit fit = puromycin("treated");
        for (int j = 0; j < 2; j++) {
            ProfileInterval interval = ProfileLikelihood.of(
                    fit, set.function(), set.rate(), null, j, 0.95, Scale.ESTIMATED, NonlinearOptions.defaults());
            double lower =
                    assertInstanceOf(ProfileLimit.At.class, interval.lower()).value();
            double upper =
                    assertInstanceOf(ProfileLimit.At.class, interval.upper()).value();
            assertEquals(limits[j][0], lower, half[j]);
            assertEquals(limits[j][1], upper, half[j]);
            assertEquals(further[j][0], lower, 1e-10 * lower);
            assertEquals(further[j][1], upper, 1e-10 * upper);
        }
    }

    @Test
    void informationCriteriaOfTheSaturationFitAreTheReferenceOnes() throws IOException {
        // R 4.2 logLik, AIC, BIC of the same fits; k counts the residual variance.
        NonlinearFit fit = puromycin("treated");
        double likelihood = InformationCriteria.minusTwoLogLikelihood(fit.residualSumOfSquares(), 12);
        assertEquals(2 * 44.635484324474, likelihood, 1e-9);
        assertEquals(
                98.270968648948, InformationCriteria.aicc(likelihood, 3, 12).getAsDouble(), 1e-9);
        assertEquals(96.725688598312, InformationCriteria.bic(likelihood, 3, 12), 1e-9);
        assertEquals(
                98.312290182558,
                InformationCriteria.aicc(2 * 42.299002234136, 4, 12).getAsDouble(),
                1e-9);
    }

    @Test
    void theCorrectedCriterionIsAbsentWhereItHasNoValue() {
        assertTrue(InformationCriteria.aicc(10, 3, 4).isEmpty());
        assertTrue(InformationCriteria.aicc(10, 3, 5).isPresent());
    }

    private static RobustFit stackloss(RobustLoss loss, double tolerance, int limit) throws IOException {
        List<String[]> rows = table("stackloss");
        double[][] design = new double[rows.size()][];
        double[] measured = new double[rows.size()];
        for (int i = 0; i < design.length; i++) {
            String[] row = rows.get(i);
            design[i] =
                    new double[] {1, Double.parseDouble(row[0]), Double.parseDouble(row[1]), Double.parseDouble(row[2])
                    };
            measured[i] = Double.parseDouble(row[3]);
        }
        return assertInstanceOf(RobustFit.class, RobustRegression.fit(design, measured, null, loss, tolerance, limit));
    }

    @Test
    void robustFitsOfTheStackLossComeOutToEveryPrintedDigit() throws IOException {
        // Brownlee 1965; Venables & Ripley 2002, package MASS, function rlm with its own stopping rule (1e-4, 20
        // iterations).
        RobustFit huber = stackloss(RobustLoss.huber(), 1e-4, 20);
        assertArrayEquals(new double[] {-41.0265, 0.8294, 0.9261, -0.1278}, huber.parameters(), 0.5e-4);
        assertArrayEquals(new double[] {9.8073, 0.1112, 0.3034, 0.1289}, huber.standardErrors(), 0.5e-4);
        assertEquals(2.441, huber.scale(), 0.5e-3);
        RobustFit bisquare = stackloss(RobustLoss.bisquare(), 1e-4, 20);
        assertArrayEquals(new double[] {-42.2853, 0.9275, 0.6507, -0.1123}, bisquare.parameters(), 0.5e-4);
        assertArrayEquals(new double[] {9.5316, 0.1081, 0.2949, 0.1252}, bisquare.standardErrors(), 0.5e-4);
        assertEquals(2.282, bisquare.scale(), 0.5e-3);
        // R's digits beyond the printed ones.
        assertEquals(-41.026531052233, huber.parameters()[0], 1e-10);
        assertEquals(9.807347196401, huber.standardErrors()[0], 1e-10);
        assertEquals(-42.285253687792, bisquare.parameters()[0], 1e-10);
        assertEquals(0.1252292846308, bisquare.standardErrors()[3], 1e-12);
        assertEquals(-39.919674420124, huber.ordinary().parameters()[0], 1e-11);
    }

    @Test
    void robustFitsOfTheStackLossAreThoseOfTheFullyConvergedReference() throws IOException {
        // R run on with a tolerance of 1e-12 (stackloss.json, "fully_converged").
        RobustFit huber = stackloss(RobustLoss.huber(), 1e-12, 1000);
        assertArrayEquals(
                new double[] {-41.026485373295, 0.8293857702537, 0.926059415549, -0.1278463179654},
                huber.parameters(),
                1e-9);
        assertEquals(9.806872294357, huber.standardErrors()[0], 1e-9);
        assertEquals(2.440489045994, huber.scale(), 1e-10);
        RobustFit bisquare = stackloss(RobustLoss.bisquare(), 1e-12, 1000);
        assertEquals(9.531385661491, bisquare.standardErrors()[0], 1e-9);
        assertEquals(2.281853314567, bisquare.scale(), 1e-10);
    }
}
