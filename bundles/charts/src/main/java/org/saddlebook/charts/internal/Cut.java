package org.saddlebook.charts.internal;

import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.PathIterator;
import java.awt.geom.Rectangle2D;

/**
 * Cuts lines to a rectangle (Liang and Barsky 1984), so that a part of a figure needs no clip, which SVG here has not.
 */
final class Cut {
    private Cut() {}

    /** The straight pieces of a path that lie in the area, joined where they were joined. */
    static Path2D lines(Path2D path, Rectangle2D area) {
        Path2D cut = new Path2D.Double();
        double[] c = new double[6];
        double x = 0;
        double y = 0;
        double startX = 0;
        double startY = 0;
        for (PathIterator i = path.getPathIterator(null); !i.isDone(); i.next()) {
            switch (i.currentSegment(c)) {
                case PathIterator.SEG_MOVETO -> {
                    startX = c[0];
                    startY = c[1];
                }
                case PathIterator.SEG_LINETO -> piece(cut, x, y, c[0], c[1], area);
                case PathIterator.SEG_CLOSE -> {
                    piece(cut, x, y, startX, startY, area);
                    c[0] = startX;
                    c[1] = startY;
                }
                default -> throw new IllegalArgumentException("a path of straight lines is expected");
            }
            x = c[0];
            y = c[1];
        }
        return cut;
    }

    /** One line cut to the area; null when nothing is left. */
    private static Line2D line(double x1, double y1, double x2, double y2, Rectangle2D area) {
        double[] direction = {x1 - x2, x2 - x1, y1 - y2, y2 - y1};
        double[] room = {x1 - area.getMinX(), area.getMaxX() - x1, y1 - area.getMinY(), area.getMaxY() - y1};
        double from = 0;
        double to = 1;
        for (int k = 0; k < 4; k++) {
            if (direction[k] == 0) {
                if (room[k] < 0) {
                    return null;
                }
            } else if (direction[k] < 0) {
                from = Math.max(from, room[k] / direction[k]);
            } else {
                to = Math.min(to, room[k] / direction[k]);
            }
        }
        return from > to
                ? null
                : new Line2D.Double(
                        x1 + from * (x2 - x1), y1 + from * (y2 - y1), x1 + to * (x2 - x1), y1 + to * (y2 - y1));
    }

    private static void piece(Path2D cut, double x1, double y1, double x2, double y2, Rectangle2D area) {
        Line2D line = line(x1, y1, x2, y2, area);
        if (line == null) {
            return;
        }
        boolean joined = cut.getCurrentPoint() != null
                && Math.abs(cut.getCurrentPoint().getX() - line.getX1()) < 1e-6
                && Math.abs(cut.getCurrentPoint().getY() - line.getY1()) < 1e-6;
        if (!joined) {
            cut.moveTo(line.getX1(), line.getY1());
        }
        cut.lineTo(line.getX2(), line.getY2());
    }
}
