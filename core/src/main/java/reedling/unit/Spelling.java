// SPDX-License-Identifier: Apache-2.0
package reedling.unit;

import java.util.Collection;
import java.util.Locale;
import java.util.Optional;

/**
 * Finds the known word nearest to a wrong one, for "did you mean" remedies.
 *
 * <p>Distance: single-letter insertions, deletions, substitutions and swaps of neighbours (Damerau, A technique for
 * computer detection and correction of spelling errors, 1964; restricted to one edit per place). Case differences cost a
 * tenth of an edit.
 */
public final class Spelling {

    private static final double CASE_COST = 0.1;

    private Spelling() {}

    /** The nearest word not further than a third of the longer word's letters (at least one edit), if any. */
    public static Optional<String> nearest(String wrong, Collection<String> known) {
        String best = null;
        double bestDistance = Double.POSITIVE_INFINITY;
        for (String word : known) {
            double distance = distance(wrong, word);
            int length = Math.max(word.length(), wrong.length());
            boolean near = distance <= Math.max(1, length / 3) && distance < length;
            if (near && distance < bestDistance) {
                best = word;
                bestDistance = distance;
            }
        }
        return Optional.ofNullable(best);
    }

    static double distance(String a, String b) {
        double[][] cost = new double[a.length() + 1][b.length() + 1];
        for (int i = 0; i <= a.length(); i++) {
            for (int j = 0; j <= b.length(); j++) {
                cost[i][j] = i == 0 || j == 0 ? i + j : cheapest(a, b, i, j, cost);
            }
        }
        return cost[a.length()][b.length()];
    }

    private static double cheapest(String a, String b, int i, int j, double[][] cost) {
        double best = cost[i - 1][j - 1] + substitution(a.charAt(i - 1), b.charAt(j - 1));
        best = Math.min(best, Math.min(cost[i - 1][j], cost[i][j - 1]) + 1);
        boolean swapped = i > 1 && j > 1 && a.charAt(i - 1) == b.charAt(j - 2) && a.charAt(i - 2) == b.charAt(j - 1);
        return swapped ? Math.min(best, cost[i - 2][j - 2] + 1) : best;
    }

    private static double substitution(char a, char b) {
        if (a == b) {
            return 0;
        }
        String first = String.valueOf(a).toLowerCase(Locale.ROOT);
        return first.equals(String.valueOf(b).toLowerCase(Locale.ROOT)) ? CASE_COST : 1;
    }
}
