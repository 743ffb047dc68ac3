package org.saddlebook.register.sqlite.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.FileTime;
import java.time.Instant;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.saddlebook.register.api.RegisterStoreFactory.Opening;

/** Runs in processes of its own, because a driver loads its library once. */
class NativeLibraryTest {
    @TempDir
    Path folder;

    @Test
    void unpacksOnceAndUsesItAgain() throws Exception {
        open();
        List<Path> first = files();
        assertEquals(1, first.size(), first.toString());
        FileTime old = FileTime.from(Instant.parse("2001-02-03T04:05:06Z"));
        Files.setLastModifiedTime(first.get(0), old);
        open();
        assertEquals(first, files());
        assertEquals(old, Files.getLastModifiedTime(first.get(0)), "not written again");
    }

    @Test
    void doesNotLoadALibraryWhoseBytesWereChanged() throws Exception {
        open();
        Path library = files().get(0);
        byte[] honest = Files.readAllBytes(library);
        byte[] damaged = honest.clone();
        damaged[damaged.length / 2] ^= 1;
        Files.write(library, damaged);
        open();
        assertEquals(-1, Arrays.mismatch(honest, Files.readAllBytes(library)));
    }

    /** Opens a register with this cache, in another process. */
    private void open() throws Exception {
        Process process = new ProcessBuilder(
                        Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                        "-Djava.io.tmpdir=" + folder.resolve("no-such-folder"),
                        "-cp",
                        System.getProperty("surefire.test.class.path", System.getProperty("java.class.path")),
                        NativeLibraryTest.class.getName(),
                        folder.toString())
                .redirectErrorStream(true)
                .start();
        String printed = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        assertEquals(0, process.waitFor(), printed);
        assertTrue(printed.contains("opened"), printed);
    }

    private List<Path> files() throws Exception {
        try (Stream<Path> files = Files.walk(folder.resolve("cache"))) {
            return files.filter(Files::isRegularFile).toList();
        }
    }

    public static void main(String[] arguments) throws Exception {
        Path folder = Path.of(arguments[0]);
        new SqliteStoreFactory(Optional.of(folder.resolve("cache")))
                .open(folder.resolve("a.register").toString(), Opening.CREATE)
                .close();
        System.out.println("opened");
    }
}
