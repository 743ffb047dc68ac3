package org.saddlebook.distribution;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;

/**
 * Measures the whole process of {@code evaluate --json} beside a plain Python script that fits the same table with SciPy,
 * run in turns, and writes what was found down. Nothing is asserted about time: that depends on the machine.
 */
@Tag("long")
@Timeout(900)
class StartTimeTest {
    private static final int ROUNDS = 21;

    private static final String SCRIPT = """
            import csv, sys
            import numpy as np
            from scipy import stats
            from scipy.optimize import curve_fit
            with open(sys.argv[1]) as f:
                rows = list(csv.reader(f))[1:]
            T = np.array([float(r[0]) for r in rows]); k = np.array([float(r[1]) for r in rows])
            R = 8.31446261815324
            p, c = curve_fit(lambda T, a, e: a - e / (R * T), T, np.log(k), p0=[30, 1e5])
            print(p, np.sqrt(np.diag(c)) * stats.t.ppf(0.975, len(T) - 2))
            """;

    @TempDir
    private Path home;

    @Test
    void measuresTheWholeProcess() throws Exception {
        InstalledProduct.table(home);
        Path script = Files.writeString(home.resolve("fit.py"), SCRIPT);
        InstalledProduct product =
                InstalledProduct.of(InstalledProduct.ASSEMBLED, home).with("SADDLEBOOK_NO_ARCHIVE", "");
        assertEquals(0, product.run("evaluate", "rates.csv", "--json").exitCode()); // makes archive and caches
        List<Double> ours = new ArrayList<>();
        List<Double> theirs = new ArrayList<>();
        List<Double> ratios = new ArrayList<>();
        boolean python = python(script) >= 0;
        for (int i = 0; i < ROUNDS; i++) {
            long start = System.nanoTime();
            assertEquals(0, product.run("evaluate", "rates.csv", "--json").exitCode());
            ours.add((System.nanoTime() - start) / 1e6);
            if (python) {
                theirs.add(python(script));
                ratios.add(ours.get(i) / theirs.get(i));
            }
        }
        StringBuilder text = new StringBuilder("## Time to start\n\n")
                .append("Whole process of `evaluate --json` on a bare table of six rows, wall time, median of ")
                .append(ROUNDS)
                .append(
                        python
                                ? ", in turns with a Python script that fits it with SciPy:\n\n"
                                : " (no Python with SciPy here):\n\n")
                .append("| | ms |\n|---|---|\n| saddlebook | ")
                .append(Math.round(median(ours)))
                .append(" |\n");
        if (python) {
            text.append("| Python with SciPy | ")
                    .append(Math.round(median(theirs)))
                    .append(" |\n\nMedian of the ratios: ");
            text.append(String.format(Locale.ROOT, "%.2f", median(ratios))).append(".\n");
        }
        Path fragment = Path.of("target", "checks", "start-time.md");
        Files.createDirectories(fragment.getParent());
        Files.writeString(fragment, text, StandardCharsets.UTF_8);
    }

    /** Milliseconds; negative when there is no Python with SciPy. */
    private double python(Path script) throws Exception {
        long start = System.nanoTime();
        Process process;
        try {
            process = new ProcessBuilder(
                            "python3",
                            script.toString(),
                            home.resolve("rates.csv").toString())
                    .redirectOutput(ProcessBuilder.Redirect.DISCARD)
                    .redirectError(ProcessBuilder.Redirect.DISCARD)
                    .start();
        } catch (java.io.IOException e) {
            return -1;
        }
        boolean ended = process.waitFor(60, TimeUnit.SECONDS);
        return ended && process.exitValue() == 0 ? (System.nanoTime() - start) / 1e6 : -1;
    }

    private static double median(List<Double> values) {
        double[] sorted = values.stream().mapToDouble(Double::doubleValue).toArray();
        Arrays.sort(sorted);
        return sorted[sorted.length / 2];
    }
}
