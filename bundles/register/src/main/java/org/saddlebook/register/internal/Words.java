package org.saddlebook.register.internal;

import java.util.Locale;
import org.saddlebook.register.api.Entry;
import org.saddlebook.register.api.LogRecord;
import org.saddlebook.register.api.RecordKind;

/** Phrases about entries. */
final class Words {
    private Words() {}

    /** The status, with the number of the record that made it so. */
    static String status(Entry entry) {
        Entry.Status status = entry.status();
        String word = status.name().toLowerCase(Locale.ROOT);
        RecordKind cause = status == Entry.Status.WITHDRAWN ? RecordKind.WITHDRAWN : RecordKind.SUPERSEDED;
        for (LogRecord later : entry.about()) {
            if (status != Entry.Status.CURRENT && later.kind() == cause) {
                return word + " by record " + later.number();
            }
        }
        return word;
    }

    /** The text on one line, without control characters. */
    static String line(String text) {
        StringBuilder out = new StringBuilder(text.length());
        for (int i = 0; i < text.length(); i++) {
            out.append(Character.isISOControl(text.charAt(i)) ? ' ' : text.charAt(i));
        }
        return out.toString();
    }
}
