package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Node;
import org.saddlebook.estimation.api.FisherF;
import org.saddlebook.estimation.api.StudentT;

/**
 * What to measure next for the rate constant at a target: the temperature and number of repeats that narrow its interval
 * most per instrument time, and how many runs reach the tolerance. One run at T adds {@code w g g'} to the information
 * about the parameters, g the gradient of ln k there, so the variance at the target falls by
 * {@code r w (c'Vg)^2 / (1 + r w g'Vg)} for r repeats (A. C. Atkinson, A. N. Donev and R. D. Tobias, Optimum Experimental
 * Designs, with SAS, Oxford 2007, chapter 11); half-widths take the t quantile of the enlarged degrees of freedom. The scale
 * that r more runs will estimate is unknown: from s with nu degrees of freedom it becomes
 * {@code s sqrt((nu + r F) / (nu + r))}, F distributed as F(r, nu), and the promise takes its median. Errors common to all runs do not fall with their number and stay in the promise.
 */
final class NextMeasurement {
    private static final int MOST_REPEATS = 6;
    private static final int MOST_RUNS = 200;
    private static final double STEP = 1;

    private final FittedLaw law;
    private final double level;
    private final double goal;
    private final boolean onSameSensor;
    private final double[] temperatures;
    private final boolean equalCost;
    private final double[] changes = new double[MOST_RUNS + 1];

    /**
     * Where and at what cost one may measure.
     *
     * @param fromKelvin lowest allowed temperature; the lowest measured one when absent
     * @param toKelvin highest allowed temperature; the highest measured one when absent
     * @param equalCost whether every run costs the same; else a run costs time in proportion to the half-life there
     */
    record Allowed(OptionalDouble fromKelvin, OptionalDouble toKelvin, boolean equalCost) {}

    /** A plan for a law that has a scale; the tolerance is exp(half-width) - 1. */
    NextMeasurement(FittedLaw law, double level, double tolerance, boolean onSameSensor, Allowed allowed) {
        this.law = law;
        this.level = level;
        this.goal = StrictMath.log1p(tolerance);
        this.onSameSensor = onSameSensor;
        this.equalCost = allowed.equalCost();
        double from = allowed.fromKelvin().orElse(law.data().lowestKelvin());
        double to = Math.max(from, allowed.toKelvin().orElse(law.data().highestKelvin()));
        int steps = (int) Math.floor((to - from) / STEP);
        temperatures = new double[steps + (from + steps * STEP < to ? 2 : 1)];
        for (int i = 0; i < temperatures.length; i++) {
            temperatures[i] = Math.min(from + i * STEP, to);
        }
    }

    /** What is known about the parameters: the covariance of unit scale and the number of runs added so far. */
    private static final class State {
        private final double[][] covariance;
        private final int added;

        State(double[][] covariance, int added) {
            this.covariance = covariance;
            this.added = added;
        }

        int added() {
            return added;
        }

        double form(double[] left, double[] right) {
            double sum = 0;
            for (int i = 0; i < left.length; i++) {
                for (int j = 0; j < right.length; j++) {
                    sum += left[i] * covariance[i][j] * right[j];
                }
            }
            return sum;
        }

        State with(double[] g, double weight, int repeats) {
            int p = g.length;
            double[] image = new double[p];
            for (int i = 0; i < p; i++) {
                for (int j = 0; j < p; j++) {
                    image[i] += covariance[i][j] * g[j];
                }
            }
            double denominator = 1 / (repeats * weight) + form(g, g);
            double[][] next = new double[p][p];
            for (int i = 0; i < p; i++) {
                for (int j = 0; j < p; j++) {
                    next[i][j] = covariance[i][j] - image[i] * image[j] / denominator;
                }
            }
            return new State(next, added + repeats);
        }
    }

    /** Runs to make; {@code halfWidth} is promised for ln k at the target. */
    record Plan(double kelvin, int repeats, double halfWidth, double cost, double merit) {}

    /** The plan for one target, K. */
    Node.Group node(double targetKelvin) {
        double[] c = gradient(targetKelvin);
        double shared = law.lnRate(targetKelvin, onSameSensor).sharedVariance();
        State now = new State(law.fit().unscaledCovariance(), 0);
        double present = halfWidth(now, c, shared);
        Tree tree = new Tree()
                .put("temperature", Node.Quantity.of(targetKelvin, "K"))
                .put("model", law.id())
                .put("goal", StrictMath.expm1(goal))
                .put("present", StrictMath.expm1(present));
        if (present <= goal) {
            return tree.put("outcome", "reached")
                    .put("advice", "Stop: the interval of k already meets the tolerance.")
                    .group();
        }
        Plan best = best(now, c, shared, present);
        tree.put("outcome", "measure")
                .put("next", Node.Quantity.of(best.kelvin(), "K"))
                .put("repeats", best.repeats())
                .put("promised", StrictMath.expm1(best.halfWidth()))
                .put("relativeCost", best.cost());
        List<String> notes = new ArrayList<>();
        int needed = runsNeeded(now, c, shared, present);
        if (needed > 0) {
            tree.put("runsNeeded", needed);
        } else {
            notes.add(
                    shared > 0 && sharedAlone(shared) > goal
                            ? "No number of runs reaches the tolerance: the errors common to all runs alone exceed it."
                            : "More than " + MOST_RUNS + " runs would be needed within the allowed temperatures.");
        }
        if (!hasMiddle()) {
            notes.add("Keep one run near the middle of the range, "
                    + Words.kelvin(law.data().centreKelvin()) + ": runs at the ends alone cannot show curvature.");
        }
        notes.add(
                equalCost
                        ? "Every run is taken to cost the same."
                        : "A run is taken to cost time in proportion to the half-life at its temperature; relative cost 1 is a run"
                                + " at the centre of the table.");
        return tree.put("notes", Tree.texts(notes)).group();
    }

