package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.saddlebook.api.findings.Node;

/**
 * Which intervals a person asked for beside the usual ones.
 *
 * @param methods asked for; none by default
 * @param resamples of each bootstrap and Monte Carlo
 * @param fewPoints whether a bootstrap is wanted below the number of points at which it is refused otherwise
 */
record IntervalRequest(Set<IntervalMethod> methods, int resamples, boolean fewPoints) {
    /** Fewer points than this: every bootstrap covers far less than it says. */
    static final int FEWEST_POINTS = 12;

    private static final int DEFAULT_RESAMPLES = 10_000;
    private static final int FEWEST_RESAMPLES = 1_000;
    private static final int MOST_RESAMPLES = 1_000_000;

    static final String METHODS_KEY = "intervals";
    static final String RESAMPLES_KEY = "resamples";
    static final String FEW_POINTS_KEY = "bootstrapOfFewPoints";

    /**
     * Reads the settings.
     *
     * @throws IllegalArgumentException with a sentence when a setting cannot be used
     */
    static IntervalRequest read(Optional<Node> settings) {
        EnumSet<IntervalMethod> methods = EnumSet.noneOf(IntervalMethod.class);
        if (!(settings.orElse(null) instanceof Node.Group group)) {
            return new IntervalRequest(methods, DEFAULT_RESAMPLES, false);
        }
        for (String word : words(group)) {
            if (!word.equals("t")) {
                methods.add(IntervalMethod.of(word));
            }
        }
        double resamples =
                group.get(RESAMPLES_KEY).isPresent() ? TreeReader.number(group, RESAMPLES_KEY) : DEFAULT_RESAMPLES;
        if (!(resamples >= FEWEST_RESAMPLES && resamples <= MOST_RESAMPLES) || resamples != Math.rint(resamples)) {
            throw new IllegalArgumentException(
                    "The setting barrier." + RESAMPLES_KEY + " must be a whole number from 1000 to 1000000.");
        }
        String few = group.get(FEW_POINTS_KEY).isPresent() ? TreeReader.text(group, FEW_POINTS_KEY) : "refused";
        if (!few.equals("refused") && !few.equals("accepted")) {
            throw new IllegalArgumentException(
                    "The setting barrier." + FEW_POINTS_KEY + " must be refused or accepted; found " + few + ".");
        }
        return new IntervalRequest(methods, (int) resamples, few.equals("accepted"));
    }

    private static List<String> words(Node.Group group) {
        List<String> words = new ArrayList<>();
        Node node = group.get(METHODS_KEY).orElse(null);
        if (node instanceof Node.Text text) {
            words.add(text.value());
        } else if (node instanceof Node.Items items) {
            for (Node item : items.items()) {
                if (!(item instanceof Node.Text text)) {
                    throw new IllegalArgumentException(
                            "The setting barrier." + METHODS_KEY + " must be a list of words.");
                }
                words.add(text.value());
            }
        } else if (node != null) {
            throw new IllegalArgumentException("The setting barrier." + METHODS_KEY + " must be a list of words.");
        }
        return words;
    }
}
