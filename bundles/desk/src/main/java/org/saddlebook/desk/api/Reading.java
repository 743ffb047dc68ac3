package org.saddlebook.desk.api;

import java.util.Objects;

/**
 * What one stratum reads at the hairline.
 *
 * @param name what is read, a symbol or one or two words
 * @param text value, uncertainty and unit, ready to be shown
 */
public record Reading(String name, String text) {
    /** Checks the components. */
    public Reading {
        Objects.requireNonNull(name, "name");
        Objects.requireNonNull(text, "text");
    }
}
