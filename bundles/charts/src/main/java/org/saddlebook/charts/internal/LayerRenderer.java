package org.saddlebook.charts.internal;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.CrosshairState;
import org.jfree.chart.plot.PlotRenderingInfo;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.AbstractXYItemRenderer;
import org.jfree.chart.renderer.xy.XYItemRendererState;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.data.xy.XYDataset;
import org.saddlebook.api.findings.Layer;

/** Draws one layer. */
final class LayerRenderer extends AbstractXYItemRenderer {
    private static final long serialVersionUID = 1L;

    private static final double[] SLOPES = {-1, 1, -0.35, 0.35};

    private final transient Layer layer;
    private final Color ink;
    private final transient BasicStroke pattern;
    private final int band;
    private final transient Palette palette;
    private final boolean part;

    /**
     * A renderer.
     *
     * @param order of a line among the lines, of a band the order of its line: decides ink and pattern
     * @param band order of a band among the bands: decides the direction of its hatch
     * @param part whether only a part of the axes is shown, so that layers can reach beyond it
     */
    LayerRenderer(Layer layer, int order, int band, Palette palette, boolean part) {
        this.layer = layer;
        this.ink = palette.line(order);
        this.pattern = Palette.pattern(order);
        this.band = band;
        this.palette = palette;
        this.part = part;
    }

    @Override
    public XYItemRendererState initialise(
            Graphics2D g, Rectangle2D area, XYPlot plot, XYDataset data, PlotRenderingInfo info) {
        XYItemRendererState state = new XYItemRendererState(info);
        state.setProcessVisibleItemsOnly(false);
        return state;
    }

    @Override
    public void drawItem(
            Graphics2D g,
            XYItemRendererState state,
            Rectangle2D area,
            PlotRenderingInfo info,
            XYPlot plot,
            ValueAxis xAxis,
            ValueAxis yAxis,
            XYDataset data,
            int series,
            int item,
            CrosshairState crosshair,
            int pass) {
        if (item > 0) {
            return;
        }
        double[] x = layer.x();
        double[] y = layer.y();
        double[] low = layer.lower();
        double[] high = layer.upper();
        for (int i = 0; i < x.length; i++) {
            x[i] = xAxis.valueToJava2D(x[i], area, RectangleEdge.BOTTOM);
            y[i] = inside(yAxis, y[i], area);
            low[i] = inside(yAxis, low[i], area);
            high[i] = inside(yAxis, high[i], area);
        }
        switch (layer.kind()) {
            case MEASURED -> {
                for (int i = 0; i < x.length; i++) {
                    if (hidden(x[i], layer.y()[i], yAxis, area)) {
                        continue;
                    }
                    Marks.measured(g, palette, x[i], y[i], low[i], high[i]);
                }
            }
            case EXCLUDED -> {
                for (int i = 0; i < x.length; i++) {
                    if (hidden(x[i], layer.y()[i], yAxis, area)) {
                        continue;
                    }
                    Marks.excluded(g, palette, x[i], y[i], low[i], high[i]);
                }
            }
            case PREDICTED -> {
                for (int i = 0; i < x.length; i++) {
                    if (hidden(x[i], layer.y()[i], yAxis, area)) {
                        continue;
                    }
                    Marks.predicted(g, palette, x[i], y[i], low[i], high[i]);
                }
            }
            case LINE -> {
                g.setPaint(ink);
                g.setStroke(pattern);
                g.draw(part ? Cut.lines(path(x, free(yAxis, area)), area) : path(x, y));
            }
            case CONFIDENCE_BAND -> {
                g.setPaint(ink);
                g.setStroke(Palette.HAIR);
                g.draw(part ? Cut.lines(hatch(x, low, high), area) : hatch(x, low, high));
            }
            case NEW_RUN_BAND -> {
                g.setPaint(ink);
                g.setStroke(Palette.OUTLINE);
                g.draw(part ? Cut.lines(path(x, low), area) : path(x, low));
                g.draw(part ? Cut.lines(path(x, high), area) : path(x, high));
            }
            case VERTICAL_MARK -> {
                g.setPaint(palette.ink());
                g.setStroke(Palette.FINE);
                for (double at : x) {
                    if (at >= area.getMinX() - 1 && at <= area.getMaxX() + 1) {
                        g.draw(new Line2D.Double(at, area.getMinY(), at, area.getMaxY()));
                    }
                }
            }
            case HORIZONTAL_MARK -> {
                g.setPaint(palette.ink());
                g.setStroke(Palette.FINE);
                for (double at : y) {
                    g.draw(new Line2D.Double(area.getMinX(), at, area.getMaxX(), at));
                }
            }
            case WALL -> {
                g.setPaint(palette.ink());
                g.setStroke(Palette.WALL);
                for (double at : x) {
                    if (at >= area.getMinX() - 1 && at <= area.getMaxX() + 1) {
                        g.draw(new Line2D.Double(at, area.getMinY(), at, area.getMaxY()));
                    }
                }
            }
            case FLOOR -> floor(g, x, y, area);
            case SPINDLE, STRIP_MARK, RUG -> {
                // Drawn in the strip under the drawing area.
            }
        }
    }

