package org.saddlebook.presentation.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/**
 * The rule that a rounded (A, Ea) must give k within a tenth of its uncertainty, checked on a straight line worked out
 * here from first principles: five temperatures 40 to 80 °C, 5 % scatter, Ea 100 kJ/mol. Known in advance (error
 * propagation by hand): rounding Ea alone to 0.1 kJ/mol moves k(60 °C) by up to 1.8 % although u(ln k) there is 2.2 %.
 */
@Tag("validation")
class RoundedSetValidationTest {
    private static final double R = 8.31446261815324;
    private static final double[] CELSIUS = {40, 50, 60, 70, 80};

    @Test
    void printedParametersGiveEveryRateConstantWithinATenthOfItsUncertainty() {
        double scatter = 0.05;
        double n = CELSIUS.length;
        double mean = 0;
        for (double t : CELSIUS) {
            mean += -1 / (R * (t + 273.15)) / n;
        }
        double spread = 0;
        for (double t : CELSIUS) {
            double x = -1 / (R * (t + 273.15)) - mean;
            spread += x * x;
        }
        double varianceSlope = scatter * scatter / spread;
        double covariance = -mean * varianceSlope;
        double varianceIntercept = scatter * scatter / n + mean * mean * varianceSlope;
        double a = 3.4567891234e12;
        double ea = 100123.456789;

        RoundedSet set = RoundedSet.reproducing(new double[] {a, ea}, new boolean[] {true, false}, new double[][] {
            {varianceIntercept, covariance}, {covariance, varianceSlope}
        });

        double worst = 0;
        double worstAtTwoDigits = 0;
        for (double celsius = -20; celsius <= 150; celsius += 1) {
            double x = -1 / (R * (celsius + 273.15));
            double u = Math.sqrt(varianceIntercept + 2 * x * covariance + x * x * varianceSlope);
            double shift = Math.log(set.values()[0] / a) + x * (set.values()[1] - ea);
            worst = Math.max(worst, Math.abs(shift) / u);
            worstAtTwoDigits = Math.max(worstAtTwoDigits, Math.abs(Math.log(3.5e12 / a) + x * (100100 - ea)) / u);
        }
        assertTrue(worst <= 0.1, "shift in standard uncertainties: " + worst);
        assertTrue(worst > 0, "the set is rounded at all");
        assertTrue(worstAtTwoDigits > 0.1, "two digits alone are not enough here: " + worstAtTwoDigits);
        assertTrue(set.digits() > 2 && set.digits() <= 5, "digits: " + set.digits());
    }

    @Test
    void independentNumbersNeedFewDigits() {
        RoundedSet set = RoundedSet.reproducing(
                new double[] {12.3456, 7.891}, new boolean[2], new double[][] {{0.04, 0}, {0, 0.09}});
        assertEquals(2, set.digits());
        assertEquals("12.35", set.texts().get(0));
        assertEquals("7.89", set.texts().get(1));
    }
}
