package org.saddlebook.spontaneity.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Axis;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.estimation.api.Normal;
import org.saddlebook.estimation.api.StudentT;
import org.saddlebook.presentation.api.Rounding;
import org.saddlebook.thermo.data.api.SpeciesSource;
import org.saddlebook.units.api.Units;

/**
 * Sign case, ΔG(T) and crossover of one campaign: {@code ΔG = ΔH − TΔS} with both taken as independent of temperature.
 * Intervals are two-sided at the campaign's level, with Student's t where degrees of freedom are stated and normal
 * quantiles else.
 */
final class SpontaneityEvaluation {
    static final String SECTION = "spontaneity";
    static final String TITLE = "Spontaneity";

    private final Campaign campaign;
    private final Stated stated;
    private final double level;
    private final double quantile;
    private final String method;
    private final Crossover crossover;
    private final Temperatures temperatures;
    private final List<Integer> enthalpySigns;
    private final List<Integer> entropySigns;

    private SpontaneityEvaluation(Campaign campaign, Stated stated) {
        this.campaign = campaign;
        this.stated = stated;
        level = campaign.choices().level();
        double probability = 0.5 + level / 2;
        OptionalDouble dof = stated.degreesOfFreedom();
        quantile = dof.isPresent() ? StudentT.quantile(probability, dof.getAsDouble()) : Normal.quantile(probability);
        method = dof.isPresent() ? "t" : "normal";
        crossover = Crossover.of(stated, quantile, level);
        temperatures = Temperatures.of(stated, campaign, crossover);
        enthalpySigns = SignCase.signs(
                stated.enthalpy(), quantile * stated.enthalpyUncertainty().orElse(0));
        entropySigns = SignCase.signs(
                stated.entropy(), quantile * stated.entropyUncertainty().orElse(0));
    }

    /** The section; refused with a reason when what was stated cannot be evaluated. */
    static Section section(Campaign campaign, List<SpeciesSource> sources) {
        Node.Group body;
        try {
            Node settings = campaign.settings().get(SECTION);
            body = settings instanceof Node.Group table
                            && table.get("equilibriumTable").isPresent()
                    ? ofTable(campaign, table)
                    : settings instanceof Node.Group group
                                    && group.get("reaction").isPresent()
                            ? ofReaction(campaign, ReactionRequest.read(settings, sources))
                            : ofStatement(campaign, settings);
        } catch (Refusal refusal) {
            return Section.refused(SECTION, TITLE, refusal.getMessage());
        }
        Map<String, String> cautions = new LinkedHashMap<>();
        CautionTexts.collect(body, cautions);
        return Section.done(SECTION, TITLE, body, cautions);
    }

    private static Node.Group ofStatement(Campaign campaign, Node settings) throws Refusal {
        Stated stated = StatementReader.read(settings, campaign.choices().standard());
        SpontaneityEvaluation evaluation = new SpontaneityEvaluation(campaign, stated);
        Node.Group body = evaluation.body();
        Optional<Node> equilibrium = ((Node.Group) settings).get("equilibrium");
        if (equilibrium.isEmpty()) {
            return body;
        }
        Map<String, Node> members = new LinkedHashMap<>(body.members());
        evaluation.equilibrium(members, EquilibriumReader.named(equilibrium.get(), stated.standard()));
        return new Node.Group(members);
    }

    /** With heat capacities where all are known; else with ΔH and ΔS at 298.15 K, and the caution that says so. */
    private static Node.Group ofReaction(Campaign campaign, ReactionRequest request) throws Refusal {
        if (request.heatCapacitiesKnown()) {
            return new ReactionEvaluation(campaign, request).body();
        }
        Map<String, Node> members = new LinkedHashMap<>();
        members.put("reaction", new Node.Text(request.equation().text()));
        Stated stated = ConstantReaction.of(request);
        SpontaneityEvaluation evaluation = new SpontaneityEvaluation(campaign, stated);
        members.putAll(evaluation.body().members());
        if (request.lnQ().isPresent()) {
            double lnQ = request.lnQ().getAsDouble();
            members.put("lnQ", new Node.Scalar(lnQ));
            Crossover there = Crossover.of(ConstantReaction.at(stated, lnQ), evaluation.quantile, evaluation.level);
            members.put("crossoversAtComposition", new Node.Items(evaluation.crossovers(there)));
        }
        Optional<Node> equilibrium = request.settings().node("equilibrium");
        if (equilibrium.isPresent()) {
            evaluation.equilibrium(members, EquilibriumReader.of(equilibrium.get(), request.participants()));
        }
        return new Node.Group(members);
    }

