package org.saddlebook.reaction.series.internal;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Interval;

/**
 * Lines through one common point in ln k against 1/T (O. Exner, Prog. Phys. Org. Chem. 10, 411 (1973)). For a given x the
 * heights of the lines are {@code h_i ± √v_i}, and holding them together costs
 * {@code S(x) = Σ (h_i − h̄)²/v_i}, h̄ their weighted mean. The estimate minimises S; the set of x that the data allow is
 * {@code S(x) − S(min) ≤ F(1, ν) s²}, which for two lines is Fieller's. x runs over the whole projective line (parallel
 * lines meet at infinity); only x above 0 is a temperature.
 */
final class CommonPoint {
    private static final int STEPS = 4000;

    private final List<ReactionLine> lines;
    private final double centre;
    private final double scale;

    CommonPoint(List<ReactionLine> lines) {
        this.lines = List.copyOf(lines);
        double sum = 0;
        double spread = 0;
        double weight = 0;
        for (ReactionLine line : lines) {
            sum += line.weight() * line.meanX();
            weight += line.weight();
            spread += line.spread();
        }
        centre = sum / weight;
        scale = Math.sqrt(spread / weight);
    }

    /** S at {@code x = centre + scale·tan(angle)}; at a right angle the cost of parallel lines. */
    private double cost(double angle) {
        double c = StrictMath.cos(angle);
        double s = StrictMath.sin(angle);
        double weights = 0;
        double heights = 0;
        double squares = 0;
        for (ReactionLine line : lines) {
            // Height and its variance, multiplied by cos and cos², so that nothing becomes infinite.
            double away = c * (centre - line.meanX()) + s * scale;
            double h = c * line.meanY() + line.slope() * away;
            double v = c * c / line.weight() + away * away / line.spread();
            weights += 1 / v;
            heights += h / v;
            squares += h * h / v;
        }
        return Math.max(0, squares - heights * heights / weights);
    }

    double x(double angle) {
        return centre + scale * StrictMath.tan(angle);
    }

    private double angle(int step) {
        return Math.PI * (step / (double) STEPS - 0.5);
    }

    /** The angle at which S is least, by golden section around the best step. */
    double best() {
        int least = 0;
        for (int i = 1; i < STEPS; i++) {
            least = cost(angle(i)) < cost(angle(least)) ? i : least;
        }
        double low = angle(least - 1);
        double high = angle(least + 1);
        double golden = (Math.sqrt(5) - 1) / 2;
        for (int i = 0; i < 100; i++) {
            double a = high - golden * (high - low);
            double b = low + golden * (high - low);
            if (cost(a) <= cost(b)) {
                high = b;
            } else {
                low = a;
            }
        }
        return (low + high) / 2;
    }

    /** S at its least. */
    double leastCost() {
        return cost(best());
    }

    /** Cost of parallel lines: a common activation energy. */
    double parallelCost() {
        return cost(-Math.PI / 2);
    }

    /** Cost of a common point at a given x. */
    double costAt(double x) {
        return cost(StrictMath.atan((x - centre) / scale));
    }

    /** The common temperature, K; absent when the lines would meet at no temperature above 0 K. */
    OptionalDouble temperature() {
        double x = x(best());
        return x > 0 && Double.isFinite(1 / x) ? OptionalDouble.of(1 / x) : OptionalDouble.empty();
    }

    /** Weighted mean height of the lines at x. */
    double height(double x) {
        double weights = 0;
        double heights = 0;
        for (ReactionLine line : lines) {
            double v = line.variance(x);
            weights += 1 / v;
            heights += line.at(x) / v;
        }
        return heights / weights;
    }

    /**
     * The temperatures at which the cost stays within a limit, cut to those above 0 K.
     *
     * @param limit largest cost allowed
     */
    Interval set(double limit, double level) {
        // x as a fraction of the projective half line x > 0, by angles again: x = centre·tan(φ), 0 < φ < π/2.
        boolean[] inside = new boolean[STEPS + 1];
        int count = 0;
        for (int i = 0; i <= STEPS; i++) {
            inside[i] = costAtPositive(i / (double) STEPS) <= limit;
            count += inside[i] ? 1 : 0;
        }
        Optional<Interval> none = narrow(limit, level, count);
        if (none.isPresent()) {
            return none.get();
        }
        // From x = 0 (infinite temperature) upward: fractions at which the set is entered and left.
        double first = Double.NaN;
        double last = Double.NaN;
        int changes = 0;
        for (int i = 0; i < STEPS; i++) {
            if (inside[i] != inside[i + 1]) {
                double at = crossing(i / (double) STEPS, (i + 1) / (double) STEPS, limit);
                first = changes == 0 ? at : first;
                last = at;
                changes++;
            }
        }
        if (changes == 0) {
            return Interval.everything(level, "joint");
        }
        double hottest = 1 / positive(first);
        double coldest = 1 / positive(last);
        if (inside[0] && inside[STEPS]) {
            return new Interval(
                    Interval.Kind.OUTSIDE, level, OptionalDouble.of(coldest), OptionalDouble.of(hottest), "joint");
        }
        if (inside[0]) {
            return new Interval(
                    Interval.Kind.AT_LEAST, level, OptionalDouble.of(hottest), OptionalDouble.empty(), "joint");
        }
        if (inside[STEPS]) {
            return new Interval(
                    Interval.Kind.AT_MOST, level, OptionalDouble.empty(), OptionalDouble.of(coldest), "joint");
        }
        return Interval.between(coldest, hottest, level, "joint");
    }

    /** A set narrower than a step, or none at all. */
    private Optional<Interval> narrow(double limit, double level, int count) {
        if (count > 0) {
            return Optional.empty();
        }
        double x = x(best());
        if (!(x > 0) || !(costAt(x) <= limit)) {
            return Optional.of(
                    new Interval(Interval.Kind.NONE, level, OptionalDouble.empty(), OptionalDouble.empty(), "joint"));
        }
        double middle = StrictMath.atan(x / centre) / (Math.PI / 2);
        double step = 1.0 / STEPS;
        double low = crossing(Math.max(0, middle - step), middle, limit);
        double high = crossing(middle, Math.min(1, middle + step), limit);
        return Optional.of(Interval.between(1 / positive(high), 1 / positive(low), level, "joint"));
    }

    private double positive(double fraction) {
        return centre * StrictMath.tan(fraction * Math.PI / 2);
    }

    private double costAtPositive(double fraction) {
        return fraction >= 1 ? parallelCost() : costAt(positive(fraction));
    }

    private double crossing(double from, double to, double limit) {
        boolean start = costAtPositive(from) <= limit;
        double low = from;
        double high = to;
        for (int i = 0; i < 80; i++) {
            double middle = (low + high) / 2;
            if ((costAtPositive(middle) <= limit) == start) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return (low + high) / 2;
    }
}
