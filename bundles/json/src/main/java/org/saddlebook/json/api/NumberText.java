package org.saddlebook.json.api;

import com.fasterxml.jackson.core.io.schubfach.DoubleToDecimal;

/**
 * Numbers as text: the shortest decimal that reads back as the same double, laid out as ECMAScript's Number::toString
 * does (ECMA-262, 6.1.6.1.20), which RFC 8785 prescribes. The same on every Java version, unlike
 * {@link Double#toString(double)}, which is not the shortest before Java 19.
 */
public final class NumberText {
    private NumberText() {}

    /**
     * The text of a number: {@code 298.15}, {@code 1e+21}, {@code 0} for both zeros.
     *
     * @throws IllegalArgumentException for NaN and infinities
     */
    public static String of(double value) {
        StringBuilder out = new StringBuilder(24);
        append(out, value);
        return out.toString();
    }

    /** Appends the text of a number. */
    static void append(StringBuilder out, double value) {
        if (!Double.isFinite(value)) {
            throw new IllegalArgumentException("no decimal form for " + value);
        }
        if (value == 0) {
            out.append('0');
            return;
        }
        double magnitude = Math.abs(value);
        if (value < 0) {
            out.append('-');
        }
        long whole = (long) magnitude;
        // Whole numbers below 2^53 are their own shortest form: no other decimal with as few digits reads back.
        if (whole == magnitude && whole < 1L << 53) {
            out.append(whole);
            return;
        }
        layOut(out, shortest(magnitude));
    }

    /** Decimal digits without zeros at either end, and where the point stands: value = 0.DIGITS times 10^point. */
    private record Decimal(String digits, int point) {}

    private static Decimal shortest(double magnitude) {
        // Schubfach (R. Giulietti, "The Schubfach way to render doubles", 2022) in its Java layout: d.ddd or d.dddE-dd.
        Decimal decimal = parse(DoubleToDecimal.toString(magnitude));
        return decimal.digits.length() == 2 ? oneDigit(magnitude, decimal) : decimal;
    }

    /**
     * Java's layout has two digits at least and prefers the nearest two-digit decimal where one digit would do; that
     * happens among the smallest subnormals only (4.9E-324 for 5e-324).
     */
    private static Decimal oneDigit(double magnitude, Decimal two) {
        int tens = two.digits.charAt(0) - '0';
        int ones = two.digits.charAt(1) - '0';
        int near = ones < 5 ? tens : tens + 1;
        int far = ones < 5 ? tens + 1 : tens;
        for (int digit : new int[] {near, far}) {
            if (digit > 0 && Double.parseDouble(digit + "e" + (two.point - 1)) == magnitude) {
                return digit == 10 ? new Decimal("1", two.point + 1) : new Decimal(Integer.toString(digit), two.point);
            }
        }
        return two;
    }

    private static Decimal parse(String text) {
        int exponentAt = text.indexOf('E');
        int exponent = exponentAt < 0 ? 0 : Integer.parseInt(text.substring(exponentAt + 1));
        String mantissa = exponentAt < 0 ? text : text.substring(0, exponentAt);
        int pointAt = mantissa.indexOf('.');
        String digits = pointAt < 0 ? mantissa : mantissa.substring(0, pointAt) + mantissa.substring(pointAt + 1);
        int point = (pointAt < 0 ? mantissa.length() : pointAt) + exponent;
        int start = 0;
        while (digits.charAt(start) == '0') {
            start++;
        }
        int end = digits.length();
        while (digits.charAt(end - 1) == '0') {
            end--;
        }
        return new Decimal(digits.substring(start, end), point - start);
    }

    private static void layOut(StringBuilder out, Decimal decimal) {
        String digits = decimal.digits;
        int point = decimal.point;
        if (point > 0 && point <= 21) {
            if (digits.length() <= point) {
                out.append(digits);
                zeros(out, point - digits.length());
            } else {
                out.append(digits, 0, point).append('.').append(digits, point, digits.length());
            }
        } else if (point > -6 && point <= 0) {
            out.append("0.");
            zeros(out, -point);
            out.append(digits);
        } else {
            out.append(digits.charAt(0));
            if (digits.length() > 1) {
                out.append('.').append(digits, 1, digits.length());
            }
            int exponent = point - 1;
            out.append('e').append(exponent < 0 ? '-' : '+').append(Math.abs(exponent));
        }
    }

    private static void zeros(StringBuilder out, int count) {
        for (int i = 0; i < count; i++) {
            out.append('0');
        }
    }
}
