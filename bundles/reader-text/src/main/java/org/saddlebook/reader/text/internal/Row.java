package org.saddlebook.reader.text.internal;

import java.util.List;

/**
 * A row of cells.
 *
 * @param line physical line from 1
 * @param cells without blanks around them
 */
record Row(int line, List<String> cells) {
    String cell(Column column) {
        return column.index() < cells.size() ? cells.get(column.index()) : "";
    }
}
