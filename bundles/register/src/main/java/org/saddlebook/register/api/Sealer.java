package org.saddlebook.register.api;

import org.osgi.annotation.versioning.ProviderType;

/** Turns a draft into the next record. A store calls it while no other writer can append. */
@ProviderType
@FunctionalInterface
public interface Sealer {
    /**
     * Seals a draft. It may read {@link RegisterStore#records} of the same store.
     *
     * @param draft what is to be recorded
     * @param head the tree before it
     * @throws RegisterException when the draft contradicts what is recorded; the store then appends nothing
     */
    SealedRecord seal(Draft draft, Head head) throws RegisterException;
}
