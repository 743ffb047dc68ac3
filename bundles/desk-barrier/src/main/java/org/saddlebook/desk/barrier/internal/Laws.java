package org.saddlebook.desk.barrier.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.desk.api.DeskState;
import org.saddlebook.desk.components.api.CautionNumbers;
import org.saddlebook.desk.components.api.LeafText;
import org.saddlebook.desk.components.api.Nodes;
import org.saddlebook.desk.components.api.TableContent;
import org.saddlebook.desk.components.api.TableContent.Cell;
import org.saddlebook.desk.components.api.TableContent.Column;
import org.saddlebook.presentation.api.QuantityText;

/** The section {@code barrier} as tables and sentences; whatever laws are installed, known here or not. */
final class Laws {
    static final String SECTION = "barrier";

    private final Node body;
    private final CautionNumbers numbers;

    Laws(Findings findings, Section section) {
        body = section.body();
        numbers = new CautionNumbers(findings.cautions().keySet());
    }

    /** The section with findings; empty when there is none. */
    static Optional<Laws> of(DeskState state) {
        return state.findings()
                .flatMap(findings -> findings.section(SECTION)
                        .filter(section -> section.outcome() == Section.Outcome.DONE)
                        .map(section -> new Laws(findings, section)));
    }

    Node body() {
        return body;
    }

    /** Every law, fitted or not. */
    List<Node> all() {
        return Nodes.items(body, "models");
    }

    /** The fitted ones. */
    List<Node> fitted() {
        List<Node> fitted = new ArrayList<>();
        for (Node law : all()) {
            if (Nodes.at(law, "parameters").isPresent()) {
                fitted.add(law);
            }
        }
        return fitted;
    }

    /** The law that carries predictions: the one of the range of honest use, else the first candidate, else the first. */
    Optional<Node> carrying() {
        String id = Nodes.text(body, "honestRange", "model");
        if (id.isEmpty()) {
            List<Node> candidates = Nodes.items(body, "comparison", "candidates");
            id = !candidates.isEmpty() && candidates.get(0) instanceof Node.Text first ? first.value() : "";
        }
        for (Node law : fitted()) {
            if (Nodes.text(law, "id").equals(id)) {
                return Optional.of(law);
            }
        }
        return fitted().stream().findFirst();
    }

    /** The name of a law by its id. */
    String title(String id) {
        for (Node law : all()) {
            if (Nodes.text(law, "id").equals(id)) {
                return Nodes.text(law, "title");
            }
        }
        return id;
    }

    /** Parameters of a law in one line: {@code Ea 84.1 ± 1.4 kJ/mol, A …}. */
    static String parameters(Node law) {
        StringBuilder text = new StringBuilder();
        if (Nodes.at(law, "parameters").orElse(null) instanceof Node.Group group) {
            for (Map.Entry<String, Node> parameter : group.members().entrySet()) {
                if (parameter.getValue() instanceof Node.Quantity quantity) {
                    text.append(text.length() == 0 ? "" : ", ")
                            .append(LeafText.activation(parameter.getKey()))
                            .append('\u00a0')
                            .append(QuantityText.of(quantity));
                }
            }
        }
        return text.toString();
    }

    /** Laws side by side: one row per parameter or derived quantity, one column per law. */
    TableContent sideBySide() {
        Map<String, String> rows = new LinkedHashMap<>();
        for (String part : new String[] {"parameters", "derived"}) {
            for (Node law : all()) {
                if (Nodes.at(law, part).orElse(null) instanceof Node.Group group) {
                    for (String symbol : group.members().keySet()) {
                        rows.putIfAbsent(symbol, Nodes.text(law, "names", symbol));
                    }
                }
            }
        }
        List<Column> columns = new ArrayList<>();
        columns.add(new Column("", "", false));
        for (Node law : all()) {
            columns.add(new Column(Nodes.text(law, "title"), TableContent.MIXED, true));
        }
        List<List<Cell>> cells = new ArrayList<>();
        for (Map.Entry<String, String> row : rows.entrySet()) {
            List<Cell> line = new ArrayList<>();
            String symbol = LeafText.activation(row.getKey());
            String name = row.getKey().equals("k") ? "rate constant" : row.getValue();
            line.add(Cell.of(name.isEmpty() ? symbol : name + " " + symbol));
            for (Node law : all()) {
                line.add(cell(law, row.getKey()));
            }
            cells.add(line);
        }
        cells.add(outcomes());
        return new TableContent(columns, cells);
    }

