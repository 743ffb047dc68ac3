package org.saddlebook.units.internal;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;

/** A product of powers of symbols; like symbols are merged. Immutable. */
final class Term {
    /** A symbol to a power. */
    record Factor(Symbol symbol, Exponent exponent) {}

    /** More digits than the exact value of any unit in use has; the quotient is then rounded once to double. */
    private static final MathContext DIGITS = new MathContext(60);

    static final Term ONE = new Term(List.of());

    private final List<Factor> factors;

    private Term(List<Factor> factors) {
        this.factors = factors;
    }

    static Term of(Symbol symbol, Exponent exponent) {
        return ONE.times(symbol, exponent);
    }

    List<Factor> factors() {
        return factors;
    }

    Term times(Symbol symbol, Exponent exponent) {
        List<Factor> merged = new ArrayList<>(factors.size() + 1);
        Exponent sum = exponent;
        for (Factor factor : factors) {
            if (factor.symbol().code().equals(symbol.code())) {
                sum = sum.plus(factor.exponent());
            } else {
                merged.add(factor);
            }
        }
        if (sum.numerator() != 0) {
            merged.add(new Factor(symbol, sum));
        }
        return new Term(merged);
    }

    Term times(Term other) {
        Term product = this;
        for (Factor factor : other.factors) {
            product = product.times(factor.symbol(), factor.exponent());
        }
        return product;
    }

    Term power(Exponent exponent) {
        Term power = ONE;
        for (Factor factor : factors) {
            power = power.times(factor.symbol(), factor.exponent().times(exponent));
        }
        return power;
    }

    /** The same with cubic decimetres written as litres, which they are. */
    Term withLitres() {
        for (Factor factor : factors) {
            if (factor.symbol().code().equals("dm") && factor.exponent().numerator() % 3 == 0) {
                Exponent third = factor.exponent().times(new Exponent(1, 3));
                return times(factor.symbol(), factor.exponent().negate()).times(Symbols.LITRE, third);
            }
        }
        return this;
    }

    Dimension dimension() {
        double[] sums = new double[5];
        for (Factor factor : factors) {
            Dimension one = factor.symbol().dimension();
            int n = factor.exponent().numerator();
            int d = factor.exponent().denominator();
            sums[0] += one.mass() * n / d;
            sums[1] += one.length() * n / d;
            sums[2] += one.time() * n / d;
            sums[3] += one.temperature() * n / d;
            sums[4] += one.amount() * n / d;
        }
        // Adding 0.0 turns a negative zero into zero.
        return new Dimension(sums[0] + 0.0, sums[1] + 0.0, sums[2] + 0.0, sums[3] + 0.0, sums[4] + 0.0);
    }

    /** The unit; {@code ArithmeticException} when its factor is beyond the range of double. */
    Unit unit() {
        double factor = factor();
        if (!(factor > 0) || Double.isInfinite(factor)) {
            throw new ArithmeticException("factor out of range");
        }
        double offset = 0;
        if (factors.size() == 1 && factors.get(0).symbol().hasOffset()) {
            Symbol only = factors.get(0).symbol();
            offset = only.offset().divide(only.denominator(), DIGITS).doubleValue();
        }
        return new Unit(code(), RateOrders.snapped(dimension()), factor, offset);
    }

    /** Exact numerator and denominator of the factor; null when an exponent is not whole. */
    BigDecimal[] exactFactor() {
        BigDecimal numerator = BigDecimal.ONE;
        BigDecimal denominator = BigDecimal.ONE;
        for (Factor factor : factors) {
            Exponent exponent = factor.exponent();
            if (!exponent.isInteger()) {
                return null;
            }
            int power = Math.abs(exponent.numerator());
            boolean up = exponent.numerator() > 0;
            BigDecimal above = factor.symbol().numerator().pow(power);
            BigDecimal below = factor.symbol().denominator().pow(power);
            numerator = numerator.multiply(up ? above : below);
            denominator = denominator.multiply(up ? below : above);
        }
        return new BigDecimal[] {numerator, denominator};
    }

    private double factor() {
        BigDecimal[] exact = exactFactor();
        if (exact != null) {
            return exact[0].divide(exact[1], DIGITS).doubleValue();
        }
        double product = 1;
        for (Factor factor : sorted()) {
            Symbol symbol = factor.symbol();
            double base =
                    symbol.numerator().divide(symbol.denominator(), DIGITS).doubleValue();
            product *= StrictMath.pow(base, factor.exponent().value());
        }
        return product;
    }

    /**
     * The normalised term: factors with positive exponents joined by {@code .}, then {@code /} and the denominator, in
     * parentheses when it has more than one factor. The order of factors does not depend on how the user wrote them.
     */
    String code() {
        StringBuilder above = new StringBuilder();
        StringBuilder below = new StringBuilder();
        int denominators = 0;
        for (Factor factor : sorted()) {
            boolean scale = factor.symbol().code().equals("10*");
            if (scale || factor.exponent().numerator() > 0) {
                above.append(above.length() == 0 ? "" : ".")
                        .append(factor.symbol().code());
                above.append(
                        scale
                                ? Integer.toString(factor.exponent().numerator())
                                : factor.exponent().code());
            } else {
                below.append(denominators == 0 ? "" : ".")
                        .append(factor.symbol().code());
                below.append(factor.exponent().negate().code());
                denominators++;
            }
        }
        if (above.length() == 0) {
            above.append('1');
        }
        if (denominators == 1) {
            above.append('/').append(below);
        } else if (denominators > 1) {
            above.append("/(").append(below).append(')');
        }
        return above.toString();
    }

    private List<Factor> sorted() {
        List<Factor> sorted = new ArrayList<>(factors);
        sorted.sort(ORDER);
        return sorted;
    }

    private static final Comparator<Factor> ORDER = new Comparator<>() {
        @Override
        public int compare(Factor one, Factor other) {
            int byRank = Integer.compare(one.symbol().rank(), other.symbol().rank());
            return byRank != 0
                    ? byRank
                    : one.symbol().code().compareTo(other.symbol().code());
        }
    };
}
