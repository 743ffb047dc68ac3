package org.saddlebook.desk.components.api;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Node;
import org.saddlebook.json.api.NumberText;
import org.saddlebook.presentation.api.CsvText;
import org.saddlebook.presentation.api.UnitText;

/**
 * What a table shows and what it hands on to a spreadsheet: the same rows once as text for people and once as plain
 * numbers, each column with its unit in the head and the uncertainty in a column of its own. Immutable.
 */
public final class TableContent {
    /** The unit of a column whose cells have units of their own. */
    public static final String MIXED = "*";

    /** No columns and no rows. */
    public static final TableContent EMPTY = new TableContent(List.of(), List.of());

    /**
     * A column.
     *
     * @param title head for people, with unit where every cell has the same
     * @param unit UCUM term of numbers handed on; empty for words; {@link #MIXED} where each cell has its own, which is
     *     then handed on in a column beside it
     * @param spread whether uncertainties are handed on in a column beside it
     */
    public record Column(String title, String unit, boolean spread) {}

    /**
     * A cell.
     *
     * @param text for people
     * @param value handed on instead of the text; absent for words
     * @param uncertainty standard uncertainty, or standard factor, handed on beside it
     * @param unit UCUM term of the value; empty for words
     */
    public record Cell(String text, OptionalDouble value, OptionalDouble uncertainty, String unit) {
        /** A cell of words. */
        public static Cell of(String text) {
            return new Cell(text, OptionalDouble.empty(), OptionalDouble.empty(), "");
        }

        /** A number with the text that stands for it. */
        public static Cell of(String text, double value) {
            return new Cell(text, OptionalDouble.of(value), OptionalDouble.empty(), "");
        }

        /**
         * A quantity.
         *
         * @param text for people
         */
        public static Cell of(String text, Node.Quantity quantity) {
            return new Cell(
                    text,
                    quantity.value(),
                    quantity.standardUncertainty().isPresent()
                            ? quantity.standardUncertainty()
                            : quantity.standardFactor(),
                    quantity.unit());
        }
    }

    private final List<Column> columns;
    private final List<List<Cell>> rows;

    /** A table; each row has one cell per column. */
    public TableContent(List<Column> columns, List<List<Cell>> rows) {
        this.columns = List.copyOf(columns);
        this.rows = List.copyOf(rows);
        for (List<Cell> row : rows) {
            if (row.size() != columns.size()) {
                throw new IllegalArgumentException("row of " + row.size() + " cells in " + columns.size() + " columns");
            }
        }
    }

    /** A table of findings. */
    public static TableContent of(Node.Table table, CautionNumbers numbers) {
        List<Column> columns = new ArrayList<>();
        for (int j = 0; j < table.columns().size(); j++) {
            Node.Column column = table.columns().get(j);
            columns.add(column(column.title(), column.unit(), cells(table.rows(), j)));
        }
        List<List<Cell>> rows = new ArrayList<>();
        for (List<Node> row : table.rows()) {
            List<Cell> cells = new ArrayList<>();
            for (int j = 0; j < row.size(); j++) {
                cells.add(cell(table.columns().get(j).key(), row.get(j), numbers));
            }
            rows.add(cells);
        }
        return new TableContent(columns, rows);
    }

    /** A list of groups with the same leaves as a table; empty when they are none or unlike. */
    public static Optional<TableContent> ofLikeGroups(List<Node> items, CautionNumbers numbers) {
        if (items.size() < 2
                || !(items.get(0) instanceof Node.Group first)
                || first.members().isEmpty()) {
            return Optional.empty();
        }
        List<String> keys = List.copyOf(first.members().keySet());
        List<List<Node>> rows = new ArrayList<>();
        for (Node item : items) {
            if (!(item instanceof Node.Group group)
                    || !List.copyOf(group.members().keySet()).equals(keys)) {
                return Optional.empty();
            }
            List<Node> row = List.copyOf(group.members().values());
            for (Node cell : row) {
                if (!LeafText.isLeaf(cell)) {
                    return Optional.empty();
                }
            }
            rows.add(row);
        }
        List<Column> columns = new ArrayList<>();
        for (int j = 0; j < keys.size(); j++) {
            columns.add(column(LeafText.key(keys.get(j)), "", cells(rows, j)));
        }
        List<List<Cell>> cells = new ArrayList<>();
        for (List<Node> row : rows) {
            List<Cell> line = new ArrayList<>();
            for (int j = 0; j < row.size(); j++) {
                line.add(cell(keys.get(j), row.get(j), numbers));
            }
            cells.add(line);
        }
        return Optional.of(new TableContent(columns, cells));
    }

