package org.saddlebook.estimation.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

class FiellerTest {
    @Test
    void aDenominatorFarFromZeroGivesABoundedSetWhoseEndsSatisfyTheDefiningEquation() {
        RatioSet.Bounded set = assertInstanceOf(RatioSet.Bounded.class, Fieller.set(3, 2, 0.04, 0.01, 0.09, 2));
        assertOnEdge(set.lower(), 3, 2, 0.04, 0.01, 0.09, 2);
        assertOnEdge(set.upper(), 3, 2, 0.04, 0.01, 0.09, 2);
        assertTrue(set.contains(1.5));
    }

    @Test
    void aDenominatorThatMayBeZeroGivesTwoRaysAroundTheExcludedMiddle() {
        RatioSet.TwoRays set = assertInstanceOf(RatioSet.TwoRays.class, Fieller.set(3, 0.1, 0.04, 0, 0.09, 2));
        assertOnEdge(set.lowerRayEnd(), 3, 0.1, 0.04, 0, 0.09, 2);
        assertOnEdge(set.upperRayStart(), 3, 0.1, 0.04, 0, 0.09, 2);
        assertTrue(set.contains(30));
        assertTrue(!set.contains(0));
    }

    @Test
    void nothingIsExcludedWhenBothMayBeZero() {
        assertInstanceOf(RatioSet.WholeLine.class, Fieller.set(0.1, 0.1, 1, 0, 1, 2));
        assertInstanceOf(RatioSet.WholeLine.class, Fieller.set(0, 0, 1, 0, 1, 2));
        assertInstanceOf(RatioSet.WholeLine.class, Fieller.set(0, 0, 0, 0, 0, 2));
    }

    @Test
    void aDenominatorExactlyOnTheEdgeGivesAHalfLine() {
        // b^2 = q^2 vbb exactly: the quadratic becomes linear, -2 (3 * 2) x + 9 - 4 <= 0.
        assertEquals(new RatioSet.AtLeast(5.0 / 12), Fieller.set(3, 2, 1, 0, 1, 2));
        assertEquals(new RatioSet.AtMost(-5.0 / 12), Fieller.set(-3, 2, 1, 0, 1, 2));
    }

    @Test
    void certainEstimatesGiveTheRatioItself() {
        assertEquals(new RatioSet.Bounded(1.5, 1.5), Fieller.set(3, 2, 0, 0, 0, 2));
        assertEquals(new RatioSet.Bounded(0, 0), Fieller.set(0, 2, 0, 0, 0, 2));
    }

    @Test
    void impossibleInputsAreRefused() {
        assertThrows(IllegalArgumentException.class, () -> Fieller.set(Double.NaN, 1, 1, 0, 1, 2));
        assertThrows(IllegalArgumentException.class, () -> Fieller.set(1, 1, -1, 0, 1, 2));
        assertThrows(IllegalArgumentException.class, () -> Fieller.set(1, 1, 1, 5, 1, 2));
        assertThrows(IllegalArgumentException.class, () -> Fieller.set(1, 1, 1, 0, 1, Double.POSITIVE_INFINITY));
    }

    private static void assertOnEdge(double x, double a, double b, double vaa, double vab, double vbb, double q) {
        double variance = vaa - 2 * x * vab + x * x * vbb;
        assertEquals(1, (a - x * b) * (a - x * b) / (q * q * variance), 1e-12);
    }
}
