// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import static reedling.contact.ContactBlock.at;

import reedling.math.Lanes;
import reedling.math.Tile;

/** First round of the turn of all tiles in columns 0-15, in place. */
final class BeginTurn implements RowStage {

    /** Doubles from one column to the next. */
    static final int STRIDE = at(1) - at(0);

    private static final int LINE = 8;

    /** Index of tile t of a block: first the tiles of columns 0-7, then those of columns 8-15. */
    static int tileAt(int t, int tiles) {
        return t < tiles ? at(0) + Lanes.TILE * t : at(LINE) + Lanes.TILE * (t - tiles);
    }

    @Override
    public void run(RowRange rows) {
        if (Lanes.VECTORISED) { // the plain version does all rounds at once in FinishTurn
            double[] columns = rows.block().columns();
            int tiles = rows.block().rows() / Lanes.TILE;
            for (int t = 0; t < 2 * tiles; t++) {
                Tile.beginTurn(columns, tileAt(t, tiles), STRIDE);
            }
        }
    }
}
