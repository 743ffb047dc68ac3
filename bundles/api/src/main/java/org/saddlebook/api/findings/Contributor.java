package org.saddlebook.api.findings;

import java.util.Objects;

/**
 * A bundle that took part in making findings.
 *
 * @param name symbolic name
 * @param version version
 * @param sha256 hash of the bundle's bytes, lower-case hexadecimal; empty when the bytes are not at hand
 */
public record Contributor(String name, String version, String sha256) {
    /** Checks the components. */
    public Contributor {
        Objects.requireNonNull(name, "name");
        Objects.requireNonNull(version, "version");
        Objects.requireNonNull(sha256, "sha256");
    }
}
