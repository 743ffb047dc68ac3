package org.saddlebook.spontaneity.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Axis;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.estimation.api.ChiSquared;
import org.saddlebook.estimation.api.FisherF;
import org.saddlebook.estimation.api.Normal;
import org.saddlebook.estimation.api.StudentT;

/**
 * Whether forward and reverse rate constants and K agree: {@code kf/kr = K (p°/RT)^Δν(gas) (c°)^Δν(solution)} in mol/m3, and
 * {@code Ea,f − Ea,r = ΔH − Δν(gas) RT}. Two tests: point by point at temperatures that both directions share, with the full
 * covariance of K (chi-squared); and by the straight lines of ln k against 1/T at the middle of the data (two degrees of freedom;
 * where a scale was estimated from scatter, Fisher's F with the smaller degrees of freedom, which is careful).
 */
final class RatesAgainstK {
    /** Temperatures closer than this are the same, K. */
    private static final double SAME = 0.02;

    private final RateSeries forward;
    private final RateSeries reverse;
    private final EquilibriumSource equilibrium;
    private final double level;
    private final double ordersDiffer;
    private final List<Shared> shared;

    /** A temperature that both directions have. */
    private record Shared(double kelvin, double lnRatio, double variance) {}

    RatesAgainstK(RateSeries forward, RateSeries reverse, EquilibriumSource equilibrium, double level) throws Refusal {
        this.forward = forward;
        this.reverse = reverse;
        this.equilibrium = equilibrium;
        this.level = level;
        ordersDiffer = reverse.order() - forward.order();
        double molecules = equilibrium.gasChange(ordersDiffer) + equilibrium.soluteChange(ordersDiffer);
        if (Math.abs(molecules - ordersDiffer) > 1e-9) {
            throw new Refusal(
                    "The units do not fit the equilibrium: the orders of the forward and reverse rate constants are "
                            + Words.number(forward.order()) + " and " + Words.number(reverse.order())
                            + ", so kf/kr has concentration"
                            + " to the power " + Words.number(ordersDiffer)
                            + ", but the number of dissolved and gas molecules changes"
                            + " by " + Words.number(molecules) + ". Check the units of k, or the equation.");
        }
        shared = shared();
    }

    private List<Shared> shared() {
        List<Shared> found = new ArrayList<>();
        boolean stated =
                forward.uncertainty().isPresent() && reverse.uncertainty().isPresent();
        List<Double> done = new ArrayList<>();
        for (double kelvin : forward.kelvin()) {
            boolean known = false;
            for (double one : done) {
                known |= Math.abs(one - kelvin) <= SAME;
            }
            Optional<double[]> f = mean(forward, kelvin, stated);
            Optional<double[]> r = mean(reverse, kelvin, stated);
            if (!known && f.isPresent() && r.isPresent()) {
                done.add(kelvin);
                found.add(new Shared(kelvin, f.get()[0] - r.get()[0], stated ? f.get()[1] + r.get()[1] : Double.NaN));
            }
        }
        return found;
    }

    /** Weighted mean of ln k at one temperature and its variance. */
    private static Optional<double[]> mean(RateSeries series, double kelvin, boolean stated) {
        double weights = 0;
        double sum = 0;
        for (int i = 0; i < series.kelvin().size(); i++) {
            if (Math.abs(series.kelvin().get(i) - kelvin) <= SAME) {
                double u = stated ? series.uncertainty().orElseThrow().get(i) : 1;
                weights += 1 / (u * u);
                sum += series.lnRate().get(i) / (u * u);
            }
        }
        return weights > 0 ? Optional.of(new double[] {sum / weights, 1 / weights}) : Optional.empty();
    }

    /** ln of kf/kr that K asks for, in SI. */
    private double expected(double kelvin) {
        return equilibrium.lnK(kelvin) + equilibrium.lnUnit(kelvin, ordersDiffer);
    }

    Node.Group node(List<Node> notes, List<Node> figures) {
        Map<String, Node> body = new LinkedHashMap<>();
        body.put("relation", new Node.Text(equilibrium.relation(ordersDiffer) + ", K from: " + equilibrium.name()));
        List<String> verdicts = new ArrayList<>();
        points(body, verdicts, figures);
        lines(body, verdicts);
        String verdict = verdicts.isEmpty()
                ? "not tested"
                : verdicts.contains("do not agree") ? "do not agree" : "agree within their uncertainties";
        body.put("verdict", new Node.Text(verdict));
        notes.add(
                new Node.Text(
                        verdicts.isEmpty()
                                ? "Nothing was tested: state u of every k and a shared temperature, or two temperatures (three without u) in"
                                        + " each direction."
                                : verdict.equals("do not agree")
                                        ? "Forward and reverse rate constants and K do not agree: one of the three, a standard state, a unit or"
                                                + " the assumption that both directions pass the same transition state is wrong."
                                        : "That they agree does not prove the mechanism; errors larger than these would have been seen."));
        return new Node.Group(body);
    }

