package org.saddlebook.evaluation.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;

import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.service.Progress;
import org.saddlebook.api.task.Cancelled;

class NamedStreamTest {
    @Test
    void dependsOnSeedAndNameAlone() {
        assertEquals(new NamedStream(7, "a").nextLong(), new NamedStream(7, "a").nextLong());
        assertNotEquals(new NamedStream(7, "a").nextLong(), new NamedStream(8, "a").nextLong());
        assertNotEquals(new NamedStream(7, "a").nextLong(), new NamedStream(7, "b").nextLong());
    }

    @Test
    void normalDeviatesHaveTheMomentsOfTheNormalLaw() {
        NamedStream stream = new NamedStream(1, "moments");
        int n = 200_000;
        double sum = 0;
        double squares = 0;
        double fourth = 0;
        for (int i = 0; i < n; i++) {
            double x = stream.nextGaussian();
            sum += x;
            squares += x * x;
            fourth += x * x * x * x;
        }
        // Five standard errors of each moment: 1, sqrt(2) and sqrt(96) over sqrt(n).
        double root = Math.sqrt(n);
        assertEquals(0, sum / n, 5 / root);
        assertEquals(1, squares / n, 5 * Math.sqrt(2) / root);
        assertEquals(3, fourth / n, 5 * Math.sqrt(96) / root);
    }

    @Test
    void partsComeBackInOrderForAnyNumberOfThreads() throws Cancelled {
        Set<String> results = new TreeSet<>();
        for (int threads : new int[] {1, 2, 8}) {
            EvaluationTask task = new EvaluationTask(3, threads, Long.MAX_VALUE, Progress.NONE);
            results.add(task.parts(
                            50, i -> Long.toHexString(task.random("part/" + i).nextLong()))
                    .toString());
        }
        assertEquals(1, results.size());
    }
}
