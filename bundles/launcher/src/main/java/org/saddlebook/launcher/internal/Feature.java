package org.saddlebook.launcher.internal;

import java.util.List;

/**
 * A named set of bundles.
 *
 * @param file name of the feature file
 * @param id its coordinates
 * @param name name for people; empty when the file has none
 * @param bundles its bundles in order of the file
 */
record Feature(String file, Coordinates id, String name, List<Coordinates> bundles) {
    Feature {
        bundles = List.copyOf(bundles);
    }

    /** The short name: the file's name without its ending, as administrators write it. */
    String shortName() {
        return file.endsWith(".json") ? file.substring(0, file.length() - ".json".length()) : file;
    }
}
