package org.saddlebook.console.internal;

import java.io.PrintStream;
import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.saddlebook.api.findings.Node;
import org.saddlebook.presentation.api.QuantityText;
import org.saddlebook.presentation.api.Rounding;
import org.saddlebook.presentation.api.UnitText;

/** Prints any tree of findings: a section of a bundle that nobody here knows reads as well as our own. */
final class NodeSummary {
    private static final int DIGITS = 6;

    private final PrintStream out;
    private final CautionMarks marks;

    NodeSummary(PrintStream out, CautionMarks marks) {
        this.out = out;
        this.marks = marks;
    }

    /** Prints a node, indented by two spaces per level. */
    void print(Node node, int level) {
        if (node instanceof Node.Group group) {
            printMembers(group.members(), level);
        } else if (node instanceof Node.Items items && printAsTable(items.items(), level)) {
            return; // groups of the same few leaves read better as rows
        } else if (node instanceof Node.Items items) {
            for (Node item : items.items()) {
                if (isLine(item)) {
                    Lines.wrapped(out, "  ".repeat(level) + "- ", line("", item));
                } else {
                    print(item, level);
                }
            }
        } else if (node instanceof Node.Table table) {
            printTable(table, level);
        } else if (node instanceof Node.Matrix || node instanceof Node.Figure) {
            return; // not for a terminal; the report shows them
        } else {
            Lines.wrapped(out, "  ".repeat(level), line("", node));
        }
    }

    private void printMembers(Map<String, Node> members, int level) {
        int width = 0;
        for (Map.Entry<String, Node> member : members.entrySet()) {
            if (isLine(member.getValue())) {
                width = Math.max(width, Symbols.key(member.getKey()).length());
            }
        }
        for (Map.Entry<String, Node> member : members.entrySet()) {
            Node value = member.getValue();
            if (member.getKey().equals("cautions") || isEmpty(value)) {
                continue;
            }
            String name = Symbols.key(member.getKey());
            if (isLine(value)) {
                Lines.wrapped(out, "  ".repeat(level) + Lines.padded(name, width) + "  ", line(member.getKey(), value));
            } else if (!(value instanceof Node.Matrix) && !holdsOnlyFigures(value)) {
                out.println("  ".repeat(level) + name);
                print(value, level + 1);
            }
        }
    }

    private void printTable(Node.Table table, int level) {
        List<List<String>> lines = new ArrayList<>();
        List<String> heads = new ArrayList<>();
        for (Node.Column column : table.columns()) {
            heads.add(UnitText.after(column.title(), column.unit()));
        }
        lines.add(heads);
        for (List<Node> row : table.rows()) {
            List<String> cells = new ArrayList<>();
            for (int i = 0; i < row.size(); i++) {
                cells.add(line(table.columns().get(i).key(), row.get(i)));
            }
            lines.add(cells);
        }
        printRows(lines, level);
    }

    /** Prints groups that hold the same leaves under one head, when they are more than one and fit; says whether it did. */
    private boolean printAsTable(List<Node> items, int level) {
        if (items.size() < 2 || !(items.get(0) instanceof Node.Group first)) {
            return false;
        }
        List<String> keys = List.copyOf(first.members().keySet());
        List<List<String>> lines = new ArrayList<>();
        List<String> heads = new ArrayList<>();
        for (String key : keys) {
            heads.add(Symbols.key(key));
        }
        lines.add(heads);
        int[] widths = new int[keys.size()];
        for (Node item : items) {
            if (!(item instanceof Node.Group group)
                    || !List.copyOf(group.members().keySet()).equals(keys)) {
                return false;
            }
            List<String> cells = new ArrayList<>();
            for (String key : keys) {
                Node member = group.members().get(key);
                if (!isLine(member)) {
                    return false;
                }
                cells.add(line(key, member));
            }
            lines.add(cells);
        }
        int total = 2 * level;
        for (List<String> line : lines) {
            for (int i = 0; i < widths.length; i++) {
                widths[i] = Math.max(widths[i], line.get(i).length());
            }
        }
        for (int width : widths) {
            total += width + 2;
        }
        if (total > Lines.WIDTH) {
            return false;
        }
        printRows(lines, level);
        return true;
    }

    private void printRows(List<List<String>> lines, int level) {
        int[] widths = new int[lines.get(0).size()];
        for (List<String> line : lines) {
            for (int i = 0; i < widths.length; i++) {
                widths[i] = Math.max(widths[i], line.get(i).length());
            }
        }
        for (List<String> line : lines) {
            StringBuilder text = new StringBuilder("  ".repeat(level));
            for (int i = 0; i < widths.length; i++) {
                text.append(i + 1 < widths.length ? Lines.padded(line.get(i), widths[i] + 2) : line.get(i));
            }
            out.println(text);
        }
    }

    /** A leaf as one line; empty for a node that is no leaf. */
    private String line(String key, Node node) {
        if (node instanceof Node.Quantity quantity) {
            String lower = key.toLowerCase(java.util.Locale.ROOT);
            boolean temperature =
                    quantity.unit().equals("K") && !lower.contains("extrapolation") && !lower.contains("shift");
            String text = temperature && quantity.interval().isEmpty()
                    ? QuantityText.temperature(quantity)
                    : QuantityText.withInterval(quantity);
            return text + marks.marks(quantity.cautions());
        }
        if (node instanceof Node.Scalar scalar) {
            return Rounding.shortest(shown(scalar.value()));
        }
        if (node instanceof Node.Items items && isShort(items)) {
            StringBuilder list = new StringBuilder();
            for (Node item : items.items()) {
                list.append(list.length() == 0 ? "" : ", ").append(line("", item));
            }
            return list.toString();
        }
        if (node instanceof Node.Flag flag) {
            return flag.value() ? "yes" : "no";
        }
        return node instanceof Node.Text text ? text.value() : "";
    }

    private static boolean isLine(Node node) {
        return node instanceof Node.Quantity
                || node instanceof Node.Scalar
                || node instanceof Node.Flag
                || node instanceof Node.Text
                || (node instanceof Node.Items items && isShort(items));
    }

    /** Plain numbers read better one behind the other. */
    private static boolean isShort(Node.Items items) {
        for (Node item : items.items()) {
            if (!(item instanceof Node.Scalar)) {
                return false;
            }
        }
        return !items.items().isEmpty();
    }

    /** Statistics have more digits than anybody reads; whole numbers keep theirs, and 0.9999999 is not 1; files keep all. */
    private static double shown(double value) {
        double rounded = value == Math.rint(value)
                ? value
                : new BigDecimal(value).round(new MathContext(DIGITS)).doubleValue();
        return rounded == Math.rint(rounded) ? value : rounded;
    }

    private static boolean isEmpty(Node node) {
        return (node instanceof Node.Group group && group.members().isEmpty())
                || (node instanceof Node.Items items && items.items().isEmpty())
                || (node instanceof Node.Text text && text.value().isEmpty());
    }

    private static boolean holdsOnlyFigures(Node node) {
        if (node instanceof Node.Figure) {
            return true;
        }
        if (!(node instanceof Node.Items items)) {
            return false;
        }
        for (Node item : items.items()) {
            if (!(item instanceof Node.Figure)) {
                return false;
            }
        }
        return true;
    }
}
