package org.saddlebook.estimation.api;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.concurrent.CancellationException;
import org.junit.jupiter.api.Test;

class NonlinearLeastSquaresTest {
    private static final double[] X = {1, 2, 3, 5, 7, 10};
    private static final double[] DEMAND = {109, 149, 149, 191, 213, 224};

    private static double rise(double x, double[] b, double[] g) {
        g[0] = -StrictMath.expm1(-b[1] * x);
        g[1] = b[0] * x * StrictMath.exp(-b[1] * x);
        return b[0] * g[0];
    }

    private static NonlinearOutcome fit(
            double[] x,
            double[] y,
            double[] weights,
            ReferenceModels.Curve curve,
            NonlinearOptions o,
            double[]... starts) {
        return NonlinearLeastSquares.fit(
                ReferenceModels.over(x, starts[0].length, curve), y, weights, List.of(starts), o);
    }

    private static NonlinearFit fitted(double[] x, double[] y, ReferenceModels.Curve curve, double[]... starts) {
        return assertInstanceOf(NonlinearFit.class, fit(x, y, null, curve, NonlinearOptions.defaults(), starts));
    }

    @Test
    void aStartOnThePlateauFindsTheMinimum() {
        // Oxygen demand, Box, Hunter & Hunter 1978, Statistics for Experimenters; certified by NIST (set BoxBOD),
        // numbers
        // from memory. From (1, 1) the first long step lands where the curve is flat.
        NonlinearFit fit = fitted(X, DEMAND, NonlinearLeastSquaresTest::rise, new double[] {1, 1});
        assertArrayEquals(new double[] {2.1380940889e2, 5.4723748542e-1}, fit.parameters(), 1e-8);
        assertEquals(1.1680088766e3, fit.residualSumOfSquares(), 1e-6);
    }

    @Test
    void anEnzymeReactionFromAFarStart() {
        // Kowalik & Osborne 1968, problem 15 of Moré, Garbow & Hillstrom, ACM TOMS 7, 17 (1981); NIST set MGH09;
        // numbers
        // from memory, the minimum 3.07505...e-4 as printed there. Start a hundred times too far.
        double[] u = {4, 2, 1, 0.5, 0.25, 0.167, 0.125, 0.1, 0.0833, 0.0714, 0.0625};
        double[] y = {.1957, .1947, .1735, .1600, .0844, .0627, .0456, .0342, .0323, .0235, .0246};
        ReferenceModels.Curve curve = (x, b, g) -> {
            double top = x * x + x * b[1];
            double bottom = x * x + x * b[2] + b[3];
            g[0] = top / bottom;
            g[1] = b[0] * x / bottom;
            g[2] = -b[0] * top * x / (bottom * bottom);
            g[3] = -b[0] * top / (bottom * bottom);
            return b[0] * top / bottom;
        };
        NonlinearFit fit = fitted(u, y, curve, new double[] {25, 39, 41.5, 39});
        assertEquals(3.07505e-4, fit.residualSumOfSquares(), 1e-9);
        assertEquals(1.9280693458e-1, fit.parameters()[0], 1e-10);
        assertEquals(1.3606233068e-1, fit.parameters()[3], 1e-10);
    }

    @Test
    void largeResidualsAreFittedToTheLastDigitToo() {
        // Brown & Dennis, problem 16 of Moré, Garbow & Hillstrom 1981: minimum 85822.2 for 20 points, at no zero
        // residual.
        double[] t = new double[20];
        for (int i = 0; i < 20; i++) {
            t[i] = (i + 1) / 5.0;
        }
        ReferenceModels.Curve curve = (x, b, g) -> {
            double first = b[0] + x * b[1] - StrictMath.exp(x);
            double second = b[2] + b[3] * StrictMath.sin(x) - StrictMath.cos(x);
            g[0] = 2 * first;
            g[1] = 2 * first * x;
            g[2] = 2 * second;
            g[3] = 2 * second * StrictMath.sin(x);
            return first * first + second * second;
        };
        NonlinearFit fit = fitted(t, new double[20], curve, new double[] {25, 5, -5, -1});
        assertEquals(85822.2, fit.residualSumOfSquares(), 0.05);
        NonlinearFit again = fitted(t, new double[20], curve, new double[] {-10, 10, 0, 0});
        assertEquals(14, ReferenceSet.digits(fit.parameters(), again.parameters()), 2);
    }

