package org.saddlebook.estimation.api;

import java.util.Objects;

/** How much to resample. Immutable; start from {@link #defaults()}. */
public final class ResampleOptions {
    private static final ResampleOptions DEFAULTS = new ResampleOptions(
            10_000, "resample", false, NonlinearOptions.defaults().check());

    private final int resamples;
    private final String stream;
    private final boolean parallel;
    private final Runnable check;

    private ResampleOptions(int resamples, String stream, boolean parallel, Runnable check) {
        this.resamples = resamples;
        this.stream = stream;
        this.parallel = parallel;
        this.check = check;
    }

    /** 10,000 resamples, streams named "resample/...", one thread, no check. */
    public static ResampleOptions defaults() {
        return DEFAULTS;
    }

    /** With another number of resamples, at least 2. */
    public ResampleOptions withResamples(int count) {
        if (count < 2) {
            throw new IllegalArgumentException("resamples is " + count + "; at least 2 are needed");
        }
        return new ResampleOptions(count, stream, parallel, check);
    }

    /** With another beginning of the names of its streams, one for each purpose. */
    public ResampleOptions withStream(String name) {
        return new ResampleOptions(resamples, Objects.requireNonNull(name, "name"), parallel, check);
    }

    /**
     * Whether to use every core. The result is the same; streams, check and a non-linear response must then be safe to call
     * from several threads.
     */
    public ResampleOptions withParallel(boolean value) {
        return new ResampleOptions(resamples, stream, value, check);
    }

    /** With a check called every few hundred resamples; an exception it throws ends the work and reaches the caller. */
    public ResampleOptions withCheck(Runnable cancelCheck) {
        return new ResampleOptions(resamples, stream, parallel, Objects.requireNonNull(cancelCheck, "check"));
    }

    /** Number of resamples. */
    public int resamples() {
        return resamples;
    }

    /** Beginning of the stream names. */
    public String stream() {
        return stream;
    }

    /** Whether every core is used. */
    public boolean parallel() {
        return parallel;
    }

    /** The check. */
    public Runnable check() {
        return check;
    }
}
