package org.saddlebook.units.internal;

import java.math.BigDecimal;
import java.util.OptionalDouble;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.units.api.DecimalSign;
import org.saddlebook.units.api.Measured;
import org.saddlebook.units.api.Numerals;
import org.saddlebook.units.api.UnitException;

/** Texts of a number with a unit: temperatures, standard states, measured values. */
public final class QuantityReading {
    private static final BigDecimal THOUSAND = BigDecimal.valueOf(1000);
    private static final BigDecimal BAR = BigDecimal.valueOf(100_000);
    private static final double ATMOSPHERE = 101_325;

    private QuantityReading() {}

    /** A temperature in kelvin. */
    public static double kelvin(String text) throws UnitException {
        String[] parts = split(text, "a temperature with its unit, for example 298.15K, 25degC or 77degF");
        BigDecimal number = Numerals.parse(parts[0], DecimalSign.POINT);
        if (parts[1].isEmpty()) {
            throw new UnitException(
                    "missing-unit",
                    "\"" + text + "\", a temperature without a unit",
                    "a temperature with its unit",
                    "write the unit, for example 298.15K, 25degC or 77degF");
        }
        double kelvin = ExactConversion.of(UnitReading.temperature(parts[1])).value(number);
        if (!(kelvin > 0) || Double.isInfinite(kelvin)) {
            throw new UnitException(
                    "below-absolute-zero",
                    "\"" + text + "\"",
                    "a temperature above 0 K",
                    "check the number and its unit");
        }
        return kelvin;
    }

    /** A standard state. */
    public static StandardState standardState(String text) throws UnitException {
        String expected = "a standard concentration or pressure, for example 1 mol/L or 1 bar";
        String[] parts = split(text, expected);
        BigDecimal number = Numerals.parse(parts[0], DecimalSign.POINT);
        if (parts[1].isEmpty()) {
            throw new UnitException("missing-unit", "\"" + text + "\"", expected, "write the unit after the number");
        }
        Unit unit = UnitReading.unit(parts[1]);
        double value = ExactConversion.of(unit).value(number);
        if (!(value > 0) || Double.isInfinite(value)) {
            throw new UnitException(
                    "not-positive", "\"" + text + "\"", "a standard state above zero", "check the number");
        }
        if (unit.dimension().equals(Dimension.CONCENTRATION)) {
            return new StandardState(StandardState.Kind.CONCENTRATION, value);
        }
        if (unit.dimension().equals(Dimension.PRESSURE)) {
            return new StandardState(StandardState.Kind.PRESSURE, value);
        }
        throw new UnitException(
                "wrong-dimension",
                "\"" + text + "\", a " + Dimensions.name(unit.dimension()),
                expected,
                "state a concentration in mol/L or mol/m3, or a pressure in bar, atm or Pa");
    }

    /** A standard state in the unit people use for it; reading the text gives the same state. */
    public static String text(StandardState standard) {
        BigDecimal shortest = Numerals.shortest(standard.value());
        if (standard.kind() == StandardState.Kind.CONCENTRATION) {
            return digits(shortest.divide(THOUSAND)) + " mol/L";
        }
        return standard.value() == ATMOSPHERE ? "1 atm" : digits(shortest.divide(BAR)) + " bar";
    }

    private static String digits(BigDecimal value) {
        BigDecimal stripped = value.stripTrailingZeros();
        boolean plain = stripped.scale() <= 12 && stripped.precision() - stripped.scale() <= 12;
        return plain ? stripped.toPlainString() : stripped.toString();
    }

    /** A value with an optional standard uncertainty and its unit. */
    public static Measured measured(String text) throws UnitException {
        String plain = UnitText.plain(text);
        String expected = "a value with its unit, for example \"-45.1 kJ/mol\", \"-45.1 ± 1.2 kJ/mol\""
                + " or \"-45.1(12) kJ/mol\"";
        boolean enclosed = plain.startsWith("(");
        if (enclosed) {
            int close = plain.indexOf(')');
            if (close < 0) {
                throw new UnitException("not-a-number", "\"" + text + "\"", expected, "close the parenthesis");
            }
            plain = plain.substring(1, close) + " " + plain.substring(close + 1);
        }
        String[] first = split(plain, expected);
        BigDecimal value = Numerals.parse(first[0], DecimalSign.POINT);
        String rest = first[1];
        BigDecimal uncertainty = null;
        if (rest.startsWith("(")) {
            int close = rest.indexOf(')');
            String digits = close < 0 ? "" : rest.substring(1, close);
            if (digits.isEmpty() || !isWhole(digits) || value.scale() < 0) {
                throw new UnitException(
                        "not-a-number",
                        "\"" + text + "\"",
                        expected,
                        "write the uncertainty in units of the last digit, for example -45.1(12)");
            }
            uncertainty = new BigDecimal(digits).movePointLeft(value.scale());
            rest = rest.substring(close + 1).trim();
        } else {
            int mark = plusMinus(rest);
            if (mark > 0) {
                String[] second = split(rest.substring(mark), expected);
                uncertainty = Numerals.parse(second[0], DecimalSign.POINT);
                rest = second[1];
            }
        }
        if (rest.isEmpty()) {
            throw new UnitException("missing-unit", "\"" + text + "\"", expected, "write the unit after the number");
        }
        if (uncertainty != null && uncertainty.signum() <= 0) {
            throw new UnitException(
                    "not-positive",
                    "\"" + text + "\"",
                    "a standard uncertainty above zero",
                    "leave the uncertainty out when it is not known");
        }
        return new Measured(
                value.doubleValue(),
                uncertainty == null ? OptionalDouble.empty() : OptionalDouble.of(uncertainty.doubleValue()),
                UnitReading.unit(rest));
    }

    /** Length of a leading ±, +-, +/- or u, blanks included; 0 when there is none. */
    private static int plusMinus(String rest) {
        for (String mark : new String[] {"±", "+/-", "+-", "u "}) {
            if (rest.startsWith(mark)) {
                return mark.length();
            }
        }
        return 0;
    }

    private static boolean isWhole(String digits) {
        for (int i = 0; i < digits.length(); i++) {
            if (digits.charAt(i) < '0' || digits.charAt(i) > '9') {
                return false;
            }
        }
        return digits.length() <= 20;
    }

    /** The number at the start, as text, and what follows it, both trimmed. */
    private static String[] split(String text, String expected) throws UnitException {
        String plain = UnitText.plain(text);
        int end = 0;
        while (end < plain.length() && "+-.,0123456789".indexOf(plain.charAt(end)) >= 0) {
            boolean pair = plain.startsWith("+-", end) || plain.startsWith("+/-", end);
            if (end > 0 && pair) {
                break;
            }
            end++;
        }
        end = exponentEnd(plain, end);
        if (end == 0) {
            throw new UnitException(
                    "not-a-number", plain.isEmpty() ? "nothing" : "\"" + text + "\"", expected, "begin with a number");
        }
        return new String[] {plain.substring(0, end), plain.substring(end).trim()};
    }

    /** The end of an exponent that starts here, or here: the e of 1e-5, but not that of 1 eV. */
    private static int exponentEnd(String plain, int from) {
        int end = from;
        if (from > 0 && end < plain.length() && (plain.charAt(end) == 'e' || plain.charAt(end) == 'E')) {
            end++;
            if (end < plain.length() && (plain.charAt(end) == '-' || plain.charAt(end) == '+')) {
                end++;
            }
            int digits = end;
            while (end < plain.length() && plain.charAt(end) >= '0' && plain.charAt(end) <= '9') {
                end++;
            }
            return end > digits ? end : from;
        }
        return from;
    }
}
