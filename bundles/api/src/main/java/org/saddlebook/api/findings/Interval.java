package org.saddlebook.api.findings;

import java.util.Objects;
import java.util.OptionalDouble;

/**
 * A coverage set of one quantity, in the quantity's unit.
 *
 * @param kind the shape of the set
 * @param level coverage probability, between 0 and 1
 * @param lower lower limit; present for BETWEEN, AT_LEAST and OUTSIDE
 * @param upper upper limit; present for BETWEEN, AT_MOST and OUTSIDE
 * @param method how it was made, for example {@code t}, {@code normal}, {@code fieller}
 */
public record Interval(Kind kind, double level, OptionalDouble lower, OptionalDouble upper, String method) {
    /** The shapes a coverage set can have; {@code key} is the word used in files. */
    public enum Kind {
        /** lower &lt;= x &lt;= upper. */
        BETWEEN("between"),
        /** x &gt;= lower. */
        AT_LEAST("atLeast"),
        /** x &lt;= upper. */
        AT_MOST("atMost"),
        /** x &lt;= lower or x &gt;= upper. */
        OUTSIDE("outside"),
        /** Every value: not determined. */
        EVERYTHING("everything"),
        /** No value. */
        NONE("none");

        private final String key;

        Kind(String key) {
            this.key = key;
        }

        /** The word used in files. */
        public String key() {
            return key;
        }

        /** The kind with this word; throws {@link IllegalArgumentException} for an unknown one. */
        public static Kind of(String key) {
            for (Kind kind : values()) {
                if (kind.key.equals(key)) {
                    return kind;
                }
            }
            throw new IllegalArgumentException("unknown interval kind: " + key);
        }
    }

    /** Checks that the limits fit the kind. */
    public Interval {
        Objects.requireNonNull(kind, "kind");
        Objects.requireNonNull(method, "method");
        if (!(level > 0 && level < 1)) {
            throw new IllegalArgumentException("level must lie between 0 and 1: " + level);
        }
        boolean wantsLower = kind == Kind.BETWEEN || kind == Kind.AT_LEAST || kind == Kind.OUTSIDE;
        boolean wantsUpper = kind == Kind.BETWEEN || kind == Kind.AT_MOST || kind == Kind.OUTSIDE;
        if (lower.isPresent() != wantsLower || upper.isPresent() != wantsUpper) {
            throw new IllegalArgumentException("limits do not fit kind " + kind);
        }
        if ((wantsLower && Double.isNaN(lower.getAsDouble())) || (wantsUpper && Double.isNaN(upper.getAsDouble()))) {
            throw new IllegalArgumentException("limits must be numbers");
        }
    }

    /** lower to upper. */
    public static Interval between(double lower, double upper, double level, String method) {
        return new Interval(Kind.BETWEEN, level, OptionalDouble.of(lower), OptionalDouble.of(upper), method);
    }

    /** Every value: the data do not determine the quantity. */
    public static Interval everything(double level, String method) {
        return new Interval(Kind.EVERYTHING, level, OptionalDouble.empty(), OptionalDouble.empty(), method);
    }
}