    private void equilibrium(Map<String, Node> body, EquilibriumReader reader) {
        List<String> cautions = new ArrayList<>(List.of("allowed-is-not-fast", SpontaneityCautions.IDEAL));
        SpontaneityCautions.addCommon(stated, cautions);
        reader.write(
                body,
                GibbsFunction.of(stated),
                temperatures.rows(campaign.choices().targetsKelvin()),
                !stated.exact(),
                cautions);
    }

    /** The straight line of van 't Hoff in the usual keys, and both fits beside them. */
    private static Node.Group ofTable(Campaign campaign, Node.Group settings) throws Refusal {
        new SettingsReader(
                settings, "the settings of spontaneity with a table", List.of("equilibriumTable", "equilibrium"));
        TableEvaluation table = new TableEvaluation(
                campaign, EquilibriumTable.read(settings.get("equilibriumTable").orElseThrow()));
        SpontaneityEvaluation line = new SpontaneityEvaluation(campaign, table.stated());
        Map<String, Node> members = new LinkedHashMap<>(line.body().members());
        members.putAll(table.members());
        members.put(
                "figures",
                new Node.Items(
                        List.of(line.figure(), table.figure(SpontaneityCautions.ofGibbs(table.stated(), false)))));
        if (settings.get("equilibrium").isPresent()) {
            line.equilibrium(
                    members, EquilibriumReader.named(settings.get("equilibrium").get(), Optional.of(table.standard())));
        }
        return new Node.Group(members);
    }

    private Node.Group body() {
        List<SignCase> cases = SignCase.possible(enthalpySigns, entropySigns);
        Map<String, Node> body = new LinkedHashMap<>();
        body.put("case", new Node.Text(cases.size() == 1 ? cases.get(0).word() : "not determined"));
        List<Node> words = new ArrayList<>();
        for (SignCase one : cases) {
            words.add(new Node.Text(one.word()));
        }
        body.put("possibleCases", new Node.Items(words));
        stated.standard().ifPresent(state -> body.put("standardState", new Node.Text(Units.text(state))));
        body.put(
                "dH",
                statedQuantity(stated.enthalpy(), stated.enthalpyUncertainty(), Unit.JOULE_PER_MOLE, enthalpySigns));
        body.put(
                "dS",
                statedQuantity(
                        stated.entropy(), stated.entropyUncertainty(), Unit.JOULE_PER_MOLE_KELVIN, entropySigns));
        if (stated.varianceOfEnthalpy() > 0 && stated.varianceOfEntropy() > 0) {
            // A zero that nobody stated must not look like one that somebody did.
            body.put(
                    "correlation",
                    stated.assumedIndependent()
                            ? new Node.Text("assumed 0")
                            : new Node.Scalar(stated.covarianceOrZero()
                                    / (stated.enthalpyUncertainty().getAsDouble()
                                            * stated.entropyUncertainty().getAsDouble())));
        }
        stated.degreesOfFreedom().ifPresent(dof -> body.put("degreesOfFreedom", new Node.Scalar(dof)));
        List<Node> rows = new ArrayList<>();
        for (double kelvin : temperatures.rows(campaign.choices().targetsKelvin())) {
            rows.add(row(kelvin));
        }
        body.put("dG", new Node.Items(rows));
        body.put("crossoverOutcome", new Node.Text(crossover.outcome().word()));
        body.put("crossovers", new Node.Items(crossovers(crossover)));
        body.put("notes", new Node.Items(notes(cases)));
        body.put("figures", new Node.Items(List.of(figure())));
        return new Node.Group(body);
    }

    private Node.Quantity statedQuantity(double value, OptionalDouble uncertainty, Unit unit, List<Integer> signs) {
        List<String> cautions = SpontaneityCautions.ofStated(stated, uncertainty.isPresent(), signs.size() > 1);
        return quantity(value, unit, uncertainty).withCautions(cautions);
    }

    private Node.Quantity quantity(double value, Unit unit, OptionalDouble uncertainty) {
        if (uncertainty.isEmpty()) {
            return Node.Quantity.of(value, unit.code());
        }
        double u = uncertainty.getAsDouble();
        return Node.Quantity.of(value, unit.code(), u)
                .withInterval(Interval.between(value - quantile * u, value + quantile * u, level, method));
    }

