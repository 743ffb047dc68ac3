package org.saddlebook.api.model;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
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
    private final Conditions conditions;
    private final Optional<Tunnelling> tunnelling;
    private final Optional<Transmission> transmissionLaw;

    private RateContext(
            Unit rateUnit,
            double order,
            StandardState standard,
            double transmission,
            double referenceKelvin,
            Map<String, Double> fixed,
            Conditions conditions,
            Optional<Tunnelling> tunnelling,
            Optional<Transmission> transmissionLaw) {
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
        this.conditions = Objects.requireNonNull(conditions, "conditions");
        this.tunnelling = Objects.requireNonNull(tunnelling, "tunnelling");
        this.transmissionLaw = Objects.requireNonNull(transmissionLaw, "transmissionLaw");
    }

    /** A rate constant of this unit and overall order; 1 mol/L, transmission 1, reference 298.15 K, nothing fixed. */
    public static RateContext of(Unit rateUnit, double order) {
        return new RateContext(
                rateUnit,
                order,
                StandardState.ONE_MOLAR,
                1,
                Constants.REFERENCE_KELVIN,
                Map.of(),
                Conditions.NONE,
                Optional.empty(),
                Optional.empty());
    }

    /** The same with rate constants shown in another unit of the same dimension. */
    public RateContext withRateUnit(Unit unit) {
        if (!unit.dimension().equals(rateUnit.dimension())) {
            throw new IllegalArgumentException(unit.code() + " is not of the dimension of " + rateUnit.code());
        }
        return new RateContext(
                unit, order, standard, transmission, referenceKelvin, fixed, conditions, tunnelling, transmissionLaw);
    }

    /** The same with this standard state. */
    public RateContext withStandard(StandardState newStandard) {
        return new RateContext(
                rateUnit,
                order,
                newStandard,
                transmission,
                referenceKelvin,
                fixed,
                conditions,
                tunnelling,
                transmissionLaw);
    }

    /** The same with this transmission coefficient. */
    public RateContext withTransmission(double newTransmission) {
        return new RateContext(
                rateUnit,
                order,
                standard,
                newTransmission,
                referenceKelvin,
                fixed,
                conditions,
                tunnelling,
                transmissionLaw);
    }

    /** The same with this reference temperature, K. */
    public RateContext withReferenceKelvin(double kelvin) {
        return new RateContext(
                rateUnit, order, standard, transmission, kelvin, fixed, conditions, tunnelling, transmissionLaw);
    }

    /** The same with the parameter {@code symbol} held at {@code value}, in the form handed to the model. */
    public RateContext withFixed(String symbol, double value) {
        Map<String, Double> more = new LinkedHashMap<>(fixed);
        more.put(symbol, value);
        return new RateContext(
                rateUnit,
                order,
                standard,
                transmission,
                referenceKelvin,
                more,
                conditions,
                tunnelling,
                transmissionLaw);
    }

    /** The same with the conditions at which the law is read when none are handed over with the temperature. */
    public RateContext withConditions(Conditions stated) {
        return new RateContext(
                rateUnit, order, standard, transmission, referenceKelvin, fixed, stated, tunnelling, transmissionLaw);
    }

    /** The same with this statement about tunnelling; it has to be resolved before a law can be bound. */
    public RateContext withTunnelling(Tunnelling stated) {
        return new RateContext(
                rateUnit,
                order,
                standard,
                transmission,
                referenceKelvin,
                fixed,
                conditions,
                Optional.of(stated),
                Optional.empty());
    }

    /** The same with a coefficient that varies with temperature, as a factor on {@link #transmission()}. */
    public RateContext withTransmission(Transmission law) {
        return new RateContext(
                rateUnit,
                order,
                standard,
                transmission,
                referenceKelvin,
                fixed,
                conditions,
                Optional.of(law.stated()),
                Optional.of(law));
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

    /** Transmission coefficient, the factor that does not vary with temperature; 1 unless stated. */
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

    /** Conditions at which the law is read when none are handed over with the temperature; none unless stated. */
    public Conditions conditions() {
        return conditions;
    }

    /** What is stated about tunnelling; empty when its effect is left inside the entropy of activation. */
    public Optional<Tunnelling> tunnelling() {
        return tunnelling;
    }

    /** The part of the transmission coefficient that varies with temperature; empty when there is none, or it is unresolved. */
    public Optional<Transmission> transmissionLaw() {
        return transmissionLaw;
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof RateContext context
                && rateUnit.equals(context.rateUnit)
                && order == context.order
                && standard.equals(context.standard)
                && transmission == context.transmission
                && referenceKelvin == context.referenceKelvin
                && fixed.equals(context.fixed)
                && conditions.equals(context.conditions)
                && tunnelling.equals(context.tunnelling)
                && transmissionLaw.isPresent() == context.transmissionLaw.isPresent();
    }

    @Override
    public int hashCode() {
        return Objects.hash(rateUnit, order, standard, transmission, referenceKelvin, fixed, conditions, tunnelling);
    }
}
