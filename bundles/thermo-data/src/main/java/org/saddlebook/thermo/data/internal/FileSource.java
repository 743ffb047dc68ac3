package org.saddlebook.thermo.data.internal;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.HexFormat;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.reaction.api.Species;
import org.saddlebook.thermo.data.api.BrokenSourceException;
import org.saddlebook.thermo.data.api.SpeciesData;
import org.saddlebook.thermo.data.api.SpeciesFiles;
import org.saddlebook.thermo.data.api.SpeciesSource;

/** A source over the contents of files. What comes from a file names it and its SHA-256, so that another content shows. */
public final class FileSource implements SpeciesSource {
    private static final int SHOWN = 16;

    private final String id;
    private final String title;
    private final Map<String, String> files;
    private List<SpeciesData> read;

    /** Files by name. */
    public FileSource(String id, String title, Map<String, String> files) {
        this.id = id;
        this.title = title;
        this.files = new TreeMap<>(files);
    }

    @Override
    public String id() {
        return id;
    }

    @Override
    public String title() {
        return title;
    }

    @Override
    public List<SpeciesData> find(Species species) {
        List<SpeciesData> found = new ArrayList<>();
        for (SpeciesData one : all()) {
            if (CuratedSource.matches(species, one.species())) {
                found.add(one);
            }
        }
        return found;
    }

    private synchronized List<SpeciesData> all() {
        if (read == null) {
            List<SpeciesData> all = new ArrayList<>();
            for (Map.Entry<String, String> file : files.entrySet()) {
                try {
                    all.addAll(SpeciesFiles.read(
                            file.getValue(), file.getKey(), file.getKey() + ", SHA-256 " + hash(file.getValue())));
                } catch (InputException wrong) {
                    throw new BrokenSourceException(message(wrong));
                }
            }
            read = List.copyOf(all);
        }
        return read;
    }

    private static String message(InputException wrong) {
        StringBuilder text = new StringBuilder();
        for (Problem one : wrong.problems()) {
            text.append(text.length() == 0 ? "" : " ").append(one.place().file());
            one.place().line().ifPresent(line -> text.append(", line ").append(line));
            one.place().column().ifPresent(column -> text.append(", column ").append(column));
            text.append(": found ")
                    .append(one.found())
                    .append(", expected ")
                    .append(one.expected())
                    .append(". ");
            text.append(one.remedy());
        }
        return text.toString();
    }

    private static String hash(String content) {
        try {
            byte[] digest = MessageDigest.getInstance("SHA-256").digest(content.getBytes(StandardCharsets.UTF_8));
            return HexFormat.of().formatHex(digest).substring(0, SHOWN);
        } catch (NoSuchAlgorithmException impossible) {
            throw new IllegalStateException("every Java platform has SHA-256", impossible);
        }
    }
}
