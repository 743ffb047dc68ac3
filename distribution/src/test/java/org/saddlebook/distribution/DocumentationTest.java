package org.saddlebook.distribution;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Runs every command that a document shows through the assembled product and compares what the document shows. */
class DocumentationTest {
    private static final Path ROOT = Path.of("..").toAbsolutePath().normalize();
    private static final Path PRODUCT = Path.of("target", "product").toAbsolutePath();

    @TempDir
    private Path folder;

    static Stream<String> documents() throws IOException {
        List<Path> documents = new ArrayList<>(List.of(ROOT.resolve("README.md"), ROOT.resolve("DEVELOPERS.md")));
        for (String place : List.of("demo-data", "distribution/docs")) {
            try (Stream<Path> files = Files.walk(ROOT.resolve(place))) {
                files.filter(file -> file.toString().endsWith(".md")).sorted().forEach(documents::add);
            }
        }
        return documents.stream().map(file -> ROOT.relativize(file).toString().replace('\\', '/'));
    }

    @ParameterizedTest
    @MethodSource("documents")
    @Timeout(300)
    void commandsInADocumentDoWhatItShows(String document) throws IOException, InterruptedException {
        copy(ROOT.resolve("demo-data"), folder.resolve("demo-data"));
        for (DocumentedStep step : DocumentedStep.of(ROOT.resolve(document))) {
            if (step instanceof DocumentedStep.WriteFile file) {
                Files.write(folder.resolve(file.name()), file.content());
            } else if (step instanceof DocumentedStep.Run run) {
                check(document, run);
            }
        }
    }

    @Test
    void theDocumentsShowCommands() throws IOException {
        int commands = 0;
        for (String document : documents().toList()) {
            for (DocumentedStep step : DocumentedStep.of(ROOT.resolve(document))) {
                commands += step instanceof DocumentedStep.Run ? 1 : 0;
            }
        }
        assertTrue(commands >= 20, "only " + commands + " commands were found: was the form of the blocks changed?");
    }

    private void check(String document, DocumentedStep.Run run) throws IOException, InterruptedException {
        Path out = folder.resolve("standard-output");
        Path err = folder.resolve("standard-error");
        List<String> command =
                new ArrayList<>(List.of(PRODUCT.resolve("bin/saddlebook").toString()));
        command.addAll(run.arguments());
        ProcessBuilder builder = new ProcessBuilder(command)
                .directory(folder.toFile())
                .redirectOutput(out.toFile())
                .redirectError(err.toFile());
        Map<String, String> environment = builder.environment();
        environment.put("JAVA_HOME", System.getProperty("java.home"));
        environment.put("HOME", folder.resolve("home").toString());
        environment.put("XDG_DATA_HOME", folder.resolve("home/data").toString());
        environment.put("XDG_CONFIG_HOME", folder.resolve("home/config").toString());
        environment.put("XDG_CACHE_HOME", folder.resolve("home/cache").toString());
        environment.put("SADDLEBOOK_NO_ARCHIVE", "1");
        Process process = builder.start();
        process.getOutputStream().close();
        assertTrue(process.waitFor(120, TimeUnit.SECONDS), () -> document + ", line " + run.line() + ": did not end");

        List<String> printed = new ArrayList<>(
                Files.readString(out, StandardCharsets.UTF_8).lines().toList());
        Files.readString(err, StandardCharsets.UTF_8).lines().forEach(printed::add);
        String where = document + ", line " + run.line() + ": saddlebook " + String.join(" ", run.arguments());
        assertEquals(run.exitCode(), process.exitValue(), () -> where + "\nprinted:\n" + String.join("\n", printed));
        Optional<String> missing = new ShownOutput(run.shown()).missingFrom(printed);
        assertEquals(
                Optional.empty(),
                missing,
                () -> where + "\ndoes not show:\n" + missing.orElse("") + "\nbut:\n" + String.join("\n", printed));
    }

    private static void copy(Path from, Path to) throws IOException {
        try (Stream<Path> files = Files.walk(from)) {
            for (Path file : files.toList()) {
                Path target = to.resolve(from.relativize(file).toString());
                if (Files.isDirectory(file)) {
                    Files.createDirectories(target);
                } else {
                    Files.copy(file, target);
                }
            }
        }
    }
}
