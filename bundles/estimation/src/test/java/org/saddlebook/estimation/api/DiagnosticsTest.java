package org.saddlebook.estimation.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

class DiagnosticsTest {
    private static List<String[]> rows(String file, String kind) throws IOException {
        List<String[]> rows = new ArrayList<>();
        try (BufferedReader reader = new BufferedReader(new InputStreamReader(
                DiagnosticsTest.class.getResourceAsStream("/reference/uncertainty/" + file), StandardCharsets.UTF_8))) {
            for (String text = reader.readLine(); text != null; text = reader.readLine()) {
                String[] cells = text.split(",", -1);
                if (kind.isEmpty() || cells[0].equals(kind) || cells[cells.length - 1].equals(kind)) {
                    rows.add(cells);
                }
            }
        }
        return rows;
    }

    private static double number(String text) {
        return Double.parseDouble(text.strip());
    }

    private static LinearFit line(double[] x, double[] y, double[] weightsOrNull) {
        double[][] design = new double[x.length][];
        for (int i = 0; i < x.length; i++) {
            design[i] = new double[] {1, x[i]};
        }
        return assertInstanceOf(LinearFit.class, LinearLeastSquares.fit(design, y, weightsOrNull));
    }

    @Test
    @Tag("validation")
    void residualsOfTheStackLossAreJudgedAsInR() throws IOException {
        // reference/uncertainty/diagnostics.csv, made by diagnostics.R beside it.
        List<String[]> data = rows("stackloss.csv", "");
        double[][] design = new double[21][];
        double[] y = new double[21];
        for (int i = 0; i < 21; i++) {
            String[] row = data.get(i + 1);
            design[i] = new double[] {1, number(row[0]), number(row[1]), number(row[2])};
            y[i] = number(row[3]);
        }
        LinearFit fit = assertInstanceOf(LinearFit.class, LinearLeastSquares.fit(design, y, null));
        List<PointDiagnostics> found = Diagnostics.of(fit, null);
        List<String[]> expected = rows("diagnostics.csv", "stackloss");
        assertEquals(21, expected.size());
        for (int i = 0; i < 21; i++) {
            String[] row = expected.get(i);
            PointDiagnostics point = found.get(i);
            assertEquals(i, point.row());
            assertEquals(number(row[2]), point.leverage(), 1e-12);
            assertEquals(number(row[3]), point.studentised().getAsDouble(), 1e-11);
            assertEquals(number(row[4]), point.deletedStudentised().getAsDouble(), 1e-11);
            assertEquals(number(row[5]), point.cook().getAsDouble(), 1e-11);
        }
    }

    @Test
    @Tag("validation")
    void lackOfFitOfTheSaturationKineticsIsThePublishedOne() throws IOException {
        // Bates & Watts 1988, table 1.2 (from memory: 497.9 with 4, 697.5 with 6 degrees of freedom, F 1.07); R for the
        // rest.
        List<String[]> data = rows("puromycin.csv", "treated");
        double[] x = data.stream().mapToDouble(row -> number(row[0])).toArray();
        double[] y = data.stream().mapToDouble(row -> number(row[1])).toArray();
        int[] groups = new int[x.length];
        double[] logarithms = new double[x.length];
        for (int i = 0; i < x.length; i++) {
            groups[i] = (int) Math.round(100 * x[i]);
            logarithms[i] = StrictMath.log(x[i]);
        }
        ReferenceModels.Curve saturation = (c, p, g) -> {
            g[0] = c / (p[1] + c);
            g[1] = -p[0] * c / ((p[1] + c) * (p[1] + c));
            return p[0] * g[0];
        };
        NonlinearFit fit = assertInstanceOf(
                NonlinearFit.class,
                NonlinearLeastSquares.fit(
                        ReferenceModels.over(x, 2, saturation),
                        y,
                        null,
                        List.of(new double[] {100, 1}),
                        NonlinearOptions.defaults()));
        compare(rows("diagnostics.csv", "lack").get(0), LackOfFit.test(fit, y, null, groups));
        LinearFit weighted = line(logarithms, y, x);
        compare(rows("diagnostics.csv", "lack-weighted").get(0), LackOfFit.test(weighted, y, x, groups));
    }

    private static void compare(String[] expected, LackOfFit.Outcome outcome) {
        LackOfFit.Tested tested = assertInstanceOf(LackOfFit.Tested.class, outcome);
        assertEquals(4, tested.lackFreedom());
        assertEquals(6, tested.pureFreedom());
        assertEquals(number(expected[1]), tested.f(), 1e-8);
        assertEquals(number(expected[2]), tested.lackSum(), 1e-6);
        assertEquals(number(expected[3]), tested.pureSum(), 1e-9);
        assertEquals(number(expected[4]), tested.pValue(), 1e-9);
    }

