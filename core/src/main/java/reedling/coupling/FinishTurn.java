// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import reedling.math.Lanes;
import reedling.math.Tile;

/** Second and third round of the turn of all tiles in columns 0-15, in place; the whole turn without vectors. */
final class FinishTurn implements RowStage {

    @Override
    public void run(RowRange rows) {
        double[] columns = rows.block().columns();
        int tiles = rows.block().rows() / Lanes.TILE;
        for (int t = 0; t < 2 * tiles; t++) {
            if (Lanes.VECTORISED) {
                Tile.finishTurn(columns, BeginTurn.tileAt(t, tiles), BeginTurn.STRIDE);
            } else {
                Tile.turnScalar(columns, BeginTurn.tileAt(t, tiles), BeginTurn.STRIDE);
            }
        }
    }
}
