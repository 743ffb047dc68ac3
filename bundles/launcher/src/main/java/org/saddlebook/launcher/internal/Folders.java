package org.saddlebook.launcher.internal;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.FileAttribute;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.Locale;
import java.util.Map;

/**
 * Where a user's own things live, by the platform's custom.
 *
 * <p>Linux: XDG Base Directory Specification 0.8 (a relative path in a variable is ignored, as it says); macOS: the
 * folders of ~/Library; Windows: LOCALAPPDATA and APPDATA.
 *
 * @param data add-ons, register
 * @param cache what can be made again
 * @param config settings
 * @param policy the administrator's policy file, one for the machine
 */
record Folders(Path data, Path cache, Path config, Path policy) {
    /** The folders for this operating system name, environment and home folder. */
    static Folders of(String osName, Map<String, String> environment, String home) {
        String os = osName.toLowerCase(Locale.ROOT);
        if (os.startsWith("windows")) {
            Path local = absolute(environment.get("LOCALAPPDATA"), Path.of(home, "AppData", "Local"))
                    .resolve("Saddlebook");
            Path roaming = absolute(environment.get("APPDATA"), Path.of(home, "AppData", "Roaming"))
                    .resolve("Saddlebook");
            // Not from PROGRAMDATA: a user could point that variable at a policy of his own.
            return new Folders(
                    local.resolve("data"),
                    local.resolve("cache"),
                    roaming,
                    Path.of("C:\\ProgramData", "Saddlebook", "policy.json"));
        }
        if (os.startsWith("mac")) {
            Path library = Path.of(home, "Library");
            Path support = library.resolve("Application Support").resolve("Saddlebook");
            return new Folders(
                    support,
                    library.resolve("Caches").resolve("Saddlebook"),
                    support.resolve("settings"),
                    Path.of("/Library/Application Support/Saddlebook/policy.json"));
        }
        return new Folders(
                xdg(environment, "XDG_DATA_HOME", home, ".local/share"),
                xdg(environment, "XDG_CACHE_HOME", home, ".cache"),
                xdg(environment, "XDG_CONFIG_HOME", home, ".config"),
                Path.of("/etc/saddlebook/policy.json"));
    }

    /** The folder for user-added bundles. */
    Path userBundles() {
        return data.resolve("bundles");
    }

    /** Creates a folder that only its owner may enter; one that exists is left as it is. */
    static Path create(Path folder) throws IOException {
        if (!Files.isDirectory(folder)) {
            boolean posix = folder.getFileSystem().supportedFileAttributeViews().contains("posix");
            FileAttribute<?>[] attributes = posix
                    ? new FileAttribute<?>[] {
                        PosixFilePermissions.asFileAttribute(PosixFilePermissions.fromString("rwx------"))
                    }
                    : new FileAttribute<?>[0];
            Files.createDirectories(folder, attributes);
        }
        return folder;
    }

    private static Path xdg(Map<String, String> environment, String variable, String home, String fallback) {
        return absolute(environment.get(variable), Path.of(home, fallback)).resolve("saddlebook");
    }

    private static Path absolute(String value, Path fallback) {
        if (value == null || value.isEmpty() || !Path.of(value).isAbsolute()) {
            return fallback;
        }
        return Path.of(value);
    }
}
