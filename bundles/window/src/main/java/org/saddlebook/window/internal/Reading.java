package org.saddlebook.window.internal;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.units.api.Measured;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/**
 * Reads members of a group of settings. Quantities may be written as text ({@code 10 h}) or as value with unit; whatever
 * is not understood is refused with a sentence that names the place.
 *
 * @param group the group
 * @param place how it is called in sentences, for example {@code limit 2 (time)}
 */
record Reading(Node.Group group, String place) {
    static final Dimension TIME = new Dimension(0, 0, 1, 0, 0);

    /** A value with its unit and how its uncertainty was stated, in SI. */
    record Stated(double si, OptionalDouble uncertainty, OptionalDouble factor, Unit unit, String text) {}

    /** A reading of a node that must be a group. */
    static Reading of(Node node, String place) throws Refusal {
        if (!(node instanceof Node.Group group)) {
            throw new Refusal("The " + place + " is not a group of named members.");
        }
        return new Reading(group, place);
    }

    /** Refuses members of other names. */
    void only(String... keys) throws Refusal {
        for (String key : group.members().keySet()) {
            if (!List.of(keys).contains(key)) {
                throw new Refusal("The " + place + " holds \"" + key + "\", which is not known; expected "
                        + String.join(", ", keys) + ".");
            }
        }
    }

    boolean has(String key) {
        return group.get(key).isPresent();
    }

    Node node(String key, String what) throws Refusal {
        Optional<Node> node = group.get(key);
        if (node.isEmpty()) {
            throw new Refusal("The " + place + " needs " + key + ": " + what + ".");
        }
        return node.get();
    }

    String text(String key, String what) throws Refusal {
        if (!(node(key, what) instanceof Node.Text text) || text.value().isBlank()) {
            throw new Refusal(name(key) + " must be a text: " + what + ".");
        }
        return text.value();
    }

    String textOr(String key, String other) throws Refusal {
        return has(key) ? text(key, "a name") : other;
    }

    /** A pure number. */
    double number(String key, String what) throws Refusal {
        Node node = node(key, what);
        if (node instanceof Node.Scalar scalar) {
            return scalar.value();
        }
        if (node instanceof Node.Quantity || node instanceof Node.Text) {
            return quantity(key, Dimension.NONE, what, "1").si();
        }
        throw new Refusal(name(key) + " must be a plain number: " + what + ".");
    }

    /** A number between 0 and 1, both excluded. */
    double share(String key, String what) throws Refusal {
        double value = number(key, what);
        if (!(value > 0 && value < 1)) {
            throw new Refusal(
                    name(key) + " must lie between 0 and 1: " + what + ", as a fraction (0.95) or with the unit %.");
        }
        return value;
    }

    /** A number above zero. */
    double positive(String key, String what) throws Refusal {
        double value = number(key, what);
        if (!(value > 0)) {
            throw new Refusal(name(key) + " must be above zero: " + what + ".");
        }
        return value;
    }

    /** A time above zero, s. */
    Stated time(String key, String what) throws Refusal {
        Stated stated = quantity(key, TIME, what, "h");
        if (!(stated.si() > 0)) {
            throw new Refusal(name(key) + " must be above zero: " + what + ".");
        }
        return stated;
    }

    /** A concentration above zero, mol/m3. */
    double concentration(String key, String what) throws Refusal {
        double value = quantity(key, Dimension.CONCENTRATION, what, "mol/L").si();
        if (!(value > 0)) {
            throw new Refusal(name(key) + " must be above zero: " + what + ".");
        }
        return value;
    }

    /** A temperature, K. */
    double kelvin(String key, String what) throws Refusal {
        Node node = node(key, what);
        double kelvin;
        try {
            if (node instanceof Node.Text text) {
                kelvin = Units.kelvin(text.value());
            } else if (node instanceof Node.Quantity quantity
                    && quantity.value().isPresent()) {
                kelvin =
                        Units.temperature(quantity.unit()).toSi(quantity.value().getAsDouble());
            } else {
                throw new Refusal(name(key) + " has no unit; state a temperature such as \"25 degC\" or \"298.15 K\".");
            }
        } catch (UnitException wrong) {
            throw new Refusal(name(key) + " cannot be used: " + sentence(wrong));
        }
        if (!(kelvin > 0 && kelvin <= 100_000)) {
            throw new Refusal(name(key) + " must lie above 0 K and at most at 100000 K.");
        }
        return kelvin;
    }

    /** A quantity of one dimension. */
    Stated quantity(String key, Dimension dimension, String what, String example) throws Refusal {
        Node node = node(key, what);
        try {
            if (node instanceof Node.Text text) {
                Measured measured = Units.measured(text.value());
                checked(measured.unit(), dimension, example);
                return new Stated(
                        finite(key, measured.si()),
                        measured.uncertaintySi(),
                        OptionalDouble.empty(),
                        measured.unit(),
                        text.value());
            }
            if (node instanceof Node.Quantity quantity && quantity.value().isPresent()) {
                if (quantity.interval().isPresent()) {
                    throw new Refusal("The uncertainty of " + key + " in the " + place
                            + " must be a standard uncertainty; an interval is not understood here.");
                }
                Unit unit = checked(Units.parse(quantity.unit()), dimension, example);
                OptionalDouble u = quantity.standardUncertainty();
                return new Stated(
                        finite(key, unit.toSi(quantity.value().getAsDouble())),
                        u.isPresent() ? OptionalDouble.of(finite(key, u.getAsDouble() * unit.factor())) : u,
                        quantity.standardFactor(),
                        unit,
                        Words.quantity(quantity.value().getAsDouble(), unit));
            }
        } catch (UnitException wrong) {
            throw new Refusal(name(key) + " cannot be used: " + sentence(wrong));
        }
        throw new Refusal(name(key) + " has no unit; state " + what + " with a unit such as " + example + ".");
    }

    private static Unit checked(Unit unit, Dimension dimension, String example) throws UnitException {
        return dimension == null || unit.dimension().equals(dimension)
                ? unit
                : Units.parse(unit.code(), dimension, example);
    }

    private double finite(String key, double value) throws Refusal {
        if (!(Math.abs(value) <= 1e300)) {
            throw new Refusal(name(key) + " is beyond the range of numbers.");
        }
        return value;
    }

    private String name(String key) {
        return "\"" + key + "\" in the " + place;
    }

    static String sentence(UnitException wrong) {
        String text = "found " + wrong.found() + ", expected " + wrong.expected() + "; " + wrong.remedy();
        return text.endsWith(".") ? text : text + ".";
    }
}
