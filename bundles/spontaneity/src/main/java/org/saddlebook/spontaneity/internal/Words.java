package org.saddlebook.spontaneity.internal;

import org.saddlebook.units.api.Numerals;

/** Numbers in sentences, the same digits on every Java version. */
final class Words {
    private Words() {}

    static String number(double value) {
        return Numerals.shortest(value).toPlainString();
    }

    static String kelvin(double kelvin) {
        return number(kelvin) + " K";
    }
}
