package org.saddlebook.desk.window.internal;

import java.awt.BorderLayout;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import javax.swing.JComponent;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.desk.api.DeskState;
import org.saddlebook.desk.components.api.CautionList;
import org.saddlebook.desk.components.api.CautionNumbers;
import org.saddlebook.desk.components.api.DeskComponents;
import org.saddlebook.desk.components.api.FigureView;
import org.saddlebook.desk.components.api.LeafText;
import org.saddlebook.desk.components.api.Nodes;
import org.saddlebook.desk.components.api.Page;
import org.saddlebook.desk.components.api.Sentence;
import org.saddlebook.desk.components.api.Sentence.Rank;
import org.saddlebook.desk.components.api.TableContent;
import org.saddlebook.desk.components.api.TableContent.Cell;
import org.saddlebook.desk.components.api.TableContent.Column;
import org.saddlebook.desk.components.api.TableView;
import org.saddlebook.presentation.api.QuantityText;
import org.saddlebook.presentation.api.Rounding;

/** The open stratum: headroom, the answer, the limits to change, intervals, and everything else. */
final class WindowPage {
    /** Members of the section that this page shows in its own way. */
    private static final Set<String> SHOWN =
            Set.of("answer", "figures", "level", "range", "draws", "intervals", "best", "limits", "rateLaw");

    private final DeskContext context;
    private final DeskComponents components;
    private final Page page;
    private final JScrollPane scroll;
    private final FigureView figure;
    private final Sentence answer;
    private final LimitFields limits;
    private final TableView intervals;
    private final Sentence best;
    private final TableView limitTable;
    private final JPanel rest;
    private final CautionList cautions;

    WindowPage(DeskContext context, DeskComponents components) {
        this.context = context;
        this.components = components;
        page = new Page("Operating window", context.ink());
        figure = page.put(components.figure(context).onRail().setHeight(420));
        answer = page.put(new Sentence("In short", "", Rank.STATEMENT, context.ink()));
        limits = new LimitFields(context);
        page.put(limits.component());
        intervals = page.put(8, components.table("Where all limits hold", context));
        best = page.put(new Sentence("Best temperature", "", Rank.TEXT, context.ink()));
        limitTable = page.put(8, components.table("Each limit by itself", context));
        rest = page.put(8, new JPanel(new BorderLayout()));
        rest.setOpaque(false);
        cautions = page.put(new CautionList(context.ink()));
        scroll = page.scrolling();
    }

    JComponent component() {
        return scroll;
    }

    void focusLimits() {
        limits.focus();
    }

    void show(DeskState state) {
        answer.say(WindowPanel.sentence(state));
        limits.show(state.campaign());
        rest.removeAll();
        Optional<Node> body = WindowPanel.findings(state);
        if (body.isPresent()) {
            fill(state.findings().orElseThrow(), body.get());
        } else {
            figure.clear();
            intervals.show(TableContent.EMPTY);
            limitTable.show(TableContent.EMPTY);
            best.say("");
            cautions.show(List.of(), Map.of());
        }
        page.revalidate();
        page.repaint();
    }

    private void fill(Findings findings, Node body) {
        CautionNumbers numbers = new CautionNumbers(findings.cautions().keySet());
        Optional<Node.Figure> headroom = Nodes.figure(body, WindowPanel.FIGURE);
        if (headroom.isPresent()) {
            figure.show(headroom.get(), findings.cautions());
        } else {
            figure.clear();
        }
        intervals.show(intervals(body, numbers));
        best.say(best(body));
        limitTable.show(limitTable(body, numbers));
        Map<String, Node> others = new LinkedHashMap<>();
        if (body instanceof Node.Group group) {
            for (Map.Entry<String, Node> member : group.members().entrySet()) {
                if (!SHOWN.contains(member.getKey())) {
                    others.put(member.getKey(), member.getValue());
                }
            }
        }
        List<Node> more = new ArrayList<>();
        for (Node item : Nodes.items(body, "figures")) {
            if (item instanceof Node.Figure other && !other.id().equals(WindowPanel.FIGURE)) {
                more.add(other);
            }
        }
        if (!more.isEmpty()) {
            others.put("figures", new Node.Items(more));
        }
        rest.add(components.tree("The window in numbers", new Node.Group(others), findings.cautions(), context));
        List<String> ids = findings.section(WindowPanel.SECTION)
                .map(section -> List.copyOf(section.cautions().keySet()))
                .orElse(List.of());
        cautions.show(ids, findings.cautions());
    }

    private static TableContent intervals(Node body, CautionNumbers numbers) {
        List<Column> columns = List.of(
                new Column("from", "K", false),
                new Column("to", "K", false),
                new Column("probability at each temperature", "1", false),
                new Column("everywhere in it at once", "1", false),
                new Column("cold end", "", false),
                new Column("hot end", "", false));
        List<List<Cell>> rows = new ArrayList<>();
        for (Node interval : Nodes.items(body, "intervals")) {
            rows.add(List.of(
                    cell(interval, "lower", numbers),
                    cell(interval, "upper", numbers),
                    cell(interval, "pointwiseProbability", numbers),
                    cell(interval, "wholeIntervalProbability", numbers),
                    Cell.of(end(interval, "lowerEnd")),
                    Cell.of(end(interval, "upperEnd"))));
        }
        return rows.isEmpty() ? TableContent.EMPTY : new TableContent(columns, rows);
    }

    private static TableContent limitTable(Node body, CautionNumbers numbers) {
        List<Column> columns = List.of(
                new Column("limit", "", false),
                new Column("what it says", "", false),
                new Column("holds from", "K", false),
                new Column("to", "K", false),
                new Column("binds", "", false));
        List<List<Cell>> rows = new ArrayList<>();
        for (Node limit : Nodes.items(body, "limits")) {
            rows.add(List.of(
                    Cell.of(Nodes.text(limit, "title")),
                    Cell.of(Nodes.text(limit, "statement")),
                    cell(limit, "aloneFrom", numbers),
                    cell(limit, "aloneTo", numbers),
                    Cell.of(Nodes.text(limit, "binds"))));
        }
        return rows.isEmpty() ? TableContent.EMPTY : new TableContent(columns, rows);
    }

    private static String best(Node body) {
        Optional<Node.Quantity> at = Nodes.quantity(body, "best", "temperature");
        OptionalDouble probability = Nodes.number(body, "best", "probability");
        return at.isEmpty() || probability.isEmpty()
                ? ""
                : "All limits hold most surely at " + QuantityText.temperature(at.get()) + ": with probability "
                        + Rounding.significant(probability.getAsDouble(), 3) + ".";
    }

    private static Cell cell(Node interval, String key, CautionNumbers numbers) {
        Optional<Node> node = Nodes.at(interval, key);
        if (node.isEmpty()) {
            return Cell.of("");
        }
        if (node.get() instanceof Node.Quantity quantity) {
            // Cautions of the ends stand below the table; here they would hide the numbers.
            return Cell.of(LeafText.of(key, quantity.withCautions(List.of()), numbers), quantity);
        }
        String text = LeafText.of(key, node.get(), numbers);
        return node.get() instanceof Node.Scalar scalar ? Cell.of(text, scalar.value()) : Cell.of(text);
    }

    private static String end(Node interval, String key) {
        String title = Nodes.text(interval, key, "title");
        String easing = Nodes.text(interval, key, "easing");
        String binds = title.isEmpty() ? "" : title + " binds.";
        return easing.isEmpty() ? binds : binds + " " + easing;
    }
}
