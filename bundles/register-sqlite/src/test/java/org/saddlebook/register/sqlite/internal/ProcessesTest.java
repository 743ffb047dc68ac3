package org.saddlebook.register.sqlite.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.BufferedReader;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.TreeMap;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.condition.DisabledOnOs;
import org.junit.jupiter.api.condition.OS;
import org.junit.jupiter.api.io.TempDir;
import org.saddlebook.register.api.Entry;
import org.saddlebook.register.api.Register;
import org.saddlebook.register.api.RegisterStoreFactory.Opening;
import org.saddlebook.register.api.Verification;

/** Several processes at one register, and processes that die. */
class ProcessesTest {
    private static final int REGISTER_LASTS = 25;

    @TempDir
    Path folder;

    private Path file() {
        return folder.resolve("saddlebook.register");
    }

    private static Process start(Path file, long seed, int count) throws IOException {
        return new ProcessBuilder(
                        Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                        "-XX:+UseSerialGC",
                        "-XX:TieredStopAtLevel=1",
                        "-Xmx128m",
                        "-cp",
                        System.getProperty("surefire.test.class.path", System.getProperty("java.class.path")),
                        EnteringProcess.class.getName(),
                        file.toString(),
                        Long.toString(seed),
                        Integer.toString(count))
                .redirectError(ProcessBuilder.Redirect.INHERIT)
                .start();
    }

    private static void go(Process process) throws IOException {
        process.getOutputStream().write('\n');
        process.getOutputStream().flush();
    }

    @Test
    @Timeout(300)
    void loseNothingAndLeaveNoGapWhenFourEnterAtOnce() throws Exception {
        int each = 20;
        List<Process> processes = new ArrayList<>();
        List<BufferedReader> outputs = new ArrayList<>();
        for (int i = 0; i < 4; i++) {
            Process process = start(file(), 100 + i, each);
            processes.add(process);
            outputs.add(process.inputReader(StandardCharsets.UTF_8));
        }
        for (BufferedReader output : outputs) {
            assertEquals("ready", output.readLine());
        }
        for (Process process : processes) {
            go(process);
        }
        TreeMap<Long, String> acknowledged = new TreeMap<>();
        for (int i = 0; i < 4; i++) {
            assertEquals(each, collect(outputs.get(i), acknowledged, Integer.MAX_VALUE));
            assertEquals(0, processes.get(i).waitFor());
        }
        assertEquals(4 * each, acknowledged.size(), "no number was given twice");
        assertEquals(1L, acknowledged.firstKey());
        assertEquals(4L * each, acknowledged.lastKey());
        Verification verification = Fixture.verify(file());
        assertTrue(verification.agrees(), () -> verification.differences().toString());
        holdTo(acknowledged);
    }

    @Test
    @Timeout(300)
    @DisabledOnOs(value = OS.WINDOWS, disabledReason = "Windows has no kill -9")
    void loseNoAcknowledgedEntryWhenKilledTenTimes() throws Exception {
        kill(10, System.nanoTime());
    }

    @Test
    @Tag("long")
    @Timeout(1800)
    @DisabledOnOs(value = OS.WINDOWS, disabledReason = "Windows has no kill -9")
    void loseNoAcknowledgedEntryWhenKilledTwoHundredTimes() throws Exception {
        kill(200, System.nanoTime());
    }

    /** Kills at random moments: at once, while the register is made, between and within entries. */
    private void kill(int times, long seed) throws Exception {
        System.out.println("kill -9, " + times + " times, seed " + seed);
        Random random = new Random(seed);
        TreeMap<Long, String> acknowledged = new TreeMap<>();
        int total = 0;
        int journals = 0;
        for (int i = 0; i < times; i++) {
            if (i > 0 && i % REGISTER_LASTS == 0) { // a new one, because each check reads all of it
                total += acknowledged.size();
                acknowledged.clear();
                Files.deleteIfExists(folder.resolve("saddlebook.register-journal"));
                Files.deleteIfExists(file());
            }
            Process process = start(file(), random.nextLong(), 1_000_000);
            BufferedReader output = process.inputReader(StandardCharsets.UTF_8);
            assertEquals("ready", output.readLine());
            go(process);
            collect(output, acknowledged, random.nextInt(6));
            process.waitFor(random.nextInt(60_000_000), TimeUnit.NANOSECONDS);
            process.toHandle().destroyForcibly(); // SIGKILL; Process.destroyForcibly would also close the output
            process.waitFor();
            collect(output, acknowledged, Integer.MAX_VALUE);
            journals += Files.exists(folder.resolve("saddlebook.register-journal")) ? 1 : 0;
            if (Files.exists(file()) && Files.size(file()) > 0) {
                Verification verification = Fixture.verify(file());
                assertTrue(verification.agrees(), "seed " + seed + ", kill " + i + ": " + verification.differences());
            }
            holdTo(acknowledged);
        }
        total += acknowledged.size();
        System.out.println(total + " acknowledged, " + journals + " deaths left a journal behind");
        assertTrue(total >= times, "the processes did enter");
    }

    /** Reads acknowledgements until there are {@code most} or the output ends. A torn last line is no acknowledgement. */
    private static int collect(BufferedReader output, Map<Long, String> acknowledged, int most) throws IOException {
        int count = 0;
        while (count < most) {
            String line = output.readLine();
            if (line == null) {
                break;
            }
            String[] words = line.split(" ", -1);
            if (words.length == 3 && words[2].length() == 64) {
                assertEquals("ack", words[0]);
                assertEquals(null, acknowledged.put(Long.parseLong(words[1]), words[2]), line);
                count++;
            }
        }
        return count;
    }

    private void holdTo(Map<Long, String> acknowledged) throws Exception {
        if (acknowledged.isEmpty()) {
            return;
        }
        TreeMap<Long, String> stored = new TreeMap<>();
        try (Register register = Fixture.open(file(), Opening.EXISTING)) {
            for (Entry entry : register.list()) {
                stored.put(entry.number(), entry.receipt().head().root().hex());
            }
        }
        acknowledged.forEach((number, root) -> assertEquals(root, stored.get(number), "entry " + number));
    }
}
