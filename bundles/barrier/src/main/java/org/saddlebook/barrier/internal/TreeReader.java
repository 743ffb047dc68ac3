package org.saddlebook.barrier.internal;

import java.util.List;
import org.saddlebook.api.findings.Node;

/** Typed access to members of a group; a missing or different member is an {@link IllegalArgumentException}. */
final class TreeReader {
    private TreeReader() {}

    static String text(Node.Group group, String key) {
        return member(group, key, Node.Text.class).value();
    }

    static double number(Node.Group group, String key) {
        return member(group, key, Node.Scalar.class).value();
    }

    static Node.Quantity quantity(Node.Group group, String key) {
        return member(group, key, Node.Quantity.class);
    }

    static Node.Group group(Node.Group group, String key) {
        return member(group, key, Node.Group.class);
    }

    static List<Node> items(Node.Group group, String key) {
        return member(group, key, Node.Items.class).items();
    }

    static <N extends Node> N member(Node.Group group, String key, Class<N> type) {
        Node node = group.get(key).orElseThrow(() -> new IllegalArgumentException("no member “" + key + "”"));
        if (!type.isInstance(node)) {
            throw new IllegalArgumentException(
                    "member “" + key + "” is not a " + type.getSimpleName().toLowerCase(java.util.Locale.ROOT));
        }
        return type.cast(node);
    }
}
