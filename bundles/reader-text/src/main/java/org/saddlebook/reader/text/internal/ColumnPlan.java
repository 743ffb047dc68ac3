package org.saddlebook.reader.text.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.reader.text.internal.Heading.Kind;
import org.saddlebook.units.api.UnitException;

/** Decides which column holds what, in which unit. */
final class ColumnPlan {
    private final Row header;
    private final ColumnUnits units;
    private final Problems problems;
    private final List<Heading> headings = new ArrayList<>();
    private final List<Column> columns = new ArrayList<>();
    private final List<String> unused = new ArrayList<>();

    /**
     * A plan.
     *
     * @param units row of units below the header, or null
     */
    ColumnPlan(Row header, Row units, Rule rule, Problems problems) {
        this.header = header;
        this.units = new ColumnUnits(header, units, rule, problems);
        this.problems = problems;
        for (String heading : header.cells()) {
            Heading read = HeadingParser.parse(heading);
            boolean other = read.kind() == Kind.PRESSURE && !this.units.isPressure(headings.size(), read);
            headings.add(other ? Heading.OTHER : read);
        }
        refuseDuplicates();
        // Wanted columns first, so that a 1/T beside T is known to be spare.
        add(Kind.TEMPERATURE);
        add(Kind.RATE);
        add(Kind.TEMPERATURE_UNCERTAINTY);
        addRateUncertainty();
        add(Kind.THIRD_BODY);
        add(Kind.PRESSURE);
        add(Kind.LABEL);
        add(Kind.BLOCK);
        add(Kind.EXCLUDED);
        refuseTransformed();
        requireBoth();
        for (int i = 0; i < headings.size(); i++) {
            if (!isUsed(i) && !header.cells().get(i).isEmpty()) {
                unused.add(header.cells().get(i));
            }
        }
    }

    /** The column of a kind, or null. */
    Column column(Kind kind) {
        for (Column column : columns) {
            if (column.kind() == kind) {
                return column;
            }
        }
        return null;
    }

    /** The columns in use. */
    List<Column> columns() {
        return columns;
    }

    /** Headings of columns that are not used. */
    List<String> unused() {
        return unused;
    }

    /** The column is empty in every row and is left out. */
    void drop(Column column) {
        columns.remove(column);
        unused.add(column.heading());
    }

    /** Whether the header leaves the unit of T or k open, so that a row of units may follow. */
    static boolean lacksUnits(Row header) {
        for (String text : header.cells()) {
            Heading heading = HeadingParser.parse(text);
            boolean wanted = heading.kind() == Kind.TEMPERATURE || heading.kind() == Kind.RATE;
            if (wanted && heading.unit() == null) {
                return true;
            }
        }
        return false;
    }

    private void refuseDuplicates() {
        List<String> cells = header.cells();
        for (int i = 1; i < cells.size(); i++) {
            for (int j = 0; j < i; j++) {
                if (!cells.get(i).isEmpty()
                        && cells.get(i)
                                .toLowerCase(Locale.ROOT)
                                .equals(cells.get(j).toLowerCase(Locale.ROOT))) {
                    problems.add(
                            "duplicate-column",
                            problems.place(header.line(), cells.get(i)),
                            "the column name " + Problems.quoted(cells.get(i)) + " twice",
                            "each column name once",
                            "rename or remove one of the two columns");
                    // Only the first is looked at further, so that the same fault is not reported twice.
                    headings.set(i, Heading.OTHER);
                    break;
                }
            }
        }
    }

    private void add(Kind kind) {
        List<Integer> candidates = candidates(kind);
        if (candidates.size() > 1) {
            String code = switch (kind) {
                case TEMPERATURE -> "two-temperature-columns";
                case RATE -> "two-rate-columns";
                default -> "two-columns";
            };
            StringBuilder found = new StringBuilder();
            for (int index : candidates) {
                found.append(found.length() == 0 ? "" : " and ")
                        .append(Problems.quoted(header.cells().get(index)));
            }
            problems.add(
                    code,
                    problems.place(header.line(), header.cells().get(candidates.get(1))),
                    found.toString(),
                    "one column for the " + kind.words(),
                    "remove or rename the columns that are not to be used");
        }
        if (!candidates.isEmpty()) {
            int index = candidates.get(0);
            columns.add(Column.of(
                    index,
                    header.cells().get(index),
                    kind,
                    candidates.size() > 1 || isText(kind) ? null : units.unit(index, headings.get(index), rateUnit())));
        }
    }

    /** Columns of a kind; those whose unit is only perhaps a unit count when they can be read, or when no other is there. */
    private List<Integer> candidates(Kind kind) {
        List<Integer> certain = new ArrayList<>();
        List<Integer> perhaps = new ArrayList<>();
        for (int i = 0; i < headings.size(); i++) {
            Heading heading = headings.get(i);
            if (heading.kind() == kind) {
                (heading.certain() || isReadable(heading) ? certain : perhaps).add(i);
            }
        }
        return certain.isEmpty() && !isText(kind) ? perhaps : certain;
    }

