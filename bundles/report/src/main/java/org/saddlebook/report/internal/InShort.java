package org.saddlebook.report.internal;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.presentation.api.QuantityText;

/** The findings in a few sentences, each with its evidence and its cautions. */
final class InShort {
    private InShort() {}

    static String html(Findings findings, Tools tools) {
        StringBuilder html = new StringBuilder();
        for (Section section : findings.sections().values()) {
            if (section.outcome() != Section.Outcome.DONE) {
                html.append("<p>")
                        .append(Html.text(section.title()))
                        .append(": ")
                        .append(section.outcome() == Section.Outcome.REFUSED ? "not done. " : "failed. ")
                        .append(Html.text(Trees.text(section.body(), "reason")))
                        .append("</p>\n");
            } else if (section.id().equals("barrier")) {
                barrier(html, section.body(), tools);
            } else if (section.id().equals("spontaneity")) {
                Trees.texts(section.body(), "notes").stream()
                        .limit(1)
                        .forEach(note ->
                                html.append(Html.element("p", Html.text(note))).append('\n'));
                for (Node crossover : Trees.items(section.body(), "crossovers")) {
                    if (crossover instanceof Node.Quantity quantity) {
                        html.append(Html.element("p", "Crossover: " + tools.temperature(quantity) + "."))
                                .append('\n');
                    }
                }
            }
        }
        return html.toString();
    }

    private static void barrier(StringBuilder html, Node body, Tools tools) {
        Node comparison = Trees.get(body, "comparison").orElse(new Node.Group(Map.of()));
        Set<String> candidates = new LinkedHashSet<>(Trees.texts(comparison, "candidates"));
        String best = Trees.text(comparison, "best");
        if (!best.isEmpty()) {
            candidates.add(best);
        }
        if (Trees.flag(comparison, "undecided")) {
            html.append("<p>The data allow more than one law; they are shown side by side.</p>\n");
        }
        String standard = Trees.text(Trees.get(body, "context").orElse(comparison), "standardStateText");
        for (Node model : Trees.items(body, "models")) {
            boolean remains = candidates.isEmpty() || candidates.contains(Trees.text(model, "id"));
            if (remains
                    && Trees.get(model, "parameters").orElse(null) instanceof Node.Group group
                    && !group.members().isEmpty()) {
                StringBuilder values = new StringBuilder();
                for (Map.Entry<String, Node> member : group.members().entrySet()) {
                    if (member.getValue() instanceof Node.Quantity quantity) {
                        values.append(values.length() == 0 ? "" : ", ")
                                .append(Symbols.activation(member.getKey()))
                                .append(" ")
                                .append(Html.element("span", "number", Html.text(QuantityText.of(quantity))))
                                .append(tools.cautions(quantity.cautions()))
                                .append(
                                        member.getKey().equals("dS") && !standard.isEmpty()
                                                ? " at " + Html.text(standard)
                                                : "");
                    }
                }
                html.append("<p><b>")
                        .append(Html.text(Trees.text(model, "title")))
                        .append("</b>: ")
                        .append(values)
                        .append(".</p>\n");
            }
        }
        BarrierPart.byTemperature(Trees.items(body, "predictions")).forEach((at, rows) -> {
            StringBuilder values = new StringBuilder();
            Set<String> cautions = new LinkedHashSet<>();
            for (Node row : rows) {
                String model = Trees.text(row, "model");
                Optional<Node.Quantity> k = Trees.quantity(row, "k");
                if (k.isPresent() && (candidates.isEmpty() || candidates.contains(model))) {
                    values.append(values.length() == 0 ? "" : "; ")
                            .append(Html.element("span", "number", Html.text(QuantityText.of(k.get()))))
                            .append(" (")
                            .append(Html.text(BarrierPart.titles(body, Set.of(model))))
                            .append(')');
                    cautions.addAll(k.get().cautions());
                }
            }
            if (values.length() > 0) {
                html.append("<p><i>k</i> at ")
                        .append(Html.text(at))
                        .append(tools.cautions(List.copyOf(cautions)))
                        .append(": ")
                        .append(values)
                        .append(".</p>\n");
            }
        });
    }
}
