package org.saddlebook.register.internal;

import java.io.FilterInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.security.MessageDigest;
import org.saddlebook.register.api.Digest;
import org.saddlebook.register.api.PartEntry;
import org.saddlebook.register.api.RegisterDamagedException;

/** A stream that ends only when what was read has the stated size and hash; otherwise it fails at its end. */
final class CheckedStream extends FilterInputStream {
    private final PartEntry part;
    private final String complaint;
    private final MessageDigest sha = Digest.algorithm();
    private long size;
    private boolean ended;

    /** A stream that fails with {@code complaint} when the bytes are not those of the part. */
    CheckedStream(InputStream in, PartEntry part, String complaint) {
        super(in);
        this.part = part;
        this.complaint = complaint;
    }

    @Override
    public int read() throws IOException {
        byte[] one = new byte[1];
        return read(one, 0, 1) < 0 ? -1 : one[0] & 0xff;
    }

    @Override
    public int read(byte[] buffer, int offset, int length) throws IOException {
        int count = super.read(buffer, offset, length);
        if (count > 0) {
            sha.update(buffer, offset, count);
            size += count;
        } else if (count < 0 && !ended) {
            ended = true;
            if (size != part.size() || !Digest.of(sha.digest()).equals(part.sha256())) {
                throw new RegisterDamagedException(complaint);
            }
        }
        return count;
    }

    @Override
    public long skip(long count) throws IOException {
        byte[] sink = new byte[(int) Math.min(8192, Math.max(0, count))];
        return Math.max(0, read(sink, 0, sink.length));
    }

    @Override
    public boolean markSupported() {
        return false;
    }
}
