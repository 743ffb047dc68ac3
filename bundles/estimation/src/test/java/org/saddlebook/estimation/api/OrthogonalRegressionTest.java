package org.saddlebook.estimation.api;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import org.junit.jupiter.api.Test;

class OrthogonalRegressionTest {
    private static final double[] X = {1, 2, 3, 4, 5, 6};
    private static final double[] Y = {2.1, 3.9, 6.2, 7.8, 10.1, 11.8};
    private static final double[] NOTHING = new double[6];

    private static double[] all(double value) {
        double[] result = new double[6];
        java.util.Arrays.fill(result, value);
        return result;
    }

    private static OrthogonalFit line(MeasuredPoints points) {
        return assertInstanceOf(OrthogonalFit.class, OrthogonalRegression.fitLine(points));
    }

    private static NotOrthogonal refused(MeasuredPoints points) {
        return assertInstanceOf(NotOrthogonal.class, OrthogonalRegression.fitLine(points));
    }

    @Test
    void exactAbscissaeGiveOrdinaryWeightedLeastSquares() {
        double[] uy = {0.1, 0.2, 0.1, 0.3, 0.1, 0.2};
        double[][] design = new double[6][];
        double[] weights = new double[6];
        for (int i = 0; i < 6; i++) {
            design[i] = new double[] {1, X[i]};
            weights[i] = 1 / (uy[i] * uy[i]);
        }
        LinearFit ordinary = assertInstanceOf(LinearFit.class, LinearLeastSquares.fit(design, Y, weights));
        OrthogonalFit fit = line(MeasuredPoints.of(X, Y, NOTHING, uy));
        assertArrayEquals(ordinary.parameters(), fit.parameters(), 1e-13);
        assertEquals(ordinary.residualSumOfSquares(), fit.residualSumOfSquares(), 1e-12);
        assertArrayEquals(ordinary.unscaledCovariance()[0], fit.unscaledCovariance()[0], 1e-13);
        assertArrayEquals(ordinary.residuals(), fit.residuals(), 1e-13);
        assertArrayEquals(X, fit.adjustedAbscissae(), 0);
    }

    @Test
    void exchangingTheCoordinatesInvertsTheLine() {
        double[] ux = {0.1, 0.2, 0.1, 0.3, 0.1, 0.2};
        double[] uy = {0.2, 0.1, 0.3, 0.1, 0.25, 0.15};
        double[] r = {0.5, -0.5, 0.2, 0, 0.9, -0.9};
        double[] forth =
                line(MeasuredPoints.of(X, Y, ux, uy).withCorrelations(r)).parameters();
        OrthogonalFit back = line(MeasuredPoints.of(Y, X, uy, ux).withCorrelations(r));
        assertEquals(1 / forth[1], back.parameters()[1], 1e-13);
        assertEquals(-forth[0] / forth[1], back.parameters()[0], 1e-13);
    }

    @Test
    void unitsOfEitherCoordinateChangeNothingButTheUnitOfTheResult() {
        MeasuredPoints plain = MeasuredPoints.of(X, Y, all(0.1), all(0.2)).withCorrelations(all(0.3));
        double[] small = new double[6];
        double[] large = new double[6];
        for (int i = 0; i < 6; i++) {
            small[i] = X[i] * 1e-9;
            large[i] = Y[i] * 1e12;
        }
        MeasuredPoints other =
                MeasuredPoints.of(small, large, all(0.1e-9), all(0.2e12)).withCorrelations(all(0.3));
        double[] a = line(plain).parameters();
        double[] b = line(other).parameters();
        assertEquals(a[0], b[0] * 1e-12, 1e-13);
        assertEquals(a[1], b[1] * 1e-21, 1e-13);
    }

    @Test
    void adjustedPointsLieOnTheLineAndChiSquaredIsTheirDistance() {
        OrthogonalFit fit = line(MeasuredPoints.of(X, Y, all(0.3), all(0.2)));
        double sum = 0;
        for (int i = 0; i < 6; i++) {
            double dx = fit.abscissaResiduals()[i];
            double dy = fit.residuals()[i];
            assertEquals(fit.parameters()[0] + fit.parameters()[1] * (X[i] - dx), Y[i] - dy, 1e-12);
            sum += dx * dx / 0.09 + dy * dy / 0.04;
        }
        assertEquals(sum, fit.residualSumOfSquares(), 1e-12);
    }

