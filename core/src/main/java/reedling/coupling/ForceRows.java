// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import static reedling.contact.ContactBlock.at;

import reedling.contact.ContactBlock;
import reedling.math.Lanes;
import reedling.math.Tile;

/**
 * Last engine stage of every kind of contact: ends the turn of the force columns of both bodies into rows. Row r of the
 * block then stands at {@link #first(int)} and {@link #second(int)}: torque 3, normal stiffness, force 3, tangential
 * stiffness, on the first and on the second body.
 */
final class ForceRows implements RowStage {

    /** Columns in which the first body's tile stands, over gathered numbers that nobody reads after {@link FirstForces}. */
    static final int FIRST = 8;

    /** Columns in which the second body's tile stands, over those that nobody reads after {@link SecondForces}. */
    static final int SECOND = 0;

    /** Doubles from one column to the next. */
    static final int STRIDE = at(1) - at(0);

    private static final int QUAD = 4;

    /** Index of the force row of the first body of a row of the block. */
    static int first(int row) {
        return at(FIRST + row % Lanes.TILE) + row - row % Lanes.TILE;
    }

    /** Index of the force row of the second body of a row of the block. */
    static int second(int row) {
        return at(SECOND + row % Lanes.TILE) + row - row % Lanes.TILE;
    }

    @Override
    public void run(RowRange rows) {
        ContactBlock block = rows.block();
        finish(block.columns(), FIRST, block.rows() / Lanes.TILE);
        finish(block.columns(), SECOND, block.rows() / Lanes.TILE);
    }

    private static void finish(double[] c, int column, int tiles) {
        if (Lanes.VECTORISED) {
            Tile.finishQuad(c, at(column), STRIDE, tiles);
            Tile.finishQuad(c, at(column + QUAD), STRIDE, tiles);
        } else {
            for (int t = 0; t < tiles; t++) {
                Tile.turnScalar(c, at(column) + Lanes.TILE * t, STRIDE);
            }
        }
    }
}
