package org.saddlebook.api.model;

/** A model does not apply in this context; the message is a sentence for the user. */
public final class Inapplicable extends Exception {
    private static final long serialVersionUID = 1L;

    /** With the reason as a sentence. */
    public Inapplicable(String reason) {
        super(reason);
    }
}