    @Test
    void exactPointsOnALineGiveItWithoutScatter() {
        double[] on = new double[6];
        for (int i = 0; i < 6; i++) {
            on[i] = 3 - 2 * X[i];
        }
        OrthogonalFit fit = line(MeasuredPoints.of(X, on, all(0.1), all(0.1)));
        assertArrayEquals(new double[] {3, -2}, fit.parameters(), 1e-14);
        assertEquals(0, fit.residualSumOfSquares(), 1e-26);
        OrthogonalFit level = line(MeasuredPoints.of(X, all(7), all(0.1), all(0.1)));
        assertArrayEquals(new double[] {7, 0}, level.parameters(), 1e-14);
    }

    @Test
    void whatDoesNotDetermineALineIsNamed() {
        assertEquals(
                NotOrthogonal.Kind.NOT_DETERMINED,
                refused(MeasuredPoints.of(all(3), Y, all(0.1), all(0.1))).kind());
        assertEquals(
                NotOrthogonal.Kind.NOT_DETERMINED,
                refused(MeasuredPoints.of(new double[] {1}, new double[] {1}, new double[] {1}, new double[] {1}))
                        .kind());
        double[] someExact = all(0.1);
        someExact[4] = 0;
        NotOrthogonal exact = refused(MeasuredPoints.of(X, Y, someExact, someExact));
        assertEquals(NotOrthogonal.Kind.EXACT_POINT, exact.kind());
        assertEquals("point 4 (counted from 0) has no uncertainty in either coordinate", exact.reason());
    }

    @Test
    void twoPointsGiveALineWithNoDegreeOfFreedom() {
        double[] u = {0.1, 0.1};
        OrthogonalFit fit = line(MeasuredPoints.of(new double[] {1, 2}, new double[] {5, 3}, u, u));
        assertArrayEquals(new double[] {7, -2}, fit.parameters(), 1e-12);
        assertEquals(0, fit.degreesOfFreedom());
        assertThrows(IllegalStateException.class, fit::residualVariance);
    }

    @Test
    void anOutlierOfAMillionAndWeightsOverTwelveDecadesStillEndInAFit() {
        double[] wild = Y.clone();
        wild[2] = 1e6;
        OrthogonalFit far = line(MeasuredPoints.of(X, wild, all(0.1), all(0.1)));
        assertEquals(4, far.degreesOfFreedom());
        double[] uy = {1e-6, 1, 1e-3, 1e-5, 1, 1e-6};
        OrthogonalFit stiff = line(MeasuredPoints.of(X, Y, NOTHING, uy));
        // The two best points carry the line.
        assertEquals((11.8 - 2.1) / 5, stiff.parameters()[1], 2e-3);
    }

    @Test
    void inputThatIsNoDataIsRefusedWithItsPlace() {
        IllegalArgumentException negative =
                assertThrows(IllegalArgumentException.class, () -> MeasuredPoints.of(X, Y, all(-0.1), all(0.1)));
        assertEquals("ux[0] is -0.1; at least 0 is needed", negative.getMessage());
        assertThrows(IllegalArgumentException.class, () -> MeasuredPoints.of(X, Y, all(Double.NaN), all(0.1)));
        MeasuredPoints points = MeasuredPoints.of(X, Y, all(0.1), all(0.1));
        assertThrows(IllegalArgumentException.class, () -> points.withCorrelations(all(1)));
        assertThrows(IllegalArgumentException.class, () -> points.withCorrelations(new double[2]));
    }

    @Test
    void aCurveThatIsNotDefinedWhereTheSearchStartsIsNamed() {
        CurveFunction root = new CurveFunction() {
            @Override
            public int parameterCount() {
                return 1;
            }

            @Override
            public double value(double x, double[] p, double[] g) {
                double value = Math.sqrt(p[0] - x);
                g[0] = 0.5 / value;
                g[1] = -0.5 / value;
                return value;
            }
        };
        MeasuredPoints points = MeasuredPoints.of(X, Y, all(0.1), all(0.1));
        NotOrthogonal refused = assertInstanceOf(
                NotOrthogonal.class,
                OrthogonalRegression.fit(root, points, List.of(new double[] {2}), NonlinearOptions.defaults()));
        assertEquals(NotOrthogonal.Kind.NOT_CONVERGED, refused.kind());
        assertEquals("the response is not defined at the start", refused.reason());
    }
}
