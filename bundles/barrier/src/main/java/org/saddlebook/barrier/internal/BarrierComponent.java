package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.Supplier;
import org.osgi.framework.BundleContext;
import org.osgi.framework.InvalidSyntaxException;
import org.osgi.framework.ServiceReference;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.analysis.Analysis;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.RateModel;
import org.saddlebook.api.model.TunnellingModel;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.api.service.Prediction;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;
import org.saddlebook.barrier.api.FittedLaws;

/** The barrier analysis and predictions from its findings, over whatever rate models are installed at the moment. */
@Component
public final class BarrierComponent implements Analysis, Prediction {
    private final BundleContext context;

    /** Models are looked up at each call, so that bundles may come and go. */
    @Activate
    public BarrierComponent(BundleContext context) {
        this.context = context;
    }

    @Override
    public String section() {
        return BarrierEvaluation.SECTION;
    }

    @Override
    public String title() {
        return BarrierEvaluation.TITLE;
    }

    @Override
    public Set<String> reads() {
        return Set.of("runs");
    }

    @Override
    public boolean appliesTo(Campaign campaign) {
        return campaign.rateTable().isPresent();
    }

    @Override
    public Section analyse(Campaign campaign, Findings earlier, Task task) throws Cancelled {
        return new BarrierEvaluation(campaign, installed(), this::corrections, task).section();
    }

    @Override
    public List<Node> predict(Findings findings, List<Double> kelvin, List<String> models) throws InputException {
        return predict(findings, kelvin, models, installed(), this::corrections);
    }

    static List<Node> predict(
            Findings findings, List<Double> kelvin, List<String> models, Map<String, InstalledModel> installed)
            throws InputException {
        return predict(findings, kelvin, models, installed, List::of);
    }

    private static List<Node> predict(
            Findings findings,
            List<Double> kelvin,
            List<String> models,
            Map<String, InstalledModel> installed,
            Supplier<List<TunnellingModel>> corrections)
            throws InputException {
        Place place = Place.of(findings.campaignTitle());
        Section section = findings.section(BarrierEvaluation.SECTION)
                .orElseThrow(() -> new InputException(new Problem(
                        "no-barrier",
                        place,
                        "findings without a section barrier",
                        "findings of an evaluated rate table",
                        "Evaluate a campaign that has a rate table and predict from its findings.")));
        try {
            StoredLaws laws = new StoredLaws(FittedLaws.of(section, corrections));
            List<Node> rows = new ArrayList<>();
            for (String id : models.isEmpty() ? laws.ids() : models) {
                if (!laws.ids().contains(id)) {
                    throw new InputException(new Problem(
                            "no-fitted-model",
                            place,
                            id,
                            "one of " + String.join(", ", laws.ids()),
                            "Name a model that these findings hold as fitted."));
                }
                InstalledModel model = installed.get(id);
                if (model == null) {
                    throw new InputException(new Problem(
                            "model-not-installed",
                            place,
                            id,
                            "an installed model",
                            "Install the bundle that provides the model " + id + "."));
                }
                if (laws.laws().conditionsAssumed()
                        && !model.model().conditions().isEmpty()) {
                    throw new InputException(new Problem(
                            "third-body-missing",
                            place,
                            "findings of " + id + " without a stated third body",
                            "the third body that the prediction is to hold for",
                            "Add a line such as \"# third body: 1 bar\" to the table and evaluate it again."));
                }
                for (double t : kelvin) {
                    rows.add(laws.predict(id, model.model(), t));
                }
            }
            return rows;
        } catch (StoredLaws.NoValue undefined) {
            throw new InputException(new Problem(
                    "no-value",
                    place,
                    String.valueOf(undefined.getMessage()),
                    "a temperature at which the law is defined",
                    "Choose another temperature, or name another model."));
        } catch (Inapplicable | RuntimeException unreadable) {
            throw new InputException(new Problem(
                    "unreadable-findings",
                    place,
                    String.valueOf(unreadable.getMessage()),
                    "a section barrier as Saddlebook writes it",
                    "Evaluate the campaign again."));
        }
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
