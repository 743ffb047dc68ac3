package org.saddlebook.json.api;

/** The JSON value {@code null}. */
public record JsonNull() implements JsonValue {
    @Override
    public String kind() {
        return "null";
    }
}
