package org.saddlebook.charts.internal;

import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.plot.DatasetRenderingOrder;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.RectangleInsets;
import org.saddlebook.api.findings.Axis;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.presentation.api.DisplayUnit;
import org.saddlebook.presentation.api.UnitText;

/** A figure laid out on its sheet of paper: title, key, drawing area, names, rail and the notes of its cautions. */
final class Sheet {
    static final int WIDTH = 720;

    private static final int MARGIN = 16;
    private static final int HEIGHT_OF_AREA = 300;
    private static final int TITLE_SIZE = 14;
    private static final int KEY_SIZE = 11;
    private static final int NOTE_SIZE = 11;
    private static final int NOTE_LINE = 15;
    private static final int FOLD = 22;

    private final Node.Figure figure;
    private final List<Layer> layers;
    private final List<Notes.Note> notes;
    private final Spacing spacingX;
    private final boolean temperature;
    private final String labelX;
    private final String labelY;
    private final StandAxis axisX;
    private final StandAxis axisY;
    private final List<String> titleLines;
    private final List<MarkNames.Name> markNames;
    private final int rows;
    private final Strip strip;
    private final Rectangle2D area;
    private final int bottom;
    private final int height;

    Sheet(Node.Figure figure, Map<String, String> cautions) {
        this.figure = figure;
        this.notes = Notes.of(figure.cautions(), cautions);
        DisplayUnit unitX = DisplayUnit.of(figure.x().unit());
        DisplayUnit unitY = DisplayUnit.of(figure.y().unit());
        spacingX = Spacing.of(figure.x().scale());
        Spacing spacingY = Spacing.of(figure.y().scale());
        layers = shown(figure.layers(), unitX, unitY, spacingX, spacingY);
        temperature = figure.x().unit().equals("K");
        labelX = label(figure.x(), unitX);
        labelY = label(figure.y(), unitY);

        Extent y = Extent.vertical(layers, spacingY);
        List<Spacing.Tick> ticksY = spacingY.ticks(y.low(), y.high(), 7);
        axisY = new StandAxis(spacingY, y.low(), y.high(), false, ticksY, 0);
        strip = new Strip(layers);
        double widest = 0;
        for (Spacing.Tick tick : ticksY) {
            widest = Math.max(widest, Lettering.width(tick.label(), StandAxis.SIZE, false));
        }
        List<String> names = new ArrayList<>();
        for (Layer layer : layers) {
            if (layer.kind() == Layer.Kind.LINE || layer.kind() == Layer.Kind.HORIZONTAL_MARK) {
                names.add(layer.label());
            }
        }
        names.addAll(strip.sideNames());
        double right =
                Math.max(EndLabels.room(names), temperature ? 8 + Lettering.width("°C, spaced as 1/T", 10, false) : 24);
        int left = MARGIN + (int) Math.ceil(widest + StandAxis.TICK + 6);
        int wide = WIDTH - MARGIN - (int) Math.ceil(right) - left;

        Extent x = Extent.horizontal(layers, spacingX);
        axisX = new StandAxis(
                spacingX,
                x.low(),
                x.high(),
                temperature,
                temperature ? List.of() : spacingX.ticks(x.low(), x.high(), wide / 70),
                strip.height());

        markNames = MarkNames.of(
                layers,
                value -> axisX.valueToJava2D(value, new Rectangle2D.Double(left, 0, wide, 1), RectangleEdge.BOTTOM),
                WIDTH - MARGIN);
        rows = MarkNames.rows(markNames);
        double numbers = Math.max(40, 10 + Lettering.width(noteNumbers(), NOTE_SIZE, true));
        titleLines = Lettering.wrap(figure.title(), TITLE_SIZE, (WIDTH - 2 * MARGIN - FOLD - numbers) / 1.1);
        int top = 12 + titleLines.size() * 18 + (Key.of(layers).isEmpty() ? 0 : 22) + 34 + rows * 14;
        area = new Rectangle2D.Double(left, top, wide, HEIGHT_OF_AREA);
        int foot =
                top + HEIGHT_OF_AREA + (int) Math.ceil(strip.height()) + (temperature ? (int) StandAxis.RAIL + 28 : 50);
        bottom = foot;
        int lines = 0;
        for (Notes.Note note : notes) {
            lines += Lettering.wrap(note.text(), NOTE_SIZE, noteRoom()).size() * NOTE_LINE + 12;
        }
        height = foot + lines + (notes.isEmpty() ? 4 : 10);
    }

    int height() {
        return height;
    }

