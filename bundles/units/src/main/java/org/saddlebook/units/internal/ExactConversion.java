package org.saddlebook.units.internal;

import java.math.BigDecimal;
import java.math.MathContext;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.units.api.UnitException;

/** {@code SI = (value * numerator + offset) / denominator}, in decimal arithmetic, rounded once to double. */
public final class ExactConversion {
    private static final MathContext DIGITS = new MathContext(40);

    private final BigDecimal numerator;
    private final BigDecimal denominator;
    private final BigDecimal offset;

    private ExactConversion(BigDecimal numerator, BigDecimal denominator, BigDecimal offset) {
        this.numerator = numerator;
        this.denominator = denominator;
        this.offset = offset;
    }

    /** The conversion of a unit; from its double factor when its code is not ours or has broken exponents. */
    public static ExactConversion of(Unit unit) {
        try {
            Term term = UnitParser.parse(unit.code());
            BigDecimal[] exact = term.exactFactor();
            Unit own = term.unit();
            // Compared by hand: record equality is set up at run time, which costs at start.
            if (exact != null && own.factor() == unit.factor() && own.offset() == unit.offset()) {
                BigDecimal offset = term.factors().size() == 1
                        ? term.factors().get(0).symbol().offset()
                        : BigDecimal.ZERO;
                return new ExactConversion(exact[0], exact[1], offset);
            }
        } catch (UnitException | ArithmeticException e) {
            // A unit made elsewhere: its double factor is all there is.
        }
        return new ExactConversion(new BigDecimal(unit.factor()), BigDecimal.ONE, new BigDecimal(unit.offset()));
    }

    /** The SI value. */
    public double value(BigDecimal value) {
        return quotient(value.multiply(numerator).add(offset));
    }

    /** The SI value of a difference. */
    public double difference(BigDecimal difference) {
        return quotient(difference.multiply(numerator));
    }

    private double quotient(BigDecimal dividend) {
        return denominator.compareTo(BigDecimal.ONE) == 0
                ? dividend.doubleValue()
                : dividend.divide(denominator, DIGITS).doubleValue();
    }
}
