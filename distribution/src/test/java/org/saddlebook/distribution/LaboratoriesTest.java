package org.saddlebook.distribution;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;

/** Installations as laboratories make them: a part of the product, one folder for many users, an administrator's policy. */
@Timeout(300)
class LaboratoriesTest {
    @TempDir
    private Path folder;

    @Test
    void baseWithOneReaderAndOneModelWorksAndSaysWhatIsMissing() throws Exception {
        Path lab = minimal("base.json", "reader-text.json", "model-eyring.json");
        InstalledProduct product = InstalledProduct.of(lab, folder.resolve("user"));
        InstalledProduct.table(folder.resolve("user"));
        InstalledProduct.Outcome summary = product.run("evaluate", "rates.csv");
        assertEquals(0, summary.exitCode(), summary.all());
        assertTrue(summary.out().contains("Eyring (eyring)"), summary.out());
        assertTrue(
                summary.out().contains("Not installed here: ") && summary.out().contains("model-arrhenius"));
        assertEquals("", summary.err());
        InstalledProduct.Outcome json = product.run("evaluate", "rates.csv", "--json");
        assertEquals(0, json.exitCode(), json.err());
        assertFalse(json.out().contains("org.saddlebook.model-arrhenius"));
        InstalledProduct.Outcome arrhenius = product.run("evaluate", "rates.csv", "--model", "arrhenius");
        assertEquals(1, arrhenius.exitCode());
        assertTrue(arrhenius.err().contains("model-arrhenius"), arrhenius.err());
        InstalledProduct.Outcome report = product.run("evaluate", "rates.csv", "--out", "result");
        assertEquals(0, report.exitCode(), report.err());
        assertTrue(report.err().contains("feature report"), report.err());
        assertTrue(Files.exists(folder.resolve("user/result/findings.json")));
        InstalledProduct.Outcome enter = product.run("enter", "result");
        assertEquals(2, enter.exitCode());
        assertTrue(enter.err().contains("no command \"enter\""), enter.err());
    }

    @Test
    void withoutAReaderATableIsRefusedWithTheFeatureToInstall() throws Exception {
        Path lab = minimal("base.json", "model-eyring.json");
        InstalledProduct.table(folder.resolve("user"));
        InstalledProduct.Outcome refused =
                InstalledProduct.of(lab, folder.resolve("user")).run("evaluate", "rates.csv");
        assertTrue(refused.exitCode() == 1 || refused.exitCode() == 2, refused.all());
        assertTrue(refused.err().contains("reader-text"), refused.err());
        assertFalse(refused.showsAStackTrace());
    }

    @Test
    void aMissingBundleIsNamedAndTheRestGoesOn() throws Exception {
        Path lab = InstalledProduct.copy(folder.resolve("lab"));
        Files.delete(lab.resolve("bundles/org.saddlebook.spontaneity-0.1.0.jar"));
        InstalledProduct.table(folder.resolve("user"));
        InstalledProduct.Outcome outcome =
                InstalledProduct.of(lab, folder.resolve("user")).run("evaluate", "rates.csv");
        assertEquals(0, outcome.exitCode(), outcome.all());
        assertTrue(
                outcome.err().contains("bundles/org.saddlebook.spontaneity-0.1.0.jar")
                        && outcome.err().contains("features/spontaneity.json"),
                outcome.err());
    }

    @Test
    void aDamagedFeatureFileIsShownWithItsLine() throws Exception {
        Path lab = InstalledProduct.copy(folder.resolve("lab"));
        Files.writeString(
                lab.resolve("features/spontaneity.json"),
                "{\n  // a comment is allowed\n  \"id\": \"a:b:1\",\n  \"id\": \"a:b:1\"\n}\n");
        InstalledProduct.table(folder.resolve("user"));
        InstalledProduct.Outcome outcome =
                InstalledProduct.of(lab, folder.resolve("user")).run("models");
        assertEquals(0, outcome.exitCode(), outcome.all());
        assertTrue(outcome.err().contains("features/spontaneity.json, line 4"), outcome.err());
    }

    @Test
    void aReadOnlyFolderServesSeveralUsersAtOnce() throws Exception {
        Path lab = InstalledProduct.copy(folder.resolve("lab"));
        setWritable(lab, false);
        List<String> before = listing(lab);
        try {
            List<InstalledProduct.Running> running = new ArrayList<>();
            for (int user = 0; user < 4; user++) {
                // Two homes, two processes each: users are apart, and processes of one user share nothing they fight
                // over.
                Path home = folder.resolve("user" + user % 2);
                InstalledProduct.table(home);
                running.add(InstalledProduct.of(lab, home).start("evaluate", "rates.csv", "--json"));
            }
            List<String> outputs = new ArrayList<>();
            for (InstalledProduct.Running each : running) {
                InstalledProduct.Outcome outcome = InstalledProduct.finish(each);
                assertEquals(0, outcome.exitCode(), outcome.all());
                assertEquals("", outcome.err());
                outputs.add(outcome.out());
            }
            assertEquals(before, listing(lab), "something was written into the product");
            assertEquals(1, Set.copyOf(outputs).size(), "users got different findings");
            for (int user = 0; user < 2; user++) {
                Path cache = folder.resolve("user" + user).resolve("cache/saddlebook");
                assertEquals("rwx------", PosixFilePermissions.toString(Files.getPosixFilePermissions(cache)));
            }
        } finally {
            setWritable(lab, true);
        }
    }

