package org.saddlebook.model.falloff.internal;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;
import org.saddlebook.api.model.Conditions;
import org.saddlebook.api.model.Derived;
import org.saddlebook.api.model.HeldParameters;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.Parameter;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.RateFunction;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;

/**
 * A rate constant between its limits: {@code k = k∞ Pr/(1 + Pr) F(Pr)}, {@code Pr = k0 [M]/k∞}, each limit {@code A (T/T0)^n
 * exp(−E/(RT))}. Parameters: ln A0 (one order above that of k, in SI), n0, E0 in J/mol, ln A∞ (in SI, the order of k), n∞,
 * E∞; with Troe's broadening also Fc. [M] is the concentration of the third body in mol/m3, T0 the reference temperature of
 * the context.
 *
 * <p>Hardly any campaign determines n beside E. Where nobody decided which of the two a limit has, {@link #completed} holds
 * n at 0 (Arrhenius form); E held at 0 leaves n (the power form of atmospheric tables), n held at another value leaves E.
 */
final class FalloffLaw implements RateFunction {
    private static final int A0 = 0;
    private static final int N0 = 1;
    private static final int A_INF = 3;
    private static final int N_INF = 4;
    private static final int FC = 6;

    private static final double LOWEST_CENTRE = 1e-3;

    private final Broadening broadening;
    private final RateContext context;
    private final List<Parameter> parameters;
    private final List<Derived> derived;

    private FalloffLaw(RateContext context, Broadening broadening) {
        this.context = context;
        this.broadening = broadening;
        Unit low = lowPressureUnit(context);
        List<Parameter> all = new ArrayList<>();
        all.add(Parameter.log("A0", "pre-exponential factor of the low-pressure limit", low));
        all.add(Parameter.linear("n0", "temperature exponent of the low-pressure limit", Unit.ONE));
        all.add(Parameter.linear("E0", "energy of the low-pressure limit", Unit.JOULE_PER_MOLE));
        all.add(Parameter.log("Ainf", "pre-exponential factor of the high-pressure limit", context.rateUnit()));
        all.add(Parameter.linear("ninf", "temperature exponent of the high-pressure limit", Unit.ONE));
        all.add(Parameter.linear("Einf", "energy of the high-pressure limit", Unit.JOULE_PER_MOLE));
        if (broadening == Broadening.TROE) {
            all.add(new Parameter(
                    "Fc",
                    "broadening factor",
                    Unit.ONE,
                    Parameter.Scale.LINEAR,
                    LOWEST_CENTRE,
                    1,
                    OptionalDouble.of(1)));
        }
        parameters = List.copyOf(all);
        derived = List.of(
                new Derived("k0", "low-pressure limit", low, Parameter.Scale.LOG, this::lnLow),
                new Derived("kinf", "high-pressure limit", context.rateUnit(), Parameter.Scale.LOG, this::lnHigh),
                new Derived("Pr", "reduced pressure", Unit.ONE, Parameter.Scale.LOG, this::lnReduced));
    }

    /** The context with n held at 0 for each limit of which neither n nor E is held. */
    static RateContext completed(RateContext context) {
        RateContext own = context;
        if (context.fixed("n0").isEmpty() && context.fixed("E0").isEmpty()) {
            own = own.withFixed("n0", 0);
        }
        if (context.fixed("ninf").isEmpty() && context.fixed("Einf").isEmpty()) {
            own = own.withFixed("ninf", 0);
        }
        return own;
    }

    static RateFunction bind(RateContext context, Broadening broadening) throws Inapplicable {
        if (context.order() != 1 && context.order() != 2) {
            throw new Inapplicable("Pressure falloff describes unimolecular reactions, whose k is of first order, and"
                    + " associations, whose k is of second order.");
        }
        return HeldParameters.of(context, new FalloffLaw(context, broadening));
    }

    /** k0 as the trade writes it: per molecule in cm³ for a gas, per mole in L where k is stated so. */
    private static Unit lowPressureUnit(RateContext context) {
        boolean second = context.order() == 2;
        Dimension dimension = Dimension.rateConstant(context.order() + 1);
        if (second && !context.rateUnit().code().contains("{molecule}")) {
            return new Unit("L2/(mol2.s)", dimension, 1e-6, 0);
        }
        // 1 cm3/molecule in m3/mol is 1e-6 NA, exact (SI 2019); for third order its square, rounded once.
        return second
                ? new Unit("cm6/({molecule}2.s)", dimension, 3.626617933325338e35, 0)
                : new Unit("cm3/({molecule}.s)", dimension, 6.02214076e17, 0);
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
        return lnRate(kelvin, context.conditions(), p, gradient);
    }

