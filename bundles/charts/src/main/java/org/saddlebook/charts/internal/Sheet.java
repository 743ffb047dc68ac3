package org.saddlebook.charts.internal;

import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.plot.DatasetRenderingOrder;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.RectangleInsets;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.charts.api.FigureLook;
import org.saddlebook.presentation.api.DisplayUnit;

/** A figure laid out on its sheet of paper: title, key, drawing area, names, rail and the notes of its cautions. */
final class Sheet {
    /** Width on paper. */
    static final int WIDTH = 720;

    private static final int MARGIN = Leaf.MARGIN;
    private static final int HEIGHT_OF_AREA = 300;
    private static final int LEAST_HEIGHT_OF_AREA = 90;
    private static final int TITLE_SIZE = 14;
    private static final int KEY_SIZE = 11;

    private final Node.Figure figure;
    private final FigureLook look;
    private final Palette palette;
    private final List<Layer> layers;
    private final List<Notes.Note> notes;
    private final Leaf leaf;
    private final boolean temperature;
    private final Optional<FigureLook.Rail> rail;
    private final String labelX;
    private final String labelY;
    private final StandAxis axisX;
    private final StandAxis axisY;
    private final List<String> titleLines;
    private final List<MarkNames.Name> markNames;
    private final int rows;
    private final boolean namesInside;
    private final Strip strip;
    private final Rectangle2D area;
    private final int bottom;
    private final int height;

    Sheet(Node.Figure figure, Map<String, String> cautions) {
        this(figure, cautions, FigureLook.PAPER);
    }

    Sheet(Node.Figure figure, Map<String, String> cautions, FigureLook look) {
        this.figure = figure;
        this.look = look;
        palette = look.theme() == FigureLook.Theme.DARK ? Palette.DARK : Palette.LIGHT;
        notes = Notes.of(figure.cautions(), cautions);
        leaf = new Leaf(look.width(), palette, notes);
        DisplayUnit unitX = DisplayUnit.of(figure.x().unit());
        DisplayUnit unitY = DisplayUnit.of(figure.y().unit());
        temperature = figure.x().unit().equals("K");
        // A rail is spaced as 1/T; zoomed, a figure leaves it and stands on an axis of its own.
        rail = temperature && look.zoom().isEmpty() ? look.rail() : Optional.empty();
        Spacing spacingX = temperature && look.rail().isPresent()
                ? Spacing.RECIPROCAL
                : Spacing.of(figure.x().scale());
        Spacing spacingY = Spacing.of(figure.y().scale());
        layers = Shown.layers(figure.layers(), unitX, unitY, spacingX, spacingY);
        labelX = Shown.label(figure.x(), unitX);
        labelY = Shown.label(figure.y(), unitY);

        Extent y = look.zoom().isPresent()
                ? new Extent(look.zoom().get().lowY(), look.zoom().get().highY())
                : Extent.vertical(layers, spacingY);
        strip = new Strip(layers, palette);
        Key key = Key.of(layers);
        double right = roomAtTheRight();
        double railRight = rail.isPresent() ? look.width() - MARGIN - rail.get().right() : right;
        namesInside = railRight < right;
        titleLines = Lettering.wrap(figure.title(), TITLE_SIZE, (look.width() - 2 * MARGIN - leaf.cornerRoom()) / 1.1);

        // Rows of names above the area hang on the abscissas, which need no height.
        Extent x = extentX(spacingX);
        double widest = 0;
        for (Spacing.Tick tick : spacingY.ticks(y.low(), y.high(), 7)) {
            widest = Math.max(widest, Lettering.width(tick.label(), StandAxis.SIZE, false));
        }
        int left = rail.isPresent() ? (int) rail.get().left() : MARGIN + (int) Math.ceil(widest + StandAxis.TICK + 6);
        int wide = rail.isPresent()
                ? (int) (rail.get().right() - rail.get().left())
                : look.width() - MARGIN - (int) Math.ceil(right) - left;
        axisX = new StandAxis(
                spacingX,
                x.low(),
                x.high(),
                temperature ? rail.isPresent() ? StandAxis.Foot.BARE : StandAxis.Foot.RAIL : StandAxis.Foot.PLAIN,
                temperature ? List.of() : spacingX.ticks(x.low(), x.high(), Math.max(2, wide / 70)),
                strip.height(),
                palette);
        Rectangle2D level = new Rectangle2D.Double(left, 0, wide, 1);
        markNames = MarkNames.of(
                layers,
                value -> axisX.valueToJava2D(value, level, RectangleEdge.BOTTOM),
                left,
                left + wide,
                look.width() - MARGIN);
        rows = MarkNames.rows(markNames);
        int top = 12
                + titleLines.size() * 18
                + (key.isEmpty() ? 0 : key.rows(keyRoom(), KEY_SIZE) * 16 + 6)
                + 34
                + rows * 14;
        int below = (int) Math.ceil(strip.height()) + belowStrip();
        int noteHeight = written() ? leaf.notesHeight() + (notes.isEmpty() ? 4 : 10) : 4;
        int high = look.height().isPresent()
                ? Math.max(LEAST_HEIGHT_OF_AREA, look.height().getAsInt() - top - below - noteHeight)
                : HEIGHT_OF_AREA;
        area = new Rectangle2D.Double(left, top, wide, high);
        bottom = top + high + below;
        height = bottom + noteHeight;
        int marks = Math.max(2, Math.min(7, high / 28));
        axisY = new StandAxis(
                spacingY,
                y.low(),
                y.high(),
                StandAxis.Foot.PLAIN,
                spacingY.ticks(y.low(), y.high(), marks),
                0,
                palette);
    }

