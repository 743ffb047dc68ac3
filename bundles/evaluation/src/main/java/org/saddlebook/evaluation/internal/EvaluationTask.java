package org.saddlebook.evaluation.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.FutureTask;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.concurrent.atomic.AtomicLong;
import java.util.function.IntFunction;
import java.util.random.RandomGenerator;
import org.saddlebook.api.service.Progress;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Contained;
import org.saddlebook.api.task.Task;

/**
 * The task handed to analyses. Watches contained code: each sign of life (progress, check, a finished part) restarts the
 * patience, so long honest work goes on and a hanging contribution is left behind on its daemon thread.
 */
final class EvaluationTask implements Task {
    private final long seed;
    private final int threads;
    private final long patienceNanos;
    private final Progress progress;
    private static final InheritableThreadLocal<Watch> WATCH = new InheritableThreadLocal<>();

    EvaluationTask(long seed, int threads, long patienceNanos, Progress progress) {
        this.seed = seed;
        this.threads = Math.max(1, threads);
        this.patienceNanos = patienceNanos;
        this.progress = progress;
    }

    @Override
    public void progress(double fraction, String doing) {
        signOfLife();
        progress.report(fraction, doing);
    }

    @Override
    public void check() throws Cancelled {
        signOfLife();
        if (Thread.currentThread().isInterrupted()) {
            throw new Cancelled();
        }
        progress.check();
    }

    @Override
    public RandomGenerator random(String stream) {
        return new NamedStream(seed, stream);
    }

    @Override
    public <T> List<T> parts(int count, IntFunction<T> part) throws Cancelled {
        int workers = Math.min(threads, count);
        List<T> results = new ArrayList<>(count);
        if (workers <= 1) {
            for (int i = 0; i < count; i++) {
                check();
                results.add(part.apply(i));
            }
            return results;
        }
        for (int i = 0; i < count; i++) {
            results.add(null);
        }
        AtomicInteger next = new AtomicInteger();
        List<FutureTask<Void>> running = new ArrayList<>();
        for (int w = 0; w < workers; w++) {
            FutureTask<Void> worker = new FutureTask<>(() -> {
                for (int i = next.getAndIncrement(); i < count; i = next.getAndIncrement()) {
                    check();
                    T result = part.apply(i);
                    synchronized (results) {
                        results.set(i, result);
                    }
                }
                return null;
            });
            running.add(worker);
            daemon(worker, "saddlebook part").start();
        }
        try {
            for (FutureTask<Void> worker : running) {
                worker.get();
            }
        } catch (InterruptedException interrupted) {
            running.forEach(worker -> worker.cancel(true));
            throw cancelled();
        } catch (ExecutionException broken) {
            running.forEach(worker -> worker.cancel(true));
            rethrow(broken.getCause());
        }
        synchronized (results) {
            return new ArrayList<>(results);
        }
    }

    @Override
    public <T> Contained<T> contain(String culprit, Callable<T> work) throws Cancelled {
        Watch own = new Watch(WATCH.get());
        FutureTask<Contained<T>> running = new FutureTask<>(() -> {
            WATCH.set(own);
            return Task.super.contain(culprit, work);
        });
        daemon(running, "saddlebook contained work").start();
        while (true) {
            long left = patienceNanos - own.silentNanos();
            if (left <= 0) {
                running.cancel(true);
                return new Contained.Broke<>(culprit + " did not answer for "
                        + TimeUnit.NANOSECONDS.toSeconds(patienceNanos) + " s and was left behind");
            }
            try {
                // Waking now and then lets a cancel through although the contained code never checks for it.
                return running.get(Math.min(left, TimeUnit.MILLISECONDS.toNanos(100)), TimeUnit.NANOSECONDS);
            } catch (TimeoutException stillRunning) {
                // Whoever waits is alive: only the innermost silent contribution runs out of patience.
                signOfLife();
                progress.check();
            } catch (InterruptedException interrupted) {
                running.cancel(true);
                throw cancelled();
            } catch (ExecutionException broken) {
                rethrow(broken.getCause());
            }
        }
    }

    private void signOfLife() {
        Watch own = WATCH.get();
        if (own != null) {
            own.signOfLife();
        }
    }

    /** When contained work was last heard of; a sign of life counts for every work that contains it. */
    private static final class Watch {
        private final Watch outer;
        private final AtomicLong last = new AtomicLong(System.nanoTime());

        Watch(Watch outer) {
            this.outer = outer;
        }

        void signOfLife() {
            for (Watch each = this; each != null; each = each.outer) {
                each.last.set(System.nanoTime());
            }
        }

        long silentNanos() {
            return System.nanoTime() - last.get();
        }
    }

    private static Thread daemon(Runnable work, String name) {
        Thread thread = new Thread(work, name);
        thread.setDaemon(true);
        return thread;
    }

    private static Cancelled cancelled() {
        Thread.currentThread().interrupt();
        return new Cancelled();
    }

    private static void rethrow(Throwable cause) throws Cancelled {
        if (cause instanceof Cancelled cancelled) {
            throw cancelled;
        }
        if (cause instanceof RuntimeException runtime) {
            throw runtime;
        }
        if (cause instanceof Error error) {
            throw error;
        }
        throw new IllegalStateException(cause);
    }
}
