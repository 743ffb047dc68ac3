package org.saddlebook.register.api;

import java.util.List;
import java.util.Objects;

/**
 * An entry and everything recorded about it since.
 *
 * @param record the record that entered it
 * @param receipt its receipt
 * @param about later records that name it, oldest first
 */
public record Entry(LogRecord record, Receipt receipt, List<LogRecord> about) {
    /** Where an entry stands. */
    public enum Status {
        /** It holds. */
        CURRENT,
        /** A later entry took its place. */
        SUPERSEDED,
        /** It was withdrawn. */
        WITHDRAWN
    }

    /** Copies the list. */
    public Entry {
        Objects.requireNonNull(record, "record");
        Objects.requireNonNull(receipt, "receipt");
        about = List.copyOf(about);
    }

    /** Number of the entry. */
    public long number() {
        return record.number();
    }

    /** Where it stands now; withdrawn outweighs superseded. */
    public Status status() {
        Status status = Status.CURRENT;
        for (LogRecord later : about) {
            if (later.kind() == RecordKind.WITHDRAWN) {
                return Status.WITHDRAWN;
            }
            if (later.kind() == RecordKind.SUPERSEDED) {
                status = Status.SUPERSEDED;
            }
        }
        return status;
    }
}
