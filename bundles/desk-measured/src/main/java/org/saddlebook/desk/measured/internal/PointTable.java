package org.saddlebook.desk.measured.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.desk.components.api.TableContent;
import org.saddlebook.desk.components.api.TableContent.Cell;
import org.saddlebook.desk.components.api.TableContent.Column;
import org.saddlebook.presentation.api.Rounding;
import org.saddlebook.presentation.api.UnitText;

/** The measured points as a table, in order of the source. */
final class PointTable {
    private PointTable() {}

    static TableContent of(RateTable table) {
        String rate = table.rateUnit().code();
        String unit = UnitText.forPeople(rate);
        boolean read = false;
        boolean named = false;
        for (RatePoint point : table.points()) {
            read |= point.asRead().line().isPresent();
            named |= !point.label().isEmpty();
        }
        List<Column> columns = new ArrayList<>();
        if (named) {
            columns.add(new Column("run", "", false));
        }
        columns.add(new Column("T / °C", "Cel", false));
        columns.add(new Column("T / K", "K", false));
        columns.add(new Column("u(T) / K", "K", false));
        columns.add(new Column("k / " + unit, rate, false));
        columns.add(new Column("u(k) / " + unit, rate, false));
        if (read) {
            columns.add(new Column("as read", "", false));
        }
        columns.add(new Column("used", "", false));
        List<List<Cell>> rows = new ArrayList<>();
        for (RatePoint point : table.points()) {
            rows.add(row(table, point, named, read));
        }
        return new TableContent(columns, rows);
    }

    private static List<Cell> row(RateTable table, RatePoint point, boolean named, boolean read) {
        List<Cell> cells = new ArrayList<>();
        if (named) {
            cells.add(Cell.of(point.label()));
        }
        double celsius = point.kelvin() - 273.15;
        cells.add(Cell.of(Rounding.decimals(celsius, 2), celsius));
        cells.add(Cell.of(Rounding.decimals(point.kelvin(), 2), point.kelvin()));
        cells.add(number(point.kelvinUncertainty(), 1));
        double rate = table.rateUnit().fromSi(point.rate());
        cells.add(Cell.of(Rounding.significant(rate, 4), rate));
        cells.add(number(point.rateUncertainty(), table.rateUnit().factor()));
        if (read) {
            String line = point.asRead().line().isPresent()
                    ? "line " + point.asRead().line().getAsInt() + ": "
                    : "";
            cells.add(Cell.of(
                    line + point.asRead().temperature() + " · " + point.asRead().rate()));
        }
        cells.add(Cell.of(point.excluded().map(reason -> "excluded: " + reason).orElse("used")));
        return cells;
    }

    private static Cell number(OptionalDouble value, double factor) {
        return value.isPresent()
                ? Cell.of(Rounding.significant(value.getAsDouble() / factor, 2), value.getAsDouble() / factor)
                : Cell.of("not stated");
    }
}
