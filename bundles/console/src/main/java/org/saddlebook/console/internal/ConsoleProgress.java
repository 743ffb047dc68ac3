package org.saddlebook.console.internal;

import java.io.PrintStream;
import org.saddlebook.api.service.Progress;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.presentation.api.Rounding;

/**
 * Progress to standard error: nothing for work that is done at once, a line now and then for work that takes long. Cancel
 * comes as an interrupt of the thread that runs the verb.
 */
final class ConsoleProgress implements Progress {
    private static final long FIRST_AFTER_NANOS = 2_000_000_000L;
    private static final long THEN_EVERY_NANOS = 5_000_000_000L;

    private final PrintStream err;
    private final Thread worker;
    private long nextNanos;

    ConsoleProgress(PrintStream err, Thread worker) {
        this.err = err;
        this.worker = worker;
        this.nextNanos = System.nanoTime() + FIRST_AFTER_NANOS;
    }

    @Override
    public void report(double fraction, String doing) {
        long now = System.nanoTime();
        synchronized (this) {
            if (now - nextNanos < 0) {
                return;
            }
            nextNanos = now + THEN_EVERY_NANOS;
        }
        double clipped = Math.max(0, Math.min(1, fraction));
        err.println("saddlebook: " + Rounding.decimals(100 * clipped, 0) + " % done, now: " + doing);
    }

    @Override
    public void check() throws Cancelled {
        if (worker.isInterrupted()) {
            throw new Cancelled();
        }
    }
}
