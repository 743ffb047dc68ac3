package org.saddlebook.reaction.series.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.data.checks.api.MixUps;
import org.saddlebook.data.checks.api.ShiftTest;
import org.saddlebook.presentation.api.CautionText;
import org.saddlebook.presentation.api.Rounding;

/**
 * Ratios of rate constants of two reactions at one temperature. The temperature is the one where the ratio is best
 * determined within the range both were measured in, unless one is asked for. With several pairs the intervals that decide
 * are widened so that all of them hold together with the level (Bonferroni).
 */
final class RateRatios {
    private RateRatios() {}

    static List<Node> of(JointFit fit, List<Double> targetsKelvin, double level) {
        List<Node> items = new ArrayList<>();
        int reactions = fit.lines().size();
        int pairs = reactions * (reactions - 1) / 2 * Math.max(1, targetsKelvin.size());
        double together = 1 - (1 - level) / pairs;
        for (int i = 0; i < reactions; i++) {
            for (int j = i + 1; j < reactions; j++) {
                if (!targetsKelvin.isEmpty()) {
                    for (double kelvin : targetsKelvin) {
                        items.add(pair(fit, i, j, kelvin, false, level, together));
                    }
                    continue;
                }
                double low = Math.max(
                        fit.reactions().get(i).lowest(), fit.reactions().get(j).lowest());
                double high = Math.min(
                        fit.reactions().get(i).highest(), fit.reactions().get(j).highest());
                items.add(
                        low <= high
                                ? pair(fit, i, j, best(fit, i, j, low, high), true, level, together)
                                : apart(fit, i, j));
            }
        }
        return items;
    }

    /** Where the sum of both variances is least, within limits. */
    private static double best(JointFit fit, int i, int j, double low, double high) {
        ReactionLine a = fit.lines().get(i);
        ReactionLine b = fit.lines().get(j);
        double x = (a.meanX() / a.spread() + b.meanX() / b.spread()) / (1 / a.spread() + 1 / b.spread());
        return Math.max(low, Math.min(high, 1 / x));
    }

    private static Node apart(JointFit fit, int i, int j) {
        String names =
                fit.reactions().get(j).name() + " and " + fit.reactions().get(i).name();
        return new Tree()
                .put("numerator", fit.reactions().get(j).name())
                .put("denominator", fit.reactions().get(i).name())
                .put("outcome", "no-common-range")
                .put(
                        "sentence",
                        names + " were measured in ranges that do not overlap, so no ratio is given; name a temperature"
                                + " with --at to extrapolate.")
                .group();
    }

    private static Node pair(JointFit fit, int i, int j, double kelvin, boolean chosen, double level, double together) {
        Reaction below = fit.reactions().get(i);
        Reaction above = fit.reactions().get(j);
        double x = 1 / kelvin;
        double ln = fit.lines().get(j).at(x) - fit.lines().get(i).at(x);
        double u = Math.sqrt(fit.scale().variance()
                * (fit.lines().get(j).variance(x) + fit.lines().get(i).variance(x)));
        boolean inside = kelvin >= Math.max(below.lowest(), above.lowest()) - 1e-9
                && kelvin <= Math.min(below.highest(), above.highest()) + 1e-9;
        List<String> cautions = inside ? List.of() : List.of("extrapolated", "same-mechanism");
        Node.Quantity ratio = Tree.factor(ln, u, Unit.ONE, level, fit.scale(), cautions);
        boolean distinguishable = Math.abs(ln) > fit.scale().quantile(together) * u;
        double half = fit.scale().quantile(together) * u;
        Tree tree = new Tree()
                .put("numerator", above.name())
                .put("denominator", below.name())
                .put("temperature", Node.Quantity.of(kelvin, "K"))
                .put("temperatureChosen", chosen ? "best determined" : "asked for")
                .put("ratio", ratio)
                .put(
                        "gibbsDifference",
                        Tree.linear(
                                -Constants.GAS * kelvin * ln,
                                Constants.GAS * kelvin * u,
                                "J/mol",
                                level,
                                fit.scale(),
                                cautions))
                .put("outcome", distinguishable ? (ln > 0 ? "faster" : "slower") : "not-distinguishable");
        StringBuilder sentence = new StringBuilder(above.name())
                .append(" against ")
                .append(below.name())
                .append(" at ")
                .append(Words.kelvin(kelvin));
        if (distinguishable) {
            sentence.append(": ")
                    .append(ln > 0 ? "faster" : "slower")
                    .append(" by a factor of ")
                    .append(Rounding.significant(StrictMath.exp(Math.abs(ln)), 3));
        } else {
            sentence.append(": not distinguishable");
        }
        sentence.append(" (")
                .append(Rounding.percent(level))
                .append(together == level ? "" : " for all ratios here together")
                .append(": ratio ")
                .append(Rounding.interval(StrictMath.exp(ln - half), StrictMath.exp(ln + half)))
                .append(").");
        mixUp(fit, above, ln, u).ifPresent(text -> {
            tree.put("mixUp", text.mixUp().id());
            sentence.append(" It is the factor one sees as if ")
                    .append(text.mixUp().meaning())
                    .append(" in ")
                    .append(above.name())
                    .append(" (")
                    .append(Rounding.significant(Math.abs(text.mixUp().entropyShift()), 3))
                    .append(" J/(mol K) in ΔS‡); if both are the same reaction, look at the units.");
        });
        return tree.put("sentence", sentence.toString()).group();
    }

    /** A mix-up is only worth a word between reactions that are otherwise alike: of slopes that do not clearly differ. */
    private static Optional<ShiftTest.Explained> mixUp(JointFit fit, Reaction above, double ln, double u) {
        if (fit.lines().size() != 2) {
            return Optional.empty();
        }
        ReactionLine a = fit.lines().get(0);
        ReactionLine b = fit.lines().get(1);
        double gap = Math.abs(a.slope() - b.slope());
        double error = Math.sqrt(fit.scale().variance() * (1 / a.spread() + 1 / b.spread()));
        if (!(gap <= fit.scale().quantile(0.999) * error)) {
            return Optional.empty();
        }
        // Two laboratories, or two batches, differ by more than their own scatter.
        double between = 0.1;
        return ShiftTest.explain(
                ln,
                Math.sqrt(u * u + between * between),
                fit.scale().degreesOfFreedom(),
                MixUps.of(above.unit(), above.order()));
    }

    /** Texts of the cautions used in a tree. */
    static Map<String, String> cautions(Node node) {
        Map<String, String> texts = new LinkedHashMap<>();
        collect(node, texts);
        return texts;
    }

    private static void collect(Node node, Map<String, String> texts) {
        if (node instanceof Node.Group group) {
            group.members().values().forEach(member -> collect(member, texts));
        } else if (node instanceof Node.Items items) {
            items.items().forEach(item -> collect(item, texts));
        } else if (node instanceof Node.Table table) {
            table.rows().forEach(row -> row.forEach(cell -> collect(cell, texts)));
        } else if (node instanceof Node.Quantity quantity) {
            quantity.cautions().forEach(id -> texts.putIfAbsent(id, CautionText.of(id)));
        }
    }
}
