package org.saddlebook.console.api;

/** Exit codes; scripts rely on them. */
public final class ExitCode {
    /** Done. */
    public static final int DONE = 0;

    /** Something asked for by name was refused, or nothing could be fitted. */
    public static final int REFUSED = 1;

    /** Input or arguments are wrong. */
    public static final int BAD_INPUT = 2;

    /** A fault inside the program. */
    public static final int INTERNAL_FAULT = 3;

    /** Verify or recompute found a difference. */
    public static final int DIFFERENCE = 4;

    /** Cancelled by the user. */
    public static final int CANCELLED = 130;

    private ExitCode() {}
}
