package org.saddlebook.register.sqlite.internal;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.ArrayList;
import java.util.List;
import java.util.Properties;
import java.util.Spliterator;
import java.util.Spliterators;
import java.util.stream.Stream;
import java.util.stream.StreamSupport;
import org.saddlebook.register.api.Digest;
import org.saddlebook.register.api.Draft;
import org.saddlebook.register.api.Head;
import org.saddlebook.register.api.PartEntry;
import org.saddlebook.register.api.Receipt;
import org.saddlebook.register.api.RegisterDamagedException;
import org.saddlebook.register.api.RegisterException;
import org.saddlebook.register.api.RegisterStore;
import org.saddlebook.register.api.RegisterStoreFactory.Opening;
import org.saddlebook.register.api.SealedRecord;
import org.saddlebook.register.api.Sealer;
import org.sqlite.JDBC;
import org.sqlite.SQLiteConfig;

/** A register in one SQLite file. */
final class SqliteStore implements RegisterStore {
    /** How long a process waits for another to finish writing, seconds. */
    static final int PATIENCE_SECONDS = 120;

    private final Path file;
    /** Package-private so that tests can tighten its limits. */
    final Connection connection;

    private SqliteStore(Path file, Connection connection) {
        this.file = file;
        this.connection = connection;
    }

    static SqliteStore open(Path file, Opening opening) throws RegisterException {
        Connection connection = null;
        try {
            // By class: the DriverManager does not see drivers of other bundles.
            connection = new JDBC().connect("jdbc:sqlite:" + file, properties());
            settle(connection);
            Schema.open(connection, file, opening);
            SqliteStore store = new SqliteStore(file, connection);
            connection = null;
            return store;
        } catch (SQLException e) {
            throw Failures.opening(file, e);
        } finally {
            if (connection != null) {
                closeQuietly(connection);
            }
        }
    }

    private static Properties properties() {
        SQLiteConfig config = new SQLiteConfig();
        config.setBusyTimeout(PATIENCE_SECONDS * 1000);
        return config.toProperties();
    }

    /**
     * Rollback journal, so that a file copied while nobody writes is a whole register. EXTRA does all that FULL does and
     * also syncs the folder after the journal is removed; without that, a power cut right after a commit can bring the
     * journal back and undo it (SQLite manual, "PRAGMA synchronous").
     */
    private static void settle(Connection connection) throws SQLException {
        try (Statement statement = connection.createStatement()) {
            statement.execute("PRAGMA journal_mode = DELETE");
            statement.execute("PRAGMA synchronous = EXTRA");
            statement.execute("PRAGMA fullfsync = ON");
            statement.execute("PRAGMA trusted_schema = OFF");
            statement.execute("PRAGMA cell_size_check = ON");
        }
    }

    @Override
    public String location() {
        return file.toString();
    }

    @Override
    public void put(Digest part, InputStream bytes) throws RegisterException {
        try {
            if (pieces(part) >= 0) {
                return;
            }
            begin();
            try {
                if (pieces(part) < 0) {
                    insert(part, bytes);
                }
                commit();
            } catch (SQLException | IOException e) {
                rollBack(connection, e);
                throw e;
            }
        } catch (SQLException e) {
            throw Failures.of(file, e);
        } catch (RegisterException e) {
            throw e;
        } catch (IOException e) {
            throw new RegisterException("A file cannot be read: " + Failures.reason(e) + ". Nothing was recorded.", e);
        }
    }

    private void insert(Digest part, InputStream bytes) throws SQLException, IOException {
        long pieces = 0;
        try (PreparedStatement insert =
                connection.prepareStatement("INSERT INTO pieces (sha256, piece, bytes) VALUES (?, ?, ?)")) {
            for (byte[] piece = bytes.readNBytes(PIECE_BYTES);
                    piece.length > 0;
                    piece = bytes.readNBytes(PIECE_BYTES)) {
                insert.setBytes(1, part.bytes());
                insert.setLong(2, pieces);
                insert.setBytes(3, piece);
                insert.executeUpdate();
                pieces++;
            }
        }
        try (PreparedStatement insert =
                connection.prepareStatement("INSERT INTO parts (sha256, pieces) VALUES (?, ?)")) {
            insert.setBytes(1, part.bytes());
            insert.setLong(2, pieces);
            insert.executeUpdate();
        }
    }

    /** Number of pieces of a part; -1 when it is not stored. */
    private long pieces(Digest part) throws SQLException {
        try (PreparedStatement select = connection.prepareStatement("SELECT pieces FROM parts WHERE sha256 = ?")) {
            select.setBytes(1, part.bytes());
            try (ResultSet row = select.executeQuery()) {
                return row.next() ? row.getLong(1) : -1;
            }
        }
    }

