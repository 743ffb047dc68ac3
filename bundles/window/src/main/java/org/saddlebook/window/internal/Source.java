package org.saddlebook.window.internal;

import java.util.OptionalDouble;
import java.util.random.RandomGenerator;

/**
 * One source of uncertainty: deviations from the best estimates with a covariance; with degrees of freedom a multivariate
 * t, one scale for each draw, because the scale of all of them was estimated together; without them a normal.
 */
final class Source {
    private final double[][] factor;
    private final OptionalDouble degreesOfFreedom;

    /**
     * A source.
     *
     * @param covariance symmetric; a direction without variance is allowed
     * @param degreesOfFreedom of the estimated scale; empty for stated uncertainties
     */
    Source(double[][] covariance, OptionalDouble degreesOfFreedom) {
        factor = factor(covariance);
        this.degreesOfFreedom = degreesOfFreedom;
    }

    int size() {
        return factor.length;
    }

    /** Draws into columns {@code [parameter][draw]}; every draw takes the same share of the stream. */
    void draw(RandomGenerator random, double[][] columns) {
        int size = factor.length;
        double[] z = new double[size];
        for (int d = 0; d < columns[0].length; d++) {
            double scale = 1;
            if (degreesOfFreedom.isPresent()) {
                double dof = degreesOfFreedom.getAsDouble();
                scale = Math.sqrt(dof / chiSquared(random, dof));
            }
            for (int i = 0; i < size; i++) {
                z[i] = scale * random.nextGaussian();
            }
            for (int i = 0; i < size; i++) {
                double sum = 0;
                for (int j = 0; j <= i; j++) {
                    sum += factor[i][j] * z[j];
                }
                columns[i][d] = sum;
            }
        }
    }

    /**
     * A chi-squared variate: twice a gamma variate of shape dof/2 (G. Marsaglia and W. W. Tsang, ACM Trans. Math. Softw.
     * 26 (2000) 363), with their power of a uniform variate for shapes below 1.
     */
    static double chiSquared(RandomGenerator random, double dof) {
        double shape = dof / 2;
        if (shape < 1) {
            double u = 1 - random.nextDouble();
            return chiSquared(random, dof + 2) * StrictMath.exp(StrictMath.log(u) / shape);
        }
        double d = shape - 1.0 / 3;
        double c = 1 / Math.sqrt(9 * d);
        while (true) {
            double x = random.nextGaussian();
            double root = 1 + c * x;
            if (!(root > 0)) {
                continue;
            }
            double v = root * root * root;
            double u = 1 - random.nextDouble();
            double x2 = x * x;
            if (u < 1 - 0.0331 * x2 * x2 || StrictMath.log(u) < 0.5 * x2 + d * (1 - v + StrictMath.log(v))) {
                return 2 * d * v;
            }
        }
    }

    /** Cholesky factor through the correlations, whose size is 1 whatever the units; null directions stay null. */
    private static double[][] factor(double[][] covariance) {
        int size = covariance.length;
        double[] deviation = new double[size];
        for (int i = 0; i < size; i++) {
            deviation[i] = Math.sqrt(Math.max(0, covariance[i][i]));
        }
        double[][] lower = new double[size][size];
        for (int i = 0; i < size; i++) {
            for (int j = 0; j <= i; j++) {
                double scale = deviation[i] * deviation[j];
                double sum = scale > 0 ? covariance[i][j] / scale : 0;
                for (int k = 0; k < j; k++) {
                    sum -= lower[i][k] * lower[j][k];
                }
                if (i == j) {
                    // Rounding can leave a perfectly correlated direction slightly below zero.
                    lower[i][i] = sum > 1e-14 ? Math.sqrt(sum) : 0;
                } else {
                    lower[i][j] = lower[j][j] > 0 ? sum / lower[j][j] : 0;
                }
            }
        }
        for (int i = 0; i < size; i++) {
            for (int j = 0; j <= i; j++) {
                lower[i][j] *= deviation[i];
            }
        }
        return lower;
    }
}
