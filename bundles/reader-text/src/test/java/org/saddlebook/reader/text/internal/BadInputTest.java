package org.saddlebook.reader.text.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.saddlebook.reader.text.internal.Reading.assertProblem;
import static org.saddlebook.reader.text.internal.Reading.problems;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.saddlebook.api.problem.Problem;

/** Every kind of bad input, with code, file, line, column, found, expected and remedy. */
class BadInputTest {
    private static final String KELVIN_PER_SECOND = "T (K);k (1/s)\n";

    @Test
    void missingUnitOfTheTemperature() {
        assertProblem(
                "T,k (1/s)\n300,1\n",
                "missing-unit",
                1,
                "T",
                "\"T\", the temperature without a unit",
                "the unit in the header",
                "write the unit after the name, for example \"T (K)\" or \"T (degC)\"");
    }

    @Test
    void missingUnitOfTheRateConstant() {
        assertProblem(
                "# a remark\n\nT (K),Rate Constant\n300,1\n",
                "missing-unit",
                3,
                "Rate Constant",
                "\"Rate Constant\", the rate constant without a unit",
                "the unit in the header",
                "write the unit after the name, for example \"k (1/s)\" or \"k (L mol-1 s-1)\"");
    }

    @ParameterizedTest
    @CsvSource({"u(k), u(k)", "u(k) (), u(k) ()"})
    void missingUnitOfAnUncertainty(String heading, String column) {
        assertProblem(
                "T (K);k (1/s);" + heading + "\n300;1;0.1\n",
                "missing-unit",
                1,
                column,
                "\"" + heading + "\", the standard uncertainty of the rate constant without a unit",
                "the unit in the header",
                "write the unit after the name, for example \"u(k) (%)\" or \"u(k) (1/s)\"");
    }

    @Test
    void unknownUnitsAreListedWithTheirNeighbours() {
        List<Problem> problems = problems("T (degX),k (1/S)\n300,1\n");
        assertEquals(2, problems.size());
        assertProblem(
                problems.subList(0, 1),
                "unknown-unit",
                OptionalInt.of(1),
                "T (degX)",
                "\"degX\"",
                "a unit symbol",
                "did you mean degC or degF? Upper and lower case differ");
        assertProblem(
                problems.subList(1, 2),
                "unknown-unit",
                OptionalInt.of(1),
                "k (1/S)",
                "\"S\" in \"1/S\"",
                "a unit symbol",
                "did you mean s? Upper and lower case differ");
    }

    @Test
    void aWrongUnitInARowOfUnitsIsPlacedThere() {
        assertProblem(
                "T;k\n°C;1/mn\n30;1\n",
                "unknown-unit",
                2,
                "k",
                "\"mn\" in \"1/mn\"",
                "a unit symbol",
                "did you mean min or ms or mm or mL? Upper and lower case differ");
    }

    @Test
    void unitsInTheHeaderAndBelowMustAgree() {
        assertProblem(
                "T (K);k\ndegC;1/s\n30;1\n",
                "two-units",
                2,
                "T (K)",
                "\"degC\" below \"T (K)\"",
                "one unit for the column",
                "state the unit in the header or in the row of units, not in both");
    }

    @Test
    void aUnitOfSomethingElseIsRefused() {
        assertProblem(
                "t / s;k (1/s)\n25;1\n",
                "wrong-dimension",
                1,
                "t / s",
                "\"s\", a unit of time",
                "a unit of temperature",
                "state it in K, °C or °F");
        assertProblem(
                "T (K);k (1/s);u(k) (L/(mol.s))\n300;2;0.1\n",
                "wrong-dimension",
                1,
                "u(k) (L/(mol.s))",
                "\"L/(mol.s)\", a unit of rate constant of order 2",
                "a unit of rate constant of order 1",
                "state it in 1/s or in %");
    }

    @Test
    void aPureNumberIsARatioOnlyWhereTheHeadingSaysSo() {
        assertProblem(
                "T (K);k (1/s);u(k) (1)\n300;2;0.1\n",
                "wrong-dimension",
                1,
                "u(k) (1)",
                "\"1\" for u(k)",
                "the unit of the rate constant, or %",
                "name the column u(k)/k when it holds u(k) divided by k");
    }