    @Test
    void lackOfFitWithoutReplicatesOrRoomIsNamed() {
        double[] x = {1, 2, 3, 4};
        double[] y = {1, 2.2, 2.9, 4.1};
        LinearFit fit = line(x, y, null);
        assertEquals(
                new LackOfFit.NotTestable("no condition was repeated"),
                LackOfFit.test(fit, y, null, new int[] {1, 2, 3, 4}));
        assertEquals(
                new LackOfFit.NotTestable("2 different conditions leave nothing to test beside 2 parameters"),
                LackOfFit.test(fit, y, null, new int[] {1, 1, 2, 2}));
        double[] twice = {1, 1, 2.9, 4.1};
        assertEquals(
                new LackOfFit.NotTestable("all replicates agree exactly"),
                LackOfFit.test(line(x, twice, null), twice, null, new int[] {1, 1, 2, 3}));
        assertThrows(IllegalArgumentException.class, () -> LackOfFit.test(fit, y, null, new int[3]));
    }

    @Test
    void pointsTheFitPassesThroughAnywayAreNotJudged() {
        // One point alone determines the slope.
        double[] x = {0, 0, 0, 5};
        double[] y = {1, 2, 3, 9};
        List<PointDiagnostics> found = Diagnostics.of(line(x, y, null), null);
        assertTrue(found.get(3).studentised().isEmpty());
        assertTrue(found.get(3).cook().isEmpty());
        assertEquals(-1 / Math.sqrt(2.0 / 3), found.get(0).studentised().getAsDouble(), 1e-12);
        double[] weights = {1, 1, 0, 1};
        assertEquals(3, Diagnostics.of(line(x, y, weights), weights).size());
    }

    @Test
    void runsAreCountedExactly() {
        // All arrangements of four and three signs, one by one.
        int[] few = new int[8];
        int total = 0;
        for (int bits = 0; bits < 128; bits++) {
            if (Integer.bitCount(bits) == 4) {
                int runs = 1 + Integer.bitCount((bits ^ (bits >> 1)) & 63);
                total++;
                for (int r = runs; r < 8; r++) {
                    few[r]++;
                }
            }
        }
        RunsTest test = Diagnostics.runs(new double[] {1, 2, 0, -1, -2, -0.5, 3, 1});
        assertEquals(3, test.runs());
        assertEquals(4, test.positive());
        assertEquals(3, test.negative());
        assertEquals(few[3] / (double) total, test.probabilityOfSoFew(), 1e-14);
        assertEquals(1 - few[2] / (double) total, test.probabilityOfSoMany(), 1e-14);
        RunsTest oneKind = Diagnostics.runs(new double[] {1, 2, 3});
        assertEquals(1, oneKind.probabilityOfSoFew(), 0);
        assertEquals(0, Diagnostics.runs(new double[] {0, 0}).runs());
    }

    @Test
    void theJointRegionIsTheOneWhereTheSumOfSquaresSaysSo() {
        double[] x = {0, 1, 2, 3, 4, 5};
        double[] y = {1, 2.9, 5.2, 6.8, 9.1, 11.05};
        LinearFit fit = line(x, y, null);
        JointRegion region = JointRegion.of(fit, 0, 1, 0.95, Scale.ESTIMATED);
        double limit = fit.residualSumOfSquares() + 2 * fit.residualVariance() * FisherF.quantile(0.95, 2, 4);
        for (double[] pair : region.edge(24)) {
            double sum = 0;
            for (int i = 0; i < 6; i++) {
                double r = y[i] - pair[0] - pair[1] * x[i];
                sum += r * r;
            }
            assertEquals(limit, sum, 1e-10);
            double[] b = fit.parameters();
            assertTrue(region.contains(b[0] + 0.999 * (pair[0] - b[0]), b[1] + 0.999 * (pair[1] - b[1])));
            assertFalse(region.contains(b[0] + 1.001 * (pair[0] - b[0]), b[1] + 1.001 * (pair[1] - b[1])));
        }
        // Chi-squared with two degrees of freedom has the quantile -2 ln(1 - level).
        assertEquals(
                -2 * StrictMath.log(0.05),
                JointRegion.of(fit, 1, 0, 0.95, Scale.STATED).limit(),
                1e-12);
        assertThrows(IllegalArgumentException.class, () -> JointRegion.of(fit, 1, 1, 0.95, Scale.STATED));
        assertThrows(IllegalArgumentException.class, () -> region.edge(2));
    }
}
