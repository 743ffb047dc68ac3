package org.saddlebook.api.task;

import java.util.Objects;

/**
 * What came of running code that may be broken.
 *
 * @param <T> type of the answer
 */
public sealed interface Contained<T> {
    /**
     * It answered.
     *
     * @param value the answer; never null
     */
    record Answer<T>(T value) implements Contained<T> {
        /** Checks the answer. */
        public Answer {
            Objects.requireNonNull(value, "value");
        }
    }

    /**
     * It threw, returned nothing or did not come back.
     *
     * @param reason a sentence that names the culprit and what it did
     */
    record Broke<T>(String reason) implements Contained<T> {
        /** Checks the reason. */
        public Broke {
            Objects.requireNonNull(reason, "reason");
        }
    }
}
