package org.saddlebook.reader.text.internal;

/**
 * What a heading says.
 *
 * @param kind what the column holds
 * @param unit the unit's text; null when the heading has none
 * @param certain whether the unit stands where only a unit stands: in brackets or after a solidus; {@code T_K} and
 *     {@code T K} are units only when they can be read as one
 */
record Heading(Kind kind, String unit, boolean certain) {
    /** What a column holds. */
    enum Kind {
        TEMPERATURE("T", "temperature"),
        RATE("k", "rate constant"),
        TEMPERATURE_UNCERTAINTY("u(T)", "standard uncertainty of the temperature"),
        RATE_UNCERTAINTY("u(k)", "standard uncertainty of the rate constant"),
        RELATIVE_RATE_UNCERTAINTY("u(k)/k", "relative standard uncertainty of the rate constant"),
        THIRD_BODY("[M]", "concentration of the third body"),
        PRESSURE("p", "pressure"),
        LABEL("label", "label of the run"),
        BLOCK("block", "stock, batch or day of the run"),
        EXCLUDED("excluded", "reason for exclusion"),
        /** 1/T and its multiples. */
        RECIPROCAL_TEMPERATURE("1/T", "reciprocal temperature"),
        /** A logarithm of k. */
        LOGARITHM_OF_RATE("ln k", "logarithm of the rate constant"),
        /** k times a power of ten. */
        SCALED_RATE("k", "multiple of the rate constant"),
        /** Some uncertainty, of which it is not said that it is a standard uncertainty of T or k. */
        UNCLEAR_UNCERTAINTY("u(k)", "uncertainty"),
        /** Anything else; not used. */
        OTHER("", "other");

        private final String key;
        private final String words;

        Kind(String key, String words) {
            this.key = key;
            this.words = words;
        }

        /** Name in messages and in the keys of a reading rule. */
        String key() {
            return key;
        }

        String words() {
            return words;
        }
    }

    static final Heading OTHER = new Heading(Kind.OTHER, null, true);
}
