package org.saddlebook.data.checks.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/**
 * The settings {@code dataChecks} of a campaign.
 *
 * @param reference earlier result to compare with
 * @param viscosity of the solvent, Pa s
 * @param medium {@code solution}, {@code gas}, or empty when not stated
 * @param collisionDiameter m
 * @param reducedMass kg/mol
 * @param unusable sentences that name what could not be understood
 */
record Stated(
        Optional<Reference> reference,
        OptionalDouble viscosity,
        String medium,
        OptionalDouble collisionDiameter,
        OptionalDouble reducedMass,
        List<String> unusable) {
    /** Dynamic viscosity, Pa s. */
    static final Dimension VISCOSITY = new Dimension(1, -1, -1, 0, 0);

    private static final Dimension LENGTH = new Dimension(0, 1, 0, 0, 0);
    private static final Dimension MOLAR_MASS = new Dimension(1, 0, 0, 0, -1);

    /** Nothing stated. */
    static final Stated NOTHING = new Stated(
            Optional.empty(), OptionalDouble.empty(), "", OptionalDouble.empty(), OptionalDouble.empty(), List.of());

    /**
     * An earlier result, SI: either energy and prefactor, or enthalpy and entropy of activation, or k at one temperature.
     *
     * @param kind which of them
     * @param first Ea or ΔH‡, J/mol, or k
     * @param firstUncertainty standard uncertainty of it
     * @param second ln A, ΔS‡ in J/(mol K), or the temperature in K
     * @param source where it comes from; may be empty
     */
    record Reference(Kind kind, double first, OptionalDouble firstUncertainty, double second, String source) {
        /** What is stated. */
        enum Kind {
            ARRHENIUS,
            EYRING,
            RATE
        }
    }

    /** Reads the settings; what cannot be understood is named and left out. */
    static Stated of(Node node) {
        if (!(node instanceof Node.Group group)) {
            return new Stated(
                    Optional.empty(),
                    OptionalDouble.empty(),
                    "",
                    OptionalDouble.empty(),
                    OptionalDouble.empty(),
                    List.of("The settings dataChecks are not a group of named members."));
        }
        List<String> unusable = new ArrayList<>();
        for (String key : group.members().keySet()) {
            if (!List.of("reference", "viscosity", "medium", "collisionDiameter", "reducedMass")
                    .contains(key)) {
                unusable.add("The settings dataChecks hold \"" + key + "\", which is not known; expected reference,"
                        + " viscosity, medium, collisionDiameter, reducedMass.");
            }
        }
        Optional<Reference> reference = group.get("reference").flatMap(stated -> reference(stated, unusable));
        return new Stated(
                reference,
                positive(group, "viscosity", VISCOSITY, unusable),
                medium(group, unusable),
                positive(group, "collisionDiameter", LENGTH, unusable),
                positive(group, "reducedMass", MOLAR_MASS, unusable),
                List.copyOf(unusable));
    }

    private static String medium(Node.Group group, List<String> unusable) {
        Optional<Node> node = group.get("medium");
        if (node.isEmpty()) {
            return "";
        }
        if (node.get() instanceof Node.Text text && List.of("solution", "gas").contains(text.value())) {
            return text.value();
        }
        unusable.add("The setting dataChecks.medium must be solution or gas.");
        return "";
    }

    private static Optional<Reference> reference(Node node, List<String> unusable) {
        if (!(node instanceof Node.Group group)) {
            unusable.add("The setting dataChecks.reference is not a group; expected Ea and A, dH and dS, or k and at.");
            return Optional.empty();
        }
        String source = group.get("source")
                .map(text -> text instanceof Node.Text words ? words.value() : "")
                .orElse("");
        Map<String, Node> members = group.members();
        if (members.containsKey("Ea") && members.containsKey("A")) {
            OptionalDouble energy = number(group, "Ea", Dimension.MOLAR_ENERGY, unusable);
            OptionalDouble prefactor = number(group, "A", null, unusable);
            if (energy.isPresent() && prefactor.isPresent() && prefactor.getAsDouble() > 0) {
                return Optional.of(new Reference(
                        Reference.Kind.ARRHENIUS,
                        energy.getAsDouble(),
                        uncertainty(group, "Ea"),
                        StrictMath.log(prefactor.getAsDouble()),
                        source));
            }
        } else if (members.containsKey("dH") && members.containsKey("dS")) {
            OptionalDouble enthalpy = number(group, "dH", Dimension.MOLAR_ENERGY, unusable);
            OptionalDouble entropy = number(group, "dS", Dimension.MOLAR_ENTROPY, unusable);
            if (enthalpy.isPresent() && entropy.isPresent()) {
                return Optional.of(new Reference(
                        Reference.Kind.EYRING,
                        enthalpy.getAsDouble(),
                        uncertainty(group, "dH"),
                        entropy.getAsDouble(),
                        source));
            }
        } else if (members.containsKey("k") && members.containsKey("at")) {
            OptionalDouble rate = number(group, "k", null, unusable);
            OptionalDouble kelvin = number(group, "at", Dimension.TEMPERATURE, unusable);
            if (rate.isPresent() && rate.getAsDouble() > 0 && kelvin.isPresent() && kelvin.getAsDouble() > 0) {
                return Optional.of(new Reference(
                        Reference.Kind.RATE,
                        rate.getAsDouble(),
                        uncertainty(group, "k"),
                        kelvin.getAsDouble(),
                        source));
            }
        }
        unusable.add("The setting dataChecks.reference needs Ea and A, or dH and dS, or k and at, each with its unit.");
        return Optional.empty();
    }

    /** A quantity in SI; a null dimension leaves that to the rule, which knows the order. */
    private static OptionalDouble number(Node.Group group, String key, Dimension dimension, List<String> unusable) {
        Optional<Node> node = group.get(key);
        if (node.isEmpty()) {
            return OptionalDouble.empty();
        }
        if (node.get() instanceof Node.Quantity quantity && quantity.value().isPresent()) {
            try {
                Unit unit = Units.parse(quantity.unit());
                if (dimension == null || unit.dimension().equals(dimension)) {
                    double si = unit.toSi(quantity.value().getAsDouble());
                    return OptionalDouble.of(si);
                }
            } catch (UnitException unreadable) {
                unusable.add("The setting dataChecks." + key + " has the unit \"" + quantity.unit()
                        + "\", which is not known.");
                return OptionalDouble.empty();
            }
        }
        unusable.add("The setting dataChecks." + key + " must be a value with its unit, of the right dimension"
                + (dimension == null ? "" : ": " + Units.name(dimension)) + ".");
        return OptionalDouble.empty();
    }

    private static OptionalDouble positive(Node.Group group, String key, Dimension dimension, List<String> unusable) {
        OptionalDouble value = number(group, key, dimension, unusable);
        if (value.isPresent() && !(value.getAsDouble() > 0)) {
            unusable.add("The setting dataChecks." + key + " must be above zero.");
            return OptionalDouble.empty();
        }
        return value;
    }

    private static OptionalDouble uncertainty(Node.Group group, String key) {
        if (group.get(key).orElse(null) instanceof Node.Quantity quantity
                && quantity.standardUncertainty().isPresent()) {
            try {
                return OptionalDouble.of(Units.parse(quantity.unit()).factor()
                        * quantity.standardUncertainty().getAsDouble());
            } catch (UnitException unreadable) {
                return OptionalDouble.empty(); // said where the value was read
            }
        }
        return OptionalDouble.empty();
    }
}
