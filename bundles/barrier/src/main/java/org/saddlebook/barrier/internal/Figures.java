package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.findings.Axis;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.barrier.api.NewRun;
import org.saddlebook.presentation.api.UnitText;

/**
 * The figures of the section: ln k and ln(k/T) with the laws, the joint region and the residuals of the law that carries
 * the bands.
 */
final class Figures {
    private static final int GRID = 41;

    private final RateTable table;
    private final Measurements data;
    private final double lnUnit;
    private final double level;
    private final List<Double> targets;

    Figures(RateTable table, Measurements data, double level, List<Double> targets) {
        this.table = table;
        this.data = data;
        this.lnUnit = StrictMath.log(table.rateUnit().factor());
        this.level = level;
        this.targets = targets;
    }

    /**
     * The figures.
     *
     * @param laws fitted laws
     * @param shown the law whose bands, predictions and residuals are drawn
     */
    Node.Items of(List<FittedLaw> laws, FittedLaw shown) {
        Node.Figure rates = rates(laws, shown);
        List<Node> figures = new ArrayList<>();
        figures.add(rates);
        figures.add(residuals(shown));
        figures.add(SideFigures.overTemperature(rates, table.rateUnit().code()));
        SideFigures.jointRegion(shown, level).ifPresent(figures::add);
        return new Node.Items(figures);
    }

    private Node.Figure rates(List<FittedLaw> laws, FittedLaw shown) {
        double[] grid = grid();
        List<Layer> layers = new ArrayList<>();
        if (shown.scale().isPresent()) {
            layers.add(band(Layer.Kind.NEW_RUN_BAND, shown.title() + ", new run", shown, grid, true));
            layers.add(band(Layer.Kind.CONFIDENCE_BAND, shown.title() + ", mean", shown, grid, false));
        }
        for (FittedLaw law : laws) {
            double[] x = new double[grid.length];
            double[] y = new double[grid.length];
            int count = 0;
            for (double kelvin : grid) {
                if (law.defined(kelvin)) {
                    x[count] = kelvin;
                    y[count++] = law.lnRate(kelvin).value() - lnUnit;
                }
            }
            layers.add(Layer.of(Layer.Kind.LINE, law.title(), Arrays.copyOf(x, count), Arrays.copyOf(y, count)));
        }
        layers.add(points(Layer.Kind.EXCLUDED, true));
        layers.add(points(Layer.Kind.MEASURED, false));
        if (!targets.isEmpty() && shown.scale().isPresent()) {
            double[] x = new double[targets.size()];
            for (int i = 0; i < x.length; i++) {
                x[i] = targets.get(i);
            }
            layers.add(band(Layer.Kind.PREDICTED, "predicted", shown, x, false));
        }
        layers.removeIf(layer -> layer.size() == 0);
        List<String> cautions = new ArrayList<>();
        cautions.add("same-mechanism");
        cautions.add("not-a-hazard-assessment");
        return new Node.Figure(
                "ln-rate",
                "Rate constant against temperature",
                new Axis("temperature", "K", Axis.Scale.RECIPROCAL_TEMPERATURE),
                new Axis("ln(k / " + UnitText.forPeople(table.rateUnit().code()) + ")", "1", Axis.Scale.LINEAR),
                layers,
                cautions);
    }

    private Node.Figure residuals(FittedLaw law) {
        int n = data.size();
        double[] p = law.fit().parameters();
        double[] x = data.kelvin();
        double[] y = new double[n];
        double[] low = new double[n];
        double[] high = new double[n];
        for (int i = 0; i < n; i++) {
            y[i] = data.lnRate(i) - data.lnRate(law.law(), i, p, new double[p.length]);
            low[i] = y[i] - data.relativeUncertainty(i);
            high[i] = y[i] + data.relativeUncertainty(i);
        }
        return new Node.Figure(
                "residuals",
                "Residuals of the law " + law.title(),
                new Axis("temperature", "K", Axis.Scale.RECIPROCAL_TEMPERATURE),
                new Axis("measured minus fitted ln k", "1", Axis.Scale.LINEAR),
                List.of(
                        Layer.of(Layer.Kind.HORIZONTAL_MARK, "", new double[] {x[0]}, new double[] {0}),
                        new Layer(Layer.Kind.MEASURED, "", x, y, low, high)),
                List.of());
    }

