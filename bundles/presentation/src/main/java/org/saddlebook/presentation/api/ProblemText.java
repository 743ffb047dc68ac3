package org.saddlebook.presentation.api;

import java.util.List;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;

/** Bad input in words: where, what was found, what was expected, what to do. */
public final class ProblemText {
    private ProblemText() {}

    /**
     * One problem in four lines, without a line feed at the end:
     *
     * <pre>
     * rates.csv, line 7, column "k / s^-1"
     *   found:    -0.0021
     *   expected: a rate constant above 0
     *   remedy:   Correct the cell, or exclude the run with a reason.
     * </pre>
     */
    public static String of(Problem problem) {
        return place(problem.place()) + "\n  found:    " + indented(problem.found()) + "\n  expected: "
                + indented(problem.expected()) + "\n  remedy:   " + indented(problem.remedy());
    }

    /** Several problems, a blank line between them. */
    public static String of(List<Problem> problems) {
        StringBuilder text = new StringBuilder();
        for (Problem problem : problems) {
            text.append(text.length() == 0 ? "" : "\n\n").append(of(problem));
        }
        return text.toString();
    }

    /** {@code rates.csv, line 7, column "k / s^-1"}. */
    public static String place(Place place) {
        StringBuilder text = new StringBuilder(visible(place.file()));
        if (place.line().isPresent()) {
            text.append(", line ").append(place.line().getAsInt());
        }
        if (place.column().isPresent()) {
            text.append(", column \"").append(visible(place.column().get())).append('"');
        }
        return text.toString();
    }

    /** Control characters of a bad file must not steer a terminal or break the layout: they are shown as U+FFFD. */
    private static String visible(String text) {
        StringBuilder shown = null;
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            boolean control = Character.isISOControl(c) && c != '\n';
            if (control && shown == null) {
                shown = new StringBuilder(text.length()).append(text, 0, i);
            }
            if (shown != null) {
                shown.append(control ? '\ufffd' : c);
            }
        }
        return shown == null ? text : shown.toString();
    }

    private static String indented(String text) {
        return visible(text.replace("\t", "    ")).replace("\n", "\n            ");
    }
}
