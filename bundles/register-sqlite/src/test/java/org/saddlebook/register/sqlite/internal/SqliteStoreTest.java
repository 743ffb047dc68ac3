package org.saddlebook.register.sqlite.internal;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.sql.Connection;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.time.Clock;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Properties;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.DisabledOnOs;
import org.junit.jupiter.api.condition.OS;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.saddlebook.register.api.Draft;
import org.saddlebook.register.api.Entry;
import org.saddlebook.register.api.PartEntry;
import org.saddlebook.register.api.PartFile;
import org.saddlebook.register.api.Register;
import org.saddlebook.register.api.RegisterDamagedException;
import org.saddlebook.register.api.RegisterException;
import org.saddlebook.register.api.RegisterStore;
import org.saddlebook.register.api.RegisterStoreFactory.Opening;
import org.saddlebook.register.internal.StoredRegister;
import org.sqlite.JDBC;
import org.sqlite.SQLiteConnection;

class SqliteStoreTest {
    @TempDir
    Path folder;

    private Path file() {
        return folder.resolve("lab").resolve("saddlebook.register");
    }

    @Test
    void keepsWhatWasEnteredWhenItIsOpenedAgain() throws Exception {
        byte[] large = new byte[2 * RegisterStore.PIECE_BYTES + 12345];
        new Random(5).nextBytes(large);
        byte[] exact = Arrays.copyOf(large, RegisterStore.PIECE_BYTES);
        List<PartFile> parts = List.of(
                PartFile.of("large.bin", "application/octet-stream", large),
                PartFile.of("exact.bin", "application/octet-stream", exact),
                PartFile.of("empty.txt", "text/plain", new byte[0]));
        try (Register register = Fixture.open(file(), Opening.CREATE)) {
            register.enter(Draft.entered("ada", "größer"), parts);
            register.enter(Draft.superseding("ada", "again", 1), parts);
        }
        try (Register register = Fixture.open(file(), Opening.EXISTING)) {
            Entry entry = register.show(1);
            assertEquals("größer", entry.record().title());
            assertEquals(Entry.Status.SUPERSEDED, entry.status());
            List<PartEntry> entries = entry.record().parts();
            assertArrayEquals(large, register.read(entries.get(0)));
            assertArrayEquals(exact, register.read(entries.get(1)));
            assertArrayEquals(new byte[0], register.read(entries.get(2)));
        }
        assertTrue(Fixture.verify(file()).agrees());
        try (Connection connection = new JDBC().connect("jdbc:sqlite:" + file(), new Properties())) {
            assertEquals(4, Schema.number(connection, "SELECT count(*) FROM pieces"), "3 + 1 + 0, each part once");
            assertEquals(RegisterStore.PIECE_BYTES, Schema.number(connection, "SELECT max(length(bytes)) FROM pieces"));
        }
    }

    @Test
    void readsMoreRecordsThanOnePageHolds() throws Exception {
        try (Register register = Fixture.open(file(), Opening.CREATE)) {
            for (int i = 0; i < 260; i++) {
                Fixture.enter(register, "same");
            }
            assertEquals(260, register.list().size());
            assertEquals(260, register.head().size());
        }
    }

    @Test
    void refusesAMissingRegisterUnlessOneIsToBeMade() {
        String message = assertThrows(RegisterException.class, () -> Fixture.open(file(), Opening.EXISTING))
                .getMessage();
        assertTrue(message.contains("There is no register at"), message);
        assertFalse(Files.exists(file().getParent()), "a refusal leaves nothing behind");
    }

    @Test
    void refusesAnEmptyFileForReadingAndFillsItForWriting() throws Exception {
        Path empty = Files.createFile(folder.resolve("empty.register"));
        assertThrows(RegisterException.class, () -> Fixture.open(empty, Opening.EXISTING));
        try (Register register = Fixture.open(empty, Opening.CREATE)) {
            assertEquals(1, Fixture.enter(register, "1").number());
        }
    }

    @Test
    void refusesWhatIsNoDatabase() throws Exception {
        Path text = folder.resolve("notes.txt");
        Files.writeString(text, "not a register, and long enough to have a header of one hundred bytes ".repeat(3));
        RegisterException refusal = assertThrows(RegisterException.class, () -> Fixture.open(text, Opening.CREATE));
        assertTrue(refusal.getMessage().contains("is not a register"), refusal.getMessage());
        assertFalse(refusal instanceof RegisterDamagedException);
    }

