package org.saddlebook.console.internal;

import java.io.PrintStream;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.saddlebook.api.findings.Node;
import org.saddlebook.presentation.api.QuantityText;
import org.saddlebook.presentation.api.RoundedSet;
import org.saddlebook.presentation.api.Rounding;
import org.saddlebook.presentation.api.UnitText;

/** The section {@code barrier} as text: laws side by side, what separates them, predictions. */
final class BarrierSummary {
    private final PrintStream out;
    private final CautionMarks marks;

    BarrierSummary(PrintStream out, CautionMarks marks) {
        this.out = out;
        this.marks = marks;
    }

    void print(Node.Group body) {
        body.get("context").ifPresent(this::context);
        body.get("table").ifPresent(table -> table(table, body));
        for (Node model : Nodes.items(body, "models")) {
            out.println();
            model(model);
        }
        body.get("comparison").ifPresent(this::comparison);
        predictions(Nodes.items(body, "predictions"));
        new ReachSummary(out).print(body);
        new ChecksSummary(out).print(body);
        List<Node> notes = Nodes.items(body, "notes");
        if (!notes.isEmpty()) {
            out.println();
            sentences(notes);
        }
    }

    private void context(Node context) {
        String standard = Nodes.text(context, "standardStateText");
        out.println("  standard state " + standard
                + (Nodes.flag(context, "standardStateAssumed") ? " (assumed)" : "")
                + ", overall order " + Rounding.shortest(Nodes.number(context, "order"))
                + ", transmission coefficient " + Rounding.shortest(Nodes.number(context, "transmission")));
        Optional<Node> tunnelling = Nodes.get(context, "tunnelling");
        if (tunnelling.isPresent()) {
            tunnelling(tunnelling.get());
        }
        Optional<Node> conditions = Nodes.get(context, "conditions");
        if (conditions.isPresent()) {
            StringBuilder line = new StringBuilder("  k is read at");
            for (Map.Entry<String, Node> condition :
                    Nodes.members(context, "conditions").entrySet()) {
                if (condition.getValue() instanceof Node.Quantity quantity) {
                    line.append(' ')
                            .append(condition.getKey().equals("thirdBody") ? "[M]" : condition.getKey())
                            .append(' ')
                            .append(Rounding.significant(quantity.value().orElse(Double.NaN), 4))
                            .append(' ')
                            .append(UnitText.forPeople(quantity.unit()));
                }
            }
            out.println(line.append(
                    Nodes.flag(context, "conditionsAssumed") ? ", the middle of the table (not stated)" : " (stated)"));
        }
    }

    private void tunnelling(Node stated) {
        StringBuilder line = new StringBuilder("  tunnelling ").append(Nodes.text(stated, "model"));
        Optional<Node.Quantity> wavenumber = Nodes.quantity(stated, "wavenumber");
        if (wavenumber.isPresent()) {
            line.append(", ")
                    .append(Rounding.shortest(wavenumber.get().value().orElse(Double.NaN)))
                    .append("i cm⁻¹");
        }
        List<Node> coefficients = Nodes.items(stated, "coefficients");
        if (coefficients.isEmpty()) {
            line.append(", could not be applied");
        }
        for (Node row : coefficients) {
            Optional<Node.Quantity> kelvin = Nodes.quantity(row, "temperature");
            if (kelvin.isPresent()) {
                line.append("; κ ")
                        .append(Rounding.significant(Nodes.number(row, "kappa"), 4))
                        .append(" at ")
                        .append(QuantityText.temperature(kelvin.get()));
            }
        }
        out.println(line);
    }

    private void table(Node table, Node.Group body) {
        String errors = switch (Nodes.text(body, "errorModel")) {
            case "stated" -> "uncertainties as stated";
            case "stated-both" -> "uncertainties of k and T as stated";
            case "constant-absolute" -> "one absolute error, estimated from the scatter";
            default -> "one relative error, estimated from the scatter";
        };
        StringBuilder line = new StringBuilder("  ");
        line.append(count(table, "used")).append(" points at ").append(count(table, "temperatures"));
        line.append(" temperatures");
        Optional<Node.Quantity> lowest = Nodes.quantity(table, "lowest");
        Optional<Node.Quantity> highest = Nodes.quantity(table, "highest");
        if (lowest.isPresent() && highest.isPresent()) {
            line.append(", ").append(QuantityText.temperature(lowest.get()));
            line.append(" to ").append(QuantityText.temperature(highest.get()));
        }
        if (Nodes.number(table, "excluded") > 0) {
            line.append(", ").append(count(table, "excluded")).append(" excluded");
        }
        out.println(line.append("; ").append(errors));
    }

    private static String count(Node table, String key) {
        double number = Nodes.number(table, key);
        return Double.isNaN(number) ? "?" : Rounding.decimals(number, 0);
    }

