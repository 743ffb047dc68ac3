package org.saddlebook.estimation.api;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** Collects digits reached and writes them as the table the README shows. */
final class DigitsTable {
    private final List<String> lines = new ArrayList<>();

    DigitsTable(String... headings) {
        lines.add("| " + String.join(" | ", headings) + " |");
        lines.add("|---".repeat(headings.length) + "|");
    }

    void add(String name, String level, double... digits) {
        StringBuilder line = new StringBuilder("| ").append(name).append(" | ").append(level);
        for (double value : digits) {
            line.append(" | ").append(String.format(Locale.ROOT, "%.1f", value));
        }
        lines.add(line.append(" |").toString());
    }

    void write(String name) {
        try {
            Path folder = Files.createDirectories(Path.of("target", "reference"));
            Files.write(folder.resolve(name), lines, StandardCharsets.UTF_8);
            List<String> fragment = new ArrayList<>();
            fragment.add("## Digits reached on certified sets: " + name.substring(0, name.indexOf('.')));
            fragment.add("");
            fragment.addAll(lines);
            Path checks = Files.createDirectories(Path.of("target", "checks"));
            Files.write(checks.resolve("digits-" + name), fragment, StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    String text() {
        return String.join("\n", lines);
    }
}
