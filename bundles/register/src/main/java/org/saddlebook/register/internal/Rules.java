package org.saddlebook.register.internal;

import java.time.Clock;
import java.time.temporal.ChronoUnit;
import java.util.List;
import org.saddlebook.register.api.Digest;
import org.saddlebook.register.api.Draft;
import org.saddlebook.register.api.Head;
import org.saddlebook.register.api.LogRecord;
import org.saddlebook.register.api.MerkleTree;
import org.saddlebook.register.api.Receipt;
import org.saddlebook.register.api.RecordKind;
import org.saddlebook.register.api.RegisterException;
import org.saddlebook.register.api.RegisterStore;
import org.saddlebook.register.api.SealedRecord;
import org.saddlebook.register.api.Sealer;

/** What may be recorded, and how a draft becomes a record. Runs while no other writer can append. */
final class Rules implements Sealer {
    private final RegisterStore store;
    private final Clock clock;

    Rules(RegisterStore store, Clock clock) {
        this.store = store;
        this.clock = clock;
    }

    @Override
    public SealedRecord seal(Draft draft, Head head) throws RegisterException {
        long number = head.size() + 1;
        if (draft.target().isPresent()) {
            checkTarget(draft, draft.target().getAsLong());
        }
        LogRecord record = new LogRecord(
                number,
                draft.kind(),
                clock.instant().truncatedTo(ChronoUnit.MILLIS),
                draft.actor(),
                draft.title(),
                draft.meaning(),
                draft.reason(),
                draft.target(),
                draft.parts());
        byte[] bytes = canonical(record);
        Digest leaf = MerkleTree.leaf(bytes);
        return new SealedRecord(bytes, new Receipt(number, leaf, head.grow(leaf)));
    }

    private static byte[] canonical(LogRecord record) throws RegisterException {
        try {
            return RecordJson.canonical(record);
        } catch (IllegalArgumentException e) {
            throw new RegisterException(
                    "A name, meaning, reason or title has no UTF-8 form (" + e.getMessage() + "). Type it again.", e);
        }
    }

    private void checkTarget(Draft draft, long target) throws RegisterException {
        if (draft.kind() == RecordKind.REVIEWED && draft.meaning().isBlank()) {
            throw new RegisterException("A review says what it means. Give it with --meaning.");
        }
        if (draft.kind() == RecordKind.WITHDRAWN && draft.reason().isBlank()) {
            throw new RegisterException("A withdrawal says why. Give the reason with --reason.");
        }
        List<LogRecord> records = target < 1 ? List.of() : Records.from(store, target);
        LogRecord first = records.isEmpty() ? null : records.get(0);
        if (first == null || first.number() != target) {
            throw new RegisterException("There is no record " + target + " in " + store.location() + ".");
        }
        if (!first.kind().isEntry()) {
            throw new RegisterException("Record " + target + " is no entry: it says that entry "
                    + first.target().getAsLong() + " is " + first.kind().key() + ".");
        }
        for (LogRecord later : records) {
            if (later.target().isPresent() && later.target().getAsLong() == target) {
                checkState(draft, later, target);
            }
        }
    }

    private static void checkState(Draft draft, LogRecord later, long target) throws RegisterException {
        if (later.kind() == RecordKind.WITHDRAWN) {
            throw new RegisterException("Entry " + target + " was withdrawn by record " + later.number() + " of "
                    + later.actor() + "; nothing more can be recorded about it.");
        }
        if (later.kind() == RecordKind.SUPERSEDED && draft.kind() == RecordKind.SUPERSEDED) {
            throw new RegisterException("Entry " + target + " is already superseded by entry " + later.number()
                    + ". Supersede entry " + later.number() + " instead.");
        }
    }
}
