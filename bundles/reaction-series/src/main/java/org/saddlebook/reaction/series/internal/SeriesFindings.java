package org.saddlebook.reaction.series.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.presentation.api.Rounding;

/** The section {@code series}: what several reactions have in common, in ln k against 1/T. */
final class SeriesFindings {
    static final String SECTION = "series";
    static final String TITLE = "Several reactions together";

    private static final String NOTE =
            "Everything is judged in ln k against 1/T. A plot of ΔH‡ against ΔS‡ is never used:"
                    + " both come from the same line, and their errors alone line up along the mean temperature.";

    private final JointFit fit;
    private final double level;
    private final CommonPoint point;
    private final int count;

    private SeriesFindings(JointFit fit, double level) {
        this.fit = fit;
        this.level = level;
        point = new CommonPoint(fit.lines());
        count = fit.lines().size();
    }

    /**
     * The section.
     *
     * @param targetsKelvin temperatures for ratios; empty for the best determined one of each pair
     */
    static Section section(List<Reaction> reactions, List<Double> targetsKelvin, double level) {
        var fit = JointFit.of(reactions);
        if (fit.isEmpty()) {
            return Section.refused(
                    SECTION,
                    TITLE,
                    "Each reaction needs used points at two temperatures, and all together more points than twice the number"
                            + " of reactions, or a stated uncertainty for every rate constant.");
        }
        SeriesFindings findings = new SeriesFindings(fit.get(), level);
        Map<String, Node> body = new LinkedHashMap<>();
        body.put(
                "errors",
                new Node.Text(
                        fit.get().scale().stated()
                                ? "as stated; their χ² over all lines is "
                                        + Rounding.significant(fit.get().rss(), 3)
                                : "one relative error for all reactions, estimated from the scatter about their own lines: "
                                        + Rounding.significant(
                                                100
                                                        * Math.sqrt(fit.get()
                                                                .scale()
                                                                .variance()),
                                                2)
                                        + " % on "
                                        + Words.freedom(
                                                Math.round(fit.get().scale().degreesOfFreedom()))));
        body.put("reactions", findings.reactionTable());
        body.put("common", new Node.Items(findings.common()));
        body.put("ratios", new Node.Items(RateRatios.of(fit.get(), targetsKelvin, level)));
        body.put("figures", new Node.Items(List.of(SeriesFigure.of(fit.get(), level))));
        body.put("notes", new Node.Items(List.of(new Node.Text(NOTE))));
        Node.Group group = new Node.Group(body);
        return Section.done(SECTION, TITLE, group, RateRatios.cautions(group));
    }

