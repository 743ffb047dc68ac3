package org.saddlebook.report.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.service.Intake;
import org.saddlebook.api.service.TableWriter;
import org.saddlebook.json.api.NumberText;
import org.saddlebook.presentation.api.CsvText;

/**
 * Findings as comma-separated values, full precision, units in columns of their own: every quantity of every section in
 * one file, and a file for each table. It knows no section, so those of add-ons are in it too.
 */
@Component
public final class CsvTables implements TableWriter {
    private static final List<String> QUANTITY = List.of(
            "place",
            "value",
            "unit",
            "standardUncertainty",
            "standardFactor",
            "interval",
            "level",
            "lower",
            "upper",
            "method",
            "cautions");

    /** Stateless. */
    public CsvTables() {}

    @Override
    public List<Intake.Part> tables(Findings findings) {
        Walk walk = new Walk();
        for (Map.Entry<String, Section> section : findings.sections().entrySet()) {
            walk.node(section.getKey(), section.getValue().body());
        }
        CsvText cautions = new CsvText().row(List.of("caution", "text"));
        for (Map.Entry<String, String> caution : findings.cautions().entrySet()) {
            cautions.row(List.of(caution.getKey(), caution.getValue()));
        }
        List<Intake.Part> parts = new ArrayList<>();
        parts.add(new Intake.Part("tables/quantities.csv", walk.quantities.bytes()));
        parts.add(new Intake.Part("tables/cautions.csv", cautions.bytes()));
        parts.addAll(walk.tables);
        return parts;
    }

    private static final class Walk {
        private final CsvText quantities = new CsvText().row(QUANTITY);
        private final List<Intake.Part> tables = new ArrayList<>();

        void node(String place, Node node) {
            if (node instanceof Node.Group group) {
                for (Map.Entry<String, Node> member : group.members().entrySet()) {
                    node(place + "." + member.getKey(), member.getValue());
                }
            } else if (node instanceof Node.Items items) {
                for (int i = 0; i < items.items().size(); i++) {
                    node(
                            place + "." + name(items.items().get(i), i),
                            items.items().get(i));
                }
            } else if (node instanceof Node.Quantity quantity) {
                quantity(place, quantity);
            } else if (node instanceof Node.Scalar scalar) {
                quantities.text(place).number(NumberText.of(scalar.value()));
                fill(QUANTITY.size() - 2);
                quantities.endRow();
            } else if (node instanceof Node.Table table) {
                tables.add(new Intake.Part("tables/" + fileName(place) + ".csv", csv(table)));
            }
        }

        /** An item that says what it is goes by its id, others by their number from 1. */
        private static String name(Node item, int index) {
            return item instanceof Node.Group group && group.get("id").orElse(null) instanceof Node.Text id
                    ? id.value()
                    : Integer.toString(index + 1);
        }

        private void quantity(String place, Node.Quantity quantity) {
            quantities.text(place);
            number(quantity.value());
            quantities.text(quantity.unit());
            number(quantity.standardUncertainty());
            number(quantity.standardFactor());
            if (quantity.interval().isPresent()) {
                Interval interval = quantity.interval().get();
                quantities.text(interval.kind().key()).number(NumberText.of(interval.level()));
                number(interval.lower());
                number(interval.upper());
                quantities.text(interval.method());
            } else {
                fill(5);
            }
            quantities.text(String.join(" ", quantity.cautions())).endRow();
        }

        private void number(OptionalDouble value) {
            quantities.number(
                    value.isPresent() && Double.isFinite(value.getAsDouble())
                            ? NumberText.of(value.getAsDouble())
                            : "");
        }

        private void fill(int cells) {
            for (int i = 0; i < cells; i++) {
                quantities.text("");
            }
        }
    }

    private static byte[] csv(Node.Table table) {
        CsvText text = new CsvText();
        boolean[] uncertain = new boolean[table.columns().size()];
        for (List<Node> row : table.rows()) {
            for (int i = 0; i < row.size(); i++) {
                uncertain[i] |= row.get(i) instanceof Node.Quantity quantity
                        && (quantity.standardUncertainty().isPresent()
                                || quantity.standardFactor().isPresent());
            }
        }
        for (int i = 0; i < uncertain.length; i++) {
            Node.Column column = table.columns().get(i);
            String unit = column.unit().isEmpty() ? "" : " (" + column.unit() + ")";
            text.text(column.key() + unit);
            if (uncertain[i]) {
                text.text("u(" + column.key() + ")");
            }
        }
        text.endRow();
        for (List<Node> row : table.rows()) {
            for (int i = 0; i < uncertain.length; i++) {
                cell(text, row.get(i));
                if (uncertain[i]) {
                    text.number(uncertainty(row.get(i)));
                }
            }
            text.endRow();
        }
        return text.bytes();
    }

    private static void cell(CsvText text, Node node) {
        if (node instanceof Node.Scalar scalar) {
            text.number(NumberText.of(scalar.value()));
        } else if (node instanceof Node.Quantity quantity) {
            OptionalDouble value = quantity.value();
            text.number(
                    value.isPresent() && Double.isFinite(value.getAsDouble())
                            ? NumberText.of(value.getAsDouble())
                            : "");
        } else if (node instanceof Node.Text words) {
            text.text(words.value());
        } else if (node instanceof Node.Flag flag) {
            text.text(flag.value() ? "true" : "false");
        } else {
            text.text("");
        }
    }

    /** Standard uncertainty, or the standard factor with a multiplication sign before it. */
    private static String uncertainty(Node node) {
        if (!(node instanceof Node.Quantity quantity)) {
            return "";
        }
        if (quantity.standardUncertainty().isPresent()) {
            return NumberText.of(quantity.standardUncertainty().getAsDouble());
        }
        return quantity.standardFactor().isPresent()
                ? "×/÷ " + NumberText.of(quantity.standardFactor().getAsDouble())
                : "";
    }

    /** A name that every file system allows, out of a place in findings. */
    private static String fileName(String place) {
        StringBuilder name = new StringBuilder();
        for (int i = 0; i < place.length(); i++) {
            char c = place.charAt(i);
            boolean plain = (c >= 'a' && c <= 'z') || (c >= 'A' && c <= 'Z') || (c >= '0' && c <= '9') || c == '-';
            name.append(plain ? c : c == '.' ? '.' : '_');
        }
        return name.toString();
    }
}
