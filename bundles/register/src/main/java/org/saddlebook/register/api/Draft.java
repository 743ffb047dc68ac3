package org.saddlebook.register.api;

import java.util.HashSet;
import java.util.List;
import java.util.Objects;
import java.util.OptionalLong;
import java.util.Set;

/**
 * What somebody wants recorded; number, time and place in the tree are given when it is sealed. Grows by {@code with}
 * methods.
 */
public final class Draft {
    private final RecordKind kind;
    private final String actor;
    private final String title;
    private final String meaning;
    private final String reason;
    private final OptionalLong target;
    private final List<PartEntry> parts;

    private Draft(
            RecordKind kind,
            String actor,
            String title,
            String meaning,
            String reason,
            OptionalLong target,
            List<PartEntry> parts) {
        this.kind = Objects.requireNonNull(kind, "kind");
        this.actor = Objects.requireNonNull(actor, "actor");
        this.title = Objects.requireNonNull(title, "title");
        this.meaning = Objects.requireNonNull(meaning, "meaning");
        this.reason = Objects.requireNonNull(reason, "reason");
        this.target = Objects.requireNonNull(target, "target");
        this.parts = List.copyOf(parts);
        if (actor.isBlank()) {
            throw new IllegalArgumentException("a record names who acts");
        }
        if (kind.hasTarget() != target.isPresent()) {
            throw new IllegalArgumentException("a target does not fit the kind " + kind.key());
        }
        if (!kind.isEntry() && !parts.isEmpty()) {
            throw new IllegalArgumentException("parts do not fit the kind " + kind.key());
        }
        Set<String> names = new HashSet<>();
        for (PartEntry part : parts) {
            if (!names.add(part.name())) {
                throw new IllegalArgumentException("two parts named " + part.name());
            }
        }
    }

    /**
     * A new entry.
     *
     * @param actor who enters it
     * @param title what it is about, for lists
     */
    public static Draft entered(String actor, String title) {
        return new Draft(RecordKind.ENTERED, actor, title, "", "", OptionalLong.empty(), List.of());
    }

    /** A new entry that takes the place of entry {@code target}. */
    public static Draft superseding(String actor, String title, long target) {
        return new Draft(RecordKind.SUPERSEDED, actor, title, "", "", OptionalLong.of(target), List.of());
    }

    /** A review of entry {@code target}; the meaning says what the reviewer vouches for. */
    public static Draft reviewed(String actor, long target, String meaning) {
        return new Draft(RecordKind.REVIEWED, actor, "", meaning, "", OptionalLong.of(target), List.of());
    }

    /** The withdrawal of entry {@code target}, with its reason. */
    public static Draft withdrawn(String actor, long target, String reason) {
        return new Draft(RecordKind.WITHDRAWN, actor, "", "", reason, OptionalLong.of(target), List.of());
    }

    /** The same with what the actor's signature means, for example {@code authorship}. */
    public Draft withMeaning(String newMeaning) {
        return new Draft(kind, actor, title, newMeaning, reason, target, parts);
    }

    /** The same with why it is done. */
    public Draft withReason(String newReason) {
        return new Draft(kind, actor, title, meaning, newReason, target, parts);
    }

    /** The same with these parts; names are unique. */
    public Draft withParts(List<PartEntry> newParts) {
        return new Draft(kind, actor, title, meaning, reason, target, newParts);
    }

    /** What the record says. */
    public RecordKind kind() {
        return kind;
    }

    /** Who acts. */
    public String actor() {
        return actor;
    }

    /** What an entry is about; empty for records about other records. */
    public String title() {
        return title;
    }

    /** What the actor's signature means; empty when not stated. */
    public String meaning() {
        return meaning;
    }

    /** Why; empty when not stated. */
    public String reason() {
        return reason;
    }

    /** Number of the entry it is about; absent for a plain new entry. */
    public OptionalLong target() {
        return target;
    }

    /** Files of the entry. */
    public List<PartEntry> parts() {
        return parts;
    }
}
