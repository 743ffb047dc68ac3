package org.saddlebook.json.api;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;

/**
 * A JSON object. Members keep their order, which files for people show; equality does not depend on it.
 *
 * @param members key to value
 */
public record JsonObject(Map<String, JsonValue> members) implements JsonValue {
    /** Copies the members, keeping their order; keys must have a UTF-8 form. */
    public JsonObject {
        members = Collections.unmodifiableMap(new LinkedHashMap<>(members));
        for (Map.Entry<String, JsonValue> member : members.entrySet()) {
            JsonString.requireEncodable(Objects.requireNonNull(member.getKey(), "key"));
            Objects.requireNonNull(member.getValue(), member.getKey());
        }
    }

    /** The member with this key. */
    public Optional<JsonValue> get(String key) {
        return Optional.ofNullable(members.get(key));
    }

    /** Whether there is a member with this key. */
    public boolean has(String key) {
        return members.containsKey(key);
    }

    /** Starts an empty object. */
    public static Builder builder() {
        return new Builder();
    }

    @Override
    public String kind() {
        return "an object";
    }

    /** Collects members in order. Not for use by several threads. */
    public static final class Builder {
        private final Map<String, JsonValue> members = new LinkedHashMap<>();

        private Builder() {}

        /** Adds a member; a key that is there already is refused. */
        public Builder put(String key, JsonValue value) {
            if (members.putIfAbsent(Objects.requireNonNull(key, "key"), Objects.requireNonNull(value, key)) != null) {
                throw new IllegalArgumentException("duplicate key: " + key);
            }
            return this;
        }

        /** Adds a string. */
        public Builder put(String key, String text) {
            return put(key, new JsonString(text));
        }

        /** Adds a number, which must be finite. */
        public Builder put(String key, double number) {
            return put(key, new JsonNumber(number));
        }

        /** Adds a whole number between -(2^53 - 1) and 2^53 - 1; others are not numbers in every JSON reader. */
        public Builder put(String key, long number) {
            if (Math.abs(number) >= 1L << 53 || number == Long.MIN_VALUE) {
                throw new IllegalArgumentException("beyond 2^53 - 1: " + number);
            }
            return put(key, (double) number);
        }

        /** Adds a boolean. */
        public Builder put(String key, boolean value) {
            return put(key, new JsonBoolean(value));
        }

        /** The object. */
        public JsonObject build() {
            return new JsonObject(members);
        }
    }
}