    private void points(Map<String, Node> body, List<String> verdicts, List<Node> figures) {
        int n = shared.size();
        if (n == 0) {
            return;
        }
        boolean stated =
                forward.uncertainty().isPresent() && reverse.uncertainty().isPresent();
        double[] difference = new double[n];
        double[][] variance = new double[n][n];
        List<Node> rows = new ArrayList<>();
        double q = Normal.quantile(0.5 + level / 2);
        for (int i = 0; i < n; i++) {
            double t = shared.get(i).kelvin();
            difference[i] = shared.get(i).lnRatio() - expected(t);
            for (int j = 0; j < n; j++) {
                variance[i][j] = equilibrium.covariance(t, shared.get(j).kelvin())
                        + (i == j && stated ? shared.get(i).variance() : 0);
            }
            Map<String, Node> row = new LinkedHashMap<>();
            row.put("temperature", Node.Quantity.of(t, "K"));
            row.put("lnRatio", new Node.Scalar(shared.get(i).lnRatio() - equilibrium.lnUnit(t, ordersDiffer)));
            row.put("lnK", new Node.Scalar(equilibrium.lnK(t)));
            double u = Math.sqrt(variance[i][i]);
            Node.Quantity quantity = stated && u > 0
                    ? Node.Quantity.of(difference[i], "1", u)
                            .withInterval(
                                    Interval.between(difference[i] - q * u, difference[i] + q * u, level, "normal"))
                    : Node.Quantity.of(difference[i], "1");
            row.put("difference", quantity.withCautions(cautions(t)));
            rows.add(new Node.Group(row));
        }
        body.put("points", new Node.Items(rows));
        Optional<double[][]> inverse = stated ? SmallMatrix.inverse(variance) : Optional.empty();
        if (inverse.isPresent()) {
            double chi = SmallMatrix.quadratic(inverse.get(), difference);
            double p = ChiSquared.upperTail(chi, n);
            body.put(
                    "pointTest",
                    test(chi, n, p, "chi-squared over shared temperatures, K's errors in common included"));
            verdicts.add(p < 1 - level ? "do not agree" : "agree");
            figures.add(figure(difference, variance, q));
        }
    }

    private Node figure(double[] difference, double[][] variance, double q) {
        int n = difference.length;
        double[] x = new double[n];
        double[] low = new double[n];
        double[] high = new double[n];
        for (int i = 0; i < n; i++) {
            x[i] = shared.get(i).kelvin();
            low[i] = difference[i] - q * Math.sqrt(variance[i][i]);
            high[i] = difference[i] + q * Math.sqrt(variance[i][i]);
        }
        return new Node.Figure(
                "rates-against-k",
                "ln of (kf/kr) over what K asks for; zero where they agree",
                new Axis("temperature", "K", Axis.Scale.RECIPROCAL_TEMPERATURE),
                new Axis("difference in ln", "1", Axis.Scale.LINEAR),
                List.of(
                        Layer.of(Layer.Kind.HORIZONTAL_MARK, "", new double[] {x[0]}, new double[] {0}),
                        new Layer(Layer.Kind.MEASURED, "", x, difference, low, high)),
                cautions(x[0]));
    }

