package org.saddlebook.estimation.api;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Random;
import org.apache.commons.math3.stat.regression.OLSMultipleLinearRegression;
import org.junit.jupiter.api.Test;

class LinearLeastSquaresTest {
    private static double[][] line(double... x) {
        double[][] design = new double[x.length][];
        for (int i = 0; i < x.length; i++) {
            design[i] = new double[] {1, x[i]};
        }
        return design;
    }

    private static LinearFit fitted(double[][] design, double[] y, double[] weights) {
        return assertInstanceOf(LinearFit.class, LinearLeastSquares.fit(design, y, weights));
    }

    private static RankDeficient deficient(double[][] design, double[] y, double[] weights) {
        return assertInstanceOf(RankDeficient.class, LinearLeastSquares.fit(design, y, weights));
    }

    @Test
    void aSmallLineGivesTheNumbersWorkedByHand() {
        // x = 0, 1, 2, 3; y = 1, 3, 4, 4: mean 3, Sxx = 5, Sxy = 5, so slope 1, constant 1.5, rss = 1; by hand.
        LinearFit fit = fitted(line(0, 1, 2, 3), new double[] {1, 3, 4, 4}, null);
        assertArrayEquals(new double[] {1.5, 1}, fit.parameters(), 1e-15);
        assertEquals(1, fit.residualSumOfSquares(), 1e-14);
        assertEquals(0.5, fit.residualVariance(), 1e-14);
        assertArrayEquals(new double[] {-0.5, 0.5, 0.5, -0.5}, fit.residuals(), 1e-15);
        assertArrayEquals(new double[] {0.7, 0.3, 0.3, 0.7}, fit.leverages(), 1e-15);
        assertArrayEquals(new double[] {0.7, -0.3}, fit.unscaledCovariance()[0], 1e-15);
        assertArrayEquals(new double[] {-0.3, 0.2}, fit.unscaledCovariance()[1], 1e-15);
        assertEquals(0.7, fit.predictionVariance(new double[] {1, 3}), 1e-15);
        // g' V h with g = (1, 3), h = (1, 0): 0.7 - 0.9
        assertEquals(-0.2, fit.predictionCovariance(new double[] {1, 3}, new double[] {1, 0}), 1e-15);
        // Unit columns with cosine c = 6 / sqrt(4 * 14): condition sqrt((1 + c) / (1 - c)).
        double c = 6 / Math.sqrt(56);
        assertEquals(Math.sqrt((1 + c) / (1 - c)), fit.conditionNumber(), 1e-14);
    }

    @Test
    void randomProblemsAgreeWithCommonsMath() {
        // org.apache.commons:commons-math3:3.6.1, OLSMultipleLinearRegression
        Random random = new Random(7);
        for (int trial = 0; trial < 50; trial++) {
            int p = 1 + trial % 5;
            int n = p + 1 + trial % 7;
            double[][] design = new double[n][p];
            double[] y = new double[n];
            for (int i = 0; i < n; i++) {
                for (int j = 0; j < p; j++) {
                    design[i][j] = random.nextGaussian() * Math.pow(10, 3 * j - 4);
                }
                y[i] = random.nextGaussian();
            }
            OLSMultipleLinearRegression other = new OLSMultipleLinearRegression();
            other.setNoIntercept(true);
            other.newSampleData(y, design);
            LinearFit fit = fitted(design, y, null);
            double[] expected = other.estimateRegressionParameters();
            double[] errors = other.estimateRegressionParametersStandardErrors();
            double[] actual = ReferenceSet.standardDeviations(fit);
            for (int j = 0; j < p; j++) {
                assertEquals(expected[j], fit.parameters()[j], 1e-9 * errors[j]);
                assertEquals(errors[j], actual[j], 1e-9 * errors[j]);
            }
        }
    }

    @Test
    void aWeightOfTwoCountsAsTheSameObservationTwice() {
        LinearFit weighted = fitted(line(0, 1, 4), new double[] {1, 3, 4}, new double[] {1, 2, 1});
        LinearFit repeated = fitted(line(0, 1, 1, 4), new double[] {1, 3, 3, 4}, null);
        assertArrayEquals(repeated.parameters(), weighted.parameters(), 1e-14);
        assertEquals(repeated.residualSumOfSquares(), weighted.residualSumOfSquares(), 1e-14);
        assertEquals(repeated.leverages()[1] + repeated.leverages()[2], weighted.leverages()[1], 1e-14);
    }

