package org.saddlebook.report.internal;

/** Escaping and small pieces of HTML; everything is written so that it is well-formed XML as well. */
final class Html {
    private Html() {}

    /** Text without anything that HTML would read as markup; characters that XML forbids become U+FFFD. */
    static String text(String text) {
        StringBuilder safe = new StringBuilder(text.length() + 16);
        for (int i = 0; i < text.length(); ) {
            int c = text.codePointAt(i);
            i += Character.charCount(c);
            switch (c) {
                case '&' -> safe.append("&amp;");
                case '<' -> safe.append("&lt;");
                case '>' -> safe.append("&gt;");
                case '"' -> safe.append("&quot;");
                case '\'' -> safe.append("&#39;");
                default -> safe.appendCodePoint(allowed(c) ? c : 0xFFFD);
            }
        }
        return safe.toString();
    }

    private static boolean allowed(int c) {
        boolean control = (c < 0x20 && c != '\t' && c != '\n' && c != '\r') || (c >= 0x7F && c < 0xA0);
        boolean noncharacter = (c >= 0xD800 && c <= 0xDFFF) || (c & 0xFFFE) == 0xFFFE;
        // Marks that turn the direction of writing could make a number read backwards.
        boolean turning = (c >= 0x202A && c <= 0x202E) || (c >= 0x2066 && c <= 0x2069);
        return !control && !noncharacter && !turning;
    }

    static String element(String name, String content) {
        return "<" + name + ">" + content + "</" + name + ">";
    }

    static String element(String name, String style, String content) {
        return "<" + name + " class=\"" + style + "\">" + content + "</" + name + ">";
    }

    static String columnHead(String content) {
        return "<th scope=\"col\">" + content + "</th>";
    }

    static String rowHead(String content) {
        return "<th scope=\"row\">" + content + "</th>";
    }

    /** A term of a definition list with its definition. */
    static String entry(String term, String definition) {
        return "<div><dt>" + term + "</dt><dd>" + definition + "</dd></div>";
    }
}
