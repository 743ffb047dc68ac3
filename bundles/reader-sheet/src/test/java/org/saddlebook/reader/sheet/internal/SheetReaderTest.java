package org.saddlebook.reader.sheet.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.saddlebook.reader.sheet.internal.Workbooks.formatted;
import static org.saddlebook.reader.sheet.internal.Workbooks.formula;
import static org.saddlebook.reader.sheet.internal.Workbooks.number;
import static org.saddlebook.reader.sheet.internal.Workbooks.text;

import com.github.miachm.sods.OfficePercentage;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.api.reader.DataReader;
import org.saddlebook.api.reader.Imported;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.api.reader.Source;
import org.saddlebook.api.reader.SourceHead;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.reader.text.internal.DelimitedTextReader;
import org.saddlebook.testkit.api.DataReaderContract;
import org.saddlebook.testkit.api.ImmediateTask;

class SheetReaderTest extends DataReaderContract {
    private static final String[] HEADER = {text("T (degC)"), text("k (1/s)"), text("u(k) (%)")};
    private static final String[] FIRST = {number("25"), number("2.9999999999999999E-2"), number("3")};
    private static final String[] SECOND = {number("35"), number("0.08"), number("3")};

    @Override
    protected DataReader reader() {
        return new SheetReader(new DelimitedTextReader());
    }

    @Override
    protected List<Source> readable() {
        return List.of(
                new Source("rates.xlsx", Workbooks.workbook(HEADER, FIRST, SECOND)),
                new Source(
                        "rates.ods",
                        Workbooks.openDocument(
                                new Object[] {"T (degC)", "k (1/s)", "u(k) (%)"},
                                new Object[] {25.0, 0.03, 3.0},
                                new Object[] {35.0, 0.08, 3.0})));
    }

    private Imported read(String name, byte[] bytes, Map<String, String> rule) throws InputException, Cancelled {
        return reader().read(new Source(name, bytes), new ReadingRule(rule), ImmediateTask.seeded(1));
    }

    private Problem refused(String name, byte[] bytes) {
        InputException refusal = assertThrows(InputException.class, () -> read(name, bytes, Map.of()));
        return refusal.problems().get(0);
    }

    @Test
    void bothFormatsGiveTheTableThatTextGives() throws Exception {
        String csv = "T (degC);k (1/s);u(k) (%)\n25;0.03;3\n35;0.08;3\n";
        List<RatePoint> expected = new DelimitedTextReader()
                .read(
                        new Source("rates.csv", csv.getBytes(java.nio.charset.StandardCharsets.UTF_8)),
                        ReadingRule.AUTOMATIC,
                        ImmediateTask.seeded(1))
                .rateTable()
                .orElseThrow()
                .points();
        for (Source source : readable()) {
            Imported imported = read(source.name(), source.bytes(), Map.of());
            assertEquals(expected, imported.rateTable().orElseThrow().points(), source.name());
            assertEquals("sheet “Rates” read", imported.understood().get(0));
            for (String sentence : imported.understood()) {
                assertFalse(
                        sentence.contains("tab")
                                || sentence.toLowerCase(java.util.Locale.ROOT).contains("utf"),
                        sentence);
            }
        }
    }

    @Test
    void commentRowsAreStatementsAndEmptyRowsKeepTheirNumber() throws Exception {
        byte[] bytes =
                Workbooks.workbook(new String[] {text("# title: Of the sheet")}, new String[0], HEADER, FIRST, SECOND);
        Imported imported = read("a.xlsx", bytes, Map.of());
        assertEquals("title", imported.directives().get(0).key());
        assertEquals("Of the sheet", imported.directives().get(0).value());
        byte[] bad =
                Workbooks.workbook(new String[0], HEADER, FIRST, new String[] {text("warm"), number("1"), number("3")});
        Problem problem = refused("a.xlsx", bad);
        assertEquals(4, problem.place().line().orElseThrow());
        assertEquals("T (degC)", problem.place().column().orElseThrow());
    }

    @Test
    void formulasAreReadAsLastSavedAndSaidToBe() throws Exception {
        byte[] bytes =
                Workbooks.workbook(HEADER, FIRST, new String[] {number("35"), formula("B2*2", "0.06"), number("3")});
        Imported imported = read("a.xlsx", bytes, Map.of());
        assertEquals(
                "1 cell is computed by the spreadsheet; read as last saved",
                imported.understood().get(1));
        assertEquals(
                "0.06",
                imported.rateTable().orElseThrow().points().get(1).asRead().rate());
    }

    @Test
    void cellsThatHideTheirValueAreRefusedByName() {
        byte[] faulty = Workbooks.workbook(HEADER, FIRST, new String[] {number("35"), Workbooks.fault(), number("3")});
        Problem fault = refused("a.xlsx", faulty);
        assertEquals("cell-error", fault.code());
        assertEquals("#DIV/0!", fault.found());
        assertEquals(3, fault.place().line().orElseThrow());
        assertEquals("B", fault.place().column().orElseThrow());

        byte[] percent = Workbooks.workbook(HEADER, new String[] {number("25"), number("0.03"), formatted("0.03", 1)});
        assertEquals("percent-cell", refused("a.xlsx", percent).code());

        byte[] date = Workbooks.workbook(HEADER, new String[] {formatted("45000", 2), number("0.03"), number("3")});
        assertEquals("date-cell", refused("a.xlsx", date).code());

        byte[] openPercent = Workbooks.openDocument(
                new Object[] {"T (degC)", "k (1/s)", "u(k) (%)"},
                new Object[] {25.0, 0.03, new OfficePercentage(0.03)});
        assertEquals("percent-cell", refused("a.ods", openPercent).code());
    }