    @Test
    void ambiguousAndPressureUnitsAreRefused() {
        assertProblem(
                "T (K);k (L/mol s)\n300;1\n",
                "ambiguous-unit",
                1,
                "k (L/mol s)",
                "\"L/mol s\", a product after a division",
                "a unit that can be read in one way only",
                "put the denominator in parentheses, as in \"J/(mol.K)\", or write exponents, as in \"J mol-1 K-1\"");
        assertProblem(
                "T (K);k (1/atm/s)\n300;1\n",
                "pressure-rate-constant",
                1,
                "k (1/atm/s)",
                "\"1/atm/s\", a rate constant per pressure",
                "a rate constant per concentration, for example \"L/(mol.s)\" or \"cm3/({molecule}.s)\"",
                "multiply each value by (R T)^(order - 1) at its own temperature and state the result in concentration"
                        + " units");
    }

    @Test
    void decimalCommasBetweenCommasAreOneProblem() {
        assertProblem(
                "T (K),k (1/s)\n300,5,1,5\n310,5,2,5\n320,5,3,5\n",
                "decimal-comma",
                2,
                null,
                "\"300,5,1,5\": 4 cells under 2 column names",
                "commas between columns only, or decimal commas only",
                "separate the columns by semicolons or tabs, or write numbers with a decimal point");
    }

    @Test
    void mixedDecimalSignsAreRefusedWhereTheyAreFewer() {
        assertProblem(
                KELVIN_PER_SECOND + "300,5;1,5\n310;1.5\n320,5;2,5\n",
                "decimal-sign",
                3,
                "k (1/s)",
                "\"1.5\"",
                "a number with a decimal comma, as the other numbers here have",
                "use one decimal sign throughout, and no mark between thousands");
        assertProblem(
                KELVIN_PER_SECOND + "300.5;1.5\n310;1,5\n320.5;2.5\n",
                "decimal-sign",
                3,
                "k (1/s)",
                "\"1,5\"",
                "a number with a decimal point",
                "write a point for the decimal sign, and no mark between thousands");
    }

    @ParameterizedTest
    @ValueSource(strings = {"1 234.5", "1,234.5", "1'234", "1.234,5", "1.234.567"})
    void thousandsSeparatorsAreRefused(String number) {
        assertProblem(
                KELVIN_PER_SECOND + "300;" + number + "\n",
                "thousands-separator",
                2,
                "k (1/s)",
                "\"" + number + "\"",
                "a number without marks between thousands",
                "remove the thousands separators, for example 1234.5 or 1.2345e3");
    }

    @ParameterizedTest
    @ValueSource(strings = {"abc", "1d", "0x1p3", "1.5 s", "<0.1", "n/a", "--", "1e"})
    void nonNumericCells(String cell) {
        assertProblem(
                KELVIN_PER_SECOND + "300;1\n310;" + cell + "\n",
                "not-a-number",
                3,
                "k (1/s)",
                "\"" + cell + "\"",
                "a number such as 1.2e-5",
                "write a number");
    }

    @ParameterizedTest
    @ValueSource(strings = {"NaN", "nan", "inf", "-Infinity", "∞", "INF"})
    void wordsForNoNumber(String cell) {
        assertProblem(
                KELVIN_PER_SECOND + "300;" + cell + "\n",
                "not-finite",
                2,
                "k (1/s)",
                "\"" + cell + "\"",
                "a finite number",
                "remove the row, or exclude it with a reason and a number that was measured");
    }

    @ParameterizedTest
    @ValueSource(strings = {"1e400", "1e-400", "9e99999999999"})
    void numbersBeyondTheRangeOfDouble(String cell) {
        assertProblem(
                KELVIN_PER_SECOND + "300;" + cell + "\n",
                "number-out-of-range",
                2,
                "k (1/s)",
                "\"" + cell + "\"",
                "a number between 5e-324 and 1.8e308 in magnitude, or 0",
                "check the exponent, or state the values in a larger or smaller unit");
    }

