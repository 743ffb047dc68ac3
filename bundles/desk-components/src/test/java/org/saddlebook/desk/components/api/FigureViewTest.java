package org.saddlebook.desk.components.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.Image;
import java.awt.Point;
import java.awt.datatransfer.Clipboard;
import java.awt.datatransfer.DataFlavor;
import java.awt.event.ActionEvent;
import java.awt.event.InputEvent;
import java.awt.event.KeyEvent;
import java.awt.event.MouseEvent;
import java.awt.event.MouseWheelEvent;
import java.awt.image.BufferedImage;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import javax.swing.JComponent;
import javax.swing.JMenuItem;
import javax.swing.JPanel;
import javax.swing.KeyStroke;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.saddlebook.api.findings.Node;
import org.saddlebook.charts.api.FigureFile;
import org.saddlebook.charts.api.FigurePoint;
import org.saddlebook.charts.internal.ChartsRenderer;
import org.saddlebook.charts.internal.PngFile;
import org.saddlebook.charts.internal.SvgFile;
import org.saddlebook.charts.pdf.internal.PdfFile;
import org.saddlebook.desk.api.DeskState;
import org.saddlebook.desk.testkit.api.ExampleStates;
import org.saddlebook.desk.testkit.api.Pictures;
import org.saddlebook.desk.testkit.api.TestDesk;

class FigureViewTest {
    @TempDir
    Path folder;

    private final Clipboard clipboard = new Clipboard("test");
    private final List<FigurePoint> clicked = new ArrayList<>();
    private TestDesk desk;
    private FigureView view;

    @BeforeEach
    void showTheFigureOfTheRates() {
        DeskState state = ExampleStates.ringClosure();
        desk = new TestDesk(state, folder, false);
        List<FigureFile> files = List.of(new PdfFile(), new PngFile(), new SvgFile());
        Saving saving = new Saving(() -> clipboard, (front, name) -> Optional.of(folder.resolve(name)));
        Node body =
                state.findings().orElseThrow().section("barrier").orElseThrow().body();
        view = Pictures.onDesk(false, () -> {
            FigureView made = new FigureView(new ChartsRenderer(), files, desk, saving);
            made.onPoint("Exclude with a reason", clicked::add);
            made.show(
                    Nodes.figure(body, "ln-rate").orElseThrow(),
                    state.findings().orElseThrow().cautions());
            JPanel holder = new JPanel(null);
            holder.add(made);
            holder.setSize(900, 400);
            made.setBounds(0, 0, 900, 400);
            Pictures.layOut(made, 900, 400);
            return made;
        });
    }

    private void mouse(int id, double x, double y, int clicks) {
        Pictures.onDesk(false, () -> {
            view.dispatchEvent(new MouseEvent(
                    view, id, 0, InputEvent.BUTTON1_DOWN_MASK, (int) x, (int) y, clicks, false, MouseEvent.BUTTON1));
            return null;
        });
    }

    private void click(double x, double y) {
        mouse(MouseEvent.MOUSE_PRESSED, x, y, 1);
        mouse(MouseEvent.MOUSE_RELEASED, x, y, 1);
    }

    private void key(int code, int modifiers) {
        Pictures.onDesk(false, () -> {
            Object name = view.getInputMap(JComponent.WHEN_FOCUSED).get(KeyStroke.getKeyStroke(code, modifiers));
            view.getActionMap().get(name).actionPerformed(new ActionEvent(view, 0, ""));
            return null;
        });
    }

    private FigurePoint measured(int index) {
        return view.drawing().orElseThrow().points().stream()
                .filter(point -> point.kind() == org.saddlebook.api.findings.Layer.Kind.MEASURED)
                .toList()
                .get(index);
    }

    @Test
    void aClickOnAPointNamesIt() {
        FigurePoint point = measured(2);
        click(point.px(), point.py());
        assertEquals(1, clicked.size());
        // Two replicates lie nearly on each other: whichever was hit is one at that temperature.
        assertEquals(point.x(), clicked.get(0).x(), 1e-9);
        click(5, 5);
        assertEquals(1, clicked.size());
    }

    @Test
    void aDragShowsThatPartAndEscapeShowsEverythingAgain() {
        Point from = new Point(
                (int) view.drawing().orElseThrow().area().getCenterX(),
                (int) view.drawing().orElseThrow().area().getMinY() + 20);
        double low = view.drawing().orElseThrow().x(from.x);
        double high = view.drawing().orElseThrow().x(from.x + 150);
        mouse(MouseEvent.MOUSE_PRESSED, from.x, from.y, 1);
        mouse(MouseEvent.MOUSE_DRAGGED, from.x + 100, from.y + 60, 1);
        mouse(MouseEvent.MOUSE_RELEASED, from.x + 150, from.y + 90, 1);
        assertEquals(low, view.zoom().orElseThrow().lowX(), 1e-6);
        assertEquals(high, view.zoom().orElseThrow().highX(), 1e-6);
        assertTrue(clicked.isEmpty());
        key(KeyEvent.VK_ESCAPE, 0);
        assertEquals(Optional.empty(), view.zoom());
    }

