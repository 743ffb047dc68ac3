package org.saddlebook.reaction.series.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Axis;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.estimation.api.Fieller;
import org.saddlebook.estimation.api.LinearFit;
import org.saddlebook.estimation.api.LinearLeastSquares;
import org.saddlebook.estimation.api.LinearOutcome;
import org.saddlebook.presentation.api.Rounding;

/**
 * The section {@code selectivity}: {@code ln r = ΔΔS‡/R − ΔΔH‡/(RT)}, r = k1/k2 of two paths of the same order from the same
 * reactants. The inversion temperature {@code ΔΔH‡/ΔΔS‡}, where r = 1, has a Fieller set. Where the paths are compared by
 * Arrhenius parameters, ΔΔH‡ is the difference of the activation energies and {@code exp(ΔΔS‡/R)} the ratio of the
 * prefactors.
 */
final class RatioFindings {
    static final String SECTION = "selectivity";
    static final String TITLE = "Ratio against temperature";
    private static final int STEPS = 48;

    private final RatioTable table;
    private final LinearFit fit;
    private final Scale scale;
    private final double level;
    private final double centre;
    private final double lowest;
    private final double highest;

    private RatioFindings(RatioTable table, LinearFit fit, Scale scale, double level, double centre) {
        this.table = table;
        this.fit = fit;
        this.scale = scale;
        this.level = level;
        this.centre = centre;
        lowest = table.points().stream()
                .mapToDouble(RatioTable.Point::kelvin)
                .min()
                .orElseThrow();
        highest = table.points().stream()
                .mapToDouble(RatioTable.Point::kelvin)
                .max()
                .orElseThrow();
    }

    static Section section(RatioTable table, List<Double> targetsKelvin, double level) {
        boolean stated = table.stated();
        int n = table.points().size();
        double[][] design = new double[n][];
        double[] response = new double[n];
        double[] weights = new double[n];
        double sum = 0;
        double total = 0;
        for (int i = 0; i < n; i++) {
            double u = stated ? table.points().get(i).lnUncertainty() : 1;
            weights[i] = 1 / (u * u);
            sum += weights[i] / table.points().get(i).kelvin();
            total += weights[i];
        }
        double centre = total / sum;
        for (int i = 0; i < n; i++) {
            design[i] = new double[] {1, 1 / table.points().get(i).kelvin() - 1 / centre};
            response[i] = table.points().get(i).lnRatio();
        }
        LinearOutcome outcome = LinearLeastSquares.fit(design, response, weights);
        if (!(outcome instanceof LinearFit fit) || (!stated && fit.degreesOfFreedom() < 1)) {
            return Section.refused(
                    SECTION,
                    TITLE,
                    "It needs ratios at two temperatures, and three of them, or two with stated uncertainties.");
        }
        Scale scale = stated ? Scale.STATED : new Scale(fit.residualVariance(), fit.degreesOfFreedom());
        Node.Group body = new RatioFindings(table, fit, scale, level, centre).body(targetsKelvin);
        return Section.done(SECTION, TITLE, body, RateRatios.cautions(body));
    }

    private Node.Group body(List<Double> targetsKelvin) {
        double[][] covariance = fit.unscaledCovariance();
        double height = fit.parameters()[0];
        double slope = fit.parameters()[1];
        double s2 = scale.variance();
        // Intercept at 1/T = 0 and slope, with their covariance.
        double intercept = height - slope / centre;
        double vSlope = s2 * covariance[1][1];
        double vBoth = s2 * (covariance[0][1] - covariance[1][1] / centre);
        double vIntercept = s2 * fit.predictionVariance(new double[] {1, -1 / centre});
        Node.Quantity enthalpy = Tree.linear(
                -Constants.GAS * slope, Constants.GAS * Math.sqrt(vSlope), "J/mol", level, scale, List.of());
        Node.Quantity entropy = Tree.linear(
                Constants.GAS * intercept, Constants.GAS * Math.sqrt(vIntercept), "J/(mol.K)", level, scale, List.of());
        // ln r = 0: T = −slope/intercept = ΔΔH‡/ΔΔS‡
        Interval set = TemperatureSet.of(
                Fieller.set(-slope, intercept, vSlope, -vBoth, vIntercept, scale.quantile(level)), level);
        double at = -slope / intercept;
        OptionalDouble inversion = at > 0 && Double.isFinite(at) ? OptionalDouble.of(at) : OptionalDouble.empty();
        Tree tree = new Tree()
                .put("kind", table.kind().word())
                .put("numerator", name(table.numerator(), true))
                .put("denominator", name(table.denominator(), false))
                .put("points", fit.observations())
                .put("errors", errors())
                .put("lowest", Node.Quantity.of(lowest, "K"))
                .put("highest", Node.Quantity.of(highest, "K"))
                .put("enthalpyDifference", enthalpy)
                .put("entropyDifference", entropy)
                .put("prefactorRatio", Tree.factor(intercept, Math.sqrt(vIntercept), Unit.ONE, level, scale, List.of()))
                .put("centre", row(centre))
                .put("inversion", Tree.temperature(inversion, set, List.of()))
                .put("inversionSentence", inversionSentence(inversion, set));
        List<Node> rows = new ArrayList<>();
        for (double kelvin : targetsKelvin) {
            rows.add(row(kelvin));
        }
        if (!rows.isEmpty()) {
            tree.put("predictions", new Node.Items(rows));
        }
        return tree.put("sentence", sentence(enthalpy, entropy))
                .put("figures", new Node.Items(List.of(figure())))
                .group();
    }

