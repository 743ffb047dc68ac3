package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.Parameter;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.estimation.api.BlockFit;
import org.saddlebook.estimation.api.BlockOutcome;
import org.saddlebook.estimation.api.BlockRegression;
import org.saddlebook.presentation.api.Rounding;

/**
 * Runs that share a stock, batch or day share its error: a straight law with one random effect for each block, variances by
 * restricted likelihood (Patterson and Thompson 1971), t intervals with Satterthwaite's degrees of freedom.
 */
final class BlockCheck {
    private final FittedLaw law;
    private final double level;
    private final Unit rateUnit;
    private final List<Double> targets;
    private final List<String> remarks = new ArrayList<>();

    BlockCheck(FittedLaw law, double level, Unit rateUnit, List<Double> targetsKelvin) {
        this.law = law;
        this.level = level;
        this.rateUnit = rateUnit;
        this.targets = targetsKelvin;
    }

    /** Whether any used point names its block. */
    static boolean named(Measurements data) {
        for (int i = 0; i < data.size(); i++) {
            if (!data.point(i).block().isEmpty()) {
                return true;
            }
        }
        return false;
    }

    /** What deserves a line in a summary; filled by {@link #node()}. */
    List<String> remarks() {
        return remarks;
    }

    /** The fit with blocks; empty when no point names one. */
    Optional<Node.Group> node() {
        if (!named(law.data())) {
            return Optional.empty();
        }
        Optional<LinearForm> form = LinearForm.of(law);
        if (form.isEmpty()) {
            return Optional.of(
                    said("Blocks are taken into account for laws that are straight in their parameters and fitted"
                            + " to ln k; here they are not, and the intervals take all runs as independent."));
        }
        int[] blocks = blocks();
        BlockOutcome outcome = BlockRegression.fit(
                form.get().design(), form.get().response(), form.get().weightsOrNull(), blocks);
        return Optional.of(outcome.fold(
                this::fitted,
                refused -> said("The scatter cannot be parted into one between and one inside blocks: "
                        + refused.reason() + ". The intervals take all runs as independent.")));
    }

    private Node.Group said(String text) {
        remarks.add(text);
        return new Tree()
                .put("model", law.id())
                .put("notes", Tree.texts(List.of(text)))
                .group();
    }

    /** A number for each block; a run that names none is a block of its own. */
    private int[] blocks() {
        Map<String, Integer> numbers = new LinkedHashMap<>();
        int[] blocks = new int[law.data().size()];
        for (int i = 0; i < blocks.length; i++) {
            String name = law.data().point(i).block();
            String key = name.isEmpty() ? "run " + i : "block " + name;
            Integer known = numbers.get(key);
            if (known == null) {
                known = numbers.size();
                numbers.put(key, known);
            }
            blocks[i] = known;
        }
        return blocks;
    }

    private Node.Group fitted(BlockFit fit) {
        List<List<Node>> rows = new ArrayList<>();
        double[] parameters = fit.parameters();
        for (int j = 0; j < parameters.length; j++) {
            Parameter parameter = law.parameters().get(j);
            double[] row = new double[parameters.length];
            row[j] = 1;
            rows.add(row(
                    Words.symbol(parameter.symbol()),
                    fit,
                    row,
                    parameters[j],
                    parameter.scale(),
                    parameter.unit(),
                    law.parameter(j)));
        }
        for (double kelvin : targets) {
            if (!law.defined(kelvin)) {
                continue;
            }

            double[] gradient = new double[parameters.length];
            double value = law.law().lnRate(kelvin, parameters, gradient);
            rows.add(row(
                    "k at " + Words.kelvin(kelvin),
                    fit,
                    gradient,
                    value,
                    Parameter.Scale.LOG,
                    rateUnit,
                    law.lnRate(kelvin)));
        }
        double between = Math.sqrt(fit.betweenVariance());
        double within = Math.sqrt(fit.withinVariance());
        List<String> notes = new ArrayList<>();
        String text = law.data().stated()
                ? "Beyond the stated uncertainties, blocks differ by " + percent(between)
                        + " in k; inside a block the scatter is " + Rounding.significant(within, 2)
                        + " times the stated one."
                : "Blocks differ by " + percent(between) + " in k, runs of one block by " + percent(within) + ".";
        notes.add(text);
        notes.add("The intervals of the laws above take all runs as independent; those of this table do not.");
        notes.add(Coverage.BLOCKS);
        remarks.add(text + " See the table of blocks for intervals that count it.");
        return new Tree()
                .put("model", law.id())
                .put("betweenDeviation", between)
                .put("withinDeviation", within)
                .put(
                        "estimates",
                        new Node.Table(
                                List.of(
                                        new Node.Column("quantity", "Quantity", ""),
                                        new Node.Column("withBlocks", "With blocks", ""),
                                        new Node.Column("independent", "Runs taken as independent", ""),
                                        new Node.Column("degreesOfFreedom", "Degrees of freedom with blocks", "1")),
                                rows))
                .put("notes", Tree.texts(notes))
                .group();
    }

    private static String percent(double deviation) {
        return Rounding.significant(100 * deviation, 2) + "\u00a0%";
    }

    private List<Node> row(
            String name,
            BlockFit fit,
            double[] combination,
            double value,
            Parameter.Scale scale,
            Unit unit,
            FittedLaw.Estimate independent) {
        double dof = fit.degreesOfFreedom(combination);
        FittedLaw.Estimate estimate = new FittedLaw.Estimate(
                value, OptionalDouble.of(fit.predictionVariance(combination)), independent.sharedVariance());
        return List.of(
                new Node.Text(name),
                new Quantities(level, OptionalDouble.of(dof)).of(estimate, scale, unit, List.of()),
                new Quantities(level, law.degreesOfFreedom()).of(independent, scale, unit, List.of()),
                new Node.Scalar(dof));
    }
}
