package org.saddlebook.spontaneity.internal;

import java.util.List;
import java.util.Set;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.osgi.service.component.annotations.Reference;
import org.osgi.service.component.annotations.ReferenceCardinality;
import org.osgi.service.component.annotations.ReferencePolicyOption;
import org.saddlebook.api.analysis.Analysis;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;
import org.saddlebook.thermo.data.api.SpeciesSource;

/** The analysis {@code consistency}, for campaigns that state something under that name. */
@Component
public final class ConsistencyComponent implements Analysis {
    private final List<SpeciesSource> sources;

    /**
     * The sources that are installed.
     *
     * @param sources in any order; asked in order of id, the curated one last
     */
    @Activate
    public ConsistencyComponent(
            @Reference(cardinality = ReferenceCardinality.MULTIPLE, policyOption = ReferencePolicyOption.GREEDY)
                    List<SpeciesSource> sources) {
        this.sources = SpontaneityComponent.ordered(sources);
    }

    @Override
    public String section() {
        return ConsistencyEvaluation.SECTION;
    }

    @Override
    public String title() {
        return ConsistencyEvaluation.TITLE;
    }

    @Override
    public Set<String> reads() {
        return Set.of();
    }

    @Override
    public boolean appliesTo(Campaign campaign) {
        return campaign.settings().containsKey(ConsistencyEvaluation.SECTION);
    }

    @Override
    public Section analyse(Campaign campaign, Findings earlier, Task task) throws Cancelled {
        task.check();
        return ConsistencyEvaluation.section(campaign, sources);
    }
}
