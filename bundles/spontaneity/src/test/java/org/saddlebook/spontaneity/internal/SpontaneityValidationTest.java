package org.saddlebook.spontaneity.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Node;
import org.saddlebook.estimation.api.Normal;
import org.saddlebook.estimation.api.StudentT;

@Tag("validation")
class SpontaneityValidationTest {
    @ParameterizedTest
    @MethodSource("reactions")
    void givesSignCaseAndCrossoverOfTabulatedReactions(List<String> row) throws Exception {
        Node.Group body = Settings.of(
                        Node.Quantity.of(Double.parseDouble(row.get(2)), "kJ/mol"),
                        Node.Quantity.of(Double.parseDouble(row.get(3)), "J/(mol.K)"))
                .body();
        String expected = switch (row.get(5)) {
            case "--" -> "below the crossover";
            case "++" -> "above the crossover";
            case "+-" -> "at no temperature";
            case "-+" -> "exergonic at every temperature";
            default -> throw new IllegalArgumentException(row.get(5));
        };
        assertEquals(expected, Settings.text(body, "case"), row.get(0));
        if (row.get(7).equals("none")) {
            assertEquals(List.of(), Settings.items(body, "crossovers"), row.get(0));
        } else {
            double kelvin = Settings.crossover(body).value().getAsDouble();
            double enthalpy = Math.abs(Double.parseDouble(row.get(2)));
            double entropy = Math.abs(Double.parseDouble(row.get(3)));
            // Half a unit of the last digit of the answer, of dH in kJ/mol and of dS.
            double tolerance = 0.05 + kelvin * (5e-4 / enthalpy + 5e-4 / entropy);
            assertEquals(Double.parseDouble(row.get(7)), kelvin, tolerance, row.get(0));
        }
    }

    @ParameterizedTest
    @MethodSource("ratios")
    void givesFiellerLimitsOfTheReferencePrograms(List<String> row) {
        OptionalDouble dof = number(row.get(6));
        Stated stated = Settings.stated(
                Double.parseDouble(row.get(1)),
                Double.parseDouble(row.get(3)),
                Double.parseDouble(row.get(2)),
                Double.parseDouble(row.get(5)),
                Double.parseDouble(row.get(4)),
                dof);
        double quantile = dof.isPresent() ? StudentT.quantile(0.975, dof.getAsDouble()) : Normal.quantile(0.975);
        Interval interval = Crossover.of(stated, quantile, 0.95).interval().orElseThrow();
        assertEquals(row.get(7), interval.kind().key(), row.get(0));
        same(number(row.get(8)), interval.lower(), row.get(0));
        same(number(row.get(9)), interval.upper(), row.get(0));
    }

    @Test
    void givesFiellerLimitsOfTheCalibrationLine() throws IOException {
        // JCGM 100:2008, annex H.3: b = y1 + y2 (t - 20); zero at -y1/y2.
        List<List<String>> rows = Reference.rows("thermometer_calibration.csv");
        int n = rows.size();
        double sx = 0;
        double sy = 0;
        double sxx = 0;
        double sxy = 0;
        for (List<String> row : rows) {
            double x = Double.parseDouble(row.get(0)) - 20;
            double y = Double.parseDouble(row.get(1));
            sx += x;
            sy += y;
            sxx += x * x;
            sxy += x * y;
        }
        double determinant = n * sxx - sx * sx;
        double y1 = (sy * sxx - sxy * sx) / determinant;
        double y2 = (n * sxy - sx * sy) / determinant;
        double rss = 0;
        for (List<String> row : rows) {
            double residual = Double.parseDouble(row.get(1)) - y1 - y2 * (Double.parseDouble(row.get(0)) - 20);
            rss += residual * residual;
        }
        double s2 = rss / (n - 2);
        // Published, to the printed digits: the line itself is right.
        assertEquals(-0.1712, y1, 5e-5);
        assertEquals(0.00218, y2, 5e-6);
        assertEquals(0.0035, Math.sqrt(s2), 5e-5);
        Stated stated = Settings.stated(
                -y1, s2 * sxx / determinant, y2, s2 * n / determinant, s2 * sx / determinant, OptionalDouble.of(n - 2));
        Crossover zero = Crossover.of(stated, StudentT.quantile(0.975, n - 2.0), 0.95);
        assertEquals(78.436784, zero.kelvin().getAsDouble(), 1e-6);
        assertEquals(47.97862, zero.interval().orElseThrow().lower().getAsDouble(), 1e-5);
        assertEquals(245.870358, zero.interval().orElseThrow().upper().getAsDouble(), 1e-6);
    }

    @Test
    void givesTheBandOfTheFullCovariance() throws Exception {
        // JCGM 100:2008, 5.2.2, by hand at 300 K: u^2 = 1800^2 + 300^2 25 - 2 300 (0.95 1800 5) = 360 000, u = 600.
        Node.Group body = Settings.of(Node.Quantity.of(62, "kJ/mol", 1.8), Node.Quantity.of(160, "J/(mol.K)", 5))
                .with("correlation", 0.95)
                .range(new Node.Scalar(300), Node.Quantity.of(126.85, "Cel"))
                .body();
        Node.Group first = (Node.Group) Settings.items(body, "dG").get(0);
        Node.Quantity gibbs = Settings.quantity(first, "dG");
        assertEquals(300, Settings.quantity(first, "temperature").value().getAsDouble());
        assertEquals(14_000, gibbs.value().getAsDouble(), 1e-9);
        assertEquals(600, gibbs.standardUncertainty().getAsDouble(), 1e-9);
        // 1.959964 is the 97.5 % point of the normal distribution (standard tables).
        assertEquals(
                14_000 + 1.959964 * 600, gibbs.interval().orElseThrow().upper().getAsDouble(), 1e-3);
    }

    private static void same(OptionalDouble expected, OptionalDouble actual, String name) {
        assertEquals(expected.isPresent(), actual.isPresent(), name);
        if (expected.isPresent()) {
            assertTrue(
                    Math.abs(actual.getAsDouble() / expected.getAsDouble() - 1) < 1e-11,
                    name + ": " + expected + " and " + actual);
        }
    }

    private static OptionalDouble number(String text) {
        return text.isEmpty() ? OptionalDouble.empty() : OptionalDouble.of(Double.parseDouble(text));
    }

    private static List<List<String>> reactions() throws IOException {
        return Reference.rows("reaction_summary.csv");
    }

    private static List<List<String>> ratios() throws IOException {
        return Reference.rows("fieller.csv");
    }
}
