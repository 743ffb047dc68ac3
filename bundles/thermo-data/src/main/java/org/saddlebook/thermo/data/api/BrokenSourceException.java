package org.saddlebook.thermo.data.api;

/**
 * A source cannot answer because something it reads is wrong; the message is for the user and names file, line, column, what was
 * found, what was expected and what to do.
 */
public final class BrokenSourceException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    /** A message for the user. */
    public BrokenSourceException(String message) {
        super(message);
    }
}
