package org.saddlebook.units.api;

import java.math.BigDecimal;
import java.math.MathContext;
import org.saddlebook.units.internal.NumeralScanner;

/**
 * Numbers in text, by a strict grammar of our own: what a person may write, not what a programming language accepts.
 *
 * <pre>
 * number   = [sign] (digits [mark [digits]] | mark digits) [("e" | "E") [sign] digits | times "10" power]
 * times    = "×" | "·" | "*" | "x", with or without blanks
 * power    = "^" [sign] digits | superscripts
 * sign     = "+" | "-" | "−"
 * </pre>
 *
 * The mark is a point or a comma, as stated, never either. Thousands separators, {@code NaN}, infinities, hexadecimal
 * numbers and type suffixes are refused.
 */
public final class Numerals {
    private static final int DOUBLE_DIGITS = 17;

    private Numerals() {}

    /**
     * The exact value of a number.
     *
     * @param text the number, blanks around it allowed
     * @param sign the decimal sign in use
     * @throws UnitException with code {@code missing-value}, {@code not-a-number}, {@code not-finite}, {@code
     *     decimal-sign}, {@code thousands-separator} or {@code number-out-of-range} (beyond the range of double)
     */
    public static BigDecimal parse(String text, DecimalSign sign) throws UnitException {
        return new NumeralScanner(text, sign).number();
    }

    /**
     * The fewest digits that give the number back, the same on every Java version (that of {@code Double.toString}
     * changed with JDK 19).
     *
     * @param value finite
     * @throws IllegalArgumentException when {@code value} is not finite
     */
    public static BigDecimal shortest(double value) {
        if (!Double.isFinite(value)) {
            throw new IllegalArgumentException("value must be finite: " + value);
        }
        if (value == 0) {
            return BigDecimal.ZERO;
        }
        BigDecimal exact = new BigDecimal(value);
        for (int digits = 1; digits < DOUBLE_DIGITS; digits++) {
            BigDecimal rounded = exact.round(new MathContext(digits));
            if (rounded.doubleValue() == value) {
                return rounded.stripTrailingZeros();
            }
        }
        return exact.round(new MathContext(DOUBLE_DIGITS)).stripTrailingZeros();
    }
}
