package org.saddlebook.reader.text.internal;

import org.saddlebook.api.quantity.Unit;
import org.saddlebook.units.api.Converter;

/**
 * A column in use.
 *
 * @param index position in a row, from 0
 * @param heading as read
 * @param kind what it holds
 * @param unit its unit; null for texts, and when the unit is missing or wrong, which is among the problems then
 * @param converter to SI; null when {@code unit} is
 */
record Column(int index, String heading, Heading.Kind kind, Unit unit, Converter converter) {
    static Column of(int index, String heading, Heading.Kind kind, Unit unit) {
        return new Column(index, heading, kind, unit, unit == null ? null : Converter.of(unit));
    }

    boolean hasNumbers() {
        return kind != Heading.Kind.LABEL && kind != Heading.Kind.BLOCK && kind != Heading.Kind.EXCLUDED;
    }
}
