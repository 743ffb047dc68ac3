package org.saddlebook.register.api;

import java.util.Objects;

/**
 * A head somebody kept outside the register, to hold it to later.
 *
 * @param size number of records at that time
 * @param root root hash at that time
 */
public record Checkpoint(long size, Digest root) {
    /** The schema named in checkpoint files of this version. */
    public static final String SCHEMA = "saddlebook/register-checkpoint/1";

    /** Checks the components. */
    public Checkpoint {
        Objects.requireNonNull(root, "root");
        if (size < 0) {
            throw new IllegalArgumentException("negative size: " + size);
        }
    }
}
