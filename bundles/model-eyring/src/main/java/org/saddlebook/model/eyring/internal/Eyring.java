package org.saddlebook.model.eyring.internal;

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
 * The Eyring law, {@code ln k = ln F(T) + ΔS/R − ΔH/(RT)}, with the frequency factor F of {@link TransitionState} for the
 * order, standard state and transmission coefficient of the context. ΔH in J/mol and ΔS in J/(mol K) do not vary with
 * temperature.
 *
 * <p>Source: H. Eyring, J. Chem. Phys. 3 (1935) 107; M. G. Evans and M. Polanyi, Trans. Faraday Soc. 31 (1935) 875; IUPAC
 * Gold Book, "transition state theory".
 */
@Component
public final class Eyring implements RateModel {
    private static final ModelDescription DESCRIPTION = new ModelDescription(
            "Eyring",
            "ln k = ln kappa + ln(kB T/h) + (1-m) ln c0 + dS/R - dH/(R T); for a gas at standard pressure"
                    + " (m-1) ln(R T/p0) in place of (1-m) ln c0",
            "H. Eyring, J. Chem. Phys. 3 (1935) 107; M. G. Evans and M. Polanyi, Trans. Faraday Soc. 31 (1935) 875;"
                    + " IUPAC Gold Book, transition state theory",
            Optional.empty());

    @Override
    public String id() {
        return "eyring";
    }

    @Override
    public ModelDescription description() {
        return DESCRIPTION;
    }

    @Override
    public RateFunction bind(RateContext context) throws Inapplicable {
        return HeldParameters.of(context, new Law(context));
    }

    /** Parameters: ΔH in J/mol, ΔS in J/(mol K). */
    private static final class Law implements RateFunction {
        private static final List<Parameter> PARAMETERS = List.of(
                Parameter.linear("dH", "enthalpy of activation", Unit.JOULE_PER_MOLE),
                Parameter.linear("dS", "entropy of activation", Unit.JOULE_PER_MOLE_KELVIN));

        private final TransitionState state;
        private final List<Derived> derived;

        Law(RateContext context) throws Inapplicable {
            state = TransitionState.of(context);
            derived = List.of(
                    new Derived(
                            "Ea",
                            "activation energy",
                            Unit.JOULE_PER_MOLE,
                            Parameter.Scale.LINEAR,
                            this::activationEnergy),
                    new Derived(
                            "A",
                            "pre-exponential factor",
                            context.rateUnit(),
                            Parameter.Scale.LOG,
                            this::lnPreExponential),
                    new Derived(
                            "dG",
                            "Gibbs energy of activation",
                            Unit.JOULE_PER_MOLE,
                            Parameter.Scale.LINEAR,
                            Law::gibbsEnergy));
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
            gradient[0] = -1 / (Constants.GAS * kelvin);
            gradient[1] = 1 / Constants.GAS;
            return state.lnRate(kelvin, p[0], p[1]);
        }

        @Override
        public boolean defined(double kelvin, double[] p) {
            return state.defined(kelvin);
        }

        @Override
        public List<Derived> derived() {
            return derived;
        }

        private double activationEnergy(double kelvin, double[] p, double[] gradient) {
            gradient[0] = 1;
            gradient[1] = 0;
            return state.activationEnergy(kelvin, p[0]);
        }

        private double lnPreExponential(double kelvin, double[] p, double[] gradient) {
            gradient[0] = 0;
            gradient[1] = 1 / Constants.GAS;
            return state.lnPreExponential(kelvin, p[1]);
        }

        private static double gibbsEnergy(double kelvin, double[] p, double[] gradient) {
            gradient[0] = 1;
            gradient[1] = -kelvin;
            return p[0] - kelvin * p[1];
        }
    }
}
