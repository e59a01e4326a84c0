// SPDX-License-Identifier: Apache-2.0
package reedling.neighbour;

import java.io.IOException;
import java.util.Arrays;
import reedling.checkpoint.SectionReader;
import reedling.checkpoint.SectionWriter;
import reedling.math.Lanes;

/**
 * Pairs of one material pair in one chunk, either all inside the chunk or all reaching into another. Active pairs are in
 * reach or were so since the last search and carry history; candidates are near and are looked at only when they could touch.
 *
 * <p>Active rows are filled up to whole tiles of 8 with the two ghost grains. History stands in groups of 8 rows:
 * {@code [group][column][8]} doubles for the laws (column 0 is the contact radius of the step before) and
 * {@code [group][8 columns][8]} floats that only the energy ledger reads.
 *
 * <p>Threads: written by the task of its chunk only; {@link #exports()} is read by other chunks after a barrier.
 */
public final class PairSegment {

    /** Candidates in a block, the unit in which they are looked at. */
    public static final int CANDIDATE_BLOCK = 16;

    /** Float columns kept for the ledger: normal dashpot, friction 3, rolling moment 3, one spare. */
    public static final int LEDGER_COLUMNS = 8;

    /** Elements before the first row or group, so that tiles start on a 64-byte line. */
    public static final int PAD = 6;

    private static final int FLOAT_PAD = 12; // 16-byte header + 12 floats = 64 bytes

    private final int historyColumns;
    private final boolean cross;
    private double reach;

    private int activeCount;
    private int[] first = new int[0];
    private int[] second = new int[0];
    private double[] history = new double[PAD];
    private float[] ledgerHistory = new float[FLOAT_PAD];
    private double[] exports = new double[PAD];

    private int candidateCount;
    private int[] candidateFirst = new int[0];
    private int[] candidateSecond = new int[0];
    private float[] candidateGap = new float[0];
    private double[] blockGap = new double[0];
    private double[] blockTravel = new double[0];

    /**
     * @param historyColumns doubles a row, the engine's contact radius included
     * @param cross true where the second grain belongs to another chunk
     */
    public PairSegment(int historyColumns, boolean cross) {
        this.historyColumns = historyColumns;
        this.cross = cross;
    }

    public boolean cross() {
        return cross;
    }

    /** Gap up to which pairs are active, m: the reach of their laws; kept when pairs are forgotten. */
    public double reach() {
        return reach;
    }

    /** Sets the reach of the laws, m. */
    public void reach(double metres) {
        reach = metres;
    }

    /** Active pairs, ghosts not counted. */
    public int activeCount() {
        return activeCount;
    }

    /** Active rows, ghosts included: a multiple of 8. */
    public int paddedCount() {
        return (activeCount + Lanes.TILE - 1) & -Lanes.TILE;
    }

    /** First grain of each row, in the own chunk. */
    public int[] first() {
        return first;
    }

    /** Second grain of each row. */
    public int[] second() {
        return second;
    }

    public double[] history() {
        return history;
    }

    public int historyColumns() {
        return historyColumns;
    }

    /** Index in {@link #history()} of the tile that a row begins, column 0; the row must be a multiple of 8. */
    public int historyAt(int row) {
        return PAD + row * historyColumns;
    }

    public float[] ledgerHistory() {
        return ledgerHistory;
    }

    /** Index in {@link #ledgerHistory()} of the tile that a row begins; the row must be a multiple of 8. */
    public static int ledgerAt(int row) {
        return FLOAT_PAD + row * LEDGER_COLUMNS;
    }

    /** Force rows for second grains of other chunks, eight doubles a row from {@link #PAD}; empty unless cross. */
    public double[] exports() {
        return exports;
    }

    public int candidateCount() {
        return candidateCount;
    }

    public int[] candidateFirst() {
        return candidateFirst;
    }

    public int[] candidateSecond() {
        return candidateSecond;
    }

    public int candidateBlocks() {
        return (candidateCount + CANDIDATE_BLOCK - 1) / CANDIDATE_BLOCK;
    }

    /** Smallest gap less reach of each candidate block when it was last looked at, m. */
    public double[] blockGap() {
        return blockGap;
    }

    /** Accumulated travel when each candidate block was last looked at, m. */
    public double[] blockTravel() {
        return blockTravel;
    }

    /** Forgets all pairs; arrays are kept for the next search. */
    public void clear() {
        activeCount = 0;
        candidateCount = 0;
    }

    /**
     * Adds an active pair with zero history.
     *
     * @param ghost row of the first ghost grain; tiles are filled up with it and the next
     * @return its row
     */
    public int activate(int i, int j, int ghost) {
        int row = activeCount++;
        if (row % Lanes.TILE == 0) {
            openTile(row, ghost);
        }
        first[row] = i;
        second[row] = j;
        return row;
    }

