package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.findings.Axis;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.estimation.api.Diagnostics;
import org.saddlebook.estimation.api.FisherF;
import org.saddlebook.estimation.api.Normal;
import org.saddlebook.estimation.api.PointDiagnostics;
import org.saddlebook.estimation.api.RunsTest;
import org.saddlebook.estimation.api.StudentT;
import org.saddlebook.presentation.api.Rounding;

/**
 * The residuals of one law, point by point (Cook and Weisberg 1982) and in order of temperature (Wald and Wolfowitz 1940),
 * and against normal quantiles. It points at what a person may look at; it excludes nothing.
 */
final class Inspection {
    /** Chance of an alarm among all points, or in the runs test, when nothing is wrong. */
    private static final double ALARM = 0.05;

    private static final int FEWEST_FOR_QUANTILES = 5;

    private final FittedLaw law;
    private final List<PointDiagnostics> points;
    private final List<String> notes = new ArrayList<>();
    private final List<String> remarks = new ArrayList<>();

    Inspection(FittedLaw law) {
        this.law = law;
        this.points = Diagnostics.of(law.fit(), law.weights());
    }

    /** What deserves a line in a summary; filled by {@link #node()}. */
    List<String> remarks() {
        return remarks;
    }

    /** Table, runs test and sentences. */
    Node.Group node() {
        double[] residuals = law.fit().residuals();
        List<List<Node>> rows = new ArrayList<>();
        for (PointDiagnostics point : points) {
            int i = point.row();
            rows.add(List.of(
                    new Node.Text(name(i)),
                    new Node.Scalar(law.data().kelvin(i)),
                    new Node.Scalar(residuals[i]),
                    new Node.Scalar(point.leverage()),
                    cell(point.studentised()),
                    cell(point.deletedStudentised()),
                    cell(point.cook())));
            judge(point);
        }
        String response = law.data().response() == Measurements.Response.LN_RATE
                ? "Residual of ln k"
                : "Residual of k, in units of the first one";
        Tree tree = new Tree()
                .put("model", law.id())
                .put(
                        "points",
                        new Node.Table(
                                List.of(
                                        new Node.Column("point", "Point", ""),
                                        new Node.Column("temperature", "Temperature", "K"),
                                        new Node.Column("residual", response, "1"),
                                        new Node.Column("leverage", "Leverage", "1"),
                                        new Node.Column("studentised", "Studentised", "1"),
                                        new Node.Column("deletedStudentised", "Studentised without it", "1"),
                                        new Node.Column("cook", "Cook's distance", "1")),
                                rows));
        runs(tree, residuals);
        if (notes.isEmpty()) {
            notes.add("No point stands out, and the signs of the residuals are in no unusual order.");
        }
        tree.put("notes", Tree.texts(notes));
        if (points.size() >= FEWEST_FOR_QUANTILES
                && points.stream().allMatch(point -> point.studentised().isPresent())) {
            tree.put("normalQuantiles", quantiles());
        }
        return tree.group();
    }

    private static Node cell(OptionalDouble value) {
        return value.isPresent() && Double.isFinite(value.getAsDouble())
                ? new Node.Scalar(value.getAsDouble())
                : new Node.Text("");
    }

    private String name(int i) {
        RatePoint point = law.data().point(i);
        if (!point.label().isEmpty()) {
            return point.label();
        }
        return point.asRead().line().isPresent()
                ? "line " + point.asRead().line().getAsInt()
                : "point " + (i + 1);
    }

    private void judge(PointDiagnostics point) {
        int n = law.fit().observations();
        int p = law.fit().parameterCount();
        int dof = n - p - 1;
        if (dof > 0 && point.deletedStudentised().isPresent()) {
            double size = Math.abs(point.deletedStudentised().getAsDouble());
            if (size > StudentT.quantile(1 - ALARM / 2 / n, dof)) {
                String text = name(point.row()) + " lies " + Rounding.significant(size, 2)
                        + " standard deviations from what the other points predict; by chance the farthest of " + n
                        + " does so in less than " + Rounding.percent(ALARM) + " of campaigns.";
                notes.add(text);
                remarks.add(text);
            }
        }
        if (n - p > 0 && point.cook().isPresent() && point.cook().getAsDouble() > FisherF.quantile(0.5, p, n - p)) {
            notes.add("Without " + name(point.row())
                    + " the parameters move beyond their joint 50 % region (Cook's distance "
                    + Rounding.significant(point.cook().getAsDouble(), 2) + "): it carries the result.");
        }
        if (point.leverage() > 1 - 1e-9) {
            notes.add("The law passes through " + name(point.row()) + " whatever it reads: nothing checks this point.");
        }
    }

    private void runs(Tree tree, double[] residuals) {
        Integer[] order = new Integer[residuals.length];
        for (int i = 0; i < order.length; i++) {
            order[i] = i;
        }
        // Stable: replicates stay in the order of the table.
        Arrays.sort(order, Comparator.comparingDouble((Integer i) -> law.data().kelvin(i)));
        double[] sorted = new double[residuals.length];
        for (int i = 0; i < sorted.length; i++) {
            sorted[i] = residuals[order[i]];
        }
        RunsTest runs = Diagnostics.runs(sorted);
        tree.put(
                "runs",
                new Tree()
                        .put("order", "temperature")
                        .put("runs", runs.runs())
                        .put("positive", runs.positive())
                        .put("negative", runs.negative())
                        .put("probabilityOfSoFew", runs.probabilityOfSoFew())
                        .put("probabilityOfSoMany", runs.probabilityOfSoMany())
                        .group());
        if (runs.probabilityOfSoFew() < ALARM) {
            String text = "Along the temperature the residuals of the law " + law.title() + " keep their sign in only "
                    + runs.runs() + " runs (probability " + Rounding.probability(runs.probabilityOfSoFew())
                    + " by chance): look for curvature.";
            notes.add(text);
            remarks.add(text);
        }
    }

    /** Studentised residuals in order against normal quantiles at (i - 3/8)/(n + 1/4) (G. Blom 1958). */
    private Node.Figure quantiles() {
        int n = points.size();
        double[] y = new double[n];
        double[] x = new double[n];
        for (int i = 0; i < n; i++) {
            y[i] = points.get(i).studentised().orElseThrow();
            x[i] = Normal.quantile((i + 1 - 0.375) / (n + 0.25));
        }
        Arrays.sort(y);
        double end = x[n - 1] * 1.1;
        return new Node.Figure(
                "normal-quantiles",
                "Residuals of the law " + law.title() + " against normal quantiles",
                new Axis("normal quantile", "1", Axis.Scale.LINEAR),
                new Axis("studentised residual", "1", Axis.Scale.LINEAR),
                List.of(
                        Layer.of(Layer.Kind.LINE, "normal", new double[] {-end, end}, new double[] {-end, end}),
                        Layer.of(Layer.Kind.MEASURED, "", x, y)),
                List.of());
    }
}
