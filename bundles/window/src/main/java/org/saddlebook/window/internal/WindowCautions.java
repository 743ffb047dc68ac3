package org.saddlebook.window.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.saddlebook.api.findings.Node;
import org.saddlebook.presentation.api.CautionText;

/** The cautions of the section: shared ones by id, and some of its own. */
final class WindowCautions {
    static final String POINTWISE = "window-pointwise";
    static final String STATED_ONLY = "window-stated-limits-only";
    static final String NO_UNCERTAINTY = "window-no-uncertainty";
    static final String INDEPENDENT = "window-independent";
    static final String LAWS_DIFFER = "window-laws-differ";
    static final String COURSE = "window-course";
    static final String WHOLE = "window-whole";

    private WindowCautions() {}

    /** The full text of a caution used in the section. */
    static String text(String id) {
        return switch (id) {
            case POINTWISE ->
                "The probability holds at one temperature each (pointwise); that all limits hold everywhere in the interval is less probable and stated beside it.";
            case WHOLE -> "The probability is that all limits hold at every temperature of the interval at once.";
            case STATED_ONLY ->
                "Only the limits stated here were looked at. What nobody stated, such as heat, pressure, gas, solubility or another by-product, may bind first.";
            case NO_UNCERTAINTY ->
                "No uncertainty was stated for a barrier or for ΔH or ΔS: it is taken as exact, and the probability is too sharp.";
            case INDEPENDENT ->
                "The fitted rate constants, the thermodynamic data and the stated barriers are taken as independent of each other; of the parameters of a stated barrier this holds where no correlation was stated.";
            case COURSE ->
                "The course of temperature is taken as followed exactly, everywhere in the vessel; overshoot, lag and gradients are not in the numbers.";
            case LAWS_DIFFER -> "More than one law fits; the draws are spread over those that cannot be told apart.";
            default -> CautionText.of(id);
        };
    }

    /** Every id used in a tree with its text, in order of first use. */
    static Map<String, String> used(Node node) {
        Map<String, String> texts = new LinkedHashMap<>();
        collect(node, texts);
        return texts;
    }

    private static void collect(Node node, Map<String, String> texts) {
        if (node instanceof Node.Group group) {
            for (Node member : group.members().values()) {
                collect(member, texts);
            }
        } else if (node instanceof Node.Items items) {
            for (Node item : items.items()) {
                collect(item, texts);
            }
        } else if (node instanceof Node.Table table) {
            for (List<Node> row : table.rows()) {
                for (Node cell : row) {
                    collect(cell, texts);
                }
            }
        } else if (node instanceof Node.Quantity quantity) {
            add(quantity.cautions(), texts);
        } else if (node instanceof Node.Figure figure) {
            add(figure.cautions(), texts);
        }
    }

    private static void add(List<String> ids, Map<String, String> texts) {
        for (String id : ids) {
            texts.putIfAbsent(id, text(id));
        }
    }

    /** The ids with more of them, each once. */
    static List<String> with(List<String> ids, String... more) {
        List<String> all = new ArrayList<>(ids);
        for (String id : more) {
            if (!all.contains(id)) {
                all.add(id);
            }
        }
        return List.copyOf(all);
    }
}
