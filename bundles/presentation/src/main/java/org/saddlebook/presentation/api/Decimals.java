package org.saddlebook.presentation.api;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** Decimal digits of doubles, independent of the Java version. */
final class Decimals {
    /** Every double is first taken to 15 digits, so that 0.285 rounds as the decimal it was written as. */
    private static final MathContext FAITHFUL = new MathContext(15, RoundingMode.HALF_UP);

    private static final String RAISED = "⁰¹²³⁴⁵⁶⁷⁸⁹";

    /** Numbers below 10 to this power, or at least 10 to {@link #LARGEST_PLAIN}, are written with a power of ten. */
    private static final int SMALLEST_PLAIN = -3;

    private static final int LARGEST_PLAIN = 6;

    private Decimals() {}

    static BigDecimal of(double value) {
        if (!Double.isFinite(value)) {
            throw new IllegalArgumentException("must be finite: " + value);
        }
        return new BigDecimal(value).round(FAITHFUL);
    }

    /** Power of ten of the leading digit; 0 for zero. */
    static int exponent(BigDecimal value) {
        return value.signum() == 0 ? 0 : value.precision() - value.scale() - 1;
    }

    static BigDecimal significant(BigDecimal value, int digits) {
        return value.round(new MathContext(digits, RoundingMode.HALF_UP));
    }

    /** Power of ten of the second significant digit after rounding to two digits, which may carry: 0.0996 is 0.10. */
    static int secondDigit(BigDecimal uncertainty) {
        return exponent(significant(uncertainty, 2)) - 1;
    }

    /** Rounded so that its last digit stands for 10 to the power {@code position}. */
    static BigDecimal at(BigDecimal value, int position) {
        return value.setScale(-position, RoundingMode.HALF_UP);
    }

    /** Whether a number with this leading exponent and this last digit is better written without a power of ten. */
    static boolean plain(int leading, int position) {
        return position <= 0 && leading >= SMALLEST_PLAIN && leading < LARGEST_PLAIN;
    }

    /** Digits with a true minus sign; never in exponent notation. */
    static String text(BigDecimal value) {
        String digits = value.toPlainString();
        return digits.startsWith("-") ? "−" + digits.substring(1) : digits;
    }

    /** {@code " × 10⁻³"}. */
    static String timesPower(int exponent) {
        return " × 10" + raised(exponent);
    }

    static String raised(int exponent) {
        String digits = Integer.toString(exponent);
        StringBuilder text = new StringBuilder(digits.length());
        for (int i = 0; i < digits.length(); i++) {
            char c = digits.charAt(i);
            text.append(c == '-' ? '⁻' : RAISED.charAt(c - '0'));
        }
        return text.toString();
    }
}
