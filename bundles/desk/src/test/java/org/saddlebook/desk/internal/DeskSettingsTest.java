package org.saddlebook.desk.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class DeskSettingsTest {
    @TempDir
    private Path folder;

    @Test
    void areThereAgainAfterSaving() throws IOException {
        DeskSettings settings = DeskSettings.in(folder.resolve("new"));
        settings.theme(DeskSettings.Theme.DARK);
        settings.opened("/data/a.csv");
        settings.opened("/data/b.csv");
        settings.opened("/data/a.csv");
        settings.size(1200, 700);
        settings.demoSeen(true);
        settings.setAside("barrier", true);
        settings.save();
        DeskSettings again = DeskSettings.in(folder.resolve("new"));
        assertEquals(DeskSettings.Theme.DARK, again.theme());
        assertEquals(List.of("/data/a.csv", "/data/b.csv"), again.recent());
        assertEquals(1200, again.width());
        assertTrue(again.demoSeen());
        assertEquals(List.of("barrier"), again.setAside());
    }

    @Test
    void aDamagedFileCountsAsNone() throws IOException {
        for (String text : new String[] {"", "{", "[1]", "{\"theme\":\"MAUVE\"}", "{\"recent\":[1,{}]}"}) {
            Files.writeString(folder.resolve("desk.json"), text);
            DeskSettings settings = DeskSettings.in(folder);
            assertEquals(DeskSettings.Theme.SYSTEM, settings.theme(), text);
            assertEquals(List.of(), settings.recent(), text);
        }
    }

    @Test
    void savingLeavesNothingHalfWrittenBehind() throws IOException {
        DeskSettings.in(folder).save();
        try (var files = Files.list(folder)) {
            assertEquals(1, files.count());
        }
    }
}
