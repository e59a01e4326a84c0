// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import java.util.Arrays;
import reedling.neighbour.PairSegment;

/**
 * Copies of the history of one chunk's contact rows, from which every trial of a step starts again. Rows that a trial made
 * active start from none.
 *
 * <p>Threads: used by the task of its chunk.
 */
final class KeptHistory {

    private PairSegment[] segments = new PairSegment[0];
    private double[][] histories = new double[0][];
    private float[][] ledgers = new float[0][];
    private int[] rows = new int[0];

    /** Copies the history of all rows of the segments. */
    void keep(PairSegment[] pairs, PairSegment[] walls) {
        makeRoom(pairs.length + walls.length);
        System.arraycopy(pairs, 0, segments, 0, pairs.length);
        System.arraycopy(walls, 0, segments, pairs.length, walls.length);
        for (int s = 0; s < segments.length; s++) {
            PairSegment segment = segments[s];
            rows[s] = segment.paddedCount();
            int from = segment.historyAt(0);
            int length = segment.historyAt(rows[s]) - from;
            if (histories[s].length < length) {
                histories[s] = new double[length + length / 4];
                ledgers[s] = new float[PairSegment.LEDGER_COLUMNS * (rows[s] + rows[s] / 4)];
            }
            System.arraycopy(segment.history(), from, histories[s], 0, length);
            System.arraycopy(
                    segment.ledgerHistory(),
                    PairSegment.ledgerAt(0),
                    ledgers[s],
                    0,
                    PairSegment.LEDGER_COLUMNS * rows[s]);
        }
    }

    private void makeRoom(int count) {
        if (segments.length != count) {
            segments = new PairSegment[count];
            histories = new double[count][0];
            ledgers = new float[count][0];
            rows = new int[count];
        }
    }

    /** Gives all rows the history that was kept. */
    void giveBack() {
        for (int s = 0; s < segments.length; s++) {
            PairSegment segment = segments[s];
            int from = segment.historyAt(0);
            int kept = segment.historyAt(rows[s]);
            System.arraycopy(histories[s], 0, segment.history(), from, kept - from);
            Arrays.fill(segment.history(), kept, segment.historyAt(segment.paddedCount()), 0);
            int ledgerFrom = PairSegment.ledgerAt(0);
            int ledgerKept = PairSegment.ledgerAt(rows[s]);
            System.arraycopy(ledgers[s], 0, segment.ledgerHistory(), ledgerFrom, ledgerKept - ledgerFrom);
            Arrays.fill(segment.ledgerHistory(), ledgerKept, PairSegment.ledgerAt(segment.paddedCount()), 0);
        }
    }
}
