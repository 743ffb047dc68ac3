package org.saddlebook.json.api;

/**
 * A JSON number, as a double (RFC 7493, I-JSON).
 *
 * @param value finite; negative zero becomes zero, because RFC 8785 writes both as {@code 0}
 */
public record JsonNumber(double value) implements JsonValue {
    /** Checks that the value is finite. */
    public JsonNumber {
        if (!Double.isFinite(value)) {
            throw new IllegalArgumentException("JSON has no number for " + value);
        }
        value = value + 0.0;
    }

    @Override
    public String kind() {
        return "a number";
    }
}
