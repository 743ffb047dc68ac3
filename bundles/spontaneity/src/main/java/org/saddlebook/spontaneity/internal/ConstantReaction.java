package org.saddlebook.spontaneity.internal;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.thermo.data.api.Segment;

/** A reaction with a species of unknown heat capacity: ΔH and ΔS at 298.15 K, from formation data. */
final class ConstantReaction {
    private ConstantReaction() {}

    /** {@code ΔH = Σ ν ΔfH°(298.15 K)}, {@code ΔS = Σ ν S°(298.15 K)}; uncertainties where every species states its own. */
    static Stated of(ReactionRequest request) throws Refusal {
        double h = 0;
        double s = 0;
        double varianceH = 0;
        double varianceS = 0;
        boolean known = true;
        for (Participant one : request.participants()) {
            Segment segment = one.data().nearest(Constants.REFERENCE_KELVIN);
            h += one.coefficient() * segment.enthalpy(Constants.REFERENCE_KELVIN);
            s += one.coefficient() * segment.entropy(Constants.REFERENCE_KELVIN);
            known &= one.data().enthalpyUncertainty().isPresent()
                    && one.data().entropyUncertainty().isPresent();
            double uh = one.coefficient() * one.data().enthalpyUncertainty().orElse(0);
            double us = one.coefficient() * one.data().entropyUncertainty().orElse(0);
            varianceH += uh * uh;
            varianceS += us * us;
        }
        OptionalDouble lower = OptionalDouble.empty();
        OptionalDouble upper = OptionalDouble.empty();
        if (request.settings().node("range").isPresent()) {
            SettingsReader range =
                    new SettingsReader(request.settings().node("range").get(), "the range", List.of("lower", "upper"));
            lower = OptionalDouble.of(range.kelvin("lower"));
            upper = OptionalDouble.of(range.kelvin("upper"));
            if (!(lower.getAsDouble() < upper.getAsDouble())) {
                throw new Refusal("The lower end of the range of temperatures must lie below its upper end.");
            }
        }
        return new Stated(
                h,
                known ? OptionalDouble.of(Math.sqrt(varianceH)) : OptionalDouble.empty(),
                s,
                known ? OptionalDouble.of(Math.sqrt(varianceS)) : OptionalDouble.empty(),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                lower,
                upper,
                Optional.of(StandardState.ONE_BAR));
    }

    /** The same at a composition: {@code ΔG + R T ln Q}. */
    static Stated at(Stated standard, double lnQ) {
        return new Stated(
                standard.enthalpy(),
                standard.enthalpyUncertainty(),
                standard.entropy() - Constants.GAS * lnQ,
                standard.entropyUncertainty(),
                standard.covariance(),
                standard.degreesOfFreedom(),
                standard.lowerKelvin(),
                standard.upperKelvin(),
                standard.standard());
    }
}
