package org.saddlebook.spontaneity.internal;

/**
 * A temperature at which ΔG is zero, or passes zero in a jump.
 *
 * @param kelvin the temperature, K
 * @param kind how
 * @param signAbove sign of ΔG just above; 0 at the upper end of the range
 */
record Root(double kelvin, Kind kind, int signAbove) {
    /** How ΔG meets zero; {@code word} is the word in files. */
    enum Kind {
        /** It changes sign. */
        CROSSING("crossing"),
        /** It touches zero without changing sign. */
        TANGENT("touches zero without crossing"),
        /** It changes sign in a jump where data of a species meet. */
        JUMP("jump between data");

        private final String word;

        Kind(String word) {
            this.word = word;
        }

        String word() {
            return word;
        }
    }
}
