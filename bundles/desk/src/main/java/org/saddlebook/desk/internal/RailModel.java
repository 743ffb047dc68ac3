package org.saddlebook.desk.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.findings.Axis;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.desk.api.DeskState;
import org.saddlebook.desk.api.TemperatureScale;

/** The temperature scale and the hairline. Event thread only. */
final class RailModel {
    private static final double COLDEST = 1;
    private static final double ICE = 273.15;
    private static final double STEAM = 373.15;

    private final List<Runnable> scaleListeners = new ArrayList<>();
    private final List<Runnable> hairlineListeners = new ArrayList<>();
    private TemperatureScale scale = new TemperatureScale(ICE, STEAM, 0, 1);
    private OptionalDouble hairline = OptionalDouble.empty();

    /** Positions are points from the left edge of the strata. */
    TemperatureScale scale() {
        return scale;
    }

    OptionalDouble hairline() {
        return hairline;
    }

    void onScale(Runnable listener) {
        scaleListeners.add(listener);
    }

    void onHairline(Runnable listener) {
        hairlineListeners.add(listener);
    }

    void ends(double left, double right) {
        set(new TemperatureScale(scale.lowKelvin(), scale.highKelvin(), left, Math.max(right, left + 1)));
    }

    /** Fits the range to what a state holds; a hairline outside goes to the middle of what was measured. */
    void fit(DeskState state) {
        double[] range = range(state);
        set(new TemperatureScale(range[0], range[1], scale.left(), scale.right()));
        if (hairline.isEmpty() || !scale.holds(hairline.getAsDouble())) {
            move(scale.kelvin((scale.left() + scale.right()) / 2));
        }
    }

    private void set(TemperatureScale next) {
        if (!next.equals(scale)) {
            scale = next;
            List.copyOf(scaleListeners).forEach(Runnable::run);
        }
    }

    void move(double kelvin) {
        if (!(kelvin > 0)) {
            return;
        }
        double kept = Math.min(Math.max(kelvin, scale.lowKelvin()), scale.highKelvin());
        if (hairline.isEmpty() || hairline.getAsDouble() != kept) {
            hairline = OptionalDouble.of(kept);
            List.copyOf(hairlineListeners).forEach(Runnable::run);
        }
    }

    static double[] range(DeskState state) {
        double[] ends = {Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY};
        state.campaign().rateTable().ifPresent(table -> {
            for (RatePoint point : table.points()) {
                widen(ends, point.kelvin());
            }
        });
        for (double target : state.campaign().choices().targetsKelvin()) {
            widen(ends, target);
        }
        state.findings().ifPresent(findings -> figures(findings, ends));
        if (!(ends[1] >= ends[0])) {
            return new double[] {ICE, STEAM};
        }
        double low = 1 / ends[0];
        double high = 1 / ends[1];
        double room = Math.max((low - high) * 0.08, 3e-5);
        return new double[] {Math.max(COLDEST, 1 / (low + room)), 1 / Math.max(high - room, 1e-4)};
    }

    /** Operating windows reach beyond what was measured: their figures say how far. */
    private static void figures(Findings findings, double[] ends) {
        Optional<Section> window = findings.section("window");
        if (window.isEmpty() || !(window.get().body() instanceof Node.Group group)) {
            return;
        }
        for (Node member : group.members().values()) {
            if (member instanceof Node.Figure figure) {
                widen(ends, figure);
            } else if (member instanceof Node.Items items) {
                for (Node item : items.items()) {
                    if (item instanceof Node.Figure figure) {
                        widen(ends, figure);
                    }
                }
            }
        }
    }

    private static void widen(double[] ends, Node.Figure figure) {
        boolean temperature = figure.x().scale() == Axis.Scale.RECIPROCAL_TEMPERATURE
                || figure.x().unit().equals("K");
        if (!temperature) {
            return;
        }
        for (Layer layer : figure.layers()) {
            for (double x : layer.x()) {
                widen(ends, x);
            }
        }
    }

    private static void widen(double[] ends, double kelvin) {
        if (kelvin >= COLDEST && kelvin < 1e4) {
            ends[0] = Math.min(ends[0], kelvin);
            ends[1] = Math.max(ends[1], kelvin);
        }
    }
}
