package org.saddlebook.charts.internal;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Names at the ends of lines, moved apart where they would touch, with a leader to the line each belongs to. */
final class EndLabels {
    static final int SIZE = 11;
    static final double LINE_HEIGHT = 13;
    static final double WIDEST = 130;

    /** Distance from the drawing area to the text; room for the leader. */
    static final double GAP = 22;

    private static final double MOST_CLEARANCE = 240;

    private static final class Label {
        private final List<String> lines;
        private final double endX;
        private final double endY;
        private final double before;
        private final Color ink;
        private double top;

        Label(List<String> lines, double endX, double endY, double before, Color ink) {
            this.lines = lines;
            this.endX = endX;
            this.endY = endY;
            this.before = before;
            this.ink = ink;
            this.top = endY - height() / 2;
        }

        double height() {
            return lines.size() * LINE_HEIGHT;
        }
    }

    private final List<Label> labels = new ArrayList<>();

    /**
     * Adds a name.
     *
     * @param before vertical coordinate of the line some way to the left of its end
     */
    void add(String text, double endX, double endY, double before, Color ink) {
        if (!text.isEmpty()) {
            labels.add(new Label(Lettering.wrap(text, SIZE, WIDEST), endX, endY, before, ink));
        }
    }

    /** Room the names need at the right of the drawing area. */
    static double room(List<String> names) {
        double most = 0;
        for (String name : names) {
            for (String line : Lettering.wrap(name, SIZE, WIDEST)) {
                most = Math.max(most, Lettering.width(line, SIZE, false));
            }
        }
        return most == 0 ? 0 : GAP + most;
    }

    void draw(Graphics2D g, Palette palette, double right, double top, double bottom) {
        labels.sort(Comparator.comparingDouble((Label label) -> label.endY));
        spread(top, bottom);
        for (Label label : labels) {
            double middle = label.top + label.height() / 2;
            g.setPaint(label.ink);
            g.setStroke(Palette.HAIR);
            g.draw(new Line2D.Double(label.endX + 2, label.endY, right + 5, label.endY));
            g.draw(new Line2D.Double(right + 5, label.endY, right + GAP - 4, middle));
            double y = label.top + LINE_HEIGHT - 3;
            for (String line : label.lines) {
                Lettering.draw(g, line, right + GAP, y, Lettering.Anchor.START, SIZE, false, palette.ink());
                y += LINE_HEIGHT;
            }
        }
    }

    /**
     * Names within the drawing area, for a figure without room beside it: ending left of the line's end, above a line that
     * rises to it and below one that falls, each on a patch of paper with a leader to its line; beside a wall, never on it.
     *
     * @param walls horizontal coordinates of walls
     */
    void drawInside(Graphics2D g, Palette palette, Rectangle2D area, List<Double> walls) {
        for (Label label : labels) {
            boolean above = label.before >= label.endY;
            label.top = above ? label.endY - label.height() - 8 : label.endY + 8;
        }
        labels.sort(Comparator.comparingDouble((Label label) -> label.top));
        // Names above their lines give way upward; those below are moved down by what follows.
        double ceiling = Double.POSITIVE_INFINITY;
        for (int i = labels.size() - 1; i >= 0; i--) {
            Label label = labels.get(i);
            if (label.top < label.endY) {
                label.top = Math.min(label.top, ceiling - label.height() - 2);
                ceiling = label.top;
            }
        }
        spread(area.getMinY() + 2, area.getMaxY() - 2);
        for (Label label : labels) {
            double right = Math.min(label.endX, area.getMaxX()) - 14 - clearance(label);
            double wide = 0;
            for (String line : label.lines) {
                wide = Math.max(wide, Lettering.width(line, SIZE, false));
            }
            for (double wall : walls) {
                boolean onIt = wall > right - wide - 8 && wall < right + 8;
                right = onIt && wall - 10 - wide > area.getMinX() ? wall - 10 : right;
            }
            g.setPaint(palette.paper());
            g.fill(new Rectangle2D.Double(right - wide - 2, label.top, wide + 4, label.height()));
            g.setPaint(label.ink);
            g.setStroke(Palette.HAIR);
            double middle = label.top + label.height() / 2;
            g.draw(new Line2D.Double(right + 3, middle, label.endX - 2, label.endY));
            double y = label.top + LINE_HEIGHT - 3;
            for (String line : label.lines) {
                Lettering.draw(g, line, right, y, Lettering.Anchor.END, SIZE, false, palette.ink());
                y += LINE_HEIGHT;
            }
        }
    }

    /** How far a name goes to the left so that its line, which is steep, passes beside it and not through it. */
    private static double clearance(Label label) {
        double rise = (label.before - label.endY) / LineEnd.SOME_WAY;
        boolean above = label.before >= label.endY;
        double overlap = above ? label.top + label.height() + 6 - label.endY : label.endY + 6 - label.top;
        return Math.abs(rise) < 0.02 ? 0 : Math.max(0, Math.min(MOST_CLEARANCE, overlap / Math.abs(rise)));
    }

    /** Down the page each label keeps clear of the one above; then, from the foot, of the one below. */
    private void spread(double top, double bottom) {
        double free = top;
        for (Label label : labels) {
            label.top = Math.max(label.top, free);
            free = label.top + label.height() + 2;
        }
        double foot = bottom;
        for (int i = labels.size() - 1; i >= 0; i--) {
            Label label = labels.get(i);
            label.top = Math.min(label.top, foot - label.height());
            foot = label.top - 2;
        }
    }
}
