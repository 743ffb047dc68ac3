package org.saddlebook.window.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeSet;
import java.util.function.Supplier;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.model.TunnellingModel;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;
import org.saddlebook.spontaneity.api.EquilibriumStart;

/** The section of one campaign: limits, intervals with probability, practical predictions, headroom figure. */
final class WindowEvaluation {
    static final String SECTION = "window";
    static final String TITLE = "Operating window";

    private static final double HALF = 0.5;

    private final Campaign campaign;
    private final Request request;
    private final Optional<Fitted> fitted;
    private final Optional<Thermo> thermo;
    private final Task task;
    private final double level;
    private final Headroom headroom;
    private final Draws draws;

    private WindowEvaluation(
            Campaign campaign,
            Request request,
            Optional<Fitted> fitted,
            Optional<Thermo> thermo,
            Optional<EquilibriumStart> start,
            Task task)
            throws Cancelled {
        this.campaign = campaign;
        this.request = request;
        this.fitted = fitted;
        this.thermo = thermo;
        this.task = task;
        level = campaign.choices().level();
        List<Limit> limits = new ArrayList<>();
        for (Limit limit : request.limits()) {
            if (!(limit instanceof Limit.Equipment)) {
                limits.add(limit);
            }
        }
        headroom = new Headroom(limits, thermo, start);
        draws = Draws.make(
                headroom,
                request.equipment(),
                fitted.isPresent() ? fitted.get().laws() : List.of(),
                fitted.isPresent() ? fitted.get().weights() : new double[0],
                request.draws(),
                task);
    }

    /** The section; refused with a reason when what was stated cannot be evaluated. */
    static Section section(Campaign campaign, Findings earlier, Map<String, InstalledModel> installed, Task task)
            throws Cancelled {
        return section(campaign, earlier, installed, List::of, task);
    }

    /** The same with the installed tunnelling corrections, asked for only when the barrier states one. */
    static Section section(
            Campaign campaign,
            Findings earlier,
            Map<String, InstalledModel> installed,
            Supplier<List<TunnellingModel>> corrections,
            Task task)
            throws Cancelled {
        Node.Group body;
        try {
            Request request = RequestReader.read(campaign);
            Optional<Section> barrier = earlier.section("barrier");
            Optional<Fitted> fitted = Optional.empty();
            if (barrier.isPresent() && (request.needsBarrier() || request.law().isPresent())) {
                fitted = Optional.of(Fitted.of(barrier.get(), installed, corrections, task));
            } else if (request.needsBarrier()) {
                throw new Refusal("The settings of window need fitted rate constants; the campaign has no rate table.");
            }
            Optional<Limit> needing = request.needingThermodynamics();
            Optional<Section> spontaneity = earlier.section("spontaneity");
            if (needing.isPresent() && spontaneity.isEmpty()) {
                throw new Refusal("The limit \"" + needing.get().title()
                        + "\" needs ΔH and ΔS of the reaction; state them in the settings of spontaneity.");
            }
            boolean reversible =
                    request.law().isPresent() && !request.law().get().irreversible() && spontaneity.isPresent();
            Optional<Thermo> thermo = needing.isPresent() || reversible
                    ? Optional.of(Thermo.of(spontaneity.orElseThrow()))
                    : Optional.empty();
            Optional<EquilibriumStart> start =
                    spontaneity.isPresent() ? EquilibriumStart.of(spontaneity.get()) : Optional.empty();
            if (start.isPresent() && !(start.get().extent().upper() > 0) && request.asksForEquilibrium()) {
                throw new Refusal(
                        "The limit on the equilibrium conversion has no reactant at the start; state amounts of the"
                                + " reactants under equilibrium in the settings of spontaneity.");
            }
            body = new WindowEvaluation(campaign, request, fitted, thermo, start, task).body();
        } catch (Refusal refusal) {
            return Section.refused(SECTION, TITLE, refusal.getMessage());
        }
        return Section.done(SECTION, TITLE, body, WindowCautions.used(body));
    }

