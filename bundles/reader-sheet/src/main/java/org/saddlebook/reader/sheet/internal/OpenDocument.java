package org.saddlebook.reader.sheet.internal;

import com.github.miachm.sods.OdsOptionParameters;
import com.github.miachm.sods.OfficeCurrency;
import com.github.miachm.sods.OfficePercentage;
import com.github.miachm.sods.Range;
import com.github.miachm.sods.Sheet;
import com.github.miachm.sods.SpreadSheet;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;
import org.saddlebook.reader.sheet.internal.Grid.Kind;

/** OpenDocument spreadsheets (ISO/IEC 26300). */
final class OpenDocument implements Office {
    @Override
    public List<Grid> sheets(byte[] bytes, Task task) throws IOException, Cancelled {
        List<Grid> grids = new ArrayList<>();
        // Looking for styles, the library would pass by the content of a document that has none.
        OdsOptionParameters withoutStyles = new OdsOptionParameters();
        withoutStyles.setLoadStyles(false);
        for (Sheet sheet : new SpreadSheet(new ByteArrayInputStream(bytes), withoutStyles).getSheets()) {
            Cells cells = new Cells();
            Range range = sheet.getDataRange();
            Object[][] values = range.getNumRows() == 0 ? new Object[0][0] : range.getValues();
            String[][] formulas = range.getNumRows() == 0 ? new String[0][0] : range.getFormulas();
            for (int row = 0; row < values.length; row++) {
                task.check();
                for (int column = 0; column < values[row].length; column++) {
                    if (formulas[row][column] != null) {
                        cells.formula();
                    }
                    if (values[row][column] != null) {
                        add(values[row][column], row, column, cells);
                    }
                }
            }
            grids.add(cells.grid(sheet.getName(), sheet.isHidden()));
        }
        return grids;
    }

    private static void add(Object value, int row, int column, Cells cells) {
        if (value instanceof Double number) {
            cells.number(row, column, number);
        } else if (value instanceof OfficePercentage share) {
            cells.flaw(row, column, Kind.PERCENT, "the number " + share.getValue() + " shown as a percentage");
        } else if (value instanceof OfficeCurrency) {
            cells.flaw(row, column, Kind.FAULT, "an amount of money");
        } else if (value instanceof Boolean || value instanceof CharSequence) {
            String text = value.toString();
            if (text.startsWith("#") && text.endsWith("!")) {
                cells.flaw(row, column, Kind.FAULT, text); // how a failed formula is saved
            } else {
                cells.text(row, column, text);
            }
        } else {
            cells.flaw(row, column, Kind.DATE, "a date or time of day, " + value);
        }
    }
}