    private Extent extentX(Spacing spacing) {
        if (rail.isPresent()) {
            return new Extent(rail.get().lowKelvin(), rail.get().highKelvin());
        }
        return look.zoom().isPresent()
                ? new Extent(look.zoom().get().lowX(), look.zoom().get().highX())
                : Extent.horizontal(layers, spacing);
    }

    private boolean written() {
        return look.notes() == FigureLook.Notes.WRITTEN;
    }

    private double keyRoom() {
        return look.width() - 2 * MARGIN;
    }

    private int belowStrip() {
        if (rail.isPresent()) {
            return 10;
        }
        return temperature ? (int) StandAxis.RAIL + 28 : 50;
    }

    private double roomAtTheRight() {
        List<String> names = new ArrayList<>();
        for (Layer layer : layers) {
            if (layer.kind() == Layer.Kind.LINE || layer.kind() == Layer.Kind.HORIZONTAL_MARK) {
                names.add(layer.label());
            }
        }
        names.addAll(strip.sideNames());
        double axisName = temperature && rail.isEmpty() ? 8 + Lettering.width("°C, spaced as 1/T", 10, false) : 24;
        return Math.max(EndLabels.room(names), axisName);
    }

    int width() {
        return look.width();
    }

    int height() {
        return height;
    }

    Rectangle2D area() {
        return new Rectangle2D.Double(area.getX(), area.getY(), area.getWidth(), area.getHeight());
    }

    List<Layer> layers() {
        return layers;
    }

    Palette palette() {
        return palette;
    }

    void draw(Graphics2D g) {
        leaf.paper(g, height);
        double y = 12;
        for (String line : titleLines) {
            y += 18;
            Lettering.draw(g, line, MARGIN, y - 2, Lettering.Anchor.START, TITLE_SIZE, true, palette.ink());
        }
        Key key = Key.of(layers);
        if (!key.isEmpty()) {
            key.draw(g, palette, MARGIN, y + 20, keyRoom(), KEY_SIZE);
        }
        Lettering.draw(
                g,
                labelY,
                MARGIN,
                area.getMinY() - 12 - rows * 14,
                Lettering.Anchor.START,
                KEY_SIZE,
                false,
                palette.ink());
        chart().draw(g, new Rectangle2D.Double(0, 0, look.width(), height));
        markNames(g);
        endNames(g);
        strip.draw(g, area.getMaxY(), area.getMinX(), area.getMaxX(), !namesInside, this::horizontal);
        if (rail.isEmpty()) {
            Lettering.draw(
                    g,
                    labelX,
                    area.getMaxX(),
                    area.getMaxY() + strip.height() + (temperature ? StandAxis.RAIL + 14 : 36),
                    Lettering.Anchor.END,
                    KEY_SIZE,
                    false,
                    palette.ink());
        }
        if (written()) {
            leaf.notes(g, bottom);
        }
    }

