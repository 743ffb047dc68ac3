package org.saddlebook.desk.api;

import java.util.List;
import java.util.Objects;
import java.util.Optional;
import javax.swing.KeyStroke;

/** Something a user can do or mend: a line of the command search, a gap, a button. Immutable; grows by {@code with} methods. */
public final class DeskAction {
    private final String title;
    private final Runnable work;
    private final List<String> words;
    private final Optional<KeyStroke> key;
    private final Optional<String> obstacle;

    private DeskAction(
            String title, Runnable work, List<String> words, Optional<KeyStroke> key, Optional<String> obstacle) {
        this.title = Objects.requireNonNull(title, "title");
        this.work = Objects.requireNonNull(work, "work");
        this.words = List.copyOf(words);
        this.key = Objects.requireNonNull(key, "key");
        this.obstacle = Objects.requireNonNull(obstacle, "obstacle");
    }

    /**
     * An action.
     *
     * @param title what it does, in the imperative, for example {@code Exclude a run}; for a gap what is missing
     * @param work does it, on the event thread
     */
    public static DeskAction of(String title, Runnable work) {
        return new DeskAction(title, work, List.of(), Optional.empty(), Optional.empty());
    }

    /** The same, found by these other words too. */
    public DeskAction withWords(String... others) {
        return new DeskAction(title, work, List.of(others), key, obstacle);
    }

    /** The same with a key that works everywhere in the desk. */
    public DeskAction withKey(KeyStroke stroke) {
        return new DeskAction(title, work, words, Optional.of(stroke), obstacle);
    }

    /** The same, not possible now, with the reason as a sentence. */
    public DeskAction notNow(String reason) {
        return new DeskAction(title, work, words, key, Optional.of(reason));
    }

    /** What it does. */
    public String title() {
        return title;
    }

    /** Other words it is found by. */
    public List<String> words() {
        return words;
    }

    /** Its key; empty for none. */
    public Optional<KeyStroke> key() {
        return key;
    }

    /** Why it is not possible now; empty when it is. */
    public Optional<String> obstacle() {
        return obstacle;
    }

    /** Does it, on the event thread. */
    public void run() {
        work.run();
    }
}
