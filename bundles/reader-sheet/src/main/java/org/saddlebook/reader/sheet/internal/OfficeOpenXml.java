package org.saddlebook.reader.sheet.internal;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import org.dhatim.fastexcel.reader.Cell;
import org.dhatim.fastexcel.reader.CellType;
import org.dhatim.fastexcel.reader.ReadableWorkbook;
import org.dhatim.fastexcel.reader.ReadingOptions;
import org.dhatim.fastexcel.reader.Row;
import org.dhatim.fastexcel.reader.Sheet;
import org.dhatim.fastexcel.reader.SheetVisibility;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;
import org.saddlebook.reader.sheet.internal.Grid.Kind;

/** Office Open XML workbooks (ISO/IEC 29500). */
final class OfficeOpenXml implements Office {
    @Override
    public List<Grid> sheets(byte[] bytes, Task task) throws IOException, Cancelled {
        List<Grid> grids = new ArrayList<>();
        try (ReadableWorkbook workbook =
                new ReadableWorkbook(new ByteArrayInputStream(bytes), new ReadingOptions(true, false))) {
            List<Sheet> sheets;
            try (Stream<Sheet> all = workbook.getSheets()) {
                sheets = all.toList();
            }
            for (Sheet sheet : sheets) {
                grids.add(grid(sheet, task));
            }
        }
        return grids;
    }

    private static Grid grid(Sheet sheet, Task task) throws IOException, Cancelled {
        Cells cells = new Cells();
        try (Stream<Row> stream = sheet.openStream()) {
            Iterator<Row> rows = stream.iterator();
            while (rows.hasNext()) {
                task.check();
                for (Cell cell : rows.next()) {
                    if (cell != null) {
                        add(cell, cells);
                    }
                }
            }
        }
        return cells.grid(sheet.getName(), sheet.getVisibility() != SheetVisibility.VISIBLE);
    }

    private static void add(Cell cell, Cells cells) {
        int row = cell.getAddress().getRow();
        int column = cell.getColumnIndex();
        CellType type = cell.getType();
        String raw = cell.getRawValue() == null ? "" : cell.getRawValue();
        if (type == CellType.FORMULA) {
            cells.formula();
            // What was computed when the file was saved: a number, a truth value, a text or the name of an error.
            if (raw.startsWith("#")) {
                cells.flaw(row, column, Kind.FAULT, raw);
                return;
            }
            Object value = cell.getValue();
            type = value instanceof Number || isNumber(raw) ? CellType.NUMBER : CellType.STRING;
        }
        switch (type) {
            case NUMBER -> number(cell, row, column, raw, cells);
            case ERROR -> cells.flaw(row, column, Kind.FAULT, raw);
            case BOOLEAN -> cells.text(row, column, raw.equals("0") ? "false" : "true");
            default -> cells.text(row, column, cell.getType() == CellType.STRING ? cell.getText() : raw);
        }
    }

    private static void number(Cell cell, int row, int column, String raw, Cells cells) {
        String format = cell.getDataFormatString() == null
                ? ""
                : cell.getDataFormatString().toLowerCase(Locale.ROOT);
        if (format.indexOf('%') >= 0) {
            cells.flaw(row, column, Kind.PERCENT, "the number " + raw + " shown as a percentage");
        } else if (isDate(format)) {
            cells.flaw(row, column, Kind.DATE, "a date or time of day, stored as " + raw);
        } else {
            cells.number(row, column, Double.parseDouble(raw));
        }
    }

    /** Whether a number format shows days, months, years or hours; letters in quotes, brackets or behind \ are text. */
    static boolean isDate(String format) {
        if (format.equals("general")) {
            return false;
        }
        boolean quoted = false;
        boolean bracket = false;
        for (int i = 0; i < format.length(); i++) {
            char c = format.charAt(i);
            if (c == '\\' || c == '_' || c == '*') {
                i++;
            } else if (c == '"') {
                quoted = !quoted;
            } else if (!quoted && (c == '[' || c == ']')) {
                bracket = c == '[';
            } else if (!quoted && !bracket && "dmyhs".indexOf(c) >= 0) {
                return true;
            }
        }
        return false;
    }

    private static boolean isNumber(String raw) {
        try {
            Double.parseDouble(raw);
            return true;
        } catch (NumberFormatException e) {
            return false;
        }
    }
}
