package org.saddlebook.distribution.desk;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.jar.Attributes;
import java.util.jar.JarEntry;
import java.util.jar.JarOutputStream;
import java.util.jar.Manifest;

/** Makes a bundle of the classes beside an activator, as an add-on of a third party would be. */
final class AddOnBundle {
    private AddOnBundle() {}

    /** The bytes of the bundle; it imports what a panel needs. */
    static byte[] of(Class<?> activator) throws IOException {
        Manifest manifest = new Manifest();
        Attributes main = manifest.getMainAttributes();
        main.put(Attributes.Name.MANIFEST_VERSION, "1.0");
        main.putValue("Bundle-ManifestVersion", "2");
        main.putValue("Bundle-SymbolicName", "org.saddlebook.test." + activator.getSimpleName());
        main.putValue("Bundle-Version", "1.0.0");
        main.putValue("Bundle-Activator", activator.getName());
        main.putValue(
                "Import-Package",
                "javax.swing,org.osgi.framework,org.saddlebook.desk.api,org.saddlebook.api.campaign,org.saddlebook.api.service,"
                        + "org.saddlebook.api.task");
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (JarOutputStream jar = new JarOutputStream(bytes, manifest);
                DirectoryStream<Path> classes = Files.newDirectoryStream(folder(activator), "*.class")) {
            for (Path file : classes) {
                if (file.getFileName().toString().startsWith(activator.getSimpleName())) {
                    jar.putNextEntry(
                            new JarEntry(activator.getPackageName().replace('.', '/') + "/" + file.getFileName()));
                    try (InputStream in = Files.newInputStream(file)) {
                        in.transferTo(jar);
                    }
                    jar.closeEntry();
                }
            }
        }
        return bytes.toByteArray();
    }

    private static Path folder(Class<?> type) throws IOException {
        try {
            Path root = Path.of(
                    type.getProtectionDomain().getCodeSource().getLocation().toURI());
            return root.resolve(type.getPackageName().replace('.', '/'));
        } catch (java.net.URISyntaxException e) {
            throw new IOException(e);
        }
    }
}
