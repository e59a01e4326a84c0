// SPDX-License-Identifier: Apache-2.0
package reedling.neighbour;

/** Sorts candidates by gap into bins, stably, so that one block holds pairs of nearly equal gap; scratch of one worker. */
public final class CandidateSort {

    private static final int BINS = 32;

    private final int[] binEnd = new int[BINS + 1];
    private int[] firstCopy = new int[0];
    private int[] secondCopy = new int[0];
    private float[] gapCopy = new float[0];

    void sort(int[] first, int[] second, float[] gap, int count, double margin) {
        if (count <= 1) {
            return;
        }
        reserve(count);
        System.arraycopy(first, 0, firstCopy, 0, count);
        System.arraycopy(second, 0, secondCopy, 0, count);
        System.arraycopy(gap, 0, gapCopy, 0, count);
        java.util.Arrays.fill(binEnd, 0);
        double perGap = BINS / margin;
        for (int k = 0; k < count; k++) {
            binEnd[bin(gapCopy[k], perGap) + 1]++;
        }
        for (int b = 0; b < BINS; b++) {
            binEnd[b + 1] += binEnd[b];
        }
        for (int k = 0; k < count; k++) {
            int at = binEnd[bin(gapCopy[k], perGap)]++;
            first[at] = firstCopy[k];
            second[at] = secondCopy[k];
            gap[at] = gapCopy[k];
        }
    }

    private static int bin(float gap, double perGap) {
        int b = (int) (gap * perGap);
        return b < 0 ? 0 : Math.min(b, BINS - 1);
    }

    private void reserve(int count) {
        if (count > firstCopy.length) {
            firstCopy = new int[count + count / 4];
            secondCopy = new int[firstCopy.length];
            gapCopy = new float[firstCopy.length];
        }
    }
}
