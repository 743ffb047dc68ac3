package org.saddlebook.reaction.api;

import java.util.Objects;
import java.util.Optional;
import org.saddlebook.reaction.internal.EquationParser;

/**
 * A substance in a phase.
 *
 * @param formula what it is
 * @param phase its phase; empty when not stated
 * @param modification crystal form or similar, for example {@code graphite}; empty text for none
 */
public record Species(Formula formula, Optional<Phase> phase, String modification) {
    /** Checks the components. */
    public Species {
        Objects.requireNonNull(formula, "formula");
        Objects.requireNonNull(phase, "phase");
        Objects.requireNonNull(modification, "modification");
    }

    /**
     * A species: a formula and, where stated, its phase {@code (g)}, {@code (l)}, {@code (s)}, {@code (cr)} or {@code
     * (aq)}, and after a comma its modification: {@code C(s,graphite)}.
     *
     * @throws ReactionException as {@link Formula#parse}, and {@code unknown-phase}
     */
    public static Species parse(String text) throws ReactionException {
        return EquationParser.species(text);
    }

    /** {@code SO4^2-(aq)}; reads back as itself. */
    public String text() {
        if (phase.isEmpty()) {
            return formula.text();
        }
        return formula.text() + "(" + phase.get().symbol() + (modification.isEmpty() ? "" : "," + modification) + ")";
    }

    /** The same in another phase. */
    public Species withPhase(Phase newPhase) {
        return new Species(formula, Optional.of(newPhase), modification);
    }
}
