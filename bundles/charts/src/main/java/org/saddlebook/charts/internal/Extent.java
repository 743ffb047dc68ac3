package org.saddlebook.charts.internal;

import java.util.List;
import org.saddlebook.api.findings.Layer;

/**
 * The part of an axis that a figure shows. Points, lines and marks are always inside; bands and the whiskers of
 * predictions widen it by at most six tenths on either side, so that an undetermined prediction cannot squash the rest.
 *
 * @param low lowest value
 * @param high highest value
 */
record Extent(double low, double high) {
    private static final double WIDEST = 0.6;

    static Extent horizontal(List<Layer> layers, Spacing spacing) {
        Growing all = new Growing(spacing);
        for (Layer layer : layers) {
            if (layer.kind() != Layer.Kind.HORIZONTAL_MARK) {
                all.add(layer.x());
            }
        }
        return all.padded(0.03);
    }

    static Extent vertical(List<Layer> layers, Spacing spacing) {
        Growing core = new Growing(spacing);
        Growing wide = new Growing(spacing);
        for (Layer layer : layers) {
            switch (layer.kind()) {
                case MEASURED, EXCLUDED -> {
                    core.add(layer.y());
                    core.add(layer.lower());
                    core.add(layer.upper());
                }
                case LINE, HORIZONTAL_MARK, FLOOR -> core.add(layer.y());
                case PREDICTED -> {
                    core.add(layer.y());
                    wide.add(layer.lower());
                    wide.add(layer.upper());
                }
                case CONFIDENCE_BAND, NEW_RUN_BAND -> {
                    wide.add(layer.lower());
                    wide.add(layer.upper());
                }
                case VERTICAL_MARK, WALL, SPINDLE, STRIP_MARK, RUG -> {
                    // Stands at every height, or in the strip under the drawing area.
                }
            }
        }
        if (core.isEmpty()) {
            return wide.padded(0.05);
        }
        double room = WIDEST * (core.high - core.low);
        core.low = Math.min(core.low, Math.max(wide.low, core.low - room));
        core.high = Math.max(core.high, Math.min(wide.high, core.high + room));
        return core.padded(0.05);
    }

    /** Collects positions. */
    private static final class Growing {
        private final Spacing spacing;
        private double low = Double.POSITIVE_INFINITY;
        private double high = Double.NEGATIVE_INFINITY;

        Growing(Spacing spacing) {
            this.spacing = spacing;
        }

        void add(double[] values) {
            for (double value : values) {
                if (spacing.admits(value)) {
                    low = Math.min(low, spacing.position(value));
                    high = Math.max(high, spacing.position(value));
                }
            }
        }

        boolean isEmpty() {
            return !(low <= high);
        }

        Extent padded(double share) {
            if (isEmpty()) {
                return spacing == Spacing.RECIPROCAL ? new Extent(273.15, 373.15) : new Extent(1, 10);
            }
            double pad = (high - low) * share;
            if (!(pad > 0)) {
                pad = Math.max(Math.abs(low) * 0.02, 1e-9);
            }
            double top = high + pad;
            if (spacing == Spacing.RECIPROCAL) {
                // Positions of temperatures end below zero, where T is infinite.
                top = Math.min(top, high / 2);
            }
            return new Extent(spacing.value(low - pad), spacing.value(top));
        }
    }
}
