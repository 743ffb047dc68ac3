package org.saddlebook.spontaneity.internal;

import java.util.List;
import java.util.Map;
import org.saddlebook.api.findings.Node;

/** The texts of the cautions that a tree of findings uses. */
final class CautionTexts {
    private CautionTexts() {}

    /** Every caution id of a tree with its text, in order of first use. */
    static void collect(Node node, Map<String, String> texts) {
        if (node instanceof Node.Group group) {
            group.members().values().forEach(member -> collect(member, texts));
        } else if (node instanceof Node.Items items) {
            items.items().forEach(item -> collect(item, texts));
        } else if (node instanceof Node.Quantity quantity) {
            add(quantity.cautions(), texts);
        } else if (node instanceof Node.Figure figure) {
            add(figure.cautions(), texts);
        }
    }

    private static void add(List<String> ids, Map<String, String> texts) {
        for (String id : ids) {
            texts.putIfAbsent(id, SpontaneityCautions.text(id));
        }
    }
}
