package org.saddlebook.desk.api;

import java.util.Objects;
import java.util.function.UnaryOperator;
import org.saddlebook.api.campaign.Campaign;

/**
 * A change of the campaign that can be undone. The desk adds it to the campaign's history with who and when, and evaluates
 * again in the background.
 *
 * @param what what is changed, as it stands in history and in "undo", for example {@code run at 65 °C excluded}
 * @param oldValue value before; empty when there was none
 * @param newValue value after; empty when there is none
 * @param reason why; empty when none was asked for
 * @param edit the change: a pure function without the history entry
 */
public record Change(String what, String oldValue, String newValue, String reason, UnaryOperator<Campaign> edit) {
    /** Checks the components. */
    public Change {
        Objects.requireNonNull(what, "what");
        Objects.requireNonNull(oldValue, "oldValue");
        Objects.requireNonNull(newValue, "newValue");
        Objects.requireNonNull(reason, "reason");
        Objects.requireNonNull(edit, "edit");
    }

    /** A change without values and reason. */
    public static Change of(String what, UnaryOperator<Campaign> edit) {
        return new Change(what, "", "", "", edit);
    }
}
