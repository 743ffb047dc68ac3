package org.saddlebook.barrier;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.TimeUnit;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;

/**
 * Runs the outside programs (mpmath, SciPy, R) again and compares with the stored reference values: the arbiter's values
 * as printed, 20 digits; R and SciPy to 10 digits for parameters and 8 for everything else.
 */
@Tag("long")
class ReferenceProgramsTest {
    private static final Path TABLES = Path.of("src/test/resources/reference");
    private static final Path PROGRAM = Path.of("src/test/reference/reference.py");
    private static final Path CHECKS = Path.of("target/checks");
    private static final Pattern VERSION = Pattern.compile("\"version\": \\{[^}]*\\},\\s*");
    private static final Pattern AGREEMENT = Pattern.compile("\"agreementDigits\": \\{((?:[^{}]|\\{[^{}]*\\})*)\\}");
    private static final Pattern PROGRAM_DIGITS = Pattern.compile("\"(scipy|R)\": \\{([^{}]*)\\}");
    private static final Pattern DIGITS = Pattern.compile("\"(\\w+)\": ([0-9.]+)");

    @TempDir
    private Path folder;

    @Test
    @Timeout(300)
    void theOutsideProgramsGiveTheStoredValuesAgain() throws IOException, InterruptedException {
        assumeTrue(
                runs("python3", "-c", "import mpmath, numpy, scipy"),
                "python3 with mpmath, numpy and scipy is not installed: reference values not computed again");
        assumeTrue(runs("Rscript", "--version"), "Rscript is not installed: reference values not computed again");
        assertTrue(
                runs("python3", PROGRAM.toString(), TABLES.toString(), folder.toString()),
                () -> "the reference program failed: " + log());

        StringBuilder table = new StringBuilder(
                "## Reference programs (mpmath, SciPy, R)\n\n| file | arbiter's values | least digits, SciPy | least digits, R |\n|---|---|---|---|\n");
        List<Path> stored;
        try (Stream<Path> files = Files.list(TABLES.resolve("expected"))) {
            stored = files.sorted().toList();
        }
        assertEquals(9, stored.size(), "seven tables, the grid and the ratios");
        for (Path file : stored) {
            String name = file.getFileName().toString();
            String again = Files.readString(folder.resolve(name));
            assertEquals(values(Files.readString(file)), values(again), name);
            table.append("| ").append(name).append(" | equal, 20 digits | ");
            table.append(least(again, "scipy")).append(" | ");
            table.append(least(again, "R")).append(" |\n");
        }
        Files.createDirectories(CHECKS);
        Files.writeString(CHECKS.resolve("reference-programs.md"), table);
    }

    /** What must not change: everything but versions and the other programs' last digits. */
    private static String values(String json) {
        return AGREEMENT.matcher(VERSION.matcher(json).replaceAll("")).replaceAll("");
    }

    /** The least number of agreeing digits of one program in one file, after checking each group against its bound. */
    private static String least(String json, String program) {
        double least = Double.POSITIVE_INFINITY;
        Matcher programs = PROGRAM_DIGITS.matcher(json);
        while (programs.find()) {
            if (!programs.group(1).equals(program)) {
                continue;
            }
            Matcher groups = DIGITS.matcher(programs.group(2));
            while (groups.find()) {
                double digits = Double.parseDouble(groups.group(2));
                double bound = groups.group(1).equals("parameter") ? 10 : 8;
                assertTrue(digits >= bound, () -> program + " agrees to " + digits + " digits in " + groups.group());
                least = Math.min(least, digits);
            }
        }
        return least == Double.POSITIVE_INFINITY ? "-" : String.format(Locale.ROOT, "%.1f", least);
    }

    private boolean runs(String... command) throws InterruptedException {
        try {
            Process process = new ProcessBuilder(command)
                    .redirectErrorStream(true)
                    .redirectOutput(folder.resolve("log").toFile())
                    .start();
            process.getOutputStream().close();
            boolean ended = process.waitFor(240, TimeUnit.SECONDS);
            if (!ended) {
                process.destroyForcibly();
            }
            return ended && process.exitValue() == 0;
        } catch (IOException missing) {
            return false;
        }
    }

    private String log() {
        try {
            return Files.readString(folder.resolve("log"), StandardCharsets.UTF_8);
        } catch (IOException unreadable) {
            return unreadable.toString();
        }
    }
}