    @Override
    public InputStream part(Digest part) throws RegisterException {
        try {
            long pieces = pieces(part);
            if (pieces < 0) {
                throw new RegisterDamagedException("The part with SHA-256 " + part + " is not in " + file + ".");
            }
            return new PieceStream(pieces, piece -> piece(part, piece));
        } catch (SQLException e) {
            throw Failures.of(file, e);
        }
    }

    private byte[] piece(Digest part, long piece) throws RegisterException {
        try (PreparedStatement select =
                connection.prepareStatement("SELECT bytes FROM pieces WHERE sha256 = ? AND piece = ?")) {
            select.setBytes(1, part.bytes());
            select.setLong(2, piece);
            try (ResultSet row = select.executeQuery()) {
                byte[] bytes = row.next() ? row.getBytes(1) : null;
                if (bytes == null) {
                    throw new RegisterDamagedException(
                            "Piece " + piece + " of the part with SHA-256 " + part + " is not in " + file + ".");
                }
                return bytes;
            }
        } catch (SQLException e) {
            throw Failures.of(file, e);
        }
    }

    @Override
    public List<Digest> parts() throws RegisterException {
        List<Digest> parts = new ArrayList<>();
        try (Statement statement = connection.createStatement();
                ResultSet rows = statement.executeQuery("SELECT sha256 FROM parts ORDER BY sha256")) {
            while (rows.next()) {
                parts.add(Rows.digest(rows.getBytes(1)));
            }
        } catch (SQLException e) {
            throw Failures.of(file, e);
        }
        return parts;
    }

    @Override
    public Receipt append(Draft draft, Sealer sealer) throws RegisterException {
        try {
            begin();
            try {
                for (PartEntry part : draft.parts()) {
                    if (pieces(part.sha256()) < 0) {
                        throw new RegisterException("The part " + part.name() + " is not stored yet.");
                    }
                }
                Head head = Rows.head(connection);
                SealedRecord sealed = sealer.seal(draft, head);
                Rows.insert(connection, sealed);
                commit();
                return sealed.receipt();
            } catch (SQLException | RegisterException | RuntimeException e) {
                rollBack(connection, e);
                throw e;
            }
        } catch (SQLException e) {
            throw Failures.of(file, e);
        }
    }

    /** Takes the write lock at once, so that the head read next is that of the last record and stays so. */
    private void begin() throws SQLException {
        execute("BEGIN IMMEDIATE");
    }

    private void commit() throws SQLException {
        execute("COMMIT");
    }

    private void execute(String sql) throws SQLException {
        try (Statement statement = connection.createStatement()) {
            statement.execute(sql);
        }
    }

    static void rollBack(Connection connection, Exception cause) {
        try (Statement statement = connection.createStatement()) {
            statement.execute("ROLLBACK");
        } catch (SQLException e) {
            cause.addSuppressed(e); // SQLite has rolled back already, as it does when the disk is full
        }
    }

    @Override
    public Stream<SealedRecord> records(long from) {
        Rows.Pages pages = new Rows.Pages(connection, file, from);
        return StreamSupport.stream(
                Spliterators.spliteratorUnknownSize(pages, Spliterator.ORDERED | Spliterator.NONNULL), false);
    }

    @Override
    public List<String> check() throws RegisterException {
        try {
            List<String> findings = new ArrayList<>();
            try (Statement statement = connection.createStatement();
                    ResultSet rows = statement.executeQuery("PRAGMA integrity_check")) {
                while (rows.next()) {
                    if (!"ok".equals(rows.getString(1))) {
                        findings.add("The file is damaged: " + rows.getString(1).replace('\n', ' ') + ".");
                    }
                }
            }
            findings.addAll(Schema.differences(connection));
            long given = Schema.number(connection, "SELECT seq FROM sqlite_sequence WHERE name = 'records'");
            long last = Schema.number(connection, "SELECT max(number) FROM records");
            for (long lost = last + 1; lost <= given; lost++) {
                findings.add("Record " + lost + " was removed from the end.");
            }
            if (given < last) {
                findings.add(
                        "The file says that " + given + " numbers were given, and there is a record " + last + ".");
            }
            return findings;
        } catch (SQLException e) {
            RegisterException failure = Failures.of(file, e);
            if (failure instanceof RegisterDamagedException) {
                return List.of(failure.getMessage());
            }
            throw failure;
        }
    }

    @Override
    public void close() throws RegisterException {
        try {
            connection.close();
        } catch (SQLException e) {
            throw Failures.of(file, e);
        }
    }

    private static void closeQuietly(Connection connection) {
        try {
            connection.close();
        } catch (SQLException e) {
            return; // another failure is on its way to the user already
        }
    }
}
