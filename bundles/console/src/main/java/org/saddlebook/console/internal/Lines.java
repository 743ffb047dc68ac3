package org.saddlebook.console.internal;

import java.io.PrintStream;

/** Lines that fit a terminal. */
final class Lines {
    static final int WIDTH = 110;

    private Lines() {}

    /** Prints text broken at spaces; the first line begins with {@code lead}, further ones are indented as far. */
    static void wrapped(PrintStream out, String lead, String text) {
        StringBuilder line = new StringBuilder(lead);
        boolean empty = true;
        for (String word : text.split(" ", -1)) {
            if (!empty && line.length() + 1 + word.length() > WIDTH) {
                out.println(line);
                line.setLength(0);
                line.append(" ".repeat(lead.length()));
                empty = true;
            }
            if (!empty) {
                line.append(' ');
            }
            line.append(word);
            empty = false;
        }
        out.println(line);
    }

    /** Text filled with spaces to a width. */
    static String padded(String text, int width) {
        return text.length() >= width ? text : text + " ".repeat(width - text.length());
    }
}
