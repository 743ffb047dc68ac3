package org.saddlebook.spontaneity.internal;

import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.model.StandardState;

/**
 * What was stated about the reaction, in SI.
 *
 * @param enthalpy ΔH in J/mol
 * @param enthalpyUncertainty standard uncertainty of it, not negative; empty when not stated
 * @param entropy ΔS in J/(mol K)
 * @param entropyUncertainty standard uncertainty of it, not negative; empty when not stated
 * @param covariance of ΔH and ΔS in (J/mol)(J/(mol K)); empty when not stated
 * @param degreesOfFreedom of the uncertainties; empty for normal quantiles
 * @param lowerKelvin lower end of the stated range, K; empty when not stated
 * @param upperKelvin upper end of the stated range, K; empty when not stated
 * @param standard standard state that ΔS refers to; empty when not stated
 */
record Stated(
        double enthalpy,
        OptionalDouble enthalpyUncertainty,
        double entropy,
        OptionalDouble entropyUncertainty,
        OptionalDouble covariance,
        OptionalDouble degreesOfFreedom,
        OptionalDouble lowerKelvin,
        OptionalDouble upperKelvin,
        Optional<StandardState> standard) {

    double varianceOfEnthalpy() {
        return square(enthalpyUncertainty.orElse(0));
    }

    double varianceOfEntropy() {
        return square(entropyUncertainty.orElse(0));
    }

    double covarianceOrZero() {
        return covariance.orElse(0);
    }

    /** Whether nothing at all is uncertain, so that every answer is a plain number. */
    boolean exact() {
        return varianceOfEnthalpy() == 0 && varianceOfEntropy() == 0;
    }

    /** Whether both are uncertain and nobody said how they hang together. */
    boolean assumedIndependent() {
        return covariance.isEmpty() && varianceOfEnthalpy() > 0 && varianceOfEntropy() > 0;
    }

    /** {@code ΔG = ΔH − T ΔS}, J/mol. */
    double gibbs(double kelvin) {
        return enthalpy - kelvin * entropy;
    }

    /** {@code u²(ΔG) = u²(ΔH) + T² u²(ΔS) − 2 T cov(ΔH, ΔS)} (JCGM 100:2008, 5.2.2), (J/mol)². */
    double varianceOfGibbs(double kelvin) {
        double sum = varianceOfEnthalpy() + kelvin * (kelvin * varianceOfEntropy() - 2 * covarianceOrZero());
        return Math.max(0, sum);
    }

    private static double square(double value) {
        return value * value;
    }
}
