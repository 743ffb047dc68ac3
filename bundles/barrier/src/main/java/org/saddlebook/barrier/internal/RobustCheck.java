package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.Parameter;
import org.saddlebook.estimation.api.RobustFit;
import org.saddlebook.estimation.api.RobustLoss;
import org.saddlebook.estimation.api.RobustRegression;
import org.saddlebook.presentation.api.Rounding;

/** M-estimates beside the ordinary fit of one law, never in its place. */
final class RobustCheck {
    /** Fewer points than this make nearly every end point one of high leverage. */
    static final int FEW = 8;

    private static final String LEVERAGE = "M-estimates do not resist leverage: with fewer than about eight points"
            + " nearly every end point pulls the law to itself, and a wrong one is not seen as wrong.";

    private final FittedLaw law;
    private final List<String> remarks = new ArrayList<>();

    RobustCheck(FittedLaw law) {
        this.law = law;
    }

    /** What deserves a line in a summary; filled by {@link #node()}. */
    List<String> remarks() {
        return remarks;
    }

    /** Both robust fits; empty for a law that was found by search or with errors in both variables. */
    Optional<Node.Group> node() {
        Optional<LinearForm> form = LinearForm.of(law);
        if (form.isEmpty() || law.scale().isEmpty() || law.fit().degreesOfFreedom() < 1) {
            return Optional.empty();
        }
        List<List<Node>> rows = new ArrayList<>();
        List<String> notes = new ArrayList<>();
        row(rows, "least squares", law.fit().parameters(), null);
        loss(form.get(), "Huber (1.345)", RobustLoss.huber(), rows, notes);
        loss(form.get(), "bisquare (4.685)", RobustLoss.bisquare(), rows, notes);
        if (law.data().size() < FEW) {
            notes.add(LEVERAGE);
        }
        notes.add(Coverage.ROBUST);
        List<Node.Column> columns = new ArrayList<>();
        columns.add(new Node.Column("method", "Method", ""));
        for (Parameter parameter : law.parameters()) {
            columns.add(new Node.Column(
                    parameter.symbol(),
                    Words.symbol(parameter.symbol()),
                    parameter.unit().code()));
        }
        columns.add(new Node.Column("downweighted", "Points that lost weight", ""));
        return Optional.of(new Tree()
                .put("model", law.id())
                .put("fits", new Node.Table(columns, rows))
                .put("notes", Tree.texts(notes))
                .group());
    }

    private void loss(LinearForm form, String name, RobustLoss loss, List<List<Node>> rows, List<String> notes) {
        RobustRegression.fit(form.design(), form.response(), form.weightsOrNull(), loss)
                .fold(
                        fit -> {
                            row(rows, name, fit.parameters(), fit);
                            compare(name, fit, notes);
                            return true;
                        },
                        refused -> notes.add(name + ": " + refused.reason() + "."));
    }

    private void row(List<List<Node>> rows, String name, double[] values, RobustFit robustOrNull) {
        Quantities quantities = new Quantities(0.95, law.degreesOfFreedom());
        List<Node> row = new ArrayList<>();
        row.add(new Node.Text(name));
        for (int j = 0; j < values.length; j++) {
            Parameter parameter = law.parameters().get(j);
            double variance = robustOrNull == null
                    ? law.parameter(j).variance().orElseThrow()
                    : robustOrNull.covariance()[j][j];
            Node.Quantity shown = quantities.of(
                    new FittedLaw.Estimate(values[j], OptionalDouble.of(variance), 0),
                    parameter.scale(),
                    parameter.unit(),
                    List.of());
            // Without an interval: none that covers what it says is known for so few points.
            row.add(new Node.Quantity(
                    shown.value(),
                    shown.unit(),
                    shown.standardUncertainty(),
                    shown.standardFactor(),
                    Optional.empty(),
                    List.of()));
        }
        row.add(new Node.Text(robustOrNull == null ? "" : lost(robustOrNull.robustWeights())));
        rows.add(row);
    }

    private String lost(double[] weights) {
        StringBuilder text = new StringBuilder();
        for (int i = 0; i < weights.length; i++) {
            if (weights[i] < 0.995) {
                text.append(text.isEmpty() ? "" : ", ")
                        .append(Words.kelvin(law.data().kelvin(i)))
                        .append(" keeps ")
                        .append(Rounding.percent(Math.rint(weights[i] * 100) / 100));
            }
        }
        return text.toString();
    }

    private void compare(String name, RobustFit fit, List<String> notes) {
        for (int j = 0; j < law.parameters().size(); j++) {
            double u = Math.sqrt(law.parameter(j).variance().orElseThrow());
            double moved = (fit.parameters()[j] - law.fit().parameters()[j]) / u;
            if (Math.abs(moved) > 1) {
                String text = name + " moves "
                        + Words.symbol(law.parameters().get(j).symbol()) + " of " + law.title() + " by "
                        + Rounding.significant(Math.abs(moved), 2)
                        + " of its standard uncertainties: a few points carry the difference.";
                notes.add(text);
                if (remarks.isEmpty()) {
                    remarks.add(text);
                }
            }
        }
    }
}
