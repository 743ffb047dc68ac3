package org.saddlebook.register.internal;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.saddlebook.register.api.Digest;
import org.saddlebook.register.api.Draft;
import org.saddlebook.register.api.PartEntry;
import org.saddlebook.register.api.Receipt;
import org.saddlebook.register.api.RegisterDamagedException;
import org.saddlebook.register.api.RegisterException;
import org.saddlebook.register.api.RegisterStore;
import org.saddlebook.register.api.SealedRecord;
import org.saddlebook.register.api.Sealer;

/** A store in memory whose content tests may spoil. */
final class MemoryStore implements RegisterStore {
    final List<SealedRecord> records = new ArrayList<>();
    final Map<Digest, byte[]> parts = new LinkedHashMap<>();

    boolean broken;

    @Override
    public String location() {
        return "memory";
    }

    @Override
    public void put(Digest part, InputStream bytes) throws RegisterException {
        if (!parts.containsKey(part)) {
            try {
                parts.put(part, bytes.readAllBytes());
            } catch (RegisterException e) {
                throw e;
            } catch (IOException e) {
                throw new RegisterException("cannot read", e);
            }
        }
    }

    @Override
    public InputStream part(Digest part) throws RegisterException {
        if (broken) {
            throw new RegisterException("the disk does not answer");
        }
        byte[] bytes = parts.get(part);
        if (bytes == null) {
            throw new RegisterDamagedException("no part " + part);
        }
        return new ByteArrayInputStream(bytes);
    }

    @Override
    public List<Digest> parts() {
        return List.copyOf(parts.keySet());
    }

    @Override
    public Receipt append(Draft draft, Sealer sealer) throws RegisterException {
        for (PartEntry part : draft.parts()) {
            part(part.sha256());
        }
        SealedRecord sealed = sealer.seal(draft, Records.head(records));
        records.add(sealed);
        return sealed.receipt();
    }

    @Override
    public Stream<SealedRecord> records(long from) {
        return List.copyOf(records).stream().filter(record -> record.number() >= from);
    }

    @Override
    public List<String> check() {
        return List.of();
    }

    @Override
    public void close() {}
}