    private Node.Group body() throws Cancelled {
        Tree tree = new Tree();
        List<String> notes = new ArrayList<>();
        if (fitted.isPresent()) {
            notes.addAll(fitted.get().notes());
        }
        List<Node> figures = new ArrayList<>();
        if (!request.limits().isEmpty()) {
            double[] range = range();
            task.progress(0.1, "operating window");
            WindowSearch search = new WindowSearch(draws, request.equipment(), range[0], range[1], level, task);
            List<WindowSearch.Found> found = search.intervals();
            WindowFindings findings = new WindowFindings(request, headroom, fitted, thermo, level, search, found);
            findings.write(tree);
            notes.addAll(findings.notes());
            task.progress(0.7, "headroom");
            figures.add(new HeadroomFigure(findings, draws, campaign).node());
        }
        predictions(tree, notes);
        tree.put("notes", Tree.texts(notes));
        tree.put("figures", new Node.Items(figures));
        return tree.group();
    }

    private void predictions(Tree tree, List<String> notes) throws Cancelled {
        if (fitted.isEmpty()) {
            return;
        }
        Fitted laws = fitted.get();
        Rates rates = new Rates(laws.laws(), draws, laws.lowest(), laws.highest(), level);
        TreeSet<Double> kelvins = new TreeSet<>(campaign.choices().targetsKelvin());
        if (kelvins.isEmpty()) {
            kelvins.add(Constants.REFERENCE_KELVIN);
            kelvins.add(laws.lowest());
            kelvins.add(laws.highest());
            notes.add("No target temperature was stated: rates and times are given at 25 °C and at the coldest and"
                    + " hottest measured temperature.");
        }
        task.check();
        PredictionTables tables = new PredictionTables(rates, List.copyOf(kelvins), laws.rateUnit());
        tree.put("rates", tables.rates());
        if (request.law().isPresent()) {
            RateLaw law = request.law().get();
            TreeSet<Double> conversions = new TreeSet<>(request.conversions());
            if (law.reaches(HALF)) {
                conversions.add(HALF);
            }
            if (law.irreversible() || thermo.isPresent()) {
                List<Double> all = List.copyOf(conversions);
                Optional<Draws> reversible = law.irreversible()
                        ? Optional.empty()
                        : Optional.of(PredictionTables.reversibleDraws(
                                law, all, thermo.orElseThrow(), laws.laws(), laws.weights(), draws.count(), task));
                tree.put("rateLaw", law.kind().word());
                tree.put("times", tables.times(law, all, reversible, thermo));
                notes.add("The time to a conversion of 0.5 is the half-life of the reactant from its initial"
                        + " concentration.");
            }
        }
        if (request.history().isPresent()) {
            tree.put("history", new HistoryFindings(request.history().get()).node(rates, request.law()));
        }
    }

    /** What was asked for; else the measured temperatures, targets and walls with a margin, K. */
    private double[] range() {
        if (request.lowerKelvin().isPresent()) {
            return new double[] {
                request.lowerKelvin().getAsDouble(), request.upperKelvin().getAsDouble()
            };
        }
        TreeSet<Double> all = new TreeSet<>(campaign.choices().targetsKelvin());
        if (fitted.isPresent()) {
            all.add(fitted.get().lowest());
            all.add(fitted.get().highest());
        }
        Limit.Equipment walls = request.equipment();
        walls.lowerKelvin().ifPresent(all::add);
        walls.upperKelvin().ifPresent(all::add);
        if (all.isEmpty()) {
            all.add(Constants.REFERENCE_KELVIN);
        }
        double low = all.first();
        double high = all.last();
        boolean bothWalls =
                walls.lowerKelvin().isPresent() && walls.upperKelvin().isPresent();
        double margin = bothWalls ? 10 : Math.max(25, 0.25 * (high - low));
        double lower = Constants.ZERO_CELSIUS + 5 * Math.floor((low - margin - Constants.ZERO_CELSIUS) / 5);
        double upper = Constants.ZERO_CELSIUS + 5 * Math.ceil((high + margin - Constants.ZERO_CELSIUS) / 5);
        return new double[] {Math.max(Math.min(10, low), lower), upper};
    }
}