    /** The vertical coordinate, cut to the drawing area; what a logarithmic axis cannot show lies at its foot. */
    private static double inside(ValueAxis axis, double value, Rectangle2D area) {
        double at = axis.valueToJava2D(value, area, RectangleEdge.LEFT);
        if (!(at < area.getMaxY())) {
            return area.getMaxY();
        }
        return Math.max(at, area.getMinY());
    }

    /** Whether a point lies outside the part that is shown; otherwise it stands on the edge, never out of sight. */
    private boolean hidden(double px, double y, ValueAxis axis, Rectangle2D area) {
        double py = axis.valueToJava2D(y, area, RectangleEdge.LEFT);
        return part
                && !(px >= area.getMinX() - 1
                        && px <= area.getMaxX() + 1
                        && py >= area.getMinY() - 1
                        && py <= area.getMaxY() + 1);
    }

    /** Vertical coordinates of the line, also beyond the drawing area, but not so far that drawing loses its digits. */
    private double[] free(ValueAxis axis, Rectangle2D area) {
        double[] y = layer.y();
        for (int i = 0; i < y.length; i++) {
            double at = axis.valueToJava2D(y[i], area, RectangleEdge.LEFT);
            y[i] = at >= -1e6 ? Math.min(at, 1e6) : at < -1e6 ? -1e6 : 1e6;
        }
        return y;
    }

    private void floor(Graphics2D g, double[] wholeX, double[] y, Rectangle2D area) {
        if (wholeX.length == 0) {
            return;
        }
        double[] x = wholeX.clone();
        for (int i = 0; i < x.length; i++) {
            x[i] = Math.max(area.getMinX(), Math.min(x[i], area.getMaxX()));
        }
        Path2D region = path(x, y);
        region.lineTo(x[x.length - 1], area.getMaxY());
        region.lineTo(x[0], area.getMaxY());
        region.closePath();
        g.setPaint(palette.rail());
        g.fill(region);
        g.setPaint(palette.ink());
        g.setStroke(Palette.FINE);
        g.draw(path(x, y));
    }

    private Path2D hatch(double[] x, double[] low, double[] high) {
        int n = x.length;
        double[] cornersX = new double[2 * n];
        double[] cornersY = new double[2 * n];
        for (int i = 0; i < n; i++) {
            cornersX[i] = x[i];
            cornersY[i] = high[i];
            cornersX[2 * n - 1 - i] = x[i];
            cornersY[2 * n - 1 - i] = low[i];
        }
        double slope = SLOPES[band % SLOPES.length];
        return Hatch.of(cornersX, cornersY, slope, band == 0 ? 5 : 9);
    }

    private static Path2D path(double[] x, double[] y) {
        Path2D path = new Path2D.Double();
        for (int i = 0; i < x.length; i++) {
            if (i == 0) {
                path.moveTo(x[i], y[i]);
            } else {
                path.lineTo(x[i], y[i]);
            }
        }
        return path;
    }

    @Override
    public boolean equals(Object other) {
        return this == other;
    }

    @Override
    public int hashCode() {
        return System.identityHashCode(this);
    }

    @Override
    public Object clone() throws CloneNotSupportedException {
        return super.clone();
    }
}
