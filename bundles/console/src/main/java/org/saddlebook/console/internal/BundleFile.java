package org.saddlebook.console.internal;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.net.URI;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.Optional;
import java.util.jar.Attributes;
import java.util.jar.JarInputStream;
import java.util.zip.ZipException;
import java.util.zip.ZipInputStream;
import org.osgi.framework.Bundle;

/**
 * What a bundle's file says about itself.
 *
 * @param symbolicName symbolic name without directives
 * @param version version
 */
record BundleFile(String symbolicName, String version) {
    /** Reads the manifest of a jar; empty when it is not an OSGi bundle. */
    static Optional<BundleFile> of(byte[] jar) {
        try (JarInputStream stream = new JarInputStream(new ByteArrayInputStream(jar), false)) {
            if (stream.getManifest() != null) {
                return of(stream.getManifest().getMainAttributes());
            }
        } catch (IOException | SecurityException e) {
            return Optional.empty();
        }
        // The manifest need not come first for the framework.
        try (ZipInputStream stream = new ZipInputStream(new ByteArrayInputStream(jar))) {
            for (var entry = stream.getNextEntry(); entry != null; entry = stream.getNextEntry()) {
                if (entry.getName().equals("META-INF/MANIFEST.MF")) {
                    return of(new java.util.jar.Manifest(stream).getMainAttributes());
                }
            }
        } catch (ZipException e) {
            return Optional.empty();
        } catch (IOException e) {
            return Optional.empty();
        }
        return Optional.empty();
    }

    private static Optional<BundleFile> of(Attributes attributes) {
        String name = attributes.getValue("Bundle-SymbolicName");
        if (name == null || !"2".equals(attributes.getValue("Bundle-ManifestVersion"))) {
            return Optional.empty();
        }
        int directives = name.indexOf(';');
        String plain = (directives < 0 ? name : name.substring(0, directives)).strip();
        String version = attributes.getValue("Bundle-Version");
        // The name becomes part of a file name; the framework allows no other characters either.
        boolean clean = plain.matches("[A-Za-z0-9_-]+(\\.[A-Za-z0-9_-]+)*");
        String cleanVersion = version == null ? "0.0.0" : version.strip();
        return clean && cleanVersion.matches("[0-9A-Za-z._-]+")
                ? Optional.of(new BundleFile(plain, cleanVersion))
                : Optional.empty();
    }

    /** The file a bundle was installed from; empty for the framework itself. */
    static Optional<Path> pathOf(Bundle bundle) {
        String location = bundle.getLocation();
        String file = location.startsWith("reference:") ? location.substring("reference:".length()) : location;
        return file.startsWith("file:") ? Optional.of(Path.of(URI.create(file))) : Optional.empty();
    }

    /** SHA-256 of a file, lower-case hexadecimal. */
    static String sha256(Path file) throws IOException {
        return sha256(Files.readAllBytes(file));
    }

    /** SHA-256 of bytes, lower-case hexadecimal. */
    static String sha256(byte[] bytes) {
        try {
            return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(bytes));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java platform has SHA-256", e);
        }
    }
}
