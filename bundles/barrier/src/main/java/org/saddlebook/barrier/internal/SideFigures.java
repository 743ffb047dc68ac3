package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.saddlebook.api.findings.Axis;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.Parameter;
import org.saddlebook.estimation.api.JointRegion;
import org.saddlebook.estimation.api.Scale;
import org.saddlebook.presentation.api.Rounding;
import org.saddlebook.presentation.api.UnitText;

/** Further views of the same fits: ln(k/T), and where two parameters lie together. */
final class SideFigures {
    private static final int EDGE = 72;

    private SideFigures() {}

    /**
     * The figure of ln k as one of ln(k/T): the natural logarithm of T in kelvin is taken off every ordinate.
     *
     * @param rates the figure of ln k against T in kelvin
     * @param rateUnit UCUM term of the rate constant
     */
    static Node.Figure overTemperature(Node.Figure rates, String rateUnit) {
        List<Layer> layers = new ArrayList<>();
        for (Layer layer : rates.layers()) {
            double[] x = layer.x();
            double[] y = layer.y();
            double[] low = layer.lower();
            double[] high = layer.upper();
            for (int i = 0; i < x.length; i++) {
                double less = StrictMath.log(x[i]);
                y[i] -= less;
                low[i] -= less;
                high[i] -= less;
            }
            layers.add(new Layer(layer.kind(), layer.label(), x, y, low, high));
        }
        return new Node.Figure(
                "ln-rate-over-temperature",
                "Rate constant over temperature, against temperature",
                rates.x(),
                new Axis("ln((k/T) / (" + UnitText.forPeople(rateUnit) + " K⁻¹))", "1", Axis.Scale.LINEAR),
                layers,
                rates.cautions());
    }

    /**
     * The joint region of two parameters of a law ({@link JointRegion}), with the estimate in it; of more than two the
     * extra one is left out. Empty where no scale of the errors is known, a law has one parameter, or errors common to all
     * runs are stated, which the region would not hold.
     */
    static Optional<Node.Figure> jointRegion(FittedLaw law, double level) {
        List<Integer> pair = new ArrayList<>();
        for (int i = 0; i < law.parameters().size(); i++) {
            if (law.parameters().size() == 2 || i != law.extraParameter()) {
                pair.add(i);
            }
        }
        if (pair.size() < 2 || law.scale().isEmpty() || !law.shared().isEmpty()) {
            return Optional.empty();
        }
        int first = pair.get(pair.size() - 1);
        int second = pair.get(0);
        JointRegion region = JointRegion.of(
                law.fit(), first, second, level, law.degreesOfFreedom().isEmpty() ? Scale.STATED : Scale.ESTIMATED);
        double[][] edge = region.edge(EDGE);
        double[] x = new double[EDGE + 1];
        double[] y = new double[EDGE + 1];
        Parameter horizontal = law.parameters().get(first);
        Parameter vertical = law.parameters().get(second);
        for (int i = 0; i <= EDGE; i++) {
            x[i] = shown(horizontal, edge[i % EDGE][0]);
            y[i] = shown(vertical, edge[i % EDGE][1]);
            if (!Double.isFinite(x[i]) || !Double.isFinite(y[i])) {
                return Optional.empty();
            }
        }
        double[] parameters = law.fit().parameters();
        return Optional.of(new Node.Figure(
                "joint-region",
                "Where " + words(vertical) + " and " + words(horizontal) + " of the law " + law.title()
                        + " lie together (" + Rounding.percent(level) + ")",
                axis(horizontal),
                axis(vertical),
                List.of(
                        Layer.of(Layer.Kind.LINE, "edge of the region", x, y),
                        Layer.of(
                                Layer.Kind.PREDICTED,
                                "estimate",
                                new double[] {shown(horizontal, parameters[first])},
                                new double[] {shown(vertical, parameters[second])})),
                List.of()));
    }

    private static String words(Parameter parameter) {
        return parameter.scale() == Parameter.Scale.LOG ? "ln " + parameter.symbol() : parameter.name();
    }

    private static Axis axis(Parameter parameter) {
        return parameter.scale() == Parameter.Scale.LOG
                ? new Axis(
                        "ln(" + parameter.symbol() + " / "
                                + UnitText.forPeople(parameter.unit().code()) + ")",
                        "1",
                        Axis.Scale.LINEAR)
                : new Axis(parameter.name(), parameter.unit().code(), Axis.Scale.LINEAR);
    }

    /** A parameter in the form handed to the law, as it is shown. */
    private static double shown(Parameter parameter, double value) {
        double factor = parameter.unit().factor();
        return parameter.scale() == Parameter.Scale.LOG ? value - StrictMath.log(factor) : value / factor;
    }
}
