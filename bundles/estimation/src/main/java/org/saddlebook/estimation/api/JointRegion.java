package org.saddlebook.estimation.api;

/**
 * The joint confidence region of two parameters: all pairs with
 * {@code (b - b0)' C^-1 (b - b0) <= limit}, C their scaled covariance; limit {@code 2 F(2, n - p)} when the scale is estimated,
 * chi-squared with two degrees of freedom when uncertainties are stated (Bates and Watts 1988, 1.1.2). It holds both at once;
 * its shadow on an axis is wider than the interval of one parameter alone. Exact for a linear response.
 */
public final class JointRegion {
    private final double first;
    private final double second;
    private final double deviation;
    private final double slope;
    private final double rest;
    private final double limit;

    private JointRegion(double first, double second, double deviation, double slope, double rest, double limit) {
        this.first = first;
        this.second = second;
        this.deviation = deviation;
        this.slope = slope;
        this.rest = rest;
        this.limit = limit;
    }

    /**
     * The region of two parameters of a fit.
     *
     * @param fit the fit
     * @param first index of one parameter
     * @param second index of another
     * @param level probability held, strictly between 0 and 1
     * @param scale whether weights are one over stated variances
     * @throws IllegalStateException when the scale is to be estimated and no degree of freedom is left
     */
    public static JointRegion of(Fit fit, int first, int second, double level, Scale scale) {
        int p = fit.parameterCount();
        if (first < 0 || first >= p || second < 0 || second >= p || first == second) {
            throw new IllegalArgumentException("parameters " + first + " and " + second + " of " + p);
        }
        double limit = scale.jointQuantile(level, 2, fit.degreesOfFreedom());
        double variance = scale.variance(fit);
        double[][] c = fit.unscaledCovariance();
        double deviation = Math.sqrt(variance * c[first][first]);
        double slope = c[first][first] > 0 ? c[first][second] / c[first][first] : 0;
        double rest = Math.sqrt(Math.max(0, variance * (c[second][second] - slope * c[first][second])));
        double[] parameters = fit.parameters();
        return new JointRegion(parameters[first], parameters[second], deviation, slope, rest, limit);
    }

    /** Whether a pair lies inside or on the edge. */
    public boolean contains(double firstValue, double secondValue) {
        double a = firstValue - first;
        double b = secondValue - second - slope * a;
        double u = a == 0 ? 0 : a / deviation;
        double v = b == 0 ? 0 : b / rest;
        return u * u + v * v <= limit;
    }

    /**
     * Points of its edge, an ellipse, once round.
     *
     * @param count number of points, at least 3
     * @return count pairs, first parameter first
     */
    public double[][] edge(int count) {
        if (count < 3) {
            throw new IllegalArgumentException("count is " + count + "; at least 3 points make an ellipse");
        }
        double radius = Math.sqrt(limit);
        double[][] points = new double[count][];
        for (int k = 0; k < count; k++) {
            double angle = 2 * Math.PI * k / count;
            double a = radius * deviation * StrictMath.cos(angle);
            points[k] = new double[] {first + a, second + slope * a + radius * rest * StrictMath.sin(angle)};
        }
        return points;
    }

    /** The limit of the quadratic form. */
    public double limit() {
        return limit;
    }
}
