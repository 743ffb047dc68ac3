package org.saddlebook.window.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.findings.Axis;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.presentation.api.Rounding;

/**
 * Every limit as headroom above its floor, in kJ/mol against temperature, with the interval of each; walls of the
 * equipment; beneath, a spindle whose thickness is the probability that all hold, filled where rates were measured.
 */
final class HeadroomFigure {
    private static final int POINTS = 41;

    /** Headroom beyond these is of no interest for a decision and would squash what is, kJ/mol. */
    private static final double DEEPEST = -12;

    private static final double HIGHEST = 40;

    private final WindowFindings findings;
    private final Draws draws;
    private final Campaign campaign;

    HeadroomFigure(WindowFindings findings, Draws draws, Campaign campaign) {
        this.findings = findings;
        this.draws = draws;
        this.campaign = campaign;
    }

    Node.Figure node() {
        double[] all = findings.held().kelvin();
        double[] grid = WindowSearch.spaced(all[0], all[all.length - 1], POINTS);
        List<Layer> bands = new ArrayList<>();
        List<Layer> lines = new ArrayList<>();
        Headroom headroom = findings.headroom();
        for (int i = 0; i < headroom.limits().size(); i++) {
            limit(i, grid, bands, lines);
        }
        List<Layer> layers = new ArrayList<>();
        layers.add(Layer.of(Layer.Kind.FLOOR, "", grid, new double[grid.length]));
        layers.addAll(bands);
        layers.addAll(lines);
        walls(layers);
        layers.add(spindle(all));
        ends(layers);
        runs(layers);
        return new Node.Figure(
                "headroom",
                title(),
                new Axis("temperature", "K", Axis.Scale.RECIPROCAL_TEMPERATURE),
                new Axis("headroom", "kJ/mol", Axis.Scale.LINEAR),
                layers,
                findings.cautions(findings.extrapolation(all[0]) > 0 ? all[0] : all[all.length - 1]));
    }

    private String title() {
        List<WindowSearch.Found> found = findings.found();
        if (found.isEmpty()) {
            return "Headroom of every limit: at no temperature do all hold with " + Rounding.percent(findings.level());
        }
        StringBuilder text = new StringBuilder("Headroom: all limits hold from ");
        for (int i = 0; i < found.size(); i++) {
            text.append(i == 0 ? "" : " and from ")
                    .append(Words.celsius(
                            found.get(i).lower().kelvin(), found.get(i).upper().kelvin()));
        }
        return text.append(" (")
                .append(Rounding.percent(findings.level()))
                .append(" at each temperature)")
                .toString();
    }

    /** Line and band of one limit, where its headroom lies within what the figure shows. */
    private void limit(int index, double[] grid, List<Layer> bands, List<Layer> lines) {
        Limit limit = findings.headroom().limits().get(index);
        List<double[]> rows = new ArrayList<>();
        double two = (1 - findings.level()) / 2;
        for (double kelvin : grid) {
            double lnRate = findings.fitted().isPresent()
                    ? findings.fitted().get().laws().get(0).at(kelvin).lnRate()
                    : Double.NaN;
            double best = findings.headroom()
                            .form(index, kelvin, lnRate, findings.law())
                            .base()
                    / 1000;
            if (!(best >= DEEPEST && best <= HIGHEST)) {
                continue;
            }
            double[] drawn = draws.headroom(index, kelvin);
            double low = WindowSearch.quantile(drawn, two) / 1000;
            double high = WindowSearch.quantile(drawn, 1 - two) / 1000;
            rows.add(new double[] {kelvin, best, inside(low, DEEPEST), inside(high, HIGHEST)});
        }
        if (rows.isEmpty()) {
            return;
        }
        double[][] columns = new double[4][rows.size()];
        boolean uncertain = false;
        for (int i = 0; i < rows.size(); i++) {
            for (int j = 0; j < columns.length; j++) {
                columns[j][i] = rows.get(i)[j];
            }
            uncertain |= columns[3][i] - columns[2][i] > 1e-9;
        }
        if (uncertain) {
            bands.add(new Layer(
                    Layer.Kind.CONFIDENCE_BAND, limit.title(), columns[0], columns[1], columns[2], columns[3]));
        }
        lines.add(Layer.of(Layer.Kind.LINE, limit.title(), columns[0], columns[1]));
    }

    private static double inside(double value, double otherwise) {
        if (!Double.isFinite(value)) {
            return otherwise;
        }
        return Math.max(DEEPEST, Math.min(HIGHEST, value));
    }

    private void walls(List<Layer> layers) {
        Limit.Equipment walls = findings.request().equipment();
        if (walls.lowerKelvin().isPresent()) {
            wall(layers, walls.lowerTitle(), walls.lowerKelvin().getAsDouble());
        }
        if (walls.upperKelvin().isPresent()) {
            wall(layers, walls.upperTitle(), walls.upperKelvin().getAsDouble());
        }
    }

    private static void wall(List<Layer> layers, String title, double kelvin) {
        layers.add(Layer.of(
                Layer.Kind.WALL, title + " " + Words.celsius(kelvin), new double[] {kelvin}, new double[] {0}));
    }

    private Layer spindle(double[] kelvin) {
        double[] all = findings.held().all();
        double[] filled = new double[all.length];
        for (int i = 0; i < filled.length; i++) {
            filled[i] = findings.extrapolation(kelvin[i]) > 0 ? 0 : all[i];
        }
        return new Layer(Layer.Kind.SPINDLE, "all hold", kelvin, all, filled, all);
    }

    private void ends(List<Layer> layers) {
        for (WindowSearch.Found each : findings.found()) {
            end(layers, each.lower());
            end(layers, each.upper());
        }
    }

    private void end(List<Layer> layers, WindowSearch.End end) {
        String name = switch (end.stop()) {
            case RANGE -> "";
            case WALL -> "wall binds";
            case LIMIT -> findings.headroom().limits().get(end.limit()).title() + " binds";
        };
        if (!name.isEmpty()) {
            layers.add(Layer.of(Layer.Kind.STRIP_MARK, name, new double[] {end.kelvin()}, new double[] {0}));
        }
    }

    private void runs(List<Layer> layers) {
        if (findings.fitted().isEmpty() || campaign.rateTable().isEmpty()) {
            return;
        }
        List<RatePoint> used = campaign.rateTable().get().used();
        double[] x = new double[used.size()];
        for (int i = 0; i < x.length; i++) {
            x[i] = used.get(i).kelvin();
        }
        layers.add(Layer.of(Layer.Kind.RUG, "runs", x, new double[x.length]));
    }
}
