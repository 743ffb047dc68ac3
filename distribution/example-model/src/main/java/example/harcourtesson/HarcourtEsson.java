package example.harcourtesson;

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
 * The law of Harcourt and Esson, {@code k = k0 (T/T0)^C}: k0 is the rate constant at the reference temperature T0 of the
 * context, C a pure number. It is older than the acceptance of the Arrhenius law and fits a narrow range as well.
 *
 * <p>Source: A. V. Harcourt and W. Esson, Phil. Trans. R. Soc. London A 186 (1895) 817; cited from memory.
 */
@Component
public final class HarcourtEsson implements RateModel {
    @Override
    public String id() {
        return "example.harcourt-esson";
    }

    @Override
    public ModelDescription description() {
        return new ModelDescription(
                "Harcourt-Esson",
                "ln k = ln k0 + C ln(T/T0)",
                "A. V. Harcourt and W. Esson, Phil. Trans. R. Soc. London A 186 (1895) 817",
                Optional.empty());
    }

    @Override
    public RateFunction bind(RateContext context) throws Inapplicable {
        return HeldParameters.of(context, new Law(context));
    }

    /** Parameters: ln k0 (k0 in SI), C. */
    private static final class Law implements RateFunction {
        private final double referenceKelvin;
        private final List<Parameter> parameters;
        private final List<Derived> derived;

        Law(RateContext context) throws Inapplicable {
            referenceKelvin = context.referenceKelvin();
            parameters = List.of(
                    Parameter.log("k0", "rate constant at the reference temperature", context.rateUnit()),
                    Parameter.linear("C", "temperature exponent", Unit.ONE));
            List<Derived> all = new ArrayList<>();
            all.add(new Derived(
                    "Ea",
                    "local activation energy",
                    Unit.JOULE_PER_MOLE,
                    Parameter.Scale.LINEAR,
                    Law::activationEnergy));
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
            return p[0] + p[1] * lnRatio;
        }

        @Override
        public List<Derived> derived() {
            return derived;
        }

        /** {@code Ea(T) = R T² d ln k/dT = C R T}. */
        private static double activationEnergy(double kelvin, double[] p, double[] gradient) {
            gradient[0] = 0;
            gradient[1] = Constants.GAS * kelvin;
            return p[1] * Constants.GAS * kelvin;
        }

        /** {@code ln A(T) = ln k + Ea(T)/(RT) = ln k + C}. */
        private double lnPreExponential(double kelvin, double[] p, double[] gradient) {
            double lnRate = lnRate(kelvin, p, gradient);
            gradient[1] += 1;
            return lnRate + p[1];
        }
    }
}
