package org.saddlebook.api.campaign;

import java.util.Objects;

/**
 * A file that belongs to a campaign.
 *
 * @param path relative path with forward slashes inside the campaign folder; for a bare table the path
 *     that it gets when it is saved, {@code sources/} and its file name
 * @param sha256 hash of its bytes, lower-case hexadecimal
 * @param size number of bytes
 * @param reader id of the reader that read it; empty when it is kept but not read
 */
public record SourcePart(String path, String sha256, long size, String reader) {
    /** Checks the components; a path must stay inside the folder. */
    public SourcePart {
        Objects.requireNonNull(reader, "reader");
        if (path.isEmpty() || path.startsWith("/") || path.contains("\\") || path.contains(":")) {
            throw new IllegalArgumentException("not a relative path: " + path);
        }
        for (String step : path.split("/", -1)) {
            if (step.isEmpty() || step.equals(".") || step.equals("..")) {
                throw new IllegalArgumentException("not a relative path inside the folder: " + path);
            }
        }
        if (!sha256.matches("[0-9a-f]{64}")) {
            throw new IllegalArgumentException("not a SHA-256: " + sha256);
        }
        if (size < 0) {
            throw new IllegalArgumentException("negative size: " + size);
        }
    }
}
