package org.saddlebook.charts.api;

import java.util.Objects;
import org.saddlebook.api.findings.Layer;

/**
 * A point of a figure.
 *
 * @param kind measured, excluded or predicted
 * @param layer index of its layer in the figure
 * @param index index of the point in its layer
 * @param x abscissa in the unit of the axis
 * @param y ordinate in the unit of the axis
 * @param px where it is drawn, points
 * @param py where it is drawn, points
 * @param text its kind and both values with units and, where it has one, its whisker, for people
 */
public record FigurePoint(
        Layer.Kind kind, int layer, int index, double x, double y, double px, double py, String text) {
    /** Checks the components. */
    public FigurePoint {
        Objects.requireNonNull(kind, "kind");
        Objects.requireNonNull(text, "text");
    }
}
