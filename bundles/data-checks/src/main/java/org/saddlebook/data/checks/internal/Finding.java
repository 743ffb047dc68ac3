package org.saddlebook.data.checks.internal;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.saddlebook.api.findings.Node;

/**
 * Something a rule saw.
 *
 * @param sentence the evidence and the proposal, as sentences for people
 * @param rows numbers of the rows it concerns; empty for the whole table
 * @param evidence the numbers behind the sentence
 */
record Finding(String sentence, List<Integer> rows, Map<String, Node> evidence) {
    Finding {
        rows = List.copyOf(rows);
        evidence = java.util.Collections.unmodifiableMap(new LinkedHashMap<>(evidence));
    }

    Finding(String sentence) {
        this(sentence, List.of(), Map.of());
    }
}
