package org.saddlebook.window.internal;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.osgi.framework.BundleContext;
import org.osgi.framework.InvalidSyntaxException;
import org.osgi.framework.ServiceReference;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.analysis.Analysis;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.model.RateModel;
import org.saddlebook.api.model.TunnellingModel;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;

/** The analysis {@code window}, for campaigns that state something under that name. */
@Component
public final class WindowComponent implements Analysis {
    private final BundleContext context;

    /** Models are looked up at each call, so that bundles may come and go. */
    @Activate
    public WindowComponent(BundleContext context) {
        this.context = context;
    }

    @Override
    public String section() {
        return WindowEvaluation.SECTION;
    }

    @Override
    public String title() {
        return WindowEvaluation.TITLE;
    }

    @Override
    public Set<String> reads() {
        return Set.of("barrier", "spontaneity");
    }

    @Override
    public boolean appliesTo(Campaign campaign) {
        return campaign.settings().containsKey(WindowEvaluation.SECTION);
    }

    @Override
    public Section analyse(Campaign campaign, Findings earlier, Task task) throws Cancelled {
        return WindowEvaluation.section(campaign, earlier, installed(), this::corrections, task);
    }

    /** The installed tunnelling corrections. */
    private List<TunnellingModel> corrections() {
        List<ServiceReference<TunnellingModel>> references = new ArrayList<>();
        try {
            references.addAll(context.getServiceReferences(TunnellingModel.class, null));
        } catch (InvalidSyntaxException impossible) {
            throw new IllegalStateException("no filter, no syntax", impossible);
        }
        references.sort(Comparator.reverseOrder());
        List<TunnellingModel> models = new ArrayList<>();
        for (ServiceReference<TunnellingModel> reference : references) {
            TunnellingModel model = context.getService(reference);
            if (model != null) {
                models.add(model);
            }
        }
        return models;
    }

    /** The installed models by id; of equal ids the one of the highest rank, then the oldest, counts. */
    private Map<String, InstalledModel> installed() {
        List<ServiceReference<RateModel>> references = new ArrayList<>();
        try {
            Collection<ServiceReference<RateModel>> found = context.getServiceReferences(RateModel.class, null);
            references.addAll(found);
        } catch (InvalidSyntaxException impossible) {
            throw new IllegalStateException("no filter, no syntax", impossible);
        }
        references.sort(Comparator.reverseOrder());
        Map<String, InstalledModel> models = new LinkedHashMap<>();
        for (ServiceReference<RateModel> reference : references) {
            RateModel model = context.getService(reference);
            if (model != null) {
                models.putIfAbsent(
                        model.id(),
                        new InstalledModel(model, reference.getBundle().getSymbolicName()));
            }
        }
        return models;
    }
}
