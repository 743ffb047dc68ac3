package org.saddlebook.tunnelling.internal;

import java.util.List;
import java.util.Optional;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.ModelDescription;
import org.saddlebook.api.model.Transmission;
import org.saddlebook.api.model.Tunnelling;
import org.saddlebook.api.model.TunnellingModel;

/**
 * Wigner's correction, the leading term for a small u: {@code κ = 1 + u²/24} with {@code u = h c ν̃/(kB T)}, ν̃ the size of the
 * imaginary wavenumber at the saddle point. Common practice trusts it while κ is below 2.
 *
 * <p>Source: E. Wigner, Z. Phys. Chem. B 19 (1932) 203.
 */
@Component
public final class Wigner implements TunnellingModel {
    private static final ModelDescription DESCRIPTION = new ModelDescription(
            "Wigner",
            "kappa = 1 + u^2/24, u = h c nu/(kB T)",
            "E. Wigner, Z. Phys. Chem. B 19 (1932) 203",
            Optional.empty());

    @Override
    public String id() {
        return "wigner";
    }

    @Override
    public ModelDescription description() {
        return DESCRIPTION;
    }

    @Override
    public Transmission of(Tunnelling stated) throws Inapplicable {
        Barrier.only(stated, List.of(Tunnelling.WAVENUMBER));
        return new Coefficient(stated, Barrier.characteristicKelvin(stated));
    }

    private record Coefficient(Tunnelling stated, double characteristicKelvin) implements Transmission {
        @Override
        public boolean defined(double kelvin) {
            return true;
        }

        @Override
        public String limit() {
            return "";
        }

        @Override
        public double lnCoefficient(double kelvin) {
            double u = characteristicKelvin / kelvin;
            return StrictMath.log1p(u * u / 24);
        }

        @Override
        public double slope(double kelvin) {
            double u = characteristicKelvin / kelvin;
            double excess = u * u / 24;
            return -2 * excess / (1 + excess) / kelvin;
        }
    }
}
