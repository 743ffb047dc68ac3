package org.saddlebook.thermo.data.internal;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.reaction.api.Species;
import org.saddlebook.thermo.data.api.BrokenSourceException;
import org.saddlebook.thermo.data.api.SpeciesData;
import org.saddlebook.thermo.data.api.SpeciesSource;

/**
 * A laboratory's own species files: every file of the folder that the environment variable {@code SADDLEBOOK_SPECIES} names.
 * Without it there is nothing, and nothing is looked for.
 */
@Component
public final class FolderSource implements SpeciesSource {
    private static final String VARIABLE = "SADDLEBOOK_SPECIES";
    private static final long LARGEST = 10_000_000;

    private final String folder;
    private FileSource files;

    /** The folder of the environment. */
    @Activate
    public FolderSource() {
        this(System.getenv(VARIABLE));
    }

    /** This folder; null for none. */
    FolderSource(String folder) {
        this.folder = folder;
    }

    @Override
    public String id() {
        return "laboratory";
    }

    @Override
    public String title() {
        return "The laboratory's own species files";
    }

    @Override
    public List<SpeciesData> find(Species species) {
        return folder == null || folder.isBlank() ? List.of() : files().find(species);
    }

    private synchronized FileSource files() {
        if (files == null) {
            Map<String, String> contents = new TreeMap<>();
            try (DirectoryStream<Path> entries = Files.newDirectoryStream(Path.of(folder))) {
                for (Path entry : entries) {
                    if (Files.isRegularFile(entry)
                            && !entry.getFileName().toString().startsWith(".")) {
                        contents.put(entry.getFileName().toString(), content(entry));
                    }
                }
            } catch (IOException unreadable) {
                throw new BrokenSourceException("The folder of species files that " + VARIABLE
                        + " names cannot be read. Check that it exists and may be read: " + folder + ".");
            }
            files = new FileSource(id(), title(), contents);
        }
        return files;
    }

    private static String content(Path file) throws IOException {
        if (Files.size(file) > LARGEST) {
            throw new BrokenSourceException(
                    file.getFileName() + " is larger than 10 MB; species files are small text files.");
        }
        return new String(Files.readAllBytes(file), StandardCharsets.UTF_8);
    }
}
