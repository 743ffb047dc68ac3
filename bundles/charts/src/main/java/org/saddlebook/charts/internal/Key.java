package org.saddlebook.charts.internal;

import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.saddlebook.api.findings.Layer;

/** One line under the title that shows each mark beside its word. Lines are named at their ends instead. */
final class Key {
    private static final Map<Layer.Kind, String> WORDS = new EnumMap<>(Map.of(
            Layer.Kind.MEASURED, "measured",
            Layer.Kind.EXCLUDED, "excluded",
            Layer.Kind.PREDICTED, "predicted",
            Layer.Kind.CONFIDENCE_BAND, "interval of the mean",
            Layer.Kind.NEW_RUN_BAND, "interval of a new run"));

    private static final double GAP = 18;

    private record Entry(Layer.Kind kind, String word) {}

    private final List<Entry> entries;

    private Key(List<Entry> entries) {
        this.entries = entries;
    }

    static Key of(List<Layer> layers) {
        Set<String> lines = new HashSet<>();
        for (Layer layer : layers) {
            if (layer.kind() == Layer.Kind.LINE) {
                lines.add(layer.label());
            }
        }
        List<Entry> entries = new ArrayList<>();
        for (Map.Entry<Layer.Kind, String> kind : WORDS.entrySet()) {
            int found = 0;
            Set<String> own = new HashSet<>();
            for (Layer layer : layers) {
                if (layer.kind() == kind.getKey() && layer.size() > 0) {
                    found++;
                    own.add(layer.label());
                }
            }
            if (found > 0) {
                String label = own.size() == 1 ? own.iterator().next() : "";
                entries.add(
                        new Entry(kind.getKey(), label.isEmpty() || lines.contains(label) ? kind.getValue() : label));
            }
        }
        return new Key(entries);
    }

    boolean isEmpty() {
        return entries.isEmpty();
    }

    /** How many lines the key takes in this room. */
    int rows(double room, int size) {
        double x = 0;
        int rows = entries.isEmpty() ? 0 : 1;
        for (Entry entry : entries) {
            double wide = wide(entry, size);
            if (x > 0 && x + wide > room) {
                rows++;
                x = 0;
            }
            x += wide + GAP;
        }
        return rows;
    }

    private static double mark(Entry entry) {
        return switch (entry.kind()) {
            case CONFIDENCE_BAND, NEW_RUN_BAND -> 24;
            case MEASURED, EXCLUDED, PREDICTED -> 16;
            case LINE, VERTICAL_MARK, HORIZONTAL_MARK, WALL, FLOOR, SPINDLE, STRIP_MARK, RUG -> 0;
        };
    }

    private static double wide(Entry entry, int size) {
        return mark(entry) + 5 + Lettering.width(entry.word(), size, false);
    }

    /** Draws the key, its first line on the baseline. */
    void draw(Graphics2D g, Palette palette, double left, double baseline, double room, int size) {
        double x = left;
        double base = baseline;
        for (Entry entry : entries) {
            double wide = wide(entry, size);
            if (x > left && x + wide > left + room) {
                x = left;
                base += 16;
            }
            double y = base - 4;
            switch (entry.kind()) {
                case MEASURED -> Marks.measured(g, palette, x + 6, y, y + 8, y - 8);
                case EXCLUDED -> Marks.excluded(g, palette, x + 8, y, y, y);
                case PREDICTED -> Marks.predicted(g, palette, x + 8, y, y, y);
                case CONFIDENCE_BAND -> {
                    g.setPaint(palette.ink());
                    g.setStroke(Palette.HAIR);
                    g.draw(Hatch.of(
                            new double[] {x, x + 24, x + 24, x}, new double[] {y - 5, y - 5, y + 5, y + 5}, -1, 5));
                }
                case NEW_RUN_BAND -> {
                    g.setPaint(palette.ink());
                    g.setStroke(Palette.OUTLINE);
                    g.draw(new Line2D.Double(x, y - 4.5, x + 24, y - 4.5));
                    g.draw(new Line2D.Double(x, y + 4.5, x + 24, y + 4.5));
                }
                case LINE, VERTICAL_MARK, HORIZONTAL_MARK, WALL, FLOOR, SPINDLE, STRIP_MARK, RUG -> {
                    // Named where it stands.
                }
            }
            double text = x + mark(entry) + 5;
            Lettering.draw(g, entry.word(), text, base, Lettering.Anchor.START, size, false, palette.ink());
            x += wide + GAP;
        }
    }
}
