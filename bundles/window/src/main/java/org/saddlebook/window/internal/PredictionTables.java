package org.saddlebook.window.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;

/** What a practitioner reads off: rates, half-lives, times to a conversion and the factor for 10 K, with bounds. */
final class PredictionTables {
    private static final double TEN = 10;

    private final Rates rates;
    private final List<Double> kelvins;
    private final Unit rateUnit;

    PredictionTables(Rates rates, List<Double> kelvins, Unit rateUnit) {
        this.rates = rates;
        this.kelvins = kelvins;
        this.rateUnit = rateUnit;
    }

    /** k with interval, its upper bound, factor for 10 K more, distance outside the data. */
    Node.Table rates() {
        List<Node.Column> columns = List.of(
                new Node.Column("temperature", "temperature", "K"),
                new Node.Column("k", "k", ""),
                new Node.Column("kAtMost", "k, upper bound", ""),
                new Node.Column("factorPer10K", "factor for 10 K more", "1"),
                new Node.Column("extrapolation", "outside the data by", ""));
        List<List<Node>> rows = new ArrayList<>();
        for (double kelvin : kelvins) {
            Rates.Spread ln = rates.lnRate(kelvin);
            List<String> fast = rates.cautions(kelvin, "not-a-hazard-assessment");
            rows.add(List.of(
                    Node.Quantity.of(kelvin, Unit.KELVIN.code()),
                    rates.quantity(ln, rateUnit.factor(), rateUnit.code(), rates.cautions(kelvin)),
                    rates.atMost(ln, rateUnit.factor(), rateUnit.code(), fast),
                    factor(kelvin),
                    Node.Quantity.of(rates.extrapolation(kelvin), Unit.KELVIN.code())));
        }
        return new Node.Table(columns, rows);
    }

    /** {@code k(T + 10 K)/k(T)} of the preferred law: what is often taken as 2 for every reaction. */
    private Node factor(double kelvin) {
        BoundLaw.At cold = rates.best().at(kelvin);
        BoundLaw.At hot = rates.best().at(kelvin + TEN);
        double[] gradient = difference(hot.gradient(), cold.gradient());
        double[] sensor = difference(hot.sensor(), cold.sensor());
        return rates.quantity(
                rates.spread(hot.lnRate() - cold.lnRate(), gradient, sensor), 1, "1", rates.cautions(kelvin + TEN));
    }

    private static double[] difference(double[] first, double[] second) {
        double[] result = new double[first.length];
        for (int i = 0; i < result.length; i++) {
            result[i] = first[i] - second[i];
        }
        return result;
    }

    /**
     * Times to conversions: with a two-sided interval, and with the lower bound that holds for storage.
     *
     * @param reversible draws of the times for a reversible law, one limit of 1 s for each conversion; empty for others
     */
    Node.Table times(RateLaw law, List<Double> conversions, Optional<Draws> reversible, Optional<Thermo> thermo) {
        List<Node.Column> columns = List.of(
                new Node.Column("temperature", "temperature", "K"),
                new Node.Column("conversion", "conversion", "1"),
                new Node.Column("time", "time", ""),
                new Node.Column("timeAtLeast", "time, lower bound", ""),
                new Node.Column("extrapolation", "outside the data by", ""));
        List<List<Node>> rows = new ArrayList<>();
        for (double kelvin : kelvins) {
            Rates.Spread lnRate = rates.lnRate(kelvin);
            for (int i = 0; i < conversions.size(); i++) {
                double x = conversions.get(i);
                Rates.Spread ln = reversible.isPresent()
                        ? reversible(reversible.get(), i, x, kelvin, thermo.orElseThrow())
                        : lnRate.inverse(law.lnProgress(x));
                Unit unit = Words.timeUnit(StrictMath.exp(ln.value()));
                rows.add(List.of(
                        Node.Quantity.of(kelvin, Unit.KELVIN.code()),
                        new Node.Scalar(x),
                        rates.quantity(
                                ln, unit.factor(), unit.code(), rates.cautions(kelvin, "not-a-hazard-assessment")),
                        rates.atLeast(ln, unit.factor(), unit.code(), rates.cautions(kelvin, "storage-lower-bound")),
                        Node.Quantity.of(rates.extrapolation(kelvin), Unit.KELVIN.code())));
            }
        }
        return new Node.Table(columns, rows);
    }

    private Rates.Spread reversible(Draws draws, int limit, double x, double kelvin, Thermo thermo) {
        double thermal = Constants.GAS * kelvin;
        double[] drawn = draws.headroom(limit, kelvin);
        for (int i = 0; i < drawn.length; i++) {
            // Headroom of a limit of 1 s is −RT ln(t / 1 s).
            drawn[i] = -drawn[i] / thermal;
        }
        double best = ReversibleTime.lnProgress(x, thermo.lnEquilibrium(kelvin))
                - rates.best().at(kelvin).lnRate();
        return rates.ofDraws(best, drawn);
    }

    /** Draws of the times to conversions under a reversible law. */
    static Draws reversibleDraws(
            RateLaw law,
            List<Double> conversions,
            Thermo thermo,
            List<BoundLaw> laws,
            double[] weights,
            int count,
            Task task)
            throws Cancelled {
        List<Limit> limits = new ArrayList<>();
        for (double x : conversions) {
            limits.add(new Limit.Time("time", "time", "", x, 1, law));
        }
        Headroom headroom = new Headroom(limits, Optional.of(thermo));
        return Draws.make(headroom, Limit.Equipment.none(), laws, weights, count, task);
    }
}
