package org.saddlebook.distribution.desk;

import java.awt.Component;
import java.awt.Container;
import java.awt.Robot;
import java.awt.Window;
import java.awt.event.InputEvent;
import java.awt.event.KeyEvent;
import java.io.IOException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.Predicate;
import java.util.function.ToIntFunction;
import javax.swing.JFrame;
import javax.swing.SwingUtilities;
import org.apache.felix.framework.FrameworkFactory;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;
import org.osgi.framework.ServiceReference;
import org.osgi.framework.launch.Framework;
import org.saddlebook.distribution.InstalledBundlesOfTheProduct;

/**
 * The assembled product in a framework of this process, its desk open in a real window. What a user sees and does goes
 * through the window: components are found by their accessible names, and pressed, typed into and dropped upon.
 */
public final class RunningDesk implements AutoCloseable {
    private static final long PATIENCE_SECONDS = 60;

    private final Path home;
    private final Framework framework;
    private final CompletableFuture<Integer> exit = new CompletableFuture<>();
    private final Robot robot;

    private RunningDesk(Path home, Framework framework, Robot robot) {
        this.home = home;
        this.framework = framework;
        this.robot = robot;
    }

    /** Opens the desk of a user whose folders lie in {@code home}, on these inputs. */
    public static RunningDesk open(Path home, Path... inputs) throws Exception {
        return open(home, List.of(), inputs);
    }

    /** The same without bundles whose file names start so. */
    @SuppressWarnings({"unchecked", "rawtypes"}) // the registry knows raw classes only
    public static RunningDesk open(Path home, List<String> without, Path... inputs) throws Exception {
        Map<String, String> settings = new HashMap<>();
        settings.put("org.osgi.framework.storage", home.resolve("framework").toString());
        settings.put("org.osgi.framework.storage.clean", "onFirstInit");
        settings.put("felix.service.urlhandlers", "false");
        settings.put("felix.log.level", "1");
        settings.put("saddlebook.home", InstalledBundlesOfTheProduct.HOME.toString());
        settings.put("saddlebook.data", home.resolve("data/saddlebook").toString());
        settings.put("saddlebook.config", home.resolve("config/saddlebook").toString());
        settings.put("saddlebook.cache", home.resolve("cache/saddlebook").toString());
        Files.createDirectories(home);
        Framework framework = new FrameworkFactory().newFramework(settings);
        framework.start();
        BundleContext context = framework.getBundleContext();
        context.registerService(Clock.class, Clock.systemUTC(), null);
        List<Bundle> bundles = new ArrayList<>();
        for (Path jar : InstalledBundlesOfTheProduct.jars()) {
            String name = jar.getFileName().toString();
            if (without.stream().noneMatch(name::startsWith)) {
                bundles.add(context.installBundle(jar.toUri().toString()));
            }
        }
        for (Bundle bundle : bundles) {
            if (bundle.getHeaders().get("Fragment-Host") == null) {
                bundle.start();
            }
        }
        ServiceReference<ToIntFunction> console = context.getServiceReferences(
                        ToIntFunction.class, "(saddlebook.entry=console)")
                .iterator()
                .next();
        ToIntFunction<String[]> entry = context.getService(console);
        List<String> arguments = new ArrayList<>(List.of("desk"));
        for (Path input : inputs) {
            arguments.add(input.toString());
        }
        RunningDesk desk = new RunningDesk(home, framework, new Robot());
        Thread thread = new Thread(
                () -> desk.exit.complete(entry.applyAsInt(arguments.toArray(new String[0]))), "desk under test");
        thread.setDaemon(true);
        thread.start();
        desk.await("the window", () -> desk.windowNow().filter(Window::isShowing));
        return desk;
    }

    public Path home() {
        return home;
    }

    public BundleContext context() {
        return framework.getBundleContext();
    }

    public Robot robot() {
        return robot;
    }

    private Optional<JFrame> windowNow() {
        for (Window window : Window.getWindows()) {
            if (window instanceof JFrame frame && frame.getTitle().contains("Saddlebook") && frame.isDisplayable()) {
                return Optional.of(frame);
            }
        }
        return Optional.empty();
    }

    public JFrame window() {
        return windowNow().orElseThrow(() -> new AssertionError("the window is gone"));
    }

