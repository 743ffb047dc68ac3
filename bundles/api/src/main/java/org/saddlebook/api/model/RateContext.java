package org.saddlebook.api.model;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Objects;
import java.util.OptionalDouble;
import java.util.TreeMap;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.quantity.Unit;

/** What a rate model needs to know about the rate constant it describes. Immutable. */
public final class RateContext {
    private final Unit rateUnit;
    private final double order;
    private final StandardState standard;
    private final double transmission;
    private final double referenceKelvin;
    private final Map<String, Double> fixed;

    private RateContext(
            Unit rateUnit,
            double order,
            StandardState standard,
            double transmission,
            double referenceKelvin,
            Map<String, Double> fixed) {
        this.rateUnit = Objects.requireNonNull(rateUnit, "rateUnit");
        this.standard = Objects.requireNonNull(standard, "standard");
        if (!(order >= 0) || Double.isInfinite(order)) {
            throw new IllegalArgumentException("order must not be negative: " + order);
        }
        if (!(transmission > 0) || Double.isInfinite(transmission)) {
            throw new IllegalArgumentException("transmission coefficient must be positive: " + transmission);
        }
        if (!(referenceKelvin > 0) || Double.isInfinite(referenceKelvin)) {
            throw new IllegalArgumentException("reference temperature must be positive: " + referenceKelvin);
        }
        this.order = order;
        this.transmission = transmission;
        this.referenceKelvin = referenceKelvin;
        this.fixed = new TreeMap<>(fixed);
    }

    /** A rate constant of this unit and overall order; 1 mol/L, transmission 1, reference 298.15 K, nothing fixed. */
    public static RateContext of(Unit rateUnit, double order) {
        return new RateContext(rateUnit, order, StandardState.ONE_MOLAR, 1, Constants.REFERENCE_KELVIN, Map.of());
    }

    /** The same with this standard state. */
    public RateContext withStandard(StandardState newStandard) {
        return new RateContext(rateUnit, order, newStandard, transmission, referenceKelvin, fixed);
    }

    /** The same with this transmission coefficient. */
    public RateContext withTransmission(double newTransmission) {
        return new RateContext(rateUnit, order, standard, newTransmission, referenceKelvin, fixed);
    }

    /** The same with this reference temperature, K. */
    public RateContext withReferenceKelvin(double kelvin) {
        return new RateContext(rateUnit, order, standard, transmission, kelvin, fixed);
    }

    /** The same with the parameter {@code symbol} held at {@code value}, in the form handed to the model. */
    public RateContext withFixed(String symbol, double value) {
        Map<String, Double> more = new LinkedHashMap<>(fixed);
        more.put(symbol, value);
        return new RateContext(rateUnit, order, standard, transmission, referenceKelvin, more);
    }

    /** Unit the rate constants are stated in; its factor leads to (m3/mol)^(order-1)/s. */
    public Unit rateUnit() {
        return rateUnit;
    }

    /** Overall order of the step, the molecularity m of transition-state theory; not negative. */
    public double order() {
        return order;
    }

    /** Standard state of entropies and Gibbs energies of activation. */
    public StandardState standard() {
        return standard;
    }

    /** Transmission coefficient; 1 unless stated. */
    public double transmission() {
        return transmission;
    }

    /** Reference temperature of laws that need one, K; 298.15 unless stated. */
    public double referenceKelvin() {
        return referenceKelvin;
    }

    /** The value at which a parameter is held, in the form handed to the model; empty when it is free. */
    public OptionalDouble fixed(String symbol) {
        Double value = fixed.get(symbol);
        return value == null ? OptionalDouble.empty() : OptionalDouble.of(value);
    }

    /** Every held parameter, by symbol. */
    public Map<String, Double> fixed() {
        return Map.copyOf(fixed);
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof RateContext context
                && rateUnit.equals(context.rateUnit)
                && order == context.order
                && standard.equals(context.standard)
                && transmission == context.transmission
                && referenceKelvin == context.referenceKelvin
                && fixed.equals(context.fixed);
    }

    @Override
    public int hashCode() {
        return Objects.hash(rateUnit, order, standard, transmission, referenceKelvin, fixed);
    }
}