    private Cell cell(Node law, String symbol) {
        Optional<Node.Quantity> quantity = Nodes.quantity(law, "parameters", symbol);
        if (quantity.isEmpty()) {
            quantity = Nodes.quantity(law, "derived", symbol);
        }
        return quantity.map(q -> Cell.of(QuantityText.withInterval(q) + numbers.marks(q.cautions()), q))
                .orElse(Cell.of(""));
    }

    private List<Cell> outcomes() {
        List<Cell> line = new ArrayList<>();
        line.add(Cell.of("outcome"));
        for (Node law : all()) {
            String reason = Nodes.text(law, "reason");
            line.add(Cell.of(Nodes.text(law, "outcome") + (reason.isEmpty() ? "" : ": " + reason)));
        }
        return line;
    }

    /** What the fits cost: one row per statistic, one column per law. */
    TableContent statistics() {
        Map<String, Node> rows = new LinkedHashMap<>();
        for (Node law : fitted()) {
            if (Nodes.at(law, "statistics").orElse(null) instanceof Node.Group group) {
                group.members().forEach(rows::putIfAbsent);
            }
        }
        List<Column> columns = new ArrayList<>();
        columns.add(new Column("", "", false));
        for (Node law : fitted()) {
            columns.add(new Column(Nodes.text(law, "title"), "", false));
        }
        List<List<Cell>> cells = new ArrayList<>();
        for (String key : rows.keySet()) {
            List<Cell> line = new ArrayList<>();
            line.add(Cell.of(statistic(key)));
            for (Node law : fitted()) {
                Optional<Node> value = Nodes.at(law, "statistics", key);
                String text = value.map(node -> LeafText.of(key, node, numbers)).orElse("");
                line.add(
                        value.orElse(null) instanceof Node.Scalar scalar
                                ? Cell.of(text, scalar.value())
                                : Cell.of(text));
            }
            cells.add(line);
        }
        cells.add(weights());
        return new TableContent(columns, cells);
    }

    private List<Cell> weights() {
        List<Cell> line = new ArrayList<>();
        line.add(Cell.of("Akaike weight"));
        for (Node law : fitted()) {
            Optional<Node> weight = Nodes.at(body, "comparison", "akaikeWeights", Nodes.text(law, "id"));
            line.add(
                    weight.orElse(null) instanceof Node.Scalar scalar
                            ? Cell.of(LeafText.of("", scalar, numbers), scalar.value())
                            : Cell.of("absent"));
        }
        return line;
    }

    private static String statistic(String key) {
        return switch (key) {
            case "n" -> "points used";
            case "dof" -> "degrees of freedom";
            case "rss" -> "sum of squared residuals";
            case "s" -> "residual standard deviation";
            case "chiSquared" -> "χ²";
            case "pValue" -> "p of χ²";
            case "birgeRatio" -> "Birge ratio";
            case "aicc" -> "AICc";
            case "bic" -> "BIC";
            case "conditionNumber" -> "condition number";
            default -> LeafText.key(key);
        };
    }

    /** Predictions: one row per temperature and law. */
    TableContent predictions() {
        List<Column> columns = List.of(
                new Column("temperature", "K", false),
                new Column("law", "", false),
                new Column("k", TableContent.MIXED, true),
                new Column("k of a new run", TableContent.MIXED, true),
                new Column("outside the data by", "K", false));
        List<List<Cell>> rows = new ArrayList<>();
        for (Node item : Nodes.items(body, "predictions")) {
            rows.add(List.of(
                    quantity(item, "temperature"),
                    Cell.of(title(Nodes.text(item, "model"))),
                    quantity(item, "k"),
                    quantity(item, "kNewRun"),
                    quantity(item, "extrapolation")));
        }
        return rows.isEmpty() ? TableContent.EMPTY : new TableContent(columns, rows);
    }

