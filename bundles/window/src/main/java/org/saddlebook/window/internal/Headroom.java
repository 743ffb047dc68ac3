package org.saddlebook.window.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.spontaneity.api.EquilibriumStart;

/**
 * How far above its floor each limit is, in J/mol: {@code −ΔG}; {@code RT ln(t_limit/t)}, inverted for a hold time;
 * {@code RT ln} of the odds limit/actual for a share and for an equilibrium conversion. All but the reversible rate law are
 * linear in ln k, ΔH, ΔS and the two parameters of a stated barrier; of a course of temperature
 * {@code RT ln(∫k dt / needed)}, which is not linear either.
 */
final class Headroom {
    /**
     * The headroom of one limit at one temperature as a linear form of deviations from the best estimates.
     *
     * @param base headroom at the best estimates
     * @param ofRate d/d ln k
     * @param ofEnthalpy d/dΔH
     * @param ofEntropy d/dΔS
     * @param stated index of the stated barrier; −1 for none
     * @param ofEnergy d/d its energy
     * @param ofSecond d/d its second parameter
     * @param reversible the time of a reversible law, whose headroom is not linear; null for all others
     * @param course what is integrated over a course of temperature, not linear either; null for all others
     */
    record Form(
            double base,
            double ofRate,
            double ofEnthalpy,
            double ofEntropy,
            int stated,
            double ofEnergy,
            double ofSecond,
            ReversibleTime reversible,
            CourseProgress course) {
        Form(
                double base,
                double ofRate,
                double ofEnthalpy,
                double ofEntropy,
                int stated,
                double ofEnergy,
                double ofSecond,
                ReversibleTime reversible) {
            this(base, ofRate, ofEnthalpy, ofEntropy, stated, ofEnergy, ofSecond, reversible, null);
        }
    }

    private final List<Limit> limits;
    private final Optional<Thermo> thermo;
    private final Optional<EquilibriumStart> start;
    private final List<StatedBarrier> stated = new ArrayList<>();
    private final int[] statedIndex;
    private final ReversibleTime[] reversible;

    /**
     * Headroom of limits.
     *
     * @param limits limits without walls of the equipment, which have no headroom
     */
    Headroom(List<Limit> limits, Optional<Thermo> thermo) {
        this(limits, thermo, Optional.empty());
    }

    /**
     * Headroom of limits.
     *
     * @param start what is there at the start, for equilibrium conversions; empty for A ⇌ B from A alone
     */
    Headroom(List<Limit> limits, Optional<Thermo> thermo, Optional<EquilibriumStart> start) {
        this.limits = List.copyOf(limits);
        this.thermo = thermo;
        this.start = start;
        statedIndex = new int[limits.size()];
        reversible = new ReversibleTime[limits.size()];
        for (int i = 0; i < statedIndex.length; i++) {
            statedIndex[i] = -1;
            Optional<StatedBarrier> barrier = limits.get(i).stated();
            if (barrier.isPresent()) {
                statedIndex[i] = stated.size();
                stated.add(barrier.get());
            }
            if (limits.get(i) instanceof Limit.Time time && !time.law().irreversible()) {
                reversible[i] = new ReversibleTime(time.conversion(), time.seconds());
            }
        }
    }

    /** ln Q where the limiting reactant is converted so far, at the standard state of the section spontaneity. */
    private double lnQuotient(double conversion) {
        return start.isPresent()
                ? start.get().extent().lnQAtConversion(conversion) - start.get().lnShift()
                : StrictMath.log(conversion / (1 - conversion));
    }

    List<Limit> limits() {
        return limits;
    }

    List<StatedBarrier> stated() {
        return stated;
    }

    Optional<Thermo> thermo() {
        return thermo;
    }

    /**
     * The form of limit i.
     *
     * @param lnRate ln k of the fitted law at this temperature; unused by limits without it
     * @param law the fitted law itself, for courses of temperature; empty where no limit needs one
     */
    Form form(int i, double kelvin, double lnRate, Optional<BoundLaw> law) {
        double thermal = Constants.GAS * kelvin;
        Limit limit = limits.get(i);
        int own = statedIndex[i];
        if (limit.course().isPresent()) {
            CourseProgress progress = CourseProgress.of(limit, kelvin, thermo);
            double base = progress.best(law);
            return new Form(base, 0, 0, 0, own, 0, 0, null, progress);
        }
        if (limit instanceof Limit.Allowed allowed) {
            double base = -thermo.orElseThrow().gibbs(kelvin) - thermal * StrictMath.log(allowed.reactionQuotient());
            return new Form(base, 0, -1, kelvin, -1, 0, 0, null);
        }
        if (limit instanceof Limit.Equilibrium equilibrium) {
            double base = -thermo.orElseThrow().gibbs(kelvin) - thermal * lnQuotient(equilibrium.conversion());
            return new Form(base, 0, -1, kelvin, -1, 0, 0, null);
        }
        if (limit instanceof Limit.Time time) {
            ReversibleTime back = reversible[i];
            if (back != null) {
                double needed = back.lnNeeded(thermo.orElseThrow().lnEquilibrium(kelvin));
                return new Form(thermal * (lnRate - needed), thermal, 0, 0, -1, 0, 0, back);
            }
            double ln = StrictMath.log(time.seconds()) + lnRate - time.law().lnProgress(time.conversion());
            return new Form(thermal * ln, thermal, 0, 0, -1, 0, 0, null);
        }
        if (limit instanceof Limit.Competing competing) {
            StatedBarrier barrier = competing.barrier();
            double s = competing.share();
            double ln = StrictMath.log(s / (1 - s)) + lnRate - barrier.lnRate(kelvin);
            return new Form(
                    thermal * ln,
                    thermal,
                    0,
                    0,
                    own,
                    -thermal * barrier.ofEnergy(kelvin),
                    -thermal * barrier.ofSecond(),
                    null);
        }
        if (limit instanceof Limit.Hold hold) {
            double progress = hold.law().lnProgress(hold.conversion());
            double floor = StrictMath.log(hold.seconds());
            if (hold.barrier().isPresent()) {
                StatedBarrier barrier = hold.barrier().get();
                return new Form(
                        thermal * (progress - barrier.lnRate(kelvin) - floor),
                        0,
                        0,
                        0,
                        own,
                        -thermal * barrier.ofEnergy(kelvin),
                        -thermal * barrier.ofSecond(),
                        null);
            }
            return new Form(thermal * (progress - lnRate - floor), -thermal, 0, 0, -1, 0, 0, null);
        }
        throw new IllegalArgumentException("no headroom: " + limit.kind());
    }
}
