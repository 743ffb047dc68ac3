package org.saddlebook.desk.api;

import java.util.List;
import java.util.Optional;
import javax.swing.JComponent;
import org.osgi.annotation.versioning.ConsumerType;

/**
 * One stratum for one campaign. Folded it is a strip that keeps its marks and one sentence; open it is a body.
 *
 * <p>Every method runs on the event thread and returns within some milliseconds, except {@link #read}. Work goes through
 * {@link DeskContext#run}. A panel that throws is replaced by its failure; one that keeps the event thread is stopped where
 * that is possible, and named.
 */
@ConsumerType
public interface DeskPanel {
    /** Name of the stratum, one or two words. */
    String title();

    /**
     * The marks shown while the stratum is folded, laid out to the right of title and sentence and as high as it prefers
     * (the desk gives 36 to 120 points). Positions of temperatures come from {@link DeskContext#scale}. Always the same
     * component; not focusable as a whole, and without controls. A strip without marks is made invisible, so that the
     * sentence has its room.
     */
    JComponent strip();

    /**
     * What is shown while the stratum is open, from the left edge of the strata to the right one, below the title.
     * Always the same component; made when first asked for. Every control in it has an accessible name and is reached
     * with the keyboard. Scroll bars are the panel's own affair: the body gets the room that is left, at least 260 points.
     */
    JComponent body();

    /** Shows a state; called once before anything else is asked for, and again after every change. */
    void show(DeskState state);

    /** One sentence for the strip, about the last state shown; how to fill the stratum when it is empty. */
    String sentence();

    /** Numbers of the last state shown that belong into the running account, each a short line such as {@code Ea 84.1 ± 1.4 kJ/mol}. */
    default List<String> account() {
        return List.of();
    }

    /** What is still open before the result can be signed, about the last state shown. */
    default List<DeskAction> gaps() {
        return List.of();
    }

    /** Everything it can do, for the command search; asked anew each time the search is opened. */
    default List<DeskAction> actions() {
        return List.of();
    }

    /** The step that ends the walk, shown as the button at the foot of the account; the lowest stratum that has one wins. */
    default Optional<DeskAction> lastStep() {
        return Optional.empty();
    }

    /**
     * What the hairline reads, for the plate beside it. Called on a thread of the background, for the newest position
     * only; so it uses nothing but its arguments and services.
     *
     * @param state a state that was shown
     * @param kelvin position of the hairline, K
     */
    default List<Reading> read(DeskState state, double kelvin) {
        return List.of();
    }

    /** The panel is no longer shown and is asked for nothing more: let go of timers, listeners and services. */
    default void close() {}
}
