package org.saddlebook.data.checks.internal;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.estimation.api.LinearFit;
import org.saddlebook.estimation.api.LinearLeastSquares;
import org.saddlebook.estimation.api.LinearOutcome;
import org.saddlebook.estimation.api.StudentT;
import org.saddlebook.presentation.api.Rounding;

/**
 * An amount per time that is the same at every temperature, such as a drifting baseline, leakage or evaporation: it weighs
 * on the slow cold runs most. ln(k + d) = ln k + d/k to first order, so the regressor is 1/k of the line; a curved law
 * (heat capacity of activation) is fitted beside it, so that curvature alone does not count. t test of d at 0.1 %, one
 * for each sign.
 */
final class ColdRunDrift implements Rule {
    private static final double LEVEL = 0.998;
    private static final int LEAST = 6;

    @Override
    public String id() {
        return "cold-run-drift";
    }

    @Override
    public String title() {
        return "drift that bends the cold runs";
    }

    @Override
    public Outcome examine(Subject subject) {
        List<Row> rows = subject.rows();
        if (subject.distinctTemperatures() < LEAST || subject.line().isEmpty()) {
            return new Outcome.NotExamined("it needs six temperatures, to be told from curvature");
        }
        Line line = subject.line().get();
        double centre = line.centreKelvin();
        double[][] design = new double[rows.size()][];
        double[] response = new double[rows.size()];
        double coldest = 0;
        for (int i = 0; i < design.length; i++) {
            double kelvin = rows.get(i).kelvin();
            double x = 1 / kelvin - 1 / centre;
            double curve = StrictMath.log(kelvin / centre) + centre / kelvin - 1;
            // d/k with k of the line, in units of k at the centre.
            double drift = StrictMath.exp(-line.fit().parameters()[1] * x);
            coldest = Math.max(coldest, drift);
            design[i] = new double[] {1, x, curve, drift};
            response[i] = rows.get(i).lnRate();
        }
        LinearOutcome outcome = LinearLeastSquares.fit(design, response, Line.weights(rows));
        if (!(outcome instanceof LinearFit fit) || fit.degreesOfFreedom() < 2) {
            return new Outcome.NotExamined("it needs more rows than six");
        }
        double size = fit.parameters()[3];
        double u = Math.sqrt(fit.unscaledCovariance()[3][3] * fit.residualVariance());
        double t = StudentT.quantile(0.5 + LEVEL / 2, fit.degreesOfFreedom());
        double share = Math.abs(size) * coldest;
        if (!(Math.abs(size) > t * u) || !(share > 0.02)) {
            return new Outcome.Nothing();
        }
        double amount = size
                * StrictMath.exp(line.height())
                / subject.table().rateUnit().factor();
        Map<String, Node> evidence = new LinkedHashMap<>();
        evidence.put(
                "constantPart",
                Node.Quantity.of(amount, subject.table().rateUnit().code()));
        evidence.put("shareInColdest", new Node.Scalar(size * coldest));
        evidence.put("tStatistic", new Node.Scalar(size / u));
        evidence.put("curvature", Node.Quantity.of(fit.parameters()[2] * Constants.GAS, "J/(mol.K)"));
        String sentence = "The cold runs bend away from the law as if "
                + Rounding.significant(Math.abs(amount), 2) + " "
                + org.saddlebook.presentation.api.UnitText.forPeople(
                        subject.table().rateUnit().code())
                + (size > 0 ? " had been added to" : " had been taken from") + " every rate constant: "
                + Rounding.significant(100 * share, 2)
                + " % in the coldest run, little in the hot ones, and more sharply than a curved law bends. A drifting"
                + " baseline, evaporation or an end value taken too early does this in long runs. Look at the traces of"
                + " the coldest runs.";
        return new Outcome.Found(List.of(new Finding(sentence, List.of(), evidence)));
    }
}
