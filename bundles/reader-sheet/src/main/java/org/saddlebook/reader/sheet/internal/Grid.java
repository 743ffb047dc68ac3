package org.saddlebook.reader.sheet.internal;

import java.util.List;

/**
 * The cells of one sheet as text, numbers with a decimal point.
 *
 * @param name name of the sheet
 * @param hidden whether its author hid it
 * @param rows rows from the first one of the sheet on, empty ones included, so that numbers of rows stay true
 * @param flaws cells that stand for no text and no number
 * @param formulas how many cells were computed from others
 */
record Grid(String name, boolean hidden, List<List<String>> rows, List<Flaw> flaws, int formulas) {
    /**
     * A cell that cannot be read.
     *
     * @param row number of the row from 1
     * @param column letters of the column
     * @param kind what is wrong with it
     * @param found what it shows
     */
    record Flaw(int row, String column, Kind kind, String found) {}

    /** What is wrong with a cell. */
    enum Kind {
        /** A formula that failed, for example by a division by zero. */
        FAULT("cell-error", "a number or a text", "correct the formula, or write the value"),
        /** A date or a time of day. */
        DATE("date-cell", "a number or a text", "format the cell as a number when it is one, and look at its value"),
        /** A number shown as a percentage, stored a hundred times smaller than what is seen. */
        PERCENT(
                "percent-cell",
                "a plain number, with \"%\" as unit in the heading",
                "format the cell as a number and write the value that is meant");

        private final String code;
        private final String expected;
        private final String remedy;

        Kind(String code, String expected, String remedy) {
            this.code = code;
            this.expected = expected;
            this.remedy = remedy;
        }

        String code() {
            return code;
        }

        String expected() {
            return expected;
        }

        String remedy() {
            return remedy;
        }
    }

    Grid {
        rows = List.copyOf(rows);
        flaws = List.copyOf(flaws);
    }

    boolean isEmpty() {
        for (List<String> row : rows) {
            for (String cell : row) {
                if (!cell.isBlank()) {
                    return false;
                }
            }
        }
        return flaws.isEmpty();
    }

    /** Letters of a column: A, B, ... Z, AA. */
    static String letters(int index) {
        StringBuilder letters = new StringBuilder();
        for (int rest = index + 1; rest > 0; rest = (rest - 1) / 26) {
            letters.insert(0, (char) ('A' + (rest - 1) % 26));
        }
        return letters.toString();
    }

    /** The rows as text: one line for each row, tabs between cells; what would break a line becomes a blank. */
    String text() {
        StringBuilder text = new StringBuilder();
        for (List<String> row : rows) {
            for (int i = 0; i < row.size(); i++) {
                if (i > 0) {
                    text.append('\t');
                }
                append(text, row.get(i));
            }
            text.append('\n');
        }
        return text.toString();
    }

    private static void append(StringBuilder text, String cell) {
        boolean quotes = cell.indexOf('"') >= 0;
        if (quotes) {
            text.append('"');
        }
        for (int i = 0; i < cell.length(); i++) {
            char c = cell.charAt(i);
            if (c == '"') {
                text.append("\"\"");
            } else {
                text.append(c == '\t' || c == '\n' || c == '\r' ? ' ' : c);
            }
        }
        if (quotes) {
            text.append('"');
        }
    }
}
