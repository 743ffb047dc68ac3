package org.saddlebook.units.api;

/** What separates the whole part of a number from its decimals. */
public enum DecimalSign {
    /** {@code 1.5}. */
    POINT('.'),
    /** {@code 1,5}. */
    COMMA(',');

    private final char character;

    DecimalSign(char character) {
        this.character = character;
    }

    /** The character itself. */
    public char character() {
        return character;
    }
}
