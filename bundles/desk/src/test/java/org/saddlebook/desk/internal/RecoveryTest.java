package org.saddlebook.desk.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.api.service.CampaignFolder;
import org.saddlebook.api.service.Intake;
import org.saddlebook.desk.api.DeskState;

/** With a campaign format of one line, the title: the real one is tried in the product. */
class RecoveryTest {
    @TempDir
    private Path data;

    private final CampaignFolder saver = (opened, folder) -> {
        Files.createDirectories(folder);
        Files.writeString(folder.resolve("campaign.json"), opened.campaign().title());
    };

    private final Intake intake = (input, rule, who, progress) -> {
        try {
            String title = Files.readString(input.resolve("campaign.json"), StandardCharsets.UTF_8);
            return new Intake.Opened(Campaign.titled(title), List.of(), List.of());
        } catch (java.io.IOException e) {
            throw new java.io.UncheckedIOException(e);
        }
    };

    private static DeskState state(String title) {
        return DeskState.of(Campaign.titled(title));
    }

    @Test
    void whatARunThatDiedHasLeftIsFoundOnce() throws Exception {
        // A run that is not closed and whose lock is gone, as after the death of its process.
        try (Recovery dead = Recovery.in(data)) {
            dead.keep("a", state("Unsaved"), saver);
        }
        try (Recovery next = Recovery.in(data)) {
            Map<String, Recovery.Left> left = next.left(intake, "ada");
            assertEquals(1, left.size());
            assertEquals(
                    "Unsaved",
                    left.values().iterator().next().state().campaign().title());
            assertEquals(Map.of(), next.left(intake, "ada"));
            next.drop(left.keySet().iterator().next());
        }
        try (Recovery later = Recovery.in(data)) {
            assertEquals(Map.of(), later.left(intake, "ada"));
        }
    }

    @Test
    void aRunThatLivesKeepsItsOwn() throws Exception {
        try (Recovery living = Recovery.in(data);
                Recovery other = Recovery.in(data)) {
            living.keep("a", state("Mine"), saver);
            assertEquals(Map.of(), other.left(intake, "ada"));
        }
    }

    @Test
    void ruleAndFolderComeBackToo() throws Exception {
        ReadingRule rule = new ReadingRule(Map.of("unit.T", "Cel"));
        Path home = data.resolve("campaigns/one");
        try (Recovery dead = Recovery.in(data)) {
            dead.keep(
                    "a",
                    state("Unsaved").withSources(List.of(), List.of(), rule).withFolder(home),
                    saver);
        }
        try (Recovery next = Recovery.in(data)) {
            DeskState state =
                    next.left(intake, "ada").values().iterator().next().state();
            assertEquals(rule, state.rule());
            assertEquals(home, state.folder().orElseThrow());
        }
    }

    @Test
    void aRunWithNothingUnsavedLeavesNothing() throws Exception {
        try (Recovery run = Recovery.in(data)) {
            run.keep("a", state("Saved later"), saver);
            run.drop("a");
        }
        try (var runs = Files.list(data.resolve("desk/unsaved"))) {
            assertEquals(0, runs.count());
        }
        assertTrue(Files.isDirectory(data));
    }
}
