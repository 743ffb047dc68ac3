/**
 * Thermodynamic functions of species, and where they come from. A laboratory adds its own data by registering a {@link
 * org.saddlebook.thermo.data.api.SpeciesSource} service; it returns {@link org.saddlebook.thermo.data.api.SpeciesData}
 * made of {@link org.saddlebook.thermo.data.api.Segment}s: constants, Shomate, NASA 7 and 9 coefficients, tables. All are
 * in SI, standard pressure 1 bar, enthalpies counted from the elements in their reference states at 298.15 K.
 */
@Export
@Version("1.0.0")
package org.saddlebook.thermo.data.api;

import org.osgi.annotation.bundle.Export;
import org.osgi.annotation.versioning.Version;
