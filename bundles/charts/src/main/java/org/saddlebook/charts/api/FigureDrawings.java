package org.saddlebook.charts.api;

import java.util.Map;
import org.osgi.annotation.versioning.ProviderType;
import org.saddlebook.api.findings.Node;

/** Lays figures out. Stateless; any thread. */
@ProviderType
public interface FigureDrawings {
    /**
     * A figure laid out.
     *
     * @param cautions caution id to text, in the order of their numbers
     * @throws IllegalArgumentException when the figure has a value that its axis cannot show
     */
    FigureDrawing draw(Node.Figure figure, Map<String, String> cautions, FigureLook look);
}
