package org.saddlebook.api.reader;

import java.util.List;
import java.util.Objects;
import java.util.Optional;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.problem.Place;

/**
 * What a reader found in a file.
 *
 * @param rateTable the rate table; absent when the file holds directives only
 * @param directives statements about the campaign that stand in the file, such as {@code standard state: 1 bar}
 * @param understood sentences that say how the file was read: separator, decimal sign, encoding, units
 */
public record Imported(Optional<RateTable> rateTable, List<Directive> directives, List<String> understood) {
    /**
     * One statement {@code key: value}; whoever opens the campaign gives it its meaning.
     *
     * @param key lower case, single spaces
     * @param value trimmed text
     * @param place where it stands
     */
    public record Directive(String key, String value, Place place) {
        /** Checks the components. */
        public Directive {
            Objects.requireNonNull(key, "key");
            Objects.requireNonNull(value, "value");
            Objects.requireNonNull(place, "place");
        }
    }

    /** Copies the lists. */
    public Imported {
        Objects.requireNonNull(rateTable, "rateTable");
        directives = List.copyOf(directives);
        understood = List.copyOf(understood);
    }
}
