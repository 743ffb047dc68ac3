package org.saddlebook.charts.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.api.findings.Axis;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.presentation.api.DisplayUnit;
import org.saddlebook.presentation.api.UnitText;

/** What a figure shows in the units of people. */
final class Shown {
    private Shown() {}

    /** What stands at an axis: name and unit. */
    static String label(Axis axis, DisplayUnit unit) {
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

    /** The layers in the units shown; refuses a value that its axis cannot show. */
    static List<Layer> layers(
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
}
