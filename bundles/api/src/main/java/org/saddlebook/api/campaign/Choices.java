package org.saddlebook.api.campaign;

import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.quantity.Constants;

/**
 * What people decided about the evaluation of a campaign; the options of a command and the defaults are folded in before
 * anything is computed. Immutable; grows by {@code with} methods.
 */
public final class Choices {
    /** The largest seed: whole numbers up to here survive every JSON reader. */
    public static final long LARGEST_SEED = (1L << 53) - 1;

    private static final Choices DEFAULTS = new Choices(new Builder());

    private final List<String> models;
    private final List<Double> targetsKelvin;
    private final Optional<StandardState> standard;
    private final OptionalDouble molecularity;
    private final double transmission;
    private final double referenceKelvin;
    private final ConstantKind constantKind;
    private final Optional<ErrorModel> errorModel;
    private final double level;
    private final long seed;
    private final Map<String, Double> fixed;

    private Choices(Builder b) {
        models = List.copyOf(b.models);
        targetsKelvin = List.copyOf(b.targetsKelvin);
        standard = Objects.requireNonNull(b.standard, "standard");
        molecularity = Objects.requireNonNull(b.molecularity, "molecularity");
        constantKind = Objects.requireNonNull(b.constantKind, "constantKind");
        errorModel = Objects.requireNonNull(b.errorModel, "errorModel");
        transmission = b.transmission;
        referenceKelvin = b.referenceKelvin;
        level = b.level;
        seed = b.seed;
        fixed = new TreeMap<>(b.fixed);
        if (!(transmission > 0) || Double.isInfinite(transmission)) {
            throw new IllegalArgumentException("transmission coefficient must be positive: " + transmission);
        }
        if (!(referenceKelvin > 0) || Double.isInfinite(referenceKelvin)) {
            throw new IllegalArgumentException("reference temperature must be positive: " + referenceKelvin);
        }
        if (!(level > 0.5 && level < 1)) {
            throw new IllegalArgumentException("level must lie between 0.5 and 1: " + level);
        }
        if (seed < 0 || seed > LARGEST_SEED) {
            throw new IllegalArgumentException("seed must lie between 0 and 2^53 - 1: " + seed);
        }
        for (double target : targetsKelvin) {
            if (!(target > 0) || Double.isInfinite(target)) {
                throw new IllegalArgumentException("target temperature must be above 0 K: " + target);
            }
        }
    }

    private static final class Builder {
        private List<String> models = List.of();
        private List<Double> targetsKelvin = List.of();
        private Optional<StandardState> standard = Optional.empty();
        private OptionalDouble molecularity = OptionalDouble.empty();
        private double transmission = 1;
        private double referenceKelvin = Constants.REFERENCE_KELVIN;
        private ConstantKind constantKind = ConstantKind.UNSTATED;
        private Optional<ErrorModel> errorModel = Optional.empty();
        private double level = 0.95;
        private long seed = 1;
        private Map<String, Double> fixed = Map.of();

        private Builder() {}

        private Builder(Choices c) {
            models = c.models;
            targetsKelvin = c.targetsKelvin;
            standard = c.standard;
            molecularity = c.molecularity;
            transmission = c.transmission;
            referenceKelvin = c.referenceKelvin;
            constantKind = c.constantKind;
            errorModel = c.errorModel;
            level = c.level;
            seed = c.seed;
            fixed = c.fixed;
        }
    }

    /** Nothing decided: every installed model that does not wait for a request, no target, 1 mol/L assumed, level 0.95, seed 1. */
    public static Choices defaults() {
        return DEFAULTS;
    }

    /** Ids of the models asked for by name; empty for every installed one that does not wait for a request. */
    public List<String> models() {
        return models;
    }

    /** Temperatures to predict at, K. */
    public List<Double> targetsKelvin() {
        return targetsKelvin;
    }

