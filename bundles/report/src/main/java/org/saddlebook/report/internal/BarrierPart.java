package org.saddlebook.report.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.presentation.api.QuantityText;
import org.saddlebook.presentation.api.Rounding;
import org.saddlebook.presentation.api.UnitText;
import org.saddlebook.report.api.ReportPart;
import org.saddlebook.report.api.ReportTools;

/** The section {@code barrier}: which laws the data allow, a card for each law, predictions, figures. */
final class BarrierPart implements ReportPart {
    private static final Set<String> SHOWN = Set.of(
            "errorModel",
            "response",
            "level",
            "context",
            "table",
            "models",
            "comparison",
            "predictions",
            "figures",
            "notes",
            "remarks",
            "cautions");

    @Override
    public String section() {
        return "barrier";
    }

    @Override
    public String html(Section section, ReportTools tools) {
        Node body = section.body();
        StringBuilder html = new StringBuilder();
        html.append(comparison(body));
        for (String note : Trees.texts(body, "notes")) {
            html.append(Html.element("p", Html.text(note))).append('\n');
        }
        List<String> remarks = Trees.texts(body, "remarks");
        if (!remarks.isEmpty()) {
            html.append("<h3>What the data could not show</h3>\n");
            for (String remark : remarks) {
                html.append(Html.element("p", Html.text(remark))).append('\n');
            }
        }
        List<String> cautions = Trees.texts(body, "cautions");
        if (!cautions.isEmpty()) {
            html.append("<p>For everything in this section")
                    .append(tools.cautions(cautions))
                    .append("</p>\n");
        }
        List<Node> figures = Trees.items(body, "figures");
        if (!figures.isEmpty()) {
            html.append(tools.node("", figures.get(0)));
        }
        for (Node model : Trees.items(body, "models")) {
            html.append(LawCard.html(model, body, tools));
        }
        html.append(predictions(body, tools));
        for (int i = 1; i < figures.size(); i++) {
            html.append(tools.node("", figures.get(i)));
        }
        if (body instanceof Node.Group group) {
            for (Map.Entry<String, Node> member : group.members().entrySet()) {
                if (!SHOWN.contains(member.getKey())) {
                    html.append(tools.node(member.getKey(), member.getValue()));
                }
            }
        }
        return html.toString();
    }

    private static String comparison(Node body) {
        Optional<Node> comparison = Trees.get(body, "comparison");
        if (comparison.isEmpty()) {
            return "";
        }
        Node node = comparison.get();
        StringBuilder html = new StringBuilder("<h3>Which law?</h3>\n");
        String best = Trees.text(node, "best");
        Set<String> candidates = new LinkedHashSet<>(Trees.texts(node, "candidates"));
        if (Trees.flag(node, "undecided")) {
            html.append("<p class=\"verdict\">Cannot be told apart: ")
                    .append(Html.text(titles(body, candidates)))
                    .append(".</p>\n");
        } else if (!best.isEmpty()) {
            html.append("<p class=\"verdict\">")
                    .append(Html.text(titles(body, Set.of(best))))
                    .append(
                            fittedCount(body) > 1
                                    ? " describes these data; see why below.</p>\n"
                                    : " is the only law fitted.</p>\n");
        }
        for (String note : Trees.texts(node, "notes")) {
            html.append(Html.element("p", Html.text(note))).append('\n');
        }
        if (Trees.get(node, "akaikeWeights").orElse(null) instanceof Node.Group weights
                && weights.members().size() > 1) {
            StringBuilder list = new StringBuilder();
            for (Map.Entry<String, Node> weight : weights.members().entrySet()) {
                if (weight.getValue() instanceof Node.Scalar scalar && scalar.value() >= 0 && scalar.value() <= 1) {
                    list.append(list.length() == 0 ? "" : ", ")
                            .append(titles(body, Set.of(weight.getKey())))
                            .append(' ')
                            .append(Rounding.probability(scalar.value()));
                }
            }
            html.append(Html.element("p", "Akaike weights: " + Html.text(list.toString()) + "."))
                    .append('\n');
        }
        return html.toString();
    }

    private static int fittedCount(Node body) {
        int count = 0;
        for (Node model : Trees.items(body, "models")) {
            count += Trees.text(model, "outcome").equals("fitted") ? 1 : 0;
        }
        return count;
    }

    /** Titles of these models, in the order of the section. */
    static String titles(Node body, Set<String> ids) {
        StringBuilder text = new StringBuilder();
        for (Node model : Trees.items(body, "models")) {
            if (ids.contains(Trees.text(model, "id"))) {
                text.append(text.length() == 0 ? "" : ", ").append(Trees.text(model, "title"));
            }
        }
        return text.length() == 0 ? String.join(", ", ids) : text.toString();
    }

