package org.saddlebook.model.parallel.channels.internal;

import java.util.Optional;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.model.HeldParameters;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.ModelDescription;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.RateFunction;
import org.saddlebook.api.model.RateModel;

/**
 * Two channels side by side, each with an Arrhenius law: {@code ln k = ln(A1 exp(−Ea1/(RT)) + A2 exp(−Ea2/(RT)))}. A in the
 * unit of k, Ea in J/mol. Channel 1 is the one with the lower activation energy: the sum stays the same when the channels
 * change places.
 *
 * <p>Common practice, no source; that ln k against 1/T is then convex is in J. R. Hulett, Q. Rev. Chem. Soc. 18 (1964) 227.
 */
@Component
public final class ParallelChannels implements RateModel {
    private static final ModelDescription DESCRIPTION = new ModelDescription(
            "Two parallel channels",
            "ln k = ln(A1 exp(-Ea1/(R T)) + A2 exp(-Ea2/(R T))), Ea1 < Ea2",
            "common practice; J. R. Hulett, Q. Rev. Chem. Soc. 18 (1964) 227",
            Optional.empty());

    @Override
    public String id() {
        return "parallel-channels";
    }

    @Override
    public ModelDescription description() {
        return DESCRIPTION;
    }

    @Override
    public RateFunction bind(RateContext context) throws Inapplicable {
        return HeldParameters.of(context, new ChannelSum(context));
    }

    @Override
    public boolean onRequest() {
        return true;
    }
}
