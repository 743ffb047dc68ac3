package org.saddlebook.distribution.desk;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.Component;
import java.awt.event.KeyEvent;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;
import org.saddlebook.testkit.api.NeedsScreen;

/** What a user does at the desk, done in a real window of the assembled product. The tables are made up. */
@NeedsScreen
@Timeout(300)
class DeskTest {
    @TempDir
    private Path folder;

    private Path table() throws Exception {
        return Files.writeString(
                folder.resolve("my-rates.csv"),
                "T (K),k (1/s)\n300,1.02e-5\n310,4.1e-5\n320,1.49e-4\n330,5.2e-4\n340,1.66e-3\n350,4.95e-3\n");
    }

    @Test
    void opensOnTheDemoAndSaysWhatToDoNext() throws Exception {
        try (RunningDesk desk = RunningDesk.open(folder.resolve("home"))) {
            desk.shows("This is an invented campaign, evaluated.");
            desk.named("Campaign Release of adduct FM-11");
            desk.shows("Caution 1:");
            assertEquals(0, desk.leave());
        }
    }

    @Test
    void takesADroppedTableAndTellsOnlyWhatBelongsToIt() throws Exception {
        try (RunningDesk desk = RunningDesk.open(folder.resolve("home"))) {
            desk.shows("Caution 1:");
            desk.drop(table());
            desk.named("Campaign my-rates, 2 open");
            desk.shows("imported: my-rates.csv");
            desk.shows("Caution 1:");
            desk.shows("not saved, kept for recovery");
            assertFalse(desk.onEventThread(desk::texts).contains("invented campaign"), "the guide has done its work");
        }
    }

    @Test
    void aTableWithAMistakeIsKeptAndSaysWhatIsWrong() throws Exception {
        Path wrong = Files.writeString(folder.resolve("no-unit.csv"), "T,k (1/s)\n25,1.02e-5\n35,4.1e-5\n45,1.5e-4\n");
        try (RunningDesk desk = RunningDesk.open(folder.resolve("home"), wrong)) {
            desk.named("Campaign no-unit");
            desk.shows("1 file");
        }
    }

    @Test
    void undoTakesBackWithItsNameAndTheAccountKeepsBoth() throws Exception {
        try (RunningDesk desk = RunningDesk.open(folder.resolve("home"), table())) {
            desk.named("Campaign my-rates");
            desk.command("rename");
            desk.awaitFocus("What shall the campaign be called?");
            desk.keys(KeyEvent.VK_CONTROL, KeyEvent.VK_A);
            desk.type("Second batch");
            desk.keys(KeyEvent.VK_ENTER);
            desk.named("Campaign Second batch");
            desk.named("Undo: title");
            desk.keys(KeyEvent.VK_CONTROL, KeyEvent.VK_Z);
            desk.named("Campaign my-rates");
            desk.named("Redo: title");
            desk.shows("title: my-rates → Second batch");
            desk.shows("undone: title");
            desk.keys(KeyEvent.VK_CONTROL, KeyEvent.VK_SHIFT, KeyEvent.VK_Z);
            desk.named("Campaign Second batch");
        }
    }

    @Test
    void theHairlineMovesByMouseAndKeyAndSaysWhereItIs() throws Exception {
        try (RunningDesk desk = RunningDesk.open(folder.resolve("home"), table())) {
            desk.named("Campaign my-rates");
            desk.shows("Caution 1:");
            Component rail = desk.named("Temperature of the hairline");
            desk.click(rail);
            String before = desk.onEventThread(() -> RunningDesk.name(rail));
            desk.keys(KeyEvent.VK_SHIFT, KeyEvent.VK_RIGHT);
            desk.awaitThat("a warmer hairline", () -> !RunningDesk.name(rail).equals(before));
            desk.keys(KeyEvent.VK_SHIFT, KeyEvent.VK_LEFT);
            desk.awaitThat("the hairline back", () -> RunningDesk.name(rail).equals(before));
            desk.command("move the hairline to");
            desk.awaitFocus("To which temperature");
            desk.type("52.5");
            desk.keys(KeyEvent.VK_ENTER);
            desk.awaitThat("the hairline at 52.5", () -> RunningDesk.name(rail).contains("52.5 °C"));
        }
    }

    @Test
    void aModelThatIsAddedOrRemovedShowsWithoutADeskOfItsOwn() throws Exception {
        try (RunningDesk desk = RunningDesk.open(folder.resolve("home"), table())) {
            desk.named("Campaign my-rates");
            desk.shows("Caution 1:");
            desk.command("unfold barrier");
            assertFalse(desk.onEventThread(desk::textsOfStrata).contains("Harcourt"));
            Path jar = desk.home().resolve("data/saddlebook/bundles/example.harcourt-esson-1.0.0.jar");
            Files.createDirectories(jar.getParent());
            Files.copy(Path.of("src/test/resources/old-binaries/example.harcourt-esson-1.0.0.jar"), jar);
            desk.awaitThat("the model", () -> desk.textsOfStrata().contains("Harcourt"));
            Files.delete(jar);
            desk.awaitThat("the model to go", () -> !desk.textsOfStrata().contains("Harcourt"));
        }
    }

