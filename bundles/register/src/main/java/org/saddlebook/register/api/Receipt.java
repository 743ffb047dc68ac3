package org.saddlebook.register.api;

import java.util.Objects;

/**
 * What the register gives back for a record: keep it, and nobody can later deny or alter the record unseen.
 *
 * @param number of the record, from 1 without gaps
 * @param leaf its leaf hash
 * @param head the tree right after it
 */
public record Receipt(long number, Digest leaf, Head head) {
    /** Checks that the head ends with this record. */
    public Receipt {
        Objects.requireNonNull(leaf, "leaf");
        if (head.size() != number) {
            throw new IllegalArgumentException("record " + number + " under a head of " + head.size());
        }
    }
}
