package org.saddlebook.estimation.api;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

class BlockRegressionTest {
    private static final double[] FIRST = {1, 0};
    private static final double[] SECOND = {0, 1};

    private static BlockFit fit(double[][] design, double[] y, double[] weightsOrNull, int[] blocks) {
        return assertInstanceOf(BlockFit.class, BlockRegression.fit(design, y, weightsOrNull, blocks));
    }

    private static String refused(double[][] design, double[] y, int[] blocks) {
        return assertInstanceOf(NotBlocked.class, BlockRegression.fit(design, y, null, blocks))
                .reason();
    }

    private static double[][] ones(int n) {
        double[][] design = new double[n][];
        for (int i = 0; i < n; i++) {
            design[i] = new double[] {1};
        }
        return design;
    }

    @Test
    void unbalancedAndWeightedBlocksAgreeWithDenseLikelihoodInFortyDigits() throws IOException {
        // reference/uncertainty/blocks.csv, made by blocks.py beside it.
        List<double[]> data = new ArrayList<>();
        List<String[]> answers = new ArrayList<>();
        try (BufferedReader reader = new BufferedReader(new InputStreamReader(
                BlockRegressionTest.class.getResourceAsStream("/reference/uncertainty/blocks.csv"),
                StandardCharsets.UTF_8))) {
            for (String text = reader.readLine(); text != null; text = reader.readLine()) {
                String[] cells = text.split(",", -1);
                if (cells[0].equals("*")) {
                    data.add(new double[] {
                        Double.parseDouble(cells[1]),
                        Double.parseDouble(cells[2]),
                        Double.parseDouble(cells[3]),
                        Double.parseDouble(cells[4])
                    });
                } else if (!cells[0].startsWith("#")) {
                    answers.add(cells);
                }
            }
        }
        int n = data.size();
        int[] blocks = new int[n];
        double[][] design = new double[n][];
        double[] y = new double[n];
        double[] weights = new double[n];
        for (int i = 0; i < n; i++) {
            blocks[i] = 7 - 3 * (int) data.get(i)[0];
            design[i] = new double[] {1, data.get(i)[1]};
            y[i] = data.get(i)[2];
            weights[i] = data.get(i)[3];
        }
        assertEquals(2, answers.size());
        for (String[] answer : answers) {
            BlockFit fit = fit(design, y, answer[0].equals("plain") ? null : weights, blocks);
            double[] found = {
                fit.betweenVariance(),
                fit.withinVariance(),
                fit.parameters()[0],
                fit.parameters()[1],
                Math.sqrt(fit.covariance()[0][0]),
                Math.sqrt(fit.predictionVariance(SECOND)),
                fit.degreesOfFreedom(FIRST),
                fit.degreesOfFreedom(SECOND)
            };
            for (int k = 0; k < found.length; k++) {
                double expected = Double.parseDouble(answer[k + 1]);
                assertEquals(expected, found[k], 2e-6 * Math.abs(expected), answer[0] + " " + k);
            }
        }
    }

    @Test
    void balancedBlocksGiveTheEstimatesOfTheAnalysisOfVariance() {
        // Three blocks of four: within = MSW, between = (MSB - MSW) / 4, mean with variance MSB / 12 and 2 degrees of
        // freedom.
        double[] y = {10.1, 10.3, 9.9, 10.2, 11.0, 11.2, 11.1, 10.8, 9.2, 9.5, 9.1, 9.3};
        int[] blocks = {1, 1, 1, 1, 2, 2, 2, 2, 3, 3, 3, 3};
        double grand = 0;
        double[] means = new double[3];
        for (int i = 0; i < 12; i++) {
            grand += y[i] / 12;
            means[blocks[i] - 1] += y[i] / 4;
        }
        double inside = 0;
        double among = 0;
        for (int i = 0; i < 12; i++) {
            inside += (y[i] - means[blocks[i] - 1]) * (y[i] - means[blocks[i] - 1]) / 9;
            among += (means[blocks[i] - 1] - grand) * (means[blocks[i] - 1] - grand) / 2;
        }
        BlockFit fit = fit(ones(12), y, null, blocks);
        assertEquals(inside, fit.withinVariance(), 1e-7 * inside);
        assertEquals((among - inside) / 4, fit.betweenVariance(), 1e-7 * among);
        assertEquals(grand, fit.parameters()[0], 1e-12);
        assertEquals(among / 12, fit.predictionVariance(new double[] {1}), 1e-7 * among);
        assertEquals(2, fit.degreesOfFreedom(new double[] {1}), 1e-5);
    }

    @Test
    void blocksThatScatterNoMoreThanTheirObservationsGiveTheOrdinaryFit() {
        double[] y = {1, 3, 3, 1, 2, 2.5, 2.4, 1.6};
        int[] blocks = {1, 1, 2, 2, 3, 3, 4, 4};
        BlockFit fit = fit(ones(8), y, null, blocks);
        LinearFit plain = assertInstanceOf(LinearFit.class, LinearLeastSquares.fit(ones(8), y, null));
        assertEquals(0, fit.betweenVariance(), 0);
        assertEquals(plain.residualVariance(), fit.withinVariance(), 1e-13);
        assertArrayEquals(plain.parameters(), fit.parameters(), 1e-13);
        assertEquals(7, fit.degreesOfFreedom(new double[] {1}), 0);
    }

    @Test
    void whatCannotBePartedIsNamed() {
        double[] y = {1, 2.2, 2.9, 4.1};
        double[][] line = {{1, 0}, {1, 1}, {1, 2}, {1, 3}};
        assertEquals("there is one block only", refused(line, y, new int[] {1, 1, 1, 1}));
        assertTrue(refused(line, y, new int[] {1, 2, 3, 4}).startsWith("every block holds one observation"));
        assertTrue(refused(line, y, new int[] {1, 1, 2, 3}).startsWith("nothing is repeated inside the blocks"));
        double[][] own = {{1, 0}, {1, 0}, {0, 1}, {0, 1}};
        assertEquals("the blocks are already told by the parameters", refused(own, y, new int[] {1, 1, 2, 2}));
        double[] same = {1, 1, 5, 5, 9, 9};
        assertTrue(refused(ones(6), same, new int[] {1, 1, 2, 2, 3, 3})
                .startsWith("the observations of each block agree"));
        assertTrue(refused(new double[][] {{1, 1}, {1, 1}, {1, 1}, {1, 1}}, y, new int[] {1, 1, 2, 2})
                .contains("repeat each other"));
        assertThrows(IllegalArgumentException.class, () -> BlockRegression.fit(line, y, null, new int[2]));
        assertThrows(
                IllegalArgumentException.class,
                () -> BlockRegression.fit(line, y, new double[] {1, 1, 0, 1}, new int[] {1, 1, 2, 2}));
    }
}
