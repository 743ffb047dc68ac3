package org.saddlebook.model.parallel.channels.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.api.model.Derived;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.Parameter;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.RateFunction;
import org.saddlebook.api.model.TransitionState;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.quantity.Unit;

/** The sum of two Arrhenius laws. Parameters: ln A1, Ea1, ln A2, Ea2 (A in SI, Ea in J/mol). */
final class ChannelSum implements RateFunction {
    private final List<Parameter> parameters;
    private final List<Derived> derived;

    ChannelSum(RateContext context) throws Inapplicable {
        parameters = List.of(
                Parameter.log("A1", "pre-exponential factor of channel 1", context.rateUnit()),
                Parameter.linear("Ea1", "activation energy of channel 1, the lower one", Unit.JOULE_PER_MOLE),
                Parameter.log("A2", "pre-exponential factor of channel 2", context.rateUnit()),
                Parameter.linear("Ea2", "activation energy of channel 2", Unit.JOULE_PER_MOLE));
        List<Derived> all = new ArrayList<>();
        all.add(new Derived(
                "Ea",
                "local activation energy",
                Unit.JOULE_PER_MOLE,
                Parameter.Scale.LINEAR,
                ChannelSum::activationEnergy));
        all.add(new Derived(
                "Alocal",
                "local pre-exponential factor",
                context.rateUnit(),
                Parameter.Scale.LOG,
                ChannelSum::lnPreExponential));
        all.add(new Derived(
                "share1", "share of channel 1 in k", Unit.ONE, Parameter.Scale.LINEAR, ChannelSum::shareOfFirst));
        if (TransitionState.applies(context)) {
            all.addAll(
                    TransitionState.of(context).activation(ChannelSum::activationEnergy, ChannelSum::lnPreExponential));
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
        double thermal = Constants.GAS * kelvin;
        double first = p[0] - p[1] / thermal;
        double second = p[2] - p[3] / thermal;
        double share = share(first, second);
        double other = share(second, first);
        gradient[0] = share;
        gradient[1] = -share / thermal;
        gradient[2] = other;
        gradient[3] = -other / thermal;
        double larger = Math.max(first, second);
        return larger + StrictMath.log1p(StrictMath.exp(Math.min(first, second) - larger));
    }

    /** Share of the first of two rates, from their logarithms, small ones to full relative precision. */
    private static double share(double first, double second) {
        return first > second
                ? 1 / (1 + StrictMath.exp(second - first))
                : StrictMath.exp(first - second) / (1 + StrictMath.exp(first - second));
    }

    @Override
    public List<double[]> starts(double[] kelvin, double[] lnRate) {
        return ChannelStarts.of(kelvin, lnRate);
    }

    @Override
    public double[] ordered(double[] p) {
        return p[1] <= p[3] ? p : new double[] {p[2], p[3], p[0], p[1]};
    }

    @Override
    public List<String> remarks(double[] p) {
        return List.of("Channel 1 is the one with the lower activation energy. The law is the same with the channels"
                + " exchanged, so the numbers alone do not say which path of the reaction is which.");
    }

    @Override
    public List<Derived> derived() {
        return derived;
    }

    /** {@code s1 = k1/k}; the logarithm of its odds is linear in the parameters. */
    private static double shareOfFirst(double kelvin, double[] p, double[] gradient) {
        double thermal = Constants.GAS * kelvin;
        double first = p[0] - p[1] / thermal;
        double second = p[2] - p[3] / thermal;
        double share = share(first, second);
        double slope = share * share(second, first);
        gradient[0] = slope;
        gradient[1] = -slope / thermal;
        gradient[2] = -slope;
        gradient[3] = slope / thermal;
        return share;
    }

    /** {@code Ea(T) = R T² d ln k/dT = s1 Ea1 + s2 Ea2}. */
    private static double activationEnergy(double kelvin, double[] p, double[] gradient) {
        double share = shareOfFirst(kelvin, p, gradient);
        double difference = p[1] - p[3];
        for (int i = 0; i < gradient.length; i++) {
            gradient[i] *= difference;
        }
        gradient[1] += share;
        gradient[3] += 1 - share;
        return p[3] + share * difference;
    }

    /** {@code ln A(T) = ln k + Ea(T)/(RT)}. */
    private static double lnPreExponential(double kelvin, double[] p, double[] gradient) {
        double thermal = Constants.GAS * kelvin;
        double first = p[0] - p[1] / thermal;
        double second = p[2] - p[3] / thermal;
        double larger = Math.max(first, second);
        double lnRate = larger + StrictMath.log1p(StrictMath.exp(Math.min(first, second) - larger));
        double share = share(first, second);
        double energy = activationEnergy(kelvin, p, gradient);
        for (int i = 0; i < gradient.length; i++) {
            gradient[i] /= thermal;
        }
        gradient[0] += share;
        gradient[1] -= share / thermal;
        gradient[2] += 1 - share;
        gradient[3] -= (1 - share) / thermal;
        return lnRate + energy / thermal;
    }
}
