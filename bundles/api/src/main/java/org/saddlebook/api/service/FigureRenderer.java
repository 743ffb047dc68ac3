package org.saddlebook.api.service;

import java.util.Map;
import org.osgi.annotation.versioning.ProviderType;
import org.saddlebook.api.findings.Node;

/** Draws neutral figures. The one implementation is the bundle {@code charts}; nothing else headless touches AWT. */
@ProviderType
public interface FigureRenderer {
    /**
     * A figure as a self-contained SVG document.
     *
     * @param cautions caution id to text, for the cautions drawn with it
     */
    byte[] svg(Node.Figure figure, Map<String, String> cautions);

    /**
     * A figure as PNG.
     *
     * @param scale pixels per point, 1 to 8
     */
    byte[] png(Node.Figure figure, Map<String, String> cautions, double scale);
}
