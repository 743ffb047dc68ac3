package org.saddlebook.spontaneity.internal;

import java.util.Set;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.analysis.Analysis;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;

/** The analysis {@code spontaneity}, for campaigns that state something under that name. */
@Component
public final class SpontaneityComponent implements Analysis {
    @Override
    public String section() {
        return SpontaneityEvaluation.SECTION;
    }

    @Override
    public String title() {
        return SpontaneityEvaluation.TITLE;
    }

    @Override
    public Set<String> reads() {
        return Set.of();
    }

    @Override
    public boolean appliesTo(Campaign campaign) {
        return campaign.settings().containsKey(SpontaneityEvaluation.SECTION);
    }

    @Override
    public Section analyse(Campaign campaign, Findings earlier, Task task) throws Cancelled {
        task.check();
        return SpontaneityEvaluation.section(campaign);
    }
}
