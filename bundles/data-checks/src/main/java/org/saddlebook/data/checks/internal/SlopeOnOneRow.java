package org.saddlebook.data.checks.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.saddlebook.api.findings.Node;
import org.saddlebook.presentation.api.Rounding;

/**
 * One row without which next to nothing is left of the slope: the share {@code 1 − S(without)/S(with)} of the weighted
 * sum of squares of 1/T that goes with it. With evenly spaced temperatures it is 0.75 for three rows, 0.6 for four, less
 * for more.
 */
final class SlopeOnOneRow implements Rule {
    /** Common practice, no source. */
    private static final double SHARE = 0.9;

    @Override
    public String id() {
        return "slope-on-one-row";
    }

    @Override
    public String title() {
        return "one row that carries the slope";
    }

    @Override
    public Outcome examine(Subject subject) {
        List<Row> rows = subject.rows();
        if (rows.size() < 3 || subject.distinctTemperatures() < 2) {
            return new Outcome.NotExamined("it needs three rows at two temperatures");
        }
        double[] weights = Line.weights(rows);
        double whole = spread(rows, weights, -1);
        List<Finding> findings = new ArrayList<>();
        for (int i = 0; i < rows.size(); i++) {
            double share = 1 - spread(rows, weights, i) / whole;
            if (share > SHARE) {
                Row row = rows.get(i);
                findings.add(new Finding(
                        Say.capital(Say.rows(List.of(row))) + " carries " + Rounding.significant(100 * share, 3) + " %"
                                + " of the slope: an error in that one row, or in its temperature, passes almost whole"
                                + " into the activation energy, and nothing in the table could show it. A second run"
                                + " there, or one in between, would.",
                        List.of(row.number()),
                        Map.of("share", new Node.Scalar(share))));
            }
        }
        return Rule.of(findings);
    }

    private static double spread(List<Row> rows, double[] weights, int without) {
        double total = 0;
        double sum = 0;
        for (int i = 0; i < rows.size(); i++) {
            if (i != without) {
                total += weights[i];
                sum += weights[i] / rows.get(i).kelvin();
            }
        }
        double mean = sum / total;
        double squares = 0;
        for (int i = 0; i < rows.size(); i++) {
            if (i != without) {
                double x = 1 / rows.get(i).kelvin() - mean;
                squares += weights[i] * x * x;
            }
        }
        return squares;
    }
}
