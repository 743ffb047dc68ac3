package org.saddlebook.barrier.internal;

import org.saddlebook.presentation.api.QuantityText;

/** Short texts inside sentences. */
final class Words {
    private Words() {}

    /** A temperature for people. */
    static String kelvin(double kelvin) {
        return QuantityText.temperature(kelvin);
    }
}