    @Test
    void valuesThatVanishInSiAreRefused() {
        assertProblem(
                "T (K);k (cm3/({molecule}.h))\n300;1e300\n",
                "number-out-of-range",
                2,
                "k (cm3/({molecule}.h))",
                "\"1e300\" cm3/({molecule}.h)",
                "a number between 5e-324 and 1.8e308 in SI units",
                "check the exponent and the unit in the header");
    }

    @ParameterizedTest
    @ValueSource(strings = {"0", "-1", "0.0", "-2e-5", "−3"})
    void negativeOrZeroRateConstants(String cell) {
        assertProblem(
                KELVIN_PER_SECOND + "300;" + cell + "\n",
                "not-positive",
                2,
                "k (1/s)",
                "\"" + cell + "\"",
                "a rate constant above zero",
                "remove the row, or exclude it with a reason and a positive value: its logarithm is fitted");
    }

    @ParameterizedTest
    @CsvSource({"K, 0, K", "K, -5, K", "degC, -273.15, Cel", "°C, -300, Cel", "degF, -459.67, [degF]"})
    void temperaturesAtOrBelowAbsoluteZero(String unit, String cell, String code) {
        assertProblem(
                "T (" + unit + ");k (1/s)\n" + cell + ";1\n",
                "below-absolute-zero",
                2,
                "T (" + unit + ")",
                "\"" + cell + "\" " + code,
                "a temperature above 0 K",
                "check the value and the unit in the header");
    }

    @ParameterizedTest
    @CsvSource({"u(k) (%), 0", "u(k) (1/s), -1", "u(k)/k, 0.0", "u(T) (K), 0"})
    void negativeOrZeroUncertainties(String heading, String cell) {
        assertProblem(
                "T (K);k (1/s);" + heading + "\n300;1;" + cell + "\n",
                "not-positive",
                2,
                heading,
                "\"" + cell + "\"",
                "a standard uncertainty above zero",
                "state the uncertainty, or remove the whole column when it is not known");
    }

    @Test
    void missingCells() {
        List<Problem> problems = problems("T (K);k (1/s);u(k) (%)\n;1;2\n310;;2\n320;2;\n330;3;2\n");
        String[] columns = {"T (K)", "k (1/s)", "u(k) (%)"};
        assertEquals(3, problems.size());
        for (int i = 0; i < 3; i++) {
            assertProblem(
                    problems.subList(i, i + 1),
                    "missing-value",
                    OptionalInt.of(2 + i),
                    columns[i],
                    "nothing",
                    "a number",
                    "write the number, or remove the row it belongs to");
        }
    }

    @Test
    void duplicateHeader() {
        assertProblem(
                "T (K);k (1/s);t (k)\n300;1;300\n",
                "duplicate-column",
                1,
                "t (k)",
                "the column name \"t (k)\" twice",
                "each column name once",
                "rename or remove one of the two columns");
    }

    @Test
    void twoColumnsForOneThing() {
        assertProblem(
                "T (K);T (degC);k (1/s)\n300;26.85;1\n",
                "two-temperature-columns",
                1,
                "T (degC)",
                "\"T (K)\" and \"T (degC)\"",
                "one column for the temperature",
                "remove or rename the columns that are not to be used");
        assertProblem(
                "T (K);k1 (1/s);k2 (L mol-1 s-1)\n300;1;1\n",
                "two-rate-columns",
                1,
                "k2 (L mol-1 s-1)",
                "\"k1 (1/s)\" and \"k2 (L mol-1 s-1)\"",
                "one column for the rate constant",
                "remove or rename the columns that are not to be used");
        assertProblem(
                "T (K);k (1/s);u(k) (%);u(k)/k\n300;1;1;0.01\n",
                "two-columns",
                1,
                "u(k)/k",
                "\"u(k) (%)\" and \"u(k)/k\"",
                "one column for the standard uncertainty of the rate constant",
                "keep the absolute or the relative uncertainty and remove the other");
        assertProblem(
                "T (K);k (1/s);label;run\n300;1;a;b\n",
                "two-columns",
                1,
                "run",
                "\"label\" and \"run\"",
                "one column for the label of the run",
                "remove or rename the columns that are not to be used");
    }

