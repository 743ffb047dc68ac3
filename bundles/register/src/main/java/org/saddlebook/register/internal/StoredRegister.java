package org.saddlebook.register.internal;

import java.io.BufferedInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.security.MessageDigest;
import java.time.Clock;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import org.saddlebook.api.service.Progress;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.register.api.Checkpoint;
import org.saddlebook.register.api.Digest;
import org.saddlebook.register.api.Draft;
import org.saddlebook.register.api.Entry;
import org.saddlebook.register.api.Export;
import org.saddlebook.register.api.Head;
import org.saddlebook.register.api.LogRecord;
import org.saddlebook.register.api.MerkleTree;
import org.saddlebook.register.api.PartEntry;
import org.saddlebook.register.api.PartFile;
import org.saddlebook.register.api.Receipt;
import org.saddlebook.register.api.Register;
import org.saddlebook.register.api.RegisterException;
import org.saddlebook.register.api.RegisterStore;
import org.saddlebook.register.api.SealedRecord;
import org.saddlebook.register.api.Verification;

/** The rules of the log over any store. */
public final class StoredRegister implements Register {
    private final RegisterStore store;
    private final Clock clock;

    /** A register kept in this store, which it closes. */
    public StoredRegister(RegisterStore store, Clock clock) {
        this.store = Objects.requireNonNull(store, "store");
        this.clock = Objects.requireNonNull(clock, "clock");
    }

    @Override
    public String location() {
        return store.location();
    }

    @Override
    public Receipt enter(Draft draft, List<PartFile> files) throws IOException {
        if (!draft.kind().isEntry()) {
            throw new IllegalArgumentException(
                    "a record of kind " + draft.kind().key() + " has no parts");
        }
        if (files.isEmpty()) {
            throw new IllegalArgumentException("an entry has at least one part");
        }
        List<PartEntry> parts = new ArrayList<>();
        for (PartFile file : files) {
            parts.add(measure(file));
        }
        Draft complete = draft.withParts(parts);
        for (int i = 0; i < files.size(); i++) {
            PartEntry part = parts.get(i);
            String complaint = "The file " + part.name() + " changed while it was being entered. Enter it again.";
            try (InputStream in = new CheckedStream(files.get(i).content().open(), part, complaint)) {
                store.put(part.sha256(), in);
            }
        }
        return append(complete);
    }

    private static PartEntry measure(PartFile file) throws IOException {
        MessageDigest sha = Digest.algorithm();
        long size = 0;
        byte[] buffer = new byte[64 * 1024];
        try (InputStream in = file.content().open()) {
            for (int count = in.read(buffer); count >= 0; count = in.read(buffer)) {
                sha.update(buffer, 0, count);
                size += count;
            }
        }
        return new PartEntry(file.name(), file.type(), size, Digest.of(sha.digest()));
    }

    @Override
    public Receipt append(Draft draft) throws RegisterException {
        return store.append(draft, new Rules(store, clock));
    }

    @Override
    public List<Entry> list() throws RegisterException {
        Map<Long, SealedRecord> entries = new LinkedHashMap<>();
        Map<Long, LogRecord> read = new LinkedHashMap<>();
        Map<Long, List<LogRecord>> about = new LinkedHashMap<>();
        Records.each(store, 1, each -> {
            LogRecord record = RecordJson.read(each.number(), each.bytes());
            if (record.kind().isEntry()) {
                entries.put(each.number(), each);
                read.put(each.number(), record);
                about.put(each.number(), new ArrayList<>());
            }
            List<LogRecord> target =
                    record.target().isPresent() ? about.get(record.target().getAsLong()) : null;
            if (target != null) {
                target.add(record);
            }
        });
        List<Entry> list = new ArrayList<>();
        for (Map.Entry<Long, SealedRecord> entry : entries.entrySet()) {
            list.add(new Entry(read.get(entry.getKey()), entry.getValue().receipt(), about.get(entry.getKey())));
        }
        return List.copyOf(list);
    }

    @Override
    public Entry show(long number) throws RegisterException {
        for (Entry entry : list()) {
            if (entry.number() == number) {
                return entry;
            }
        }
        for (LogRecord record : number < 1 ? List.<LogRecord>of() : Records.from(store, number)) {
            if (record.number() == number) {
                throw new RegisterException("Record " + number + " is no entry: it says that entry "
                        + record.target().getAsLong() + " is " + record.kind().key() + ".");
            }
        }
        throw new RegisterException(
                "There is no entry " + number + " in " + location() + ". \"register list\" shows what there is.");
    }

    @Override
    public Optional<PartEntry> part(Entry entry, String name) {
        for (PartEntry part : entry.record().parts()) {
            if (part.name().equals(name)) {
                return Optional.of(part);
            }
        }
        return Optional.empty();
    }

    @Override
    public InputStream open(PartEntry part) throws RegisterException {
        return new CheckedStream(
                new BufferedInputStream(store.part(part.sha256())),
                part,
                "The stored bytes of " + part.name() + " are not those that were entered. Run \"register verify\".");
    }

    @Override
    public byte[] read(PartEntry part) throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream((int) Math.min(part.size(), 1 << 24));
        try (InputStream in = open(part)) {
            in.transferTo(out);
        }
        return out.toByteArray();
    }

    @Override
    public Head head() throws RegisterException {
        return Records.head(Records.all(store));
    }

    @Override
    public Verification verify(List<Checkpoint> kept, Progress progress) throws RegisterException, Cancelled {
        return new Verifier(store, kept, progress).run();
    }

    @Override
    public List<Digest> inclusionProof(long number) throws RegisterException {
        return MerkleTree.inclusionProof(number - 1, leaves(Records.all(store)));
    }

    @Override
    public List<Digest> consistencyProof(long size) throws RegisterException {
        return MerkleTree.consistencyProof(size, leaves(Records.all(store)));
    }

    static List<Digest> leaves(List<SealedRecord> records) {
        List<Digest> leaves = new ArrayList<>(records.size());
        for (SealedRecord record : records) {
            leaves.add(record.receipt().leaf());
        }
        return leaves;
    }

    @Override
    public Export export(long number) throws RegisterException {
        Entry entry = show(number);
        return new Exporter(this, entry, Records.all(store)).export();
    }

    @Override
    public void close() throws RegisterException {
        store.close();
    }
}
