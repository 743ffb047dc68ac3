package org.saddlebook.reaction.series.internal;

import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.units.api.Converter;
import org.saddlebook.units.api.DecimalSign;
import org.saddlebook.units.api.Numerals;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/**
 * Reads a table of ratios: a head line with {@code T (degC)} and one of {@code ratio}, {@code er}, {@code ee (%)}, {@code
 * KIE}, optionally {@code u(...)} of it; comment lines begin with {@code #} and may state {@code title}, {@code numerator}
 * and {@code denominator}. Separated by commas, semicolons or tabs; numbers with a decimal point, with semicolons or tabs
 * also with a comma.
 */
final class RatioReader {
    private final String file;
    private final List<String> lines;
    private final List<Problem> problems = new ArrayList<>();
    private String title = "";
    private String numerator = "";
    private String denominator = "";

    private RatioReader(String file, List<String> lines) {
        this.file = file;
        this.lines = lines;
    }

    /** Whether these bytes begin like a table of ratios. */
    static boolean recognises(byte[] bytes) {
        int length = Math.min(bytes.length, 1 << 16);
        for (String line : new String(bytes, 0, length, StandardCharsets.UTF_8).split("\\R", -1)) {
            String text = line.strip();
            if (text.isEmpty() || text.startsWith("#") || text.startsWith("\ufeff#")) {
                continue;
            }
            for (String head : cells(text, separator(text))) {
                if (RatioTable.Kind.of(name(head)).isPresent()) {
                    return true;
                }
            }
            return false;
        }
        return false;
    }

    /**
     * Reads.
     *
     * @param file name for messages
     * @throws InputException with every problem found
     */
    static RatioTable read(String file, byte[] bytes) throws InputException {
        String text;
        try {
            text = StandardCharsets.UTF_8
                    .newDecoder()
                    .decode(ByteBuffer.wrap(bytes))
                    .toString();
        } catch (CharacterCodingException e) {
            throw new InputException(new Problem(
                    "wrong-encoding",
                    Place.of(file),
                    "bytes that are not UTF-8",
                    "text in UTF-8",
                    "Save the table as UTF-8."));
        }
        String plain = text.startsWith("\ufeff") ? text.substring(1) : text;
        return new RatioReader(file, List.of(plain.split("\\R", -1))).read();
    }

    private RatioTable read() throws InputException {
        int at = 0;
        while (at < lines.size()
                && (lines.get(at).isBlank() || lines.get(at).strip().startsWith("#"))) {
            comment(lines.get(at).strip());
            at++;
        }
        if (at == lines.size()) {
            throw new InputException(new Problem(
                    "no-table", Place.of(file), "no line with column heads", "a table", "Write the head line first."));
        }
        char separator = separator(lines.get(at));
        Columns columns = columns(cells(lines.get(at), separator), at + 1);
        List<RatioTable.Point> points = new ArrayList<>();
        for (int i = at + 1; i < lines.size(); i++) {
            String line = lines.get(i).strip();
            if (line.startsWith("#")) {
                comment(line);
            } else if (!line.isEmpty()) {
                point(cells(lines.get(i), separator), columns, separator, i + 1).ifPresent(points::add);
            }
        }
        if (!problems.isEmpty()) {
            throw new InputException(problems);
        }
        if (points.isEmpty()) {
            throw new InputException(new Problem(
                    "no-rows",
                    Place.of(file, at + 1),
                    "a head line and no rows",
                    "one row or more",
                    "Add the measured ratios below the head line."));
        }
        return new RatioTable(title, columns.kind(), numerator, denominator, points);
    }

    /** Which column is what; −1 for none. */
    private record Columns(
            int count,
            int temperature,
            Unit unit,
            int ratio,
            RatioTable.Kind kind,
            double factor,
            int uncertainty,
            double uncertaintyFactor,
            List<String> heads) {}

