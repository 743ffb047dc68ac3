package org.saddlebook.spontaneity.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.reaction.api.Phase;
import org.saddlebook.spontaneity.api.EquilibriumExtent;
import org.saddlebook.spontaneity.api.EquilibriumStart;

/**
 * Reads what is there at the start and writes what is there at equilibrium, at every temperature of the table. Species are
 * those of the equation, or, where ΔH and ΔS or a table of K are stated, those named under {@code species}.
 */
final class EquilibriumReader {
    private static final List<String> KEYS = List.of("amounts", "species", "inert", "pressure", "volume");
    private static final Dimension AMOUNT = new Dimension(0, 0, 0, 0, 1);
    private static final Dimension VOLUME = new Dimension(0, 3, 0, 0, 0);
    private static final double BAR = 1e5;
    private static final double LITRE = 1e-3;

    private final List<String> names = new ArrayList<>();
    private final List<EquilibriumExtent.Member> members = new ArrayList<>();
    private final EquilibriumStart start;

    private EquilibriumReader(Node node, List<Participant> participants, Optional<StandardState> standard)
            throws Refusal {
        SettingsReader settings = new SettingsReader(node, "the equilibrium", KEYS);
        if (participants.isEmpty()) {
            named(settings);
        } else {
            ofEquation(settings, participants);
        }
        boolean gases = false;
        boolean solutes = false;
        double gasChange = 0;
        double soluteChange = 0;
        for (EquilibriumExtent.Member one : members) {
            gases |= one.kind() == EquilibriumExtent.Kind.GAS;
            solutes |= one.kind() == EquilibriumExtent.Kind.SOLUTE;
            gasChange += one.kind() == EquilibriumExtent.Kind.GAS ? one.coefficient() : 0;
            soluteChange += one.kind() == EquilibriumExtent.Kind.SOLUTE ? one.coefficient() : 0;
        }
        double bar = gases ? positive(settings.quantity("pressure", Dimension.PRESSURE, "bar"), "pressure") / BAR : 1;
        double litres = solutes ? positive(settings.quantity("volume", VOLUME, "L"), "volume") / LITRE : 1;
        double inert = settings.node("inert").isPresent()
                ? amount(settings, "inert", settings.node("inert").get())
                : 0;
        start = new EquilibriumStart(
                new EquilibriumExtent(members, inert, bar, litres), shift(standard, gasChange, soluteChange));
        if (Double.isInfinite(extent().lower()) || Double.isInfinite(extent().upper())) {
            throw new Refusal("An equilibrium needs species on both sides of the equation.");
        }
        if (!(extent().lower() < extent().upper())) {
            throw new Refusal("Nothing can react: at the start a reactant and a product are both missing.");
        }
    }

    /** For the species of an equation, whose ln K has standard states 1 bar and 1 mol/L. */
    static EquilibriumReader of(Node node, List<Participant> participants) throws Refusal {
        return new EquilibriumReader(node, participants, Optional.empty());
    }

    /**
     * For species named in the settings.
     *
     * @param standard standard state of ln K; empty for 1 bar and 1 mol/L
     */
    static EquilibriumReader named(Node node, Optional<StandardState> standard) throws Refusal {
        return new EquilibriumReader(node, List.of(), standard);
    }

    /** What turns ln K of one standard state into that of 1 bar and 1 mol/L: {@code Δν ln(p°/1 bar)}, {@code Δν ln(c°/1 M)}. */
    private static double shift(Optional<StandardState> standard, double gasChange, double soluteChange)
            throws Refusal {
        if (standard.isEmpty()) {
            return 0;
        }
        boolean pressure = standard.get().kind() == StandardState.Kind.PRESSURE;
        if ((pressure ? soluteChange : gasChange) != 0) {
            throw new Refusal("The standard state of K is a " + (pressure ? "pressure" : "concentration")
                    + ", but the number of " + (pressure ? "solutes" : "gas molecules")
                    + " changes in the equilibrium: state K for the standard state of what reacts.");
        }
        StandardState own = pressure ? StandardState.ONE_BAR : StandardState.ONE_MOLAR;
        double change = pressure ? gasChange : soluteChange;
        return change == 0 ? 0 : change * StrictMath.log(standard.get().value() / own.value());
    }

    private void ofEquation(SettingsReader settings, List<Participant> participants) throws Refusal {
        if (settings.node("species").isPresent()) {
            throw new Refusal("The equilibrium of an equation has its species; leave species out and state amounts.");
        }
        if (settings.node("amounts").isEmpty()) {
            throw new Refusal("The equilibrium needs amounts: species to amount at the start, in mol.");
        }
        SettingsReader amounts = new SettingsReader(settings.node("amounts").get(), "the amounts", List.of());
        int used = 0;
        for (Participant one : participants) {
            double amount = 0;
            for (Map.Entry<String, Node> entry : amounts.members().entrySet()) {
                if (Composition.names(entry.getKey(), one.data().species())) {
                    amount = amount(amounts, entry.getKey(), entry.getValue());
                    used++;
                }
            }
            names.add(one.data().species().text());
            members.add(new EquilibriumExtent.Member(
                    one.coefficient(), amount, kind(one.data().species().phase().orElse(Phase.GAS))));
        }
        if (used < amounts.members().size()) {
            throw new Refusal("The amounts name a species that takes no part; state an inert gas under inert.");
        }
    }