    @Test
    void whatWasNotSavedIsThereAgainAndWhatWasSavedIsNot() throws Exception {
        Path home = folder.resolve("home");
        try (RunningDesk desk = RunningDesk.open(home, table())) {
            desk.named("Campaign my-rates");
            desk.command("rename");
            desk.awaitFocus("What shall the campaign be called?");
            desk.keys(KeyEvent.VK_CONTROL, KeyEvent.VK_A);
            desk.type("Kept");
            desk.keys(KeyEvent.VK_ENTER);
            desk.named("Campaign Kept");
            assertEquals(0, desk.leave());
        }
        try (RunningDesk desk = RunningDesk.open(home)) {
            desk.named("Campaign Kept");
            desk.shows("title: my-rates → Kept");
            desk.command("save in another");
            desk.awaitFocus("Into which folder");
            desk.keys(KeyEvent.VK_CONTROL, KeyEvent.VK_A);
            desk.type(folder.resolve("saved").toString());
            desk.keys(KeyEvent.VK_ENTER);
            desk.shows("· saved");
            assertTrue(Files.exists(folder.resolve("saved/campaign.json")));
            assertEquals(0, desk.leave());
        }
        assertEquals(
                List.of(),
                RunningDesk.files(home.resolve("data/saddlebook/desk/unsaved")).stream()
                        .filter(file -> file.endsWith("campaign.json"))
                        .toList());
    }

    @Test
    void theSearchFindsEveryActionAndSaysWhyOneIsNotPossible() throws Exception {
        try (RunningDesk desk = RunningDesk.open(folder.resolve("home"), table())) {
            desk.named("Campaign my-rates");
            desk.command("undo");
            desk.shows("There is nothing to undo.");
            desk.keys(KeyEvent.VK_CONTROL, KeyEvent.VK_K);
            desk.awaitFocus("What do you want to do?");
            javax.swing.JList<?> list = desk.named(javax.swing.JList.class, "Actions");
            int size = desk.onEventThread(() -> list.getModel().getSize());
            assertTrue(size > 20, "only " + size + " actions");
            desk.keys(KeyEvent.VK_ESCAPE);
            desk.awaitThat("the list to go", () -> !list.isShowing());
        }
    }

    @Test
    void everyControlHasAnAccessibleName() throws Exception {
        try (RunningDesk desk = RunningDesk.open(folder.resolve("home"))) {
            desk.shows("Caution 1:");
            desk.settle();
            List<String> nameless = new ArrayList<>();
            int strata = desk.onEventThread(() -> titles(desk).size());
            for (int i = 1; i <= strata; i++) {
                desk.keys(KeyEvent.VK_CONTROL, KeyEvent.VK_0 + i);
                desk.settle();
                desk.onEventThread(() -> {
                    desk.find(component -> {
                        boolean control = component instanceof javax.swing.AbstractButton
                                || component instanceof javax.swing.text.JTextComponent
                                || component instanceof javax.swing.JTable
                                || component instanceof javax.swing.JComboBox
                                || component instanceof javax.swing.JList
                                || component instanceof javax.swing.JSlider;
                        boolean arrow = component.getParent() instanceof javax.swing.JScrollBar
                                || component.getParent() instanceof javax.swing.JComboBox;
                        if (control && !arrow && RunningDesk.name(component).isBlank()) {
                            nameless.add(component.toString());
                        }
                        return false;
                    });
                    return true;
                });
            }
            assertTrue(strata >= 2, "strata: " + strata);
            assertEquals(List.of(), nameless);
        }
    }

    private static List<String> titles(RunningDesk desk) {
        List<String> titles = new ArrayList<>();
        desk.find(component -> {
            String name = RunningDesk.name(component);
            if (component instanceof javax.swing.JButton && (name.endsWith(", open") || name.endsWith(", folded"))) {
                titles.add(name);
            }
            return false;
        });
        return titles;
    }

    @Test
    void aKilledDeskLosesNothing() throws Exception {
        Path home = folder.resolve("home");
        DeskProcess process = DeskProcess.start(home, table());
        try {
            process.awaitKept("my-rates");
        } finally {
            process.kill();
        }
        try (RunningDesk desk = RunningDesk.open(home)) {
            desk.named("Campaign my-rates");
            desk.shows("was not saved when the desk ended");
            Optional<Component> guide =
                    desk.onEventThread(() -> desk.find(c -> RunningDesk.name(c).contains("invented campaign")));
            assertTrue(guide.isEmpty(), "the demo is not what one wants after a crash");
        }
    }
}
