package org.saddlebook.testkit.api;

import java.util.function.DoubleUnaryOperator;

/**
 * Numerical derivatives good to about ten digits: central differences extrapolated to step zero.
 *
 * <p>Source: C. J. F. Ridders, Adv. Eng. Software 4 (1982) 75.
 */
final class Slopes {
    private static final int ROWS = 8;
    private static final double SHRINK = 1.6;

    private Slopes() {}

    /**
     * A derivative and how far it can be trusted.
     *
     * @param value the derivative
     * @param error estimated absolute error, rounding included
     */
    record Slope(double value, double error) {}

    /**
     * The derivative of f at x.
     *
     * @param step first step; f is called within x ± step
     */
    static Slope at(DoubleUnaryOperator f, double x, double step) {
        double[][] table = new double[ROWS][ROWS];
        double h = step;
        table[0][0] = central(f, x, h);
        Slope best = new Slope(table[0][0], Double.MAX_VALUE);
        for (int i = 1; i < ROWS; i++) {
            h /= SHRINK;
            table[0][i] = central(f, x, h);
            double factor = SHRINK * SHRINK;
            for (int j = 1; j <= i; j++) {
                table[j][i] = (table[j - 1][i] * factor - table[j - 1][i - 1]) / (factor - 1);
                factor *= SHRINK * SHRINK;
                double error =
                        Math.max(Math.abs(table[j][i] - table[j - 1][i]), Math.abs(table[j][i] - table[j - 1][i - 1]));
                // The rounding of f divided by the step is the least error there can be.
                error += 4 * Math.ulp(f.applyAsDouble(x)) / h;
                if (error < best.error) {
                    best = new Slope(table[j][i], error);
                }
            }
        }
        return best;
    }

    private static double central(DoubleUnaryOperator f, double x, double h) {
        double above = x + h;
        double below = x - h;
        return (f.applyAsDouble(above) - f.applyAsDouble(below)) / (above - below);
    }
}
