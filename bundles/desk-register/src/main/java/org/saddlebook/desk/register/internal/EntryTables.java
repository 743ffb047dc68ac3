package org.saddlebook.desk.register.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.desk.components.api.CautionNumbers;
import org.saddlebook.desk.components.api.Exclusions;
import org.saddlebook.desk.components.api.LeafText;
import org.saddlebook.desk.components.api.Nodes;
import org.saddlebook.desk.components.api.TableContent;
import org.saddlebook.desk.components.api.TableContent.Cell;
import org.saddlebook.desk.components.api.TableContent.Column;
import org.saddlebook.register.console.api.Recomputed;

/** Tables of the register: entries, two entries value by value, what a recomputation found. */
final class EntryTables {
    private static final CautionNumbers NONE = new CautionNumbers(List.of());

    private EntryTables() {}

    static TableContent entries(List<EntryRow> rows) {
        List<Column> columns = List.of(
                new Column("entry", "1", false),
                new Column("title", "", false),
                new Column("stands", "", false),
                new Column("entered by", "", false),
                new Column("when", "", false),
                new Column("measured", "", false),
                new Column("honest use", "", false));
        List<List<Cell>> cells = new ArrayList<>();
        for (EntryRow row : rows) {
            cells.add(List.of(
                    Cell.of(Long.toString(row.number()), (double) row.number()),
                    Cell.of(row.entry().record().title()),
                    Cell.of(row.standing()),
                    Cell.of(row.entry().record().actor()),
                    Cell.of(row.time()),
                    Cell.of(range(row.measured())),
                    Cell.of(range(row.honest()))));
        }
        return rows.isEmpty() ? TableContent.EMPTY : new TableContent(columns, cells);
    }

    private static String range(Optional<EntryRow.Range> range) {
        return range.map(r -> whole(r.low()) + " to " + whole(r.high()) + "\u00a0°C")
                .orElse("");
    }

    private static String whole(double kelvin) {
        String text = Exclusions.celsius(Math.rint((kelvin - 273.15) * 10) / 10 + 273.15);
        return text.substring(0, text.indexOf('\u00a0'));
    }

    /** Two findings side by side, every value in the order of the first; those that differ say so. */
    static TableContent comparison(long first, Findings a, long second, Findings b, boolean onlyDifferences) {
        Map<String, Node> left = leaves(a);
        Map<String, Node> right = leaves(b);
        Set<String> places = new LinkedHashSet<>(left.keySet());
        places.addAll(right.keySet());
        List<List<Cell>> rows = new ArrayList<>();
        for (String place : places) {
            Node one = left.get(place);
            Node other = right.get(place);
            boolean same = one != null && one.equals(other);
            if (same && onlyDifferences) {
                continue;
            }
            rows.add(List.of(Cell.of(place), cell(place, one), cell(place, other), Cell.of(same ? "same" : "differs")));
        }
        return new TableContent(
                List.of(
                        new Column("value", "", false),
                        new Column("entry " + first, TableContent.MIXED, true),
                        new Column("entry " + second, TableContent.MIXED, true),
                        new Column("compared", "", false)),
                rows);
    }

    private static Cell cell(String place, Node node) {
        if (node == null) {
            return Cell.of("absent");
        }
        String text = LeafText.of(place, node, NONE);
        if (node instanceof Node.Quantity quantity) {
            return Cell.of(LeafText.of(place, quantity.withCautions(List.of()), NONE), quantity);
        }
        return node instanceof Node.Scalar scalar ? Cell.of(text, scalar.value()) : Cell.of(text);
    }

    private static Map<String, Node> leaves(Findings findings) {
        Map<String, Node> leaves = new LinkedHashMap<>();
        leaves.put("campaign", new Node.Text(findings.campaignTitle()));
        for (Map.Entry<String, Section> section : findings.sections().entrySet()) {
            walk(section.getKey(), section.getValue().body(), leaves);
        }
        return leaves;
    }

    private static void walk(String place, Node node, Map<String, Node> leaves) {
        if (LeafText.isLeaf(node)) {
            leaves.put(place, node);
        } else if (node instanceof Node.Group group) {
            for (Map.Entry<String, Node> member : group.members().entrySet()) {
                if (!member.getKey().equals("figures") && !member.getKey().equals("cautions")) {
                    walk(place + " · " + LeafText.key(member.getKey()), member.getValue(), leaves);
                }
            }
        } else if (node instanceof Node.Items items) {
            for (int i = 0; i < items.items().size(); i++) {
                String id = Nodes.text(items.items().get(i), "id");
                walk(
                        place + " · " + (id.isEmpty() ? Integer.toString(i + 1) : id),
                        items.items().get(i),
                        leaves);
            }
        } else if (node instanceof Node.Table table) {
            for (int i = 0; i < table.rows().size(); i++) {
                for (int j = 0; j < table.columns().size(); j++) {
                    walk(
                            place + " · row " + (i + 1) + " · "
                                    + table.columns().get(j).title(),
                            table.rows().get(i).get(j),
                            leaves);
                }
            }
        }
    }

    /** Places where a recomputation differs. */
    static TableContent differences(Recomputed recomputed) {
        List<List<Cell>> rows = new ArrayList<>();
        for (Recomputed.OtherBundle other : recomputed.otherBundles()) {
            rows.add(List.of(Cell.of("bundle " + other.name()), Cell.of(other.then()), Cell.of(other.now())));
        }
        for (Recomputed.Difference difference : recomputed.differences()) {
            rows.add(List.of(Cell.of(difference.place()), Cell.of(difference.then()), Cell.of(difference.now())));
        }
        return rows.isEmpty()
                ? TableContent.EMPTY
                : new TableContent(
                        List.of(
                                new Column("place", "", false),
                                new Column("then", "", false),
                                new Column("now", "", false)),
                        rows);
    }
}
