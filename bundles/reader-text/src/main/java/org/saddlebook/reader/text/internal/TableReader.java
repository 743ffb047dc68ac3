package org.saddlebook.reader.text.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;
import org.saddlebook.reader.text.internal.Heading.Kind;
import org.saddlebook.reader.text.internal.TextDocument.Line;
import org.saddlebook.units.api.DecimalSign;
import org.saddlebook.units.api.Numerals;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/** Lines of a table to a rate table. */
final class TableReader {
    private final Rule rule;
    private final Problems problems;
    private final List<String> understood;

    TableReader(Rule rule, Problems problems, List<String> understood) {
        this.rule = rule;
        this.problems = problems;
        this.understood = understood;
    }

    RateTable read(List<Line> table, Task task) throws InputException, Cancelled {
        Line headerLine = table.get(0);
        Separator separator = rule.separator() != null ? rule.separator() : SeparatorChoice.choose(table, problems);
        List<String> headerCells = separator.cells(headerLine.text());
        if (headerCells == null) {
            refuseQuote(headerLine);
            problems.throwIfAny();
        }
        refuseMissingHeader(headerLine, headerCells);
        List<Row> rows = rows(table, separator, headerCells);
        Row header = new Row(headerLine.number(), named(headerLine, headerCells, rows));
        Row units = takeUnits(header, rows);
        ColumnPlan plan = new ColumnPlan(header, units, rule, problems);
        dropEmpty(plan, rows);
        DecimalSign sign = rule.decimal() != null ? rule.decimal() : decimalSign(plan, rows);
        if (rows.isEmpty() && problems.isEmpty()) {
            problems.add(
                    "no-rows",
                    problems.place(header.line()),
                    "a header without rows",
                    "at least one row of numbers below the header",
                    "add the measured temperatures and rate constants");
        }
        List<RatePoint> points = new PointReader(plan, sign, problems).read(rows, task);
        problems.throwIfAny();
        explain(separator, sign, plan, points);
        Unit unit = plan.column(Kind.RATE).unit();
        OptionalDouble order = Units.rateOrder(unit);
        return new RateTable(unit, order.orElseThrow(), points);
    }

    /** The rows with as many cells as the header; the others are problems, or one when one cause explains them. */
    private List<Row> rows(List<Line> table, Separator separator, List<String> header) {
        List<Row> rows = new ArrayList<>(table.size());
        List<Ragged> ragged = new ArrayList<>();
        int digits = 0;
        for (int i = 1; i < table.size(); i++) {
            Line line = table.get(i);
            List<String> cells = separator.cells(line.text());
            if (cells == null) {
                refuseQuote(line);
                continue;
            }
            cells = withoutPadding(cells, header.size());
            if (cells.size() == header.size()) {
                rows.add(new Row(line.number(), cells));
            } else {
                boolean decimals = separator == Separator.COMMA && cells.size() > header.size() && areDigits(cells);
                ragged.add(new Ragged(line, cells.size(), decimals));
                digits += decimals ? 1 : 0;
            }
        }
        // Too many numbers between commas in most rows: these are decimal commas.
        if (digits * 2 > ragged.size() + rows.size()) {
            Ragged first = ragged.get(0);
            problems.add(
                    "decimal-comma",
                    problems.place(first.line().number()),
                    Problems.quoted(first.line().text()) + ": " + first.cells() + " cells under " + header.size()
                            + " column names",
                    "commas between columns only, or decimal commas only",
                    "separate the columns by semicolons or tabs, or write numbers with a decimal point");
        } else {
            for (Ragged row : ragged) {
                refuseRagged(row, header.size());
            }
        }
        return rows;
    }

    /** A line with another number of cells than the header; whether its commas may be decimal ones. */
    private record Ragged(Line line, int cells, boolean decimals) {}

    private void refuseRagged(Ragged row, int width) {
        String remedy = "remove what is too much, or put a text that contains the separator in double quotes";
        if (row.cells() < width) {
            remedy = "add what is missing, or an empty cell for it";
        } else if (row.decimals()) {
            remedy = "remove what is too much, or separate the columns by semicolons when these are decimal commas";
        }
        problems.add(
                "ragged-row",
                problems.place(row.line().number()),
                Problems.quoted(row.line().text()) + ": " + row.cells() + (row.cells() == 1 ? " cell" : " cells"),
                width + " cells, one for each column name",
                remedy);
    }

    private static List<String> withoutPadding(List<String> cells, int width) {
        int size = cells.size();
        while (size > width && cells.get(size - 1).isEmpty()) {
            size--;
        }
        return cells.subList(0, size);
    }

    private static boolean areDigits(List<String> cells) {
        int numeric = 0;
        for (String cell : cells) {
            char first = cell.isEmpty() ? ' ' : cell.charAt(0);
            if ((first >= '0' && first <= '9') || first == '-' || first == '+') {
                numeric++;
            }
        }
        return numeric * 2 > cells.size();
    }

