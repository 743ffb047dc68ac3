package org.saddlebook.api.model;

import java.util.Objects;
import java.util.OptionalDouble;
import org.saddlebook.api.quantity.Unit;

/**
 * A parameter of a rate model.
 *
 * @param symbol plain ASCII symbol used in files, for example {@code Ea}
 * @param name name for people, for example {@code activation energy}
 * @param unit unit it is shown in; inside, it is in SI
 * @param scale LOG parameters are handed to the model as natural logarithms of their SI value
 * @param lower lower bound in the form handed to the model; may be negative infinity
 * @param upper upper bound in the form handed to the model; may be infinity
 * @param neutral value, in the form handed to the model, at which the law becomes the simpler law named by
 *     {@link ModelDescription#contains()}; present for the one extra parameter of such a law only
 */
public record Parameter(
        String symbol, String name, Unit unit, Scale scale, double lower, double upper, OptionalDouble neutral) {
    /** How a parameter is handed over and how its uncertainty is stated. */
    public enum Scale {
        /** As its SI value; uncertainty as plus or minus. */
        LINEAR,
        /** As the natural logarithm of its SI value; uncertainty as a factor. */
        LOG
    }

    /** Checks the components. */
    public Parameter {
        if (!symbol.matches("[A-Za-z][A-Za-z0-9]*")) {
            throw new IllegalArgumentException("not a plain symbol: " + symbol);
        }
        Objects.requireNonNull(name, "name");
        Objects.requireNonNull(unit, "unit");
        Objects.requireNonNull(scale, "scale");
        if (!(lower < upper)) {
            throw new IllegalArgumentException("lower bound must be below upper bound: " + lower + ", " + upper);
        }
    }

    /** An unbounded parameter on a linear scale. */
    public static Parameter linear(String symbol, String name, Unit unit) {
        return new Parameter(
                symbol,
                name,
                unit,
                Scale.LINEAR,
                Double.NEGATIVE_INFINITY,
                Double.POSITIVE_INFINITY,
                OptionalDouble.empty());
    }

    /** An unbounded parameter on a logarithmic scale. */
    public static Parameter log(String symbol, String name, Unit unit) {
        return new Parameter(
                symbol,
                name,
                unit,
                Scale.LOG,
                Double.NEGATIVE_INFINITY,
                Double.POSITIVE_INFINITY,
                OptionalDouble.empty());
    }

    /** The same, marked as the extra parameter that is without effect at {@code value}. */
    public Parameter withNeutral(double value) {
        return new Parameter(symbol, name, unit, scale, lower, upper, OptionalDouble.of(value));
    }
}
