package org.saddlebook.api.problem;

import java.util.Objects;
import java.util.Optional;
import java.util.OptionalInt;

/**
 * Where a problem was found.
 *
 * @param file name of the file or argument, as the user gave it; never empty
 * @param line physical line from 1; absent when the problem is not in one line
 * @param column name of the column or field; absent when not in one column
 */
public record Place(String file, OptionalInt line, Optional<String> column) {
    /** Checks the components. */
    public Place {
        Objects.requireNonNull(file, "file");
        Objects.requireNonNull(line, "line");
        Objects.requireNonNull(column, "column");
    }

    /** The whole of a file or argument. */
    public static Place of(String file) {
        return new Place(file, OptionalInt.empty(), Optional.empty());
    }

    /** One line of a file, from 1. */
    public static Place of(String file, int line) {
        return new Place(file, OptionalInt.of(line), Optional.empty());
    }

    /** One column of one line. */
    public static Place of(String file, int line, String column) {
        return new Place(file, OptionalInt.of(line), Optional.of(column));
    }
}
