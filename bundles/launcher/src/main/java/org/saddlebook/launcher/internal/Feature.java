package org.saddlebook.launcher.internal;

import java.util.List;

/**
 * A named set of bundles.
 *
 * @param file name of the feature file
 * @param id its coordinates
 * @param name name for people; empty when the file has none
 * @param bundles its bundles in order of the file
 * @param verbs verbs of the command line that need it; empty when every one may
 */
record Feature(String file, Coordinates id, String name, List<Coordinates> bundles, List<String> verbs) {
    Feature {
        bundles = List.copyOf(bundles);
        verbs = List.copyOf(verbs);
    }

    /**
     * Whether a command needs it. Windows are of no use to a command that prints numbers, and resolving their bundles would
     * take a tenth of its time.
     *
     * @param verb first word of the command; empty for none
     */
    boolean neededBy(String verb) {
        return verbs.isEmpty() || verb.isEmpty() || verb.startsWith("-") || verbs.contains(verb);
    }

    /** The short name: the file's name without its ending, as administrators write it. */
    String shortName() {
        return file.endsWith(".json") ? file.substring(0, file.length() - ".json".length()) : file;
    }
}
