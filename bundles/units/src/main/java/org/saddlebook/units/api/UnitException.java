package org.saddlebook.units.api;

import java.util.Objects;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;

/**
 * A text is not a unit, number or quantity that can be used. Carries what a {@link Problem} needs, except the place,
 * which only the caller knows.
 */
public final class UnitException extends Exception {
    private static final long serialVersionUID = 1L;

    private final String code;
    private final String found;
    private final String expected;
    private final String remedy;

    /**
     * The parts of the problem.
     *
     * @param code stable identifier, see the bundle's README for the list
     * @param found what is there, quoted as read
     * @param expected what should be there
     * @param remedy what to do about it, one sentence
     */
    public UnitException(String code, String found, String expected, String remedy) {
        super(found + "; expected " + expected + "; " + remedy, null, false, false);
        this.code = Objects.requireNonNull(code, "code");
        this.found = found;
        this.expected = expected;
        this.remedy = Objects.requireNonNull(remedy, "remedy");
    }

    /** Stable identifier in lower case with hyphens, for example {@code unknown-unit}. */
    public String code() {
        return code;
    }

    /** What is there, quoted as read. */
    public String found() {
        return found;
    }

    /** What should be there. */
    public String expected() {
        return expected;
    }

    /** What to do about it, one sentence. */
    public String remedy() {
        return remedy;
    }

    /** The problem at a place. */
    public Problem at(Place place) {
        return new Problem(code, place, found, expected, remedy);
    }
}
