package org.saddlebook.api.model;

import java.util.Map;
import java.util.OptionalDouble;
import java.util.TreeMap;
import org.saddlebook.api.quantity.Constants;

/**
 * What else a rate constant was measured at, beside its temperature: values in SI by name. Immutable. A law that depends
 * on a condition names it in {@link RateModel#conditions()}; every other law never sees one.
 */
public final class Conditions {
    /** Concentration of the molecules that take part in energy transfer, mol/m3; written [M]. */
    public static final String THIRD_BODY = "thirdBody";

    /** Total pressure of an ideal gas, Pa. */
    public static final String PRESSURE = "pressure";

    /** None stated. */
    public static final Conditions NONE = new Conditions(new TreeMap<>());

    private final Map<String, Double> values;

    private Conditions(Map<String, Double> values) {
        this.values = values;
    }

    /** The same with one more, or another, value in SI; positive and finite. */
    public Conditions with(String name, double value) {
        if (!name.matches("[a-z][A-Za-z0-9]*")) {
            throw new IllegalArgumentException("not a plain name of a condition: " + name);
        }
        if (!(value > 0) || Double.isInfinite(value)) {
            throw new IllegalArgumentException(name + " must be positive and finite: " + value);
        }
        TreeMap<String, Double> more = new TreeMap<>(values);
        more.put(name, value);
        return new Conditions(more);
    }

    /** The value of a condition in SI; empty when it is not stated. */
    public OptionalDouble get(String name) {
        Double value = values.get(name);
        return value == null ? OptionalDouble.empty() : OptionalDouble.of(value);
    }

    /**
     * Concentration of the third body in mol/m3: as stated, else that of an ideal gas, {@code p/(RT)}; empty when neither it
     * nor the pressure is stated.
     *
     * @param kelvin temperature, K
     */
    public OptionalDouble thirdBody(double kelvin) {
        OptionalDouble stated = get(THIRD_BODY);
        if (stated.isPresent()) {
            return stated;
        }
        OptionalDouble pressure = get(PRESSURE);
        return pressure.isPresent()
                ? OptionalDouble.of(pressure.getAsDouble() / (Constants.GAS * kelvin))
                : OptionalDouble.empty();
    }

    /** Whether the condition is stated, or follows from another: the third body from the pressure. */
    public boolean has(String name) {
        return values.containsKey(name) || (name.equals(THIRD_BODY) && values.containsKey(PRESSURE));
    }

    /** Whether nothing is stated. */
    public boolean isEmpty() {
        return values.isEmpty();
    }

    /** Every stated condition in SI, by name, in order of the names. */
    public Map<String, Double> values() {
        return new TreeMap<>(values);
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Conditions conditions && values.equals(conditions.values);
    }

    @Override
    public int hashCode() {
        return values.hashCode();
    }

    @Override
    public String toString() {
        return values.toString();
    }
}
