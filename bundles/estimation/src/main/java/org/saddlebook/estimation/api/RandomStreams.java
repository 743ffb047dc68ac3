package org.saddlebook.estimation.api;

import java.util.random.RandomGenerator;
import org.osgi.annotation.versioning.ConsumerType;

/**
 * Where random numbers come from: a fresh generator for each name, the same numbers for the same name whenever and on
 * whatever thread it is asked for. Only {@link RandomGenerator#nextLong()} is used, so that no library's own method for other
 * distributions decides a result. Must be thread-safe when resampling in parallel.
 */
@ConsumerType
@FunctionalInterface
public interface RandomStreams {
    /**
     * A generator at its beginning.
     *
     * @param stream what it is for, a piece of work at a time
     */
    RandomGenerator stream(String stream);
}
