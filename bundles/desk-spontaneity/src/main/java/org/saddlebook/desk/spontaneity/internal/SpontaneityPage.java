package org.saddlebook.desk.spontaneity.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import javax.swing.JComponent;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.desk.api.DeskState;
import org.saddlebook.desk.components.api.CautionList;
import org.saddlebook.desk.components.api.DeskComponents;
import org.saddlebook.desk.components.api.FigureView;
import org.saddlebook.desk.components.api.Page;
import org.saddlebook.desk.components.api.Sentence;
import org.saddlebook.desk.components.api.Sentence.Rank;

/** The open stratum: figure, sentences, then everything the section holds. */
final class SpontaneityPage {
    private final DeskContext context;
    private final DeskComponents components;
    private final Page page;
    private final JScrollPane scroll;
    private final Sentence statement;
    private final FigureView figure;
    private final JPanel rest;
    private final CautionList cautions;

    SpontaneityPage(DeskContext context, DeskComponents components) {
        this.context = context;
        this.components = components;
        page = new Page("Spontaneity", context.ink());
        figure = page.put(components.figure(context).onRail().setHeight(280));
        statement = page.put(new Sentence("In short", "", Rank.STATEMENT, context.ink()));
        rest = page.put(new JPanel(new java.awt.BorderLayout()));
        rest.setOpaque(false);
        cautions = page.put(new CautionList(context.ink()));
        scroll = page.scrolling();
    }

    JComponent component() {
        return scroll;
    }

    void show(DeskState state) {
        statement.say(SpontaneityPanel.sentence(state));
        rest.removeAll();
        Optional<Section> section = SpontaneityPanel.section(state);
        if (section.isPresent() && section.get().outcome() == Section.Outcome.DONE) {
            fill(state.findings().orElseThrow(), section.get());
        } else {
            figure.clear();
            cautions.show(List.of(), Map.of());
        }
        page.revalidate();
        page.repaint();
    }

    private void fill(Findings findings, Section section) {
        Map<String, Node> others = new LinkedHashMap<>();
        List<Node> more = new ArrayList<>();
        Optional<Node.Figure> first = Optional.empty();
        if (section.body() instanceof Node.Group group) {
            for (Map.Entry<String, Node> member : group.members().entrySet()) {
                if (!member.getKey().equals("figures")) {
                    others.put(member.getKey(), member.getValue());
                } else if (member.getValue() instanceof Node.Items items) {
                    for (Node item : items.items()) {
                        if (first.isEmpty() && item instanceof Node.Figure drawn) {
                            first = Optional.of(drawn);
                        } else {
                            more.add(item);
                        }
                    }
                }
            }
        }
        if (!more.isEmpty()) {
            others.put("figures", new Node.Items(more));
        }
        if (first.isPresent()) {
            figure.show(first.get(), findings.cautions());
        } else {
            figure.clear();
        }
        rest.add(components.tree("Spontaneity in numbers", new Node.Group(others), findings.cautions(), context));
        Set<String> ids = new LinkedHashSet<>(section.cautions().keySet());
        cautions.show(List.copyOf(ids), findings.cautions());
    }
}
