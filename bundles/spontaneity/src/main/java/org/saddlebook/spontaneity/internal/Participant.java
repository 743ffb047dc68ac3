package org.saddlebook.spontaneity.internal;

import org.saddlebook.thermo.data.api.SpeciesData;

/**
 * A species that takes part.
 *
 * @param coefficient products minus reactants, not zero
 * @param data what is known of it
 * @param origin id of the source it came from
 */
record Participant(double coefficient, SpeciesData data, String origin) {}
