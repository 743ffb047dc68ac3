package org.saddlebook.evaluation.internal;

import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.concurrent.TimeUnit;
import java.util.function.UnaryOperator;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;
import org.osgi.framework.InvalidSyntaxException;
import org.osgi.framework.ServiceReference;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.osgi.service.component.annotations.Reference;
import org.saddlebook.api.analysis.Analysis;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.model.RateModel;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.service.CampaignFormat;
import org.saddlebook.api.service.Evaluation;
import org.saddlebook.api.service.Progress;
import org.saddlebook.api.task.Cancelled;

/** The evaluation service over whatever is installed at the moment of the call. */
@Component
public final class EvaluationComponent implements Evaluation {
    private final BundleContext context;
    private final CampaignFormat format;

    /** Services are looked up at each call, so that bundles may come and go. */
    @Activate
    public EvaluationComponent(BundleContext context, @Reference CampaignFormat format) {
        this.context = context;
        this.format = format;
    }

    @Override
    public Campaign effective(Campaign campaign) throws InputException {
        List<String> ids = new ArrayList<>();
        Collection<RateModel> installed = services(RateModel.class).values();
        for (RateModel model : installed) {
            ids.add(model.id());
        }
        return Effective.of(campaign, ids, Effective.unasked(campaign, installed));
    }

    @Override
    public Findings evaluate(Campaign effective, Progress progress) throws Cancelled {
        Map<String, Analysis> analyses = new TreeMap<>();
        Map<String, Bundle> owners = new TreeMap<>();
        services(Analysis.class).forEach((reference, analysis) -> {
            // The first of equal ids wins: references come by rank, then by age.
            if (analyses.putIfAbsent(analysis.section(), analysis) == null) {
                owners.put(analysis.section(), reference.getBundle());
            }
        });
        Contributors contributors = new Contributors(knownHashes());
        contributors.add(context.getBundle());
        Optional<Bundle> formatBundle = Optional.ofNullable(context.getServiceReference(CampaignFormat.class))
                .map(ServiceReference::getBundle);
        formatBundle.ifPresent(contributors::add);
        EvaluationTask task = new EvaluationTask(
                effective.choices().seed(),
                Integer.getInteger("saddlebook.threads", Runtime.getRuntime().availableProcessors()),
                TimeUnit.SECONDS.toNanos(Long.getLong("saddlebook.patience", 30)),
                progress);
        Map<String, String> names = new TreeMap<>();
        owners.forEach((section, bundle) -> names.put(section, bundle.getSymbolicName()));
        Findings findings = new Evaluator(analyses, names)
                .evaluate(
                        effective,
                        format.digest(effective),
                        task,
                        section -> contributors.addWithServices(owners.get(section)));
        if (findings.sections().containsKey("barrier")) {
            services(RateModel.class).forEach((reference, model) -> {
                if (effective.choices().models().contains(model.id())) {
                    contributors.add(reference.getBundle());
                }
            });
        }
        return new Findings(
                findings.campaignTitle(), findings.campaignDigest(), contributors.list(), findings.sections());
    }

    /** Hashes that the launcher keeps, valid for the files that this run was started from; hashing them anew takes long. */
    @SuppressWarnings({"unchecked", "rawtypes"}) // what the launcher registers under this property
    private UnaryOperator<String> knownHashes() {
        try {
            for (ServiceReference<UnaryOperator> reference :
                    context.getServiceReferences(UnaryOperator.class, "(saddlebook.entry=hashes)")) {
                UnaryOperator<String> hashes = (UnaryOperator<String>) context.getService(reference);
                if (hashes != null) {
                    return hashes;
                }
            }
        } catch (InvalidSyntaxException impossible) {
            throw new IllegalStateException("a constant filter", impossible);
        }
        return location -> "";
    }

    private <S> Map<ServiceReference<S>, S> services(Class<S> type) {
        List<ServiceReference<S>> references = new ArrayList<>();
        try {
            references.addAll(context.getServiceReferences(type, null));
        } catch (InvalidSyntaxException impossible) {
            throw new IllegalStateException("no filter, no syntax", impossible);
        }
        references.sort(java.util.Comparator.reverseOrder());
        Map<ServiceReference<S>, S> services = new LinkedHashMap<>();
        for (ServiceReference<S> reference : references) {
            S service = context.getService(reference);
            if (service != null) {
                services.put(reference, service);
            }
        }
        return services;
    }
}
