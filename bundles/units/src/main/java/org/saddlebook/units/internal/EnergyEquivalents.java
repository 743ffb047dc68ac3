package org.saddlebook.units.internal;

import org.saddlebook.api.quantity.Dimension;

/**
 * Molar energies stated "per particle": E, h c times a wavenumber, h times a frequency, k_B times a temperature, each
 * per molecule. All factors are exact (SI Brochure, 9th edition, 2019).
 */
final class EnergyEquivalents {
    private static final Dimension ENERGY = new Dimension(1, 2, -2, 0, 0);
    private static final Dimension WAVENUMBER = new Dimension(0, -1, 0, 0, 0);
    private static final Dimension FREQUENCY = new Dimension(0, 0, -1, 0, 0);

    private EnergyEquivalents() {}

    static Term perParticle(Term term) {
        Term perParticle = term.times(Symbols.MOLECULE, new Exponent(-1, 1));
        Dimension dimension = term.dimension();
        if (dimension.equals(ENERGY)) {
            return perParticle;
        }
        if (dimension.equals(WAVENUMBER)) {
            return perParticle.times(Symbols.PLANCK, Exponent.ONE).times(Symbols.LIGHT, Exponent.ONE);
        }
        if (dimension.equals(FREQUENCY)) {
            return perParticle.times(Symbols.PLANCK, Exponent.ONE);
        }
        if (dimension.equals(Dimension.TEMPERATURE)
                && !term.factors().get(0).symbol().hasOffset()) {
            return perParticle.times(Symbols.BOLTZMANN, Exponent.ONE);
        }
        return perParticle;
    }
}