    /** Runs on the event thread and returns what came out. */
    public <T> T onEventThread(Callable<T> work) throws Exception {
        AtomicReference<T> result = new AtomicReference<>();
        AtomicReference<Exception> fault = new AtomicReference<>();
        SwingUtilities.invokeAndWait(() -> {
            try {
                result.set(work.call());
            } catch (Exception e) {
                fault.set(e);
            }
        });
        if (fault.get() != null) {
            throw fault.get();
        }
        return result.get();
    }

    /** Asks on the event thread again and again until there is an answer. */
    public <T> T await(String what, Callable<Optional<T>> question) throws Exception {
        long end = System.nanoTime() + TimeUnit.SECONDS.toNanos(PATIENCE_SECONDS);
        CountDownLatch never = new CountDownLatch(1);
        while (System.nanoTime() < end) {
            Optional<T> answer = onEventThread(question);
            if (answer.isPresent()) {
                return answer.get();
            }
            if (exit.isDone()) {
                throw new AssertionError("the desk ended with " + exit.get() + " while waiting for " + what);
            }
            if (never.await(20, TimeUnit.MILLISECONDS)) {
                break;
            }
        }
        throw new AssertionError("waited in vain for " + what + "; on screen: " + onEventThread(() -> texts()));
    }

    /** Waits until something is so. */
    public void awaitThat(String what, Callable<Boolean> condition) throws Exception {
        await(what, () -> condition.call() ? Optional.of(true) : Optional.empty());
    }

    /** Waits for a component on screen whose accessible name holds this text. */
    public Component named(String part) throws Exception {
        return await(
                "a component named " + part,
                () -> find(component -> name(component).contains(part)));
    }

    /** Waits for a component of a kind on screen whose accessible name holds this text. */
    public <T extends Component> T named(Class<T> kind, String part) throws Exception {
        return await(
                kind.getSimpleName() + " named " + part,
                () -> find(component ->
                                kind.isInstance(component) && name(component).contains(part))
                        .map(kind::cast));
    }

    /** Waits until a text is on screen, in whatever component. */
    public void shows(String part) throws Exception {
        awaitThat("the text " + part, () -> texts().contains(part));
    }

    /** Everything that is on screen with a name, for messages and searches. */
    public String texts() {
        return texts(window().getRootPane());
    }

    /** What is on screen in the strata; the account remembers what is gone. */
    public String textsOfStrata() {
        return texts(find(component -> name(component).equals("Strata")).orElseThrow());
    }

    private static String texts(Component where) {
        StringBuilder text = new StringBuilder();
        visit(where, component -> {
            String name = name(component);
            if (!name.isBlank()) {
                text.append(name).append('\n');
            }
            if (component instanceof javax.swing.text.JTextComponent field) {
                text.append(field.getText()).append('\n');
            }
            if (component instanceof javax.swing.JTable table) {
                cells(table, text);
            }
            return false;
        });
        return text.toString();
    }

    private static void cells(javax.swing.JTable table, StringBuilder text) {
        for (int column = 0; column < table.getColumnCount(); column++) {
            text.append(table.getColumnName(column)).append('\n');
            for (int row = 0; row < Math.min(200, table.getRowCount()); row++) {
                text.append(table.getValueAt(row, column)).append('\n');
            }
        }
    }

    /** The first visible component that fits. */
    public Optional<Component> find(Predicate<Component> fits) {
        AtomicReference<Component> found = new AtomicReference<>();
        visit(window().getRootPane(), component -> {
            if (fits.test(component)) {
                found.set(component);
                return true;
            }
            return false;
        });
        return Optional.ofNullable(found.get());
    }

    private static boolean visit(Component component, Predicate<Component> stop) {
        if (!component.isShowing()) {
            return false;
        }
        if (stop.test(component)) {
            return true;
        }
        if (component instanceof Container container) {
            for (Component child : container.getComponents()) {
                if (visit(child, stop)) {
                    return true;
                }
            }
        }
        return false;
    }

    /** The accessible name; empty for none. */
    public static String name(Component component) {
        var accessible = component.getAccessibleContext();
        String name = accessible == null ? null : accessible.getAccessibleName();
        return name == null ? "" : name;
    }

    /** Clicks into the middle of a component with the mouse. */
    public void click(Component component) throws Exception {
        java.awt.Point middle = onEventThread(() -> {
            java.awt.Point corner = component.getLocationOnScreen();
            corner.translate(component.getWidth() / 2, component.getHeight() / 2);
            return corner;
        });
        robot.mouseMove(middle.x, middle.y);
        robot.mousePress(InputEvent.BUTTON1_DOWN_MASK);
        robot.mouseRelease(InputEvent.BUTTON1_DOWN_MASK);
        settle();
    }

