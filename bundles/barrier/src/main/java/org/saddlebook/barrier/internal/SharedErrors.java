package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/**
 * Errors that shift every run together: they do not show in the scatter and do not fall with the number of runs. Stated
 * by the user as settings of the section.
 *
 * @param thermometerOffset standard uncertainty of a common offset of the thermometer, K; 0 for none stated
 * @param thermometerGain relative standard uncertainty of the thermometer's scale above {@code gainFrom}; 0 for none
 * @param gainFrom temperature at which the scale is right, K
 * @param concentration relative standard uncertainty of a common concentration; 0 for none
 * @param targetOnSameSensor whether target temperatures are read on the same thermometer; else they are true ones
 */
record SharedErrors(
        double thermometerOffset,
        double thermometerGain,
        double gainFrom,
        double concentration,
        boolean targetOnSameSensor) {
    /** Nothing stated. */
    static final SharedErrors NONE = new SharedErrors(0, 0, Constants.ZERO_CELSIUS, 0, false);

    private static final List<String> KEYS = List.of(
            "thermometerOffset",
            "thermometerGain",
            "gainFrom",
            "concentrationUncertainty",
            "targets",
            "tolerance",
            "measureFrom",
            "measureTo",
            "runCost",
            Surroundings.THIRD_BODY,
            Surroundings.TUNNELLING,
            IntervalRequest.METHODS_KEY,
            IntervalRequest.RESAMPLES_KEY,
            IntervalRequest.FEW_POINTS_KEY);

    /**
     * One cause at one standard uncertainty.
     *
     * @param id lowerCamelCase id
     * @param title name for people
     * @param size what was stated, with unit
     * @param offset offset of the measured temperatures, K
     * @param gain relative error of the scale above {@code gainFrom}
     * @param gainFrom temperature at which the scale is right, K
     * @param lnRateShift shift of every ln k
     */
    record Cause(
            String id,
            String title,
            Node.Quantity size,
            double offset,
            double gain,
            double gainFrom,
            double lnRateShift) {
        /** The temperature that a thermometer with this error shows, times {@code sign}. */
        double shifted(double kelvin, int sign) {
            return kelvin + sign * (offset + gain * (kelvin - gainFrom));
        }
    }

    boolean hasThermometer() {
        return thermometerOffset > 0 || thermometerGain > 0;
    }

    /** The stated causes for a rate constant of this order. */
    List<Cause> causes(double order) {
        List<Cause> causes = new ArrayList<>();
        if (thermometerOffset > 0) {
            causes.add(new Cause(
                    "thermometerOffset",
                    "common offset of the thermometer",
                    Node.Quantity.of(thermometerOffset, "K"),
                    thermometerOffset,
                    0,
                    gainFrom,
                    0));
        }
        if (thermometerGain > 0) {
            causes.add(new Cause(
                    "thermometerGain",
                    "scale of the thermometer",
                    Node.Quantity.of(thermometerGain, "1"),
                    0,
                    thermometerGain,
                    gainFrom,
                    0));
        }
        if (concentration > 0 && order != 1) {
            causes.add(new Cause(
                    "concentration",
                    "common concentration",
                    Node.Quantity.of(concentration, "1"),
                    0,
                    0,
                    gainFrom,
                    (1 - order) * concentration));
        }
        return causes;
    }

    /**
     * Reads the settings.
     *
     * @throws IllegalArgumentException with a sentence when a setting cannot be used
     */
    static SharedErrors read(Optional<Node> settings) {
        if (settings.isEmpty()) {
            return NONE;
        }
        if (!(settings.get() instanceof Node.Group group)) {
            throw new IllegalArgumentException("The settings of the section barrier must be a group.");
        }
        for (String key : group.members().keySet()) {
            if (!KEYS.contains(key)) {
                throw new IllegalArgumentException(
                        "Unknown setting barrier." + key + "; known are " + String.join(", ", KEYS) + ".");
            }
        }
        String targets = group.get("targets").isPresent() ? TreeReader.text(group, "targets") : "true";
        if (!targets.equals("true") && !targets.equals("same-sensor")) {
            throw new IllegalArgumentException(
                    "The setting barrier.targets must be true or same-sensor; found " + targets + ".");
        }
        return new SharedErrors(
                difference(group, "thermometerOffset"),
                fraction(group, "thermometerGain", 0),
                group.get("gainFrom").isPresent() ? temperature(group, "gainFrom") : Constants.ZERO_CELSIUS,
                fraction(group, "concentrationUncertainty", 0),
                targets.equals("same-sensor"));
    }

    /** The relative tolerance of k from the settings; 0.10 when none is stated. */
    static double tolerance(Optional<Node> settings) {
        return settings.isPresent() && settings.get() instanceof Node.Group group
                ? fraction(group, "tolerance", Comparison.TOLERANCE)
                : Comparison.TOLERANCE;
    }

    /** Where and at what cost the settings allow further runs. */
    static NextMeasurement.Allowed allowed(Optional<Node> settings) {
        if (settings.isEmpty() || !(settings.get() instanceof Node.Group group)) {
            return new NextMeasurement.Allowed(OptionalDouble.empty(), OptionalDouble.empty(), false);
        }
        OptionalDouble from = limit(group, "measureFrom");
        OptionalDouble to = limit(group, "measureTo");
        if (from.isPresent() && to.isPresent() && !(from.getAsDouble() <= to.getAsDouble())) {
            throw new IllegalArgumentException("The setting barrier.measureFrom must not lie above barrier.measureTo.");
        }
        String cost = group.get("runCost").isPresent() ? TreeReader.text(group, "runCost") : "half-life";
        if (!cost.equals("half-life") && !cost.equals("equal")) {
            throw new IllegalArgumentException(
                    "The setting barrier.runCost must be half-life or equal; found " + cost + ".");
        }
        return new NextMeasurement.Allowed(from, to, cost.equals("equal"));
    }

    private static OptionalDouble limit(Node.Group group, String key) {
        return group.get(key).isPresent() ? OptionalDouble.of(temperature(group, key)) : OptionalDouble.empty();
    }

    private static double fraction(Node.Group group, String key, double otherwise) {
        if (group.get(key).isEmpty()) {
            return otherwise;
        }
        Node node = group.get(key).get();
        double value = node instanceof Node.Quantity quantity
                ? toSi(quantity, key, Dimension.NONE, true)
                : TreeReader.number(group, key);
        if (!(value > 0 && value < 1)) {
            throw new IllegalArgumentException(
                    "The setting barrier." + key + " must be a fraction between 0 and 1, such as 0.02.");
        }
        return value;
    }

    private static double difference(Node.Group group, String key) {
        if (group.get(key).isEmpty()) {
            return 0;
        }
        double value = toSi(TreeReader.quantity(group, key), key, Dimension.TEMPERATURE, true);
        if (!(value > 0) || Double.isInfinite(value)) {
            throw new IllegalArgumentException("The setting barrier." + key + " must be a positive difference in K.");
        }
        return value;
    }

    private static double temperature(Node.Group group, String key) {
        double value = toSi(TreeReader.quantity(group, key), key, Dimension.TEMPERATURE, false);
        if (!(value > 0) || Double.isInfinite(value)) {
            throw new IllegalArgumentException("The setting barrier." + key + " must be a temperature above 0 K.");
        }
        return value;
    }

    private static double toSi(Node.Quantity quantity, String key, Dimension dimension, boolean difference) {
        try {
            Unit unit =
                    quantity.unit().equals("%") ? new Unit("%", Dimension.NONE, 0.01, 0) : Units.parse(quantity.unit());
            if (!unit.dimension().equals(dimension)) {
                throw new IllegalArgumentException("The setting barrier." + key + " has the unit " + quantity.unit()
                        + ", which is of another kind.");
            }
            double value = quantity.value().orElse(Double.NaN);
            // A difference of temperatures knows no zero point.
            return difference ? value * unit.factor() : unit.toSi(value);
        } catch (UnitException unknown) {
            throw new IllegalArgumentException("The setting barrier." + key + ": " + unknown.getMessage(), unknown);
        }
    }
}
