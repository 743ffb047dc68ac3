package org.saddlebook.spontaneity.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.api.findings.Axis;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.presentation.api.Rounding;

/** ΔG of a reaction, and ln of its equilibrium constant, against temperature. */
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

    Node.Figure gibbs(double level, List<Root> roots, List<String> cautions) {
        double[] x = grid();
        double[] y = new double[x.length];
        double[] half = new double[x.length];
        double[] gibbs = function.at(x)[2];
        for (int i = 0; i < x.length; i++) {
            y[i] = gibbs[i] / 1000;
            half[i] = quantile * function.uncertaintyOfGibbs(x[i]) / 1000;
        }
        List<Layer> layers = new ArrayList<>();
        band(layers, level, x, y, half);
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

    /** ln K, whose slope against 1/T is −ΔH/R: bent where there is a heat capacity of reaction. */
    Node.Figure equilibrium(double level, List<String> cautions) {
        double[] x = grid();
        double[] y = new double[x.length];
        double[] half = new double[x.length];
        double[] gibbs = function.at(x)[2];
        for (int i = 0; i < x.length; i++) {
            double thermal = Constants.GAS * x[i];
            y[i] = -gibbs[i] / thermal;
            half[i] = quantile * function.uncertaintyOfGibbs(x[i]) / thermal;
        }
        List<Layer> layers = new ArrayList<>();
        band(layers, level, x, y, half);
        layers.add(Layer.of(Layer.Kind.HORIZONTAL_MARK, "", new double[] {x[0]}, new double[] {0}));
        layers.add(Layer.of(Layer.Kind.LINE, "ln K", x, y));
        return new Node.Figure(
                "equilibrium-constant",
                "ln K against temperature",
                new Axis("temperature", "K", Axis.Scale.RECIPROCAL_TEMPERATURE),
                new Axis("ln K", "1", Axis.Scale.LINEAR),
                layers,
                cautions);
    }

    private void band(List<Layer> layers, double level, double[] x, double[] y, double[] half) {
        if (!uncertain) {
            return;
        }
        double[] low = new double[x.length];
        double[] high = new double[x.length];
        for (int i = 0; i < x.length; i++) {
            low[i] = y[i] - half[i];
            high[i] = y[i] + half[i];
        }
        layers.add(new Layer(Layer.Kind.CONFIDENCE_BAND, Rounding.percent(level), x, y, low, high));
    }

    private double[] grid() {
        double[] x = new double[GRID + 1];
        for (int i = 0; i < x.length; i++) {
            x[i] = i == GRID ? function.upper() : function.lower() + (function.upper() - function.lower()) * i / GRID;
        }
        return x;
    }
}
