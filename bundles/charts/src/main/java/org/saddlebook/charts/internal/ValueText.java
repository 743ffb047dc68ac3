package org.saddlebook.charts.internal;

import org.saddlebook.api.findings.Axis;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.presentation.api.DisplayUnit;
import org.saddlebook.presentation.api.Rounding;
import org.saddlebook.presentation.api.UnitText;

/** Values of a figure in words, for hover and screen readers. */
final class ValueText {
    private final Node.Figure figure;
    private final String nameY;
    private final String unitX;
    private final String unitY;

    ValueText(Node.Figure figure) {
        this.figure = figure;
        nameY = figure.y().label();
        unitX = DisplayUnit.of(figure.x().unit()).ucum();
        unitY = DisplayUnit.of(figure.y().unit()).ucum();
    }

    /** An abscissa in the unit shown: {@code 323.15 K (50.00 °C)}. */
    String abscissa(double x) {
        Axis axis = figure.x();
        if (axis.unit().equals("K")) {
            return Rounding.decimals(x, 2) + " K (" + Rounding.decimals(x - 273.15, 2) + " °C)";
        }
        return axis.label() + " " + UnitText.after(Rounding.significant(x, 5), unitX);
    }

    /** What a line reads: {@code Eyring: ln(k / s⁻¹) −7.43}. */
    String line(String label, double y) {
        return (label.isEmpty() ? "" : label + ": ") + ordinate(y);
    }

    private String ordinate(double y) {
        return nameY + " " + UnitText.after(Rounding.significant(y, 4), unitY);
    }

    /** One point of a layer in the units shown. */
    String point(Layer.Kind kind, Layer shown, int index) {
        String word = switch (kind) {
            case MEASURED -> "measured";
            case EXCLUDED -> "excluded";
            case PREDICTED -> "predicted";
            case LINE,
                    CONFIDENCE_BAND,
                    NEW_RUN_BAND,
                    VERTICAL_MARK,
                    HORIZONTAL_MARK,
                    WALL,
                    FLOOR,
                    SPINDLE,
                    STRIP_MARK,
                    RUG -> throw new IllegalArgumentException("not a point: " + kind);
        };
        double low = shown.lower()[index];
        double high = shown.upper()[index];
        String whisker = low < high ? " (" + Rounding.interval(low, high) + ")" : "";
        return word + " at " + abscissa(shown.x()[index]) + ", " + ordinate(shown.y()[index]) + whisker;
    }
}
