package org.saddlebook.reaction.internal;

import org.saddlebook.reaction.api.Fraction;

/** A text with the many signs that people type for the same thing made one, character by character, so that places stay. */
final class Characters {
    /** Beyond this no one has written an equation by hand. */
    static final int LONGEST = 2000;

    private static final String LOWERED = "₀₁₂₃₄₅₆₇₈₉";
    private static final String RAISED = "⁰¹²³⁴⁵⁶⁷⁸⁹";
    private static final String VULGAR = "½⅓⅔¼¾⅕⅖⅗⅘⅙⅚⅛⅜⅝⅞";
    private static final int[][] VULGAR_VALUES = {
        {1, 2}, {1, 3}, {2, 3}, {1, 4}, {3, 4}, {1, 5}, {2, 5}, {3, 5}, {4, 5}, {1, 6}, {5, 6}, {1, 8}, {3, 8}, {5, 8},
        {7, 8}
    };

    private final String text;

    Characters(String text) {
        StringBuilder plain = new StringBuilder(text.length());
        for (int i = 0; i < text.length(); i++) {
            plain.append(plain(text.charAt(i)));
        }
        this.text = plain.toString();
    }

    private static char plain(char c) {
        int digit = LOWERED.indexOf(c);
        if (digit >= 0) {
            return (char) ('0' + digit);
        }
        return switch (c) {
            case '−', '–' -> '-';
            case '•', '⋅', '∙', '*' -> '·';
            case '\t', '\u00a0', '\u2009', '\u202f' -> ' ';
            default -> c;
        };
    }

    int length() {
        return text.length();
    }

    /** The character at i; a line feed beyond the end, which no rule accepts. */
    char at(int i) {
        return i >= 0 && i < text.length() ? text.charAt(i) : '\n';
    }

    String part(int start, int end) {
        return text.substring(start, end);
    }

    boolean starts(String what, int i) {
        return text.startsWith(what, i);
    }

    int skipBlanks(int i) {
        int next = i;
        while (at(next) == ' ') {
            next++;
        }
        return next;
    }

    int skipDigits(int i) {
        int next = i;
        while (digit(at(next))) {
            next++;
        }
        return next;
    }

    /** Whether a state of aggregation begins here: a parenthesis with a small letter. */
    boolean phaseAt(int i) {
        return at(i) == '(' && small(at(skipBlanks(i + 1)));
    }

    static boolean digit(char c) {
        return c >= '0' && c <= '9';
    }

    static boolean capital(char c) {
        return c >= 'A' && c <= 'Z';
    }

    static boolean small(char c) {
        return c >= 'a' && c <= 'z';
    }

    /** The digit that a raised character stands for; -1 for every other character. */
    static int raised(char c) {
        return RAISED.indexOf(c);
    }

    static boolean vulgar(char c) {
        return VULGAR.indexOf(c) >= 0;
    }

    static Fraction vulgarValue(char c) {
        int[] value = VULGAR_VALUES[VULGAR.indexOf(c)];
        return Fraction.of(value[0], value[1]);
    }
}
