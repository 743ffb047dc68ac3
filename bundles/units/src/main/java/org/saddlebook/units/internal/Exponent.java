package org.saddlebook.units.internal;

/**
 * An exponent as a fraction in lowest terms, so that exponents add up exactly.
 *
 * @param numerator any sign
 * @param denominator positive
 */
record Exponent(int numerator, int denominator) {
    static final Exponent ONE = new Exponent(1, 1);

    /** Bound on the magnitude of numerator and denominator; no unit of the trade comes near it. */
    private static final long BOUND = 10_000;

    /** A fraction in lowest terms; {@code ArithmeticException} when it is out of all proportion. */
    static Exponent of(long numerator, long denominator) {
        if (denominator == 0) {
            throw new ArithmeticException("zero denominator");
        }
        long divisor = Math.max(1, gcd(Math.abs(numerator), Math.abs(denominator)));
        long n = numerator / divisor * (denominator < 0 ? -1 : 1);
        long d = Math.abs(denominator) / divisor;
        if (Math.abs(n) > BOUND || d > BOUND || Math.abs(n) > 30 * d) {
            throw new ArithmeticException("exponent out of bounds");
        }
        return new Exponent((int) n, (int) d);
    }

    Exponent plus(Exponent other) {
        return of(
                (long) numerator * other.denominator + (long) other.numerator * denominator,
                (long) denominator * other.denominator);
    }

    Exponent times(Exponent other) {
        return of((long) numerator * other.numerator, (long) denominator * other.denominator);
    }

    Exponent negate() {
        return new Exponent(-numerator, denominator);
    }

    boolean isInteger() {
        return denominator == 1;
    }

    double value() {
        return (double) numerator / denominator;
    }

    /** The exponent after a symbol: nothing for 1, {@code 2}, {@code ^0.5} or {@code ^(1/3)}. */
    String code() {
        if (denominator == 1) {
            return numerator == 1 ? "" : Integer.toString(numerator);
        }
        for (int power = 10; power <= 10_000; power *= 10) {
            if (power % denominator == 0) {
                int scaled = Math.abs(numerator) * (power / denominator);
                StringBuilder digits = new StringBuilder(Integer.toString(scaled));
                int places = Integer.toString(power).length() - 1;
                while (digits.length() <= places) {
                    digits.insert(0, '0');
                }
                digits.insert(digits.length() - places, '.');
                return "^" + (numerator < 0 ? "-" : "") + digits;
            }
        }
        return "^(" + numerator + "/" + denominator + ")";
    }

    private static long gcd(long a, long b) {
        return b == 0 ? a : gcd(b, a % b);
    }
}
