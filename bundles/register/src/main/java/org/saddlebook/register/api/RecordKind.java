package org.saddlebook.register.api;

/** What a record says; {@code key} is the word in the log. */
public enum RecordKind {
    /** Its parts are a new entry. */
    ENTERED("entered"),
    /** Somebody reviewed the entry {@code target}. */
    REVIEWED("reviewed"),
    /** The entry {@code target} is superseded by this record, whose parts are the new entry. */
    SUPERSEDED("superseded"),
    /** The entry {@code target} is withdrawn. */
    WITHDRAWN("withdrawn");

    private final String key;

    RecordKind(String key) {
        this.key = key;
    }

    /** The word in the log. */
    public String key() {
        return key;
    }

    /** Whether a record of this kind names an earlier entry. */
    public boolean hasTarget() {
        return this != ENTERED;
    }

    /** Whether a record of this kind is itself an entry, with parts. */
    public boolean isEntry() {
        return this == ENTERED || this == SUPERSEDED;
    }

    /** The kind with this word; throws {@link IllegalArgumentException} for an unknown one. */
    public static RecordKind of(String key) {
        for (RecordKind kind : values()) {
            if (kind.key.equals(key)) {
                return kind;
            }
        }
        throw new IllegalArgumentException("unknown kind of record: " + key);
    }
}
