package org.saddlebook.register.sqlite.internal;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import org.saddlebook.register.api.Digest;
import org.sqlite.SQLiteJDBCLoader;
import org.sqlite.util.LibraryLoaderUtil;
import org.sqlite.util.OSInfo;

/**
 * Unpacks the driver's native library once per version into the user's cache and points the driver at it. Left alone, the
 * driver unpacks it into the shared temporary folder at each start.
 */
final class NativeLibrary {
    private static final String LIB_PATH = "org.sqlite.lib.path";
    private static final String LIB_NAME = "org.sqlite.lib.name";
    private static final String UNPACK_FOLDER = "org.sqlite.tmpdir";

    private NativeLibrary() {}

    /** Prepares the library; what goes wrong is left to the driver, which then unpacks it for itself. */
    static synchronized void prepare(Path cache) {
        if (System.getProperty(LIB_PATH) != null || System.getProperty(UNPACK_FOLDER) != null) {
            return; // an administrator has decided, or it was done before
        }
        try {
            Path folder = Files.createDirectories(
                    cache.resolve("sqlite-" + SQLiteJDBCLoader.getVersion()).resolve(platform()));
            System.setProperty(UNPACK_FOLDER, folder.toString());
            Path library = unpacked(folder, LibraryLoaderUtil.getNativeLibName());
            if (library != null) {
                System.setProperty(LIB_PATH, folder.toString());
                System.setProperty(LIB_NAME, library.getFileName().toString());
            }
        } catch (IOException e) {
            // The driver falls back to the temporary folder, and says so itself when that fails too.
            return;
        }
    }

    private static String platform() {
        return OSInfo.getNativeLibFolderPathForCurrentOS().replace('/', '-').replace('\\', '-');
    }

    /** The library whose name holds the hash of its bytes; null when the driver has none for this machine. */
    private static Path unpacked(Path folder, String name) throws IOException {
        try (DirectoryStream<Path> files = Files.newDirectoryStream(folder, "*-" + name)) {
            for (Path file : files) {
                if (file.getFileName().toString().equals(hashed(Files.readAllBytes(file), name))) {
                    return file;
                }
            }
        }
        String resource = "/" + LibraryLoaderUtil.getNativeLibResourcePath() + "/" + name;
        try (InputStream in = SQLiteJDBCLoader.class.getResourceAsStream(
                resource.startsWith("//") ? resource.substring(1) : resource)) {
            if (in == null) {
                return null;
            }
            byte[] bytes = in.readAllBytes();
            Path library = folder.resolve(hashed(bytes, name));
            Path partial = Files.createTempFile(folder, "partial", ".tmp");
            Files.write(partial, bytes);
            Files.move(partial, library, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
            return library;
        }
    }

    private static String hashed(byte[] bytes, String name) {
        return Digest.sha256(bytes).hex().substring(0, 16) + "-" + name;
    }
}
