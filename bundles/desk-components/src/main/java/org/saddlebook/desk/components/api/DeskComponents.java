package org.saddlebook.desk.components.api;

import java.util.Map;
import javax.swing.JComponent;
import org.osgi.annotation.versioning.ProviderType;
import org.saddlebook.api.findings.Node;
import org.saddlebook.desk.api.DeskContext;

/** Makes the components that need services. */
@ProviderType
public interface DeskComponents {
    /** An empty figure; {@link FigureView#show} fills it. */
    FigureView figure(DeskContext context);

    /**
     * An empty table; {@link TableView#show} fills it.
     *
     * @param name accessible name
     */
    TableView table(String name, DeskContext context);

    /**
     * Any piece of findings: groups as names with values, like groups and tables as tables, figures as figures.
     *
     * @param name accessible name
     * @param cautions caution id to text of the whole findings, in the order of their numbers
     */
    JComponent tree(String name, Node node, Map<String, String> cautions, DeskContext context);
}
