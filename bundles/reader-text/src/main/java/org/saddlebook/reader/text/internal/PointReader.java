package org.saddlebook.reader.text.internal;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.model.Conditions;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;
import org.saddlebook.reader.text.internal.Heading.Kind;
import org.saddlebook.units.api.DecimalSign;
import org.saddlebook.units.api.Numerals;
import org.saddlebook.units.api.UnitException;

/** Cells to rate points. Every cell is looked at, also when an earlier one is wrong. */
final class PointReader {
    private static final int ROWS_BETWEEN_CHECKS = 500;
    private static final BigDecimal HUNDRED = BigDecimal.valueOf(100);
    private static final List<String> YES_OR_NO = List.of("yes", "no", "true", "false", "0", "1", "x", "y", "n");

    private final ColumnPlan plan;
    private final DecimalSign sign;
    private final Problems problems;

    PointReader(ColumnPlan plan, DecimalSign sign, Problems problems) {
        this.plan = plan;
        this.sign = sign;
        this.problems = problems;
    }

    List<RatePoint> read(List<Row> rows, Task task) throws Cancelled {
        List<RatePoint> points = new ArrayList<>(rows.size());
        for (int i = 0; i < rows.size(); i++) {
            if (i % ROWS_BETWEEN_CHECKS == 0) {
                task.check();
            }
            RatePoint point = point(rows.get(i));
            if (point != null) {
                points.add(point);
            }
        }
        return points;
    }

    private RatePoint point(Row row) {
        Column temperature = plan.column(Kind.TEMPERATURE);
        Column rate = plan.column(Kind.RATE);
        Optional<String> excluded = excluded(row);
        BigDecimal temperatureNumber = number(row, temperature, false);
        BigDecimal rateNumber = number(row, rate, false);
        double kelvin = kelvin(row, temperature, temperatureNumber);
        double si = rate(row, rate, rateNumber);
        double kelvinUncertainty = uncertainty(row, plan.column(Kind.TEMPERATURE_UNCERTAINTY), null, excluded);
        double rateUncertainty = uncertainty(row, plan.column(Kind.RATE_UNCERTAINTY), rateNumber, excluded);
        double fromRelative = uncertainty(row, plan.column(Kind.RELATIVE_RATE_UNCERTAINTY), rateNumber, excluded);
        if (!(kelvin > 0) || !(si > 0)) {
            return null;
        }
        Column label = plan.column(Kind.LABEL);
        Column block = plan.column(Kind.BLOCK);
        return new RatePoint(
                        kelvin,
                        si,
                        optional(kelvinUncertainty),
                        optional(rateUncertainty > 0 ? rateUncertainty : fromRelative),
                        label == null ? "" : row.cell(label),
                        excluded,
                        new RatePoint.AsRead(OptionalInt.of(row.line()), row.cell(temperature), row.cell(rate)))
                .withConditions(conditions(row, excluded))
                .withBlock(block == null ? "" : row.cell(block));
    }

    /** The number in a cell; null when there is none, which is then among the problems unless it may be absent. */
    private BigDecimal number(Row row, Column column, boolean mayBeAbsent) {
        if (column == null || (mayBeAbsent && row.cell(column).isEmpty())) {
            return null;
        }
        try {
            return Numerals.parse(row.cell(column), sign);
        } catch (UnitException e) {
            problems.add(e, problems.place(row.line(), column.heading()));
            return null;
        }
    }

    private double kelvin(Row row, Column column, BigDecimal number) {
        if (number == null || column.converter() == null) {
            return Double.NaN;
        }
        double kelvin = column.converter().toSi(number);
        if (!(kelvin > 0) || Double.isInfinite(kelvin)) {
            problems.add(
                    "below-absolute-zero",
                    problems.place(row.line(), column.heading()),
                    Problems.quoted(row.cell(column)) + " " + column.unit().code(),
                    "a temperature above 0 K",
                    "check the value and the unit in the header");
            return Double.NaN;
        }
        return kelvin;
    }

