package org.saddlebook.spontaneity.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.OptionalDouble;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.estimation.api.Normal;
import org.saddlebook.estimation.api.StudentT;

/**
 * The set of crossovers, of whatever kind, holds the true one in 95 % of campaigns (E. C. Fieller, J. R. Stat. Soc. B 16
 * (1954) 175). Seeded; the tolerance is five standard deviations of the count.
 */
class CrossoverCoverageTest {
    private static final double TRUE_KELVIN = 380;
    private static final int QUICK = 20_000;
    private static final int LONG = 2_000_000;

    @Test
    void coversWhereTheSignsAreClear() {
        covers(new Design(62_000, 1800, 5, 0.6, 0), QUICK, 0);
        covers(new Design(62_000, 1800, 5, 0.6, 4), QUICK, 0);
    }

    @Test
    void coversWhereTheSignsAreOpen() {
        covers(new Design(3_000, 2500, 7, -0.3, 0), QUICK, 0.3);
        covers(new Design(3_000, 2500, 7, -0.3, 3), QUICK, 0.3);
        covers(new Design(-500, 900, 4, 0.95, 5), QUICK, 0.3);
    }

    @Test
    @Tag("long")
    void coversToThreeDigits() {
        covers(new Design(62_000, 1800, 5, 0.6, 4), LONG, 0);
        covers(new Design(3_000, 2500, 7, -0.3, 3), LONG, 0.3);
        covers(new Design(-500, 900, 4, 0.95, 0), LONG, 0.3);
    }

    /**
     * True values and how they are measured; ΔS follows from the true crossover.
     *
     * @param dof degrees of freedom of an estimated scale; 0 for stated uncertainties
     */
    private record Design(double enthalpy, double uH, double uS, double correlation, int dof) {}

    private static void covers(Design d, int campaigns, double leastShareUnbounded) {
        SplittableRandom random = new SplittableRandom(1954);
        double quantile = d.dof > 0 ? StudentT.quantile(0.975, d.dof) : Normal.quantile(0.975);
        int held = 0;
        int unbounded = 0;
        for (int i = 0; i < campaigns; i++) {
            double first = random.nextGaussian();
            double second =
                    d.correlation * first + Math.sqrt(1 - d.correlation * d.correlation) * random.nextGaussian();
            double h = d.enthalpy + d.uH * first;
            double s = d.enthalpy / TRUE_KELVIN + d.uS * second;
            double scale = 1;
            if (d.dof > 0) {
                scale = 0;
                for (int j = 0; j < d.dof; j++) {
                    double z = random.nextGaussian();
                    scale += z * z / d.dof;
                }
            }
            Stated stated = Settings.stated(
                    h,
                    scale * d.uH * d.uH,
                    s,
                    scale * d.uS * d.uS,
                    scale * d.correlation * d.uH * d.uS,
                    OptionalDouble.empty());
            Crossover crossover = Crossover.of(stated, quantile, 0.95);
            if (holds(crossover.interval().orElseThrow())) {
                held++;
            }
            if (crossover.outcome() != Crossover.Outcome.BOUNDED) {
                unbounded++;
            }
        }
        double deviation = Math.sqrt(0.95 * 0.05 / campaigns);
        assertEquals(0.95, (double) held / campaigns, 5 * deviation, d.toString());
        assertTrue(
                (double) unbounded / campaigns >= leastShareUnbounded, "the design must show open sets: " + unbounded);
    }

    private static boolean holds(Interval interval) {
        return switch (interval.kind()) {
            case BETWEEN ->
                TRUE_KELVIN >= interval.lower().getAsDouble()
                        && TRUE_KELVIN <= interval.upper().getAsDouble();
            case AT_LEAST -> TRUE_KELVIN >= interval.lower().getAsDouble();
            case AT_MOST -> TRUE_KELVIN <= interval.upper().getAsDouble();
            case OUTSIDE ->
                TRUE_KELVIN <= interval.lower().getAsDouble()
                        || TRUE_KELVIN >= interval.upper().getAsDouble();
            case EVERYTHING -> true;
            case NONE -> false;
        };
    }
}