    @Test
    void raggedRows() {
        assertProblem(
                KELVIN_PER_SECOND + "300;1\n310\n",
                "ragged-row",
                3,
                null,
                "\"310\": 1 cell",
                "2 cells, one for each column name",
                "add what is missing, or an empty cell for it");
        assertProblem(
                KELVIN_PER_SECOND + "300;1;x;y\n310;2\n",
                "ragged-row",
                2,
                null,
                "\"300;1;x;y\": 4 cells",
                "2 cells, one for each column name",
                "remove what is too much, or put a text that contains the separator in double quotes");
        assertProblem(
                "T (K),k (1/s)\n300,1,2\n310,2\n320,3\n",
                "ragged-row",
                2,
                null,
                "\"300,1,2\": 3 cells",
                "2 cells, one for each column name",
                "remove what is too much, or separate the columns by semicolons when these are decimal commas");
    }

    @Test
    void missingColumns() {
        assertProblem(
                "k (1/s);u(k) (1/s)\n1;0.1\n",
                "missing-temperature-column",
                1,
                null,
                "the columns \"k (1/s)\", \"u(k) (1/s)\"",
                "a column for the temperature",
                "name the column with its unit, for example \"T (K)\"");
        assertProblem(
                "T (K);rate\n300;1\n",
                "missing-rate-column",
                1,
                null,
                "the columns \"T (K)\", \"rate\"",
                "a column for the rate constant",
                "name the column with its unit, for example \"k (1/s)\"");
    }

    @ParameterizedTest
    @ValueSource(strings = {"1/T (1/K)", "1/T", "1000/T (1/K)", "10^3/T / K^-1"})
    void reciprocalTemperatures(String heading) {
        assertProblem(
                heading + ";k (1/s)\n0.003;1\n",
                "transformed-column",
                1,
                heading,
                "\"" + heading + "\"",
                "the temperature itself",
                "replace 1/T by T with its unit, for example \"T (K)\"");
    }

    @ParameterizedTest
    @ValueSource(strings = {"ln k", "ln(k)", "ln(k / s^-1)", "log10 k", "log k", "lg k", "ln(k/T)", "lnk (1/s)"})
    void logarithmsOfRateConstants(String heading) {
        assertProblem(
                "T (K);" + heading + "\n300;-1\n",
                "transformed-column",
                1,
                heading,
                "\"" + heading + "\"",
                "the rate constant itself",
                "replace the logarithm by k with its unit, for example \"k (1/s)\"; an uncertainty u(ln k) becomes"
                        + " u(k)/k");
    }