    private Columns columns(List<String> heads, int line) throws InputException {
        int temperature = -1;
        int ratio = -1;
        int uncertainty = -1;
        Unit unit = Unit.KELVIN;
        RatioTable.Kind kind = RatioTable.Kind.RATIO;
        double factor = 1;
        double uncertaintyFactor = 1;
        for (int i = 0; i < heads.size(); i++) {
            String head = heads.get(i);
            String name = name(head);
            String unitText = unit(head);
            Optional<RatioTable.Kind> found = RatioTable.Kind.of(name);
            if (name.equalsIgnoreCase("T") || name.equalsIgnoreCase("temperature")) {
                once(temperature, head, line);
                temperature = i;
                unit = temperatureUnit(unitText, head, line);
            } else if (found.isPresent()) {
                once(ratio, head, line);
                ratio = i;
                kind = found.get();
                factor = percent(unitText, head, line);
            } else if (name.toLowerCase(Locale.ROOT).startsWith("u(") || name.equalsIgnoreCase("u")) {
                once(uncertainty, head, line);
                uncertainty = i;
                uncertaintyFactor = percent(unitText, head, line);
            } else {
                problems.add(new Problem(
                        "unknown-column",
                        Place.of(file, line, head),
                        "\"" + head + "\"",
                        "T with its unit, one of ratio, er, ee, KIE, and u(...) of it",
                        "Rename or remove the column."));
            }
        }
        if (temperature < 0) {
            problems.add(new Problem(
                    "missing-column",
                    Place.of(file, line),
                    "no temperature column",
                    "a column such as T (degC)",
                    "Add the temperatures with their unit."));
        }
        if (ratio < 0) {
            problems.add(new Problem(
                    "missing-column",
                    Place.of(file, line),
                    "no column of ratios",
                    "a column ratio, er, ee or KIE",
                    "Name the column of ratios so."));
        }
        if (!problems.isEmpty()) {
            throw new InputException(problems);
        }
        return new Columns(heads.size(), temperature, unit, ratio, kind, factor, uncertainty, uncertaintyFactor, heads);
    }

    private void once(int known, String head, int line) {
        if (known >= 0) {
            problems.add(new Problem(
                    "duplicate-header",
                    Place.of(file, line, head),
                    "a second column of this kind",
                    "each once",
                    "Remove one of the two columns."));
        }
    }

    private Unit temperatureUnit(String text, String head, int line) {
        if (text.isEmpty()) {
            problems.add(new Problem(
                    "missing-unit",
                    Place.of(file, line, head),
                    "\"" + head + "\" without a unit",
                    "K, degC or degF in brackets",
                    "Write for example T (degC)."));
            return Unit.KELVIN;
        }
        try {
            return Units.temperature(text);
        } catch (UnitException e) {
            problems.add(e.at(Place.of(file, line, head)));
            return Unit.KELVIN;
        }
    }

    private double percent(String text, String head, int line) {
        if (text.isEmpty() || text.equals("1")) {
            return 1;
        }
        if (text.equals("%")) {
            return 0.01;
        }
        problems.add(new Problem(
                "wrong-unit",
                Place.of(file, line, head),
                "the unit \"" + text + "\"",
                "none, or %",
                "A ratio has no unit; an excess may be in %."));
        return 1;
    }

    private Optional<RatioTable.Point> point(List<String> cells, Columns columns, char separator, int line) {
        if (cells.size() != columns.count()) {
            problems.add(new Problem(
                    "ragged-row",
                    Place.of(file, line),
                    cells.size() + (cells.size() == 1 ? " cell" : " cells"),
                    columns.count() + " cells, as in the head line",
                    "Complete the row; a decimal comma needs semicolons or tabs between cells."));
            return Optional.empty();
        }
        int before = problems.size();
        double temperature = number(cells.get(columns.temperature()), columns, columns.temperature(), separator, line);
        double ratio = ratio(cells.get(columns.ratio()), columns, separator, line);
        double uncertainty = 0;
        if (columns.uncertainty() >= 0 && !cells.get(columns.uncertainty()).isBlank()) {
            uncertainty = columns.uncertaintyFactor()
                    * number(cells.get(columns.uncertainty()), columns, columns.uncertainty(), separator, line);
            if (problems.size() == before && !(uncertainty > 0)) {
                wrong(columns, columns.uncertainty(), line, cells, "a standard uncertainty above zero");
            }
        }
        if (problems.size() > before) {
            return Optional.empty();
        }
        double kelvin = Converter.of(columns.unit()).toSi(Numerals.shortest(temperature));
        if (!(kelvin > 0)) {
            wrong(columns, columns.temperature(), line, cells, "a temperature above 0 K");
            return Optional.empty();
        }
        return logarithm(kelvin, ratio, uncertainty, columns, line, cells);
    }

