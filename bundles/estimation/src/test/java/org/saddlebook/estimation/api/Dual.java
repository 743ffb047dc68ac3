package org.saddlebook.estimation.api;

/** A number with its derivatives, so that test functions are written once: forward differentiation, exact. */
final class Dual {
    private final double value;
    private final double[] slopes;

    private Dual(double value, double[] slopes) {
        this.value = value;
        this.slopes = slopes;
    }

    static Dual[] variables(double[] p) {
        Dual[] result = new Dual[p.length];
        for (int j = 0; j < p.length; j++) {
            double[] slopes = new double[p.length];
            slopes[j] = 1;
            result[j] = new Dual(p[j], slopes);
        }
        return result;
    }

    double value() {
        return value;
    }

    double slope(int j) {
        return slopes[j];
    }

    private Dual of(double newValue, double factor) {
        double[] scaled = new double[slopes.length];
        for (int j = 0; j < scaled.length; j++) {
            scaled[j] = factor * slopes[j];
        }
        return new Dual(newValue, scaled);
    }

    private static Dual combined(double value, Dual a, double alpha, Dual b, double beta) {
        double[] slopes = new double[a.slopes.length];
        for (int j = 0; j < slopes.length; j++) {
            slopes[j] = alpha * a.slopes[j] + beta * b.slopes[j];
        }
        return new Dual(value, slopes);
    }

    Dual plus(Dual other) {
        return combined(value + other.value, this, 1, other, 1);
    }

    Dual plus(double number) {
        return of(value + number, 1);
    }

    Dual minus(Dual other) {
        return combined(value - other.value, this, 1, other, -1);
    }

    Dual times(Dual other) {
        return combined(value * other.value, this, other.value, other, value);
    }

    Dual times(double factor) {
        return of(value * factor, factor);
    }

    Dual over(Dual other) {
        double quotient = value / other.value;
        return combined(quotient, this, 1 / other.value, other, -quotient / other.value);
    }

    Dual exp() {
        double e = StrictMath.exp(value);
        return of(e, e);
    }

    Dual sqrt() {
        double root = Math.sqrt(value);
        return of(root, 0.5 / root);
    }

    Dual arctan() {
        return of(StrictMath.atan(value), 1 / (1 + value * value));
    }

    Dual squared() {
        return times(this);
    }
}
