package org.saddlebook.report.internal;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import org.saddlebook.api.findings.Findings;

/** Numbers the cautions of findings in order of first use; the same numbers stand in text, margin and figures. */
final class CautionNumbers {
    private final Map<String, String> texts;
    private final List<String> ids;

    CautionNumbers(Findings findings) {
        texts = new LinkedHashMap<>(findings.cautions());
        ids = new ArrayList<>(texts.keySet());
    }

    /** Id to text, in order of the numbers. */
    Map<String, String> texts() {
        return Collections.unmodifiableMap(texts);
    }

    /** Numbers of these cautions, rising; one whose text a section forgot is numbered too and shown by its id. */
    Set<Integer> numbers(List<String> wanted) {
        Set<Integer> numbers = new TreeSet<>();
        for (String id : wanted) {
            if (!texts.containsKey(id)) {
                texts.put(id, id);
                ids.add(id);
            }
            numbers.add(ids.indexOf(id) + 1);
        }
        return numbers;
    }

    /** Text of a number. */
    String text(int number) {
        return texts.get(ids.get(number - 1));
    }
}
