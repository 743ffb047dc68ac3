package org.saddlebook.register.console.internal;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.TreeSet;
import java.util.zip.ZipFile;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.saddlebook.api.findings.Contributor;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.service.ReportWriter;
import org.saddlebook.console.api.ExitCode;
import org.saddlebook.json.api.JsonArray;
import org.saddlebook.json.api.JsonNumber;
import org.saddlebook.json.api.JsonObject;
import org.saddlebook.json.api.JsonReader;
import org.saddlebook.json.api.JsonString;
import org.saddlebook.register.api.Registers;

class VerbsTest {
    @TempDir
    Path folder;

    private Bench bench;

    @BeforeEach
    void set() {
        bench = new Bench(folder);
    }

    private Path own() {
        return folder.resolve("data").resolve("register").resolve("saddlebook.register");
    }

    @Test
    void entersListsShowsAndVerifies() throws Exception {
        assertEquals(0, bench.run("enter", "rates.csv", "--meaning", "measured by me", "--reason", "first"));
        assertTrue(bench.out().contains("Entered as 1: Invented rates.csv"), bench.out());
        assertTrue(bench.out().contains("sources/rates.csv"), bench.out());
        assertTrue(bench.out().contains("report.html"), bench.out());
        assertTrue(Files.exists(own()));
        assertEquals(0, bench.run("register", "list"));
        assertTrue(bench.out().contains("1  2026-04-05  current  mira  Invented rates.csv"), bench.out());
        assertEquals(0, bench.run("register", "show", "1"));
        assertTrue(bench.out().contains("Meaning    measured by me"), bench.out());
        assertEquals(0, bench.run("register", "verify"));
        assertTrue(bench.out().contains("Everything agrees"), bench.out());
    }

    @Test
    void handsTheFindingsOfAnEntryToOtherVerbs() throws Exception {
        bench.run("enter", "rates.csv");
        String json = new String(bench.findings(1), java.nio.charset.StandardCharsets.UTF_8);
        assertTrue(json.startsWith("{"), json);
        assertTrue(json.contains("saddlebook/findings/1"), json);
        Exception absent = org.junit.jupiter.api.Assertions.assertThrows(
                org.saddlebook.register.api.RegisterException.class, () -> bench.findings(7));
        assertTrue(absent.getMessage().contains("7"), absent.getMessage());
    }

    @Test
    void givesJsonToScripts() throws Exception {
        bench.run("enter", "a.csv");
        bench.run("enter", "b.csv", "--supersedes", "1", "--as", "Jo Kern");
        bench.run("review", "2", "--meaning", "checked against the notebook", "--as", "Ruth");
        assertEquals(0, bench.run("register", "list", "--json"));
        JsonArray list = (JsonArray) JsonReader.read("list", bench.out().getBytes(StandardCharsets.UTF_8));
        assertEquals(2, list.items().size());
        JsonObject first = (JsonObject) list.items().get(0);
        JsonObject second = (JsonObject) list.items().get(1);
        assertEquals(new JsonString("superseded"), first.get("status").orElseThrow());
        assertEquals(new JsonNumber(1), second.get("target").orElseThrow());
        assertEquals(new JsonString("Jo Kern"), second.get("actor").orElseThrow());
        JsonObject review = (JsonObject)
                ((JsonArray) second.get("about").orElseThrow()).items().get(0);
        assertEquals(new JsonString("reviewed"), review.get("kind").orElseThrow());
        bench.run("register", "show", "2", "--json");
        assertEquals(second, JsonReader.read("show", bench.out().getBytes(StandardCharsets.UTF_8)));
    }

    @Test
    void listsAnEmptyArrayOnlyWhenThereIsARegister() throws Exception {
        assertThrows(IOException.class, () -> bench.run("register", "list", "--json"));
        assertEquals("", bench.out());
    }

    @Test
    void saysThatAnEntryHasNoReportWithoutTheFeature() throws Exception {
        bench.uninstall(ReportWriter.class);
        assertEquals(0, bench.run("enter", "a.csv"));
        assertTrue(bench.out().contains("has no report"), bench.out());
        assertFalse(bench.out().contains("report.html"), bench.out());
    }

    @Test
    void entersNothingWhenNothingCouldBeEvaluated() throws Exception {
        bench.refused = true;
        assertEquals(ExitCode.REFUSED, bench.run("enter", "a.csv"));
        assertTrue(bench.err().contains("nothing was entered"), bench.err());
        assertFalse(Files.exists(own()));
    }

    @Test
    void refusesAModelThatIsNotInstalled() throws Exception {
        assertEquals(ExitCode.REFUSED, bench.run("enter", "a.csv", "--model", "absent"));
        assertFalse(Files.exists(own()));
    }

    @Test
    void recomputesToTheSameBytes() throws Exception {
        bench.run("enter", "a.csv");
        assertEquals(0, bench.run("register", "recompute", "1"));
        assertTrue(bench.out().contains("bit for bit"), bench.out());
    }

    @Test
    void findsTheSmallestDifferenceWhenTheBundlesAreTheSame() throws Exception {
        bench.run("enter", "a.csv");
        bench.barrier = Math.nextUp(bench.barrier);
        assertEquals(ExitCode.DIFFERENCE, bench.run("register", "recompute", "1"));
        assertTrue(bench.out().contains("barrier.Ea.value"), bench.out());
    }

    @Test
    void allowsWhatTwoBuildsMayDifferByAndNamesTheBundles() throws Exception {
        bench.run("enter", "a.csv");
        bench.bundle = new Contributor("org.example.law", "1.0.1", "b".repeat(64));
        bench.barrier += 0.9 * 1e-6 * 200; // the larger limit: 1e-6 of the standard uncertainty
        assertEquals(0, bench.run("register", "recompute", "1"));
        assertTrue(bench.out().contains("org.example.law: then 1.0.0"), bench.out());
        bench.barrier += 0.2 * 1e-6 * 200;
        assertEquals(ExitCode.DIFFERENCE, bench.run("register", "recompute", "1"));
        assertTrue(bench.out().contains("barrier.Ea.value: then 50000.123456789, now 50000.12"), bench.out());
    }

