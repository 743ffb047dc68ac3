package org.saddlebook.reader.text.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.api.reader.Imported;
import org.saddlebook.api.reader.Imported.Directive;
import org.saddlebook.api.reader.SourceHead;

/** What is read, and how the reader says so. All tables are invented. */
class ReadingTest {
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "T (degC) | 25",
                "T / °C | 25",
                "T/°C | 25",
                "T [K] | 298.15",
                "Temperature (°F) | 77",
                "TEMPERATURE (K) | 298.15",
                "temp. (°C) | 25",
                "temperature_K | 298.15",
                "T_K | 298.15",
                "T_degC | 25",
                "T (C) | 25",
                "T°C | 25",
                "T in K | 298.15",
                "T K | 298.15",
                "θ / °C | 25",
                "t (℃) | 25",
                "T ([degF]) | 77"
            })
    void headingsOfTemperature(String heading, String value) throws InputException {
        RateTable table = Reading.table(heading + ";k (1/s)\n" + value + ";1\n");
        assertEquals(298.15, table.points().get(0).kelvin());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "k (L mol-1 s-1) | L/(mol.s) | 2",
                "k / s^-1 | 1/s | 1",
                "k/s^-1 | 1/s | 1",
                "k (1/s) | 1/s | 1",
                "k(1/s) | 1/s | 1",
                "k [h⁻¹] | 1/h | 1",
                "k_s-1 | 1/s | 1",
                "k_L_mol-1_s-1 | L/(mol.s) | 2",
                "K_OBS / min^-1 | 1/min | 1",
                "kobs (1/s) | 1/s | 1",
                "k2 (M^-1 s^-1) | L/(mol.s) | 2",
                "rate constant (1/s) | 1/s | 1",
                "Rate coefficient [cm3 molecule-1 s-1] | cm3/({molecule}.s) | 2",
                "k (L/(mol.s)) | L/(mol.s) | 2",
                "k / (L mol⁻¹ s⁻¹) | L/(mol.s) | 2",
                "k (mol/(L.s)) | mol/(L.s) | 0",
                "k (L^0.5 mol^-0.5 s^-1) | L^0.5/(mol^0.5.s) | 1.5",
                "k / 10^-5 s^-1 | 10*-5/s | 1"
            })
    void headingsOfTheRateConstant(String heading, String code, double order) throws InputException {
        RateTable table = Reading.table("T (K);" + heading + "\n300;1\n");
        assertEquals(code, table.rateUnit().code());
        assertEquals(order, table.order());
        assertEquals(table.rateUnit().factor(), table.points().get(0).rate());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "u(k) (%) | 4",
                "u(k) / % | 4",
                "u(k)/k (%) | 4",
                "u(k)/k | 0.04",
                "u(k) / k (1) | 0.04",
                "u_rel(k) | 0.04",
                "u_rel(k) (%) | 4",
                "u(k) / s^-1 | 0.08",
                "u(k) (1/min) | 4.8",
                "u_k (1/s) | 0.08",
                "u(k)_s-1 | 0.08",
                "u(k) in % | 4"
            })
    void headingsOfTheUncertaintyOfTheRateConstant(String heading, String value) throws InputException {
        RateTable table = Reading.table("T (K);k (1/s);" + heading + "\n300;2;" + value + "\n");
        assertEquals(OptionalDouble.of(0.08), table.points().get(0).rateUncertainty());
    }

    @ParameterizedTest
    @CsvSource({"u(T) / K, 0.5", "u(T) (K), 0.5", "u(T) (°C), 0.5", "u(T) (degF), 0.9", "u(T) [mK], 500", "u_T (K), 0.5"
    })
    void anUncertaintyOfTemperatureIsADifference(String heading, String value) throws InputException {
        RateTable table = Reading.table("T (degC);k (1/s);" + heading + "\n26.85;2;" + value + "\n");
        assertEquals(OptionalDouble.of(0.5), table.points().get(0).kelvinUncertainty());
    }

    @Test
    void pointsKeepTheirOrderReplicatesLabelsReasonsAndTexts() throws InputException {
        RateTable table = Reading.table("""
                run,T (K),k (1/min),u(k) (%),excluded
                B2,330,3.0,5,
                A1,300,1.50e0,,"bubble, seen late"
                A2,330,3.0,5,
                """);
        assertEquals(
                List.of(
                        new RatePoint(
                                330,
                                0.05,
                                OptionalDouble.empty(),
                                OptionalDouble.of(0.0025),
                                "B2",
                                Optional.empty(),
                                new RatePoint.AsRead(OptionalInt.of(2), "330", "3.0")),
                        new RatePoint(
                                300,
                                0.025,
                                OptionalDouble.empty(),
                                OptionalDouble.empty(),
                                "A1",
                                Optional.of("bubble, seen late"),
                                new RatePoint.AsRead(OptionalInt.of(3), "300", "1.50e0")),
                        new RatePoint(
                                330,
                                0.05,
                                OptionalDouble.empty(),
                                OptionalDouble.of(0.0025),
                                "A2",
                                Optional.empty(),
                                new RatePoint.AsRead(OptionalInt.of(4), "330", "3.0"))),
                table.points());
    }

    @Test
    void theReaderSaysHowItUnderstoodTheFile() throws InputException {
        Imported imported = Reading.read("T (degC);k (1/min);u(k) (%);pH;excluded\n25,5;1,5;4;7;\n30,5;2,5;4;7;leak\n"
                .getBytes(StandardCharsets.UTF_8));
        assertEquals(
                List.of(
                        "read as UTF-8",
                        "columns are separated by semicolons",
                        "numbers have a decimal comma",
                        "column “T (degC)” read as temperature in °C",
                        "column “k (1/min)” read as rate constant in 1/min, overall order 1",
                        "column “u(k) (%)” read as standard uncertainty of the rate constant in %",
                        "column “excluded” read as reason for exclusion",
                        "column “pH” not used",
                        "2 rows, of which 1 excluded"),
                imported.understood());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "UTF-8 | false | read as UTF-8",
                "UTF-8 | true | read as UTF-8, with a byte order mark",
                "UTF-16LE | true | read as UTF-16, little-endian",
                "UTF-16BE | true | read as UTF-16, big-endian",
                "UTF-16LE | false | read as UTF-16, little-endian, without a byte order mark, as its zero bytes show",
                "UTF-16BE | false | read as UTF-16, big-endian, without a byte order mark, as its zero bytes show",
                "ISO-8859-1 | false | read as Windows-1252 (Latin-1), because it is not valid UTF-8",
                "windows-1252 | false | read as Windows-1252 (Latin-1), because it is not valid UTF-8"
            })
    void encodingsAreFoundOutAndSaid(String charset, boolean mark, String understood) throws Exception {
        byte[] bytes = ((mark ? "\uFEFF" : "") + "T (°C);k (1/s);label\n25;1;Zürich µ\n").getBytes(charset);
        Imported imported = Reading.read(bytes);
        assertEquals(understood, imported.understood().get(0));
        RatePoint point = imported.rateTable().orElseThrow().points().get(0);
        assertEquals(298.15, point.kelvin());
        assertEquals("Zürich µ", point.label());
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "T (K),k (1/s)\n300,1.5\n310,2.5\n",
                "T (K);k (1/s)\n300;1.5\n310;2.5\n",
                "T (K);k (1/s)\n300;1,5\n310;2,5\n",
                "T (K)\tk (1/s)\n300\t1.5\n310\t2.5\n",
                "T (K)\tk (1/s)\n300\t1,5\n310\t2,5\n",
                "T (K)  k (1/s)\n300    1.5\n310    2.5\n",
                "T_K k_s-1\n300 1.5\n310 2.5\n",
                "  T_K   k_s-1\n  300   1,5 \n  310   2,5 \n",
                "T (K) , k (1/s)\n 300 , 1.5 \n310,2.5",
                "\"T (K)\",\"k (1/s)\"\n\"300\",\"1,5\"\n\"310\",\"2,5\"\n",
                "T (K),k (1/s),,\n300,1.5,,\n310,2.5,,\n",
                "T (K);k (1/s)\n300;1.5;;\n310;2.5;\n",
                "T;k\nK;1/s\n300;1,5\n310;2,5\n",
                "T;k (1/s)\n[K];\n300;1,5\n310;2,5\n",
                "T (K)\tk (1/s)\tnote; more, text\n300\t1.5\ta\n310\t2.5\tb\n",
                "T (K);k (1/s);note, with comma\n300;1.5;a, b\n310;2.5;c\n",
                "T (K);1/T (1/K);k (1/s);ln k\n300;0.0033;1.5;0.4\n310;0.0032;2.5;0.9\n",
                "T set (K);T (K);k (1/s)\n299;300;1.5\n309;310;2.5\n",
                "T (K);k (1/s);u(k) (%)\n300;1.5;\n310;2.5;\n",
                "T (K);k (1/s)\n300;1.5×10^0\n310;2.5·10⁰\n"
            })
    void layoutsOfOneTable(String text) throws InputException {
        List<RatePoint> points = Reading.table(text).points();
        assertEquals(2, points.size());
        assertEquals(300, points.get(0).kelvin());
        assertEquals(1.5, points.get(0).rate());
        assertEquals(310, points.get(1).kelvin());
        assertEquals(2.5, points.get(1).rate());
    }

    @Test
    void quotedCellsMayHoldSeparatorsAndQuotes() throws InputException {
        RateTable table = Reading.table("T (K),k (1/s),label\n300,1,\"a, b \"\"c\"\"\"\n310,2,5\" tube\n");
        assertEquals("a, b \"c\"", table.points().get(0).label());
        assertEquals("5\" tube", table.points().get(1).label());
    }

    @Test
    void commentLinesOfTheFormKeyValueAreDirectives() throws InputException {
        Imported imported = Reading.read("""
                # Standard  State: 1 bar
                #order:2
                # see http://example.org/a
                # C:\\data
                # at 12:30 warmer
                # only a remark
                "# Title: a, b",,
                T (K),k (1/s)
                300,1
                  # late: yes
                # empty:
                """);
        assertEquals(
                List.of(
                        new Directive("standard state", "1 bar", Place.of(Reading.FILE, 1)),
                        new Directive("order", "2", Place.of(Reading.FILE, 2)),
                        new Directive("title", "a, b", Place.of(Reading.FILE, 7)),
                        new Directive("late", "yes", Place.of(Reading.FILE, 10)),
                        new Directive("empty", "", Place.of(Reading.FILE, 11))),
                imported.directives());
        assertEquals(1, imported.rateTable().orElseThrow().points().size());
    }

    @Test
    void aFileMayHoldDirectivesOnly() throws InputException {
        Imported imported = Reading.read("# standard state: 1 bar\n\n");
        assertTrue(imported.rateTable().isEmpty());
        assertEquals(1, imported.directives().size());
        assertEquals(List.of("read as UTF-8"), imported.understood());
    }

    @Test
    void aReadingRuleSuppliesWhatTheFileDoesNotSay() throws InputException {
        byte[] bytes = "T;k;u(k)\n25,5;1,5;10\n".getBytes(StandardCharsets.UTF_16LE);
        Imported imported = Reading.read(
                bytes,
                Map.of(
                        "encoding", "utf-16le",
                        "separator", "semicolon",
                        "decimal", "comma",
                        "unit.T", "degC",
                        "unit.k", "1/min",
                        "unit.u(k)", "%"));
        RatePoint point = imported.rateTable().orElseThrow().points().get(0);
        assertEquals(298.65, point.kelvin());
        assertEquals(0.025, point.rate());
        assertEquals(OptionalDouble.of(0.0025), point.rateUncertainty());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "separator | pipe | \"pipe\" | tab, semicolon, comma, wide-space or space",
                "decimal | dot | \"dot\" | point or comma",
                "encoding | ebcdic | \"ebcdic\" | one of utf-8, utf-16le, utf-16be, windows-1252"
            })
    void aWrongReadingRuleIsRefused(String key, String value, String found, String expected) {
        byte[] bytes = "T (K);k (1/s)\n300;1\n".getBytes(StandardCharsets.UTF_8);
        List<Problem> problems = assertThrows(InputException.class, () -> Reading.read(bytes, Map.of(key, value)))
                .problems();
        assertEquals(
                List.of(new Problem(
                        "reading-rule",
                        Rule.place(key),
                        found,
                        expected,
                        "correct the reading rule or leave the option out")),
                problems);
    }

    @Test
    void anUnknownOptionOfAReadingRuleIsRefused() {
        byte[] bytes = "T (K);k (1/s)\n300;1\n".getBytes(StandardCharsets.UTF_8);
        Problem problem = assertThrows(InputException.class, () -> Reading.read(bytes, Map.of("sheet", "1")))
                .problems()
                .get(0);
        assertEquals("reading-rule", problem.code());
        assertEquals("the option \"sheet\"", problem.found());
    }

    @Test
    void aWrongUnitInAReadingRuleIsPlacedThere() {
        byte[] bytes = "T (K);k\n300;1\n".getBytes(StandardCharsets.UTF_8);
        Problem problem = assertThrows(InputException.class, () -> Reading.read(bytes, Map.of("unit.k", "1/S")))
                .problems()
                .get(0);
        assertEquals("unknown-unit", problem.code());
        assertEquals(Rule.place("unit.k"), problem.place());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "a.csv | T (K),k (1/s) | 90",
                "a.TSV | x | 90",
                "a.txt | plain words | 90",
                "a.dat | {} | 90",
                "table | T (K);k (1/s) | 50",
                "notes | no separators | 10",
                "campaign.json | {\"a\": 1, \"b\": 2} | 0",
                "page.html | <p>a, b</p> | 0",
                "a.csv | %PDF-1.7 | 0"
            })
    void confidenceFollowsNameAndContent(String name, String content, int confidence) {
        byte[] bytes = content.getBytes(StandardCharsets.UTF_8);
        assertEquals(confidence, new DelimitedTextReader().confidence(new SourceHead(name, bytes, bytes.length)));
    }

    @Test
    void confidenceIsNoneInBinaryFilesAndSomeInUtf16() {
        DelimitedTextReader reader = new DelimitedTextReader();
        byte[] zip = {'P', 'K', 3, 4, 20, 0};
        byte[] zeros = new byte[64];
        byte[] utf16 = "\uFEFFT (K);k (1/s)\n".getBytes(StandardCharsets.UTF_16LE);
        assertEquals(0, reader.confidence(new SourceHead("a.csv", zip, zip.length)));
        assertEquals(0, reader.confidence(new SourceHead("a.csv", zeros, zeros.length)));
        assertEquals(90, reader.confidence(new SourceHead("a.csv", utf16, utf16.length)));
        assertEquals(50, reader.confidence(new SourceHead("a", utf16, utf16.length)));
        assertEquals(90, reader.confidence(new SourceHead("a.csv", new byte[0], 0)));
        assertEquals(0, reader.confidence(new SourceHead("a", new byte[0], 0)));
        assertEquals("delimited-text", reader.id());
    }
}
