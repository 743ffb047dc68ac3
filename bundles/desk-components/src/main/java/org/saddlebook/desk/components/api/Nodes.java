package org.saddlebook.desk.components.api;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Node;

/** Reads members of findings; what is absent or of another kind is empty, never an error. */
public final class Nodes {
    private Nodes() {}

    /** The member at this path of group keys. */
    public static Optional<Node> at(Node node, String... path) {
        Node here = node;
        for (String key : path) {
            if (!(here instanceof Node.Group group) || group.members().get(key) == null) {
                return Optional.empty();
            }
            here = group.members().get(key);
        }
        return Optional.of(here);
    }

    /** The text at this path; empty when there is none. */
    public static String text(Node node, String... path) {
        return at(node, path).orElse(null) instanceof Node.Text text ? text.value() : "";
    }

    /** The quantity at this path. */
    public static Optional<Node.Quantity> quantity(Node node, String... path) {
        return at(node, path).orElse(null) instanceof Node.Quantity quantity ? Optional.of(quantity) : Optional.empty();
    }

    /** The plain number at this path, or the value of the quantity there. */
    public static OptionalDouble number(Node node, String... path) {
        Node found = at(node, path).orElse(null);
        if (found instanceof Node.Scalar scalar) {
            return OptionalDouble.of(scalar.value());
        }
        return found instanceof Node.Quantity quantity ? quantity.value() : OptionalDouble.empty();
    }

    /** Whether there is a true flag at this path. */
    public static boolean flag(Node node, String... path) {
        return at(node, path).orElse(null) instanceof Node.Flag flag && flag.value();
    }

    /** The items at this path; empty when there is no list. */
    public static List<Node> items(Node node, String... path) {
        return at(node, path).orElse(null) instanceof Node.Items items ? items.items() : List.of();
    }

    /** The table at this path. */
    public static Optional<Node.Table> table(Node node, String... path) {
        return at(node, path).orElse(null) instanceof Node.Table table ? Optional.of(table) : Optional.empty();
    }

    /** The figure with this id among the items {@code figures} of a section's body. */
    public static Optional<Node.Figure> figure(Node body, String id) {
        for (Node item : items(body, "figures")) {
            if (item instanceof Node.Figure figure && figure.id().equals(id)) {
                return Optional.of(figure);
            }
        }
        return Optional.empty();
    }
}
