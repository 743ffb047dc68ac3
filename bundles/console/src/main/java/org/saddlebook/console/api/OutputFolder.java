package org.saddlebook.console.api;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.saddlebook.api.problem.InputException;

/**
 * The folder that {@code --out} names. Everything is written into a folder beside it, which then takes its place: there is
 * never half a result. A folder is only replaced when each file in it was written by an earlier result; the list of them
 * is kept in {@value #LIST}.
 */
public final class OutputFolder {
    /** Names of the files of a result, one a line. */
    public static final String LIST = ".saddlebook-result";

    private final Path folder;

    private OutputFolder(Path folder) {
        this.folder = folder;
    }

    /** Files to write. */
    public static final class Content {
        private final Map<String, byte[]> files = new LinkedHashMap<>();

        /** Adds a file of the result. */
        public void add(String name, byte[] bytes) {
            if (files.putIfAbsent(name, bytes) != null) {
                throw new IllegalArgumentException("two files of the name " + name);
            }
        }

        /** Adds a source of the campaign, which keeps its own name. */
        public void addSource(String name, byte[] bytes) throws InputException {
            if (files.putIfAbsent(name, bytes) != null) {
                throw Options.wrong(
                        "name-taken",
                        "INPUT",
                        "a source file named " + name,
                        "a name that no file of the result has",
                        "Rename the source file.");
            }
        }
    }

    /**
     * Checks before anything is computed that the folder may be written.
     *
     * @throws InputException it holds files that no result wrote
     */
    public static OutputFolder at(Path folder) throws InputException, IOException {
        Path real = Files.exists(folder)
                ? folder.toRealPath()
                : folder.toAbsolutePath().normalize();
        if (Files.exists(real) && !Files.isDirectory(real)) {
            throw Options.wrong("not-a-folder", "--out", "the file " + folder, "a folder", "Choose another name.");
        }
        if (real.getParent() == null) {
            throw Options.wrong("not-a-folder", "--out", folder.toString(), "a folder of its own", "Name one.");
        }
        OutputFolder output = new OutputFolder(real);
        output.refuseForeign();
        return output;
    }

    /** Where the result is, for people. */
    public Path path() {
        return folder;
    }

    /** Writes everything, or nothing. */
    public void write(Content content) throws InputException, IOException {
        refuseForeign(); // somebody may have put something there meanwhile
        Path parent = Files.createDirectories(folder.getParent());
        Path fresh = Files.createTempDirectory(parent, ".saddlebook-");
        boolean placed = false;
        try {
            StringBuilder list = new StringBuilder();
            for (Map.Entry<String, byte[]> file : content.files.entrySet()) {
                Path target = fresh.resolve(file.getKey()).normalize();
                if (!target.startsWith(fresh)) {
                    throw new IOException("a file of the result would lie outside its folder: " + file.getKey());
                }
                Files.createDirectories(target.getParent());
                Files.write(target, file.getValue());
                list.append(file.getKey()).append('\n');
            }
            Files.writeString(fresh.resolve(LIST), list, StandardCharsets.UTF_8);
            openToOthers(fresh, parent);
            swap(fresh);
            placed = true;
        } finally {
            if (!placed) {
                delete(fresh);
            }
        }
    }

    private void swap(Path fresh) throws IOException {
        if (!Files.exists(folder)) {
            Files.move(fresh, folder);
            return;
        }
        Path old = fresh.resolveSibling(fresh.getFileName() + ".old");
        Files.move(folder, old);
        try {
            Files.move(fresh, folder);
        } catch (IOException e) {
            Files.move(old, folder);
            throw e;
        }
        delete(old);
    }

    /** Temporary folders are closed to others; the result gets the rights that a new folder would have had. */
    private static void openToOthers(Path fresh, Path parent) throws IOException {
        if (fresh.getFileSystem().supportedFileAttributeViews().contains("posix")) {
            Path probe = Files.createDirectory(parent.resolve(fresh.getFileName() + ".probe"));
            try {
                Files.setPosixFilePermissions(fresh, Files.getPosixFilePermissions(probe));
            } finally {
                Files.delete(probe);
            }
        }
    }

    private void refuseForeign() throws InputException, IOException {
        if (!Files.isDirectory(folder)) {
            return;
        }
        TreeSet<String> ours = new TreeSet<>();
        ours.add(LIST);
        Path list = folder.resolve(LIST);
        if (Files.isRegularFile(list)) {
            ours.addAll(Files.readAllLines(list, StandardCharsets.UTF_8));
        }
        try (Stream<Path> walk = Files.walk(folder)) {
            for (Path file : (Iterable<Path>) walk::iterator) {
                String name = folder.relativize(file).toString().replace('\\', '/');
                if (!Files.isDirectory(file) && !ours.contains(name)) {
                    throw Options.wrong(
                            "folder-in-use",
                            "--out",
                            "the folder " + folder + ", which holds " + name,
                            "a new folder, an empty one, or one with nothing but an earlier result",
                            "Choose another folder, or move " + name + " away.");
                }
            }
        }
    }

    private static void delete(Path folder) throws IOException {
        try (Stream<Path> walk = Files.walk(folder)) {
            for (Path path : (Iterable<Path>) walk.sorted((a, b) -> b.compareTo(a))::iterator) {
                Files.delete(path);
            }
        }
    }
}
