package org.saddlebook.distribution;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;

/** The assembled product as one user has it: own home, own caches, started by its script as a process. */
final class InstalledProduct {
    /** The assembled product. */
    static final Path ASSEMBLED = Path.of("target", "product").toAbsolutePath();

    private final Path product;
    private final Path home;
    private final Map<String, String> environment = new HashMap<>();

    /** What a command printed. */
    record Outcome(int exitCode, String out, String err) {
        /** Both streams. */
        String all() {
            return out + err;
        }

        boolean showsAStackTrace() {
            return all().contains("\tat ") || all().contains("Exception in thread");
        }
    }

    private InstalledProduct(Path product, Path home) {
        this.product = product;
        this.home = home;
        environment.put("SADDLEBOOK_NO_ARCHIVE", "1");
    }

    /** A product used by someone whose home is the folder given. */
    static InstalledProduct of(Path product, Path home) {
        return new InstalledProduct(product, home);
    }

    /** Sets a variable of the environment. */
    InstalledProduct with(String variable, String value) {
        environment.put(variable, value);
        return this;
    }

    Path data() {
        return home.resolve("data").resolve("saddlebook");
    }

    /** Runs a command and waits for its end. */
    Outcome run(String... arguments) throws IOException, InterruptedException {
        return finish(start(arguments));
    }

    /** A command that was started. */
    record Running(Process process, Path out, Path err) {}

    Running start(String... arguments) throws IOException {
        return start(List.of(), arguments);
    }

    /**
     * Starts a command that an interrupt reaches. A build that runs in the background of a shell ignores interrupts, and so
     * does every process that it starts.
     */
    Running startInterruptible(String... arguments) throws IOException, InterruptedException {
        List<String> reset = List.of("env", "--default-signal=INT");
        List<String> trial = new ArrayList<>(reset);
        trial.add("true");
        int known = new ProcessBuilder(trial)
                .redirectErrorStream(true)
                .redirectOutput(ProcessBuilder.Redirect.DISCARD)
                .start()
                .waitFor();
        return start(known == 0 ? reset : List.of(), arguments);
    }

    private Running start(List<String> prefix, String... arguments) throws IOException {
        Files.createDirectories(home);
        Path out = Files.createTempFile(home, "out", ".txt");
        Path err = Files.createTempFile(home, "err", ".txt");
        List<String> command = new ArrayList<>(prefix);
        command.add(product.resolve("bin/saddlebook").toString());
        command.addAll(List.of(arguments));
        ProcessBuilder builder = new ProcessBuilder(command)
                .directory(home.toFile())
                .redirectOutput(out.toFile())
                .redirectError(err.toFile());
        Map<String, String> all = builder.environment();
        all.keySet().removeIf(name -> name.startsWith("SADDLEBOOK") || name.equals("JAVA_TOOL_OPTIONS"));
        all.put("JAVA_HOME", System.getProperty("java.home"));
        all.put("HOME", home.toString());
        all.put("XDG_DATA_HOME", home.resolve("data").toString());
        all.put("XDG_CONFIG_HOME", home.resolve("config").toString());
        all.put("XDG_CACHE_HOME", home.resolve("cache").toString());
        all.putAll(environment);
        Process process = builder.start();
        process.getOutputStream().close();
        return new Running(process, out, err);
    }

    static Outcome finish(Running running) throws IOException, InterruptedException {
        if (!running.process().waitFor(180, TimeUnit.SECONDS)) {
            running.process().destroyForcibly();
            throw new AssertionError("the command did not end");
        }
        return new Outcome(
                running.process().exitValue(),
                Files.readString(running.out(), StandardCharsets.UTF_8),
                Files.readString(running.err(), StandardCharsets.UTF_8));
    }

    /** A copy of the assembled product that a test may change. */
    static Path copy(Path target) throws IOException {
        try (Stream<Path> files = Files.walk(ASSEMBLED)) {
            for (Path file : files.toList()) {
                Path to = target.resolve(ASSEMBLED.relativize(file).toString());
                if (Files.isDirectory(file)) {
                    Files.createDirectories(to);
                } else if (!file.startsWith(ASSEMBLED.resolve("archive"))) {
                    Files.copy(file, to, java.nio.file.StandardCopyOption.COPY_ATTRIBUTES);
                }
            }
        }
        return target;
    }

    /** A small table of rate constants, made up. */
    static Path table(Path folder) throws IOException {
        Files.createDirectories(folder);
        return Files.writeString(
                folder.resolve("rates.csv"),
                "T (K),k (1/s)\n300,1.02e-5\n310,4.1e-5\n320,1.49e-4\n330,5.2e-4\n340,1.66e-3\n350,4.95e-3\n");
    }
}
