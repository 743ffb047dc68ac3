package org.saddlebook.data.checks.internal;

import java.util.List;

/** One kind of mistake that is looked for. Stateless. */
interface Rule {
    /** Stable identifier, lower case with hyphens. */
    String id();

    /** What is looked for, for people. */
    String title();

    /** Looks. */
    Outcome examine(Subject subject);

    /** What came of looking. */
    sealed interface Outcome {
        /** The rule saw something. */
        record Found(List<Finding> findings) implements Outcome {
            /** Copies the list. */
            public Found {
                findings = List.copyOf(findings);
            }
        }

        /** It looked and saw nothing. */
        record Nothing() implements Outcome {}

        /** It could not look. */
        record NotExamined(String reason) implements Outcome {}
    }

    /** {@link Outcome.Found} for one finding or more, else {@link Outcome.Nothing}. */
    static Outcome of(List<Finding> findings) {
        return findings.isEmpty() ? new Outcome.Nothing() : new Outcome.Found(findings);
    }
}
