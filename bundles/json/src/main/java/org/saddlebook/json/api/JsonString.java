package org.saddlebook.json.api;

import java.util.Objects;

/**
 * A JSON string.
 *
 * @param value text that has a UTF-8 form: no surrogate without its other half
 */
public record JsonString(String value) implements JsonValue {
    /** Checks that the text has a UTF-8 form. */
    public JsonString {
        requireEncodable(Objects.requireNonNull(value, "value"));
    }

    static void requireEncodable(String text) {
        int at = loneSurrogate(text);
        if (at >= 0) {
            throw new IllegalArgumentException("half of a surrogate pair at character " + at + " of a string");
        }
    }

    /** Index of the first surrogate without its other half; -1 for none. */
    static int loneSurrogate(String text) {
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            if (Character.isSurrogate(c)) {
                boolean pair = Character.isHighSurrogate(c)
                        && i + 1 < text.length()
                        && Character.isLowSurrogate(text.charAt(i + 1));
                if (!pair) {
                    return i;
                }
                i++;
            }
        }
        return -1;
    }

    @Override
    public String kind() {
        return "a string";
    }
}
