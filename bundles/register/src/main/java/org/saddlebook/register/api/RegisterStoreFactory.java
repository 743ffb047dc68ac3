package org.saddlebook.register.api;

import org.osgi.annotation.versioning.ConsumerType;

/** Opens one kind of store. Register an implementation as an OSGi service; it must cost nothing until it is asked. */
@ConsumerType
public interface RegisterStoreFactory {
    /** What to do when there is no register at the location. */
    enum Opening {
        /** Refuse with a sentence. */
        EXISTING,
        /** Make one. */
        CREATE
    }

    /** Stable id, for example {@code sqlite}. */
    String id();

    /** Whether locations of this form are for this store. */
    boolean accepts(String location);

    /**
     * Opens the store.
     *
     * @throws RegisterException when it is missing, unreadable, written by a newer version, or in a place where this kind
     *     of store loses data
     */
    RegisterStore open(String location, Opening opening) throws RegisterException;
}
