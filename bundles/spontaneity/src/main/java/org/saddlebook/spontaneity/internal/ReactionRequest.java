package org.saddlebook.spontaneity.internal;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Node;
import org.saddlebook.reaction.api.Equation;
import org.saddlebook.reaction.api.ReactionException;
import org.saddlebook.thermo.data.api.Joint;
import org.saddlebook.thermo.data.api.SpeciesSource;

/**
 * What was asked about a reaction equation.
 *
 * @param equation balanced
 * @param participants data of every species
 * @param lowerKelvin lower end of the range, K
 * @param upperKelvin upper end
 * @param extrapolated whether the range goes beyond the data of a species
 * @param lnQ ln of the reaction quotient; empty for standard states
 * @param settings the settings it was read from
 */
record ReactionRequest(
        Equation equation,
        List<Participant> participants,
        double lowerKelvin,
        double upperKelvin,
        boolean extrapolated,
        OptionalDouble lnQ,
        SettingsReader settings) {
    static final List<String> KEYS = List.of(
            "reaction", "source", "species", "range", "extrapolate", "composition", "standardState", "equilibrium");

    /** Whether the species' heat capacities are all known. */
    boolean heatCapacitiesKnown() {
        for (Participant one : participants) {
            if (!one.data().heatCapacityKnown()) {
                return false;
            }
        }
        return true;
    }

    /**
     * Reads the settings; the range is empty of meaning (both ends 298.15 K) where a heat capacity is not known.
     *
     * @throws Refusal with a sentence for the user
     */
    static ReactionRequest read(Node node, List<SpeciesSource> sources) throws Refusal {
        SettingsReader settings = new SettingsReader(node, "the settings of spontaneity", KEYS);
        Equation equation = equation(settings.text("reaction").orElse(""));
        Optional<String> standard = settings.text("standardState");
        if (standard.isPresent() && !standard.get().replace(" ", "").equals("1bar")) {
            throw new Refusal(
                    "Species data hold for a standard pressure of 1 bar; leave standardState out or state 1 bar.");
        }
        List<Participant> participants =
                SpeciesResolver.resolve(equation, sources, settings.text("source"), settings.node("species"));
        OptionalDouble lnQ = Composition.lnQ(settings.node("composition"), participants);
        ReactionRequest bare = new ReactionRequest(equation, participants, 0, 0, false, lnQ, settings);
        return bare.heatCapacitiesKnown() ? bare.withRange() : bare;
    }

    static Equation equation(String text) throws Refusal {
        try {
            return Equation.parseBalanced(text);
        } catch (ReactionException wrong) {
            throw new Refusal("The equation \"" + text + "\" cannot be used: found " + wrong.found() + " at character "
                    + wrong.character() + ", expected " + wrong.expected() + ". " + wrong.remedy());
        }
    }

    private ReactionRequest withRange() throws Refusal {
        double low = 0;
        double high = Double.POSITIVE_INFINITY;
        for (Participant one : participants) {
            low = Math.max(low, one.data().lowerKelvin());
            high = Math.min(high, one.data().upperKelvin());
        }
        double from = low;
        double to = high;
        boolean beyond = false;
        if (settings.node("range").isPresent()) {
            SettingsReader range =
                    new SettingsReader(settings.node("range").get(), "the range", List.of("lower", "upper"));
            from = range.kelvin("lower");
            to = range.kelvin("upper");
            if (!(from < to)) {
                throw new Refusal("The lower end of the range of temperatures must lie below its upper end.");
            }
            beyond = from < low || to > high;
        }
        if (beyond && !settings.flag("extrapolate")) {
            throw new Refusal("The range goes beyond the data: " + limits(from, to)
                    + ". Narrow the range, or state extrapolate: true to go on with a caution.");
        }
        if (!(from < to)) {
            throw new Refusal("The data of the species have no temperature in common: " + limits(to, from)
                    + ". Choose another source, or state a range and extrapolate: true.");
        }
        for (Participant one : participants) {
            for (Joint joint : one.data().joints()) {
                if (joint.kind() == Joint.Kind.GAP && joint.lowerKelvin() < to && joint.upperKelvin() > from) {
                    throw new Refusal("The data of " + one.data().species().text() + " have a gap from "
                            + Words.kelvin(joint.lowerKelvin()) + " to " + Words.kelvin(joint.upperKelvin())
                            + "; state a range on one side of it.");
                }
            }
        }
        return new ReactionRequest(equation, participants, from, to, beyond, lnQ, settings);
    }

    /** The species whose data do not reach so far. */
    private String limits(double from, double to) {
        StringBuilder text = new StringBuilder();
        for (Participant one : participants) {
            if (one.data().lowerKelvin() > from || one.data().upperKelvin() < to) {
                text.append(text.length() == 0 ? "" : ", ")
                        .append(one.data().species().text())
                        .append(" is known from ")
                        .append(Words.kelvin(one.data().lowerKelvin()))
                        .append(" to ")
                        .append(Words.kelvin(one.data().upperKelvin()));
            }
        }
        return text.toString();
    }
}
