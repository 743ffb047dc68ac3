package org.saddlebook.estimation.api;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

class RobustRegressionTest {
    private static double[][] line(int n) {
        double[][] design = new double[n][];
        for (int i = 0; i < n; i++) {
            design[i] = new double[] {1, i};
        }
        return design;
    }

    private static double[] scattered(int n) {
        double[] y = new double[n];
        for (int i = 0; i < n; i++) {
            y[i] = 2 - 0.5 * i + 0.1 * StrictMath.sin(37.0 * i);
        }
        return y;
    }

    private static RobustFit fit(double[][] design, double[] y, double[] weightsOrNull, RobustLoss loss) {
        return assertInstanceOf(RobustFit.class, RobustRegression.fit(design, y, weightsOrNull, loss));
    }

    private static NotRobust.Kind refused(double[][] design, double[] y, RobustLoss loss) {
        return assertInstanceOf(NotRobust.class, RobustRegression.fit(design, y, null, loss))
                .kind();
    }

    @Test
    void anOutlierOfAMillionLosesItsSayWithTheBisquareAndKeepsLittleWithHuber() {
        double[] y = scattered(15);
        double[] wild = y.clone();
        wild[6] = 1e6;
        RobustFit bisquare = fit(line(15), wild, null, RobustLoss.bisquare());
        double[] without = new double[15];
        java.util.Arrays.fill(without, 1);
        without[6] = 0;
        RobustFit clean = fit(line(15), y, without, RobustLoss.bisquare());
        assertEquals(0, bisquare.robustWeights()[6], 0);
        assertArrayEquals(clean.parameters(), bisquare.parameters(), 0.02);
        RobustFit huber = fit(line(15), wild, null, RobustLoss.huber());
        assertTrue(huber.robustWeights()[6] < 1e-6);
        assertArrayEquals(clean.parameters(), huber.parameters(), 0.1);
        assertTrue(Math.abs(huber.ordinary().parameters()[0]) > 1e4, "the ordinary fit is given beside it");
    }

    @Test
    void aConstantSoLargeThatNothingIsAnOutlierGivesTheOrdinaryFit() {
        double[] y = scattered(12);
        RobustFit fit = fit(line(12), y, null, RobustLoss.huber(1000));
        double[] ordinary = fit.ordinary().parameters();
        assertArrayEquals(ordinary, fit.parameters(), 1e-13);
        double[] u = ReferenceSet.standardDeviations(fit.ordinary());
        assertArrayEquals(u, fit.standardErrors(), 1e-13);
    }

    @Test
    void weightsAreThoseOfRepeatedObservationsForTheEstimateAndUnitsDoNotMatter() {
        double[] y = scattered(12);
        double[] scaled = new double[12];
        double[] weights = new double[12];
        for (int i = 0; i < 12; i++) {
            scaled[i] = 1e9 * y[i];
            weights[i] = 1e-18;
        }
        RobustFit plain = fit(line(12), y, null, RobustLoss.huber());
        RobustFit other = fit(line(12), scaled, weights, RobustLoss.huber());
        assertEquals(plain.parameters()[1], 1e-9 * other.parameters()[1], 1e-12);
        assertEquals(plain.scale(), other.scale(), 1e-12);
        assertEquals(plain.standardErrors()[1], 1e-9 * other.standardErrors()[1], 1e-12);
    }

    @Test
    void everyDegenerateCaseIsNamed() {
        assertEquals(
                NotRobust.Kind.NOT_DETERMINED,
                refused(new double[][] {{1, 2}, {1, 2}, {1, 2}}, new double[] {1, 2, 3}, RobustLoss.huber()));
        double[] exact = {1, 3, 5, 7, 9};
        assertEquals(NotRobust.Kind.NO_SCALE, refused(line(5), exact, RobustLoss.huber()));
        assertEquals(NotRobust.Kind.NO_SCALE, refused(line(2), new double[] {1, 7}, RobustLoss.bisquare()));
        RobustOutcome early = RobustRegression.fit(line(12), scattered(12), null, RobustLoss.huber(0.5), 1e-15, 1);
        assertEquals(
                NotRobust.Kind.NOT_CONVERGED,
                assertInstanceOf(NotRobust.class, early).kind());
        assertThrows(IllegalArgumentException.class, () -> RobustLoss.huber(0));
        assertThrows(
                IllegalArgumentException.class,
                () -> RobustRegression.fit(line(3), scattered(3), null, RobustLoss.huber(), Double.NaN, 5));
    }
}
