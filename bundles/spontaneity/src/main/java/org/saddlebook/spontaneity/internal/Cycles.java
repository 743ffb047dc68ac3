package org.saddlebook.spontaneity.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.estimation.api.ChiSquared;
import org.saddlebook.estimation.api.Normal;

/**
 * Thermodynamic cycles: around a closed way the equilibrium constants multiply to 1 (R. Wegscheider, Monatsh. Chem. 22 (1901)
 * 849). With {@code x} the ln K of all steps, V their variances and L the cycles, {@code χ² = (Lx)ᵀ(LVLᵀ)⁻¹(Lx)}; the adjusted
 * values {@code x − VLᵀ(LVLᵀ)⁻¹Lx} close exactly and change x least (adjustment by conditions, C. F. Gauss).
 */
final class Cycles {
    private final CycleSteps steps;
    private final double level;

    Cycles(CycleSteps steps, double level) {
        this.steps = steps;
        this.level = level;
    }

    Node.Group node(List<Node> notes) {
        int n = steps.names().size();
        int m = steps.cycles().size();
        double[] x = new double[n];
        double[] v = new double[n];
        boolean all = true;
        for (int i = 0; i < n; i++) {
            x[i] = steps.lnK()[i];
            all &= steps.uncertainty()[i].isPresent();
            v[i] = square(steps.uncertainty()[i].orElse(0));
        }
        List<String> cautions = List.of(ConsistencyCautions.REVERSIBLE, ConsistencyCautions.INDEPENDENT);
        double q = Normal.quantile(0.5 + level / 2);
        double[] closure = new double[m];
        double[][] variance = new double[m][m];
        List<Node> rows = new ArrayList<>();
        for (int c = 0; c < m; c++) {
            for (int i = 0; i < n; i++) {
                closure[c] += steps.cycles().get(c)[i] * x[i];
                for (int d = 0; d < m; d++) {
                    variance[c][d] +=
                            steps.cycles().get(c)[i] * v[i] * steps.cycles().get(d)[i];
                }
            }
            Map<String, Node> row = new LinkedHashMap<>();
            row.put("cycle", new Node.Text(steps.text(c)));
            double u = Math.sqrt(variance[c][c]);
            Node.Quantity ln = all && u > 0
                    ? Node.Quantity.of(closure[c], "1", u)
                            .withInterval(Interval.between(closure[c] - q * u, closure[c] + q * u, level, "normal"))
                    : Node.Quantity.of(closure[c], "1");
            row.put("lnProduct", ln.withCautions(cautions));
            row.put("product", new Node.Scalar(StrictMath.exp(closure[c])));
            row.put(
                    "misclosure",
                    Node.Quantity.of(Constants.GAS * steps.kelvin() * closure[c], "J/mol")
                            .withCautions(cautions));
            if (all && u > 0) {
                row.put("pValue", new Node.Scalar(ChiSquared.upperTail(square(closure[c] / u), 1)));
            }
            rows.add(new Node.Group(row));
        }
        Map<String, Node> body = new LinkedHashMap<>();
        body.put("temperature", Node.Quantity.of(steps.kelvin(), "K"));
        body.put("closures", new Node.Items(rows));
        Optional<double[][]> inverse = all ? SmallMatrix.inverse(variance) : Optional.empty();
        if (!all) {
            body.put("verdict", new Node.Text("not tested"));
            notes.add(new Node.Text("The cycles are not tested: at least one step states no u."));
        } else if (inverse.isEmpty()) {
            body.put("verdict", new Node.Text("not tested"));
            notes.add(new Node.Text(
                    "The cycles are not tested together: one of them follows from the others, leave it out."));
        } else {
            adjust(body, notes, x, v, closure, inverse.get(), cautions);
        }
        return new Node.Group(body);
    }

    private void adjust(
            Map<String, Node> body,
            List<Node> notes,
            double[] x,
            double[] v,
            double[] closure,
            double[][] inverse,
            List<String> cautions) {
        int n = x.length;
        int m = closure.length;
        double chi = SmallMatrix.quadratic(inverse, closure);
        double p = ChiSquared.upperTail(chi, m);
        body.put("test", RatesAgainstK.test(chi, m, p, "chi-squared over all cycles"));
        boolean closes = p >= 1 - level;
        body.put("verdict", new Node.Text(closes ? "close within their uncertainties" : "do not close"));
        double[] multipliers = SmallMatrix.times(inverse, closure);
        List<Node> rows = new ArrayList<>();
        double largest = 0;
        List<String> suspects = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            double[] own = new double[m];
            double correction = 0;
            for (int c = 0; c < m; c++) {
                own[c] = steps.cycles().get(c)[i];
                correction -= v[i] * own[c] * multipliers[c];
            }
            double reduced = v[i] * v[i] * SmallMatrix.quadratic(inverse, own);
            double size = reduced > 0 ? Math.abs(correction) / Math.sqrt(reduced) : 0;
            Map<String, Node> row = new LinkedHashMap<>();
            row.put("step", new Node.Text(steps.names().get(i)));
            row.put(
                    "lnK",
                    Node.Quantity.of(x[i] + steps.perLitre(i), "1", Math.sqrt(v[i]))
                            .withCautions(cautions));
            row.put(
                    "adjusted",
                    Node.Quantity.of(x[i] + steps.perLitre(i) + correction, "1", Math.sqrt(Math.max(0, v[i] - reduced)))
                            .withCautions(cautions));
            row.put("normalisedCorrection", new Node.Scalar(size));
            rows.add(new Node.Group(row));
            if (size > largest * (1 + 1e-9)) {
                suspects.clear();
            }
            if (size > 0 && size >= largest * (1 - 1e-9)) {
                suspects.add(steps.names().get(i));
                largest = Math.max(largest, size);
            }
        }
        body.put("steps", new Node.Items(rows));
        if (closes) {
            return;
        }
        notes.add(new Node.Text(
                suspects.size() == 1
                        ? "The cycles do not close. The step whose correction is largest for its uncertainty is "
                                + suspects.get(0) + "; look there first."
                        : "The cycles do not close, and they cannot tell which of these steps is wrong: "
                                + String.join(", ", suspects) + "."));
    }

    private static double square(double value) {
        return value * value;
    }
}
