package org.saddlebook.data.checks.internal;

import java.util.Set;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.analysis.Analysis;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;

/** The analysis {@code dataChecks}, for campaigns with a rate table. */
@Component
public final class DataChecksComponent implements Analysis {
    @Override
    public String section() {
        return DataChecksEvaluation.SECTION;
    }

    @Override
    public String title() {
        return DataChecksEvaluation.TITLE;
    }

    @Override
    public Set<String> reads() {
        return Set.of("runs", "barrier");
    }

    @Override
    public boolean appliesTo(Campaign campaign) {
        return campaign.rateTable().isPresent();
    }

    @Override
    public Section analyse(Campaign campaign, Findings earlier, Task task) throws Cancelled {
        return DataChecksEvaluation.section(campaign, task);
    }
}
