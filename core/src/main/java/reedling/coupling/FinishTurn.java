// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import reedling.math.Lanes;
import reedling.math.Tile;

/** Second and third round of the turn of all tiles in columns 0-15, in place. */
final class FinishTurn implements RowStage {

    @Override
    public void run(RowRange rows) {
        if (Lanes.VECTORISED) { // the plain versions turn whole tiles at once
            double[] columns = rows.block().columns();
            int tiles = rows.block().rows() / Lanes.TILE;
            for (int t = 0; t < 2 * tiles; t++) {
                Tile.finishTurn(columns, BeginTurn.tileAt(t, tiles), BeginTurn.STRIDE);
            }
        }
    }
}