    @Test
    void tellsARegisterWithADamagedBeginningFromAnotherFile() throws Exception {
        try (Register register = Fixture.open(file(), Opening.CREATE)) {
            Fixture.enter(register, "1");
        }
        byte[] bytes = Files.readAllBytes(file());
        for (int at : new int[] {3, 17, 20}) { // magic, page size, reserved space
            byte[] damaged = bytes.clone();
            damaged[at] ^= 0x55;
            Files.write(file(), damaged);
            RegisterException refusal =
                    assertThrows(RegisterException.class, () -> Fixture.open(file(), Opening.EXISTING), "byte " + at);
            assertInstanceOf(RegisterDamagedException.class, refusal, "byte " + at + ": " + refusal.getMessage());
        }
    }

    @Test
    void refusesADatabaseOfAnotherProgram() throws Exception {
        Path other = folder.resolve("other.db");
        Fixture.sql(other, "CREATE TABLE shopping (item TEXT)");
        String message = assertThrows(RegisterException.class, () -> Fixture.open(other, Opening.CREATE))
                .getMessage();
        assertTrue(message.contains("database of another program"), message);
    }

    @Test
    void refusesARegisterOfANewerVersion() throws Exception {
        Fixture.open(file(), Opening.CREATE).close();
        Fixture.sql(file(), "INSERT INTO schema_version (version) VALUES (99)");
        String message = assertThrows(RegisterException.class, () -> Fixture.open(file(), Opening.EXISTING))
                .getMessage();
        assertTrue(message.contains("newer version") && message.contains("99"), message);
    }

    @ParameterizedTest
    @ValueSource(strings = {"nfs4", "CIFS", "smb3", "9p", "fuse.sshfs", "smbfs"})
    void refusesNetworkDrivesAndNamesTheAnswer(String type) {
        SqliteStoreFactory factory = new SqliteStoreFactory(Optional.empty(), new Place(existing -> type));
        String message = assertThrows(RegisterException.class, () -> factory.open(file().toString(), Opening.CREATE))
                .getMessage();
        assertTrue(message.contains("network drive") && message.contains("PostgreSQL"), message);
        assertFalse(Files.exists(file()));
    }

    @Test
    void leavesAddressesOfDatabasesToOtherStores() {
        SqliteStoreFactory factory = new SqliteStoreFactory(Optional.empty());
        assertFalse(factory.accepts("postgresql://host/register"));
        assertTrue(factory.accepts("C:\\lab\\saddlebook.register"));
    }

    @Test
    @DisabledOnOs(value = OS.WINDOWS, disabledReason = "Windows has no setgid folders")
    void makesTheFileGroupWritableInAFolderThatAGroupShares() throws Exception {
        Path shared = Files.createDirectory(folder.resolve("shared"));
        Files.setAttribute(shared, "unix:mode", 02770);
        Path register = shared.resolve("saddlebook.register");
        Fixture.open(register, Opening.CREATE).close();
        assertTrue(PosixFilePermissions.toString(Files.getPosixFilePermissions(register))
                .startsWith("rw-rw-"));
        Path own = Files.createDirectory(folder.resolve("own"));
        Files.setAttribute(own, "unix:mode", 0750);
        Path mine = own.resolve("saddlebook.register");
        Fixture.open(mine, Opening.CREATE).close();
        assertEquals(
                '-',
                PosixFilePermissions.toString(Files.getPosixFilePermissions(mine))
                        .charAt(4));
    }

    @Test
    void letsNoStatementChangeOrRemoveWhatIsRecorded() throws Exception {
        try (Register register = Fixture.open(file(), Opening.CREATE)) {
            Fixture.enter(register, "1");
        }
        for (String sql : List.of(
                "DELETE FROM records",
                "UPDATE records SET record = x'00'",
                "DELETE FROM pieces",
                "UPDATE pieces SET bytes = x'00'")) {
            SQLException refusal = assertThrows(SQLException.class, () -> Fixture.sql(file(), sql), sql);
            assertTrue(refusal.getMessage().contains("append-only"), refusal.getMessage());
        }
        assertTrue(Fixture.verify(file()).agrees());
    }

