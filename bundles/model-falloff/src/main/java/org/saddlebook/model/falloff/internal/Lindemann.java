package org.saddlebook.model.falloff.internal;

import java.util.Optional;
import java.util.Set;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.model.Conditions;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.ModelDescription;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.RateFunction;
import org.saddlebook.api.model.RateModel;

/**
 * Pressure falloff without broadening, {@code k = k∞ Pr/(1 + Pr)} with {@code Pr = k0 [M]/k∞}; see {@link FalloffLaw}.
 *
 * <p>Source: F. A. Lindemann, Trans. Faraday Soc. 17 (1922) 598.
 */
@Component
public final class Lindemann implements RateModel {
    private static final ModelDescription DESCRIPTION = new ModelDescription(
            "Falloff, Lindemann",
            "k = kinf Pr/(1+Pr), Pr = k0 [M]/kinf; ln k0 = ln A0 + n0 ln(T/T0) - E0/(R T), ln kinf = ln Ainf + ninf"
                    + " ln(T/T0) - Einf/(R T)",
            "F. A. Lindemann, Trans. Faraday Soc. 17 (1922) 598",
            Optional.empty());

    @Override
    public String id() {
        return "falloff-lindemann";
    }

    @Override
    public ModelDescription description() {
        return DESCRIPTION;
    }

    @Override
    public RateFunction bind(RateContext context) throws Inapplicable {
        return FalloffLaw.bind(context, Broadening.NONE);
    }

    @Override
    public RateContext completed(RateContext context) {
        return FalloffLaw.completed(context);
    }

    @Override
    public Set<String> conditions() {
        return Set.of(Conditions.THIRD_BODY);
    }
}