    @Test
    void theWheelZoomsAboutThePointerWithControlAndTurnsThePageWithout() {
        double px = view.drawing().orElseThrow().area().getCenterX();
        double kelvin = view.drawing().orElseThrow().x((int) px);
        wheel((int) px, 0);
        assertEquals(Optional.empty(), view.zoom());
        wheel((int) px, InputEvent.CTRL_DOWN_MASK);
        assertTrue(view.zoom().isPresent());
        assertEquals(kelvin, view.drawing().orElseThrow().x((int) px), 0.5);
    }

    private void wheel(int x, int modifiers) {
        Pictures.onDesk(false, () -> {
            view.dispatchEvent(new MouseWheelEvent(
                    view,
                    MouseEvent.MOUSE_WHEEL,
                    0,
                    modifiers,
                    x,
                    200,
                    0,
                    false,
                    MouseWheelEvent.WHEEL_UNIT_SCROLL,
                    3,
                    -1));
            return null;
        });
    }

    @Test
    void keysWalkFromPointToPointAndEnterActs() {
        key(KeyEvent.VK_RIGHT, 0);
        key(KeyEvent.VK_RIGHT, 0);
        String said = view.getAccessibleContext().getAccessibleDescription();
        key(KeyEvent.VK_ENTER, 0);
        assertEquals(view.drawing().orElseThrow().points().get(1), clicked.get(0));
        assertTrue(said.contains("K ("), said);
        key(KeyEvent.VK_PLUS, 0);
        assertTrue(view.zoom().isPresent());
        key(KeyEvent.VK_RIGHT, InputEvent.SHIFT_DOWN_MASK);
        key(KeyEvent.VK_ESCAPE, 0);
        assertTrue(view.zoom().isEmpty());
    }

    @Test
    void theHoverIsPaintedOverTheFigureWithoutCuttingIt() throws Exception {
        BufferedImage without = Pictures.onDesk(false, () -> Pictures.paint(view, 1));
        FigurePoint point = measured(4);
        mouse(MouseEvent.MOUSE_MOVED, point.px(), point.py(), 0);
        BufferedImage with = Pictures.onDesk(false, () -> Pictures.paint(view, 1));
        Pictures.write(with, Path.of("target", "pictures", "hover.png"));
        int changed = 0;
        for (int y = 0; y < with.getHeight(); y++) {
            for (int x = 0; x < with.getWidth(); x++) {
                changed += with.getRGB(x, y) != without.getRGB(x, y) ? 1 : 0;
            }
        }
        assertTrue(changed > 1000, "pixels of the plate: " + changed);
    }

    @Test
    void thePictureOnTheClipboardIsThePaperWithItsCautions() throws Exception {
        key(KeyEvent.VK_C, InputEvent.CTRL_DOWN_MASK);
        assertEquals(List.of(), desk.faults());
        Image image = (Image) clipboard.getData(DataFlavor.imageFlavor);
        assertEquals(1440, image.getWidth(null));
        assertTrue(
                desk.notes().get(0).startsWith("Copied the figure"),
                desk.notes().toString());
    }

    @Test
    void savesEachFormatAsAFileThatBeginsLikeOne() throws Exception {
        Pictures.onDesk(false, () -> {
            for (java.awt.Component item : view.menu().menu().getComponents()) {
                if (item instanceof JMenuItem menu && menu.getText().startsWith("Save as")) {
                    menu.doClick();
                }
            }
            return null;
        });
        assertEquals(List.of(), desk.faults());
        String name = "rate-constant-against-temperature";
        assertTrue(start(name + ".pdf").startsWith("%PDF-1."), start(name + ".pdf"));
        assertTrue(start(name + ".svg").startsWith("<?xml"), start(name + ".svg"));
        assertTrue(start(name + ".png").substring(1).startsWith("PNG"), start(name + ".png"));
        try (var files = Files.list(folder)) {
            assertEquals(3, files.count());
        }
    }

    private String start(String name) throws Exception {
        byte[] bytes = Files.readAllBytes(folder.resolve(name));
        return new String(bytes, 0, Math.min(40, bytes.length), StandardCharsets.ISO_8859_1);
    }

    @Test
    void aScreenReaderMeetsTheFigureByNameAndItsPointsAsActions() {
        var context = view.getAccessibleContext();
        assertEquals("Rate constant against temperature", context.getAccessibleName());
        assertEquals("canvas", context.getAccessibleRole().toDisplayString(Locale.ENGLISH));
        var actions = context.getAccessibleAction();
        assertEquals(view.drawing().orElseThrow().points().size(), actions.getAccessibleActionCount());
        assertTrue(actions.getAccessibleActionDescription(0).startsWith("Exclude with a reason: "));
        Pictures.onDesk(false, () -> actions.doAccessibleAction(3));
        assertEquals(1, clicked.size());
        assertFalse(actions.doAccessibleAction(1000));
    }

    @Test
    void onTheRailTemperaturesLieWhereTheDeskSays() {
        double own = view.drawing().orElseThrow().px(330);
        Pictures.onDesk(false, () -> {
            view.onRail().zoomTo(Optional.empty());
            return null;
        });
        double onRail = view.drawing().orElseThrow().px(330);
        assertEquals(desk.scale(view).x(330), onRail, 1e-6);
        assertNotEquals(own, onRail, 1);
    }
}
