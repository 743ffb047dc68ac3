package org.saddlebook.launcher.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class KnownHashesTest {
    /** SHA-256 of "abc": FIPS 180-2, appendix B.1. */
    private static final String ABC = "ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad";

    @TempDir
    private Path folder;

    @Test
    void keepsTheHashOfEachBundleByItsLocation() throws Exception {
        Path jar = Files.writeString(folder.resolve("a bundle.jar"), "abc");
        new KnownHashes(folder.resolve("hashes")).keep(List.of(jar));
        KnownHashes later = new KnownHashes(folder.resolve("hashes"));
        assertEquals(ABC, later.apply(KnownHashes.location(jar)));
        assertEquals("", later.apply("reference:file:/elsewhere.jar"));
    }

    @Test
    void nothingIsKnownWhereNothingWasKept() {
        assertEquals("", new KnownHashes(folder.resolve("none")).apply("reference:file:/a.jar"));
    }
}