    @Test
    void aWeightOfZeroExcludesTheObservationButReportsItsResidual() {
        double[] y = {1, 3, 100, 4};
        LinearFit fit = fitted(line(0, 1, 2, 3), y, new double[] {1, 1, 0, 1});
        LinearFit without = fitted(line(0, 1, 3), new double[] {1, 3, 4}, null);
        assertArrayEquals(without.parameters(), fit.parameters(), 1e-14);
        assertEquals(3, fit.observations());
        assertEquals(1, fit.degreesOfFreedom());
        assertEquals(0, fit.leverages()[2]);
        assertEquals(100 - fit.parameters()[0] - 2 * fit.parameters()[1], fit.residuals()[2], 1e-12);
    }

    @Test
    void asManyParametersAsObservationsLeaveNoVariance() {
        LinearFit fit = fitted(line(1, 2), new double[] {3, 5}, null);
        assertArrayEquals(new double[] {1, 2}, fit.parameters(), 1e-14);
        assertEquals(0, fit.degreesOfFreedom());
        assertEquals(0, fit.residualSumOfSquares(), 1e-28);
        assertThrows(IllegalStateException.class, fit::residualVariance);
        assertArrayEquals(new double[] {1, 1}, fit.leverages(), 1e-14);
    }

    @Test
    void tooFewObservationsAreNamed() {
        RankDeficient outcome = deficient(line(1), new double[] {3}, null);
        assertEquals(1, outcome.rank());
        assertEquals(2, outcome.parameterCount());
        assertTrue(outcome.reason().contains("1 observations do not determine 2 parameters"), outcome.reason());
        assertEquals(
                0,
                deficient(line(1, 2), new double[] {3, 5}, new double[] {0, 0}).rank());
    }

    @Test
    void identicalAbscissaeAreNamedInAnyUnit() {
        for (double x : new double[] {1 / 298.15, 298.15, 1e-12, 1e12}) {
            assertEquals(
                    1, deficient(line(x, x, x), new double[] {1, 2, 3}, null).rank());
            assertEquals(
                    1,
                    deficient(line(x, x, x), new double[] {1, 2, 3}, new double[] {1, 1e12, 1e-3})
                            .rank());
        }
        assertEquals(
                1,
                assertInstanceOf(
                                RankDeficient.class,
                                LinearLeastSquares.fitPolynomial(
                                        new double[] {2.1, 2.1, 2.1}, 2, new double[] {1, 2, 3}, null))
                        .rank());
        assertEquals(
                0,
                deficient(new double[][] {{0}, {0}}, new double[] {1, 2}, null).rank());
    }

    @Test
    void abscissaeThatDifferOnlyALittleStillDetermineALine() {
        LinearFit fit = fitted(line(300, 300.000001, 300.000002), new double[] {1, 2, 3}, null);
        assertEquals(1e6, fit.parameters()[1], 1e6 * 1e-7);
    }

    @Test
    void zeroScatterGivesAVarianceOfRoundingOnly() {
        double[] y = new double[6];
        double[] x = new double[6];
        for (int i = 0; i < 6; i++) {
            x[i] = 1 / (300.0 + 10 * i);
            y[i] = 25 - 9000 * x[i];
        }
        LinearFit fit = fitted(line(x), y, null);
        assertTrue(ReferenceSet.standardDeviations(fit)[1] < 1e-9 * 9000);
        assertEquals(-9000, fit.parameters()[1], 1e-9 * 9000);
        LinearFit constant = fitted(line(x), new double[6], null);
        assertEquals(0, constant.residualSumOfSquares());
    }

    @Test
    void anOutlierOfAMillionLeavesTheDigitsOfTheFit() {
        double[] x = {1, 2, 3, 4, 5, 6, 7, 8};
        double[] y = {2, 4, 6, 1e6, 10, 12, 14, 16};
        LinearFit fit = fitted(line(x), y, null);
        // Exactly: y = 2 x + 999992 e4; slope change = (4 - 4.5) / 42 * 999992, constant from the mean.
        double slope = 2 - 0.5 / 42 * 999992;
        assertEquals(slope, fit.parameters()[1], 1e-12 * Math.abs(slope));
        assertEquals((72 - 8 + 1e6) / 8 - 4.5 * slope, fit.parameters()[0], 1e-12 * 2e5);
    }

