package org.saddlebook.intake.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import java.util.function.IntFunction;
import java.util.random.RandomGenerator;
import org.saddlebook.api.service.Progress;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;

/** The task that a reader sees: one thread, the caller's progress. */
final class ImportTask implements Task {
    private final Progress progress;

    ImportTask(Progress progress) {
        this.progress = progress;
    }

    @Override
    public void progress(double fraction, String doing) {
        progress.report(fraction, doing);
    }

    @Override
    public void check() throws Cancelled {
        progress.check();
    }

    /** A file is read before there is a campaign with a seed: the stream depends on its name alone. */
    @Override
    public RandomGenerator random(String stream) {
        return new SplittableRandom(stream.hashCode());
    }

    @Override
    public <T> List<T> parts(int count, IntFunction<T> part) throws Cancelled {
        List<T> results = new ArrayList<>(count);
        for (int i = 0; i < count; i++) {
            check();
            results.add(part.apply(i));
        }
        return results;
    }
}
