package org.saddlebook.tunnelling.internal;

import java.util.Optional;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.ModelDescription;
import org.saddlebook.api.model.Transmission;
import org.saddlebook.api.model.Tunnelling;
import org.saddlebook.api.model.TunnellingModel;
import org.saddlebook.api.quantity.Constants;

/**
 * Eckart's correction: the exact transmission probability of a smooth barrier that may be higher from one side, averaged over
 * the energies of a temperature; see {@link EckartIntegral}. Needs the size of the imaginary wavenumber and the heights of the
 * barrier from the reactants and from the products, zero-point energies included.
 *
 * <p>Source: C. Eckart, Phys. Rev. 35 (1930) 1303.
 */
@Component
public final class Eckart implements TunnellingModel {
    static final String ID = "eckart";

    private static final ModelDescription DESCRIPTION = new ModelDescription(
            "Eckart",
            "kappa = exp(V1/(kB T)) integral P(E) exp(-E/(kB T)) dE/(kB T), P of the Eckart barrier",
            "C. Eckart, Phys. Rev. 35 (1930) 1303; H. S. Johnston and J. Heicklen, J. Phys. Chem. 66 (1962) 532",
            Optional.empty());

    @Override
    public String id() {
        return ID;
    }

    @Override
    public ModelDescription description() {
        return DESCRIPTION;
    }

    @Override
    public Transmission of(Tunnelling stated) throws Inapplicable {
        double characteristic = Barrier.characteristicKelvin(stated);
        double forward = Barrier.need(stated, Tunnelling.FORWARD_BARRIER, "forward height") / Constants.GAS;
        double reverse = Barrier.need(stated, Tunnelling.REVERSE_BARRIER, "reverse height") / Constants.GAS;
        return new EckartCoefficient(stated, new EckartIntegral(characteristic, forward, reverse));
    }
}
