package org.saddlebook.charts.internal;

import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;

/** The shapes of points: told apart without colour. */
final class Marks {
    private static final double WIDE = 4.5;
    private static final double HIGH = 5.5;

    private Marks() {}

    /** A measured point: a filled hourglass on its whisker. */
    static void measured(Graphics2D g, Palette palette, double x, double y, double low, double high) {
        whisker(g, palette, x, low, high);
        g.setPaint(palette.ink());
        g.fill(hourglass(x, y));
    }

    /** A point that a person excluded: a hollow hourglass with a slash. */
    static void excluded(Graphics2D g, Palette palette, double x, double y, double low, double high) {
        whisker(g, palette, x, low, high);
        g.setPaint(palette.paper());
        g.fill(hourglass(x, y));
        g.setPaint(palette.ink());
        g.setStroke(Palette.FINE);
        g.draw(hourglass(x, y));
        g.draw(new Line2D.Double(x - WIDE - 3, y + HIGH - 1, x + WIDE + 3, y - HIGH + 1));
    }

    /** A prediction: an open flat bar; its whisker ends in feet. */
    static void predicted(Graphics2D g, Palette palette, double x, double y, double low, double high) {
        whisker(g, palette, x, low, high);
        if (low > high) {
            g.draw(new Line2D.Double(x - 3, low, x + 3, low));
            g.draw(new Line2D.Double(x - 3, high, x + 3, high));
        }
        Rectangle2D bar = new Rectangle2D.Double(x - 7.5, y - 2.5, 15, 5);
        g.setPaint(palette.paper());
        g.fill(bar);
        g.setPaint(palette.ink());
        g.setStroke(Palette.FIRM);
        g.draw(bar);
    }

    private static void whisker(Graphics2D g, Palette palette, double x, double low, double high) {
        g.setPaint(palette.ink());
        g.setStroke(Palette.FINE);
        if (low > high) {
            g.draw(new Line2D.Double(x, low, x, high));
        }
    }

    private static Path2D hourglass(double x, double y) {
        Path2D path = new Path2D.Double();
        path.moveTo(x - WIDE, y - HIGH);
        path.lineTo(x + WIDE, y - HIGH);
        path.lineTo(x - WIDE, y + HIGH);
        path.lineTo(x + WIDE, y + HIGH);
        path.closePath();
        return path;
    }
}
