package org.saddlebook.presentation.api;

import java.math.BigDecimal;

/**
 * Numbers for people, rounded as JCGM 100:2008 (the GUM), 7.2.6 asks: the uncertainty to two significant digits, the value
 * to the same decimal place. Ties are rounded away from zero; uncertainties are rounded to the nearest digit, not up.
 *
 * <p>Numbers from 0.001 to below a million stand as they are, others with a power of ten, as do numbers whose last
 * certain digit lies left of the decimal point. The minus is U+2212. Arguments must be finite; an
 * {@link IllegalArgumentException} says which was not.
 */
public final class Rounding {
    private static final int MOST_DIGITS = 15;

    private Rounding() {}

    /**
     * A value with its standard uncertainty: {@code 84.0 ± 1.4}, {@code (1.370 ± 0.055) × 10⁻³}.
     *
     * @param value the value
     * @param uncertainty its standard uncertainty in the same unit, not negative; 0 gives the value alone
     */
    public static String plusMinus(double value, double uncertainty) {
        BigDecimal exact = Decimals.of(value);
        BigDecimal u = nonNegative(uncertainty);
        if (u.signum() == 0) {
            return shortest(value);
        }
        int position = Decimals.secondDigit(u);
        int leading = Math.max(Decimals.exponent(exact), Decimals.exponent(u));
        if (Decimals.plain(leading, position)) {
            return Decimals.text(Decimals.at(exact, position)) + " ± " + Decimals.text(Decimals.at(u, position));
        }
        // The power is taken after rounding, which may carry into the next decade.
        int power =
                Math.max(Decimals.exponent(Decimals.at(exact, position)), Decimals.exponent(Decimals.at(u, position)));
        return "(" + Decimals.text(Decimals.at(exact.scaleByPowerOfTen(-power), position - power)) + " ± "
                + Decimals.text(Decimals.at(u.scaleByPowerOfTen(-power), position - power)) + ")"
                + Decimals.timesPower(power);
    }

    /**
     * A quantity estimated on a logarithmic scale with its standard factor: {@code 1.370 × 10⁻³ ×/÷ 1.040}. The factor
     * has two significant digits of its distance from 1, or two digits from 2 on.
     *
     * @param value the value
     * @param standardFactor exp of the standard uncertainty of ln value, at least 1; 1 gives the value alone
     */
    public static String factor(double value, double standardFactor) {
        if (!(standardFactor >= 1)) {
            throw new IllegalArgumentException("standard factor must be at least 1: " + standardFactor);
        }
        BigDecimal f = Decimals.of(standardFactor);
        BigDecimal over = f.subtract(BigDecimal.ONE);
        if (over.signum() == 0) {
            return shortest(value);
        }
        BigDecimal shown = over.compareTo(BigDecimal.ONE) >= 0
                ? Decimals.significant(f, 2)
                : Decimals.at(f, Decimals.secondDigit(over));
        BigDecimal exact = Decimals.of(value);
        int position = Decimals.secondDigit(exact.abs().multiply(over));
        int digits = Math.max(2, Math.min(MOST_DIGITS, Decimals.exponent(exact) - position + 1));
        return significant(value, digits) + " ×/÷ " + number(shown);
    }

    /**
     * A number with so many significant digits: {@code 0.0274}, {@code 1.37 × 10⁻⁵}.
     *
     * @param digits 1 to 15
     */
    public static String significant(double value, int digits) {
        if (digits < 1 || digits > MOST_DIGITS) {
            throw new IllegalArgumentException("digits must lie between 1 and " + MOST_DIGITS + ": " + digits);
        }
        BigDecimal rounded = Decimals.significant(Decimals.of(value), digits);
        if (rounded.signum() == 0) {
            return "0";
        }
        int leading = Decimals.exponent(rounded);
        return at(rounded, leading - digits + 1);
    }

    /** A number that is known exactly or was chosen by a person, with no digit more than it needs, at most 12. */
    public static String shortest(double value) {
        BigDecimal stripped = Decimals.significant(Decimals.of(value), 12).stripTrailingZeros();
        if (stripped.signum() == 0) {
            return "0";
        }
        return number(stripped);
    }

    /**
     * A number with so many decimals, never with a power of ten: {@code 40.00}.
     *
     * @param decimals 0 to 15
     */
    public static String decimals(double value, int decimals) {
        BigDecimal rounded = Decimals.at(Decimals.of(value), -decimals);
        // No "minus zero".
        return Decimals.text(rounded.signum() == 0 ? BigDecimal.ZERO.setScale(decimals) : rounded);
    }

