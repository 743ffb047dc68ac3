package org.saddlebook.spontaneity.internal;

import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.estimation.api.Fieller;
import org.saddlebook.estimation.api.RatioSet;

/**
 * The crossover temperature {@code T* = ΔH/ΔS} and the set of temperatures above 0 K that it may be: all T with
 * {@code (ΔH − TΔS)² ≤ q² u²(ΔG(T))}. The set, of whatever kind, covers with the stated probability; its bounded cases
 * alone do not.
 *
 * <p>Source: E. C. Fieller, J. R. Stat. Soc. B 16 (1954) 175.
 *
 * @param outcome kind of the set
 * @param kelvin ΔH/ΔS, K; empty when it does not lie above 0 K
 * @param standardUncertainty first-order propagation (JCGM 100:2008, 5.2.2), K; present for bounded sets only
 * @param interval the set, K; empty when nothing is uncertain
 */
record Crossover(
        Outcome outcome, OptionalDouble kelvin, OptionalDouble standardUncertainty, Optional<Interval> interval) {
    private static final String METHOD = "fieller";

    /** What can be said; {@code word} is the word in files. */
    enum Outcome {
        /** From one temperature to another; the lower may be 0 K. */
        BOUNDED("bounded"),
        /** One or two rays: not bounded above. */
        UNBOUNDED("unbounded"),
        /** Every temperature is possible. */
        UNDETERMINED("not determined"),
        /** No temperature above 0 K is possible. */
        NONE("no crossover above 0 K");

        private final String word;

        Outcome(String word) {
            this.word = word;
        }

        String word() {
            return word;
        }
    }

    /**
     * The crossover of what was stated.
     *
     * @param quantile two-sided quantile of the level
     * @param level coverage probability
     */
    static Crossover of(Stated s, double quantile, double level) {
        OptionalDouble ratio = ratio(s);
        if (s.exact()) {
            boolean everywhere = s.enthalpy() == 0 && s.entropy() == 0;
            Outcome outcome = everywhere ? Outcome.UNDETERMINED : ratio.isPresent() ? Outcome.BOUNDED : Outcome.NONE;
            return new Crossover(outcome, ratio, OptionalDouble.empty(), Optional.empty());
        }
        Interval interval = aboveZero(set(s, quantile), level);
        Outcome outcome = outcome(interval.kind());
        OptionalDouble u = outcome == Outcome.BOUNDED && ratio.isPresent()
                ? OptionalDouble.of(propagated(s, ratio.getAsDouble()))
                : OptionalDouble.empty();
        return new Crossover(
                outcome, outcome == Outcome.NONE ? OptionalDouble.empty() : ratio, u, Optional.of(interval));
    }

    private static OptionalDouble ratio(Stated s) {
        double ratio = s.enthalpy() / s.entropy();
        return ratio > 0 && Double.isFinite(ratio) ? OptionalDouble.of(ratio) : OptionalDouble.empty();
    }

    /** The empty set, which a ratio of two uncertain numbers never has, is null. */
    private static RatioSet set(Stated s, double quantile) {
        if (s.entropy() == 0 && s.varianceOfEntropy() == 0) {
            // ΔG does not vary with temperature: it is zero everywhere or nowhere.
            double half = quantile * s.enthalpyUncertainty().orElse(0);
            return Math.abs(s.enthalpy()) > half ? new RatioSet.AtMost(0) : new RatioSet.WholeLine();
        }
        return Fieller.set(
                s.enthalpy(),
                s.entropy(),
                s.varianceOfEnthalpy(),
                s.covarianceOrZero(),
                s.varianceOfEntropy(),
                quantile);
    }

    /** u²(T*) = u²(ΔG(T*))/ΔS². */
    private static double propagated(Stated s, double kelvin) {
        return Math.sqrt(s.varianceOfGibbs(kelvin)) / Math.abs(s.entropy());
    }

    /** The part of a set that lies above 0 K. */
    static Interval aboveZero(RatioSet set, double level) {
        if (set instanceof RatioSet.Bounded bounded) {
            return between(bounded.lower(), bounded.upper(), level);
        }
        if (set instanceof RatioSet.TwoRays rays) {
            return rays.lowerRayEnd() > 0
                    ? new Interval(
                            Interval.Kind.OUTSIDE,
                            level,
                            OptionalDouble.of(rays.lowerRayEnd()),
                            OptionalDouble.of(rays.upperRayStart()),
                            METHOD)
                    : atLeast(rays.upperRayStart(), level);
        }
        if (set instanceof RatioSet.AtLeast ray) {
            return atLeast(ray.lower(), level);
        }
        if (set instanceof RatioSet.AtMost ray) {
            return between(Double.NEGATIVE_INFINITY, ray.upper(), level);
        }
        return Interval.everything(level, METHOD);
    }

    private static Interval between(double lower, double upper, double level) {
        if (!(upper > 0)) {
            return new Interval(Interval.Kind.NONE, level, OptionalDouble.empty(), OptionalDouble.empty(), METHOD);
        }
        return lower > 0
                ? Interval.between(lower, upper, level, METHOD)
                : new Interval(Interval.Kind.AT_MOST, level, OptionalDouble.empty(), OptionalDouble.of(upper), METHOD);
    }

    private static Interval atLeast(double lower, double level) {
        return lower > 0
                ? new Interval(Interval.Kind.AT_LEAST, level, OptionalDouble.of(lower), OptionalDouble.empty(), METHOD)
                : Interval.everything(level, METHOD);
    }

    private static Outcome outcome(Interval.Kind kind) {
        return switch (kind) {
            case BETWEEN, AT_MOST -> Outcome.BOUNDED;
            case AT_LEAST, OUTSIDE -> Outcome.UNBOUNDED;
            case EVERYTHING -> Outcome.UNDETERMINED;
            case NONE -> Outcome.NONE;
        };
    }
}
