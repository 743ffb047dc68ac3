package org.saddlebook.charts.api;

import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import java.util.Optional;
import org.osgi.annotation.versioning.ProviderType;
import org.saddlebook.api.findings.Node;

/** A figure laid out for one look. Immutable; coordinates are points from the upper left corner of the sheet. */
@ProviderType
public interface FigureDrawing {
    /** The figure. */
    Node.Figure figure();

    /** Width of the sheet. */
    int width();

    /** Height of the sheet. */
    int height();

    /** The drawing area within axes. */
    Rectangle2D area();

    /** Paints the sheet; the caller has chosen smoothing and scale. */
    void paint(Graphics2D g);

    /** The points that are in view: measured, excluded and predicted ones, from left to right. */
    List<FigurePoint> points();

    /** The point nearest to a pixel, not farther from it than {@code reach}. */
    Optional<FigurePoint> pointAt(double px, double py, double reach);

    /** What is read off at a horizontal position: the abscissa first, then each line that passes there; empty outside. */
    List<String> readingsAt(double px);

    /** Horizontal position of an abscissa, in the unit of the axis; may lie outside the area. */
    double px(double x);

    /** The abscissa at a horizontal position, in the unit of the axis. */
    double x(double px);

    /**
     * The part of the axes that a rectangle shows; empty when an axis cannot show it, such as temperatures beyond
     * infinity.
     */
    Optional<FigureLook.Zoom> part(Rectangle2D rectangle);

    /** What a screen reader says beyond the title. */
    String description();

    /** The sheet as a self-contained SVG document. */
    byte[] svg();

    /**
     * The sheet as PNG.
     *
     * @param scale pixels per point, 1 to 8
     */
    byte[] png(double scale);
}