    @ParameterizedTest
    @ValueSource(strings = {"10^5 k (1/s)", "10⁵ k / s⁻¹", "k x 10^5 (1/s)", "k × 10⁵ / s⁻¹", "1e5 k (1/s)"})
    void scaledRateConstants(String heading) {
        assertProblem(
                "T (K);" + heading + "\n300;1\n",
                "scaled-column",
                1,
                heading,
                "\"" + heading + "\"",
                "the rate constant itself",
                "write the power of ten into the values or into the unit, for example \"k / 10^-5 s^-1\"");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "U(k) (1/s)",
                "sd",
                "s(k) (1/s)",
                "k error",
                "k_err",
                "uncertainty of k (1/s)",
                "standard deviation",
                "Δk (1/s)",
                "u(ln k)",
                "±",
                "sigma_k"
            })
    void uncertaintiesOfWhichItIsNotSaidWhich(String heading) {
        assertProblem(
                "T (K);k (1/s);" + heading + "\n300;1;0.1\n",
                "unclear-uncertainty",
                1,
                heading,
                "\"" + heading + "\"",
                "a standard uncertainty named u(k), u(k)/k or u(T)",
                "rename the column when it holds standard uncertainties, divide expanded ones by their coverage factor,"
                        + " or remove the column");
    }

    @ParameterizedTest
    @ValueSource(strings = {"yes", "no", "0", "1", "TRUE", "x"})
    void exclusionsWithoutAReason(String cell) {
        assertProblem(
                "T (K);k (1/s);excluded\n300;1;\n310;2;" + cell + "\n",
                "exclusion-without-reason",
                3,
                "excluded",
                "\"" + cell + "\"",
                "the reason why the row is excluded, or nothing when it is used",
                "write the reason in words, or leave the cell empty");
    }

    @Test
    void headersThatAreNone() {
        assertProblem(
                "300,1\n310,2\n",
                "missing-header",
                1,
                null,
                "\"300,1\", numbers in the first line",
                "a line with column names and units",
                "add a first line such as \"T (K);k (1/s)\"");
        assertProblem(
                "T (K),k (1/s),\n300,1,5\n",
                "unnamed-column",
                1,
                null,
                "no name above column 3, which is not empty",
                "a name for every column",
                "name the column, or remove it");
        assertProblem(
                "# remark\nT (K);k (1/s)\n# remark\n",
                "no-rows",
                2,
                null,
                "a header without rows",
                "at least one row of numbers below the header",
                "add the measured temperatures and rate constants");
    }

    @Test
    void separatorsThatCannotBeTold() {
        assertProblem(
                "T (K)\n300\n",
                "no-separator",
                1,
                null,
                "\"T (K)\"",
                "column names separated by commas, semicolons or tabs",
                "separate the columns by semicolons or tabs, in the header and in every row");
        assertProblem(
                "T (K) k (1/s)\n300 1\n",
                "no-separator",
                1,
                null,
                "\"T (K) k (1/s)\"",
                "column names separated by commas, semicolons or tabs",
                "separate the columns by semicolons or tabs, in the header and in every row");
        assertProblem(
                "T (K),k (1/s);note\n300,1;a\n",
                "ambiguous-separator",
                1,
                null,
                "a header with semicolons and commas",
                "one kind of separator that gives every row as many cells as the header",
                "use one separator throughout, or put names that contain it in double quotes");
    }

    @Test
    void quotesThatDoNotClose() {
        assertProblem(
                "T (K),k (1/s),note\n300,1,\"open\n310,2,closed\n",
                "unclosed-quote",
                2,
                null,
                "\"300,1,\"open\"",
                "double quotes that enclose a whole cell and close on the same line",
                "close the quotes, and write a double quote inside them twice");
    }

    @Test
    void emptyFiles() {
        String expected = "a table with a header and rows";
        String remedy = "add a header such as \"T (K);k (1/s)\" and the measured rows";
        assertProblem(
                problems(""),
                "empty-file",
                OptionalInt.empty(),
                null,
                "an empty file",
                expected,
                "export the table again; nothing was written into this file");
        for (String blank : new String[] {"\n\n", "  \r\n\t\r\n", "\uFEFF", ";;\n,,\n"}) {
            assertProblem(
                    problems(blank), "empty-file", OptionalInt.empty(), null, "blank lines only", expected, remedy);
        }
        assertProblem(
                problems("# a remark\n"),
                "no-table",
                OptionalInt.empty(),
                null,
                "comment lines only",
                expected,
                remedy);
    }

    @Test
    void binaryFiles() {
        String remedy = "save the table as text in UTF-8, with columns separated by commas, semicolons or tabs";
        Object[][] magics = {
            {"PK\u0003\u0004rest", "a ZIP archive or a spreadsheet file"},
            {"%PDF-1.7\n", "a PDF document"},
            {"\u00D0\u00CF\u0011\u00E0", "an old office document"},
            {"\u001F\u008B\b", "a gzip archive"},
            {"\u0089PNG\r\n", "a picture"},
        };
        for (Object[] magic : magics) {
            assertProblem(
                    problems(((String) magic[0]).getBytes(StandardCharsets.ISO_8859_1)),
                    "not-text",
                    OptionalInt.empty(),
                    null,
                    (String) magic[1],
                    "delimited text",
                    remedy);
        }
        assertProblem(
                "T (K);k (1/s)\n300;1\u0000\n",
                "not-text",
                2,
                null,
                "the control character U+0000",
                "delimited text",
                remedy);
        assertProblem(
                "T (K);k (1/s)\r\n300;1\r\n\u0007\r\n",
                "not-text",
                3,
                null,
                "the control character U+0007",
                "delimited text",
                remedy);
    }

    @Test
    void wrongEncodings() {
        String expected = "text in UTF-8, UTF-16 or Windows-1252 (Latin-1)";
        String remedy = "save the file as text in UTF-8";
        byte[] odd = "\uFEFFT (K);k".getBytes(StandardCharsets.UTF_16LE);
        byte[] cut = java.util.Arrays.copyOf(odd, odd.length - 1);
        assertProblem(
                problems(cut),
                "wrong-encoding",
                OptionalInt.empty(),
                null,
                "bytes that are not valid UTF-16LE",
                expected,
                remedy);
        byte[] marked = {(byte) 0xEF, (byte) 0xBB, (byte) 0xBF, 'T', (byte) 0xB0};
        assertProblem(
                problems(marked),
                "wrong-encoding",
                OptionalInt.empty(),
                null,
                "bytes that are not valid UTF-8",
                expected,
                remedy);
        byte[] utf32 = {(byte) 0xFF, (byte) 0xFE, 0, 0, 'T', 0, 0, 0};
        assertProblem(problems(utf32), "wrong-encoding", OptionalInt.empty(), null, "text in UTF-32", expected, remedy);
        byte[] neither = {'T', (byte) 0x81, ';', 'k', '\n'};
        assertProblem(
                problems(neither),
                "wrong-encoding",
                OptionalInt.empty(),
                null,
                "bytes that are neither UTF-8 nor Windows-1252",
                expected,
                remedy);
        assertProblem(
                "T (K);k (1/s)\n300;1\uFFFD\n",
                "wrong-encoding",
                2,
                null,
                "the replacement character U+FFFD",
                "text whose characters are all known",
                "export the table again from its source: an earlier program has lost a character here");
    }

    @Test
    void allProblemsAreReportedInOrderOfLine() {
        List<Problem> problems = problems("T;k (1/S)\nx;1\n300;0\n310\n-1;1e999\n");
        List<String> codes = new ArrayList<>();
        List<Integer> lines = new ArrayList<>();
        for (Problem problem : problems) {
            codes.add(problem.code());
            lines.add(problem.place().line().orElseThrow());
        }
        assertEquals(
                List.of(
                        "missing-unit",
                        "unknown-unit",
                        "not-a-number",
                        "not-positive",
                        "ragged-row",
                        "number-out-of-range"),
                codes);
        assertEquals(List.of(1, 1, 2, 3, 4, 5), lines);
    }

    @Test
    void afterFiftyProblemsTheRestIsCounted() {
        List<Problem> problems = problems(KELVIN_PER_SECOND + "x;1\n".repeat(60));
        assertEquals(51, problems.size());
        assertProblem(
                problems.subList(50, 51),
                "more-problems",
                OptionalInt.empty(),
                null,
                "10 further problems",
                "a file without problems",
                "mend those listed and read the file again");
    }

    @Test
    void linesAreCountedAsAnEditorCountsThem() {
        for (String end : new String[] {"\n", "\r\n", "\r"}) {
            List<Problem> problems =
                    problems("# one\n\nT (K);k (1/s)\n# four\n300;1\n;;\n310;bad\n".replace("\n", end));
            assertEquals(1, problems.size());
            assertEquals(OptionalInt.of(7), problems.get(0).place().line());
        }
    }

    @Test
    void longCellsAreCutInMessages() {
        List<Problem> problems = problems(KELVIN_PER_SECOND + "300;" + "y".repeat(10_000) + "\n");
        assertEquals("a text of 10000 characters", problems.get(0).found());
        List<Problem> ragged = problems(KELVIN_PER_SECOND + "y".repeat(10_000) + "\n");
        assertTrue(ragged.get(0).found().length() < 120, ragged.get(0).found());
    }
}
