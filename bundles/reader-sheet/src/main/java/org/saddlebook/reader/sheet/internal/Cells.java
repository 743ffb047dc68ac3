package org.saddlebook.reader.sheet.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.reader.sheet.internal.Grid.Flaw;
import org.saddlebook.reader.sheet.internal.Grid.Kind;
import org.saddlebook.units.api.Numerals;

/** Collects the cells of one sheet. */
final class Cells {
    private final List<List<String>> rows = new ArrayList<>();
    private final List<Flaw> flaws = new ArrayList<>();
    private int formulas;

    /** A text at a place counted from 0. */
    void text(int row, int column, String text) {
        if (text.isEmpty()) {
            return;
        }
        while (rows.size() <= row) {
            rows.add(new ArrayList<>());
        }
        List<String> cells = rows.get(row);
        while (cells.size() <= column) {
            cells.add("");
        }
        cells.set(column, text);
    }

    /** A number; one that is not finite is written in a word, so that the reader of the table names it. */
    void number(int row, int column, double value) {
        String text = "NaN";
        if (Double.isFinite(value)) {
            text = Numerals.shortest(value).toString();
        } else if (!Double.isNaN(value)) {
            text = "inf";
        }
        text(row, column, text);
    }

    void flaw(int row, int column, Kind kind, String found) {
        flaws.add(new Flaw(row + 1, Grid.letters(column), kind, found));
    }

    void formula() {
        formulas++;
    }

    Grid grid(String name, boolean hidden) {
        return new Grid(name, hidden, rows, flaws, formulas);
    }
}
