package org.saddlebook.console.internal;

import java.io.PrintStream;
import java.util.List;
import org.saddlebook.api.findings.Node;
import org.saddlebook.presentation.api.QuantityText;

/** What was looked at beside the laws: sentences that deserve a line, and the further intervals that were asked for. */
final class ChecksSummary {
    private final PrintStream out;

    ChecksSummary(PrintStream out) {
        this.out = out;
    }

    void print(Node.Group body) {
        List<Node> remarks = Nodes.items(body, "remarks");
        if (!remarks.isEmpty()) {
            out.println();
            out.println("  What the data could not show");
            sentences(remarks);
        }
        body.get("otherIntervals").ifPresent(this::intervals);
    }

    private void intervals(Node group) {
        out.println();
        out.println("  Further intervals");
        String law = "";
        if (Nodes.get(group, "table").orElse(null) instanceof Node.Table table) {
            for (List<Node> row : table.rows()) {
                if (row.get(0) instanceof Node.Text model
                        && row.get(1) instanceof Node.Text quantity
                        && row.get(2) instanceof Node.Text method
                        && row.get(3) instanceof Node.Quantity value) {
                    if (!law.equals(model.value())) {
                        law = model.value();
                        out.println("    " + law);
                    }
                    Lines.wrapped(
                            out,
                            "      " + Lines.padded(Symbols.activation(quantity.value()), 4) + " ",
                            QuantityText.interval(value).orElse("not determined") + ", " + method.value());
                }
            }
        }
        sentences(Nodes.items(group, "notes"));
    }

    private void sentences(List<Node> notes) {
        for (Node note : notes) {
            if (note instanceof Node.Text text) {
                Lines.wrapped(out, "    - ", text.value());
            }
        }
    }
}
