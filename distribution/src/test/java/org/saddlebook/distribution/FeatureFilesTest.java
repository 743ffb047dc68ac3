package org.saddlebook.distribution;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.Reader;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import org.apache.felix.feature.impl.FeatureServiceImpl;
import org.junit.jupiter.api.Test;
import org.osgi.service.feature.Feature;
import org.osgi.service.feature.FeatureBundle;

/**
 * The feature files are OSGi Features (OSGi Compendium 8, chapter 159): another implementation, Apache Felix Feature,
 * reads them and finds in them what the product was assembled of.
 */
class FeatureFilesTest {
    private static List<Feature> features() throws IOException {
        List<Feature> features = new ArrayList<>();
        try (DirectoryStream<Path> files =
                Files.newDirectoryStream(InstalledProduct.ASSEMBLED.resolve("features"), "*.json")) {
            for (Path file : files) {
                try (Reader reader = Files.newBufferedReader(file)) {
                    Feature feature = new FeatureServiceImpl().readFeature(reader);
                    assertEquals(
                            "org.saddlebook.features."
                                    + file.getFileName().toString().replace(".json", ""),
                            feature.getID().getArtifactId());
                    assertTrue(feature.getName().isPresent(), () -> file + " has no name");
                    features.add(feature);
                }
            }
        }
        return features;
    }

    @Test
    void theFilesNameExactlyTheBundlesOfTheProduct() throws IOException {
        Set<String> named = new TreeSet<>();
        for (Feature feature : features()) {
            for (FeatureBundle bundle : feature.getBundles()) {
                named.add(bundle.getID().getArtifactId() + "-" + bundle.getID().getVersion() + ".jar");
            }
        }
        Set<String> shipped = new TreeSet<>();
        try (DirectoryStream<Path> jars = Files.newDirectoryStream(InstalledProduct.ASSEMBLED.resolve("bundles"))) {
            for (Path jar : jars) {
                shipped.add(jar.getFileName().toString());
            }
        }
        assertEquals(named, shipped);
    }
}
