package org.saddlebook.distribution;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;

/**
 * Output as a document shows it. Lines stand next to each other and in order; a line {@code ...} stands for any number of
 * lines, the sign {@code …} inside a line for any text. Nothing is said about what comes before the first and after the
 * last line.
 */
final class ShownOutput {
    private static final String ANY_LINES = "...";
    private static final String ANY_TEXT = "…";

    private final List<List<String>> passages = new ArrayList<>();

    ShownOutput(List<String> shown) {
        List<String> passage = new ArrayList<>();
        for (String line : shown) {
            if (line.strip().equals(ANY_LINES)) {
                close(passage);
                passage = new ArrayList<>();
            } else {
                passage.add(line);
            }
        }
        close(passage);
    }

    private void close(List<String> passage) {
        if (!passage.isEmpty()) {
            passages.add(passage);
        }
    }

    /** The first shown passage that does not occur where it should; empty when all occur in order. */
    Optional<String> missingFrom(List<String> printed) {
        int from = 0;
        for (List<String> passage : passages) {
            int at = find(passage, printed, from);
            if (at < 0) {
                return Optional.of(String.join("\n", passage));
            }
            from = at + passage.size();
        }
        return Optional.empty();
    }

    private static int find(List<String> passage, List<String> printed, int from) {
        for (int start = from; start + passage.size() <= printed.size(); start++) {
            boolean equal = true;
            for (int i = 0; equal && i < passage.size(); i++) {
                equal = pattern(passage.get(i))
                        .matcher(plain(printed.get(start + i)))
                        .matches();
            }
            if (equal) {
                return start;
            }
        }
        return -1;
    }

    /** Documents are typed with ordinary spaces where the product prints spaces that do not break. */
    private static String plain(String line) {
        return line.replace('\u00a0', ' ').stripTrailing();
    }

    private static Pattern pattern(String shown) {
        StringBuilder regex = new StringBuilder();
        for (String piece : plain(shown).split(ANY_TEXT, -1)) {
            regex.append(regex.isEmpty() ? "" : ".*").append(Pattern.quote(piece));
        }
        return Pattern.compile(regex.toString());
    }
}