    private void lines(Map<String, Node> body, List<String> verdicts) {
        double theta = center();
        Optional<RateSeries.Line> f = forward.line(theta);
        Optional<RateSeries.Line> r = reverse.line(theta);
        if (f.isEmpty() || r.isEmpty()) {
            return;
        }
        double gas = equilibrium.gasChange(ordersDiffer);
        double fromRates = f.get().energy() - r.get().energy();
        double fromK = equilibrium.enthalpy(theta) - gas * Constants.GAS * theta;
        double[] difference = {f.get().lnRate() - r.get().lnRate() - expected(theta), fromRates - fromK};
        double[][] variance = ofK(theta);
        double varianceOfK = variance[1][1];
        for (int i = 0; i < 2; i++) {
            for (int j = 0; j < 2; j++) {
                variance[i][j] += f.get().covariance()[i][j] + r.get().covariance()[i][j];
            }
        }
        OptionalDouble dof = smaller(f.get().degreesOfFreedom(), r.get().degreesOfFreedom());
        double probability = 0.5 + level / 2;
        double q = dof.isPresent() ? StudentT.quantile(probability, dof.getAsDouble()) : Normal.quantile(probability);
        String method = dof.isPresent() ? "t" : "normal";
        Map<String, Node> lines = new LinkedHashMap<>();
        List<String> cautions = cautions(theta);
        lines.put("referenceTemperature", Node.Quantity.of(theta, "K"));
        lines.put(
                "differenceInLn",
                quantity(difference[0], variance[0][0], q, method, "1").withCautions(cautions));
        lines.put(
                "energyFromRates",
                quantity(fromRates, variance[1][1] - varianceOfK, q, method, "J/mol")
                        .withCautions(cautions));
        lines.put(
                "energyFromK",
                quantity(fromK, varianceOfK, q, "normal", "J/mol").withCautions(cautions));
        lines.put(
                "energyDifference",
                quantity(difference[1], variance[1][1], q, method, "J/mol").withCautions(cautions));
        body.put("lines", new Node.Group(lines));
        Optional<double[][]> inverse = SmallMatrix.inverse(variance);
        if (inverse.isPresent()) {
            double chi = SmallMatrix.quadratic(inverse.get(), difference);
            double p =
                    dof.isPresent() ? FisherF.upperTail(chi / 2, 2, dof.getAsDouble()) : ChiSquared.upperTail(chi, 2);
            body.put(
                    "lineTest",
                    test(
                            chi,
                            2,
                            p,
                            dof.isPresent() ? "F of the lines, scale from scatter" : "chi-squared of the lines"));
            verdicts.add(p < 1 - level ? "do not agree" : "agree");
        }
    }

    /** Covariance of ln K and ΔH at a temperature: {@code ΔH = R T² d ln K/dT}, derivatives by central differences. */
    private double[][] ofK(double theta) {
        double step = theta * 1e-3;
        double factor = Constants.GAS * theta * theta / (2 * step);
        double up = theta + step;
        double down = theta - step;
        double both = factor * (equilibrium.covariance(theta, up) - equilibrium.covariance(theta, down));
        double slope = factor
                * factor
                * (equilibrium.covariance(up, up)
                        - 2 * equilibrium.covariance(up, down)
                        + equilibrium.covariance(down, down));
        return new double[][] {{equilibrium.covariance(theta, theta), both}, {both, Math.max(0, slope)}};
    }

    private double center() {
        double inverse = 0;
        int n = 0;
        for (RateSeries series : List.of(forward, reverse)) {
            for (double kelvin : series.kelvin()) {
                inverse += 1 / kelvin;
                n++;
            }
        }
        return n / inverse;
    }

    private static OptionalDouble smaller(OptionalDouble one, OptionalDouble other) {
        return one.isPresent() && other.isPresent()
                ? OptionalDouble.of(Math.min(one.getAsDouble(), other.getAsDouble()))
                : one.isPresent() ? one : other;
    }

    private Node.Quantity quantity(double value, double variance, double q, String method, String unit) {
        double u = Math.sqrt(Math.max(0, variance));
        return u > 0
                ? Node.Quantity.of(value, unit, u)
                        .withInterval(Interval.between(value - q * u, value + q * u, level, method))
                : Node.Quantity.of(value, unit);
    }

    static Node.Group test(double chi, int dof, double p, String what) {
        Map<String, Node> test = new LinkedHashMap<>();
        test.put("test", new Node.Text(what));
        test.put("chiSquared", new Node.Scalar(chi));
        test.put("degreesOfFreedom", new Node.Scalar(dof));
        test.put("pValue", new Node.Scalar(p));
        return new Node.Group(test);
    }

    private List<String> cautions(double kelvin) {
        List<String> ids = new ArrayList<>();
        if (!equilibrium.covers(kelvin)) {
            ids.add("extrapolated");
        }
        ids.add(ConsistencyCautions.REVERSIBLE);
        if (equilibrium.covariance(kelvin, kelvin) == 0) {
            ids.add(SpontaneityCautions.NO_UNCERTAINTY);
        }
        ids.add(ConsistencyCautions.INDEPENDENT);
        return ids;
    }
}
