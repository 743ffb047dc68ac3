package org.saddlebook.register.console.api;

import java.util.List;
import java.util.Objects;

/**
 * What came of evaluating an entry again.
 *
 * @param agreement the outcome
 * @param absentModels ids of models that the entry needs and that are not installed; empty unless NOT_POSSIBLE
 * @param otherBundles bundles that are others than then, in order of name
 * @param differences places that do not agree, in the order of the findings
 */
public record Recomputed(
        Agreement agreement, List<String> absentModels, List<OtherBundle> otherBundles, List<Difference> differences) {
    /** How the new findings stand to the stored ones. */
    public enum Agreement {
        /** The same bytes from the same bundles. */
        IDENTICAL,
        /** Other bundles; every number within the larger of 1e-9 of its value and 1e-6 of its standard uncertainty. */
        AGREES,
        /** Equal values in other bytes. */
        WRITTEN_DIFFERENTLY,
        /** Values differ. */
        DIFFERS,
        /** A model that the entry was evaluated with is not installed. */
        NOT_POSSIBLE
    }

    /**
     * A bundle that is another one now.
     *
     * @param name symbolic name
     * @param then version and hash then, or none
     * @param now version and hash now, or none
     */
    public record OtherBundle(String name, String then, String now) {}

    /**
     * A place that differs.
     *
     * @param place path in the findings
     * @param then value then
     * @param now value now
     */
    public record Difference(String place, String then, String now) {}

    /** Copies the lists. */
    public Recomputed {
        Objects.requireNonNull(agreement, "agreement");
        absentModels = List.copyOf(absentModels);
        otherBundles = List.copyOf(otherBundles);
        differences = List.copyOf(differences);
    }
}
