package org.saddlebook.window.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.NavigableSet;
import java.util.Optional;
import java.util.TreeSet;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;

/** Finds the intervals of temperature in which all limits hold with at least a probability, temperature by temperature. */
final class WindowSearch {
    /** Temperatures of the search, spaced as 1/T. */
    static final int GRID = 200;

    private static final int HALVINGS = 11;
    private static final int REFINED = 8;

    /** What ends an interval. */
    enum Stop {
        /** A limit with headroom. */
        LIMIT,
        /** A wall of the equipment. */
        WALL,
        /** The range that was looked at; the interval may go on. */
        RANGE
    }

    /**
     * One end of an interval.
     *
     * @param kelvin where the probability falls below the level, K
     * @param even where it falls below one half, K; NaN where that is outside the range
     * @param doubtful where it falls below 1 − level, K; NaN as before
     * @param stop what ends the interval
     * @param limit index of the limit that fails most often there; −1 for walls and range
     * @param failing how often it fails there
     */
    record End(double kelvin, double even, double doubtful, Stop stop, int limit, double failing) {}

    /**
     * A narrower interval that holds as a whole.
     *
     * @param probability that all limits hold everywhere in it
     */
    record Whole(double lowerKelvin, double upperKelvin, double probability) {}

    /**
     * An interval.
     *
     * @param throughout probability that all limits hold everywhere in it
     * @param whole a part of it in which they do with the level; empty where there is none
     */
    record Found(End lower, End upper, double throughout, Optional<Whole> whole) {}

    private final Draws draws;
    private final Limit.Equipment walls;
    private final double level;
    private final Task task;
    private Held held;

    WindowSearch(Draws draws, Limit.Equipment walls, double lower, double upper, double level, Task task)
            throws Cancelled {
        this.draws = draws;
        this.walls = walls;
        this.level = level;
        this.task = task;
        NavigableSet<Double> grid = new TreeSet<>();
        for (double kelvin : spaced(lower, upper, GRID)) {
            grid.add(kelvin);
        }
        for (double wall : new double[] {
            walls.lowerKelvin().orElse(lower), walls.upperKelvin().orElse(upper)
        }) {
            if (wall > lower && wall < upper) {
                grid.add(wall);
            }
        }
        held = draws.evaluate(array(grid), task);
        refine(grid);
    }

    /** Temperatures spaced as 1/T, ends included. */
    static double[] spaced(double lower, double upper, int count) {
        double[] kelvin = new double[count];
        for (int i = 0; i < count; i++) {
            double inverse = 1 / lower + (1 / upper - 1 / lower) * i / (count - 1);
            kelvin[i] = i == 0 ? lower : i == count - 1 ? upper : 1 / inverse;
        }
        return kelvin;
    }

    /** What holds on the grid. */
    Held held() {
        return held;
    }

    /** Index of the temperature at which all limits hold most probably; the middle one of equals. */
    int best() {
        int first = 0;
        int last = 0;
        for (int i = 1; i < held.all().length; i++) {
            if (held.all()[i] > held.all()[first]) {
                first = i;
                last = i;
            } else if (held.all()[i] == held.all()[first] && i == last + 1) {
                last = i;
            }
        }
        return (first + last) / 2;
    }

    /** The intervals, from cold to hot. */
    List<Found> intervals() throws Cancelled {
        List<Found> found = new ArrayList<>();
        int n = held.kelvin().length;
        for (int from = 0; from < n; from++) {
            if (held.all()[from] >= level) {
                int to = from;
                while (to + 1 < n && held.all()[to + 1] >= level) {
                    to++;
                }
                task.check();
                found.add(interval(from, to));
                from = to;
            }
        }
        return found;
    }

    /** A window narrower than the grid shows as a peak that does not reach the level: look closer there. */
    private void refine(NavigableSet<Double> grid) throws Cancelled {
        double[] kelvin = held.kelvin();
        double[] all = held.all();
        boolean more = false;
        for (int i = 1; i + 1 < kelvin.length; i++) {
            boolean peak = all[i] >= all[i - 1] && all[i] >= all[i + 1] && all[i] > Math.min(all[i - 1], all[i + 1]);
            if (peak && all[i] < level && all[i] >= 0.5) {
                double[] closer = spaced(kelvin[i - 1], kelvin[i + 1], 2 * REFINED + 1);
                for (double each : closer) {
                    if (draws.probability(each) >= level) {
                        more |= grid.add(each);
                    }
                }
            }
        }
        if (more) {
            held = draws.evaluate(array(grid), task);
        }
    }

