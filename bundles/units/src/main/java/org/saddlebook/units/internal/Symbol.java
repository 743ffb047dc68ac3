package org.saddlebook.units.internal;

import java.math.BigDecimal;
import java.util.Objects;
import org.saddlebook.api.quantity.Dimension;

/**
 * A unit symbol, prefix included, with its exact relation to SI: {@code SI = value * numerator / denominator + offset}.
 *
 * @param code symbol in the normalised term
 * @param rank place among the factors of a term, see {@link Symbols}
 * @param numerator SI units per unit, numerator
 * @param denominator the same, denominator
 * @param offset exact offset times {@code denominator}; zero but for temperatures with another zero
 * @param dimension its dimension
 */
record Symbol(
        String code, int rank, BigDecimal numerator, BigDecimal denominator, BigDecimal offset, Dimension dimension) {
    Symbol {
        Objects.requireNonNull(code, "code");
        Objects.requireNonNull(numerator, "numerator");
        Objects.requireNonNull(denominator, "denominator");
        Objects.requireNonNull(offset, "offset");
        Objects.requireNonNull(dimension, "dimension");
    }

    boolean hasOffset() {
        return offset.signum() != 0;
    }

    Symbol prefixed(String prefix, int power) {
        return new Symbol(
                prefix + code, rank, numerator.scaleByPowerOfTen(power), denominator, BigDecimal.ZERO, dimension);
    }
}
