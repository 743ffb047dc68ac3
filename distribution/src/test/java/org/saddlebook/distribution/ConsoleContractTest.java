package org.saddlebook.distribution;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The console as scripts see it: exit codes, streams, what is written. */
@Timeout(300)
class ConsoleContractTest {
    @TempDir
    private Path home;

    private InstalledProduct product;
    private Path table;

    @BeforeEach
    void install() throws IOException {
        product = InstalledProduct.of(InstalledProduct.ASSEMBLED, home);
        table = InstalledProduct.table(home);
    }

    @ParameterizedTest
    @ValueSource(strings = {"help", "--help", "-h"})
    void helpListsTheCommands(String word) throws Exception {
        InstalledProduct.Outcome help = product.run(word);
        assertEquals(0, help.exitCode(), help.err());
        for (String verb : List.of("evaluate", "predict", "enter", "register", "bundles", "models", "self-test")) {
            assertTrue(help.out().contains("  " + verb + " "), verb);
        }
        assertEquals("", help.err());
    }

    @Test
    void noArgumentsGiveHelp() throws Exception {
        InstalledProduct.Outcome help = product.run();
        assertEquals(0, help.exitCode());
        assertTrue(help.out().contains("usage: saddlebook COMMAND"));
    }

    @Test
    void anUnknownCommandNamesTheNearestOne() throws Exception {
        InstalledProduct.Outcome unknown = product.run("evalute", "rates.csv");
        assertEquals(2, unknown.exitCode());
        assertEquals("", unknown.out());
        assertTrue(unknown.err().contains("Did you mean \"evaluate\"?"), unknown.err());
    }

    @Test
    void findingsAloneGoToStandardOutput() throws Exception {
        InstalledProduct.Outcome json = product.run("evaluate", "rates.csv", "--json");
        assertEquals(0, json.exitCode(), json.err());
        assertTrue(json.out().startsWith("{\n"));
        assertTrue(json.out().endsWith("}\n"));
        assertEquals("", json.err());
    }

    @Test
    void whatLibrariesPrintStaysOutOfTheFindings() throws Exception {
        // The virtual machine itself reports this option on its standard error, which is not the user's.
        InstalledProduct.Outcome json = product.with("SADDLEBOOK_JAVA_OPTIONS", "-Dsaddlebook.threads=1")
                .run("evaluate", "rates.csv", "--json");
        assertTrue(json.out().startsWith("{"), json.out());
    }

    @Test
    void aModelThatIsNotInstalledIsRefused() throws Exception {
        InstalledProduct.Outcome refused = product.run("evaluate", "rates.csv", "--model", "nowhere");
        assertEquals(1, refused.exitCode());
        assertTrue(refused.err().contains("nowhere"));
    }

    @Test
    void onePointCannotBeFitted() throws Exception {
        Files.writeString(home.resolve("one.csv"), "T (K),k (1/s)\n300,1e-5\n");
        InstalledProduct.Outcome one = product.run("evaluate", "one.csv");
        assertEquals(1, one.exitCode(), one.all());
        assertFalse(one.showsAStackTrace());
    }

    @Test
    void anUndeterminedParameterIsNoError() throws Exception {
        Files.writeString(home.resolve("two.csv"), "T (K),k (1/s)\n300,1e-5\n320,2e-4\n");
        InstalledProduct.Outcome two = product.run("evaluate", "two.csv");
        assertEquals(0, two.exitCode(), two.all());
    }

    static Stream<Path> mistakes() throws IOException {
        try (Stream<Path> files = Files.list(InstalledProduct.ASSEMBLED.resolve("demo-data/with-mistakes"))) {
            return files.filter(file -> file.toString().endsWith(".csv")).sorted().toList().stream();
        }
    }

    @ParameterizedTest
    @MethodSource("mistakes")
    void badInputIsAMessageAndNeverAStackTrace(Path file) throws Exception {
        InstalledProduct.Outcome bad = product.run("evaluate", file.toString(), "--json", "--out", "result");
        assertEquals(2, bad.exitCode(), bad.all());
        assertEquals("", bad.out());
        assertTrue(bad.err().contains(file.getFileName().toString()), bad.err());
        assertTrue(bad.err().contains("found:")
                && bad.err().contains("expected:")
                && bad.err().contains("remedy:"));
        assertFalse(bad.showsAStackTrace());
        assertFalse(Files.exists(home.resolve("result")), "something was written");
    }

    @Test
    void aResultIsReplacedByANewerOneButNothingElseIs() throws Exception {
        assertEquals(0, product.run("evaluate", "rates.csv", "--out", "result").exitCode());
        assertTrue(Files.size(home.resolve("result/report.html")) > 0);
        byte[] first = Files.readAllBytes(home.resolve("result/findings.json"));
        assertEquals(0, product.run("evaluate", "rates.csv", "--out", "result").exitCode());
        assertEquals(new String(first, StandardCharsets.UTF_8), Files.readString(home.resolve("result/findings.json")));
        Files.writeString(home.resolve("result/notes.txt"), "mine");
        InstalledProduct.Outcome refused = product.run("evaluate", "rates.csv", "--out", "result");
        assertEquals(2, refused.exitCode());
        assertTrue(refused.err().contains("notes.txt"));
        assertEquals("mine", Files.readString(home.resolve("result/notes.txt")));
        try (Stream<Path> left = Files.list(home)) {
            assertEquals(
                    0,
                    left.filter(file -> file.getFileName().toString().startsWith(".saddlebook"))
                            .count());
        }
    }

