package org.saddlebook.window.internal;

import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.model.TransitionState;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/** Reads a barrier that the user states: {@code dH} and {@code dS}, or {@code Ea} and {@code A}. */
final class BarrierReader {
    private final Choices choices;

    BarrierReader(Choices choices) {
        this.choices = choices;
    }

    /**
     * The barrier.
     *
     * @param order order of a rate constant from dH and dS where none is stated
     */
    StatedBarrier read(Node node, String owner, double order) throws Refusal {
        Reading at = Reading.of(node, "barrier in the " + owner);
        at.only("dH", "dS", "Ea", "A", "order", "standardState", "correlation", "degreesOfFreedom");
        boolean activation = at.has("dH") || at.has("dS");
        if (activation == (at.has("Ea") || at.has("A"))) {
            throw new Refusal("The " + at.place() + " needs either dH and dS of activation, or Ea and A.");
        }
        return activation ? eyring(at, order) : arrhenius(at);
    }

    private StatedBarrier eyring(Reading at, double order) throws Refusal {
        Reading.Stated dH = energy(at, "dH", "the enthalpy of activation");
        Reading.Stated dS = at.quantity("dS", Dimension.MOLAR_ENTROPY, "the entropy of activation", "J/(mol.K)");
        noFactor(at, "dS", dS);
        double own = at.has("order") ? at.number("order", "overall order of the step") : order;
        if (!(own >= 1 && own <= 10)) {
            throw new Refusal("The order in the " + at.place() + " must lie between 1 and 10 for dH and dS.");
        }
        StandardState standard = choices.standard().orElse(StandardState.ONE_MOLAR);
        TransitionState transition;
        try {
            if (at.has("standardState")) {
                standard = Units.standardState(at.text("standardState", "such as 1 mol/L"));
            }
            Unit unit = new Unit("k", Dimension.rateConstant(own), 1, 0);
            transition = TransitionState.of(RateContext.of(unit, own).withStandard(standard));
        } catch (UnitException wrong) {
            throw new Refusal("The standardState in the " + at.place() + " cannot be used: " + Reading.sentence(wrong));
        } catch (Inapplicable wrong) {
            throw new Refusal("The " + at.place() + " cannot be used: " + wrong.getMessage());
        }
        return barrier(at, transition, dH.si(), dS.si(), dH.uncertainty(), dS.uncertainty(), own);
    }

    private StatedBarrier arrhenius(Reading at) throws Refusal {
        if (at.has("order") || at.has("standardState")) {
            throw new Refusal("The " + at.place()
                    + " has Ea and A; their order is that of the unit of A and they need no standard state.");
        }
        Reading.Stated energy = energy(at, "Ea", "the activation energy");
        Reading.Stated factor = at.quantity("A", null, "the pre-exponential factor", "1/s");
        OptionalDouble order = Units.rateOrder(factor.unit());
        if (order.isEmpty()) {
            throw new Refusal("\"A\" in the " + at.place() + " has the unit "
                    + factor.unit().code()
                    + ", which is not that of a rate constant; state one such as 1/s or L/(mol.s).");
        }
        if (!(factor.si() > 0)) {
            throw new Refusal("\"A\" in the " + at.place() + " must be above zero.");
        }
        OptionalDouble u = OptionalDouble.empty();
        if (factor.factor().isPresent()) {
            u = OptionalDouble.of(StrictMath.log(factor.factor().getAsDouble()));
        } else if (factor.uncertainty().isPresent()) {
            u = OptionalDouble.of(factor.uncertainty().getAsDouble() / factor.si());
        }
        return barrier(
                at, null, energy.si(), StrictMath.log(factor.si()), energy.uncertainty(), u, order.getAsDouble());
    }

    private static Reading.Stated energy(Reading at, String key, String what) throws Refusal {
        Reading.Stated energy = at.quantity(key, Dimension.MOLAR_ENERGY, what, "kJ/mol");
        noFactor(at, key, energy);
        if (!(Math.abs(energy.si()) <= 1e7)) {
            throw new Refusal("\"" + key + "\" in the " + at.place()
                    + " is beyond anything a barrier can have; check the number and its unit.");
        }
        return energy;
    }

    private static void noFactor(Reading at, String key, Reading.Stated stated) throws Refusal {
        if (stated.factor().isPresent()) {
            throw new Refusal("The uncertainty of \"" + key + "\" in the " + at.place()
                    + " must be a standard uncertainty in its unit, not a factor.");
        }
    }

    private static StatedBarrier barrier(
            Reading at,
            TransitionState transition,
            double energy,
            double second,
            OptionalDouble uEnergy,
            OptionalDouble uSecond,
            double order)
            throws Refusal {
        double first = uEnergy.orElse(0);
        double other = uSecond.orElse(0);
        double correlation = 0;
        if (at.has("correlation")) {
            correlation = at.number("correlation", "between -1 and 1");
            if (!(Math.abs(correlation) <= 1)) {
                throw new Refusal("The correlation in the " + at.place() + " must lie between -1 and 1.");
            }
            if (!(first > 0 && other > 0)) {
                throw new Refusal("A correlation in the " + at.place() + " needs the uncertainty of both parameters.");
            }
        }
        OptionalDouble dof = OptionalDouble.empty();
        if (at.has("degreesOfFreedom")) {
            dof = OptionalDouble.of(at.positive("degreesOfFreedom", "of the uncertainties"));
        }
        return new StatedBarrier(
                transition,
                energy,
                second,
                new double[] {first * first, other * other, correlation * first * other},
                dof,
                order,
                uEnergy.isPresent() && uSecond.isPresent(),
                first > 0 && other > 0 && !at.has("correlation"));
    }

    /** The sentence that the user should see when a barrier stands at temperatures where its rate is absurd. */
    static Optional<String> implausible(String title, StatedBarrier barrier, double kelvin) {
        double lnRate = barrier.lnRate(kelvin);
        double fastest = Constants.LN_BOLTZMANN_OVER_PLANCK + StrictMath.log(kelvin);
        return barrier.order() == 1 && lnRate > fastest
                ? Optional.of("The stated barrier of " + title + " makes a step of first order faster than kT/h at "
                        + Words.celsius(kelvin) + ": check the units.")
                : Optional.empty();
    }
}
