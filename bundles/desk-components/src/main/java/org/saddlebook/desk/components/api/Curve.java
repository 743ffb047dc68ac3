package org.saddlebook.desk.components.api;

import java.awt.geom.Path2D;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.desk.api.TemperatureScale;

/** Curves of figures read off and drawn small; between the points of the findings they are straight, as in the figure. */
public final class Curve {
    private Curve() {}

    /** The first layer of this kind, with this label unless it is empty. */
    public static Optional<Layer> layer(Node.Figure figure, Layer.Kind kind, String label) {
        for (Layer layer : figure.layers()) {
            if (layer.kind() == kind && (label.isEmpty() || layer.label().equals(label))) {
                return Optional.of(layer);
            }
        }
        return Optional.empty();
    }

    /** What is read off at x, in the unit of the axis; empty outside. */
    public static OptionalDouble at(double[] x, double[] y, double where) {
        for (int i = 0; i + 1 < x.length; i++) {
            double low = Math.min(x[i], x[i + 1]);
            double high = Math.max(x[i], x[i + 1]);
            if (where >= low && where <= high && high > low) {
                return OptionalDouble.of(y[i] + (y[i + 1] - y[i]) * (where - x[i]) / (x[i + 1] - x[i]));
            }
        }
        return OptionalDouble.empty();
    }

    /** A curve against temperature in the coordinates of a strip; what lies beyond the ends of the rail is left out. */
    public static Path2D path(double[] kelvin, double[] y, TemperatureScale scale, DoubleUnaryOperator vertical) {
        Path2D path = new Path2D.Double();
        boolean begun = false;
        for (int i = 0; i < kelvin.length; i++) {
            if (!scale.holds(kelvin[i])) {
                begun = false;
                continue;
            }
            double px = scale.x(kelvin[i]);
            double py = vertical.applyAsDouble(y[i]);
            if (begun) {
                path.lineTo(px, py);
            } else {
                path.moveTo(px, py);
                begun = true;
            }
        }
        return path;
    }
}
