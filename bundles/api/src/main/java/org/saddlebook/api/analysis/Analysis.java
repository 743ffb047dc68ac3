package org.saddlebook.api.analysis;

import java.util.Set;
import org.osgi.annotation.versioning.ConsumerType;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;

/**
 * One step of the evaluation: a pure function from the effective campaign and earlier sections to one section. Register
 * an implementation as an OSGi service.
 */
@ConsumerType
public interface Analysis {
    /** Id of the section it writes. */
    String section();

    /** Title of the section, for people. */
    String title();

    /** Ids of the sections it reads when they are there; they are computed first. */
    Set<String> reads();

    /**
     * Whether this campaign gives the analysis anything to do; when not, the section is left out without a word. Must be
     * quick.
     */
    boolean appliesTo(Campaign campaign);

    /**
     * The section.
     *
     * @param campaign effective campaign
     * @param earlier the sections named by {@link #reads()} that are there
     */
    Section analyse(Campaign campaign, Findings earlier, Task task) throws Cancelled;
}
