package org.saddlebook.model.arrhenius.internal;

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
 * The Arrhenius law, {@code ln k = ln A − Ea/(RT)}: A in the unit of k and Ea in J/mol do not vary with temperature.
 *
 * <p>Source: S. Arrhenius, Z. Phys. Chem. 4 (1889) 226; IUPAC Gold Book, "Arrhenius equation".
 */
@Component
public final class Arrhenius implements RateModel {
    private static final ModelDescription DESCRIPTION = new ModelDescription(
            "Arrhenius",
            "ln k = ln A - Ea/(R T)",
            "S. Arrhenius, Z. Phys. Chem. 4 (1889) 226; IUPAC Gold Book, Arrhenius equation",
            Optional.empty());

    @Override
    public String id() {
        return "arrhenius";
    }

    @Override
    public ModelDescription description() {
        return DESCRIPTION;
    }

    @Override
    public RateFunction bind(RateContext context) throws Inapplicable {
        return HeldParameters.of(context, new Law(context));
    }

    /** Parameters: ln A (A in SI), Ea in J/mol. */
    private static final class Law implements RateFunction {
        private final List<Parameter> parameters;
        private final List<Derived> derived;

        Law(RateContext context) throws Inapplicable {
            parameters = List.of(
                    Parameter.log("A", "pre-exponential factor", context.rateUnit()),
                    Parameter.linear("Ea", "activation energy", Unit.JOULE_PER_MOLE));
            derived = TransitionState.applies(context)
                    ? TransitionState.of(context).activation(Law::activationEnergy, Law::lnPreExponential)
                    : List.of();
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
            gradient[0] = 1;
            gradient[1] = -1 / (Constants.GAS * kelvin);
            return p[0] - p[1] / (Constants.GAS * kelvin);
        }

        @Override
        public List<Derived> derived() {
            return derived;
        }

        private static double activationEnergy(double kelvin, double[] p, double[] gradient) {
            gradient[0] = 0;
            gradient[1] = 1;
            return p[1];
        }

        private static double lnPreExponential(double kelvin, double[] p, double[] gradient) {
            gradient[0] = 1;
            gradient[1] = 0;
            return p[0];
        }
    }
}
