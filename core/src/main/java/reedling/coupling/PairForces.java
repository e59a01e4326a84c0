// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import static reedling.contact.ContactBlock.at;

import reedling.contact.ContactBlock;
import reedling.contact.ContactKind;
import reedling.contact.LawSet;
import reedling.math.Lanes;
import reedling.math.Tile;
import reedling.neighbour.Chunk;
import reedling.neighbour.PairSegment;
import reedling.particle.GrainRow;
import reedling.particle.GrainStore;

/**
 * Forces of all active grain-grain pairs of a chunk: block after block is gathered, handed to the laws and scattered. A
 * second grain of another chunk gets its force row in the segment's exports, for its own chunk to add.
 */
final class PairForces {

    private static final int STRIDE = at(1) - at(0);
    private static final int SECOND = 8; // column where the second body's force rows start

    private final LawSet laws;

    PairForces(LawSet laws) {
        this.laws = laws;
    }

    void apply(Chunk chunk, GrainStore grains, StepContext step, ContactBlock block, ContactTally tally) {
        PairSegment[] segments = chunk.segments();
        for (int s = 0; s < segments.length; s++) {
            PairSegment segment = segments[s];
            LawSet.Bound bound = laws.bound(ContactKind.GRAIN_GRAIN, s / 2);
            int padded = segment.paddedCount();
            for (int from = 0; from < padded; from += ContactBlock.CAPACITY) {
                int rows = Math.min(ContactBlock.CAPACITY, padded - from);
                block.open(rows, step.pastStep(), segment.history(), segment.historyAt(from), segment.historyColumns(),
                        step.energyDue());
                PairGather.gather(block, grains.rows(), segment, from);
                StageRunner.approach(block, bound.normal(), step.approach(), tally);
                StageRunner.run(block, bound, segment.ledgerHistory(), PairSegment.ledgerAt(from), tally);
                scatter(block, segment, from, grains.forces());
            }
        }
    }

    private static void scatter(ContactBlock block, PairSegment segment, int from, double[] forces) {
        double[] c = block.columns();
        int[] first = segment.first();
        int[] second = segment.second();
        int base = GrainRow.PAD;
        for (int r = 0; r < block.rows(); r += Lanes.TILE) {
            int row = from + r;
            if (Lanes.VECTORISED) {
                Tile.addToRows(c, at(0) + r, STRIDE, forces, base, first, row);
                if (segment.cross()) {
                    Tile.storeRows(c, at(SECOND) + r, STRIDE, segment.exports(), PairSegment.PAD + 8 * row);
                } else {
                    Tile.addToRows(c, at(SECOND) + r, STRIDE, forces, base, second, row);
                }
            } else {
                Tile.addToRowsScalar(c, at(0) + r, STRIDE, forces, base, first, row);
                if (segment.cross()) {
                    Tile.storeRowsScalar(c, at(SECOND) + r, STRIDE, segment.exports(), PairSegment.PAD + 8 * row);
                } else {
                    Tile.addToRowsScalar(c, at(SECOND) + r, STRIDE, forces, base, second, row);
                }
            }
        }
    }
}
