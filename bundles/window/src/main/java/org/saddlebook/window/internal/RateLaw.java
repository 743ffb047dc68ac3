package org.saddlebook.window.internal;

/**
 * How the concentration of the limiting reactant falls: {@code −dc/dt = k c^n}, or {@code k a b} with another reactant in
 * excess, from an initial concentration. Times in s, concentrations in mol/m3, k in (m3/mol)^(n−1)/s. Integrated forms are
 * those of every text on kinetics, for example K. J. Laidler, Chemical Kinetics, 3rd ed. (1987), chapter 2.
 *
 * @param kind which law
 * @param order overall order n, not negative
 * @param concentration initial concentration of the limiting reactant; 1 where it does not enter (order 1)
 * @param otherConcentration initial concentration of the other reactant, equal to {@code concentration} where there is
 *     none; second order only
 */
record RateLaw(Kind kind, double order, double concentration, double otherConcentration) {
    /** The laws; {@code word} is what settings and findings say. */
    enum Kind {
        FIRST("first"),
        SECOND("second"),
        ORDER("order"),
        REVERSIBLE_FIRST("reversible first");

        private final String word;

        Kind(String word) {
            this.word = word;
        }

        String word() {
            return word;
        }
    }

    static final RateLaw FIRST = new RateLaw(Kind.FIRST, 1, 1, 1);

    /** Whether k alone gives the time, without the equilibrium constant. */
    boolean irreversible() {
        return kind != Kind.REVERSIBLE_FIRST;
    }

    /** Whether the other reactant suffices for this conversion. */
    boolean reaches(double conversion) {
        return kind != Kind.SECOND || concentration * conversion < otherConcentration;
    }

    /**
     * {@code k t} at this conversion for an irreversible law: 1 for first order means {@code −ln(1−x)}.
     *
     * <ul>
     *   <li>order 1: {@code −ln(1−x)}
     *   <li>order n: {@code ((1−x)^(1−n) − 1) / ((n−1) c^(n−1))}
     *   <li>second order, unequal: {@code ln((b − a x)/(b (1−x))) / (b − a)}
     * </ul>
     *
     * @param conversion 0 to 1, both excluded
     */
    double progress(double conversion) {
        double lost = -StrictMath.log1p(-conversion);
        if (kind == Kind.SECOND && otherConcentration != concentration) {
            double a = concentration;
            double b = otherConcentration;
            // ln((b − a x)/(b (1 − x))) = ln(1 + x (b − a)/(b (1 − x))): stable where a and b nearly agree.
            return StrictMath.log1p(conversion * (b - a) / (b * (1 - conversion))) / (b - a);
        }
        double over = (order - 1) * lost;
        // expm1(y)/y tends to 1 where the order tends to 1.
        double ratio = over == 0 ? 1 : StrictMath.expm1(over) / over;
        return lost * ratio * StrictMath.exp((1 - order) * StrictMath.log(concentration));
    }

    /** ln of {@code k t} at this conversion. */
    double lnProgress(double conversion) {
        return StrictMath.log(progress(conversion));
    }

    /** Conversion after {@code k t}, the inverse of {@link #progress}; 1 where the reactant is used up. */
    double conversion(double progress) {
        if (kind == Kind.SECOND && otherConcentration != concentration) {
            double a = concentration;
            double b = otherConcentration;
            double growth = StrictMath.expm1((b - a) * progress);
            // From (b − a x)/(b (1 − x)) = exp((b − a) k t).
            return Double.isInfinite(growth) ? 1 : b * growth / (b * growth + b - a);
        }
        double scaled = progress * StrictMath.exp((order - 1) * StrictMath.log(concentration));
        double over = (order - 1) * scaled;
        if (!(over > -1)) {
            return 1;
        }
        double lost = order == 1 ? scaled : StrictMath.log1p(over) / (order - 1);
        return -StrictMath.expm1(-lost);
    }
}
