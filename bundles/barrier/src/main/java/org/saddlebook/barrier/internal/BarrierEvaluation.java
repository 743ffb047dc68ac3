package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Supplier;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.model.Conditions;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.RateModel;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.model.TunnellingModel;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Contained;
import org.saddlebook.api.task.Task;
import org.saddlebook.presentation.api.CautionText;

/** Computes the section {@code barrier} of one campaign. */
final class BarrierEvaluation {
    static final String SECTION = "barrier";
    static final String TITLE = "Barrier";

    private final Choices choices;
    private final RateTable table;
    private final Map<String, InstalledModel> installed;
    private final Task task;
    private final Optional<Node> settings;
    private final Supplier<List<TunnellingModel>> corrections;

    /** An evaluation without tunnelling corrections. */
    BarrierEvaluation(Campaign campaign, Map<String, InstalledModel> installed, Task task) {
        this(campaign, installed, List::of, task);
    }

    /**
     * An evaluation.
     *
     * @param campaign effective campaign with a rate table
     * @param installed model id to model
     * @param corrections the installed tunnelling corrections, asked for only when tunnelling is stated
     */
    BarrierEvaluation(
            Campaign campaign,
            Map<String, InstalledModel> installed,
            Supplier<List<TunnellingModel>> corrections,
            Task task) {
        this.corrections = corrections;
        this.choices = campaign.choices();
        this.table = campaign.rateTable().orElseThrow();
        this.installed = installed;
        this.task = task;
        this.settings = Optional.ofNullable(campaign.settings().get(SECTION));
    }

    /** A law with everything computed from its own code. */
    private record Computed(LawOutcome outcome, Node.Group node, List<Node> predictions, List<String> notes) {}

