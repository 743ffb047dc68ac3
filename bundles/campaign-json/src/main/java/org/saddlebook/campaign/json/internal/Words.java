package org.saddlebook.campaign.json.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.json.api.JsonCursor;

/** Constants as words in files: {@code CONFIDENCE_BAND} is written {@code confidenceBand}. */
final class Words {
    private Words() {}

    static String of(Enum<?> constant) {
        String name = constant.name();
        StringBuilder word = new StringBuilder(name.length());
        for (int i = 0; i < name.length(); i++) {
            char c = name.charAt(i);
            if (c == '_') {
                word.append(name.charAt(++i));
            } else {
                word.append((char) (c | 0x20)); // names of constants are ASCII capitals
            }
        }
        return word.toString();
    }

    /** The constant that a string names. */
    static <E extends Enum<E>> E read(JsonCursor at, E[] constants) throws InputException {
        String text = at.text();
        List<String> words = new ArrayList<>();
        for (E constant : constants) {
            String word = of(constant);
            if (word.equals(text)) {
                return constant;
            }
            words.add(word);
        }
        throw at.wrongValue("one of " + String.join(", ", words));
    }
}
