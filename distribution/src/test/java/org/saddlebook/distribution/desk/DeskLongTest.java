package org.saddlebook.distribution.desk;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.AWTEvent;
import java.awt.EventQueue;
import java.awt.Toolkit;
import java.awt.event.KeyEvent;
import java.io.ByteArrayInputStream;
import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;
import java.lang.ref.WeakReference;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicReference;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;
import org.osgi.framework.Bundle;
import org.osgi.framework.wiring.BundleWiring;
import org.saddlebook.distribution.desk.addon.LeakyPanel;
import org.saddlebook.testkit.api.NeedsScreen;

/** What takes long: many cycles, many campaigns, a long table. */
@NeedsScreen
@Tag("long")
@Timeout(1800)
class DeskLongTest {
    private static final int CYCLES = 1000;
    private static final long LIMIT_MILLISECONDS = 50;

    @TempDir
    private Path folder;

    private Path table(String name, int rows) throws Exception {
        StringBuilder text = new StringBuilder("T (K),k (1/s)\n");
        for (int i = 0; i < rows; i++) {
            double kelvin = 290 + 70.0 * i / rows;
            double rate = 1e11 * StrictMath.exp(-90000 / (8.314 * kelvin)) * (1 + 0.02 * ((i * 7919) % 11 - 5) / 5);
            text.append(String.format(Locale.ROOT, "%.3f,%.6e%n", kelvin, rate));
        }
        return Files.writeString(folder.resolve(name), text.toString());
    }

    @Test
    void aThousandCyclesOfALeakyAddOnLeaveNoClassLoaderBehind() throws Exception {
        byte[] jar = AddOnBundle.of(LeakyPanel.class);
        try (RunningDesk desk = RunningDesk.open(folder.resolve("home"), table("rates.csv", 8))) {
            desk.named("Campaign rates");
            desk.shows("Caution 1:");
            List<WeakReference<ClassLoader>> loaders = new ArrayList<>();
            for (int i = 0; i < CYCLES; i++) {
                Bundle bundle = desk.context().installBundle("test:leaky-" + i, new ByteArrayInputStream(jar));
                bundle.start();
                loaders.add(new WeakReference<>(bundle.adapt(BundleWiring.class).getClassLoader()));
                desk.named("Leaky, ");
                if (i % 10 == 0) {
                    desk.press("Leaky, "); // from now on it is open as soon as it comes
                    desk.shows("body of the leaky panel");
                }
                bundle.uninstall();
                desk.awaitThat(
                        "the panel to go",
                        () -> desk.find(component -> RunningDesk.name(component).startsWith("Leaky"))
                                .isEmpty());
            }
            // The event thread remembers the last event it handled, and with it a component: handle another.
            desk.command("move the hairline warmer");
            assertEquals(0, left(loaders), "class loaders left");
        }
    }

    private static long left(List<WeakReference<ClassLoader>> loaders) throws InterruptedException {
        long left = loaders.size();
        CountDownLatch never = new CountDownLatch(1);
        for (int i = 0; i < 50 && left > 0; i++) {
            System.gc();
            boolean opened = never.await(50, TimeUnit.MILLISECONDS);
            assertTrue(!opened);
            left = loaders.stream().filter(reference -> reference.get() != null).count();
        }
        return left;
    }

    /** Takes the processor's time of each turn: on a busy machine the clock would count what others do. */
    private static final class TimedQueue extends EventQueue {
        private final ThreadMXBean threads = ManagementFactory.getThreadMXBean();
        private final AtomicReference<String> slow = new AtomicReference<>("");
        private long longest;

        @Override
        protected void dispatchEvent(AWTEvent event) {
            long start = threads.getCurrentThreadCpuTime();
            super.dispatchEvent(event);
            long took = threads.getCurrentThreadCpuTime() - start;
            if (took > longest) {
                longest = took;
                slow.set(TimeUnit.NANOSECONDS.toMillis(took) + " ms of processor: " + event);
            }
        }

        long takeLongest() {
            long result = longest;
            longest = 0;
            return result;
        }
    }

    @Test
    void noTurnOfTheEventThreadIsLongWithFiftyCampaignsAndALongTable() throws Exception {
        List<Path> inputs = new ArrayList<>();
        for (int i = 0; i < 49; i++) {
            inputs.add(table("campaign-" + i + ".csv", 8));
        }
        inputs.add(table("long.csv", 20_000));
        try (RunningDesk desk = RunningDesk.open(folder.resolve("home"), inputs.toArray(new Path[0]))) {
            desk.awaitThat("fifty campaigns", () -> desk.texts().contains("50 open"));
            walk(desk); // once before counting: classes are loaded and code is made quick
            TimedQueue queue = new TimedQueue();
            Toolkit.getDefaultToolkit().getSystemEventQueue().push(queue);
            desk.onEventThread(queue::takeLongest);
            walk(desk);
            String slowest = queue.slow.get();
            long longest = desk.onEventThread(queue::takeLongest);
            assertTrue(longest < TimeUnit.MILLISECONDS.toNanos(LIMIT_MILLISECONDS), () -> "longest: " + slowest);
        }
    }

    private static void walk(RunningDesk desk) throws Exception {
        desk.command("go to campaign-7");
        desk.named("Campaign campaign-7,");
        desk.shows("Caution 1:");
        desk.command("go to long");
        desk.named("Campaign long");
        for (int i = 1; i <= 4; i++) {
            desk.keys(KeyEvent.VK_CONTROL, KeyEvent.VK_0 + i);
        }
        for (int i = 0; i < 20; i++) {
            desk.keys(KeyEvent.VK_ALT, KeyEvent.VK_RIGHT);
        }
        desk.command("write a note");
        desk.awaitFocus("What is to be noted?");
        desk.type("a long table");
        desk.keys(KeyEvent.VK_ENTER);
        desk.named("Undo: note");
        desk.keys(KeyEvent.VK_CONTROL, KeyEvent.VK_Z);
        desk.named("Redo: note");
        desk.command("go to campaign-8");
        desk.named("Campaign campaign-8,");
        desk.shows("Caution 1:");
        desk.keys(KeyEvent.VK_ALT, KeyEvent.VK_PAGE_DOWN);
        // Which one is next depends on the order in which the files were read.
        desk.awaitThat("the next campaign", () -> !desk.texts().contains("Campaign campaign-8,"));
        desk.shows("Caution 1:");
        desk.settle();
    }
}
