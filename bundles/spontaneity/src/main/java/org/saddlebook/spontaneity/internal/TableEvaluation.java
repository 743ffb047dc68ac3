package org.saddlebook.spontaneity.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Axis;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.estimation.api.Normal;
import org.saddlebook.estimation.api.StudentT;
import org.saddlebook.presentation.api.Rounding;

/** van 't Hoff and Clarke-Glew from an equilibrium table, and whether the data show a heat capacity of reaction. */
final class TableEvaluation {
    private static final int STEPS = 400;
    private static final int CURVE = 80;
    private static final List<String> OF_GIBBS = List.of("allowed-is-not-fast", "at-stated-composition");

    private final EquilibriumTable table;
    private final double level;
    private final double lower;
    private final double upper;

    TableEvaluation(Campaign campaign, EquilibriumTable table) {
        this.table = table;
        level = campaign.choices().level();
        double low = table.kelvin().get(0);
        double high = low;
        for (double one : table.kelvin()) {
            low = Math.min(low, one);
            high = Math.max(high, one);
        }
        lower = low;
        upper = high;
    }

    /** 298.15 K where the table spans it, else the harmonic mean of its ends, where ΔG and ΔH are least correlated. */
    private double theta() {
        double reference = Constants.REFERENCE_KELVIN;
        return reference >= lower && reference <= upper ? reference : 2 / (1 / lower + 1 / upper);
    }

    /** The straight line, as ΔH and ΔS with their covariance. */
    Stated stated() throws Refusal {
        ClarkeGlew line = line();
        double h = line.enthalpy(line.theta()).value();
        double s = line.entropy(line.theta()).value();
        return new Stated(
                h,
                OptionalDouble.of(line.enthalpy(line.theta()).uncertainty()),
                s,
                OptionalDouble.of(line.entropy(line.theta()).uncertainty()),
                OptionalDouble.of(line.covarianceAtTheta()),
                line.scaleStated() ? OptionalDouble.empty() : OptionalDouble.of(line.degreesOfFreedom()),
                OptionalDouble.of(lower),
                OptionalDouble.of(upper),
                Optional.of(marker()));
    }

    /** Says that a standard state was stated; its text, which may be a molality, is written by {@link #members}. */
    private StandardState marker() {
        return table.kind().equals("Kp") || table.converted() ? StandardState.ONE_BAR : StandardState.ONE_MOLAR;
    }

    /** The standard state of the constants, where amounts follow from it. */
    StandardState standard() throws Refusal {
        return table.standard();
    }

    private ClarkeGlew line() throws Refusal {
        return ClarkeGlew.fit(table, theta(), false)
                .orElseThrow(
                        () -> new Refusal("The rows of the equilibrium table do not determine ΔH and ΔS: at least two"
                                + " different temperatures are needed, and three rows where no u is stated."));
    }

    /** Everything of the table that stands beside the usual keys. */
    Map<String, Node> members() throws Refusal {
        ClarkeGlew line = line();
        Optional<ClarkeGlew> bent = ClarkeGlew.fit(table, theta(), true);
        Map<String, Node> members = new LinkedHashMap<>();
        members.put("constantKind", new Node.Text(table.kind()));
        members.put("standardState", new Node.Text(table.standardState()));
        members.put("vantHoff", group(line));
        List<Node> notes = new ArrayList<>();
        if (table.converted()) {
            notes.add(
                    new Node.Text("Kc of gases was turned into Kp at 1 bar: the slope of ln Kc itself is that of ΔU."));
        }
        String verdict = "not tested";
        if (bent.isPresent()) {
            members.put("clarkeGlew", group(bent.get()));
            boolean needed = bent.get().heatCapacityProbability() < 1 - level;
            verdict = needed ? "needed" : "not shown by the data";
            if (needed) {
                notes.add(new Node.Text(
                        "The data show a heat capacity of reaction: ΔH of van 't Hoff is a mean over the range,"
                                + " use clarkeGlew."));
            }
        }
        members.put("heatCapacityVerdict", new Node.Text(verdict));
        members.put("tableNotes", new Node.Items(notes));
        return members;
    }

