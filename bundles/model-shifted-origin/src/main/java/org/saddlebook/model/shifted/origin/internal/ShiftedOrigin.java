package org.saddlebook.model.shifted.origin.internal;

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
 * The law with a shifted origin of the temperature, {@code ln k = ln A − B/(T − T∞)}: A in the unit of k, B and T∞ in K.
 * It has no value at and below T∞. At T∞ = 0 it is the Arrhenius law with {@code Ea = R B}.
 *
 * <p>Sources: H. Vogel, Phys. Z. 22 (1921) 645; G. S. Fulcher, J. Am. Ceram. Soc. 8 (1925) 339; G. Tammann and W. Hesse,
 * Z. anorg. allg. Chem. 156 (1926) 245.
 */
@Component
public final class ShiftedOrigin implements RateModel {
    private static final ModelDescription DESCRIPTION = new ModelDescription(
            "Shifted origin",
            "ln k = ln A - B/(T - Tinf)",
            "H. Vogel, Phys. Z. 22 (1921) 645; G. S. Fulcher, J. Am. Ceram. Soc. 8 (1925) 339; G. Tammann and W. Hesse,"
                    + " Z. anorg. allg. Chem. 156 (1926) 245",
            Optional.of("arrhenius"));

    @Override
    public String id() {
        return "shifted-origin";
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

    /** Parameters: ln A (A in SI), B and T∞ in K. */
    private static final class Law implements RateFunction {
        /** Origins that are tried first, as parts of the lowest temperature: close below it, far below it, at zero. */
        private static final double[] ORIGINS = {0.97, 0.9, 0.8, 0.65, 0.5, 0.3, 0, -0.6, -2, -6};

        private static final int STARTS = 3;

        private final List<Parameter> parameters;
        private final List<Derived> derived;

        Law(RateContext context) throws Inapplicable {
            parameters = List.of(
                    Parameter.log("A", "limit of the rate constant at high temperature", context.rateUnit()),
                    Parameter.linear("B", "temperature in the numerator", Unit.KELVIN),
                    Parameter.linear("Tinf", "shifted origin of the temperature", Unit.KELVIN)
                            .withNeutral(0));
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
                    Law::lnPreExponential));
            if (TransitionState.applies(context)) {
                all.addAll(TransitionState.of(context).activation(Law::activationEnergy, Law::lnPreExponential));
            }
            derived = List.copyOf(all);
        }

        @Override
        public List<Parameter> parameters() {
            return parameters;
        }

        @Override
        public boolean linear() {
            return false;
        }

        @Override
        public double lnRate(double kelvin, double[] p, double[] gradient) {
            double distance = kelvin - p[2];
            if (!(distance > 0)) {
                return undefined(gradient);
            }
            gradient[0] = 1;
            gradient[1] = -1 / distance;
            gradient[2] = -p[1] / distance / distance;
            return p[0] - p[1] / distance;
        }

        private static double undefined(double[] gradient) {
            java.util.Arrays.fill(gradient, Double.NaN);
            return Double.NaN;
        }

        @Override
        public boolean defined(double kelvin, double[] p) {
            return kelvin > p[2];
        }

        /** For each of some origins the straight line through the points; the best of them. */
        @Override
        public List<double[]> starts(double[] kelvin, double[] lnRate) {
            double lowest = Double.POSITIVE_INFINITY;
            for (double t : kelvin) {
                lowest = Math.min(lowest, t);
            }
            List<double[]> lines = new ArrayList<>();
            List<Double> misfits = new ArrayList<>();
            for (double part : ORIGINS) {
                double origin = part * lowest;
                double meanX = 0;
                double meanY = 0;
                for (int i = 0; i < kelvin.length; i++) {
                    meanX += 1 / (kelvin[i] - origin) / kelvin.length;
                    meanY += lnRate[i] / kelvin.length;
                }
                double sxx = 0;
                double sxy = 0;
                double syy = 0;
                for (int i = 0; i < kelvin.length; i++) {
                    double x = 1 / (kelvin[i] - origin) - meanX;
                    double y = lnRate[i] - meanY;
                    sxx += x * x;
                    sxy += x * y;
                    syy += y * y;
                }
                double slope = sxx > 0 ? sxy / sxx : 0;
                double misfit = syy - slope * sxy;
                int place = 0;
                while (place < lines.size() && misfits.get(place) <= misfit) {
                    place++;
                }
                lines.add(place, new double[] {meanY - slope * meanX, -slope, origin});
                misfits.add(place, misfit);
            }
            return List.copyOf(lines.subList(0, STARTS));
        }

        @Override
        public List<String> remarks(double[] p) {
            return p[2] < 0
                    ? List.of(
                            "The origin lies below 0 K, where it has no physical meaning: the activation energy rises with"
                                    + " temperature, which this law was not made for.")
                    : List.of(
                            "The law has no value at and below its origin, and its activation energy grows without limit"
                                    + " on the way there.");
        }

        @Override
        public List<Derived> derived() {
            return derived;
        }

        /** {@code Ea(T) = R T² d ln k/dT = R B (T/(T − T∞))²}. */
        private static double activationEnergy(double kelvin, double[] p, double[] gradient) {
            double distance = kelvin - p[2];
            if (!(distance > 0)) {
                return undefined(gradient);
            }
            double stretch = kelvin / distance;
            gradient[0] = 0;
            gradient[1] = Constants.GAS * stretch * stretch;
            gradient[2] = 2 * Constants.GAS * p[1] * stretch * stretch / distance;
            return p[1] * gradient[1];
        }

        /** {@code ln A(T) = ln k + Ea(T)/(RT) = ln A + B T∞/(T − T∞)²}. */
        private static double lnPreExponential(double kelvin, double[] p, double[] gradient) {
            double distance = kelvin - p[2];
            if (!(distance > 0)) {
                return undefined(gradient);
            }
            double square = distance * distance;
            gradient[0] = 1;
            gradient[1] = p[2] / square;
            gradient[2] = p[1] * (kelvin + p[2]) / square / distance;
            return p[0] + p[1] * gradient[1];
        }
    }
}
