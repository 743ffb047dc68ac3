package org.saddlebook.reaction.series.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.api.findings.Axis;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Unit;

/**
 * k of every reaction against 1/T: the line over the range of all of them, so that they can be compared, and the interval of
 * the mean where the reaction was measured.
 */
final class SeriesFigure {
    private static final int STEPS = 48;

    private SeriesFigure() {}

    static Node.Figure of(JointFit fit, double level) {
        Unit unit = fit.reactions().get(0).unit();
        List<Layer> layers = new ArrayList<>();
        List<Layer> points = new ArrayList<>();
        double quantile = fit.scale().quantile(level);
        double s = Math.sqrt(fit.scale().variance());
        double lowest = Double.POSITIVE_INFINITY;
        double highest = 0;
        for (Reaction reaction : fit.reactions()) {
            lowest = Math.min(lowest, reaction.lowest());
            highest = Math.max(highest, reaction.highest());
        }
        for (int r = 0; r < fit.lines().size(); r++) {
            Reaction reaction = fit.reactions().get(r);
            ReactionLine line = fit.lines().get(r);
            double[] kelvin = new double[STEPS + 1];
            double[] middle = new double[STEPS + 1];
            double[] lower = new double[STEPS + 1];
            double[] upper = new double[STEPS + 1];
            double cold = 1 / reaction.lowest();
            double hot = 1 / reaction.highest();
            for (int i = 0; i <= STEPS; i++) {
                double x = cold + (hot - cold) * i / STEPS;
                double half = quantile * s * Math.sqrt(line.variance(x));
                kelvin[i] = 1 / x;
                middle[i] = StrictMath.exp(line.at(x)) / unit.factor();
                lower[i] = StrictMath.exp(line.at(x) - half) / unit.factor();
                upper[i] = StrictMath.exp(line.at(x) + half) / unit.factor();
            }
            layers.add(new Layer(Layer.Kind.CONFIDENCE_BAND, "", kelvin, middle, lower, upper));
            double[] ends = new double[STEPS + 1];
            double[] height = new double[STEPS + 1];
            for (int i = 0; i <= STEPS; i++) {
                double x = 1 / lowest + (1 / highest - 1 / lowest) * i / STEPS;
                ends[i] = 1 / x;
                height[i] = StrictMath.exp(line.at(x)) / unit.factor();
            }
            layers.add(Layer.of(Layer.Kind.LINE, reaction.name(), ends, height));
            double[] t = new double[reaction.size()];
            double[] k = new double[reaction.size()];
            for (int i = 0; i < t.length; i++) {
                t[i] = reaction.kelvin(i);
                k[i] = StrictMath.exp(reaction.lnRate(i)) / unit.factor();
            }
            points.add(Layer.of(Layer.Kind.MEASURED, reaction.name(), t, k));
        }
        layers.addAll(points);
        return new Node.Figure(
                "series",
                "Rate constants of the reactions",
                new Axis("temperature", "K", Axis.Scale.RECIPROCAL_TEMPERATURE),
                new Axis("k", unit.code(), Axis.Scale.LOGARITHMIC),
                layers,
                List.of());
    }
}
