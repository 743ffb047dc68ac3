package org.saddlebook.report.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Node;
import org.saddlebook.presentation.api.DisplayUnit;
import org.saddlebook.presentation.api.QuantityText;
import org.saddlebook.presentation.api.RoundedSet;
import org.saddlebook.presentation.api.Rounding;
import org.saddlebook.presentation.api.UnitText;
import org.saddlebook.report.api.ReportTools;

/** One law of the section {@code barrier}: parameters, derived values, the set to calculate with, statistics, covariance. */
final class LawCard {
    private LawCard() {}

    static String html(Node model, Node body, ReportTools tools) {
        StringBuilder html = new StringBuilder("<section class=\"card\">\n");
        html.append(Html.element("h3", Html.text(Trees.text(model, "title")))).append('\n');
        if (!Trees.text(model, "outcome").equals("fitted")) {
            String word = switch (Trees.text(model, "outcome")) {
                case "undetermined" -> "Not determined: ";
                case "refused" -> "Not fitted: ";
                default -> "Failed: ";
            };
            html.append("<p class=\"lost\">")
                    .append(word)
                    .append(Html.text(Trees.text(model, "reason")))
                    .append("</p>\n");
            return html.append("</section>\n").toString();
        }
        html.append(quantities("Parameters", model, "parameters", tools));
        html.append(toCalculateWith(model));
        Optional<Node.Quantity> at = Trees.quantity(model, "derivedAt");
        String where = at.isEmpty() ? "Derived values" : "Derived, holding at " + QuantityText.temperature(at.get());
        html.append(quantities(where, model, "derived", tools));
        html.append(conventions(body));
        html.append(statistics(model));
        html.append(covariance(model));
        return html.append("</section>\n").toString();
    }

    private static String quantities(String caption, Node model, String key, ReportTools tools) {
        if (!(Trees.get(model, key).orElse(null) instanceof Node.Group group)
                || group.members().isEmpty()) {
            return "";
        }
        StringBuilder html = new StringBuilder("<div class=\"wide\"><table class=\"numbers\">\n");
        html.append(Html.element("caption", Html.text(caption))).append("\n<thead><tr>");
        for (String head : List.of("symbol", "stands for", "value and standard uncertainty", "interval")) {
            html.append(Html.columnHead(head));
        }
        html.append("</tr></thead>\n<tbody>\n");
        for (Map.Entry<String, Node> member : group.members().entrySet()) {
            if (!(member.getValue() instanceof Node.Quantity quantity)) {
                continue;
            }
            html.append("<tr>").append(Html.rowHead(Symbols.activation(member.getKey())));
            html.append(Html.element("td", Html.text(name(model, member.getKey()))));
            String value = QuantityText.isUndetermined(quantity) ? "not determined" : QuantityText.of(quantity);
            html.append(BarrierPart.cell(value, quantity.cautions(), tools));
            html.append(Html.element(
                            "td", Html.text(QuantityText.interval(quantity).orElse("none"))))
                    .append("</tr>\n");
        }
        return html.append("</tbody></table></div>\n").toString();
    }

    /** What a symbol stands for, as the law names it. */
    private static String name(Node model, String symbol) {
        Optional<Node> names = Trees.get(model, "names");
        String name = names.isPresent() ? Trees.text(names.get(), symbol) : "";
        return name.isEmpty() ? Symbols.name(symbol) : name;
    }

