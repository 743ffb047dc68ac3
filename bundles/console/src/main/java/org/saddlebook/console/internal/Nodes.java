package org.saddlebook.console.internal;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.saddlebook.api.findings.Node;

/** Reads members of findings without caring whether they are there. */
final class Nodes {
    private Nodes() {}

    /** A member of a group; empty for other nodes. */
    static Optional<Node> get(Node node, String key) {
        return node instanceof Node.Group group ? group.get(key) : Optional.empty();
    }

    /** Text of a member; empty when it is not there. */
    static String text(Node node, String key) {
        return get(node, key).orElse(null) instanceof Node.Text text ? text.value() : "";
    }

    /** Items of a member; empty when it is not there. */
    static List<Node> items(Node node, String key) {
        return get(node, key).orElse(null) instanceof Node.Items items ? items.items() : List.of();
    }

    /** Members of a member; empty when it is not there. */
    static Map<String, Node> members(Node node, String key) {
        return get(node, key).orElse(null) instanceof Node.Group group ? group.members() : Map.of();
    }

    /** A quantity. */
    static Optional<Node.Quantity> quantity(Node node, String key) {
        return get(node, key).orElse(null) instanceof Node.Quantity quantity ? Optional.of(quantity) : Optional.empty();
    }

    /** A plain number; NaN when it is not there. */
    static double number(Node node, String key) {
        return get(node, key).orElse(null) instanceof Node.Scalar scalar ? scalar.value() : Double.NaN;
    }

    /** Yes or no; no when it is not there. */
    static boolean flag(Node node, String key) {
        return get(node, key).orElse(null) instanceof Node.Flag flag && flag.value();
    }
}
