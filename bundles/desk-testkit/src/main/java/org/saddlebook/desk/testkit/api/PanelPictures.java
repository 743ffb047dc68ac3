package org.saddlebook.desk.testkit.api;

import java.awt.image.BufferedImage;
import java.nio.file.Path;
import java.util.List;
import java.util.function.Function;
import javax.swing.JComponent;
import javax.swing.JScrollPane;
import org.saddlebook.desk.api.DeskPanel;

/**
 * A panel as it is drawn for the ring closure of the demo data, for looking at.
 *
 * @param strip its strip
 * @param page everything its body shows when scrolled through
 * @param cut texts that have less room than they need
 * @param nameless controls without an accessible name
 */
public record PanelPictures(BufferedImage strip, BufferedImage page, List<String> cut, List<String> nameless) {
    /** Copies the lists. */
    public PanelPictures {
        cut = List.copyOf(cut);
        nameless = List.copyOf(nameless);
    }

    /**
     * Draws a panel.
     *
     * @param dark in the dark colours
     * @param width width of the strata, points
     * @param scale pixels for each point
     * @param folder the user's folder
     * @param maker makes the panel for a desk; its body is a scroll pane
     */
    public static PanelPictures of(
            boolean dark, int width, double scale, Path folder, Function<TestDesk, ? extends DeskPanel> maker) {
        return Pictures.onDesk(dark, () -> {
            TestDesk desk = new TestDesk(ExampleStates.ringClosure(), folder, dark);
            DeskPanel panel = maker.apply(desk);
            desk.attach(panel);
            JComponent strip = panel.strip();
            Pictures.layOut(strip, width, strip.getPreferredSize().height);
            JScrollPane body = (JScrollPane) panel.body();
            JComponent page = (JComponent) body.getViewport().getView();
            Pictures.layOut(page, width, 100);
            Pictures.layOut(page, width, page.getPreferredSize().height);
            Pictures.layOut(page, width, page.getPreferredSize().height);
            return new PanelPictures(
                    Pictures.paint(strip, scale),
                    Pictures.paint(page, scale),
                    Pictures.cut(page),
                    Pictures.nameless(page));
        });
    }

    /** Writes both pictures into target/pictures. */
    public void write(String name) throws java.io.IOException {
        Path target = Path.of("target", "pictures");
        Pictures.write(strip, target.resolve(name + "-strip.png"));
        Pictures.write(page, target.resolve(name + ".png"));
    }
}
