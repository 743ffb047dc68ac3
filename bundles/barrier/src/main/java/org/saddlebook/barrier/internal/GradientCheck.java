package org.saddlebook.barrier.internal;

import org.saddlebook.api.model.RateFunction;

/**
 * Compares the gradient a law states with differences of its values, because every uncertainty rests on it. Catches a
 * wrong law, not a rounded one: the tolerance is far above what differences lose in double precision.
 */
final class GradientCheck {
    private static final double TOLERANCE = 1e-4;

    private GradientCheck() {}

    /** Empty when value and gradient agree at a measured point and these parameters, else a sentence. */
    static String at(RateFunction law, Measurements data, int point, double[] p) {
        double kelvin = data.kelvin(point);
        double[] gradient = new double[p.length];
        double value = data.lnRate(law, point, p.clone(), gradient);
        String broken = LawFitter.notFinite(law, kelvin, value, gradient);
        if (!broken.isEmpty()) {
            return broken;
        }
        double[] unused = new double[p.length];
        for (int j = 0; j < p.length; j++) {
            // A step that moves ln k by about 1e-4, or a millionth of the parameter where the gradient says nothing.
            double step = Math.min(
                    gradient[j] == 0 ? Double.MAX_VALUE : 1e-4 / Math.abs(gradient[j]),
                    1e-4 * Math.max(Math.abs(p[j]), 1));
            double[] above = p.clone();
            double[] below = p.clone();
            above[j] += step;
            below[j] -= step;
            double difference = data.lnRate(law, point, above, unused) - data.lnRate(law, point, below, unused);
            double expected = difference / (above[j] - below[j]);
            // What rounding of ln k alone can do to the difference.
            double noise = 8 * Math.ulp(Math.max(Math.abs(value), 1)) / step;
            if (Double.isFinite(expected)
                    && Math.abs(expected - gradient[j])
                            > TOLERANCE * Math.max(Math.abs(expected), Math.abs(gradient[j])) + noise) {
                return "The derivative of ln k with respect to "
                        + law.parameters().get(j).symbol() + " at " + Words.kelvin(kelvin)
                        + " does not agree with the values of the law.";
            }
        }
        return "";
    }

    /** Empty when the gradient at p is the one at zero, as a law linear in its parameters must have it, else a sentence. */
    static String straight(RateFunction law, Measurements data, int point, double[] p, double[] atZero) {
        double kelvin = data.kelvin(point);
        double[] gradient = new double[p.length];
        data.lnRate(law, point, p.clone(), gradient);
        for (int j = 0; j < p.length; j++) {
            if (!(Math.abs(gradient[j] - atZero[j]) <= TOLERANCE * Math.abs(atZero[j]))) {
                return "The law says that it is linear, but its derivative with respect to "
                        + law.parameters().get(j).symbol() + " at " + Words.kelvin(kelvin)
                        + " changes with the parameters.";
            }
        }
        return "";
    }
}
