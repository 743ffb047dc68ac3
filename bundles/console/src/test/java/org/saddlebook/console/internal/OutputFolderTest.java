package org.saddlebook.console.internal;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.console.api.OutputFolder;

class OutputFolderTest {
    private static final byte[] ONE = {1};
    private static final byte[] TWO = {2};

    @TempDir
    private Path parent;

    private static OutputFolder.Content content(String name, byte[] bytes) {
        OutputFolder.Content content = new OutputFolder.Content();
        content.add(name, bytes);
        return content;
    }

    @Test
    void writesIntoANewFolderWithItsParents() throws Exception {
        Path folder = parent.resolve("a/b/result");
        OutputFolder.at(folder).write(content("figures/one.svg", ONE));
        assertArrayEquals(ONE, Files.readAllBytes(folder.resolve("figures/one.svg")));
        assertNothingElseIn(folder.getParent(), 1);
    }

    @Test
    void aNewerResultReplacesAllOfAnOlderOne() throws Exception {
        Path folder = parent.resolve("result");
        OutputFolder.at(folder).write(content("old.txt", ONE));
        OutputFolder.at(folder).write(content("new.txt", TWO));
        assertFalse(Files.exists(folder.resolve("old.txt")));
        assertArrayEquals(TWO, Files.readAllBytes(folder.resolve("new.txt")));
        assertNothingElseIn(parent, 1);
    }

    @Test
    void anEmptyFolderIsUsed() throws Exception {
        Path folder = Files.createDirectory(parent.resolve("result"));
        OutputFolder.at(folder).write(content("new.txt", TWO));
        assertTrue(Files.exists(folder.resolve("new.txt")));
    }

    @Test
    void aFolderWithAForeignFileIsRefusedAndLeftAlone() throws Exception {
        Path folder = parent.resolve("result");
        OutputFolder.at(folder).write(content("old.txt", ONE));
        Files.write(folder.resolve("mine.txt"), TWO);
        InputException refused = assertThrows(InputException.class, () -> OutputFolder.at(folder));
        assertTrue(refused.problems().get(0).found().contains("mine.txt"));
        assertArrayEquals(ONE, Files.readAllBytes(folder.resolve("old.txt")));
    }

    @Test
    void aFileThatAppearsMeanwhileStopsTheWriting() throws Exception {
        Path folder = Files.createDirectory(parent.resolve("result"));
        OutputFolder output = OutputFolder.at(folder);
        Files.write(folder.resolve("mine.txt"), TWO);
        assertThrows(InputException.class, () -> output.write(content("new.txt", ONE)));
        assertFalse(Files.exists(folder.resolve("new.txt")));
        assertNothingElseIn(parent, 1);
    }

    @Test
    void aFileOutsideTheFolderIsNeverWritten() throws Exception {
        OutputFolder output = OutputFolder.at(parent.resolve("result"));
        assertThrows(IOException.class, () -> output.write(content("../outside.txt", ONE)));
        assertFalse(Files.exists(parent.resolve("outside.txt")));
        assertNothingElseIn(parent, 0);
    }

    @Test
    void aSourceMayNotTakeTheNameOfAFileOfTheResult() throws Exception {
        OutputFolder.Content content = content("report.html", ONE);
        assertThrows(InputException.class, () -> content.addSource("report.html", TWO));
    }

    @Test
    void aFileInPlaceOfTheFolderIsRefused() throws Exception {
        Path file = Files.write(parent.resolve("result"), ONE);
        assertThrows(InputException.class, () -> OutputFolder.at(file));
    }

    private static void assertNothingElseIn(Path folder, long expected) throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            assertEquals(expected, files.count(), "something was left behind");
        }
    }
}
