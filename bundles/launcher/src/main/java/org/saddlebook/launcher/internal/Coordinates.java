package org.saddlebook.launcher.internal;

/**
 * Maven coordinates of a bundle as a feature file writes them.
 *
 * @param group group id
 * @param artifact artifact id
 * @param version version
 */
record Coordinates(String group, String artifact, String version) {
    /** Reads {@code group:artifact:version}; null when the text is not of that form or could leave the bundles folder. */
    static Coordinates parse(String text) {
        String[] parts = text.split(":", -1);
        if (parts.length != 3) {
            return null;
        }
        for (String part : parts) {
            if (!plain(part)) {
                return null;
            }
        }
        return new Coordinates(parts[0], parts[1], parts[2]);
    }

    /** Name of the bundle's file in the product's bundles folder. */
    String fileName() {
        return artifact + "-" + version + ".jar";
    }

    @Override
    public String toString() {
        return group + ":" + artifact + ":" + version;
    }

    private static boolean plain(String part) {
        if (part.isEmpty() || part.charAt(0) == '.') {
            return false;
        }
        for (int i = 0; i < part.length(); i++) {
            char c = part.charAt(i);
            boolean letterOrDigit = (c >= 'a' && c <= 'z') || (c >= 'A' && c <= 'Z') || (c >= '0' && c <= '9');
            if (!letterOrDigit && c != '.' && c != '-' && c != '_') {
                return false;
            }
        }
        return true;
    }
}
