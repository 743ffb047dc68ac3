package org.saddlebook.window.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Arrays;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.saddlebook.estimation.api.ChiSquared;
import org.saddlebook.estimation.api.Normal;
import org.saddlebook.estimation.api.StudentT;

/** Draws against the distributions they stand for; bounds are five standard deviations of the count. */
class SourceTest {
    private static final int DRAWS = 200_000;

    @ParameterizedTest
    @ValueSource(doubles = {0.7, 1, 3, 4, 17.5})
    void chiSquaredDrawsHaveTheirQuantiles(double dof) {
        SplittableRandom random = new SplittableRandom(11);
        int[] below = new int[3];
        double[] shares = {0.05, 0.5, 0.95};
        for (int i = 0; i < DRAWS; i++) {
            double value = Source.chiSquared(random, dof);
            for (int j = 0; j < shares.length; j++) {
                below[j] += value <= ChiSquared.quantile(shares[j], dof) ? 1 : 0;
            }
        }
        for (int j = 0; j < shares.length; j++) {
            assertEquals(shares[j], (double) below[j] / DRAWS, bound(shares[j]), "dof " + dof);
        }
    }

    @Test
    void nearlyCollinearParametersKeepTheirCombination() {
        // ln A and Ea/R·1e-3: variance of ln A − Ea/(R T) is far smaller than that of either.
        double ua = 2;
        double ub = 0.6;
        double r = 0.99999;
        double[][] covariance = {{ua * ua, r * ua * ub}, {r * ua * ub, ub * ub}};
        double[][] columns = new double[2][DRAWS];
        new Source(covariance, OptionalDouble.empty()).draw(new SplittableRandom(3), columns);
        double c = ua / ub;
        double variance = 0;
        for (int d = 0; d < DRAWS; d++) {
            double x = columns[0][d] - c * columns[1][d];
            variance += x * x / DRAWS;
        }
        double expected = 2 * ua * ua * (1 - r);
        assertEquals(expected, variance, expected * 5 * Math.sqrt(2.0 / DRAWS));
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, 3})
    void everyCombinationHasTheQuantilesOfNormalOrT(double dof) {
        double[][] covariance = {{4, 1.1, 0.2}, {1.1, 1, -0.3}, {0.2, -0.3, 2}};
        double[][] columns = new double[3][DRAWS];
        new Source(covariance, dof > 0 ? OptionalDouble.of(dof) : OptionalDouble.empty())
                .draw(new SplittableRandom(19), columns);
        double[] a = {0.5, -2, 1};
        double variance = 0;
        for (int i = 0; i < 3; i++) {
            for (int j = 0; j < 3; j++) {
                variance += a[i] * covariance[i][j] * a[j];
            }
        }
        for (double share : new double[] {0.025, 0.3, 0.95}) {
            double quantile = Math.sqrt(variance) * (dof > 0 ? StudentT.quantile(share, dof) : Normal.quantile(share));
            int below = 0;
            for (int d = 0; d < DRAWS; d++) {
                double x = a[0] * columns[0][d] + a[1] * columns[1][d] + a[2] * columns[2][d];
                below += x <= quantile ? 1 : 0;
            }
            assertEquals(share, (double) below / DRAWS, bound(share));
        }
    }

    @Test
    void aDirectionWithoutVarianceStaysStill() {
        double[][] columns = new double[2][1000];
        new Source(new double[][] {{4, 6}, {6, 9}}, OptionalDouble.empty()).draw(new SplittableRandom(1), columns);
        for (int d = 0; d < 1000; d++) {
            assertEquals(0, 1.5 * columns[0][d] - columns[1][d], 1e-12);
        }
    }

    @Test
    void quantilesOfDrawsAreThoseOfTheSortedDraws() {
        SplittableRandom random = new SplittableRandom(23);
        for (int size : new int[] {1, 2, 7, 1000}) {
            double[] values = new double[size];
            for (int i = 0; i < size; i++) {
                values[i] = random.nextInt(50);
            }
            double[] sorted = values.clone();
            Arrays.sort(sorted);
            for (double share : new double[] {0, 0.1, 0.5, 0.975, 1}) {
                int index = (int) Math.min(size - 1, Math.floor(share * size));
                assertEquals(sorted[index], WindowSearch.quantile(values.clone(), share));
            }
        }
    }

    private static double bound(double share) {
        return 5 * Math.sqrt(share * (1 - share) / DRAWS);
    }
}
