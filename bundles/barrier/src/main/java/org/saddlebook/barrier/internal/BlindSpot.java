package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.estimation.api.LinearFit;
import org.saddlebook.estimation.api.LinearLeastSquares;
import org.saddlebook.estimation.api.Normal;
import org.saddlebook.estimation.api.StudentT;
import org.saddlebook.presentation.api.Rounding;

/**
 * How much curvature these temperatures and this scatter would have hidden. A column
 * {@code n [ln(T/T0) + T0/T - 1]} beside the straight line is the exponent n of the modified Arrhenius law, and a heat capacity
 * of activation {@code R n} (Clarke and Glew 1966). A curvature of {@code (q(1 - alpha/2) + q(0.8)) u(n)} is found, as an
 * interval of n that excludes none, in about four campaigns of five; a smaller one is missed more often.
 *
 * <p>A hidden parallel path bends the line too. Here it has half the barrier (for targets below the centre of the table) or one
 * and a half times the barrier (above), and that share of the rate at the centre that bends the line by just so much. What the
 * straight law would then miss at the target is computed from the straight fit to {@code ln(1 + k2/k1)}.
 */
final class BlindSpot {
    /** Share of campaigns in which a curvature of the stated size is found. */
    private static final double POWER = 0.8;

    private static final double SMALLEST_RATIO = 1e-6;
    private static final double STEP = 1.1;
    private static final int HALVINGS = 50;

    private final Measurements data;
    private final double level;
    private final double centre;
    private final double[] weights;

    BlindSpot(Measurements data, double level) {
        this.data = data;
        this.level = level;
        this.centre = data.centreKelvin();
        this.weights = data.weightsOnLogarithm();
    }

    /** Largest hidden curvature as n, or why there is none to state. */
    private record Size(OptionalDouble exponent, String reason) {}

    /** What the data could not have shown, and what it would do at the targets. */
    Node.Group node(List<Double> targetsKelvin) {
        Size size = size();
        Tree tree = new Tree().put("power", POWER);
        List<String> notes = new ArrayList<>();
        if (size.exponent().isEmpty()) {
            notes.add(size.reason());
            return tree.put("notes", Tree.texts(notes)).group();
        }
        double exponent = size.exponent().getAsDouble();
        tree.put("n", exponent).put("dCp", Node.Quantity.of(Constants.GAS * exponent, "J/(mol.K)"));
        notes.add("Curvature up to ΔCp‡ = ±" + Rounding.significant(Constants.GAS * exponent, 2) + " J/(mol K) (n = ±"
                + Rounding.significant(exponent, 2)
                + ") would be missed in at least one of five campaigns like this one.");
        List<Node> paths = new ArrayList<>();
        for (double kelvin : targetsKelvin) {
            path(kelvin, exponent, paths, notes);
        }
        if (!paths.isEmpty()) {
            tree.put("hiddenPaths", new Node.Items(paths));
        }
        return tree.put("notes", Tree.texts(notes)).group();
    }

    private Size size() {
        if (data.distinctPoints() > data.distinctTemperatures()) {
            return new Size(
                    OptionalDouble.empty(),
                    "The runs differ in more than temperature: what curvature they would hide is not computed.");
        }
        if (data.distinctTemperatures() < 3) {
            return new Size(
                    OptionalDouble.empty(),
                    "Fewer than three different temperatures show no curvature, however large it is.");
        }
        if (!(LinearLeastSquares.fit(design(3), data.lnRate(), weights) instanceof LinearFit fit)) {
            return new Size(OptionalDouble.empty(), "The temperatures lie too close together to show any curvature.");
        }
        int dof = fit.degreesOfFreedom();
        if (!data.stated() && dof < 1) {
            return new Size(
                    OptionalDouble.empty(),
                    "Three points show no curvature: none is left to estimate the scatter from beside it.");
        }
        double variance = fit.predictionVariance(new double[] {0, 0, 1}) * (data.stated() ? 1 : fit.residualVariance());
        double outer = 0.5 + level / 2;
        double quantiles = data.stated()
                ? Normal.quantile(outer) + Normal.quantile(POWER)
                : StudentT.quantile(outer, dof) + StudentT.quantile(POWER, dof);
        double exponent = quantiles * Math.sqrt(variance);
        return exponent > 0 && Double.isFinite(exponent)
                ? new Size(OptionalDouble.of(exponent), "")
                : new Size(OptionalDouble.empty(), "The points show no scatter: any curvature would show.");
    }

