package org.saddlebook.desk.api;

import org.osgi.annotation.versioning.ProviderType;

/** Work that is running or waiting. */
@ProviderType
public interface DeskTask {
    /** Asks it to stop; its result is not handed over. */
    void cancel();

    /** Whether it has ended, in whatever way. */
    boolean ended();
}
