package org.saddlebook.json.api;

import java.nio.charset.StandardCharsets;
import java.util.Iterator;
import java.util.List;
import java.util.Map;

/**
 * JSON for people: two spaces per level, members in the order of the tree, what is short on one line, long arrays of
 * numbers in filled lines, a line feed at the end. Numbers and strings are those of RFC 8785.
 */
public final class PrettyJson {
    private static final int WIDTH = 110;

    private final StringBuilder out = new StringBuilder(8192);

    private PrettyJson() {}

    /** The bytes in UTF-8. */
    public static byte[] bytes(JsonValue value) {
        PrettyJson writer = new PrettyJson();
        writer.write(value, 0);
        writer.out.append('\n');
        return writer.out.toString().getBytes(StandardCharsets.UTF_8);
    }

    private void write(JsonValue value, int indent) {
        if (value instanceof JsonObject object) {
            if (!writeOnOneLine(value)) {
                writeObject(object, indent);
            }
        } else if (value instanceof JsonArray array) {
            if (!writeOnOneLine(value)) {
                writeArray(array, indent);
            }
        } else {
            CanonicalJson.appendLeaf(out, value);
        }
    }

    /** Writes a container of leaves on this line when it fits; otherwise leaves the text as it was. */
    private boolean writeOnOneLine(JsonValue value) {
        int start = out.length();
        int lineStart = out.lastIndexOf("\n") + 1;
        boolean fits = value instanceof JsonObject object
                ? tryObject(object, lineStart)
                : tryArray((JsonArray) value, lineStart);
        if (!fits) {
            out.setLength(start);
        }
        return fits;
    }

    private boolean tryObject(JsonObject object, int lineStart) {
        Iterator<Map.Entry<String, JsonValue>> members =
                object.members().entrySet().iterator();
        out.append('{');
        while (members.hasNext()) {
            Map.Entry<String, JsonValue> member = members.next();
            StringText.append(out, member.getKey());
            out.append(": ");
            if (!tryLeaf(member.getValue(), lineStart)) {
                return false;
            }
            if (members.hasNext()) {
                out.append(", ");
            }
        }
        out.append('}');
        return out.length() - lineStart <= WIDTH;
    }

    private boolean tryArray(JsonArray array, int lineStart) {
        Iterator<JsonValue> items = array.items().iterator();
        out.append('[');
        while (items.hasNext()) {
            if (!tryLeaf(items.next(), lineStart)) {
                return false;
            }
            if (items.hasNext()) {
                out.append(", ");
            }
        }
        out.append(']');
        return out.length() - lineStart <= WIDTH;
    }

    private boolean tryLeaf(JsonValue value, int lineStart) {
        if (value instanceof JsonArray array && array.items().isEmpty()) {
            out.append("[]");
        } else if (value instanceof JsonObject object && object.members().isEmpty()) {
            out.append("{}");
        } else if (value instanceof JsonObject || value instanceof JsonArray) {
            return false;
        } else {
            CanonicalJson.appendLeaf(out, value);
        }
        return out.length() - lineStart <= WIDTH;
    }

    private void writeObject(JsonObject object, int indent) {
        Iterator<Map.Entry<String, JsonValue>> members =
                object.members().entrySet().iterator();
        out.append('{');
        while (members.hasNext()) {
            Map.Entry<String, JsonValue> member = members.next();
            newLine(indent + 1);
            StringText.append(out, member.getKey());
            out.append(": ");
            write(member.getValue(), indent + 1);
            if (members.hasNext()) {
                out.append(',');
            }
        }
        newLine(indent);
        out.append('}');
    }

    private void writeArray(JsonArray array, int indent) {
        boolean numbers = true;
        for (JsonValue item : array.items()) {
            numbers &= item instanceof JsonNumber;
        }
        out.append('[');
        if (numbers) {
            fillNumbers(array.items(), indent + 1);
        } else {
            writeItems(array.items(), indent + 1);
        }
        newLine(indent);
        out.append(']');
    }

    private void writeItems(List<JsonValue> items, int indent) {
        Iterator<JsonValue> left = items.iterator();
        while (left.hasNext()) {
            newLine(indent);
            write(left.next(), indent);
            if (left.hasNext()) {
                out.append(',');
            }
        }
    }

    private void fillNumbers(List<JsonValue> numbers, int indent) {
        newLine(indent);
        int lineStart = out.length() - 2 * indent;
        StringBuilder text = new StringBuilder(26);
        for (int i = 0; i < numbers.size(); i++) {
            text.setLength(0);
            CanonicalJson.appendLeaf(text, numbers.get(i));
            if (i + 1 < numbers.size()) {
                text.append(',');
            }
            if (i > 0 && out.length() + 1 + text.length() - lineStart > WIDTH) {
                newLine(indent);
                lineStart = out.length() - 2 * indent;
            } else if (i > 0) {
                out.append(' ');
            }
            out.append(text);
        }
    }

    private void newLine(int indent) {
        out.append('\n');
        for (int i = 0; i < indent; i++) {
            out.append("  ");
        }
    }
}