    private Node row(double kelvin) {
        double value = stated.gibbs(kelvin);
        double u = Math.sqrt(stated.varianceOfGibbs(kelvin));
        List<Integer> signs = SignCase.signs(value, quantile * u);
        boolean known = stated.enthalpyUncertainty().isPresent()
                || stated.entropyUncertainty().isPresent();
        Map<String, Node> row = new LinkedHashMap<>();
        row.put("temperature", Node.Quantity.of(kelvin, Unit.KELVIN.code()));
        row.put(
                "dG",
                quantity(value, Unit.JOULE_PER_MOLE, known ? OptionalDouble.of(u) : OptionalDouble.empty())
                        .withCautions(SpontaneityCautions.ofGibbs(stated, signs.size() > 1)));
        row.put("sign", new Node.Text(signs.size() > 1 ? "not determined" : signWord(signs.get(0))));
        return new Node.Group(row);
    }

    private static String signWord(int sign) {
        return sign < 0 ? "negative" : sign > 0 ? "positive" : "zero";
    }

    private List<Node> crossovers(Crossover crossover) {
        boolean none = crossover.outcome() == Crossover.Outcome.NONE
                || (crossover.kelvin().isEmpty() && crossover.interval().isEmpty());
        if (none) {
            return List.of();
        }
        return List.of(new Node.Quantity(
                crossover.kelvin(),
                Unit.KELVIN.code(),
                crossover.standardUncertainty(),
                OptionalDouble.empty(),
                crossover.interval(),
                SpontaneityCautions.ofCrossover(stated, crossover)));
    }

    private List<Node> notes(List<SignCase> cases) {
        List<Node> notes = new ArrayList<>();
        if (cases.size() == 1) {
            notes.add(new Node.Text(cases.get(0).sentence()));
        } else {
            StringBuilder words = new StringBuilder();
            for (SignCase one : cases) {
                words.append(words.length() == 0 ? "" : "; ").append(one.word());
            }
            notes.add(new Node.Text("The sign of " + open() + " is not determined: the " + Rounding.percent(level)
                    + " interval includes zero. Possible: " + words + "."));
        }
        notes.add(new Node.Text(crossoverSentence()));
        notes.add(new Node.Text("Intervals of ΔG hold at one temperature each, not for all of them together."));
        List<Double> targets = campaign.choices().targetsKelvin();
        if (Temperatures.sensible(targets).size() < targets.size()) {
            notes.add(new Node.Text("Temperatures above 100000 K are left out."));
        }
        return notes;
    }

    private String open() {
        if (enthalpySigns.size() > 1) {
            return entropySigns.size() > 1 ? "ΔH and of ΔS" : "ΔH";
        }
        return "ΔS";
    }

    private String crossoverSentence() {
        boolean negative = crossover.kelvin().isEmpty();
        return switch (crossover.outcome()) {
            case BOUNDED ->
                crossover.interval().isEmpty()
                        ? "The crossover is a plain number: no uncertainty was stated."
                        : "The crossover is bounded: its limits are those of Fieller's theorem, not symmetric.";
            case UNBOUNDED ->
                "The crossover is not bounded: the data exclude a stretch of temperatures and nothing above it"
                        + (negative ? ", and the best estimate itself does not lie above 0 K." : ".");
            case UNDETERMINED -> "The crossover is not determined: no temperature above 0 K is excluded.";
            case NONE -> "There is no crossover above 0 K.";
        };
    }

    private Node.Figure figure() {
        double[] x = temperatures.grid();
        double[] y = new double[x.length];
        double[] low = new double[x.length];
        double[] high = new double[x.length];
        for (int i = 0; i < x.length; i++) {
            double half = quantile * Math.sqrt(stated.varianceOfGibbs(x[i]));
            y[i] = stated.gibbs(x[i]) / 1000;
            low[i] = (stated.gibbs(x[i]) - half) / 1000;
            high[i] = (stated.gibbs(x[i]) + half) / 1000;
        }
        List<Layer> layers = new ArrayList<>();
        if (!stated.exact()) {
            layers.add(new Layer(Layer.Kind.CONFIDENCE_BAND, Rounding.percent(level), x, y, low, high));
        }
        layers.add(Layer.of(Layer.Kind.HORIZONTAL_MARK, "", new double[] {x[0]}, new double[] {0}));
        layers.add(Layer.of(Layer.Kind.LINE, "ΔG", x, y));
        if (crossover.kelvin().isPresent()
                && temperatures.contains(crossover.kelvin().getAsDouble())) {
            double at = crossover.kelvin().getAsDouble();
            layers.add(Layer.of(Layer.Kind.VERTICAL_MARK, "crossover", new double[] {at}, new double[] {0}));
        }
        return new Node.Figure(
                "gibbs-energy",
                "Gibbs energy of reaction against temperature",
                new Axis("temperature", "K", Axis.Scale.LINEAR),
                new Axis("ΔG", "kJ/mol", Axis.Scale.LINEAR),
                layers,
                SpontaneityCautions.ofGibbs(stated, false));
    }
}
