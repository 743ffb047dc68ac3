package org.saddlebook.register.api;

import java.time.Clock;
import org.osgi.annotation.versioning.ProviderType;

/** Opens registers, whatever store they are in. */
@ProviderType
public interface Registers {
    /**
     * Opens a register.
     *
     * @param location a file, or whatever an installed store accepts
     * @param clock gives the time of new records
     * @throws RegisterException when no installed store accepts the location, or the store cannot be opened
     */
    Register open(String location, RegisterStoreFactory.Opening opening, Clock clock) throws RegisterException;
}
