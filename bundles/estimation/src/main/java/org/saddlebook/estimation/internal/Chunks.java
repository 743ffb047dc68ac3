package org.saddlebook.estimation.internal;

import java.util.Arrays;
import java.util.stream.IntStream;
import org.saddlebook.estimation.api.RandomStreams;
import org.saddlebook.estimation.api.ResampleOptions;

/** Work cut into pieces, each with a random stream of its own, so that the number of threads decides nothing. */
public final class Chunks {
    private static final int SIZE = 500;

    private Chunks() {}

    /** One piece of work. */
    @FunctionalInterface
    public interface Work {
        /**
         * Fills parameter sets.
         *
         * @param draws random deviates of this piece
         * @param values where they go
         * @param from first set
         * @param to after the last set
         * @return sets drawn again, or -1 to give up
         */
        long fill(Draws draws, double[] values, int from, int to);
    }

    /** Does the work; sets drawn again over all pieces, or -1 when one gave up. */
    public static long run(ResampleOptions options, RandomStreams streams, String kind, double[] values, Work work) {
        int count = options.resamples();
        int pieces = (count + SIZE - 1) / SIZE;
        long[] redrawn = new long[pieces];
        IntStream range = IntStream.range(0, pieces);
        (options.parallel() ? range.parallel() : range).forEach(piece -> {
            options.check().run();
            Draws draws = new Draws(streams.stream(options.stream() + "/" + kind + "/" + piece));
            redrawn[piece] = work.fill(draws, values, piece * SIZE, Math.min(count, (piece + 1) * SIZE));
        });
        for (long number : redrawn) {
            if (number < 0) {
                return -1;
            }
        }
        return Arrays.stream(redrawn).sum();
    }
}
