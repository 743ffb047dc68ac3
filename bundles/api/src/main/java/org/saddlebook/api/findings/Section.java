package org.saddlebook.api.findings;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Objects;

/**
 * What one analysis found.
 *
 * @param id section id; add-ons use reverse-domain ids ({@code com.example.isotopes}), ours are single words
 * @param title heading for people
 * @param outcome whether the analysis did its work
 * @param body the findings: a group or items
 * @param cautions caution id to its full text, for every id used in the body
 */
public record Section(String id, String title, Outcome outcome, Node body, Map<String, String> cautions) {
    /** Whether the analysis did its work. */
    public enum Outcome {
        /** It has findings. */
        DONE,
        /** It does not apply to this campaign; the body's {@code reason} says why. */
        REFUSED,
        /** It broke; the body's {@code reason} names the bundle and the fault. */
        FAILED
    }

    /** Checks the components and copies the cautions in order. */
    public Section {
        if (!id.matches("[a-zA-Z][a-zA-Z0-9.-]*")) {
            throw new IllegalArgumentException("not a section id: " + id);
        }
        if (id.equals("schema") || id.equals("software") || id.equals("campaign") || id.equals("cautions")) {
            throw new IllegalArgumentException("reserved, not a section id: " + id);
        }
        Objects.requireNonNull(title, "title");
        Objects.requireNonNull(outcome, "outcome");
        if (!(body instanceof Node.Group || body instanceof Node.Items)) {
            throw new IllegalArgumentException("the body of a section is a group or items");
        }
        cautions = Collections.unmodifiableMap(new LinkedHashMap<>(cautions));
    }

    /** A section with findings. */
    public static Section done(String id, String title, Node body, Map<String, String> cautions) {
        return new Section(id, title, Outcome.DONE, body, cautions);
    }

    /** A section that does not apply, with the reason as a sentence. */
    public static Section refused(String id, String title, String reason) {
        return without(id, title, Outcome.REFUSED, "refused", reason);
    }

    /** A section whose analysis broke, with the reason as a sentence. */
    public static Section failed(String id, String title, String reason) {
        return without(id, title, Outcome.FAILED, "failed", reason);
    }

    private static Section without(String id, String title, Outcome outcome, String word, String reason) {
        Map<String, Node> members = new LinkedHashMap<>();
        members.put("outcome", new Node.Text(word));
        members.put("reason", new Node.Text(reason));
        return new Section(id, title, outcome, new Node.Group(members), Map.of());
    }
}
