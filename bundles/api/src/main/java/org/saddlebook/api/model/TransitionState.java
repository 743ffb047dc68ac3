package org.saddlebook.api.model;

import java.util.List;
import java.util.Objects;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.quantity.Unit;

/**
 * Transition-state theory for one molecularity, standard state and transmission coefficient: how a rate constant, the
 * Arrhenius parameters and the enthalpy, entropy and Gibbs energy of activation hang together at a temperature.
 *
 * <p>With the frequency factor
 *
 * <ul>
 *   <li>concentration standard c°: {@code F(T) = κ (kB T/h) (c°)^(1−m)}, s = 1
 *   <li>pressure standard p° of an ideal gas: {@code F(T) = κ (kB T/h) (RT/p°)^(m−1)}, s = m
 * </ul>
 *
 * the law is {@code k = F(T) exp(ΔS/R) exp(−ΔH/(RT))}, and its tangent in {@code ln k} against 1/T at T gives
 * {@code Ea = ΔH + s R T} and {@code A(T) = e^s F(T) exp(ΔS/R)}; {@code ΔG = ΔH − T ΔS = R T ln(F(T)/k)}. These are local
 * relations: the converted parameters belong to the temperature they were converted at.
 *
 * <p>κ is the factor {@link RateContext#transmission()}, times {@code κ(T)} where tunnelling is stated. With it {@code Ea =
 * ΔH + s R T + R T² d ln κ/dT} and {@code ln A = s + T d ln κ/dT + ln F + ΔS/R}. Without a stated κ its effect is absorbed
 * in ΔS, and that of its slope in ΔH.
 *
 * <p>Everything is in SI: m is the overall order, k and F in (m3/mol)^(m−1)/s, energies in J/mol, entropies in J/(mol K),
 * temperatures in K and positive. Symbols with a double dagger in print are written without one.
 *
 * <p>Sources: H. Eyring, J. Chem. Phys. 3 (1935) 107; M. G. Evans and M. Polanyi, Trans. Faraday Soc. 31 (1935) 875;
 * IUPAC Gold Book, "transition state theory", "enthalpy of activation", "entropy of activation", "Gibbs energy of
 * activation".
 */
public final class TransitionState {
    private final StandardState standard;
    private final double order;
    private final double lnTransmission;
    private final double lnStandard;
    private final double thermalSteps;
    /** Null where κ does not vary with temperature: this lies on the way of every value of a law. */
    private final Transmission varying;

    private TransitionState(RateContext context) {
        varying = context.transmissionLaw().orElse(null);
        standard = context.standard();
        order = context.order();
        lnTransmission = StrictMath.log(context.transmission());
        lnStandard = StrictMath.log(standard.value());
        thermalSteps = standard.kind() == StandardState.Kind.PRESSURE ? order : 1;
    }

    /**
     * The relations for the order, standard state and transmission coefficient of a context.
     *
     * @throws Inapplicable when the order is below 1: a transition state is made of at least one molecule
     */
    public static TransitionState of(RateContext context) throws Inapplicable {
        Objects.requireNonNull(context, "context");
        if (!(context.order() >= 1)) {
            throw new Inapplicable(
                    "Transition-state theory describes a step of at least one molecule; a rate constant of"
                            + " an order below 1 belongs to no such step, so enthalpy and entropy of activation have no meaning"
                            + " for it.");
        }
        if (context.tunnelling().isPresent() && context.transmissionLaw().isEmpty()) {
            throw new Inapplicable("The stated tunnelling correction "
                    + context.tunnelling().get().modelId() + " could not be applied.");
        }
        return new TransitionState(context);
    }

    /**
     * Whether a rate constant of this context can belong to an elementary step: its order is at least 1, and a stated
     * tunnelling correction is at hand.
     */
    public static boolean applies(RateContext context) {
        return context.order() >= 1
                && (context.tunnelling().isEmpty() || context.transmissionLaw().isPresent());
    }

    /** Whether κ has a value at this temperature, K; it always has where it does not vary. */
    public boolean defined(double kelvin) {
        return varying == null || varying.defined(kelvin);
    }

    /** κ at a temperature, K; NaN where it has no value. */
    public double transmission(double kelvin) {
        return StrictMath.exp(lnTransmission(kelvin));
    }

    private double lnTransmission(double kelvin) {
        return varying == null ? lnTransmission : lnTransmission + varying.lnCoefficient(kelvin);
    }

    /** T d ln F/dT: s, and with a varying κ its slope. */
    private double steps(double kelvin) {
        return varying == null ? thermalSteps : thermalSteps + kelvin * varying.slope(kelvin);
    }

