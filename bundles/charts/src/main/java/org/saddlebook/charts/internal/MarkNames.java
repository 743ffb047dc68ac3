package org.saddlebook.charts.internal;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.saddlebook.api.findings.Layer;

/**
 * Names of vertical marks, each to the right of its own stem, in rows. From the right to the left a name takes the lowest
 * row that is free, so that a stem, which passes the rows below its own, never crosses a name.
 */
final class MarkNames {
    private static final double GAP = 10;

    /**
     * A name with its place.
     *
     * @param stem horizontal coordinate of the mark, px
     * @param start where the text starts, px
     * @param row 0 is nearest to the drawing area
     */
    record Name(String text, double stem, double start, int row) {}

    private record Wanted(String text, double stem) {}

    private MarkNames() {}

    /**
     * Names of the marks in view.
     *
     * @param first left edge of the drawing area, px
     * @param last right edge of the drawing area, px
     * @param right where text must end, px
     */
    static List<Name> of(List<Layer> layers, DoubleUnaryOperator horizontal, double first, double last, double right) {
        List<Wanted> wanted = new ArrayList<>();
        for (Layer layer : layers) {
            boolean vertical = layer.kind() == Layer.Kind.VERTICAL_MARK || layer.kind() == Layer.Kind.WALL;
            if (vertical && !layer.label().isEmpty()) {
                for (double value : layer.x()) {
                    double stem = horizontal.applyAsDouble(value);
                    if (stem >= first - 1 && stem <= last + 1) {
                        wanted.add(new Wanted(layer.label(), stem));
                    }
                }
            }
        }
        wanted.sort(Comparator.comparingDouble(Wanted::stem).reversed());
        List<Double> free = new ArrayList<>();
        List<Name> names = new ArrayList<>();
        for (Wanted name : wanted) {
            double wide = Lettering.width(name.text(), StandAxis.SIZE, false);
            double start = Math.min(name.stem() + 4, right - wide);
            int row = 0;
            while (row < free.size() && start + wide + GAP > free.get(row)) {
                row++;
            }
            if (row == free.size()) {
                free.add(right);
            }
            free.set(row, Math.min(start, name.stem()));
            names.add(new Name(name.text(), name.stem(), start, row));
        }
        return names;
    }

    static int rows(List<Name> names) {
        int rows = 0;
        for (Name name : names) {
            rows = Math.max(rows, name.row() + 1);
        }
        return rows;
    }
}
