package org.saddlebook.api.findings;

import java.util.List;
import java.util.Set;

/** Recognises groups and items that would be written like another node; the rules stand in {@link Node}. */
final class NodeShape {
    private NodeShape() {}

    /** What a group with these keys would be taken for; empty when for nothing else. */
    static String ofKeys(Set<String> keys) {
        if (keys.contains("unit")) {
            boolean number = keys.contains("value")
                    || keys.contains("standardUncertainty")
                    || keys.contains("standardFactor")
                    || keys.contains("interval");
            boolean bare = keys.size() == 1 || (keys.size() == 2 && keys.contains("cautions"));
            if (number || bare) {
                return "a quantity";
            }
        }
        if (keys.contains("columns") && keys.contains("rows")) {
            return "a table";
        }
        return keys.contains("figure") && keys.contains("layers") ? "a figure" : "";
    }

    /** Whether items with these members would be taken for a matrix. */
    static boolean looksLikeMatrix(List<Node> items) {
        if (items.isEmpty()
                || !(items.get(0) instanceof Node.Items first)
                || first.items().isEmpty()) {
            return false;
        }
        for (Node item : items) {
            if (!(item instanceof Node.Items row)
                    || row.items().size() != first.items().size()) {
                return false;
            }
            for (Node cell : row.items()) {
                if (!(cell instanceof Node.Scalar)) {
                    return false;
                }
            }
        }
        return true;
    }
}