    /** Standard state; empty when nobody stated one (1 mol/L is then assumed, and said so). */
    public Optional<StandardState> standard() {
        return standard;
    }

    /** Stated molecularity; empty when it follows from the unit alone. */
    public OptionalDouble molecularity() {
        return molecularity;
    }

    /** Transmission coefficient. */
    public double transmission() {
        return transmission;
    }

    /** Reference temperature of laws that need one, K. */
    public double referenceKelvin() {
        return referenceKelvin;
    }

    /** What the rate constant stands for. */
    public ConstantKind constantKind() {
        return constantKind;
    }

    /** Error model; empty until it is resolved: stated where every used point has an uncertainty, else constant relative. */
    public Optional<ErrorModel> errorModel() {
        return errorModel;
    }

    /** Coverage probability of intervals. */
    public double level() {
        return level;
    }

    /** Seed of every random stream. */
    public long seed() {
        return seed;
    }

    /** Parameters held at a value, {@code model-id/symbol} to value in the form handed to the model. */
    public Map<String, Double> fixed() {
        return Map.copyOf(fixed);
    }

    /** The same with these models asked for. */
    public Choices withModels(List<String> ids) {
        Builder b = new Builder(this);
        b.models = ids;
        return new Choices(b);
    }

    /** The same with these target temperatures, K. */
    public Choices withTargetsKelvin(List<Double> kelvin) {
        Builder b = new Builder(this);
        b.targetsKelvin = kelvin;
        return new Choices(b);
    }

    /** The same with this stated standard state. */
    public Choices withStandard(StandardState stated) {
        Builder b = new Builder(this);
        b.standard = Optional.of(stated);
        return new Choices(b);
    }

    /** The same with this stated molecularity. */
    public Choices withMolecularity(double stated) {
        Builder b = new Builder(this);
        b.molecularity = OptionalDouble.of(stated);
        return new Choices(b);
    }

    /** The same with this transmission coefficient. */
    public Choices withTransmission(double coefficient) {
        Builder b = new Builder(this);
        b.transmission = coefficient;
        return new Choices(b);
    }

    /** The same with this reference temperature, K. */
    public Choices withReferenceKelvin(double kelvin) {
        Builder b = new Builder(this);
        b.referenceKelvin = kelvin;
        return new Choices(b);
    }

    /** The same with this kind of rate constant. */
    public Choices withConstantKind(ConstantKind kind) {
        Builder b = new Builder(this);
        b.constantKind = kind;
        return new Choices(b);
    }

    /** The same with this error model. */
    public Choices withErrorModel(ErrorModel model) {
        Builder b = new Builder(this);
        b.errorModel = Optional.of(model);
        return new Choices(b);
    }

    /** The same with this coverage probability. */
    public Choices withLevel(double probability) {
        Builder b = new Builder(this);
        b.level = probability;
        return new Choices(b);
    }

    /** The same with this seed, 0 to {@link #LARGEST_SEED}. */
    public Choices withSeed(long newSeed) {
        Builder b = new Builder(this);
        b.seed = newSeed;
        return new Choices(b);
    }

    /** The same with these held parameters, {@code model-id/symbol} to value in the form handed to the model. */
    public Choices withFixed(Map<String, Double> held) {
        Builder b = new Builder(this);
        b.fixed = held;
        return new Choices(b);
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Choices c
                && models.equals(c.models)
                && targetsKelvin.equals(c.targetsKelvin)
                && standard.equals(c.standard)
                && molecularity.equals(c.molecularity)
                && transmission == c.transmission
                && referenceKelvin == c.referenceKelvin
                && constantKind == c.constantKind
                && errorModel.equals(c.errorModel)
                && level == c.level
                && seed == c.seed
                && fixed.equals(c.fixed);
    }

    @Override
    public int hashCode() {
        return Objects.hash(models, targetsKelvin, standard, errorModel, level, seed, fixed);
    }
}
