package org.saddlebook.desk.barrier.internal;

import java.awt.BorderLayout;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import javax.swing.JButton;
import javax.swing.JComponent;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTextField;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.ErrorModel;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.desk.api.Change;
import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.desk.api.DeskState;
import org.saddlebook.desk.components.api.CautionList;
import org.saddlebook.desk.components.api.DeskComponents;
import org.saddlebook.desk.components.api.Exclusions;
import org.saddlebook.desk.components.api.FieldFlow;
import org.saddlebook.desk.components.api.FigureView;
import org.saddlebook.desk.components.api.Nodes;
import org.saddlebook.desk.components.api.Page;
import org.saddlebook.desk.components.api.Sentence;
import org.saddlebook.desk.components.api.Sentence.Rank;
import org.saddlebook.desk.components.api.TableView;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/** The open stratum: what was measured and fitted, then what follows from it, downward. */
final class BarrierPage {
    private static final String LN_RATE = "ln-rate";
    private static final String OVER_TEMPERATURE = "ln-rate-over-temperature";
    private static final String RESIDUALS = "residuals";
    private static final String REGION = "joint-region";
    private static final String CHECKS = "dataChecks";

    private final DeskContext context;
    private final DeskComponents components;
    private final Page page;
    private final JScrollPane scroll;
    private final Sentence empty;
    private final FigureView rates;
    private final FigureView residuals;
    private final JButton turn;
    private final Sentence comparison;
    private final TableView laws;
    private final JPanel checks;
    private final JTextField targets;
    private final JTextField standard;
    private final Sentence wrong;
    private final TableView predictions;
    private final Sentence reach;
    private final TableView budgets;
    private final TableView errorModels;
    private final FieldFlow chooseErrors;
    private final FigureView region;
    private final TableView statistics;
    private final Sentence notes;
    private final JPanel others;
    private final CautionList cautions;
    private final List<JComponent> parts = new ArrayList<>();
    private DeskState state;
    private String ordinate = LN_RATE;

    BarrierPage(DeskContext context, DeskComponents components) {
        this.context = context;
        this.components = components;
        this.state = context.state();
        page = new Page("Barrier", context.ink());
        empty = page.put(new Sentence("Barrier", "", Rank.STATEMENT, context.ink()));
        rates = put(0, figure().setHeight(330));
        residuals = put(0, figure().setHeight(190));
        FieldFlow ordinates = put(0, new FieldFlow(context.ink()));
        turn = ordinates.button("Show ln(k/T)", "Show the other ordinate, ln k or ln(k/T)", this::turn);
        standard = ordinates.field(
                "standard state", "Standard state, for example 1 mol/L or 1 bar", "", 9, this::statedStandard);
        comparison = put(4, new Sentence("Which law", "", Rank.TEXT, context.ink()));
        laws = put(8, components.table("Laws side by side", context));
        notes = put(0, new Sentence("What the fit may say", "", Rank.TEXT, context.ink()));
        checks = holder();
        FieldFlow asked = put(10, new FieldFlow(context.ink()));
        targets = asked.field(
                "Predict k at",
                "Temperatures to predict the rate constant at, separated by semicolons",
                "",
                26,
                this::askedAt);
        wrong = page.put(new Sentence("What is wrong with the entry", "", Rank.STATEMENT, context.ink()));
        wrong.say("");
        predictions = put(0, components.table("Predictions", context));
        reach = put(8, new Sentence("How far it reaches and what to measure next", "", Rank.TEXT, context.ink()));
        budgets = put(8, components.table("Where the uncertainty comes from", context));
        errorModels = put(8, components.table("The same data under each error model", context));
        chooseErrors = put(0, new FieldFlow(context.ink()));
        region = put(8, components.figure(context).setHeight(330));
        statistics = put(8, components.table("Fits", context));
        others = holder();
        cautions = put(8, new CautionList(context.ink()));
        scroll = page.scrolling();
    }

    private FigureView figure() {
        return components
                .figure(context)
                .onRail()
                .describePoints(point -> Exclusions.describe(shownCampaign(), point))
                .onPoint(
                        "Exclude with a reason, or use again",
                        point -> Exclusions.toggle(context, Exclusions.index(shownCampaign(), point)));
    }

    private Campaign shownCampaign() {
        return state.effective().orElse(state.campaign());
    }

    private <C extends JComponent> C put(int above, C part) {
        parts.add(part);
        return page.put(above, part);
    }

    private JPanel holder() {
        JPanel holder = put(4, new JPanel(new BorderLayout()));
        holder.setOpaque(false);
        return holder;
    }

    JComponent component() {
        return scroll;
    }

    void focusTargets() {
        targets.requestFocusInWindow();
    }

    void focusStandard() {
        standard.requestFocusInWindow();
    }

    /** Shows the other ordinate. */
    void turn() {
        ordinate = ordinate.equals(LN_RATE) ? OVER_TEMPERATURE : LN_RATE;
        show(state);
    }

