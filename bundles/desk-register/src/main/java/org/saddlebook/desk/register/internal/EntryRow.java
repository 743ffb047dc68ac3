package org.saddlebook.desk.register.internal;

import java.util.Locale;
import java.util.Objects;
import java.util.Optional;
import org.saddlebook.register.api.Entry;

/**
 * An entry as it is listed.
 *
 * @param entry the entry
 * @param measured measured temperatures; absent when the entry has no findings on them
 * @param honest range of honest use; absent when the entry has none
 */
record EntryRow(Entry entry, Optional<Range> measured, Optional<Range> honest) {
    /**
     * A range of temperatures.
     *
     * @param low lower end, K
     * @param high upper end, K
     */
    record Range(double low, double high) {}

    EntryRow {
        Objects.requireNonNull(entry, "entry");
        Objects.requireNonNull(measured, "measured");
        Objects.requireNonNull(honest, "honest");
    }

    long number() {
        return entry.number();
    }

    /** Where it stands, in words: {@code holds}, {@code holds, reviewed by A}, {@code superseded}, {@code withdrawn}. */
    String standing() {
        StringBuilder text = new StringBuilder(
                switch (entry.status()) {
                    case CURRENT -> "holds";
                    case SUPERSEDED -> "superseded";
                    case WITHDRAWN -> "withdrawn";
                });
        for (org.saddlebook.register.api.LogRecord later : entry.about()) {
            if (later.kind() == org.saddlebook.register.api.RecordKind.REVIEWED) {
                text.append(", reviewed by ").append(later.actor());
            }
        }
        return text.toString();
    }

    /** Time of entry, to the minute: {@code 2026-03-02 09:12 UTC}. */
    String time() {
        String iso = entry.record().time().toString();
        return iso.length() >= 16 ? iso.substring(0, 10) + " " + iso.substring(11, 16) + " UTC" : iso;
    }

    /** Whether every word of a search occurs in what is listed. */
    boolean matches(String search) {
        String all = (number() + " " + entry.record().title() + " "
                        + entry.record().actor() + " " + standing() + " " + time())
                .toLowerCase(Locale.ROOT);
        for (String word : search.toLowerCase(Locale.ROOT).split(" ", -1)) {
            if (!all.contains(word)) {
                return false;
            }
        }
        return true;
    }
}
