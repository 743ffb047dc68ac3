package org.saddlebook.register.api;

import java.io.InputStream;
import java.util.List;
import java.util.stream.Stream;
import org.osgi.annotation.versioning.ConsumerType;

/**
 * Keeps sealed records and parts and knows nothing of their meaning. What a method has returned from survives the death
 * of the process. Several processes may use one store at once; each store object belongs to one thread at a time.
 */
@ConsumerType
public interface RegisterStore extends AutoCloseable {
    /** The largest piece a part may be stored in, bytes. */
    int PIECE_BYTES = 4 * 1024 * 1024;

    /** Where it is, for messages. */
    String location();

    /**
     * Stores a part, in pieces of at most {@link #PIECE_BYTES}; does nothing when a part with this digest is there
     * already. A part is stored whole or not at all. The caller answers for the digest.
     */
    void put(Digest part, InputStream bytes) throws RegisterException;

    /** The bytes of a part, as stored; a missing part is a {@link RegisterDamagedException}. */
    InputStream part(Digest part) throws RegisterException;

    /** Every part stored. */
    List<Digest> parts() throws RegisterException;

    /**
     * Appends one record. While the sealer runs, no other writer of any process can append; the head it is given is that
     * of the last record. Every part the draft names must be stored.
     *
     * @return the receipt, after the record is safely stored
     */
    Receipt append(Draft draft, Sealer sealer) throws RegisterException;

    /**
     * The records with at least this number, in order of number, unchecked; close the stream. What goes wrong while
     * it is read arrives as an {@link java.io.UncheckedIOException} around a {@link RegisterException}.
     */
    Stream<SealedRecord> records(long from) throws RegisterException;

    /**
     * What the store itself can tell to be wrong with what it keeps, such as a damaged page or a lost last record; empty
     * when nothing.
     */
    List<String> check() throws RegisterException;

    @Override
    void close() throws RegisterException;
}
