package org.saddlebook.desk.measured.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import javax.swing.JComponent;
import javax.swing.JScrollPane;
import javax.swing.JTextField;
import org.saddlebook.api.campaign.SourcePart;
import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.desk.api.DeskState;
import org.saddlebook.desk.components.api.DeskComponents;
import org.saddlebook.desk.components.api.Exclusions;
import org.saddlebook.desk.components.api.FieldFlow;
import org.saddlebook.desk.components.api.Page;
import org.saddlebook.desk.components.api.Sentence;
import org.saddlebook.desk.components.api.Sentence.Rank;
import org.saddlebook.desk.components.api.TableContent;
import org.saddlebook.desk.components.api.TableView;
import org.saddlebook.presentation.api.ProblemText;

/** The open stratum: source, reading, rule, points. */
final class MeasuredPage {
    /** Options of a reading rule, key to what is read. */
    private static final Map<String, String> OPTIONS = options();

    private final MeasuredPanel panel;
    private final DeskContext context;
    private final Page page;
    private final JScrollPane scroll;
    private final Sentence problems;
    private final Sentence source;
    private final Sentence understood;
    private final Sentence ruleHeading;
    private final Sentence ruleAside;
    private final FieldFlow rule;
    private final Map<String, JTextField> fields = new LinkedHashMap<>();
    private final TableView points;
    private final Sentence aside;
    private DeskState state;

    MeasuredPage(MeasuredPanel panel, DeskContext context, DeskComponents components) {
        this.panel = panel;
        this.context = context;
        this.state = context.state();
        page = new Page("Measured", context.ink());
        problems = page.put(new Sentence("What is wrong with the file", "", Rank.STATEMENT, context.ink()));
        source = page.put(new Sentence("Source", "", Rank.TEXT, context.ink()));
        understood = page.put(new Sentence("How the file was understood", "", Rank.TEXT, context.ink()));
        ruleHeading = page.put(new Sentence("", "Reading rule", Rank.HEADING, context.ink()));
        ruleAside = page.put(new Sentence(
                "About the reading rule",
                "What is left empty, the reader finds out by itself and says. Enter reads the file again.",
                Rank.ASIDE,
                context.ink()));
        rule = page.put(new FieldFlow(context.ink()));
        for (Map.Entry<String, String> option : OPTIONS.entrySet()) {
            fields.put(
                    option.getKey(),
                    rule.field(
                            option.getValue(),
                            "Reading rule: " + option.getValue(),
                            "",
                            9,
                            value -> panel.option(option.getKey(), value, option.getValue())));
        }
        rule.button("Save this rule …", "Save this reading rule for the next file", this::saveRule);
        rule.button("Use a saved rule …", "Read the file by a saved rule", this::useRule);
        points = page.put(10, components.table("Points", context)).withRowsInView(16);
        points.onRow("Exclude with a reason, or use again", row -> Exclusions.toggle(context, row));
        aside = page.put(new Sentence(
                "About the points",
                "Enter on a row excludes the point, with a reason, or uses it again. Excluded points stay visible"
                        + " everywhere and count nowhere.",
                Rank.ASIDE,
                context.ink()));
        scroll = page.scrolling();
    }

    private static Map<String, String> options() {
        Map<String, String> options = new LinkedHashMap<>();
        options.put("unit.T", "unit of T");
        options.put("unit.k", "unit of k");
        options.put("unit.u(T)", "unit of u(T)");
        options.put("unit.u(k)", "unit of u(k)");
        options.put("separator", "separator");
        options.put("decimal", "decimal sign");
        options.put("encoding", "encoding");
        return options;
    }

    JComponent component() {
        return scroll;
    }

    void show(DeskState shown) {
        state = shown;
        problems.say(state.problems().isEmpty() ? "" : ProblemText.of(state.problems()));
        source.say(sources());
        understood.say(String.join("\n", state.understood()));
        // A campaign.json has nothing to find out: its reading is written in it.
        boolean table = !state.parts().isEmpty() && !state.parts().get(0).name().endsWith(".json");
        for (JComponent part : new JComponent[] {ruleHeading, ruleAside, rule}) {
            part.setVisible(table);
        }
        for (Map.Entry<String, JTextField> field : fields.entrySet()) {
            field.getValue().setText(state.rule().get(field.getKey()).orElse(""));
        }
        points.show(state.campaign().rateTable().map(PointTable::of).orElse(TableContent.EMPTY));
        aside.setVisible(state.campaign().rateTable().isPresent());
        if (state.campaign().rateTable().isEmpty() && state.problems().isEmpty()) {
            source.say(panel.sentence());
        }
        page.revalidate();
        page.repaint();
    }

    private String sources() {
        List<String> lines = new ArrayList<>();
        for (SourcePart part : state.campaign().sources()) {
            String reader = part.reader().isEmpty() ? "kept, not read" : "read by " + part.reader();
            lines.add(part.path() + ", " + part.size() + " bytes, " + reader + ", SHA-256 "
                    + part.sha256().substring(0, 16) + "…");
        }
        if (lines.isEmpty() && state.campaign().rateTable().isPresent()) {
            lines.add("The points stand in the campaign itself; it keeps no source file.");
        }
        return String.join("\n", lines);
    }

    void focusRule() {
        fields.get("unit.T").requestFocusInWindow();
    }

    void saveRule() {
        context.ask(
                "Under which name is the reading rule kept, for the next file of this kind?",
                "",
                name -> context.run(
                        "saving the reading rule",
                        progress -> new RuleFile(context.dataFolder()).save(name, state.rule()),
                        file -> context.note("Reading rule " + name + " saved.")));
    }

    private void useRule() {
        context.run("looking for saved rules", progress -> new RuleFile(context.dataFolder()).names(), names -> {
            if (names.isEmpty()) {
                context.note("There is no saved reading rule yet.");
                return;
            }
            context.ask(
                    "Which reading rule? There are: " + String.join(", ", names) + ".",
                    names.get(0),
                    name -> context.run(
                            "reading a saved rule",
                            progress -> new RuleFile(context.dataFolder()).read(name),
                            saved -> context.reread(saved, "read by the saved rule " + name)));
        });
    }
}
