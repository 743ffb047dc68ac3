package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.Conditions;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.model.Transmission;
import org.saddlebook.api.model.Tunnelling;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/** Writes and reads the context that every law was bound to. */
public final class ContextNode {
    private static final double PER_CENTIMETRE = 100;

    private ContextNode() {}

    /**
     * The context with what surrounds the rate constant.
     *
     * @param kelvin where the transmission coefficient is stated, K
     */
    static Node.Group of(Surroundings surroundings, boolean assumedStandard, List<Double> kelvin) {
        RateContext context = surroundings.context();
        Tree tree = new Tree();
        of(context, assumedStandard).members().forEach(tree::put);
        if (!context.conditions().isEmpty()) {
            Tree conditions = new Tree();
            context.conditions()
                    .values()
                    .forEach((name, value) -> conditions.put(name, Node.Quantity.of(value, unit(name))));
            tree.put("conditions", conditions.group()).put("conditionsAssumed", surroundings.thirdBodyAssumed());
        }
        if (context.tunnelling().isPresent()) {
            Tree stated = new Tree().put("model", context.tunnelling().get().modelId());
            context.tunnelling()
                    .get()
                    .values()
                    .forEach((name, value) -> stated.put(
                            name,
                            name.equals(Tunnelling.WAVENUMBER)
                                    ? Node.Quantity.of(value / PER_CENTIMETRE, "1/cm")
                                    : Node.Quantity.of(value, "J/mol")));
            if (context.transmissionLaw().isPresent()) {
                stated.put("coefficients", coefficients(context, kelvin));
            }
            tree.put("tunnelling", stated.group());
        }
        return tree.group();
    }

    private static String unit(String condition) {
        return condition.equals(Conditions.PRESSURE) ? "Pa" : "mol/m3";
    }

    /** κ at some temperatures, the constant factor included; those at which it has no value are left out. */
    private static Node.Items coefficients(RateContext context, List<Double> kelvin) {
        Transmission law = context.transmissionLaw().orElseThrow();
        List<Node> rows = new ArrayList<>();
        for (double t : kelvin) {
            if (law.defined(t)) {
                rows.add(new Tree()
                        .put("temperature", Node.Quantity.of(t, "K"))
                        .put("kappa", context.transmission() * StrictMath.exp(law.lnCoefficient(t)))
                        .group());
            }
        }
        return new Node.Items(rows);
    }

    public static Node.Group of(RateContext context, boolean assumedStandard) {
        boolean pressure = context.standard().kind() == StandardState.Kind.PRESSURE;
        return new Tree()
                .put("rateUnit", context.rateUnit().code())
                .put("order", context.order())
                .put("standardState", Node.Quantity.of(context.standard().value(), pressure ? "Pa" : "mol/m3"))
                .put("standardStateText", Units.text(context.standard()))
                .put("standardStateAssumed", assumedStandard)
                .put("transmission", context.transmission())
                .put("referenceTemperature", Node.Quantity.of(context.referenceKelvin(), "K"))
                .group();
    }

    /** The context written by {@link #of}; throws {@link IllegalArgumentException} for a group that is not one. */
    public static RateContext read(Node.Group group) {
        Node.Quantity standard = TreeReader.quantity(group, "standardState");
        Unit unit;
        try {
            unit = Units.parse(TreeReader.text(group, "rateUnit"));
        } catch (UnitException unreadable) {
            throw new IllegalArgumentException(unreadable.getMessage(), unreadable);
        }
        RateContext context = RateContext.of(unit, TreeReader.number(group, "order"))
                .withStandard(new StandardState(
                        standard.unit().equals("Pa") ? StandardState.Kind.PRESSURE : StandardState.Kind.CONCENTRATION,
                        standard.value().orElseThrow()))
                .withTransmission(TreeReader.number(group, "transmission"))
                .withReferenceKelvin(TreeReader.quantity(group, "referenceTemperature")
                        .value()
                        .orElseThrow());
        if (group.get("conditions").isPresent()) {
            Conditions conditions = Conditions.NONE;
            Node.Group stated = TreeReader.group(group, "conditions");
            for (String name : stated.members().keySet()) {
                conditions = conditions.with(
                        name, TreeReader.quantity(stated, name).value().orElseThrow());
            }
            context = context.withConditions(conditions);
        }
        return group.get("tunnelling").isPresent()
                ? context.withTunnelling(tunnelling(TreeReader.group(group, "tunnelling")))
                : context;
    }

    private static Tunnelling tunnelling(Node.Group group) {
        Tunnelling stated = Tunnelling.by(TreeReader.text(group, "model"));
        for (Map.Entry<String, Node> member : group.members().entrySet()) {
            if (member.getValue() instanceof Node.Quantity quantity) {
                double value = quantity.value().orElseThrow();
                stated = stated.with(member.getKey(), quantity.unit().equals("1/cm") ? value * PER_CENTIMETRE : value);
            }
        }
        return stated;
    }
}
