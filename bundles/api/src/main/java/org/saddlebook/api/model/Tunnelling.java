package org.saddlebook.api.model;

import java.util.Map;
import java.util.Objects;
import java.util.OptionalDouble;
import java.util.TreeMap;

/**
 * What somebody stated about tunnelling: which correction, and the barrier it is computed from. A bundle with a
 * {@link TunnellingModel} turns it into a {@link Transmission}. Immutable.
 */
public final class Tunnelling {
    /** Wavenumber of the imaginary frequency at the saddle point, 1/m, without its i. */
    public static final String WAVENUMBER = "wavenumber";

    /** Height of the barrier seen from the reactants, J/mol. */
    public static final String FORWARD_BARRIER = "forwardBarrier";

    /** Height of the barrier seen from the products, J/mol. */
    public static final String REVERSE_BARRIER = "reverseBarrier";

    private final String modelId;
    private final Map<String, Double> values;

    private Tunnelling(String modelId, Map<String, Double> values) {
        this.modelId = Objects.requireNonNull(modelId, "modelId");
        this.values = values;
    }

    /** The correction of this id, with nothing stated about the barrier yet. */
    public static Tunnelling by(String modelId) {
        return new Tunnelling(modelId, new TreeMap<>());
    }

    /** The same with one more value in SI; positive and finite. */
    public Tunnelling with(String name, double value) {
        if (!(value > 0) || Double.isInfinite(value)) {
            throw new IllegalArgumentException(name + " must be positive and finite: " + value);
        }
        TreeMap<String, Double> more = new TreeMap<>(values);
        more.put(Objects.requireNonNull(name, "name"), value);
        return new Tunnelling(modelId, more);
    }

    /** Id of the correction. */
    public String modelId() {
        return modelId;
    }

    /** A stated value in SI; empty when it is not stated. */
    public OptionalDouble get(String name) {
        Double value = values.get(name);
        return value == null ? OptionalDouble.empty() : OptionalDouble.of(value);
    }

    /** Every stated value in SI, by name, in order of the names. */
    public Map<String, Double> values() {
        return new TreeMap<>(values);
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Tunnelling stated && modelId.equals(stated.modelId) && values.equals(stated.values);
    }

    @Override
    public int hashCode() {
        return Objects.hash(modelId, values);
    }
}
