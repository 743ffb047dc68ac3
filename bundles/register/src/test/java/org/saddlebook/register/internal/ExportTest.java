package org.saddlebook.register.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.EnabledOnOs;
import org.junit.jupiter.api.condition.OS;
import org.junit.jupiter.api.io.TempDir;
import org.saddlebook.register.api.Draft;
import org.saddlebook.register.api.PartFile;

class ExportTest {
    private final StoredRegister register = new StoredRegister(new MemoryStore(), Clock.systemUTC());

    @TempDir
    Path folder;

    /** Runs the commands of the README as they stand, with the system's sha256sum: nothing of ours takes part. */
    @Test
    @EnabledOnOs(OS.LINUX)
    void canBeCheckedByHandWithTheCommandsOfItsReadme() throws Exception {
        for (int i = 1; i <= 13; i++) {
            register.enter(Draft.entered("ada", "entry " + i), List.of(part("parts.txt", "content " + i)));
        }
        for (int number = 1; number <= 13; number++) {
            Path target = Files.createDirectory(folder.resolve("entry-" + number));
            write(target, number);
            assertEquals(register.head().root().hex(), byHand(target), "entry " + number);
        }
    }

    @Test
    @EnabledOnOs(OS.LINUX)
    void failsTheCheckByHandWhenTheRecordWasChanged() throws Exception {
        for (int i = 1; i <= 3; i++) {
            register.enter(Draft.entered("ada", "entry " + i), List.of(part("parts.txt", "content " + i)));
        }
        write(folder, 2);
        Path record = folder.resolve("record.json");
        Files.writeString(record, Files.readString(record).replace("ada", "eve"));
        String printed = byHand(folder);
        assertTrue(printed.contains("FAILED"), printed);
        assertTrue(!printed.contains(register.head().root().hex()), printed);
    }

    @Test
    void namesWhatWasRecordedAboutTheEntryWithoutLettingTextIntoThePage() throws Exception {
        register.enter(Draft.entered("ada", "<b>&"), List.of(part("a.txt", "a")));
        register.append(Draft.reviewed("grace", 1, "checked <script>alert(1)</script>"));
        register.append(Draft.withdrawn("ada", 1, "wrong stock"));
        write(folder, 1);
        String page = Files.readString(folder.resolve("signatures.html"));
        assertTrue(page.contains("withdrawn by record 3"), page);
        assertTrue(page.contains("checked &lt;script&gt;"), page);
        assertTrue(page.contains("&lt;b&gt;&amp;"), page);
        assertTrue(!page.contains("<script>"), page);
        assertTrue(Files.exists(folder.resolve("about/record-2.json")));
        assertTrue(Files.exists(folder.resolve("about/record-3.proof.json")));
    }

    private static PartFile part(String name, String content) {
        return PartFile.of(name, "text/plain", content.getBytes(StandardCharsets.UTF_8));
    }

    private void write(Path target, long number) throws IOException {
        for (PartFile file : register.export(number).files()) {
            Path path = target.resolve(file.name());
            Files.createDirectories(path.getParent());
            try (InputStream in = file.content().open()) {
                Files.copy(in, path);
            }
        }
    }

    private static String byHand(Path target) throws Exception {
        StringBuilder script = new StringBuilder();
        for (String line : Files.readAllLines(target.resolve("README.txt"))) {
            if (line.startsWith("    ")) {
                script.append(line.strip()).append('\n');
            }
        }
        Process process = new ProcessBuilder("bash", "-c", script.toString())
                .directory(target.toFile())
                .redirectErrorStream(true)
                .start();
        String printed = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        assertTrue(process.waitFor(60, TimeUnit.SECONDS));
        return printed.strip();
    }
}