    /**
     * Two limits: {@code 81.2 to 86.8}, {@code (1.30 to 1.44) × 10⁻³}. Both have the decimal place that gives half their
     * distance two digits; limits of the same sign more than a factor 20 apart have two digits each.
     *
     * @param lower lower limit; may be infinite
     * @param upper upper limit, not below the lower one; may be infinite
     */
    public static String interval(double lower, double upper) {
        if (!(lower <= upper)) {
            throw new IllegalArgumentException("lower limit " + lower + " above upper limit " + upper);
        }
        if (Double.isInfinite(lower) || Double.isInfinite(upper)) {
            return limit(lower) + " to " + limit(upper);
        }
        double wide = Math.max(Math.abs(lower), Math.abs(upper));
        double narrow = Math.min(Math.abs(lower), Math.abs(upper));
        if (lower * upper > 0 && wide > 20 * narrow) {
            return significant(lower, 2) + " to " + significant(upper, 2);
        }
        BigDecimal low = Decimals.of(lower);
        BigDecimal high = Decimals.of(upper);
        BigDecimal half = high.subtract(low).divide(BigDecimal.valueOf(2));
        if (half.signum() == 0) {
            return shortest(lower) + " to " + shortest(upper);
        }
        int position = Decimals.secondDigit(half);
        int leading = Math.max(Decimals.exponent(low), Decimals.exponent(high));
        if (Decimals.plain(leading, position)) {
            return Decimals.text(Decimals.at(low, position)) + " to " + Decimals.text(Decimals.at(high, position));
        }
        int power = leading;
        return "(" + Decimals.text(Decimals.at(low.scaleByPowerOfTen(-power), position - power)) + " to "
                + Decimals.text(Decimals.at(high.scaleByPowerOfTen(-power), position - power)) + ")"
                + Decimals.timesPower(power);
    }

    /** One limit of an open interval, three significant digits; {@code −∞} and {@code ∞} for infinite ones. */
    public static String limit(double value) {
        if (Double.isInfinite(value)) {
            return value < 0 ? "−∞" : "∞";
        }
        return significant(value, 3);
    }

    /**
     * A correlation coefficient with enough digits that 1 − |r| has two: {@code −0.99912}. Needed because a covariance
     * rebuilt from fewer digits no longer reproduces the uncertainty of a prediction.
     *
     * @param coefficient −1 to 1
     */
    public static String correlation(double coefficient) {
        if (!(Math.abs(coefficient) <= 1)) {
            throw new IllegalArgumentException("a correlation lies between -1 and 1: " + coefficient);
        }
        BigDecimal r = Decimals.of(coefficient);
        BigDecimal rest = BigDecimal.ONE.subtract(r.abs());
        if (rest.signum() == 0) {
            return coefficient < 0 ? "−1" : "1";
        }
        int position = Math.max(-MOST_DIGITS, Math.min(-2, Decimals.secondDigit(rest)));
        return decimals(coefficient, -position);
    }

    /** A probability or share: {@code 0.32}, {@code 0.0041}, {@code below 0.0001}. */
    public static String probability(double probability) {
        if (!(probability >= 0 && probability <= 1)) {
            throw new IllegalArgumentException("a probability lies between 0 and 1: " + probability);
        }
        if (probability < 1e-4) {
            return "below 0.0001";
        }
        if (probability > 1 - 1e-4) {
            return probability == 1 ? "1" : "above 0.9999";
        }
        BigDecimal exact = Decimals.of(probability);
        BigDecimal rest = BigDecimal.ONE.subtract(exact);
        return decimals(probability, -Math.min(-2, Decimals.secondDigit(exact.min(rest))));
    }

    /** A coverage probability in per cent: {@code 95 %}, {@code 99.9 %}. */
    public static String percent(double fraction) {
        return shortest(Decimals.of(fraction).movePointRight(2).doubleValue()) + " %";
    }

    /** The number as it is, with a power of ten where it is very large or small. */
    private static String number(BigDecimal value) {
        int leading = Decimals.exponent(value);
        int position = -value.scale();
        if (leading >= -3 && leading < 6) {
            return Decimals.text(position > 0 ? value.setScale(0) : value);
        }
        return Decimals.text(value.scaleByPowerOfTen(-leading)) + Decimals.timesPower(leading);
    }

    /** An already rounded number whose last digit stands at {@code position}. */
    static String at(BigDecimal rounded, int position) {
        int leading = Decimals.exponent(rounded);
        if (Decimals.plain(leading, position)) {
            return Decimals.text(Decimals.at(rounded, position));
        }
        return Decimals.text(Decimals.at(rounded.scaleByPowerOfTen(-leading), position - leading))
                + Decimals.timesPower(leading);
    }

    private static BigDecimal nonNegative(double uncertainty) {
        if (!(uncertainty >= 0)) {
            throw new IllegalArgumentException("standard uncertainty must not be negative: " + uncertainty);
        }
        return Decimals.of(uncertainty);
    }
}
