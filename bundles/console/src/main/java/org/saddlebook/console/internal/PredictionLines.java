package org.saddlebook.console.internal;

import java.io.PrintStream;
import java.util.List;
import java.util.Optional;
import org.saddlebook.api.findings.Node;
import org.saddlebook.presentation.api.QuantityText;
import org.saddlebook.presentation.api.Rounding;

/** Predicted rate constants as text, as {@code evaluate} and {@code predict} show them. */
final class PredictionLines {
    private PredictionLines() {}

    /** Prints rows of the shape of {@code barrier.predictions}, gathered by temperature in the order given. */
    static void print(PrintStream out, CautionMarks marks, List<Node> rows) {
        List<Double> done = new java.util.ArrayList<>();
        for (Node row : rows) {
            Optional<Node.Quantity> at = Nodes.quantity(row, "temperature");
            if (at.isEmpty() || at.get().value().isEmpty()) {
                continue;
            }
            double kelvin = at.get().value().getAsDouble();
            if (done.contains(kelvin)) {
                continue;
            }
            done.add(kelvin);
            double outside = Nodes.quantity(row, "extrapolation")
                    .map(quantity -> quantity.value().orElse(0))
                    .orElse(0.0);
            out.println("    " + QuantityText.temperature(at.get())
                    + (outside > 0 ? ", " + Rounding.significant(outside, 3) + " K outside the measured range" : ""));
            for (Node other : rows) {
                Optional<Node.Quantity> there = Nodes.quantity(other, "temperature");
                if (there.isPresent() && there.get().value().orElse(Double.NaN) == kelvin) {
                    row(out, marks, other);
                }
            }
        }
    }

    private static void row(PrintStream out, CautionMarks marks, Node row) {
        Optional<Node.Quantity> k = Nodes.quantity(row, "k");
        if (k.isEmpty()) {
            return;
        }
        String text = QuantityText.withInterval(k.get()) + marks.marks(k.get().cautions());
        Optional<Node.Quantity> newRun = Nodes.quantity(row, "kNewRun");
        Optional<String> interval = newRun.flatMap(QuantityText::interval);
        if (interval.isPresent()) {
            text = text + "; a new run " + interval.get()
                    + marks.marks(newRun.get().cautions().stream()
                            .filter(id -> !k.get().cautions().contains(id))
                            .toList());
        }
        Lines.wrapped(out, "      " + Lines.padded(Nodes.text(row, "model"), 20) + " k = ", text);
    }
}