    private Node reactionTable() {
        List<List<Node>> rows = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            Reaction reaction = fit.reactions().get(i);
            ReactionLine line = fit.lines().get(i);
            double s = Math.sqrt(fit.scale().variance());
            double u = Constants.GAS * s / Math.sqrt(line.spread());
            rows.add(List.of(
                    new Node.Text(reaction.name()),
                    new Node.Scalar(reaction.size()),
                    Node.Quantity.of(reaction.lowest(), "K"),
                    Node.Quantity.of(reaction.highest(), "K"),
                    Tree.linear(-Constants.GAS * line.slope(), u, "J/mol", level, fit.scale(), List.of())));
        }
        return new Node.Table(
                List.of(
                        new Node.Column("reaction", "reaction", ""),
                        new Node.Column("used", "points", "1"),
                        new Node.Column("lowest", "from", ""),
                        new Node.Column("highest", "to", ""),
                        new Node.Column("Ea", "Ea", "")),
                rows);
    }

    private List<Node> common() {
        List<Node> items = new ArrayList<>();
        items.add(energy());
        items.add(prefactor());
        items.add(count == 2 ? crossing() : isokinetic());
        items.add(sameLine());
        return items;
    }

    private Tree test(String id, double cost, int restrictions) {
        return new Tree()
                .put("id", id)
                .put("statistic", fit.scale().statistic(cost, restrictions))
                .put("restrictions", restrictions)
                .put("pValue", fit.scale().probability(cost, restrictions));
    }

    private String verdict(String what, double cost, int restrictions) {
        double p = fit.scale().probability(cost, restrictions);
        return (p < 1 - level ? "The data exclude " : "The data do not exclude ") + what + " ("
                + fit.scale().statisticName(restrictions) + " = "
                + Rounding.significant(fit.scale().statistic(cost, restrictions), 3) + ", " + Words.probability(p)
                + ")";
    }

    private Node energy() {
        double cost = point.parallelCost();
        double spread = 0;
        double sum = 0;
        for (ReactionLine line : fit.lines()) {
            spread += line.spread();
            sum += line.spread() * line.slope();
        }
        Scale scale = fit.restricted(cost, count - 1);
        Node.Quantity value = Tree.linear(
                -Constants.GAS * sum / spread,
                Constants.GAS * Math.sqrt(scale.variance() / spread),
                "J/mol",
                level,
                scale,
                List.of());
        return test("common-activation-energy", cost, count - 1)
                .put("Ea", value)
                .put(
                        "sentence",
                        verdict("a common activation energy", cost, count - 1) + "; held together it is "
                                + Words.quantity(value) + ".")
                .group();
    }

    private Node prefactor() {
        double cost = point.costAt(0);
        Scale scale = fit.restricted(cost, count - 1);
        double weights = 0;
        for (ReactionLine line : fit.lines()) {
            weights += 1 / line.variance(0);
        }
        Node.Quantity value = Tree.factor(
                point.height(0),
                Math.sqrt(scale.variance() / weights),
                fit.reactions().get(0).unit(),
                level,
                scale,
                List.of());
        return test("common-prefactor", cost, count - 1)
                .put("A", value)
                .put(
                        "sentence",
                        verdict("a common pre-exponential factor", cost, count - 1) + "; held together it is "
                                + Words.quantity(value) + ".")
                .group();
    }

    private Node crossing() {
        Interval set = point.set(fit.scale().limit(level), level);
        Node.Quantity kelvin = Tree.temperature(point.temperature(), set, List.of());
        return new Tree()
                .put("id", "crossing")
                .put("temperature", kelvin)
                .put(
                        "sentence",
                        "The two lines cross at " + estimate(point.temperature()) + " (" + Words.temperatures(set)
                                + ")."
                                + place(point.temperature())
                                + " Two lines always cross: this is no sign of an isokinetic relation.")
                .group();
    }

    private Node isokinetic() {
        double cost = point.leastCost();
        int restrictions = count - 2;
        Interval set = point.set(cost + fit.scale().limit(level), level);
        Node.Quantity kelvin = Tree.temperature(point.temperature(), set, List.of());
        String tail = fit.scale().probability(cost, restrictions) < 1 - level
                ? " No common temperature is given a meaning."
                : " The best common temperature is " + estimate(point.temperature()) + " ("
                        + Words.temperatures(set) + ")." + place(point.temperature())
                        + (set.kind() == Interval.Kind.BETWEEN
                                ? ""
                                : " A common activation energy (parallel lines) is part of this set.");
        return test("isokinetic-point", cost, restrictions)
                .put("temperature", kelvin)
                .put("sentence", verdict("a common point of all lines", cost, restrictions) + "." + tail)
                .group();
    }

    private static String estimate(OptionalDouble kelvin) {
        return kelvin.isPresent() ? Words.kelvin(kelvin.getAsDouble()) : "no temperature above 0 K";
    }

    private String place(OptionalDouble kelvin) {
        double low = Double.POSITIVE_INFINITY;
        double high = 0;
        for (Reaction reaction : fit.reactions()) {
            low = Math.min(low, reaction.lowest());
            high = Math.max(high, reaction.highest());
        }
        if (kelvin.isEmpty() || (kelvin.getAsDouble() >= low && kelvin.getAsDouble() <= high)) {
            return "";
        }
        return " It lies outside the measured temperatures.";
    }

    private Node sameLine() {
        int restrictions = 2 * (count - 1);
        return test("one-line", fit.oneLineCost(), restrictions)
                .put("sentence", verdict("one line for all reactions", fit.oneLineCost(), restrictions) + ".")
                .group();
    }
}
