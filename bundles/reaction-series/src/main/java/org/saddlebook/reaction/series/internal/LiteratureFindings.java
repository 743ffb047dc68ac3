package org.saddlebook.reaction.series.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.saddlebook.api.findings.Axis;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.presentation.api.Rounding;

/**
 * The section {@code literature}: measured over literature, temperature by temperature and overall. Half-widths of both
 * sides are combined as the root of the sum of squares; the error of the literature is common to all temperatures.
 */
final class LiteratureFindings {
    static final String SECTION = "literature";
    static final String TITLE = "Against the literature";
    private static final int STEPS = 48;

    private LiteratureFindings() {}

    static Section section(List<Reaction> reactions, ReferenceRate reference, double level) {
        List<Node> items = new ArrayList<>();
        List<Node> figures = new ArrayList<>();
        for (Reaction reaction : reactions) {
            Optional<JointFit> fit = JointFit.of(List.of(reaction));
            if (fit.isEmpty()) {
                return Section.refused(
                        SECTION,
                        TITLE,
                        reaction.name() + " needs points at two temperatures, and three of them, or stated"
                                + " uncertainties.");
            }
            items.add(compared(reaction, fit.get(), reference, level));
            figures.add(figure(reaction, reference, level, figures.size()));
        }
        Map<String, Node> body = new LinkedHashMap<>();
        body.put("reference", new Node.Text(reference.name()));
        body.put("reactions", new Node.Items(items));
        body.put("figures", new Node.Items(figures));
        Node.Group group = new Node.Group(body);
        return Section.done(SECTION, TITLE, group, RateRatios.cautions(group));
    }

    private static Node compared(Reaction reaction, JointFit fit, ReferenceRate reference, double level) {
        ReactionLine line = fit.lines().get(0);
        Scale scale = fit.scale();
        double centre = 1 / line.meanX();
        double ln = line.meanY() - reference.lnRate(centre);
        double own = scale.quantile(level) * Math.sqrt(scale.variance() / line.weight());
        double half = combine(own, reference.halfWidth(centre, level));
        double gap = -Constants.GAS * line.slope() - reference.energy(centre);
        double gapHalf = combine(
                scale.quantile(level) * Constants.GAS * Math.sqrt(scale.variance() / line.spread()),
                reference.energyHalfWidth(level));
        Tree tree = new Tree()
                .put("reaction", reaction.name())
                .put("temperature", Node.Quantity.of(centre, "K"))
                .put("ratio", ratio(ln, half, level, cautions(reference, centre)))
                .put(
                        "energyDifference",
                        Node.Quantity.of(gap, "J/mol")
                                .withInterval(Interval.between(gap - gapHalf, gap + gapHalf, level, "combined")))
                .put("outcome", Math.abs(ln) > half ? (ln > 0 ? "faster" : "slower") : "not-distinguishable")
                .put("byTemperature", table(reaction, fit, reference, level))
                .put("sentence", sentence(reaction, reference, centre, ln, half, gap, gapHalf, level));
        return tree.group();
    }

    private static String sentence(
            Reaction reaction,
            ReferenceRate reference,
            double centre,
            double ln,
            double half,
            double gap,
            double gapHalf,
            double level) {
        boolean different = Math.abs(ln) > half;
        boolean trend = Math.abs(gap) > gapHalf;
        String interval = " (" + Rounding.percent(level) + ": ratio "
                + Rounding.interval(StrictMath.exp(ln - half), StrictMath.exp(ln + half)) + ")";
        String known = reference.halfWidth(centre, level) > 0
                ? ""
                : " The reference states no uncertainty: it is taken as exact.";
        return reaction.name() + " against " + reference.name() + " at the centre of the data, " + Words.kelvin(centre)
                + ": "
                + (different
                        ? (ln > 0 ? "faster" : "slower") + " by a factor of "
                                + Rounding.significant(StrictMath.exp(Math.abs(ln)), 3)
                        : "not distinguishable")
                + interval + ". The activation energies "
                + (trend ? "differ by " + Rounding.significant(gap / 1000, 2) + " kJ/mol" : "are not distinguishable")
                + " (" + Rounding.percent(level) + ": difference "
                + Rounding.interval((gap - gapHalf) / 1000, (gap + gapHalf) / 1000) + " kJ/mol)"
                + (trend ? ", so the ratio moves with temperature." : ".") + known;
    }

