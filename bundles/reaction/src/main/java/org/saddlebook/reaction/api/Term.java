package org.saddlebook.reaction.api;

import java.util.Objects;

/**
 * A species with its coefficient.
 *
 * @param coefficient above zero
 * @param species the species
 */
public record Term(Fraction coefficient, Species species) {
    /** Checks the components. */
    public Term {
        Objects.requireNonNull(species, "species");
        if (coefficient.signum() <= 0) {
            throw new IllegalArgumentException("a coefficient must be above zero: " + coefficient.text());
        }
    }

    /** {@code 3 H2(g)}, or {@code N2(g)} for a coefficient of one. */
    public String text() {
        return coefficient.equals(Fraction.ONE) ? species.text() : coefficient.text() + " " + species.text();
    }
}