    private Found interval(int from, int to) throws Cancelled {
        End lower = end(from, -1);
        End upper = end(to, 1);
        int inside = to - from + 1;
        double[] kelvin = new double[inside + 2];
        long[][] bits = new long[inside + 2][];
        double[] all = new double[inside + 2];
        Held ends = draws.evaluate(new double[] {lower.kelvin(), upper.kelvin()}, task);
        for (int i = 0; i < inside + 2; i++) {
            boolean atEnd = i == 0 || i == inside + 1;
            int index = atEnd ? (i == 0 ? 0 : 1) : from + i - 1;
            Held source = atEnd ? ends : held;
            kelvin[i] = source.kelvin()[index];
            bits[i] = source.bits()[index];
            all[i] = source.all()[index];
        }
        Held within = new Held(kelvin, all, new double[0][], bits, draws.count());
        return new Found(
                withBinding(lower, ends, 0),
                withBinding(upper, ends, 1),
                within.throughout(0, inside + 1),
                whole(within));
    }

    private static End withBinding(End end, Held ends, int index) {
        if (end.stop() != Stop.LIMIT) {
            return end;
        }
        double[] alone = ends.alone()[index];
        int most = 0;
        for (int i = 1; i < alone.length; i++) {
            most = alone[i] < alone[most] ? i : most;
        }
        return new End(end.kelvin(), end.even(), end.doubtful(), end.stop(), most, 1 - alone[most]);
    }

    /** The end of a run of grid points, going outward from its last one. */
    private End end(int last, int step) {
        double[] kelvin = held.kelvin();
        int next = last + step;
        if (next < 0 || next >= kelvin.length) {
            return new End(kelvin[last], Double.NaN, Double.NaN, Stop.RANGE, -1, 0);
        }
        if (!walls.holds(kelvin[next])) {
            return new End(kelvin[last], kelvin[last], kelvin[last], Stop.WALL, -1, 0);
        }
        return new End(
                crossing(last, step, level),
                crossing(last, step, 0.5),
                crossing(last, step, 1 - level),
                Stop.LIMIT,
                -1,
                0);
    }

    /** Where the probability first falls below a value, going outward; NaN where it does not in the range. */
    private double crossing(int last, int step, double probability) {
        double[] kelvin = held.kelvin();
        int out = last + step;
        while (out >= 0 && out < kelvin.length && held.all()[out] >= probability) {
            out += step;
        }
        if (out < 0 || out >= kelvin.length) {
            return Double.NaN;
        }
        if (!walls.holds(kelvin[out])) {
            return kelvin[out - step];
        }
        double inside = kelvin[out - step];
        double outside = kelvin[out];
        for (int i = 0; i < HALVINGS; i++) {
            double middle = (inside + outside) / 2;
            if (draws.probability(middle) >= probability) {
                inside = middle;
            } else {
                outside = middle;
            }
        }
        return inside;
    }

    /** The widest part around the most probable temperature that holds as a whole: its ends are raised together. */
    private Optional<Whole> whole(Held within) {
        double[] all = within.all();
        int top = 0;
        int last = 0;
        for (int i = 1; i < all.length; i++) {
            if (all[i] > all[top]) {
                top = i;
                last = i;
            } else if (all[i] == all[top] && i == last + 1) {
                last = i;
            }
        }
        int center = (top + last) / 2;
        double low = level;
        double high = all[top];
        Optional<Whole> best = Optional.empty();
        double asked = low;
        for (int i = 0; i < 12; i++) {
            int from = center;
            int to = center;
            while (from > 0 && all[from - 1] >= asked) {
                from--;
            }
            while (to + 1 < all.length && all[to + 1] >= asked) {
                to++;
            }
            double probability = within.throughout(from, to);
            if (probability >= level) {
                best = Optional.of(new Whole(within.kelvin()[from], within.kelvin()[to], probability));
                high = asked;
            } else {
                low = asked;
            }
            if (i == 0 && best.isPresent()) {
                return best;
            }
            asked = i == 0 ? high : (low + high) / 2;
        }
        return best;
    }

    private static double[] array(NavigableSet<Double> sorted) {
        double[] values = new double[sorted.size()];
        int i = 0;
        for (double value : sorted) {
            values[i++] = value;
        }
        return values;
    }

    /** The value below which a share of the numbers lies; reorders them (C. A. R. Hoare, Commun. ACM 4 (1961) 321). */
    static double quantile(double[] values, double probability) {
        int wanted = (int) Math.min(values.length - 1.0, Math.max(0, Math.floor(probability * values.length)));
        int low = 0;
        int high = values.length - 1;
        while (low < high) {
            double pivot = values[(low + high) >>> 1];
            int i = low;
            int j = high;
            while (i <= j) {
                while (values[i] < pivot) {
                    i++;
                }
                while (pivot < values[j]) {
                    j--;
                }
                if (i <= j) {
                    double swap = values[i];
                    values[i++] = values[j];
                    values[j--] = swap;
                }
            }
            if (wanted <= j) {
                high = j;
            } else if (wanted >= i) {
                low = i;
            } else {
                return values[wanted];
            }
        }
        return values[wanted];
    }
}
