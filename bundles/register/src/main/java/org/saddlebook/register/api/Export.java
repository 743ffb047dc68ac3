package org.saddlebook.register.api;

import java.util.List;
import java.util.Objects;

/**
 * An entry on its way out of the register.
 *
 * @param entry the entry
 * @param files what to write, {@code README.txt} first; names are relative paths
 */
public record Export(Entry entry, List<PartFile> files) {
    /** Copies the list. */
    public Export {
        Objects.requireNonNull(entry, "entry");
        files = List.copyOf(files);
    }
}
