package org.saddlebook.desk.testkit.api;

import com.formdev.flatlaf.FlatDarkLaf;
import com.formdev.flatlaf.FlatLightLaf;
import java.awt.Component;
import java.awt.Container;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.lang.reflect.InvocationTargetException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.Supplier;
import javax.accessibility.AccessibleContext;
import javax.imageio.ImageIO;
import javax.swing.AbstractButton;
import javax.swing.JComponent;
import javax.swing.JTable;
import javax.swing.SwingUtilities;
import javax.swing.text.JTextComponent;

/** Lays components out and paints them without a window, as the desk would show them. */
public final class Pictures {
    private Pictures() {}

    /** Sets the look of the light or the dark desk, then makes something on the event thread. */
    public static <T> T onDesk(boolean dark, Supplier<T> make) {
        AtomicReference<T> made = new AtomicReference<>();
        try {
            SwingUtilities.invokeAndWait(() -> {
                if (dark) {
                    FlatDarkLaf.setup();
                } else {
                    FlatLightLaf.setup();
                }
                made.set(make.get());
            });
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException(e);
        } catch (InvocationTargetException e) {
            throw new IllegalStateException(e.getCause());
        }
        return made.get();
    }

    /** Gives a component a size and lays it out with everything in it. Call on the event thread. */
    public static void layOut(JComponent component, int width, int height) {
        component.setSize(width, height);
        // Heights of wrapped text follow from widths, which follow from the layout: twice is enough.
        for (int i = 0; i < 3; i++) {
            layOut(component);
        }
    }

    private static void layOut(Component component) {
        component.doLayout();
        if (component instanceof Container container) {
            for (Component child : container.getComponents()) {
                layOut(child);
            }
        }
    }

    /** Paints a component that was laid out. Call on the event thread. */
    public static BufferedImage paint(JComponent component, double scale) {
        BufferedImage image = new BufferedImage(
                (int) Math.ceil(component.getWidth() * scale),
                (int) Math.ceil(component.getHeight() * scale),
                BufferedImage.TYPE_INT_RGB);
        Graphics2D g = image.createGraphics();
        g.setRenderingHint(RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
        g.scale(scale, scale);
        component.print(g);
        g.dispose();
        return image;
    }

    /** Writes a picture for looking at. */
    public static void write(BufferedImage image, Path file) throws IOException {
        Files.createDirectories(file.toAbsolutePath().getParent());
        ImageIO.write(image, "png", file.toFile());
    }

    /** Every component of a kind, from top to bottom. */
    public static <C> List<C> all(Container container, Class<C> kind) {
        List<C> found = new ArrayList<>();
        for (Component child : container.getComponents()) {
            if (kind.isInstance(child)) {
                found.add(kind.cast(child));
            }
            if (child instanceof Container inner) {
                found.addAll(all(inner, kind));
            }
        }
        return found;
    }

    /** The component of a kind with this accessible name; fails when there is none. */
    public static <C extends Component> C named(Container container, Class<C> kind, String name) {
        List<String> names = new ArrayList<>();
        for (C found : all(container, kind)) {
            AccessibleContext context = found.getAccessibleContext();
            if (context != null && name.equals(context.getAccessibleName())) {
                return found;
            }
            names.add(context == null ? "?" : context.getAccessibleName());
        }
        throw new AssertionError("no " + kind.getSimpleName() + " named \"" + name + "\" among " + names);
    }

    /** Controls that a screen reader would meet without a name. */
    public static List<String> nameless(Container container) {
        List<String> nameless = new ArrayList<>();
        for (JComponent component : all(container, JComponent.class)) {
            boolean control = component instanceof AbstractButton
                    || component instanceof JTextComponent
                    || component instanceof JTable
                    || (component.isFocusable()
                            && component.getComponentCount() == 0
                            && component.getAccessibleContext() != null
                            && component.getClass().getName().startsWith("org.saddlebook"));
            String name = component.getAccessibleContext() == null
                    ? null
                    : component.getAccessibleContext().getAccessibleName();
            if (control && component.isVisible() && (name == null || name.isBlank())) {
                nameless.add(component.getClass().getName());
            }
        }
        return nameless;
    }

    /** Components that stick out of their holders or whose text needs more room than they have. */
    public static List<String> cut(Container container) {
        List<String> cut = new ArrayList<>();
        for (JComponent component : all(container, JComponent.class)) {
            Container holder = component.getParent();
            boolean scrolls = holder instanceof javax.swing.JViewport || holder instanceof javax.swing.CellRendererPane;
            if (!component.isVisible() || holder == null || scrolls || hidden(component)) {
                continue;
            }
            boolean out = component.getX() < 0
                    || component.getY() < 0
                    || component.getX() + component.getWidth() > holder.getWidth() + 1
                    || component.getY() + component.getHeight() > holder.getHeight() + 1;
            boolean button = component instanceof AbstractButton || component instanceof javax.swing.JLabel;
            boolean tight = button && component.getWidth() + 1 < component.getPreferredSize().width;
            if (out || tight) {
                cut.add(component.getClass().getSimpleName() + " "
                        + component.getAccessibleContext().getAccessibleName() + " " + component.getBounds() + " in "
                        + holder.getBounds());
            }
        }
        return cut;
    }

    private static boolean hidden(Component component) {
        for (Container c = component.getParent(); c != null; c = c.getParent()) {
            if (!c.isVisible()) {
                return true;
            }
        }
        return false;
    }
}
