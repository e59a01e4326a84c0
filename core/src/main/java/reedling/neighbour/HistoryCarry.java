// SPDX-License-Identifier: Apache-2.0
package reedling.neighbour;

import java.util.Arrays;
import java.util.List;
import reedling.math.Lanes;
import reedling.parallel.WorkerTeam;

/**
 * Carries the history of living contacts over a search. Before it, every segment's living rows are copied out; after
 * it, each contact found again takes its own back by its two bodies. Between grains a vector changes its sign when the
 * two change places; the second body of other contacts is a number that a search leaves alone.
 *
 * <p>Threads: copying out and taking back are parallel over chunks.
 */
public final class HistoryCarry {

    private final int columns;
    private final boolean[] signed;
    private final boolean betweenGrains;

    private int count;
    private int[] offset = new int[0]; // first carried row of each old chunk
    private int[] low = new int[0]; // the grain, or the lower of two
    private int[] high = new int[0]; // the other body
    private boolean[] swapped = new boolean[0]; // first had the higher new row
    private double[] history = new double[0];
    private float[] ledger = new float[0];
    private int[] bucketStart = new int[1];
    private int[] bucketRow = new int[0];

    /**
     * @param signed for each history column, whether it turns its sign with the order of the bodies
     * @param betweenGrains true where the second body is a grain too
     */
    public HistoryCarry(boolean[] signed, boolean betweenGrains) {
        this.signed = signed.clone();
        this.columns = signed.length;
        this.betweenGrains = betweenGrains;
    }

    /** Copies living rows out of the segments of all chunks. */
    public void copyOut(List<PairSegment[]> chunks, WorkerTeam team) {
        offset = new int[chunks.size() + 1];
        for (int c = 0; c < chunks.size(); c++) {
            int living = 0;
            for (PairSegment segment : chunks.get(c)) {
                living += countLiving(segment);
            }
            offset[c + 1] = offset[c] + living;
        }
        count = offset[chunks.size()];
        reserve();
        team.run((task, worker) -> copyOut(chunks.get(task), offset[task]), chunks.size());
    }

    private static int countLiving(PairSegment segment) {
        int living = 0;
        for (int row = 0; row < segment.activeCount(); row++) {
            if (alive(segment, row)) {
                living++;
            }
        }
        return living;
    }

    /** A row lives while the contact radius of the step before is above zero. */
    private static boolean alive(PairSegment segment, int row) {
        return segment.history()[segment.historyAt(row & -Lanes.TILE) + (row & Lanes.TILE - 1)] > 0;
    }

    private void reserve() {
        if (count > low.length) {
            int capacity = count + count / 8;
            low = new int[capacity];
            high = new int[capacity];
            swapped = new boolean[capacity];
            bucketRow = new int[capacity];
            history = new double[capacity * columns];
            ledger = new float[capacity * PairSegment.LEDGER_COLUMNS];
        }
    }

    private void copyOut(PairSegment[] segments, int start) {
        int to = start;
        for (PairSegment segment : segments) {
            for (int row = 0; row < segment.activeCount(); row++) {
                if (alive(segment, row)) {
                    low[to] = segment.first()[row];
                    high[to] = segment.second()[row];
                    copyRow(segment, row, to++);
                }
            }
        }
    }

    private void copyRow(PairSegment segment, int row, int to) {
        int tile = row & -Lanes.TILE;
        int lane = row - tile;
        int from = segment.historyAt(tile) + lane;
        for (int c = 0; c < columns; c++) {
            history[to * columns + c] = segment.history()[from + Lanes.TILE * c];
        }
        int ledgerFrom = PairSegment.ledgerAt(tile) + lane;
        for (int c = 0; c < PairSegment.LEDGER_COLUMNS; c++) {
            ledger[to * PairSegment.LEDGER_COLUMNS + c] = segment.ledgerHistory()[ledgerFrom + Lanes.TILE * c];
        }
    }

    /**
     * Renames the grains of carried rows and sorts the rows into buckets by the lower grain.
     *
     * @param newRow new row of each old row, -1 for a grain that left
     * @param grains number of grains now
     */
    public void rename(int[] newRow, int grains) {
        if (grains + 2 > bucketStart.length) {
            bucketStart = new int[grains + grains / 4 + 2];
        }
        Arrays.fill(bucketStart, 0);
        for (int k = 0; k < count; k++) {
            int a = newRow[low[k]];
            int b = betweenGrains ? newRow[high[k]] : high[k];
            swapped[k] = betweenGrains && a > b;
            if (!betweenGrains) {
                low[k] = a;
                if (a >= 0) {
                    bucketStart[a + 2]++;
                }
                continue;
            }
            low[k] = Math.min(a, b);
            high[k] = Math.max(a, b);
            if (low[k] >= 0) {
                bucketStart[low[k] + 2]++;
            }
        }
        for (int g = 0; g < grains; g++) {
            bucketStart[g + 2] += bucketStart[g + 1];
        }
        for (int k = 0; k < count; k++) {
            if (low[k] >= 0) {
                bucketRow[bucketStart[low[k] + 1]++] = k;
            }
        }
    }

    /** First of the carried rows of a grain, as a number for {@link #bodyOf} and {@link #giveBack}. */
    public int firstOf(int grain) {
        return bucketStart[grain];
    }

    /** One past the last of the carried rows of a grain. */
    public int endOf(int grain) {
        return bucketStart[grain + 1];
    }

    /** Carried row at a place between {@link #firstOf} and {@link #endOf}. */
    public int rowAt(int place) {
        return bucketRow[place];
    }

    /** Second body of a carried row. */
    public int bodyOf(int carried) {
        return high[carried];
    }

    /** Carried row of a contact, or -1; between grains i < j. */
    public int find(int i, int j) {
        int end = bucketStart[i + 1];
        for (int b = bucketStart[i]; b < end; b++) {
            if (high[bucketRow[b]] == j) {
                return bucketRow[b];
            }
        }
        return -1;
    }

    /** Writes a carried row into a segment's row, whose first grain is the lower. */
    public void giveBack(int carried, PairSegment segment, int row) {
        int tile = row & -Lanes.TILE;
        int lane = row - tile;
        double sign = swapped[carried] ? -1 : 1;
        int to = segment.historyAt(tile) + lane;
        for (int c = 0; c < columns; c++) {
            double value = history[carried * columns + c];
            segment.history()[to + Lanes.TILE * c] = signed[c] ? sign * value : value;
        }
        int ledgerTo = PairSegment.ledgerAt(tile) + lane;
        for (int c = 0; c < PairSegment.LEDGER_COLUMNS; c++) {
            float value = ledger[carried * PairSegment.LEDGER_COLUMNS + c];
            segment.ledgerHistory()[ledgerTo + Lanes.TILE * c] = c > 0 ? (float) sign * value : value; // 0: dashpot
        }
    }
}
