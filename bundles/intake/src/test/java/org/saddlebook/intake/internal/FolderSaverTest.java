package org.saddlebook.intake.internal;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.saddlebook.intake.internal.IntakeFixture.FORMAT;
import static org.saddlebook.intake.internal.IntakeFixture.TABLE;
import static org.saddlebook.intake.internal.IntakeFixture.open;
import static org.saddlebook.intake.internal.IntakeFixture.write;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.service.Intake;

class FolderSaverTest {
    @TempDir
    private Path temp;

    private final FolderSaver saver = new FolderSaver(FORMAT);
    private Intake.Opened opened;

    @BeforeEach
    void openTable() throws Exception {
        opened = open(write(temp, "rates.csv", "# standard state: 1 bar\n# dH: 62 +- 2 kJ/mol\n" + TABLE));
    }

    private List<String> files(Path folder) throws IOException {
        try (Stream<Path> tree = Files.walk(folder)) {
            return tree.filter(Files::isRegularFile)
                    .map(file -> folder.relativize(file).toString().replace('\\', '/'))
                    .sorted()
                    .toList();
        }
    }

    @Test
    void openedAgainItIsTheSameCampaign() throws Exception {
        Path folder = temp.resolve("new/saved");
        saver.save(opened, folder);
        assertEquals(List.of("campaign.json", "sources/rates.csv"), files(folder));
        Intake.Opened again = open(folder);
        assertEquals(opened.campaign(), again.campaign());
        assertEquals(FORMAT.digest(opened.campaign()), FORMAT.digest(again.campaign()), "and so the same findings");
        assertArrayEquals(opened.parts().get(0).bytes(), again.parts().get(0).bytes());
        assertEquals(List.of("saved"), names(folder.getParent()), "nothing left beside it");
    }

    private static List<String> names(Path folder) throws IOException {
        try (Stream<Path> entries = Files.list(folder)) {
            return entries.map(entry -> entry.getFileName().toString()).sorted().toList();
        }
    }

    @Test
    void takesAnEmptyFolderAndAnEarlierSave() throws Exception {
        Path folder = Files.createDirectories(temp.resolve("saved"));
        saver.save(opened, folder);
        Intake.Opened renamed =
                new Intake.Opened(opened.campaign().withTitle("renamed"), opened.parts(), opened.understood());
        saver.save(renamed, folder);
        assertEquals("renamed", open(folder).campaign().title());
        assertEquals(List.of("rates.csv", "saved"), names(temp));
    }

    @Test
    void leavesForeignFoldersAlone() throws Exception {
        Path folder = Files.createDirectories(temp.resolve("thesis"));
        write(folder, "chapter.txt", "text");
        InputException e = assertThrows(InputException.class, () -> saver.save(opened, folder));
        assertEquals("folder-taken", e.problems().get(0).code());
        assertTrue(e.problems().get(0).found().contains("chapter.txt"));
        assertEquals(List.of("chapter.txt"), files(folder));
    }

    @Test
    void leavesCampaignsWithForeignFilesAlone() throws Exception {
        Path folder = temp.resolve("saved");
        saver.save(opened, folder);
        write(folder, "sources/notes.txt", "mine");
        assertThrows(InputException.class, () -> saver.save(opened, folder));
        assertEquals(List.of("campaign.json", "sources/notes.txt", "sources/rates.csv"), files(folder));
    }

    @Test
    void leavesFilesAlone() throws Exception {
        Path file = write(temp, "taken", "mine");
        InputException e = assertThrows(InputException.class, () -> saver.save(opened, file));
        assertEquals("folder-taken", e.problems().get(0).code());
        assertEquals("mine", Files.readString(file));
    }

    @Test
    void saysWhyItCouldNotBeWritten() throws Exception {
        Path file = write(temp, "file", "mine");
        IOException e = assertThrows(IOException.class, () -> saver.save(opened, file.resolve("below")));
        assertTrue(e.getMessage().startsWith("The campaign could not be saved in "), e.getMessage());
    }

    @Test
    void refusesPartsThatAreNotWhatTheirHashSays() {
        Intake.Part wrong = new Intake.Part("sources/rates.csv", new byte[] {1});
        Intake.Opened broken = new Intake.Opened(opened.campaign(), List.of(wrong), List.of());
        assertThrows(IllegalArgumentException.class, () -> saver.save(broken, temp.resolve("x")));
        Intake.Opened without = new Intake.Opened(opened.campaign(), List.of(), List.of());
        assertThrows(IllegalArgumentException.class, () -> saver.save(without, temp.resolve("x")));
    }
}
