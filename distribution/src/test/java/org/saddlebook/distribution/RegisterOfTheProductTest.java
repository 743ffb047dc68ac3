package org.saddlebook.distribution;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.NavigableSet;
import java.util.Random;
import java.util.TreeSet;
import java.util.concurrent.TimeUnit;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.condition.DisabledOnOs;
import org.junit.jupiter.api.condition.OS;
import org.junit.jupiter.api.io.TempDir;

/** The register as the installed product keeps it: killed at random moments, written by several processes at once. */
@Timeout(value = 30, unit = TimeUnit.MINUTES)
class RegisterOfTheProductTest {
    private static final Pattern ACKNOWLEDGED = Pattern.compile("Entered as (\\d+):");
    private static final Pattern NUMBER = Pattern.compile("\"number\": ?(\\d+)");

    @TempDir
    Path home;

    private InstalledProduct product;
    private Path table;

    @BeforeEach
    void install() throws IOException {
        product = InstalledProduct.of(InstalledProduct.ASSEMBLED, home);
        table = Files.writeString(
                home.resolve("rates.csv"), "T (degC),k (1/s)\n20,1.1e-5\n40,1.22e-4\n50,3.7e-4\n60,1.02e-3\n");
    }

    @Test
    void anEntryVerifiesRecomputesAndPredicts() throws Exception {
        assertEquals(0, product.run("enter", table.toString()).exitCode());
        assertEquals(0, product.run("register", "verify").exitCode());
        InstalledProduct.Outcome again = product.run("register", "recompute", "1");
        assertEquals(0, again.exitCode(), again.all());
        assertTrue(again.out().contains("bit for bit"), again.all());
        InstalledProduct.Outcome predicted = product.run("predict", "1", "--at", "25degC", "--model", "eyring");
        assertEquals(0, predicted.exitCode(), predicted.all());
        assertTrue(predicted.out().contains("eyring"), predicted.all());
    }

    @Test
    void fourProcessesAtOnceLoseNothingAndLeaveNoGap() throws Exception {
        List<InstalledProduct.Running> running = new ArrayList<>();
        for (int i = 0; i < 4; i++) {
            running.add(product.start("enter", table.toString()));
        }
        for (InstalledProduct.Running each : running) {
            assertEquals(0, each.process().waitFor(), () -> read(each.err()));
        }
        assertEquals(new TreeSet<>(List.of(1, 2, 3, 4)), entries());
        assertEquals(0, product.run("register", "verify").exitCode());
    }

    /** A twentieth of the full run. */
    @Test
    @DisabledOnOs(value = OS.WINDOWS, disabledReason = "Windows has no kill -9")
    void killsAtRandomMomentsLoseNoAcknowledgedEntry() throws Exception {
        kill(10, System.nanoTime());
    }

    @Test
    @Tag("long")
    @DisabledOnOs(value = OS.WINDOWS, disabledReason = "Windows has no kill -9")
    void twoHundredKillsAtRandomMomentsLoseNoAcknowledgedEntry() throws Exception {
        kill(200, System.nanoTime());
    }

    private void kill(int times, long seed) throws Exception {
        System.out.println("seed of the kills: " + seed);
        Random random = new Random(seed);
        // How long an undisturbed entry takes here; the kill falls anywhere up to a little after that.
        long start = System.nanoTime();
        TreeSet<Integer> acknowledged = new TreeSet<>();
        acknowledged.add(acknowledged(product.run("enter", table.toString()).out()));
        long whole = (System.nanoTime() - start) * 12 / 10;
        int killed = 0;
        for (int i = 0; i < times; i++) {
            InstalledProduct.Running running = product.start("enter", table.toString());
            if (!running.process().waitFor((long) (random.nextDouble() * whole), TimeUnit.NANOSECONDS)) {
                running.process().destroyForcibly();
                killed++;
            }
            running.process().waitFor();
            String printed = read(running.out());
            if (ACKNOWLEDGED.matcher(printed).find()) {
                acknowledged.add(acknowledged(printed));
            }
            InstalledProduct.Outcome verified = product.run("register", "verify");
            assertEquals(0, verified.exitCode(), "after kill " + i + " of seed " + seed + ": " + verified.all());
        }
        NavigableSet<Integer> entries = entries();
        assertTrue(entries.containsAll(acknowledged), acknowledged + " acknowledged, " + entries + " there");
        assertEquals(entries.size(), entries.last(), "numbers have no gap: " + entries);
        System.out.println(times + " entries started, " + killed + " killed, " + acknowledged.size() + " acknowledged, "
                + entries.size() + " in the register");
    }

    private NavigableSet<Integer> entries() throws IOException, InterruptedException {
        InstalledProduct.Outcome listed = product.run("register", "list", "--json");
        assertEquals(0, listed.exitCode(), listed.all());
        TreeSet<Integer> numbers = new TreeSet<>();
        Matcher number = NUMBER.matcher(listed.out());
        while (number.find()) {
            numbers.add(Integer.valueOf(number.group(1)));
        }
        return numbers;
    }

    private static int acknowledged(String printed) {
        Matcher matcher = ACKNOWLEDGED.matcher(printed);
        assertTrue(matcher.find(), printed);
        return Integer.parseInt(matcher.group(1));
    }

    private static String read(Path file) {
        try {
            return Files.readString(file);
        } catch (IOException unreadable) {
            return unreadable.toString();
        }
    }
}
