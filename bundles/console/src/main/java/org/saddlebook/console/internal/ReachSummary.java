package org.saddlebook.console.internal;

import java.io.PrintStream;
import java.util.ArrayList;
import java.util.List;
import org.saddlebook.api.findings.Node;
import org.saddlebook.presentation.api.QuantityText;
import org.saddlebook.presentation.api.Rounding;

/** How far the numbers reach and what to measure next, as sentences. */
final class ReachSummary {
    private final PrintStream out;

    ReachSummary(PrintStream out) {
        this.out = out;
    }

    void print(Node.Group body) {
        List<String> sentences = new ArrayList<>();
        body.get("honestRange").ifPresent(range -> sentences.add(range(range)));
        for (Node budget : Nodes.items(body, "budgets")) {
            sentences.add(budget(budget));
        }
        for (Node plan : Nodes.items(body, "nextMeasurements")) {
            sentences.add(plan(plan));
        }
        if (sentences.isEmpty()) {
            return;
        }
        out.println();
        out.println("  How far it reaches");
        for (String sentence : sentences) {
            Lines.wrapped(out, "    - ", sentence);
        }
    }

    private static String range(Node range) {
        String tolerance = "k within " + Rounding.percent(Nodes.number(range, "tolerance"));
        if (Nodes.text(range, "outcome").equals("nowhere")) {
            return "The interval of k holds no temperature to " + tolerance + ".";
        }
        String lower =
                Nodes.quantity(range, "lower").map(QuantityText::temperature).orElse("far below the data");
        String upper =
                Nodes.quantity(range, "upper").map(QuantityText::temperature).orElse("far above the data");
        return "Range of honest use, " + tolerance + ": " + lower + " to " + upper + ", if the law holds there.";
    }

    private static String budget(Node budget) {
        StringBuilder text = new StringBuilder("Variance of k at ");
        text.append(Nodes.quantity(budget, "temperature")
                .map(QuantityText::temperature)
                .orElse("?"));
        String separator = ": ";
        if (Nodes.get(budget, "table").orElse(null) instanceof Node.Table table) {
            for (List<Node> row : table.rows()) {
                if (row.get(0) instanceof Node.Text cause && row.get(3) instanceof Node.Scalar share) {
                    text.append(separator)
                            .append(cause.value())
                            .append(' ')
                            .append(Rounding.percent(Math.rint(share.value() * 100) / 100));
                    separator = ", ";
                }
            }
        }
        return text.append('.').toString();
    }

    private static String plan(Node plan) {
        String at = "k at "
                + Nodes.quantity(plan, "temperature")
                        .map(QuantityText::temperature)
                        .orElse("?");
        if (Nodes.text(plan, "outcome").equals("reached")) {
            return at + ": stop measuring, its interval already meets the tolerance.";
        }
        double needed = Nodes.number(plan, "runsNeeded");
        return at + ": next, " + Rounding.decimals(Nodes.number(plan, "repeats"), 0) + " × at "
                + Nodes.quantity(plan, "next").map(QuantityText::temperature).orElse("?")
                + ", half-width from " + percent(plan, "present") + " to about " + percent(plan, "promised")
                + (Double.isNaN(needed) ? "" : "; runs until the tolerance is met: " + Rounding.decimals(needed, 0))
                + ".";
    }

    private static String percent(Node plan, String key) {
        return Rounding.significant(100 * Nodes.number(plan, key), 2) + "\u00a0%";
    }
}
