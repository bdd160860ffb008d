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

    /** Letters to insert, remove or replace (Levenshtein 1966). */
    private static int distance(String a, String b) {
        int[] row = new int[b.length() + 1];
        for (int j = 0; j <= b.length(); j++) {
            row[j] = j;
        }
        for (int i = 1; i <= a.length(); i++) {
            int diagonal = row[0];
            row[0] = i;
            for (int j = 1; j <= b.length(); j++) {
                int change = diagonal + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
                diagonal = row[j];
                row[j] = Math.min(change, Math.min(row[j], row[j - 1]) + 1);
            }
        }
        return row[b.length()];
    }
}
