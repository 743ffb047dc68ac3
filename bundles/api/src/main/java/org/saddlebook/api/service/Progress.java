package org.saddlebook.api.service;

import org.saddlebook.api.task.Cancelled;

/** Progress out and cancel in, as the caller of a service provides it. Called from several threads. */
public interface Progress {
    /** Says nothing and never cancels. */
    Progress NONE = (fraction, doing) -> {};

    /**
     * Receives progress.
     *
     * @param fraction done so far, 0 to 1
     * @param doing what is being done
     */
    void report(double fraction, String doing);

    /** Throws when the user has cancelled. */
    default void check() throws Cancelled {}
}
