package org.saddlebook.reader.text.internal;

import java.util.ArrayList;
import java.util.List;

/** What stands between cells. */
enum Separator {
    TAB("tabs", "tab"),
    SEMICOLON("semicolons", "semicolon"),
    COMMA("commas", "comma"),
    WIDE_SPACE("runs of two or more spaces", "wide-space"),
    SPACE("spaces", "space");

    private final String plural;
    private final String key;

    Separator(String plural, String key) {
        this.plural = plural;
        this.key = key;
    }

    /** For people. */
    String plural() {
        return plural;
    }

    /** The value in a reading rule. */
    String key() {
        return key;
    }

    /**
     * The cells of a line, without blanks around them and with quotes resolved (RFC 4180, but a quoted cell ends on its
     * line: a stray quote must not swallow the rest of a file); null when a quoted cell is not closed or is followed by
     * more than the next separator.
     */
    List<String> cells(String line) {
        List<String> cells = new ArrayList<>();
        int position = 0;
        int length = line.length();
        if (isSpace()) {
            position = skipBlanks(line, 0);
            while (length > position && line.charAt(length - 1) == ' ') {
                length--;
            }
        }
        while (true) {
            int start = skipBlanks(line, position);
            if (start < length && line.charAt(start) == '"') {
                StringBuilder cell = new StringBuilder();
                position = quoted(line, start + 1, cell);
                if (position < 0) {
                    return null;
                }
                int after = isSpace() ? position : skipBlanks(line, position);
                if (after < length && separatorLength(line, after, length) == 0) {
                    return null;
                }
                position = after;
                cells.add(TextDocument.collapse(cell.toString()));
            } else {
                int end = position;
                while (end < length && separatorLength(line, end, length) == 0) {
                    end++;
                }
                cells.add(TextDocument.collapse(line.substring(position, end)));
                position = end;
            }
            if (position >= length) {
                return cells;
            }
            position += separatorLength(line, position, length);
        }
    }

    private boolean isSpace() {
        return this == SPACE || this == WIDE_SPACE;
    }

    /** Length of the separator at a position, 0 when there is none. */
    private int separatorLength(String line, int position, int length) {
        char c = line.charAt(position);
        return switch (this) {
            case TAB -> c == '\t' ? 1 : 0;
            case SEMICOLON -> c == ';' ? 1 : 0;
            case COMMA -> c == ',' ? 1 : 0;
            case SPACE, WIDE_SPACE -> {
                int end = position;
                while (end < length && line.charAt(end) == ' ') {
                    end++;
                }
                yield end - position >= (this == SPACE ? 1 : 2) ? end - position : 0;
            }
        };
    }

    private static int skipBlanks(String line, int from) {
        int position = from;
        while (position < line.length() && line.charAt(position) == ' ') {
            position++;
        }
        return position;
    }

    /** Copies a quoted cell; returns the position after the closing quote, -1 when there is none. */
    private static int quoted(String line, int from, StringBuilder cell) {
        int position = from;
        while (position < line.length()) {
            char c = line.charAt(position);
            if (c != '"') {
                cell.append(c);
                position++;
            } else if (line.startsWith("\"\"", position)) {
                cell.append('"');
                position += 2;
            } else {
                return position + 1;
            }
        }
        return -1;
    }
}
