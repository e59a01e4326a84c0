// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import java.util.Arrays;

/**
 * What one chunk keeps of its grains near wires: the grains, for each the elements it may touch before the next search,
 * and the contact rows by material pair.
 */
final class WireChunk {

    private final NearGrains near = new NearGrains();
    private final WireRows[] rows;
    private final int[][] lastRow;
    private int[] candidateStart = new int[16];
    private int[] candidates = new int[64];
    private int candidateCount;

    WireChunk(int materialPairs, int historyColumns) {
        rows = new WireRows[materialPairs];
        Arrays.setAll(rows, pair -> new WireRows(historyColumns));
        lastRow = new int[materialPairs][0];
    }

    NearGrains near() {
        return near;
    }

    WireRows[] rows() {
        return rows;
    }

    void open(int firstGrain, int endGrain) {
        near.open(firstGrain, endGrain);
        candidateCount = 0;
        for (WireRows one : rows) {
            one.clear();
        }
    }

    /** Begins the candidates of a grain, the next of the near grains. */
    void beginGrain(int grain) {
        near.add(grain);
        int number = near.count() - 1;
        if (number + 2 > candidateStart.length) {
            candidateStart = Arrays.copyOf(candidateStart, 2 * candidateStart.length);
        }
        candidateStart[number] = candidateCount;
        candidateStart[number + 1] = candidateCount;
        for (int pair = 0; pair < lastRow.length; pair++) {
            if (number >= lastRow[pair].length) {
                lastRow[pair] = Arrays.copyOf(lastRow[pair], Math.max(16, 2 * number));
            }
            lastRow[pair][number] = -1;
        }
    }

    /** Adds an element to the grain begun last; elements come in ascending order. */
    void addCandidate(int element) {
        if (candidateCount == candidates.length) {
            candidates = Arrays.copyOf(candidates, 2 * candidateCount);
        }
        candidates[candidateCount++] = element;
        candidateStart[near.count()] = candidateCount;
    }

    int candidateStart(int nearNumber) {
        return candidateStart[nearNumber];
    }

    int candidateEnd(int nearNumber) {
        return candidateStart[nearNumber + 1];
    }

    int candidate(int place) {
        return candidates[place];
    }

    /** Last row of a near grain in a material pair, or -1; the others are chained to it. */
    int lastRow(int pair, int nearNumber) {
        return lastRow[pair][nearNumber];
    }

    /** Adds a row of a near grain on a wire. */
    int addRow(int pair, int nearNumber, int wire, double effectiveRadius, int ghost) {
        int row = rows[pair].add(
                near.grain(nearNumber), wire, nearNumber, lastRow[pair][nearNumber], effectiveRadius, ghost);
        lastRow[pair][nearNumber] = row;
        return row;
    }
}
