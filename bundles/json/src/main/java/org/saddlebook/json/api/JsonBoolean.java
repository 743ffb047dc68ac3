package org.saddlebook.json.api;

/**
 * A JSON boolean.
 *
 * @param value the value
 */
public record JsonBoolean(boolean value) implements JsonValue {
    @Override
    public String kind() {
        return "true or false";
    }
}
