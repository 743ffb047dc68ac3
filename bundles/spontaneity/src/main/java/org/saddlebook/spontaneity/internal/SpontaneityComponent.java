package org.saddlebook.spontaneity.internal;

import java.util.ArrayList;
import java.util.Comparator;
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

/** The analysis {@code spontaneity}, for campaigns that state something under that name. */
@Component
public final class SpontaneityComponent implements Analysis {
    private final List<SpeciesSource> sources;

    /**
     * The sources that are installed; the framework makes another component when they change.
     *
     * @param sources in any order; asked in order of id, the curated one last
     */
    @Activate
    public SpontaneityComponent(
            @Reference(cardinality = ReferenceCardinality.MULTIPLE, policyOption = ReferencePolicyOption.GREEDY)
                    List<SpeciesSource> sources) {
        this.sources = ordered(sources);
    }

    /** In order of id, the curated one last. */
    static List<SpeciesSource> ordered(List<SpeciesSource> sources) {
        List<SpeciesSource> ordered = new ArrayList<>(sources);
        ordered.sort(Comparator.comparing((SpeciesSource source) -> source.id().equals("curated"))
                .thenComparing(SpeciesSource::id));
        return List.copyOf(ordered);
    }

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
        return SpontaneityEvaluation.section(campaign, sources);
    }
}
