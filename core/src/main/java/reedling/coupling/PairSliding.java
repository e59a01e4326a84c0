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
 * Gather stage: ends the turn of the sum of radius times spin and the difference of radii; sliding of the surfaces and
 * mean normal of grain-grain rows.
 *
 * <pre>v_t = s (r_i w_i + r_j w_j) x n - u        n_mean = n - h/(2 d) u</pre>
 */
final class PairSliding implements RowStage {

    /** First less second radius, m; {@link PairLevers} puts the lever in its place. */
    static final int RADIUS_DIFFERENCE = Column.LEVER_FIRST;

    private static final int QUAD = Column.MEAN_NORMAL;

    @Override
    public void run(RowRange rows) {
        ContactBlock block = rows.block();
        if (Lanes.VECTORISED) {
            vector(block.columns(), block.rows(), -0.5 * block.step());
        } else {
            scalar(block.columns(), block.rows(), -0.5 * block.step());
        }
    }

    private static void vector(double[] c, int rows, double minusHalfStep) {
        DoubleVector back = DoubleVector.broadcast(Lanes.SPECIES, minusHalfStep);
        for (int r = 0; r < rows; r += Lanes.TILE) {
            DoubleVector a = load(c, QUAD, r), b = load(c, QUAD + 1, r);
            DoubleVector d = load(c, QUAD + 2, r), e = load(c, QUAD + 3, r);
            DoubleVector ad = Tile.swap2(a, d), be = Tile.swap2(b, e);
            DoubleVector a2 = Tile.take2(a, ad), b2 = Tile.take2(b, be);
            DoubleVector d2 = Tile.take2(ad, d), e2 = Tile.take2(be, e);
            DoubleVector ab = Tile.swap1(a2, b2), de = Tile.swap1(d2, e2);
            store(Tile.take1(de, e2), c, RADIUS_DIFFERENCE, r);

            DoubleVector shortening = load(c, PairDistance.SHORTENING, r);
            DoubleVector sx = Tile.take1(a2, ab).mul(shortening);
            DoubleVector sy = Tile.take1(ab, b2).mul(shortening);
            DoubleVector sz = Tile.take1(d2, de).mul(shortening);
            DoubleVector nx = load(c, Column.NORMAL, r),
                    ny = load(c, Column.NORMAL + 1, r),
                    nz = load(c, Column.NORMAL + 2, r);
            DoubleVector ux = load(c, Column.SLIDING, r),
                    uy = load(c, Column.SLIDING + 1, r),
                    uz = load(c, Column.SLIDING + 2, r);
            store(sy.mul(nz).sub(sz.fma(ny, ux)), c, Column.SLIDING, r);
            store(sz.mul(nx).sub(sx.fma(nz, uy)), c, Column.SLIDING + 1, r);
            store(sx.mul(ny).sub(sy.fma(nx, uz)), c, Column.SLIDING + 2, r);
            DoubleVector turn = load(c, PairDistance.INVERSE_DISTANCE, r).mul(back);
            store(ux.fma(turn, nx), c, Column.MEAN_NORMAL, r);
            store(uy.fma(turn, ny), c, Column.MEAN_NORMAL + 1, r);
            store(uz.fma(turn, nz), c, Column.MEAN_NORMAL + 2, r);
        }
    }

    private static void scalar(double[] c, int rows, double minusHalfStep) {
        for (int r = 0; r < rows; r++) {
            double shortening = c[at(PairDistance.SHORTENING) + r];
            double sx = c[at(QUAD) + r] * shortening;
            double sy = c[at(QUAD + 1) + r] * shortening;
            double sz = c[at(QUAD + 2) + r] * shortening;
            double nx = c[at(Column.NORMAL) + r], ny = c[at(Column.NORMAL + 1) + r], nz = c[at(Column.NORMAL + 2) + r];
            double ux = c[at(Column.SLIDING) + r],
                    uy = c[at(Column.SLIDING + 1) + r],
                    uz = c[at(Column.SLIDING + 2) + r];
            c[at(Column.SLIDING) + r] = sy * nz - Math.fma(sz, ny, ux);
            c[at(Column.SLIDING + 1) + r] = sz * nx - Math.fma(sx, nz, uy);
            c[at(Column.SLIDING + 2) + r] = sx * ny - Math.fma(sy, nx, uz);
            double turn = c[at(PairDistance.INVERSE_DISTANCE) + r] * minusHalfStep;
            c[at(Column.MEAN_NORMAL) + r] = Math.fma(ux, turn, nx);
            c[at(Column.MEAN_NORMAL + 1) + r] = Math.fma(uy, turn, ny);
            c[at(Column.MEAN_NORMAL + 2) + r] = Math.fma(uz, turn, nz);
        }
    }
}
