package org.saddlebook.reader.text.internal;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.units.api.UnitException;

/** The problems of one file, in order; after the first {@value #LIMIT} they are counted only. */
final class Problems {
    static final int LIMIT = 50;

    private static final int LONGEST_QUOTE = 80;

    /** Those of the whole file first. */
    private static final Comparator<Problem> BY_LINE = new Comparator<>() {
        @Override
        public int compare(Problem one, Problem other) {
            return Integer.compare(
                    one.place().line().orElse(0), other.place().line().orElse(0));
        }
    };

    private final String file;
    private final List<Problem> list = new ArrayList<>();
    private int further;

    Problems(String file) {
        this.file = file;
    }

    Place wholeFile() {
        return Place.of(file);
    }

    Place place(int line) {
        return Place.of(file, line);
    }

    Place place(int line, String column) {
        return Place.of(file, line, column);
    }

    void add(String code, Place place, String found, String expected, String remedy) {
        if (list.size() < LIMIT) {
            list.add(new Problem(code, place, found, expected, remedy));
        } else {
            further++;
        }
    }

    void add(UnitException cause, Place place) {
        add(cause.code(), place, cause.found(), cause.expected(), cause.remedy());
    }

    /** A text of the file in double quotes, cut when it is long. */
    static String quoted(String text) {
        String stripped = text.strip();
        return stripped.length() > LONGEST_QUOTE
                ? "\"" + stripped.substring(0, LONGEST_QUOTE) + "…\""
                : "\"" + stripped + "\"";
    }

    boolean isEmpty() {
        return list.isEmpty();
    }

    /** Throws what has been collected; returns when there is nothing. */
    void throwIfAny() throws InputException {
        if (list.isEmpty()) {
            return;
        }
        list.sort(BY_LINE);
        if (further > 0) {
            list.add(new Problem(
                    "more-problems",
                    wholeFile(),
                    further + " further problems",
                    "a file without problems",
                    "mend those listed and read the file again"));
        }
        throw new InputException(list);
    }

    /** Throws this problem beside those collected so far. */
    InputException fatal(String code, Place place, String found, String expected, String remedy) {
        List<Problem> all = new ArrayList<>(list);
        all.add(new Problem(code, place, found, expected, remedy));
        return new InputException(all);
    }
}
