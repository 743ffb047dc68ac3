package org.saddlebook.intake.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeFalse;
import static org.junit.jupiter.api.Assumptions.assumeTrue;
import static org.saddlebook.intake.internal.IntakeFixture.TABLE;
import static org.saddlebook.intake.internal.IntakeFixture.problem;
import static org.saddlebook.intake.internal.IntakeFixture.write;

import java.io.IOException;
import java.io.RandomAccessFile;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.json.api.Sha256;

class FilesTest {
    private static final String HASH = Sha256.of(TABLE.getBytes(StandardCharsets.UTF_8));

    @TempDir
    private Path temp;

    private Path folder;

    @BeforeEach
    void makeFolder() throws IOException {
        folder = Files.createDirectories(temp.resolve("campaign"));
    }

    private void campaign(String partPath, String hash) throws IOException {
        write(folder, "campaign.json", """
                {
                  "schema": "saddlebook/campaign/1",
                  "title": "t",
                  "sources": [
                    {"path": "%s", "sha256": "%s", "size": 52}
                  ]
                }
                """.formatted(partPath, hash));
    }

    @Test
    void opensFolderDocumentAndLinkToItAlike() throws Exception {
        Files.createDirectories(folder.resolve("sources"));
        write(folder, "sources/rates.csv", TABLE);
        campaign("sources/rates.csv", HASH);
        Path link = Files.createSymbolicLink(temp.resolve("link.json"), folder.resolve("campaign.json"));
        for (Path input : new Path[] {folder, folder.resolve("campaign.json"), link}) {
            var opened = IntakeFixture.open(input);
            assertEquals("t", opened.campaign().title());
            assertEquals("sources/rates.csv", opened.parts().get(0).name());
            assertEquals(HASH, Sha256.of(opened.parts().get(0).bytes()));
        }
    }

    @Test
    void saysWhichFileIsMissing() {
        Problem problem = problem(temp.resolve("no.csv"));
        assertEquals("missing-file", problem.code());
        assertEquals(temp.resolve("no.csv").toString(), problem.place().file());
        assertEquals("missing-file", problem(temp.resolve("no.json")).code());
        assertEquals("missing-file", problem(Path.of("")).code());
    }

    @Test
    void refusesFoldersWithoutDocument() {
        assertEquals("no-campaign", problem(folder).code());
    }

    @Test
    void refusesHugeFilesWithoutReadingThem() throws IOException {
        Path huge = folder.resolve("huge.csv");
        try (RandomAccessFile file = new RandomAccessFile(huge.toFile(), "rw")) {
            file.setLength(2L << 30); // sparse: takes no space and no time
        }
        Problem problem = problem(huge);
        assertEquals("too-large", problem.code());
        assertTrue(problem.found().contains("2147483648"), problem.found());
        Files.move(huge, folder.resolve("huge.json"));
        assertEquals("too-large", problem(folder.resolve("huge.json")).code());
    }

    @Test
    @Timeout(value = 20, threadMode = Timeout.ThreadMode.SEPARATE_THREAD)
    void refusesPipesAndDevicesWithoutWaiting() throws Exception {
        assumeTrue(Files.exists(Path.of("/dev/zero")), "a system with device files");
        assertEquals("not-a-file", problem(Path.of("/dev/zero")).code());
        Path pipe = folder.resolve("pipe.csv");
        Process make = new ProcessBuilder("mkfifo", pipe.toString()).start();
        assumeTrue(make.waitFor(10, TimeUnit.SECONDS) && make.exitValue() == 0, "a system with mkfifo");
        assertEquals("not-a-file", problem(pipe).code());
    }

    @Test
    void saysThatAFileMayNotBeRead() throws IOException {
        Path secret = write(folder, "secret.csv", TABLE);
        assumeTrue(Files.getFileStore(secret).supportsFileAttributeView("posix"), "a system with access rights");
        Files.setPosixFilePermissions(secret, PosixFilePermissions.fromString("---------"));
        assumeFalse(Files.isReadable(secret), "a user that rights apply to");
        Problem problem = problem(secret);
        assertEquals("unreadable-file", problem.code());
        assertTrue(problem.found().contains("access denied"), problem.found());
    }

    @Test
    void saysThatReadingFailed() {
        Path broken = Path.of("/proc/self/mem"); // a regular file whose first byte cannot be read
        assumeTrue(Files.isRegularFile(broken), "a system with /proc");
        assertEquals("unreadable-file", problem(broken).code());
    }

    @Test
    void namesBothHashesOfAChangedPart() throws IOException {
        write(folder, "rates.csv", TABLE + "55,1.6\n");
        campaign("rates.csv", HASH);
        Problem problem = problem(folder);
        assertEquals("changed-part", problem.code());
        assertTrue(problem.expected().contains(HASH));
        String changed = Sha256.of((TABLE + "55,1.6\n").getBytes(StandardCharsets.UTF_8));
        assertTrue(problem.found().contains(changed), problem.found());
        assertEquals(folder.resolve("rates.csv").toString(), problem.place().file());
    }

    @Test
    void namesTheHashOfAMissingPart() throws IOException {
        campaign("rates.csv", HASH);
        Problem problem = problem(folder);
        assertEquals("missing-part", problem.code());
        assertTrue(problem.expected().contains(HASH));
    }

    @Test
    void refusesPathsOutOfTheFolder() throws IOException {
        write(temp, "rates.csv", TABLE);
        for (String path : new String[] {
            "../rates.csv", temp.resolve("rates.csv").toString(), "a/../../rates.csv", "..\\\\rates.csv", "C:/rates.csv"
        }) {
            campaign(path, HASH);
            Problem problem = problem(folder);
            assertEquals("path-outside", problem.code(), path);
            assertEquals(5, problem.place().line().orElseThrow());
        }
    }

    @Test
    void refusesLinksOutOfTheFolder() throws IOException {
        Path outside = write(temp, "rates.csv", TABLE);
        Files.createSymbolicLink(folder.resolve("rates.csv"), outside);
        campaign("rates.csv", HASH);
        assertEquals("path-outside", problem(folder).code());
        Files.createSymbolicLink(folder.resolve("sub"), temp);
        campaign("sub/rates.csv", HASH);
        assertEquals("path-outside", problem(folder).code());
    }

    @Test
    void refusesDocumentsThatAreLinksOutOfTheFolder() throws IOException {
        campaign("rates.csv", HASH);
        Path other = Files.createDirectories(temp.resolve("other"));
        Files.createSymbolicLink(other.resolve("campaign.json"), folder.resolve("campaign.json"));
        assertEquals("path-outside", problem(other).code());
    }

    @Test
    void followsLinksInsideTheFolder() throws Exception {
        Files.createDirectories(folder.resolve("sources"));
        write(folder, "sources/rates.csv", TABLE);
        Files.createSymbolicLink(folder.resolve("rates.csv"), Path.of("sources/rates.csv"));
        campaign("rates.csv", HASH);
        assertEquals(1, IntakeFixture.open(folder).parts().size());
    }

    @Test
    void refusesPartsThatAreFolders() throws IOException {
        Files.createDirectories(folder.resolve("rates.csv"));
        campaign("rates.csv", HASH);
        assertEquals("not-a-file", problem(folder).code());
    }
}
