package org.saddlebook.campaign.json.internal;

import java.time.Instant;
import java.time.LocalDate;

/** Times in ISO 8601. The common form is read without the formatters of java.time, which take long to load. */
final class InstantText {
    private InstantText() {}

    /** A time; throws {@link java.time.DateTimeException} when the text is none. */
    static Instant parse(String text) {
        if (text.length() != 20 || !hasShape(text)) {
            return Instant.parse(text);
        }
        int hour = digits(text, 11, 13);
        int minute = digits(text, 14, 16);
        int second = digits(text, 17, 19);
        if (hour > 23 || minute > 59 || second > 59) {
            return Instant.parse(text);
        }
        LocalDate day = LocalDate.of(digits(text, 0, 4), digits(text, 5, 7), digits(text, 8, 10));
        return Instant.ofEpochSecond(day.toEpochDay() * 86_400 + hour * 3_600L + minute * 60L + second);
    }

    /** Whether the text has digits, signs and letters where {@code 2026-03-02T09:30:00Z} has them. */
    private static boolean hasShape(String text) {
        String shape = "0000-00-00T00:00:00Z";
        for (int i = 0; i < shape.length(); i++) {
            char c = text.charAt(i);
            char s = shape.charAt(i);
            if (s == '0' ? c < '0' || c > '9' : c != s) {
                return false;
            }
        }
        return true;
    }

    private static int digits(String text, int start, int end) {
        int value = 0;
        for (int i = start; i < end; i++) {
            value = 10 * value + text.charAt(i) - '0';
        }
        return value;
    }
}
