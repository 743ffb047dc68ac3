package org.saddlebook.spontaneity.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.reaction.api.Equation;
import org.saddlebook.reaction.api.Fraction;
import org.saddlebook.reaction.api.ReactionException;
import org.saddlebook.reaction.api.Species;
import org.saddlebook.thermo.data.api.BrokenSourceException;
import org.saddlebook.thermo.data.api.PowerSegment;
import org.saddlebook.thermo.data.api.SpeciesData;
import org.saddlebook.thermo.data.api.SpeciesSource;

/** Finds data for every species of an equation: what the campaign states first, then the sources in their order. */
final class SpeciesResolver {
    static final String STATED = "campaign";

    /** A stated heat capacity is taken as constant over this range unless the campaign says otherwise, K. */
    private static final double STATED_LOWEST = 200;

    private static final double STATED_HIGHEST = 1000;

    /** Beyond these a stated value is a slip of unit (common practice, no source): J/mol and J/(mol K). */
    private static final double LARGEST_ENTHALPY = 2e7;

    private static final double LARGEST_ENTROPY = 20_000;

    private final List<SpeciesSource> sources;
    private final Optional<String> wanted;
    private final Map<Species, SpeciesData> stated;

    private SpeciesResolver(List<SpeciesSource> sources, Optional<String> wanted, Map<Species, SpeciesData> stated) {
        this.sources = sources;
        this.wanted = wanted;
        this.stated = stated;
    }

    /**
     * What takes part, in order of writing.
     *
     * @param sources in the order in which they are asked
     * @param wanted id of a source, or of a kind of data; empty for the first that has the species
     * @param statedNode species to values, from the settings; empty for none
     */
    static List<Participant> resolve(
            Equation equation, List<SpeciesSource> sources, Optional<String> wanted, Optional<Node> statedNode)
            throws Refusal {
        Map<Species, SpeciesData> stated = new LinkedHashMap<>();
        if (statedNode.isPresent()) {
            for (Map.Entry<String, Node> entry : new SettingsReader(
                            statedNode.get(), "the species of spontaneity", List.of())
                    .members()
                    .entrySet()) {
                SpeciesData data = stated(entry.getKey(), entry.getValue());
                stated.put(data.species(), data);
            }
        }
        SpeciesResolver resolver = new SpeciesResolver(sources, wanted, stated);
        List<Participant> participants = new ArrayList<>();
        for (Map.Entry<Species, Fraction> entry : equation.net().entrySet()) {
            participants.add(
                    resolver.participant(entry.getKey(), entry.getValue().doubleValue()));
        }
        if (participants.isEmpty()) {
            throw new Refusal("The equation " + equation.text()
                    + " has the same species on both sides; nothing is left to compute.");
        }
        return participants;
    }

    private static SpeciesData stated(String key, Node node) throws Refusal {
        Species species;
        try {
            species = Species.parse(key);
        } catch (ReactionException wrong) {
            throw new Refusal("The species \"" + key + "\" cannot be read: found " + wrong.found() + ", expected "
                    + wrong.expected() + "; " + wrong.remedy());
        }
        String name = "the species " + key;
        SettingsReader reader = new SettingsReader(node, name, List.of("dHf", "S", "Cp", "lower", "upper"));
        SettingsReader.Si h = reader.quantity("dHf", Dimension.MOLAR_ENERGY, "kJ/mol");
        SettingsReader.Si s = reader.quantity("S", Dimension.MOLAR_ENTROPY, "J/(mol.K)");
        if (Math.abs(h.value()) > LARGEST_ENTHALPY || Math.abs(s.value()) > LARGEST_ENTROPY) {
            throw new Refusal(
                    "In " + name + " dHf or S is larger than any known one; check whether J and kJ were mixed.");
        }
        SpeciesData data;
        if (reader.node("Cp").isPresent()) {
            double cp =
                    reader.quantity("Cp", Dimension.MOLAR_ENTROPY, "J/(mol.K)").value();
            double lower = reader.node("lower").isPresent() ? reader.kelvin("lower") : STATED_LOWEST;
            double upper = reader.node("upper").isPresent() ? reader.kelvin("upper") : STATED_HIGHEST;
            if (!(lower < upper)) {
                throw new Refusal("The lower end of the range of " + key + " must lie below its upper end.");
            }
            double[] powers = {0, 0, cp, 0, 0, 0, 0};
            data = SpeciesData.of(
                    species,
                    STATED,
                    "stated in the campaign",
                    List.of(PowerSegment.from298(lower, upper, powers, h.value(), s.value())));
        } else {
            data = SpeciesData.constants(species, STATED, "stated in the campaign", h.value(), s.value());
        }
        return data.withUncertainties(h.uncertainty(), s.uncertainty());
    }

    private Participant participant(Species species, double coefficient) throws Refusal {
        if (stated.containsKey(species)) {
            return new Participant(coefficient, stated.get(species), STATED);
        }
        List<Participant> found = new ArrayList<>();
        Set<String> others = new TreeSet<>();
        for (SpeciesSource source : sources) {
            for (SpeciesData data : asked(source, species)) {
                boolean fits = wanted.isEmpty()
                        || wanted.get().equals(source.id())
                        || wanted.get().equals(data.source());
                if (fits) {
                    found.add(new Participant(coefficient, data, source.id()));
                } else {
                    others.add(data.source());
                }
            }
        }
        if (found.isEmpty()) {
            throw new Refusal(missing(species, others));
        }
        Set<String> phases = new TreeSet<>();
        for (Participant one : found) {
            phases.add(one.data().species().text());
        }
        if (phases.size() > 1) {
            throw new Refusal("There are data of " + String.join(", ", phases) + ": write the phase of "
                    + species.text() + " in the equation.");
        }
        return found.get(0);
    }

    private static List<SpeciesData> asked(SpeciesSource source, Species species) throws Refusal {
        try {
            return source.find(species);
        } catch (BrokenSourceException broken) {
            throw new Refusal("The species source " + source.id() + " cannot be used. " + broken.getMessage());
        }
    }

    private String missing(Species species, Set<String> others) throws Refusal {
        String text = species.text();
        if (!others.isEmpty()) {
            return "The source " + wanted.orElse("") + " has no data of " + text + "; found in: "
                    + String.join(", ", others) + ".";
        }
        Set<String> phases = new TreeSet<>();
        for (SpeciesSource source : sources) {
            for (SpeciesData data : asked(source, new Species(species.formula(), Optional.empty(), ""))) {
                phases.add(data.species().text());
            }
        }
        return phases.isEmpty()
                ? "No installed source has data of " + text
                        + "; state dHf and S (and Cp) under species in the settings of spontaneity."
                : "No installed source has data of " + text + ", but of " + String.join(", ", phases)
                        + "; check the phase, or state dHf and S (and Cp) under species in the settings of spontaneity.";
    }
}
