package org.saddlebook.reaction.api;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.MathContext;
import java.util.Objects;

/**
 * An exact rational number in lowest terms: a coefficient or a count of atoms. A balance is then true or false, never
 * nearly so.
 *
 * @param numerator carries the sign
 * @param denominator positive
 */
public record Fraction(BigInteger numerator, BigInteger denominator) implements Comparable<Fraction> {
    /** 0. */
    public static final Fraction ZERO = new Fraction(BigInteger.ZERO, BigInteger.ONE);

    /** 1. */
    public static final Fraction ONE = new Fraction(BigInteger.ONE, BigInteger.ONE);

    /** Brings it to lowest terms; throws {@link IllegalArgumentException} for a denominator of zero. */
    public Fraction {
        Objects.requireNonNull(numerator, "numerator");
        if (denominator.signum() == 0) {
            throw new IllegalArgumentException("the denominator must not be 0");
        }
        BigInteger common = numerator.gcd(denominator);
        if (denominator.signum() < 0) {
            common = common.negate();
        }
        if (!common.equals(BigInteger.ONE)) {
            numerator = numerator.divide(common);
            denominator = denominator.divide(common);
        }
    }

    /** A whole number. */
    public static Fraction of(long whole) {
        return new Fraction(BigInteger.valueOf(whole), BigInteger.ONE);
    }

    /** A ratio of whole numbers. */
    public static Fraction of(long numerator, long denominator) {
        return new Fraction(BigInteger.valueOf(numerator), BigInteger.valueOf(denominator));
    }

    /** The exact value of a decimal number. */
    public static Fraction of(BigDecimal decimal) {
        return decimal.scale() <= 0
                ? new Fraction(decimal.toBigIntegerExact(), BigInteger.ONE)
                : new Fraction(decimal.unscaledValue(), BigInteger.TEN.pow(decimal.scale()));
    }

    /** The sum. */
    public Fraction plus(Fraction other) {
        return new Fraction(
                numerator.multiply(other.denominator).add(other.numerator.multiply(denominator)),
                denominator.multiply(other.denominator));
    }

    /** The difference. */
    public Fraction minus(Fraction other) {
        return plus(other.negated());
    }

    /** The product. */
    public Fraction times(Fraction other) {
        return new Fraction(numerator.multiply(other.numerator), denominator.multiply(other.denominator));
    }

    /** The quotient; throws {@link IllegalArgumentException} when the other is zero. */
    public Fraction dividedBy(Fraction other) {
        return new Fraction(numerator.multiply(other.denominator), denominator.multiply(other.numerator));
    }

    /** The same with the other sign. */
    public Fraction negated() {
        return new Fraction(numerator.negate(), denominator);
    }

    /** -1, 0 or 1. */
    public int signum() {
        return numerator.signum();
    }

    /** The nearest double. */
    public double doubleValue() {
        return new BigDecimal(numerator)
                .divide(new BigDecimal(denominator), MathContext.DECIMAL128)
                .doubleValue();
    }

    /** {@code 3} or {@code 1/2}. */
    public String text() {
        return denominator.equals(BigInteger.ONE) ? numerator.toString() : numerator + "/" + denominator;
    }

    @Override
    public int compareTo(Fraction other) {
        return minus(other).signum();
    }
}
