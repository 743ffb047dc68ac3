package org.saddlebook.spontaneity.api;

import java.util.List;

/**
 * The extent at which one reaction is at equilibrium: {@code Σ ν ln a(ξ) = ln K} with {@code n = n₀ + ν ξ}. Gases are ideal at
 * a held pressure, {@code a = (n/n_gas) p/(1 bar)}, solutes ideal in a held volume, {@code a = n/(V · 1 mol/L)}, pure liquids
 * and solids have {@code a = 1} until they are used up. {@code ln Q} never falls with ξ, so there is one answer; where a pure
 * phase runs out before equilibrium, that is the answer and said so.
 */
public final class EquilibriumExtent {
    private static final int MOST_STEPS = 2000;

    /** How a species enters Q. */
    public enum Kind {
        /** Ideal gas at the held pressure. */
        GAS,
        /** Ideal solute in the held volume. */
        SOLUTE,
        /** Pure liquid or solid. */
        PURE
    }

    /**
     * A species that takes part.
     *
     * @param coefficient products minus reactants
     * @param amount at the start, mol, not negative
     * @param kind how it enters Q
     */
    public record Member(double coefficient, double amount, Kind kind) {}

    /**
     * The answer.
     *
     * @param extent ξ, mol
     * @param usedUp whether a pure phase ran out before equilibrium, or nothing opposes the reaction
     * @param perLnK dξ/d ln K, mol; 0 where used up
     * @param perLnPressure dξ/d ln p, mol; 0 where used up
     */
    public record Answer(double extent, boolean usedUp, double perLnK, double perLnPressure) {}

    private final List<Member> members;
    private final double inert;
    private final double bar;
    private final double litres;

    /**
     * A start.
     *
     * @param inert inert gas, mol
     * @param bar pressure over 1 bar; of no effect without gases
     * @param litres volume over 1 L; of no effect without solutes
     */
    public EquilibriumExtent(List<Member> members, double inert, double bar, double litres) {
        this.members = List.copyOf(members);
        this.inert = inert;
        this.bar = bar;
        this.litres = litres;
    }

    /** The smallest extent: a product is used up. */
    public double lower() {
        double bound = Double.NEGATIVE_INFINITY;
        for (Member one : members) {
            if (one.coefficient() > 0) {
                bound = Math.max(bound, -one.amount() / one.coefficient());
            }
        }
        return bound;
    }

    /** The largest extent: a reactant is used up. */
    public double upper() {
        double bound = Double.POSITIVE_INFINITY;
        for (Member one : members) {
            if (one.coefficient() < 0) {
                bound = Math.min(bound, -one.amount() / one.coefficient());
            }
        }
        return bound;
    }

    /** ln Q at an extent between the bounds. */
    public double lnQ(double extent) {
        double gas = gas(extent);
        double sum = 0;
        for (Member one : members) {
            double amount = one.amount() + one.coefficient() * extent;
            if (one.kind() == Kind.GAS) {
                sum += one.coefficient() * StrictMath.log(amount / gas * bar);
            } else if (one.kind() == Kind.SOLUTE) {
                sum += one.coefficient() * StrictMath.log(amount / litres);
            }
        }
        return sum;
    }

    /**
     * ln Q where the limiting reactant is converted to x. Because ln Q rises with the extent, the equilibrium conversion is at
     * least x exactly where ln K is at least this.
     *
     * @param conversion 0 to 1, both excluded; there must be reactants at the start
     */
    public double lnQAtConversion(double conversion) {
        return lnQ(conversion * upper());
    }

    /** The species that take part. */
    public List<Member> members() {
        return members;
    }

    /** Inert gas, mol. */
    public double inert() {
        return inert;
    }

    /** Pressure over 1 bar. */
    public double bar() {
        return bar;
    }

    /** Volume over 1 L. */
    public double litres() {
        return litres;
    }

    private double gas(double extent) {
        double gas = inert;
        for (Member one : members) {
            if (one.kind() == Kind.GAS) {
                gas += one.amount() + one.coefficient() * extent;
            }
        }
        return gas;
    }

    private double gasChange() {
        double sum = 0;
        for (Member one : members) {
            sum += one.kind() == Kind.GAS ? one.coefficient() : 0;
        }
        return sum;
    }

    /** d ln Q/dξ, never negative (Cauchy and Schwarz). */
    private double slope(double extent) {
        double gas = gas(extent);
        double sum = gas > 0 ? -gasChange() * gasChange() / gas : 0;
        for (Member one : members) {
            if (one.kind() != Kind.PURE) {
                sum += one.coefficient() * one.coefficient() / (one.amount() + one.coefficient() * extent);
            }
        }
        return Math.max(0, sum);
    }

    /** The equilibrium; both bounds must be finite and differ. */
    public Answer at(double lnK) {
        double low = lower();
        double high = upper();
        for (int i = 0; i < MOST_STEPS; i++) {
            double middle = low + (high - low) / 2;
            if (!(middle > low && middle < high)) {
                break;
            }
            if (lnQ(middle) < lnK) {
                low = middle;
            } else {
                high = middle;
            }
        }
        double extent = low + (high - low) / 2;
        boolean usedUp = low == lower() || high == upper();
        double slope = usedUp ? 0 : slope(extent);
        return slope > 0
                ? new Answer(extent, false, 1 / slope, -gasChange() / slope)
                : new Answer(low == lower() ? lower() : high == upper() ? upper() : extent, true, 0, 0);
    }
}
