package org.saddlebook.units.internal;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.Locale;
import org.saddlebook.units.api.DecimalSign;
import org.saddlebook.units.api.UnitException;

/** Scans one number; see {@link org.saddlebook.units.api.Numerals} for the grammar. */
public final class NumeralScanner {
    /** More digits than any instrument prints; keeps a hostile cell from costing time. */
    private static final int LONGEST = 400;

    private static final int LARGEST_POWER = 400;

    /** As many digits fit a long, sign included. */
    private static final int LONG_DIGITS = 18;

    /** Magnitudes to this power of ten are within the range of double for certain. */
    private static final int SURE_POWER = 300;

    private final String original;
    private final String text;
    private final DecimalSign sign;
    private int position;

    /** A scanner for one number. */
    public NumeralScanner(String original, DecimalSign sign) {
        this.original = original;
        this.text = UnitText.plain(original);
        this.sign = sign;
    }

    /** The number's exact value. */
    public BigDecimal number() throws UnitException {
        checkShape();
        StringBuilder digits = new StringBuilder(text.length());
        int scale = mantissa(digits);
        int power = power();
        if (position < text.length()) {
            throw explain();
        }
        if (Math.abs(power) > LARGEST_POWER) {
            throw range();
        }
        BigDecimal value = digits.length() <= LONG_DIGITS
                ? BigDecimal.valueOf(Long.parseLong(digits.toString()), scale - power)
                : new BigDecimal(new BigInteger(digits.toString()), scale - power);
        if (Math.abs((long) value.precision() - value.scale()) > SURE_POWER) {
            double rounded = value.doubleValue();
            if (Double.isInfinite(rounded) || (rounded == 0 && value.signum() != 0)) {
                throw range();
            }
        }
        return value;
    }

    private void checkShape() throws UnitException {
        if (text.isEmpty()) {
            throw new UnitException(
                    "missing-value", "nothing", "a number", "write the number, or remove the row it belongs to");
        }
        if (text.length() > LONGEST) {
            throw new UnitException(
                    "not-a-number",
                    "a text of " + text.length() + " characters",
                    "a number",
                    "write a number of at most " + LONGEST + " characters");
        }
    }

    /** Appends sign and digits; returns the number of decimals. */
    private int mantissa(StringBuilder digits) throws UnitException {
        if (at('-')) {
            digits.append('-');
            position++;
        } else if (at('+')) {
            position++;
        }
        int start = position;
        copyDigits(digits);
        int whole = position - start;
        int decimals = 0;
        if (at(sign.character())) {
            position++;
            int from = position;
            copyDigits(digits);
            decimals = position - from;
        }
        if (whole + decimals == 0) {
            throw explain();
        }
        return decimals;
    }

    private int power() throws UnitException {
        if (at('e') || at('E')) {
            position++;
            return signedInteger();
        }
        int before = position;
        skipBlank();
        if (!at('*') && !at('x')) {
            position = before;
            return 0;
        }
        position++;
        skipBlank();
        if (!text.startsWith("10", position)) {
            throw explain();
        }
        position += 2;
        if (at('^')) {
            position++;
            return signedInteger();
        }
        StringBuilder plain = new StringBuilder();
        while (position < text.length() && UnitText.superscript(text.charAt(position)) != 0) {
            plain.append(UnitText.superscript(text.charAt(position)));
            position++;
        }
        NumeralScanner inner = new NumeralScanner(plain.toString(), sign);
        if (plain.length() == 0) {
            throw explain();
        }
        int power = inner.signedInteger();
        if (inner.position < inner.text.length()) {
            throw explain();
        }
        return power;
    }

    private int signedInteger() throws UnitException {
        int factor = at('-') ? -1 : 1;
        if (at('-') || at('+')) {
            position++;
        }
        int start = position;
        int value = 0;
        while (position < text.length() && isDigit(text.charAt(position))) {
            // Saturates well above the largest power allowed.
            value = Math.min(100_000, value * 10 + text.charAt(position) - '0');
            position++;
        }
        if (position == start) {
            throw explain();
        }
        return factor * value;
    }

    private void copyDigits(StringBuilder digits) {
        while (position < text.length() && isDigit(text.charAt(position))) {
            digits.append(text.charAt(position));
            position++;
        }
    }

    private void skipBlank() {
        while (at(' ')) {
            position++;
        }
    }

    private boolean at(char c) {
        return position < text.length() && text.charAt(position) == c;
    }

    private static boolean isDigit(char c) {
        return c >= '0' && c <= '9';
    }

    private UnitException range() {
        return new UnitException(
                "number-out-of-range",
                quoted(),
                "a number between 5e-324 and 1.8e308 in magnitude, or 0",
                "check the exponent, or state the values in a larger or smaller unit");
    }

    /** Says why the text is no number, as closely as can be told. */
    private UnitException explain() {
        String lower = text.toLowerCase(Locale.ROOT);
        String bare = lower.startsWith("-") || lower.startsWith("+") ? lower.substring(1) : lower;
        if (bare.equals("nan") || bare.equals("inf") || bare.equals("infinity") || bare.equals("∞")) {
            return new UnitException(
                    "not-finite",
                    quoted(),
                    "a finite number",
                    "remove the row, or exclude it with a reason and a number that was measured");
        }
        char other = sign == DecimalSign.POINT ? ',' : '.';
        if (isGrouped()) {
            return new UnitException(
                    "thousands-separator",
                    quoted(),
                    "a number without marks between thousands",
                    "remove the thousands separators, for example 1234.5 or 1.2345e3");
        }
        if (looksNumeric() && text.indexOf(other) >= 0) {
            return sign == DecimalSign.POINT
                    ? new UnitException(
                            "decimal-sign",
                            quoted(),
                            "a number with a decimal point",
                            "write a point for the decimal sign, and no mark between thousands")
                    : new UnitException(
                            "decimal-sign",
                            quoted(),
                            "a number with a decimal comma, as the other numbers here have",
                            "use one decimal sign throughout, and no mark between thousands");
        }
        return new UnitException(
                "not-a-number", quoted(), "a number such as 1" + sign.character() + "2e-5", "write a number");
    }

    /** Two marks, or digits grouped by blanks or apostrophes. */
    private boolean isGrouped() {
        int marks = 0;
        boolean grouped = false;
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            if (c == ',' || c == '.') {
                marks++;
            } else if ((c == ' ' || c == '\'' || c == '\u2019' || c == '_')
                    && i > 0
                    && i + 3 < text.length()
                    && isDigit(text.charAt(i - 1))
                    && isDigit(text.charAt(i + 1))
                    && isDigit(text.charAt(i + 2))
                    && isDigit(text.charAt(i + 3))) {
                grouped = true;
            }
        }
        return looksNumeric() && (marks > 1 || grouped);
    }

    private boolean looksNumeric() {
        boolean digit = false;
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            digit |= isDigit(c);
            if (!isDigit(c) && " .,'\u2019_+-eE".indexOf(c) < 0) {
                return false;
            }
        }
        return digit;
    }

    private String quoted() {
        return original.length() > 60 ? "\"" + original.substring(0, 60) + "…\"" : "\"" + original + "\"";
    }
}
