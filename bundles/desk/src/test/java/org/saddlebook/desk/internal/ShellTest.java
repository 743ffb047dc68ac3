package org.saddlebook.desk.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.desk.internal.broken.BrokenPanel;
import org.saddlebook.desk.internal.broken.HangingPanel;
import org.saddlebook.desk.internal.sound.PlainPanel;
import org.saddlebook.testkit.api.NeedsScreen;

@NeedsScreen
@Timeout(120)
class ShellTest {
    @TempDir
    private Path folder;

    @Test
    void aForeignSectionGetsTheDefaultPanel() throws Exception {
        try (Shell shell = new Shell(folder)) {
            Section section = Section.done(
                    "com.example.made-up",
                    "Isotopes",
                    new Node.Group(Map.of("heavyAtomRatio", Node.Quantity.of(1.02, "1", 0.01))),
                    Map.of("made-up", "Nobody measured this."));
            shell.finds(section);
            shell.shows("Isotopes, open");
            shell.shows("heavy atom ratio");
            shell.shows("1.020");
            shell.shows("Caution 1: Nobody measured this.");
        }
    }

    @Test
    void panelsComeAndGoWithTheirServices() throws Exception {
        try (Shell shell = new Shell(folder)) {
            PlainPanel first = new PlainPanel("alpha", 100);
            shell.install(first);
            shell.install(new PlainPanel("beta", 50));
            shell.shows("beta, open");
            shell.shows("alpha, folded");
            shell.onEventThread(() -> {
                shell.desk().unfold("alpha");
                return true;
            });
            shell.shows("alpha, open");
            shell.shows("body of alpha");
            shell.uninstall("alpha");
            shell.awaitThat("the panel to go", () -> !shell.texts().contains("alpha"));
            assertEquals(1, first.closed());
            shell.shows("beta, open");
        }
    }

    @ParameterizedTest
    @EnumSource(BrokenPanel.Where.class)
    void aPanelThatThrowsShowsItsFailureInItsOwnPlace(BrokenPanel.Where where) throws Exception {
        try (Shell shell = new Shell(folder)) {
            shell.install(new PlainPanel("sound", 100));
            shell.install(new BrokenPanel("broken", 200, where));
            shell.onEventThread(() -> {
                shell.desk().unfold("broken");
                return true;
            });
            shell.shows("of made.up.bundle 1.0.0 failed while");
            shell.shows("broken on purpose");
            shell.shows("Try again");
            shell.onEventThread(() -> {
                shell.desk().unfold("sound");
                return true;
            });
            shell.shows("body of sound");
        }
    }

    @Test
    void aPanelThatWaitsForEverIsStoppedAndNamed() throws Exception {
        try (Shell shell = new Shell(folder, TimeUnit.MILLISECONDS.toNanos(400))) {
            shell.install(new PlainPanel("sound", 100));
            shell.shows("body of sound");
            shell.install(new HangingPanel("hanging", 200));
            shell.shows("kept the desk from answering");
            shell.shows("body of sound");
            assertEquals(List.of("hanging"), DeskSettings.in(folder).setAside());
        }
        // A run later it is set aside before it is asked anything, until the user wants another try.
        try (Shell shell = new Shell(folder)) {
            shell.install(new HangingPanel("hanging", 200));
            shell.shows("is set aside");
            shell.shows("Try again");
        }
    }

    @Test
    void aPanelThatIsGoneHoldsNeitherDeskNorCampaign() throws Exception {
        try (Shell shell = new Shell(folder)) {
            PlainPanel leaky = new PlainPanel("leaky", 100);
            shell.install(leaky);
            shell.shows("body of leaky");
            shell.uninstall("leaky");
            shell.awaitThat("the panel to go", () -> !shell.texts().contains("leaky"));
            shell.onEventThread(() -> {
                assertEquals("", leaky.context().state().campaign().title());
                leaky.context().note("from beyond");
                leaky.context().unfold();
                assertTrue(leaky.context().hairline().isEmpty());
                return true;
            });
            assertFalse(shell.onEventThread(shell::texts).contains("from beyond"));
        }
    }

    @Test
    void theRailStaysUnderTheStrata() throws Exception {
        try (Shell shell = new Shell(folder)) {
            PlainPanel panel = new PlainPanel("one", 100);
            shell.install(panel);
            shell.shows("body of one");
            shell.onEventThread(() -> {
                RailModel rail = shell.desk().rail();
                double kelvin = 300;
                double inRail =
                        rail.scale().x(kelvin) + shell.window().railPane().getLocationOnScreen().x;
                double inStrip = panel.context().scale(panel.body()).x(kelvin)
                        + panel.body().getLocationOnScreen().x;
                assertEquals(inRail, inStrip, 1e-6);
                return true;
            });
        }
    }
}
