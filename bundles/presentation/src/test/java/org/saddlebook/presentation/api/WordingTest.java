package org.saddlebook.presentation.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;

class WordingTest {
    private static String plain(String text) {
        return text.replace('\u00a0', ' ');
    }

    @ParameterizedTest
    @CsvSource({
        "83.96, 1.38, 84.0 ± 1.4",
        "-48.2, 4.04, −48.2 ± 4.0",
        "-0.02, 4.04, 0.0 ± 4.0",
        "1.3701e-3, 5.5e-5, 0.001370 ± 0.000055",
        "1.3701e-5, 5.5e-7, (1.370 ± 0.055) × 10⁻⁵",
        "84000, 1400, (8.40 ± 0.14) × 10⁴",
        "99.96, 0.996, 100.0 ± 1.0",
        "9.9996e7, 9.96e4, (1.0000 ± 0.0010) × 10⁸",
        "0.001, 12.3, 0 ± 12",
        "5, 0, 5",
        "0.285, 0.0285, 0.285 ± 0.029"
    })
    void roundsToTwoDigitsOfTheUncertainty(double value, double u, String text) {
        assertEquals(text, Rounding.plusMinus(value, u));
    }

    @ParameterizedTest
    @CsvSource({
        "1.37012e-3, 1.0401, 0.001370 ×/÷ 1.040",
        "1.37012e-4, 1.0401, 1.370 × 10⁻⁴ ×/÷ 1.040",
        "3.456e12, 5.34, 3.5 × 10¹² ×/÷ 5.3",
        "3.456e12, 1.532, 3.5 × 10¹² ×/÷ 1.53",
        "2, 1, 2",
        "3.456e12, 4.2e9, 3.5 × 10¹² ×/÷ 4.2 × 10⁹"
    })
    void writesLogarithmicQuantitiesWithAFactor(double value, double factor, String text) {
        assertEquals(text, Rounding.factor(value, factor));
    }

    @ParameterizedTest
    @CsvSource({
        "0.0273999, 3, 0.0274",
        "1.3701e-5, 3, 1.37 × 10⁻⁵",
        "84000, 2, 8.4 × 10⁴",
        "999.96, 4, 1000",
        "-1234.5, 6, −1234.50",
        "0, 3, 0",
        "9.9996e-5, 3, 1.00 × 10⁻⁴"
    })
    void writesSignificantDigits(double value, int digits, String text) {
        assertEquals(text, Rounding.significant(value, digits));
    }

    @ParameterizedTest
    @CsvSource({
        "-11.04, 2.91, −11.0 to 2.9",
        "340.2, 371.4, 340 to 371",
        "1.301e-5, 1.442e-5, (1.301 to 1.442) × 10⁻⁵",
        "1e8, 3.33e14, 1.0 × 10⁸ to 3.3 × 10¹⁴",
        "2, 2, 2 to 2",
        "9.996, 10.004, 9.9960 to 10.0040"
    })
    void writesIntervalsWithMatchingDecimals(double lower, double upper, String text) {
        assertEquals(text, Rounding.interval(lower, upper));
    }

    @ParameterizedTest
    @CsvSource({"-0.99912345, −0.99912", "0.3, 0.30", "1, 1", "-1, −1", "0, 0.00", "0.99999996, 0.999999960"})
    void writesCorrelationsWithTwoDigitsOfTheirDistanceFromOne(double r, String text) {
        assertEquals(text, Rounding.correlation(r));
    }

    @Test
    void refusesNumbersThatAreNone() {
        assertThrows(IllegalArgumentException.class, () -> Rounding.plusMinus(Double.NaN, 1));
        assertThrows(IllegalArgumentException.class, () -> Rounding.plusMinus(1, Double.NaN));
        assertThrows(IllegalArgumentException.class, () -> Rounding.plusMinus(1, -1));
        assertThrows(IllegalArgumentException.class, () -> Rounding.factor(1, 0.9));
        assertThrows(IllegalArgumentException.class, () -> Rounding.correlation(1.1));
        assertThrows(IllegalArgumentException.class, () -> Rounding.interval(2, 1));
    }

    @ParameterizedTest
    @CsvSource({
        "L/(mol.s), L mol⁻¹ s⁻¹",
        "L.mol-1.s-1, L mol⁻¹ s⁻¹",
        "s-1, s⁻¹",
        "/s, s⁻¹",
        "1/s, s⁻¹",
        "1/min, min⁻¹",
        "m3/(mol.s), m³ mol⁻¹ s⁻¹",
        "cm3/{molecule}/s, cm³ molecule⁻¹ s⁻¹",
        "cm3.{molecule}-1.s-1, cm3.{molecule}-1.s-1",
        "L2/(mol2.s), L² mol⁻² s⁻¹",
        "mol/(L.s), mol L⁻¹ s⁻¹",
        "J/(mol.K), J/(mol K)",
        "J/mol, J/mol",
        "Cel, °C",
        "K, K",
        "h-1, h⁻¹",
        "odd unit, odd unit"
    })
    void writesUnitsInTheLookOfTheTrade(String ucum, String text) {
        assertEquals(text, plain(UnitText.forPeople(ucum)));
    }

