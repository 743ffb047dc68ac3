package org.saddlebook.barrier.internal;

import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/** Writes and reads the context that every law was bound to. */
public final class ContextNode {
    private ContextNode() {}

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
        return RateContext.of(unit, TreeReader.number(group, "order"))
                .withStandard(new StandardState(
                        standard.unit().equals("Pa") ? StandardState.Kind.PRESSURE : StandardState.Kind.CONCENTRATION,
                        standard.value().orElseThrow()))
                .withTransmission(TreeReader.number(group, "transmission"))
                .withReferenceKelvin(TreeReader.quantity(group, "referenceTemperature")
                        .value()
                        .orElseThrow());
    }
}
