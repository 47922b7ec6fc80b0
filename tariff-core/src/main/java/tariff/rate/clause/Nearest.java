// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.util.Collection;
import java.util.Comparator;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Collectors;

/** Finds what somebody probably meant to write. */
public final class Nearest {
    private static final int SLIP = 3;
    private static final int MOST_LISTED = 30;
    private static final int MOST_COMPARED = 200;

    private Nearest() {}

    /** {@code ; did you mean "energy"?}, or nothing if no known word is near. */
    public static String hint(String written, Collection<String> known) {
        return nearest(written, known)
                .map(word -> "; did you mean \"" + word + "\"?")
                .orElse("");
    }

    /** The known words for a message. */
    public static String list(Collection<String> known) {
        String more = known.size() > MOST_LISTED ? " and " + (known.size() - MOST_LISTED) + " more" : "";
        return known.isEmpty()
                ? "none is defined"
                : known.stream().limit(MOST_LISTED).collect(Collectors.joining(", ")) + more;
    }

    static Optional<String> nearest(String written, Collection<String> known) {
        return known.stream()
                .limit(MOST_COMPARED)
                .filter(word -> Math.abs(word.length() - written.length()) <= SLIP)
                .filter(word -> distance(written, word) <= Math.min(SLIP, Math.max(1, word.length() / 2)))
                .min(Comparator.comparingInt((String word) -> distance(written, word))
                        .thenComparing(Comparator.naturalOrder()));
    }

    /** Edits (insert, drop, replace) between two words, upper and lower case alike: Levenshtein's distance. */
    private static int distance(String left, String right) {
        String a = left.toLowerCase(Locale.ROOT);
        String b = right.toLowerCase(Locale.ROOT);
        int[] row = new int[b.length() + 1];
        for (int j = 0; j <= b.length(); j++) {
            row[j] = j;
        }
        for (int i = 1; i <= a.length(); i++) {
            int diagonal = row[0];
            row[0] = i;
            for (int j = 1; j <= b.length(); j++) {
                int replace = diagonal + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
                diagonal = row[j];
                row[j] = Math.min(replace, Math.min(row[j], row[j - 1]) + 1);
            }
        }
        return row[b.length()];
    }
}
