package org.saddlebook.testkit.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.jar.JarFile;
import java.util.stream.Stream;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.CleanupMode;
import org.junit.jupiter.api.io.TempDir;
import org.saddlebook.api.model.RateModel;

/** The example add-on builds by its own build file, outside this build, against the api jar and the testkit jar alone. */
@Tag("long")
class ExampleModelBuildTest {
    private static final Path PROJECT = Path.of("..", "..", "distribution", "example-model");

    @TempDir(cleanup = CleanupMode.ON_SUCCESS)
    Path folder;

    @Test
    @Timeout(value = 10, unit = TimeUnit.MINUTES)
    void buildsAndHoldsToTheContract() throws IOException, InterruptedException {
        Path project = folder.resolve("example-model");
        copy(PROJECT, project);
        boolean windows = Path.of("x").getFileSystem().getSeparator().equals("\\");
        Path log = folder.resolve("maven.log");
        Process maven = new ProcessBuilder(List.of(
                        windows ? "mvn.cmd" : "mvn",
                        "--batch-mode",
                        "--offline",
                        "package",
                        "-Dsaddlebook.api.jar=" + jarOf(RateModel.class, "api.jar"),
                        "-Dsaddlebook.testkit.jar=" + jarOf(RateModelContract.class, "testkit.jar")))
                .directory(project.toFile())
                .redirectErrorStream(true)
                .redirectOutput(log.toFile())
                .start();
        int code = maven.waitFor();
        String output = Files.readString(log, StandardCharsets.UTF_8);
        assertEquals(0, code, output);
        assertTrue(output.contains("Tests run: 19, Failures: 0, Errors: 0, Skipped: 0"), output);
        Path jar = project.resolve("target").resolve("example.harcourt-esson-1.0.0.jar");
        assertEquals("example.harcourt-esson", BundleLoader.rateModel(jar).id());
        try (JarFile file = new JarFile(jar.toFile())) {
            String imports = file.getManifest().getMainAttributes().getValue("Import-Package");
            assertTrue(imports.contains("org.saddlebook.api.model;version=\"[1.0,2)\""), imports);
        }
    }

    /** The jar a class came from; where the build has only a folder of classes yet, a jar made of it. */
    private Path jarOf(Class<?> type, String name) throws IOException {
        Path location = BundleBuilder.location(type).toAbsolutePath();
        if (!Files.isDirectory(location)) {
            return location;
        }
        Path jar = folder.resolve(name);
        try (OutputStream out = Files.newOutputStream(jar);
                ZipOutputStream zip = new ZipOutputStream(out);
                Stream<Path> files = Files.walk(location)) {
            for (Path file : files.filter(Files::isRegularFile).sorted().toList()) {
                zip.putNextEntry(
                        new ZipEntry(location.relativize(file).toString().replace('\\', '/')));
                Files.copy(file, zip);
                zip.closeEntry();
            }
        }
        return jar.toAbsolutePath();
    }

    private static void copy(Path from, Path to) throws IOException {
        try (Stream<Path> files = Files.walk(from)) {
            for (Path file : files.toList()) {
                Path relative = from.relativize(file);
                if (relative.startsWith("target")) {
                    continue;
                }
                Path target = to.resolve(relative.toString());
                if (Files.isDirectory(file)) {
                    Files.createDirectories(target);
                } else {
                    Files.copy(file, target);
                }
            }
        }
    }
}