    @Test
    void aWrittenResultIsACampaignThatGivesTheSameFindings() throws Exception {
        assertEquals(
                0,
                product.run("evaluate", "rates.csv", "--at", "25degC", "--out", "result")
                        .exitCode());
        InstalledProduct.Outcome again = product.run("evaluate", "result", "--json");
        assertEquals(0, again.exitCode(), again.err());
        assertEquals(Files.readString(home.resolve("result/findings.json")), again.out());
    }

    @Test
    void predictionsFromFindingsAreThoseOfTheEvaluation() throws Exception {
        assertEquals(
                0,
                product.run("evaluate", "rates.csv", "--at", "25degC", "--out", "result")
                        .exitCode());
        InstalledProduct.Outcome predicted = product.run("predict", "result", "--at", "25degC", "--model", "eyring");
        assertEquals(0, predicted.exitCode(), predicted.err());
        InstalledProduct.Outcome evaluated =
                product.run("evaluate", "rates.csv", "--at", "25degC", "--model", "eyring");
        String line = predicted
                .out()
                .lines()
                .filter(text -> text.contains(" k = "))
                .findFirst()
                .orElseThrow();
        String value = line.substring(0, line.indexOf('('));
        assertTrue(evaluated.out().contains(value), () -> value + "\nnot in\n" + evaluated.out());
    }

    @Test
    void anEntryOfTheRegisterPredictsAsItsFindingsDo() throws Exception {
        assertEquals(0, product.run("evaluate", "rates.csv", "--out", "result").exitCode());
        assertEquals(0, product.run("enter", "result").exitCode());
        InstalledProduct.Outcome entry = product.run("predict", "1", "--at", "25degC", "--json");
        assertEquals(0, entry.exitCode(), entry.err());
        assertEquals(
                product.run("predict", "result", "--at", "25degC", "--json").out(), entry.out());
        assertEquals(2, product.run("predict", "7", "--at", "25degC").exitCode());
    }

    @Test
    void aFileWithAnAccentInItsNameOpensInThePosixLocale() throws Exception {
        Files.copy(table, home.resolve("geschwindigkeit-größe.csv"));
        InstalledProduct.Outcome found = product.with("LC_ALL", "C").run("evaluate", "geschwindigkeit-größe.csv");
        assertEquals(0, found.exitCode(), found.err());
    }

    @Test
    void theSelfTestPasses() throws Exception {
        InstalledProduct.Outcome test = product.run("self-test");
        assertEquals(0, test.exitCode(), test.all());
        assertTrue(test.out().endsWith("passed\n"), test.out());
    }

    @Test
    void aFileOfTheProductThatWasChangedIsFound() throws Exception {
        Path changed = InstalledProduct.copy(home.resolve("changed"));
        Files.write(changed.resolve("lib/training"), List.of("help"));
        Path jar = changed.resolve("bundles/org.saddlebook.model-eyring-0.1.0.jar");
        Files.write(jar, new byte[] {0}, java.nio.file.StandardOpenOption.APPEND);
        InstalledProduct.Outcome check =
                InstalledProduct.of(changed, home.resolve("user")).run("bundles", "check");
        assertEquals(4, check.exitCode(), check.all());
        assertTrue(check.err().contains("org.saddlebook.model-eyring-0.1.0.jar"), check.err());
    }

    @Test
    void anInterruptEndsWithItsOwnCodeAndLeavesNothingHalf() throws Exception {
        // Enough points that the signal arrives while the command runs.
        StringBuilder many = new StringBuilder("T (K),k (1/s)\n");
        for (int i = 0; i < 300_000; i++) {
            many.append(300 + i % 97).append(",1.").append(i % 89 + 10).append("e-4\n");
        }
        Files.writeString(home.resolve("many.csv"), many);
        InstalledProduct.Running running = product.startInterruptible("evaluate", "many.csv", "--out", "result");
        Path framework = home.resolve("cache/saddlebook/framework");
        long deadline = System.nanoTime() + 60_000_000_000L;
        while (!Files.isDirectory(framework) && running.process().isAlive() && System.nanoTime() < deadline) {
            Thread.onSpinWait();
        }
        new ProcessBuilder("kill", "-INT", Long.toString(running.process().pid()))
                .start()
                .waitFor();
        InstalledProduct.Outcome cancelled = InstalledProduct.finish(running);
        assertEquals(130, cancelled.exitCode(), cancelled.all());
        assertFalse(cancelled.showsAStackTrace(), cancelled.all());
        assertFalse(Files.exists(home.resolve("result")));
    }
}