    void draw(Graphics2D g) {
        paper(g);
        double y = 12;
        for (String line : titleLines) {
            y += 18;
            Lettering.draw(g, line, MARGIN, y - 2, Lettering.Anchor.START, TITLE_SIZE, true, Palette.INK);
        }
        Key key = Key.of(layers);
        if (!key.isEmpty()) {
            y += 22;
            key.draw(g, MARGIN, y - 2, KEY_SIZE);
        }
        Lettering.draw(
                g,
                labelY,
                MARGIN,
                area.getMinY() - 12 - rows * 14,
                Lettering.Anchor.START,
                KEY_SIZE,
                false,
                Palette.INK);
        chart().draw(g, new Rectangle2D.Double(0, 0, WIDTH, height));
        markNames(g);
        endNames(g);
        strip.draw(g, area.getMaxY(), area.getMinX(), area.getMaxX(), this::horizontal);
        Lettering.draw(
                g,
                labelX,
                area.getMaxX(),
                area.getMaxY() + strip.height() + (temperature ? StandAxis.RAIL + 14 : 36),
                Lettering.Anchor.END,
                KEY_SIZE,
                false,
                Palette.INK);
        notes(g);
    }

    /** The figure as a chart on its sheet; everything around the drawing area is left to the sheet. */
    private JFreeChart chart() {
        XYPlot plot = new XYPlot();
        plot.setDomainAxis(axisX);
        plot.setRangeAxis(axisY);
        plot.setInsets(
                new RectangleInsets(area.getMinY(), area.getMinX(), height - area.getMaxY(), WIDTH - area.getMaxX()),
                false);
        plot.setAxisOffset(RectangleInsets.ZERO_INSETS);
        plot.setBackgroundPaint(null);
        plot.setOutlineVisible(false);
        plot.setDomainGridlinesVisible(false);
        plot.setRangeGridlinesVisible(false);
        plot.setDatasetRenderingOrder(DatasetRenderingOrder.FORWARD);
        int bands = 0;
        for (int i = 0; i < layers.size(); i++) {
            Layer layer = layers.get(i);
            plot.setDataset(i, new LayerData(layer));
            plot.setRenderer(i, new LayerRenderer(layer, order(i), bands), false);
            if (layer.kind() == Layer.Kind.CONFIDENCE_BAND) {
                bands++;
            }
        }
        JFreeChart chart = new JFreeChart(null, null, plot, false);
        chart.setBackgroundPaint(null);
        chart.setPadding(RectangleInsets.ZERO_INSETS);
        return chart;
    }

    /** Order of a line among the lines; a band goes with the line of its name, or with the line of its own order. */
    private int order(int index) {
        Layer wanted = layers.get(index);
        int lines = 0;
        int sameKindBefore = 0;
        int named = -1;
        for (int i = 0; i < layers.size(); i++) {
            Layer layer = layers.get(i);
            if (i < index && layer.kind() == wanted.kind()) {
                sameKindBefore++;
            }
            if (layer.kind() == Layer.Kind.LINE) {
                if (named < 0 && layer.label().equals(wanted.label())) {
                    named = lines;
                }
                lines++;
            }
        }
        return wanted.kind() == Layer.Kind.LINE || named < 0 ? sameKindBefore : named;
    }

    private void endNames(Graphics2D g) {
        EndLabels labels = new EndLabels();
        for (int index = 0; index < layers.size(); index++) {
            Layer layer = layers.get(index);
            if (layer.kind() == Layer.Kind.LINE && layer.size() > 0) {
                double[] x = layer.x();
                int last = 0;
                for (int i = 1; i < x.length; i++) {
                    last = x[i] > x[last] ? i : last;
                }
                labels.add(layer.label(), horizontal(x[last]), vertical(layer.y()[last]), Palette.line(order(index)));
            } else if (layer.kind() == Layer.Kind.HORIZONTAL_MARK && layer.size() > 0) {
                labels.add(layer.label(), area.getMaxX(), vertical(layer.y()[0]), Palette.INK);
            }
        }
        labels.draw(g, area.getMaxX(), area.getMinY(), area.getMaxY());
    }

    /** Names of vertical marks, above the drawing area; each stem runs down from its own name. */
    private void markNames(Graphics2D g) {
        for (MarkNames.Name name : markNames) {
            double y = area.getMinY() - 5 - name.row() * 14;
            g.setPaint(Palette.INK);
            g.setStroke(Palette.FINE);
            g.draw(new Line2D.Double(name.stem(), y - 8, name.stem(), area.getMinY()));
            Lettering.draw(g, name.text(), name.start(), y, Lettering.Anchor.START, KEY_SIZE, false, Palette.INK);
        }
    }

