package org.saddlebook.launcher.internal;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;

/**
 * Reads OSGi Feature files (OSGi Compendium 8, chapter 159). What this launcher cannot honour (configurations, variables,
 * mandatory extensions) is refused rather than skipped: a feature must never be half there without a word.
 */
final class FeatureReader {
    /** Extension of kind text: the verbs that need the feature. */
    private static final String VERBS = "saddlebook-verbs";

    private final List<String> verbs = new ArrayList<>();

    private final List<Coordinates> bundles = new ArrayList<>();
    private Coordinates id;
    private String name = "";

    private FeatureReader() {}

    /** Reads one feature file; {@code file} is its name for messages. */
    static Feature read(String file, byte[] bytes) throws Refused {
        FeatureReader reader = new FeatureReader();
        StrictJson.readObject(file, bytes, json -> json.members("a feature", key -> reader.member(json, key)));
        if (reader.id == null) {
            throw Refused.at(
                    file,
                    "no \"id\"",
                    "an id such as org.saddlebook:org.saddlebook.features.base:0.1.0",
                    "Add the id or restore the file from the installation archive.");
        }
        return new Feature(file, reader.id, reader.name, reader.bundles, reader.verbs);
    }

    private void member(StrictJson json, String key) throws IOException, Refused {
        switch (key) {
            case "feature-resource-version" -> {
                String version = json.text(key);
                if (!version.equals("1.0")) {
                    throw json.refused(
                            "feature-resource-version " + version,
                            "1.0",
                            "The file was written for another version; restore the one of this product.");
                }
            }
            case "id" -> id = coordinates(json, json.text(key));
            case "name" -> name = json.text(key);
            case "description", "docURL", "license", "SCM", "vendor", "categories", "complete" -> json.skip();
            case "bundles" -> json.items(key, this::bundle);
            case "variables", "configurations" -> {
                if (!json.skipEmpty()) {
                    throw json.refused(
                            "\"" + key + "\" with content",
                            "none; this launcher does not apply them",
                            "Remove them from the file.");
                }
            }
            case "extensions" -> json.members(key, extension -> extension(json, extension));
            default ->
                throw json.refused(
                        "the key \"" + key + "\"", "a key of OSGi Feature files", "Correct its spelling or remove it.");
        }
    }

    private void bundle(StrictJson json) throws IOException, Refused {
        if (json.atText()) {
            bundles.add(coordinates(json, json.text("a bundle")));
            return;
        }
        String[] found = {null};
        json.members("a bundle", key -> {
            if (key.equals("id")) {
                found[0] = json.text("the bundle's id");
            } else {
                json.skip(); // metadata for other tools
            }
        });
        if (found[0] == null) {
            throw json.refused("a bundle without \"id\"", "its coordinates", "Add group:artifact:version.");
        }
        bundles.add(coordinates(json, found[0]));
    }

    private void extension(StrictJson json, String extension) throws IOException, Refused {
        boolean[] mandatory = {false}; // an extension without a kind is optional
        json.members("an extension", key -> {
            if (key.equals("kind")) {
                mandatory[0] = json.text("the extension's kind").equals("mandatory");
            } else if (extension.equals(VERBS) && key.equals("text")) {
                verbs.addAll(json.texts("the verbs"));
            } else {
                json.skip();
            }
        });
        if (mandatory[0]) {
            throw json.refused(
                    "the mandatory extension \"" + extension + "\"",
                    "optional or transient ones only",
                    "This product does not know it; install the feature elsewhere.");
        }
    }

    private static Coordinates coordinates(StrictJson json, String text) throws Refused {
        Coordinates coordinates = Coordinates.parse(text);
        if (coordinates == null) {
            throw json.refused("\"" + text + "\"", "group:artifact:version", "Correct the coordinates.");
        }
        return coordinates;
    }
}
