package org.saddlebook.console.internal;

/** Symbols of files in the look of the trade. */
final class Symbols {
    private Symbols() {}

    /** A symbol of the barrier: {@code dH} is ΔH‡. */
    static String activation(String symbol) {
        return switch (symbol) {
            case "dH", "dS", "dG", "dCp" -> "Δ" + symbol.substring(1) + "‡";
            default -> symbol;
        };
    }

    /** A key of another section: {@code dH} is ΔH, {@code vantHoff} is vant hoff. */
    static String key(String key) {
        if (key.length() > 1 && key.charAt(0) == 'd' && Character.isUpperCase(key.charAt(1))) {
            return "Δ" + key.substring(1);
        }
        StringBuilder words = new StringBuilder(key.length() + 4);
        for (int i = 0; i < key.length(); i++) {
            char c = key.charAt(i);
            boolean next = Character.isUpperCase(c) && i > 0 && Character.isLowerCase(key.charAt(i - 1));
            if (next) {
                words.append(' ').append(Character.toLowerCase(c));
            } else {
                words.append(c);
            }
        }
        return words.toString();
    }
}