    @Test
    void severalSheetsAreNotGuessedAmong() throws Exception {
        Map<String, String> sheets = new LinkedHashMap<>();
        sheets.put("Notes", Workbooks.sheet(new String[][] {{text("see the notebook")}}));
        sheets.put("Rates", Workbooks.sheet(HEADER, FIRST, SECOND));
        sheets.put("!Old", Workbooks.sheet(HEADER, FIRST));
        byte[] bytes = Workbooks.archive(Workbooks.parts(sheets));
        Problem problem = refused("a.xlsx", bytes);
        assertEquals("several-sheets", problem.code());
        assertEquals("2 sheets with content: “Notes”, “Rates”", problem.found());
        assertEquals(
                2,
                read("a.xlsx", bytes, Map.of("sheet", "Rates"))
                        .rateTable()
                        .orElseThrow()
                        .points()
                        .size());
        assertEquals(
                1,
                read("a.xlsx", bytes, Map.of("sheet", "Old"))
                        .rateTable()
                        .orElseThrow()
                        .points()
                        .size());
        InputException absent =
                assertThrows(InputException.class, () -> read("a.xlsx", bytes, Map.of("sheet", "Elsewhere")));
        assertEquals("no-such-sheet", absent.problems().get(0).code());
    }

    @Test
    void theDemoWorkbooksGiveTheSameTable() throws Exception {
        Path demo = Path.of("..", "..", "demo-data", "spreadsheets");
        Imported workbook = read("a.xlsx", Files.readAllBytes(demo.resolve("release.xlsx")), Map.of("sheet", "Rates"));
        Imported document = read("a.ods", Files.readAllBytes(demo.resolve("release.ods")), Map.of());
        assertEquals(10, workbook.rateTable().orElseThrow().points().size());
        assertEquals(workbook.rateTable(), document.rateTable());
    }

    @Test
    void archivesThatGrowWithoutLimitAreRefused() {
        Map<String, byte[]> parts = Workbooks.parts(Map.of("Rates", Workbooks.sheet(HEADER, FIRST)));
        parts.put("xl/media/image.bin", new byte[64 << 20]);
        Problem problem = refused("bomb.xlsx", Workbooks.archive(parts));
        assertEquals("archive-too-large", problem.code());
        assertTrue(problem.found().contains("200 times"), problem.found());
    }

    @Test
    void documentTypesAreRefusedSoThatNoEntityReachesOut() {
        String evil = "<?xml version=\"1.0\"?><!DOCTYPE worksheet [<!ENTITY e SYSTEM \"file:///etc/passwd\">]>"
                + Workbooks.sheet(new String[][] {{text("&e;")}}).replaceFirst("<\\?xml[^>]*>", "");
        Problem problem = refused("evil.xlsx", Workbooks.archive(Workbooks.parts(Map.of("Rates", evil))));
        assertEquals("document-type", problem.code());
        Map<String, byte[]> open = new LinkedHashMap<>();
        Workbooks.add(open, "mimetype", "application/vnd.oasis.opendocument.spreadsheet");
        open.put("content.xml", evil.getBytes(java.nio.charset.StandardCharsets.UTF_16));
        assertEquals(
                "document-type", refused("evil.ods", Workbooks.archive(open)).code());
    }

    @Test
    void namesThatPointOutOfTheArchiveAreRefused() {
        for (String name : List.of("../../outside.xml", "/etc/passwd", "xl/../../b.xml", "C:\\windows\\b.xml")) {
            Map<String, byte[]> parts = Workbooks.parts(Map.of("Rates", Workbooks.sheet(HEADER, FIRST)));
            Workbooks.add(parts, name, "<a/>");
            assertEquals(
                    "path-in-archive",
                    refused("a.xlsx", Workbooks.archive(parts)).code(),
                    name);
        }
    }

    @Test
    void emptyAndOldFilesAreNamed() {
        assertEquals("empty-file", refused("a.xlsx", new byte[0]).code());
        assertEquals(
                "empty-file",
                refused("a.xlsx", Workbooks.workbook(new String[0])).code());
        byte[] old = {(byte) 0xD0, (byte) 0xCF, 0x11, (byte) 0xE0, 0, 0, 0, 0};
        assertEquals("old-spreadsheet", refused("a.xls", old).code());
        assertEquals(
                "damaged-spreadsheet",
                refused("a.xlsx", new byte[] {'P', 'K', 3, 4, 0, 0}).code());
    }

    @Test
    void leavesOtherArchivesToOthers() {
        byte[] other = Workbooks.archive(Map.of("readme.txt", new byte[10]));
        assertEquals(0, reader().confidence(new SourceHead("a.zip", other, other.length)));
        byte[] text = "T (K),k (1/s)".getBytes(java.nio.charset.StandardCharsets.UTF_8);
        assertEquals(0, reader().confidence(new SourceHead("a.csv", text, text.length)));
    }

    @Test
    void datesAreToldFromOtherNumberFormats() {
        for (String format : List.of("dd/mm/yyyy", "h:mm:ss", "[$-409]d-mmm-yy", "mm:ss.0")) {
            assertTrue(OfficeOpenXml.isDate(format), format);
        }
        for (String format : List.of("general", "0.00e+00", "#,##0.00", "0.0\"days\"", "[red]0.0", "0\\d", "")) {
            assertFalse(OfficeOpenXml.isDate(format), format);
        }
    }
}