    /** The figure as a chart on its sheet; everything around the drawing area is left to the sheet. */
    private JFreeChart chart() {
        XYPlot plot = new XYPlot();
        plot.setDomainAxis(axisX);
        plot.setRangeAxis(axisY);
        plot.setInsets(
                new RectangleInsets(
                        area.getMinY(), area.getMinX(), height - area.getMaxY(), look.width() - area.getMaxX()),
                false);
        plot.setAxisOffset(RectangleInsets.ZERO_INSETS);
        plot.setBackgroundPaint(null);
        plot.setOutlineVisible(false);
        plot.setDomainGridlinesVisible(false);
        plot.setRangeGridlinesVisible(false);
        plot.setDatasetRenderingOrder(DatasetRenderingOrder.FORWARD);
        boolean part = look.zoom().isPresent() || rail.isPresent();
        int bands = 0;
        for (int i = 0; i < layers.size(); i++) {
            Layer layer = layers.get(i);
            plot.setDataset(i, new LayerData(layer));
            plot.setRenderer(i, new LayerRenderer(layer, LayerOrder.of(layers, i), bands, palette, part), false);
            if (layer.kind() == Layer.Kind.CONFIDENCE_BAND) {
                bands++;
            }
        }
        JFreeChart chart = new JFreeChart(null, null, plot, false);
        chart.setBackgroundPaint(null);
        chart.setPadding(RectangleInsets.ZERO_INSETS);
        return chart;
    }

    private void endNames(Graphics2D g) {
        EndLabels labels = new EndLabels();
        for (int index = 0; index < layers.size(); index++) {
            Layer layer = layers.get(index);
            if (layer.kind() == Layer.Kind.LINE && layer.size() > 0) {
                LineEnd end = LineEnd.of(layer, this::horizontal, this::anyVertical, area);
                labels.add(layer.label(), end.x(), end.y(), end.before(), palette.line(LayerOrder.of(layers, index)));
            } else if (layer.kind() == Layer.Kind.HORIZONTAL_MARK && layer.size() > 0) {
                double at = vertical(layer.y()[0]);
                labels.add(layer.label(), area.getMaxX(), at, at, palette.ink());
            }
        }
        if (namesInside) {
            List<Double> walls = new ArrayList<>();
            for (Layer layer : layers) {
                if (layer.kind() == Layer.Kind.WALL || layer.kind() == Layer.Kind.VERTICAL_MARK) {
                    for (double x : layer.x()) {
                        walls.add(horizontal(x));
                    }
                }
            }
            labels.drawInside(g, palette, area, walls);
        } else {
            labels.draw(g, palette, area.getMaxX(), area.getMinY(), area.getMaxY());
        }
    }

    /** Names of vertical marks, above the drawing area; each stem runs down from its own name. */
    private void markNames(Graphics2D g) {
        for (MarkNames.Name name : markNames) {
            double y = area.getMinY() - 5 - name.row() * 14;
            g.setPaint(palette.ink());
            g.setStroke(Palette.FINE);
            g.draw(new Line2D.Double(name.stem(), y - 8, name.stem(), area.getMinY()));
            Lettering.draw(g, name.text(), name.start(), y, Lettering.Anchor.START, KEY_SIZE, false, palette.ink());
        }
    }

    /** Horizontal coordinate of an abscissa in the unit shown. */
    double horizontal(double value) {
        return axisX.valueToJava2D(value, area, RectangleEdge.BOTTOM);
    }

    /** Abscissa in the unit shown at a horizontal coordinate. */
    double abscissa(double px) {
        return axisX.java2DToValue(px, area, RectangleEdge.BOTTOM);
    }

    /** Ordinate in the unit shown at a vertical coordinate. */
    double ordinate(double py) {
        return axisY.java2DToValue(py, area, RectangleEdge.LEFT);
    }

    /** Vertical coordinate of an ordinate in the unit shown, also outside the drawing area. */
    double anyVertical(double value) {
        return axisY.valueToJava2D(value, area, RectangleEdge.LEFT);
    }

    private double vertical(double value) {
        return Math.max(area.getMinY(), Math.min(anyVertical(value), area.getMaxY()));
    }

    /** What a screen reader says beyond the title. */
    String description() {
        StringBuilder text =
                new StringBuilder(labelY).append(" against ").append(labelX).append('.');
        for (Layer layer : figure.layers()) {
            if (layer.kind() == Layer.Kind.LINE && !layer.label().isEmpty()) {
                text.append(" Line: ").append(layer.label()).append('.');
            }
        }
        for (Notes.Note note : notes) {
            text.append(" Caution ").append(note.number()).append(": ").append(note.text());
        }
        return text.toString();
    }
}
