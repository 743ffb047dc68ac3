/**
 * Formulas and equations as chemists write them, for every bundle that speaks of species: text becomes an {@link
 * org.saddlebook.reaction.api.Equation} of {@link org.saddlebook.reaction.api.Species} with exact coefficients, and what
 * can be read in two ways, or does not balance, becomes a {@link org.saddlebook.reaction.api.ReactionException} that says
 * where, what was found, what is expected and what to do. Nothing is guessed. Start with {@code Equation.parse}.
 */
@Export
@Version("1.0.0")
package org.saddlebook.reaction.api;

import org.osgi.annotation.bundle.Export;
import org.osgi.annotation.versioning.Version;