    private Cell quantity(Node item, String key) {
        return Nodes.quantity(item, key)
                .map(quantity -> Cell.of(LeafText.of(key, quantity, numbers), quantity))
                .orElse(Cell.of(""));
    }

    /** Causes of the uncertainty of each prediction. */
    TableContent budgets() {
        List<Column> columns = new ArrayList<>();
        List<List<Cell>> rows = new ArrayList<>();
        for (Node budget : Nodes.items(body, "budgets")) {
            Optional<Node.Table> table = Nodes.table(budget, "table");
            if (table.isEmpty()) {
                continue;
            }
            TableContent content = TableContent.of(table.get(), numbers);
            if (columns.isEmpty()) {
                columns.add(new Column("k at", "K", false));
                columns.addAll(content.columns());
            }
            if (columns.size() == content.columns().size() + 1) {
                for (List<Cell> row : content.rows()) {
                    List<Cell> line = new ArrayList<>();
                    line.add(quantity(budget, "temperature"));
                    line.addAll(row);
                    rows.add(line);
                }
            }
        }
        return rows.isEmpty() ? TableContent.EMPTY : new TableContent(columns, rows);
    }

    /** The same data under each error model. */
    TableContent errorModels() {
        return Nodes.table(body, "errorModels")
                .map(table -> TableContent.of(table, numbers))
                .orElse(TableContent.EMPTY);
    }

    /** How far the numbers reach and what to measure next, in sentences. */
    String reach() {
        StringBuilder text = new StringBuilder();
        Optional<Node.Quantity> lower = Nodes.quantity(body, "honestRange", "lower");
        Optional<Node.Quantity> upper = Nodes.quantity(body, "honestRange", "upper");
        if (lower.isPresent() && upper.isPresent()) {
            text.append("Range of honest use: ")
                    .append(QuantityText.temperature(lower.get()))
                    .append(" to ")
                    .append(QuantityText.temperature(upper.get()));
            Nodes.number(body, "honestRange", "tolerance")
                    .ifPresent(tolerance -> text.append("; there k is known within ")
                            .append(org.saddlebook.presentation.api.Rounding.percent(tolerance)));
            text.append(", if the law ")
                    .append(title(Nodes.text(body, "honestRange", "model")))
                    .append(" holds.");
        } else {
            String reason = Nodes.text(body, "honestRange", "reason");
            text.append(reason);
        }
        for (Node next : Nodes.items(body, "nextMeasurements")) {
            String advice = Nodes.text(next, "advice");
            if (!advice.isEmpty()) {
                text.append(text.length() == 0 ? "" : "\n");
                Nodes.quantity(next, "temperature")
                        .ifPresent(at -> text.append("For k at ")
                                .append(QuantityText.temperature(at))
                                .append(": "));
                text.append(advice);
            }
        }
        return text.toString();
    }

    /** Sentences of the comparison. */
    String comparison() {
        return lines(Nodes.items(body, "comparison", "notes"));
    }

    /** Further sentences of the section. */
    String notes() {
        return lines(Nodes.items(body, "notes"));
    }

    private static String lines(List<Node> items) {
        StringBuilder text = new StringBuilder();
        for (Node item : items) {
            if (item instanceof Node.Text line) {
                text.append(text.length() == 0 ? "" : "\n").append(line.value());
            }
        }
        return text.toString();
    }

    /** Members that this class does not show: what bundles of later versions add is shown as it is. */
    Map<String, Node> others() {
        List<String> known = List.of(
                "errorModel",
                "response",
                "level",
                "targets",
                "context",
                "table",
                "models",
                "comparison",
                "predictions",
                "figures",
                "errorModels",
                "budgets",
                "honestRange",
                "nextMeasurements",
                "notes",
                "cautions");
        Map<String, Node> others = new LinkedHashMap<>();
        if (body instanceof Node.Group group) {
            for (Map.Entry<String, Node> member : group.members().entrySet()) {
                if (!known.contains(member.getKey())) {
                    others.put(member.getKey(), member.getValue());
                }
            }
        }
        return others;
    }
}