    private void paper(Graphics2D g) {
        double fold = notes.isEmpty() ? 0 : FOLD;
        Path2D page = new Path2D.Double();
        page.moveTo(0, 0);
        page.lineTo(WIDTH - fold, 0);
        page.lineTo(WIDTH, fold);
        page.lineTo(WIDTH, height);
        page.lineTo(0, height);
        page.closePath();
        g.setPaint(Palette.PAPER);
        g.fill(page);
        if (!notes.isEmpty()) {
            Path2D ear = new Path2D.Double();
            ear.moveTo(WIDTH - fold, 0);
            ear.lineTo(WIDTH - fold, fold);
            ear.lineTo(WIDTH, fold);
            ear.closePath();
            g.setPaint(Palette.LICHEN);
            g.fill(ear);
            g.setPaint(Palette.INK);
            g.setStroke(Palette.FINE);
            g.draw(ear);
            Lettering.draw(g, noteNumbers(), WIDTH - fold - 6, 16, Lettering.Anchor.END, NOTE_SIZE, true, Palette.INK);
        }
    }

    private String noteNumbers() {
        StringBuilder numbers = new StringBuilder();
        for (Notes.Note note : notes) {
            numbers.append(numbers.length() == 0 ? "" : " ").append(note.number());
        }
        return numbers.toString();
    }

    private void notes(Graphics2D g) {
        double y = bottom;
        for (Notes.Note note : notes) {
            List<String> lines = Lettering.wrap(note.text(), NOTE_SIZE, noteRoom());
            double high = lines.size() * NOTE_LINE + 6;
            Path2D strip = new Path2D.Double();
            strip.moveTo(MARGIN, y);
            strip.lineTo(WIDTH - MARGIN - 9, y);
            strip.lineTo(WIDTH - MARGIN, y + 9);
            strip.lineTo(WIDTH - MARGIN, y + high);
            strip.lineTo(MARGIN, y + high);
            strip.closePath();
            g.setPaint(Palette.RAIL);
            g.fill(strip);
            String number = Integer.toString(note.number());
            Lettering.draw(g, number, MARGIN + 24, y + NOTE_LINE, Lettering.Anchor.END, NOTE_SIZE, true, Palette.INK);
            for (String line : lines) {
                y += NOTE_LINE;
                Lettering.draw(g, line, MARGIN + 34, y, Lettering.Anchor.START, NOTE_SIZE, false, Palette.INK);
            }
            y += 12;
        }
    }

    private static double noteRoom() {
        return WIDTH - 2 * MARGIN - 34 - 14;
    }

    private double horizontal(double value) {
        return axisX.valueToJava2D(value, area, RectangleEdge.BOTTOM);
    }

    private double vertical(double value) {
        double at = axisY.valueToJava2D(value, area, RectangleEdge.LEFT);
        return Math.max(area.getMinY(), Math.min(at, area.getMaxY()));
    }

    private static String label(Axis axis, DisplayUnit unit) {
        if (axis.scale() == Axis.Scale.RECIPROCAL_TEMPERATURE || axis.unit().equals("K")) {
            return axis.label();
        }
        String text = UnitText.forPeople(unit.ucum());
        if (text.isEmpty() || axis.label().contains(" / ")) {
            return axis.label();
        }
        boolean compound = text.indexOf('/') >= 0 || text.indexOf('\u00a0') >= 0;
        return axis.label() + " / " + (compound ? "(" + text + ")" : text);
    }

    private static List<Layer> shown(
            List<Layer> layers, DisplayUnit unitX, DisplayUnit unitY, Spacing spacingX, Spacing spacingY) {
        List<Layer> result = new ArrayList<>();
        for (Layer layer : layers) {
            boolean fits = true;
            for (double x : layer.x()) {
                fits &= layer.kind() == Layer.Kind.HORIZONTAL_MARK || spacingX.admits(x);
            }
            for (double y : layer.y()) {
                fits &= layer.kind() == Layer.Kind.VERTICAL_MARK
                        || layer.kind() == Layer.Kind.CONFIDENCE_BAND
                        || layer.kind() == Layer.Kind.NEW_RUN_BAND
                        || spacingY.admits(y);
            }
            if (!fits) {
                throw new IllegalArgumentException(
                        "layer \"" + layer.label() + "\" has a value that its axis cannot show: not above zero");
            }
            result.add(new Layer(
                    layer.kind(),
                    layer.label(),
                    in(unitX, layer.x()),
                    in(unitY, layer.y()),
                    in(unitY, layer.lower()),
                    in(unitY, layer.upper())));
        }
        return result;
    }

    private static double[] in(DisplayUnit unit, double[] values) {
        for (int i = 0; i < values.length; i++) {
            values[i] = unit.value(values[i]);
        }
        return values;
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