    /** One table for each temperature; cautions that all its laws share stand with the temperature. */
    private static String predictions(Node body, ReportTools tools) {
        Map<String, List<Node>> byTemperature = byTemperature(Trees.items(body, "predictions"));
        if (byTemperature.isEmpty()) {
            return "";
        }
        StringBuilder html = new StringBuilder("<h3>Predictions</h3>\n");
        byTemperature.forEach((at, rows) -> {
            List<String> shared = shared(rows, "k");
            html.append("<div class=\"wide\"><table class=\"numbers\">\n<caption>At ")
                    .append(Html.text(at))
                    .append(", ")
                    .append(Html.text(outside(rows.get(0))))
                    .append(tools.cautions(shared))
                    .append("</caption>\n<thead><tr>");
            String unit = Trees.quantity(rows.get(0), "k")
                    .map(k -> UnitText.forPeople(k.unit()))
                    .orElse("");
            html.append(Html.columnHead("law"));
            for (String head : List.of("<i>k</i>", "interval of the mean", "interval of a new run")) {
                html.append(Html.columnHead(head + "<br/><small>" + Html.text(unit) + "</small>"));
            }
            html.append("</tr></thead>\n<tbody>\n");
            rows.forEach(row -> html.append(row(row, body, shared, tools)));
            html.append("</tbody></table></div>\n");
        });
        return html.toString();
    }

    private static String row(Node row, Node body, List<String> shared, ReportTools tools) {
        Optional<Node.Quantity> k = Trees.quantity(row, "k");
        Optional<Node.Quantity> newRun = Trees.quantity(row, "kNewRun");
        List<String> own = without(cautions(k), shared);
        List<String> more = without(without(cautions(newRun), shared), own);
        return "<tr>" + Html.rowHead(Html.text(titles(body, Set.of(Trees.text(row, "model")))))
                + cell(k.map(BarrierPart::bare).map(QuantityText::of).orElse("not determined"), own, tools)
                + cell(interval(k), List.of(), tools)
                + cell(interval(newRun), more, tools)
                + "</tr>\n";
    }

    /** Rows of predictions under the temperature they hold at, in order. */
    static Map<String, List<Node>> byTemperature(List<Node> rows) {
        Map<String, List<Node>> groups = new LinkedHashMap<>();
        for (Node row : rows) {
            String at = Trees.quantity(row, "temperature")
                    .map(QuantityText::temperature)
                    .orElse("a temperature that is not stated");
            groups.computeIfAbsent(at, key -> new ArrayList<>()).add(row);
        }
        return groups;
    }

    /** Ids of the cautions that the quantity carries in every row. */
    static List<String> shared(List<Node> rows, String key) {
        List<String> shared = new ArrayList<>(cautions(Trees.quantity(rows.get(0), key)));
        for (Node row : rows) {
            shared.retainAll(cautions(Trees.quantity(row, key)));
        }
        return shared;
    }

    static List<String> without(List<String> ids, List<String> shared) {
        return ids.stream().filter(id -> !shared.contains(id)).toList();
    }

    static List<String> cautions(Optional<Node.Quantity> quantity) {
        return quantity.map(Node.Quantity::cautions).orElse(List.of());
    }

    private static String outside(Node row) {
        Optional<Node.Quantity> extrapolation = Trees.quantity(row, "extrapolation");
        if (extrapolation.isEmpty() || extrapolation.get().value().isEmpty()) {
            return "";
        }
        double kelvin = extrapolation.get().value().getAsDouble();
        return kelvin == 0
                ? "inside the measured temperatures"
                : Rounding.significant(kelvin, 3) + "\u00a0K outside the measured temperatures";
    }

    private static String interval(Optional<Node.Quantity> quantity) {
        return quantity.flatMap(Node.Quantity::interval)
                .map(interval -> QuantityText.set(interval, "1"))
                .orElse("none");
    }

    /** The same without its unit, which stands in the head of the column. */
    private static Node.Quantity bare(Node.Quantity k) {
        return new Node.Quantity(
                k.value(), "1", k.standardUncertainty(), k.standardFactor(), k.interval(), k.cautions());
    }

    /** A cell with a number and the numbers of its cautions. */
    static String cell(String text, List<String> cautions, ReportTools tools) {
        return Html.element("td", Html.element("span", "number", Html.text(text)) + tools.cautions(cautions));
    }
}
