package org.saddlebook.units.internal;

/** Characters that people and programs put for others, made one. */
final class UnitText {
    private UnitText() {}

    /** Blanks, minus signs, products, micro and degree signs in one form; superscripts stay. */
    static String plain(String text) {
        StringBuilder plain = new StringBuilder(text.length());
        boolean blank = false;
        for (int i = 0; i < text.length(); i++) {
            char c = one(text.charAt(i));
            if (c == ' ') {
                blank = plain.length() > 0;
                continue;
            }
            if (blank) {
                plain.append(' ');
                blank = false;
            }
            if (c == '\u2103') {
                plain.append("°C");
            } else if (c == '\u2109') {
                plain.append("°F");
            } else {
                plain.append(c);
            }
        }
        return plain.toString();
    }

    private static char one(char c) {
        return switch (c) {
            case '\t', '\u00a0', '\u2007', '\u2009', '\u200a', '\u202f' -> ' ';
            case '\u2212', '\u2010', '\u2011', '\u2013' -> '-';
            case '\u00b7', '\u22c5', '\u2219', '\u2022', '\u00d7' -> '*';
            case '\u2215', '\u2044' -> '/';
            case '\u00b5', '\u03bc' -> 'u';
            case '\u00ba' -> '°';
            case '\u212a' -> 'K';
            default -> c;
        };
    }

    /** The digit of a superscript, {@code -} or {@code +} of a superscript sign, else 0. */
    static char superscript(char c) {
        return switch (c) {
            case '\u2070' -> '0';
            case '\u00b9' -> '1';
            case '\u00b2' -> '2';
            case '\u00b3' -> '3';
            case '\u207a' -> '+';
            case '\u207b' -> '-';
            default -> c >= '\u2074' && c <= '\u2079' ? (char) ('4' + (c - '\u2074')) : 0;
        };
    }
}