    private Optional<RatioTable.Point> logarithm(
            double kelvin, double ratio, double uncertainty, Columns columns, int line, List<String> cells) {
        if (columns.kind() == RatioTable.Kind.ENANTIOMERIC_EXCESS) {
            double excess = ratio * columns.factor();
            if (!(Math.abs(excess) < 1)) {
                wrong(
                        columns,
                        columns.ratio(),
                        line,
                        cells,
                        columns.factor() == 1
                                ? "an excess between −1 and 1, as a fraction, or ee (%) in the head"
                                : "an excess between −100 and 100 %");
                return Optional.empty();
            }
            // d ln((1+e)/(1-e))/de = 2/(1-e²)
            return Optional.of(new RatioTable.Point(
                    kelvin,
                    StrictMath.log1p(excess) - StrictMath.log1p(-excess),
                    2 * uncertainty / (1 - excess * excess),
                    line));
        }
        if (!(ratio > 0)) {
            wrong(columns, columns.ratio(), line, cells, "a ratio above zero");
            return Optional.empty();
        }
        return Optional.of(new RatioTable.Point(
                kelvin, StrictMath.log(ratio * columns.factor()), uncertainty / (ratio * columns.factor()), line));
    }

    /** A number, or {@code 97:3}. */
    private double ratio(String text, Columns columns, char separator, int line) {
        int colon = text.indexOf(':');
        if (colon < 0 || columns.kind() == RatioTable.Kind.ENANTIOMERIC_EXCESS) {
            return number(text, columns, columns.ratio(), separator, line);
        }
        double above = number(text.substring(0, colon), columns, columns.ratio(), separator, line);
        double below = number(text.substring(colon + 1), columns, columns.ratio(), separator, line);
        return above / below;
    }

    private double number(String text, Columns columns, int column, char separator, int line) {
        try {
            DecimalSign sign = separator != ',' && text.indexOf(',') >= 0 ? DecimalSign.COMMA : DecimalSign.POINT;
            double value = Numerals.parse(text.strip(), sign).doubleValue();
            if (Double.isFinite(value)) {
                return value;
            }
        } catch (UnitException e) {
            // named below, like a number beyond the range
        }
        problems.add(new Problem(
                "not-a-number",
                Place.of(file, line, columns.heads().get(column)),
                "\"" + text.strip() + "\"",
                "a number",
                "Correct the cell, or remove the row."));
        return Double.NaN;
    }

    private void wrong(Columns columns, int column, int line, List<String> cells, String expected) {
        problems.add(new Problem(
                "wrong-value",
                Place.of(file, line, columns.heads().get(column)),
                "\"" + cells.get(column).strip() + "\"",
                expected,
                "Correct the cell, or remove the row."));
    }

    private void comment(String line) {
        String text = line.startsWith("#") ? line.substring(1).strip() : "";
        int colon = text.indexOf(':');
        if (colon < 0) {
            return;
        }
        String value = text.substring(colon + 1).strip();
        switch (text.substring(0, colon).strip().toLowerCase(Locale.ROOT)) {
            case "title" -> title = value;
            case "numerator" -> numerator = value;
            case "denominator" -> denominator = value;
            default -> {
                // a remark
            }
        }
    }

    private static String name(String head) {
        int bracket = unitStart(head);
        return (bracket < 0 ? head : head.substring(0, bracket)).strip();
    }

    private static String unit(String head) {
        int bracket = unitStart(head);
        if (bracket < 0) {
            return "";
        }
        String rest = head.substring(bracket + 1).strip();
        return rest.endsWith(")") || rest.endsWith("]")
                ? rest.substring(0, rest.length() - 1).strip()
                : rest;
    }

    /** The bracket of a unit, not that of {@code u(ratio)}. */
    private static int unitStart(String head) {
        String text = head.strip();
        int from = text.toLowerCase(Locale.ROOT).startsWith("u(") ? text.indexOf(')') + 1 : 0;
        int round = text.indexOf('(', from);
        int square = text.indexOf('[', from);
        int start = round < 0 ? square : square < 0 ? round : Math.min(round, square);
        return start < 0 ? -1 : head.indexOf(text) + start;
    }

    private static char separator(String line) {
        if (line.indexOf(';') >= 0) {
            return ';';
        }
        return line.indexOf('\t') >= 0 ? '\t' : ',';
    }

    private static List<String> cells(String line, char separator) {
        List<String> cells = new ArrayList<>();
        int start = 0;
        for (int i = 0; i <= line.length(); i++) {
            if (i == line.length() || line.charAt(i) == separator) {
                cells.add(line.substring(start, i).strip());
                start = i + 1;
            }
        }
        return cells;
    }
}
