package org.saddlebook.barrier.internal;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Supplier;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.Conditions;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.RateModel;
import org.saddlebook.api.model.Tunnelling;
import org.saddlebook.api.model.TunnellingModel;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/**
 * What the settings say about a rate constant beside its table: the third body that predictions hold for, and tunnelling.
 *
 * @param context the context with both
 * @param thirdBodyAssumed whether no third body is stated and the middle of the table stands for it
 * @param trouble why the stated tunnelling could not be applied, as a sentence; empty when it could, or none is stated
 */
record Surroundings(RateContext context, boolean thirdBodyAssumed, String trouble) {
    static final String THIRD_BODY = "thirdBody";
    static final String TUNNELLING = "tunnelling";

    private static final Dimension WAVENUMBER = new Dimension(0, -1, 0, 0, 0);
    private static final Map<String, Dimension> BARRIER = Map.of(
            Tunnelling.WAVENUMBER, WAVENUMBER,
            Tunnelling.FORWARD_BARRIER, Dimension.MOLAR_ENERGY,
            Tunnelling.REVERSE_BARRIER, Dimension.MOLAR_ENERGY);

    /**
     * The surroundings that settings state.
     *
     * @param base the context without them
     * @param corrections the installed tunnelling corrections, asked for only when tunnelling is stated
     * @throws IllegalArgumentException with a sentence when a setting cannot be used
     */
    static Surroundings of(
            RateContext base, Optional<Node> settings, Measurements data, Supplier<List<TunnellingModel>> corrections) {
        if (!(settings.orElse(null) instanceof Node.Group group)) {
            return inTheMiddle(base, data, "");
        }
        RateContext context = base;
        String trouble = "";
        if (group.get(TUNNELLING).isPresent()) {
            context = context.withTunnelling(tunnelling(TreeReader.group(group, TUNNELLING)));
            try {
                RateContext resolved = TunnellingModel.resolve(context, corrections.get());
                trouble = undefined(resolved, data);
                context = trouble.isEmpty() ? resolved : context;
            } catch (Inapplicable refused) {
                trouble = String.valueOf(refused.getMessage());
            }
        }
        return group.get(THIRD_BODY).isPresent()
                ? new Surroundings(
                        context.withConditions(thirdBody(TreeReader.quantity(group, THIRD_BODY))), false, trouble)
                : inTheMiddle(context, data, trouble);
    }

    /** Without a statement the geometric middle of the table stands for the third body, where the table has one. */
    private static Surroundings inTheMiddle(RateContext context, Measurements data, String trouble) {
        double sum = 0;
        List<Conditions> conditions = data.conditions();
        for (int i = 0; i < data.size(); i++) {
            if (!conditions.get(i).has(Conditions.THIRD_BODY)) {
                return new Surroundings(context, false, trouble);
            }
            sum += StrictMath.log(conditions.get(i).thirdBody(data.kelvin(i)).orElseThrow());
        }
        return new Surroundings(
                context.withConditions(Conditions.NONE.with(Conditions.THIRD_BODY, StrictMath.exp(sum / data.size()))),
                true,
                trouble);
    }

    private static String undefined(RateContext resolved, Measurements data) {
        for (double kelvin : data.kelvin()) {
            if (!resolved.transmissionLaw().orElseThrow().defined(kelvin)) {
                return resolved.transmissionLaw().orElseThrow().limit() + " The table has a point at "
                        + Words.kelvin(kelvin) + ".";
            }
        }
        return "";
    }

    /** Why a model cannot be fitted to this table for want of a condition, as a sentence; empty when nothing is missing. */
    static String missing(RateModel model, Measurements data) {
        Set<String> needed = model.conditions();
        for (String name : needed) {
            for (int i = 0; i < data.size(); i++) {
                if (!data.conditions().get(i).has(name)) {
                    return "The law depends on "
                            + (name.equals(Conditions.THIRD_BODY)
                                    ? "the concentration of the third body, which the table does not state for every point:"
                                            + " add a column such as \"[M] (molecule cm-3)\", or the pressure, \"p (bar)\"."
                                    : "the condition " + name + ", which the table does not state for every point.");
                }
            }
        }
        return "";
    }

    private static Tunnelling tunnelling(Node.Group group) {
        Tunnelling stated = Tunnelling.by(TreeReader.text(group, "model"));
        for (String key : group.members().keySet()) {
            if (!key.equals("model")) {
                Dimension dimension = BARRIER.get(key);
                if (dimension == null) {
                    throw new IllegalArgumentException("Unknown setting barrier.tunnelling." + key
                            + "; known are model, wavenumber, forwardBarrier, reverseBarrier.");
                }
                stated = stated.with(key, positive(TreeReader.quantity(group, key), "tunnelling." + key, dimension));
            }
        }
        return stated;
    }

    private static Conditions thirdBody(Node.Quantity quantity) {
        boolean pressure = unit(quantity, THIRD_BODY).dimension().equals(Dimension.PRESSURE);
        return Conditions.NONE.with(
                pressure ? Conditions.PRESSURE : Conditions.THIRD_BODY,
                positive(quantity, THIRD_BODY, pressure ? Dimension.PRESSURE : Dimension.CONCENTRATION));
    }

    private static double positive(Node.Quantity quantity, String key, Dimension dimension) {
        Unit unit = unit(quantity, key);
        if (!unit.dimension().equals(dimension)) {
            throw new IllegalArgumentException(
                    "The setting barrier." + key + " has the unit " + quantity.unit() + ", which is of another kind.");
        }
        double value = unit.toSi(quantity.value().orElse(Double.NaN));
        if (!(value > 0) || Double.isInfinite(value)) {
            throw new IllegalArgumentException("The setting barrier." + key + " must be positive.");
        }
        return value;
    }

    private static Unit unit(Node.Quantity quantity, String key) {
        try {
            return Units.parse(quantity.unit());
        } catch (UnitException unknown) {
            throw new IllegalArgumentException("The setting barrier." + key + ": " + unknown.getMessage(), unknown);
        }
    }
}