    private void model(Node model) {
        out.println("  " + Nodes.text(model, "title") + " (" + Nodes.text(model, "id") + ")");
        String outcome = Nodes.text(model, "outcome");
        if (!outcome.equals("fitted")) {
            Lines.wrapped(out, "    ", outcome + ": " + Nodes.text(model, "reason"));
            return;
        }
        quantities(Nodes.members(model, "parameters"));
        reproducing(model).ifPresent(text -> Lines.wrapped(out, "    to calculate with: ", text));
        Nodes.quantity(model, "derivedAt").ifPresent(at -> {
            out.println("    at " + QuantityText.temperature(at) + ":");
            quantities(Nodes.members(model, "derived"));
        });
        statistics(model);
    }

    private void quantities(Map<String, Node> members) {
        for (Map.Entry<String, Node> member : members.entrySet()) {
            if (member.getValue() instanceof Node.Quantity quantity) {
                Lines.wrapped(
                        out,
                        "      " + Lines.padded(Symbols.activation(member.getKey()), 4) + " ",
                        QuantityText.withInterval(quantity) + marks.marks(quantity.cautions()));
            }
        }
    }

    /** The parameters with so many digits that k calculated from them is right within a tenth of its uncertainty. */
    private static Optional<String> reproducing(Node model) {
        Map<String, Node> parameters = Nodes.members(model, "parameters");
        if (!(Nodes.get(model, "covariance").orElse(null) instanceof Node.Group covariance)
                || !(covariance.get("matrix").orElse(null) instanceof Node.Matrix matrix)
                || matrix.rows() != parameters.size()) {
            return Optional.empty();
        }
        List<Node> basis = Nodes.items(covariance, "basis");
        int n = matrix.rows();
        double[] values = new double[n];
        double[] scale = new double[n];
        boolean[] logarithmic = new boolean[n];
        String[] units = new String[n];
        int i = 0;
        for (Node node : parameters.values()) {
            if (!(node instanceof Node.Quantity quantity) || quantity.value().isEmpty()) {
                return Optional.empty();
            }
            boolean kilo = quantity.unit().equals("J/mol");
            logarithmic[i] =
                    basis.get(i) instanceof Node.Text text && text.value().startsWith("ln ");
            scale[i] = kilo && !logarithmic[i] ? 1e-3 : 1;
            units[i] = kilo ? "kJ/mol" : quantity.unit();
            values[i] = quantity.value().getAsDouble() * (kilo ? 1e-3 : 1);
            i++;
        }
        double[][] scaled = new double[n][n];
        for (int row = 0; row < n; row++) {
            for (int column = 0; column < n; column++) {
                scaled[row][column] = matrix.get(row, column) * scale[row] * scale[column];
            }
        }
        RoundedSet set = RoundedSet.reproducing(values, logarithmic, scaled);
        List<String> texts = new ArrayList<>();
        int at = 0;
        for (String symbol : parameters.keySet()) {
            texts.add(Symbols.activation(symbol) + " = "
                    + UnitText.after(set.texts().get(at), units[at]));
            at++;
        }
        double correlation = Nodes.number(covariance, "correlation");
        if (!Double.isNaN(correlation)) {
            texts.add("correlation " + Rounding.correlation(Math.max(-1, Math.min(1, correlation))));
        }
        return Optional.of(String.join(", ", texts));
    }

    private void statistics(Node model) {
        Node statistics = Nodes.get(model, "statistics").orElse(null);
        if (statistics == null) {
            return;
        }
        List<String> texts = new ArrayList<>();
        number(statistics, "s", 3).ifPresent(s -> texts.add("scatter s " + s));
        number(statistics, "chiSquared", 4).ifPresent(chi -> texts.add("χ² " + chi));
        double p = Nodes.number(statistics, "pValue");
        if (!Double.isNaN(p)) {
            texts.add("p " + Rounding.probability(Math.max(0, Math.min(1, p))));
        }
        number(statistics, "dof", 3).ifPresent(dof -> texts.add("degrees of freedom " + dof));
        number(statistics, "aicc", 4).ifPresent(aicc -> texts.add("AICc " + aicc));
        if (!texts.isEmpty()) {
            out.println("    " + String.join(", ", texts));
        }
    }

    private static Optional<String> number(Node group, String key, int digits) {
        double value = Nodes.number(group, key);
        if (Double.isNaN(value)) {
            return Optional.empty();
        }
        return Optional.of(value == Math.rint(value) ? Rounding.shortest(value) : Rounding.significant(value, digits));
    }

    private void comparison(Node comparison) {
        List<Node> notes = Nodes.items(comparison, "notes");
        String best = Nodes.text(comparison, "best");
        if (notes.isEmpty() && best.isEmpty()) {
            return;
        }
        out.println();
        out.println("  Which law");
        if (!best.isEmpty()) {
            out.println("    " + best);
        }
        sentences(notes);
    }

    private void sentences(List<Node> notes) {
        for (Node note : notes) {
            if (note instanceof Node.Text text) {
                Lines.wrapped(out, "    - ", text.value());
            }
        }
    }

    private void predictions(List<Node> rows) {
        if (rows.isEmpty()) {
            return;
        }
        out.println();
        out.println("  Predictions");
        PredictionLines.print(out, marks, rows);
    }
}
