// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import static reedling.contact.ContactBlock.at;

import reedling.math.Lanes;
import reedling.math.Tile;
import reedling.neighbour.PairSegment;
import reedling.particle.GrainRow;

/**
 * Last stage of grain-grain rows: adds the force rows to both grains; a second grain of another chunk gets its row in the
 * segment's exports, for its own chunk to add.
 *
 * <p>Rows are added lane by lane, first row 0 of every tile, then row 1: pairs of one grain follow one another in a segment,
 * and adding to one force row twice in a row waits for the first store.
 */
final class PairScatter implements RowStage {

    @Override
    public void run(RowRange rows) {
        double[] c = rows.block().columns();
        int count = rows.block().rows();
        addTo(rows.segment().first(), rows.from(), c, ForceRows.FIRST, count, rows.forces());
        if (rows.segment().cross()) {
            export(rows.segment(), rows.from(), c, count);
        } else {
            addTo(rows.segment().second(), rows.from(), c, ForceRows.SECOND, count, rows.forces());
        }
    }

    private static void addTo(int[] grains, int from, double[] c, int column, int count, double[] forces) {
        for (int lane = 0; lane < Lanes.TILE; lane++) {
            int rowAt = at(column + lane);
            for (int r = 0; r < count; r += Lanes.TILE) {
                Tile.addRow(c, rowAt + r, forces, GrainRow.forceAt(grains[from + r + lane]));
            }
        }
    }

    private static void export(PairSegment segment, int from, double[] c, int count) {
        for (int lane = 0; lane < Lanes.TILE; lane++) {
            int rowAt = at(ForceRows.SECOND + lane);
            for (int r = 0; r < count; r += Lanes.TILE) {
                Tile.copyRow(c, rowAt + r, segment.exports(), PairSegment.PAD + 8 * (from + r + lane));
            }
        }
    }
}
