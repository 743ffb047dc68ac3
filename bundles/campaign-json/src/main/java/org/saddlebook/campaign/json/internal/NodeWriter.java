package org.saddlebook.campaign.json.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Axis;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.json.api.JsonArray;
import org.saddlebook.json.api.JsonBoolean;
import org.saddlebook.json.api.JsonNumber;
import org.saddlebook.json.api.JsonObject;
import org.saddlebook.json.api.JsonReader;
import org.saddlebook.json.api.JsonString;
import org.saddlebook.json.api.JsonValue;

/** Nodes as JSON. Each tree has one form and each form one tree; {@link Node} tells how that is kept. */
final class NodeWriter {
    /** Nesting left to the document around a tree and to the parts of a figure. */
    private static final int SPARE_DEPTH = 10;

    private NodeWriter() {}

    /**
     * A tree.
     *
     * @throws IllegalArgumentException when it is nested deeper than can be read again, or has a text without UTF-8 form
     */
    static JsonValue write(Node node) {
        return write(node, 1);
    }

    private static JsonValue write(Node node, int depth) {
        if (depth > JsonReader.MAX_DEPTH - SPARE_DEPTH) {
            throw new IllegalArgumentException("findings nested deeper than " + depth);
        }
        if (node instanceof Node.Group group) {
            Map<String, JsonValue> members = new LinkedHashMap<>();
            for (Map.Entry<String, Node> member : group.members().entrySet()) {
                members.put(member.getKey(), write(member.getValue(), depth + 1));
            }
            return new JsonObject(members);
        } else if (node instanceof Node.Items items) {
            return array(items.items(), depth);
        } else if (node instanceof Node.Quantity quantity) {
            return quantity(quantity);
        } else if (node instanceof Node.Scalar scalar) {
            return new JsonNumber(scalar.value());
        } else if (node instanceof Node.Flag flag) {
            return new JsonBoolean(flag.value());
        } else if (node instanceof Node.Text text) {
            return new JsonString(text.value());
        } else if (node instanceof Node.Table table) {
            return table(table, depth);
        } else if (node instanceof Node.Matrix matrix) {
            return matrix(matrix);
        } else {
            return figure((Node.Figure) node);
        }
    }

    private static JsonArray array(List<Node> nodes, int depth) {
        List<JsonValue> items = new ArrayList<>(nodes.size());
        for (Node node : nodes) {
            items.add(write(node, depth + 1));
        }
        return new JsonArray(items);
    }

    private static JsonValue quantity(Node.Quantity quantity) {
        JsonObject.Builder out = JsonObject.builder();
        put(out, "value", quantity.value());
        out.put("unit", quantity.unit());
        put(out, "standardUncertainty", quantity.standardUncertainty());
        put(out, "standardFactor", quantity.standardFactor());
        if (quantity.interval().isPresent()) {
            out.put("interval", interval(quantity.interval().get()));
        }
        cautions(out, quantity.cautions());
        return out.build();
    }

    private static JsonValue interval(Interval interval) {
        JsonObject.Builder out =
                JsonObject.builder().put("kind", interval.kind().key());
        out.put("level", interval.level());
        put(out, "lower", interval.lower());
        put(out, "upper", interval.upper());
        return out.put("method", interval.method()).build();
    }

    private static void put(JsonObject.Builder out, String key, OptionalDouble value) {
        if (value.isPresent()) {
            out.put(key, Numbers.write(value.getAsDouble()));
        }
    }

    private static void cautions(JsonObject.Builder out, List<String> cautions) {
        if (!cautions.isEmpty()) {
            out.put("cautions", JsonArray.ofStrings(cautions));
        }
    }

    private static JsonValue table(Node.Table table, int depth) {
        List<JsonValue> columns = new ArrayList<>();
        for (Node.Column column : table.columns()) {
            columns.add(JsonObject.builder()
                    .put("key", column.key())
                    .put("title", column.title())
                    .put("unit", column.unit())
                    .build());
        }
        List<JsonValue> rows = new ArrayList<>();
        for (List<Node> row : table.rows()) {
            rows.add(array(row, depth + 2));
        }
        return JsonObject.builder()
                .put("columns", new JsonArray(columns))
                .put("rows", new JsonArray(rows))
                .build();
    }

    private static JsonValue matrix(Node.Matrix matrix) {
        List<JsonValue> rows = new ArrayList<>();
        for (double[] row : matrix.toArray()) {
            rows.add(JsonArray.ofNumbers(row));
        }
        return new JsonArray(rows);
    }

    private static JsonValue figure(Node.Figure figure) {
        List<JsonValue> layers = new ArrayList<>();
        for (Layer layer : figure.layers()) {
            layers.add(layer(layer));
        }
        JsonObject.Builder out = JsonObject.builder()
                .put("figure", figure.id())
                .put("title", figure.title())
                .put("x", axis(figure.x()))
                .put("y", axis(figure.y()))
                .put("layers", new JsonArray(layers));
        cautions(out, figure.cautions());
        return out.build();
    }

    private static JsonValue axis(Axis axis) {
        return JsonObject.builder()
                .put("label", axis.label())
                .put("unit", axis.unit())
                .put("scale", Words.of(axis.scale()))
                .build();
    }

    private static JsonValue layer(Layer layer) {
        return JsonObject.builder()
                .put("kind", Words.of(layer.kind()))
                .put("label", layer.label())
                .put("x", JsonArray.ofNumbers(layer.x()))
                .put("y", JsonArray.ofNumbers(layer.y()))
                .put("lower", JsonArray.ofNumbers(layer.lower()))
                .put("upper", JsonArray.ofNumbers(layer.upper()))
                .build();
    }
}
