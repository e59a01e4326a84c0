// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

import static reedling.contact.ContactBlock.at;
import static reedling.contact.ContactBlock.load;
import static reedling.contact.ContactBlock.store;

import jdk.incubator.vector.DoubleVector;
import reedling.contact.Column;
import reedling.contact.ContactBlock;
import reedling.math.Lanes;
import reedling.math.Tile;

/**
 * Last stage of the gather: ends the turn of relative spin and sum of inverse moments of inertia; levers l = s r and
 * effective radius R* = r_i r_j / (r_i + r_j) of grain-grain rows.
 */
final class PairLevers implements RowStage {

    @Override
    public void run(RowRange rows) {
        ContactBlock block = rows.block();
        if (Lanes.VECTORISED) {
            Tile.finishQuad(block.columns(), at(Column.SPIN), at(1) - at(0), block.rows() / Lanes.TILE);
            vector(block.columns(), block.rows());
        } else {
            scalar(block.columns(), block.rows());
        }
    }

    private static void vector(double[] c, int rows) {
        DoubleVector half = DoubleVector.broadcast(Lanes.SPECIES, 0.5);
        for (int r = 0; r < rows; r += Lanes.TILE) {
            DoubleVector radii = load(c, PairDistance.RADII, r);
            DoubleVector difference = load(c, PairSliding.RADIUS_DIFFERENCE, r);
            DoubleVector shortening = load(c, PairDistance.SHORTENING, r);
            DoubleVector first = radii.add(difference).mul(half);
            DoubleVector second = radii.sub(difference).mul(half);
            store(first.mul(second).mul(load(c, PairDistance.INVERSE_RADII, r)), c, Column.EFFECTIVE_RADIUS, r);
            store(shortening.mul(first), c, Column.LEVER_FIRST, r);
            store(shortening.mul(second), c, Column.LEVER_SECOND, r);
        }
    }

    private static void scalar(double[] c, int rows) {
        for (int r = 0; r < rows; r++) {
            double radii = c[at(PairDistance.RADII) + r];
            double difference = c[at(PairSliding.RADIUS_DIFFERENCE) + r];
            double shortening = c[at(PairDistance.SHORTENING) + r];
            double first = (radii + difference) * 0.5;
            double second = (radii - difference) * 0.5;
            c[at(Column.EFFECTIVE_RADIUS) + r] = first * second * c[at(PairDistance.INVERSE_RADII) + r];
            c[at(Column.LEVER_FIRST) + r] = shortening * first;
            c[at(Column.LEVER_SECOND) + r] = shortening * second;
        }
    }
}
