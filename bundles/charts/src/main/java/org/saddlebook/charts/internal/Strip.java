package org.saddlebook.charts.internal;

import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.saddlebook.api.findings.Layer;

/**
 * The strip between the drawing area and the temperature rail: names over the ends of a spindle, the spindle, ticks of the
 * runs. Takes no room when a figure has none of them.
 */
final class Strip {
    private static final int SIZE = 11;
    private static final double LINE = 14;
    private static final double BODY = 40;
    private static final double TICKS = 18;
    private static final double GAP = 10;

    /** A probability below this is thinner than a hair. */
    private static final double NOTHING = 1e-3;

    private record Name(String text, double at, double start, int row) {}

    private final List<Layer> layers;
    private final Palette palette;

    Strip(List<Layer> layers, Palette palette) {
        this.palette = palette;
        List<Layer> own = new ArrayList<>();
        for (Layer layer : layers) {
            boolean inStrip = layer.kind() == Layer.Kind.SPINDLE
                    || layer.kind() == Layer.Kind.STRIP_MARK
                    || layer.kind() == Layer.Kind.RUG;
            if (inStrip && layer.size() > 0) {
                own.add(layer);
            }
        }
        this.layers = List.copyOf(own);
    }

    /** Names at the right of the strip. */
    List<String> sideNames() {
        List<String> names = new ArrayList<>();
        for (Layer layer : layers) {
            if (layer.kind() != Layer.Kind.STRIP_MARK) {
                names.add(layer.label());
            }
        }
        return names;
    }

    /** Height, where names have so many rows at most as there are names. */
    double height() {
        if (layers.isEmpty()) {
            return 0;
        }
        double height = 8;
        int names = 0;
        for (Layer layer : layers) {
            switch (layer.kind()) {
                case STRIP_MARK -> names += layer.size();
                case SPINDLE -> height += BODY;
                case RUG -> height += TICKS;
                default -> throw new IllegalStateException("not in the strip: " + layer.kind());
            }
        }
        return height + Math.min(2, names) * LINE;
    }

    /**
     * Draws the strip.
     *
     * @param top where it begins
     * @param left left edge of the drawing area
     * @param right right edge of the drawing area
     * @param sideNames whether there is room for names at the right
     * @param horizontal horizontal coordinate of a value
     */
    void draw(Graphics2D g, double top, double left, double right, boolean sideNames, DoubleUnaryOperator horizontal) {
        List<Name> names = names(left, right, horizontal);
        int rows = Math.min(2, names.size());
        double y = top + 4 + rows * LINE;
        double foot = y + 4;
        for (Layer layer : layers) {
            if (layer.kind() == Layer.Kind.SPINDLE) {
                spindle(g, layer, y + BODY / 2, left, right, horizontal);
                side(g, layer.label(), left, right, sideNames, y + BODY / 2 + 4);
                foot = y + BODY;
            }
        }
        for (Name name : names) {
            double base = y - 4 - name.row() * LINE;
            g.setPaint(palette.ink());
            g.setStroke(Palette.FINE);
            g.draw(new Line2D.Double(name.at(), base + 2, name.at(), foot - 2));
            Lettering.draw(g, name.text(), name.start(), base, Lettering.Anchor.START, SIZE, false, palette.ink());
        }
        for (Layer layer : layers) {
            if (layer.kind() == Layer.Kind.RUG) {
                double middle = foot + TICKS / 2;
                for (double x : layer.x()) {
                    double at = horizontal.applyAsDouble(x);
                    if (at >= left && at <= right) {
                        Marks.measured(g, palette, at, middle, middle, middle);
                    }
                }
                side(g, layer.label(), left, right, sideNames, middle + 4);
            }
        }
    }

    private void side(Graphics2D g, String text, double left, double right, boolean sideNames, double y) {
        double x = sideNames ? right + EndLabels.GAP : left - 8;
        Lettering.Anchor anchor = sideNames ? Lettering.Anchor.START : Lettering.Anchor.END;
        Lettering.draw(g, text, x, y, anchor, SIZE, false, palette.ink());
    }

    private void spindle(
            Graphics2D g, Layer layer, double middle, double left, double right, DoubleUnaryOperator unbounded) {
        // What lies beyond the ends is drawn on the edge, where it has no width.
        DoubleUnaryOperator horizontal = value -> Math.max(left, Math.min(unbounded.applyAsDouble(value), right));
        double[] x = layer.x();
        double[] whole = layer.y();
        double[] filled = layer.lower();
        int from = 0;
        while (from < x.length) {
            if (!(whole[from] > NOTHING)) {
                from++;
                continue;
            }
            int to = from;
            while (to + 1 < x.length && whole[to + 1] > NOTHING) {
                to++;
            }
            g.setPaint(palette.paper());
            Path2D outline = body(x, whole, from, to, middle, horizontal);
            g.fill(outline);
            g.setPaint(palette.ink());
            g.setStroke(Palette.FINE);
            g.draw(outline);
            from = to + 1;
        }
        from = 0;
        g.setPaint(palette.ink());
        while (from < x.length) {
            int to = from;
            while (filled[from] > NOTHING && to + 1 < x.length && filled[to + 1] > NOTHING) {
                to++;
            }
            if (to > from) {
                g.fill(body(x, filled, from, to, middle, horizontal));
            }
            from = to + 1;
        }
    }

    private static Path2D body(
            double[] x, double[] thick, int from, int to, double middle, DoubleUnaryOperator horizontal) {
        Path2D path = new Path2D.Double();
        for (int i = from; i <= to; i++) {
            double at = horizontal.applyAsDouble(x[i]);
            double y = middle - thick[i] * BODY / 2;
            if (i == from) {
                path.moveTo(at, y);
            } else {
                path.lineTo(at, y);
            }
        }
        for (int i = to; i >= from; i--) {
            path.lineTo(horizontal.applyAsDouble(x[i]), middle + thick[i] * BODY / 2);
        }
        path.closePath();
        return path;
    }

    /**
     * The name of a cold end stands left of its stem, that of a hot end right of it, so that both are clear of the body
     * between them; where there is no room, on the other side; in the second row where two would touch.
     */
    private List<Name> names(double left, double right, DoubleUnaryOperator horizontal) {
        List<Name> wanted = new ArrayList<>();
        for (Layer layer : layers) {
            if (layer.kind() == Layer.Kind.STRIP_MARK) {
                for (double x : layer.x()) {
                    double at = horizontal.applyAsDouble(x);
                    if (at >= left - 1 && at <= right + 1) {
                        wanted.add(new Name(layer.label(), at, 0, 0));
                    }
                }
            }
        }
        wanted.sort(Comparator.comparingDouble(Name::at));
        List<Name> placed = new ArrayList<>();
        double free = Double.NEGATIVE_INFINITY;
        for (int i = 0; i < wanted.size(); i++) {
            Name name = wanted.get(i);
            double wide = Lettering.width(name.text(), SIZE, false);
            boolean cold = wanted.size() > 1 ? i % 2 == 0 : name.at() < (left + right) / 2;
            double before = name.at() - 4 - wide;
            double after = name.at() + 4;
            boolean toTheLeft = (cold && before >= left) || after + wide > right;
            double start = toTheLeft ? Math.max(left, before) : after;
            int row = start < free ? 1 : 0;
            placed.add(new Name(name.text(), name.at(), start, row));
            free = row == 0 ? start + wide + GAP : free;
        }
        return placed;
    }
}