    private void openTile(int row, int ghost) {
        int end = row + Lanes.TILE;
        if (end > first.length) {
            reserve(end + end / 8 + Lanes.TILE & -Lanes.TILE);
        }
        Arrays.fill(first, row, end, ghost);
        Arrays.fill(second, row, end, ghost + 1);
        Arrays.fill(history, historyAt(row), historyAt(end), 0);
        Arrays.fill(ledgerHistory, ledgerAt(row), ledgerAt(end), 0);
    }

    private void reserve(int rows) {
        first = Arrays.copyOf(first, rows);
        second = Arrays.copyOf(second, rows);
        history = Arrays.copyOf(history, historyAt(rows));
        ledgerHistory = Arrays.copyOf(ledgerHistory, ledgerAt(rows));
        if (cross) {
            exports = Arrays.copyOf(exports, PAD + 8 * rows);
        }
    }

    /** Adds a candidate found by the search with its gap less reach, m; {@link #sortCandidates} must follow before the next step. */
    public void addCandidate(int i, int j, double gap) {
        if (candidateCount == candidateFirst.length) {
            int capacity = Math.max(CANDIDATE_BLOCK, candidateCount + candidateCount / 4);
            candidateFirst = Arrays.copyOf(candidateFirst, capacity);
            candidateSecond = Arrays.copyOf(candidateSecond, capacity);
            candidateGap = Arrays.copyOf(candidateGap, capacity);
        }
        candidateFirst[candidateCount] = i;
        candidateSecond[candidateCount] = j;
        candidateGap[candidateCount++] = (float) gap;
    }

    /** Takes a candidate out: the ghost pair stands in its place until the next search. */
    public void removeCandidate(int at, int ghost) {
        candidateFirst[at] = ghost;
        candidateSecond[at] = ghost + 1;
    }

    /** Sets what the looking-at of a candidate block found. */
    public void blockLooked(int block, double smallestGap, double travel) {
        blockGap[block] = smallestGap;
        blockTravel[block] = travel;
    }

    /** Sorts candidates by gap into bins and sets the bounds of their blocks. */
    public void sortCandidates(CandidateSort sort, double margin) {
        sort.sort(candidateFirst, candidateSecond, candidateGap, candidateCount, margin);
        int blocks = candidateBlocks();
        if (blocks > blockGap.length) {
            blockGap = new double[blocks + blocks / 4];
            blockTravel = new double[blockGap.length];
        }
        for (int b = 0; b < blocks; b++) {
            double smallest = Double.POSITIVE_INFINITY;
            int end = Math.min(candidateCount, (b + 1) * CANDIDATE_BLOCK);
            for (int k = b * CANDIDATE_BLOCK; k < end; k++) {
                smallest = Math.min(smallest, candidateGap[k]);
            }
            blockLooked(b, smallest * (1 - 1e-6), 0); // single precision may have rounded a gap up
        }
    }

    /** Writes active pairs with their history, and candidates. */
    public void save(SectionWriter out) throws IOException {
        out.writeInt(activeCount);
        out.writeInts(first, 0, activeCount);
        out.writeInts(second, 0, activeCount);
        saveHistory(out);
        out.writeInt(candidateCount);
        out.writeInts(candidateFirst, 0, candidateCount);
        out.writeInts(candidateSecond, 0, candidateCount);
        out.writeDoubles(blockGap, 0, candidateBlocks());
        out.writeDoubles(blockTravel, 0, candidateBlocks());
    }

    /** Writes the history of the active rows. */
    public void saveHistory(SectionWriter out) throws IOException {
        out.writeDoubles(history, historyAt(0), historyAt(paddedCount()));
        out.writeFloats(ledgerHistory, ledgerAt(0), ledgerAt(paddedCount()));
    }

    /** Reads the history of the active rows, which must stand already. */
    public void restoreHistory(SectionReader in) {
        in.readDoubles(history, historyAt(0), historyAt(paddedCount()));
        in.readFloats(ledgerHistory, ledgerAt(0), ledgerAt(paddedCount()));
    }

    /** Reads the bounds of the candidate blocks, whose candidates must stand already. */
    void restoreBlocks(SectionReader in) {
        int blocks = candidateBlocks();
        if (blocks > blockGap.length) {
            blockGap = new double[blocks];
            blockTravel = new double[blocks];
        }
        in.readDoubles(blockGap, 0, blocks);
        in.readDoubles(blockTravel, 0, blocks);
    }
}
