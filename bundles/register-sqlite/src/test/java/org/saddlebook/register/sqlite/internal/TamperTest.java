package org.saddlebook.register.sqlite.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.ArrayList;
import java.util.List;
import java.util.Properties;
import java.util.Random;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.saddlebook.register.api.Checkpoint;
import org.saddlebook.register.api.Head;
import org.saddlebook.register.api.Register;
import org.saddlebook.register.api.RegisterDamagedException;
import org.saddlebook.register.api.RegisterException;
import org.saddlebook.register.api.RegisterStoreFactory.Opening;
import org.saddlebook.register.api.Verification;
import org.sqlite.JDBC;

/** Somebody with the right to write the file changes it: the check names what. */
class TamperTest {
    private static final String[] UNLOCK = {
        "DROP TRIGGER records_keep", "DROP TRIGGER records_stay", "DROP TRIGGER pieces_keep", "DROP TRIGGER pieces_stay"
    };

    @TempDir
    Path folder;

    private Path file;
    private Head head;

    @BeforeEach
    void enterFive() throws Exception {
        file = folder.resolve("saddlebook.register");
        try (Register register = Fixture.open(file, Opening.CREATE)) {
            for (int i = 1; i <= 5; i++) {
                head = Fixture.enter(register, "{\"findings\": " + i + "}").head();
            }
        }
    }

    /** Changes the file, puts the triggers back as they were, and checks. */
    private List<String> after(String... changes) throws Exception {
        String[] triggers = triggers();
        Fixture.sql(file, UNLOCK);
        Fixture.sql(file, changes);
        Fixture.sql(file, triggers);
        return Fixture.codes(Fixture.verify(file));
    }

    private String[] triggers() throws SQLException {
        List<String> found = new ArrayList<>();
        try (Connection connection = new JDBC().connect("jdbc:sqlite:" + file, new Properties());
                Statement statement = connection.createStatement();
                ResultSet rows = statement.executeQuery("SELECT sql FROM sqlite_master WHERE type = 'trigger'")) {
            while (rows.next()) {
                found.add(rows.getString(1));
            }
        }
        return found.toArray(new String[0]);
    }

    @Test
    void findsNothingInAnHonestRegister() throws Exception {
        assertEquals(List.of(), after());
        assertEquals(head, Fixture.verify(file).head());
    }

    @Test
    void namesAPartOfWhichOneByteWasFlipped() throws Exception {
        assertEquals(
                List.of("part-changed@3"),
                after("UPDATE pieces SET bytes = CAST('{\"findings\": 7}' AS BLOB)"
                        + " WHERE CAST(bytes AS TEXT) = '{\"findings\": 3}'"));
    }

    @Test
    void namesARecordThatWasChanged() throws Exception {
        assertEquals(
                List.of("record-changed@2"),
                after("UPDATE records SET record = CAST(replace(CAST(record AS TEXT), 'ada', 'eve') AS BLOB)"
                        + " WHERE number = 2"));
    }

    @Test
    void namesAChangedLeafRootAndPeak() throws Exception {
        assertEquals(
                List.of("record-changed@2", "head-changed@2"),
                after("UPDATE records SET leaf = randomblob(32) WHERE number = 2"));
        enterFiveAnew();
        assertEquals(List.of("head-changed@4"), after("UPDATE records SET root = randomblob(32) WHERE number = 4"));
        enterFiveAnew();
        assertEquals(
                List.of("head-changed@4", "head-changed@5"),
                after("UPDATE records SET peaks = randomblob(32) WHERE number = 4"));
        enterFiveAnew();
        assertEquals(List.of("store-damaged@-"), after("UPDATE records SET peaks = x'00' WHERE number = 4"));
    }

    @Test
    void namesADeletedRecordInTheMiddle() throws Exception {
        assertEquals(List.of("record-missing@3"), after("DELETE FROM records WHERE number = 3"));
    }

    @Test
    void namesADeletedRecordAtTheEnd() throws Exception {
        assertEquals(List.of("store-damaged@-"), after("DELETE FROM records WHERE number = 5"));
        String message = Fixture.verify(file).differences().get(0).message();
        assertTrue(message.contains("Record 5 was removed from the end"), message);
    }

    @Test
    void namesADeletedEndByACheckpointWhenTheFileWasMadeToForgetIt() throws Exception {
        assertEquals(
                List.of(),
                after(
                        "DELETE FROM records WHERE number = 5",
                        "UPDATE sqlite_sequence SET seq = 4 WHERE name = 'records'"));
        Checkpoint kept = new Checkpoint(head.size(), head.root());
        assertEquals(List.of("records-lost@-"), Fixture.codes(Fixture.verify(file, kept)));
    }

    @Test
    void namesRecordsThatChangedPlaces() throws Exception {
        assertEquals(
                List.of("record-changed@2", "record-moved@2", "record-changed@3", "record-moved@3"),
                after(
                        "CREATE TEMP TABLE kept AS SELECT number, record FROM records",
                        "UPDATE records SET record = (SELECT record FROM kept WHERE kept.number = 5 - records.number)"
                                + " WHERE number IN (2, 3)"));
        enterFiveAnew();
        assertEquals(
                List.of("head-changed@2", "record-moved@2", "head-changed@3", "record-moved@3"),
                after(
                        "CREATE TEMP TABLE kept AS SELECT number, record, leaf FROM records",
                        "UPDATE records SET"
                                + " record = (SELECT record FROM kept WHERE kept.number = 5 - records.number),"
                                + " leaf = (SELECT leaf FROM kept WHERE kept.number = 5 - records.number)"
                                + " WHERE number IN (2, 3)"));
    }

    @Test
    void namesAMissingPieceAndAMissingPart() throws Exception {
        List<String> codes = after("DELETE FROM pieces WHERE CAST(bytes AS TEXT) = '{\"findings\": 2}'");
        assertEquals(List.of("part-missing@2"), codes);
        enterFiveAnew();
        assertEquals(
                5,
                after("DELETE FROM parts WHERE sha256 = (SELECT sha256 FROM pieces"
                                + " WHERE CAST(bytes AS TEXT) = '{}')")
                        .size());
    }

    @Test
    void namesARemovedTrigger() throws Exception {
        Fixture.sql(file, "DROP TRIGGER records_keep");
        assertEquals(List.of("store-damaged@-"), Fixture.codes(Fixture.verify(file)));
    }

    /** Flips one bit of the file itself, anywhere: found, or in a place where nothing is stored. */
    @Test
    void neverTakesAFlippedBitForAnotherContent() throws Exception {
        byte[] honest = Files.readAllBytes(file);
        long seed = 20261202;
        Random random = new Random(seed);
        int found = 0;
        for (int round = 0; round < 300; round++) {
            byte[] flipped = honest.clone();
            int at = random.nextInt(flipped.length);
            flipped[at] ^= (byte) (1 << random.nextInt(8));
            Files.write(file, flipped);
            String where = "seed " + seed + ", byte " + at;
            try {
                Verification verification = Fixture.verify(file);
                if (verification.agrees()) {
                    assertEquals(head, verification.head(), where);
                    assertEquals(6, verification.parts(), where);
                } else {
                    found++;
                }
            } catch (RegisterException e) {
                found++;
                assertTrue(e.getMessage().length() > 20, where);
                if (e instanceof RegisterDamagedException) {
                    assertTrue(e.getMessage().contains("damaged"), where + ": " + e.getMessage());
                }
            }
        }
        assertTrue(found > 30, "most of the file is content or structure; found " + found);
    }

    private void enterFiveAnew() throws Exception {
        Files.delete(file);
        enterFive();
    }
}
