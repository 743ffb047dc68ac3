package org.saddlebook.spontaneity.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.quantity.Constants;

/**
 * The temperatures that are looked at, K.
 *
 * @param lower lower end of table and figure
 * @param upper upper end
 */
record Temperatures(double lower, double upper) {
    /** Temperatures above this are not looked at, K: no molecule lives there. */
    static final double HOTTEST = 100_000;

    private static final double MARGIN = 25;
    private static final double ROUND = 10;
    private static final double LEAST_SPAN = 100;
    private static final int ROWS = 8;
    private static final int GRID = 60;

    /** Crossovers beyond this are left to the number; a figure that reached them would show nothing else. */
    private static final double FARTHEST_CROSSOVER = 2000;

    /** The stated range; else what the campaign is about, 298.15 K and the crossover, with a margin. */
    static Temperatures of(Stated stated, Campaign campaign, Crossover crossover) {
        if (stated.lowerKelvin().isPresent()) {
            return new Temperatures(
                    stated.lowerKelvin().getAsDouble(), stated.upperKelvin().getAsDouble());
        }
        double low = Constants.REFERENCE_KELVIN;
        double high = Constants.REFERENCE_KELVIN;
        List<Double> wanted = new ArrayList<>(sensible(campaign.choices().targetsKelvin()));
        if (campaign.rateTable().isPresent()) {
            for (RatePoint point : campaign.rateTable().get().points()) {
                wanted.add(Math.min(HOTTEST, point.kelvin()));
            }
        }
        if (crossover.kelvin().isPresent() && crossover.kelvin().getAsDouble() <= FARTHEST_CROSSOVER) {
            wanted.add(crossover.kelvin().getAsDouble());
        }
        for (double kelvin : wanted) {
            low = Math.min(low, kelvin);
            high = Math.max(high, kelvin);
        }
        low = Math.floor((low - MARGIN) / ROUND) * ROUND;
        high = Math.ceil((high + MARGIN) / ROUND) * ROUND;
        double missing = LEAST_SPAN - (high - low);
        if (missing > 0) {
            low -= missing / 2;
            high += missing / 2;
        }
        return new Temperatures(Math.max(ROUND, low), high);
    }

    /** Evenly spaced, for the figure. */
    double[] grid() {
        return spaced(GRID);
    }

    /** For the table: evenly spaced, 298.15 K where it lies inside, and every temperature asked for. */
    List<Double> rows(List<Double> targets) {
        TreeSet<Double> all = new TreeSet<>();
        for (double kelvin : spaced(ROWS)) {
            all.add(kelvin);
        }
        if (contains(Constants.REFERENCE_KELVIN)) {
            all.add(Constants.REFERENCE_KELVIN);
        }
        all.addAll(sensible(targets));
        return List.copyOf(all);
    }

    static List<Double> sensible(List<Double> kelvins) {
        List<Double> kept = new ArrayList<>();
        for (double kelvin : kelvins) {
            if (kelvin <= HOTTEST) {
                kept.add(kelvin);
            }
        }
        return kept;
    }

    boolean contains(double kelvin) {
        return kelvin >= lower && kelvin <= upper;
    }

    private double[] spaced(int steps) {
        double[] kelvins = new double[steps + 1];
        for (int i = 0; i <= steps; i++) {
            kelvins[i] = i == steps ? upper : lower + (upper - lower) * i / steps;
        }
        return kelvins;
    }
}
