package org.saddlebook.desk.spontaneity.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.saddlebook.charts.internal.ChartsRenderer;
import org.saddlebook.desk.components.api.Saving;
import org.saddlebook.desk.components.internal.ComponentsService;
import org.saddlebook.desk.testkit.api.PanelPictures;

/** Pictures in target/pictures, for looking at; nothing may be cut or nameless. */
class SpontaneityPictureTest {
    @TempDir
    Path folder;

    private PanelPictures shown(boolean dark, int width, double scale) {
        return PanelPictures.of(
                dark,
                width,
                scale,
                folder,
                desk -> new SpontaneityPanel(
                        desk, new ComponentsService(new ChartsRenderer(), List.of(), Saving.system())));
    }

    private static void check(String name, PanelPictures shown) throws Exception {
        shown.write(name);
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