    private static List<Node> cells(List<List<Node>> rows, int column) {
        List<Node> cells = new ArrayList<>();
        for (List<Node> row : rows) {
            cells.add(row.get(column));
        }
        return cells;
    }

    private static Column column(String title, String unit, List<Node> cells) {
        String common = unit;
        boolean spread = false;
        boolean plain = false;
        for (Node cell : cells) {
            plain |= cell instanceof Node.Scalar;
            if (cell instanceof Node.Quantity quantity) {
                common = common.isEmpty() || common.equals(quantity.unit()) ? quantity.unit() : MIXED;
                spread |= quantity.standardUncertainty().isPresent()
                        || quantity.standardFactor().isPresent();
            }
        }
        String shown = plain && !common.equals(MIXED) ? UnitText.forPeople(common) : "";
        return new Column(shown.isEmpty() ? title : title + " / " + shown, common, spread);
    }

    private static Cell cell(String key, Node node, CautionNumbers numbers) {
        String text = LeafText.of(key, node, numbers);
        if (node instanceof Node.Quantity quantity) {
            return Cell.of(text, quantity);
        }
        return node instanceof Node.Scalar scalar ? Cell.of(text, scalar.value()) : Cell.of(text);
    }

    /** The columns. */
    public List<Column> columns() {
        return columns;
    }

    /** The rows, each with one cell per column. */
    public List<List<Cell>> rows() {
        return rows;
    }

    /**
     * Rows for the clipboard: tab-separated, head with units first, numbers in full precision and in the unit of the head.
     * What a spreadsheet would run as a formula gets an apostrophe in front.
     *
     * @param chosen indices of rows, in order
     */
    public String tabSeparated(int[] chosen) {
        StringBuilder text = new StringBuilder();
        List<String> heads = new ArrayList<>();
        for (String head : heads()) {
            heads.add(harmless(head));
        }
        line(text, heads);
        for (int row : chosen) {
            List<String> cells = new ArrayList<>();
            for (int j = 0; j < columns.size(); j++) {
                Cell cell = rows.get(row).get(j);
                boolean number = finite(cell.value());
                cells.add(number ? NumberText.of(cell.value().getAsDouble()) : harmless(cell.text()));
                if (columns.get(j).unit().equals(MIXED)) {
                    cells.add(harmless(cell.unit()));
                }
                if (columns.get(j).spread()) {
                    cells.add(
                            finite(cell.uncertainty())
                                    ? NumberText.of(cell.uncertainty().getAsDouble())
                                    : "");
                }
            }
            line(text, cells);
        }
        return text.toString();
    }

    /** All rows as a CSV file after RFC 4180, in the same form. */
    public byte[] csv() {
        CsvText csv = new CsvText();
        csv.row(heads());
        for (List<Cell> row : rows) {
            for (int j = 0; j < columns.size(); j++) {
                Cell cell = row.get(j);
                if (finite(cell.value())) {
                    csv.number(NumberText.of(cell.value().getAsDouble()));
                } else {
                    csv.text(cell.text());
                }
                if (columns.get(j).unit().equals(MIXED)) {
                    csv.text(cell.unit());
                }
                if (columns.get(j).spread()) {
                    csv.number(
                            finite(cell.uncertainty())
                                    ? NumberText.of(cell.uncertainty().getAsDouble())
                                    : "");
                }
            }
            csv.endRow();
        }
        return csv.bytes();
    }

    private List<String> heads() {
        List<String> heads = new ArrayList<>();
        for (Column column : columns) {
            String title = column.title().contains(" / ")
                    ? column.title().substring(0, column.title().indexOf(" / "))
                    : column.title();
            boolean mixed = column.unit().equals(MIXED);
            String unit = column.unit().equals("1") || mixed ? "" : column.unit();
            heads.add(unit.isEmpty() ? title : title + " / " + unit);
            if (mixed) {
                heads.add("unit of " + title);
            }
            if (column.spread()) {
                heads.add("u(" + title + ") (standard uncertainty; standard factor where estimated on a log scale)"
                        + (unit.isEmpty() ? "" : " / " + unit));
            }
        }
        return heads;
    }

    private static boolean finite(OptionalDouble value) {
        return value.isPresent() && Double.isFinite(value.getAsDouble());
    }

    private static String harmless(String cell) {
        String flat = cell.replace('\t', ' ').replace('\n', ' ').replace('\r', ' ');
        return CsvText.isFormula(flat) ? "'" + flat : flat;
    }

    private static void line(StringBuilder text, List<String> cells) {
        text.append(String.join("\t", cells)).append('\n');
    }
}
