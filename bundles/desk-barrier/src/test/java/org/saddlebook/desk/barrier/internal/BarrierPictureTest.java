package org.saddlebook.desk.barrier.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.awt.image.BufferedImage;
import java.nio.file.Path;
import java.util.List;
import javax.swing.JComponent;
import javax.swing.JScrollPane;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.saddlebook.charts.internal.ChartsRenderer;
import org.saddlebook.desk.components.api.Saving;
import org.saddlebook.desk.components.internal.ComponentsService;
import org.saddlebook.desk.testkit.api.ExampleStates;
import org.saddlebook.desk.testkit.api.Pictures;
import org.saddlebook.desk.testkit.api.TestDesk;

/** Pictures in target/pictures, for looking at; nothing may be cut or nameless. */
class BarrierPictureTest {
    @TempDir
    Path folder;

    private record Shown(BufferedImage strip, BufferedImage page, List<String> cut, List<String> nameless) {}

    private Shown shown(boolean dark, int width, double scale) {
        return Pictures.onDesk(dark, () -> {
            TestDesk desk = new TestDesk(ExampleStates.ringClosure(), folder, dark);
            BarrierPanel panel = new BarrierPanel(
                    desk,
                    new ComponentsService(new ChartsRenderer(), List.of(), Saving.system()),
                    java.util.Optional.empty());
            desk.attach(panel);
            JComponent strip = panel.strip();
            Pictures.layOut(strip, width, strip.getPreferredSize().height);
            JScrollPane body = (JScrollPane) panel.body();
            JComponent page = (JComponent) body.getViewport().getView();
            Pictures.layOut(page, width, 100);
            Pictures.layOut(page, width, page.getPreferredSize().height);
            Pictures.layOut(page, width, page.getPreferredSize().height);
            return new Shown(
                    Pictures.paint(strip, scale),
                    Pictures.paint(page, scale),
                    Pictures.cut(page),
                    Pictures.nameless(page));
        });
    }

    private void check(String name, Shown shown) throws Exception {
        Path target = Path.of("target", "pictures");
        Pictures.write(shown.strip(), target.resolve(name + "-strip.png"));
        Pictures.write(shown.page(), target.resolve(name + ".png"));
        assertEquals(List.of(), shown.cut(), name);
        assertEquals(List.of(), shown.nameless(), name);
    }

    @Test
    void nothingIsCutAndEveryControlHasANameInLight() throws Exception {
        check("light", shown(false, 1066, 1));
    }

    @Test
    void nothingIsCutAndEveryControlHasANameInDark() throws Exception {
        check("dark", shown(true, 1066, 1));
    }

    @Test
    void nothingIsCutOnAScreenOfHighDensity() throws Exception {
        check("dense", shown(false, 1500, 2));
    }
}
