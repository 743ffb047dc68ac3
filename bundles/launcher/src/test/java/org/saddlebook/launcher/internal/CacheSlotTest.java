package org.saddlebook.launcher.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class CacheSlotTest {
    @TempDir
    private Path parent;

    private void fill(String key, String content) throws IOException {
        try (CacheSlot slot = CacheSlot.take(parent, key)) {
            Files.createDirectories(slot.storage());
            Files.writeString(slot.storage().resolve("content"), content);
            slot.markFilled();
        }
    }

    @Test
    void aFilledSlotIsFoundAgain() throws IOException {
        fill("one", "1");
        fill("two", "2");
        for (String[] each : new String[][] {{"one", "1"}, {"two", "2"}}) {
            try (CacheSlot slot = CacheSlot.take(parent, each[0])) {
                assertTrue(slot.filled());
                assertEquals(each[1], Files.readString(slot.storage().resolve("content")));
            }
        }
    }

    @Test
    void aSlotThatWasNotFilledToTheEndIsEmptied() throws IOException {
        try (CacheSlot slot = CacheSlot.take(parent, "one")) {
            Files.createDirectories(slot.storage());
            Files.writeString(slot.storage().resolve("half"), "x");
        }
        try (CacheSlot slot = CacheSlot.take(parent, "one")) {
            assertFalse(slot.filled());
            assertFalse(Files.exists(slot.storage().resolve("half")));
        }
    }

    @Test
    void aBusySlotIsLeftAlone() throws IOException {
        fill("one", "1");
        try (CacheSlot first = CacheSlot.take(parent, "one");
                CacheSlot second = CacheSlot.take(parent, "one")) {
            assertNotEquals(first.storage(), second.storage());
            assertTrue(first.filled());
            assertFalse(second.filled());
        }
    }

    @Test
    void slotsDoNotPileUp() throws IOException {
        for (int i = 0; i < 40; i++) {
            fill("set " + i, Integer.toString(i));
        }
        try (var files = Files.list(parent)) {
            assertTrue(files.filter(Files::isDirectory).count() <= 8);
        }
    }

    @Test
    void aTemporarySlotGoesWithItsRun() throws IOException {
        Path storage;
        try (CacheSlot slot = CacheSlot.temporary("one")) {
            storage = Files.createDirectories(slot.storage());
        }
        assertFalse(Files.exists(storage.getParent()));
    }

    @Test
    void withoutAPlaceForCachesARunUsesATemporaryOne() throws IOException {
        Path file = Files.writeString(parent.resolve("file"), "not a folder");
        try (CacheSlot slot = CacheSlot.take(file, "one")) {
            assertFalse(slot.storage().startsWith(parent));
        }
    }
}