    private double rate(Row row, Column column, BigDecimal number) {
        if (number == null) {
            return Double.NaN;
        }
        if (number.signum() <= 0) {
            problems.add(
                    "not-positive",
                    problems.place(row.line(), column.heading()),
                    Problems.quoted(row.cell(column)),
                    "a rate constant above zero",
                    "remove the row, or exclude it with a reason and a positive value: its logarithm is fitted");
            return Double.NaN;
        }
        return column.converter() == null
                ? Double.NaN
                : inRange(row, column, column.converter().toSi(number));
    }

    /**
     * A standard uncertainty in SI; NaN when there is none or it is wrong.
     *
     * @param rate the rate constant in its own unit, for uncertainties relative to it
     */
    private double uncertainty(Row row, Column column, BigDecimal rate, Optional<String> excluded) {
        BigDecimal number = number(row, column, excluded.isPresent());
        if (number == null) {
            return Double.NaN;
        }
        if (number.signum() <= 0) {
            problems.add(
                    "not-positive",
                    problems.place(row.line(), column.heading()),
                    Problems.quoted(row.cell(column)),
                    "a standard uncertainty above zero",
                    "state the uncertainty, or remove the whole column when it is not known");
            return Double.NaN;
        }
        if (column.converter() == null) {
            return Double.NaN;
        }
        boolean relative = column.kind() == Kind.RELATIVE_RATE_UNCERTAINTY
                || (column.kind() == Kind.RATE_UNCERTAINTY
                        && column.unit().code().equals("%"));
        if (!relative) {
            return inRange(row, column, column.converter().differenceToSi(number));
        }
        Column rates = plan.column(Kind.RATE);
        if (rate == null || rate.signum() <= 0 || rates.converter() == null) {
            return Double.NaN;
        }
        BigDecimal fraction = column.unit().code().equals("%")
                ? number.divide(HUNDRED)
                : number.multiply(new BigDecimal(column.unit().factor()));
        return inRange(row, column, rates.converter().toSi(rate.multiply(fraction)));
    }

    /** What else the point was measured at; an excluded row may leave it open. */
    private Conditions conditions(Row row, Optional<String> excluded) {
        Conditions conditions = Conditions.NONE;
        double thirdBody = condition(row, plan.column(Kind.THIRD_BODY), excluded);
        if (thirdBody > 0) {
            conditions = conditions.with(Conditions.THIRD_BODY, thirdBody);
        }
        double pressure = condition(row, plan.column(Kind.PRESSURE), excluded);
        return pressure > 0 ? conditions.with(Conditions.PRESSURE, pressure) : conditions;
    }

    private double condition(Row row, Column column, Optional<String> excluded) {
        BigDecimal number = number(row, column, excluded.isPresent());
        if (number == null || column.converter() == null) {
            return Double.NaN;
        }
        if (number.signum() <= 0) {
            problems.add(
                    "not-positive",
                    problems.place(row.line(), column.heading()),
                    Problems.quoted(row.cell(column)),
                    "a " + column.kind().words() + " above zero",
                    "correct the value, or exclude the row with a reason");
            return Double.NaN;
        }
        return inRange(row, column, column.converter().toSi(number));
    }

    private double inRange(Row row, Column column, double si) {
        if (si > 0 && !Double.isInfinite(si)) {
            return si;
        }
        problems.add(
                "number-out-of-range",
                problems.place(row.line(), column.heading()),
                Problems.quoted(row.cell(column)) + " " + column.unit().code(),
                "a number between 5e-324 and 1.8e308 in SI units",
                "check the exponent and the unit in the header");
        return Double.NaN;
    }

    private Optional<String> excluded(Row row) {
        Column column = plan.column(Kind.EXCLUDED);
        String reason = column == null ? "" : row.cell(column);
        if (YES_OR_NO.contains(reason.toLowerCase(Locale.ROOT))) {
            problems.add(
                    "exclusion-without-reason",
                    problems.place(row.line(), column.heading()),
                    Problems.quoted(reason),
                    "the reason why the row is excluded, or nothing when it is used",
                    "write the reason in words, or leave the cell empty");
        }
        return reason.isEmpty() ? Optional.empty() : Optional.of(reason);
    }

    private static OptionalDouble optional(double value) {
        return value > 0 ? OptionalDouble.of(value) : OptionalDouble.empty();
    }
}
