package org.saddlebook.desk.api;

import org.osgi.annotation.versioning.ConsumerType;
import org.saddlebook.api.service.Progress;

/**
 * Work in the background.
 *
 * @param <T> what it gives
 */
@ConsumerType
@FunctionalInterface
public interface Work<T> {
    /**
     * Does the work, off the event thread.
     *
     * @param progress progress out, cancel in: call {@code check} often
     * @throws Exception what went wrong; an {@code InputException} or {@code IOException} carries a sentence for the user
     */
    T run(Progress progress) throws Exception;
}
