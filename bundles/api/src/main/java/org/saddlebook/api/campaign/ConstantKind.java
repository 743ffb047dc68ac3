package org.saddlebook.api.campaign;

/** What the rate constant stands for; decides whether an entropy of activation may be read. {@code key} is the word in files. */
public enum ConstantKind {
    /** Nothing was said. */
    UNSTATED("unstated"),
    /** An elementary step. */
    ELEMENTARY("elementary"),
    /** Measured with other reactants in excess: their concentrations are inside the constant. */
    PSEUDO_ORDER("pseudo-order"),
    /** A combination of several constants. */
    LUMPED("lumped");

    private final String key;

    ConstantKind(String key) {
        this.key = key;
    }

    /** The word used in files. */
    public String key() {
        return key;
    }

    /** The kind with this word; throws {@link IllegalArgumentException} for an unknown one. */
    public static ConstantKind of(String key) {
        for (ConstantKind kind : values()) {
            if (kind.key.equals(key)) {
                return kind;
            }
        }
        throw new IllegalArgumentException("unknown kind of rate constant: " + key);
    }
}
