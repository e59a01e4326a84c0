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
 * Gather stage: ends the turn of velocity difference and sum of inverse masses; closing speed, effective masses and the
 * tangential velocity of the centres of grain-grain rows, which waits in the columns of SLIDING for {@link PairSliding}.
 *
 * <pre>v_n = (v_i - v_j) . n        u = (v_j - v_i) + v_n n        1/m_t = (1 + 5/2 s^2) / m*</pre>
 */
final class PairApproach implements RowStage {

    private static final int QUAD = Column.SLIDING;

    /** r^2 / I = 2.5 / m for a solid sphere: what a lever adds to the inverse mass along the surface. */
    private static final double SPHERE = 2.5;

    @Override
    public void run(RowRange rows) {
        ContactBlock block = rows.block();
        if (Lanes.VECTORISED) {
            vector(block.columns(), block.rows());
        } else {
            scalar(block.columns(), block.rows());
        }
    }

    private static void vector(double[] c, int rows) {
        DoubleVector one = DoubleVector.broadcast(Lanes.SPECIES, 1.0);
        DoubleVector sphere = DoubleVector.broadcast(Lanes.SPECIES, SPHERE);
        for (int r = 0; r < rows; r += Lanes.TILE) {
            DoubleVector a = load(c, QUAD, r), b = load(c, QUAD + 1, r);
            DoubleVector d = load(c, QUAD + 2, r), e = load(c, QUAD + 3, r);
            DoubleVector ad = Tile.swap2(a, d), be = Tile.swap2(b, e);
            DoubleVector a2 = Tile.take2(a, ad), b2 = Tile.take2(b, be);
            DoubleVector d2 = Tile.take2(ad, d), e2 = Tile.take2(be, e);
            DoubleVector ab = Tile.swap1(a2, b2), de = Tile.swap1(d2, e2);
            DoubleVector dx = Tile.take1(a2, ab), dy = Tile.take1(ab, b2), dz = Tile.take1(d2, de);
            DoubleVector inverseMass = Tile.take1(de, e2);

            DoubleVector nx = load(c, Column.NORMAL, r),
                    ny = load(c, Column.NORMAL + 1, r),
                    nz = load(c, Column.NORMAL + 2, r);
            DoubleVector closing = dx.fma(nx, dy.fma(ny, dz.mul(nz))).neg();
            store(closing, c, Column.CLOSING, r);
            store(closing.fma(nx, dx), c, Column.SLIDING, r);
            store(closing.fma(ny, dy), c, Column.SLIDING + 1, r);
            store(closing.fma(nz, dz), c, Column.SLIDING + 2, r);
            store(inverseMass, c, Column.INVERSE_MASS, r);
            store(one.div(inverseMass), c, Column.EFFECTIVE_MASS, r);
            DoubleVector shortening = load(c, PairDistance.SHORTENING, r);
            DoubleVector levers = shortening.mul(shortening).mul(sphere);
            store(levers.fma(inverseMass, inverseMass), c, Column.INVERSE_MASS_SLIDING, r);
        }
    }

    private static void scalar(double[] c, int rows) {
        for (int r = 0; r < rows; r++) {
            double dx = c[at(Column.SLIDING) + r],
                    dy = c[at(Column.SLIDING + 1) + r],
                    dz = c[at(Column.SLIDING + 2) + r];
            double inverseMass = c[at(Column.INVERSE_MASS) + r];

            double nx = c[at(Column.NORMAL) + r], ny = c[at(Column.NORMAL + 1) + r], nz = c[at(Column.NORMAL + 2) + r];
            double closing = -Math.fma(dx, nx, Math.fma(dy, ny, dz * nz));
            c[at(Column.CLOSING) + r] = closing;
            c[at(Column.SLIDING) + r] = Math.fma(closing, nx, dx);
            c[at(Column.SLIDING + 1) + r] = Math.fma(closing, ny, dy);
            c[at(Column.SLIDING + 2) + r] = Math.fma(closing, nz, dz);
            c[at(Column.EFFECTIVE_MASS) + r] = 1.0 / inverseMass;
            double shortening = c[at(PairDistance.SHORTENING) + r];
            double levers = shortening * shortening * SPHERE;
            c[at(Column.INVERSE_MASS_SLIDING) + r] = Math.fma(levers, inverseMass, inverseMass);
        }
    }
}
