package org.saddlebook.reaction.series.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.quantity.Unit;

/** The used rate constants of one reaction: ln k (SI) against 1/T. Arrays are copied in and out. */
final class Reaction {
    private final String name;
    private final Unit unit;
    private final double order;
    private final double[] kelvin;
    private final double[] lnRate;
    private final Optional<double[]> lnUncertainty;

    private Reaction(
            String name, Unit unit, double order, double[] kelvin, double[] lnRate, Optional<double[]> lnUncertainty) {
        this.name = name;
        this.unit = unit;
        this.order = order;
        this.kelvin = kelvin;
        this.lnRate = lnRate;
        this.lnUncertainty = lnUncertainty;
    }

    /** The used points of a table. */
    static Reaction of(String name, RateTable table) {
        List<RatePoint> used = new ArrayList<>(table.used());
        int n = used.size();
        double[] kelvin = new double[n];
        double[] lnRate = new double[n];
        double[] uncertainty = new double[n];
        boolean stated = n > 0;
        for (int i = 0; i < n; i++) {
            RatePoint point = used.get(i);
            kelvin[i] = point.kelvin();
            lnRate[i] = StrictMath.log(point.rate());
            stated &= point.rateUncertainty().isPresent();
            uncertainty[i] = point.rateUncertainty().orElse(0) / point.rate();
        }
        return new Reaction(
                name,
                table.rateUnit(),
                table.order(),
                kelvin,
                lnRate,
                stated ? Optional.of(uncertainty) : Optional.empty());
    }

    String name() {
        return name;
    }

    Unit unit() {
        return unit;
    }

    double order() {
        return order;
    }

    int size() {
        return kelvin.length;
    }

    double kelvin(int i) {
        return kelvin[i];
    }

    double lnRate(int i) {
        return lnRate[i];
    }

    /** Relative standard uncertainties; absent unless every point states one. */
    Optional<double[]> lnUncertainty() {
        return lnUncertainty.map(double[]::clone);
    }

    double lowest() {
        double lowest = kelvin[0];
        for (double each : kelvin) {
            lowest = Math.min(lowest, each);
        }
        return lowest;
    }

    double highest() {
        double highest = kelvin[0];
        for (double each : kelvin) {
            highest = Math.max(highest, each);
        }
        return highest;
    }
}
