package org.saddlebook.estimation.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import org.apache.commons.math3.distribution.ChiSquaredDistribution;
import org.apache.commons.math3.distribution.FDistribution;
import org.apache.commons.math3.distribution.TDistribution;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Distributions against 60-digit values (mpmath), R and Apache Commons Math; the programs that made the stored values lie
 * beside them in the test resources.
 */
@Tag("validation")
class DistributionsValidationTest {
    private static double compute(String[] f) {
        double a = Double.parseDouble(f[1]);
        double b = f.length > 3 ? Double.parseDouble(f[2]) : Double.NaN;
        double c = f.length > 4 ? Double.parseDouble(f[3]) : Double.NaN;
        return switch (f[0]) {
            case "studentQuantile" -> StudentT.quantile(a, b);
            case "studentUpperTail" -> StudentT.upperTail(a, b);
            case "normalQuantile" -> Normal.quantile(a);
            case "normalUpperTail" -> Normal.upperTail(a);
            case "chiSquaredQuantile" -> ChiSquared.quantile(a, b);
            case "chiSquaredUpperTail" -> ChiSquared.upperTail(a, b);
            case "fisherQuantile" -> FisherF.quantile(a, b, c);
            case "fisherUpperTail" -> FisherF.upperTail(a, b, c);
            default -> throw new IllegalArgumentException(f[0]);
        };
    }

    /** Quantiles to the accuracy asked for everywhere; tails too (worst met: 9e-14, at probabilities near 1e-105). */
    @ParameterizedTest
    @CsvSource({"high-precision, 700", "statistics-package, 45"})
    void everyStoredValueIsMetToThirteenDigits(String file, int atLeast) throws IOException {
        int count = 0;
        try (BufferedReader reader = new BufferedReader(new InputStreamReader(
                getClass().getResourceAsStream("/reference/distributions/" + file + ".csv"), StandardCharsets.UTF_8))) {
            for (String line = reader.readLine(); line != null; line = reader.readLine()) {
                if (line.startsWith("#")) {
                    continue;
                }
                String[] fields = line.split(",", -1);
                double expected = Double.parseDouble(fields[fields.length - 1]);
                assertEquals(expected, compute(fields), 1e-13 * Math.abs(expected), line);
                count++;
            }
        }
        assertTrue(count >= atLeast, "values read: " + count);
    }

    @Test
    void tailsAgreeWithCommonsMath() {
        // org.apache.commons:commons-math3:3.6.1; its tails are differences from one, so absolute agreement is
        // compared.
        for (double dof : new double[] {1, 2, 2.5, 5, 9, 40, 250}) {
            TDistribution t = new TDistribution(null, dof);
            ChiSquaredDistribution chi = new ChiSquaredDistribution(null, dof);
            for (double x = 0.1; x < 60; x *= 1.7) {
                assertEquals(1 - t.cumulativeProbability(x), StudentT.upperTail(x, dof), 1e-12);
                assertEquals(t.cumulativeProbability(x), StudentT.upperTail(-x, dof), 1e-12);
                assertEquals(1 - chi.cumulativeProbability(x), ChiSquared.upperTail(x, dof), 1e-12);
                for (double other : new double[] {1, 6, 33}) {
                    FDistribution f = new FDistribution(null, dof, other);
                    assertEquals(1 - f.cumulativeProbability(x), FisherF.upperTail(x, dof, other), 1e-12);
                }
            }
        }
    }

    @Test
    void manyDegreesOfFreedomJoinTheNormalDistributionWithoutAStep() {
        double below = StudentT.quantile(0.975, 0.999e8);
        double above = StudentT.quantile(0.975, 1.001e8);
        assertEquals(below, above, 1e-10);
        // Slope of the first term of Abramowitz & Stegun 26.7.5 across the gap.
        double z = Normal.quantile(0.975);
        assertEquals((z * z * z + z) / 4 * (1 / 0.999e8 - 1 / 1.001e8), below - above, 1e-14);
        assertEquals(StudentT.upperTail(2, 0.999e8), StudentT.upperTail(2, 1.001e8), 1e-10);
        assertEquals(Normal.quantile(0.975), StudentT.quantile(0.975, Double.POSITIVE_INFINITY));
    }

    @Test
    void everyFiniteProbabilityHasAQuantile() {
        for (double p : new double[] {Double.MIN_NORMAL, 1e-200, 1e-30, 0.5, 1 - 1e-10, Math.nextDown(1.0)}) {
            for (double dof : new double[] {0.1, 1, 3, 50, 2000}) {
                if (dof >= 1 && p > 1e-150) {
                    assertTrue(Double.isFinite(StudentT.quantile(p, dof)), p + " " + dof);
                }
                assertTrue(ChiSquared.quantile(p, dof) >= 0, p + " " + dof);
            }
            assertTrue(Double.isFinite(Normal.quantile(p)));
        }
    }

    @Test
    void whatIsNotAProbabilityOrAFreedomIsRefused() {
        assertThrows(IllegalArgumentException.class, () -> StudentT.quantile(1, 5));
        assertThrows(IllegalArgumentException.class, () -> StudentT.quantile(Double.NaN, 5));
        assertThrows(IllegalArgumentException.class, () -> StudentT.quantile(0.9, 0));
        assertThrows(IllegalArgumentException.class, () -> StudentT.upperTail(Double.NaN, 5));
        assertThrows(IllegalArgumentException.class, () -> ChiSquared.quantile(0.5, Double.POSITIVE_INFINITY));
        assertThrows(IllegalArgumentException.class, () -> FisherF.upperTail(1, 0, 5));
        assertThrows(IllegalArgumentException.class, () -> Normal.quantile(0));
    }
}