    private String errors() {
        if (scale.stated()) {
            return "as stated; χ² is " + Rounding.significant(fit.residualSumOfSquares(), 3) + " on "
                    + Words.freedom(fit.degreesOfFreedom());
        }
        return "one relative error, estimated from the scatter: "
                + Rounding.significant(100 * Math.sqrt(scale.variance()), 2) + " % on "
                + Words.freedom(fit.degreesOfFreedom());
    }

    private String name(String stated, boolean above) {
        if (!stated.isEmpty()) {
            return stated;
        }
        return switch (table.kind()) {
            case ISOTOPE_EFFECT -> above ? "light isotope" : "heavy isotope";
            case ENANTIOMERIC_EXCESS, ENANTIOMERIC_RATIO -> above ? "first enantiomer" : "second enantiomer";
            case RATIO -> above ? "first product" : "second product";
        };
    }

    private Node row(double kelvin) {
        double[] gradient = {1, 1 / kelvin - 1 / centre};
        double ln = fit.parameters()[0] + fit.parameters()[1] * gradient[1];
        double u = Math.sqrt(scale.variance() * fit.predictionVariance(gradient));
        boolean outside = kelvin < lowest - 1e-9 || kelvin > highest + 1e-9;
        List<String> cautions = outside ? List.of("extrapolated", "same-mechanism") : List.of();
        Map<String, Node> members = new LinkedHashMap<>();
        members.put("temperature", Node.Quantity.of(kelvin, "K"));
        members.put("ratio", Tree.factor(ln, u, Unit.ONE, level, scale, cautions));
        if (table.kind() == RatioTable.Kind.ENANTIOMERIC_EXCESS || table.kind() == RatioTable.Kind.ENANTIOMERIC_RATIO) {
            // ee = tanh(ln r / 2), monotone: the limits carry over.
            double half = scale.quantile(level) * u;
            double excess = StrictMath.tanh(ln / 2);
            members.put(
                    "ee",
                    Node.Quantity.of(excess, "1", (1 - excess * excess) / 2 * u)
                            .withInterval(Interval.between(
                                    StrictMath.tanh((ln - half) / 2),
                                    StrictMath.tanh((ln + half) / 2),
                                    level,
                                    scale.method()))
                            .withCautions(cautions));
        }
        return new Node.Group(members);
    }

    private String sentence(Node.Quantity enthalpy, Node.Quantity entropy) {
        String what = table.kind() == RatioTable.Kind.ISOTOPE_EFFECT ? " (light minus heavy)" : " (first minus second)";
        return "The barriers differ by ΔΔH‡ = " + Words.quantity(enthalpy) + " and ΔΔS‡ = " + Words.quantity(entropy)
                + what + ". Both rest on one line and are strongly correlated; at the centre, "
                + Words.kelvin(centre) + ", the ratio itself is known best.";
    }

    private String inversionSentence(OptionalDouble inversion, Interval set) {
        String start = inversion.isPresent()
                ? "The ratio passes 1 at " + Words.kelvin(inversion.getAsDouble())
                : "The line passes ratio 1 at no temperature above 0 K";
        String place = inversion.isPresent() && (inversion.getAsDouble() < lowest || inversion.getAsDouble() > highest)
                ? " It lies outside the measured temperatures and assumes that nothing changes on the way."
                : "";
        return start + " (" + Words.temperatures(set) + ")." + place;
    }

    private Node.Figure figure() {
        double[] kelvin = new double[STEPS + 1];
        double[] middle = new double[STEPS + 1];
        double[] lower = new double[STEPS + 1];
        double[] upper = new double[STEPS + 1];
        double q = scale.quantile(level);
        for (int i = 0; i <= STEPS; i++) {
            double x = 1 / lowest + (1 / highest - 1 / lowest) * i / STEPS;
            double[] gradient = {1, x - 1 / centre};
            double ln = fit.parameters()[0] + fit.parameters()[1] * gradient[1];
            double half = q * Math.sqrt(scale.variance() * fit.predictionVariance(gradient));
            kelvin[i] = 1 / x;
            middle[i] = StrictMath.exp(ln);
            lower[i] = StrictMath.exp(ln - half);
            upper[i] = StrictMath.exp(ln + half);
        }
        int n = table.points().size();
        double[] t = new double[n];
        double[] r = new double[n];
        double[] low = new double[n];
        double[] high = new double[n];
        boolean crosses = middle[0] < 1 != middle[STEPS] < 1;
        for (int i = 0; i < n; i++) {
            RatioTable.Point point = table.points().get(i);
            t[i] = point.kelvin();
            r[i] = StrictMath.exp(point.lnRatio());
            low[i] = StrictMath.exp(point.lnRatio() - point.lnUncertainty());
            high[i] = StrictMath.exp(point.lnRatio() + point.lnUncertainty());
            crosses |= r[i] < 1 != r[0] < 1;
        }
        List<Layer> layers = new ArrayList<>();
        layers.add(new Layer(Layer.Kind.CONFIDENCE_BAND, "", kelvin, middle, lower, upper));
        if (crosses) {
            layers.add(Layer.of(Layer.Kind.HORIZONTAL_MARK, "ratio 1", new double[] {lowest}, new double[] {1}));
        }
        layers.add(Layer.of(Layer.Kind.LINE, "straight line", kelvin, middle));
        layers.add(new Layer(Layer.Kind.MEASURED, "measured", t, r, low, high));
        return new Node.Figure(
                "ratio",
                "Ratio of " + name(table.numerator(), true) + " to " + name(table.denominator(), false),
                new Axis("temperature", "K", Axis.Scale.RECIPROCAL_TEMPERATURE),
                new Axis("ratio", "1", Axis.Scale.LOGARITHMIC),
                layers,
                List.of());
    }
}
