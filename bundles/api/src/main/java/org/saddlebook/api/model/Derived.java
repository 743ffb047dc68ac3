package org.saddlebook.api.model;

import java.util.Objects;
import org.saddlebook.api.quantity.Unit;

/**
 * A quantity that follows from a model's parameters at a temperature, with the gradient that carries their covariance.
 *
 * @param symbol plain ASCII symbol used in files, for example {@code dG}
 * @param name name for people
 * @param unit unit it is shown in
 * @param scale LOG quantities are computed as the natural logarithm of their SI value
 * @param function computes it
 */
public record Derived(String symbol, String name, Unit unit, Parameter.Scale scale, Function function) {
    /** Computes a derived quantity. */
    @FunctionalInterface
    public interface Function {
        /**
         * The quantity in SI, or the natural logarithm of its SI value for LOG quantities.
         *
         * @param kelvin temperature, K
         * @param p parameters in the form handed to the model, in the order of {@link RateFunction#parameters()}
         * @param gradient receives the partial derivatives with respect to p; same length as p
         */
        double value(double kelvin, double[] p, double[] gradient);
    }

    /** Checks the components. */
    public Derived {
        if (!symbol.matches("[A-Za-z][A-Za-z0-9]*")) {
            throw new IllegalArgumentException("not a plain symbol: " + symbol);
        }
        Objects.requireNonNull(name, "name");
        Objects.requireNonNull(unit, "unit");
        Objects.requireNonNull(scale, "scale");
        Objects.requireNonNull(function, "function");
    }
}
