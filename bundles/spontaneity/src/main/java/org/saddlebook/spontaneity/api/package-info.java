/**
 * What is there at the start of a reaction that goes to equilibrium, for analyses that ask how far it goes: start with
 * {@link org.saddlebook.spontaneity.api.EquilibriumStart#of}.
 */
@Export
@Version("1.0.0")
package org.saddlebook.spontaneity.api;

import org.osgi.annotation.bundle.Export;
import org.osgi.annotation.versioning.Version;
