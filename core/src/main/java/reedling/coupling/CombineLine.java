// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import static reedling.contact.ContactBlock.at;

import reedling.contact.ContactBlock;
import reedling.math.Lanes;
import reedling.math.Tile;
import reedling.particle.GrainRow;

/**
 * First stage of the gather: combines one line of the two grains of each pair and begins to turn it into columns; the
 * stages after it end the turn, four columns each. Without vectors the columns are complete at once.
 *
 * <p>First line (columns 0-7): centre difference 3 (second less first), sum of radii, velocity difference 3 (second less
 * first), sum of inverse masses. Second line (columns 8-15): spin difference 3 (first less second), sum of inverse
 * inertias, sum of radius times spin 3, difference of radii (first less second).
 */
final class CombineLine implements RowStage {

    private static final double[] FIRST_WEIGHTS = {-1, -1, -1, 1, -1, -1, -1, 1};
    private static final double[] SECOND_WEIGHTS = {-1, -1, -1, 1, 1, 1, 1, -1};
    private static final int STRIDE = at(1) - at(0);
    private static final int LINE = 8;

    private final boolean second;

    CombineLine(boolean second) {
        this.second = second;
    }

    @Override
    public void run(RowRange rows) {
        ContactBlock block = rows.block();
        int[] minus = second ? rows.segment().second() : rows.segment().first();
        int[] plus = second ? rows.segment().first() : rows.segment().second();
        double[] weights = second ? SECOND_WEIGHTS : FIRST_WEIGHTS;
        int base = GrainRow.PAD + (second ? LINE : 0);
        int column = at(second ? LINE : 0);
        double[] c = block.columns();
        int count = block.rows();
        if (Lanes.VECTORISED) {
            Tile.combine(
                    rows.grainRows(),
                    base,
                    GrainRow.LENGTH,
                    minus,
                    plus,
                    rows.from(),
                    count,
                    weights,
                    c,
                    column,
                    STRIDE);
        } else {
            Tile.combineScalar(
                    rows.grainRows(),
                    base,
                    GrainRow.LENGTH,
                    minus,
                    plus,
                    rows.from(),
                    count,
                    weights,
                    c,
                    column,
                    STRIDE);
        }
    }
}
