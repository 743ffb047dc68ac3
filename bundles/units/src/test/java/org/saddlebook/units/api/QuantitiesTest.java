package org.saddlebook.units.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.model.StandardState.Kind;

class QuantitiesTest {
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "298.15 | missing-unit",
                "25 | missing-unit",
                "degC | not-a-number",
                "'' | not-a-number",
                "0 K | below-absolute-zero",
                "-1 K | below-absolute-zero",
                "-273.15 °C | below-absolute-zero",
                "-500 degF | below-absolute-zero",
                "25,5 degC | decimal-sign",
                "25 kJ | wrong-dimension",
                "25 degX | unknown-unit",
                "1e999 K | number-out-of-range",
                "1e308 kK | below-absolute-zero",
                "NaN K | not-a-number"
            })
    void temperaturesThatAreNoneAreRefused(String text, String code) {
        assertEquals(
                code,
                assertThrows(UnitException.class, () -> Units.kelvin(text)).code());
    }

    @Test
    void aTemperatureWithoutAUnitSaysHowToWriteIt() {
        UnitException problem = assertThrows(UnitException.class, () -> Units.kelvin("25"));
        assertEquals("\"25\", a temperature without a unit", problem.found());
        assertEquals("a temperature with its unit", problem.expected());
        assertEquals("write the unit, for example 298.15K, 25degC or 77degF", problem.remedy());
    }

    @ParameterizedTest
    @CsvSource({
        "1bar, PRESSURE, 100000, 1 bar",
        "1 bar, PRESSURE, 100000, 1 bar",
        "1 atm, PRESSURE, 101325, 1 atm",
        "101325 Pa, PRESSURE, 101325, 1 atm",
        "100 kPa, PRESSURE, 100000, 1 bar",
        "1 mol/L, CONCENTRATION, 1000, 1 mol/L",
        "1M, CONCENTRATION, 1000, 1 mol/L",
        "1 M, CONCENTRATION, 1000, 1 mol/L",
        "1 mol dm-3, CONCENTRATION, 1000, 1 mol/L",
        "1 mol/m3, CONCENTRATION, 1, 0.001 mol/L",
        "0.1 mM, CONCENTRATION, 0.1, 0.0001 mol/L",
        "1 {molecule}/cm3, CONCENTRATION, 1.6605390671738466e-18, 1.6605390671738466E-21 mol/L"
    })
    void standardStatesAreReadAndWritten(String text, Kind kind, double value, String written) throws UnitException {
        StandardState state = Units.standardState(text);
        assertEquals(new StandardState(kind, value), state);
        assertEquals(written, Units.text(state));
        assertEquals(state, Units.standardState(Units.text(state)));
    }

    @ParameterizedTest
    @CsvSource({
        "1, missing-unit",
        "0 bar, not-positive",
        "-1 mol/L, not-positive",
        "1 mol/kg, wrong-dimension",
        "1 K, wrong-dimension",
        "bar, not-a-number",
        "1 Bar, unknown-unit"
    })
    void standardStatesThatAreNoneAreRefused(String text, String code) {
        assertEquals(
                code,
                assertThrows(UnitException.class, () -> Units.standardState(text))
                        .code());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "-45.1 kJ/mol | -45.1 | | kJ/mol",
                "-45.1 ± 1.2 kJ/mol | -45.1 | 1.2 | kJ/mol",
                "−45.1 ± 1.2 kJ mol⁻¹ | -45.1 | 1.2 | kJ/mol",
                "-45.1±1.2 kJ/mol | -45.1 | 1.2 | kJ/mol",
                "-45.1(12) kJ/mol | -45.1 | 1.2 | kJ/mol",
                "-45.10(12)kJ/mol | -45.1 | 0.12 | kJ/mol",
                "45(3) kJ/mol | 45 | 3 | kJ/mol",
                "-45.1 +- 1.2 kJ/mol | -45.1 | 1.2 | kJ/mol",
                "-45.1+-1.2 kJ/mol | -45.1 | 1.2 | kJ/mol",
                "-45.1 +/- 1.2 kJ/mol | -45.1 | 1.2 | kJ/mol",
                "-45.1 u 1.2 kJ/mol | -45.1 | 1.2 | kJ/mol",
                "(-45.1 ± 1.2) kJ/mol | -45.1 | 1.2 | kJ/mol",
                "1.5e3 J/mol | 1500 | | J/mol",
                "1.5e3±2e1 J/mol | 1500 | 20 | J/mol",
                "0.85 eV per particle | 0.85 | | eV/{molecule}",
                "-120 J/(mol.K) | -120 | | J/(mol.K)"
            })
    void measuredValuesKeepTheirUnit(String text, double value, Double uncertainty, String unit) throws UnitException {
        Measured measured = Units.measured(text);
        assertEquals(value, measured.value());
        assertEquals(
                uncertainty == null ? OptionalDouble.empty() : OptionalDouble.of(uncertainty), measured.uncertainty());
        assertEquals(unit, measured.unit().code());
    }

    @Test
    void measuredValuesConvertToSi() throws UnitException {
        Measured celsius = Units.measured("25.0(2) °C");
        assertEquals(298.15, celsius.si());
        assertEquals(0.2, celsius.uncertaintySi().orElseThrow());
        Measured energy = Units.measured("-45.1 ± 1.2 kJ/mol");
        assertEquals(-45100, energy.si());
        assertEquals(1200, energy.uncertaintySi().orElseThrow());
        assertEquals(OptionalDouble.empty(), Units.measured("1 K").uncertaintySi());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "-45.1 | missing-unit",
                "-45.1 ± 1.2 | missing-unit",
                "-45.1 ± kJ/mol | not-a-number",
                "-45.1 ± 0 kJ/mol | not-positive",
                "-45.1 ± -1 kJ/mol | not-positive",
                "-45.1(1.2) kJ/mol | not-a-number",
                "-45.1() kJ/mol | not-a-number",
                "-45.1(12 kJ/mol | not-a-number",
                "(-45.1 ± 1.2 kJ/mol | not-a-number",
                "kJ/mol | not-a-number",
                "'' | not-a-number",
                "-45,1 kJ/mol | decimal-sign",
                "-45.1 KJ/mol | unknown-unit",
                "-45.1 kJ/mol ± 1 kJ/mol | unit-syntax"
            })
    void measuredValuesThatAreNoneAreRefused(String text, String code) {
        assertEquals(
                code,
                assertThrows(UnitException.class, () -> Units.measured(text)).code());
    }

    @ParameterizedTest
    @ValueSource(doubles = {1e5, 0.1, 1.0 / 3, 1e22, Double.MIN_VALUE, Double.MAX_VALUE, -2.5, 0, 123456.789})
    void shortestDigitsGiveTheNumberBack(double value) {
        assertEquals(value, Numerals.shortest(value).doubleValue());
    }

    /** Double.toString(Double.MIN_VALUE) has two digits, and before JDK 19 often more than needed. */
    @Test
    void shortestDigitsAreTheFewest() {
        assertEquals("0.1", Numerals.shortest(0.1).toString());
        assertEquals("1E+22", Numerals.shortest(1e22).toString());
        assertEquals("5E-324", Numerals.shortest(Double.MIN_VALUE).toString());
        assertEquals("0", Numerals.shortest(-0.0).toString());
        assertThrows(IllegalArgumentException.class, () -> Numerals.shortest(Double.NaN));
    }
}
