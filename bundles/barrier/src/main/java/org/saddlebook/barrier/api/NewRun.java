package org.saddlebook.barrier.api;

import java.util.Objects;
import java.util.OptionalDouble;

/**
 * How one more run would scatter about the law. All absent when the scale of the errors is unknown.
 *
 * @param lnRate standard deviation in ln k; absent when the error of k is an absolute one
 * @param rate standard deviation of k itself, SI; present for an absolute error of k only
 * @param kelvin standard deviation of its temperature, K; present when the uncertainties of temperatures are stated
 */
public record NewRun(OptionalDouble lnRate, OptionalDouble rate, OptionalDouble kelvin) {
    /** Nothing is known. */
    public static final NewRun UNKNOWN =
            new NewRun(OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty());

    /** Checks the components. */
    public NewRun {
        Objects.requireNonNull(lnRate, "lnRate");
        Objects.requireNonNull(rate, "rate");
        Objects.requireNonNull(kelvin, "kelvin");
    }

    /** A run that scatters by this standard deviation in ln k. */
    public static NewRun ofLnRate(double deviation) {
        return new NewRun(OptionalDouble.of(deviation), OptionalDouble.empty(), OptionalDouble.empty());
    }

    /**
     * Standard deviation in ln k of a run at a nominal temperature.
     *
     * @param slope d ln k/dT there, 1/K
     */
    public OptionalDouble onLogarithm(double slope) {
        if (lnRate.isEmpty() || kelvin.isEmpty()) {
            return lnRate;
        }
        double own = lnRate.getAsDouble();
        double fromTemperature = slope * kelvin.getAsDouble();
        return OptionalDouble.of(Math.sqrt(own * own + fromTemperature * fromTemperature));
    }
}