    Section section() throws Cancelled {
        if (table.used().isEmpty()) {
            return Section.refused(
                    SECTION, TITLE, "Every point of the rate table is excluded; use at least one to fit a law.");
        }
        SharedErrors shared;
        double tolerance;
        NextMeasurement.Allowed allowed;
        IntervalRequest intervals;
        try {
            shared = SharedErrors.read(settings);
            tolerance = SharedErrors.tolerance(settings);
            allowed = SharedErrors.allowed(settings);
            intervals = IntervalRequest.read(settings);
        } catch (IllegalArgumentException unusable) {
            return Section.refused(SECTION, TITLE, String.valueOf(unusable.getMessage()));
        }
        Measurements data = Measurements.of(table, choices.errorModel().orElseThrow());
        Surroundings surroundings;
        try {
            surroundings = Surroundings.of(context(), settings, data, corrections);
        } catch (IllegalArgumentException unusable) {
            return Section.refused(SECTION, TITLE, String.valueOf(unusable.getMessage()));
        }
        RateContext context = surroundings.context();
        Plausibility plausibility = new Plausibility(context, choices, data, shared);
        double centre = data.centreKelvin();
        LawNode nodes = new LawNode(plausibility, table.rateUnit(), centre, choices.level());
        Predictions predictions = new Predictions(
                table.rateUnit(),
                data.lowestKelvin(),
                data.highestKelvin(),
                choices.level(),
                shared.targetOnSameSensor());

        List<Node> models = new ArrayList<>();
        List<FittedLaw> fitted = new ArrayList<>();
        List<Node> predicted = new ArrayList<>();
        List<String> notes = new ArrayList<>();
        for (String id : choices.models()) {
            Computed computed = compute(id, surroundings, data, shared, plausibility, nodes, predictions);
            models.add(computed.node());
            predicted.addAll(computed.predictions());
            notes.addAll(computed.notes());
            if (computed.outcome() instanceof FittedLaw law) {
                fitted.add(law);
            }
        }
        if (choices.models().isEmpty()) {
            notes.add("No rate model is installed. Install a feature such as model-eyring.");
        }
        if (!surroundings.trouble().isEmpty()) {
            notes.add(surroundings.trouble());
        }
        List<String> blind = new ArrayList<>();
        for (FittedLaw law : fitted) {
            if (installed.get(law.id()).model().conditions().isEmpty()) {
                blind.add(law.title());
            }
        }
        if (!blind.isEmpty() && table.varies(Conditions.THIRD_BODY)) {
            notes.add(
                    "The third body varies over the table; the laws of temperature alone do not know it and take its effect"
                            + " for scatter: " + String.join(", ", blind) + ".");
        }
        List<Double> shownAt = new ArrayList<>(List.of(centre));
        shownAt.addAll(choices.targetsKelvin());
        Tree body = new Tree()
                .put("errorModel", data.errorModel().key())
                .put("response", data.response().text())
                .put("level", choices.level())
                .put("targets", shared.targetOnSameSensor() ? "same-sensor" : "true")
                .put("context", ContextNode.of(surroundings, choices.standard().isEmpty(), shownAt))
                .put("table", table(data, centre))
                .put("models", new Node.Items(models));
        Contained<Comparison> comparison = task.contain(
                "the comparison of laws", () -> new Comparison(fitted, choices.level(), choices.targetsKelvin()));
        Set<String> candidates = Set.of();
        Map<String, Double> akaikeWeights = Map.of();
        if (comparison instanceof Contained.Answer<Comparison> answer) {
            body.put("comparison", answer.value().node());
            candidates = answer.value().candidates();
            akaikeWeights = answer.value().weights();
        } else if (comparison instanceof Contained.Broke<Comparison> broke) {
            notes.add(broke.reason());
        }
        body.put("predictions", new Node.Items(predicted));
        if (!fitted.isEmpty()) {
            FittedLaw shown = shown(fitted, candidates);
            Contained<Node.Items> figures = task.contain(
                    "drawing the laws",
                    () -> new Figures(table, data, choices.level(), choices.targetsKelvin()).of(fitted, shown));
            if (figures instanceof Contained.Answer<Node.Items> drawn) {
                body.put("figures", drawn.value());
            }
        }
        if (!fitted.isEmpty()) {
            Set<String> left = candidates;
            Reach limits = new Reach(fitted, left, choices.level(), tolerance, shared.targetOnSameSensor(), allowed);
            Contained<Node.Group> reach = task.contain("the error budget", () -> limits.node(choices.targetsKelvin()));
            if (limits.carrying().isPresent()) {
                String id = limits.carrying().get().id();
                Contained<Node.Table> errorModels = task.contain(
                        "the comparison of error models",
                        () -> new ErrorModelComparison(
                                        table,
                                        choices.level(),
                                        definedTargets(limits.carrying().get()))
                                .of(
                                        installed.get(id).model(),
                                        installed.get(id).model().completed(context(id, context)),
                                        table.rateUnit(),
                                        new CancelCheck(task)));
                if (errorModels instanceof Contained.Answer<Node.Table> compared) {
                    body.put("errorModels", compared.value());
                }
            }
            if (reach instanceof Contained.Answer<Node.Group> answer) {
                answer.value().members().forEach(body::put);
            } else if (reach instanceof Contained.Broke<Node.Group> broke) {
                notes.add(broke.reason());
            }
        }
        if (!fitted.isEmpty()) {
            Checks checks = new Checks(
                    fitted,
                    shown(fitted, candidates),
                    table.rateUnit(),
                    choices.level(),
                    choices.targetsKelvin(),
                    task);
            LeaveOneOut.Refit refit = (id, rest) -> {
                RateModel model = installed.get(id).model();
                return fit(model, model.completed(context(id, context)), rest, List.of());
            };
            checks.node(refit, akaikeWeights, shared.targetOnSameSensor(), intervals)
                    .members()
                    .forEach(body::put);
            notes.addAll(checks.broken());
        }
        List<String> tableCautions = plausibility.table();
        body.put("notes", Tree.texts(notes));
        body.put("cautions", Tree.texts(tableCautions));
        Node.Group group = body.group();
        Set<String> ids = new LinkedHashSet<>(tableCautions);
        Cautions.collect(group, ids);
        return Section.done(SECTION, TITLE, group, texts(ids));
    }

    private Computed compute(
            String id,
            Surroundings surroundings,
            Measurements data,
            SharedErrors shared,
            Plausibility plausibility,
            LawNode nodes,
            Predictions predictions)
            throws Cancelled {
        InstalledModel model = installed.get(id);
        if (model == null) {
            return without(new LawOutcome.NotFitted(
                    id,
                    id,
                    LawOutcome.Kind.REFUSED,
                    "The model " + id + " is not installed; install the bundle that provides it."));
        }
        Contained<Computed> answer = task.contain(model.culprit(id), () -> {
            String missing = Surroundings.missing(model.model(), data);
            if (!missing.isEmpty()) {
                return without(new LawOutcome.NotFitted(
                        id, model.model().description().title(), LawOutcome.Kind.REFUSED, missing));
            }
            RateContext context = model.model().completed(context(id, surroundings.context()));
            LawOutcome outcome = fit(model.model(), context, data, shared.causes(context.order()));
            if (!(outcome instanceof FittedLaw law)) {
                LawOutcome.NotFitted missed = (LawOutcome.NotFitted) outcome;
                boolean unresolved = context.tunnelling().isPresent()
                        && context.transmissionLaw().isEmpty();
                return without(
                        missed.kind() == LawOutcome.Kind.REFUSED && unresolved
                                ? new LawOutcome.NotFitted(
                                        id,
                                        missed.title(),
                                        missed.kind(),
                                        missed.reason() + " " + surroundings.trouble())
                                : missed);
            }
            List<String> notes = new ArrayList<>();
            List<Node> rows = rows(
                    law, !model.model().conditions().isEmpty() && surroundings.thirdBodyAssumed(), predictions, notes);
            for (String remark : law.law().remarks(law.fit().parameters())) {
                notes.add(law.title() + ": " + remark);
            }
            for (int i = 0; i < law.parameters().size(); i++) {
                if (law.parameters().get(i).symbol().equals("dS")) {
                    notes.add(plausibility.hint(law, law.parameter(i), choices.level()));
                }
            }
            return new Computed(law, nodes.fitted(law, context.fixed()), rows, notes);
        });
        if (answer instanceof Contained.Answer<Computed> given) {
            Computed computed = given.value();
            if (computed.outcome() instanceof LawOutcome.NotFitted missed && missed.kind() == LawOutcome.Kind.FAILED) {
                return without(new LawOutcome.NotFitted(
                        id, missed.title(), missed.kind(), model.culprit(id) + ": " + missed.reason()));
            }
            return computed;
        }
        return without(new LawOutcome.NotFitted(
                id, id, LawOutcome.Kind.FAILED, ((Contained.Broke<Computed>) answer).reason()));
    }

