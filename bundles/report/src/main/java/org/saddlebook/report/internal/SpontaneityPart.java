package org.saddlebook.report.internal;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.presentation.api.QuantityText;
import org.saddlebook.report.api.ReportPart;
import org.saddlebook.report.api.ReportTools;

/** The section {@code spontaneity}: sign case, ΔH and ΔS, crossovers, ΔG at temperatures, figures. */
final class SpontaneityPart implements ReportPart {
    private static final Map<String, String> SYMBOLS =
            Map.of("dH", "Δ<i>H</i>", "dS", "Δ<i>S</i>", "dG", "Δ<i>G</i>", "dCp", "Δ<i>C</i><sub>p</sub>");

    @Override
    public String section() {
        return "spontaneity";
    }

    @Override
    public String html(Section section, ReportTools tools) {
        if (!(section.body() instanceof Node.Group body)) {
            return tools.node("", section.body());
        }
        StringBuilder head = new StringBuilder();
        StringBuilder list = new StringBuilder();
        StringBuilder rest = new StringBuilder();
        StringBuilder foot = new StringBuilder();
        boolean verdict = false;
        for (String note : Trees.texts(body, "notes")) {
            head.append(verdict ? Html.element("p", Html.text(note)) : Html.element("p", "verdict", Html.text(note)));
            head.append('\n');
            verdict = true;
        }
        for (Map.Entry<String, Node> member : body.members().entrySet()) {
            String key = member.getKey();
            Node node = member.getValue();
            if (key.equals("notes") || (key.equals("possibleCases") && single(node))) {
                continue;
            }
            if (node instanceof Node.Quantity || node instanceof Node.Scalar || node instanceof Node.Text) {
                list.append(entry(key, node, tools)).append('\n');
            } else if (key.equals("crossovers") && node instanceof Node.Items items) {
                rest.append(crossovers(items.items(), tools));
            } else if (key.equals("dG") && node instanceof Node.Items items) {
                rest.append(energies(items, tools));
            } else if (key.equals("figures") && node instanceof Node.Items items) {
                for (Node figure : items.items()) {
                    foot.append(tools.node("", figure));
                }
            } else {
                rest.append(tools.node(key, node));
            }
        }
        String quantities = list.length() == 0 ? "" : "<dl>\n" + list + "</dl>\n";
        return head + quantities + rest + foot;
    }

    /** One possible case only: then it is the case. */
    private static boolean single(Node cases) {
        return cases instanceof Node.Items items && items.items().size() == 1;
    }

    private static String entry(String key, Node node, ReportTools tools) {
        String name = SYMBOLS.getOrDefault(key, Html.text(Symbols.words(key)));
        if (node instanceof Node.Quantity quantity) {
            return Html.entry(name, tools.quantity(quantity));
        }
        return Html.entry(
                name,
                node instanceof Node.Scalar scalar
                        ? DefaultPart.number(scalar.value())
                        : Html.text(((Node.Text) node).value()));
    }

    private static String crossovers(List<Node> items, ReportTools tools) {
        if (items.isEmpty()) {
            return "";
        }
        StringBuilder html = new StringBuilder("<h3>Crossover</h3>\n");
        for (Node item : items) {
            Optional<Node.Quantity> temperature = item instanceof Node.Quantity quantity
                    ? Optional.of(quantity)
                    : Trees.quantity(item, "temperature");
            if (temperature.isPresent() && item instanceof Node.Quantity quantity) {
                html.append(Html.element("p", "Δ<i>G</i> passes zero at " + tools.temperature(quantity) + "."))
                        .append('\n');
            } else if (temperature.isPresent() && item instanceof Node.Group group) {
                html.append(Html.element("p", "Δ<i>G</i> passes zero at " + tools.temperature(temperature.get()) + "."))
                        .append('\n');
                for (Map.Entry<String, Node> member : group.members().entrySet()) {
                    if (!member.getKey().equals("temperature")) {
                        html.append(tools.node(member.getKey(), member.getValue()));
                    }
                }
            } else {
                html.append(tools.node("", item));
            }
        }
        return html.toString();
    }

    private static String energies(Node.Items items, ReportTools tools) {
        if (items.items().isEmpty()) {
            return "";
        }
        for (Node row : items.items()) {
            if (Trees.quantity(row, "temperature").isEmpty()
                    || Trees.quantity(row, "dG").isEmpty()) {
                return tools.node("dG", items);
            }
        }
        List<String> shared = BarrierPart.shared(items.items(), "dG");
        StringBuilder html =
                new StringBuilder("<div class=\"wide\"><table class=\"numbers\">\n<caption>Δ<i>G</i> at single"
                        + " temperatures" + tools.cautions(shared) + "</caption>\n<thead><tr>");
        for (String head : List.of("at", "Δ<i>G</i>", "interval", "sign")) {
            html.append(Html.columnHead(head));
        }
        html.append("</tr></thead>\n<tbody>\n");
        for (Node row : items.items()) {
            Node.Quantity energy = Trees.quantity(row, "dG").orElseThrow();
            html.append("<tr>")
                    .append(Html.rowHead(Html.text(QuantityText.temperature(
                            Trees.quantity(row, "temperature").orElseThrow()))))
                    .append(BarrierPart.cell(
                            QuantityText.of(energy), BarrierPart.without(energy.cautions(), shared), tools))
                    .append(Html.element(
                            "td", Html.text(QuantityText.interval(energy).orElse("none"))))
                    .append(Html.element("td", Html.text(Trees.text(row, "sign"))))
                    .append("</tr>\n");
        }
        return html.append("</tbody></table></div>\n").toString();
    }
}
