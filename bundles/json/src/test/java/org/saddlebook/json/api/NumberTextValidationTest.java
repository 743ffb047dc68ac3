package org.saddlebook.json.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import net.jqwik.api.Example;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Tag;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Against RFC 8785, appendix B, and against the definition of the shortest form in ECMA-262, 6.1.6.1.20. */
@Tag("validation")
class NumberTextValidationTest {
    @org.junit.jupiter.api.Tag("validation")
    @ParameterizedTest
    @CsvSource({
        "0000000000000000, 0",
        "8000000000000000, 0",
        "0000000000000001, 5e-324",
        "8000000000000001, -5e-324",
        "7fefffffffffffff, 1.7976931348623157e+308",
        "ffefffffffffffff, -1.7976931348623157e+308",
        "4340000000000000, 9007199254740992",
        "c340000000000000, -9007199254740992",
        "4430000000000000, 295147905179352830000",
        "44b52d02c7e14af5, 9.999999999999997e+22",
        "44b52d02c7e14af6, 1e+23",
        "44b52d02c7e14af7, 1.0000000000000001e+23",
        "444b1ae4d6e2ef4e, 999999999999999700000",
        "444b1ae4d6e2ef4f, 999999999999999900000",
        "444b1ae4d6e2ef50, 1e+21",
        "3eb0c6f7a0b5ed8c, 9.999999999999997e-7",
        "3eb0c6f7a0b5ed8d, 0.000001",
        "41b3de4355555553, 333333333.3333332",
        "41b3de4355555554, 333333333.33333325",
        "41b3de4355555555, 333333333.3333333",
        "41b3de4355555556, 333333333.3333334",
        "41b3de4355555557, 333333333.33333343",
        "becbf647612f3696, -0.0000033333333333333333",
        "43143ff3c1cb0959, 1424953923781206.2",
    })
    void writesTheVectorsOfTheStandard(String bits, String expected) {
        assertEquals(expected, NumberText.of(Double.longBitsToDouble(Long.parseUnsignedLong(bits, 16))));
    }

    @Example
    void refusesWhatHasNoNumber() {
        assertThrows(IllegalArgumentException.class, () -> NumberText.of(Double.NaN));
        assertThrows(IllegalArgumentException.class, () -> NumberText.of(Double.POSITIVE_INFINITY));
        assertThrows(IllegalArgumentException.class, () -> NumberText.of(Double.NEGATIVE_INFINITY));
    }

    /** The value read back is the same, and no decimal with one digit fewer reads back as it. */
    @Property(tries = 4_000)
    void isTheShortestThatReadsBack(@ForAll long bits) {
        double value = Double.longBitsToDouble(bits);
        if (Double.isFinite(value)) {
            assertShortest(value);
        }
    }

    @Property(tries = 1_000)
    void isTheShortestAmongTheSmallestNumbersToo(@ForAll @IntRange(min = 1) int bits) {
        assertShortest(Double.longBitsToDouble(bits));
        assertShortest(Double.longBitsToDouble(bits % 64 + 1));
    }

    @Property(tries = 1_000)
    void isTheShortestAmongNumbersPeopleType(@ForAll int digits, @ForAll byte exponent) {
        assertShortest(new BigDecimal(digits).scaleByPowerOfTen(exponent).doubleValue());
    }

    private static void assertShortest(double value) {
        String text = NumberText.of(value);
        assertEquals(value + 0.0, Double.parseDouble(text), text);
        if (value == 0) {
            return;
        }
        BigDecimal decimal = new BigDecimal(text).abs().stripTrailingZeros();
        if (decimal.precision() > 1) {
            // The two decimals of one digit fewer that enclose the value: if neither reads back, none does.
            BigDecimal exact = new BigDecimal(Math.abs(value));
            BigDecimal unit = BigDecimal.ONE.scaleByPowerOfTen(1 - decimal.scale());
            BigDecimal below = exact.divideToIntegralValue(unit).multiply(unit);
            assertTrue(below.doubleValue() != Math.abs(value), text);
            assertTrue(below.add(unit).doubleValue() != Math.abs(value), text);
            // Of those with as many digits, the nearest was taken.
            BigDecimal last = BigDecimal.ONE.scaleByPowerOfTen(-decimal.scale());
            BigDecimal error = decimal.subtract(exact).abs();
            assertTrue(error.compareTo(decimal.add(last).subtract(exact).abs()) <= 0, text);
            assertTrue(error.compareTo(decimal.subtract(last).subtract(exact).abs()) <= 0, text);
        }
    }
}
