package org.saddlebook.testkit.api;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.io.CleanupMode;
import org.junit.jupiter.api.io.TempDir;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.model.RateModel;

/** The example add-on's source compiles against the api of today, and nothing else of ours, and holds to the contract. */
class ExampleModelTest extends RateModelContract {
    private static final String CLASS = "example.harcourtesson.HarcourtEsson";

    @TempDir(cleanup = CleanupMode.ON_SUCCESS)
    static Path folder;

    private static Path jar;

    @BeforeAll
    static void build() throws IOException {
        Path source = Path.of("..", "..", "distribution", "example-model", "src", "main", "java")
                .resolve(CLASS.replace('.', '/') + ".java");
        jar = folder.resolve("example.jar");
        BundleBuilder.named("example.harcourt-esson")
                .withLibrary(BundleBuilder.location(Component.class))
                .write(CLASS, Files.readString(source, StandardCharsets.UTF_8), jar);
    }

    @Override
    protected RateModel model() {
        try {
            return BundleLoader.rateModel(jar);
        } catch (IOException unreadable) {
            throw new UncheckedIOException(unreadable);
        }
    }

    @Override
    protected List<Example> examples() {
        return OldBinaryTest.HarcourtEssonExamples.LIST;
    }
}
