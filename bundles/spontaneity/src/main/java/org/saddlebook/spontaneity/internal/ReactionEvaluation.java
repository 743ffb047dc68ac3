package org.saddlebook.spontaneity.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.estimation.api.Normal;
import org.saddlebook.thermo.data.api.Joint;

/** A reaction equation with species whose heat capacities are known: everything as functions of temperature. */
final class ReactionEvaluation {
    private static final int ROWS = 12;

    private final Campaign campaign;
    private final ReactionRequest request;
    private final ReactionFunction function;
    private final double level;
    private final double quantile;
    private final boolean uncertain;
    private final List<String> common = new ArrayList<>();

    ReactionEvaluation(Campaign campaign, ReactionRequest request) {
        this.campaign = campaign;
        this.request = request;
        function = ReactionFunction.of(request.participants(), request.lowerKelvin(), request.upperKelvin());
        level = campaign.choices().level();
        quantile = Normal.quantile(0.5 + level / 2);
        boolean all = true;
        boolean any = false;
        for (Participant one : request.participants()) {
            boolean known = one.data().enthalpyUncertainty().isPresent()
                    && one.data().entropyUncertainty().isPresent();
            all &= known;
            any |= known;
        }
        uncertain = any && (function.varianceOfEnthalpy() > 0 || function.varianceOfEntropy() > 0);
        if (!all) {
            common.add(SpontaneityCautions.SPECIES_UNCERTAINTY);
        }
        if (uncertain) {
            common.add(SpontaneityCautions.SPECIES_INDEPENDENT);
        }
        if (request.extrapolated()) {
            common.add("extrapolated");
        }
    }

    Node.Group body() throws Refusal {
        CrossoverFindings found = new CrossoverFindings(function, uncertain, quantile, level, common);
        Map<String, Node> body = new LinkedHashMap<>();
        body.put("case", new Node.Text(found.word()));
        body.put("reaction", new Node.Text(request.equation().text()));
        body.put("standardState", new Node.Text("1 bar"));
        body.put("data", new Node.Items(data()));
        double reference = Math.min(Math.max(Constants.REFERENCE_KELVIN, request.lowerKelvin()), request.upperKelvin());
        body.put("referenceTemperature", Node.Quantity.of(reference, "K"));
        body.put("dH", enthalpy(reference));
        body.put("dS", entropy(function, reference));
        body.put("dCp", Node.Quantity.of(function.heatCapacity(reference), Unit.JOULE_PER_MOLE_KELVIN.code()));
        List<Node> rows = new ArrayList<>();
        for (double kelvin : rows()) {
            rows.add(row(kelvin));
        }
        body.put("dG", new Node.Items(rows));
        body.put("crossoverOutcome", new Node.Text(found.outcome()));
        body.put("crossovers", new Node.Items(found.crossovers()));
        body.put("crossoverKinds", new Node.Items(found.kinds()));
        body.put("signs", new Node.Items(found.signs()));
        if (request.lnQ().isPresent()) {
            composition(body);
        }
        if (request.settings().node("equilibrium").isPresent()) {
            List<String> cautions = new ArrayList<>(List.of("allowed-is-not-fast", SpontaneityCautions.IDEAL));
            cautions.addAll(common);
            EquilibriumReader.of(request.settings().node("equilibrium").get(), request.participants())
                    .write(body, function, rows(), uncertain, cautions);
        }
        body.put("notes", new Node.Items(notes(found.roots(), found.open())));
        ReactionFigure figure = new ReactionFigure(function, quantile, uncertain);
        body.put(
                "figures",
                new Node.Items(List.of(
                        figure.gibbs(level, found.roots(), gibbsCautions(false)),
                        figure.equilibrium(level, gibbsCautions(false)))));
        return new Node.Group(body);
    }

    private List<Node> data() {
        List<Node> items = new ArrayList<>();
        for (Participant one : request.participants()) {
            Map<String, Node> item = new LinkedHashMap<>();
            item.put("species", new Node.Text(one.data().species().text()));
            item.put("coefficient", new Node.Scalar(one.coefficient()));
            item.put("source", new Node.Text(one.origin() + ", " + one.data().source()));
            item.put("reference", new Node.Text(one.data().reference()));
            item.put("uncertainty", new Node.Text(uncertainty(one)));
            item.put("lower", Node.Quantity.of(one.data().lowerKelvin(), "K"));
            item.put("upper", Node.Quantity.of(one.data().upperKelvin(), "K"));
            items.add(new Node.Group(item));
        }
        return items;
    }

    /** What is known of the uncertainty of one species, in words: an absent one must not look like a small one. */
    private static String uncertainty(Participant one) {
        String h = one.data().enthalpyUncertainty().isPresent()
                ? "u(ΔfH) " + Words.number(one.data().enthalpyUncertainty().getAsDouble() / 1000) + " kJ/mol"
                : "";
        String s = one.data().entropyUncertainty().isPresent()
                ? "u(S) " + Words.number(one.data().entropyUncertainty().getAsDouble()) + " J/(mol K)"
                : "";
        if (h.isEmpty() && s.isEmpty()) {
            return "not stated, taken as exact";
        }
        String both = h.isEmpty() || s.isEmpty() ? h + s + ", the other not stated" : h + ", " + s;
        String from = one.data().uncertaintyReference();
        return from.isEmpty() ? both : both + " (" + from + ")";
    }