    @Override
    public double lnRate(double kelvin, Conditions at, double[] p, double[] gradient) {
        OptionalDouble thirdBody = at.thirdBody(kelvin);
        if (thirdBody.isEmpty()) {
            Arrays.fill(gradient, Double.NaN);
            return Double.NaN;
        }
        double lnHigh = limit(kelvin, p, A_INF);
        double lnReduced = limit(kelvin, p, A0) + StrictMath.log(thirdBody.getAsDouble()) - lnHigh;
        double[] slopes = new double[2];
        double centre = broadening == Broadening.TROE ? p[FC] : 1;
        double shape = lnShape(lnReduced) + broadening.lnFactor(lnReduced, centre, slopes);
        double low = 1 / (1 + StrictMath.exp(lnReduced)) + slopes[0];
        fill(kelvin, gradient, A0, low);
        fill(kelvin, gradient, A_INF, 1 - low);
        if (broadening == Broadening.TROE) {
            gradient[FC] = slopes[1];
        }
        return lnHigh + shape;
    }

    /** {@code ln(Pr/(1 + Pr))}, precise at both ends. */
    private static double lnShape(double lnReduced) {
        return lnReduced > 0
                ? -StrictMath.log1p(StrictMath.exp(-lnReduced))
                : lnReduced - StrictMath.log1p(StrictMath.exp(lnReduced));
    }

    private double limit(double kelvin, double[] p, int first) {
        return p[first]
                + p[first + 1] * StrictMath.log(kelvin / context.referenceKelvin())
                - p[first + 2] / (Constants.GAS * kelvin);
    }

    private void fill(double kelvin, double[] gradient, int first, double factor) {
        gradient[first] = factor;
        gradient[first + 1] = factor * StrictMath.log(kelvin / context.referenceKelvin());
        gradient[first + 2] = -factor / (Constants.GAS * kelvin);
    }

    private double lnLow(double kelvin, double[] p, double[] gradient) {
        Arrays.fill(gradient, 0);
        fill(kelvin, gradient, A0, 1);
        return limit(kelvin, p, A0);
    }

    private double lnHigh(double kelvin, double[] p, double[] gradient) {
        Arrays.fill(gradient, 0);
        fill(kelvin, gradient, A_INF, 1);
        return limit(kelvin, p, A_INF);
    }

    private double lnReduced(double kelvin, double[] p, double[] gradient) {
        Arrays.fill(gradient, 0);
        fill(kelvin, gradient, A0, 1);
        fill(kelvin, gradient, A_INF, -1);
        OptionalDouble thirdBody = context.conditions().thirdBody(kelvin);
        return thirdBody.isEmpty()
                ? Double.NaN
                : limit(kelvin, p, A0) + StrictMath.log(thirdBody.getAsDouble()) - limit(kelvin, p, A_INF);
    }

    @Override
    public List<double[]> starts(double[] kelvin, double[] lnRate) {
        List<Conditions> same = new ArrayList<>();
        for (int i = 0; i < kelvin.length; i++) {
            same.add(context.conditions());
        }
        return starts(kelvin, same, lnRate);
    }

    @Override
    public List<double[]> starts(double[] kelvin, List<Conditions> at, double[] lnRate) {
        return new FalloffStarts(this, kelvin, at, lnRate).of();
    }

    /**
     * Parameters with these limits; of n and E of a limit the one that is held stays, the other takes up the slope.
     *
     * @param kelvin where the limits are given, K
     * @param lnLow ln k0 there
     * @param lowEnergy local activation energy of k0 there, J/mol
     * @param lnHigh ln k∞ there
     * @param highEnergy local activation energy of k∞ there, J/mol
     */
    double[] with(double kelvin, double lnLow, double lowEnergy, double lnHigh, double highEnergy) {
        double[] p = new double[parameters.size()];
        slope(p, kelvin, N0, lowEnergy);
        slope(p, kelvin, N_INF, highEnergy);
        p[A0] = lnLow - limit(kelvin, p, A0);
        p[A_INF] = lnHigh - limit(kelvin, p, A_INF);
        if (broadening == Broadening.TROE) {
            // The usual guess for a reaction of which nothing is known (common practice).
            p[FC] = context.fixed("Fc").orElse(0.6);
        }
        return p;
    }

    private void slope(double[] p, double kelvin, int exponent, double energy) {
        OptionalDouble heldExponent = context.fixed(parameters.get(exponent).symbol());
        OptionalDouble heldEnergy = context.fixed(parameters.get(exponent + 1).symbol());
        double thermal = Constants.GAS * kelvin;
        p[exponent] = heldExponent.orElse((energy - heldEnergy.orElse(0)) / thermal);
        p[exponent + 1] = heldEnergy.orElse(energy - p[exponent] * thermal);
    }

    @Override
    public List<String> remarks(double[] p) {
        List<String> remarks = new ArrayList<>();
        if (broadening == Broadening.TROE && context.fixed("Fc").isEmpty() && p[FC] == 1) {
            remarks.add("The broadening factor ended at 1, where the law is that of Lindemann.");
        }
        return remarks;
    }

    @Override
    public List<Derived> derived() {
        return derived;
    }
}
