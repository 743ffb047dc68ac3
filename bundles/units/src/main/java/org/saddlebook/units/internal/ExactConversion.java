package org.saddlebook.units.internal;

import java.math.BigDecimal;
import java.math.MathContext;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.units.api.UnitException;

/** {@code SI = (value * numerator + offset) / denominator}, in decimal arithmetic, rounded once to double. */
public final class ExactConversion {
    private static final MathContext DIGITS = new MathContext(40);

    /** Whole numbers of as many digits are exact in a double. */
    private static final int EXACT_DIGITS = 15;

    private static final double LARGEST_EXACT = 0x1p53;

    private static final double[] POWERS = {
        1, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15
    };

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
        int scale = dividend.scale() - denominator.scale();
        boolean small = dividend.precision() <= EXACT_DIGITS && denominator.precision() <= EXACT_DIGITS;
        if (small && Math.abs(scale) < POWERS.length) {
            double above = dividend.unscaledValue().longValue();
            double below = denominator.unscaledValue().longValue();
            above = scale < 0 ? above * POWERS[-scale] : above;
            below = scale > 0 ? below * POWERS[scale] : below;
            if (Math.abs(above) < LARGEST_EXACT && below < LARGEST_EXACT) {
                // Both are whole numbers that a double holds, so the one division is the one rounding.
                return above / below;
            }
        }
        return dividend.divide(denominator, DIGITS).doubleValue();
    }
}