    @Test
    void refusesToRecomputeWithoutTheModelsOfThen() throws Exception {
        bench.run("enter", "a.csv");
        bench.installed = List.of("eyring");
        assertEquals(ExitCode.REFUSED, bench.run("register", "recompute", "1"));
        assertTrue(bench.err().contains("the model arrhenius, not installed here"), bench.err());
    }

    @Test
    void exportsAFolderThatCanBeEvaluatedAgain() throws Exception {
        bench.run("enter", "a.csv");
        bench.run("register", "withdraw", "1", "--reason", "wrong stock");
        assertEquals(0, bench.run("register", "export", "1", "--out", "taken/out"));
        Path out = folder.resolve("taken").resolve("out");
        assertArrayEquals(Bench.SOURCE, Files.readAllBytes(out.resolve("parts/sources/rates.csv")));
        assertTrue(Files.exists(out.resolve("parts/campaign.json")));
        assertTrue(Files.readString(out.resolve("signatures.html")).contains("wrong stock"));
        assertThrows(IOException.class, () -> bench.run("register", "export", "1", "--out", "taken/out"));
        try (var files = Files.list(folder.resolve("taken"))) {
            assertEquals(1, files.count(), "nothing half-written is left");
        }
        assertEquals(0, bench.run("register", "verify", "--checkpoint", "taken/out/checkpoint.json"));
    }

    @Test
    void exportsTwiceToTheSameZip() throws Exception {
        bench.run("enter", "a.csv");
        bench.run("register", "export", "1", "--out", "one.zip");
        bench.run("register", "export", "1", "--out", "two.zip");
        Path one = folder.resolve("one.zip");
        assertArrayEquals(Files.readAllBytes(one), Files.readAllBytes(folder.resolve("two.zip")));
        try (ZipFile zip = new ZipFile(one.toFile());
                InputStream in = zip.getInputStream(zip.getEntry("parts/sources/rates.csv"))) {
            assertArrayEquals(Bench.SOURCE, in.readAllBytes());
            TreeSet<String> names = new TreeSet<>();
            zip.stream().forEach(entry -> names.add(entry.getName()));
            assertTrue(names.containsAll(
                    List.of("README.txt", "SHA256SUMS", "record.json", "proof.json", "checkpoint.json")));
        }
    }

    @Test
    void exitsWithFourWhenARegisterWasShortened() throws Exception {
        bench.run("enter", "a.csv");
        bench.run("enter", "b.csv", "--register", "copy.register");
        bench.run("enter", "b.csv");
        bench.run("register", "export", "2", "--out", "kept");
        assertEquals(
                ExitCode.DIFFERENCE,
                bench.run("register", "verify", "--register", "copy.register", "--checkpoint", "kept/checkpoint.json"));
        assertTrue(bench.out().contains("records-lost"), bench.out());
    }

    @Test
    void exitsWithFourWhenTheBeginningOfTheFileIsDamaged() throws Exception {
        bench.run("enter", "a.csv");
        byte[] bytes = Files.readAllBytes(own());
        bytes[17] ^= 0x55;
        Files.write(own(), bytes);
        assertEquals(ExitCode.DIFFERENCE, bench.run("register", "verify"));
        assertTrue(bench.out().contains("store-damaged"), bench.out());
    }

    @Test
    void takesTheRegisterFromOptionPolicyAndEnvironmentInThisOrder() throws Exception {
        bench.settings.put("SADDLEBOOK_REGISTER", "environment.register");
        bench.run("enter", "a.csv");
        assertTrue(Files.exists(folder.resolve("environment.register")));
        bench.settings.put(
                "saddlebook.register", folder.resolve("policy.register").toString());
        bench.run("enter", "a.csv");
        assertTrue(Files.exists(folder.resolve("policy.register")));
        bench.run("enter", "a.csv", "--register", "given.register");
        assertTrue(Files.exists(folder.resolve("given.register")));
    }

    @Test
    void saysWhichStoreIsMissing() {
        String message = assertThrows(
                        IOException.class,
                        () -> bench.run("register", "list", "--register", "postgresql://lab/register"))
                .getMessage();
        assertTrue(message.contains("installed: sqlite"), message);
        bench.uninstall(Registers.class);
        assertThrows(InputException.class, () -> bench.run("register", "list"));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "",
                "lst",
                "show",
                "show x",
                "show 0",
                "show 1 2",
                "list extra",
                "list --jsn",
                "export 1",
                "verify --json",
                "recompute",
                "withdraw -1"
            })
    void refusesWrongArguments(String line) {
        String[] arguments = line.isEmpty() ? new String[0] : line.split(" ", -1);
        assertThrows(InputException.class, () -> bench.run("register", arguments));
    }

    @Test
    void refusesARecordThatDoesNotFitTheEntry() throws Exception {
        bench.run("enter", "a.csv");
        assertThrows(IOException.class, () -> bench.run("register", "withdraw", "1"));
        assertThrows(IOException.class, () -> bench.run("review", "1"));
        assertThrows(IOException.class, () -> bench.run("register", "show", "2"));
        assertThrows(IOException.class, () -> bench.run("enter", "b.csv", "--supersedes", "7"));
        assertThrows(InputException.class, () -> bench.run("enter", "b.csv", "--as", " "));
        bench.run("register", "verify");
        assertTrue(bench.out().startsWith("1 record and 4 parts"), bench.out());
    }
}
