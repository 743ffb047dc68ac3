package org.saddlebook.reader.text.internal;

import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.reader.text.internal.Heading.Kind;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/** Finds a column's unit: in the heading, in a row of units below it, or in the reading rule. */
final class ColumnUnits {
    private final Row header;
    private final Row units;
    private final Rule rule;
    private final Problems problems;

    /**
     * For one table.
     *
     * @param units row of units below the header, or null
     */
    ColumnUnits(Row header, Row units, Rule rule, Problems problems) {
        this.header = header;
        this.units = units;
        this.rule = rule;
        this.problems = problems;
    }

    /**
     * The unit of a column; null when it is missing or wrong, which is then among the problems.
     *
     * @param rate unit of the rate constant, or null when that is not known
     */
    Unit unit(int index, Heading heading, Unit rate) {
        Kind kind = heading.kind();
        String below = units == null || index >= units.cells().size()
                ? ""
                : unwrapped(units.cells().get(index));
        String text = heading.unit();
        int line = header.line();
        if (text != null && !below.isEmpty() && !text.equals(below)) {
            problems.add(
                    "two-units",
                    problems.place(units.line(), name(index)),
                    Problems.quoted(below) + " below " + Problems.quoted(name(index)),
                    "one unit for the column",
                    "state the unit in the header or in the row of units, not in both");
            return null;
        }
        if (text == null && !below.isEmpty()) {
            text = below;
            line = units.line();
        }
        boolean fromRule = text == null && rule.unit(kind) != null;
        if (fromRule) {
            text = rule.unit(kind);
        }
        if (text == null && kind == Kind.RELATIVE_RATE_UNCERTAINTY) {
            // u(k)/k is a pure number by its name.
            return Unit.ONE;
        }
        if (text == null || text.isEmpty()) {
            refuseMissingUnit(index, kind);
            return null;
        }
        try {
            return parse(text, kind, rate);
        } catch (UnitException e) {
            problems.add(e, fromRule ? Rule.place("unit." + kind.key()) : problems.place(line, name(index)));
            return null;
        }
    }

    /**
     * Whether a heading that begins like a pressure is one: p is also the beginning of other things, and a column of those
     * is not used, as before.
     */
    boolean isPressure(int index, Heading heading) {
        String below = units == null || index >= units.cells().size()
                ? ""
                : unwrapped(units.cells().get(index));
        String text = heading.unit() == null ? below : heading.unit();
        try {
            return !text.isEmpty() && parse(text, Kind.PRESSURE, null) != null;
        } catch (UnitException e) {
            return false;
        }
    }

    /** Reads a unit of what a column of this kind holds. */
    static Unit parse(String text, Kind kind, Unit rate) throws UnitException {
        switch (kind) {
            case TEMPERATURE, TEMPERATURE_UNCERTAINTY -> {
                return Units.temperature(text);
            }
            case THIRD_BODY -> {
                return Units.parse(text, Dimension.CONCENTRATION, "molecule cm-3 or mol/L");
            }
            case PRESSURE -> {
                return Units.parse(text, Dimension.PRESSURE, "bar");
            }
            case RELATIVE_RATE_UNCERTAINTY -> {
                return Units.parse(text, Dimension.NONE, "1 or %");
            }
            case RATE_UNCERTAINTY -> {
                return rateUncertainty(text, rate);
            }
            default -> {
                return Units.rateConstant(text);
            }
        }
    }

    /** A percentage, or a unit of the dimension of k. */
    private static Unit rateUncertainty(String text, Unit rate) throws UnitException {
        Unit unit = Units.parse(text);
        if (unit.code().equals("%") || rate == null) {
            return unit;
        }
        if (unit.dimension().equals(Dimension.NONE)) {
            throw new UnitException(
                    "wrong-dimension",
                    Problems.quoted(text) + " for u(k)",
                    "the unit of the rate constant, or %",
                    "name the column u(k)/k when it holds u(k) divided by k");
        }
        return Units.parse(text, rate.dimension(), rate.code() + " or in %");
    }

    private void refuseMissingUnit(int index, Kind kind) {
        String example = switch (kind) {
            case TEMPERATURE -> "\"T (K)\" or \"T (degC)\"";
            case TEMPERATURE_UNCERTAINTY -> "\"u(T) (K)\"";
            case RATE -> "\"k (1/s)\" or \"k (L mol-1 s-1)\"";
            case THIRD_BODY -> "\"[M] (molecule cm-3)\" or \"[M] (mol/L)\"";
            case PRESSURE -> "\"p (bar)\"";
            default -> "\"u(k) (%)\" or \"u(k) (1/s)\"";
        };
        problems.add(
                "missing-unit",
                problems.place(header.line(), name(index)),
                Problems.quoted(name(index)) + ", the " + kind.words() + " without a unit",
                "the unit in the header",
                "write the unit after the name, for example " + example);
    }

    private String name(int index) {
        return header.cells().get(index);
    }

    private static String unwrapped(String cell) {
        boolean wrapped = (cell.startsWith("(") && cell.endsWith(")")) || (cell.startsWith("[") && cell.endsWith("]"));
        return wrapped && cell.indexOf(cell.charAt(0), 1) < 0
                ? cell.substring(1, cell.length() - 1).strip()
                : cell;
    }
}