    void show(DeskState shown) {
        state = shown;
        Optional<Laws> found = Laws.of(shown);
        empty.say(found.isEmpty() ? BarrierPanel.sentence(shown) : "");
        for (JComponent part : parts) {
            part.setVisible(found.isPresent());
        }
        found.ifPresent(this::fill);
        page.revalidate();
        page.repaint();
    }

    private void fill(Laws found) {
        Findings findings = state.findings().orElseThrow();
        Optional<Node.Figure> chosen = Nodes.figure(found.body(), ordinate);
        boolean both = Nodes.figure(found.body(), OVER_TEMPERATURE).isPresent();
        turn.setVisible(both);
        turn.setText(ordinate.equals(LN_RATE) ? "Show ln(k/T)" : "Show ln k");
        show(rates, chosen.or(() -> Nodes.figure(found.body(), LN_RATE)), findings);
        show(residuals, Nodes.figure(found.body(), RESIDUALS), findings);
        show(region, Nodes.figure(found.body(), REGION), findings);
        standard.setText(
                state.campaign().choices().standard().isPresent()
                        ? Units.text(state.campaign().choices().standard().get())
                        : "");
        comparison.say(found.comparison());
        laws.show(found.sideBySide());
        notes.say(found.notes());
        tree(checks, "Mistakes looked for", checksBody(findings), findings);
        StringBuilder asked = new StringBuilder();
        for (double kelvin : state.campaign().choices().targetsKelvin()) {
            asked.append(asked.length() == 0 ? "" : "; ").append(Exclusions.celsius(kelvin));
        }
        targets.setText(asked.toString());
        predictions.show(found.predictions());
        reach.say(found.reach());
        budgets.show(found.budgets());
        errorModels.show(found.errorModels());
        errorChoices(found);
        statistics.show(found.statistics());
        Map<String, Node> more = new LinkedHashMap<>(found.others());
        List<Node> figures = new ArrayList<>();
        for (Node item : Nodes.items(found.body(), "figures")) {
            if (item instanceof Node.Figure figure
                    && !List.of(LN_RATE, OVER_TEMPERATURE, RESIDUALS, REGION).contains(figure.id())) {
                figures.add(figure);
            }
        }
        if (!figures.isEmpty()) {
            more.put("figures", new Node.Items(figures));
        }
        tree(
                others,
                "Further findings",
                more.isEmpty() ? Optional.empty() : Optional.of(new Node.Group(more)),
                findings);
        List<String> ids = findings.section(Laws.SECTION)
                .map(section -> List.copyOf(section.cautions().keySet()))
                .orElse(List.of());
        cautions.show(ids, findings.cautions());
    }

    private static void show(FigureView view, Optional<Node.Figure> figure, Findings findings) {
        if (figure.isPresent()) {
            view.show(figure.get(), findings.cautions());
        } else {
            view.clear();
        }
    }

    private static Optional<Node> checksBody(Findings findings) {
        return findings.section(CHECKS)
                .filter(section -> section.outcome() == Section.Outcome.DONE)
                .map(Section::body);
    }

    private void tree(JPanel holder, String name, Optional<Node> body, Findings findings) {
        holder.removeAll();
        holder.setVisible(body.isPresent());
        body.ifPresent(node -> {
            holder.add(new Sentence("", name, Rank.HEADING, context.ink()), BorderLayout.NORTH);
            holder.add(components.tree(name, node, findings.cautions(), context), BorderLayout.CENTER);
        });
    }

    private void errorChoices(Laws found) {
        chooseErrors.clear();
        String now = Nodes.text(found.body(), "errorModel");
        chooseErrors.say("Used: " + words(now) + ".");
        for (ErrorModel model : ErrorModel.values()) {
            if (!model.key().equals(now)) {
                chooseErrors.button(
                        "Use " + words(model.key()),
                        "Use the error model " + words(model.key()),
                        () -> context.change(new Change(
                                "error model",
                                words(now),
                                words(model.key()),
                                "",
                                campaign ->
                                        campaign.withChoices(campaign.choices().withErrorModel(model)))));
            }
        }
    }

    private static String words(String key) {
        return key.replace('-', ' ');
    }

    private void askedAt(String typed) {
        List<Double> kelvin = new ArrayList<>();
        try {
            for (String one : typed.split(";", -1)) {
                if (!one.isBlank()) {
                    kelvin.add(Units.kelvin(one.strip().replace('\u00a0', ' ')));
                }
            }
        } catch (UnitException e) {
            wrong.say(String.valueOf(e.getMessage()));
            return;
        }
        wrong.say("");
        context.change(Change.of(
                kelvin.isEmpty() ? "no temperature asked for" : "k asked for at " + typed,
                campaign -> campaign.withChoices(campaign.choices().withTargetsKelvin(kelvin))));
    }

    private void statedStandard(String typed) {
        try {
            org.saddlebook.api.model.StandardState stated = Units.standardState(typed);
            wrong.say("");
            context.change(Change.of(
                    "standard state " + Units.text(stated),
                    campaign -> campaign.withChoices(campaign.choices().withStandard(stated))));
        } catch (UnitException e) {
            wrong.say(String.valueOf(e.getMessage()));
        }
    }
}
