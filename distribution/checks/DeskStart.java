import java.awt.Robot;
import java.awt.event.KeyEvent;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.TimeUnit;

/**
 * Measures how long the desk takes from the start of its process until a demo result is painted, and how long a bare
 * framework with an empty window takes, in turns and in one run. Needs a screen (DISPLAY) and the built product.
 *
 * <p>Run in the folder of the repository: {@code java distribution/checks/DeskStart.java [TURNS]}. Prints a table for
 * distribution/docs/desk.md.
 */
public final class DeskStart {
    private static final Path PRODUCT = Path.of("distribution", "target", "product").toAbsolutePath();

    private DeskStart() {}

    public static void main(String[] arguments) throws Exception {
        int turns = arguments.length > 0 ? Integer.parseInt(arguments[0]) : 10;
        Path scratch = Files.createTempDirectory("saddlebook-start-");
        Path empty = scratch.resolve("EmptyWindow.java");
        Files.writeString(empty, EMPTY_WINDOW);
        Path classes = scratch.resolve("classes");
        String path = PRODUCT.resolve("lib/org.apache.felix.framework.jar").toString();
        run(List.of(java("javac"), "-d", classes.toString(), "-cp", path, empty.toString()));
        List<Long> desks = new ArrayList<>();
        List<Long> bare = new ArrayList<>();
        long memory = 0;
        // Two desks before counting: the first makes caches, and when it is left the class archive.
        for (int i = -2; i < turns; i++) {
            Sample sample = desk(scratch, i);
            long window = bare(scratch, classes, path, i);
            if (i >= 0) {
                desks.add(sample.milliseconds());
                bare.add(window);
                memory = Math.max(memory, sample.residentKilobytes());
            }
        }
        long desk = median(desks);
        long frame = median(bare);
        System.out.println("| what | median of " + turns + " |");
        System.out.println("|---|---|");
        System.out.println("| desk, demo result painted | " + desk + " ms |");
        System.out.println("| bare framework, empty window painted | " + frame + " ms |");
        System.out.println("| ratio | " + String.format(Locale.ROOT, "%.2f", desk / (double) frame) + " |");
        System.out.println("| memory of the desk's process with the demo | " + memory / 1024 + " MB |");
    }

    private record Sample(long milliseconds, long residentKilobytes) {}

    private static Sample desk(Path scratch, int turn) throws Exception {
        Path mark = scratch.resolve("desk-" + turn);
        ProcessBuilder builder =
                new ProcessBuilder(PRODUCT.resolve("bin/saddlebook").toString(), "desk").directory(scratch.toFile());
        builder.environment().put("HOME", scratch.toString());
        for (String variable : List.of("XDG_DATA_HOME", "XDG_CONFIG_HOME", "XDG_CACHE_HOME")) {
            builder.environment().put(variable, scratch.resolve(variable).toString());
        }
        builder.environment().put("SADDLEBOOK_JAVA_OPTIONS", "-Dsaddlebook.desk.mark=" + mark);
        builder.redirectErrorStream(true).redirectOutput(scratch.resolve("desk.txt").toFile());
        long start = System.currentTimeMillis();
        Process process = builder.start();
        long painted = await(process, mark);
        ProcessHandle java = process.descendants()
                .filter(each -> each.info().command().orElse("").endsWith("java"))
                .findFirst()
                .orElse(process.toHandle());
        long memory = resident(java.pid());
        // Left as a user leaves it: only then the class archive is made.
        Robot robot = new Robot();
        robot.mouseMove(700, 300);
        robot.keyPress(KeyEvent.VK_CONTROL);
        robot.keyPress(KeyEvent.VK_Q);
        robot.keyRelease(KeyEvent.VK_Q);
        robot.keyRelease(KeyEvent.VK_CONTROL);
        if (!process.waitFor(60, TimeUnit.SECONDS)) {
            java.destroy();
        }
        return new Sample(painted - start, memory);
    }

    private static long bare(Path scratch, Path classes, String path, int turn) throws Exception {
        Path mark = scratch.resolve("bare-" + turn);
        Path archive = scratch.resolve("bare.jsa");
        List<String> command = new ArrayList<>(List.of(java("java"), "-XX:TieredStopAtLevel=1", "-XX:+UseSerialGC"));
        command.add(turn == -2 ? "-XX:ArchiveClassesAtExit=" + archive : "-XX:SharedArchiveFile=" + archive);
        command.addAll(List.of("-Xlog:disable", "-cp", classes + ":" + path, "EmptyWindow", mark.toString()));
        ProcessBuilder builder = new ProcessBuilder(command).directory(scratch.toFile());
        builder.redirectErrorStream(true).redirectOutput(scratch.resolve("bare.txt").toFile());
        long start = System.currentTimeMillis();
        Process process = builder.start();
        long painted = await(process, mark);
        if (!process.waitFor(60, TimeUnit.SECONDS)) {
            process.destroyForcibly();
        }
        return painted - start;
    }

    private static long await(Process process, Path mark) throws Exception {
        long end = System.nanoTime() + TimeUnit.SECONDS.toNanos(120);
        while (System.nanoTime() < end) {
            if (Files.exists(mark) && Files.size(mark) > 0) {
                return Long.parseLong(Files.readString(mark).strip());
            }
            if (process.waitFor(10, TimeUnit.MILLISECONDS)) {
                break;
            }
        }
        throw new IllegalStateException("nothing was painted: " + mark);
    }

    private static long resident(long pid) throws IOException {
        Path status = Path.of("/proc", Long.toString(pid), "status");
        for (String line : Files.exists(status) ? Files.readAllLines(status) : List.<String>of()) {
            if (line.startsWith("VmRSS:")) {
                return Long.parseLong(line.replaceAll("\\D", ""));
            }
        }
        return 0;
    }

    private static long median(List<Long> values) {
        List<Long> sorted = new ArrayList<>(values);
        Collections.sort(sorted);
        return sorted.get(sorted.size() / 2);
    }

    private static String java(String tool) {
        return Path.of(System.getProperty("java.home"), "bin", tool).toString();
    }

    private static void run(List<String> command) throws Exception {
        if (new ProcessBuilder(command).inheritIO().start().waitFor() != 0) {
            throw new IllegalStateException(String.join(" ", command));
        }
    }

    private static final String EMPTY_WINDOW = """
            import java.awt.Graphics;
            import java.nio.file.*;
            import java.util.Map;
            import javax.swing.*;

            public class EmptyWindow {
                public static void main(String[] arguments) throws Exception {
                    String storage = Files.createTempDirectory("bare-").toString();
                    var framework = new org.apache.felix.framework.FrameworkFactory().newFramework(
                            Map.of("org.osgi.framework.storage", storage, "felix.service.urlhandlers", "false"));
                    framework.start();
                    SwingUtilities.invokeAndWait(() -> {
                        JFrame frame = new JFrame("empty");
                        frame.setContentPane(new JPanel() {
                            @Override
                            protected void paintComponent(Graphics g) {
                                super.paintComponent(g);
                                SwingUtilities.invokeLater(() -> {
                                    try {
                                        java.awt.Toolkit.getDefaultToolkit().sync();
                                        Files.writeString(Path.of(arguments[0]), Long.toString(System.currentTimeMillis()));
                                    } catch (java.io.IOException e) {
                                        throw new java.io.UncheckedIOException(e);
                                    }
                                    System.exit(0);
                                });
                            }
                        });
                        frame.setSize(1366, 740);
                        frame.setVisible(true);
                    });
                }
            }
            """;
}
