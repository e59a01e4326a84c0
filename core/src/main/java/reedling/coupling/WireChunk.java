// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import java.io.IOException;
import java.util.Arrays;
import reedling.checkpoint.SectionReader;
import reedling.checkpoint.SectionWriter;

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

    /** Writes near grains, candidates and rows. */
    void save(SectionWriter out) throws IOException {
        out.writeInt(near.count());
        for (int number = 0; number < near.count(); number++) {
            out.writeInt(near.grain(number));
            out.writeInt(candidateEnd(number) - candidateStart(number));
        }
        out.writeInts(candidates, 0, candidateCount);
        for (WireRows one : rows) {
            one.save(out);
        }
    }

    /** Reads what {@link #save} wrote into an opened chunk. */
    void restore(SectionReader in, int ghost) {
        int count = in.readInt();
        int[] grains = new int[count];
        int[] elements = new int[count];
        int total = 0;
        for (int k = 0; k < count; k++) {
            grains[k] = in.readInt();
            elements[k] = in.readInt();
            total += elements[k];
        }
        int[] listed = new int[total];
        in.readInts(listed, 0, total);
        int next = 0;
        for (int k = 0; k < count; k++) {
            beginGrain(grains[k]);
            for (int e = 0; e < elements[k]; e++) {
                addCandidate(listed[next++]);
            }
        }
        for (int pair = 0; pair < rows.length; pair++) {
            restoreRows(pair, in, ghost);
        }
    }

    private void restoreRows(int pair, SectionReader in, int ghost) {
        WireRows into = rows[pair];
        int count = in.readInt();
        int[] grain = new int[count];
        int[] wire = new int[count];
        int[] number = new int[count];
        in.readInts(grain, 0, count);
        in.readInts(wire, 0, count);
        in.readInts(number, 0, count);
        for (int k = 0; k < count; k++) {
            addRow(pair, number[k], wire[k], 0, ghost); // the effective radius stands in the geometry
        }
        in.readInts(into.element(), 0, count);
        in.readLongs(into.seen(), 0, count);
        in.readDoubles(into.geometry(), 0, WireRows.GEOMETRY * count);
        into.segment().restoreHistory(in);
    }
}
