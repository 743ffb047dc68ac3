package org.saddlebook.launcher.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.core.JsonFactory;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;
import java.util.jar.JarFile;
import org.junit.jupiter.api.Test;

class SettingsTest {
    private static final Plan NOTHING = new Plan(List.of(), List.of(), List.of("base"), List.of(), Map.of(), "key");

    @Test
    void everyPackageOfTheSharedParserIsExported() throws Exception {
        Path jar = Path.of(JsonFactory.class
                .getProtectionDomain()
                .getCodeSource()
                .getLocation()
                .toURI());
        String stated;
        try (JarFile file = new JarFile(jar.toFile())) {
            stated = file.getManifest().getMainAttributes().getValue("Export-Package");
        }
        TreeSet<String> expected = new TreeSet<>();
        for (String word : stated.split("[;,]", -1)) {
            if (word.startsWith("com.fasterxml.jackson.core")) {
                expected.add(word.replace("\"", "")); // also inside a list of used packages
            }
        }
        TreeSet<String> exported = new TreeSet<>();
        String extra = Settings.of(
                        Path.of("s"), Path.of("h"), Folders.of("Linux", Map.of(), "/home/a"), NOTHING, Policy.OPEN)
                .get("org.osgi.framework.system.packages.extra");
        for (String word : extra.split("[;,]", -1)) {
            if (word.startsWith("com.fasterxml.jackson.core")) {
                exported.add(word);
            }
        }
        assertEquals(expected, exported);
        assertTrue(
                extra.contains(
                        "version=" + new JsonFactory().version().toString().replace("/", "")),
                extra);
    }

    @Test
    void theSystemBundleExportsThePlatform() {
        List<String> packages = List.of(Settings.systemPackages().split(",", -1));
        assertTrue(packages.containsAll(
                List.of("java.lang", "java.util.random", "javax.swing", "org.w3c.dom", "sun.misc")));
        assertFalse(packages.contains("jdk.internal.misc"));
    }
}
