package org.saddlebook.desk.api;

import java.awt.BasicStroke;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;

/** The marks of the desk, the same as on paper: told apart by shape. Coordinates in points; the caller has smoothed edges. */
public final class Marks {
    private static final double WIDE = 4.5;
    private static final double HIGH = 5.5;
    private static final BasicStroke FINE = new BasicStroke(1f);
    private static final BasicStroke FIRM = new BasicStroke(1.5f);

    private Marks() {}

    /** A measured point: a filled hourglass. */
    public static void measured(Graphics2D g, Ink ink, double x, double y) {
        g.setPaint(ink.ink());
        g.fill(hourglass(x, y));
    }

    /** A point that a person excluded: a hollow hourglass with a slash. */
    public static void excluded(Graphics2D g, Ink ink, double x, double y) {
        g.setPaint(ink.paper());
        g.fill(hourglass(x, y));
        g.setPaint(ink.ink());
        g.setStroke(FINE);
        g.draw(hourglass(x, y));
        g.draw(new Line2D.Double(x - WIDE - 3, y + HIGH - 1, x + WIDE + 3, y - HIGH + 1));
    }

    /** A prediction: an open flat bar. */
    public static void predicted(Graphics2D g, Ink ink, double x, double y) {
        Rectangle2D bar = new Rectangle2D.Double(x - 7.5, y - 2.5, 15, 5);
        g.setPaint(ink.paper());
        g.fill(bar);
        g.setPaint(ink.ink());
        g.setStroke(FIRM);
        g.draw(bar);
    }

    /** The ground of a caution: filled, its upper right corner folded. */
    public static void dogEar(Graphics2D g, Ink ink, double x, double y, double width, double height) {
        double fold = Math.min(9, height / 2);
        Path2D sheet = new Path2D.Double();
        sheet.moveTo(x, y);
        sheet.lineTo(x + width - fold, y);
        sheet.lineTo(x + width, y + fold);
        sheet.lineTo(x + width, y + height);
        sheet.lineTo(x, y + height);
        sheet.closePath();
        g.setPaint(ink.lichen());
        g.fill(sheet);
        g.setPaint(ink.line());
        g.setStroke(FINE);
        Path2D corner = new Path2D.Double();
        corner.moveTo(x + width - fold, y);
        corner.lineTo(x + width - fold, y + fold);
        corner.lineTo(x + width, y + fold);
        g.draw(corner);
    }

    private static Shape hourglass(double x, double y) {
        Path2D path = new Path2D.Double();
        path.moveTo(x - WIDE, y - HIGH);
        path.lineTo(x + WIDE, y - HIGH);
        path.lineTo(x - WIDE, y + HIGH);
        path.lineTo(x + WIDE, y + HIGH);
        path.closePath();
        return path;
    }
}
