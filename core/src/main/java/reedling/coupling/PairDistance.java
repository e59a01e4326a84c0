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
 * Gather stage: ends the turn of centre difference and sum of radii; normal, overlap and touch of grain-grain rows. What
 * only the gather's later stages want waits in columns that the laws will fill: inverse distance, inverse sum of radii,
 * sum of radii and the shortening of both levers, s = d / (r_i + r_j).
 */
final class PairDistance implements RowStage {

    static final int INVERSE_DISTANCE = Column.ELASTIC_FORCE;
    static final int INVERSE_RADII = Column.DAMPING;
    static final int RADII = Column.EFFECTIVE_RADIUS;
    static final int SHORTENING = Column.CONTACT_RADIUS;

    private static final int QUAD = Column.NORMAL;

    @Override
    public void run(RowRange rows) {
        ContactBlock block = rows.block();
        if (Lanes.VECTORISED) {
            vector(block.columns(), block.rows(), -block.reach());
        } else {
            scalar(block.columns(), block.rows(), -block.reach());
        }
    }

    private static void vector(double[] c, int rows, double farthest) {
        DoubleVector zero = DoubleVector.zero(Lanes.SPECIES);
        DoubleVector edge = DoubleVector.broadcast(Lanes.SPECIES, farthest);
        DoubleVector one = DoubleVector.broadcast(Lanes.SPECIES, 1.0);
        for (int r = 0; r < rows; r += Lanes.TILE) {
            DoubleVector a = load(c, QUAD, r), b = load(c, QUAD + 1, r);
            DoubleVector d = load(c, QUAD + 2, r), e = load(c, QUAD + 3, r);
            DoubleVector ad = Tile.swap2(a, d), be = Tile.swap2(b, e);
            DoubleVector a2 = Tile.take2(a, ad), b2 = Tile.take2(b, be);
            DoubleVector d2 = Tile.take2(ad, d), e2 = Tile.take2(be, e);
            DoubleVector ab = Tile.swap1(a2, b2), de = Tile.swap1(d2, e2);
            DoubleVector dx = Tile.take1(a2, ab), dy = Tile.take1(ab, b2), dz = Tile.take1(d2, de);
            DoubleVector radii = Tile.take1(de, e2);

            DoubleVector distance = dx.fma(dx, dy.fma(dy, dz.mul(dz))).sqrt();
            DoubleVector inverse = one.div(distance);
            DoubleVector overlap = radii.sub(distance);
            store(dx.mul(inverse), c, Column.NORMAL, r);
            store(dy.mul(inverse), c, Column.NORMAL + 1, r);
            store(dz.mul(inverse), c, Column.NORMAL + 2, r);
            store(overlap, c, Column.OVERLAP, r);
            store(zero.blend(one, edge.lt(overlap)), c, Column.TOUCH, r);
            store(inverse, c, INVERSE_DISTANCE, r);
            DoubleVector inverseRadii = one.div(radii); // not from the distance: R* of a contact keeps its bits
            store(inverseRadii, c, INVERSE_RADII, r);
            store(distance.mul(inverseRadii), c, SHORTENING, r);
            store(radii, c, RADII, r);
        }
    }

    private static void scalar(double[] c, int rows, double farthest) {
        for (int r = 0; r < rows; r++) {
            double dx = c[at(Column.NORMAL) + r], dy = c[at(Column.NORMAL + 1) + r], dz = c[at(Column.NORMAL + 2) + r];
            double radii = c[at(Column.OVERLAP) + r];

            double distance = Math.sqrt(Math.fma(dx, dx, Math.fma(dy, dy, dz * dz)));
            double inverse = 1.0 / distance;
            double overlap = radii - distance;
            c[at(Column.NORMAL) + r] = dx * inverse;
            c[at(Column.NORMAL + 1) + r] = dy * inverse;
            c[at(Column.NORMAL + 2) + r] = dz * inverse;
            c[at(Column.OVERLAP) + r] = overlap;
            c[at(Column.TOUCH) + r] = farthest < overlap ? 1.0 : 0.0;
            c[at(INVERSE_DISTANCE) + r] = inverse;
            double inverseRadii = 1.0 / radii;
            c[at(INVERSE_RADII) + r] = inverseRadii;
            c[at(SHORTENING) + r] = distance * inverseRadii;
            c[at(RADII) + r] = radii;
        }
    }
}
