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

/** The joint region of each two parameters of a law, as numbers and as a figure (Bates and Watts 1988, 1.1.2). */
final class JointRegions {
    private static final int CORNERS = 73;

    private final FittedLaw law;
    private final double level;

    JointRegions(FittedLaw law, double level) {
        this.law = law;
        this.level = level;
    }

    /** A group for each pair of parameters; empty without a scale or with one parameter. */
    Optional<Node.Items> node() {
        int p = law.parameters().size();
        if (p < 2 || law.scale().isEmpty() || !(law.scale().getAsDouble() > 0)) {
            return Optional.empty();
        }
        double[][] covariance = law.fit().unscaledCovariance();
        List<Node> pairs = new ArrayList<>();
        for (int first = 0; first < p; first++) {
            for (int second = first + 1; second < p; second++) {
                // A parameter held at its bound has no variance.
                if (covariance[first][first] > 0 && covariance[second][second] > 0) {
                    pairs.add(pair(first, second));
                }
            }
        }
        return pairs.isEmpty() ? Optional.empty() : Optional.of(new Node.Items(pairs));
    }

    private Node.Group pair(int first, int second) {
        Scale scale = law.data().stated() ? Scale.STATED : Scale.ESTIMATED;
        JointRegion region = JointRegion.of(law.fit(), first, second, level, scale);
        double[][] covariance = law.fit().unscaledCovariance();
        double variance = law.scale().orElseThrow();
        double reach = Math.sqrt(region.limit() * variance);
        return new Tree()
                .put("model", law.id())
                .put("parameters", Tree.texts(List.of(name(first), name(second))))
                .put("level", level)
                .put("limit", region.limit())
                .put(
                        "correlation",
                        covariance[first][second]
                                / Math.sqrt(covariance[first][first])
                                / Math.sqrt(covariance[second][second]))
                .put("firstHalfWidth", size(first, reach * Math.sqrt(covariance[first][first])))
                .put("secondHalfWidth", size(second, reach * Math.sqrt(covariance[second][second])))
                .put(
                        "note",
                        "All pairs inside the ellipse are compatible with the data together; its shadows on the axes are wider"
                                + " than the interval of one parameter alone."
                                + (law.shared().isEmpty() ? "" : " Errors common to all runs are not in it."))
                .put("figure", figure(region, first, second))
                .group();
    }

    private Node size(int j, double value) {
        Parameter parameter = law.parameters().get(j);
        return parameter.scale() == Parameter.Scale.LOG
                ? Node.Quantity.of(value, "1")
                : Node.Quantity.of(
                        value / parameter.unit().factor(), parameter.unit().code());
    }

    private String name(int j) {
        Parameter parameter = law.parameters().get(j);
        return (parameter.scale() == Parameter.Scale.LOG ? "ln " : "") + Words.symbol(parameter.symbol());
    }

    private double shown(int j, double value) {
        Parameter parameter = law.parameters().get(j);
        return parameter.scale() == Parameter.Scale.LOG
                ? value - StrictMath.log(parameter.unit().factor())
                : parameter.unit().fromSi(value);
    }

    private Axis axis(int j) {
        Parameter parameter = law.parameters().get(j);
        boolean logarithm = parameter.scale() == Parameter.Scale.LOG;
        return new Axis(name(j), logarithm ? "1" : parameter.unit().code(), Axis.Scale.LINEAR);
    }

    private Node.Figure figure(JointRegion region, int first, int second) {
        double[][] edge = region.edge(CORNERS - 1);
        double[] x = new double[CORNERS];
        double[] y = new double[CORNERS];
        for (int i = 0; i < CORNERS; i++) {
            double[] corner = edge[i % edge.length];
            x[i] = shown(first, corner[0]);
            y[i] = shown(second, corner[1]);
        }
        double[] estimate = law.fit().parameters();
        return new Node.Figure(
                "joint-region-" + (first + 1) + "-" + (second + 1),
                "Joint region of " + name(first) + " and " + name(second) + ", law " + law.title(),
                axis(first),
                axis(second),
                List.of(
                        Layer.of(Layer.Kind.LINE, "", x, y),
                        Layer.of(
                                Layer.Kind.PREDICTED,
                                "estimate",
                                new double[] {shown(first, estimate[first])},
                                new double[] {shown(second, estimate[second])})),
                List.of());
    }
}
