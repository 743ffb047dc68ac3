package org.saddlebook.reaction.series.internal;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/**
 * Lines of several reactions with one scatter. Weights are {@code (k/u)²} where every point of every reaction states u,
 * else all one.
 */
final class JointFit {
    private final List<Reaction> reactions;
    private final List<ReactionLine> lines;
    private final Scale scale;
    private final double rss;
    private final double oneLineCost;

    private JointFit(List<Reaction> reactions, List<ReactionLine> lines, Scale scale, double rss, double oneLineCost) {
        this.reactions = List.copyOf(reactions);
        this.lines = List.copyOf(lines);
        this.scale = scale;
        this.rss = rss;
        this.oneLineCost = oneLineCost;
    }

    /**
     * Fits.
     *
     * @return empty when a reaction has a single temperature, or no degree of freedom is left to estimate the scatter
     */
    static Optional<JointFit> of(List<Reaction> reactions) {
        boolean stated = true;
        for (Reaction reaction : reactions) {
            stated &= reaction.lnUncertainty().isPresent();
        }
        List<ReactionLine> lines = new ArrayList<>();
        double rss = 0;
        int points = 0;
        for (Reaction reaction : reactions) {
            Optional<ReactionLine> line = ReactionLine.of(reaction, weights(reaction, stated));
            if (line.isEmpty()) {
                return Optional.empty();
            }
            lines.add(line.get());
            rss += line.get().rss();
            points += reaction.size();
        }
        int freedom = points - 2 * lines.size();
        if (!stated && freedom < 1) {
            return Optional.empty();
        }
        Scale scale = stated ? Scale.STATED : new Scale(rss / freedom, freedom);
        return Optional.of(new JointFit(reactions, lines, scale, rss, oneLine(lines) - rss));
    }

    static double[] weights(Reaction reaction, boolean stated) {
        double[] weights = new double[reaction.size()];
        if (!stated) {
            Arrays.fill(weights, 1);
            return weights;
        }
        double[] u = reaction.lnUncertainty().orElseThrow();
        for (int i = 0; i < weights.length; i++) {
            weights[i] = 1 / (u[i] * u[i]);
        }
        return weights;
    }

    /** Residual sum of squares of one line through everything, from the sums of the single lines. */
    private static double oneLine(List<ReactionLine> lines) {
        double w = 0;
        double x = 0;
        double y = 0;
        for (ReactionLine line : lines) {
            w += line.weight();
            x += line.weight() * line.meanX();
            y += line.weight() * line.meanY();
        }
        x /= w;
        y /= w;
        double sxx = 0;
        double sxy = 0;
        double rss = 0;
        for (ReactionLine line : lines) {
            double dx = line.meanX() - x;
            double dy = line.meanY() - y;
            sxx += line.spread() + line.weight() * dx * dx;
            sxy += line.slope() * line.spread() + line.weight() * dx * dy;
        }
        double slope = sxy / sxx;
        for (ReactionLine line : lines) {
            double dy = line.meanY() - y - slope * (line.meanX() - x);
            double db = line.slope() - slope;
            rss += line.rss() + line.weight() * dy * dy + db * db * line.spread();
        }
        return rss;
    }

    List<Reaction> reactions() {
        return reactions;
    }

    List<ReactionLine> lines() {
        return lines;
    }

    Scale scale() {
        return scale;
    }

    double rss() {
        return rss;
    }

    /** What it costs to describe all reactions by one line. */
    double oneLineCost() {
        return oneLineCost;
    }

    /** Scale of a fit with fewer parameters, of this additional cost. */
    Scale restricted(double cost, int restrictions) {
        if (scale.stated()) {
            return scale;
        }
        double freedom = scale.degreesOfFreedom() + restrictions;
        return new Scale((rss + cost) / freedom, freedom);
    }
}
