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
 * Pressure falloff with a broadening factor, {@code k = k∞ Pr/(1 + Pr) F}; see {@link FalloffLaw} and {@link
 * Broadening#TROE}. At Fc = 1 it is the law of Lindemann.
 *
 * <p>Sources: J. Troe, Ber. Bunsenges. Phys. Chem. 87 (1983) 161; R. G. Gilbert, K. Luther and J. Troe, Ber. Bunsenges.
 * Phys. Chem. 87 (1983) 169.
 */
@Component
public final class Troe implements RateModel {
    private static final ModelDescription DESCRIPTION = new ModelDescription(
            "Falloff, Troe",
            "k = kinf Pr/(1+Pr) F, Pr = k0 [M]/kinf; lg F = lg Fc/(1+((lg Pr+c)/(N-0.14 (lg Pr+c)))^2), c = -0.4-0.67 lg Fc,"
                    + " N = 0.75-1.27 lg Fc; k0 and kinf as in falloff-lindemann",
            "J. Troe, Ber. Bunsenges. Phys. Chem. 87 (1983) 161; R. G. Gilbert, K. Luther and J. Troe, Ber. Bunsenges. Phys."
                    + " Chem. 87 (1983) 169",
            Optional.of("falloff-lindemann"));

    @Override
    public String id() {
        return "falloff-troe";
    }

    @Override
    public ModelDescription description() {
        return DESCRIPTION;
    }

    @Override
    public RateFunction bind(RateContext context) throws Inapplicable {
        return FalloffLaw.bind(context, Broadening.TROE);
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
