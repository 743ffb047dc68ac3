package org.saddlebook.reaction.api;

import java.util.Collections;
import java.util.Map;
import java.util.Objects;
import java.util.TreeMap;
import org.saddlebook.reaction.internal.EquationParser;

/**
 * A chemical formula: what it is made of and its charge. Two formulas are equal when they are written alike, because
 * isomers have the same composition.
 *
 * @param text the formula in plain characters, {@code SO4^2-}, {@code CuSO4·5H2O}, {@code e^-}; reads back as itself
 * @param elements symbol to number of atoms, in alphabetical order, each above zero; empty for the electron
 * @param charge in units of the elementary charge
 */
public record Formula(String text, Map<String, Fraction> elements, int charge) {
    /** Copies the composition. */
    public Formula {
        Objects.requireNonNull(text, "text");
        elements = Collections.unmodifiableMap(new TreeMap<>(elements));
    }

    /**
     * A formula: {@code H2O}, {@code H₂O}, {@code Ca(OH)2}, {@code [Fe(CN)6]3-}, {@code SO4^2-}, {@code SO₄²⁻}, {@code
     * SO4--}, {@code Fe3+}, {@code CuSO4·5H2O}, {@code Fe0.95O}, {@code e-}. {@code D} and {@code T} are elements of
     * their own.
     *
     * @throws ReactionException with code {@code unknown-element}, {@code ambiguous-charge}, {@code ambiguous-count},
     *     {@code formula-syntax} or {@code empty-formula}
     */
    public static Formula parse(String text) throws ReactionException {
        return EquationParser.formula(text);
    }
}
