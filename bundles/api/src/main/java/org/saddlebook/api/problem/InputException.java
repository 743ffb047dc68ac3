package org.saddlebook.api.problem;

import java.util.List;

/** Input or arguments cannot be used; carries every problem found, at least one. Nothing was written. */
public final class InputException extends Exception {
    private static final long serialVersionUID = 1L;

    private final transient List<Problem> problems;

    /** One problem. */
    public InputException(Problem problem) {
        this(List.of(problem));
    }

    /** Several problems, in order of place. */
    public InputException(List<Problem> problems) {
        super(problems.isEmpty() ? "no problem" : problems.get(0).toString());
        if (problems.isEmpty()) {
            throw new IllegalArgumentException("at least one problem");
        }
        this.problems = List.copyOf(problems);
    }

    /** The problems, at least one. */
    public List<Problem> problems() {
        return problems;
    }
}
