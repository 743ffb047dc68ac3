package org.saddlebook.console.internal;

import java.io.PrintStream;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** Numbers the cautions in order of use, so that each number is printed with its marks and the texts follow once. */
final class CautionMarks {
    private final List<String> used = new ArrayList<>();

    /** The marks of these cautions with a space before them, such as {@code  [1,4]}; empty for none. */
    String marks(List<String> ids) {
        if (ids.isEmpty()) {
            return "";
        }
        StringBuilder text = new StringBuilder(" [");
        for (int i = 0; i < ids.size(); i++) {
            int at = used.indexOf(ids.get(i));
            if (at < 0) {
                at = used.size();
                used.add(ids.get(i));
            }
            text.append(i == 0 ? "" : ",").append(at + 1);
        }
        return text.append(']').toString();
    }

    /**
     * Prints the texts of all that were used, then of those that belong to the whole.
     *
     * @param texts caution id to text
     */
    void print(PrintStream out, Map<String, String> texts) {
        marks(List.copyOf(texts.keySet()));
        if (used.isEmpty()) {
            return;
        }
        out.println();
        out.println("Cautions");
        for (int i = 0; i < used.size(); i++) {
            String number = "[" + (i + 1) + "]";
            String text = texts.getOrDefault(used.get(i), used.get(i));
            Lines.wrapped(out, "  " + number + " ".repeat(Math.max(1, 5 - number.length())), text);
        }
    }
}
