package org.saddlebook.intake.internal;

import java.nio.file.Path;
import java.time.Clock;
import java.time.Instant;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.osgi.framework.Bundle;
import org.osgi.framework.FrameworkUtil;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.HistoryEntry;
import org.saddlebook.api.campaign.SourcePart;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.reader.DataReader;
import org.saddlebook.api.reader.Imported;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.api.reader.Source;
import org.saddlebook.api.reader.SourceHead;
import org.saddlebook.api.service.Intake;
import org.saddlebook.api.service.Progress;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.json.api.Sha256;

/** Makes a campaign of a table, with the installed reader that knows it best. */
final class TableImport {
    private static final int HEAD = 64 << 10;

    private final List<DataReader> readers;
    private final Clock clock;

    TableImport(List<DataReader> readers, Clock clock) {
        List<DataReader> sorted = new ArrayList<>(readers);
        sorted.sort(Comparator.comparing(DataReader::id));
        this.readers = List.copyOf(sorted);
        this.clock = clock;
    }

    Intake.Opened open(Path input, ReadingRule rule, String who, Progress progress) throws InputException, Cancelled {
        String name = input.toString();
        byte[] bytes = FileGate.read(input, name);
        String fileName = input.getFileName().toString();
        DataReader reader = reader(name, fileName, bytes);
        Imported imported = read(reader, new Source(name, bytes), rule, progress);
        SourcePart source = new SourcePart(partPath(fileName), Sha256.of(bytes), bytes.length, reader.id());
        Campaign campaign = Campaign.titled(title(fileName)).withSources(List.of(source));
        if (imported.rateTable().isPresent()) {
            campaign = campaign.withRateTable(imported.rateTable().get());
        }
        Statements statements = Statements.read(imported.directives(), campaign);
        List<String> understood = new ArrayList<>(imported.understood());
        understood.addAll(statements.freeText());
        // Whole seconds: nobody imports by the microsecond, and the file stays readable.
        Instant now = Instant.ofEpochSecond(clock.instant().getEpochSecond());
        campaign = statements
                .campaign()
                .withHistory(new HistoryEntry(who, now, "imported", "", fileName + ", SHA-256 " + source.sha256(), ""));
        return new Intake.Opened(campaign, List.of(new Intake.Part(source.path(), bytes)), understood);
    }

    private DataReader reader(String name, String fileName, byte[] bytes) throws InputException {
        if (readers.isEmpty()) {
            throw FileGate.problem(
                    "no-reader",
                    name,
                    "a table, and no reader is installed",
                    "a reader for this kind of file",
                    "Install the feature with the reader: reader-text reads delimited text, reader-sheet spreadsheets.");
        }
        SourceHead head =
                new SourceHead(fileName, bytes.length <= HEAD ? bytes : Arrays.copyOf(bytes, HEAD), bytes.length);
        DataReader best = null;
        int highest = 0;
        Optional<InputException> broken = Optional.empty();
        for (DataReader reader : readers) {
            int confidence = 0;
            try {
                confidence = reader.confidence(head);
            } catch (RuntimeException | LinkageError | StackOverflowError e) {
                broken = Optional.of(broke(reader, name, e));
            }
            if (confidence > highest) {
                best = reader;
                highest = confidence;
            }
        }
        if (best != null) {
            return best;
        }
        if (broken.isPresent()) {
            throw broken.get();
        }
        StringBuilder ids = new StringBuilder();
        for (DataReader reader : readers) {
            ids.append(ids.length() == 0 ? "" : ", ").append(reader.id());
        }
        throw FileGate.problem(
                "no-reader",
                name,
                "a file that no installed reader knows",
                "a file for one of the installed readers: " + ids,
                "Save the table in a form they know, for example as delimited text (.csv), or install the feature with a"
                        + " reader for this kind of file.");
    }

    private static Imported read(DataReader reader, Source source, ReadingRule rule, Progress progress)
            throws InputException, Cancelled {
        try {
            Imported imported = reader.read(source, rule, new ImportTask(progress));
            if (imported == null) {
                throw new NullPointerException("nothing returned");
            }
            return imported;
        } catch (RuntimeException | LinkageError | StackOverflowError e) {
            throw broke(reader, source.name(), e);
        }
    }

    private static InputException broke(DataReader reader, String name, Throwable fault) {
        Bundle bundle = FrameworkUtil.getBundle(reader.getClass());
        String owner =
                bundle == null ? reader.getClass().getName() : bundle.getSymbolicName() + " " + bundle.getVersion();
        String message = fault.getMessage() == null ? "" : ": " + fault.getMessage();
        return FileGate.problem(
                "reader-broke",
                name,
                "a file on which the reader " + reader.id() + " of " + owner + " broke ("
                        + fault.getClass().getSimpleName() + message + ")",
                "a file that the reader can read, or says what is wrong with",
                "Report this to the maker of " + owner + "; meanwhile save the table in another form.");
    }

    /** Where the file is kept in the campaign's folder; what no file system of a colleague allows becomes a low line. */
    static String partPath(String fileName) {
        StringBuilder safe = new StringBuilder("sources/");
        for (int i = 0; i < fileName.length(); i++) {
            char c = fileName.charAt(i);
            boolean forbidden = c < ' ' || c == 0x7f || "\\:*?\"<>|".indexOf(c) >= 0 || Character.isSurrogate(c);
            safe.append(forbidden ? '_' : c);
        }
        return safe.toString();
    }

    static String title(String fileName) {
        int dot = fileName.lastIndexOf('.');
        return dot > 0 ? fileName.substring(0, dot) : fileName;
    }
}
