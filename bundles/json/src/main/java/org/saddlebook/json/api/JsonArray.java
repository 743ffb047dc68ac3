package org.saddlebook.json.api;

import java.util.ArrayList;
import java.util.List;

/**
 * A JSON array.
 *
 * @param items the items in order
 */
public record JsonArray(List<JsonValue> items) implements JsonValue {
    /** Copies the items. */
    public JsonArray {
        items = List.copyOf(items);
    }

    /** An array of strings. */
    public static JsonArray ofStrings(List<String> texts) {
        List<JsonValue> items = new ArrayList<>(texts.size());
        for (String text : texts) {
            items.add(new JsonString(text));
        }
        return new JsonArray(items);
    }

    /** An array of numbers; all must be finite. */
    public static JsonArray ofNumbers(double... numbers) {
        List<JsonValue> items = new ArrayList<>(numbers.length);
        for (double number : numbers) {
            items.add(new JsonNumber(number));
        }
        return new JsonArray(items);
    }

    @Override
    public String kind() {
        return "an array";
    }
}
