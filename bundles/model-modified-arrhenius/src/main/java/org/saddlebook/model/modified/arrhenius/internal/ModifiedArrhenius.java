package org.saddlebook.model.modified.arrhenius.internal;

import java.util.ArrayList;
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
 * The modified Arrhenius law, {@code ln k = ln A + n ln(T/T0) − E/(RT)}: A in the unit of k, n a pure number, E in J/mol,
 * T0 the reference temperature of the context. At n = 0 it is the Arrhenius law. In a narrow range n is usually
 * undetermined: hold it at 0, 1/2, 1 or 2 through the context.
 *
 * <p>Source: D. M. Kooij, Z. Phys. Chem. 12 (1893) 155; IUPAC Gold Book, "modified Arrhenius equation".
 */
@Component
public final class ModifiedArrhenius implements RateModel {
    private static final ModelDescription DESCRIPTION = new ModelDescription(
            "Modified Arrhenius",
            "ln k = ln A + n ln(T/T0) - E/(R T)",
            "D. M. Kooij, Z. Phys. Chem. 12 (1893) 155; IUPAC Gold Book, modified Arrhenius equation",
            Optional.of("arrhenius"));

    @Override
    public String id() {
        return "modified-arrhenius";
    }

    @Override
    public ModelDescription description() {
        return DESCRIPTION;
    }

    @Override
    public RateFunction bind(RateContext context) throws Inapplicable {
        return HeldParameters.of(context, new Law(context));
    }

    /** Parameters: ln A (A in SI), n, E in J/mol. */
    private static final class Law implements RateFunction {
        private final double referenceKelvin;
        private final List<Parameter> parameters;
        private final List<Derived> derived;

        Law(RateContext context) throws Inapplicable {
            referenceKelvin = context.referenceKelvin();
            parameters = List.of(
                    Parameter.log("A", "pre-exponential factor at the reference temperature", context.rateUnit()),
                    Parameter.linear("n", "temperature exponent", Unit.ONE).withNeutral(0),
                    Parameter.linear("E", "energy in the exponent", Unit.JOULE_PER_MOLE));
            List<Derived> all = new ArrayList<>();
            all.add(new Derived(
                    "Ea",
                    "local activation energy",
                    Unit.JOULE_PER_MOLE,
                    Parameter.Scale.LINEAR,
                    Law::activationEnergy));
            all.add(new Derived(
                    "Alocal",
                    "local pre-exponential factor",
                    context.rateUnit(),
                    Parameter.Scale.LOG,
                    this::lnPreExponential));
            if (TransitionState.applies(context)) {
                all.addAll(TransitionState.of(context).activation(Law::activationEnergy, this::lnPreExponential));
            }
            derived = List.copyOf(all);
        }

        @Override
        public List<Parameter> parameters() {
            return parameters;
        }

        @Override
        public boolean linear() {
            return true;
        }

        @Override
        public double lnRate(double kelvin, double[] p, double[] gradient) {
            double lnRatio = StrictMath.log(kelvin / referenceKelvin);
            gradient[0] = 1;
            gradient[1] = lnRatio;
            gradient[2] = -1 / (Constants.GAS * kelvin);
            return p[0] + p[1] * lnRatio - p[2] / (Constants.GAS * kelvin);
        }

        @Override
        public List<Derived> derived() {
            return derived;
        }

        /** {@code Ea(T) = R T² d ln k/dT = E + n R T}. */
        private static double activationEnergy(double kelvin, double[] p, double[] gradient) {
            gradient[0] = 0;
            gradient[1] = Constants.GAS * kelvin;
            gradient[2] = 1;
            return p[2] + p[1] * Constants.GAS * kelvin;
        }

        /** {@code ln A(T) = ln k + Ea(T)/(RT) = ln A + n ln(T/T0) + n}. */
        private double lnPreExponential(double kelvin, double[] p, double[] gradient) {
            double perExponent = StrictMath.log(kelvin / referenceKelvin) + 1;
            gradient[0] = 1;
            gradient[1] = perExponent;
            gradient[2] = 0;
            return p[0] + p[1] * perExponent;
        }
    }
}
