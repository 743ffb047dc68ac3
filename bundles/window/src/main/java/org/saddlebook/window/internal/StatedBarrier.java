package org.saddlebook.window.internal;

import java.util.OptionalDouble;
import org.saddlebook.api.model.TransitionState;
import org.saddlebook.api.quantity.Constants;

/**
 * A barrier that the user states, not one fitted here: either enthalpy and entropy of activation or Arrhenius parameters.
 * ln k is linear in both parameters: J/mol for the first, J/(mol K) or the logarithm of the SI value for the second.
 *
 * @param transition relations of transition-state theory for ΔH and ΔS; null for Arrhenius parameters
 * @param energy ΔH or Ea, J/mol
 * @param second ΔS in J/(mol K), or ln A
 * @param variances variance of energy, variance of second, covariance
 * @param degreesOfFreedom of the uncertainties; empty for normal ones
 * @param order overall order of its rate constant
 * @param uncertain whether uncertainties of both were stated
 * @param assumedIndependent whether both are uncertain and no correlation was stated
 */
@SuppressWarnings("ArrayRecordComponent") // compared by nobody; handed over inside this package only
record StatedBarrier(
        TransitionState transition,
        double energy,
        double second,
        double[] variances,
        OptionalDouble degreesOfFreedom,
        double order,
        boolean uncertain,
        boolean assumedIndependent) {
    double lnRate(double kelvin) {
        return transition == null
                ? second - energy / (Constants.GAS * kelvin)
                : transition.lnRate(kelvin, energy, second);
    }

    /** d ln k / d energy. */
    double ofEnergy(double kelvin) {
        return -1 / (Constants.GAS * kelvin);
    }

    /** d ln k / d second. */
    double ofSecond() {
        return transition == null ? 1 : 1 / Constants.GAS;
    }

    Source source() {
        return new Source(
                new double[][] {{variances[0], variances[2]}, {variances[2], variances[1]}}, degreesOfFreedom);
    }
}
