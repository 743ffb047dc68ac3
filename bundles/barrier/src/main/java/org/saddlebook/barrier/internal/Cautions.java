package org.saddlebook.barrier.internal;

import java.util.Set;
import org.saddlebook.api.findings.Node;

/** Collects the caution ids used in a tree. */
final class Cautions {
    private Cautions() {}

    static void collect(Node node, Set<String> ids) {
        if (node instanceof Node.Group group) {
            group.members().values().forEach(member -> collect(member, ids));
        } else if (node instanceof Node.Items items) {
            items.items().forEach(item -> collect(item, ids));
        } else if (node instanceof Node.Quantity quantity) {
            ids.addAll(quantity.cautions());
        } else if (node instanceof Node.Table table) {
            table.rows().forEach(row -> row.forEach(cell -> collect(cell, ids)));
        } else if (node instanceof Node.Figure figure) {
            ids.addAll(figure.cautions());
        }
    }
}
