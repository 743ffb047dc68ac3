package org.saddlebook.reaction.api;

import java.util.Objects;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;

/**
 * A text is not a formula or equation that can be used. Carries what a {@link Problem} needs, except the file, which only
 * the caller knows.
 */
public final class ReactionException extends Exception {
    private static final long serialVersionUID = 1L;

    private final String code;
    private final String found;
    private final String expected;
    private final String remedy;
    private final int character;

    /**
     * The parts of the problem.
     *
     * @param code stable identifier in lower case with hyphens
     * @param found what is there, quoted as read
     * @param expected what should be there
     * @param remedy what to do about it, one sentence
     * @param character where in the text it begins, from 1
     */
    public ReactionException(String code, String found, String expected, String remedy, int character) {
        super(found + " (character " + character + "); expected " + expected + "; " + remedy, null, false, false);
        this.code = Objects.requireNonNull(code, "code");
        this.found = Objects.requireNonNull(found, "found");
        this.expected = Objects.requireNonNull(expected, "expected");
        this.remedy = Objects.requireNonNull(remedy, "remedy");
        this.character = character;
    }

    /** Stable identifier in lower case with hyphens, for example {@code unknown-element}. */
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

    /** Where in the text it begins, from 1. */
    public int character() {
        return character;
    }

    /** The problem in a file or argument; the character within the text becomes part of what was found. */
    public Problem at(Place place) {
        return new Problem(code, place, found + " (character " + character + ")", expected, remedy);
    }
}