    private void refuseMissingHeader(Line line, List<String> cells) throws InputException {
        for (String cell : cells) {
            if (!isNumber(cell)) {
                return;
            }
        }
        throw problems.fatal(
                "missing-header",
                problems.place(line.number()),
                Problems.quoted(line.text()) + ", numbers in the first line",
                "a line with column names and units",
                "add a first line such as \"T (K);k (1/s)\"");
    }

    /** The column names; a column without a name must be empty. */
    private List<String> named(Line line, List<String> cells, List<Row> rows) {
        for (int i = 0; i < cells.size(); i++) {
            if (cells.get(i).isEmpty() && !isEmpty(i, rows)) {
                problems.add(
                        "unnamed-column",
                        problems.place(line.number()),
                        "no name above column " + (i + 1) + ", which is not empty",
                        "a name for every column",
                        "name the column, or remove it");
            }
        }
        return cells;
    }

    private static boolean isEmpty(int index, List<Row> rows) {
        for (Row row : rows) {
            if (!row.cells().get(index).isEmpty()) {
                return false;
            }
        }
        return true;
    }

    /** Takes the row of units away from the rows when there is one; else null. */
    private static Row takeUnits(Row header, List<Row> rows) {
        if (rows.isEmpty() || !ColumnPlan.lacksUnits(header)) {
            return null;
        }
        Row first = rows.get(0);
        boolean filled = false;
        for (int i = 0; i < header.cells().size(); i++) {
            Kind kind = HeadingParser.parse(header.cells().get(i)).kind();
            String cell = first.cells().get(i);
            if (kind == Kind.TEMPERATURE || kind == Kind.RATE) {
                if (isNumber(cell) || isWordForNoNumber(cell)) {
                    return null;
                }
                filled |= !cell.isEmpty();
            }
        }
        return filled ? rows.remove(0) : null;
    }

    private static boolean isWordForNoNumber(String cell) {
        try {
            Numerals.parse(cell, DecimalSign.POINT);
            return false;
        } catch (UnitException e) {
            return e.code().equals("not-finite");
        }
    }

    private static boolean isNumber(String cell) {
        for (DecimalSign sign : DecimalSign.values()) {
            try {
                Numerals.parse(cell, sign);
                return true;
            } catch (UnitException e) {
                // Perhaps with the other sign.
            }
        }
        return false;
    }

    /** A column of uncertainties with nothing in it states nothing. */
    private static void dropEmpty(ColumnPlan plan, List<Row> rows) {
        for (Column column : new ArrayList<>(plan.columns())) {
            boolean required = column.kind() == Kind.TEMPERATURE || column.kind() == Kind.RATE;
            if (!required && column.hasNumbers() && isEmpty(column.index(), rows) && !rows.isEmpty()) {
                plan.drop(column);
            }
        }
    }

    /** The sign that more numbers have; the others are then problems. A point when no number has decimals. */
    private static DecimalSign decimalSign(ColumnPlan plan, List<Row> rows) {
        int commas = 0;
        int points = 0;
        for (Row row : rows) {
            for (Column column : plan.columns()) {
                if (column.hasNumbers()) {
                    commas += row.cell(column).indexOf(',') >= 0 ? 1 : 0;
                    points += row.cell(column).indexOf('.') >= 0 ? 1 : 0;
                }
            }
        }
        return commas > points ? DecimalSign.COMMA : DecimalSign.POINT;
    }

    private void refuseQuote(Line line) {
        problems.add(
                "unclosed-quote",
                problems.place(line.number()),
                Problems.quoted(line.text()),
                "double quotes that enclose a whole cell and close on the same line",
                "close the quotes, and write a double quote inside them twice");
    }

    private void explain(Separator separator, DecimalSign sign, ColumnPlan plan, List<RatePoint> points) {
        understood.add("columns are separated by " + separator.plural());
        understood.add("numbers have a decimal " + (sign == DecimalSign.COMMA ? "comma" : "point"));
        for (Column column : plan.columns()) {
            StringBuilder sentence = new StringBuilder("column “");
            sentence.append(column.heading())
                    .append("” read as ")
                    .append(column.kind().words());
            if (column.hasNumbers()) {
                sentence.append(" in ").append(display(column.unit()));
            }
            if (column.kind() == Kind.RATE) {
                double order = Units.rateOrder(column.unit()).orElseThrow();
                sentence.append(", overall order ")
                        .append(Numerals.shortest(order).toPlainString());
            }
            understood.add(sentence.toString());
        }
        for (String heading : plan.unused()) {
            understood.add("column “" + heading + "” not used");
        }
        int excluded = 0;
        for (RatePoint point : points) {
            excluded += point.excluded().isPresent() ? 1 : 0;
        }
        understood.add(points.size()
                + (points.size() == 1 ? " row" : " rows")
                + (excluded == 0 ? "" : ", of which " + excluded + " excluded"));
    }

    private static String display(Unit unit) {
        return switch (unit.code()) {
            case "Cel" -> "°C";
            case "[degF]" -> "°F";
            case "1" -> "parts of k";
            default -> unit.code();
        };
    }
}
