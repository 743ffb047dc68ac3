package org.saddlebook.report.api;

import java.util.List;
import org.osgi.annotation.versioning.ProviderType;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;

/** What a part of the report needs; one instance serves one section of one report. */
@ProviderType
public interface ReportTools {
    /** The campaign. */
    Campaign campaign();

    /** All findings. */
    Findings findings();

    /** Text with everything escaped that HTML would read as markup, also inside attributes. */
    String text(String text);

    /** A quantity, rounded, with its unit, its interval and the numbers of its cautions. */
    String quantity(Node.Quantity quantity);

    /** The same for an absolute temperature in K, with degrees Celsius. */
    String temperature(Node.Quantity quantity);

    /** The numbers of cautions, to stand beside what they belong to; their texts follow in the margin. */
    String cautions(List<String> ids);

    /** A figure, drawn where a renderer is installed, else a sentence that says why it is not. */
    String figure(Node.Figure figure);

    /**
     * Any node: groups as definition lists, items as lists, tables and matrices as tables.
     *
     * @param key key of the node; shown as a heading where the node needs one, empty for none
     */
    String node(String key, Node node);
}
