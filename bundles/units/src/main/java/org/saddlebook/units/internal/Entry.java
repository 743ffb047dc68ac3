package org.saddlebook.units.internal;

import java.util.List;

/**
 * A row of the table of units.
 *
 * @param symbol the unit
 * @param name its name in words
 * @param prefixes whether SI prefixes may stand before the symbol and its short spellings
 * @param spellings other spellings
 */
record Entry(Symbol symbol, String name, boolean prefixes, List<String> spellings) {}