    @Test
    void weightsSpanningTwelveDecadesKeepTheirDigits() {
        // Two heavy points fix the line to their own accuracy; checked in exact decimal arithmetic.
        double[] x = {1, 2, 3, 4, 5};
        double[] y = {1.1, 1.9, 3.2, 3.8, 5.1};
        double[] w = {1e12, 1, 1e6, 1e12, 1};
        LinearFit fit = fitted(line(x), y, w);
        BigDecimal sw = BigDecimal.ZERO;
        BigDecimal sx = BigDecimal.ZERO;
        BigDecimal sxx = BigDecimal.ZERO;
        BigDecimal sy = BigDecimal.ZERO;
        BigDecimal sxy = BigDecimal.ZERO;
        for (int i = 0; i < 5; i++) {
            BigDecimal weight = new BigDecimal(w[i]);
            BigDecimal xi = new BigDecimal(x[i]);
            BigDecimal yi = new BigDecimal(y[i]);
            sw = sw.add(weight);
            sx = sx.add(weight.multiply(xi));
            sxx = sxx.add(weight.multiply(xi).multiply(xi));
            sy = sy.add(weight.multiply(yi));
            sxy = sxy.add(weight.multiply(xi).multiply(yi));
        }
        MathContext digits = new MathContext(60);
        BigDecimal determinant = sw.multiply(sxx).subtract(sx.multiply(sx));
        double slope = sw.multiply(sxy)
                .subtract(sx.multiply(sy))
                .divide(determinant, digits)
                .doubleValue();
        double constant = sxx.multiply(sy)
                .subtract(sx.multiply(sxy))
                .divide(determinant, digits)
                .doubleValue();
        assertEquals(slope, fit.parameters()[1], 1e-15 * Math.abs(slope));
        assertEquals(constant, fit.parameters()[0], 1e-15 * Math.abs(constant));
        assertEquals(sw.divide(determinant, digits).doubleValue(), fit.unscaledCovariance()[1][1], 1e-26);
    }

    @Test
    void whatIsNotANumberIsRefusedWithItsPlaceAndValue() {
        double[] y = {1, 2, 3};
        IllegalArgumentException refused = assertThrows(
                IllegalArgumentException.class, () -> LinearLeastSquares.fit(line(1, Double.NaN, 3), y, null));
        assertTrue(
                refused.getMessage().contains("row 1") && refused.getMessage().contains("NaN"));
        refused = assertThrows(
                IllegalArgumentException.class,
                () -> LinearLeastSquares.fit(line(1, 2, 3), new double[] {1, Double.POSITIVE_INFINITY, 3}, null));
        assertTrue(refused.getMessage().contains("response[1] is Infinity"), refused.getMessage());
        refused = assertThrows(
                IllegalArgumentException.class,
                () -> LinearLeastSquares.fit(line(1, 2, 3), y, new double[] {1, 1, -2}));
        assertTrue(refused.getMessage().contains("weight[2] is -2.0"), refused.getMessage());
        assertThrows(
                IllegalArgumentException.class,
                () -> LinearLeastSquares.fit(line(1, 2, 3), y, new double[] {1, 1, Double.NaN}));
        assertThrows(IllegalArgumentException.class, () -> LinearLeastSquares.fit(line(1, 2), y, null));
        assertThrows(IllegalArgumentException.class, () -> LinearLeastSquares.fit(new double[0][], y, null));
        LinearFit fit = fitted(line(1, 2, 3), y, null);
        assertThrows(IllegalArgumentException.class, () -> fit.predictionVariance(new double[] {1}));
        assertThrows(IllegalArgumentException.class, () -> fit.predictionVariance(new double[] {1, Double.NaN}));
    }

    @Test
    void unitsChangeTheNumbersAndNothingElse() {
        double[] x = {1, 2, 4, 7, 9};
        double[] y = {1.2, 1.9, 4.4, 6.5, 9.7};
        LinearFit plain = fitted(line(x), y, null);
        double[] scaledX = new double[5];
        double[] scaledY = new double[5];
        double[] weights = new double[5];
        for (int i = 0; i < 5; i++) {
            scaledX[i] = x[i] * 0x1p60;
            scaledY[i] = y[i] * 0x1p-90;
            weights[i] = 0x1p40;
        }
        // Powers of two are exact, so even the last bit must be the same.
        LinearFit scaled = fitted(line(scaledX), scaledY, weights);
        assertEquals(plain.parameters()[0] * 0x1p-90, scaled.parameters()[0]);
        assertEquals(plain.parameters()[1] * 0x1p-150, scaled.parameters()[1]);
        assertEquals(plain.residualSumOfSquares() * 0x1p-140, scaled.residualSumOfSquares());
        assertEquals(plain.conditionNumber(), scaled.conditionNumber());
    }

    @Test
    void anExcludedColumnFollowsThePathOfItsCase() {
        String told = LinearLeastSquares.fit(line(1, 1), new double[] {1, 2}, null)
                .fold(fit -> "fitted", deficient -> "rank " + deficient.rank());
        assertEquals("rank 1", told);
        assertEquals(
                "fitted",
                LinearLeastSquares.fit(line(1, 2), new double[] {1, 2}, null).fold(fit -> "fitted", deficient -> "no"));
    }
}
