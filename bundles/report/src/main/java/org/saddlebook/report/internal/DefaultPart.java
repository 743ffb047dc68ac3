package org.saddlebook.report.internal;

import java.util.List;
import java.util.Map;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.presentation.api.DisplayUnit;
import org.saddlebook.presentation.api.Rounding;
import org.saddlebook.presentation.api.UnitText;

/** Shows any section, also of a bundle that is gone: every node of the closed vocabulary has a form. */
final class DefaultPart {
    private static final int DIGITS = 6;

    private DefaultPart() {}

    static String html(Section section, Tools tools) {
        return node("", section.body(), tools);
    }

    static String node(String key, Node node, Tools tools) {
        if (node instanceof Node.Group group) {
            return titled(key, group(group, tools));
        }
        if (node instanceof Node.Items items) {
            return key.equals("cautions") ? cautions(items, tools) : titled(key, items(items, tools));
        }
        if (node instanceof Node.Table table) {
            return titled(key, table(table, tools));
        }
        if (node instanceof Node.Matrix matrix) {
            return titled(key, matrix(matrix, List.of()));
        }
        if (node instanceof Node.Figure figure) {
            return tools.figure(figure);
        }
        return titled(key, "<p>" + inline(node, tools) + "</p>\n");
    }

    private static String titled(String key, String content) {
        return key.isEmpty() || content.isEmpty()
                ? content
                : "<h4>" + Html.text(Symbols.words(key)) + "</h4>\n" + content;
    }

    /** Simple members side by side in a definition list, in order; what is large follows under its own heading. */
    private static String group(Node.Group group, Tools tools) {
        StringBuilder simple = new StringBuilder();
        StringBuilder large = new StringBuilder();
        for (Map.Entry<String, Node> member : group.members().entrySet()) {
            if (simple(member.getValue())) {
                simple.append(Html.entry(Html.text(Symbols.words(member.getKey())), inline(member.getValue(), tools)))
                        .append('\n');
            } else {
                large.append(node(member.getKey(), member.getValue(), tools));
            }
        }
        String list = simple.length() == 0 ? "" : "<dl>\n" + simple + "</dl>\n";
        return list + large;
    }

    private static String items(Node.Items items, Tools tools) {
        if (items.items().isEmpty()) {
            return "";
        }
        StringBuilder html = new StringBuilder("<ul>\n");
        for (Node item : items.items()) {
            html.append("<li>")
                    .append(simple(item) ? inline(item, tools) : node("", item, tools))
                    .append("</li>\n");
        }
        return html.append("</ul>\n").toString();
    }

    private static String cautions(Node.Items items, Tools tools) {
        List<String> ids = items.items().stream()
                .filter(Node.Text.class::isInstance)
                .map(item -> ((Node.Text) item).value())
                .toList();
        return ids.isEmpty() ? "" : "<p>For all of the above" + tools.cautions(ids) + "</p>\n";
    }

    static String table(Node.Table table, Tools tools) {
        StringBuilder html = new StringBuilder("<div class=\"wide\"><table>\n<thead><tr>");
        for (Node.Column column : table.columns()) {
            String unit = UnitText.forPeople(DisplayUnit.of(column.unit()).ucum());
            html.append(Html.columnHead(
                    Html.text(column.title()) + (unit.isEmpty() ? "" : "<br/><small>" + Html.text(unit) + "</small>")));
        }
        html.append("</tr></thead>\n<tbody>\n");
        for (List<Node> row : table.rows()) {
            html.append("<tr>");
            for (int i = 0; i < row.size(); i++) {
                Node cell = row.get(i);
                String content = cell instanceof Node.Scalar scalar
                        ? number(DisplayUnit.of(table.columns().get(i).unit()).value(scalar.value()))
                        : simple(cell) ? inline(cell, tools) : node("", cell, tools);
                html.append(i == 0 ? Html.rowHead(content) : Html.element("td", content));
            }
            html.append("</tr>\n");
        }
        return html.append("</tbody></table></div>\n").toString();
    }

    /** A matrix with the names of its rows and columns, where there are any. */
    static String matrix(Node.Matrix matrix, List<String> names) {
        StringBuilder html = new StringBuilder("<div class=\"wide\"><table>\n");
        boolean named = names.size() == matrix.rows() && names.size() == matrix.columns();
        if (named) {
            html.append("<thead><tr><td></td>");
            names.forEach(name -> html.append(Html.columnHead(name)));
            html.append("</tr></thead>\n");
        }
        html.append("<tbody>\n");
        for (int i = 0; i < matrix.rows(); i++) {
            html.append("<tr>").append(named ? Html.rowHead(names.get(i)) : "");
            for (int j = 0; j < matrix.columns(); j++) {
                html.append("<td>").append(number(matrix.get(i, j))).append("</td>");
            }
            html.append("</tr>\n");
        }
        return html.append("</tbody></table></div>\n").toString();
    }

    private static boolean simple(Node node) {
        return node instanceof Node.Quantity
                || node instanceof Node.Scalar
                || node instanceof Node.Flag
                || node instanceof Node.Text;
    }

    private static String inline(Node node, Tools tools) {
        if (node instanceof Node.Quantity quantity) {
            return tools.quantity(quantity);
        }
        if (node instanceof Node.Scalar scalar) {
            return number(scalar.value());
        }
        if (node instanceof Node.Flag flag) {
            return flag.value() ? "yes" : "no";
        }
        return node instanceof Node.Text text ? Html.text(text.value()) : "";
    }

    /** Whole numbers stand as they are; others have six digits, which a report needs at most. */
    static String number(double value) {
        boolean whole = value == Math.rint(value) && Math.abs(value) < 1e9;
        return Html.element(
                "span", "number", whole ? Rounding.decimals(value, 0) : Rounding.significant(value, DIGITS));
    }
}
