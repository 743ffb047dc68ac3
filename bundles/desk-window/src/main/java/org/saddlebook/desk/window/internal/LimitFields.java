package org.saddlebook.desk.window.internal;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import javax.swing.JPanel;
import javax.swing.JTextField;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Node;
import org.saddlebook.desk.api.Change;
import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.desk.components.api.FieldFlow;
import org.saddlebook.desk.components.api.LeafText;
import org.saddlebook.desk.components.api.Nodes;
import org.saddlebook.desk.components.api.Page;
import org.saddlebook.desk.components.api.Sentence;
import org.saddlebook.desk.components.api.Sentence.Rank;

/** The stated limits as fields, each on a line of its own, and what can be added. */
final class LimitFields {
    private final DeskContext context;
    private final Page page;
    private final Sentence wrong;
    private Optional<JTextField> first = Optional.empty();
    private Optional<Campaign> shown = Optional.empty();

    LimitFields(DeskContext context) {
        this.context = context;
        page = new Page("Limits", context.ink());
        wrong = new Sentence("What is wrong with the limit", "", Rank.STATEMENT, context.ink());
    }

    JPanel component() {
        return page;
    }

    void focus() {
        first.ifPresent(JTextField::requestFocusInWindow);
    }

    void show(Campaign campaign) {
        if (shown.isPresent() && shown.get().settings().equals(campaign.settings())) {
            // What somebody is typing stays while findings arrive.
            return;
        }
        shown = Optional.of(campaign);
        page.removeAll();
        first = Optional.empty();
        page.put(new Sentence("", "Limits", Rank.HEADING, context.ink()));
        List<Node.Group> limits = Limits.of(campaign);
        for (int i = 0; i < limits.size(); i++) {
            page.put(line(i, limits.get(i)));
        }
        if (!limits.isEmpty()) {
            page.put(range(campaign));
        }
        page.put(wrong);
        wrong.say("");
        page.put(adding());
        page.revalidate();
        page.repaint();
    }

    private FieldFlow line(int index, Node.Group limit) {
        FieldFlow flow = new FieldFlow(context.ink());
        String kind = Nodes.text(limit, "kind");
        int number = index + 1;
        flow.say(number + "  " + kind);
        for (Map.Entry<String, Node> member : limit.members().entrySet()) {
            Optional<String> text = Limits.text(member.getValue());
            String key = member.getKey();
            if (key.equals("kind") || text.isEmpty()) {
                continue;
            }
            String words = words(key);
            JTextField field = flow.field(
                    words,
                    "Limit " + number + ", " + kind + ": " + words,
                    text.get(),
                    key.equals("title") || key.endsWith("Title") ? 9 : 6,
                    typed -> set(index, kind, key, member.getValue(), text.get(), typed));
            first = first.isPresent() ? first : Optional.of(field);
        }
        flow.button(
                "Remove",
                "Remove limit " + number + ", " + kind,
                () -> context.change(Change.of(
                        "limit " + number + " (" + kind + ") removed", campaign -> Limits.without(campaign, index))));
        return flow;
    }

    private static String words(String key) {
        return switch (key) {
            case "atLeast" -> "at least";
            case "lower" -> "not below";
            case "upper" -> "not above";
            case "lowerTitle" -> "lower wall";
            case "upperTitle" -> "upper wall";
            case "title" -> "called";
            case "reactionQuotient" -> "Q";
            default -> LeafText.key(key);
        };
    }

    private void set(int index, String kind, String key, Node before, String old, String typed) {
        if (typed.equals(old)) {
            return;
        }
        try {
            Node value = Limits.value(before, typed);
            context.change(new Change(
                    "limit " + (index + 1) + " (" + kind + "), " + words(key),
                    old,
                    typed,
                    "",
                    campaign -> Limits.with(campaign, index, key, value)));
        } catch (NumberFormatException e) {
            wrong.say("\"" + typed + "\" is no number; expected one such as 0.95 or 95 %.");
        }
    }

