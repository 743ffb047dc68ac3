package org.saddlebook.register.sqlite.internal;

import java.nio.file.Path;
import java.sql.Connection;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.saddlebook.register.api.RegisterException;
import org.saddlebook.register.api.RegisterStoreFactory.Opening;

/** The tables of a register file, and how it is known as one. */
final class Schema {
    /** Marks the file as ours in its header (bytes 68 to 71): "Sdbk". */
    static final int APPLICATION_ID = 0x5364626b;

    /** Version of the tables; raised with each change, and every earlier one stays readable. */
    static final int VERSION = 1;

    /**
     * The triggers keep honest programs from changing what is recorded. They cannot stop somebody with an editor: the
     * hashes tell on him.
     */
    private static final List<String> STATEMENTS = List.of(
            "CREATE TABLE schema_version (version INTEGER NOT NULL)",
            "CREATE TABLE parts (sha256 BLOB PRIMARY KEY, pieces INTEGER NOT NULL) WITHOUT ROWID",
            "CREATE TABLE pieces (sha256 BLOB NOT NULL, piece INTEGER NOT NULL, bytes BLOB NOT NULL,"
                    + " UNIQUE (sha256, piece))",
            "CREATE TABLE records (number INTEGER PRIMARY KEY AUTOINCREMENT, record BLOB NOT NULL, leaf BLOB NOT NULL,"
                    + " root BLOB NOT NULL, peaks BLOB NOT NULL)",
            "CREATE TRIGGER records_keep BEFORE DELETE ON records"
                    + " BEGIN SELECT RAISE(ABORT, 'a register is append-only'); END",
            "CREATE TRIGGER records_stay BEFORE UPDATE ON records"
                    + " BEGIN SELECT RAISE(ABORT, 'a register is append-only'); END",
            "CREATE TRIGGER pieces_keep BEFORE DELETE ON pieces"
                    + " BEGIN SELECT RAISE(ABORT, 'a register is append-only'); END",
            "CREATE TRIGGER pieces_stay BEFORE UPDATE ON pieces"
                    + " BEGIN SELECT RAISE(ABORT, 'a register is append-only'); END");

    private Schema() {}

    /** Makes the tables in a new file when asked to, and refuses a file that is not a register of this or an older version. */
    static void open(Connection connection, Path file, Opening opening) throws SQLException, RegisterException {
        if (isEmpty(connection)) {
            if (opening == Opening.EXISTING) {
                throw new RegisterException("There is no register at " + file
                        + ": the file is empty. \"enter\" makes one; --register names another.");
            }
            create(connection);
        }
        if (number(connection, "PRAGMA application_id") != APPLICATION_ID) {
            throw new RegisterException(
                    file + " is a database of another program, not a register. Name a register with --register.");
        }
        long version = number(connection, "SELECT max(version) FROM schema_version");
        if (version > VERSION) {
            throw new RegisterException("The register " + file + " was written by a newer version (its schema is "
                    + version + ", this one knows up to " + VERSION + "). Use the newer version; nothing was changed.");
        }
    }

    private static void create(Connection connection) throws SQLException {
        try (Statement statement = connection.createStatement()) {
            statement.execute("BEGIN IMMEDIATE");
            try {
                if (isEmpty(connection)) { // else another process was first
                    statement.execute("PRAGMA application_id = " + APPLICATION_ID);
                    for (String sql : STATEMENTS) {
                        statement.execute(sql);
                    }
                    statement.execute("INSERT INTO schema_version (version) VALUES (" + VERSION + ")");
                }
                statement.execute("COMMIT");
            } catch (SQLException e) {
                SqliteStore.rollBack(connection, e);
                throw e;
            }
        }
    }

    private static boolean isEmpty(Connection connection) throws SQLException {
        return number(connection, "SELECT count(*) FROM sqlite_master") == 0;
    }

    static long number(Connection connection, String sql) throws SQLException {
        try (Statement statement = connection.createStatement();
                ResultSet row = statement.executeQuery(sql)) {
            return row.next() ? row.getLong(1) : 0;
        }
    }

    /** What was taken from, added to or changed in the tables and triggers. */
    static List<String> differences(Connection connection) throws SQLException {
        Map<String, String> expected = new TreeMap<>();
        for (String sql : STATEMENTS) {
            expected.put(sql.split(" ", 4)[2], sql);
        }
        List<String> findings = new ArrayList<>();
        try (Statement statement = connection.createStatement();
                ResultSet rows = statement.executeQuery(
                        "SELECT name, sql FROM sqlite_master WHERE name NOT LIKE 'sqlite\\_%' ESCAPE '\\' ORDER BY name")) {
            while (rows.next()) {
                String name = rows.getString(1);
                String known = expected.remove(name);
                if (known == null) {
                    findings.add("The file has \"" + name + "\", which is no part of a register.");
                } else if (!known.equals(rows.getString(2))) {
                    findings.add("The definition of \"" + name + "\" in the file was changed.");
                }
            }
        }
        for (String missing : expected.keySet()) {
            findings.add("\"" + missing + "\" was removed from the file.");
        }
        return findings;
    }
}
