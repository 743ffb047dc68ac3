package org.saddlebook.distribution;

import java.io.IOException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/** The jars of the assembled product, for a framework inside a test. */
public final class InstalledBundlesOfTheProduct {
    /** The assembled product. */
    public static final Path HOME = InstalledProduct.ASSEMBLED;

    private InstalledBundlesOfTheProduct() {}

    /** The bundles, and what the launcher has on its class path and provides to them. */
    public static List<Path> jars() throws IOException {
        List<Path> jars = new ArrayList<>();
        for (String name : List.of(
                "jackson-core",
                "org.osgi.util.function",
                "org.osgi.util.promise",
                "org.osgi.service.component",
                "org.apache.felix.scr")) {
            jars.add(HOME.resolve("lib").resolve(name + ".jar"));
        }
        try (DirectoryStream<Path> bundles = Files.newDirectoryStream(HOME.resolve("bundles"), "*.jar")) {
            List<Path> sorted = new ArrayList<>();
            bundles.forEach(sorted::add);
            Collections.sort(sorted);
            jars.addAll(sorted);
        }
        return jars;
    }
}
