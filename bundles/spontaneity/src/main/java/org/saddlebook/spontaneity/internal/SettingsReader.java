package org.saddlebook.spontaneity.internal;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/** Members of a group of settings, each refused by name when it is not what it should be. */
final class SettingsReader {
    private final Node.Group group;
    private final String name;

    /**
     * A group.
     *
     * @param name how the group is called in messages, for example {@code the settings of spontaneity}
     * @param keys the keys it may have; empty for any
     */
    SettingsReader(Node node, String name, List<String> keys) throws Refusal {
        if (!(node instanceof Node.Group members)) {
            throw new Refusal("In " + name + " a group of named values is expected.");
        }
        this.group = members;
        this.name = name;
        for (String key : members.members().keySet()) {
            if (!keys.isEmpty() && !keys.contains(key)) {
                throw new Refusal("In " + name + " there is \"" + key + "\", which is not known; expected "
                        + String.join(", ", keys) + ".");
            }
        }
    }

    Map<String, Node> members() {
        return group.members();
    }

    Optional<Node> node(String key) {
        return group.get(key);
    }

    Optional<String> text(String key) throws Refusal {
        if (group.get(key).isEmpty()) {
            return Optional.empty();
        }
        if (!(group.get(key).get() instanceof Node.Text text) || text.value().isBlank()) {
            throw new Refusal("In " + name + " the value of " + key + " must be a text.");
        }
        return Optional.of(text.value());
    }

    boolean flag(String key) throws Refusal {
        if (group.get(key).isEmpty()) {
            return false;
        }
        if (!(group.get(key).get() instanceof Node.Flag flag)) {
            throw new Refusal("In " + name + " the value of " + key + " must be true or false.");
        }
        return flag.value();
    }

    OptionalDouble scalar(String key) throws Refusal {
        if (group.get(key).isEmpty()) {
            return OptionalDouble.empty();
        }
        if (!(group.get(key).get() instanceof Node.Scalar scalar)) {
            throw new Refusal("In " + name + " the value of " + key + " must be a plain number.");
        }
        return OptionalDouble.of(scalar.value());
    }

    /**
     * A stated quantity in SI.
     *
     * @param value SI value
     * @param uncertainty SI standard uncertainty; empty when not stated
     */
    record Si(double value, OptionalDouble uncertainty) {}

    /** A quantity that must be there. */
    Si quantity(String key, Dimension dimension, String example) throws Refusal {
        if (group.get(key).isEmpty()) {
            throw new Refusal("In " + name + " " + key + " is missing; state it in a unit such as " + example + ".");
        }
        return quantity(group.get(key).get(), key, dimension, example);
    }

    /** Any node as a quantity of this dimension. */
    Si quantity(Node node, String key, Dimension dimension, String example) throws Refusal {
        if (!(node instanceof Node.Quantity quantity) || quantity.value().isEmpty()) {
            throw new Refusal(
                    "In " + name + " " + key + " has no unit or no value; state it in a unit such as " + example + ".");
        }
        try {
            Unit unit = dimension.equals(Dimension.TEMPERATURE)
                    ? Units.temperature(quantity.unit())
                    : Units.parse(quantity.unit(), dimension, example);
            double u = quantity.standardUncertainty().orElse(0);
            return new Si(
                    unit.toSi(quantity.value().getAsDouble()),
                    quantity.standardUncertainty().isPresent()
                            ? OptionalDouble.of(u * unit.factor())
                            : OptionalDouble.empty());
        } catch (UnitException wrong) {
            throw new Refusal("In " + name + " the unit of " + key + " cannot be used: found " + wrong.found()
                    + ", expected " + wrong.expected() + "; " + wrong.remedy());
        }
    }

    /** An absolute temperature, K; a plain number is in K, as every plain number in a campaign is in SI. */
    double kelvin(String key) throws Refusal {
        Optional<Node> node = group.get(key);
        if (node.isEmpty()) {
            throw new Refusal("In " + name + " " + key + " is missing; state a temperature.");
        }
        double kelvin = node.get() instanceof Node.Scalar scalar
                ? scalar.value()
                : quantity(node.get(), key, Dimension.TEMPERATURE, "K").value();
        if (!(kelvin > 0 && kelvin <= Temperatures.HOTTEST)) {
            throw new Refusal("In " + name + " " + key + " must lie above 0 K and at most at 100000 K.");
        }
        return kelvin;
    }
}
