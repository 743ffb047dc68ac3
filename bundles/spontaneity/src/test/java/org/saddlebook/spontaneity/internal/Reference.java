package org.saddlebook.spontaneity.internal;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;

/** Rows of a reference file, without comments and header. */
final class Reference {
    private Reference() {}

    static List<List<String>> rows(String file) throws IOException {
        try (InputStream stream = Reference.class.getResourceAsStream("/reference/" + file)) {
            return new String(stream.readAllBytes(), StandardCharsets.UTF_8)
                    .lines()
                    .filter(line -> !line.startsWith("#"))
                    .skip(1)
                    .map(line -> List.of(line.split(",", -1)))
                    .toList();
        }
    }
}