    /** Predictions at the targets; what is left out is said in a note. */
    private List<Node> rows(FittedLaw law, boolean unstated, Predictions predictions, List<String> notes) {
        List<Node> rows = new ArrayList<>();
        for (double kelvin : choices.targetsKelvin()) {
            if (unstated) {
                notes.add(law.title() + ": no prediction, because the third body is not stated; add a line such as"
                        + " \"# third body: 2.4e19 molecule cm-3\" or \"# third body: 1 bar\". Lines and derived quantities"
                        + " are given at the geometric middle of the table.");
                break;
            }
            if (law.defined(kelvin)) {
                rows.add(predictions.row(kelvin, law));
            } else {
                notes.add(law.title() + " has no value at " + Words.kelvin(kelvin) + ".");
            }
        }
        return rows;
    }

    private LawOutcome fit(RateModel model, RateContext context, Measurements data, List<SharedErrors.Cause> causes)
            throws Cancelled {
        try {
            CancelCheck check = new CancelCheck(task);
            LawOutcome outcome = LawFitter.fit(model, context, data, check);
            return outcome instanceof FittedLaw law
                    ? LawFitter.withShared(law, model, context, causes, check)
                    : outcome;
        } catch (CancelCheck.Stopped stopped) {
            throw new Cancelled();
        }
    }

    private static Computed without(LawOutcome.NotFitted law) {
        return new Computed(law, LawNode.notFitted(law), List.of(), List.of());
    }

    private RateContext context() {
        return RateContext.of(table.rateUnit(), table.order())
                .withStandard(choices.standard().orElse(StandardState.ONE_MOLAR))
                .withTransmission(choices.transmission())
                .withReferenceKelvin(choices.referenceKelvin());
    }

    /** The context with the parameters that this model is asked to hold. */
    private RateContext context(String id, RateContext context) {
        RateContext own = context;
        for (Map.Entry<String, Double> held : choices.fixed().entrySet()) {
            if (held.getKey().startsWith(id + "/")) {
                own = own.withFixed(held.getKey().substring(id.length() + 1), held.getValue());
            }
        }
        return own;
    }

    private List<Double> definedTargets(FittedLaw law) {
        List<Double> defined = new ArrayList<>();
        for (double kelvin : choices.targetsKelvin()) {
            if (law.defined(kelvin)) {
                defined.add(kelvin);
            }
        }
        return defined;
    }

    private Node.Group table(Measurements data, double centre) {
        return new Tree()
                .put("used", data.size())
                .put("excluded", table.points().size() - data.size())
                .put("temperatures", data.distinctTemperatures())
                .put("lowest", Node.Quantity.of(data.lowestKelvin(), "K"))
                .put("highest", Node.Quantity.of(data.highestKelvin(), "K"))
                .put("centre", Node.Quantity.of(centre, "K"))
                .group();
    }

    /** The law that carries the bands: the first that remains in the comparison and has an uncertainty. */
    private static FittedLaw shown(List<FittedLaw> fitted, Set<String> candidates) {
        for (FittedLaw law : fitted) {
            if (candidates.contains(law.id()) && law.scale().isPresent()) {
                return law;
            }
        }
        return fitted.get(0);
    }

    private static Map<String, String> texts(Set<String> ids) {
        Map<String, String> texts = new LinkedHashMap<>();
        for (String id : ids) {
            texts.put(id, CautionText.of(id));
        }
        return texts;
    }
}