    private static EquilibriumExtent.Kind kind(Phase phase) {
        return switch (phase) {
            case GAS -> EquilibriumExtent.Kind.GAS;
            case AQUEOUS -> EquilibriumExtent.Kind.SOLUTE;
            case LIQUID, SOLID -> EquilibriumExtent.Kind.PURE;
        };
    }

    private void named(SettingsReader settings) throws Refusal {
        if (settings.node("amounts").isPresent() || settings.node("species").isEmpty()) {
            throw new Refusal(
                    "Without an equation the equilibrium needs species: name to coefficient (reactants negative),"
                            + " phase (g, l, s, aq) and amount in mol.");
        }
        SettingsReader species = new SettingsReader(settings.node("species").get(), "the species", List.of());
        for (Map.Entry<String, Node> entry : species.members().entrySet()) {
            String name = "the species " + entry.getKey() + " of the equilibrium";
            SettingsReader one = new SettingsReader(entry.getValue(), name, List.of("coefficient", "phase", "amount"));
            double coefficient = one.scalar("coefficient").orElse(0);
            if (!(Math.abs(coefficient) > 0 && Math.abs(coefficient) < 1000)) {
                throw new Refusal(
                        "In " + name + " coefficient must be a number other than zero, negative for a reactant.");
            }
            EquilibriumExtent.Kind kind = null;
            for (Phase phase : Phase.values()) {
                kind = phase.symbol().equals(one.text("phase").orElse("")) ? kind(phase) : kind;
            }
            if (kind == null) {
                throw new Refusal("In " + name + " phase must be g, l, s or aq (aq for every dissolved species).");
            }
            double amount = one.node("amount").isPresent()
                    ? amount(one, "amount", one.node("amount").get())
                    : 0;
            names.add(entry.getKey());
            members.add(new EquilibriumExtent.Member(coefficient, amount, kind));
        }
    }

    private static double amount(SettingsReader reader, String key, Node node) throws Refusal {
        double amount = node instanceof Node.Scalar scalar
                ? scalar.value()
                : reader.quantity(node, key, AMOUNT, "mol").value();
        if (!(amount >= 0 && amount < 1e12)) {
            throw new Refusal("The amount of " + key + " must not be negative.");
        }
        return amount;
    }

    private static double positive(SettingsReader.Si si, String key) throws Refusal {
        if (!(si.value() > 0)) {
            throw new Refusal("In the equilibrium the " + key + " must be above zero.");
        }
        return si.value();
    }

    private EquilibriumExtent extent() {
        return start.extent();
    }

    /** Adds the start and the rows to a body. */
    void write(
            Map<String, Node> body,
            GibbsFunction function,
            Iterable<Double> kelvins,
            boolean uncertain,
            List<String> cautions) {
        List<Node> rows = new ArrayList<>();
        for (double kelvin : kelvins) {
            rows.add(row(function, kelvin, uncertain, cautions));
        }
        body.put(EquilibriumStart.KEY, start.node(names));
        body.put("equilibrium", new Node.Items(rows));
    }

    /** One temperature: extent, conversion of the limiting reactant, amounts and sensitivities. */
    private Node row(GibbsFunction function, double kelvin, boolean uncertain, List<String> cautions) {
        double rt = Constants.GAS * kelvin;
        EquilibriumExtent.Answer answer = extent().at(-function.gibbs(kelvin) / rt + start.lnShift());
        double u = Math.abs(answer.perLnK()) * function.uncertaintyOfGibbs(kelvin) / rt;
        Map<String, Node> row = new LinkedHashMap<>();
        row.put("temperature", Node.Quantity.of(kelvin, "K"));
        row.put("extent", quantity(answer.extent(), "mol", u, uncertain).withCautions(cautions));
        if (extent().upper() > 0) {
            double conversion = answer.extent() / extent().upper();
            row.put(
                    "conversion",
                    quantity(conversion, "1", u / extent().upper(), uncertain).withCautions(cautions));
        }
        Map<String, Node> amounts = new LinkedHashMap<>();
        for (int i = 0; i < members.size(); i++) {
            double n = members.get(i).amount() + members.get(i).coefficient() * answer.extent();
            amounts.put(names.get(i), Node.Quantity.of(Math.max(0, n), "mol").withCautions(cautions));
        }
        row.put("amounts", new Node.Group(amounts));
        row.put("outcome", new Node.Text(answer.usedUp() ? "a species is used up" : "equilibrium"));
        row.put("extentPerLnK", new Node.Scalar(answer.perLnK()));
        row.put("extentPerKelvin", new Node.Scalar(answer.perLnK() * function.enthalpy(kelvin) / (rt * kelvin)));
        row.put("extentPerLnPressure", new Node.Scalar(answer.perLnPressure()));
        return new Node.Group(row);
    }

    private static Node.Quantity quantity(double value, String unit, double u, boolean uncertain) {
        return uncertain ? Node.Quantity.of(value, unit, u) : Node.Quantity.of(value, unit);
    }
}