    @Test
    void unitsChangeTheNumbersAndNothingElse() {
        NonlinearFit plain = fitted(X, DEMAND, NonlinearLeastSquaresTest::rise, new double[] {100, 0.75});
        double scale = 1e-23;
        double time = 1e15;
        double[] y = new double[6];
        double[] x = new double[6];
        for (int i = 0; i < 6; i++) {
            y[i] = DEMAND[i] * scale;
            x[i] = X[i] * time;
        }
        NonlinearFit other = fitted(x, y, NonlinearLeastSquaresTest::rise, new double[] {100 * scale, 0.75 / time});
        assertEquals(1, plain.parameters()[0] * scale / other.parameters()[0], 1e-13);
        assertEquals(1, plain.parameters()[1] / time / other.parameters()[1], 1e-13);
        assertEquals(1, plain.conditionNumber() / other.conditionNumber(), 1e-12);
        // Unscaled covariance of parameters i and j carries their units over that of the response, squared.
        double expected = plain.unscaledCovariance()[0][1] / (scale * time);
        assertEquals(1, expected / other.unscaledCovariance()[0][1], 1e-12);
    }

    @Test
    void aLinearResponseGivesTheLinearFit() {
        ReferenceModels.Curve line = (x, b, g) -> {
            g[0] = 1;
            g[1] = x;
            return b[0] + b[1] * x;
        };
        double[] weights = {1, 2, 0, 4, 5, 6};
        NonlinearFit fit = assertInstanceOf(
                NonlinearFit.class, fit(X, DEMAND, weights, line, NonlinearOptions.defaults(), new double[] {0, 0}));
        double[][] design = new double[6][];
        for (int i = 0; i < 6; i++) {
            design[i] = new double[] {1, X[i]};
        }
        LinearFit linear = assertInstanceOf(LinearFit.class, LinearLeastSquares.fit(design, DEMAND, weights));
        assertArrayEquals(linear.parameters(), fit.parameters(), 1e-11);
        assertArrayEquals(linear.residuals(), fit.residuals(), 1e-10);
        assertArrayEquals(linear.leverages(), fit.leverages(), 1e-13);
        assertEquals(linear.residualSumOfSquares(), fit.residualSumOfSquares(), 1e-9);
        assertEquals(5, fit.observations());
        assertEquals(3, fit.degreesOfFreedom());
        double[] g = {1, 4};
        assertEquals(linear.predictionVariance(g), fit.predictionVariance(g), 1e-13);
        assertEquals(
                linear.predictionCovariance(g, new double[] {0, 1}),
                fit.predictionCovariance(g, new double[] {0, 1}),
                1e-13);
    }

    @Test
    void theBetterOfTwoValleysWinsAndItsStartIsNamed() {
        // sin(p) = 0.5 x has many solutions; the response p sin(p) has valleys of different depth.
        ReferenceModels.Curve curve = (x, b, g) -> {
            g[0] = x * (StrictMath.sin(b[0]) + b[0] * StrictMath.cos(b[0]));
            return x * b[0] * StrictMath.sin(b[0]);
        };
        double[] y = {5, 10, 15};
        double[] x = {1, 2, 3};
        NonlinearFit fit = assertInstanceOf(
                NonlinearFit.class,
                fit(x, y, null, curve, NonlinearOptions.defaults().withThorough(false), new double[] {2}, new double[] {
                    7.5
                }));
        assertEquals(1, fit.winningStart());
        assertEquals(5, fit.parameters()[0] * StrictMath.sin(fit.parameters()[0]), 1e-12);
    }

    @Test
    void aBoundHoldsTheParameterWithoutVariance() {
        NonlinearOptions bounded = NonlinearOptions.defaults()
                .withBounds(new double[] {0, 0}, new double[] {200, Double.POSITIVE_INFINITY});
        NonlinearFit fit = assertInstanceOf(
                NonlinearFit.class,
                fit(X, DEMAND, null, NonlinearLeastSquaresTest::rise, bounded, new double[] {100, 0.75}));
        assertEquals(200, fit.parameters()[0]);
        assertArrayEquals(new boolean[] {true, false}, fit.atBound());
        assertEquals(0, fit.unscaledCovariance()[0][0]);
        assertTrue(fit.unscaledCovariance()[1][1] > 0);
        // The other parameter is the least-squares one with the first fixed at its bound.
        ReferenceModels.Curve fixed = (x, b, g) -> {
            double[] both = new double[2];
            double value = rise(x, new double[] {200, b[0]}, both);
            g[0] = both[1];
            return value;
        };
        NonlinearFit alone = fitted(X, DEMAND, fixed, new double[] {0.75});
        assertEquals(alone.parameters()[0], fit.parameters()[1], 1e-12);
        NonlinearOptions wide = NonlinearOptions.defaults().withBounds(new double[] {0, 0}, new double[] {1e4, 1e4});
        NonlinearFit inside = assertInstanceOf(
                NonlinearFit.class, fit(X, DEMAND, null, NonlinearLeastSquaresTest::rise, wide, new double[] {1, 1}));
        assertEquals(2.1380940889e2, inside.parameters()[0], 1e-8);
    }

