package org.saddlebook.presentation.api;

import java.nio.charset.StandardCharsets;
import java.util.List;

/**
 * Comma-separated values after RFC 4180: lines end in CR LF, cells that need it stand in double quotes. A text that a
 * spreadsheet would run as a formula gets an apostrophe in front (common practice, no source), because titles and labels
 * come from files of other people.
 */
public final class CsvText {
    /** Without it spreadsheets take UTF-8 for the code page of the machine. */
    private static final char BYTE_ORDER_MARK = '\ufeff';

    private final StringBuilder text = new StringBuilder().append(BYTE_ORDER_MARK);
    private boolean rowBegun;

    /** Starts an empty file. */
    public CsvText() {}

    /** Adds a cell with a text. */
    public CsvText text(String cell) {
        append(isFormula(cell) ? "'" + cell : cell);
        return this;
    }

    /** Adds a cell with a number as it is written; the caller vouches that it is one. */
    public CsvText number(String cell) {
        append(cell);
        return this;
    }

    /** Ends the row. */
    public CsvText endRow() {
        text.append("\r\n");
        rowBegun = false;
        return this;
    }

    /** Adds a row of texts. */
    public CsvText row(List<String> cells) {
        for (String cell : cells) {
            text(cell);
        }
        return endRow();
    }

    /** The file in UTF-8, with a byte order mark. */
    public byte[] bytes() {
        return text.toString().getBytes(StandardCharsets.UTF_8);
    }

    /** Whether a spreadsheet would run a cell with this text. */
    public static boolean isFormula(String cell) {
        return !cell.isEmpty() && "=+-@\t\r\n".indexOf(cell.charAt(0)) >= 0;
    }

    private void append(String cell) {
        if (rowBegun) {
            text.append(',');
        }
        rowBegun = true;
        boolean quotes = false;
        for (int i = 0; i < cell.length() && !quotes; i++) {
            quotes = ",\"\r\n".indexOf(cell.charAt(i)) >= 0;
        }
        if (quotes) {
            text.append('"').append(cell.replace("\"", "\"\"")).append('"');
        } else {
            text.append(cell);
        }
    }
}
