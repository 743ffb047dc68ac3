package org.saddlebook.register.internal;

import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import java.util.stream.Stream;
import org.saddlebook.register.api.Head;
import org.saddlebook.register.api.LogRecord;
import org.saddlebook.register.api.RegisterException;
import org.saddlebook.register.api.RegisterStore;
import org.saddlebook.register.api.SealedRecord;

/** Reads the records of a store, with checked exceptions. */
final class Records {
    private Records() {}

    /** What is done with each record. */
    @FunctionalInterface
    interface Visitor {
        void visit(SealedRecord record) throws RegisterException;
    }

    /** Visits the records with at least this number. */
    static void each(RegisterStore store, long from, Visitor visitor) throws RegisterException {
        try (Stream<SealedRecord> stream = store.records(from)) {
            Iterator<SealedRecord> records = stream.iterator();
            while (records.hasNext()) {
                visitor.visit(records.next());
            }
        } catch (UncheckedIOException e) {
            if (e.getCause() instanceof RegisterException known) {
                throw known;
            }
            throw new RegisterException(
                    "Cannot read " + store.location() + ": " + e.getCause().getMessage(), e);
        }
    }

    /** The records with at least this number, read. */
    static List<LogRecord> from(RegisterStore store, long from) throws RegisterException {
        List<LogRecord> records = new ArrayList<>();
        each(store, from, each -> records.add(RecordJson.read(each.number(), each.bytes())));
        return records;
    }

    /** Every record as stored. */
    static List<SealedRecord> all(RegisterStore store) throws RegisterException {
        List<SealedRecord> records = new ArrayList<>();
        each(store, 1, records::add);
        return records;
    }

    /** The head of the last of these records. */
    static Head head(List<SealedRecord> records) {
        return records.isEmpty()
                ? Head.EMPTY
                : records.get(records.size() - 1).receipt().head();
    }
}
