package org.saddlebook.reader.text.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.reader.text.internal.TextDocument.Line;

/**
 * Finds the separator. A candidate must split the header into two cells or more; among several the one that gives every
 * row as many cells as the header wins; when that does not decide, nothing does.
 */
final class SeparatorChoice {
    private static final Separator[] MARKS = {Separator.TAB, Separator.SEMICOLON, Separator.COMMA};
    private static final Separator[] SPACES = {Separator.WIDE_SPACE, Separator.SPACE};

    private SeparatorChoice() {}

    static Separator choose(List<Line> table, Problems problems) throws InputException {
        Line header = table.get(0);
        List<Separator> splitting = new ArrayList<>();
        List<Separator> consistent = new ArrayList<>();
        for (Separator mark : MARKS) {
            int width = width(mark, header);
            if (width > 1) {
                splitting.add(mark);
                if (isConsistent(mark, width, table)) {
                    consistent.add(mark);
                }
            }
        }
        if (splitting.size() == 1) {
            return splitting.get(0);
        }
        if (consistent.size() == 1) {
            return consistent.get(0);
        }
        if (splitting.size() > 1) {
            StringBuilder found = new StringBuilder("a header with ");
            for (int i = 0; i < splitting.size(); i++) {
                found.append(i == 0 ? "" : " and ").append(splitting.get(i).plural());
            }
            throw problems.fatal(
                    "ambiguous-separator",
                    problems.place(header.number()),
                    found.toString(),
                    "one kind of separator that gives every row as many cells as the header",
                    "use one separator throughout, or put names that contain it in double quotes");
        }
        for (Separator space : SPACES) {
            int width = width(space, header);
            if (width > 1 && isConsistent(space, width, table)) {
                consistent.add(space);
            }
        }
        // Both kinds of space may cut the same cells; when they do not, neither is certain.
        if (consistent.size() == 2 && width(SPACES[0], header) != width(SPACES[1], header)) {
            consistent.clear();
        }
        if (!consistent.isEmpty()) {
            return consistent.get(0);
        }
        throw problems.fatal(
                "no-separator",
                problems.place(header.number()),
                Problems.quoted(header.text()),
                "column names separated by commas, semicolons or tabs",
                "separate the columns by semicolons or tabs, in the header and in every row");
    }

    private static int width(Separator separator, Line line) {
        List<String> cells = separator.cells(line.text());
        return cells == null ? 0 : cells.size();
    }

    private static boolean isConsistent(Separator separator, int width, List<Line> table) {
        for (Line line : table) {
            if (width(separator, line) != width) {
                return false;
            }
        }
        return true;
    }
}
