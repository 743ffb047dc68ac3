package org.saddlebook.spontaneity.internal;

import java.util.Optional;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.estimation.api.LinearFit;
import org.saddlebook.estimation.api.LinearLeastSquares;
import org.saddlebook.estimation.api.LinearOutcome;
import org.saddlebook.estimation.api.Normal;
import org.saddlebook.estimation.api.StudentT;

/**
 * {@code R ln K = −ΔG(θ)/θ + ΔH(θ)(1/θ − 1/T) + ΔCp(θ)[θ/T − 1 + ln(T/θ)]} with constant ΔCp, or without it (van 't Hoff).
 *
 * <p>Source: E. C. W. Clarke and D. N. Glew, Trans. Faraday Soc. 62 (1966) 539.
 */
final class ClarkeGlew {
    private final double theta;
    private final LinearFit fit;
    private final boolean scaleStated;

    private ClarkeGlew(double theta, LinearFit fit, boolean scaleStated) {
        this.theta = theta;
        this.fit = fit;
        this.scaleStated = scaleStated;
    }

    /**
     * The fit; empty when the temperatures do not determine it.
     *
     * @param theta reference temperature, K
     * @param heatCapacity whether ΔCp is fitted too
     */
    static Optional<ClarkeGlew> fit(EquilibriumTable table, double theta, boolean heatCapacity) {
        int n = table.kelvin().size();
        int extra = table.calorimetric().isPresent() ? 1 : 0;
        int columns = heatCapacity ? 3 : 2;
        double[][] design = new double[n + extra][columns];
        double[] response = new double[n + extra];
        double[] weights = new double[n + extra];
        for (int i = 0; i < n; i++) {
            double[] row = row(table.kelvin().get(i), theta);
            System.arraycopy(row, 0, design[i], 0, columns);
            response[i] = Constants.GAS * table.lnK().get(i);
            double u = table.uncertainty().isPresent()
                    ? Constants.GAS * table.uncertainty().get().get(i)
                    : 1;
            weights[i] = 1 / (u * u);
        }
        if (extra > 0) {
            EquilibriumTable.Calorimetric heat = table.calorimetric().get();
            design[n][1] = 1;
            if (heatCapacity) {
                design[n][2] = heat.kelvin() - theta;
            }
            response[n] = heat.enthalpy();
            weights[n] = 1 / (heat.uncertainty() * heat.uncertainty());
        }
        LinearOutcome outcome = LinearLeastSquares.fit(design, response, weights);
        boolean stated = table.uncertainty().isPresent();
        return outcome.fold(
                fitted -> stated || fitted.degreesOfFreedom() > 0
                        ? Optional.of(new ClarkeGlew(theta, fitted, stated))
                        : Optional.empty(),
                deficient -> Optional.empty());
    }

    private static double[] row(double kelvin, double theta) {
        return new double[] {1, 1 / theta - 1 / kelvin, theta / kelvin - 1 + StrictMath.log(kelvin / theta)};
    }

    double theta() {
        return theta;
    }

    boolean heatCapacityFitted() {
        return fit.parameterCount() == 3;
    }

    int degreesOfFreedom() {
        return fit.degreesOfFreedom();
    }

    boolean scaleStated() {
        return scaleStated;
    }

    private double scale() {
        return scaleStated ? 1 : fit.residualVariance();
    }

    /** Root of the mean weighted square of the residuals over the degrees of freedom. */
    double residualScale() {
        return fit.degreesOfFreedom() > 0 ? Math.sqrt(fit.residualVariance()) : 0;
    }

    /** A value with its standard uncertainty. */
    record Estimate(double value, double uncertainty) {}

    private Estimate combination(double[] row) {
        double value = 0;
        double[] parameters = fit.parameters();
        for (int k = 0; k < parameters.length; k++) {
            value += row[k] * parameters[k];
        }
        double[] used = java.util.Arrays.copyOf(row, parameters.length);
        return new Estimate(value, Math.sqrt(Math.max(0, scale() * fit.predictionVariance(used))));
    }

    /** ΔG(T), J/mol. */
    Estimate gibbs(double kelvin) {
        double[] row = row(kelvin, theta);
        for (int k = 0; k < row.length; k++) {
            row[k] *= -kelvin;
        }
        return combination(row);
    }

    /** ΔH(T), J/mol. */
    Estimate enthalpy(double kelvin) {
        return combination(new double[] {0, 1, kelvin - theta});
    }

    /** ΔS(T) = (ΔH − ΔG)/T, J/(mol K). */
    Estimate entropy(double kelvin) {
        double[] row = row(kelvin, theta);
        return combination(new double[] {row[0], row[1] + 1 / kelvin, row[2] + (kelvin - theta) / kelvin});
    }

    /** ΔCp, J/(mol K). */
    Estimate heatCapacity() {
        return combination(new double[] {0, 0, 1});
    }

    /** Two-sided probability of a ΔCp as large by chance. */
    double heatCapacityProbability() {
        Estimate cp = heatCapacity();
        if (cp.uncertainty() == 0) {
            return cp.value() == 0 ? 1 : 0;
        }
        double ratio = Math.abs(cp.value()) / cp.uncertainty();
        return 2 * (scaleStated ? Normal.upperTail(ratio) : StudentT.upperTail(ratio, fit.degreesOfFreedom()));
    }

    /** Covariance of ln K at two temperatures. */
    double covarianceOfLnK(double kelvin, double other) {
        int n = fit.parameterCount();
        double[] first = java.util.Arrays.copyOf(row(kelvin, theta), n);
        double[] second = java.util.Arrays.copyOf(row(other, theta), n);
        return scale() * fit.predictionCovariance(first, second) / (Constants.GAS * Constants.GAS);
    }

    /** Covariance of ΔH and ΔS at θ, (J/mol)(J/(mol K)). */
    double covarianceAtTheta() {
        int n = fit.parameterCount();
        double[] h = java.util.Arrays.copyOf(new double[] {0, 1, 0}, n);
        double[] s = java.util.Arrays.copyOf(new double[] {1, 1 / theta, 0}, n);
        return scale() * fit.predictionCovariance(h, s);
    }
}
