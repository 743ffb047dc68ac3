package org.saddlebook.launcher.internal;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.UnaryOperator;

/**
 * SHA-256 of the product's bundles by location, kept in the slot of a cache. The slot's key holds size and time of every
 * jar, so what is kept is what the files hold as long as nobody changes one and sets its time back; {@code bundles check}
 * reads the files themselves. Findings name these hashes, and computing them at each start would take a tenth of it.
 */
final class KnownHashes implements UnaryOperator<String> {
    private final Path file;
    private Map<String, String> hashes;

    /**
     * The hashes of a slot.
     *
     * @param file where they are kept
     */
    KnownHashes(Path file) {
        this.file = file;
    }

    /** The location that a bundle of the product is installed under. */
    static String location(Path jar) {
        return "reference:" + jar.toUri();
    }

    /** Computes and keeps the hashes of these jars. */
    void keep(List<Path> jars) throws IOException {
        StringBuilder lines = new StringBuilder();
        for (Path jar : jars) {
            lines.append(Digests.sha256(Files.readAllBytes(jar)));
            lines.append(' ').append(location(jar)).append('\n');
        }
        Files.writeString(file, lines, StandardCharsets.UTF_8);
    }

    /** The hash of the bundle at a location; empty when it is not kept. */
    @Override
    public synchronized String apply(String location) {
        if (hashes == null) {
            hashes = read();
        }
        return hashes.getOrDefault(location, "");
    }

    private Map<String, String> read() {
        Map<String, String> all = new HashMap<>();
        try {
            for (String line : Files.readAllLines(file, StandardCharsets.UTF_8)) {
                int gap = line.indexOf(' ');
                if (gap == 64) {
                    all.put(line.substring(gap + 1), line.substring(0, gap));
                }
            }
        } catch (IOException e) {
            return Map.of(); // whoever asks computes them
        }
        return all;
    }
}
