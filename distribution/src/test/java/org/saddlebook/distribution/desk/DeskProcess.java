package org.saddlebook.distribution.desk;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.concurrent.TimeUnit;
import org.saddlebook.distribution.InstalledBundlesOfTheProduct;

/** The desk as a process of its own, started by the product's script, to be killed. */
final class DeskProcess {
    private static final long PATIENCE_SECONDS = 120;

    private final Path home;
    private final Process process;

    private DeskProcess(Path home, Process process) {
        this.home = home;
        this.process = process;
    }

    /** Starts it; data and settings lie where {@link RunningDesk} looks for them. */
    static DeskProcess start(Path home, Path input) throws IOException {
        Files.createDirectories(home);
        ProcessBuilder builder = new ProcessBuilder(List.of(
                        InstalledBundlesOfTheProduct.HOME
                                .resolve("bin/saddlebook")
                                .toString(),
                        "desk",
                        input.toString()))
                .directory(home.toFile())
                .redirectOutput(home.resolve("out.txt").toFile())
                .redirectError(home.resolve("err.txt").toFile());
        Map<String, String> environment = builder.environment();
        environment.keySet().removeIf(name -> name.startsWith("SADDLEBOOK") || name.equals("JAVA_TOOL_OPTIONS"));
        environment.put("SADDLEBOOK_NO_ARCHIVE", "1");
        environment.put("JAVA_HOME", System.getProperty("java.home"));
        environment.put("HOME", home.toString());
        environment.put("XDG_DATA_HOME", home.resolve("data").toString());
        environment.put("XDG_CONFIG_HOME", home.resolve("config").toString());
        environment.put("XDG_CACHE_HOME", home.resolve("cache").toString());
        return new DeskProcess(home, builder.start());
    }

    /** Waits until a campaign of this title is kept on the disk. */
    void awaitKept(String title) throws Exception {
        long end = System.nanoTime() + TimeUnit.SECONDS.toNanos(PATIENCE_SECONDS);
        Path unsaved = home.resolve("data/saddlebook/desk/unsaved");
        while (System.nanoTime() < end) {
            for (Path file : RunningDesk.files(unsaved)) {
                if (file.endsWith("campaign/campaign.json")
                        && Files.readString(file).contains(title)) {
                    return;
                }
            }
            if (process.waitFor(50, TimeUnit.MILLISECONDS)) {
                throw new AssertionError("the desk ended: " + Files.readString(home.resolve("err.txt")));
            }
        }
        throw new AssertionError("nothing was kept; " + Files.readString(home.resolve("err.txt")));
    }

    /** Kills it, with no chance to tidy up. */
    void kill() throws Exception {
        process.descendants().forEach(ProcessHandle::destroyForcibly);
        process.destroyForcibly();
        process.waitFor();
    }
}
