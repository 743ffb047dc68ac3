package org.saddlebook.distribution.desk;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.event.KeyEvent;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;
import org.saddlebook.testkit.api.NeedsScreen;

/**
 * The walks in the document on the desk, done as they are written there: a block marked {@code walk} holds one interaction a
 * line, and lines that begin with {@code see} say what must then be on screen.
 */
@NeedsScreen
@Timeout(300)
class DocumentedWalkTest {
    private static final int FEWER_THAN = 25;
    private static final Path DOCUMENT = Path.of("docs", "desk.md");

    @TempDir
    private Path folder;

    private record Block(String head, List<String> lines) {}

    private static List<Block> blocks() throws Exception {
        List<Block> blocks = new ArrayList<>();
        List<String> open = null;
        String head = "";
        for (String line : Files.readAllLines(DOCUMENT)) {
            if (line.startsWith("```") && open == null) {
                open = new ArrayList<>();
                head = line.substring(3).strip();
            } else if (line.startsWith("```")) {
                blocks.add(new Block(head, open));
                open = null;
            } else if (open != null) {
                open.add(line);
            }
        }
        return blocks;
    }

    @Test
    void fromAFreshStartToAnEntryOfOnesOwnTable() throws Exception {
        int walks = 0;
        for (Block block : blocks()) {
            if (block.head().startsWith("csv ")) {
                Files.writeString(folder.resolve(block.head().substring(4)), String.join("\n", block.lines()) + "\n");
            } else if (block.head().equals("walk")) {
                walks++;
                walk(block.lines(), walks);
            }
        }
        assertTrue(walks >= 3, "walks: " + walks);
    }

    private void walk(List<String> lines, int number) throws Exception {
        try (RunningDesk desk = RunningDesk.open(folder.resolve("home-" + number))) {
            desk.shows("Caution 1:");
            int interactions = 0;
            for (String line : lines) {
                String word = line.substring(0, line.indexOf(' '));
                String rest = line.substring(line.indexOf(' ') + 1).strip();
                switch (word) {
                    case "see" -> desk.shows(rest);
                    case "drop" -> desk.drop(folder.resolve(rest));
                    case "press" -> press(desk, rest);
                    case "click" -> desk.press(rest);
                    case "write" -> desk.type(rest.replace("FOLDER", folder.toString()));
                    default -> throw new AssertionError("not a step: " + line);
                }
                interactions += word.equals("see") ? 0 : 1;
            }
            assertTrue(interactions > 0 && interactions < FEWER_THAN, "interactions: " + interactions);
            assertEquals(0, desk.leave());
        }
    }

    private static void press(RunningDesk desk, String keys) throws Exception {
        List<Integer> codes = new ArrayList<>();
        for (String key : keys.split("\\+", -1)) {
            codes.add(
                    switch (key.toLowerCase(Locale.ROOT)) {
                        case "ctrl" -> KeyEvent.VK_CONTROL;
                        case "shift" -> KeyEvent.VK_SHIFT;
                        case "alt" -> KeyEvent.VK_ALT;
                        case "enter" -> KeyEvent.VK_ENTER;
                        case "escape" -> KeyEvent.VK_ESCAPE;
                        case "tab" -> KeyEvent.VK_TAB;
                        case "left" -> KeyEvent.VK_LEFT;
                        case "right" -> KeyEvent.VK_RIGHT;
                        default -> KeyEvent.getExtendedKeyCodeForChar(key.charAt(0));
                    });
        }
        desk.keys(codes.stream().mapToInt(Integer::intValue).toArray());
    }
}
