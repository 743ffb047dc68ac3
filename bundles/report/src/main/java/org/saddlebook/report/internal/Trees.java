package org.saddlebook.report.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Node;

/** Reads members of findings without trusting their shape: what is missing or of another kind is absent. */
final class Trees {
    private Trees() {}

    static Optional<Node> get(Node node, String key) {
        return node instanceof Node.Group group ? group.get(key) : Optional.empty();
    }

    static String text(Node node, String key) {
        return get(node, key).orElse(null) instanceof Node.Text text ? text.value() : "";
    }

    static boolean flag(Node node, String key) {
        return get(node, key).orElse(null) instanceof Node.Flag flag && flag.value();
    }

    static OptionalDouble number(Node node, String key) {
        return get(node, key).orElse(null) instanceof Node.Scalar scalar
                ? OptionalDouble.of(scalar.value())
                : OptionalDouble.empty();
    }

    static Optional<Node.Quantity> quantity(Node node, String key) {
        return get(node, key).orElse(null) instanceof Node.Quantity quantity ? Optional.of(quantity) : Optional.empty();
    }

    /** The items under the key; none when there are none. */
    static List<Node> items(Node node, String key) {
        return get(node, key).orElse(null) instanceof Node.Items items ? items.items() : List.of();
    }

    static List<String> texts(Node node, String key) {
        List<String> texts = new ArrayList<>();
        for (Node item : items(node, key)) {
            if (item instanceof Node.Text text) {
                texts.add(text.value());
            }
        }
        return texts;
    }
}
