/** The analysis {@code spontaneity}: from an enthalpy and an entropy of reaction to sign case, ΔG(T) and crossover. */
package org.saddlebook.spontaneity.internal;
