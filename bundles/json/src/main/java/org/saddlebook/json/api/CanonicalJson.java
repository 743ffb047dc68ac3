package org.saddlebook.json.api;

import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;

/** The canonical form of RFC 8785 (JSON Canonicalization Scheme): one sequence of bytes per value, for hashes. */
public final class CanonicalJson {
    private CanonicalJson() {}

    /**
     * The canonical bytes: no white space, keys sorted by UTF-16 code units, numbers as ECMAScript writes them, UTF-8.
     */
    public static byte[] bytes(JsonValue value) {
        StringBuilder out = new StringBuilder(1024);
        append(out, value);
        return out.toString().getBytes(StandardCharsets.UTF_8);
    }

    private static void append(StringBuilder out, JsonValue value) {
        if (value instanceof JsonObject object) {
            // String.compareTo compares UTF-16 code units, which is the order that RFC 8785, 3.2.3 asks for.
            String[] keys = object.members().keySet().toArray(new String[0]);
            Arrays.sort(keys);
            out.append('{');
            for (int i = 0; i < keys.length; i++) {
                if (i > 0) {
                    out.append(',');
                }
                StringText.append(out, keys[i]);
                out.append(':');
                append(out, object.members().get(keys[i]));
            }
            out.append('}');
        } else if (value instanceof JsonArray array) {
            List<JsonValue> items = array.items();
            out.append('[');
            for (int i = 0; i < items.size(); i++) {
                if (i > 0) {
                    out.append(',');
                }
                append(out, items.get(i));
            }
            out.append(']');
        } else {
            appendLeaf(out, value);
        }
    }

    /** Appends a value that holds no others; the same in both written forms. */
    static void appendLeaf(StringBuilder out, JsonValue value) {
        if (value instanceof JsonString string) {
            StringText.append(out, string.value());
        } else if (value instanceof JsonNumber number) {
            NumberText.append(out, number.value());
        } else if (value instanceof JsonBoolean flag) {
            out.append(flag.value());
        } else {
            out.append("null");
        }
    }
}
