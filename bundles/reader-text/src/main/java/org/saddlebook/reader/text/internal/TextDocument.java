package org.saddlebook.reader.text.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.saddlebook.api.reader.Imported.Directive;

/**
 * The lines of a file sorted into directives and table.
 *
 * @param table lines of the table, header first; blank and comment lines are left out
 * @param directives comment lines of the form {@code # key: value}
 * @param blank whether the file has nothing but blank lines
 */
record TextDocument(List<Line> table, List<Directive> directives, boolean blank) {
    /**
     * One line.
     *
     * @param number physical line from 1
     * @param text without its line end
     */
    record Line(int number, String text) {}

    private static final int LONGEST_KEY = 40;

    static TextDocument of(String text, Problems problems) {
        List<Line> table = new ArrayList<>();
        List<Directive> directives = new ArrayList<>();
        boolean blank = true;
        int number = 0;
        int start = 0;
        while (start < text.length()) {
            number++;
            int end = start;
            while (end < text.length() && text.charAt(end) != '\n' && text.charAt(end) != '\r') {
                end++;
            }
            String line = text.substring(start, end);
            start = text.startsWith("\r\n", end) ? end + 2 : end + 1;
            String comment = comment(line);
            if (comment != null) {
                blank = false;
                addDirective(comment, number, directives, problems);
            } else if (!isBlank(line)) {
                blank = false;
                table.add(new Line(number, line));
            }
        }
        return new TextDocument(table, directives, blank);
    }

    /** The text of a comment line after its mark; null for other lines. A spreadsheet may have quoted or padded it. */
    private static String comment(String line) {
        String trimmed = line.strip();
        boolean quoted = trimmed.startsWith("\"#");
        if (!quoted && !trimmed.startsWith("#")) {
            return null;
        }
        int end = trimmed.length();
        while (end > 0 && ",;\t ".indexOf(trimmed.charAt(end - 1)) >= 0) {
            end--;
        }
        String text = trimmed.substring(0, end);
        if (quoted) {
            text = text.endsWith("\"") ? text.substring(1, text.length() - 1) : text.substring(1);
            text = text.replace("\"\"", "\"");
        }
        return text.substring(1).strip();
    }

    private static void addDirective(String comment, int line, List<Directive> directives, Problems problems) {
        int colon = comment.indexOf(':');
        if (colon <= 0 || colon > LONGEST_KEY || !isKeyEnd(comment, colon)) {
            return;
        }
        String key = collapse(comment.substring(0, colon)).toLowerCase(Locale.ROOT);
        directives.add(new Directive(key, comment.substring(colon + 1).strip(), problems.place(line)));
    }

    /** Not the colon of an address, a path or a time of day. */
    private static boolean isKeyEnd(String comment, int colon) {
        char before = comment.charAt(colon - 1);
        char after = colon + 1 < comment.length() ? comment.charAt(colon + 1) : ' ';
        return Character.isLetter(comment.charAt(0))
                && after != '/'
                && after != '\\'
                && !(Character.isDigit(before) && Character.isDigit(after));
    }

    /** Single spaces, none at the ends. */
    static String collapse(String text) {
        StringBuilder collapsed = new StringBuilder(text.length());
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            if (Character.isWhitespace(c) || c == '\u00a0' || c == '\u202f') {
                if (collapsed.length() > 0 && collapsed.charAt(collapsed.length() - 1) != ' ') {
                    collapsed.append(' ');
                }
            } else {
                collapsed.append(c);
            }
        }
        int length = collapsed.length();
        return length > 0 && collapsed.charAt(length - 1) == ' '
                ? collapsed.substring(0, length - 1)
                : collapsed.toString();
    }

    /** Blanks, or separators alone as spreadsheets write for an empty row. */
    private static boolean isBlank(String line) {
        for (int i = 0; i < line.length(); i++) {
            char c = line.charAt(i);
            if (!Character.isWhitespace(c) && c != '\u00a0' && c != ',' && c != ';') {
                return false;
            }
        }
        return true;
    }
}
