package org.saddlebook.spontaneity.internal;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.reaction.api.Phase;
import org.saddlebook.thermo.data.api.SpeciesSource;

/**
 * The equilibrium constant that the section spontaneity rests on, whatever it was stated as: ln K at any temperature with the
 * covariance of its errors at two.
 */
final class EquilibriumSource {
    /** ln K at a temperature. */
    interface Value {
        double at(double kelvin);
    }

    /** Covariance of ln K at two temperatures. */
    interface Covariance {
        double of(double kelvin, double other);
    }

    private final String name;
    private final Value lnK;
    private final Value enthalpy;
    private final Covariance covariance;
    private final StandardState pressure;
    private final StandardState concentration;
    private final OptionalDouble gasChange;
    private final OptionalDouble soluteChange;
    private final double lower;
    private final double upper;

    private EquilibriumSource(
            String name,
            Value lnK,
            Value enthalpy,
            Covariance covariance,
            StandardState[] standards,
            OptionalDouble[] changes,
            double lower,
            double upper) {
        this.name = name;
        this.lnK = lnK;
        this.enthalpy = enthalpy;
        this.covariance = covariance;
        pressure = standards[0];
        concentration = standards[1];
        gasChange = changes[0];
        soluteChange = changes[1];
        this.lower = lower;
        this.upper = upper;
    }

    /**
     * Reads what the campaign states for the section spontaneity.
     *
     * @throws Refusal where it states nothing, or no standard state
     */
    static EquilibriumSource of(Campaign campaign, List<SpeciesSource> sources) throws Refusal {
        Node settings = campaign.settings().get(SpontaneityEvaluation.SECTION);
        if (!(settings instanceof Node.Group group)) {
            throw new Refusal(
                    "To compare rate constants with K, state the equilibrium in the settings of spontaneity: dH and"
                            + " dS, a reaction with species data, or an equilibriumTable.");
        }
        if (group.get("equilibriumTable").isPresent()) {
            return ofTable(group.get("equilibriumTable").get());
        }
        if (group.get("reaction").isPresent()) {
            return ofReaction(ReactionRequest.read(group, sources));
        }
        Stated stated = StatementReader.read(settings, campaign.choices().standard());
        StandardState standard = stated.standard()
                .orElseThrow(() -> new Refusal("K has the dimensions of kf/kr only with its standard state; state"
                        + " standardState in the settings of spontaneity, such as 1 mol/L or 1 bar."));
        return of(
                "ΔH and ΔS as stated",
                stated,
                new StandardState[] {standard, standard},
                ofKind(standard),
                stated.lowerKelvin().orElse(0),
                stated.upperKelvin().orElse(Double.POSITIVE_INFINITY));
    }

    /** Which change in the number of molecules a single standard state belongs to; the size is left to the rate constants. */
    private static OptionalDouble[] ofKind(StandardState standard) {
        boolean gas = standard.kind() == StandardState.Kind.PRESSURE;
        return new OptionalDouble[] {
            gas ? OptionalDouble.empty() : OptionalDouble.of(0), gas ? OptionalDouble.of(0) : OptionalDouble.empty()
        };
    }

    private static EquilibriumSource of(
            String name, Stated stated, StandardState[] standards, OptionalDouble[] changes, double low, double high) {
        double r = Constants.GAS;
        return new EquilibriumSource(
                name,
                t -> -stated.gibbs(t) / (r * t),
                t -> stated.enthalpy(),
                (t, o) -> (stated.varianceOfEnthalpy()
                                - (t + o) * stated.covarianceOrZero()
                                + t * o * stated.varianceOfEntropy())
                        / (r * r * t * o),
                standards,
                changes,
                low,
                high);
    }

