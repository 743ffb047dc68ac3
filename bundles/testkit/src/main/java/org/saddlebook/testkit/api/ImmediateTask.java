package org.saddlebook.testkit.api;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import java.util.function.IntFunction;
import java.util.random.RandomGenerator;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;

/** A task for tests: runs parts one after another, keeps no progress, draws from streams named as the product names them. */
public final class ImmediateTask implements Task {
    private final long seed;
    private final boolean cancelled;

    private ImmediateTask(long seed, boolean cancelled) {
        this.seed = seed;
        this.cancelled = cancelled;
    }

    /** A task whose random streams depend on this seed. */
    public static ImmediateTask seeded(long seed) {
        return new ImmediateTask(seed, false);
    }

    /** A task that the user has already cancelled. */
    public static ImmediateTask cancelled() {
        return new ImmediateTask(1, true);
    }

    @Override
    public void progress(double fraction, String doing) {
        if (!(fraction >= 0 && fraction <= 1)) {
            throw new IllegalArgumentException("fraction must lie between 0 and 1: " + fraction);
        }
    }

    @Override
    public void check() throws Cancelled {
        if (cancelled) {
            throw new Cancelled();
        }
    }

    @Override
    public RandomGenerator random(String stream) {
        long mixed = seed;
        for (byte part : stream.getBytes(StandardCharsets.UTF_8)) {
            mixed = mixed * 0x100000001B3L + part;
        }
        return new SplittableRandom(mixed);
    }

    @Override
    public <T> List<T> parts(int count, IntFunction<T> part) throws Cancelled {
        List<T> results = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            check();
            results.add(part.apply(i));
        }
        return results;
    }
}
