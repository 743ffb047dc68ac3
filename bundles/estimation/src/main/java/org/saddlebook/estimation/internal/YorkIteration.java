package org.saddlebook.estimation.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.estimation.api.CurveFunction;
import org.saddlebook.estimation.api.MeasuredPoints;

/** The straight line by York's equations (York et al. 2004, equations 13a-d), from both ordinary regressions. */
public final class YorkIteration {
    private static final int LIMIT = 200;
    private static final double AT_ROUNDING = 4e-16;
    private static final double NEAR_ROUNDING = 1e-12;

    private final double[] x;
    private final double[] y;
    private final double[] varianceX;
    private final double[] varianceY;
    private final double[] covariance;
    private final double sumXx;
    private final double sumXy;
    private final double sumYy;
    private final double meanX;
    private final double meanY;
    private double intercept;
    private double chiSquared;

    /** {@code y = a + b x}. */
    public static final class Line implements CurveFunction {
        @Override
        public int parameterCount() {
            return 2;
        }

        @Override
        public double value(double x, double[] parameters, double[] gradient) {
            gradient[0] = 1;
            gradient[1] = x;
            gradient[2] = parameters[1];
            return parameters[0] + parameters[1] * x;
        }
    }

    /** Prepares the ordinary sums. */
    public YorkIteration(MeasuredPoints points) {
        x = points.x();
        y = points.y();
        varianceX = points.ux();
        varianceY = points.uy();
        covariance = points.correlations();
        double mx = 0;
        double my = 0;
        for (int i = 0; i < x.length; i++) {
            covariance[i] *= varianceX[i] * varianceY[i];
            varianceX[i] *= varianceX[i];
            varianceY[i] *= varianceY[i];
            mx += x[i];
            my += y[i];
        }
        meanX = mx / x.length;
        meanY = my / x.length;
        double xx = 0;
        double xy = 0;
        double yy = 0;
        for (int i = 0; i < x.length; i++) {
            xx += (x[i] - meanX) * (x[i] - meanX);
            xy += (x[i] - meanX) * (y[i] - meanY);
            yy += (y[i] - meanY) * (y[i] - meanY);
        }
        sumXx = xx;
        sumXy = xy;
        sumYy = yy;
    }

    /** Whether no slope can be told. */
    public boolean sameAbscissae() {
        for (double value : x) {
            if (value != x[0]) {
                return false;
            }
        }
        return true;
    }

    /** The lines of both ordinary regressions. */
    public List<double[]> starts() {
        List<double[]> result = new ArrayList<>();
        for (double slope : slopes()) {
            result.add(new double[] {meanY - slope * meanX, slope});
        }
        return result;
    }

    private double[] slopes() {
        double direct = sumXy / sumXx;
        double inverse = sumYy / sumXy;
        return Math.abs(inverse) < Inputs.LARGEST && inverse != direct
                ? new double[] {direct, inverse}
                : new double[] {direct};
    }

    /** Intercept and slope of the smaller chi-squared, or null when not every start settled. */
    public double[] settledOrNull() {
        double[] best = null;
        double smallest = Double.POSITIVE_INFINITY;
        for (double start : slopes()) {
            double slope = settle(start);
            if (Double.isNaN(slope)) {
                return null;
            }
            if (chiSquared < smallest * (1 - 1e-12)) {
                smallest = chiSquared;
                best = new double[] {intercept, slope};
            }
        }
        return best;
    }

    private double settle(double start) {
        double slope = start;
        double scale = Math.sqrt(sumYy / sumXx);
        double lastChange = Double.POSITIVE_INFINITY;
        for (int k = 0; k < LIMIT; k++) {
            double next = improved(slope);
            double change = Math.abs(next - slope);
            if (!(change < Double.POSITIVE_INFINITY)) {
                return Double.NaN;
            }
            slope = next;
            double size = Math.max(scale, Math.abs(slope));
            if (change <= AT_ROUNDING * size || (change >= lastChange && change <= NEAR_ROUNDING * size)) {
                improved(slope);
                return slope;
            }
            lastChange = change;
        }
        return Double.NaN;
    }

    /** One step of equation 13b; leaves intercept and chi-squared of the slope handed in. */
    private double improved(double b) {
        double sum = 0;
        double xBar = 0;
        double yBar = 0;
        for (int i = 0; i < x.length; i++) {
            double w = weight(i, b);
            sum += w;
            xBar += w * (x[i] - meanX);
            yBar += w * (y[i] - meanY);
        }
        xBar /= sum;
        yBar /= sum;
        double numerator = 0;
        double denominator = 0;
        double chi = 0;
        for (int i = 0; i < x.length; i++) {
            double w = weight(i, b);
            double u = x[i] - meanX - xBar;
            double v = y[i] - meanY - yBar;
            double beta = w * (u * varianceY[i] + b * v * varianceX[i] - (b * u + v) * covariance[i]);
            numerator += w * beta * v;
            denominator += w * beta * u;
            chi += w * (v - b * u) * (v - b * u);
        }
        intercept = meanY + yBar - b * (meanX + xBar);
        chiSquared = chi;
        return numerator / denominator;
    }

    private double weight(int i, double b) {
        return 1 / (varianceY[i] + b * b * varianceX[i] - 2 * b * covariance[i]);
    }
}
