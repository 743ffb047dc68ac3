package org.saddlebook.barrier.internal;

import org.saddlebook.presentation.api.QuantityText;

/** Short texts inside sentences. */
final class Words {
    private Words() {}

    /** A temperature for people. */
    static String kelvin(double kelvin) {
        return QuantityText.temperature(kelvin);
    }

    /** A parameter's plain symbol as people write it. */
    static String symbol(String plain) {
        return switch (plain) {
            case "dH" -> "ΔH‡";
            case "dS" -> "ΔS‡";
            case "dG" -> "ΔG‡";
            case "dCp" -> "ΔCp‡";
            default -> plain;
        };
    }
}
