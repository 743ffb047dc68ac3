package org.saddlebook.register.api;

import java.time.Instant;
import java.util.List;
import java.util.Objects;
import java.util.OptionalLong;

/**
 * A record of the log, read. The members are those of the canonical JSON, which is documented in the README of this
 * bundle.
 *
 * @param number from 1 without gaps
 * @param kind what it says
 * @param time when it was sealed
 * @param actor who acted
 * @param title what an entry is about; empty for records about other records
 * @param meaning what the actor's signature means; empty when not stated
 * @param reason why; empty when not stated
 * @param target number of the earlier entry it is about; absent for {@link RecordKind#ENTERED}
 * @param parts files of the entry
 */
public record LogRecord(
        long number,
        RecordKind kind,
        Instant time,
        String actor,
        String title,
        String meaning,
        String reason,
        OptionalLong target,
        List<PartEntry> parts) {
    /** The schema named in records of this version. */
    public static final String SCHEMA = "saddlebook/register-record/1";

    /** Checks the components. */
    public LogRecord {
        Objects.requireNonNull(kind, "kind");
        Objects.requireNonNull(time, "time");
        Objects.requireNonNull(actor, "actor");
        Objects.requireNonNull(title, "title");
        Objects.requireNonNull(meaning, "meaning");
        Objects.requireNonNull(reason, "reason");
        Objects.requireNonNull(target, "target");
        parts = List.copyOf(parts);
        if (number < 1) {
            throw new IllegalArgumentException("numbers count from 1: " + number);
        }
        if (kind.hasTarget() != target.isPresent()) {
            throw new IllegalArgumentException("a target does not fit the kind " + kind.key());
        }
        if (target.isPresent() && !(target.getAsLong() >= 1 && target.getAsLong() < number)) {
            throw new IllegalArgumentException("a target is an earlier record: " + target.getAsLong());
        }
        if (!kind.isEntry() && !parts.isEmpty()) {
            throw new IllegalArgumentException("parts do not fit the kind " + kind.key());
        }
    }
}
