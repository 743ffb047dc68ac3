package org.saddlebook.desk.components.api;

import java.awt.BorderLayout;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import javax.swing.BorderFactory;
import javax.swing.JComponent;
import javax.swing.JPanel;
import org.saddlebook.api.findings.Node;
import org.saddlebook.desk.api.DeskContext;

/** Any piece of findings as components, one below the other. */
public final class NodeTree extends JPanel {
    private static final long serialVersionUID = 1L;

    private static final int INDENT = 14;
    private static final int DEEPEST = 12;

    private final transient DeskComponents components;
    private final transient DeskContext context;
    private final transient CautionNumbers numbers;
    private final transient Map<String, String> cautions;

    /**
     * A tree.
     *
     * @param name accessible name
     * @param cautions caution id to text of the whole findings, in the order of their numbers
     */
    public NodeTree(
            String name, Node node, Map<String, String> cautions, DeskComponents components, DeskContext context) {
        this.components = components;
        this.context = context;
        this.cautions = cautions;
        this.numbers = new CautionNumbers(cautions.keySet());
        setLayout(new Downward());
        setOpaque(false);
        getAccessibleContext().setAccessibleName(name);
        add(node, name, 0);
    }

    private void add(Node node, String name, int depth) {
        if (depth > DEEPEST) {
            return;
        }
        if (node instanceof Node.Group group) {
            members(group, name, depth);
        } else if (node instanceof Node.Items items) {
            items(items.items(), name, depth);
        } else if (node instanceof Node.Table table) {
            table(name, TableContent.of(table, numbers), depth);
        } else if (node instanceof Node.Figure figure) {
            FigureView view = components.figure(context).setHeight(340);
            view.show(figure, cautions);
            put(view, depth);
        } else if (node instanceof Node.Matrix matrix) {
            table(name, content(matrix), depth);
        } else {
            put(new Sentence("", LeafText.of("", node, numbers), Sentence.Rank.TEXT, context.ink()), depth);
        }
    }

    /** Leaves first, as one table of names and values; then everything that has parts, each under its name. */
    private void members(Node.Group group, String name, int depth) {
        List<List<TableContent.Cell>> leaves = new ArrayList<>();
        for (Map.Entry<String, Node> member : group.members().entrySet()) {
            Node value = member.getValue();
            if (LeafText.isLeaf(value)
                    && !(value instanceof Node.Text text && text.value().isEmpty())) {
                String shown = LeafText.of(member.getKey(), value, numbers);
                leaves.add(List.of(TableContent.Cell.of(LeafText.key(member.getKey())), TableContent.Cell.of(shown)));
            }
        }
        if (!leaves.isEmpty()) {
            table(
                    name,
                    new TableContent(
                            List.of(
                                    new TableContent.Column("name", "", false),
                                    new TableContent.Column("value", "", false)),
                            leaves),
                    depth);
        }
        for (Map.Entry<String, Node> member : group.members().entrySet()) {
            Node value = member.getValue();
            boolean nothing = LeafText.isLeaf(value)
                    || member.getKey().equals("cautions")
                    || (value instanceof Node.Group inner && inner.members().isEmpty())
                    || (value instanceof Node.Items list && list.items().isEmpty());
            if (!nothing) {
                String title = LeafText.key(member.getKey());
                // What begins with a table has its name above that.
                boolean ownTitle = value instanceof Node.Table
                        || value instanceof Node.Matrix
                        || (value instanceof Node.Group inner && hasLeaves(inner))
                        || (value instanceof Node.Items list
                                && TableContent.ofLikeGroups(list.items(), numbers)
                                        .isPresent());
                if (!ownTitle) {
                    put(new Sentence("", title, Sentence.Rank.HEADING, context.ink()), depth);
                }
                add(value, title, depth + 1);
            }
        }
    }

    private static boolean hasLeaves(Node.Group group) {
        for (Node member : group.members().values()) {
            if (LeafText.isLeaf(member)
                    && !(member instanceof Node.Text text && text.value().isEmpty())) {
                return true;
            }
        }
        return false;
    }

    private void items(List<Node> items, String name, int depth) {
        Optional<TableContent> alike = TableContent.ofLikeGroups(items, numbers);
        if (alike.isPresent()) {
            table(name, alike.get(), depth);
            return;
        }
        StringBuilder lines = new StringBuilder();
        for (Node item : items) {
            if (LeafText.isLeaf(item)) {
                lines.append(lines.length() == 0 ? "" : "\n").append("– ").append(LeafText.of(name, item, numbers));
            }
        }
        if (lines.length() > 0) {
            put(new Sentence(name, lines.toString(), Sentence.Rank.TEXT, context.ink()), depth);
        }
        int number = 0;
        for (Node item : items) {
            number++;
            if (!LeafText.isLeaf(item)) {
                String title = Nodes.text(item, "title");
                add(item, title.isEmpty() ? name + " " + number : title, depth + 1);
            }
        }
    }

    private static TableContent content(Node.Matrix matrix) {
        List<TableContent.Column> columns = new ArrayList<>();
        for (int j = 0; j < matrix.columns(); j++) {
            columns.add(new TableContent.Column(Integer.toString(j + 1), "", false));
        }
        List<List<TableContent.Cell>> rows = new ArrayList<>();
        for (int i = 0; i < matrix.rows(); i++) {
            List<TableContent.Cell> row = new ArrayList<>();
            for (int j = 0; j < matrix.columns(); j++) {
                Node.Scalar entry = new Node.Scalar(matrix.get(i, j));
                row.add(TableContent.Cell.of(LeafText.of("", entry, new CautionNumbers(List.of())), matrix.get(i, j)));
            }
            rows.add(row);
        }
        return new TableContent(columns, rows);
    }

    private void table(String name, TableContent content, int depth) {
        TableView view = components.table(name, context);
        view.show(content);
        put(view, depth);
    }

    private void put(JComponent component, int depth) {
        JPanel indented = new JPanel(new BorderLayout());
        indented.setOpaque(false);
        indented.setBorder(BorderFactory.createEmptyBorder(0, INDENT * Math.max(0, depth - 1), 0, 0));
        indented.add(component, BorderLayout.CENTER);
        add(indented);
    }
}
