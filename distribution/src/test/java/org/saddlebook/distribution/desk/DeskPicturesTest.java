package org.saddlebook.distribution.desk;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.awt.Component;
import java.awt.Dimension;
import java.awt.Graphics2D;
import java.awt.event.KeyEvent;
import java.awt.image.BufferedImage;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import javax.imageio.ImageIO;
import javax.swing.AbstractButton;
import javax.swing.JFrame;
import javax.swing.JLabel;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;
import org.saddlebook.distribution.InstalledBundlesOfTheProduct;
import org.saddlebook.testkit.api.NeedsScreen;

/**
 * Every stratum of the demo campaigns, light and dark, on a small screen and on a dense one: no word is cut off. The pictures
 * lie in {@code target/pictures} for people to look at; with the property {@code saddlebook.pictures} the three of the README
 * are written there.
 */
@NeedsScreen
@Tag("long")
@Timeout(900)
class DeskPicturesTest {
    private static final Path PICTURES = Path.of("target", "pictures");

    /** Name of a picture to the name it has in the README. */
    private static final Map<String, String> OF_THE_README = Map.of(
            "light-1366-ring-closure-Operating-window", "desk-window.png",
            "light-1366-adduct-campaign-Barrier", "desk-barrier.png",
            "dark-1366-ring-closure-Measured", "desk-measured-dark.png");

    @TempDir
    private Path folder;

    @Test
    void lightAndSmall() throws Exception {
        look("light-1366", "Colours: light", new Dimension(1366, 768), 1);
    }

    @Test
    void darkAndSmall() throws Exception {
        look("dark-1366", "Colours: dark", new Dimension(1366, 768), 1);
    }

    @Test
    void lightAndDense() throws Exception {
        look("light-3840", "Colours: light", new Dimension(1920, 1080), 2);
    }

    @Test
    void darkAndDense() throws Exception {
        look("dark-3840", "Colours: dark", new Dimension(1920, 1080), 2);
    }

    private void look(String name, String colours, Dimension size, double scale) throws Exception {
        Files.createDirectories(PICTURES);
        Path demo = InstalledBundlesOfTheProduct.HOME.resolve("demo-data");
        List<String> cut = new ArrayList<>();
        for (String campaign : List.of("adduct-campaign", "ring-closure")) {
            try (RunningDesk desk = RunningDesk.open(folder.resolve(name + campaign), demo.resolve(campaign))) {
                desk.shows("Caution 1:");
                desk.onEventThread(() -> {
                    desk.window().setSize(size);
                    desk.window().validate();
                    return true;
                });
                desk.command(colours);
                desk.settle();
                desk.awaitThat(
                        "work to end",
                        () -> desk.find(c -> RunningDesk.name(c).equals("Work in the background"))
                                .isEmpty());
                Set<String> seen = new HashSet<>();
                for (int i = 1; i <= 9; i++) {
                    desk.keys(KeyEvent.VK_CONTROL, KeyEvent.VK_0 + i);
                    desk.settle();
                    desk.awaitThat(
                            "work to end",
                            () -> desk.find(c -> RunningDesk.name(c).equals("Work in the background"))
                                    .isEmpty());
                    String open = desk.onEventThread(() -> desk.find(c -> c instanceof AbstractButton
                                    && RunningDesk.name(c).endsWith(", open"))
                            .map(RunningDesk::name)
                            .orElse(""));
                    if (open.isEmpty() || !seen.add(open)) {
                        continue; // there are fewer strata than keys
                    }
                    cut.addAll(desk.onEventThread(() -> cut(desk)));
                    String file = name + "-" + campaign + "-"
                            + open.replace(", open", "").replace(' ', '-');
                    BufferedImage picture = picture(desk, scale);
                    ImageIO.write(
                            picture, "png", PICTURES.resolve(file + ".png").toFile());
                    String readme = System.getProperty("saddlebook.pictures");
                    if (readme != null && OF_THE_README.containsKey(file)) {
                        ImageIO.write(
                                picture,
                                "png",
                                Path.of(readme, OF_THE_README.get(file)).toFile());
                    }
                }
            }
        }
        assertEquals(List.of(), cut.stream().distinct().toList());
    }

    /** Buttons and labels whose words have less room than they need. */
    private static List<String> cut(RunningDesk desk) {
        List<String> cut = new ArrayList<>();
        desk.find(component -> {
            boolean words = (component instanceof AbstractButton button
                            && button.getText() != null
                            && !button.getText().isBlank())
                    || (component instanceof JLabel label
                            && label.getText() != null
                            && !label.getText().isBlank());
            if (words && component.getPreferredSize().width > component.getWidth() + 1 && inSight(component)) {
                cut.add(component.getClass().getSimpleName() + " " + RunningDesk.name(component) + " "
                        + component.getPreferredSize().width + " in " + component.getWidth());
            }
            return false;
        });
        return cut;
    }

    private static boolean inSight(Component component) {
        return !((javax.swing.JComponent) component).getVisibleRect().isEmpty();
    }

    private static BufferedImage picture(RunningDesk desk, double scale) throws Exception {
        return desk.onEventThread(() -> {
            JFrame frame = desk.window();
            BufferedImage image = new BufferedImage(
                    (int) (frame.getWidth() * scale), (int) (frame.getHeight() * scale), BufferedImage.TYPE_INT_RGB);
            Graphics2D g = image.createGraphics();
            g.scale(scale, scale);
            frame.getRootPane().printAll(g);
            g.dispose();
            return image;
        });
    }
}
