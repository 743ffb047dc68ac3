package org.saddlebook.register.sqlite.internal;

import java.io.IOException;
import java.io.InputStream;
import java.util.Objects;

/** The pieces of a part, one after the other; one is in memory at a time. */
final class PieceStream extends InputStream {
    /** Reads one piece, from 0. */
    @FunctionalInterface
    interface Pieces {
        byte[] read(long piece) throws IOException;
    }

    private final long count;
    private final Pieces pieces;
    private byte[] current = new byte[0];
    private int position;
    private long next;

    PieceStream(long count, Pieces pieces) {
        this.count = count;
        this.pieces = pieces;
    }

    @Override
    public int read() throws IOException {
        return fill() ? current[position++] & 0xff : -1;
    }

    @Override
    public int read(byte[] buffer, int offset, int length) throws IOException {
        Objects.checkFromIndexSize(offset, length, buffer.length);
        if (length == 0) {
            return 0;
        }
        if (!fill()) {
            return -1;
        }
        int taken = Math.min(length, current.length - position);
        System.arraycopy(current, position, buffer, offset, taken);
        position += taken;
        return taken;
    }

    private boolean fill() throws IOException {
        while (position == current.length && next < count) {
            current = pieces.read(next++);
            position = 0;
        }
        return position < current.length;
    }
}
