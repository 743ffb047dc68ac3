package org.saddlebook.reader.text.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.reader.DataReader;
import org.saddlebook.api.reader.Imported;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.api.reader.Source;
import org.saddlebook.api.reader.SourceHead;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;

/** Rate tables in delimited text. Stateless. */
@Component(property = "saddlebook.reader=delimited-text")
public final class DelimitedTextReader implements DataReader {
    private static final String[] EXTENSIONS = {".csv", ".tsv", ".txt", ".dat", ".tab"};

    private static final int BY_EXTENSION = 90;
    private static final int BY_SEPARATORS = 50;
    private static final int TEXT_ONLY = 10;

    @Override
    public String id() {
        return "delimited-text";
    }

    @Override
    public int confidence(SourceHead head) {
        byte[] start = head.start();
        if (!TextDecoder.binaryKind(start).isEmpty()) {
            return 0;
        }
        boolean utf16 = start.length >= 2
                && ((start[0] == (byte) 0xFF && start[1] == (byte) 0xFE)
                        || (start[0] == (byte) 0xFE && start[1] == (byte) 0xFF)
                        || TextDecoder.utf16Guess(start, start.length) != 0);
        boolean separators = utf16;
        byte first = 0;
        for (byte b : start) {
            if (!utf16 && b >= 0 && b < ' ' && b != '\t' && b != '\n' && b != '\r') {
                return 0;
            }
            separators |= b == ',' || b == ';' || b == '\t';
            if (first == 0 && b > ' ') {
                first = b;
            }
        }
        String name = head.name().toLowerCase(Locale.ROOT);
        for (String extension : EXTENSIONS) {
            if (name.endsWith(extension)) {
                return BY_EXTENSION;
            }
        }
        // Documents in JSON, XML or HTML are text too, but no tables.
        if (first == '{' || first == '[' || first == '<' || head.size() == 0) {
            return 0;
        }
        return separators ? BY_SEPARATORS : TEXT_ONLY;
    }

    @Override
    public Imported read(Source source, ReadingRule readingRule, Task task) throws InputException, Cancelled {
        Problems problems = new Problems(source.name());
        Rule rule = new Rule(readingRule, problems);
        problems.throwIfAny();
        if (source.bytes().length == 0) {
            throw problems.fatal(
                    "empty-file",
                    problems.wholeFile(),
                    "an empty file",
                    "a table with a header and rows",
                    "export the table again; nothing was written into this file");
        }
        TextDecoder.Decoded decoded = TextDecoder.decode(source.bytes(), rule.encoding(), problems);
        task.check();
        TextDocument document = TextDocument.of(decoded.text(), problems);
        List<String> understood = new ArrayList<>();
        understood.add(decoded.understood());
        if (document.table().isEmpty()) {
            if (document.directives().isEmpty()) {
                throw problems.fatal(
                        document.blank() ? "empty-file" : "no-table",
                        problems.wholeFile(),
                        document.blank() ? "blank lines only" : "comment lines only",
                        "a table with a header and rows",
                        "add a header such as \"T (K);k (1/s)\" and the measured rows");
            }
            return new Imported(Optional.empty(), document.directives(), understood);
        }
        RateTable table = new TableReader(rule, problems, understood).read(document.table(), task);
        return new Imported(Optional.of(table), document.directives(), understood);
    }
}
