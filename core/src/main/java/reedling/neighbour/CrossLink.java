// SPDX-License-Identifier: Apache-2.0
package reedling.neighbour;

import java.util.Arrays;

/**
 * Rows of one segment whose second grains belong to one other chunk, in the order in which they became active. The
 * other chunk adds the exported force rows in this order.
 *
 * <p>Threads: written by the source chunk's task in the force phase, read by the target's in the move phase.
 */
public final class CrossLink {

    private final PairSegment segment;
    private final int targetChunk;
    private int[] rows = new int[16];
    private int count;

    CrossLink(PairSegment segment, int targetChunk) {
        this.segment = segment;
        this.targetChunk = targetChunk;
    }

    public PairSegment segment() {
        return segment;
    }

    public int targetChunk() {
        return targetChunk;
    }

    public int count() {
        return count;
    }

    /** Rows of the segment, the first {@link #count()} entries. */
    public int[] rows() {
        return rows;
    }

    void add(int row) {
        if (count == rows.length) {
            rows = Arrays.copyOf(rows, 2 * count);
        }
        rows[count++] = row;
    }
}