    @Test
    void aPreparedInstallationIsUsedByEveryUser() throws Exception {
        Path lab = InstalledProduct.copy(folder.resolve("lab"));
        Path admin = folder.resolve("admin");
        InstalledProduct.Outcome prepared = InstalledProduct.of(lab, admin).run("prepare");
        assertEquals(0, prepared.exitCode(), prepared.all());
        Path home = folder.resolve("user");
        Path log = folder.resolve("classes.txt");
        InstalledProduct.Outcome help = InstalledProduct.of(lab, home)
                .with("SADDLEBOOK_JAVA_OPTIONS", "-Xlog:class+load:file=" + log)
                .run("help");
        assertEquals(0, help.exitCode(), help.all());
        long fromArchive;
        try (Stream<String> lines = Files.lines(log)) {
            fromArchive = lines.filter(line -> line.contains("org.apache.felix.framework.Felix ")
                            && line.contains("shared objects file (top)"))
                    .count();
        }
        assertEquals(1, fromArchive, "the framework did not come from the class archive");
    }

    @Test
    void theFirstUseMakesAnArchiveOnceAndSaysSo() throws Exception {
        Path home = folder.resolve("user");
        InstalledProduct product = InstalledProduct.of(InstalledProduct.copy(folder.resolve("lab")), home)
                .with("SADDLEBOOK_NO_ARCHIVE", "");
        InstalledProduct.Outcome first = product.run("version");
        assertEquals(0, first.exitCode(), first.all());
        assertTrue(first.err().contains("preparing a quicker start"), first.err());
        InstalledProduct.Outcome second = product.run("version");
        assertEquals("", second.err());
    }

    @Test
    void aPolicySwitchesFeaturesOff() throws Exception {
        Path policy = Files.writeString(
                folder.resolve("policy.json"),
                "{ \"schema\": \"saddlebook-policy/1\", \"features\": { \"off\": [\"model-arrhenius\"] } }");
        Path home = folder.resolve("user");
        InstalledProduct.Outcome models = InstalledProduct.of(InstalledProduct.ASSEMBLED, home)
                .with("SADDLEBOOK_POLICY", policy.toString())
                .run("models");
        assertEquals(0, models.exitCode(), models.all());
        assertFalse(models.out().contains("arrhenius  Arrhenius\n"), models.out());
        assertTrue(models.out().contains("eyring"));
    }

    @Test
    void aPolicyThatCannotBeReadLetsNothingStart() throws Exception {
        Path policy = Files.writeString(folder.resolve("policy.json"), "{ \"userBundels\": {} }");
        InstalledProduct.Outcome refused = InstalledProduct.of(InstalledProduct.ASSEMBLED, folder.resolve("user"))
                .with("SADDLEBOOK_POLICY", policy.toString())
                .run("models");
        assertEquals(2, refused.exitCode());
        assertTrue(refused.err().contains("userBundels") && refused.err().contains("line 1"), refused.err());
        assertEquals("", refused.out());
    }

    private Path minimal(String... features) throws IOException {
        Path lab = InstalledProduct.copy(folder.resolve("lab"));
        StringBuilder kept = new StringBuilder();
        try (DirectoryStream<Path> files = Files.newDirectoryStream(lab.resolve("features"))) {
            for (Path file : files) {
                if (Set.of(features).contains(file.getFileName().toString())) {
                    kept.append(Files.readString(file));
                } else {
                    Files.delete(file);
                }
            }
        }
        try (DirectoryStream<Path> jars = Files.newDirectoryStream(lab.resolve("bundles"))) {
            for (Path jar : jars) {
                String name = jar.getFileName().toString();
                int dash = name.lastIndexOf('-');
                if (!kept.toString().contains(":" + name.substring(0, dash) + ":")) {
                    Files.delete(jar);
                }
            }
        }
        return lab;
    }

    private static List<String> listing(Path root) throws IOException {
        List<String> files = new ArrayList<>();
        try (Stream<Path> walk = Files.walk(root)) {
            for (Path file : walk.sorted().toList()) {
                files.add(file + " " + Files.getLastModifiedTime(file));
            }
        }
        return files;
    }

    private static void setWritable(Path root, boolean writable) throws IOException {
        try (Stream<Path> files = Files.walk(root)) {
            for (Path file : files.toList()) {
                boolean program = Files.isDirectory(file) || file.endsWith("bin/saddlebook");
                Files.setPosixFilePermissions(
                        file,
                        PosixFilePermissions.fromString(
                                program
                                        ? (writable ? "rwxr-xr-x" : "r-xr-xr-x")
                                        : (writable ? "rw-r--r--" : "r--r--r--")));
            }
        }
    }
}
