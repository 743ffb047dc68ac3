package org.saddlebook.window.internal;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;

/**
 * All random draws and what holds for them at a temperature. Draws are spread over the laws that cannot be told apart, by
 * weight; every chunk has a random stream of its own, so that the result does not depend on the number of cores.
 */
final class Draws {
    private static final int CHUNK = 2048;

    private final Headroom headroom;
    private final Limit.Equipment walls;
    private final List<Chunk> chunks;
    private final int count;

    private Draws(Headroom headroom, Limit.Equipment walls, List<Chunk> chunks, int count) {
        this.headroom = headroom;
        this.walls = walls;
        this.chunks = chunks;
        this.count = count;
    }

    /** A chunk to be made. */
    private record Plan(String stream, int size, Optional<BoundLaw> law) {}

    /**
     * Draws.
     *
     * @param laws the laws that remain; may be empty where no limit needs one
     * @param weights as many, summing to 1
     */
    static Draws make(
            Headroom headroom, Limit.Equipment walls, List<BoundLaw> laws, double[] weights, int count, Task task)
            throws Cancelled {
        List<Plan> plans = new ArrayList<>();
        if (laws.isEmpty()) {
            plan(plans, "none", count, Optional.empty());
        }
        int[] shares = shares(weights, count);
        for (int l = 0; l < laws.size(); l++) {
            plan(plans, laws.get(l).id(), shares[l], Optional.of(laws.get(l)));
        }
        List<Chunk> chunks = task.parts(plans.size(), i -> {
            Plan plan = plans.get(i);
            return new Chunk(plan.size(), task.random(plan.stream()), plan.law(), headroom.thermo(), headroom.stated());
        });
        return new Draws(headroom, walls, chunks, count);
    }

    private static void plan(List<Plan> plans, String name, int size, Optional<BoundLaw> law) {
        for (int from = 0, number = 0; from < size; from += CHUNK, number++) {
            plans.add(new Plan("window/" + name + "/" + number, Math.min(CHUNK, size - from), law));
        }
    }

    /** Whole numbers in proportion to the weights; the largest remainders get what is left over. */
    private static int[] shares(double[] weights, int count) {
        int[] shares = new int[weights.length];
        double[] rest = new double[weights.length];
        int left = count;
        for (int i = 0; i < weights.length; i++) {
            shares[i] = (int) Math.floor(weights[i] * count);
            rest[i] = weights[i] * count - shares[i];
            left -= shares[i];
        }
        while (left > 0 && weights.length > 0) {
            int most = 0;
            for (int i = 1; i < rest.length; i++) {
                most = rest[i] > rest[most] ? i : most;
            }
            shares[most]++;
            rest[most] = -1;
            left--;
        }
        return shares;
    }

    int count() {
        return count;
    }

    /** What holds at many temperatures; chunks may run at the same time. */
    Held evaluate(double[] kelvin, Task task) throws Cancelled {
        return joined(kelvin, task.parts(chunks.size(), i -> evaluate(chunks.get(i), kelvin)));
    }

    /** Probability that all limits hold at one temperature, without handing work out. */
    double probability(double kelvin) {
        double[] one = {kelvin};
        int holding = 0;
        for (Chunk chunk : chunks) {
            holding += evaluate(chunk, one).holding()[0];
        }
        return (double) holding / count;
    }

    /** Headroom of one limit at one temperature for every draw, J/mol. */
    double[] headroom(int limit, double kelvin) {
        double[] all = new double[count];
        int from = 0;
        for (Chunk chunk : chunks) {
            double[] rates = new double[chunk.size()];
            double lnRate = rates(chunk, kelvin, rates);
            double[] part = new double[chunk.size()];
            chunk.headroom(
                    headroom.form(limit, kelvin, lnRate, chunk.law()),
                    kelvin,
                    lnRate,
                    headroom.thermo(),
                    rates,
                    true,
                    part);
            System.arraycopy(part, 0, all, from, part.length);
            from += part.length;
        }
        return all;
    }

    /** ln k at one temperature for every draw. */
    double[] lnRates(double kelvin) {
        double[] all = new double[count];
        int from = 0;
        for (Chunk chunk : chunks) {
            double[] rates = new double[chunk.size()];
            double lnRate = rates(chunk, kelvin, rates);
            for (double rate : rates) {
                all[from++] = lnRate + rate;
            }
        }
        return all;
    }

    private static double rates(Chunk chunk, double kelvin, double[] rates) {
        if (chunk.law().isEmpty()) {
            return Double.NaN;
        }
        BoundLaw.At at = chunk.law().get().at(kelvin);
        chunk.rates(at, rates);
        return at.lnRate();
    }

    /** What holds for the draws of one chunk. */
    @SuppressWarnings("ArrayRecordComponent") // compared by nobody; handed over inside this package only
    private record Part(long[][] bits, int[][] failures, int[] holding) {}

    private Part evaluate(Chunk chunk, double[] kelvin) {
        int size = chunk.size();
        int limits = headroom.limits().size();
        long[][] bits = new long[kelvin.length][(size + 63) / 64];
        int[][] failures = new int[kelvin.length][limits];
        int[] holding = new int[kelvin.length];
        double[] rates = new double[size];
        double[] one = new double[size];
        double[] least = new double[size];
        for (int t = 0; t < kelvin.length; t++) {
            double lnRate = rates(chunk, kelvin[t], rates);
            Arrays.fill(least, walls.holds(kelvin[t]) ? Double.POSITIVE_INFINITY : -1);
            for (int i = 0; i < limits; i++) {
                chunk.headroom(
                        headroom.form(i, kelvin[t], lnRate, chunk.law()),
                        kelvin[t],
                        lnRate,
                        headroom.thermo(),
                        rates,
                        false,
                        one);
                int failed = 0;
                for (int d = 0; d < size; d++) {
                    // A headroom that is not a number counts as missed.
                    failed += one[d] >= 0 ? 0 : 1;
                    least[d] = Math.min(least[d], one[d]);
                }
                failures[t][i] = failed;
            }
            holding[t] = pack(least, bits[t]);
        }
        return new Part(bits, failures, holding);
    }

    private static int pack(double[] least, long[] bits) {
        int holding = 0;
        for (int d = 0; d < least.length; d++) {
            if (least[d] >= 0) {
                bits[d >> 6] |= 1L << (d & 63);
                holding++;
            }
        }
        return holding;
    }

    private Held joined(double[] kelvin, List<Part> parts) {
        int words = 0;
        for (Part part : parts) {
            words += part.bits()[0].length;
        }
        long[][] bits = new long[kelvin.length][words];
        int limits = headroom.limits().size();
        double[][] alone = new double[kelvin.length][limits];
        double[] all = new double[kelvin.length];
        for (int t = 0; t < kelvin.length; t++) {
            int from = 0;
            int holding = 0;
            int[] failed = new int[limits];
            for (Part part : parts) {
                long[] own = part.bits()[t];
                System.arraycopy(own, 0, bits[t], from, own.length);
                from += own.length;
                holding += part.holding()[t];
                for (int i = 0; i < limits; i++) {
                    failed[i] += part.failures()[t][i];
                }
            }
            all[t] = (double) holding / count;
            for (int i = 0; i < limits; i++) {
                alone[t][i] = (double) (count - failed[i]) / count;
            }
        }
        return new Held(kelvin, all, alone, bits, count);
    }
}
