// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import static reedling.contact.ContactBlock.at;

import reedling.contact.ContactBlock;
import reedling.math.Lanes;
import reedling.math.Tile;
import reedling.neighbour.PairSegment;
import reedling.particle.GrainRow;

/**
 * Last stage of grain-grain rows: adds the force rows, turned back, to both grains; a second grain of another chunk gets
 * its row in the segment's exports, for its own chunk to add.
 */
final class PairScatter implements RowStage {

    private static final int SECOND = 8; // column where the second body's force rows start

    @Override
    public void run(RowRange rows) {
        ContactBlock block = rows.block();
        PairSegment segment = rows.segment();
        double[] c = block.columns();
        double[] forces = rows.forces();
        for (int r = 0; r < block.rows(); r += Lanes.TILE) {
            int row = rows.from() + r;
            int first = at(0) + r;
            int second = at(SECOND) + r;
            if (Lanes.VECTORISED) {
                Tile.addRows(c, first, BeginTurn.STRIDE, forces, GrainRow.PAD, segment.first(), row);
            } else {
                Tile.addToRowsScalar(c, first, BeginTurn.STRIDE, forces, GrainRow.PAD, segment.first(), row);
            }
            if (segment.cross()) {
                store(c, second, segment.exports(), PairSegment.PAD + 8 * row);
            } else if (Lanes.VECTORISED) {
                Tile.addRows(c, second, BeginTurn.STRIDE, forces, GrainRow.PAD, segment.second(), row);
            } else {
                Tile.addToRowsScalar(c, second, BeginTurn.STRIDE, forces, GrainRow.PAD, segment.second(), row);
            }
        }
    }

    private static void store(double[] c, int at, double[] exports, int to) {
        if (Lanes.VECTORISED) {
            Tile.storeRows(c, at, BeginTurn.STRIDE, exports, to);
        } else {
            Tile.storeRowsScalar(c, at, BeginTurn.STRIDE, exports, to);
        }
    }
}
