package org.saddlebook.testkit.api;

import java.io.IOException;
import java.nio.file.Path;
import org.saddlebook.api.model.RateModel;

/**
 * Rate models that break the contract on purpose, each in one way, to test that a broken contribution loses its own
 * result and nothing else. All are the Arrhenius law apart from their fault. Get an instance for a test without a
 * framework, or the bundle for one with.
 */
public enum BrokenModel {
    /** Throws a runtime exception when it is evaluated. */
    THROWS("throws", "ThrowingModel"),
    /** Returns NaN for ln k. */
    RETURNS_NAN("returns-nan", "NotANumberModel"),
    /** Gives a gradient with a wrong sign. */
    WRONG_GRADIENT("wrong-gradient", "WrongGradientModel"),
    /** Never returns, and ignores interrupts. Its threads live until the virtual machine ends. */
    HANGS("hangs", "HangingModel"),
    /** Throws an error, not an exception, when it is bound. */
    ERROR_AT_BIND("error-at-bind", "ErrorAtBindModel");

    private static final String FOLDER = "/org/saddlebook/testkit/broken/";
    private static final String PACKAGE = "example.broken.";

    private final String word;
    private final String simpleName;

    BrokenModel(String word, String simpleName) {
        this.word = word;
        this.simpleName = simpleName;
    }

    /** Id of the rate model, for example {@code broken.throws}. */
    public String modelId() {
        return "broken." + word;
    }

    /** Symbolic name of the bundle, for example {@code example.broken.throws}. */
    public String bundleName() {
        return PACKAGE + word;
    }

    /** The Java source. */
    public String source() {
        return BundleBuilder.resource(BrokenModel.class, FOLDER + simpleName + ".java.txt");
    }

    /**
     * Writes the bundle to {@code folder}, ready for {@code bundles add}.
     *
     * @return the jar
     * @throws IOException when it cannot be written
     */
    public Path writeBundle(Path folder) throws IOException {
        Path jar = folder.resolve(bundleName() + ".jar");
        BundleBuilder.named(bundleName()).write(PACKAGE + simpleName, source(), jar);
        return jar;
    }

    /**
     * A new instance, outside any framework.
     *
     * @param folder where the bundle is written, and must stay
     * @throws IOException when it cannot be written
     */
    public RateModel load(Path folder) throws IOException {
        return BundleLoader.rateModel(writeBundle(folder));
    }
}