    @Test
    void recordsNothingWhenTheDiskIsFullAndGoesOnWhenThereIsRoom() throws Exception {
        SqliteStore store = create();
        try (Register register = new StoredRegister(store, Clock.systemUTC())) {
            Fixture.enter(register, "1");
            // SQLite's own limit gives the same error as a full disk (SQLITE_FULL).
            long pages = Schema.number(store.connection, "PRAGMA page_count");
            Schema.number(store.connection, "PRAGMA max_page_count = " + (pages + 2));
            String message = assertThrows(RegisterException.class, () -> Fixture.enter(register, "x".repeat(100_000)))
                    .getMessage();
            assertTrue(message.contains("no room left"), message);
            Schema.number(store.connection, "PRAGMA max_page_count = 1000000");
            assertEquals(2, Fixture.enter(register, "x".repeat(100_000)).number());
        }
        assertTrue(Fixture.verify(file()).agrees());
    }

    @Test
    void saysSoWhenAnotherProcessHoldsTheLock() throws Exception {
        SqliteStore store = create();
        try (Register register = new StoredRegister(store, Clock.systemUTC());
                Connection other = new JDBC().connect("jdbc:sqlite:" + file(), new Properties());
                Statement statement = other.createStatement()) {
            ((SQLiteConnection) store.connection).setBusyTimeout(1);
            statement.execute("BEGIN EXCLUSIVE");
            String message = assertThrows(RegisterException.class, () -> Fixture.enter(register, "1"))
                    .getMessage();
            assertTrue(message.contains("locked by another process"), message);
            statement.execute("ROLLBACK");
            assertEquals(1, Fixture.enter(register, "1").number());
        }
    }

    @Test
    void saysSoWhenTheRegisterIsReadOnly() throws Exception {
        SqliteStore store = create();
        try (Register register = new StoredRegister(store, Clock.systemUTC())) {
            // A file without write permission gives the same error (SQLITE_READONLY); permissions do not bind root.
            try (Statement statement = store.connection.createStatement()) {
                statement.execute("PRAGMA query_only = ON");
            }
            String message = assertThrows(RegisterException.class, () -> Fixture.enter(register, "1"))
                    .getMessage();
            assertTrue(message.contains("read-only"), message);
        }
    }

    @Test
    void readsAndWritesEachCommitToTheDisk() throws Exception {
        SqliteStore store = create();
        assertEquals(3, Schema.number(store.connection, "PRAGMA synchronous"), "3 is EXTRA");
        try (Statement statement = store.connection.createStatement();
                ResultSet row = statement.executeQuery("PRAGMA journal_mode")) {
            assertEquals("delete", row.getString(1));
        }
        store.close();
    }

    @Test
    void recordsNothingWhenTheSealerRefuses() throws Exception {
        try (Register register = Fixture.open(file(), Opening.CREATE)) {
            Fixture.enter(register, "1");
            assertThrows(RegisterException.class, () -> register.append(Draft.withdrawn("ada", 7, "no")));
            assertEquals(2, Fixture.enter(register, "2").number());
        }
        assertTrue(Fixture.verify(file()).agrees());
    }

    @Test
    void countsPartsLeftBehindWithoutCallingThemADifference() throws Exception {
        try (Register register = Fixture.open(file(), Opening.CREATE)) {
            assertThrows(
                    IOException.class,
                    () -> register.enter(
                            Draft.superseding("ada", "lost", 5),
                            List.of(PartFile.of("a", "text/plain", "lonely".getBytes(StandardCharsets.UTF_8)))));
        }
        assertTrue(Fixture.verify(file()).agrees());
        assertEquals(1, Fixture.verify(file()).unreferenced());
    }

    @Test
    void marksTheFileAsOursWhereOtherToolsLook() throws Exception {
        Fixture.open(file(), Opening.CREATE).close();
        // Source: SQLite file format, section 1.3 (application id at offset 68, big-endian).
        assertEquals(
                Schema.APPLICATION_ID,
                ByteBuffer.wrap(Files.readAllBytes(file())).getInt(68));
    }

    private SqliteStore create() throws RegisterException {
        return (SqliteStore) new SqliteStoreFactory(Optional.empty()).open(file().toString(), Opening.CREATE);
    }
}
