package org.saddlebook.api.findings;

import java.util.Arrays;
import java.util.Objects;

/**
 * One layer of a figure: points, a line, a band or a mark. Coordinates are in the units of the axes; arrays are copied in
 * and out.
 */
public final class Layer {
    /** What a layer is. */
    public enum Kind {
        /** Measured points; {@code lower} and {@code upper} are the ends of the whiskers, equal to y where there are none. */
        MEASURED,
        /** Measured points that a person excluded. */
        EXCLUDED,
        /** Predictions; lower and upper as for MEASURED. */
        PREDICTED,
        /** A line through y(x). */
        LINE,
        /** The interval of the mean: lower(x) to upper(x). */
        CONFIDENCE_BAND,
        /** The interval of a new run: lower(x) to upper(x). */
        NEW_RUN_BAND,
        /** A vertical mark at each x. */
        VERTICAL_MARK,
        /** A horizontal mark at each y. */
        HORIZONTAL_MARK,
        /** A firm vertical line at each x that nothing may cross. */
        WALL,
        /** Everything below y(x), filled. */
        FLOOR,
        /**
         * In a strip of its own under the figure: a body as thick as y(x), from 0 to 1, filled up to lower(x) and
         * outlined beyond it.
         */
        SPINDLE,
        /** In the strip under the figure: a name above each x. */
        STRIP_MARK,
        /** In the strip under the figure: a tick at each x. */
        RUG
    }

    private final Kind kind;
    private final String label;
    private final double[] x;
    private final double[] y;
    private final double[] lower;
    private final double[] upper;

    /**
     * A layer; all four arrays have the same length and hold finite numbers.
     *
     * @param kind what it is
     * @param label name shown beside it; empty for none
     * @param x horizontal coordinates
     * @param y vertical coordinates; for a band the middle line
     * @param lower lower ends
     * @param upper upper ends
     */
    public Layer(Kind kind, String label, double[] x, double[] y, double[] lower, double[] upper) {
        this.kind = Objects.requireNonNull(kind, "kind");
        this.label = Objects.requireNonNull(label, "label");
        if (y.length != x.length || lower.length != x.length || upper.length != x.length) {
            throw new IllegalArgumentException("coordinates of unequal length");
        }
        for (double[] array : new double[][] {x, y, lower, upper}) {
            for (double value : array) {
                if (!Double.isFinite(value)) {
                    throw new IllegalArgumentException("coordinates must be finite: " + value);
                }
            }
        }
        this.x = x.clone();
        this.y = y.clone();
        this.lower = lower.clone();
        this.upper = upper.clone();
    }

    /** A layer without whiskers or band. */
    public static Layer of(Kind kind, String label, double[] x, double[] y) {
        return new Layer(kind, label, x, y, y, y);
    }

    /** What it is. */
    public Kind kind() {
        return kind;
    }

    /** Name shown beside it; empty for none. */
    public String label() {
        return label;
    }

    /** Number of coordinates. */
    public int size() {
        return x.length;
    }

    /** Horizontal coordinates, a copy. */
    public double[] x() {
        return x.clone();
    }

    /** Vertical coordinates, a copy. */
    public double[] y() {
        return y.clone();
    }

    /** Lower ends, a copy. */
    public double[] lower() {
        return lower.clone();
    }

    /** Upper ends, a copy. */
    public double[] upper() {
        return upper.clone();
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Layer layer
                && kind == layer.kind
                && label.equals(layer.label)
                && Arrays.equals(x, layer.x)
                && Arrays.equals(y, layer.y)
                && Arrays.equals(lower, layer.lower)
                && Arrays.equals(upper, layer.upper);
    }

    @Override
    public int hashCode() {
        return Objects.hash(kind, label, Arrays.hashCode(x), Arrays.hashCode(y));
    }
}
