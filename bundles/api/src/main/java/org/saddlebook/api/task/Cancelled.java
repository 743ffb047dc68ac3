package org.saddlebook.api.task;

/** The user cancelled the work. Not a fault: let it pass through. */
public final class Cancelled extends Exception {
    private static final long serialVersionUID = 1L;

    /** Work stopped on request. */
    public Cancelled() {
        super("cancelled", null, false, false);
    }
}
