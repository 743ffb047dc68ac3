package org.saddlebook.tunnelling.internal;

import java.util.List;
import java.util.Optional;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.ModelDescription;
import org.saddlebook.api.model.Transmission;
import org.saddlebook.api.model.Tunnelling;
import org.saddlebook.api.model.TunnellingModel;
import org.saddlebook.presentation.api.Rounding;

/**
 * Bell's correction for a parabolic barrier of unlimited depth, {@code κ = (u/2)/sin(u/2)} with {@code u = h c ν̃/(kB T)}. It
 * grows without limit towards u = 2π and means nothing there and beyond: no value is given.
 *
 * <p>Source: R. P. Bell, The Tunnel Effect in Chemistry (Chapman and Hall, 1980); Trans. Faraday Soc. 55 (1959) 1.
 */
@Component
public final class Bell implements TunnellingModel {
    private static final ModelDescription DESCRIPTION = new ModelDescription(
            "Bell",
            "kappa = (u/2)/sin(u/2), u = h c nu/(kB T) < 2 pi",
            "R. P. Bell, The Tunnel Effect in Chemistry (1980)",
            Optional.empty());

    @Override
    public String id() {
        return "bell";
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
            return characteristicKelvin / kelvin < 2 * Math.PI;
        }

        @Override
        public String limit() {
            return "The tunnelling correction bell has no value at and below "
                    + Rounding.significant(characteristicKelvin / (2 * Math.PI), 4)
                    + " K, where u reaches 2 pi; choose eckart for so much tunnelling.";
        }

        @Override
        public double lnCoefficient(double kelvin) {
            if (!defined(kelvin)) {
                return Double.NaN;
            }
            double half = characteristicKelvin / kelvin / 2;
            return StrictMath.log(half / StrictMath.sin(half));
        }

        @Override
        public double slope(double kelvin) {
            if (!defined(kelvin)) {
                return Double.NaN;
            }
            double half = characteristicKelvin / kelvin / 2;
            // 1 - x cot x; by its series where the two terms cancel.
            double square = half * half;
            double difference = half < 0.02
                    ? square * (1.0 / 3 + square * (1.0 / 45 + square * 2 / 945))
                    : 1 - half * StrictMath.cos(half) / StrictMath.sin(half);
            return -difference / kelvin;
        }
    }
}
