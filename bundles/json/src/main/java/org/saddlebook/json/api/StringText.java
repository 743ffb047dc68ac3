package org.saddlebook.json.api;

/** Strings in quotes, escaped exactly as RFC 8785, 3.2.2.2 prescribes. */
final class StringText {
    private static final String HEX = "0123456789abcdef";

    private StringText() {}

    static void append(StringBuilder out, String text) {
        out.append('"');
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            switch (c) {
                case '"' -> out.append("\\\"");
                case '\\' -> out.append("\\\\");
                case '\b' -> out.append("\\b");
                case '\f' -> out.append("\\f");
                case '\n' -> out.append("\\n");
                case '\r' -> out.append("\\r");
                case '\t' -> out.append("\\t");
                default -> {
                    if (c < 0x20) {
                        out.append("\\u00").append(HEX.charAt(c >> 4)).append(HEX.charAt(c & 15));
                    } else {
                        out.append(c);
                    }
                }
            }
        }
        out.append('"');
    }
}