    private static EquilibriumSource ofReaction(ReactionRequest request) throws Refusal {
        double gas = 0;
        double solute = 0;
        for (Participant one : request.participants()) {
            Phase phase = one.data().species().phase().orElse(Phase.GAS);
            gas += phase == Phase.GAS ? one.coefficient() : 0;
            solute += phase == Phase.AQUEOUS ? one.coefficient() : 0;
        }
        StandardState[] standards = {StandardState.ONE_BAR, StandardState.ONE_MOLAR};
        OptionalDouble[] changes = {OptionalDouble.of(gas), OptionalDouble.of(solute)};
        if (!request.heatCapacitiesKnown()) {
            Stated stated = ConstantReaction.of(request);
            return of(
                    request.equation().text() + ", ΔH and ΔS at 298.15 K",
                    stated,
                    standards,
                    changes,
                    stated.lowerKelvin().orElse(0),
                    stated.upperKelvin().orElse(Double.POSITIVE_INFINITY));
        }
        ReactionFunction function =
                ReactionFunction.of(request.participants(), request.lowerKelvin(), request.upperKelvin());
        double r = Constants.GAS;
        return new EquilibriumSource(
                request.equation().text() + ", species data",
                t -> -function.gibbs(t) / (r * t),
                function::enthalpy,
                (t, o) -> (function.varianceOfEnthalpy() + t * o * function.varianceOfEntropy()) / (r * r * t * o),
                standards,
                changes,
                request.lowerKelvin(),
                request.upperKelvin());
    }

    private static EquilibriumSource ofTable(Node node) throws Refusal {
        EquilibriumTable table = EquilibriumTable.read(node);
        StandardState standard = table.standard();
        double low = Double.POSITIVE_INFINITY;
        double high = 0;
        double inverse = 0;
        for (double one : table.kelvin()) {
            low = Math.min(low, one);
            high = Math.max(high, one);
            inverse += 1 / one;
        }
        double theta = table.kelvin().size() / inverse;
        Optional<ClarkeGlew> bent = ClarkeGlew.fit(table, theta, true);
        boolean curved = bent.isPresent() && bent.get().heatCapacityProbability() < 0.05;
        ClarkeGlew fit = curved
                ? bent.get()
                : ClarkeGlew.fit(table, theta, false)
                        .orElseThrow(
                                () -> new Refusal("The rows of the equilibrium table do not determine ΔH and ΔS."));
        double r = Constants.GAS;
        return new EquilibriumSource(
                "equilibrium table, " + (curved ? "Clarke-Glew" : "van 't Hoff"),
                t -> -fit.gibbs(t).value() / (r * t),
                t -> fit.enthalpy(t).value(),
                fit::covarianceOfLnK,
                new StandardState[] {standard, standard},
                table.gases().isPresent()
                        ? new OptionalDouble[] {table.gases(), OptionalDouble.of(0)}
                        : ofKind(standard),
                low,
                high);
    }

    String name() {
        return name;
    }

    double lnK(double kelvin) {
        return lnK.at(kelvin);
    }

    /** ΔH, J/mol. */
    double enthalpy(double kelvin) {
        return enthalpy.at(kelvin);
    }

    double covariance(double kelvin, double other) {
        return covariance.of(kelvin, other);
    }

    boolean covers(double kelvin) {
        return kelvin >= lower && kelvin <= upper;
    }

    /** Products minus reactants in the gas; what is not known is all of the difference of the orders. */
    double gasChange(double ordersDiffer) {
        return gasChange.orElse(ordersDiffer);
    }

    /** Products minus reactants in solution. */
    double soluteChange(double ordersDiffer) {
        return soluteChange.orElse(ordersDiffer);
    }

    /** ln of {@code (p°/RT)^Δν (c°)^Δν} in mol/m3: what turns K into kf/kr. */
    double lnUnit(double kelvin, double ordersDiffer) {
        double gas = gasChange(ordersDiffer);
        double solute = soluteChange(ordersDiffer);
        return (gas == 0 ? 0 : gas * StrictMath.log(pressure.value() / (Constants.GAS * kelvin)))
                + (solute == 0 ? 0 : solute * StrictMath.log(concentration.value()));
    }

    /** The relation in words, with its numbers. */
    String relation(double ordersDiffer) {
        double gas = gasChange(ordersDiffer);
        double solute = soluteChange(ordersDiffer);
        if (gas == 0 && solute == 0) {
            return "kf/kr = K";
        }
        return "kf/kr = K" + (gas == 0 ? "" : " (p°/RT)^" + Words.number(gas))
                + (solute == 0 ? "" : " (c°)^" + Words.number(solute));
    }
}
