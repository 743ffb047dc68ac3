package org.saddlebook.distribution;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.jar.Attributes;
import java.util.jar.JarFile;
import org.junit.jupiter.api.Test;

/** What bundles see of each other, from the manifests that the framework goes by. */
class LayeringTest {
    private static final String OURS = "org.saddlebook.";

    /** Bundle name to the packages of ours that it imports from others. */
    private static Map<String, Set<String>> imports() throws IOException {
        Map<String, Set<String>> all = new TreeMap<>();
        for (Map.Entry<String, Attributes> bundle : manifests().entrySet()) {
            Set<String> imported = new TreeSet<>(packages(bundle.getValue().getValue("Import-Package")));
            imported.removeAll(packages(bundle.getValue().getValue("Export-Package")));
            all.put(bundle.getKey(), imported);
        }
        return all;
    }

    private static Map<String, Attributes> manifests() throws IOException {
        Map<String, Attributes> manifests = new TreeMap<>();
        try (DirectoryStream<Path> jars =
                Files.newDirectoryStream(InstalledProduct.ASSEMBLED.resolve("bundles"), OURS + "*.jar")) {
            for (Path jar : jars) {
                try (JarFile file = new JarFile(jar.toFile())) {
                    Attributes main = file.getManifest().getMainAttributes();
                    manifests.put(main.getValue("Bundle-SymbolicName"), main);
                }
            }
        }
        assertTrue(manifests.size() > 15, "bundles are missing: " + manifests.keySet());
        return manifests;
    }

    /** Package names of a manifest header, without attributes and directives. */
    private static List<String> packages(String header) {
        List<String> names = new ArrayList<>();
        if (header != null) {
            StringBuilder clause = new StringBuilder();
            boolean quoted = false;
            for (char c : (header + ",").toCharArray()) {
                if (c == '"') {
                    quoted = !quoted;
                }
                if (c == ',' && !quoted) {
                    String text = clause.toString();
                    int end = text.indexOf(';');
                    names.add((end < 0 ? text : text.substring(0, end)).strip());
                    clause.setLength(0);
                } else {
                    clause.append(c);
                }
            }
        }
        return names;
    }

    @Test
    void noBundleExportsOrImportsInternals() throws IOException {
        for (Map.Entry<String, Attributes> bundle : manifests().entrySet()) {
            for (String header : new String[] {"Export-Package", "Import-Package"}) {
                for (String name : packages(bundle.getValue().getValue(header))) {
                    assertFalse(
                            name.startsWith(OURS) && name.contains(".internal"),
                            () -> bundle.getKey() + " " + header + " " + name);
                }
            }
        }
    }

    @Test
    void theApiDependsOnTheJdkAlone() throws IOException {
        // Annotations of OSGi have class retention: they leave no import behind.
        assertEquals(Set.of(), imports().get("org.saddlebook.api"));
    }

    @Test
    void theConsoleImportsNoCapability() throws IOException {
        Set<String> imported = imports().get("org.saddlebook.console");
        for (String name : imported) {
            assertTrue(
                    name.startsWith("org.saddlebook.api.")
                            || name.startsWith("org.saddlebook.json.")
                            || name.startsWith("org.saddlebook.units.")
                            || name.startsWith("org.saddlebook.presentation.")
                            || name.startsWith("org.osgi."),
                    name);
        }
    }

    @Test
    void theRegisterImportsNeitherReportNorEvaluation() throws IOException {
        for (String bundle : new String[] {"org.saddlebook.register", "org.saddlebook.register-sqlite"}) {
            for (String name : imports().get(bundle)) {
                assertFalse(
                        name.startsWith("org.saddlebook.report")
                                || name.startsWith("org.saddlebook.evaluation")
                                || name.startsWith("org.saddlebook.barrier"),
                        () -> bundle + " imports " + name);
            }
        }
    }

    @Test
    void rateModelsUseThePublicApiAlone() throws IOException {
        imports().forEach((bundle, imported) -> {
            if (bundle.startsWith("org.saddlebook.model-")) {
                for (String name : imported) {
                    assertTrue(name.startsWith("org.saddlebook.api."), bundle + " imports " + name);
                }
            }
        });
    }

    @Test
    void onlyFiguresAndTheDeskTouchTheWindowToolkit() throws IOException {
        try (DirectoryStream<Path> jars =
                Files.newDirectoryStream(InstalledProduct.ASSEMBLED.resolve("bundles"), OURS + "*.jar")) {
            for (Path jar : jars) {
                String name = jar.getFileName().toString();
                if (name.startsWith("org.saddlebook.charts-")
                        || name.startsWith("org.saddlebook.desk-")
                        || name.startsWith("org.saddlebook.lib-")) {
                    continue;
                }
                try (JarFile file = new JarFile(jar.toFile())) {
                    for (var entry : file.stream()
                            .filter(each -> each.getName().endsWith(".class"))
                            .toList()) {
                        // Class names stand in a class file's constants as plain text.
                        String constants = new String(
                                file.getInputStream(entry).readAllBytes(),
                                java.nio.charset.StandardCharsets.ISO_8859_1);
                        assertFalse(
                                constants.contains("java/awt/") || constants.contains("javax/swing/"),
                                () -> name + ": " + entry.getName());
                    }
                }
            }
        }
    }

    @Test
    void noFeatureButTheDeskBringsABundleOfTheDesk() throws IOException {
        int others = 0;
        try (DirectoryStream<Path> features =
                Files.newDirectoryStream(InstalledProduct.ASSEMBLED.resolve("features"), "*.json")) {
            for (Path feature : features) {
                String name = feature.getFileName().toString();
                if (!name.startsWith("desk")) {
                    others++;
                    String text = Files.readString(feature);
                    assertFalse(
                            text.contains("org.saddlebook.desk")
                                    || text.contains("flatlaf")
                                    || text.contains("miglayout"),
                            name);
                }
            }
        }
        assertTrue(others > 5, "features are missing");
    }
}