    /** Presses a component that can be pressed, by its accessible action. */
    public void press(String part) throws Exception {
        javax.swing.AbstractButton button = await(
                "a button named " + part + " that can be pressed",
                () -> find(component -> component instanceof javax.swing.AbstractButton
                                && component.isEnabled()
                                && name(component).contains(part))
                        .map(javax.swing.AbstractButton.class::cast));
        onEventThread(() -> button.getAccessibleContext().getAccessibleAction().doAccessibleAction(0));
        settle();
    }

    /** Lets the event queue run empty. */
    public void settle() throws Exception {
        robot.waitForIdle();
    }

    /** Presses keys together: modifiers first. */
    public void keys(int... codes) throws Exception {
        for (int code : codes) {
            robot.keyPress(code);
        }
        for (int i = codes.length - 1; i >= 0; i--) {
            robot.keyRelease(codes[i]);
        }
        settle();
    }

    /** Types a text of plain characters into whatever has the focus. */
    public void type(String text) throws Exception {
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            Component owner = await(
                    "a component with the focus",
                    () -> Optional.ofNullable(java.awt.KeyboardFocusManager.getCurrentKeyboardFocusManager()
                            .getFocusOwner()));
            onEventThread(() -> {
                owner.dispatchEvent(new KeyEvent(
                        owner, KeyEvent.KEY_TYPED, System.currentTimeMillis(), 0, KeyEvent.VK_UNDEFINED, c));
                return true;
            });
        }
        settle();
    }

    /** Finds an action by words and does it, as a user does with the search. */
    public void command(String words) throws Exception {
        keys(KeyEvent.VK_CONTROL, KeyEvent.VK_K);
        awaitFocus("What do you want to do?");
        type(words);
        keys(KeyEvent.VK_ENTER);
    }

    /** Waits until the component of this name has the focus. */
    public void awaitFocus(String part) throws Exception {
        awaitThat("the focus on " + part, () -> {
            Component owner = java.awt.KeyboardFocusManager.getCurrentKeyboardFocusManager()
                    .getFocusOwner();
            return owner != null && name(owner).contains(part);
        });
    }

    /** Drops a file onto the strata. */
    public void drop(Path file) throws Exception {
        onEventThread(() -> {
            javax.swing.JComponent target = (javax.swing.JComponent) window().getContentPane();
            return target.getTransferHandler()
                    .importData(new javax.swing.TransferHandler.TransferSupport(target, new FileTransfer(file)));
        });
        settle();
    }

    /** The picture of the window. */
    public java.awt.image.BufferedImage picture() throws Exception {
        settle();
        return onEventThread(() -> {
            JFrame frame = window();
            java.awt.image.BufferedImage image = new java.awt.image.BufferedImage(
                    frame.getWidth(), frame.getHeight(), java.awt.image.BufferedImage.TYPE_INT_RGB);
            frame.printAll(image.getGraphics());
            return image;
        });
    }

    /** Everything below a folder that is a file, as paths. */
    public static List<Path> files(Path folder) throws IOException {
        List<Path> found = new ArrayList<>();
        if (Files.isDirectory(folder)) {
            try (DirectoryStream<Path> entries = Files.newDirectoryStream(folder)) {
                for (Path entry : entries) {
                    found.addAll(Files.isDirectory(entry) ? files(entry) : List.of(entry));
                }
            }
        }
        return found;
    }

    /** Leaves the desk as a user does and returns the exit code. */
    public int leave() throws Exception {
        onEventThread(() -> {
            JFrame frame = window();
            frame.dispatchEvent(new java.awt.event.WindowEvent(frame, java.awt.event.WindowEvent.WINDOW_CLOSING));
            return true;
        });
        return exit.get(PATIENCE_SECONDS, TimeUnit.SECONDS);
    }

    @Override
    public void close() {
        try {
            if (!exit.isDone() && windowNow().isPresent()) {
                leave();
            }
            framework.stop();
            framework.waitForStop(TimeUnit.SECONDS.toMillis(PATIENCE_SECONDS));
            // Set by the register's store for a whole process; the next user of this one has a folder of his own,
            // without
            // which Java would refuse to load the database's native part again.
            for (String property : List.of("org.sqlite.tmpdir", "org.sqlite.lib.path", "org.sqlite.lib.name")) {
                System.clearProperty(property);
            }
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        } catch (Exception e) {
            throw new IllegalStateException("the desk did not end well", e);
        }
    }
}
