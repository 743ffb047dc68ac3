package org.saddlebook.register.api;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.util.Objects;

/**
 * A file on its way into the register or out of it.
 *
 * @param name relative path with forward slashes, unique among its siblings
 * @param type media type
 * @param content gives the bytes, the same each time it is opened
 */
public record PartFile(String name, String type, Content content) {
    /** Where the bytes come from; entering reads them twice, once for the hash and once for the store. */
    @FunctionalInterface
    public interface Content {
        /** A fresh stream over the bytes. */
        InputStream open() throws IOException;
    }

    /** Checks the components. */
    public PartFile {
        PartEntry.checkName(name);
        Objects.requireNonNull(type, "type");
        Objects.requireNonNull(content, "content");
    }

    /** A part held in memory; the bytes must not change. */
    public static PartFile of(String name, String type, byte[] bytes) {
        return new PartFile(name, type, () -> new ByteArrayInputStream(bytes));
    }
}