    private void addRateUncertainty() {
        boolean both = !candidates(Kind.RATE_UNCERTAINTY).isEmpty()
                && !candidates(Kind.RELATIVE_RATE_UNCERTAINTY).isEmpty();
        add(Kind.RATE_UNCERTAINTY);
        if (both) {
            int index = candidates(Kind.RELATIVE_RATE_UNCERTAINTY).get(0);
            problems.add(
                    "two-columns",
                    problems.place(header.line(), header.cells().get(index)),
                    Problems.quoted(column(Kind.RATE_UNCERTAINTY).heading()) + " and "
                            + Problems.quoted(header.cells().get(index)),
                    "one column for the standard uncertainty of the rate constant",
                    "keep the absolute or the relative uncertainty and remove the other");
        } else {
            add(Kind.RELATIVE_RATE_UNCERTAINTY);
        }
    }

    private void refuseTransformed() {
        for (int i = 0; i < headings.size(); i++) {
            Kind kind = headings.get(i).kind();
            if (kind == Kind.RECIPROCAL_TEMPERATURE && column(Kind.TEMPERATURE) == null) {
                refuse(
                        i,
                        "transformed-column",
                        "the temperature itself",
                        "replace 1/T by T with its unit, for example" + " \"T (K)\"");
            } else if (kind == Kind.LOGARITHM_OF_RATE && column(Kind.RATE) == null) {
                refuse(
                        i,
                        "transformed-column",
                        "the rate constant itself",
                        "replace the logarithm by k with its unit,"
                                + " for example \"k (1/s)\"; an uncertainty u(ln k) becomes u(k)/k");
            } else if (kind == Kind.SCALED_RATE && column(Kind.RATE) == null) {
                refuse(
                        i,
                        "scaled-column",
                        "the rate constant itself",
                        "write the power of ten into the values or into" + " the unit, for example \"k / 10^-5 s^-1\"");
            } else if (kind == Kind.UNCLEAR_UNCERTAINTY && !isSpare(i)) {
                refuse(
                        i,
                        "unclear-uncertainty",
                        "a standard uncertainty named u(k), u(k)/k or u(T)",
                        "rename the"
                                + " column when it holds standard uncertainties, divide expanded ones by their coverage factor,"
                                + " or remove the column");
            }
        }
    }

    /** An unclear uncertainty beside a clear one of k is spare, unless it is written like one of ours. */
    private boolean isSpare(int index) {
        return !heading(index).toLowerCase(Locale.ROOT).startsWith("u(")
                && (column(Kind.RATE_UNCERTAINTY) != null || column(Kind.RELATIVE_RATE_UNCERTAINTY) != null);
    }

    private void refuse(int index, String code, String expected, String remedy) {
        problems.add(
                code, problems.place(header.line(), heading(index)), Problems.quoted(heading(index)), expected, remedy);
    }

    private void requireBoth() {
        require(Kind.TEMPERATURE, Kind.RECIPROCAL_TEMPERATURE, null, "missing-temperature-column", "\"T (K)\"");
        require(Kind.RATE, Kind.LOGARITHM_OF_RATE, Kind.SCALED_RATE, "missing-rate-column", "\"k (1/s)\"");
    }

    /** Requires a column, unless one that stands in its place has been refused already. */
    private void require(Kind kind, Kind refused, Kind refusedToo, String code, String example) {
        if (column(kind) != null) {
            return;
        }
        for (Heading heading : headings) {
            if (heading.kind() == refused || heading.kind() == refusedToo) {
                return;
            }
        }
        StringBuilder found = new StringBuilder("the columns ");
        for (int i = 0; i < header.cells().size(); i++) {
            found.append(i == 0 ? "" : ", ")
                    .append(Problems.quoted(header.cells().get(i)));
        }
        problems.add(
                code,
                problems.place(header.line()),
                found.toString(),
                "a column for the " + kind.words(),
                "name the column with its unit, for example " + example);
    }

    private Unit rateUnit() {
        Column rate = column(Kind.RATE);
        return rate == null ? null : rate.unit();
    }

    private boolean isUsed(int index) {
        for (Column column : columns) {
            if (column.index() == index) {
                return true;
            }
        }
        return false;
    }

    private boolean isReadable(Heading heading) {
        if (isText(heading.kind())) {
            return false;
        }
        try {
            ColumnUnits.parse(heading.unit(), heading.kind(), rateUnit());
            return true;
        } catch (UnitException e) {
            return false;
        }
    }

    private static boolean isText(Kind kind) {
        return kind == Kind.LABEL || kind == Kind.BLOCK || kind == Kind.EXCLUDED;
    }

    private String heading(int index) {
        return header.cells().get(index);
    }
}
