package org.saddlebook.charts.internal;

import java.awt.geom.Path2D;
import java.util.Arrays;

/**
 * Parallel lines inside a closed outline, worked out as lines and not as a filling pattern: they stay lines in SVG and in
 * print, and need no ids.
 */
final class Hatch {
    private Hatch() {}

    /**
     * The hatch of a polygon.
     *
     * @param x horizontal coordinates of the corners, px
     * @param y vertical coordinates of the corners, px
     * @param slope dy/dx of the lines
     * @param distance vertical distance of neighbouring lines, px
     */
    static Path2D of(double[] x, double[] y, double slope, double distance) {
        Path2D path = new Path2D.Double();
        double low = Double.POSITIVE_INFINITY;
        double high = Double.NEGATIVE_INFINITY;
        for (int i = 0; i < x.length; i++) {
            low = Math.min(low, y[i] - slope * x[i]);
            high = Math.max(high, y[i] - slope * x[i]);
        }
        double[] cuts = new double[x.length];
        for (double c = (Math.floor(low / distance) + 0.5) * distance; c < high; c += distance) {
            int found = 0;
            for (int i = 0; i < x.length; i++) {
                int j = (i + 1) % x.length;
                double here = y[i] - slope * x[i] - c;
                double there = y[j] - slope * x[j] - c;
                if (here < 0 != there < 0) {
                    cuts[found++] = x[i] + (x[j] - x[i]) * here / (here - there);
                }
            }
            Arrays.sort(cuts, 0, found);
            for (int k = 0; k + 1 < found; k += 2) {
                if (cuts[k + 1] - cuts[k] > 0.3) {
                    path.moveTo(cuts[k], slope * cuts[k] + c);
                    path.lineTo(cuts[k + 1], slope * cuts[k + 1] + c);
                }
            }
        }
        return path;
    }
}
