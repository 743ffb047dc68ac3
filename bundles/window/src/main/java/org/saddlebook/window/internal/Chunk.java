package org.saddlebook.window.internal;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.random.RandomGenerator;
import org.saddlebook.api.quantity.Constants;

/**
 * Some of the random draws, all of one law: deviations from the best estimates in columns, so that a temperature costs a
 * few passes over arrays that stay in the fastest cache.
 */
final class Chunk {
    private final Optional<BoundLaw> law;
    private final int size;
    private final double[][] parameters;
    private final double[][] shared;
    private final double[][] thermo;
    private final double[][][] stated;

    /**
     * Draws.
     *
     * @param law the law these draws follow; empty where no limit needs one
     */
    Chunk(
            int size,
            RandomGenerator random,
            Optional<BoundLaw> law,
            Optional<Thermo> thermo,
            List<StatedBarrier> stated) {
        this.law = law;
        this.size = size;
        int own = law.isPresent() ? law.get().parameters() : 0;
        int causes = law.isPresent() ? law.get().sharedErrors() : 0;
        parameters = new double[own][size];
        shared = new double[causes][size];
        if (law.isPresent()) {
            law.get().source().draw(random, parameters);
            for (int c = 0; c < causes; c++) {
                for (int d = 0; d < size; d++) {
                    double error = random.nextGaussian();
                    shared[c][d] = error;
                    for (int i = 0; i < own; i++) {
                        parameters[i][d] += error * law.get().shift(c, i);
                    }
                }
            }
        }
        this.thermo = new double[thermo.isPresent() ? 2 : 0][size];
        if (thermo.isPresent()) {
            thermo.get().source().draw(random, this.thermo);
        }
        this.stated = new double[stated.size()][2][size];
        for (int s = 0; s < this.stated.length; s++) {
            stated.get(s).source().draw(random, this.stated[s]);
        }
    }

    /** Deviations of ΔH and ΔS, {@code [which][draw]}. */
    double[][] thermo() {
        return thermo;
    }

    /** Deviations of the two parameters of a stated barrier, {@code [which][draw]}. */
    double[][] stated(int barrier) {
        return stated[barrier];
    }

    int size() {
        return size;
    }

    Optional<BoundLaw> law() {
        return law;
    }

    /** Deviation of ln k from its best estimate, for every draw; NaN where the law has no value. */
    void rates(BoundLaw.At at, double[] rates) {
        Arrays.fill(rates, 0);
        BoundLaw own = law.orElseThrow();
        if (own.linear()) {
            for (int i = 0; i < parameters.length; i++) {
                add(rates, at.gradient()[i], parameters[i]);
            }
        } else {
            double[] deviation = new double[parameters.length];
            double[] scratch = new double[parameters.length];
            double[] unused = new double[parameters.length];
            for (int d = 0; d < size; d++) {
                for (int i = 0; i < deviation.length; i++) {
                    deviation[i] = parameters[i][d];
                }
                rates[d] = own.lnRate(at.kelvin(), deviation, scratch, unused) - at.lnRate();
            }
        }
        if (own.movesTarget()) {
            for (int c = 0; c < shared.length; c++) {
                add(rates, at.sensor()[c], shared[c]);
            }
        }
    }

    /**
     * Headroom of one limit for every draw, J/mol.
     *
     * @param rates deviations of ln k
     * @param exact whether the value matters, not only its sign
     */
    void headroom(
            Headroom.Form form,
            double kelvin,
            double lnRate,
            Optional<Thermo> best,
            double[] rates,
            boolean exact,
            double[] headroom) {
        if (form.course() != null) {
            form.course().headroom(this, form.stated(), exact, headroom);
            return;
        }
        if (form.reversible() != null) {
            reversible(form.reversible(), kelvin, lnRate, best.orElseThrow(), rates, exact, headroom);
            return;
        }
        Arrays.fill(headroom, form.base());
        if (form.ofRate() != 0) {
            add(headroom, form.ofRate(), rates);
        }
        if (form.ofEnthalpy() != 0) {
            add(headroom, form.ofEnthalpy(), thermo[0]);
            add(headroom, form.ofEntropy(), thermo[1]);
        }
        if (form.stated() >= 0) {
            add(headroom, form.ofEnergy(), stated[form.stated()][0]);
            add(headroom, form.ofSecond(), stated[form.stated()][1]);
        }
    }

    private void reversible(
            ReversibleTime time,
            double kelvin,
            double lnRate,
            Thermo best,
            double[] rates,
            boolean exact,
            double[] headroom) {
        double thermal = Constants.GAS * kelvin;
        double center = best.lnEquilibrium(kelvin);
        double ofEnthalpy = -1 / thermal;
        double ofEntropy = 1 / Constants.GAS;
        for (int d = 0; d < size; d++) {
            double lnEquilibrium = center + ofEnthalpy * thermo[0][d] + ofEntropy * thermo[1][d];
            double own = lnRate + rates[d];
            headroom[d] =
                    exact ? thermal * (own - time.lnNeeded(lnEquilibrium)) : time.holds(own, lnEquilibrium) ? 1 : -1;
        }
    }

    private static void add(double[] sum, double coefficient, double[] column) {
        for (int d = 0; d < sum.length; d++) {
            sum[d] += coefficient * column[d];
        }
    }
}
