package org.saddlebook.barrier.internal;

import java.util.List;
import org.saddlebook.api.findings.Node;

/** Typed access to members of a group; a missing or different member is an {@link IllegalArgumentException}. */
public final class TreeReader {
    private TreeReader() {}

    public static String text(Node.Group group, String key) {
        return member(group, key, Node.Text.class).value();
    }

    public static double number(Node.Group group, String key) {
        return member(group, key, Node.Scalar.class).value();
    }

    public static Node.Quantity quantity(Node.Group group, String key) {
        return member(group, key, Node.Quantity.class);
    }

    public static Node.Group group(Node.Group group, String key) {
        return member(group, key, Node.Group.class);
    }

    public static List<Node> items(Node.Group group, String key) {
        return member(group, key, Node.Items.class).items();
    }

    public static <N extends Node> N member(Node.Group group, String key, Class<N> type) {
        Node node = group.get(key).orElseThrow(() -> new IllegalArgumentException("no member “" + key + "”"));
        if (!type.isInstance(node)) {
            throw new IllegalArgumentException(
                    "member “" + key + "” is not a " + type.getSimpleName().toLowerCase(java.util.Locale.ROOT));
        }
        return type.cast(node);
    }
}
