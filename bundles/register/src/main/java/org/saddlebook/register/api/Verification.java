package org.saddlebook.register.api;

import java.util.List;
import java.util.Objects;
import java.util.OptionalLong;

/**
 * What checking a whole register found.
 *
 * @param records number of records read
 * @param parts number of different parts read
 * @param bytes number of bytes in those parts
 * @param head the tree over the records read, recomputed
 * @param unreferenced parts that are stored and named by no record: left behind when a process died before it could
 *     append, and harmless
 * @param differences what does not agree; empty when all is well
 */
public record Verification(
        long records, long parts, long bytes, Head head, long unreferenced, List<Difference> differences) {
    /**
     * Something that does not agree with what was sealed.
     *
     * @param code stable identifier, for example {@code record-changed}
     * @param number of the record concerned; absent when it concerns no single one
     * @param message a sentence that names it
     */
    public record Difference(String code, OptionalLong number, String message) {
        /** Checks the components. */
        public Difference {
            Objects.requireNonNull(code, "code");
            Objects.requireNonNull(number, "number");
            Objects.requireNonNull(message, "message");
        }
    }

    /** Copies the list. */
    public Verification {
        Objects.requireNonNull(head, "head");
        differences = List.copyOf(differences);
    }

    /** Whether everything agrees. */
    public boolean agrees() {
        return differences.isEmpty();
    }
}
