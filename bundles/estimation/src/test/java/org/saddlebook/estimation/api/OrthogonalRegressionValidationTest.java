package org.saddlebook.estimation.api;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertNotNull;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Errors in both variables against published values, against ODRPACK (through SciPy) and against the same minimum in 40-digit
 * arithmetic; reference/uncertainty/orthogonal.csv, made by orthogonal.py beside it.
 */
@Tag("validation")
class OrthogonalRegressionValidationTest {
    /** One case of the file: its points and, row by row, the answers. */
    private record Case(String curve, MeasuredPoints points, List<String[]> answers) {}

    private static Case read(String name) throws IOException {
        List<String[]> answers = new ArrayList<>();
        List<double[]> rows = new ArrayList<>();
        String curve = "";
        try (BufferedReader reader = new BufferedReader(new InputStreamReader(
                OrthogonalRegressionValidationTest.class.getResourceAsStream("/reference/uncertainty/orthogonal.csv"),
                StandardCharsets.UTF_8))) {
            for (String text = reader.readLine(); text != null; text = reader.readLine()) {
                String[] cells = text.split(",", -1);
                if (cells[0].equals(name)) {
                    curve = cells[1];
                    answers.add(cells);
                } else if (cells[0].equals("*" + name)) {
                    double[] row = new double[5];
                    for (int k = 0; k < 5; k++) {
                        row[k] = Double.parseDouble(cells[k + 1]);
                    }
                    rows.add(row);
                }
            }
        }
        MeasuredPoints points = MeasuredPoints.of(column(rows, 0), column(rows, 1), column(rows, 2), column(rows, 3))
                .withCorrelations(column(rows, 4));
        return new Case(curve, points, answers);
    }

    private static double[] column(List<double[]> rows, int k) {
        return rows.stream().mapToDouble(row -> row[k]).toArray();
    }

    private static CurveFunction curve(String name) {
        return switch (name) {
            case "line" ->
                new Curve(2, (x, p, g) -> {
                    g[0] = 1;
                    g[1] = x;
                    g[2] = p[1];
                    return p[0] + p[1] * x;
                });
            case "saturation" ->
                new Curve(2, (x, p, g) -> {
                    double sum = p[1] + x;
                    g[0] = x / sum;
                    g[1] = -p[0] * x / (sum * sum);
                    g[2] = p[0] * p[1] / (sum * sum);
                    return p[0] * g[0];
                });
            case "decay" ->
                new Curve(3, (x, p, g) -> {
                    g[0] = StrictMath.exp(-p[1] * x);
                    g[1] = -p[0] * x * g[0];
                    g[2] = 1;
                    g[3] = -p[0] * p[1] * g[0];
                    return p[0] * g[0] + p[2];
                });
            default -> throw new IllegalArgumentException(name);
        };
    }

    private record Curve(int parameterCount, ReferenceModels.Curve inner) implements CurveFunction {
        @Override
        public double value(double x, double[] p, double[] gradient) {
            return inner.value(x, p, gradient);
        }
    }

    private static List<double[]> starts(String curve) {
        return switch (curve) {
            // A line of the wrong sign has a minimum of its own; several starts are for that.
            case "line" -> List.of(new double[] {1, 1}, new double[] {1, -1});
            case "saturation" -> List.of(new double[] {100, 1});
            default -> List.of(new double[] {5, 1, 0});
        };
    }

    private static OrthogonalFit general(Case read, NonlinearOptions options) {
        return assertInstanceOf(
                OrthogonalFit.class,
                OrthogonalRegression.fit(curve(read.curve), read.points, starts(read.curve), options));
    }

    private static void compare(OrthogonalFit fit, Case read, double tolerance) {
        double[][] covariance = fit.unscaledCovariance();
        for (int j = 0; j < fit.parameterCount(); j++) {
            String[] row = read.answers.get(j);
            double value = Double.parseDouble(row[5]);
            double deviation = Double.parseDouble(row[6]);
            double chi = Double.parseDouble(row[7]);
            assertEquals(value, fit.parameters()[j], tolerance * Math.abs(value));
            assertEquals(deviation, Math.sqrt(covariance[j][j]), tolerance * deviation);
            assertEquals(chi, fit.residualSumOfSquares(), tolerance * chi);
            if (!row[3].isEmpty()) {
                // ODRPACK stops at the square root of rounding (its limit on the change of the sum of squares).
                assertEquals(Double.parseDouble(row[3]), fit.parameters()[j], 1e-8 * Math.abs(value));
                assertEquals(Double.parseDouble(row[4]), Math.sqrt(covariance[j][j]), 1e-8 * deviation);
            }
        }
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "pearson",
                "pearson-correlated",
                "eyring",
                "saturation",
                "decay",
                "decay-correlated",
                "decay-exact-y"
            })
    void curvesAgreeWithOdrpackAndWithTheMinimumInFortyDigits(String name) throws IOException {
        Case read = read(name);
        assertNotNull(read.curve);
        compare(general(read, NonlinearOptions.defaults()), read, 2e-11);
        compare(general(read, NonlinearOptions.defaults().withThorough(false)), read, 2e-11);
    }

    @ParameterizedTest
    @ValueSource(strings = {"pearson", "pearson-correlated", "eyring"})
    void linesAgreeWithOdrpackAndWithTheMinimumInFortyDigits(String name) throws IOException {
        Case read = read(name);
        OrthogonalFit line = assertInstanceOf(OrthogonalFit.class, OrthogonalRegression.fitLine(read.points));
        compare(line, read, 2e-13);
    }

    @Test
    void pearsonsPointsWithYorksWeightsComeOutToEveryPrintedDigit() throws IOException {
        // York et al. 2004 and Reed 1989 as given in pearson_york.json.
        OrthogonalFit line =
                assertInstanceOf(OrthogonalFit.class, OrthogonalRegression.fitLine(read("pearson").points));
        double[][] covariance = line.unscaledCovariance();
        double[] u = {Math.sqrt(covariance[0][0]), Math.sqrt(covariance[1][1])};
        assertArrayEquals(new double[] {5.47991022, -0.480533407}, line.parameters(), 0.5e-8);
        assertEquals(-0.480533407, line.parameters()[1], 0.5e-9);
        assertArrayEquals(new double[] {0.294971, 0.057985}, u, 0.5e-6);
        assertEquals(11.8663532, line.residualSumOfSquares(), 0.5e-7);
        assertEquals(1.4833, line.residualVariance(), 0.5e-4);
        double factor = Math.sqrt(line.residualVariance());
        assertArrayEquals(new double[] {0.35924652, 0.07062027}, new double[] {factor * u[0], factor * u[1]}, 0.5e-8);
        assertEquals(-0.96308814, covariance[0][1] / u[0] / u[1], 0.5e-8);
    }

    @Test
    void pearsonsOwnLineIsTheOneOfEqualUncertainties() throws IOException {
        // K. Pearson, Phil. Mag. 2 (1901) 559: y = -0.5456 x + 5.784; more digits from pearson_york.json.
        MeasuredPoints points = read("pearson").points;
        double[] one = new double[points.count()];
        java.util.Arrays.fill(one, 1);
        OrthogonalFit line = assertInstanceOf(
                OrthogonalFit.class, OrthogonalRegression.fitLine(MeasuredPoints.of(points.x(), points.y(), one, one)));
        assertEquals(-0.545561198, line.parameters()[1], 0.5e-9);
        assertEquals(5.78404377, line.parameters()[0], 0.5e-8);
    }
}
