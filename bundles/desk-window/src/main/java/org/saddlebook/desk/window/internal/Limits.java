package org.saddlebook.desk.window.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Node;
import org.saddlebook.desk.components.api.Nodes;

/** The limits in the settings of the window, changed one value at a time; everything else in the settings stays as it is. */
final class Limits {
    private static final String LIMITS = "limits";

    private Limits() {}

    /** The limits stated, in order. */
    static List<Node.Group> of(Campaign campaign) {
        List<Node.Group> limits = new ArrayList<>();
        for (Node item : Nodes.items(settings(campaign), LIMITS)) {
            if (item instanceof Node.Group group) {
                limits.add(group);
            }
        }
        return limits;
    }

    static Node.Group settings(Campaign campaign) {
        return campaign.settings().get(WindowPanel.SECTION) instanceof Node.Group group
                ? group
                : new Node.Group(Map.of());
    }

    /** A value that can be edited as a line of text; empty for anything else. */
    static Optional<String> text(Node value) {
        if (value instanceof Node.Text text) {
            return Optional.of(text.value());
        }
        return value instanceof Node.Scalar scalar
                ? Optional.of(org.saddlebook.presentation.api.Rounding.shortest(scalar.value()))
                : Optional.empty();
    }

    /**
     * A typed value in the form the setting had.
     *
     * @throws NumberFormatException when a number is expected and something else was typed
     */
    static Node value(Node before, String typed) {
        if (before instanceof Node.Scalar) {
            boolean percent = typed.endsWith("%");
            String number = percent ? typed.substring(0, typed.length() - 1).strip() : typed;
            double value = Double.parseDouble(number.replace('−', '-').replace(',', '.'));
            return new Node.Scalar(percent ? value / 100 : value);
        }
        return new Node.Text(typed);
    }

    static Campaign with(Campaign campaign, int index, String key, Node value) {
        List<Node> limits = new ArrayList<>(Nodes.items(settings(campaign), LIMITS));
        if (index < limits.size() && limits.get(index) instanceof Node.Group group) {
            Map<String, Node> members = new LinkedHashMap<>(group.members());
            members.put(key, value);
            limits.set(index, new Node.Group(members));
        }
        return put(campaign, limits);
    }

    static Campaign without(Campaign campaign, int index) {
        List<Node> limits = new ArrayList<>(Nodes.items(settings(campaign), LIMITS));
        limits.remove(index);
        return put(campaign, limits);
    }

    static Campaign and(Campaign campaign, Map<String, Node> limit) {
        List<Node> limits = new ArrayList<>(Nodes.items(settings(campaign), LIMITS));
        limits.add(new Node.Group(limit));
        return put(campaign, limits);
    }

    private static Campaign put(Campaign campaign, List<Node> limits) {
        Map<String, Node> members = new LinkedHashMap<>(settings(campaign).members());
        if (limits.isEmpty()) {
            members.remove(LIMITS);
        } else {
            members.put(LIMITS, new Node.Items(limits));
        }
        return campaign.withSetting(WindowPanel.SECTION, new Node.Group(members));
    }

    /** The same with one end of the range looked at. */
    static Campaign withRange(Campaign campaign, String end, String typed) {
        Map<String, Node> members = new LinkedHashMap<>(settings(campaign).members());
        Map<String, Node> range =
                new LinkedHashMap<>(members.get("range") instanceof Node.Group group ? group.members() : Map.of());
        range.put(end, new Node.Text(typed));
        members.put("range", new Node.Group(range));
        return campaign.withSetting(WindowPanel.SECTION, new Node.Group(members));
    }
}