    @Test
    void whereTheResponseIsNotDefinedTheSearchTurnsBack() {
        ReferenceModels.Curve root = (x, b, g) -> {
            double argument = x - b[1];
            g[0] = argument > 0 ? Math.sqrt(argument) : Double.NaN;
            g[1] = -b[0] / (2 * g[0]);
            return b[0] * g[0];
        };
        double[] x = {1, 2, 3, 5, 8};
        double[] y = new double[5];
        for (int i = 0; i < 5; i++) {
            y[i] = 3 * Math.sqrt(x[i] - 0.9);
        }
        NonlinearFit fit = fitted(x, y, root, new double[] {1, -5});
        assertArrayEquals(new double[] {3, 0.9}, fit.parameters(), 1e-12);
        NotConverged outside = assertInstanceOf(
                NotConverged.class, fit(x, y, null, root, NonlinearOptions.defaults(), new double[] {1, 4}));
        assertTrue(outside.reason().contains("not defined at the start"), outside.reason());
        NonlinearFit second = fitted(x, y, root, new double[] {1, 4}, new double[] {1, 0});
        assertEquals(1, second.winningStart());
    }

    @Test
    void parametersTheDataDoNotTellApartAreNamed() {
        ReferenceModels.Curve product = (x, b, g) -> {
            g[0] = b[1] * x;
            g[1] = b[0] * x;
            return b[0] * b[1] * x;
        };
        NonlinearRankDeficient outcome = assertInstanceOf(
                NonlinearRankDeficient.class,
                fit(X, DEMAND, null, product, NonlinearOptions.defaults(), new double[] {1, 2}));
        assertEquals(1, outcome.rank());
        assertEquals(2, outcome.parameterCount());
        NonlinearRankDeficient few = assertInstanceOf(
                NonlinearRankDeficient.class,
                fit(
                        new double[] {1},
                        new double[] {2},
                        null,
                        NonlinearLeastSquaresTest::rise,
                        NonlinearOptions.defaults(),
                        new double[] {1, 2}));
        assertTrue(few.reason().contains("1 observations do not determine 2 parameters"), few.reason());
    }

    @Test
    void asManyParametersAsObservationsPassThroughThem() {
        NonlinearFit fit = fitted(
                new double[] {1, 5}, new double[] {109, 191}, NonlinearLeastSquaresTest::rise, new double[] {100, 1});
        assertEquals(0, fit.degreesOfFreedom());
        assertThrows(IllegalStateException.class, fit::residualVariance);
        assertArrayEquals(new double[] {0, 0}, fit.residuals(), 1e-11);
    }

    @Test
    void anIterationLimitEndsInTheNamedOutcome() {
        ReferenceSet set = ReferenceSet.read("nonlinear", "MGH10");
        NotConverged outcome = assertInstanceOf(
                NotConverged.class,
                fit(
                        set.abscissae(),
                        set.response(),
                        null,
                        ReferenceModels.curve("MGH10"),
                        NonlinearOptions.defaults().withMaximumIterations(3),
                        set.certified("start1")));
        assertTrue(outcome.reason().contains("after 3 iterations"), outcome.reason());
        assertEquals(3, outcome.bestParameters().length);
    }

    @Test
    void cancellingReachesTheCaller() {
        CancellationException cancelled = new CancellationException("asked for");
        int[] calls = new int[1];
        NonlinearOptions options = NonlinearOptions.defaults().withCheck(() -> {
            if (++calls[0] == 3) {
                throw cancelled;
            }
        });
        assertSame(
                cancelled,
                assertThrows(
                        CancellationException.class,
                        () -> fit(X, DEMAND, null, NonlinearLeastSquaresTest::rise, options, new double[] {1, 1})));
    }

    @Test
    void malformedInputIsRefused() {
        NonlinearOptions o = NonlinearOptions.defaults();
        ResponseFunction f = ReferenceModels.over(X, 2, NonlinearLeastSquaresTest::rise);
        assertThrows(IllegalArgumentException.class, () -> NonlinearLeastSquares.fit(f, DEMAND, null, List.of(), o));
        assertThrows(
                IllegalArgumentException.class,
                () -> NonlinearLeastSquares.fit(f, DEMAND, null, List.of(new double[] {1}), o));
        assertThrows(
                IllegalArgumentException.class,
                () -> NonlinearLeastSquares.fit(f, DEMAND, null, List.of(new double[] {1, Double.NaN}), o));
        assertThrows(
                IllegalArgumentException.class,
                () -> NonlinearLeastSquares.fit(f, new double[] {1}, null, List.of(new double[] {1, 1}), o));
        assertThrows(IllegalArgumentException.class, () -> o.withBounds(new double[] {1}, new double[] {1}));
        assertThrows(IllegalArgumentException.class, () -> o.withMaximumIterations(0));
    }
}
