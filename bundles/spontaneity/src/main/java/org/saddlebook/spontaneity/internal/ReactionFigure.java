package org.saddlebook.spontaneity.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.api.findings.Axis;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.presentation.api.Rounding;

/** ΔG of a reaction against temperature. */
final class ReactionFigure {
    private static final int GRID = 120;

    private final ReactionFunction function;
    private final double quantile;
    private final boolean uncertain;

    ReactionFigure(ReactionFunction function, double quantile, boolean uncertain) {
        this.function = function;
        this.quantile = quantile;
        this.uncertain = uncertain;
    }

    Node.Figure figure(double level, List<Root> roots, List<String> cautions) {
        double[] x = new double[GRID + 1];
        double[] y = new double[x.length];
        double[] low = new double[x.length];
        double[] high = new double[x.length];
        for (int i = 0; i < x.length; i++) {
            x[i] = i == GRID ? function.upper() : function.lower() + (function.upper() - function.lower()) * i / GRID;
            double half = quantile * function.uncertaintyOfGibbs(x[i]);
            y[i] = function.gibbs(x[i]) / 1000;
            low[i] = y[i] - half / 1000;
            high[i] = y[i] + half / 1000;
        }
        List<Layer> layers = new ArrayList<>();
        if (uncertain) {
            layers.add(new Layer(Layer.Kind.CONFIDENCE_BAND, Rounding.percent(level), x, y, low, high));
        }
        layers.add(Layer.of(Layer.Kind.HORIZONTAL_MARK, "", new double[] {x[0]}, new double[] {0}));
        layers.add(Layer.of(Layer.Kind.LINE, "ΔG", x, y));
        for (Root root : roots) {
            layers.add(Layer.of(Layer.Kind.VERTICAL_MARK, "crossover", new double[] {root.kelvin()}, new double[] {0}));
        }
        return new Node.Figure(
                "gibbs-energy",
                "Gibbs energy of reaction against temperature",
                new Axis("temperature", "K", Axis.Scale.LINEAR),
                new Axis("ΔG", "kJ/mol", Axis.Scale.LINEAR),
                layers,
                cautions);
    }
}
