package org.saddlebook.desk.barrier.internal;

import java.util.Optional;
import org.osgi.service.component.annotations.Activate;
import org.osgi.service.component.annotations.Component;
import org.osgi.service.component.annotations.Reference;
import org.osgi.service.component.annotations.ReferenceCardinality;
import org.osgi.service.component.annotations.ReferencePolicyOption;
import org.saddlebook.api.service.Prediction;
import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.desk.api.DeskPanel;
import org.saddlebook.desk.api.DeskPanelProvider;
import org.saddlebook.desk.components.api.DeskComponents;

/** The stratum of rate laws. */
@Component
public final class BarrierProvider implements DeskPanelProvider {
    private final DeskComponents components;
    private final Optional<Prediction> prediction;

    /** Without a prediction service the hairline reads no rate constant. */
    @Activate
    public BarrierProvider(
            @Reference DeskComponents components,
            @Reference(cardinality = ReferenceCardinality.OPTIONAL, policyOption = ReferencePolicyOption.GREEDY)
                    Prediction prediction) {
        this.components = components;
        this.prediction = Optional.ofNullable(prediction);
    }

    @Override
    public String id() {
        return "barrier";
    }

    @Override
    public int order() {
        return BARRIER;
    }

    @Override
    public DeskPanel create(DeskContext context) {
        return new BarrierPanel(context, components, prediction);
    }
}
