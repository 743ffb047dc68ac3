package org.saddlebook.spontaneity.internal;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.reaction.api.Phase;
import org.saddlebook.reaction.api.ReactionException;
import org.saddlebook.reaction.api.Species;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/**
 * The reaction quotient {@code Q = Π a^ν}: for gases pressure over 1 bar, for dissolved species concentration over 1 mol/L
 * (for an activity a plain number), for pure liquids and solids 1. Ideal: activity coefficients are taken as 1.
 */
final class Composition {
    private static final double BAR = 1e5;

    /** mol/m3 in 1 mol/L. */
    private static final double MOLAR = 1000;

    private Composition() {}

    /** ln Q; empty when no composition is stated. */
    static OptionalDouble lnQ(Optional<Node> node, List<Participant> participants) throws Refusal {
        if (node.isEmpty()) {
            return OptionalDouble.empty();
        }
        if (node.get() instanceof Node.Scalar quotient) {
            return OptionalDouble.of(StrictMath.log(positive("Q", quotient.value())));
        }
        Map<String, Node> stated = new SettingsReader(node.get(), "the composition", List.of()).members();
        double sum = 0;
        int used = 0;
        for (Participant one : participants) {
            OptionalDouble activity = OptionalDouble.empty();
            for (Map.Entry<String, Node> entry : stated.entrySet()) {
                if (names(entry.getKey(), one.data().species())) {
                    activity = OptionalDouble.of(activity(entry.getKey(), entry.getValue(), one));
                    used++;
                }
            }
            Phase phase = one.data().species().phase().orElse(Phase.GAS);
            if (activity.isEmpty() && (phase == Phase.GAS || phase == Phase.AQUEOUS)) {
                throw new Refusal(
                        "The composition lacks " + one.data().species().text()
                                + "; state its " + (phase == Phase.GAS ? "partial pressure" : "concentration")
                                + ". Pure liquids and solids may be left out.");
            }
            sum += one.coefficient() * StrictMath.log(activity.orElse(1));
        }
        if (used < stated.size()) {
            throw new Refusal(
                    "The composition names a species that takes no part: " + String.join(", ", stated.keySet()) + ".");
        }
        return OptionalDouble.of(sum);
    }

    /** Whether a name means a species; the phase may be left out. */
    static boolean names(String text, Species species) throws Refusal {
        try {
            Species named = Species.parse(text);
            return named.formula().equals(species.formula())
                    && (named.phase().isEmpty() || named.phase().equals(species.phase()));
        } catch (ReactionException wrong) {
            throw new Refusal("The species \"" + text + "\" cannot be read: found " + wrong.found() + ", expected "
                    + wrong.expected() + ".");
        }
    }

    private static double activity(String key, Node node, Participant one) throws Refusal {
        if (node instanceof Node.Scalar scalar) {
            return positive(key, scalar.value());
        }
        if (!(node instanceof Node.Quantity quantity) || quantity.value().isEmpty()) {
            throw new Refusal("The composition of " + key + " must be a quantity or a plain activity.");
        }
        Phase phase = one.data().species().phase().orElse(Phase.GAS);
        try {
            Unit unit = Units.parse(quantity.unit());
            double si = unit.toSi(quantity.value().getAsDouble());
            if (phase == Phase.GAS && unit.dimension().equals(Dimension.PRESSURE)) {
                return positive(key, si / BAR);
            }
            if (phase == Phase.AQUEOUS && unit.dimension().equals(Dimension.CONCENTRATION)) {
                return positive(key, si / MOLAR);
            }
        } catch (UnitException wrong) {
            throw new Refusal("The unit of the composition of " + key + " cannot be used: found " + wrong.found()
                    + ", expected " + wrong.expected() + ".");
        }
        throw new Refusal("The composition of " + key + " must be "
                + (phase == Phase.GAS
                        ? "a partial pressure"
                        : phase == Phase.AQUEOUS ? "a concentration" : "a plain activity")
                + ", found the unit " + quantity.unit()
                + ".");
    }

    private static double positive(String key, double value) throws Refusal {
        if (!(value > 0 && value < Double.POSITIVE_INFINITY)) {
            throw new Refusal("The composition of " + key + " must be above zero: ln Q has no value otherwise.");
        }
        return value;
    }
}
