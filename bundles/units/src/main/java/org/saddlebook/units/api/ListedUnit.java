package org.saddlebook.units.api;

import java.util.List;
import java.util.Objects;
import org.saddlebook.api.quantity.Unit;

/**
 * One unit symbol that is understood.
 *
 * @param unit the unit; its code is the symbol used in findings
 * @param name its name in words
 * @param dimension the dimension in words, or as a product of SI base units
 * @param spellings other spellings that are read as this unit
 * @param prefixes whether SI prefixes may stand before it
 */
public record ListedUnit(Unit unit, String name, String dimension, List<String> spellings, boolean prefixes) {
    /** Checks the components. */
    public ListedUnit {
        Objects.requireNonNull(unit, "unit");
        Objects.requireNonNull(name, "name");
        Objects.requireNonNull(dimension, "dimension");
        spellings = List.copyOf(spellings);
    }
}
