package org.saddlebook.register.internal;

import java.io.IOException;
import java.io.InputStream;
import java.security.MessageDigest;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalLong;
import java.util.Set;
import org.saddlebook.api.service.Progress;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.register.api.Checkpoint;
import org.saddlebook.register.api.Digest;
import org.saddlebook.register.api.Head;
import org.saddlebook.register.api.LogRecord;
import org.saddlebook.register.api.MerkleTree;
import org.saddlebook.register.api.PartEntry;
import org.saddlebook.register.api.RecordKind;
import org.saddlebook.register.api.RegisterDamagedException;
import org.saddlebook.register.api.RegisterException;
import org.saddlebook.register.api.RegisterStore;
import org.saddlebook.register.api.SealedRecord;
import org.saddlebook.register.api.Verification;
import org.saddlebook.register.api.Verification.Difference;

/** Reads a whole register again and names what does not agree. One object per run. */
final class Verifier {
    private final RegisterStore store;
    private final List<Checkpoint> kept;
    private final Progress progress;
    private final List<Difference> differences = new ArrayList<>();
    private final Map<Long, RecordKind> kinds = new HashMap<>();
    private final Map<Digest, List<Use>> uses = new LinkedHashMap<>();
    private final Map<Long, Digest> roots = new HashMap<>();
    private Head stored = Head.EMPTY;
    private Head recomputed = Head.EMPTY;
    private long records;
    private long bytes;

    /** Where a part is named. */
    private record Use(long number, PartEntry part) {}

    Verifier(RegisterStore store, List<Checkpoint> kept, Progress progress) {
        this.store = store;
        this.kept = List.copyOf(kept);
        this.progress = progress;
    }

    Verification run() throws RegisterException, Cancelled {
        for (String finding : store.check()) {
            differ("store-damaged", OptionalLong.empty(), finding);
        }
        progress.check();
        try {
            Records.each(store, 1, this::record);
        } catch (RegisterDamagedException e) {
            differ("store-damaged", OptionalLong.empty(), e.getMessage());
        }
        progress.report(0.1, "checking parts");
        int done = 0;
        for (Map.Entry<Digest, List<Use>> part : uses.entrySet()) {
            progress.check();
            part(part.getKey(), part.getValue());
            done++;
            progress.report(0.1 + 0.9 * done / uses.size(), "checking parts");
        }
        checkpoints();
        return new Verification(records, uses.size(), bytes, recomputed, unreferenced(), differences);
    }

    private void record(SealedRecord sealed) throws RegisterException {
        long number = sealed.number();
        records++;
        boolean next = number == stored.size() + 1;
        for (long missing = stored.size() + 1; missing < number; missing++) {
            differ("record-missing", OptionalLong.of(missing), "Record " + missing + " is missing.");
        }
        byte[] content = sealed.bytes();
        Digest leaf = MerkleTree.leaf(content);
        if (!leaf.equals(sealed.receipt().leaf())) {
            differ(
                    "record-changed",
                    OptionalLong.of(number),
                    "Record " + number + " was changed: its bytes give the leaf hash " + leaf + ", sealed was "
                            + sealed.receipt().leaf() + ".");
        }
        if (next
                && !stored.grow(sealed.receipt().leaf()).equals(sealed.receipt().head())) {
            differ(
                    "head-changed",
                    OptionalLong.of(number),
                    "The tree stored with record " + number + " does not follow from the one before it: the record "
                            + "was moved, or its leaf hash or its tree was changed.");
        }
        // Each break is named once, where it is: the next record is held to what is stored with this one.
        stored = sealed.receipt().head();
        recomputed = recomputed.grow(leaf);
        roots.put(recomputed.size(), recomputed.root());
        try {
            content(number, RecordJson.read(number, content), content);
        } catch (RegisterException e) {
            differ("record-unreadable", OptionalLong.of(number), e.getMessage());
        }
    }

    private void content(long number, LogRecord record, byte[] content) {
        if (record.number() != number) {
            differ(
                    "record-moved",
                    OptionalLong.of(number),
                    "In the place of record " + number + " stands record " + record.number() + ".");
        }
        if (!Arrays.equals(RecordJson.canonical(record), content)) {
            differ(
                    "record-not-canonical",
                    OptionalLong.of(number),
                    "Record " + number + " is not in the canonical form of RFC 8785.");
        }
        if (record.target().isPresent()) {
            RecordKind target = kinds.get(record.target().getAsLong());
            if (target == null || !target.isEntry()) {
                differ(
                        "target-missing",
                        OptionalLong.of(number),
                        "Record " + number + " says that entry "
                                + record.target().getAsLong() + " is "
                                + record.kind().key() + ", and there is no such entry.");
            }
        }
        kinds.put(number, record.kind());
        for (PartEntry part : record.parts()) {
            uses.computeIfAbsent(part.sha256(), digest -> new ArrayList<>()).add(new Use(number, part));
        }
    }

    private void part(Digest digest, List<Use> named) throws RegisterException {
        MessageDigest sha = Digest.algorithm();
        long size = 0;
        try (InputStream in = store.part(digest)) {
            byte[] buffer = new byte[64 * 1024];
            for (int count = in.read(buffer); count >= 0; count = in.read(buffer)) {
                sha.update(buffer, 0, count);
                size += count;
            }
        } catch (RegisterDamagedException e) {
            for (Use use : named) {
                differ(
                        "part-missing",
                        OptionalLong.of(use.number()),
                        "The part " + use.part().name() + " of record " + use.number() + " cannot be read: "
                                + e.getMessage());
            }
            return;
        } catch (RegisterException e) {
            throw e; // a lock or a failing disk is no difference
        } catch (IOException e) {
            throw new RegisterException("A part cannot be read: " + e.getMessage(), e);
        }
        bytes += size;
        Digest found = Digest.of(sha.digest());
        for (Use use : named) {
            if (!found.equals(digest) || size != use.part().size()) {
                differ(
                        "part-changed",
                        OptionalLong.of(use.number()),
                        "The part " + use.part().name() + " of record " + use.number() + " was changed: found "
                                + size + " bytes with SHA-256 " + found + ", entered were "
                                + use.part().size() + " bytes with SHA-256 " + digest + ".");
            }
        }
    }

    private void checkpoints() {
        for (Checkpoint checkpoint : kept) {
            if (checkpoint.size() > recomputed.size()) {
                differ(
                        "records-lost",
                        OptionalLong.empty(),
                        "The checkpoint kept outside is of " + checkpoint.size() + " records, and the register has "
                                + recomputed.size() + ": records were removed from its end.");
            } else if (!checkpoint.root().equals(root(checkpoint.size()))) {
                differ(
                        "history-changed",
                        OptionalLong.empty(),
                        "The first " + checkpoint.size() + " records have the root hash " + root(checkpoint.size())
                                + ", and the checkpoint kept outside says " + checkpoint.root() + ".");
            }
        }
    }

    private Digest root(long size) {
        return size == 0 ? Head.EMPTY.root() : roots.get(size);
    }

    private long unreferenced() throws RegisterException {
        Set<Digest> rest;
        try {
            rest = new HashSet<>(store.parts());
        } catch (RegisterDamagedException e) {
            differ("store-damaged", OptionalLong.empty(), e.getMessage());
            return 0;
        }
        rest.removeAll(uses.keySet());
        return rest.size();
    }

    private void differ(String code, OptionalLong number, String message) {
        differences.add(new Difference(code, number, message));
    }
}
