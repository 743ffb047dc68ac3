package org.saddlebook.register.api;

import java.util.Objects;

/**
 * One file of an entry, as the record names it.
 *
 * @param name relative path with forward slashes, for example {@code sources/rates.csv}
 * @param type media type, for example {@code application/json}
 * @param size number of bytes
 * @param sha256 hash of its bytes
 */
public record PartEntry(String name, String type, long size, Digest sha256) {
    /** Checks the components; a name must stay inside the folder it is exported to. */
    public PartEntry {
        Objects.requireNonNull(type, "type");
        Objects.requireNonNull(sha256, "sha256");
        checkName(name);
        if (size < 0) {
            throw new IllegalArgumentException("negative size: " + size);
        }
    }

    static void checkName(String name) {
        if (name.isEmpty() || name.startsWith("/") || name.contains("\\") || name.contains(":")) {
            throw new IllegalArgumentException("not a relative path: " + name);
        }
        for (int i = 0; i < name.length(); i++) {
            if (name.charAt(i) < ' ' || name.charAt(i) == 0x7f) {
                throw new IllegalArgumentException("a name with a control character");
            }
        }
        for (String step : name.split("/", -1)) {
            if (step.isEmpty() || step.equals(".") || step.equals("..")) {
                throw new IllegalArgumentException("not a relative path inside the folder: " + name);
            }
        }
    }
}
