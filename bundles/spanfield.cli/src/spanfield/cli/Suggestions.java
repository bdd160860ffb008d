/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli;

import java.util.Collection;
import java.util.Locale;
import java.util.Optional;

/** Finds what the user may have meant. */
final class Suggestions {

    /** Differences up to a third of the word are slips; more is another word. */
    private static final int LETTERS_PER_SLIP = 3;

    private Suggestions() {
    }

    /** The nearest of some words, if it is near enough to be meant. */
    static Optional<String> nearest(String word, Collection<String> known) {
        String best = null;
        int least = Integer.MAX_VALUE;
        for (String candidate : known) {
            int distance = distance(word.toLowerCase(Locale.ROOT), candidate.toLowerCase(Locale.ROOT));
            if (distance < least) {
                least = distance;
                best = candidate;
            }
        }
        return least <= Math.max(1, word.length() / LETTERS_PER_SLIP) ? Optional.of(best) : Optional.empty();
    }

    /** "; did you mean 'x'?" or nothing. */
    static String hint(String word, Collection<String> known) {
        return nearest(word, known).map(near -> "; did you mean '" + near + "'?").orElse("");
    }

    /** Letters to insert, remove, replace or swap with the next (Levenshtein 1966, Damerau 1964; each pair swapped at most once). */
    private static int distance(String a, String b) {
        int[][] cost = new int[a.length() + 1][b.length() + 1];
        for (int i = 0; i <= a.length(); i++) {
            for (int j = 0; j <= b.length(); j++) {
                if (i == 0 || j == 0) {
                    cost[i][j] = i + j;
                    continue;
                }
                int change = cost[i - 1][j - 1] + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
                cost[i][j] = Math.min(change, Math.min(cost[i - 1][j], cost[i][j - 1]) + 1);
                boolean swapped = i > 1 && j > 1 && a.charAt(i - 1) == b.charAt(j - 2) && a.charAt(i - 2) == b.charAt(j - 1);
                cost[i][j] = swapped ? Math.min(cost[i][j], cost[i - 2][j - 2] + 1) : cost[i][j];
            }
        }
        return cost[a.length()][b.length()];
    }
}
