package org.saddlebook.launcher.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class FoldersTest {
    @Test
    void linuxFollowsTheXdgSpecification() {
        // XDG Base Directory Specification 0.8: defaults below the home folder; relative paths are to be ignored.
        Folders plain = Folders.of("Linux", Map.of(), "/home/a");
        assertEquals(Path.of("/home/a/.local/share/saddlebook"), plain.data());
        assertEquals(Path.of("/home/a/.cache/saddlebook"), plain.cache());
        assertEquals(Path.of("/home/a/.config/saddlebook"), plain.config());
        Folders set = Folders.of(
                "Linux", Map.of("XDG_DATA_HOME", "/d", "XDG_CACHE_HOME", "relative", "XDG_CONFIG_HOME", ""), "/home/a");
        assertEquals(Path.of("/d/saddlebook"), set.data());
        assertEquals(Path.of("/home/a/.cache/saddlebook"), set.cache());
        assertEquals(Path.of("/home/a/.config/saddlebook"), set.config());
    }

    @Test
    void macUsesTheLibrary() {
        Folders folders = Folders.of("Mac OS X", Map.of("XDG_DATA_HOME", "/d"), "/Users/a");
        assertEquals(Path.of("/Users/a/Library/Application Support/Saddlebook"), folders.data());
        assertEquals(Path.of("/Users/a/Library/Caches/Saddlebook"), folders.cache());
    }

    @Test
    void newFoldersAreForTheirOwnerAlone(@TempDir Path folder) throws Exception {
        Path made = Folders.create(folder.resolve("a/b"));
        assertTrue(Files.isDirectory(made));
        assertEquals("rwx------", PosixFilePermissions.toString(Files.getPosixFilePermissions(made)));
        assertEquals("rwx------", PosixFilePermissions.toString(Files.getPosixFilePermissions(folder.resolve("a"))));
        assertEquals(made, Folders.create(made));
    }
}
