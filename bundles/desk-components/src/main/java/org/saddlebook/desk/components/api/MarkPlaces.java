package org.saddlebook.desk.components.api;

import java.util.HashSet;
import java.util.Set;

/**
 * Where marks of one kind have been drawn. Marks at the same half point cover each other, so that a table of 20,000 rows
 * needs no more of them than a strip is wide; drawing each would hold the window up.
 */
public final class MarkPlaces {
    private final Set<Long> taken = new HashSet<>();

    /** Starts with every place free. */
    public MarkPlaces() {}

    /** Takes the place of a mark at this point, in points; false when a mark is there already. */
    public boolean take(double x, double y) {
        return taken.add(Math.round(2 * x) * 1_000_003L + Math.round(2 * y));
    }
}
