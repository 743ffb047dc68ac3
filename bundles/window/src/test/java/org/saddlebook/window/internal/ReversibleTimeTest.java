package org.saddlebook.window.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

/** Time to a conversion of A ⇌ B against its printed form and against the irreversible limit. */
class ReversibleTimeTest {
    @Test
    void agreesWithTheRelaxationOfAKnownCase() {
        // kf = 3, kr = 1: x = 0.75 (1 − exp(−4 t)); x = 0.5 at t = ln(3)/4.
        double lnProgress = ReversibleTime.lnProgress(0.5, StrictMath.log(3));
        assertEquals(3 * StrictMath.log(3) / 4, StrictMath.exp(lnProgress), 1e-14);
    }

    @Test
    void tendsToTheIrreversibleLawWhereTheEquilibriumLiesFarOver() {
        assertEquals(RateLaw.FIRST.lnProgress(0.9), ReversibleTime.lnProgress(0.9, 60), 1e-12);
    }

    @Test
    void isNeverReachedAtOrBeyondTheEquilibriumConversion() {
        assertEquals(Double.POSITIVE_INFINITY, ReversibleTime.lnProgress(0.75, StrictMath.log(2.9)));
        assertFalse(new ReversibleTime(0.75, 1e9).holds(100, StrictMath.log(2.9)));
    }

    @Test
    void theTableChangesNoAnswer() {
        SplittableRandom random = new SplittableRandom(7);
        ReversibleTime time = new ReversibleTime(0.8, 3600);
        int holding = 0;
        for (int i = 0; i < 200_000; i++) {
            double lnEquilibrium = random.nextDouble(0, 45);
            double needed = time.lnNeeded(lnEquilibrium);
            double lnRate = Double.isInfinite(needed)
                    ? random.nextDouble(-20, 20)
                    : needed + random.nextDouble(-1, 1) * StrictMath.exp(-random.nextDouble(0, 30));
            boolean holds = time.holds(lnRate, lnEquilibrium);
            assertEquals(lnRate >= needed, holds, "ln K = " + lnEquilibrium);
            holding += holds ? 1 : 0;
        }
        assertTrue(holding > 50_000 && holding < 150_000, "both answers must be met: " + holding);
    }
}