    private void path(double kelvin, double exponent, List<Node> paths, List<String> notes) {
        if (!(LinearLeastSquares.fit(design(2), data.lnRate(), weights) instanceof LinearFit straight)) {
            return;
        }
        double barrier = -straight.parameters()[1] * Constants.GAS * centre;
        if (!(barrier > 0)) {
            return;
        }
        double multiple = kelvin < centre ? 0.5 : 1.5;
        double difference = (multiple - 1) * barrier;
        double ratio = ratio(difference, exponent);
        boolean visible = ratio < 1;
        double missed = missed(ratio, difference, kelvin);
        double share = ratio / (1 + ratio);
        paths.add(new Tree()
                .put("temperature", Node.Quantity.of(kelvin, "K"))
                .put("barrierRatio", multiple)
                .put("shareAtCentre", share)
                .put("factor", OptionalDouble.of(StrictMath.exp(missed)))
                .group());
        String factor = Rounding.significant(StrictMath.exp(missed), 2);
        String steepness = multiple < 1 ? "half the barrier" : "one and a half times the barrier";
        notes.add(
                visible
                        ? "A parallel path with " + steepness + " that carries " + percent(share)
                                + " of the rate at " + Words.kelvin(centre)
                                + " would be as hard to see; k at " + Words.kelvin(kelvin) + " would then be " + factor
                                + " times what the straight law predicts."
                        : "A parallel path with " + steepness + " that carries half of the rate at "
                                + Words.kelvin(centre) + " would not even be seen; k at " + Words.kelvin(kelvin)
                                + " would then be " + factor + " times what the straight law predicts.");
    }

    private static String percent(double share) {
        return Rounding.significant(100 * share, 2) + "\u00a0%";
    }

    /** The smallest k2/k1 at the centre whose curvature is this large; 1 where none below is. */
    private double ratio(double difference, double exponent) {
        double below = SMALLEST_RATIO;
        double above = below;
        while (above < 1 && curvature(above, difference) < exponent) {
            below = above;
            above = above * STEP;
        }
        if (above >= 1) {
            return 1;
        }
        for (int i = 0; i < HALVINGS; i++) {
            double middle = (below + above) / 2;
            if (curvature(middle, difference) < exponent) {
                below = middle;
            } else {
                above = middle;
            }
        }
        return above;
    }

    private double curvature(double ratio, double difference) {
        return LinearLeastSquares.fit(design(3), bent(ratio, difference), weights) instanceof LinearFit fit
                ? Math.abs(fit.parameters()[2])
                : 0;
    }

    /** ln k beyond the prediction of a straight law fitted to the measured temperatures. */
    private double missed(double ratio, double difference, double kelvin) {
        LinearFit fit = (LinearFit) LinearLeastSquares.fit(design(2), bent(ratio, difference), weights);
        double[] b = fit.parameters();
        return added(ratio, difference, kelvin) - b[0] - b[1] * (centre / kelvin - 1);
    }

    private double[] bent(double ratio, double difference) {
        double[] added = new double[data.size()];
        for (int i = 0; i < added.length; i++) {
            added[i] = added(ratio, difference, data.kelvin(i));
        }
        return added;
    }

    /** ln(1 + k2/k1), stable where the second path dominates. */
    private double added(double ratio, double difference, double kelvin) {
        double ln = StrictMath.log(ratio) - difference / Constants.GAS * (1 / kelvin - 1 / centre);
        return ln > 0 ? ln + StrictMath.log1p(StrictMath.exp(-ln)) : StrictMath.log1p(StrictMath.exp(ln));
    }

    private double[][] design(int columns) {
        double[][] design = new double[data.size()][columns];
        for (int i = 0; i < design.length; i++) {
            double kelvin = data.kelvin(i);
            design[i][0] = 1;
            design[i][1] = centre / kelvin - 1;
            if (columns > 2) {
                design[i][2] = StrictMath.log(kelvin / centre) + centre / kelvin - 1;
            }
        }
        return design;
    }
}
