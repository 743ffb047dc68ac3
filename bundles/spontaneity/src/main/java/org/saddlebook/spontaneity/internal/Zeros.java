package org.saddlebook.spontaneity.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleUnaryOperator;

/** Zeros of polynomials and of functions that change sign once. */
final class Zeros {
    /** Halving a range of doubles ends long before this. */
    private static final int MOST_STEPS = 2000;

    private Zeros() {}

    /**
     * Where a polynomial changes sign strictly between two arguments, in rising order. Between two such places of its
     * derivative it is monotone, so that no zero can be missed; the derivatives are taken down to degree one.
     *
     * @param c coefficients, constant first
     */
    static List<Double> ofPolynomial(double[] c, double lower, double upper) {
        List<Double> zeros = new ArrayList<>();
        int degree = c.length - 1;
        while (degree > 0 && c[degree] == 0) {
            degree--;
        }
        if (degree == 0) {
            return zeros;
        }
        double[] derivative = new double[degree];
        for (int k = 1; k <= degree; k++) {
            derivative[k - 1] = k * c[k];
        }
        List<Double> ends = new ArrayList<>(ofPolynomial(derivative, lower, upper));
        ends.add(0, lower);
        ends.add(upper);
        int top = degree;
        DoubleUnaryOperator value = x -> {
            double sum = c[top];
            for (int k = top - 1; k >= 0; k--) {
                sum = sum * x + c[k];
            }
            return sum;
        };
        signChanges(value, ends, zeros);
        return zeros;
    }

    /** Adds the sign change inside each step of a function that changes sign at most once in each. */
    static void signChanges(DoubleUnaryOperator value, List<Double> ends, List<Double> zeros) {
        double before = 0;
        double at = Double.NaN;
        for (double end : ends) {
            double y = value.applyAsDouble(end);
            if (y == 0) {
                continue;
            }
            if (before * Math.signum(y) < 0) {
                zeros.add(between(value, at, end, before));
            }
            before = Math.signum(y);
            at = end;
        }
    }

    /**
     * The sign change between two arguments, by halving: the last argument with the first sign or the next double.
     *
     * @param sign sign of the value at the lower argument
     */
    static double between(DoubleUnaryOperator value, double lower, double upper, double sign) {
        double low = lower;
        double high = upper;
        for (int i = 0; i < MOST_STEPS; i++) {
            double middle = low + (high - low) / 2;
            if (!(middle > low && middle < high)) {
                break;
            }
            double y = value.applyAsDouble(middle);
            if (y == 0) {
                return middle;
            }
            if (y * sign > 0) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return high;
    }
}
