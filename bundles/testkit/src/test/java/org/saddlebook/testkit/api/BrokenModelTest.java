package org.saddlebook.testkit.api;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.jar.JarFile;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.CleanupMode;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.saddlebook.api.model.RateFunction;
import org.saddlebook.api.model.RateModel;

class BrokenModelTest {
    private static final double[] P = {30, 80_000};

    // An open class loader keeps its jar open, which on Windows bars its deletion.
    @TempDir(cleanup = CleanupMode.ON_SUCCESS)
    Path folder;

    @ParameterizedTest
    @EnumSource
    void isABundleWithOneRateModel(BrokenModel broken) throws IOException {
        Path jar = broken.writeBundle(folder);
        try (JarFile file = new JarFile(jar.toFile())) {
            var main = file.getManifest().getMainAttributes();
            assertEquals(broken.bundleName(), main.getValue("Bundle-SymbolicName"));
            assertEquals(
                    "org.saddlebook.api.model;version=\"[1.0,2)\",org.saddlebook.api.quantity;version=\"[1.0,2)\"",
                    main.getValue("Import-Package"));
            assertTrue(file.getEntry(main.getValue("Service-Component")) != null, "component description is there");
        }
        assertEquals(broken.modelId(), BundleLoader.rateModel(jar).id());
    }

    @ParameterizedTest
    @EnumSource
    void isTheSameFileEveryTime(BrokenModel broken) throws IOException {
        byte[] first = Files.readAllBytes(broken.writeBundle(folder));
        assertArrayEquals(first, Files.readAllBytes(broken.writeBundle(folder)));
    }

    @Test
    void breaksAsItSays() throws Exception {
        RateFunction throwing = BrokenModel.THROWS.load(folder).bind(TestLaw.CONTEXT);
        assertThrows(IllegalStateException.class, () -> throwing.lnRate(300, P, new double[2]));

        RateFunction nan = BrokenModel.RETURNS_NAN.load(folder).bind(TestLaw.CONTEXT);
        assertTrue(Double.isNaN(nan.lnRate(300, P, new double[2])));

        double[] gradient = new double[2];
        BrokenModel.WRONG_GRADIENT.load(folder).bind(TestLaw.CONTEXT).lnRate(300, P, gradient);
        assertTrue(gradient[1] > 0, "the true derivative is negative");

        RateModel error = BrokenModel.ERROR_AT_BIND.load(folder);
        assertThrows(NoClassDefFoundError.class, () -> error.bind(TestLaw.CONTEXT));
    }

    @Test
    @Timeout(60)
    void hangsAndIgnoresInterrupts() throws Exception {
        RateFunction hanging = BrokenModel.HANGS.load(folder).bind(TestLaw.CONTEXT);
        Thread thread = new Thread(() -> hanging.lnRate(300, P, new double[2]), "hanging on purpose");
        thread.setDaemon(true);
        thread.start();
        waitFor(thread, Thread.State.WAITING);
        thread.interrupt();
        waitFor(thread, Thread.State.WAITING);
        assertTrue(thread.isAlive(), "an interrupt must not end it");
    }

    @Test
    void tellsWhatTheCompilerSays() {
        IllegalArgumentException refused = assertThrows(
                IllegalArgumentException.class,
                () -> BundleBuilder.named("example.bad")
                        .write("example.Bad", "package example; class Bad { int }", folder.resolve("bad.jar")));
        assertTrue(refused.getMessage().contains("Bad.java"), refused.getMessage());
    }

    private static void waitFor(Thread thread, Thread.State state) {
        while (thread.getState() != state && thread.isAlive()) {
            Thread.onSpinWait();
        }
    }
}
