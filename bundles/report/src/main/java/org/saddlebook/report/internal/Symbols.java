package org.saddlebook.report.internal;

import java.util.Map;

/** Symbols of findings, plain ASCII in files, as people write them. */
final class Symbols {
    private static final Map<String, String> ACTIVATION = Map.of(
            "A", "<i>A</i>",
            "Ea", "<i>E</i><sub>a</sub>",
            "E", "<i>E</i>",
            "n", "<i>n</i>",
            "k", "<i>k</i>",
            "Alocal", "<i>A</i>(<i>T</i>)",
            "dH", "Δ<i>H</i><sup>‡</sup>",
            "dS", "Δ<i>S</i><sup>‡</sup>",
            "dG", "Δ<i>G</i><sup>‡</sup>",
            "dCp", "Δ<i>C</i><sub>p</sub><sup>‡</sup>");

    private static final Map<String, String> NAMES = Map.of(
            "A", "pre-exponential factor",
            "Ea", "activation energy",
            "E", "energy parameter",
            "n", "exponent of temperature",
            "k", "rate constant",
            "Alocal", "local pre-exponential factor",
            "dH", "enthalpy of activation",
            "dS", "entropy of activation",
            "dG", "Gibbs energy of activation",
            "dCp", "heat capacity of activation");

    private Symbols() {}

    /** The symbol as HTML; one that is not known is shown as it is. */
    static String activation(String symbol) {
        String known = ACTIVATION.get(symbol);
        if (known != null) {
            return known;
        }
        if (symbol.startsWith("ln ")) {
            return "ln " + activation(symbol.substring(3));
        }
        return "<i>" + Html.text(symbol) + "</i>";
    }

    /** The symbol in plain text. */
    static String plain(String symbol) {
        return switch (symbol) {
            case "Ea" -> "Ea";
            case "dH" -> "ΔH‡";
            case "dS" -> "ΔS‡";
            case "dG" -> "ΔG‡";
            case "dCp" -> "ΔCp‡";
            default -> symbol;
        };
    }

    /** What the symbol stands for; empty when it is not known. */
    static String name(String symbol) {
        return NAMES.getOrDefault(symbol, "");
    }

    /** A lowerCamelCase key as words: {@code conditionNumber} is {@code condition number}. */
    static String words(String key) {
        StringBuilder words = new StringBuilder();
        for (int i = 0; i < key.length(); i++) {
            char c = key.charAt(i);
            boolean starts = Character.isUpperCase(c) && i > 0 && Character.isLowerCase(key.charAt(i - 1));
            boolean lone = i + 1 >= key.length() || !Character.isUpperCase(key.charAt(i + 1));
            if (starts) {
                words.append(' ').append(lone ? Character.toLowerCase(c) : c);
            } else {
                words.append(c);
            }
        }
        return words.toString();
    }
}
