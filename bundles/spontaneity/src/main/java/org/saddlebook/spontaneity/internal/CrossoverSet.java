package org.saddlebook.spontaneity.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Interval;

/**
 * The temperatures around a crossover that the data do not exclude: the connected part of
 * {@code {T : ΔG(T)² ≤ q² u²(ΔG(T))}} that holds it. With uncertain ΔH and ΔS and a known heat capacity this is the
 * construction of E. C. Fieller, J. R. Stat. Soc. B 16 (1954) 175, carried over: the set of all such T covers at the level,
 * whatever the heat capacity does.
 */
final class CrossoverSet {
    static final String METHOD = "fieller";

    /** Each monotone step is looked at in this many parts. */
    private static final int PARTS = 16;

    private final ReactionFunction function;
    private final double quantile;
    private final List<Double> grid = new ArrayList<>();

    CrossoverSet(ReactionFunction function, double quantile) {
        this.function = function;
        this.quantile = quantile;
        List<Double> steps = CrossoverSearch.steps(function);
        for (int i = 0; i + 1 < steps.size(); i++) {
            for (int k = 0; k < PARTS; k++) {
                grid.add(steps.get(i) + (steps.get(i + 1) - steps.get(i)) * k / PARTS);
            }
        }
        grid.add(steps.get(steps.size() - 1));
    }

    /** Positive where a crossover is excluded. */
    private double excess(double kelvin) {
        return Math.abs(function.gibbs(kelvin)) - quantile * function.uncertaintyOfGibbs(kelvin);
    }

    /** Whether the sign of ΔG is open anywhere in the range. */
    boolean touchesZero() {
        for (double kelvin : grid) {
            if (excess(kelvin) <= 0) {
                return true;
            }
        }
        return false;
    }

    /** The connected set around a crossover; open where it reaches the end of the range. */
    Interval around(double kelvin, double level) {
        OptionalDouble lower = OptionalDouble.empty();
        OptionalDouble upper = OptionalDouble.empty();
        double inside = kelvin;
        for (int i = grid.size() - 1; i >= 0 && lower.isEmpty(); i--) {
            double at = grid.get(i);
            if (at < kelvin) {
                if (excess(at) > 0) {
                    lower = OptionalDouble.of(Zeros.between(this::excess, at, inside, 1));
                }
                inside = at;
            }
        }
        inside = kelvin;
        for (int i = 0; i < grid.size() && upper.isEmpty(); i++) {
            double at = grid.get(i);
            if (at > kelvin) {
                if (excess(at) > 0) {
                    upper = OptionalDouble.of(Zeros.between(this::excess, inside, at, -1));
                }
                inside = at;
            }
        }
        Interval.Kind kind = lower.isPresent()
                ? (upper.isPresent() ? Interval.Kind.BETWEEN : Interval.Kind.AT_LEAST)
                : (upper.isPresent() ? Interval.Kind.AT_MOST : Interval.Kind.EVERYTHING);
        return new Interval(kind, level, lower, upper, METHOD);
    }
}