    /** A band of the mean or of a new run; where a new run may read zero, its logarithm has no lower end and no band is drawn. */
    private Layer band(Layer.Kind kind, String label, FittedLaw law, double[] grid, boolean newRun) {
        double[] x = new double[grid.length];
        double[] y = new double[grid.length];
        double[] low = new double[grid.length];
        double[] high = new double[grid.length];
        int count = 0;
        for (double kelvin : grid) {
            double[] half = newRun ? newRunHalves(law, kelvin) : meanHalves(law.lnRate(kelvin), law);
            if (Double.isFinite(half[0]) && Double.isFinite(half[1])) {
                x[count] = kelvin;
                y[count] = law.lnRate(kelvin).value() - lnUnit;
                low[count] = y[count] - half[0];
                high[count] = y[count] + half[1];
                count++;
            }
        }
        return new Layer(
                kind,
                label,
                Arrays.copyOf(x, count),
                Arrays.copyOf(y, count),
                Arrays.copyOf(low, count),
                Arrays.copyOf(high, count));
    }

    private double[] meanHalves(FittedLaw.Estimate estimate, FittedLaw law) {
        double half = estimate.halfWidth(level, law.degreesOfFreedom());
        return new double[] {half, half};
    }

    private double[] newRunHalves(FittedLaw law, double kelvin) {
        FittedLaw.Estimate estimate = law.lnRate(kelvin);
        NewRun newRun = law.newRun();
        OptionalDouble scatter = newRun.onLogarithm(law.slope(kelvin));
        if (scatter.isPresent()) {
            return meanHalves(
                    new FittedLaw.Estimate(
                            estimate.value(),
                            OptionalDouble.of(
                                    estimate.variance().orElseThrow() + scatter.getAsDouble() * scatter.getAsDouble()),
                            estimate.sharedVariance()),
                    law);
        }
        double half = estimate.halfWidth(level, law.degreesOfFreedom());
        double own =
                law.quantile(level) * newRun.rate().orElse(Double.POSITIVE_INFINITY) / StrictMath.exp(estimate.value());
        double below = length(StrictMath.expm1(-half), own);
        double above = length(StrictMath.expm1(half), own);
        return new double[] {below < 1 ? -StrictMath.log1p(-below) : Double.POSITIVE_INFINITY, StrictMath.log1p(above)};
    }

    private static double length(double a, double b) {
        return Math.sqrt(a * a + b * b);
    }

    private Layer points(Layer.Kind kind, boolean excluded) {
        List<RatePoint> chosen = new ArrayList<>();
        for (RatePoint point : table.points()) {
            if (point.excluded().isPresent() == excluded) {
                chosen.add(point);
            }
        }
        int n = chosen.size();
        double[] x = new double[n];
        double[] y = new double[n];
        double[] low = new double[n];
        double[] high = new double[n];
        for (int i = 0; i < n; i++) {
            RatePoint point = chosen.get(i);
            x[i] = point.kelvin();
            y[i] = StrictMath.log(point.rate()) - lnUnit;
            double u = point.rateUncertainty().isPresent()
                    ? point.rateUncertainty().getAsDouble() / point.rate()
                    : 0;
            low[i] = y[i] - u;
            high[i] = y[i] + u;
        }
        return new Layer(kind, excluded ? "excluded" : "measured", x, y, low, high);
    }

    /** Temperatures evenly spaced in 1/T over everything that is drawn, with a small margin, rising. */
    private double[] grid() {
        double lowest = Double.POSITIVE_INFINITY;
        double highest = 0;
        for (RatePoint point : table.points()) {
            lowest = Math.min(lowest, point.kelvin());
            highest = Math.max(highest, point.kelvin());
        }
        for (double target : targets) {
            lowest = Math.min(lowest, target);
            highest = Math.max(highest, target);
        }
        double margin = Math.max((1 / lowest - 1 / highest) * 0.04, 1e-3 / highest);
        double from = 1 / lowest + margin;
        double to = 1 / highest - margin;
        double[] grid = new double[GRID];
        for (int i = 0; i < GRID; i++) {
            grid[i] = 1 / (from + (to - from) * i / (GRID - 1));
        }
        return grid;
    }
}
