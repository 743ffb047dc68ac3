package org.saddlebook.register.api;

import java.io.IOException;
import java.io.InputStream;
import java.util.List;
import java.util.Optional;
import org.osgi.annotation.versioning.ProviderType;
import org.saddlebook.api.service.Progress;
import org.saddlebook.api.task.Cancelled;

/** An open register: the rules of the log over a store. Belongs to one thread at a time; close it. */
@ProviderType
public interface Register extends AutoCloseable {
    /** Where it is. */
    String location();

    /**
     * Stores the parts and appends the record. When it returns, the record is safely stored.
     *
     * @param draft an entry ({@link Draft#entered} or {@link Draft#superseding}); its own list of parts is replaced
     * @param parts the files, at least one
     * @throws IOException when a part cannot be read or the register refuses the draft
     */
    Receipt enter(Draft draft, List<PartFile> parts) throws IOException;

    /**
     * Appends a record about an entry: a review or a withdrawal.
     *
     * @throws RegisterException when there is no such entry or the record does not fit its state
     */
    Receipt append(Draft draft) throws RegisterException;

    /** Every entry with what was recorded about it, in order of number. */
    List<Entry> list() throws RegisterException;

    /** One entry; a number that is no entry is a {@link RegisterException} that says what the number is. */
    Entry show(long number) throws RegisterException;

    /** The part of an entry with this name, for example {@code findings.json}. */
    Optional<PartEntry> part(Entry entry, String name);

    /**
     * The bytes of a part. They are checked while they are read: at the end of a stream whose bytes do not have the
     * stated hash stands a {@link RegisterException}.
     */
    InputStream open(PartEntry part) throws RegisterException;

    /** The whole of a part, checked. */
    byte[] read(PartEntry part) throws IOException;

    /** The tree over all records as stored. */
    Head head() throws RegisterException;

    /**
     * Reads everything again: each leaf, each head, each part, the numbers and the rules.
     *
     * @param kept heads kept outside that the register must still contain
     */
    Verification verify(List<Checkpoint> kept, Progress progress) throws RegisterException, Cancelled;

    /** The proof that record {@code number} is in the present tree, from the leaf upwards. */
    List<Digest> inclusionProof(long number) throws RegisterException;

    /** The proof that the tree of the first {@code size} records was kept unchanged in the present tree. */
    List<Digest> consistencyProof(long size) throws RegisterException;

    /** The files of an export of one entry, readable and checkable without this program. */
    Export export(long number) throws RegisterException;

    @Override
    void close() throws RegisterException;
}
