package org.saddlebook.desk.internal;

import java.awt.AWTEvent;
import java.awt.EventQueue;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.BiConsumer;

/**
 * Watches the event thread: what throws there is handed to the desk, which finds whose fault it is; what keeps it too long
 * is interrupted, so that a panel which waits for something comes back and is folded. Code that never looks at an interrupt
 * cannot be stopped in Java; then at least its name is known before the process is ended, and the next start sets it aside.
 */
final class EventWatch extends EventQueue {
    /** A piece of event-thread work. */
    record Slow(long nanoseconds, String what) {}

    private static final long LOOK_MILLISECONDS = 200;

    private final long patienceNanoseconds;
    private volatile BiConsumer<Throwable, AWTEvent> fault;
    private volatile BiConsumer<StackTraceElement[], Long> stall;
    private final AtomicReference<Slow> slowest = new AtomicReference<>(new Slow(0, "nothing"));
    private final Thread watcher = new Thread(this::watch, "desk event watch");
    private volatile Thread thread;
    private volatile long started;
    private volatile boolean stalled;
    private volatile boolean closed;

    /**
     * A watch.
     *
     * @param fault receives what was thrown, on the event thread
     * @param stall receives the stack of work that takes longer than the patience, on the watcher's thread
     */
    EventWatch(
            long patienceNanoseconds,
            BiConsumer<Throwable, AWTEvent> fault,
            BiConsumer<StackTraceElement[], Long> stall) {
        this.patienceNanoseconds = patienceNanoseconds;
        this.fault = fault;
        this.stall = stall;
        watcher.setDaemon(true);
        watcher.start();
    }

    @Override
    protected void dispatchEvent(AWTEvent event) {
        long outer = started;
        long start = System.nanoTime();
        thread = Thread.currentThread();
        started = start;
        try {
            super.dispatchEvent(event);
        } catch (RuntimeException | Error e) {
            fault.accept(e, event);
        } finally {
            long took = System.nanoTime() - start;
            if (outer == 0 && took > slowest.get().nanoseconds()) {
                slowest.set(new Slow(took, event.toString()));
            }
            started = outer;
            if (stalled) {
                stalled = false;
                boolean leftOver = Thread.interrupted(); // nobody waited for it: the next wait must not end by it
                assert !leftOver || outer == 0;
            }
        }
    }

    /** The longest piece of work since the last call. */
    Slow takeSlowest() {
        return slowest.getAndSet(new Slow(0, "nothing"));
    }

    private void watch() {
        try {
            while (!closed) {
                synchronized (this) {
                    wait(LOOK_MILLISECONDS);
                }
                long since = started;
                Thread busy = thread;
                long took = System.nanoTime() - since;
                if (since != 0 && busy != null && took > patienceNanoseconds && !stalled) {
                    look(busy, took);
                }
            }
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }

    private void look(Thread busy, long took) {
        StackTraceElement[] stack = busy.getStackTrace();
        if (waitsForEvents(stack)) {
            return; // a nested loop, which goes on dispatching
        }
        stalled = true;
        stall.accept(stack, took);
        busy.interrupt();
    }

    private static boolean waitsForEvents(StackTraceElement[] stack) {
        for (int i = 0; i < Math.min(8, stack.length); i++) {
            if (stack[i].getMethodName().equals("getNextEvent")
                    && stack[i].getClassName().startsWith("java.awt.EventQueue")) {
                return true;
            }
        }
        return false;
    }

    /**
     * Stops watching and lets go of everybody. The queue itself stays, as a plain one: taking a queue away while events
     * arrive can lose some.
     */
    void close() {
        closed = true;
        fault = (thrown, event) -> Faults.log(thrown);
        stall = (stack, took) -> {};
        synchronized (this) {
            notifyAll();
        }
    }

    /** The first frame of a stack that lies in one of these packages. */
    static Optional<String> packageIn(StackTraceElement[] stack, Iterable<String> packages) {
        for (StackTraceElement element : stack) {
            for (String name : packages) {
                if (element.getClassName().startsWith(name + ".")) {
                    return Optional.of(name);
                }
            }
        }
        return Optional.empty();
    }
}
