package org.saddlebook.model.eyring.heat.capacity.internal;

import java.util.List;
import java.util.Optional;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.model.Derived;
import org.saddlebook.api.model.HeldParameters;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.ModelDescription;
import org.saddlebook.api.model.Parameter;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.RateFunction;
import org.saddlebook.api.model.RateModel;
import org.saddlebook.api.model.TransitionState;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.quantity.Unit;

/**
 * The Eyring law with a heat capacity of activation that does not vary with temperature: {@code ln k = ln F(T) + ΔS(T)/R −
 * ΔH(T)/(RT)} with {@code ΔH(T) = ΔH + ΔCp (T − T0)} and {@code ΔS(T) = ΔS + ΔCp ln(T/T0)}. F is the frequency factor of
 * {@link TransitionState}, T0 the reference temperature of the context; ΔH in J/mol, ΔS and ΔCp in J/(mol K). At ΔCp = 0 it
 * is the Eyring law.
 *
 * <p>Source: E. C. W. Clarke and D. N. Glew, Trans. Faraday Soc. 62 (1966) 539, for equilibrium constants, applied to
 * activation.
 */
@Component
public final class EyringHeatCapacity implements RateModel {
    private static final ModelDescription DESCRIPTION = new ModelDescription(
            "Eyring with heat capacity",
            "ln k = ln kappa + ln(kB T/h) + (1-m) ln c0 + dS(T)/R - dH(T)/(R T); dH(T) = dH + dCp (T-T0), dS(T) = dS +"
                    + " dCp ln(T/T0); for a gas at standard pressure (m-1) ln(R T/p0) in place of (1-m) ln c0",
            "E. C. W. Clarke and D. N. Glew, Trans. Faraday Soc. 62 (1966) 539, applied to activation",
            Optional.of("eyring"));

    @Override
    public String id() {
        return "eyring-heat-capacity";
    }

    @Override
    public ModelDescription description() {
        return DESCRIPTION;
    }

    @Override
    public RateFunction bind(RateContext context) throws Inapplicable {
        return HeldParameters.of(context, new Law(context));
    }

    @Override
    public boolean onRequest() {
        return true;
    }

    /** Parameters: ΔH in J/mol and ΔS in J/(mol K) at T0, ΔCp in J/(mol K). */
    private static final class Law implements RateFunction {
        private static final List<Parameter> PARAMETERS = List.of(
                Parameter.linear("dH", "enthalpy of activation at the reference temperature", Unit.JOULE_PER_MOLE),
                Parameter.linear(
                        "dS", "entropy of activation at the reference temperature", Unit.JOULE_PER_MOLE_KELVIN),
                Parameter.linear("dCp", "heat capacity of activation", Unit.JOULE_PER_MOLE_KELVIN)
                        .withNeutral(0));

        private final TransitionState state;
        private final double referenceKelvin;
        private final List<Derived> derived;

        Law(RateContext context) throws Inapplicable {
            state = TransitionState.of(context);
            referenceKelvin = context.referenceKelvin();
            derived = List.of(
                    new Derived(
                            "Ea",
                            "local activation energy",
                            Unit.JOULE_PER_MOLE,
                            Parameter.Scale.LINEAR,
                            this::activationEnergy),
                    new Derived(
                            "Alocal",
                            "local pre-exponential factor",
                            context.rateUnit(),
                            Parameter.Scale.LOG,
                            this::lnPreExponential),
                    new Derived(
                            "dHlocal",
                            "enthalpy of activation",
                            Unit.JOULE_PER_MOLE,
                            Parameter.Scale.LINEAR,
                            this::enthalpy),
                    new Derived(
                            "dSlocal",
                            "entropy of activation",
                            Unit.JOULE_PER_MOLE_KELVIN,
                            Parameter.Scale.LINEAR,
                            this::entropy),
                    new Derived(
                            "dG",
                            "Gibbs energy of activation",
                            Unit.JOULE_PER_MOLE,
                            Parameter.Scale.LINEAR,
                            this::gibbsEnergy));
        }

        @Override
        public List<Parameter> parameters() {
            return PARAMETERS;
        }

        @Override
        public boolean linear() {
            return true;
        }

        @Override
        public double lnRate(double kelvin, double[] p, double[] gradient) {
            double thermal = Constants.GAS * kelvin;
            gradient[0] = -1 / thermal;
            gradient[1] = 1 / Constants.GAS;
            gradient[2] = curvature(kelvin) / Constants.GAS;
            return state.lnFrequency(kelvin) + (p[1] + p[2] * curvature(kelvin)) / Constants.GAS - p[0] / thermal;
        }

        /**
         * {@code ln(T/T0) − (1 − T0/T)}, what ΔCp/R is multiplied with; by a series near T0, where the two terms cancel: with
         * x = T0/T − 1 it is {@code x − ln(1 + x)}.
         */
        private double curvature(double kelvin) {
            double x = (referenceKelvin - kelvin) / kelvin;
            if (Math.abs(x) > 0.05) {
                return x - StrictMath.log1p(x);
            }
            double sum = 0;
            for (int power = 14; power >= 2; power--) {
                sum = 1.0 / power - x * sum;
            }
            return x * x * sum;
        }

        @Override
        public boolean defined(double kelvin, double[] p) {
            return state.defined(kelvin);
        }

        @Override
        public List<Derived> derived() {
            return derived;
        }

        /** {@code ΔH(T)}. */
        private double enthalpy(double kelvin, double[] p, double[] gradient) {
            gradient[0] = 1;
            gradient[1] = 0;
            gradient[2] = kelvin - referenceKelvin;
            return p[0] + p[2] * (kelvin - referenceKelvin);
        }

        /** {@code ΔS(T)}. */
        private double entropy(double kelvin, double[] p, double[] gradient) {
            double lnRatio = StrictMath.log(kelvin / referenceKelvin);
            gradient[0] = 0;
            gradient[1] = 1;
            gradient[2] = lnRatio;
            return p[1] + p[2] * lnRatio;
        }

        /** {@code R T² d ln k/dT}: the terms in ΔCp of the two derivatives cancel, and ΔH(T) takes the place of ΔH. */
        private double activationEnergy(double kelvin, double[] p, double[] gradient) {
            return state.activationEnergy(kelvin, enthalpy(kelvin, p, gradient));
        }

        private double lnPreExponential(double kelvin, double[] p, double[] gradient) {
            double entropy = entropy(kelvin, p, gradient);
            for (int i = 0; i < gradient.length; i++) {
                gradient[i] /= Constants.GAS;
            }
            return state.lnPreExponential(kelvin, entropy);
        }

        private double gibbsEnergy(double kelvin, double[] p, double[] gradient) {
            gradient[0] = 1;
            gradient[1] = -kelvin;
            gradient[2] = -kelvin * curvature(kelvin);
            return p[0] - kelvin * p[1] + p[2] * gradient[2];
        }
    }
}
