package org.saddlebook.reader.sheet.internal;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.osgi.service.component.annotations.Reference;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.api.reader.DataReader;
import org.saddlebook.api.reader.Imported;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.api.reader.Source;
import org.saddlebook.api.reader.SourceHead;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;

/**
 * Rate tables in spreadsheets. It gets the cells out; what headings, units and comment rows mean is the business of the
 * reader of delimited text, so that a table means the same whatever kind of file it stands in.
 */
@Component
public final class SheetReader implements DataReader {
    private static final String SHEET = "sheet";

    private static final int BY_EXTENSION = 95;
    private static final int BY_CONTENT = 60;

    /** The parts of a spreadsheet's name and first bytes that tell its format. */
    private enum Kind {
        OPEN_XML,
        OPEN_DOCUMENT,
        OLD,
        NONE
    }

    private final DataReader rows;

    /** Reads with the help of the reader of delimited text. */
    @Activate
    public SheetReader(@Reference(target = "(saddlebook.reader=delimited-text)") DataReader rows) {
        this.rows = rows;
    }

    @Override
    public String id() {
        return "spreadsheet";
    }

    @Override
    public int confidence(SourceHead head) {
        if (kind(head.name(), head.start()) == Kind.NONE) {
            return 0;
        }
        String name = head.name().toLowerCase(Locale.ROOT);
        return name.endsWith(".xlsx") || name.endsWith(".ods") || name.endsWith(".xls") ? BY_EXTENSION : BY_CONTENT;
    }

    @Override
    public Imported read(Source source, ReadingRule rule, Task task) throws InputException, Cancelled {
        List<Grid> grids = grids(source, task);
        Grid grid = choose(source.name(), grids, rule.get(SHEET).orElse(""));
        refuseFlaws(source.name(), grid);
        Map<String, String> options = new TreeMap<>(rule.options());
        options.remove(SHEET);
        options.put("separator", "tab");
        options.remove("encoding");
        byte[] text = grid.text().getBytes(StandardCharsets.UTF_8);
        Imported imported = rows.read(new Source(source.name(), text), new ReadingRule(options), task);
        return new Imported(imported.rateTable(), imported.directives(), understood(grid, imported.understood()));
    }

    private static Kind kind(String name, byte[] start) {
        String lower = name.toLowerCase(Locale.ROOT);
        if (start.length > 3 && (start[0] & 0xFF) == 0xD0 && (start[1] & 0xFF) == 0xCF && lower.endsWith(".xls")) {
            return Kind.OLD;
        }
        if (start.length < 4 || start[0] != 'P' || start[1] != 'K') {
            return Kind.NONE;
        }
        // Both formats say what they are in the first entries of the archive.
        String head = new String(start, 0, Math.min(start.length, 4096), StandardCharsets.ISO_8859_1);
        if (lower.endsWith(".ods") || head.contains("application/vnd.oasis.opendocument.spreadsheet")) {
            return Kind.OPEN_DOCUMENT;
        }
        return lower.endsWith(".xlsx") || head.contains("[Content_Types].xml") || head.contains("xl/")
                ? Kind.OPEN_XML
                : Kind.NONE;
    }

    private static List<Grid> grids(Source source, Task task) throws InputException, Cancelled {
        if (source.bytes().length == 0) {
            throw ArchiveGate.refusal(
                    source.name(),
                    "empty-file",
                    "an empty file",
                    "a spreadsheet with a table",
                    "save the table again; nothing was written into this file");
        }
        Kind kind = kind(source.name(), source.bytes());
        if (kind == Kind.OLD) {
            throw ArchiveGate.refusal(
                    source.name(),
                    "old-spreadsheet",
                    "a spreadsheet in the old binary format",
                    "the format xlsx or ods",
                    "open it and save it as .xlsx, .ods or .csv");
        }
        ArchiveGate.check(source.name(), source.bytes(), task);
        Office office = kind == Kind.OPEN_DOCUMENT ? new OpenDocument() : new OfficeOpenXml();
        try {
            return office.sheets(source.bytes(), task);
        } catch (IOException | RuntimeException e) {
            // The libraries answer to a damaged file with whatever exception the damage happens to cause.
            throw ArchiveGate.damaged(source.name(), e);
        }
    }

    private static Grid choose(String file, List<Grid> grids, String wanted) throws InputException {
        List<Grid> filled = new ArrayList<>();
        for (Grid grid : grids) {
            if (wanted.isEmpty()
                    ? !grid.hidden() && !grid.isEmpty()
                    : grid.name().equals(wanted)) {
                filled.add(grid);
            }
        }
        if (filled.size() == 1) {
            return filled.get(0);
        }
        if (!wanted.isEmpty()) {
            throw ArchiveGate.refusal(
                    file,
                    "no-such-sheet",
                    "no sheet “" + wanted + "”",
                    "the name of one of its sheets: " + names(grids),
                    "correct the option \"sheet\" of the reading rule");
        }
        if (filled.isEmpty()) {
            throw ArchiveGate.refusal(
                    file,
                    "empty-file",
                    "no sheet with anything in it",
                    "a sheet with a header and rows",
                    "save the table again, and show the sheet when it is hidden");
        }
        throw ArchiveGate.refusal(
                file,
                "several-sheets",
                filled.size() + " sheets with content: " + names(filled),
                "one, or the name of the one to read",
                "name it in the reading rule, in the console with --read \"sheet="
                        + filled.get(0).name() + "\"");
    }

    private static String names(List<Grid> grids) {
        StringBuilder names = new StringBuilder();
        for (Grid grid : grids) {
            names.append(names.isEmpty() ? "“" : ", “").append(grid.name()).append('”');
        }
        return names.toString();
    }

    private static void refuseFlaws(String file, Grid grid) throws InputException {
        List<Problem> problems = new ArrayList<>();
        for (Grid.Flaw flaw : grid.flaws()) {
            Place place = Place.of(file, flaw.row(), flaw.column());
            problems.add(new Problem(
                    flaw.kind().code(),
                    place,
                    flaw.found(),
                    flaw.kind().expected(),
                    flaw.kind().remedy()));
        }
        if (!problems.isEmpty()) {
            throw new InputException(problems);
        }
    }

    private static List<String> understood(Grid grid, List<String> ofText) {
        List<String> understood = new ArrayList<>();
        understood.add("sheet “" + grid.name() + "” read");
        if (grid.formulas() > 0) {
            understood.add(grid.formulas() + (grid.formulas() == 1 ? " cell is" : " cells are")
                    + " computed by the spreadsheet; read as last saved");
        }
        for (String sentence : ofText) {
            // How the cells were handed on is nobody's concern.
            if (!sentence.startsWith("read as UTF-8") && !sentence.equals("columns are separated by tabs")) {
                understood.add(sentence);
            }
        }
        return understood;
    }
}
