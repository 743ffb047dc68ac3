package org.saddlebook.barrier.internal;

import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;

/** Lets a cancel pass through the estimation engine, which knows no task. */
final class CancelCheck implements Runnable {
    private final Task task;

    CancelCheck(Task task) {
        this.task = task;
    }

    /** Carries a cancel through code that declares none. */
    static final class Stopped extends RuntimeException {
        private static final long serialVersionUID = 1L;

        Stopped(Cancelled cause) {
            super(cause);
        }
    }

    @Override
    public void run() {
        try {
            task.check();
        } catch (Cancelled cancelled) {
            throw new Stopped(cancelled);
        }
    }
}