    private Plan best(State state, double[] c, double shared, double present) {
        Plan best = null;
        for (double kelvin : temperatures) {
            double[] g = gradient(kelvin);
            double weight = weight(kelvin);
            for (int repeats = 1; repeats <= MOST_REPEATS; repeats++) {
                double half = halfWidth(state.with(g, weight, repeats), c, shared);
                double cost = repeats * cost(kelvin);
                double merit = StrictMath.log(present / half) / cost;
                if (best == null || merit > best.merit()) {
                    best = new Plan(kelvin, repeats, half, cost, merit);
                }
            }
        }
        return best;
    }

    /** Runs until the tolerance is met, each where it narrows the interval most, whatever it costs; 0 when too many. */
    private int runsNeeded(State start, double[] c, double shared, double present) {
        State state = start;
        double half = present;
        while (half > goal && state.added() < MOST_RUNS) {
            state = narrowest(state, c).after();
            half = halfWidth(state, c, shared);
        }
        return half <= goal ? state.added() : 0;
    }

    private record Run(double kelvin, State after) {}

    /** One run where it narrows the interval most, whatever it costs. */
    private Run narrowest(State state, double[] c) {
        Run best = null;
        double smallest = Double.POSITIVE_INFINITY;
        for (double kelvin : temperatures) {
            State tried = state.with(gradient(kelvin), weight(kelvin), 1);
            double variance = tried.form(c, c);
            if (best == null || variance < smallest) {
                smallest = variance;
                best = new Run(kelvin, tried);
            }
        }
        return best;
    }

    /** Temperatures of so many runs, each where it narrows the interval at the target most, whatever it costs; K. */
    double[] sequence(double targetKelvin, int runs) {
        double[] c = gradient(targetKelvin);
        State state = new State(law.fit().unscaledCovariance(), 0);
        double[] kelvin = new double[runs];
        for (int i = 0; i < runs; i++) {
            Run next = narrowest(state, c);
            kelvin[i] = next.kelvin();
            state = next.after();
        }
        return kelvin;
    }

    /** The best next runs; their half-width is that of ln k. */
    Plan plan(double targetKelvin) {
        double[] c = gradient(targetKelvin);
        double shared = law.lnRate(targetKelvin, onSameSensor).sharedVariance();
        State now = new State(law.fit().unscaledCovariance(), 0);
        return best(now, c, shared, halfWidth(now, c, shared));
    }

    private double halfWidth(State state, double[] c, double shared) {
        double variance = state.form(c, c) * law.scale().orElseThrow() * change(state.added());
        OptionalDouble dof = law.degreesOfFreedom().isPresent()
                ? OptionalDouble.of(law.degreesOfFreedom().getAsDouble() + state.added())
                : OptionalDouble.empty();
        if (shared > 0 || dof.isEmpty()) {
            return new FittedLaw.Estimate(0, OptionalDouble.of(variance), shared).halfWidth(level, dof);
        }
        return StudentT.quantile(0.5 + level / 2, dof.getAsDouble()) * Math.sqrt(variance);
    }

    /** The median of the estimated scale after so many more runs, over the present one. */
    private double change(int added) {
        if (added == 0 || law.data().stated()) {
            return 1;
        }
        if (!(changes[added] > 0)) {
            int dof = law.fit().degreesOfFreedom();
            changes[added] = (dof + added * FisherF.quantile(0.5, added, dof)) / (dof + added);
        }
        return changes[added];
    }

    private double sharedAlone(double shared) {
        return FittedLaw.quantile(level, OptionalDouble.empty()) * Math.sqrt(shared);
    }

    private double[] gradient(double kelvin) {
        double[] gradient = new double[law.fit().parameterCount()];
        law.law().lnRate(kelvin, law.fit().parameters(), gradient);
        return gradient;
    }

    /** Weight of one run on ln k in the units of the fit. */
    private double weight(double kelvin) {
        if (law.data().stated()) {
            double u = law.newRun().onLogarithm(law.slope(kelvin)).orElseThrow();
            return 1 / (u * u);
        }
        if (law.data().response() == Measurements.Response.LN_RATE) {
            return 1;
        }
        // On k, in units of the first measured one, a run at T weighs (d k / d ln k)^2 = k^2 times its weight on k.
        double k = StrictMath.exp(law.lnRate(kelvin).value() - law.data().lnRate(0));
        return k * k;
    }

    private double cost(double kelvin) {
        return equalCost
                ? 1
                : StrictMath.exp(law.lnRate(law.data().centreKelvin()).value()
                        - law.lnRate(kelvin).value());
    }

    /** Whether a measured temperature lies in the middle third of the range in 1/T. */
    private boolean hasMiddle() {
        double hot = 1 / law.data().highestKelvin();
        double cold = 1 / law.data().lowestKelvin();
        for (double kelvin : law.data().kelvin()) {
            double share = (1 / kelvin - hot) / (cold - hot);
            if (share > 1.0 / 3 && share < 2.0 / 3) {
                return true;
            }
        }
        return false;
    }
}
