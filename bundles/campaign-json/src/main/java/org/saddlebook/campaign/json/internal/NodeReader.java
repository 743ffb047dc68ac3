package org.saddlebook.campaign.json.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.json.api.JsonArray;
import org.saddlebook.json.api.JsonBoolean;
import org.saddlebook.json.api.JsonCursor;
import org.saddlebook.json.api.JsonNumber;
import org.saddlebook.json.api.JsonObject;
import org.saddlebook.json.api.JsonString;
import org.saddlebook.json.api.JsonValue;

/** JSON as nodes, by the rules that stand in {@link Node}. */
final class NodeReader {
    private static final List<String> QUANTITY_KEYS =
            List.of("value", "unit", "standardUncertainty", "standardFactor", "interval", "cautions");
    private static final List<String> INTERVAL_KEYS = List.of("kind", "level", "lower", "upper", "method");
    private static final List<String> TABLE_KEYS = List.of("columns", "rows");
    private static final List<String> COLUMN_KEYS = List.of("key", "title", "unit");

    private NodeReader() {}

    static Node read(JsonCursor at) throws InputException {
        JsonValue value = at.value();
        if (value instanceof JsonObject object) {
            return ofObject(at, object);
        } else if (value instanceof JsonArray array) {
            return isMatrix(array) ? matrix(array) : items(at);
        } else if (value instanceof JsonString string) {
            return new Node.Text(string.value());
        } else if (value instanceof JsonNumber number) {
            return new Node.Scalar(number.value());
        } else if (value instanceof JsonBoolean flag) {
            return new Node.Flag(flag.value());
        }
        throw at.problem(
                "wrong-type", "null", "a number, string, true, false, object or array", "Leave the key out instead.");
    }

    private static Node ofObject(JsonCursor at, JsonObject object) throws InputException {
        if (isQuantity(object)) {
            return quantity(at);
        }
        if (object.has("columns") && object.has("rows")) {
            return table(at);
        }
        if (object.has("figure") && object.has("layers")) {
            return FigureReader.read(at);
        }
        Map<String, Node> members = new LinkedHashMap<>();
        for (JsonCursor member : at.members()) {
            members.put(member.key(), read(member));
        }
        return new Node.Group(members);
    }

    private static boolean isQuantity(JsonObject object) {
        if (!object.has("unit")) {
            return false;
        }
        int size = object.members().size();
        return object.has("value")
                || object.has("standardUncertainty")
                || object.has("standardFactor")
                || object.has("interval")
                || size == 1
                || (size == 2 && object.has("cautions"));
    }

    private static Node quantity(JsonCursor at) throws InputException {
        at.onlyKeys(QUANTITY_KEYS);
        OptionalDouble uncertainty = number(at, "standardUncertainty");
        if (uncertainty.isPresent() && !(uncertainty.getAsDouble() >= 0)) {
            throw at.member("standardUncertainty").wrongValue("a standard uncertainty, not negative");
        }
        OptionalDouble factor = number(at, "standardFactor");
        if (factor.isPresent() && !(factor.getAsDouble() >= 1)) {
            throw at.member("standardFactor").wrongValue("a factor of at least 1");
        }
        Optional<JsonCursor> interval = at.optional("interval");
        return new Node.Quantity(
                number(at, "value"),
                at.member("unit").text(),
                uncertainty,
                factor,
                interval.isPresent() ? Optional.of(interval(interval.get())) : Optional.empty(),
                texts(at, "cautions"));
    }

    private static Interval interval(JsonCursor at) throws InputException {
        at.onlyKeys(INTERVAL_KEYS);
        Interval.Kind kind = kind(at.member("kind"));
        double level = at.member("level").number();
        if (!(level > 0 && level < 1)) {
            throw at.member("level").wrongValue("a coverage probability between 0 and 1");
        }
        OptionalDouble lower = number(at, "lower");
        OptionalDouble upper = number(at, "upper");
        try {
            return new Interval(kind, level, lower, upper, at.member("method").text());
        } catch (IllegalArgumentException e) {
            throw at.problem(
                    "wrong-value",
                    "kind \"" + kind.key() + "\" with " + present(lower, "lower") + " and " + present(upper, "upper"),
                    "both limits for between and outside, lower for atLeast, upper for atMost, none for everything and none",
                    "Correct the interval.");
        }
    }

    private static String present(OptionalDouble limit, String name) {
        return (limit.isPresent() ? "" : "no ") + name;
    }

    private static Interval.Kind kind(JsonCursor at) throws InputException {
        try {
            return Interval.Kind.of(at.text());
        } catch (IllegalArgumentException e) {
            throw at.wrongValue("one of between, atLeast, atMost, outside, everything, none");
        }
    }

    private static OptionalDouble number(JsonCursor at, String key) throws InputException {
        Optional<JsonCursor> member = at.optional(key);
        return member.isPresent() ? OptionalDouble.of(Numbers.read(member.get())) : OptionalDouble.empty();
    }

    /** The strings of an array that may be absent. */
    static List<String> texts(JsonCursor at, String key) throws InputException {
        List<String> texts = new ArrayList<>();
        Optional<JsonCursor> array = at.optional(key);
        if (array.isPresent()) {
            for (JsonCursor item : array.get().items()) {
                texts.add(item.text());
            }
        }
        return texts;
    }

    private static Node table(JsonCursor at) throws InputException {
        at.onlyKeys(TABLE_KEYS);
        List<Node.Column> columns = new ArrayList<>();
        for (JsonCursor column : at.member("columns").items()) {
            column.onlyKeys(COLUMN_KEYS);
            columns.add(new Node.Column(
                    column.member("key").text(),
                    column.member("title").text(),
                    column.member("unit").text()));
        }
        List<List<Node>> rows = new ArrayList<>();
        for (JsonCursor row : at.member("rows").items()) {
            List<Node> cells = new ArrayList<>();
            for (JsonCursor cell : row.items()) {
                cells.add(read(cell));
            }
            if (cells.size() != columns.size()) {
                throw row.problem(
                        "wrong-value",
                        cells.size() + " cells",
                        columns.size() + " cells, one per column",
                        "Correct the row.");
            }
            rows.add(cells);
        }
        return new Node.Table(columns, rows);
    }

    private static Node items(JsonCursor at) throws InputException {
        List<Node> items = new ArrayList<>();
        for (JsonCursor item : at.items()) {
            items.add(read(item));
        }
        return new Node.Items(items);
    }

    private static boolean isMatrix(JsonArray array) {
        if (array.items().isEmpty()
                || !(array.items().get(0) instanceof JsonArray first)
                || first.items().isEmpty()) {
            return false;
        }
        for (JsonValue item : array.items()) {
            if (!(item instanceof JsonArray row)
                    || row.items().size() != first.items().size()) {
                return false;
            }
            for (JsonValue cell : row.items()) {
                if (!(cell instanceof JsonNumber)) {
                    return false;
                }
            }
        }
        return true;
    }

    private static Node matrix(JsonArray array) {
        double[][] entries = new double[array.items().size()][];
        for (int i = 0; i < entries.length; i++) {
            List<JsonValue> row = ((JsonArray) array.items().get(i)).items();
            entries[i] = new double[row.size()];
            for (int j = 0; j < entries[i].length; j++) {
                entries[i][j] = ((JsonNumber) row.get(j)).value();
            }
        }
        return new Node.Matrix(entries);
    }
}
