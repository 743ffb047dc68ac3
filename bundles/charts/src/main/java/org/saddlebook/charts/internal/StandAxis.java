package org.saddlebook.charts.internal;

import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import org.jfree.chart.axis.AxisSpace;
import org.jfree.chart.axis.AxisState;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.Plot;
import org.jfree.chart.plot.PlotRenderingInfo;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.data.Range;

/** An axis with a {@link Spacing}: upright at the left, or lying at the foot as a plain line or as a temperature rail. */
final class StandAxis extends ValueAxis {
    private static final long serialVersionUID = 1L;

    /** How an axis looks at the foot of a figure. */
    enum Foot {
        /** A line with marks. */
        PLAIN,
        /** Kelvin and degrees Celsius on either side of a line. */
        RAIL,
        /** A line alone: the marks stand elsewhere. */
        BARE
    }

    static final int SIZE = 11;

    static final double TICK = 5;

    /** Height of the rail under the drawing area. */
    static final double RAIL = 44;

    private final transient Spacing spacing;
    private final Foot foot;
    private final transient List<Spacing.Tick> marks;
    private final double drop;
    private final transient Palette palette;

    /**
     * An axis.
     *
     * @param foot how it looks when it lies at the foot
     * @param marks the marks of an axis that is not a temperature
     * @param drop room between the drawing area and the axis at its foot
     */
    StandAxis(
            Spacing spacing,
            double low,
            double high,
            Foot foot,
            List<Spacing.Tick> marks,
            double drop,
            Palette palette) {
        super(null, null);
        this.spacing = spacing;
        this.foot = foot;
        this.marks = List.copyOf(marks);
        this.drop = drop;
        this.palette = palette;
        setAutoRange(false);
        setRange(new Range(low, high), false, false);
    }

    @Override
    public double valueToJava2D(double value, Rectangle2D area, RectangleEdge edge) {
        double low = spacing.position(getLowerBound());
        double share = (spacing.position(value) - low) / (spacing.position(getUpperBound()) - low);
        return RectangleEdge.isTopOrBottom(edge)
                ? area.getMinX() + share * area.getWidth()
                : area.getMaxY() - share * area.getHeight();
    }

    @Override
    public double java2DToValue(double coordinate, Rectangle2D area, RectangleEdge edge) {
        double share = RectangleEdge.isTopOrBottom(edge)
                ? (coordinate - area.getMinX()) / area.getWidth()
                : (area.getMaxY() - coordinate) / area.getHeight();
        double low = spacing.position(getLowerBound());
        return spacing.value(low + share * (spacing.position(getUpperBound()) - low));
    }

    @Override
    public AxisState draw(
            Graphics2D g,
            double cursor,
            Rectangle2D plotArea,
            Rectangle2D area,
            RectangleEdge edge,
            PlotRenderingInfo info) {
        if (!RectangleEdge.isTopOrBottom(edge)) {
            upright(g, area, edge);
        } else if (foot == Foot.RAIL) {
            rail(g, area, edge);
        } else if (foot == Foot.BARE) {
            line(g, area.getMinX(), area.getMaxY() + drop, area.getMaxX(), area.getMaxY() + drop);
        } else {
            lying(g, area, edge);
        }
        return new AxisState(cursor);
    }

    private void upright(Graphics2D g, Rectangle2D area, RectangleEdge edge) {
        double x = area.getMinX();
        for (Spacing.Tick tick : marks) {
            double y = valueToJava2D(tick.value(), area, edge);
            line(g, x - (tick.label().isEmpty() ? TICK / 2 : TICK), y, x, y);
            Lettering.draw(g, tick.label(), x - TICK - 4, y + 4, Lettering.Anchor.END, SIZE, false, palette.ink());
        }
        line(g, x, area.getMinY(), x, area.getMaxY());
    }

    private void lying(Graphics2D g, Rectangle2D area, RectangleEdge edge) {
        double y = area.getMaxY() + drop;
        double free = Double.NEGATIVE_INFINITY;
        for (Spacing.Tick tick : marks) {
            double x = valueToJava2D(tick.value(), area, edge);
            line(g, x, y, x, y + TICK);
            free = label(g, tick.label(), x, y + TICK + 13, SIZE, free);
        }
        line(g, area.getMinX(), y, area.getMaxX(), y);
    }

    /** The temperature rail: kelvin above the line, degrees Celsius below it. */
    private void rail(Graphics2D g, Rectangle2D area, RectangleEdge edge) {
        double top = area.getMaxY() + drop;
        double y = top + RAIL / 2;
        g.setPaint(palette.rail());
        g.fill(new Rectangle2D.Double(area.getMinX(), top, area.getWidth(), RAIL));
        int most = Math.max(2, (int) (area.getWidth() / 52));
        double free = Double.NEGATIVE_INFINITY;
        for (Spacing.Tick tick : Spacing.even(getLowerBound(), getUpperBound(), most, 0)) {
            double x = valueToJava2D(tick.value(), area, edge);
            line(g, x, y - TICK, x, y);
            free = label(g, tick.label(), x, y - TICK - 4, SIZE - 1, free);
        }
        free = Double.NEGATIVE_INFINITY;
        for (Spacing.Tick tick : Spacing.even(getLowerBound(), getUpperBound(), most, 273.15)) {
            double x = valueToJava2D(tick.value(), area, edge);
            line(g, x, y, x, y + TICK);
            free = label(g, tick.label(), x, y + TICK + 11, SIZE, free);
        }
        g.setStroke(Palette.FIRM);
        g.draw(new Line2D.Double(area.getMinX(), y, area.getMaxX(), y));
        Lettering.draw(
                g, "K", area.getMaxX() + 8, y - TICK - 4, Lettering.Anchor.START, SIZE - 1, false, palette.ink());
        Lettering.draw(
                g,
                spacing == Spacing.RECIPROCAL ? "°C, spaced as 1/T" : "°C",
                area.getMaxX() + 8,
                y + TICK + 11,
                Lettering.Anchor.START,
                SIZE - 1,
                false,
                palette.ink());
    }

    /** Writes a label unless it would touch the one before; returns where the next may begin. */
    private double label(Graphics2D g, String text, double x, double y, int size, double free) {
        double half = Lettering.width(text, size, false) / 2;
        if (text.isEmpty() || x - half < free) {
            return free;
        }
        Lettering.draw(g, text, x, y, Lettering.Anchor.MIDDLE, size, false, palette.ink());
        return x + half + 8;
    }

    private void line(Graphics2D g, double x1, double y1, double x2, double y2) {
        g.setPaint(palette.ink());
        g.setStroke(Palette.FINE);
        g.draw(new Line2D.Double(x1, y1, x2, y2));
    }

    @Override
    public AxisSpace reserveSpace(Graphics2D g, Plot plot, Rectangle2D area, RectangleEdge edge, AxisSpace space) {
        // The sheet decides the drawing area; see Sheet.
        return space == null ? new AxisSpace() : space;
    }

    @Override
    public List<Object> refreshTicks(Graphics2D g, AxisState state, Rectangle2D area, RectangleEdge edge) {
        return List.of();
    }

    @Override
    public double lengthToJava2D(double length, Rectangle2D area, RectangleEdge edge) {
        return valueToJava2D(getLowerBound() + length, area, edge) - valueToJava2D(getLowerBound(), area, edge);
    }

    @Override
    public void configure() {
        // The range is fixed.
    }

    @Override
    protected void autoAdjustRange() {
        // The range is fixed.
    }
}
