package org.saddlebook.register.console.internal;

import java.util.Locale;
import org.saddlebook.register.api.Entry;
import org.saddlebook.register.api.LogRecord;
import org.saddlebook.register.api.RecordKind;

/** Entries in words. */
final class Text {
    private Text() {}

    /** On one line, without control characters: what others typed must not steer a terminal. */
    static String line(String text) {
        StringBuilder out = new StringBuilder(text.length());
        for (int i = 0; i < text.length(); i++) {
            out.append(Character.isISOControl(text.charAt(i)) ? '\ufffd' : text.charAt(i));
        }
        return out.toString();
    }

    /** {@code 1 record}, {@code 2 records}. */
    static String count(long number, String word) {
        return number + " " + word + (number == 1 ? "" : "s");
    }

    /** The status in a word. */
    static String status(Entry entry) {
        return entry.status().name().toLowerCase(Locale.ROOT);
    }

    /** What a record says, in a sentence. */
    static String sentence(LogRecord record) {
        StringBuilder out = new StringBuilder(record.kind().key());
        if (record.kind() == RecordKind.SUPERSEDED) {
            out.append(" by entry ").append(record.number());
        }
        out.append(" on ")
                .append(record.time())
                .append(" by ")
                .append(line(record.actor()))
                .append(" (record ")
                .append(record.number())
                .append(')');
        if (!record.meaning().isEmpty()) {
            out.append("; meaning: ").append(line(record.meaning()));
        }
        if (!record.reason().isEmpty()) {
            out.append("; reason: ").append(line(record.reason()));
        }
        return out.toString();
    }
}