    @Test
    void showsMolarEnergiesInKilojoule() {
        assertEquals("84.0 ± 1.4 kJ/mol", plain(QuantityText.of(Node.Quantity.of(83960, "J/mol", 1380))));
        assertEquals(
                "84.0 ± 1.4 kJ/mol (95 %: 79.6 to 88.4 kJ/mol)",
                plain(QuantityText.withInterval(Node.Quantity.of(83960, "J/mol", 1380)
                        .withInterval(Interval.between(79570, 88350, 0.95, "t")))));
        assertEquals("100.000 s⁻¹", plain(QuantityText.of(Node.Quantity.of(100, "s-1"))));
    }

    @Test
    void neverGivesAnUndeterminedQuantityAPlusMinus() {
        Node.Quantity n = Node.Quantity.of(-4.1, "1", 0.51)
                .withInterval(Interval.between(-11.04, 2.91, 0.95, "t"))
                .withCautions(List.of("undetermined"));
        assertEquals("not determined (95 %: −11.0 to 2.9)", QuantityText.of(n));
        assertEquals("not determined (95 %: −11.0 to 2.9)", QuantityText.withInterval(n));
        Node.Quantity nothing = new Node.Quantity(
                OptionalDouble.empty(),
                "J/mol",
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                Optional.empty(),
                List.of());
        assertEquals("not determined", QuantityText.of(nothing));
        assertEquals(
                "not determined (95 %: every value)",
                QuantityText.of(nothing.withInterval(Interval.everything(0.95, "fieller"))));
    }

    @Test
    void wordsEveryKindOfInterval() {
        assertEquals(
                "79.6 to 88.4 kJ/mol", plain(QuantityText.set(Interval.between(79570, 88350, 0.95, "t"), "J/mol")));
        assertEquals(
                "at least 340 K",
                plain(QuantityText.set(
                        new Interval(Interval.Kind.AT_LEAST, 0.95, OptionalDouble.of(340), OptionalDouble.empty(), "t"),
                        "K")));
        assertEquals(
                "at most 371 K",
                plain(QuantityText.set(
                        new Interval(Interval.Kind.AT_MOST, 0.95, OptionalDouble.empty(), OptionalDouble.of(371), "t"),
                        "K")));
        assertEquals(
                "below 340 K or above 371 K",
                plain(QuantityText.set(
                        new Interval(Interval.Kind.OUTSIDE, 0.95, OptionalDouble.of(340), OptionalDouble.of(371), "f"),
                        "K")));
        assertEquals("every value", QuantityText.set(Interval.everything(0.95, "t"), "K"));
        assertEquals(
                "no value",
                QuantityText.set(
                        new Interval(Interval.Kind.NONE, 0.95, OptionalDouble.empty(), OptionalDouble.empty(), "t"),
                        "K"));
    }

    @Test
    void givesAbsoluteTemperaturesInBothScales() {
        assertEquals("313.15 K (40.00 °C)", plain(QuantityText.temperature(313.15)));
        assertEquals("353.0 ± 4.2 K (79.9 °C)", plain(QuantityText.temperature(Node.Quantity.of(353.04, "K", 4.2))));
        assertEquals("268.15 K (−5.00 °C)", plain(QuantityText.temperature(268.15)));
    }

    @Test
    void saysWhereWhatAndHow() {
        Problem problem = new Problem(
                "non-positive-rate",
                Place.of("rates.csv", 7, "k / s^-1"),
                "-0.0021",
                "a rate constant above 0",
                "Correct the cell.");
        assertEquals(
                "rates.csv, line 7, column \"k / s^-1\"\n  found:    -0.0021\n  expected: a rate constant above 0\n"
                        + "  remedy:   Correct the cell.",
                ProblemText.of(problem));
        Problem nasty = new Problem("x", Place.of("a\u001b[2Jb"), "1\u0007\n2", "number", "none");
        String text = ProblemText.of(nasty);
        assertFalse(text.contains("\u001b") || text.contains("\u0007"), text);
        assertEquals(5, text.split("\n", -1).length);
    }

    @Test
    void everyStandardCautionIsASentence() {
        for (String id : CautionText.ids()) {
            String text = CautionText.of(id);
            assertTrue(id.matches("[a-z0-9-]+"), id);
            assertTrue(text.endsWith(".") && Character.isUpperCase(text.codePointAt(0)), text);
        }
        assertEquals(
                Map.of("extrapolated", CautionText.of("extrapolated")),
                CautionText.texts(List.of("extrapolated", "extrapolated")));
        assertThrows(IllegalArgumentException.class, () -> CautionText.of("no-such-caution"));
    }
}
