package org.saddlebook.charts.internal;

import java.awt.geom.Rectangle2D;
import java.util.function.DoubleUnaryOperator;
import org.saddlebook.api.findings.Layer;

/**
 * Where a line ends, or leaves the drawing area, on the right.
 *
 * @param x horizontal coordinate, px
 * @param y vertical coordinate within the area, px
 * @param before vertical coordinate of the line some way to the left, px: tells on which side of it there is room
 */
record LineEnd(double x, double y, double before) {
    /** How far to the left it is looked, px. */
    static final double SOME_WAY = 90;

    static LineEnd of(Layer layer, DoubleUnaryOperator horizontal, DoubleUnaryOperator vertical, Rectangle2D area) {
        double[] x = layer.x();
        double[] y = layer.y();
        int last = -1;
        for (int i = 0; i < x.length; i++) {
            double px = horizontal.applyAsDouble(x[i]);
            double py = vertical.applyAsDouble(y[i]);
            boolean inside = px >= area.getMinX() - 0.5
                    && px <= area.getMaxX() + 0.5
                    && py >= area.getMinY() - 0.5
                    && py <= area.getMaxY() + 0.5;
            if (inside && (last < 0 || x[i] > x[last])) {
                last = i;
            }
        }
        if (last < 0) {
            // Nowhere in view: named at the edge nearest to its rightmost end.
            for (int i = 0; i < x.length; i++) {
                last = last < 0 || x[i] > x[last] ? i : last;
            }
        }
        double endX = Math.min(area.getMaxX(), horizontal.applyAsDouble(x[last]));
        double endY = clamp(vertical.applyAsDouble(y[last]), area);
        double before = endY;
        double nearest = Double.POSITIVE_INFINITY;
        for (int i = 0; i < x.length; i++) {
            double distance = Math.abs(horizontal.applyAsDouble(x[i]) - (endX - SOME_WAY));
            if (distance < nearest) {
                nearest = distance;
                before = clamp(vertical.applyAsDouble(y[i]), area);
            }
        }
        return new LineEnd(endX, endY, before);
    }

    private static double clamp(double y, Rectangle2D area) {
        return Math.max(area.getMinY(), Math.min(y, area.getMaxY()));
    }
}
