package org.saddlebook.units.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.math.BigDecimal;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class NumeralsTest {
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "1.2e-5 | 1.2e-5",
                "1.2E-05 | 1.2e-5",
                "1.2E5 | 1.2e5",
                "1.2e+5 | 1.2e5",
                "+3 | 3",
                "-3 | -3",
                "−3 | -3",
                "–3 | -3",
                ".5 | 0.5",
                "5. | 5",
                "007 | 7",
                " 12 | 12",
                "1.2×10^-5 | 1.2e-5",
                "1.2 × 10^-5 | 1.2e-5",
                "1.2·10⁻⁵ | 1.2e-5",
                "1.2 x 10^5 | 1.2e5",
                "1.2*10^5 | 1.2e5",
                "1.2×10⁵ | 1.2e5",
                "0 | 0",
                "0.000 | 0",
                "0e999 | number-out-of-range",
                "1e309 | number-out-of-range",
                "1e-400 | number-out-of-range",
                "1e99999999999 | number-out-of-range",
                "NaN | not-finite",
                "nan | not-finite",
                "inf | not-finite",
                "-Inf | not-finite",
                "Infinity | not-finite",
                "∞ | not-finite",
                "1,5 | decimal-sign",
                "1,234 | decimal-sign",
                "1,234.5 | thousands-separator",
                "1.234.567 | thousands-separator",
                "1 234.5 | thousands-separator",
                "1'234.5 | thousands-separator",
                "1’234 | thousands-separator",
                "1\u00a0234 | thousands-separator",
                "1_000 | thousands-separator",
                "1d | not-a-number",
                "1f | not-a-number",
                "0x1p3 | not-a-number",
                "0x10 | not-a-number",
                "1L | not-a-number",
                "1e | not-a-number",
                "1e- | not-a-number",
                "1×10 | not-a-number",
                "1×10^ | not-a-number",
                "1x | not-a-number",
                "--1 | not-a-number",
                "+-1 | not-a-number",
                "- | not-a-number",
                ". | not-a-number",
                "e5 | not-a-number",
                "1.2 3 | not-a-number",
                "< 0.1 | not-a-number",
                "1.2 s | not-a-number",
                "n/a | not-a-number",
                "٣ | not-a-number",
                "'' | missing-value"
            })
    void onlyNumbersThatPeopleWriteArePassed(String text, String outcome) throws UnitException {
        if (Character.isDigit(outcome.charAt(0)) || outcome.charAt(0) == '-') {
            assertEquals(0, new BigDecimal(outcome).compareTo(Numerals.parse(text, DecimalSign.POINT)), text);
        } else {
            assertEquals(
                    outcome,
                    assertThrows(UnitException.class, () -> Numerals.parse(text, DecimalSign.POINT))
                            .code(),
                    text);
        }
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "1,2e-5 | 1.2e-5",
                ",5 | 0.5",
                "1,2·10⁻⁵ | 1.2e-5",
                "3 | 3",
                "1.5 | decimal-sign",
                "1.234,5 | thousands-separator",
                "1,2,3 | thousands-separator"
            })
    void aDecimalCommaIsAsStrict(String text, String outcome) throws UnitException {
        if (Character.isDigit(outcome.charAt(0))) {
            assertEquals(0, new BigDecimal(outcome).compareTo(Numerals.parse(text, DecimalSign.COMMA)), text);
        } else {
            assertEquals(
                    outcome,
                    assertThrows(UnitException.class, () -> Numerals.parse(text, DecimalSign.COMMA))
                            .code());
        }
    }
}