    private Iterable<Double> rows() {
        TreeSet<Double> kelvins = new TreeSet<>();
        double low = request.lowerKelvin();
        double high = request.upperKelvin();
        for (int i = 0; i <= ROWS; i++) {
            kelvins.add(i == ROWS ? high : low + (high - low) * i / ROWS);
        }
        List<Double> wanted = new ArrayList<>(campaign.choices().targetsKelvin());
        wanted.add(Constants.REFERENCE_KELVIN);
        for (double kelvin : wanted) {
            if (kelvin >= low && kelvin <= high) {
                kelvins.add(kelvin);
            }
        }
        return kelvins;
    }

    private Node row(double kelvin) {
        double value = function.gibbs(kelvin);
        double u = function.uncertaintyOfGibbs(kelvin);
        List<Integer> signs = SignCase.signs(value, quantile * u);
        double rt = Constants.GAS * kelvin;
        Map<String, Node> row = new LinkedHashMap<>();
        row.put("temperature", Node.Quantity.of(kelvin, "K"));
        List<String> cautions = gibbsCautions(signs.size() > 1);
        row.put("dG", quantity(value, "J/mol", u).withCautions(cautions));
        row.put(
                "sign",
                new Node.Text(
                        signs.size() > 1
                                ? "not determined"
                                : signs.get(0) < 0 ? "negative" : signs.get(0) > 0 ? "positive" : "zero"));
        row.put("dH", enthalpy(kelvin));
        row.put("dS", entropy(function, kelvin));
        row.put("lnK", quantity(-value / rt, "1", u / rt).withCautions(cautions));
        if (request.lnQ().isPresent()) {
            ReactionFunction there = function.at(request.lnQ().getAsDouble());
            row.put("dGAtComposition", quantity(there.gibbs(kelvin), "J/mol", u).withCautions(cautions));
        }
        return new Node.Group(row);
    }

    private Node.Quantity enthalpy(double kelvin) {
        return quantity(function.enthalpy(kelvin), "J/mol", Math.sqrt(function.varianceOfEnthalpy()))
                .withCautions(common);
    }

    private Node.Quantity entropy(ReactionFunction at, double kelvin) {
        return quantity(at.entropy(kelvin), Unit.JOULE_PER_MOLE_KELVIN.code(), Math.sqrt(function.varianceOfEntropy()))
                .withCautions(common);
    }

    private Node.Quantity quantity(double value, String unit, double u) {
        return uncertain
                ? Node.Quantity.of(value, unit, u)
                        .withInterval(Interval.between(value - quantile * u, value + quantile * u, level, "normal"))
                : Node.Quantity.of(value, unit);
    }

    private List<String> gibbsCautions(boolean openSign) {
        List<String> ids = new ArrayList<>();
        if (openSign) {
            ids.add("uncertain-sign");
        }
        ids.add("allowed-is-not-fast");
        ids.add("at-stated-composition");
        ids.addAll(common);
        return ids;
    }

    /** Crossovers where the composition is held. */
    private void composition(Map<String, Node> body) {
        double lnQ = request.lnQ().getAsDouble();
        body.put("lnQ", new Node.Scalar(lnQ));
        CrossoverFindings there = new CrossoverFindings(function.at(lnQ), uncertain, quantile, level, common);
        body.put("crossoversAtComposition", new Node.Items(there.crossovers()));
    }

    private List<Node> notes(List<Root> roots, boolean open) {
        List<Node> notes = new ArrayList<>();
        notes.add(new Node.Text(
                roots.isEmpty()
                        ? "ΔG does not change sign between " + Words.kelvin(function.lower()) + " and "
                                + Words.kelvin(function.upper()) + (open ? ", but its interval includes zero." : ".")
                        : "Every crossover between " + Words.kelvin(function.lower()) + " and "
                                + Words.kelvin(function.upper()) + " is listed; outside nothing is said."));
        for (Root root : roots) {
            if (root.kind() == Root.Kind.TANGENT) {
                notes.add(
                        new Node.Text("ΔG touches zero without changing sign; the smallest change of the data makes two"
                                + " crossovers of it, or none."));
            }
        }
        notes.add(new Node.Text("Intervals of ΔG hold at one temperature each, not for all of them together."));
        for (Participant one : request.participants()) {
            for (Joint joint : one.data().joints()) {
                boolean inside = joint.lowerKelvin() > function.lower() && joint.lowerKelvin() < function.upper();
                if (inside && joint.kind() != Joint.Kind.SMOOTH) {
                    notes.add(new Node.Text((joint.kind() == Joint.Kind.PHASE_CHANGE
                                    ? "Phase change of " + one.data().species().text()
                                    : "The data of " + one.data().species().text() + " do not fit together")
                            + " at " + Words.kelvin(joint.lowerKelvin()) + "."));
                }
            }
        }
        for (double target : campaign.choices().targetsKelvin()) {
            if (target < function.lower() || target > function.upper()) {
                notes.add(new Node.Text(Words.kelvin(target) + " is left out: outside the range."));
            }
        }
        return notes;
    }
}
