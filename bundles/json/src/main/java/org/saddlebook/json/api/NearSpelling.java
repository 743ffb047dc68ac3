package org.saddlebook.json.api;

import java.util.Collection;
import java.util.Locale;
import java.util.Optional;

/** Finds the word that was probably meant. */
public final class NearSpelling {
    private NearSpelling() {}

    /**
     * The known word nearest to one that is not known: at most two edits away (one for words of up to four letters),
     * letter case apart; the first of several equally near.
     */
    public static Optional<String> of(String word, Collection<String> known) {
        String lower = word.toLowerCase(Locale.ROOT);
        int best = (lower.length() <= 4 ? 1 : 2) + 1;
        String nearest = null;
        for (String candidate : known) {
            int limit = Math.min(best, candidate.length() <= 4 ? 2 : 3);
            int distance = distance(lower, candidate.toLowerCase(Locale.ROOT));
            if (distance < limit) {
                best = distance;
                nearest = candidate;
            }
        }
        return Optional.ofNullable(nearest);
    }

    /**
     * The number of edits between two words: letters put in, left out, replaced, or neighbours swapped (optimal string
     * alignment; Damerau 1964, Levenshtein 1966).
     */
    static int distance(String a, String b) {
        int[][] edits = new int[a.length() + 1][b.length() + 1];
        for (int i = 0; i <= a.length(); i++) {
            for (int j = 0; j <= b.length(); j++) {
                edits[i][j] = i == 0 || j == 0 ? i + j : step(edits, a, b, i, j);
            }
        }
        return edits[a.length()][b.length()];
    }

    private static int step(int[][] edits, String a, String b, int i, int j) {
        char x = a.charAt(i - 1);
        char y = b.charAt(j - 1);
        int replaced = edits[i - 1][j - 1] + (x == y ? 0 : 1);
        int fewest = Math.min(replaced, 1 + Math.min(edits[i - 1][j], edits[i][j - 1]));
        boolean swapped = i > 1 && j > 1 && x == b.charAt(j - 2) && y == a.charAt(i - 2);
        return swapped ? Math.min(fewest, edits[i - 2][j - 2] + 1) : fewest;
    }
}
