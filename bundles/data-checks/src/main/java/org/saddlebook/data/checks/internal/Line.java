package org.saddlebook.data.checks.internal;

import java.util.List;
import java.util.Optional;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.estimation.api.LinearFit;
import org.saddlebook.estimation.api.LinearLeastSquares;
import org.saddlebook.estimation.api.StudentT;

/**
 * The line of ln k (SI) against 1/T − 1/Tc, Tc the centre where height and slope are uncorrelated, and its scatter. Where
 * every row has a stated uncertainty those are the weights; the scale is estimated all the same, as a mistake is more
 * often in them than in the scatter.
 */
final class Line {
    private final LinearFit fit;
    private final double centreKelvin;

    private Line(LinearFit fit, double centreKelvin) {
        this.fit = fit;
        this.centreKelvin = centreKelvin;
    }

    static Optional<Line> through(List<Row> rows) {
        int n = rows.size();
        if (n < 3) {
            return Optional.empty();
        }
        double[][] design = new double[n][];
        double[] response = new double[n];
        double[] weights = weights(rows);
        double sum = 0;
        double total = 0;
        for (int i = 0; i < n; i++) {
            sum += weights[i] / rows.get(i).kelvin();
            total += weights[i];
        }
        double centre = total / sum;
        for (int i = 0; i < n; i++) {
            design[i] = new double[] {1, 1 / rows.get(i).kelvin() - 1 / centre};
            response[i] = rows.get(i).lnRate();
        }
        return LinearLeastSquares.fit(design, response, weights)
                .fold(fitted -> Optional.of(new Line(fitted, centre)), deficient -> Optional.empty());
    }

    /** {@code (k/u)²} where every row states u, else 1. */
    static double[] weights(List<Row> rows) {
        double[] weights = new double[rows.size()];
        boolean stated = true;
        for (Row row : rows) {
            stated &= row.lnUncertainty().isPresent();
        }
        for (int i = 0; i < weights.length; i++) {
            double u = stated ? rows.get(i).lnUncertainty().getAsDouble() : 1;
            weights[i] = 1 / (u * u);
        }
        return weights;
    }

    LinearFit fit() {
        return fit;
    }

    double centreKelvin() {
        return centreKelvin;
    }

    /** ln k at the centre. */
    double height() {
        return fit.parameters()[0];
    }

    double heightUncertainty() {
        return Math.sqrt(fit.unscaledCovariance()[0][0] * fit.residualVariance());
    }

    /** Activation energy, J/mol. */
    double energy() {
        return -Constants.GAS * fit.parameters()[1];
    }

    double energyUncertainty() {
        return Constants.GAS * Math.sqrt(fit.unscaledCovariance()[1][1] * fit.residualVariance());
    }

    double degreesOfFreedom() {
        return fit.degreesOfFreedom();
    }

    /** Standard deviation of one row, ln. */
    double scatter() {
        return Math.sqrt(fit.residualSumOfSquares() / Math.max(1, fit.degreesOfFreedom()));
    }

    /** ln of the pre-exponential factor, SI. */
    double lnPrefactor() {
        return height() + energy() / (Constants.GAS * centreKelvin);
    }

    double lnPrefactorUncertainty() {
        double slope = energyUncertainty() / (Constants.GAS * centreKelvin);
        return Math.sqrt(heightUncertainty() * heightUncertainty() + slope * slope);
    }

    /** Two-sided quantile of t. */
    double quantile(double level) {
        return StudentT.quantile(0.5 + level / 2, fit.degreesOfFreedom());
    }
}