    /** The parameters with enough digits to calculate with; left out where the findings hold no full covariance. */
    private static String toCalculateWith(Node model) {
        Optional<Node> covariance = Trees.get(model, "covariance");
        if (covariance.isEmpty()
                || !(Trees.get(covariance.get(), "matrix").orElse(null) instanceof Node.Matrix matrix)
                || !(Trees.get(model, "parameters").orElse(null) instanceof Node.Group parameters)) {
            return "";
        }
        List<String> basis = Trees.texts(covariance.get(), "basis");
        int n = basis.size();
        if (n != matrix.rows() || n != matrix.columns()) {
            return "";
        }
        double[] values = new double[n];
        boolean[] logarithmic = new boolean[n];
        double[] factor = new double[n];
        List<String> symbols = new ArrayList<>();
        List<String> units = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            logarithmic[i] = basis.get(i).startsWith("ln ");
            String symbol = logarithmic[i] ? basis.get(i).substring(3) : basis.get(i);
            if (!(parameters.members().get(symbol) instanceof Node.Quantity quantity)
                    || quantity.value().isEmpty()
                    || !Double.isFinite(quantity.value().getAsDouble())
                    || (logarithmic[i] && !(quantity.value().getAsDouble() > 0))) {
                return "";
            }
            DisplayUnit unit = DisplayUnit.of(quantity.unit());
            values[i] = unit.value(quantity.value().getAsDouble());
            factor[i] = logarithmic[i] ? 1 : unit.value(1);
            symbols.add(symbol);
            units.add(unit.ucum());
        }
        double[][] shown = new double[n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                shown[i][j] = matrix.get(i, j) * factor[i] * factor[j];
            }
        }
        RoundedSet set = RoundedSet.reproducing(values, logarithmic, shown);
        boolean open = false;
        for (String symbol : symbols) {
            open |= parameters.members().get(symbol) instanceof Node.Quantity quantity
                    && QuantityText.isUndetermined(quantity);
        }
        StringBuilder html = new StringBuilder("<p class=\"set\">To calculate with");
        html.append(open ? ", all together only, since single ones are not determined: " : ": ");
        for (int i = 0; i < n; i++) {
            html.append(i == 0 ? "" : "; ")
                    .append(Symbols.activation(symbols.get(i)))
                    .append(" = ")
                    .append(Html.element(
                            "span",
                            "number",
                            Html.text(UnitText.after(set.texts().get(i), units.get(i)))));
        }
        return html.append(
                        ". With these digits every <i>k</i> comes out within a tenth of its standard uncertainty.</p>\n")
                .toString();
    }

    private static String conventions(Node body) {
        Optional<Node> context = Trees.get(body, "context");
        if (context.isEmpty()) {
            return "";
        }
        Node node = context.get();
        StringBuilder text = new StringBuilder();
        OptionalDouble order = Trees.number(node, "order");
        if (order.isPresent()) {
            text.append("Overall order ")
                    .append(Rounding.shortest(order.getAsDouble()))
                    .append(", from the unit. ");
        }
        String standard = Trees.text(node, "standardStateText");
        if (!standard.isEmpty()) {
            text.append("Standard state ")
                    .append(standard)
                    .append(Trees.flag(node, "standardStateAssumed") ? ", assumed" : ", stated")
                    .append(". ");
        }
        OptionalDouble transmission = Trees.number(node, "transmission");
        if (transmission.isPresent()) {
            text.append("Transmission coefficient ")
                    .append(Rounding.shortest(transmission.getAsDouble()))
                    .append(". ");
        }
        Optional<Node> tunnelling = Trees.get(node, "tunnelling");
        if (tunnelling.isPresent()) {
            text.append("Tunnelling: ").append(Trees.text(tunnelling.get(), "model"));
            for (Node row : Trees.items(tunnelling.get(), "coefficients")) {
                Optional<Node.Quantity> kelvin = Trees.quantity(row, "temperature");
                OptionalDouble kappa = Trees.number(row, "kappa");
                if (kelvin.isPresent() && kappa.isPresent()) {
                    text.append(", κ ")
                            .append(Rounding.significant(kappa.getAsDouble(), 4))
                            .append(" at ")
                            .append(QuantityText.temperature(kelvin.get()));
                }
            }
            text.append(". ");
        }
        Optional<Node.Quantity> reference = Trees.quantity(node, "referenceTemperature");
        if (reference.isPresent()) {
            text.append("Laws with a reference temperature use ")
                    .append(QuantityText.temperature(reference.get()))
                    .append(". ");
        }
        return text.length() == 0
                ? ""
                : Html.element("p", "small", Html.text(text.toString().trim())) + "\n";
    }

    private static String statistics(Node model) {
        Optional<Node> statistics = Trees.get(model, "statistics");
        if (statistics.isEmpty()) {
            return "";
        }
        Node node = statistics.get();
        StringBuilder list = new StringBuilder();
        Trees.number(node, "n").ifPresent(n -> list.append(Html.entry("points", DefaultPart.number(n))));
        Trees.number(node, "dof").ifPresent(n -> list.append(Html.entry("degrees of freedom", DefaultPart.number(n))));
        Trees.number(node, "s")
                .ifPresent(s -> list.append(Html.entry(
                        "scatter of ln <i>k</i>", Html.element("span", "number", Rounding.significant(s, 2)))));
        Trees.number(node, "chiSquared").ifPresent(x -> list.append(Html.entry("χ²", digits(x, 3))));
        Trees.number(node, "pValue")
                .ifPresent(p -> list.append(Html.entry(
                        "probability of a larger χ²", p >= 0 && p <= 1 ? Rounding.probability(p) : digits(p, 2))));
        Trees.number(node, "birgeRatio")
                .ifPresent(r -> list.append(Html.entry("√(χ²/degrees of freedom), not applied", digits(r, 3))));
        if (Trees.number(node, "chiSquared").isEmpty()) {
            Trees.number(node, "rss").ifPresent(x -> list.append(Html.entry("sum of squares", digits(x, 4))));
        }
        list.append(Html.entry(
                "AICc",
                Trees.number(node, "aicc").isPresent()
                        ? digits(Trees.number(node, "aicc").getAsDouble(), 5)
                        : "absent: too few points, or no scatter"));
        Trees.number(node, "bic").ifPresent(x -> list.append(Html.entry("BIC", digits(x, 5))));
        Trees.number(node, "conditionNumber").ifPresent(x -> list.append(Html.entry("condition number", digits(x, 2))));
        return "<dl class=\"figures\">\n" + list + "</dl>\n";
    }

    private static String digits(double value, int digits) {
        return Html.element("span", "number", Rounding.significant(value, digits));
    }

    private static String covariance(Node model) {
        Optional<Node> covariance = Trees.get(model, "covariance");
        if (covariance.isEmpty()
                || !(Trees.get(covariance.get(), "matrix").orElse(null) instanceof Node.Matrix matrix)) {
            return "<p class=\"small\">No covariance: nothing is left to estimate the scatter from.</p>\n";
        }
        List<String> basis = Trees.texts(covariance.get(), "basis");
        List<String> units = Trees.texts(covariance.get(), "units");
        List<String> names = new ArrayList<>();
        for (int i = 0; i < basis.size(); i++) {
            String unit = i < units.size() ? UnitText.forPeople(units.get(i)) : "";
            names.add(Symbols.activation(basis.get(i))
                    + (unit.isEmpty() ? "" : " <small>/ " + Html.text(unit) + "</small>"));
        }
        StringBuilder html =
                new StringBuilder("<details open=\"open\"><summary>Covariance and correlation</summary>\n");
        html.append(DefaultPart.matrix(matrix, names));
        html.append(correlations(matrix, basis));
        return html.append("</details>\n").toString();
    }

    private static String correlations(Node.Matrix matrix, List<String> basis) {
        StringBuilder text = new StringBuilder();
        for (int i = 0; i < matrix.rows() && i < basis.size(); i++) {
            for (int j = 0; j < i; j++) {
                double r = matrix.get(i, j) / Math.sqrt(matrix.get(i, i)) / Math.sqrt(matrix.get(j, j));
                if (Double.isFinite(r)) {
                    text.append(text.length() == 0 ? "Correlation: " : "; ")
                            .append(Symbols.activation(basis.get(j)))
                            .append(" with ")
                            .append(Symbols.activation(basis.get(i)))
                            .append(' ')
                            .append(Rounding.correlation(Math.max(-1, Math.min(1, r))));
                }
            }
        }
        return text.length() == 0 ? "" : Html.element("p", "small", text + ".") + "\n";
    }
}