    private FieldFlow range(Campaign campaign) {
        FieldFlow flow = new FieldFlow(context.ink());
        flow.say("Looked at");
        for (String end : new String[] {"lower", "upper"}) {
            String old = Nodes.text(Limits.settings(campaign), "range", end);
            flow.field(
                    end.equals("lower") ? "from" : "to",
                    "Temperatures looked at: " + (end.equals("lower") ? "from" : "to"),
                    old,
                    7,
                    typed -> {
                        if (!typed.equals(old) && !typed.isEmpty()) {
                            context.change(new Change(
                                    "range of temperatures looked at, " + end,
                                    old,
                                    typed,
                                    "",
                                    changed -> Limits.withRange(changed, end, typed)));
                        }
                    });
        }
        return flow;
    }

    private FieldFlow adding() {
        FieldFlow flow = new FieldFlow(context.ink());
        flow.say("Add:");
        flow.button("allowed", "Add the limit that ΔG is not positive", () -> add("allowed", new LinkedHashMap<>()));
        flow.button(
                "fast enough …",
                "Add a limit of time",
                () -> two("Which conversion, within which time?", "0.95 within 10 h", " within ", (x, t) -> {
                    Map<String, Node> limit = new LinkedHashMap<>();
                    limit.put("conversion", new Node.Scalar(x));
                    limit.put("within", new Node.Text(t));
                    add("time", limit);
                }));
        flow.button(
                "keeps long enough …",
                "Add a hold time",
                () -> two("Which share may be lost, in which time at least?", "0.02 in 24 h", " in ", (x, t) -> {
                    Map<String, Node> limit = new LinkedHashMap<>();
                    limit.put("conversion", new Node.Scalar(x));
                    limit.put("atLeast", new Node.Text(t));
                    add("hold", limit);
                }));
        flow.button(
                "equilibrium …",
                "Add a limit of conversion at equilibrium",
                () -> context.ask(
                        "Which conversion must equilibrium allow?",
                        "0.95",
                        typed -> number(typed, x -> {
                            Map<String, Node> limit = new LinkedHashMap<>();
                            limit.put("conversion", new Node.Scalar(x));
                            add("equilibrium", limit);
                        })));
        flow.button(
                "equipment …",
                "Add the walls of the equipment",
                () -> context.ask(
                        "Between which temperatures does the equipment work?", "5 degC to 90 degC", this::walls));
        return flow;
    }

    private void add(String kind, Map<String, Node> members) {
        Map<String, Node> limit = new LinkedHashMap<>();
        limit.put("kind", new Node.Text(kind));
        limit.putAll(members);
        context.change(Change.of("limit added: " + kind, campaign -> Limits.and(campaign, limit)));
    }

    private interface NumberAndText {
        void accept(double number, String text);
    }

    private void two(String question, String start, String between, NumberAndText done) {
        context.ask(question, start, typed -> {
            int at = typed.indexOf(between);
            if (at < 0) {
                wrong.say("\"" + typed + "\" is not understood; expected the form \"" + start + "\".");
                return;
            }
            number(
                    typed.substring(0, at).strip(),
                    x -> done.accept(x, typed.substring(at + between.length()).strip()));
        });
    }

    private void number(String typed, Consumer<Double> done) {
        try {
            if (Limits.value(new Node.Scalar(0), typed) instanceof Node.Scalar scalar) {
                done.accept(scalar.value());
            }
        } catch (NumberFormatException e) {
            wrong.say("\"" + typed + "\" is no number; expected one such as 0.95 or 95 %.");
        }
    }

    private void walls(String typed) {
        String[] ends = typed.split(" to ", -1);
        if (ends.length != 2) {
            wrong.say("\"" + typed + "\" is not understood; expected the form \"5 degC to 90 degC\".");
            return;
        }
        Map<String, Node> limit = new LinkedHashMap<>();
        limit.put("lower", new Node.Text(ends[0].strip()));
        limit.put("upper", new Node.Text(ends[1].strip()));
        add("equipment", limit);
    }
}
