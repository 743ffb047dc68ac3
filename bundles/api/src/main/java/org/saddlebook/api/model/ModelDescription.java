package org.saddlebook.api.model;

import java.util.Objects;
import java.util.Optional;

/**
 * What people read about a rate model.
 *
 * @param title name of the law, for example {@code Eyring}
 * @param formula the law in one line of plain text, with its symbols
 * @param source where the law was published
 * @param contains id of the simpler law that this one becomes when its extra parameter is neutral; empty when there is
 *     none
 */
public record ModelDescription(String title, String formula, String source, Optional<String> contains) {
    /** Checks the components. */
    public ModelDescription {
        Objects.requireNonNull(title, "title");
        Objects.requireNonNull(formula, "formula");
        Objects.requireNonNull(source, "source");
        Objects.requireNonNull(contains, "contains");
    }
}
