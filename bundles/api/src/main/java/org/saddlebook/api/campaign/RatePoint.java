package org.saddlebook.api.campaign;

import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import org.saddlebook.api.model.Conditions;

/**
 * One measured rate constant at one temperature.
 *
 * @param kelvin temperature, K; positive and finite
 * @param rate rate constant in SI, (m3/mol)^(order-1)/s; positive and finite
 * @param kelvinUncertainty standard uncertainty of the temperature, K; absent when not stated, positive otherwise
 * @param rateUncertainty standard uncertainty of the rate constant in SI; absent when not stated, positive otherwise
 * @param label the run's own name; empty when it has none
 * @param excluded reason why a person excluded it; absent when it is used
 * @param asRead what stood in the source
 * @param conditions what else it was measured at; none for most tables
 * @param block stock, batch or day it shares an error with other runs through; empty when not stated
 */
public record RatePoint(
        double kelvin,
        double rate,
        OptionalDouble kelvinUncertainty,
        OptionalDouble rateUncertainty,
        String label,
        Optional<String> excluded,
        AsRead asRead,
        Conditions conditions,
        String block) {
    /**
     * What stood in the source, so that the reading can be checked.
     *
     * @param line physical line from 1; absent when the point was not read from a file
     * @param temperature the temperature's text
     * @param rate the rate constant's text
     */
    public record AsRead(OptionalInt line, String temperature, String rate) {
        /** For points that were not read from a file. */
        public static final AsRead NOT_READ = new AsRead(OptionalInt.empty(), "", "");

        /** Checks the components. */
        public AsRead {
            Objects.requireNonNull(line, "line");
            Objects.requireNonNull(temperature, "temperature");
            Objects.requireNonNull(rate, "rate");
        }

        // Spelled out: the comparison that records get is put together at run time, which every start would pay for.
        @Override
        public boolean equals(Object other) {
            return other instanceof AsRead read
                    && line.equals(read.line)
                    && temperature.equals(read.temperature)
                    && rate.equals(read.rate);
        }

        @Override
        public int hashCode() {
            return Objects.hash(line, temperature, rate);
        }
    }

    /** Checks the components. */
    public RatePoint {
        positive("temperature in kelvin", kelvin);
        positive("rate constant", rate);
        // No lambdas: a table is read at every start.
        if (kelvinUncertainty.isPresent()) {
            positive("uncertainty of the temperature", kelvinUncertainty.getAsDouble());
        }
        if (rateUncertainty.isPresent()) {
            positive("uncertainty of the rate constant", rateUncertainty.getAsDouble());
        }
        Objects.requireNonNull(label, "label");
        Objects.requireNonNull(excluded, "excluded");
        Objects.requireNonNull(asRead, "asRead");
        Objects.requireNonNull(conditions, "conditions");
        Objects.requireNonNull(block, "block");
    }

    /** A point of which no condition but the temperature is stated, and no block. */
    public RatePoint(
            double kelvin,
            double rate,
            OptionalDouble kelvinUncertainty,
            OptionalDouble rateUncertainty,
            String label,
            Optional<String> excluded,
            AsRead asRead) {
        this(kelvin, rate, kelvinUncertainty, rateUncertainty, label, excluded, asRead, Conditions.NONE, "");
    }

    /** A point that belongs to no block. */
    public RatePoint(
            double kelvin,
            double rate,
            OptionalDouble kelvinUncertainty,
            OptionalDouble rateUncertainty,
            String label,
            Optional<String> excluded,
            AsRead asRead,
            Conditions conditions) {
        this(kelvin, rate, kelvinUncertainty, rateUncertainty, label, excluded, asRead, conditions, "");
    }

    /** A used point without uncertainties. */
    public static RatePoint of(double kelvin, double rate) {
        return new RatePoint(
                kelvin, rate, OptionalDouble.empty(), OptionalDouble.empty(), "", Optional.empty(), AsRead.NOT_READ);
    }

    /** The same with a stated standard uncertainty of the rate constant, SI. */
    public RatePoint withRateUncertainty(double uncertainty) {
        return new RatePoint(
                kelvin,
                rate,
                kelvinUncertainty,
                OptionalDouble.of(uncertainty),
                label,
                excluded,
                asRead,
                conditions,
                block);
    }

    /** The same, measured under these conditions. */
    public RatePoint withConditions(Conditions stated) {
        return new RatePoint(kelvin, rate, kelvinUncertainty, rateUncertainty, label, excluded, asRead, stated, block);
    }

    /** The same with a stated standard uncertainty of the temperature, K. */
    public RatePoint withKelvinUncertainty(double uncertainty) {
        return new RatePoint(
                kelvin,
                rate,
                OptionalDouble.of(uncertainty),
                rateUncertainty,
                label,
                excluded,
                asRead,
                conditions,
                block);
    }

    /** The same in this block. */
    public RatePoint withBlock(String name) {
        return new RatePoint(
                kelvin, rate, kelvinUncertainty, rateUncertainty, label, excluded, asRead, conditions, name);
    }

    /** The same, excluded for this reason. */
    public RatePoint exclude(String reason) {
        return new RatePoint(
                kelvin,
                rate,
                kelvinUncertainty,
                rateUncertainty,
                label,
                Optional.of(reason),
                asRead,
                conditions,
                block);
    }

    /** The same, used again. */
    public RatePoint include() {
        return new RatePoint(
                kelvin, rate, kelvinUncertainty, rateUncertainty, label, Optional.empty(), asRead, conditions, block);
    }

    private static void positive(String what, double value) {
        if (!(value > 0) || Double.isInfinite(value)) {
            throw new IllegalArgumentException(what + " must be positive and finite: " + value);
        }
    }
}
