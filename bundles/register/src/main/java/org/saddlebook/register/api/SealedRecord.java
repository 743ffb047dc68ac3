package org.saddlebook.register.api;

import java.util.Objects;

/** A record as it is stored: canonical bytes (RFC 8785) and the receipt for them. */
public final class SealedRecord {
    private final byte[] bytes;
    private final Receipt receipt;

    /** A record with these canonical bytes. */
    public SealedRecord(byte[] bytes, Receipt receipt) {
        this.bytes = bytes.clone();
        this.receipt = Objects.requireNonNull(receipt, "receipt");
    }

    /** A copy of the canonical bytes; the leaf is SHA-256(0x00 || these). */
    public byte[] bytes() {
        return bytes.clone();
    }

    /** Number, leaf and head. */
    public Receipt receipt() {
        return receipt;
    }

    /** Number of the record, from 1. */
    public long number() {
        return receipt.number();
    }
}
