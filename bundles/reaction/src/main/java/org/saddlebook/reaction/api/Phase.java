package org.saddlebook.reaction.api;

/** The state of aggregation that a formula carries in parentheses. */
public enum Phase {
    /** Gas. */
    GAS("g"),
    /** Liquid. */
    LIQUID("l"),
    /** Solid; {@code (cr)} is read as this too. */
    SOLID("s"),
    /** Dissolved in water. */
    AQUEOUS("aq");

    private final String symbol;

    Phase(String symbol) {
        this.symbol = symbol;
    }

    /** {@code g}, {@code l}, {@code s} or {@code aq}. */
    public String symbol() {
        return symbol;
    }
}
