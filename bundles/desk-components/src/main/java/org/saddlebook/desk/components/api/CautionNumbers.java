package org.saddlebook.desk.components.api;

import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Numbers of cautions: the place in the findings' own list, so that screen, report and pictures say the same number. */
public final class CautionNumbers {
    private final Map<String, Integer> numbers = new LinkedHashMap<>();

    /**
     * Numbers from 1.
     *
     * @param ids ids of every caution of the findings, in order
     */
    public CautionNumbers(Collection<String> ids) {
        for (String id : ids) {
            numbers.putIfAbsent(id, numbers.size() + 1);
        }
    }

    /** The number of a caution; 0 for one that is not in the list. */
    public int of(String id) {
        return numbers.getOrDefault(id, 0);
    }

    /** {@code " [1,4]"}, or nothing for no caution. */
    public String marks(List<String> ids) {
        StringBuilder text = new StringBuilder();
        for (String id : ids) {
            text.append(text.length() == 0 ? " [" : ",").append(numbers.containsKey(id) ? of(id) : id);
        }
        return text.length() == 0 ? "" : text.append(']').toString();
    }
}
