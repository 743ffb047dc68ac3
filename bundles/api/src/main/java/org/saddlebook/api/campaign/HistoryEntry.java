package org.saddlebook.api.campaign;

import java.time.Instant;
import java.util.Objects;

/**
 * One change of a campaign.
 *
 * @param who who made it
 * @param when when, from the injected clock
 * @param what what was changed, for example {@code imported} or {@code point 3 excluded}
 * @param oldValue value before; empty when there was none
 * @param newValue value after; empty when there is none
 * @param reason why; empty when none was asked for
 */
public record HistoryEntry(String who, Instant when, String what, String oldValue, String newValue, String reason) {
    /** Checks the components. */
    public HistoryEntry {
        Objects.requireNonNull(who, "who");
        Objects.requireNonNull(when, "when");
        Objects.requireNonNull(what, "what");
        Objects.requireNonNull(oldValue, "oldValue");
        Objects.requireNonNull(newValue, "newValue");
        Objects.requireNonNull(reason, "reason");
    }
}
