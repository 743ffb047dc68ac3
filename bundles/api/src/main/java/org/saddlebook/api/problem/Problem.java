package org.saddlebook.api.problem;

import java.util.Objects;

/**
 * Something wrong with what was given, in the five parts a person needs to mend it.
 *
 * @param code stable identifier in lower case with hyphens, for example {@code missing-unit}
 * @param place where
 * @param found what is there, quoted as read
 * @param expected what should be there
 * @param remedy what to do about it, one sentence
 */
public record Problem(String code, Place place, String found, String expected, String remedy) {
    /** Checks the components. */
    public Problem {
        Objects.requireNonNull(code, "code");
        Objects.requireNonNull(place, "place");
        Objects.requireNonNull(found, "found");
        Objects.requireNonNull(expected, "expected");
        Objects.requireNonNull(remedy, "remedy");
    }
}
