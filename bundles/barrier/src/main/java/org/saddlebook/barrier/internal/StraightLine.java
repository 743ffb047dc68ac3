package org.saddlebook.barrier.internal;

import java.util.Optional;
import org.saddlebook.api.model.RateFunction;

/**
 * A law of two parameters that is a straight line in 1/T once a term of temperature alone is taken off:
 * {@code ln k - o(T) = a + b/T}, a and b linear in the parameters. For the Eyring law o is ln T and constants, so that
 * ordinate and abscissa share the error of the temperature.
 */
final class StraightLine {
    private static final double STEP = 1e-5;
    private static final double ROUNDING = 1e-9;

    private final RateFunction law;
    private final double[] intercepts;
    private final double[] slopes;

    private StraightLine(RateFunction law, double[] intercepts, double[] slopes) {
        this.law = law;
        this.intercepts = intercepts;
        this.slopes = slopes;
    }

    /** The law as a line; empty when it is none. The data have at least two different temperatures. */
    static Optional<StraightLine> of(RateFunction law, Measurements data) {
        if (!law.linear() || law.parameters().size() != 2) {
            return Optional.empty();
        }
        double[] cold = gradient(law, data.lowestKelvin());
        double[] hot = gradient(law, data.highestKelvin());
        double between = 2 / (1 / data.lowestKelvin() + 1 / data.highestKelvin());
        double[] middle = gradient(law, between);
        double span = 1 / data.lowestKelvin() - 1 / data.highestKelvin();
        double[] intercepts = new double[2];
        double[] slopes = new double[2];
        for (int j = 0; j < 2; j++) {
            slopes[j] = (cold[j] - hot[j]) / span;
            intercepts[j] = hot[j] - slopes[j] / data.highestKelvin();
            double expected = intercepts[j] + slopes[j] / between;
            double size = Math.abs(intercepts[j]) + Math.abs(slopes[j] / between);
            if (!(Math.abs(middle[j] - expected) <= ROUNDING * size)) {
                return Optional.empty();
            }
        }
        StraightLine line = new StraightLine(law, intercepts, slopes);
        return Double.isFinite(1 / line.determinant()) ? Optional.of(line) : Optional.empty();
    }

    private static double[] gradient(RateFunction law, double kelvin) {
        double[] gradient = new double[2];
        law.lnRate(kelvin, new double[2], gradient);
        return gradient;
    }

    private double determinant() {
        return intercepts[0] * slopes[1] - intercepts[1] * slopes[0];
    }

    /** o(T), the term of temperature alone. */
    double offset(double kelvin) {
        return law.lnRate(kelvin, new double[2], new double[2]);
    }

    /** do/dT, 1/K. */
    double offsetSlope(double kelvin) {
        double above = kelvin * (1 + STEP);
        double below = kelvin * (1 - STEP);
        return (offset(above) - offset(below)) / (above - below);
    }

    /** a + b x, with its derivatives to the parameters and to x. */
    double value(double x, double[] p, double[] gradient) {
        gradient[0] = intercepts[0] + slopes[0] * x;
        gradient[1] = intercepts[1] + slopes[1] * x;
        gradient[2] = slopes[0] * p[0] + slopes[1] * p[1];
        return gradient[0] * p[0] + gradient[1] * p[1];
    }

    /** The parameters that give this line. */
    double[] parameters(double a, double b) {
        double determinant = determinant();
        return new double[] {
            (a * slopes[1] - b * intercepts[1]) / determinant, (b * intercepts[0] - a * slopes[0]) / determinant
        };
    }
}
