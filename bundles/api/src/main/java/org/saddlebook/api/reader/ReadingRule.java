package org.saddlebook.api.reader;

import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/**
 * How a file's layout is understood, saved and used again. Keys belong to the reader, for example {@code separator} or
 * {@code unit.T}.
 *
 * @param options option to value, sorted
 */
public record ReadingRule(Map<String, String> options) {
    /** Nothing prescribed: the reader works it out and refuses what is ambiguous. */
    public static final ReadingRule AUTOMATIC = new ReadingRule(Map.of());

    /** Copies the options. */
    public ReadingRule {
        options = Map.copyOf(new TreeMap<>(options));
    }

    /** The value of an option. */
    public Optional<String> get(String key) {
        return Optional.ofNullable(options.get(key));
    }
}
