package org.saddlebook.console.internal;

import java.io.IOException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.TreeMap;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.console.api.ExitCode;
import org.saddlebook.console.api.Invocation;
import org.saddlebook.json.api.NearSpelling;

/** The folder of a user's own bundles. */
final class AddedBundles {
    private final Path folder;

    AddedBundles(Path dataFolder) {
        this.folder = dataFolder.resolve("bundles");
    }

    /** Puts a bundle in, in one step, and takes older files of the same symbolic name out. */
    Path put(BundleFile file, byte[] bytes) throws IOException {
        Files.createDirectories(folder);
        Path target = folder.resolve(file.symbolicName() + "-" + file.version() + ".jar");
        Path fresh = Files.createTempFile(folder, ".adding-", ".tmp");
        try {
            Files.write(fresh, bytes);
            Files.move(fresh, target, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
        } finally {
            Files.deleteIfExists(fresh);
        }
        for (Path older : named(file.symbolicName())) {
            if (!older.equals(target)) {
                Files.delete(older);
            }
        }
        return target;
    }

    /** The folder. */
    Path folder() {
        return folder;
    }

    /** The files with this symbolic name. */
    List<Path> named(String symbolicName) throws IOException {
        List<Path> found = new ArrayList<>();
        for (Path file : files()) {
            Optional<BundleFile> bundle = BundleFile.of(Files.readAllBytes(file));
            if (bundle.isPresent() && bundle.get().symbolicName().equals(symbolicName)) {
                found.add(file);
            }
        }
        return found;
    }

    /** {@code bundles remove}. */
    int remove(String name, Invocation invocation) throws IOException, InputException {
        List<Path> found = named(name);
        TreeMap<String, Path> known = new TreeMap<>();
        for (Path file : files()) {
            // A file that is no bundle at all goes by its file name.
            String own = BundleFile.of(Files.readAllBytes(file))
                    .map(BundleFile::symbolicName)
                    .orElse(file.getFileName().toString());
            known.put(own, file);
            if (found.isEmpty() && file.getFileName().toString().equals(name)) {
                found.add(file);
            }
        }
        if (found.isEmpty()) {
            invocation
                    .err()
                    .println("saddlebook: there is no added bundle " + name + ". "
                            + NearSpelling.of(name, known.keySet())
                                    .map(near -> "Did you mean " + near + "?")
                                    .orElse(
                                            known.isEmpty()
                                                    ? "No bundle was added."
                                                    : "Added are: " + String.join(", ", known.keySet()) + "."));
            return ExitCode.REFUSED;
        }
        for (Path file : found) {
            Files.delete(file);
            invocation.out().println("Removed " + name + " (" + file.getFileName() + ").");
        }
        return ExitCode.DONE;
    }

    private List<Path> files() throws IOException {
        List<Path> files = new ArrayList<>();
        if (Files.isDirectory(folder)) {
            try (DirectoryStream<Path> stream = Files.newDirectoryStream(folder, "*.jar")) {
                stream.forEach(files::add);
            }
        }
        return files;
    }
}
