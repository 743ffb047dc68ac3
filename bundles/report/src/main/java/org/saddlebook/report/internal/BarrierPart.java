package org.saddlebook.report.internal;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.presentation.api.QuantityText;
import org.saddlebook.presentation.api.Rounding;
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

    private static String predictions(Node body, ReportTools tools) {
        List<Node> rows = Trees.items(body, "predictions");
        if (rows.isEmpty()) {
            return "";
        }
        StringBuilder html =
                new StringBuilder("<h3>Predictions</h3>\n<div class=\"wide\"><table class=\"numbers\">\n<thead><tr>");
        for (String head : List.of(
                "at", "law", "<i>k</i>", "interval of the mean", "interval of a new run", "outside the data by")) {
            html.append(Html.columnHead(head));
        }
        html.append("</tr></thead>\n<tbody>\n");
        String last = "";
        for (Node row : rows) {
            String at = Trees.quantity(row, "temperature")
                    .map(QuantityText::temperature)
                    .orElse("");
            Optional<Node.Quantity> k = Trees.quantity(row, "k");
            Optional<Node.Quantity> newRun = Trees.quantity(row, "kNewRun");
            html.append("<tr").append(at.equals(last) ? ">" : " class=\"first\">");
            html.append(Html.rowHead(at.equals(last) ? "″" : Html.text(at)));
            html.append(Html.element("td", Html.text(titles(body, Set.of(Trees.text(row, "model"))))));
            html.append(cautioned(k.map(QuantityText::of).orElse("not determined"), k, tools));
            html.append(Html.element("td", Html.text(interval(k))));
            List<String> more = newRun.map(Node.Quantity::cautions).orElse(List.of()).stream()
                    .filter(id -> k.isEmpty() || !k.get().cautions().contains(id))
                    .toList();
            html.append(Html.element("td", Html.text(interval(newRun)) + tools.cautions(more)));
            html.append(Html.element("td", Html.text(outside(row)))).append("</tr>\n");
            last = at;
        }
        return html.append("</tbody></table></div>\n").toString();
    }

    private static String outside(Node row) {
        Optional<Node.Quantity> extrapolation = Trees.quantity(row, "extrapolation");
        if (extrapolation.isEmpty() || extrapolation.get().value().isEmpty()) {
            return "";
        }
        double kelvin = extrapolation.get().value().getAsDouble();
        return kelvin == 0 ? "inside" : Rounding.significant(kelvin, 3) + "\u00a0K";
    }

    private static String interval(Optional<Node.Quantity> quantity) {
        return quantity.flatMap(q -> q.interval().map(i -> QuantityText.set(i, q.unit())))
                .orElse("none");
    }

    /** A cell; with cautions its corner is dog-eared. */
    static String cautioned(String text, Optional<Node.Quantity> quantity, ReportTools tools) {
        List<String> ids = quantity.map(Node.Quantity::cautions).orElse(List.of());
        String content = Html.element("span", "number", Html.text(text)) + tools.cautions(ids);
        return ids.isEmpty() ? Html.element("td", content) : Html.element("td", "eared", content);
    }
}
