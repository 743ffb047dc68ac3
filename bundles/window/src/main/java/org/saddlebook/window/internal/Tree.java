package org.saddlebook.window.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.saddlebook.api.findings.Node;

/** Builds a group of findings member by member. */
final class Tree {
    private final Map<String, Node> members = new LinkedHashMap<>();

    Tree put(String key, Node node) {
        members.put(key, node);
        return this;
    }

    Tree put(String key, String text) {
        return put(key, new Node.Text(text));
    }

    Tree put(String key, double number) {
        return put(key, new Node.Scalar(number));
    }

    Node.Group group() {
        return new Node.Group(members);
    }

    static Node.Items texts(List<String> texts) {
        List<Node> items = new ArrayList<>();
        for (String text : texts) {
            items.add(new Node.Text(text));
        }
        return new Node.Items(items);
    }
}