    /** ln K against 1/T: measured points, the straight line and, where it was fitted, the bent one with its band. */
    Node figure(List<String> cautions) throws Refusal {
        ClarkeGlew line = line();
        Optional<ClarkeGlew> bent = ClarkeGlew.fit(table, theta(), true);
        double[] x = new double[CURVE + 1];
        for (int i = 0; i < x.length; i++) {
            x[i] = i == CURVE ? upper : lower + (upper - lower) * i / CURVE;
        }
        List<Layer> layers = new ArrayList<>();
        ClarkeGlew banded = bent.orElse(line);
        double q = quantile(banded);
        double[] low = new double[x.length];
        double[] high = new double[x.length];
        double[] y = lnK(banded, x);
        for (int i = 0; i < x.length; i++) {
            double half = q * Math.sqrt(Math.max(0, banded.covarianceOfLnK(x[i], x[i])));
            low[i] = y[i] - half;
            high[i] = y[i] + half;
        }
        layers.add(new Layer(Layer.Kind.CONFIDENCE_BAND, Rounding.percent(level), x, y, low, high));
        layers.add(Layer.of(Layer.Kind.LINE, "van 't Hoff", x, lnK(line, x)));
        if (bent.isPresent()) {
            layers.add(Layer.of(Layer.Kind.LINE, "with heat capacity", x, y));
        }
        int n = table.kelvin().size();
        double[] t = new double[n];
        double[] measured = new double[n];
        double[] down = new double[n];
        double[] up = new double[n];
        for (int i = 0; i < n; i++) {
            t[i] = table.kelvin().get(i);
            measured[i] = table.lnK().get(i);
            double u =
                    table.uncertainty().isPresent() ? table.uncertainty().get().get(i) : 0;
            down[i] = measured[i] - q * u;
            up[i] = measured[i] + q * u;
        }
        layers.add(new Layer(Layer.Kind.MEASURED, "", t, measured, down, up));
        return new Node.Figure(
                "equilibrium-constant",
                "ln K against temperature, measured and fitted",
                new Axis("temperature", "K", Axis.Scale.RECIPROCAL_TEMPERATURE),
                new Axis("ln K", "1", Axis.Scale.LINEAR),
                layers,
                cautions);
    }

    private static double[] lnK(ClarkeGlew fit, double[] kelvin) {
        double[] y = new double[kelvin.length];
        for (int i = 0; i < y.length; i++) {
            y[i] = -fit.gibbs(kelvin[i]).value() / (Constants.GAS * kelvin[i]);
        }
        return y;
    }

    private double quantile(ClarkeGlew fit) {
        double probability = 0.5 + level / 2;
        return fit.scaleStated()
                ? Normal.quantile(probability)
                : StudentT.quantile(probability, fit.degreesOfFreedom());
    }

    private Node.Group group(ClarkeGlew fit) {
        double theta = fit.theta();
        Map<String, Node> members = new LinkedHashMap<>();
        members.put("referenceTemperature", Node.Quantity.of(theta, "K"));
        members.put("dG", quantity(fit.gibbs(theta), "J/mol", fit).withCautions(OF_GIBBS));
        members.put("dH", quantity(fit.enthalpy(theta), "J/mol", fit));
        members.put("dS", quantity(fit.entropy(theta), "J/(mol.K)", fit));
        if (fit.heatCapacityFitted()) {
            members.put("dCp", quantity(fit.heatCapacity(), "J/(mol.K)", fit));
            members.put("pValue", new Node.Scalar(fit.heatCapacityProbability()));
        }
        members.put("degreesOfFreedom", new Node.Scalar(fit.degreesOfFreedom()));
        members.put("residualScale", new Node.Scalar(fit.residualScale()));
        members.put("crossovers", new Node.Items(crossovers(fit)));
        return new Node.Group(members);
    }

    /** Sign changes of the fitted ΔG inside the table, on equal steps: a curve of three terms has at most two. */
    List<Node> crossovers(ClarkeGlew fit) {
        List<Double> ends = new ArrayList<>();
        for (int i = 0; i <= STEPS; i++) {
            ends.add(lower + (upper - lower) * i / STEPS);
        }
        List<Double> zeros = new ArrayList<>();
        Zeros.signChanges(t -> fit.gibbs(t).value(), ends, zeros);
        List<Node> items = new ArrayList<>();
        for (double zero : zeros) {
            double slope = Math.abs(fit.entropy(zero).value());
            double u = fit.gibbs(zero).uncertainty() / slope;
            Node.Quantity crossover =
                    slope > 0 && Double.isFinite(u) ? Node.Quantity.of(zero, "K", u) : Node.Quantity.of(zero, "K");
            items.add(crossover.withCautions(List.of("at-stated-composition")));
        }
        return items;
    }

    private Node.Quantity quantity(ClarkeGlew.Estimate estimate, String unit, ClarkeGlew fit) {
        double q = quantile(fit);
        double u = estimate.uncertainty();
        return Node.Quantity.of(estimate.value(), unit, u)
                .withInterval(Interval.between(
                        estimate.value() - q * u, estimate.value() + q * u, level, fit.scaleStated() ? "normal" : "t"));
    }
}