    private static Node table(Reaction reaction, JointFit fit, ReferenceRate reference, double level) {
        List<List<Node>> rows = new ArrayList<>();
        double[] u = new double[reaction.size()];
        for (int i = 0; i < u.length; i++) {
            u[i] = fit.scale().stated()
                    ? reaction.lnUncertainty().orElseThrow()[i]
                    : Math.sqrt(fit.scale().variance());
            double kelvin = reaction.kelvin(i);
            double ln = reaction.lnRate(i) - reference.lnRate(kelvin);
            double half = combine(fit.scale().quantile(level) * u[i], reference.halfWidth(kelvin, level));
            rows.add(List.of(
                    Node.Quantity.of(kelvin, "K"),
                    rate(reaction.lnRate(i), reaction.unit()),
                    rate(reference.lnRate(kelvin), reaction.unit()),
                    ratio(ln, half, level, cautions(reference, kelvin)),
                    new Node.Text(Math.abs(ln) > half ? "differs" : "not distinguishable")));
        }
        return new Node.Table(
                List.of(
                        new Node.Column("temperature", "T", ""),
                        new Node.Column("measured", "k measured", ""),
                        new Node.Column("reference", "k reference", ""),
                        new Node.Column("ratio", "measured / reference", ""),
                        new Node.Column("outcome", "", "")),
                rows);
    }

    private static List<String> cautions(ReferenceRate reference, double kelvin) {
        return reference.covers(kelvin) ? List.of() : List.of("extrapolated", "same-mechanism");
    }

    private static Node.Quantity rate(double ln, Unit unit) {
        return Node.Quantity.of(StrictMath.exp(ln) / unit.factor(), unit.code());
    }

    private static Node.Quantity ratio(double ln, double half, double level, List<String> cautions) {
        return Node.Quantity.of(StrictMath.exp(ln), "1")
                .withInterval(Interval.between(StrictMath.exp(ln - half), StrictMath.exp(ln + half), level, "combined"))
                .withCautions(cautions);
    }

    private static double combine(double a, double b) {
        return Math.sqrt(a * a + b * b);
    }

    private static Node figure(Reaction reaction, ReferenceRate reference, double level, int number) {
        Unit unit = reaction.unit();
        double[] kelvin = new double[STEPS + 1];
        double[] middle = new double[STEPS + 1];
        double[] lower = new double[STEPS + 1];
        double[] upper = new double[STEPS + 1];
        for (int i = 0; i <= STEPS; i++) {
            double x = 1 / reaction.lowest() + (1 / reaction.highest() - 1 / reaction.lowest()) * i / STEPS;
            kelvin[i] = 1 / x;
            double half = reference.halfWidth(kelvin[i], level);
            middle[i] = StrictMath.exp(reference.lnRate(kelvin[i])) / unit.factor();
            lower[i] = StrictMath.exp(reference.lnRate(kelvin[i]) - half) / unit.factor();
            upper[i] = StrictMath.exp(reference.lnRate(kelvin[i]) + half) / unit.factor();
        }
        double[] t = new double[reaction.size()];
        double[] k = new double[t.length];
        for (int i = 0; i < t.length; i++) {
            t[i] = reaction.kelvin(i);
            k[i] = StrictMath.exp(reaction.lnRate(i)) / unit.factor();
        }
        return new Node.Figure(
                "literature-" + (number + 1),
                reaction.name() + " and " + reference.name(),
                new Axis("temperature", "K", Axis.Scale.RECIPROCAL_TEMPERATURE),
                new Axis("k", unit.code(), Axis.Scale.LOGARITHMIC),
                List.of(
                        new Layer(Layer.Kind.CONFIDENCE_BAND, "", kelvin, middle, lower, upper),
                        Layer.of(Layer.Kind.LINE, "literature", kelvin, middle),
                        Layer.of(Layer.Kind.MEASURED, reaction.name(), t, k)),
                List.of());
    }
}
