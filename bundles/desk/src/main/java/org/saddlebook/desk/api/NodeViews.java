package org.saddlebook.desk.api;

import java.util.Map;
import javax.swing.JComponent;
import org.osgi.annotation.versioning.ProviderType;
import org.saddlebook.api.findings.Node;

/**
 * Components for figures and tables of findings, as a service of the bundle with the desk's components. The desk uses it
 * for sections that no panel claims; without it they are shown plainly.
 */
@ProviderType
public interface NodeViews {
    /**
     * A figure with hover, zoom, copy and save.
     *
     * @param cautions caution id to text, of the section that holds the figure
     */
    JComponent figure(Node.Figure figure, Map<String, String> cautions, DeskContext context);

    /**
     * A table that copies with units.
     *
     * @param name accessible name
     */
    JComponent table(String name, Node.Table table, DeskContext context);
}
