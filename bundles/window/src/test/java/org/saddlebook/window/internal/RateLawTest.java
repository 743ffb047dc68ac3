package org.saddlebook.window.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Integrated rate laws against their printed forms (K. J. Laidler, Chemical Kinetics, 3rd ed. (1987), table 2.1, from
 * memory) and against step-wise integration.
 */
class RateLawTest {
    @Test
    void firstOrderHalfLifeIsLnTwoOverK() {
        assertEquals(StrictMath.log(2), RateLaw.FIRST.progress(0.5), 1e-15);
        assertEquals(-StrictMath.log(0.05), RateLaw.FIRST.progress(0.95), 1e-14);
    }

    @Test
    void secondOrderHalfLifeIsOneOverKTimesConcentration() {
        RateLaw law = new RateLaw(RateLaw.Kind.SECOND, 2, 500, 500);
        assertEquals(1 / 500.0, law.progress(0.5), 1e-16);
        assertEquals(19 / 500.0, law.progress(0.95), 1e-15);
    }

    @Test
    void zeroOrderIsProportionalToConversion() {
        RateLaw law = new RateLaw(RateLaw.Kind.ORDER, 0, 200, 200);
        assertEquals(0.3 * 200, law.progress(0.3), 1e-12);
        assertEquals(1, law.conversion(250), 0);
    }

    @Test
    void halfOrderFollowsItsPrintedForm() {
        // 2 (sqrt(c0) − sqrt(c)) = k t.
        RateLaw law = new RateLaw(RateLaw.Kind.ORDER, 0.5, 100, 100);
        assertEquals(2 * (10 - Math.sqrt(100 * 0.4)), law.progress(0.6), 1e-12);
    }

    @Test
    void orderNearOneTendsToFirstOrder() {
        RateLaw law = new RateLaw(RateLaw.Kind.ORDER, 1 + 1e-9, 1, 1);
        assertEquals(RateLaw.FIRST.progress(0.9), law.progress(0.9), 1e-8);
    }

    @Test
    void unequalConcentrationsNearEqualOnesTendToEqualOnes() {
        RateLaw equal = new RateLaw(RateLaw.Kind.SECOND, 2, 100, 100);
        RateLaw nearly = new RateLaw(RateLaw.Kind.SECOND, 2, 100, 100 * (1 + 1e-10));
        assertEquals(equal.progress(0.8), nearly.progress(0.8), 1e-9 * equal.progress(0.8));
    }

    @Test
    void aShortageOfTheOtherReactantLimitsConversion() {
        RateLaw law = new RateLaw(RateLaw.Kind.SECOND, 2, 100, 60);
        assertTrue(law.reaches(0.59));
        assertFalse(law.reaches(0.61));
        assertEquals(0.6, law.conversion(1e3), 1e-12);
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, 0.5, 1, 1.5, 2, 3})
    void conversionInvertsProgress(double order) {
        RateLaw law = new RateLaw(order == 1 ? RateLaw.Kind.FIRST : RateLaw.Kind.ORDER, order, order == 1 ? 1 : 40, 40);
        for (double x : new double[] {1e-6, 0.01, 0.5, 0.95, 0.999}) {
            assertEquals(x, law.conversion(law.progress(x)), 1e-11, "x = " + x);
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {60, 100, 350})
    void secondOrderAgreesWithStepwiseIntegration(double other) {
        RateLaw law = new RateLaw(RateLaw.Kind.SECOND, 2, 100, other);
        double end = law.progress(0.5);
        // Runge and Kutta, fourth order, dx/d(kt) = (1 − x)(b − a x).
        int steps = 4000;
        double h = end / steps;
        double x = 0;
        for (int i = 0; i < steps; i++) {
            double k1 = slope(x, other);
            double k2 = slope(x + h / 2 * k1, other);
            double k3 = slope(x + h / 2 * k2, other);
            double k4 = slope(x + h * k3, other);
            x += h / 6 * (k1 + 2 * k2 + 2 * k3 + k4);
        }
        assertEquals(0.5, x, 1e-11);
        assertEquals(0.5, law.conversion(end), 1e-12);
    }

    private static double slope(double x, double other) {
        return (1 - x) * (other - 100 * x);
    }
}
