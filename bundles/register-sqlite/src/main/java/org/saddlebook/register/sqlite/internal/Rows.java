package org.saddlebook.register.sqlite.internal;

import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Deque;
import java.util.Iterator;
import java.util.List;
import java.util.NoSuchElementException;
import org.saddlebook.register.api.Digest;
import org.saddlebook.register.api.Head;
import org.saddlebook.register.api.Receipt;
import org.saddlebook.register.api.RegisterDamagedException;
import org.saddlebook.register.api.RegisterException;
import org.saddlebook.register.api.SealedRecord;

/** Records as rows. */
final class Rows {
    private static final String COLUMNS = "SELECT number, record, leaf, root, peaks FROM records ";
    private static final int PAGE = 256;

    private Rows() {}

    /** The head of the last record. */
    static Head head(Connection connection) throws SQLException, RegisterDamagedException {
        try (Statement statement = connection.createStatement();
                ResultSet row = statement.executeQuery(COLUMNS + "ORDER BY number DESC LIMIT 1")) {
            return row.next() ? read(row).receipt().head() : Head.EMPTY;
        }
    }

    static void insert(Connection connection, SealedRecord sealed) throws SQLException {
        Head head = sealed.receipt().head();
        byte[] peaks = new byte[32 * head.peaks().size()];
        for (int i = 0; i < head.peaks().size(); i++) {
            System.arraycopy(head.peaks().get(i).bytes(), 0, peaks, 32 * i, 32);
        }
        try (PreparedStatement insert = connection.prepareStatement(
                "INSERT INTO records (number, record, leaf, root, peaks) VALUES (?, ?, ?, ?, ?)")) {
            insert.setLong(1, sealed.number());
            insert.setBytes(2, sealed.bytes());
            insert.setBytes(3, sealed.receipt().leaf().bytes());
            insert.setBytes(4, head.root().bytes());
            insert.setBytes(5, peaks);
            insert.executeUpdate();
        }
    }

    private static SealedRecord read(ResultSet row) throws SQLException, RegisterDamagedException {
        long number = row.getLong(1);
        try {
            byte[] peaks = bytes(row, 5);
            List<Digest> list = new ArrayList<>();
            for (int i = 0; i < peaks.length; i += 32) {
                list.add(digest(Arrays.copyOfRange(peaks, i, Math.min(peaks.length, i + 32))));
            }
            Head head = new Head(number, digest(row.getBytes(4)), list);
            return new SealedRecord(bytes(row, 2), new Receipt(number, digest(row.getBytes(3)), head));
        } catch (IllegalArgumentException | RegisterDamagedException e) {
            throw new RegisterDamagedException(
                    "What is stored with record " + number + " cannot be read: " + e.getMessage()
                            + ". The records after it were not looked at.",
                    e);
        }
    }

    private static byte[] bytes(ResultSet row, int column) throws SQLException, RegisterDamagedException {
        byte[] bytes = row.getBytes(column);
        if (bytes == null) {
            throw new RegisterDamagedException("column " + column + " is empty");
        }
        return bytes;
    }

    static Digest digest(byte[] bytes) throws RegisterDamagedException {
        if (bytes == null || bytes.length != 32) {
            throw new RegisterDamagedException(
                    "A stored hash has " + (bytes == null ? "no bytes" : bytes.length + " bytes") + " instead of 32.");
        }
        return Digest.of(bytes);
    }

    /**
     * Reads records page by page, so that no lock is held while a slow caller looks at them; records are only ever
     * added, so the pages fit together.
     */
    static final class Pages implements Iterator<SealedRecord> {
        private final Connection connection;
        private final Path file;
        private final Deque<SealedRecord> page = new ArrayDeque<>();
        private long next;
        private boolean ended;

        Pages(Connection connection, Path file, long from) {
            this.connection = connection;
            this.file = file;
            this.next = from;
        }

        @Override
        public boolean hasNext() {
            if (page.isEmpty() && !ended) {
                try {
                    fill();
                } catch (SQLException e) {
                    throw new UncheckedIOException(Failures.of(file, e));
                } catch (RegisterException e) {
                    throw new UncheckedIOException(e);
                }
            }
            return !page.isEmpty();
        }

        private void fill() throws SQLException, RegisterException {
            try (PreparedStatement select =
                    connection.prepareStatement(COLUMNS + "WHERE number >= ? ORDER BY number LIMIT " + PAGE)) {
                select.setLong(1, next);
                try (ResultSet rows = select.executeQuery()) {
                    while (rows.next()) {
                        page.add(read(rows));
                    }
                }
            }
            ended = page.size() < PAGE;
            next = page.isEmpty() ? next : page.getLast().number() + 1;
        }

        @Override
        public SealedRecord next() {
            if (!hasNext()) {
                throw new NoSuchElementException();
            }
            return page.remove();
        }
    }
}