    /** ln F(T): the logarithm of the frequency factor in SI; its derivative is s/T, and that of ln κ where κ varies. */
    public double lnFrequency(double kelvin) {
        double lnThermal = lnTransmission(kelvin) + Constants.LN_BOLTZMANN_OVER_PLANCK + StrictMath.log(kelvin);
        return standard.kind() == StandardState.Kind.PRESSURE
                ? lnThermal + (order - 1) * (StrictMath.log(Constants.GAS * kelvin) - lnStandard)
                : lnThermal + (1 - order) * lnStandard;
    }

    /** s: how many times RT the activation energy lies above the enthalpy of activation, tunnelling apart. */
    public double thermalSteps() {
        return thermalSteps;
    }

    /** ln k from ΔH and ΔS; d/dΔH = −1/(RT), d/dΔS = 1/R. */
    public double lnRate(double kelvin, double enthalpy, double entropy) {
        return lnFrequency(kelvin) + entropy / Constants.GAS - enthalpy / (Constants.GAS * kelvin);
    }

    /** ΔG from ln k: {@code R T (ln F(T) − ln k)}; d/d ln k = −RT. */
    public double gibbsEnergy(double kelvin, double lnRate) {
        return Constants.GAS * kelvin * (lnFrequency(kelvin) - lnRate);
    }

    /** ΔH from the activation energy at T: {@code Ea − s R T − R T² d ln κ/dT}; d/dEa = 1. */
    public double enthalpy(double kelvin, double activationEnergy) {
        return activationEnergy - steps(kelvin) * Constants.GAS * kelvin;
    }

    /** ΔS from ln A at T: {@code R (ln A − ln F(T) − s − T d ln κ/dT)}; d/d ln A = R. */
    public double entropy(double kelvin, double lnPreExponential) {
        return Constants.GAS * (lnPreExponential - lnFrequency(kelvin) - steps(kelvin));
    }

    /** The activation energy at T from ΔH: {@code ΔH + s R T + R T² d ln κ/dT}; d/dΔH = 1. */
    public double activationEnergy(double kelvin, double enthalpy) {
        return enthalpy + steps(kelvin) * Constants.GAS * kelvin;
    }

    /** ln A at T from ΔS: {@code s + T d ln κ/dT + ln F(T) + ΔS/R}; d/dΔS = 1/R. */
    public double lnPreExponential(double kelvin, double entropy) {
        return steps(kelvin) + lnFrequency(kelvin) + entropy / Constants.GAS;
    }

    /**
     * ΔH, ΔS and ΔG as derived quantities {@code dH}, {@code dS}, {@code dG} of any law whose local Arrhenius parameters
     * are known; gradients are carried through exactly.
     *
     * @param activationEnergy {@code R T² d ln k/dT} in J/mol, with gradient
     * @param lnPreExponential {@code ln k + Ea/(RT)}, with gradient
     */
    public List<Derived> activation(Derived.Function activationEnergy, Derived.Function lnPreExponential) {
        return List.of(
                new Derived(
                        "dH",
                        "enthalpy of activation",
                        Unit.JOULE_PER_MOLE,
                        Parameter.Scale.LINEAR,
                        (kelvin, p, gradient) -> enthalpy(kelvin, activationEnergy.value(kelvin, p, gradient))),
                new Derived(
                        "dS",
                        "entropy of activation",
                        Unit.JOULE_PER_MOLE_KELVIN,
                        Parameter.Scale.LINEAR,
                        (kelvin, p, gradient) -> {
                            double lnA = lnPreExponential.value(kelvin, p, gradient);
                            for (int i = 0; i < gradient.length; i++) {
                                gradient[i] *= Constants.GAS;
                            }
                            return entropy(kelvin, lnA);
                        }),
                new Derived(
                        "dG",
                        "Gibbs energy of activation",
                        Unit.JOULE_PER_MOLE,
                        Parameter.Scale.LINEAR,
                        (kelvin, p, gradient) -> {
                            // ln k = ln A − Ea/(RT), hence ΔG = Ea + R T (ln F − ln A).
                            double[] energyGradient = new double[gradient.length];
                            double energy = activationEnergy.value(kelvin, p, energyGradient);
                            double lnA = lnPreExponential.value(kelvin, p, gradient);
                            double thermal = Constants.GAS * kelvin;
                            for (int i = 0; i < gradient.length; i++) {
                                gradient[i] = energyGradient[i] - thermal * gradient[i];
                            }
                            return energy + thermal * (lnFrequency(kelvin) - lnA);
                        }));
    }
}
