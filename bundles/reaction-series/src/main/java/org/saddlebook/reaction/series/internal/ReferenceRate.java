package org.saddlebook.reaction.series.internal;

import org.saddlebook.api.quantity.Constants;

/** A rate constant that others found, as a function of temperature. */
interface ReferenceRate {
    /** For people. */
    String name();

    /** ln k in SI. */
    double lnRate(double kelvin);

    /** Half-width of the interval of it at a level; 0 when no uncertainty is known. */
    double halfWidth(double kelvin, double level);

    /** Local activation energy, J/mol. */
    double energy(double kelvin);

    /** Half-width of its interval; 0 when no uncertainty is known. */
    double energyHalfWidth(double level);

    /** Whether it was measured there; expressions do not say. */
    boolean covers(double kelvin);

    /** An expression of the literature; its errors are taken as normal. */
    static ReferenceRate of(Literature literature) {
        return new ReferenceRate() {
            @Override
            public String name() {
                return literature.source().isEmpty() ? "the literature" : literature.source();
            }

            @Override
            public double lnRate(double kelvin) {
                return literature.lnRate(kelvin);
            }

            @Override
            public double halfWidth(double kelvin, double level) {
                return Scale.STATED.quantile(level) * literature.lnFactor(kelvin);
            }

            @Override
            public double energy(double kelvin) {
                return literature.energy(kelvin);
            }

            @Override
            public double energyHalfWidth(double level) {
                return Scale.STATED.quantile(level) * Constants.GAS * Math.abs(literature.spread());
            }

            @Override
            public boolean covers(double kelvin) {
                return true;
            }
        };
    }

    /** The line through a table of others. */
    static ReferenceRate of(Reaction table, ReactionLine line, Scale scale) {
        return new ReferenceRate() {
            @Override
            public String name() {
                return table.name();
            }

            @Override
            public double lnRate(double kelvin) {
                return line.at(1 / kelvin);
            }

            @Override
            public double halfWidth(double kelvin, double level) {
                return scale.quantile(level) * Math.sqrt(scale.variance() * line.variance(1 / kelvin));
            }

            @Override
            public double energy(double kelvin) {
                return -Constants.GAS * line.slope();
            }

            @Override
            public double energyHalfWidth(double level) {
                return scale.quantile(level) * Constants.GAS * Math.sqrt(scale.variance() / line.spread());
            }

            @Override
            public boolean covers(double kelvin) {
                return kelvin >= table.lowest() - 1e-9 && kelvin <= table.highest() + 1e-9;
            }
        };
    }
}
