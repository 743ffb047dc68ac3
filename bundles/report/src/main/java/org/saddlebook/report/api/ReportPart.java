package org.saddlebook.report.api;

import org.osgi.annotation.versioning.ConsumerType;
import org.saddlebook.api.findings.Section;

/**
 * Shows one section in the report. Register an implementation as an OSGi service. Only sections that are done are handed
 * in; a part that throws, or whose HTML is refused, loses its own part: the report says so, names the bundle and falls
 * back to the default part.
 */
@ConsumerType
public interface ReportPart {
    /** Id of the section it shows. */
    String section();

    /**
     * The section as a fragment of HTML, a function of the arguments alone. Every tag is closed ({@code <br/>}), text is
     * escaped by {@link ReportTools#text}, headings begin at {@code h3}. Scripts, styles, event attributes and addresses
     * other than {@code #...} are refused, because a report is complete in itself.
     */
    String html(Section section, ReportTools tools);
}
