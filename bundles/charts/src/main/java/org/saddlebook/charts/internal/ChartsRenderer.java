package org.saddlebook.charts.internal;

import java.util.Map;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.service.FigureRenderer;
import org.saddlebook.charts.api.FigureDrawing;
import org.saddlebook.charts.api.FigureDrawings;
import org.saddlebook.charts.api.FigureLook;

/** Draws figures with JFreeChart, as SVG through Batik and as PNG through Java 2D. Stateless; needs no display. */
@Component
public final class ChartsRenderer implements FigureRenderer, FigureDrawings {
    @Override
    public byte[] svg(Node.Figure figure, Map<String, String> cautions) {
        return new Drawing(figure, cautions, FigureLook.PAPER).svg();
    }

    @Override
    public byte[] png(Node.Figure figure, Map<String, String> cautions, double scale) {
        return new Drawing(figure, cautions, FigureLook.PAPER).png(scale);
    }

    @Override
    public FigureDrawing draw(Node.Figure figure, Map<String, String> cautions, FigureLook look) {
        return new Drawing(figure, cautions, look);
    }
}
