// SPDX-License-Identifier: Apache-2.0
package reedling.plugin;

import java.util.Collection;
import java.util.Comparator;
import java.util.Optional;

/** The known name that a mistyped one probably meant. */
public final class NearestName {

    private NearestName() {}

    /**
     * Known name of the smallest edit distance (Levenshtein, Binary codes capable of correcting deletions, insertions,
     * and reversals, 1966), the first in alphabetical order among equals.
     *
     * @return empty when even the nearest differs in more than half of the typed letters
     */
    public static Optional<String> of(String typed, Collection<String> known) {
        return known.stream()
                .min(Comparator.<String>comparingInt(name -> distance(typed, name))
                        .thenComparing(Comparator.naturalOrder()))
                .filter(name -> distance(typed, name) <= Math.max(1, typed.length() / 2));
    }

    static int distance(String a, String b) {
        int[] above = new int[b.length() + 1];
        int[] row = new int[b.length() + 1];
        for (int j = 0; j <= b.length(); j++) {
            above[j] = j;
        }
        for (int i = 1; i <= a.length(); i++) {
            row[0] = i;
            for (int j = 1; j <= b.length(); j++) {
                int replaced = above[j - 1] + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
                row[j] = Math.min(replaced, 1 + Math.min(above[j], row[j - 1]));
            }
            int[] swap = above;
            above = row;
            row = swap;
        }
        return above[b.length()];
    }
}
