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
        StringBuilder head = new StringBuilder();
        StringBuilder list = new StringBuilder();
        StringBuilder rest = new StringBuilder();
        StringBuilder foot = new StringBuilder();
        if (!(section.body() instanceof Node.Group body)) {
            return tools.node("", section.body());
        }
        for (Map.Entry<String, Node> member : body.members().entrySet()) {
            String key = member.getKey();
            Node node = member.getValue();
            if (key.equals("case") && node instanceof Node.Text text) {
                head.append(Html.element("p", "verdict", Html.text(text.value())))
                        .append('\n');
            } else if (key.equals("notes") && node instanceof Node.Items) {
                for (String note : Trees.texts(body, key)) {
                    head.append(Html.element("p", Html.text(note))).append('\n');
                }
            } else if (node instanceof Node.Quantity quantity) {
                list.append(Html.entry(
                                SYMBOLS.getOrDefault(key, Html.text(Symbols.words(key))), tools.quantity(quantity)))
                        .append('\n');
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
        StringBuilder rows = new StringBuilder();
        for (Node row : items.items()) {
            Optional<Node.Quantity> at = Trees.quantity(row, "temperature");
            Optional<Node.Quantity> energy = Trees.quantity(row, "dG");
            if (at.isEmpty() || energy.isEmpty()) {
                return tools.node("dG", items);
            }
            rows.append("<tr>").append(Html.rowHead(Html.text(QuantityText.temperature(at.get()))));
            rows.append(BarrierPart.cautioned(QuantityText.of(energy.get()), energy, tools));
            rows.append(Html.element(
                            "td", Html.text(QuantityText.interval(energy.get()).orElse("none"))))
                    .append("</tr>\n");
        }
        if (rows.length() == 0) {
            return "";
        }
        return "<div class=\"wide\"><table class=\"numbers\">\n<thead><tr>" + Html.columnHead("at")
                + Html.columnHead("Δ<i>G</i>") + Html.columnHead("interval") + "</tr></thead>\n<tbody>\n" + rows
                + "</tbody></table></div>\n";
    }
}
