package org.saddlebook.spontaneity.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.reaction.api.Phase;
import org.saddlebook.reaction.api.Species;

/** Reads what is there at the start and writes what is there at equilibrium, at every temperature of the table. */
final class EquilibriumReader {
    private static final List<String> KEYS = List.of("amounts", "inert", "pressure", "volume");
    private static final Dimension AMOUNT = new Dimension(0, 0, 0, 0, 1);
    private static final Dimension VOLUME = new Dimension(0, 3, 0, 0, 0);
    private static final double BAR = 1e5;
    private static final double LITRE = 1e-3;

    private final List<Species> species = new ArrayList<>();
    private final List<EquilibriumExtent.Member> members = new ArrayList<>();
    private final EquilibriumExtent start;

    EquilibriumReader(Node node, List<Participant> participants) throws Refusal {
        SettingsReader settings = new SettingsReader(node, "the equilibrium", KEYS);
        if (settings.node("amounts").isEmpty()) {
            throw new Refusal("The equilibrium needs amounts: species to amount at the start, in mol.");
        }
        SettingsReader amounts = new SettingsReader(settings.node("amounts").get(), "the amounts", List.of());
        int used = 0;
        boolean gases = false;
        boolean solutes = false;
        for (Participant one : participants) {
            double amount = 0;
            for (Map.Entry<String, Node> entry : amounts.members().entrySet()) {
                if (Composition.names(entry.getKey(), one.data().species())) {
                    amount = amount(amounts, entry.getKey(), entry.getValue());
                    used++;
                }
            }
            Phase phase = one.data().species().phase().orElse(Phase.GAS);
            gases |= phase == Phase.GAS;
            solutes |= phase == Phase.AQUEOUS;
            species.add(one.data().species());
            members.add(new EquilibriumExtent.Member(
                    one.coefficient(),
                    amount,
                    phase == Phase.GAS
                            ? EquilibriumExtent.Kind.GAS
                            : phase == Phase.AQUEOUS ? EquilibriumExtent.Kind.SOLUTE : EquilibriumExtent.Kind.PURE));
        }
        if (used < amounts.members().size()) {
            throw new Refusal("The amounts name a species that takes no part; state an inert gas under inert.");
        }
        double bar = gases ? positive(settings.quantity("pressure", Dimension.PRESSURE, "bar"), "pressure") / BAR : 1;
        double litres = solutes ? positive(settings.quantity("volume", VOLUME, "L"), "volume") / LITRE : 1;
        double inert = settings.node("inert").isPresent()
                ? amount(settings, "inert", settings.node("inert").get())
                : 0;
        start = new EquilibriumExtent(members, inert, bar, litres);
        if (!(start.lower() < start.upper())) {
            throw new Refusal("Nothing can react: at the start a reactant and a product are both missing.");
        }
        if (Double.isInfinite(start.lower()) || Double.isInfinite(start.upper())) {
            throw new Refusal("An equilibrium needs species on both sides of the equation.");
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

    /** One temperature: extent, conversion of the limiting reactant, amounts and sensitivities. */
    Node row(ReactionFunction function, double kelvin, boolean uncertain, List<String> cautions) {
        double rt = Constants.GAS * kelvin;
        EquilibriumExtent.Answer answer = start.at(-function.gibbs(kelvin) / rt);
        double u = Math.abs(answer.perLnK()) * function.uncertaintyOfGibbs(kelvin) / rt;
        Map<String, Node> row = new LinkedHashMap<>();
        row.put("temperature", Node.Quantity.of(kelvin, "K"));
        row.put("extent", quantity(answer.extent(), "mol", u, uncertain).withCautions(cautions));
        if (start.upper() > 0) {
            row.put(
                    "conversion",
                    quantity(answer.extent() / start.upper(), "1", u / start.upper(), uncertain)
                            .withCautions(cautions));
        }
        Map<String, Node> amounts = new LinkedHashMap<>();
        for (int i = 0; i < members.size(); i++) {
            double n = members.get(i).amount() + members.get(i).coefficient() * answer.extent();
            amounts.put(species.get(i).text(), Node.Quantity.of(Math.max(0, n), "mol"));
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
