package org.saddlebook.desk.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.LinkedBlockingQueue;
import java.util.concurrent.ThreadPoolExecutor;
import java.util.concurrent.TimeUnit;
import java.util.function.Consumer;
import javax.swing.SwingUtilities;
import org.saddlebook.api.service.Progress;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.desk.api.DeskTask;
import org.saddlebook.desk.api.Work;

/** Work off the event thread. Two pieces run at a time, so that a long one does not hold up a quick one. */
final class Background {
    private static final int AT_A_TIME = 2;

    private final ThreadPoolExecutor threads;
    private final List<Job<?>> jobs = new ArrayList<>(); // guarded by itself
    private final Runnable changed;

    /**
     * A background.
     *
     * @param changed called on the event thread when work starts, gets on or ends
     */
    Background(Runnable changed) {
        this.changed = changed;
        threads =
                new ThreadPoolExecutor(AT_A_TIME, AT_A_TIME, 5, TimeUnit.SECONDS, new LinkedBlockingQueue<>(), work -> {
                    Thread thread = new Thread(work, "desk background");
                    thread.setDaemon(true);
                    return thread;
                });
        threads.allowCoreThreadTimeOut(true);
    }

    /** One line about work that is shown. */
    record Shown(String what, double fraction, DeskTask task) {}

    /** The work that is running or waiting and is shown, oldest first. */
    List<Shown> shown() {
        List<Shown> list = new ArrayList<>();
        synchronized (jobs) {
            for (Job<?> job : jobs) {
                if (job.visible) {
                    list.add(new Shown(job.what, job.fraction, job));
                }
            }
        }
        return list;
    }

    /** Whether nothing runs or waits. */
    boolean idle() {
        synchronized (jobs) {
            return jobs.isEmpty();
        }
    }

    /** Runs work; results are handed over on the event thread. */
    <T> DeskTask run(String what, boolean visible, Work<T> work, Consumer<T> done, Consumer<Throwable> failed) {
        Job<T> job = new Job<>(what, visible, work, done, failed);
        synchronized (jobs) {
            jobs.add(job);
        }
        threads.execute(job);
        tell();
        return job;
    }

    /** Cancels everything and takes no more. */
    void close() {
        synchronized (jobs) {
            for (Job<?> job : jobs) {
                job.cancelled = true;
            }
        }
        threads.shutdownNow();
    }

    private void tell() {
        SwingUtilities.invokeLater(changed);
    }

    private final class Job<T> implements Runnable, DeskTask, Progress {
        private final String what;
        private final boolean visible;
        private Work<T> work;
        private Consumer<T> done;
        private Consumer<Throwable> failed;
        private volatile double fraction;
        private volatile boolean cancelled;
        private volatile boolean ended;
        private long lastTold;

        Job(String what, boolean visible, Work<T> work, Consumer<T> done, Consumer<Throwable> failed) {
            this.what = what;
            this.visible = visible;
            this.work = work;
            this.done = done;
            this.failed = failed;
        }

        @Override
        public void run() {
            try {
                if (!cancelled) {
                    T result = work.run(this);
                    SwingUtilities.invokeLater(() -> {
                        if (!cancelled) {
                            done.accept(result);
                        }
                        forget();
                    });
                    return;
                }
            } catch (Cancelled e) {
                cancelled = true;
            } catch (Exception | LinkageError | AssertionError | StackOverflowError | OutOfMemoryError e) {
                SwingUtilities.invokeLater(() -> {
                    if (!cancelled) {
                        failed.accept(e);
                    }
                    forget();
                });
                return;
            }
            SwingUtilities.invokeLater(this::forget);
        }

        /** What it worked for may hold on to a panel; nothing of it is kept. */
        private void forget() {
            ended = true;
            work = null;
            done = null;
            failed = null;
            synchronized (jobs) {
                jobs.remove(this);
            }
            changed.run();
        }

        @Override
        public void cancel() {
            cancelled = true;
        }

        @Override
        public boolean ended() {
            return ended;
        }

        @Override
        public void report(double done, String doing) {
            fraction = done;
            long now = System.nanoTime();
            if (visible && now - lastTold > 100_000_000L) {
                lastTold = now;
                tell();
            }
        }

        @Override
        public void check() throws Cancelled {
            if (cancelled || Thread.currentThread().isInterrupted()) {
                throw new Cancelled();
            }
        }
    }
}
